package org.soakwright.solver.chain;

import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Locale;
import java.util.Set;
import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;
import org.soakwright.solver.shape.Axis;
import org.soakwright.solver.shape.Grade;
import org.soakwright.solver.shape.Grain;
import org.soakwright.solver.shape.Side;
import org.soakwright.solver.stage.Surface;
import org.soakwright.solver.stage.Surfaces;

/**
 * Polynomial modes with the liquor on a contour, against the two other ways to the same numbers: standing waves of pieces and liquor
 * together where all pieces have one axis, launched products where no liquor is shared. The three have no kernel in common but
 * the positions' meaning.
 */
class PolynomialsAgreeTest {
    private static final double MOST = 100;

    private final SplittableRandom random = new SplittableRandom(20261201);
    private final SplittableRandom spice = new SplittableRandom(2701);
    private double worstMean;
    private double worstPlace;
    private double worstSlope;
    private double worstBound;
    private int compared;

    @Test
    void withStandingWavesInSharedLiquors() {
        for (int i = 0; i < 120; i++) {
            List<Grade> lot = new ArrayList<>();
            double length = log(1e-3, 1e-2);
            for (int j = 0; j <= random.nextInt(3); j++) {
                Axis axis = List.of(Axis.values()).get(random.nextInt(3));
                lot.add(new Grade(axis, length * log(0.4, 2.5), 1e-3 * log(0.1, 10)));
            }
            List<Double> seconds = new ArrayList<>();
            List<Stage> stages = stages(length, lot.size(), true, 1e-3, seconds);
            List<Start> starts = new ArrayList<>();
            lot.forEach(grade -> starts.add(start()));
            Course waves = Chain.of(lot, starts, stages, Set.of()).follow(times(seconds));
            Course polynomials = new RitzChain(lot, starts, stages, Set.of()).follow(times(seconds));
            compare(lot, waves, polynomials, seconds);
        }
        report("against standing waves", 1e-11, 1e-6, 120);
    }

    @Test
    void withLaunchedProductsInLiquorsThatNothingChanges() {
        for (int i = 0; i < 60; i++) {
            double length = log(1e-3, 1e-2);
            List<Side> sides = new ArrayList<>();
            boolean brick = i % 2 == 0;
            sides.add(new Side(brick ? Axis.SLAB : Axis.CYLINDER, length));
            sides.add(new Side(Axis.SLAB, length * log(0.5, 2)));
            if (brick && i % 4 == 0) {
                sides.add(new Side(Axis.SLAB, length * log(0.5, 2)));
            }
            List<Grade> lot = new ArrayList<>(List.of(new Grade(sides, 1e-3, log(0.5, 2))));
            if (i % 3 == 0) {
                lot.add(new Grade(Axis.SPHERE, 0.8 * length, 2e-3));
            }
            List<Double> seconds = new ArrayList<>();
            List<Stage> stages = stages(length, lot.size(), false, 2e-2, seconds);
            List<Start> starts = Collections.nCopies(lot.size(), new Start.Uniform(MOST * random.nextDouble()));
            Course products = Chain.of(lot, starts, stages, Set.of()).follow(times(seconds));
            assertTrue(products instanceof LaunchCourse, "these are products");
            Course polynomials = new RitzChain(lot, starts, stages, Set.of()).follow(times(seconds));
            compare(lot, products, polynomials, seconds);
        }
        report("against launched products", 1e-11, 1e-7, 60);
    }

    private void compare(List<Grade> lot, Course exact, Course course, List<Double> seconds) {
        for (int k = 0; k < seconds.size(); k++) {
            worstMean = Math.max(worstMean, gap(exact, course, new Probe.Liquor(), k));
            for (int j = 0; j < lot.size(); j++) {
                worstMean = Math.max(worstMean, gap(exact, course, new Probe.Mean(j), k));
                for (Probe probe : List.of(
                        new Probe.At(j, 0),
                        new Probe.At(j, 0.8),
                        new Probe.Surface(j),
                        new Probe.Highest(j),
                        new Probe.Lowest(j))) {
                    worstPlace = Math.max(worstPlace, gap(exact, course, probe, k));
                    worstBound = Math.max(
                            worstBound,
                            gap(exact, course, probe, k)
                                    * MOST
                                    / (course.read(probe, k).error() + 1e-11 * MOST));
                }
                double[] one = exact.gradient(new Probe.Mean(j), k);
                double[] other = course.gradient(new Probe.Mean(j), k);
                for (int i = 0; i <= k; i++) {
                    worstSlope = Math.max(worstSlope, Math.abs(one[i] - other[i]) * seconds.get(i) / MOST);
                }
            }
        }
        compared++;
    }

    private static double gap(Course exact, Course course, Probe probe, int stage) {
        return Math.abs(exact.value(probe, stage) - course.value(probe, stage)) / MOST;
    }

    private void report(String what, double mean, double place, int least) {
        String line = String.format(
                Locale.ROOT,
                "%s: %d chains, worst of the content: means and liquors %.1e, places %.1e, time times slope %.1e;"
                        + " difference over stated error at most %.2f",
                what,
                compared,
                worstMean,
                worstPlace,
                worstSlope,
                worstBound);
        System.out.println(line);
        assertTrue(compared >= least, line);
        assertTrue(worstMean < mean && worstPlace < place && worstSlope < 10 * mean && worstBound < 1, line);
    }

    private List<Stage> stages(double length, int grades, boolean shared, double shortest, List<Double> seconds) {
        List<Stage> stages = new ArrayList<>();
        int count = 1 + random.nextInt(4);
        for (int k = 0; k < count; k++) {
            double diffusivity = log(1e-11, 1e-9);
            double partition = log(0.3, 3);
            double film = log(1e-2, 1e4) * partition * diffusivity / length;
            Surface surface = random.nextInt(3) == 0 ? new Surface.Open() : new Surface.Film(film);
            seconds.add(length * length / diffusivity * log(shortest, 1));
            double content = MOST / 4 * random.nextDouble();
            Surroundings around = new Surroundings.Plenty(content);
            double clinging = 0;
            int kind = random.nextInt(4);
            if (kind == 0) {
                around = new Surroundings.Rest();
                surface = new Surface.Sealed();
            } else if (shared && kind < 3) {
                double volume = 1e-3 * log(0.1, 30);
                double flow = kind == 1 ? 0 : volume / seconds.get(k) * log(0.1, 10);
                around = new Surroundings.Vessel(volume, content, flow, MOST / 4 * random.nextDouble());
                clinging = 0.1 * volume * random.nextDouble();
            }
            stages.add(new Stage(diffusivity, partition, surfaces(surface, grades), around, clinging, Grain.NONE));
        }
        return stages;
    }

    /** Every other time one for each grade. */
    private Surfaces surfaces(Surface first, int grades) {
        if (first instanceof Surface.Sealed || spice.nextBoolean()) {
            return new Surfaces.Alike(first);
        }
        List<Surface> each = new ArrayList<>(List.of(first));
        while (each.size() < grades) {
            boolean film = first instanceof Surface.Film && spice.nextInt(3) > 0;
            each.add(
                    film
                            ? new Surface.Film(((Surface.Film) first).coefficient() * (0.1 + spice.nextDouble()))
                            : new Surface.Open());
        }
        return new Surfaces.ByGrade(each);
    }

    private Start start() {
        if (random.nextInt(5) > 0) {
            return new Start.Uniform(MOST * random.nextDouble());
        }
        return new Start.Polyline(List.of(
                new Start.Point(0, MOST * random.nextDouble()),
                new Start.Point(0.3 + 0.4 * random.nextDouble(), MOST * random.nextDouble()),
                new Start.Point(1, MOST * random.nextDouble())));
    }

    private double log(double low, double high) {
        return low * Math.pow(high / low, random.nextDouble());
    }

    private static double[] times(List<Double> seconds) {
        return seconds.stream().mapToDouble(one -> one).toArray();
    }
}
