package org.soakwright.planner.report.line;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static org.soakwright.planner.report.Json.at;
import static org.soakwright.planner.report.Json.number;

import java.io.IOException;
import java.time.Duration;
import java.time.OffsetDateTime;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.OptionalDouble;
import java.util.OptionalLong;
import org.jspecify.annotations.Nullable;
import org.junit.jupiter.api.Test;
import org.soakwright.planner.line.HandmadePlan;
import org.soakwright.planner.line.LinePlan;
import org.soakwright.planner.report.Json;
import org.soakwright.planner.report.ResultJson;
import org.soakwright.planner.report.Stamp;

class LineJsonTest {
    private static final Stamp STAMP = new Stamp("0.1.0", "00ff".repeat(16));

    private final LinePlan plan = HandmadePlan.of();
    private final Map<String, @Nullable Object> json = read(plan);

    private static Map<String, @Nullable Object> read(LinePlan plan) {
        try {
            return Json.object(LineJson.of(STAMP, plan));
        } catch (IOException e) {
            throw new AssertionError(e);
        }
    }

    @SuppressWarnings("unchecked")
    private static List<Object> list(@Nullable Object from, Object... path) {
        return (List<Object>) Objects.requireNonNull(at(from, path));
    }

    private static OffsetDateTime time(@Nullable Object from, Object... path) {
        return OffsetDateTime.parse((String) Objects.requireNonNull(at(from, path)));
    }

    @Test
    void everyShareOfEveryLoadHasAnEntry() {
        List<String> lots = list(json, "lots").stream()
                .map(lot -> at(lot, "lot") + "|" + at(lot, "part") + "|" + at(lot, "load"))
                .toList();
        assertEquals(
                List.of(
                        "L1|1.0|L1 (1 of 2)",
                        "L1|2.0|L1 (2 of 2)",
                        "C1|null|C1 + C2",
                        "C2|null|C1 + C2",
                        "C3, ж; urgent|null|C3, ж; urgent",
                        "L2|null|L2"),
                lots);
        assertEquals(450, number(json, "lots", 0, "mass-kg"));
        assertEquals(150, number(json, "lots", 2, "mass-kg"));
        assertNull(at(json, "lots", 3, "due"));
    }

    @Test
    void stepsFollowEachOtherAndLastAsLongAsTheySay() {
        for (Object lot : list(json, "lots")) {
            OffsetDateTime before = time(lot, "loaded");
            assertFalse(before.isBefore(time(lot, "ready")));
            for (Object step : list(lot, "steps")) {
                assertFalse(time(step, "start").isBefore(before));
                before = time(step, "end");
                assertEquals(number(step, "seconds"), (double)
                        Duration.between(time(step, "start"), before).toSeconds());
                assertEquals(number(step, "slack-seconds"), (double)
                        Duration.between(before, time(step, "latest-pull")).toSeconds());
            }
            assertTrue(time(lot, "done").isAfter(before));
        }
    }

    @Test
    void fillsAreNumberedWhereThereAreSeveral() {
        List<Object> fills = list(json, "lots", 0, "steps").stream()
                .map(step -> at(step, "fill"))
                .toList();
        assertEquals("[null, 1.0, 2.0, null]", fills.toString());
    }

    /** In Oslo clocks are turned back on 25 October 2026 at 03:00. */
    @Test
    void momentsCarryTheOffsetOfTheirDay() {
        assertEquals("2026-10-23T06:15+02:00", at(json, "lots", 0, "steps", 0, "start"));
        assertEquals("2026-10-25T07:00+01:00", at(json, "lots", 5, "steps", 3, "end"));
    }

    @Test
    void aLateLotSaysWhyAndTheOthersNothing() {
        assertEquals(4500, number(json, "lots", 4, "late-seconds"));
        assertEquals(
                List.of("it waited for the tub", "where C1 + C2 were until 16:30"), list(json, "lots", 4, "why-late"));
        assertEquals(0, number(json, "lots", 0, "late-seconds"));
        assertEquals(List.of(), list(json, "lots", 0, "why-late"));
        assertEquals(2 * 4500, number(json, "lateness-seconds"), "its priority is 2");
        assertEquals(false, at(json, "met"));
    }

    @Test
    void targetsStandAsInTheResultOfARecipe() throws IOException {
        var recipe = Json.object(ResultJson.of(STAMP, plan.loads().get(0).run()));
        assertEquals(list(recipe, "targets"), list(json, "lots", 0, "targets"));
        assertEquals(1, list(json, "lots", 0, "targets").size());
    }

    @Test
    void aLoadThatMissesIsNotMet() {
        Map<String, @Nullable Object> missing = read(HandmadePlan.missing());
        assertEquals(false, at(missing, "lots", 0, "met"));
        assertEquals(true, at(missing, "lots", 1, "met"));
        assertEquals(false, at(missing, "lots", 0, "targets", 0, "met"));
    }

    @Test
    void movesComeInOrderWithTheirVessels() {
        List<Object> moves = list(json, "moves");
        OffsetDateTime before = OffsetDateTime.MIN;
        for (Object move : moves) {
            assertFalse(time(move, "start").isBefore(before));
            before = time(move, "start");
            boolean loads = "load".equals(at(move, "kind"));
            boolean unloads = "unload".equals(at(move, "kind"));
            assertEquals(loads, at(move, "from") == null);
            assertEquals(unloads, at(move, "to") == null);
            assertEquals(!"changeover".equals(at(move, "kind")), at(move, "hoist"));
        }
        // Loins: load, two changeovers, a transfer, unload; cords: load, two transfers, unload.
        assertEquals(3 * 5 + 2 * 4, moves.size());
        Object change = moves.stream()
                .filter(move -> "changeover".equals(at(move, "kind")))
                .findFirst()
                .orElseThrow();
        assertEquals("tank 1", at(change, "from"));
        assertEquals("tank 1", at(change, "to"));
    }

    @Test
    void boundsThatNobodyKnowsAreNull() {
        assertEquals(48 * 3600, number(json, "bound-seconds"));
        assertEquals(1800, number(json, "bound-lateness-seconds"));
        LinePlan unproven = new LinePlan(
                plan.line(),
                plan.clock(),
                plan.schedule(),
                plan.loads(),
                new LinePlan.Proof(OptionalDouble.empty(), OptionalLong.empty()),
                List.of());
        Map<String, @Nullable Object> other = read(unproven);
        assertTrue(other.containsKey("bound-seconds"));
        assertNull(at(other, "bound-seconds"));
        assertNull(at(other, "bound-lateness-seconds"));
    }

    @Test
    void whatItCostsIsInTheMoneyOfTheRecipes() {
        assertEquals("EUR", at(json, "currency"));
        // Three loads of loins at 40 EUR/h of the time from the first landing to the last pull, and 3 EUR/m3.
        double hours = 25.75 + 25.75 + 25.75;
        double litres = 3 * 2 * (450 + 450 + 400) + 3 * 800 + 5 * 60 * (10.75 + 10.5 + 10.25);
        assertEquals(40 * hours + 3 * litres / 1000, number(json, "cost"), 0.02);
    }
}
