package org.soakwright.planner.batch;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;
import org.soakwright.recipes.model.Reading;
import org.soakwright.recipes.model.Recipe;

/** Lots whose pieces differ: against pieces drawn one by one, against many grades written out, against themselves. */
class PiecesThatDifferTest {
    private static final int DRAWN = 100_000;

    private static String recipe(String grades, String spread, String start, String diffusivity, String liquor) {
        return """
                language: 1
                title: pieces that differ
                product: [other]
                lot:
                  mass: 1000 kg
                  density: 1000 kg/m3
                  pieces:
                %s
                %s
                species:
                  salt:
                    start: %s
                    diffusivity: %s
                    partition: 0.8
                steps:
                  - soak: bath
                    liquor: {%s, salt: 0 g/L}
                    film: negligible
                    time: 30 h
                targets:
                  - {species: salt, reading: mean, at-most: 25 g/kg, share: 95 %%}
                """.formatted(grades, spread.isEmpty() ? "" : "  spread: " + spread, start, diffusivity, liquor);
    }

    private static String slab(String name, double thickness, double share) {
        return String.format(
                Locale.ROOT,
                "    - {name: %s, shape: slab, thickness: %.12f mm, share: %.14f %%}",
                name,
                thickness,
                100 * share);
    }

    private static Run followed(String text) {
        Recipe recipe = Recipes.of(text);
        return new Batch(recipe).follow(StepTimes.definite(recipe));
    }

    private static List<Double> told(Run run, Reading reading) {
        StepEnd.Content content = run.end(0).pieces().get(0).species().get(0);
        return java.util.Objects.requireNonNull(content.distribution().get(reading), "nothing is told");
    }

    /** What is left of 1 in a slab of half-thickness L after Fo = D t/L^2 in plenty of water (Newman 1931), mean and core. */
    private static double left(double fourier, boolean core) {
        double sum = 0;
        for (int n = 0; n < 400; n++) {
            double wave = (n + 0.5) * Math.PI;
            double decay = Math.exp(-wave * wave * fourier);
            sum += core ? (n % 2 == 0 ? 2 : -2) / wave * decay : 2 / (wave * wave) * decay;
            if (decay < 1e-20) {
                break;
            }
        }
        return sum;
    }

    /**
     * 100 000 slabs with a size, a start and a diffusivity of their own, each by Newman's series. With so many the share below a
     * percentile is known to four standard errors, 4 sqrt(p (1 - p)/n): at 5 % to 0.3 %.
     */
    @Test
    void percentilesAreThoseOfAHundredThousandPiecesDrawnOneByOne() {
        double sizes = Math.sqrt(Math.log1p(0.15 * 0.15));
        double starts = Math.sqrt(Math.log1p(0.08 * 0.08));
        double rates = Math.sqrt(Math.log1p(0.2 * 0.2));
        Run run = followed(recipe(
                slab("all", 24, 1),
                "15 %",
                "{value: 190 g/kg, varies: 8 %}",
                "{value: 8e-10 m2/s, varies: 20 %}",
                "volume: unlimited"));
        for (Reading reading : List.of(Reading.MEAN, Reading.CORE)) {
            java.util.Random random = new java.util.Random(20261201);
            double[] drawn = new double[DRAWN];
            for (int i = 0; i < DRAWN; i++) {
                double half = 0.012 * Math.exp(sizes * random.nextGaussian());
                double start = 190 * Math.exp(starts * random.nextGaussian());
                double rate = 8e-10 * Math.exp(rates * random.nextGaussian());
                drawn[i] = start * left(rate * 30 * 3600 / (half * half), reading == Reading.CORE);
            }
            Arrays.sort(drawn);
            List<Double> told = told(run, reading);
            for (int s = 0; s < told.size(); s++) {
                double share = StepEnd.SHARES.get(s);
                int at = Arrays.binarySearch(drawn, told.get(s));
                double below = (at < 0 ? -at - 1 : at) / (double) DRAWN;
                double known = 4 * Math.sqrt(share * (1 - share) / DRAWN);
                assertEquals(share, below, known, () -> reading + " at " + share);
            }
        }
    }

    /** Sixty grades, each the middle of a sixtieth of the mass, in one closed bath with the rest. */
    @Test
    void aSpreadInASharedBathIsWhatSixtyGradesAre() {
        int count = 60;
        double sigma = Math.sqrt(Math.log1p(0.15 * 0.15));
        List<String> grades = new ArrayList<>();
        var normal = new org.apache.commons.math3.distribution.NormalDistribution();
        for (int i = 0; i < count; i++) {
            double size = 24 * Math.exp(sigma * normal.inverseCumulativeProbability((i + 0.5) / count));
            grades.add(slab("g" + i, size, 1.0 / count));
        }
        String closed = "ratio: 2 L/kg";
        Run many = followed(recipe(String.join("\n", grades), "", "190 g/kg", "8e-10 m2/s", closed));
        Run one = followed(recipe(slab("all", 24, 1), "15 %", "190 g/kg", "8e-10 m2/s", closed));
        double liquor = one.end(0).liquor().get(0).end();
        assertEquals(many.end(0).liquor().get(0).end(), liquor, 1e-3 * liquor);
        // The grades' own readings, as a staircase: its percentiles are within a step of the curve's.
        double[] means = many.end(0).pieces().stream()
                .mapToDouble(piece -> piece.species().get(0).value(Reading.MEAN))
                .sorted()
                .toArray();
        List<Double> told = told(one, Reading.MEAN);
        for (int s = 1; s < told.size() - 1; s++) {
            double place = StepEnd.SHARES.get(s) * count - 0.5;
            int below = (int) Math.floor(place);
            double between = means[below] + (place - below) * (means[below + 1] - means[below]);
            double step = means[below + 1] - means[below];
            assertEquals(between, told.get(s), 0.15 * step + 1e-3 * between, "at " + StepEnd.SHARES.get(s));
        }
    }

    /** The purpose of it all: a lot that complies on average fails piece by piece. Common practice: a fifth thicker, twice the residue. */
    @Test
    void piecesAFifthThickerKeepAboutTwiceAsMuch() {
        Run run = followed(recipe(slab("all", 24, 1), "", "190 g/kg", "8e-10 m2/s", "volume: unlimited"));
        Run thicker = followed(recipe(slab("all", 28.8, 1), "", "190 g/kg", "8e-10 m2/s", "volume: unlimited"));
        double ratio = mean(thicker) / mean(run);
        assertTrue(ratio > 1.5 && ratio < 2.5, () -> "times as much: " + ratio);
    }

    private static double mean(Run run) {
        return run.end(0).pieces().get(0).species().get(0).value(Reading.MEAN);
    }

    /** What is chosen for each width against twice as many classes. */
    @Test
    void moreClassesOfSizeTellNothingNew() {
        for (double cv : new double[] {0.02, 0.06, 0.1, 0.15, 0.2, 0.3, 0.45, 0.6}) {
            double sigma = Math.sqrt(Math.log1p(cv * cv));
            int count = Variation.classes(sigma);
            double worst = 0;
            for (boolean core : new boolean[] {false, true}) {
                Scatter few = scatter(sigma, count, core);
                Scatter many = scatter(sigma, 2 * count + 1, core);
                for (double share : new double[] {0.02, 0.05, 0.25, 0.5, 0.75, 0.95, 0.98}) {
                    worst = Math.max(worst, Math.abs(few.percentile(share) - many.percentile(share)));
                }
            }
            double off = worst;
            System.out.printf(
                    Locale.ROOT, "spread %.0f %%: %d classes, percentiles within %.1e%n", 100 * cv, count, off);
            assertTrue(off < (cv <= 0.3 ? 2e-5 : 2e-3), () -> cv + ": " + count + " classes are off by " + off);
        }
    }

    private static Scatter scatter(double sigma, int count, boolean core) {
        Variation variation = Variation.ofSize(sigma, count);
        double[] values = new double[count];
        for (int i = 0; i < count; i++) {
            double size = variation.factor(i);
            values[i] = left(0.3 / (size * size), core);
        }
        return new Scatter(List.of(new Population(0, 1, List.of(variation))), values);
    }

    /** The planner descends along them. */
    @Test
    void aPercentilesDerivativeIsItsDifferenceQuotient() {
        Recipe recipe = Recipes.of(recipe(
                slab("thin", 18, 0.4) + "\n" + slab("thick", 26, 0.6),
                "12 %",
                "{value: 190 g/kg, varies: 8 %}",
                "8e-10 m2/s",
                "ratio: 2 L/kg"));
        Batch batch = new Batch(recipe);
        double time = 30 * 3600;
        double step = 30;
        SplittableRandom random = new SplittableRandom(4);
        for (Reading reading : List.of(Reading.MEAN, Reading.CORE, Reading.RANGE)) {
            for (boolean lot : new boolean[] {false, true}) {
                double share = 0.05 + 0.9 * random.nextDouble();
                List<Population> every = batch.classes(0).populations();
                Gauge gauge = new Gauge.Percentile(lot ? -1 : 1, lot ? every : every.subList(1, 2), reading, share);
                double slope = gauge.gradient(batch.follow(time).course(0), 0)[0];
                double up = gauge.value(batch.follow(time + step).course(0), 0);
                double down = gauge.value(batch.follow(time - step).course(0), 0);
                assertEquals((up - down) / (2 * step), slope, 1e-4 * Math.abs(slope), reading + " of the lot: " + lot);
            }
        }
    }

    @Test
    void aShareOfPiecesAllAlikeIsAllOrNothing() {
        Scatter scatter = new Scatter(
                List.of(new Population(0, 0.4, List.of()), new Population(1, 0.6, List.of())), new double[] {3, 7});
        assertEquals(0, scatter.below(2.9));
        assertEquals(0.4, scatter.below(3), 1e-15);
        assertEquals(1, scatter.below(7), 1e-15);
        assertEquals(3, scatter.percentile(0.39), 1e-9);
        assertEquals(7, scatter.percentile(0.41), 1e-9);
    }

    /** Without a film only D/L^2 counts: a coefficient of variation of the one is half of it in the other, for small ones. */
    @Test
    void aDiffusivityThatVariesIsASizeThatDoes() {
        double rates = 0.2;
        double sizes = Math.sqrt(Math.expm1(Math.log1p(rates * rates) / 4));
        Run fast = followed(
                recipe(slab("all", 24, 1), "", "190 g/kg", "{value: 8e-10 m2/s, varies: 20 %}", "ratio: 2 L/kg"));
        Run small = followed(recipe(
                slab("all", 24, 1),
                String.format(Locale.ROOT, "%.10f %%", 100 * sizes),
                "190 g/kg",
                "8e-10 m2/s",
                "ratio: 2 L/kg"));
        for (int s = 0; s < StepEnd.SHARES.size(); s++) {
            double expected = told(small, Reading.HIGHEST).get(s);
            assertEquals(expected, told(fast, Reading.HIGHEST).get(s), 1e-7 * expected);
        }
    }

    /** The average of pieces that differ is a sum of exponentials and bounded by its tangents; which piece a share ends at changes. */
    @Test
    void aPlanForAShareIsNotClaimedToBeProvenBest() {
        String clean = recipe(slab("all", 24, 1), "15 %", "190 g/kg", "8e-10 m2/s", "volume: unlimited");
        assertTrue(Convexity.holds(Recipes.of(clean.replace(", share: 95 %", ""))));
        assertFalse(Convexity.holds(Recipes.of(clean)));
    }

    /** Film over diffusivity is one Biot number of each side only while the sides' diffusivities keep their proportion. */
    @Test
    void aGrainThatChangesWithTheStepLeavesNoProofBehindAFilm() {
        String rod = "    - {name: rod, shape: short-cylinder, diameter: 20 mm, length: 60 mm}";
        String recipe = recipe(rod, "", "190 g/kg", "{across: 2e-10 m2/s, along: 3e-10 m2/s}", "volume: unlimited")
                .replace(", share: 95 %", "")
                .replace("film: negligible", "film: {coefficient: 1e-6 m/s}");
        String second = """
                  - soak: second
                    liquor: {volume: unlimited, salt: 0 g/L}
                    film: {coefficient: 1e-6 m/s}
                    time: 2 h
                """;
        String own = "    diffusivity: {salt: {across: 2e-10 m2/s, along: 4e-10 m2/s}}\n";
        assertTrue(Convexity.holds(Recipes.of(recipe.replace("targets:", second + "targets:"))));
        assertFalse(Convexity.holds(Recipes.of(recipe.replace("targets:", second + own + "targets:"))));
    }

    @Test
    void twoTargetsOfOneNameAreBothShown() {
        Run run = followed(recipe(slab("all", 24, 1), "15 %", "190 g/kg", "8e-10 m2/s", "ratio: 2 L/kg")
                + "  - {species: salt, reading: mean, at-least: 1 g/kg, share: 95 %}\n");
        List<Distribution> all = Distribution.of(run);
        assertEquals(2, all.size());
        assertTrue(all.get(0).atMost().isPresent() && all.get(1).atLeast().isPresent());
    }
}
