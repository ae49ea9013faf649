package org.soakwright.planner.line.verify;

import com.fasterxml.jackson.core.JsonProcessingException;
import java.io.IOException;
import java.time.DateTimeException;
import java.time.OffsetDateTime;
import java.time.ZoneId;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.OptionalLong;
import org.jspecify.annotations.Nullable;
import org.soakwright.planner.json.JsonValues;

/** A value of a JSON text with the path that leads to it. What is missing or of another type becomes a fault, and something harmless in its place. */
final class Tree {
    private static final String MOMENT = "a time with its offset such as 2026-03-02T06:15+01:00";

    /** Lines start from 2000 to 2199, and no step lasts longer than a century. */
    private static final int FIRST_YEAR = 1900;

    private static final int LAST_YEAR = 2400;

    private final Faults faults;
    private final String path;
    private final Map<?, ?> members;

    private Tree(Faults faults, String path, Map<?, ?> members) {
        this.faults = faults;
        this.path = path;
        this.members = members;
    }

    /** Reads one object; empty with a fault where the text is none. */
    static Optional<Tree> read(String text, Faults faults) {
        try {
            JsonValues.Read read = JsonValues.read(text);
            if (read.goesOn()) {
                faults.add("The text goes on after the result ends; one JSON object would be right.");
            } else if (read.value() instanceof Map<?, ?> members) {
                return Optional.of(new Tree(faults, "", members));
            } else {
                faults.add("The text is no JSON object; what line writes with --json would be right.");
            }
        } catch (JsonProcessingException e) {
            String where = e.getLocation() == null
                    ? ""
                    : " in line " + Math.max(1, e.getLocation().getLineNr()) + ", column "
                            + Math.max(1, e.getLocation().getColumnNr());
            faults.add(
                    "The text is no whole JSON" + where + ": " + JsonValues.fault(e) + "; write it anew with --json.");
        } catch (IOException e) {
            faults.add("The text cannot be read; write it anew with --json.");
        }
        return Optional.empty();
    }

    String path() {
        return path;
    }

    private String path(String name) {
        return path.isEmpty() ? name : path + "." + name;
    }

    private void wrong(String name, @Nullable Object found, String wanted) {
        String is = found == null
                ? "is missing"
                : found instanceof Map || found instanceof List ? "is no single value" : "is \"" + found + "\"";
        faults.add(path(name) + " " + is + ", " + wanted + " would be right.");
    }

    private @Nullable Object get(String name) {
        return members.get(name);
    }

    boolean has(String name) {
        return get(name) != null;
    }

    String text(String name) {
        Object found = get(name);
        if (found instanceof String text) {
            return text;
        }
        wrong(name, found, "a text");
        return "";
    }

    Optional<String> textIfAny(String name) {
        return has(name) ? Optional.of(text(name)) : Optional.empty();
    }

    double number(String name) {
        Object found = get(name);
        if (found instanceof Double number && Double.isFinite(number)) {
            return number;
        }
        wrong(name, found, "a number");
        return 0;
    }

    OptionalDouble numberIfAny(String name) {
        return has(name) ? OptionalDouble.of(number(name)) : OptionalDouble.empty();
    }

    /** A whole number that others count with; kept within what an int holds. */
    int whole(String name) {
        double number = number(name);
        if (number != Math.rint(number) || Math.abs(number) > Integer.MAX_VALUE) {
            wrong(name, number, "a whole number");
        }
        return (int) number;
    }

    /** The same; 1 where it is not there. */
    int wholeOrOne(String name) {
        return has(name) ? whole(name) : 1;
    }

    boolean truth(String name) {
        Object found = get(name);
        if (found instanceof Boolean truth) {
            return truth;
        }
        wrong(name, found, "true or false");
        return false;
    }

    /** Seconds since 1970 of a time on the clock of a zone. */
    long moment(String name, ZoneId zone) {
        Object found = get(name);
        if (found instanceof String text) {
            try {
                OffsetDateTime time = OffsetDateTime.parse(text);
                if (time.getYear() < FIRST_YEAR || time.getYear() > LAST_YEAR) {
                    wrong(name, found, "a time from " + FIRST_YEAR + " to " + LAST_YEAR);
                } else if (time.getNano() != 0) {
                    wrong(name, found, "a whole second");
                } else if (!zone.getRules().getOffset(time.toInstant()).equals(time.getOffset())) {
                    wrong(
                            name,
                            found,
                            "the clock of " + zone.getId() + " with "
                                    + time.toInstant().atZone(zone).toOffsetDateTime());
                }
                return time.toEpochSecond();
            } catch (DateTimeException e) {
                // Said below, as of whatever else is no time.
            }
        }
        wrong(name, found, MOMENT);
        return 0;
    }

    OptionalLong momentIfAny(String name, ZoneId zone) {
        return has(name) ? OptionalLong.of(moment(name, zone)) : OptionalLong.empty();
    }

    /** Objects of a list. */
    List<Tree> elements(String name) {
        Object found = get(name);
        if (!(found instanceof List<?> list)) {
            wrong(name, found instanceof Map ? "an object" : found, "a list");
            return List.of();
        }
        List<Tree> all = new ArrayList<>();
        for (int i = 0; i < list.size(); i++) {
            if (list.get(i) instanceof Map<?, ?> one) {
                all.add(new Tree(faults, path(name) + "[" + i + "]", one));
            } else {
                faults.add(path(name) + "[" + i + "] is no object, one with names and values would be right.");
            }
        }
        return all;
    }

    /** How many elements a list has; none where it is no list. */
    int size(String name) {
        return get(name) instanceof List<?> list ? list.size() : 0;
    }
}
