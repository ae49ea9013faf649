package org.soakwright.planner.report.paper;

import java.time.LocalDateTime;
import java.time.temporal.ChronoUnit;
import java.util.Optional;
import org.soakwright.planner.batch.Durations;
import org.soakwright.planner.report.Wording;

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
        return start.map(begin -> Wording.wall(begin, seconds)).orElse("");
    }

    /** With the year in any case. */
    String wallWithYear(double seconds) {
        return start.map(begin -> Wording.wall(begin.plusMinutes(Math.round(seconds / 60)), true))
                .orElse("");
    }

    /** {@code 13:15 (Mon 2 Mar 19:15)}. */
    String both(double seconds) {
        return running(seconds) + (hasWall() ? " (" + wall(seconds) + ")" : "");
    }
}
