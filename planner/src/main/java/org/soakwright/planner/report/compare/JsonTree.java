package org.soakwright.planner.report.compare;

import com.fasterxml.jackson.core.JsonProcessingException;
import java.io.IOException;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.Function;
import org.jspecify.annotations.Nullable;
import org.soakwright.planner.json.JsonValues;
import org.soakwright.recipes.text.Place;
import org.soakwright.recipes.text.Unsound;

/** A value of a JSON text with the path that leads to it, for messages. Whatever is not as wanted is refused by its path. */
final class JsonTree {
    private final String file;
    private final String path;
    private final @Nullable Object value;

    private JsonTree(String file, String path, @Nullable Object value) {
        this.file = file;
        this.path = path;
        this.value = value;
    }

    /**
     * Reads one object.
     *
     * @throws Unsound where the text is no JSON
     */
    static JsonTree read(String file, String text) {
        try {
            JsonValues.Read read = JsonValues.read(text);
            if (read.goesOn()) {
                throw new Unsound(Place.of(file), "this is no result: found more after its end");
            }
            return new JsonTree(file, "", read.value());
        } catch (JsonProcessingException e) {
            Place place = e.getLocation() == null
                    ? Place.of(file)
                    : new Place(
                            file,
                            Math.max(0, e.getLocation().getLineNr()),
                            Math.max(0, e.getLocation().getColumnNr()));
            throw new Unsound(
                    place, "this is no whole JSON text: found " + JsonValues.fault(e) + "; write it anew with --json");
        } catch (IOException e) {
            throw new Unsound(Place.of(file), "the text cannot be read");
        }
    }

    private Unsound wrong(String wanted) {
        return new Unsound(
                Place.of(file),
                "this is no result of follow or plan: " + (path.isEmpty() ? "it" : "\"" + path + "\"") + " is "
                        + (value == null ? "missing" : "not as wanted") + ", " + wanted + " would be right");
    }

    private Map<?, ?> members() {
        if (value instanceof Map<?, ?> members) {
            return members;
        }
        throw wrong("an object");
    }

    boolean has(String name) {
        return members().get(name) != null;
    }

    JsonTree at(String name) {
        return new JsonTree(
                file, path.isEmpty() ? name : path + "." + name, members().get(name));
    }

    String text() {
        if (value instanceof String text) {
            return text;
        }
        throw wrong("a text");
    }

    Optional<String> text(String name) {
        return has(name) ? Optional.of(at(name).text()) : Optional.empty();
    }

    double number() {
        if (value instanceof Double number && Double.isFinite(number)) {
            return number;
        }
        throw wrong("a number");
    }

    OptionalDouble number(String name) {
        return has(name) ? OptionalDouble.of(at(name).number()) : OptionalDouble.empty();
    }

    boolean truth() {
        if (value instanceof Boolean truth) {
            return truth;
        }
        throw wrong("true or false");
    }

    <T> List<T> elements(Function<JsonTree, T> reader) {
        if (!(value instanceof List<?> elements)) {
            throw wrong("a list");
        }
        List<T> all = new ArrayList<>();
        for (int i = 0; i < elements.size(); i++) {
            all.add(reader.apply(new JsonTree(file, path + "[" + i + "]", elements.get(i))));
        }
        return List.copyOf(all);
    }

    /** Members by name, in the order written. */
    <T> Map<String, T> each(Function<JsonTree, T> reader) {
        Map<String, T> all = new LinkedHashMap<>();
        for (Object name : members().keySet()) {
            all.put((String) name, reader.apply(at((String) name)));
        }
        return all;
    }
}
