package org.soakwright.planner.report.paper;

import java.time.LocalDateTime;
import java.time.temporal.ChronoUnit;
import java.util.Locale;
import java.util.Optional;
import org.soakwright.planner.batch.Durations;

/**
 * Times as the running clock and, where the start is known, the clock on the wall show them, both to the minute. Local time without
 * any zone: every hour has 60 minutes.
 */
final class Clock {
    private final Optional<LocalDateTime> start;

    Clock(Optional<LocalDateTime> start) {
        this.start = start.map(time -> time.truncatedTo(ChronoUnit.MINUTES));
    }

    boolean hasWall() {
        return start.isPresent();
    }

    String running(double seconds) {
        return Durations.clock(seconds);
    }

    /** {@code Mon 2 Mar 06:00}, with the year where it is another than at the start; empty where the start is not known. */
    String wall(double seconds) {
        return start.map(begin -> {
                    LocalDateTime time = begin.plusMinutes(Math.round(seconds / 60));
                    return text(time, time.getYear() != begin.getYear());
                })
                .orElse("");
    }

    /** With the year in any case. */
    String wallWithYear(double seconds) {
        return start.map(begin -> text(begin.plusMinutes(Math.round(seconds / 60)), true))
                .orElse("");
    }

    /** {@code 13:15 (Mon 2 Mar 19:15)}. */
    String both(double seconds) {
        return running(seconds) + (hasWall() ? " (" + wall(seconds) + ")" : "");
    }

    private static String text(LocalDateTime time, boolean year) {
        return brief(time.getDayOfWeek().name()) + " " + time.getDayOfMonth() + " "
                + brief(time.getMonth().name()) + (year ? " " + time.getYear() : "")
                + String.format(Locale.ROOT, " %02d:%02d", time.getHour(), time.getMinute());
    }

    private static String brief(String name) {
        return name.charAt(0) + name.substring(1, 3).toLowerCase(Locale.ROOT);
    }
}
