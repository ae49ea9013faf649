package org.soakwright.planner.batch;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.concurrent.ForkJoinPool;
import org.apache.commons.math3.distribution.NormalDistribution;
import org.junit.jupiter.api.Test;
import org.soakwright.recipes.model.Recipe;
import org.soakwright.recipes.text.Unsound;

/** What a recipe whose values are not known exactly is said to end with, against closed forms. */
class InDoubtTest {
    private static final NormalDistribution NORMAL = new NormalDistribution();
    private static final double HOUR = 3600;

    /** Held surface, unlimited water, one grade: the mean falls as the diffusivity rises, whatever else. */
    private static Recipe held(String diffusivity, String... targets) {
        return Recipes.of("""
                language: 1
                title: Held
                product: [other]
                lot:
                  mass: 100 kg
                  density: 1000 kg/m3
                  pieces:
                    - {name: sheet, shape: slab, thickness: 10 mm, share: 100 %}
                species:
                  salt: {start: 100 g/kg, diffusivity: DIFFUSIVITY, partition: 1}
                steps:
                  - {soak: first, liquor: {volume: unlimited, salt: 0 g/L}, film: negligible, time: 4 h}
                targets:\
                """.replace("DIFFUSIVITY", diffusivity), String.join("\n", targets), "minimise: time");
    }

    private static double sigma(double variation) {
        return Math.sqrt(Math.log(1 + variation * variation));
    }

    private static Outlook outlook(Recipe recipe) {
        return new Batch(recipe)
                .follow(StepTimes.definite(recipe))
                .judged(Progress.NONE)
                .outlook()
                .orElseThrow();
    }

    private static double mean(double diffusivity) {
        Recipe known = held(diffusivity + " m2/s", "  - {species: salt, reading: mean, at-most: 60 g/kg}");
        return new Batch(known).follow(4 * HOUR).targets().get(0).value();
    }

    private static final String DOUBTED = "{value: 8e-10 m2/s, give-or-take: 20 %}";

    @Test
    void aPercentileOfTheReadingIsTheReadingAtThePercentileOfTheDiffusivity() {
        Outlook.Prospect found = outlook(held(DOUBTED, "  - {species: salt, reading: mean, at-most: 60 g/kg}"))
                .prospects()
                .get(0);
        for (int i = 0; i < Outlook.LEVELS.size(); i++) {
            double number = NORMAL.inverseCumulativeProbability(1 - Outlook.LEVELS.get(i));
            double exact = mean(8e-10 * Math.exp(sigma(0.2) * number));
            assertEquals(exact, found.percentiles().get(i), 2e-3 * exact);
        }
    }

    /** The chance is that of a diffusivity above the one with which the limit is just met; without a confidence the median decides. */
    @Test
    void theChanceIsThatOfTheDiffusivity() {
        double limit = mean(7e-10);
        double exact = NORMAL.cumulativeProbability(Math.log(8.0 / 7) / sigma(0.2));
        Recipe recipe = held(DOUBTED, "  - {species: salt, reading: mean, at-most: " + limit + " g/kg}");
        Run run = new Batch(recipe).follow(4 * HOUR).judged(Progress.NONE);
        Outlook outlook = run.outlook().orElseThrow();
        assertEquals(exact, outlook.all().value(), 2e-3);
        assertTrue(
                outlook.all().low() <= exact && exact <= outlook.all().high(),
                outlook.all().toString());
        assertTrue(outlook.all().high() - outlook.all().low() < 5e-3);
        assertEquals(outlook.all(), outlook.chances().get(0));
        assertTrue(run.meetsTargets());
        assertEquals(10_240, outlook.all().samples());
    }

    /** At most is held to the percentile, at least to the one from below; the value shown is the one that counts. */
    @Test
    void aConfidenceIsAPercentile() {
        double low = mean(8e-10 * Math.exp(sigma(0.2) * 1.2815515655446004));
        double high = mean(8e-10 * Math.exp(-sigma(0.2) * 1.2815515655446004));
        Recipe recipe = held(
                DOUBTED,
                "  - {species: salt, reading: mean, at-most: " + (high + 0.1) + " g/kg, confidence: 90 %}",
                "  - {species: salt, reading: mean, at-most: " + (high - 0.1) + " g/kg, confidence: 90 %}",
                "  - {species: salt, reading: mean, at-least: " + (low - 0.1) + " g/kg, confidence: 90 %}",
                "  - {species: salt, reading: mean, at-least: " + (low + 0.1) + " g/kg, confidence: 90 %}");
        Run run = new Batch(recipe).follow(4 * HOUR).judged(Progress.NONE);
        List<TargetState> states = run.targets();
        assertEquals(
                List.of(true, false, true, false),
                states.stream().map(TargetState::met).toList());
        assertEquals(high, states.get(0).value(), 0.05);
        assertEquals(low, states.get(2).value(), 0.05);
        assertEquals("salt mean with 90 % confidence, sheet", states.get(0).name());
        Outlook outlook = run.outlook().orElseThrow();
        double error = outlook.of(states.get(0)).orElseThrow().error().orElseThrow();
        assertEquals(high, states.get(0).value(), 4 * error);
    }

    @Test
    void whereEverythingIsKnownThereIsNoOutlook() {
        Recipe recipe = held("8e-10 m2/s", "  - {species: salt, reading: mean, at-most: 60 g/kg, confidence: 90 %}");
        assertTrue(new Batch(recipe)
                .follow(4 * HOUR)
                .judged(Progress.NONE)
                .outlook()
                .isEmpty());
    }

    /** By activation: a temperature known to a kelvin is as good as a diffusivity known to E/(R T^2) of it. */
    @Test
    void temperaturesAreNormalInKelvins() {
        Recipe recipe = Recipes.of(
                Recipes.LOINS + "steps:",
                "  - {soak: first, liquor: {volume: unlimited, salt: 0 g/L}, temperature: {value: 5 Cel, give-or-take: 2 K},"
                        + " film: negligible, time: 12 h}",
                "targets:",
                "  - {species: salt, reading: mean, at-most: 60 g/kg, grade: thick}",
                "minimise: time");
        Outlook.Prospect found = outlook(recipe).prospects().get(0);
        double[] exact = new double[3];
        for (int i = 0; i < 3; i++) {
            double kelvins = 2 * NORMAL.inverseCumulativeProbability(1 - Outlook.LEVELS.get(i));
            Recipe known = Recipes.of(
                    Recipes.LOINS + "steps:",
                    "  - {soak: first, liquor: {volume: unlimited, salt: 0 g/L}, temperature: " + (5 + kelvins)
                            + " Cel, film: negligible, time: 12 h}",
                    "targets:",
                    "  - {species: salt, reading: mean, at-most: 60 g/kg, grade: thick}",
                    "minimise: time");
            exact[i] = new Batch(known).follow(12 * HOUR).targets().get(0).value();
            assertEquals(exact[i], found.percentiles().get(i), 1e-3 * exact[i]);
        }
        assertTrue(exact[0] < exact[1] && exact[1] < exact[2]);
    }

    private static Recipe several(String... targets) {
        return Recipes.of("""
                language: 1
                title: Several
                product: [other]
                lot:
                  mass: 100 kg
                  density: {value: 1000 kg/m3, give-or-take: 3 %}
                  pieces:
                    - {name: small, shape: slab, thickness: 10 mm, share: 50 %}
                    - {name: large, shape: slab, thickness: {value: 16 mm, give-or-take: 5 %}, share: 50 %}
                species:
                  salt:
                    start: {value: 100 g/kg, give-or-take: 5 %}
                    diffusivity: {value: 8e-10 m2/s, give-or-take: 20 %}
                    partition: {value: 0.8, give-or-take: 10 %}
                steps:
                  - {soak: first, liquor: {ratio: {value: 2 L/kg, give-or-take: 5 %}, salt: 0 g/L},
                     film: {coefficient: {value: 2e-6 m/s, give-or-take: 30 %}}, time: {from: 1 h, to: 24 h, grain: 5 min, planned: 4 h}}
                  - {soak: second, liquor: {ratio: 2 L/kg, salt: 0 g/L},
                     film: {coefficient: 2e-6 m/s}, time: {from: 1 h, to: 24 h, grain: 5 min, planned: 6 h}}
                targets:\
                """, String.join("\n", targets), "minimise: time");
    }

    @Test
    void theSamplesDoNotDependOnTheNumberOfThreads() throws Exception {
        Recipe recipe = several("  - {species: salt, reading: mean, at-most: 30 g/kg, confidence: 90 %}");
        List<Run> runs = new ArrayList<>();
        for (int threads : new int[] {1, 3}) {
            ForkJoinPool pool = new ForkJoinPool(threads);
            try {
                runs.add(pool.submit(() ->
                                new Batch(recipe).follow(4 * HOUR, 6 * HOUR).judged(Progress.NONE))
                        .get());
            } finally {
                pool.shutdown();
            }
        }
        assertEquals(runs.get(0).outlook(), runs.get(1).outlook());
        assertEquals(runs.get(0).targets(), runs.get(1).targets());
    }

    /** A start content scales every reading, so its share is that of its logarithm; where of: start is asked for it has none. */
    @Test
    void sharesTellWhatMatters() {
        Recipe recipe = several(
                "  - {species: salt, reading: mean, at-most: 30 g/kg, grade: small}",
                "  - {species: salt, reading: mean, at-most: 30 %, of: start, grade: small}");
        Outlook outlook = outlook(recipe);
        int start = outlook.values().indexOf("start of salt");
        int diffusivity = outlook.values().indexOf("diffusivity of salt");
        List<Double> plain = outlook.prospects().get(0).shares();
        List<Double> relative = outlook.prospects().get(1).shares();
        assertTrue(plain.get(start) > 0.01 && plain.get(start) < 0.5);
        assertEquals(0, relative.get(start));
        assertEquals(outlook.values().size(), plain.size());
        for (List<Double> shares : List.of(plain, relative)) {
            double sum = shares.stream().mapToDouble(share -> share).sum();
            assertTrue(sum > 0.9 && sum < 1 + 4e-3, "sum of shares " + sum);
        }
        assertEquals(plain.stream().mapToDouble(share -> share).max().orElseThrow(), plain.get(diffusivity));
    }

    /** Two independent readings of one uncertainty pass together as often as the harder one does. */
    @Test
    void theChanceOfAllIsThatOfTheHardest() {
        Outlook outlook = outlook(held(
                DOUBTED,
                "  - {species: salt, reading: mean, at-most: " + mean(7e-10) + " g/kg}",
                "  - {species: salt, reading: mean, at-most: " + mean(8e-10) + " g/kg}"));
        assertEquals(outlook.chances().get(1), outlook.all());
        assertTrue(outlook.chances().get(0).value() > outlook.all().value());
    }

    /** A liquor's share by mass of 60 %, give or take 40 %, is above 100 % in some samples: no recipe, so failing, and said. */
    private static Recipe refusing(double limit, String more) {
        return Recipes.of(
                """
                language: 1
                title: Strong
                product: [other]
                lot:
                  mass: 100 kg
                  density: 1000 kg/m3
                  pieces:
                    - {name: sheet, shape: slab, thickness: 10 mm, share: 100 %}
                species:
                  sugar: {start: {value: 60 %, give-or-take: 30 %}, diffusivity: 8e-10 m2/s, partition: 1}
                steps:
                  - {soak: first, liquor: {volume: unlimited, sugar: 0 g/L}, film: negligible, time: 4 h}
                targets:\
                """, "  - {species: sugar, reading: mean, at-most: " + limit + " %" + more + "}", "minimise: time");
    }

    @Test
    void samplesThatAreNoRecipeCountAsFailingAndAreTold() {
        double above = 1 - NORMAL.cumulativeProbability(Math.log(1 / 0.6) / sigma(0.3));
        Outlook outlook = outlook(refusing(99, ""));
        assertEquals(above, outlook.refused() / 10_240.0, 2e-3);
        assertEquals(1 - outlook.refused() / 10_240.0, outlook.all().value(), 1e-12);
        assertTrue(
                outlook.refusal().orElseThrow().contains("100 %"),
                outlook.refusal().toString());
        Unsound refused = assertThrows(Unsound.class, () -> outlook(refusing(99, ", confidence: 99 %")));
        assertTrue(String.valueOf(refused.getMessage())
                .contains("cannot be reached, because " + outlook.refused() + " of 10240"));
    }

    /** What is planned on few samples is judged by many, and that by independent ones here. */
    @Test
    void aPlanWithConfidenceIsLongerAndHolds() {
        Recipe plain = several("  - {species: salt, reading: mean, at-most: 30 g/kg}");
        Recipe sure = several("  - {species: salt, reading: mean, at-most: 30 g/kg, confidence: 90 %}");
        Plan short_ = Planner.plan(plain, Progress.NONE);
        Plan plan = Planner.plan(sure, Progress.NONE);
        assertTrue(plan.met() && plan.run().meetsTargets());
        assertEquals(Plan.Claim.LOCAL, plan.proof().claim());
        assertTrue(plan.run().totals().seconds() > short_.run().totals().seconds() + 1800);
        double[] seconds = plan.run().seconds();
        double passed = share(sure, seconds, 20_000);
        double error = 3 * Math.sqrt(0.09 / 20_000);
        // A grain of five minutes is worth less than half a per cent.
        assertTrue(passed > 0.9 - error && passed < 0.905 + error, "passed " + passed);
        for (int i = 0; i < seconds.length; i++) {
            double[] shorter = seconds.clone();
            shorter[i] -= 300;
            assertFalse(new Batch(sure).follow(shorter).judged(Progress.NONE).meetsTargets());
        }
    }

    /** Half of the samples lie on either side of the stated value: the plan is the plain one, or a grain beside it. */
    @Test
    void aConfidenceOfHalfInOneValueIsThePlainPlan() {
        String water = "  - {soak: NAME, liquor: {volume: unlimited, salt: 0 g/L}, film: negligible,"
                + " time: {from: 1 h, to: 9 h, grain: 1 min}}";
        List<Double> totals = new ArrayList<>();
        for (String confidence : List.of("", ", confidence: 50.001 %")) {
            String head = held(DOUBTED, "  - {species: salt, reading: mean, at-most: 60 g/kg}")
                    .title();
            Recipe recipe = Recipes.of(
                    "language: 1",
                    "title: " + head,
                    "product: [other]",
                    "lot: {mass: 100 kg, density: 1000 kg/m3, pieces: [{name: sheet, shape: slab, thickness: 10 mm, share: 100 %}]}",
                    "species: {salt: {start: 100 g/kg, diffusivity: " + DOUBTED + ", partition: 1}}",
                    "steps:",
                    water.replace("NAME", "first"),
                    water.replace("NAME", "second"),
                    "targets:",
                    "  - {species: salt, reading: mean, at-most: 20 g/kg" + confidence + "}",
                    "minimise: time");
            Plan plan = Planner.plan(recipe, Progress.NONE);
            assertTrue(plan.met());
            totals.add(plan.run().totals().seconds());
        }
        assertEquals(totals.get(0), totals.get(1), 120);
    }

    /** Independent samples, drawn plainly: how often all targets are met. */
    private static double share(Recipe recipe, double[] seconds, int samples) {
        java.util.Random random = new java.util.Random(20_001);
        Uncertainty uncertainty = Uncertainty.of(recipe);
        int passed = 0;
        for (int i = 0; i < samples; i++) {
            double[] normals = new double[uncertainty.size()];
            Arrays.setAll(normals, j -> random.nextGaussian());
            passed += new Batch(uncertainty.drawn(normals)).follow(seconds).meetsTargets() ? 1 : 0;
        }
        return (double) passed / samples;
    }

    @Test
    void aConfidenceOutOfReachIsAMissAndTold() {
        Recipe recipe = several("  - {species: salt, reading: mean, at-most: 8 g/kg, confidence: 99 %}");
        Plan plan = Planner.plan(recipe, Progress.NONE);
        assertFalse(plan.met());
        Plan.NearestMiss miss = plan.nearestMiss().orElseThrow();
        assertTrue(miss.by() > 0);
        assertEquals("salt mean with 99 % confidence, large", miss.target().name());
        assertTrue(plan.run().outlook().orElseThrow().all().value() < 0.99);
    }

    /** At the end the band is what the outlook tells, found on fewer samples; all along it holds the reading at stated values. */
    @Test
    void bandsEndAtThePercentiles() {
        Recipe recipe = several("  - {species: salt, reading: mean, at-most: 30 g/kg}");
        Run run = new Batch(recipe).follow(4 * HOUR, 6 * HOUR).judged(Progress.NONE);
        Trace trace = Trace.of(run, 2);
        Bands bands = Bands.of(trace).orElseThrow();
        for (TargetState state : EachGrade.of(run)) {
            Bands.Band band = bands.of(state);
            double[] course = trace.course(state);
            int end = course.length - 1;
            List<Double> percentiles =
                    run.outlook().orElseThrow().of(state).orElseThrow().percentiles();
            assertEquals(percentiles.get(0), band.low()[end], 0.02 * percentiles.get(0));
            assertEquals(percentiles.get(2), band.high()[end], 0.02 * percentiles.get(2));
            for (int i = 0; i <= end; i++) {
                assertTrue(band.low()[i] < course[i] && course[i] < band.high()[i]);
            }
        }
    }

    /** The same batch followed again by another thread is judged the same, and so are other durations. */
    @Test
    void aRunAgainIsHeldToTheSame() {
        Run run = new Batch(several("  - {species: salt, reading: mean, at-most: 30 g/kg, confidence: 90 %}"))
                .follow(4 * HOUR, 6 * HOUR)
                .judged(Progress.NONE);
        Run again = run.again();
        assertEquals(run.targets(), again.targets());
        assertEquals(run.outlook(), again.outlook());
        assertEquals(
                run.batch().follow(5 * HOUR, 6 * HOUR).targets(),
                again.batch().follow(5 * HOUR, 6 * HOUR).targets());
        // Followed anew, the margin makes the ensemble read what was judged.
        assertEquals(
                run.targets().get(0).value(),
                run.batch().follow(4 * HOUR, 6 * HOUR).targets().get(0).value(),
                1e-9);
    }
}
