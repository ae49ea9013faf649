package org.soakwright.planner.batch;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Optional;
import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.soakwright.recipes.model.Recipe;
import org.soakwright.recipes.model.Target;
import org.soakwright.recipes.model.Time;

/** The planner's choice is the best point of the grid: small cases are enumerated here, independently of its searches. */
class PlannerTest {
    private static Recipe twoWaters(String first, String second, String... targets) {
        return Recipes.of(
                Recipes.LOINS + "steps:",
                Recipes.water("first", "ratio: 4 L/kg", first),
                Recipes.water("second", "ratio: 4 L/kg", second),
                "targets:",
                String.join("\n", targets),
                "minimise: time");
    }

    /** Every point of the grid followed, the least seconds among those that meet the targets. */
    private static Optional<double[]> enumerated(Recipe recipe) {
        Batch batch = new Batch(recipe);
        List<Time> times = recipe.steps().stream().map(step -> step.time()).toList();
        int[] choice = new int[times.size()];
        double[] best = null;
        double least = Double.POSITIVE_INFINITY;
        while (true) {
            double[] seconds = new double[choice.length];
            double total = 0;
            for (int i = 0; i < choice.length; i++) {
                seconds[i] = times.get(i).seconds(choice[i]);
                total += seconds[i];
            }
            if (total < least && batch.follow(seconds).meetsTargets()) {
                least = total;
                best = seconds;
            }
            int i = 0;
            while (i < choice.length && ++choice[i] == times.get(i).choices()) {
                choice[i++] = 0;
            }
            if (i == choice.length) {
                return Optional.ofNullable(best);
            }
        }
    }

    private static double sum(double[] values) {
        double sum = 0;
        for (double value : values) {
            sum += value;
        }
        return sum;
    }

    private static void agrees(Recipe recipe, Plan.Claim claim) {
        Optional<double[]> best = enumerated(recipe);
        Plan plan = Planner.plan(recipe, Progress.NONE);
        assertEquals(best.isPresent(), plan.met());
        assertEquals(claim, plan.proof().claim());
        if (best.isPresent()) {
            assertTrue(plan.run().meetsTargets());
            assertEquals(sum(best.get()), plan.run().totals().seconds(), 1e-6);
        }
    }

    @Test
    void aSmallGridIsGoneThroughWhole() {
        agrees(
                twoWaters(
                        "{from: 10 h, to: 40 h, grain: 30 min}",
                        "{from: 10 h, to: 40 h, grain: 30 min}",
                        "  - {species: salt, reading: mean, at-most: 30 g/kg}"),
                Plan.Claim.EXHAUSTIVE);
    }

    @ParameterizedTest
    @ValueSource(longs = {1, 2, 3, 4, 5, 6, 7, 8})
    void descentsFindTheBestPointOfALargerGrid(long seed) {
        SplittableRandom random = new SplittableRandom(seed);
        double limit = 22 + 25 * random.nextDouble();
        double highest = limit * (1.2 + 1.5 * random.nextDouble());
        agrees(
                twoWaters(
                        "{from: " + (2 + random.nextInt(6)) + " h, to: 34 h, grain: 20 min}",
                        "{from: 3 h, to: 36 h, grain: " + (15 + 5 * random.nextInt(3)) + " min}",
                        "  - {species: salt, reading: mean, at-most: " + limit + " g/kg}",
                        "  - {species: salt, reading: highest, at-most: " + highest + " g/kg, grade: thick}"),
                Plan.Claim.LOCAL);
    }

    @ParameterizedTest
    @ValueSource(longs = {11, 12, 13, 14, 15, 16})
    void aBandIsMetOnBothSides(long seed) {
        SplittableRandom random = new SplittableRandom(seed);
        double low = 20 + 20 * random.nextDouble();
        double high = low * (1.02 + 0.2 * random.nextDouble());
        agrees(
                twoWaters(
                        "{from: 2 h, to: 34 h, grain: 20 min}",
                        "{from: 3 h, to: 36 h, grain: 25 min}",
                        "  - {species: salt, reading: mean, at-least: " + low + " g/kg, at-most: " + high
                                + " g/kg, grade: thick}",
                        "  - {liquor: second, species: salt, reading: end, at-most: 10.2 g/L}"),
                Plan.Claim.LOCAL);
    }

    @Test
    void uptakeAndEveningOutAreWeighedAgainstEachOther() {
        Recipe recipe = Recipes.of(
                "language: 1",
                "title: Cords",
                "product: [food]",
                "lot: {mass: 100 kg, density: 1080 kg/m3, pieces: [{shape: cylinder, diameter: 12 mm}]}",
                "species: {salt: {start: 2 g/kg, diffusivity: 3e-10 m2/s, partition: 0.55}}",
                "steps:",
                "  - {soak: brine, liquor: {volume: 900 L, salt: 180 g/L}, temperature: 12 Cel, film: negligible,"
                        + " time: {from: 5 min, to: 6 h, grain: 5 min}}",
                "  - {rest: room, temperature: 12 Cel, time: {from: 1 h, to: 20 h, grain: 15 min}}",
                "targets:",
                "  - {species: salt, reading: mean, at-least: 15 g/kg, at-most: 30 g/kg}",
                "  - {species: salt, reading: range, at-most: 4 g/kg}",
                "minimise: time");
        agrees(recipe, Plan.Claim.LOCAL);
    }

    @Test
    void inUnlimitedCleanLiquorTheBestIsProvenBest() {
        Recipe recipe = Recipes.of(
                Recipes.LOINS + "steps:",
                Recipes.water("cold", "volume: unlimited", "{from: 2 h, to: 30 h, grain: 20 min}")
                        .replace("film: {coefficient: 2e-6 m/s}", "film: negligible"),
                Recipes.water("colder", "volume: unlimited", "{from: 2 h, to: 30 h, grain: 20 min}")
                        .replace("4 Cel", "1 Cel")
                        .replace("film: {coefficient: 2e-6 m/s}", "film: negligible"),
                "targets:",
                "  - {species: salt, reading: mean, at-most: 20 g/kg}",
                "minimise: time");
        agrees(recipe, Plan.Claim.GLOBAL);
        Plan plan = Planner.plan(recipe, Progress.NONE);
        double bound = plan.proof().bound().orElseThrow();
        double seconds = plan.run().totals().seconds();
        assertTrue(bound <= seconds && seconds - bound < 20 * 60, bound + " against " + seconds);
    }

    @Test
    void theCheapestIsChosenWhenCostIsMinimised() {
        Recipe recipe = Recipes.of(
                Recipes.LOINS + "steps:",
                Recipes.water("still", "ratio: 6 L/kg", "{from: 2 h, to: 60 h, grain: 30 min}"),
                "  - {rinse: running, liquor: {volume: 1200 L, flow: 40 L/min, salt: 0 g/L}, temperature: 4 Cel,"
                        + " film: {coefficient: 4e-6 m/s}, time: {from: 30 min, to: 40 h, grain: 30 min}}",
                "targets:",
                "  - {species: salt, reading: mean, at-most: 30 g/kg}",
                "minimise: cost",
                "prices: {time: 4 EUR/h, liquor: 6 EUR/m3}");
        Plan plan = Planner.plan(recipe, Progress.NONE);
        Batch batch = new Batch(recipe);
        double least = Double.POSITIVE_INFINITY;
        for (int i = 0; i < recipe.steps().get(0).time().choices(); i++) {
            for (int j = 0; j < recipe.steps().get(1).time().choices(); j++) {
                Run run = batch.follow(
                        recipe.steps().get(0).time().seconds(i),
                        recipe.steps().get(1).time().seconds(j));
                if (run.meetsTargets()) {
                    least = Math.min(least, run.totals().cost().orElseThrow());
                }
            }
        }
        assertTrue(plan.met());
        assertEquals(least, plan.run().totals().cost().orElseThrow(), 1e-6);
    }

    @Test
    void whatCannotBeMetIsMissedByAsLittleAsPossible() {
        Recipe recipe = twoWaters(
                "{from: 4 h, to: 12 h, grain: 30 min}",
                "{from: 4 h, to: 12 h, grain: 30 min}",
                "  - {species: salt, reading: mean, at-most: 25 g/kg}");
        Plan plan = Planner.plan(recipe, Progress.NONE);
        assertFalse(plan.met());
        assertArrayEquals(new double[] {12 * 3600, 12 * 3600}, plan.run().seconds());
        Plan.NearestMiss miss = plan.nearestMiss().orElseThrow();
        assertEquals("salt mean, thick", miss.target().name());
        assertEquals(miss.target().value() - 25, miss.by(), 1e-9);
        assertTrue(miss.by() > 0);
    }

    /** Far beyond equilibrium nothing changes any more: the nearest miss does not ask for the longest times. */
    @Test
    void aMissThatTimeCannotMendTakesNoMoreTimeThanItNeeds() {
        Plan plan = Planner.plan(
                twoWaters(
                        "{from: 4 h, to: 2000 h, grain: 15 min}",
                        "{from: 4 h, to: 2000 h, grain: 15 min}",
                        "  - {species: salt, reading: mean, at-most: 3 g/kg}"),
                Progress.NONE);
        assertFalse(plan.met());
        assertTrue(
                plan.run().totals().seconds() < 700 * 3600, plan.run().totals().toString());
    }

    @Test
    void whereTheGrainLeapsOverTheBandAFinerOneIsOffered() {
        Plan plan = Planner.plan(
                twoWaters(
                        "{from: 4 h, to: 40 h, grain: 4 h}",
                        "{from: 4 h, to: 40 h, grain: 4 h}",
                        "  - {species: salt, reading: mean, at-least: 30 g/kg, at-most: 30.05 g/kg, grade: thick}"),
                Progress.NONE);
        assertFalse(plan.met());
        assertTrue(
                plan.remedies().stream().anyMatch(remedy -> remedy.kind().equals("finer")),
                plan.remedies().toString());
    }

    @Test
    void everyRemedyOfferedWasPlannedAndMeetsTheTargets() {
        Recipe recipe = twoWaters(
                "{from: 4 h, to: 20 h, grain: 30 min}",
                "{from: 4 h, to: 20 h, grain: 30 min}",
                "  - {species: salt, reading: mean, at-most: 30 g/kg}");
        Plan plan = Planner.plan(recipe, Progress.NONE);
        assertFalse(plan.met());
        List<String> kinds = plan.remedies().stream().map(Plan.Remedy::kind).toList();
        assertEquals(List.of("longer", "fill"), kinds);
        Plan.Remedy longer = plan.remedies().get(0);
        // Written into the recipe, the remedy does what it says.
        Recipe changed = twoWaters(
                "{from: 4 h, to: 40 h, grain: 30 min}",
                "{from: 4 h, to: 40 h, grain: 30 min}",
                "  - {species: salt, reading: mean, at-most: 30 g/kg}");
        Plan again = Planner.plan(changed, Progress.NONE);
        assertTrue(again.met());
        assertEquals(
                again.run().totals().seconds(),
                longer.totals().seconds(),
                0.01 * longer.totals().seconds());
    }

    /** FDA Food Code 3-501.16, cold holding at 5 Cel or below: the first warming tried, by 2 kelvins from 4 Cel, stops there. */
    @Test
    void foodIsOfferedWarmthUpToFiveDegreesAndNoMore() {
        Recipe recipe = twoWaters(
                "{from: 4 h, to: 24 h, grain: 15 min}",
                "{from: 4 h, to: 25 h, grain: 15 min}",
                "  - {species: salt, reading: mean, at-most: 30 g/kg}");
        Plan.Remedy warmer = Planner.plan(recipe, Progress.NONE).remedies().stream()
                .filter(remedy -> remedy.kind().equals("warmer"))
                .findFirst()
                .orElseThrow();
        assertTrue(warmer.change().startsWith("warm first to 5.0 Cel, second to 5.0 Cel"), warmer.change());
        Recipe hot = twoWaters(
                "{from: 4 h, to: 12 h, grain: 15 min}",
                "{from: 4 h, to: 12 h, grain: 15 min}",
                "  - {species: salt, reading: mean, at-most: 30 g/kg}");
        assertTrue(Planner.plan(hot, Progress.NONE).remedies().stream()
                .noneMatch(remedy -> remedy.kind().equals("warmer")));
    }

    @Test
    void aTotalThatStandsInTheWayIsNamedWithWhatItWouldTake() {
        Recipe recipe = twoWaters(
                "{from: 4 h, to: 40 h, grain: 30 min}",
                "{from: 4 h, to: 40 h, grain: 30 min}",
                "  - {species: salt, reading: mean, at-most: 30 g/kg}",
                "  - {total: time, at-most: 20 h}");
        Plan plan = Planner.plan(recipe, Progress.NONE);
        assertFalse(plan.met());
        Plan.Remedy remedy = plan.remedies().stream()
                .filter(one -> one.kind().equals("total"))
                .findFirst()
                .orElseThrow();
        assertTrue(remedy.totals().seconds() > 20 * 3600, remedy.toString());
        assertTrue(recipe.targets().get(1) instanceof Target.OfTotal);
    }

    /** 4 h and 8 h make exactly the 12 h allowed, 2 x 2400 L exactly the 4800 L. */
    @Test
    void aTotalEqualToItsLimitIsWithinIt() {
        Plan plan = Planner.plan(
                twoWaters(
                        "{any-of: [4 h, 5 h]}",
                        "8 h",
                        "  - {species: salt, reading: mean, at-most: 190 g/kg}",
                        "  - {total: time, at-most: 12 h}",
                        "  - {total: liquor, at-most: 4800 L}"),
                Progress.NONE);
        assertTrue(plan.met());
        assertEquals(12 * 3600, plan.run().totals().seconds());
    }

    @Test
    void whatBindsIsWhatAShorterStepWouldBreak() {
        Plan plan = Planner.plan(
                twoWaters(
                        "{from: 10 h, to: 40 h, grain: 30 min}",
                        "{from: 10 h, to: 40 h, grain: 30 min}",
                        "  - {species: salt, reading: mean, at-most: 30 g/kg}",
                        "  - {species: salt, reading: highest, at-most: 150 g/kg}"),
                Progress.NONE);
        assertEquals(List.of("salt mean, thick"), plan.binds());
        assertEquals(2, plan.perHour().size());
        for (Plan.PerHour change : plan.perHour()) {
            assertTrue(change.change() < 0, change.toString());
            assertEquals("g/kg", change.unit());
        }
    }

    @Test
    void planningTwiceGivesTheSamePlan() {
        Recipe recipe = twoWaters(
                "{from: 2 h, to: 34 h, grain: 1 min}",
                "{from: 2 h, to: 34 h, grain: 1 min}",
                "  - {species: salt, reading: mean, at-most: 33 g/kg}");
        Plan one = Planner.plan(recipe, Progress.NONE);
        Plan two = Planner.plan(recipe, Progress.NONE);
        assertArrayEquals(one.run().seconds(), two.run().seconds());
        assertEquals(one.proof(), two.proof());
    }
}
