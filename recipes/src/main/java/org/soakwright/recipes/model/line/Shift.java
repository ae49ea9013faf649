package org.soakwright.recipes.model.line;

import java.time.LocalDate;
import java.time.LocalDateTime;
import java.time.LocalTime;
import java.time.temporal.ChronoUnit;
import java.util.ArrayList;
import java.util.List;
import org.soakwright.recipes.text.Place;
import org.soakwright.recipes.text.Problem;
import org.soakwright.recipes.text.Unsound;

/**
 * People who work from one time of day to another. It is the clock on the wall that counts: where it is turned back within a
 * shift, the repeated hour belongs to it as well.
 *
 * @param to at or before {@code from} it is that time of the next day, so that midnight ends a day and equal times span one
 * @param heads how many, 1 to 999
 * @param breaks within the shift
 */
public record Shift(Place place, LocalTime from, LocalTime to, int heads, List<Break> breaks) {
    /** More than any hall has. */
    public static final int MOST_HEADS = 999;

    public Shift {
        breaks = List.copyOf(breaks);
        Minutes.require("the begin of a shift", from, place);
        Minutes.require("the end of a shift", to, place);
        List<Problem> problems = new ArrayList<>();
        if (heads < 1 || heads > MOST_HEADS) {
            problems.add(new Problem(
                    place,
                    "a shift has 1 to " + MOST_HEADS + " heads: found " + heads
                            + "; write such as heads: 2, or leave the shift out"));
        }
        int length = Minutes.between(from, to);
        for (Break pause : breaks) {
            if (Minutes.after(from, pause.from()) + Minutes.between(pause.from(), pause.to()) > length) {
                problems.add(new Problem(
                        pause.place(),
                        "a break lies within its shift: found " + pause.from() + " to " + pause.to() + " in " + from
                                + " to " + to + "; correct one of them"));
            }
        }
        if (!problems.isEmpty()) {
            throw new Unsound(problems);
        }
    }

    /** How long it is on the wall, 1 to 1440 minutes. */
    public int minutes() {
        return Minutes.between(from, to);
    }

    /** Whether it is on at a time, of the shift that began on a day. */
    boolean isOn(LocalDate begun, LocalDateTime time) {
        return lies(time, begun.atTime(from), minutes());
    }

    /** Whether it is on and no break is. */
    boolean works(LocalDate begun, LocalDateTime time) {
        return isOn(begun, time) && breaks.stream().noneMatch(one -> lies(time, start(begun, one), length(one)));
    }

    /** Every time at which something begins or ends, of the shift that begins on a day. */
    List<LocalDateTime> edges(LocalDate begun) {
        List<LocalDateTime> edges = new ArrayList<>();
        edges.add(begun.atTime(from));
        edges.add(begun.atTime(from).plusMinutes(minutes()));
        for (Break one : breaks) {
            edges.add(start(begun, one));
            edges.add(start(begun, one).plusMinutes(length(one)));
        }
        return edges;
    }

    private LocalDateTime start(LocalDate begun, Break one) {
        return begun.atTime(from).plusMinutes(Minutes.after(from, one.from()));
    }

    private static int length(Break one) {
        return Minutes.between(one.from(), one.to());
    }

    private static boolean lies(LocalDateTime time, LocalDateTime start, int minutes) {
        return !time.isBefore(start) && ChronoUnit.MINUTES.between(start, time) < minutes;
    }
}
