package org.soakwright.planner.report.line;

import java.time.LocalDate;
import java.time.LocalDateTime;
import java.time.ZonedDateTime;
import org.soakwright.planner.batch.Durations;
import org.soakwright.planner.line.Clock;
import org.soakwright.planner.report.Wording;

/** Moments of a line by the clock on its wall. */
final class Times {
    private final Clock clock;
    private final int year;

    Times(Clock clock) {
        this.clock = clock;
        year = clock.at(0).getYear();
    }

    /** {@code 2026-03-02T06:15+01:00}. */
    String iso(long seconds) {
        return iso(clock.at(seconds));
    }

    static String iso(ZonedDateTime time) {
        return time.toOffsetDateTime().toString();
    }

    /** {@code Mon 2 Mar 06:15}, with the year where it is another than at the start. */
    String wall(long seconds) {
        LocalDateTime local = clock.at(seconds).toLocalDateTime();
        return Wording.wall(local, local.getYear() != year);
    }

    String wallWithYear(long seconds) {
        return Wording.wall(clock.at(seconds).toLocalDateTime(), true);
    }

    /** {@code 06:15}. */
    String hour(long seconds) {
        LocalDateTime local = clock.at(seconds).toLocalDateTime();
        return two(local.getHour()) + ":" + two(local.getMinute());
    }

    private static String two(int number) {
        return (number < 10 ? "0" : "") + number;
    }

    /** {@code Mon 2 Mar}, with the year where it is another than at the start. */
    String day(LocalDate day) {
        String wall = Wording.wall(day.atStartOfDay(), day.getYear() != year);
        return wall.substring(0, wall.length() - " 00:00".length());
    }

    /** {@code 3 h 20 min}. */
    static String lasting(long seconds) {
        return Durations.practical((double) seconds);
    }
}
