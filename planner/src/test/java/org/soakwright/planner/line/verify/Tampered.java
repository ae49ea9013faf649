package org.soakwright.planner.line.verify;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import org.jspecify.annotations.Nullable;
import org.soakwright.planner.line.HandmadePlan;
import org.soakwright.planner.report.Json;
import org.soakwright.planner.report.Stamp;
import org.soakwright.planner.report.line.LineJson;
import org.soakwright.recipes.LineOutcome;
import org.soakwright.recipes.Lines;
import org.soakwright.recipes.model.line.Line;

/** The result of a plan put together by hand, of which somebody changed something; and its hall, with other rules. */
final class Tampered {
    private static final String GOOD = LineJson.of(new Stamp("0.1.0", "00"), HandmadePlan.of());

    private final Map<String, @Nullable Object> json;

    Tampered() {
        try {
            json = Json.object(GOOD);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    /** Puts a value where a path of names and positions leads. */
    Tampered with(@Nullable Object value, Object... path) {
        put(value, path);
        return this;
    }

    /** Takes away what a path leads to. */
    Tampered without(Object... path) {
        Object parent = parent(path);
        Object last = path[path.length - 1];
        if (parent instanceof List<?> list) {
            list.remove((int) (Integer) last);
        } else {
            ((Map<?, ?>) parent).remove(last);
        }
        return this;
    }

    /** Puts what a path leads to there once more. */
    @SuppressWarnings("unchecked")
    Tampered twice(Object... path) {
        ((List<@Nullable Object>) parent(path)).add(Json.at(json, path));
        return this;
    }

    private Object parent(Object... path) {
        return Objects.requireNonNull(Json.at(json, java.util.Arrays.copyOf(path, path.length - 1)));
    }

    @SuppressWarnings("unchecked")
    private void put(@Nullable Object value, Object... path) {
        Object last = path[path.length - 1];
        Object parent = parent(path);
        if (last instanceof Integer index) {
            ((List<@Nullable Object>) parent).set(index, value);
        } else {
            ((Map<String, @Nullable Object>) parent).put((String) last, value);
        }
    }

    @Nullable
    Object get(Object... path) {
        return Json.at(json, path);
    }

    /** Every path to a value that is neither an object nor a list. */
    List<List<Object>> leaves() {
        List<List<Object>> all = new ArrayList<>();
        walk(json, List.of(), all, false);
        return all;
    }

    /** Every path to any value. */
    List<List<Object>> everything() {
        List<List<Object>> all = new ArrayList<>();
        walk(json, List.of(), all, true);
        return all;
    }

    private static void walk(@Nullable Object at, List<Object> path, List<List<Object>> all, boolean inner) {
        Map<Object, @Nullable Object> children = new LinkedHashMap<>();
        if (at instanceof Map<?, ?> map) {
            map.forEach(children::put);
        } else if (at instanceof List<?> list) {
            for (int i = 0; i < list.size(); i++) {
                children.put(i, list.get(i));
            }
        }
        boolean leaf = !(at instanceof Map) && !(at instanceof List);
        if (!path.isEmpty() && (leaf || inner)) {
            all.add(path);
        }
        children.forEach((step, child) -> {
            List<Object> longer = new ArrayList<>(path);
            longer.add(step);
            walk(child, longer, all, inner);
        });
    }

    String text() {
        StringBuilder text = new StringBuilder();
        write(text, json);
        return text.toString();
    }

    private static void write(StringBuilder text, @Nullable Object value) {
        if (value instanceof Map<?, ?> map) {
            String between = "{";
            for (Map.Entry<?, ?> entry : map.entrySet()) {
                text.append(between).append('"').append(entry.getKey()).append("\":");
                write(text, entry.getValue());
                between = ",";
            }
            text.append(map.isEmpty() ? "{}" : "}");
        } else if (value instanceof List<?> list) {
            String between = "[";
            for (Object one : list) {
                text.append(between);
                write(text, one);
                between = ",";
            }
            text.append(list.isEmpty() ? "[]" : "]");
        } else if (value instanceof String word) {
            text.append('"')
                    .append(word.replace("\\", "\\\\").replace("\"", "\\\""))
                    .append('"');
        } else {
            text.append(value);
        }
    }

    /** The hall with some words in one of its files written otherwise, each where it comes first. */
    static Line hall(Path folder, String file, String... fromTo) {
        try {
            Path own = Objects.requireNonNull(HandmadePlan.FILE.toAbsolutePath().getParent());
            for (String name : List.of("small-hall.yaml", "thin-loins.yaml", "cords.yaml")) {
                String text = Files.readString(own.resolve(name));
                for (int i = 0; name.equals(file) && i < fromTo.length; i += 2) {
                    if (!text.contains(fromTo[i])) {
                        throw new IllegalArgumentException("not in " + file + ": " + fromTo[i]);
                    }
                    int at = text.indexOf(fromTo[i]);
                    text = text.substring(0, at) + fromTo[i + 1] + text.substring(at + fromTo[i].length());
                }
                Files.writeString(folder.resolve(name), text);
            }
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
        LineOutcome outcome = Lines.read(folder.resolve("small-hall.yaml"));
        if (outcome instanceof LineOutcome.Refused refused) {
            throw new IllegalArgumentException(refused.problems().toString());
        }
        return ((LineOutcome.Accepted) outcome).line();
    }
}
