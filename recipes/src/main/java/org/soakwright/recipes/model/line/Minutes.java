package org.soakwright.recipes.model.line;

import java.time.LocalTime;
import java.time.ZonedDateTime;
import java.util.List;
import org.jspecify.annotations.Nullable;
import org.soakwright.recipes.model.Quantity;
import org.soakwright.recipes.text.Place;
import org.soakwright.recipes.text.Problem;
import org.soakwright.recipes.text.Unsound;

/** The rule that a line counts in whole minutes. */
final class Minutes {
    /** More is a stoppage, not a turnaround or a move. */
    private static final double MOST_SECONDS = 366 * 86_400.0;

    private Minutes() {}

    /** A time of zero or more whole minutes. */
    static List<Problem> ifNone(String what, @Nullable Quantity time, String example) {
        if (time == null) {
            return List.of();
        }
        String remedy = ": found \"" + time + "\"; write such as " + example;
        if (!(time.si() >= 0 && time.si() <= MOST_SECONDS)) {
            return List.of(new Problem(time.place(), what + " lies from 0 min to 366 d" + remedy));
        }
        return Math.rint(time.si() / 60) * 60 == time.si()
                ? List.of()
                : List.of(new Problem(time.place(), what + " is whole minutes" + remedy));
    }

    static void require(String what, @Nullable ZonedDateTime time, Place place) {
        if (time != null) {
            require(what, time.toLocalTime(), place);
        }
    }

    static void require(String what, LocalTime time, Place place) {
        if (time.getSecond() != 0 || time.getNano() != 0) {
            throw new Unsound(
                    place, what + " is a whole minute: found \"" + time + "\"; leave the seconds out, such as 06:00");
        }
    }

    /** From one time of day on to the next time that it is the other, 1 to 1440. */
    static int between(LocalTime from, LocalTime to) {
        return after(from, to) == 0 ? 1440 : after(from, to);
    }

    /** How long after a time of day it is the other, 0 to 1439. */
    static int after(LocalTime from, LocalTime time) {
        return Math.floorMod(ofDay(time) - ofDay(from), 1440);
    }

    private static int ofDay(LocalTime time) {
        return time.getHour() * 60 + time.getMinute();
    }
}
