package org.soakwright.planner.report.paper;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.time.LocalDateTime;
import java.util.Optional;
import org.junit.jupiter.api.Test;

/** Days of the week as any printed calendar of these years shows them. */
class ClockTest {
    private static final double HOUR = 3600;

    private static Clock from(String start) {
        return new Clock(Optional.of(LocalDateTime.parse(start)));
    }

    @Test
    void midnightTurnsTheDay() {
        Clock clock = from("2026-03-02T06:00");
        assertEquals("Mon 2 Mar 06:00", clock.wall(0));
        assertEquals("Mon 2 Mar 23:59", clock.wall(18 * HOUR - 60));
        assertEquals("Tue 3 Mar 00:00", clock.wall(18 * HOUR));
    }

    @Test
    void februaryHas28DaysAnd29InALeapYear() {
        assertEquals("Sun 1 Mar 01:00", from("2026-02-28T22:00").wall(3 * HOUR));
        assertEquals("Tue 29 Feb 01:00", from("2028-02-28T22:00").wall(3 * HOUR));
        assertEquals("Wed 1 Mar 01:00", from("2028-02-28T22:00").wall(27 * HOUR));
    }

    @Test
    void theYearIsNamedWhereItIsAnother() {
        Clock clock = from("2026-12-31T22:00");
        assertEquals("Thu 31 Dec 23:00", clock.wall(HOUR));
        assertEquals("Fri 1 Jan 2027 01:00", clock.wall(3 * HOUR));
        assertEquals("Thu 31 Dec 2026 22:00", clock.wallWithYear(0));
    }

    @Test
    void everyHourHas60MinutesWhereSummerTimeBegins() {
        // Clocks in most of Europe went from 2:00 to 3:00 on 30 March 2025; the sheet does not.
        assertEquals("Sun 30 Mar 04:00", from("2025-03-29T22:00").wall(6 * HOUR));
    }

    @Test
    void bothClocksShowTheSameMinute() {
        Clock clock = from("2026-03-02T06:00:59");
        assertEquals("0:02 (Mon 2 Mar 06:02)", clock.both(90));
        assertEquals("0:01 (Mon 2 Mar 06:01)", clock.both(89));
    }

    @Test
    void withoutAStartOnlyTheRunningClockIsKnown() {
        Clock clock = new Clock(Optional.empty());
        assertEquals("100:30", clock.both(100.5 * HOUR));
        assertEquals("", clock.wall(0));
    }
}
