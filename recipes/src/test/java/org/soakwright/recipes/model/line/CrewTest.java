package org.soakwright.recipes.model.line;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.time.DayOfWeek;
import java.time.Duration;
import java.time.Instant;
import java.time.LocalDate;
import java.time.LocalDateTime;
import java.time.LocalTime;
import java.time.ZoneId;
import java.time.ZoneOffset;
import java.util.EnumSet;
import java.util.List;
import java.util.Set;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.soakwright.recipes.text.Place;
import org.soakwright.recipes.text.Unsound;

/** Who is there when: by the clock on the wall, across midnight, breaks and changes of the clock. */
class CrewTest {
    private static final Place HERE = new Place("f", 1, 1);
    private static final ZoneId OSLO = ZoneId.of("Europe/Oslo");
    private static final Set<DayOfWeek> WEEKDAYS = EnumSet.range(DayOfWeek.MONDAY, DayOfWeek.FRIDAY);
    private static final Set<DayOfWeek> EVERY_DAY = EnumSet.allOf(DayOfWeek.class);

    private static LocalTime at(String time) {
        return LocalTime.parse(time);
    }

    private static Break pause(String from, String to) {
        return new Break(HERE, at(from), at(to));
    }

    private static Hours hours(Set<DayOfWeek> days, String from, String to, int heads, Break... breaks) {
        return new Hours(HERE, days, at(from), at(to), heads, List.of(breaks));
    }

    private static Crew crew(List<Hours> hours, ExceptionalDay... except) {
        return new Crew(HERE, OSLO, hours, List.of(except), Night.usual(HERE));
    }

    private static ExceptionalDay closed(String from, String through) {
        return new ExceptionalDay(HERE, LocalDate.parse(from), LocalDate.parse(through), null);
    }

    private static Instant oslo(String local) {
        return LocalDateTime.parse(local).atZone(OSLO).toInstant();
    }

    private static Instant utc(String local) {
        return LocalDateTime.parse(local).toInstant(ZoneOffset.UTC);
    }

    /** Early and late shifts, one across midnight with a break across it, one of a whole day, one that ends within the hour that is turned. */
    private static final Crew BUSY = crew(
            List.of(
                    hours(WEEKDAYS, "06:00", "14:00", 2, pause("10:00", "10:30")),
                    hours(WEEKDAYS, "14:00", "22:00", 2, pause("18:00", "18:30"), pause("20:00", "20:15")),
                    hours(EVERY_DAY, "22:00", "06:00", 1, pause("23:45", "00:15"), pause("02:15", "02:45")),
                    hours(EnumSet.of(DayOfWeek.SATURDAY), "18:00", "02:30", 4),
                    hours(EnumSet.of(DayOfWeek.SUNDAY), "00:00", "00:00", 1)),
            closed("2026-03-30", "2026-03-30"),
            new ExceptionalDay(
                    HERE,
                    LocalDate.parse("2026-10-26"),
                    LocalDate.parse("2026-10-27"),
                    new Shift(HERE, at("08:00"), at("12:00"), 7, List.of())));

    @ParameterizedTest
    @ValueSource(strings = {"2026-03-27T17:13", "2026-10-23T17:13"})
    void spansAgreeWithTheClockMinuteByMinuteAcrossTheChangesOfTheClock(String start) {
        Instant from = oslo(start);
        Instant to = from.plus(Duration.ofDays(6));
        List<Span> spans = BUSY.spans(from, to);
        List<Span> shifts = BUSY.shifts(from, to);
        for (Instant minute = from; minute.isBefore(to); minute = minute.plusSeconds(60)) {
            Instant now = minute;
            assertEquals(BUSY.heads(now), in(spans, now).heads(), now::toString);
            assertEquals(BUSY.onShift(now), in(shifts, now).heads() > 0, now::toString);
        }
        assertEquals(from, spans.get(0).from());
        assertEquals(to, spans.get(spans.size() - 1).to());
        for (int i = 1; i < spans.size(); i++) {
            assertEquals(spans.get(i - 1).to(), spans.get(i).from());
            assertTrue(spans.get(i - 1).heads() != spans.get(i).heads(), "each is as long as it can be");
        }
    }

    private static Span in(List<Span> spans, Instant time) {
        List<Span> holding = spans.stream()
                .filter(span -> !time.isBefore(span.from()) && time.isBefore(span.to()))
                .toList();
        assertEquals(1, holding.size(), time::toString);
        return holding.get(0);
    }

    @Test
    void aShiftHoldsFromItsBeginUntilJustBeforeItsEnd() {
        Crew crew = crew(List.of(hours(WEEKDAYS, "06:00", "14:00", 2)));
        assertEquals(0, crew.heads(oslo("2026-03-02T05:59:59")));
        assertEquals(2, crew.heads(oslo("2026-03-02T06:00")));
        assertEquals(2, crew.heads(oslo("2026-03-02T13:59:59")));
        assertEquals(0, crew.heads(oslo("2026-03-02T14:00")));
        assertEquals(0, crew.heads(oslo("2026-03-01T08:00")), "a Sunday");
    }

    @Test
    void overlappingShiftsAddUp() {
        Crew crew = crew(List.of(hours(WEEKDAYS, "06:00", "14:00", 2), hours(WEEKDAYS, "12:00", "16:00", 3)));
        assertEquals(5, crew.heads(oslo("2026-03-02T13:00")));
    }

    @Test
    void nobodyMovesLotsInABreakButTheyAreOnShift() {
        Crew crew = crew(List.of(hours(WEEKDAYS, "06:00", "14:00", 2, pause("10:00", "10:30"))));
        assertEquals(0, crew.heads(oslo("2026-03-02T10:00")));
        assertTrue(crew.onShift(oslo("2026-03-02T10:00")));
        assertEquals(2, crew.heads(oslo("2026-03-02T10:30")));
        assertFalse(crew.onShift(oslo("2026-03-02T14:00")));
    }

    @Test
    void aShiftPastMidnightBelongsToTheDayItBegins() {
        Crew crew = crew(List.of(hours(WEEKDAYS, "22:00", "06:00", 1)));
        assertEquals(1, crew.heads(oslo("2026-03-07T05:00")), "Saturday morning belongs to Friday");
        assertEquals(0, crew.heads(oslo("2026-03-07T22:00")));
        assertEquals(0, crew.heads(oslo("2026-03-09T05:00")), "Monday morning belongs to Sunday");
    }

    @Test
    void aClosedDayLetsTheShiftOfTheDayBeforeRunOn() {
        Crew crew = crew(List.of(hours(EVERY_DAY, "22:00", "06:00", 1)), closed("2026-05-01", "2026-05-02"));
        assertEquals(1, crew.heads(oslo("2026-05-01T05:59")));
        assertEquals(0, crew.heads(oslo("2026-05-01T22:00")));
        assertEquals(0, crew.heads(oslo("2026-05-03T05:59")));
        assertEquals(1, crew.heads(oslo("2026-05-03T22:00")));
    }

    /** 8 h on the wall are 7 h in the spring night and 9 h in the autumn one. Changes of 2026: 29 March and 25 October, 01:00 UTC. */
    @ParameterizedTest
    @ValueSource(strings = {"2026-03-28 7", "2026-10-24 9", "2026-06-06 8"})
    void aNightIsAsLongAsTheClocksMakeIt(String night) {
        LocalDate day = LocalDate.parse(night.substring(0, 10));
        Crew crew = crew(List.of(hours(EVERY_DAY, "22:00", "06:00", 1)));
        Instant noon = day.atTime(12, 0).atZone(OSLO).toInstant();
        List<Span> there = crew.spans(noon, noon.plus(Duration.ofHours(23))).stream()
                .filter(span -> span.heads() > 0)
                .toList();
        assertEquals(1, there.size());
        assertEquals(
                Duration.ofHours(Long.parseLong(night.substring(11))),
                Duration.between(there.get(0).from(), there.get(0).to()));
    }

    @Test
    void whatEndsWithinTheTurnedHourComesBackWithIt() {
        Crew crew = crew(List.of(hours(EVERY_DAY, "18:00", "02:30", 1)));
        assertEquals(1, crew.heads(utc("2026-10-25T00:29")), "02:29 in summer time");
        assertEquals(0, crew.heads(utc("2026-10-25T00:30")));
        assertEquals(1, crew.heads(utc("2026-10-25T01:00")), "02:00 again");
        assertEquals(0, crew.heads(utc("2026-10-25T01:30")));
    }

    @Test
    void theNightRunsAcrossMidnight() {
        Crew crew = crew(List.of(hours(WEEKDAYS, "06:00", "14:00", 2)));
        assertTrue(crew.isNight(oslo("2026-03-02T22:00")));
        assertTrue(crew.isNight(oslo("2026-03-02T05:59")));
        assertFalse(crew.isNight(oslo("2026-03-02T06:00")));
        assertFalse(crew.isNight(oslo("2026-03-02T21:59")));
    }

    @Test
    void aBreakMayFillAShiftButNotLeaveIt() {
        assertEquals(
                1,
                hours(WEEKDAYS, "22:00", "06:00", 1, pause("22:00", "06:00"))
                        .breaks()
                        .size());
        Unsound unsound =
                assertThrows(Unsound.class, () -> hours(WEEKDAYS, "22:00", "06:00", 1, pause("05:45", "06:15")));
        assertEquals(
                "a break lies within its shift: found 05:45 to 06:15 in 22:00 to 06:00; correct one of them",
                unsound.problems().get(0).what());
    }

    @Test
    void noSpansWhereThereIsNoTime() {
        Instant noon = oslo("2026-03-02T12:00");
        assertEquals(List.of(), BUSY.spans(noon, noon));
    }
}
