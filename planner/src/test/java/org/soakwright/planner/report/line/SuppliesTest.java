package org.soakwright.planner.report.line;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.time.LocalDate;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.soakwright.planner.line.HandmadePlan;

class SuppliesTest {
    private static final LocalDate FRIDAY = LocalDate.of(2026, 10, 23);
    private static final LocalDate SATURDAY = FRIDAY.plusDays(1);
    private static final LocalDate SUNDAY = FRIDAY.plusDays(2);

    private final List<Supply> supplies = Supplies.of(HandmadePlan.of());

    private List<Supply> of(String load, String step, boolean running) {
        return supplies.stream()
                .filter(supply -> supply.load().load().name().equals(load)
                        && supply.leg().name().equals(step)
                        && supply.running() == running)
                .toList();
    }

    @Test
    void aFillIsNeededWhenItsLegBegins() {
        List<Supply> washing = of("L1 (1 of 2)", "washing", false);
        assertEquals(List.of(FRIDAY, FRIDAY), washing.stream().map(Supply::day).toList());
        assertEquals(900, washing.get(0).litres().orElseThrow(), 1e-9);
        assertEquals(1.8, washing.get(0).kg("salt"), 1e-9, "2 g/L");
        assertEquals(
                List.of(FRIDAY),
                of("C1 + C2", "brine", false).stream().map(Supply::day).toList());
        assertEquals(144, of("C1 + C2", "brine", false).get(0).kg("salt"), 1e-9, "800 L of 180 g/L");
    }

    @Test
    void runningWaterIsCutAtLocalMidnight() {
        List<Supply> running = of("L1 (1 of 2)", "running water", true);
        assertEquals(
                List.of(FRIDAY, SATURDAY), running.stream().map(Supply::day).toList());
        // From 21:15 until 08:00 at 5 L/min.
        assertEquals(5 * 165, running.get(0).litres().orElseThrow(), 1e-9);
        assertEquals(5 * 480, running.get(1).litres().orElseThrow(), 1e-9);
    }

    @Test
    void theNightWithAnHourMoreNeedsAnHourMore() {
        List<Supply> running = of("L2", "running water", true);
        assertEquals(
                List.of(SATURDAY, SUNDAY), running.stream().map(Supply::day).toList());
        // Until 07:00 by the clock on the wall, eight hours after midnight.
        assertEquals(5 * 480, running.get(1).litres().orElseThrow(), 1e-9);
    }

    @Test
    void unlimitedLiquorIsSaidAndNotCounted() {
        assertTrue(of("C1 + C2", "dip", false).get(0).litres().isEmpty());
        List<Supplies.Day> days = Supplies.byDay(supplies);
        assertFalse(days.get(0).complete());
        assertTrue(days.get(1).complete());
        assertEquals(
                "Not counted, since it is unlimited: the liquor of dip.",
                new LineTables(new Account(HandmadePlan.of())).uncounted().get(1));
    }

    @Test
    void daysAddUpToWhatLoadsNeed() {
        double litres = Supplies.byDay(supplies).stream()
                .mapToDouble(Supplies.Day::litres)
                .sum();
        double loins = 3 * 2 * (450 + 450 + 400) + 3 * 800 + 5 * 60 * (10.75 + 10.5 + 10.25);
        assertEquals(loins + 2 * 800, litres, 1e-6);
    }
}
