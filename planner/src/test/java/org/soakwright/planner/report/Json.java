package org.soakwright.planner.report;

import com.fasterxml.jackson.core.JsonFactory;
import com.fasterxml.jackson.core.JsonParser;
import com.fasterxml.jackson.core.JsonToken;
import java.io.IOException;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.jspecify.annotations.Nullable;

/** JSON read back into maps in the order written, lists, strings, numbers, truths and null. */
public final class Json {
    private final JsonParser parser;

    private Json(JsonParser parser) {
        this.parser = parser;
    }

    public static Map<String, @Nullable Object> object(String text) throws IOException {
        try (JsonParser parser = new JsonFactory().createParser(text)) {
            parser.nextToken();
            return new Json(parser).object();
        }
    }

    private Map<String, @Nullable Object> object() throws IOException {
        Map<String, @Nullable Object> members = new LinkedHashMap<>();
        while (parser.nextToken() != JsonToken.END_OBJECT) {
            String name = parser.currentName();
            parser.nextToken();
            if (members.put(name, value()) != null) {
                throw new IOException("twice: " + name);
            }
        }
        return members;
    }

    private List<@Nullable Object> array() throws IOException {
        List<@Nullable Object> elements = new ArrayList<>();
        while (parser.nextToken() != JsonToken.END_ARRAY) {
            elements.add(value());
        }
        return elements;
    }

    private @Nullable Object value() throws IOException {
        return switch (parser.currentToken()) {
            case START_OBJECT -> object();
            case START_ARRAY -> array();
            case VALUE_STRING -> parser.getText();
            case VALUE_NUMBER_INT, VALUE_NUMBER_FLOAT -> parser.getDoubleValue();
            case VALUE_TRUE -> true;
            case VALUE_FALSE -> false;
            case VALUE_NULL -> null;
            default -> throw new IOException("unexpected " + parser.currentToken());
        };
    }

    /** What a path of names and positions leads to. */
    @SuppressWarnings("unchecked")
    public static @Nullable Object at(@Nullable Object from, Object... path) {
        @Nullable Object here = from;
        for (Object step : path) {
            if (step instanceof Integer index) {
                here = ((List<@Nullable Object>) java.util.Objects.requireNonNull(here)).get(index);
            } else {
                here = ((Map<String, @Nullable Object>) java.util.Objects.requireNonNull(here)).get((String) step);
            }
        }
        return here;
    }

    /** The number a path leads to. */
    public static double number(@Nullable Object from, Object... path) {
        return (double) java.util.Objects.requireNonNull(at(from, path));
    }

    /** The names of the members of what a path leads to. */
    @SuppressWarnings("unchecked")
    public static List<String> names(@Nullable Object from, Object... path) {
        return List.copyOf(((Map<String, @Nullable Object>) java.util.Objects.requireNonNull(at(from, path))).keySet());
    }
}
