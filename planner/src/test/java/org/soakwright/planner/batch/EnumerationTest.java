package org.soakwright.planner.batch;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Locale;
import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;
import org.soakwright.recipes.model.Recipe;
import org.soakwright.recipes.model.Time;

/** Grids beyond what is gone through whole, of many kinds, each enumerated here: the plan is never worse than the best point. */
class EnumerationTest {
    private int plans;
    private int global;

    /** Totals of the best point in the order minimised; null where no point meets the targets. */
    private static double @org.jspecify.annotations.Nullable [] enumerated(Recipe recipe) {
        Batch batch = new Batch(recipe);
        List<Time> times = recipe.steps().stream().map(step -> step.time()).toList();
        int[] choice = new int[times.size()];
        double[] best = null;
        while (true) {
            double[] seconds = new double[choice.length];
            for (int i = 0; i < choice.length; i++) {
                seconds[i] = times.get(i).seconds(choice[i]);
            }
            double[] merit = merit(batch, seconds);
            if ((best == null || java.util.Arrays.compare(merit, best) < 0)
                    && batch.follow(seconds).meetsTargets()) {
                best = merit;
            }
            int i = 0;
            while (i < choice.length && ++choice[i] == times.get(i).choices()) {
                choice[i++] = 0;
            }
            if (i == choice.length) {
                return best;
            }
        }
    }

    /** Rounded to a millionth, so that sums in another order compare as equal. */
    private static double[] merit(Batch batch, double[] seconds) {
        return batch.recipe().minimise().stream()
                .mapToDouble(goal -> Math.rint(batch.cost().of(goal, seconds) * 1e6) / 1e6)
                .toArray();
    }

    private void neverWorse(Recipe recipe) {
        assertTrue(new Grid(recipe).points() > WholeGrid.MOST_POINTS);
        double[] best = enumerated(recipe);
        Plan plan = Planner.plan(recipe, Progress.NONE);
        plans++;
        global += plan.proof().claim() == Plan.Claim.GLOBAL ? 1 : 0;
        assertEquals(best != null, plan.met(), () -> "met, case " + plans);
        if (best != null) {
            double[] chosen = merit(plan.run().batch(), plan.run().seconds());
            for (int g = 0; g < best.length; g++) {
                assertEquals(best[g], chosen[g], 1e-5, "goal " + g + ", case " + plans);
            }
            plan.proof()
                    .bound()
                    .ifPresent(bound -> assertTrue(bound <= plan.run().totals().seconds() + 1e-6));
        }
    }

    private void report(String kind) {
        System.out.println(
                "enumerated, " + kind + ": " + plans + " recipes, none better than planned; claimed global " + global);
    }

    private static String number(double value) {
        return String.format(Locale.ROOT, "%.3f", value);
    }

    private static String unlimited(String name, int celsius, String time) {
        return Recipes.water(name, "volume: unlimited", time)
                .replace("4 Cel", celsius + " Cel")
                .replace("film: {coefficient: 2e-6 m/s}", "film: negligible");
    }

    @Test
    void threeSoaksWithUnequalGrains() {
        SplittableRandom random = new SplittableRandom(31);
        for (int i = 0; i < 12; i++) {
            neverWorse(Recipes.of(
                    Recipes.LOINS + "steps:",
                    unlimited(
                            "a",
                            1 + random.nextInt(5),
                            "{from: 1 h, to: 29 h, grain: " + (60 + random.nextInt(40)) + " min}"),
                    unlimited(
                            "b",
                            1 + random.nextInt(5),
                            "{from: 1 h, to: 29 h, grain: " + (60 + random.nextInt(40)) + " min}"),
                    unlimited(
                            "c",
                            1 + random.nextInt(5),
                            "{from: 1 h, to: 29 h, grain: " + (60 + random.nextInt(40)) + " min}"),
                    "targets:",
                    "  - {species: salt, reading: mean, at-most: " + number(14 + 20 * random.nextDouble()) + " g/kg}",
                    "minimise: time"));
        }
        report("three soaks of unequal grains");
        assertTrue(global > 0);
    }

    @Test
    void aTotalExactlyAsLongAsTheBestPlanStillLeavesIt() {
        SplittableRandom random = new SplittableRandom(32);
        for (int i = 0; i < 12; i++) {
            String[] lines = {
                Recipes.LOINS + "steps:",
                unlimited("a", 4, "{from: 1 h, to: 30 h, grain: " + (10 + random.nextInt(12)) + " min}"),
                unlimited("b", 2, "{from: 1 h, to: 30 h, grain: " + (10 + random.nextInt(12)) + " min}"),
                "targets:",
                "  - {species: salt, reading: mean, at-most: " + number(14 + 20 * random.nextDouble()) + " g/kg}",
                "minimise: time"
            };
            double[] best = enumerated(Recipes.of(lines));
            lines[4] += "\n  - {total: time, at-most: " + (best == null ? 36000 : Math.round(best[0])) + " s}";
            neverWorse(Recipes.of(lines));
        }
        report("a total as long as the best");
    }

    @Test
    void narrowBandsOfClosedSoaks() {
        SplittableRandom random = new SplittableRandom(33);
        for (int i = 0; i < 15; i++) {
            double low = 20 + 20 * random.nextDouble();
            neverWorse(Recipes.of(
                    Recipes.LOINS + "steps:",
                    Recipes.water(
                            "a", "ratio: 4 L/kg", "{from: 2 h, to: 34 h, grain: " + (5 + random.nextInt(15)) + " min}"),
                    Recipes.water(
                            "b", "ratio: 4 L/kg", "{from: 3 h, to: 36 h, grain: " + (5 + random.nextInt(15)) + " min}"),
                    "targets:",
                    "  - {species: salt, reading: mean, grade: thick, at-least: " + number(low) + " g/kg, at-most: "
                            + number(low * (1.0005 + 0.002 * random.nextDouble())) + " g/kg}",
                    "minimise: time"));
        }
        report("narrow bands");
    }

    @Test
    void listsOfTimesBesideRanges() {
        SplittableRandom random = new SplittableRandom(34);
        for (int i = 0; i < 12; i++) {
            neverWorse(Recipes.of(
                    Recipes.LOINS + "steps:",
                    unlimited("a", 4, "{any-of: [2 h, 4 h, 6 h, 6.2 h, 9 h, 9.05 h, 13 h]}"),
                    unlimited("b", 2, "{from: 1 h, to: 40 h, grain: " + (3 + random.nextInt(3)) + " min}"),
                    unlimited("c", 3, "{any-of: [1 h, 90 min, 4 h]}"),
                    "targets:",
                    "  - {species: salt, reading: mean, at-most: " + number(14 + 20 * random.nextDouble()) + " g/kg}",
                    "minimise: time"));
        }
        report("lists beside ranges");
    }

    @Test
    void liquorFirstThenTime() {
        SplittableRandom random = new SplittableRandom(35);
        for (int i = 0; i < 12; i++) {
            neverWorse(Recipes.of(
                    Recipes.LOINS + "steps:",
                    Recipes.water(
                            "a",
                            "ratio: 5 L/kg",
                            "{from: 2 h, to: 40 h, grain: " + (12 + random.nextInt(18)) + " min}"),
                    "  - {rinse: b, liquor: {volume: 1200 L, flow: 40 L/min, salt: 0 g/L}, temperature: 4 Cel,"
                            + " film: {coefficient: 4e-6 m/s}, time: {from: 30 min, to: 40 h, grain: "
                            + (12 + random.nextInt(18)) + " min}}",
                    "targets:",
                    "  - {species: salt, reading: mean, at-most: " + number(24 + 16 * random.nextDouble()) + " g/kg}",
                    "minimise: [liquor, time]"));
        }
        report("liquor first, then time");
    }

    @Test
    void threeClosedSoaksWithHighestLimited() {
        SplittableRandom random = new SplittableRandom(36);
        for (int i = 0; i < 6; i++) {
            neverWorse(Recipes.of(
                    Recipes.LOINS + "between: 20 min\nsteps:",
                    Recipes.water(
                            "a",
                            "ratio: 3 L/kg",
                            "{from: 2 h, to: 26 h, grain: " + (60 + random.nextInt(24)) + " min}"),
                    Recipes.water(
                            "b",
                            "ratio: 3 L/kg",
                            "{from: 2 h, to: 26 h, grain: " + (60 + random.nextInt(24)) + " min}"),
                    Recipes.water(
                            "c",
                            "ratio: 3 L/kg",
                            "{from: 2 h, to: 26 h, grain: " + (60 + random.nextInt(24)) + " min}"),
                    "targets:",
                    "  - {species: salt, reading: mean, at-most: " + number(22 + 16 * random.nextDouble()) + " g/kg}",
                    "  - {species: salt, reading: highest, at-most: " + number(40 + 30 * random.nextDouble())
                            + " g/kg}",
                    "minimise: time"));
        }
        report("three closed soaks");
    }
}
