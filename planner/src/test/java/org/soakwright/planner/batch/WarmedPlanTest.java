package org.soakwright.planner.batch;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;

/** What may be claimed of a plan whose pieces warm up on the way. */
class WarmedPlanTest {
    private static Plan plan(String lotTemperature, String second) {
        String water = "  - {soak: NAME, liquor: {volume: unlimited, salt: 0 g/L}, film: negligible, temperature: AT,"
                + " time: {from: 10 min, to: 20 h}}";
        return Planner.plan(
                Recipes.of(
                        Recipes.LOINS.replace("  mass:", "  temperature: " + lotTemperature + "\n  mass:") + "steps:",
                        water.replace("NAME", "one").replace("AT", "5 Cel"),
                        water.replace("NAME", "two").replace("AT", second),
                        "targets:",
                        "  - {species: salt, reading: mean, at-most: 60 g/kg}",
                        "minimise: time"),
                Progress.NONE);
    }

    /** At one temperature the mean is a sum of exponentials of the clock, and tangents bound it. */
    @Test
    void whereNothingWarmsThePlanIsGlobal() {
        assertEquals(Plan.Claim.GLOBAL, plan("5 Cel", "5 Cel").proof().claim());
    }

    /** A cold piece gives off little at first: twice the time is worth more than twice as much, and no tangent bounds that. */
    @Test
    void whereSomethingWarmsNothingIsClaimedOfAllDurations() {
        for (Plan plan : new Plan[] {plan("25 Cel", "5 Cel"), plan("5 Cel", "25 Cel")}) {
            assertTrue(plan.met());
            assertEquals(Plan.Claim.LOCAL, plan.proof().claim());
            assertTrue(plan.proof().bound().isEmpty());
        }
    }
}
