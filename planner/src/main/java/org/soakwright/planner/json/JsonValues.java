package org.soakwright.planner.json;

import com.fasterxml.jackson.core.JsonFactory;
import com.fasterxml.jackson.core.JsonParser;
import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.core.JsonToken;
import com.fasterxml.jackson.core.StreamReadFeature;
import java.io.IOException;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.jspecify.annotations.Nullable;

/** One JSON text as maps in the order written, lists, doubles, booleans, texts without control characters, and null. */
public final class JsonValues {
    private JsonValues() {}

    /**
     * What a text holds.
     *
     * @param value null also where it says so
     * @param goesOn whether there is more after its end
     */
    public record Read(@Nullable Object value, boolean goesOn) {}

    /**
     * Reads one value.
     *
     * @throws JsonProcessingException where it is no whole JSON, or a name comes twice
     */
    public static Read read(String text) throws IOException {
        JsonFactory factory = JsonFactory.builder()
                .enable(StreamReadFeature.STRICT_DUPLICATE_DETECTION)
                .build();
        try (JsonParser parser = factory.createParser(text)) {
            parser.nextToken();
            Object value = value(parser);
            return new Read(value, parser.nextToken() != null);
        }
    }

    /** The first line of what is wrong with a text. */
    public static String fault(JsonProcessingException e) {
        String message = String.valueOf(e.getOriginalMessage());
        return plain(message.lines().findFirst().orElse("a fault").strip());
    }

    private static @Nullable Object value(JsonParser parser) throws IOException {
        JsonToken token = parser.currentToken();
        if (token == JsonToken.START_OBJECT) {
            Map<String, @Nullable Object> members = new LinkedHashMap<>();
            while (parser.nextToken() != JsonToken.END_OBJECT) {
                String name = parser.currentName();
                parser.nextToken();
                members.put(name, value(parser));
            }
            return members;
        }
        if (token == JsonToken.START_ARRAY) {
            List<@Nullable Object> elements = new ArrayList<>();
            while (parser.nextToken() != JsonToken.END_ARRAY) {
                elements.add(value(parser));
            }
            return elements;
        }
        if (token == JsonToken.VALUE_NUMBER_INT || token == JsonToken.VALUE_NUMBER_FLOAT) {
            return parser.getDoubleValue();
        }
        if (token == JsonToken.VALUE_TRUE || token == JsonToken.VALUE_FALSE) {
            return token == JsonToken.VALUE_TRUE;
        }
        return token == JsonToken.VALUE_STRING ? plain(parser.getText()) : null;
    }

    /** A terminal obeys control characters; a name has none. */
    private static String plain(String text) {
        return text.replaceAll("\\p{Cntrl}", " ");
    }
}
