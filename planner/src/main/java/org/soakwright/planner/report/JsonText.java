package org.soakwright.planner.report;

import com.fasterxml.jackson.core.JsonFactory;
import com.fasterxml.jackson.core.JsonGenerator;
import com.fasterxml.jackson.core.util.DefaultIndenter;
import com.fasterxml.jackson.core.util.DefaultPrettyPrinter;
import java.io.IOException;
import java.io.StringWriter;
import java.io.UncheckedIOException;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/** A JSON object being written into memory. No number is ever NaN or infinite: one that would be is a fault, not a value. */
public final class JsonText {
    private static final DefaultIndenter INDENTER = new DefaultIndenter("  ", "\n");

    private final StringWriter text = new StringWriter();
    private final JsonGenerator json;

    /** Something written with a generator, which can fail in principle. */
    public interface Part {
        void write() throws IOException;
    }

    private JsonText() throws IOException {
        json = new JsonFactory().createGenerator(text);
        DefaultPrettyPrinter printer = new DefaultPrettyPrinter();
        printer.indentObjectsWith(INDENTER);
        printer.indentArraysWith(INDENTER);
        json.setPrettyPrinter(printer);
    }

    /** What writes the members of an object. */
    public interface Members {
        void write(JsonText json) throws IOException;
    }

    /** One object as text, with a line feed at its end. */
    public static String object(Members members) {
        try {
            JsonText json = new JsonText();
            json.json.writeStartObject();
            members.write(json);
            json.json.writeEndObject();
            json.json.close();
            return json.text + "\n";
        } catch (IOException e) {
            throw new UncheckedIOException("memory does not fail to be written", e);
        }
    }

    public void object(String name, Part members) throws IOException {
        json.writeObjectFieldStart(name);
        members.write();
        json.writeEndObject();
    }

    /** An element of the array being written. */
    public void element(Part members) throws IOException {
        json.writeStartObject();
        members.write();
        json.writeEndObject();
    }

    public void array(String name, Part elements) throws IOException {
        json.writeArrayFieldStart(name);
        elements.write();
        json.writeEndArray();
    }

    public void strings(String name, List<String> values) throws IOException {
        array(name, () -> {
            for (String value : values) {
                json.writeString(value);
            }
        });
    }

    public void number(String name, double value) throws IOException {
        json.writeNumberField(name, finite(name, value));
    }

    public void numbers(String name, double... values) throws IOException {
        array(name, () -> {
            for (double value : values) {
                json.writeNumber(finite(name, value));
            }
        });
    }

    public void numberOrNull(String name, OptionalDouble value) throws IOException {
        if (value.isPresent()) {
            number(name, value.getAsDouble());
        } else {
            nothing(name);
        }
    }

    /** A member only where there is a number. */
    public void numberIfAny(String name, OptionalDouble value) throws IOException {
        if (value.isPresent()) {
            number(name, value.getAsDouble());
        }
    }

    public void whole(String name, long value) throws IOException {
        json.writeNumberField(name, value);
    }

    public void string(String name, String value) throws IOException {
        json.writeStringField(name, value);
    }

    public void stringOrNull(String name, Optional<String> value) throws IOException {
        if (value.isPresent()) {
            string(name, value.get());
        } else {
            nothing(name);
        }
    }

    public void truth(String name, boolean value) throws IOException {
        json.writeBooleanField(name, value);
    }

    public void nothing(String name) throws IOException {
        json.writeNullField(name);
    }

    private static double finite(String name, double value) {
        if (!Double.isFinite(value)) {
            throw new ArithmeticException(name + " came out as " + value);
        }
        return value == 0 ? 0.0 : value;
    }
}
