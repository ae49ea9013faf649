package org.soakwright.solver.identities;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Set;
import org.junit.jupiter.api.Test;
import org.soakwright.solver.chain.Chain;
import org.soakwright.solver.chain.Course;
import org.soakwright.solver.chain.Probe;
import org.soakwright.solver.chain.Reading;
import org.soakwright.solver.chain.Stage;
import org.soakwright.solver.chain.Start;
import org.soakwright.solver.chain.Surroundings;
import org.soakwright.solver.identities.Draw.Kind;
import org.soakwright.solver.shape.Axis;
import org.soakwright.solver.shape.Grade;
import org.soakwright.solver.shape.Grain;
import org.soakwright.solver.shape.Side;
import org.soakwright.solver.stage.Surface;

/** Pieces of several sides that are simpler than they look. */
class SolidsShapeTest {
    private static final double FAR = 1e7;

    @Test
    void endsFarApartLeaveASlabOrACylinder() {
        Draw draw = new Draw(1201);
        Tally tally = new Tally("huge sides, over the stated errors and the ends' share");
        Tally absolute = new Tally("huge sides, of the largest content");
        for (int i = 0; i < 40; i++) {
            Axis axis = i % 2 == 0 ? Axis.SLAB : Axis.CYLINDER;
            double length = draw.log(1e-3, 1e-2);
            List<Side> sides = new ArrayList<>(List.of(new Side(axis, length)));
            for (int n = axis == Axis.SLAB ? 1 + draw.below(2) : 1; n > 0; n--) {
                sides.add(new Side(Axis.SLAB, FAR * length));
            }
            List<Grade> plain = List.of(new Grade(axis, length, 1e-3));
            List<Grade> finite = List.of(new Grade(sides, 1e-3, 1));
            Start start = new Start.Uniform(draw.between(1, Draw.MOST));
            List<Timed> steps = new ArrayList<>();
            for (int k = 0; k < 2; k++) {
                Timed step = draw.clinging(draw.stage(plain, k == 0 ? Kind.CLOSED : draw.kind(), 1));
                steps.add(step.lasting(Math.max(step.seconds(), fourier(0.01, length, step))));
            }
            Course one = Timed.follow(plain, start, steps);
            Course other = Timed.follow(finite, start, steps);
            for (int k = 0; k < steps.size(); k++) {
                double scale = Bounds.highest(start, steps)[k]
                        * Math.max(1, steps.get(k).stage().partition());
                for (Probe probe :
                        List.of(new Probe.Liquor(), new Probe.Mean(0), new Probe.At(0, 0), new Probe.At(0, 0.7))) {
                    note(one, other, probe, probe, k, scale, tally, absolute);
                }
                note(one, other, new Probe.At(0, 1), new Probe.Surface(0), k, scale, tally, absolute);
            }
        }
        absolute.within(1e-6, 300);
        tally.within(1, 300);
    }

    /** The ends are a share of 1/FAR of the surface. */
    private static void note(
            Course one, Course other, Probe here, Probe there, int k, double scale, Tally tally, Tally absolute) {
        Reading a = one.read(here, k);
        Reading b = other.read(there, k);
        double difference = Math.abs(a.value() - b.value());
        tally.note(difference / (a.error() + b.error() + 4 * scale / FAR));
        absolute.note(difference / scale);
    }

    /** Such a piece gives its liquor nothing, so the others are followed exactly, in standing waves, without it. */
    @Test
    void aBrickTooSmallToMatterLeavesTheOthersAlone() {
        Draw draw = new Draw(1202);
        Tally honest = new Tally("beside a tiny brick, over the stated errors");
        Tally absolute = new Tally("beside a tiny brick, of the largest content");
        for (int i = 0; i < 30; i++) {
            List<Grade> plain = draw.lot(3);
            Grade brick = draw.solid(plain.get(0).length());
            List<Grade> mixed = new ArrayList<>(plain);
            mixed.add(new Grade(brick.sides(), 1e-15 * brick.volume(), 1));
            Start start = draw.start();
            List<Start> starts = new ArrayList<>();
            plain.forEach(grade -> starts.add(start));
            starts.add(new Start.Uniform(1));
            List<Timed> steps = new ArrayList<>();
            for (int k = 0; k < 2; k++) {
                Timed step = draw.clinging(draw.stage(plain, k == 0 ? Kind.CLOSED : draw.kind(), 1));
                steps.add(step.lasting(
                        Math.max(step.seconds(), fourier(0.01, plain.get(0).length(), step))));
            }
            Course one = Timed.follow(plain, start, steps);
            Course other = Chain.of(
                            mixed, starts, steps.stream().map(Timed::stage).toList(), Set.of())
                    .follow(Timed.seconds(steps));
            for (int k = 0; k < steps.size(); k++) {
                double scale = Bounds.highest(start, steps)[k]
                        * Math.max(1, steps.get(k).stage().partition());
                List<Probe> probes = new ArrayList<>(List.of(new Probe.Liquor()));
                for (int j = 0; j < plain.size(); j++) {
                    probes.addAll(List.of(
                            new Probe.Mean(j),
                            new Probe.At(j, 0),
                            new Probe.At(j, 0.7),
                            new Probe.At(j, 1),
                            new Probe.Highest(j),
                            new Probe.Lowest(j)));
                }
                for (Probe probe : probes) {
                    Reading a = one.read(probe, k);
                    Reading b = other.read(probe, k);
                    double difference = Math.abs(a.value() - b.value());
                    honest.note(difference / (a.error() + b.error() + 1e-14 * scale));
                    absolute.note(difference / scale);
                }
            }
        }
        absolute.within(1e-6, 500);
        honest.within(1, 500);
    }

    @Test
    void theOrderOfABricksSidesDoesNotMatter() {
        Draw draw = new Draw(1203);
        Tally tally = new Tally("sides of a brick in another order");
        for (int i = 0; i < 20; i++) {
            double length = draw.log(1e-3, 1e-2);
            List<Side> sides = new ArrayList<>();
            for (int n = 0; n < 3; n++) {
                sides.add(new Side(Axis.SLAB, length * draw.log(0.5, 2), n));
            }
            List<Side> turned = List.of(sides.get(2), sides.get(0), sides.get(1));
            Grade neighbour = new Grade(draw.axis(), length, 1e-3);
            List<Grade> lot = List.of(new Grade(sides, 1e-3, 1), neighbour);
            List<Grade> other = List.of(new Grade(turned, 1e-3, 1), neighbour);
            boolean shared = i % 2 == 0;
            List<Timed> steps = steps(draw, lot, shared ? Kind.CLOSED : Kind.PLENTY);
            Start start = new Start.Uniform(draw.between(1, Draw.MOST));
            tally.note(worst(lot, other, start, steps));
        }
        tally.within(1e-12, 20);
    }

    /** Equal sides have equal rates, so their products coincide in threes and sixes; the directions are then interchangeable. */
    @Test
    void theThreeSidesOfACubeAreAlike() {
        Draw draw = new Draw(1204);
        Tally alike = new Tally("grain along another side of a cube");
        Tally honest = new Tally("a cube against one whose sides differ in the eighth place, over what that may make");
        for (int i = 0; i < 20; i++) {
            double length = draw.log(1e-3, 1e-2);
            List<Grade> cube = List.of(block(length, length, length, 1));
            List<Timed> steps = steps(draw, cube, i % 2 == 0 ? Kind.FLOWING : Kind.AIR);
            Start start = new Start.Uniform(draw.between(1, Draw.MOST));
            List<Timed> along = grained(steps, 1.0, 1.0, 0.4);
            List<Timed> across = grained(steps, 0.4, 1.0, 1.0);
            double worst = 0;
            Course one = Timed.follow(cube, start, along);
            Course other = Timed.follow(cube, start, across);
            for (int k = 0; k < steps.size(); k++) {
                double scale =
                        Bounds.highest(start, steps)[k] * steps.get(k).stage().partition();
                for (Probe probe : List.of(new Probe.Mean(0), new Probe.At(0, 0), new Probe.Surface(0))) {
                    worst = Math.max(worst, Math.abs(one.value(probe, k) - other.value(probe, k)) / scale);
                }
            }
            alike.note(worst);
            double gap = 1e-8;
            List<Grade> almost = List.of(block(length, length * (1 + gap), length * (1 + 2 * gap), 1));
            honest.note(worst(cube, almost, start, steps) / (10 * gap));
        }
        alike.within(1e-12, 20);
        honest.within(1, 20);
    }

    /** Without film the modes of cubes of sizes 1 and 3 have poles in common. */
    @Test
    void cubesOfSizesOneAndThreeShareALiquor() {
        Draw draw = new Draw(1205);
        Tally tally = new Tally("cubes of sizes 1 and 3 against 1 and 3 (1 + 1e-8), over what that may make");
        Tally balance = new Tally("cubes of sizes 1 and 3, balance");
        for (int i = 0; i < 12; i++) {
            double a = draw.log(1e-3, 3e-3);
            Grade small = block(a, a, a, draw.log(0.2, 5));
            List<Grade> lot = List.of(small, block(3 * a, 3 * a, 3 * a, 1));
            double b = 3 * a * (1 + 1e-8);
            List<Grade> almost = List.of(small, block(b, b, b, 1));
            double volume = Draw.capacity(lot, 1) * draw.log(0.2, 5);
            Surroundings bath = new Surroundings.Vessel(volume, 0, 0, 0);
            Stage stage = new Stage(1e-9, 1, i % 2 == 0 ? new Surface.Open() : new Surface.Film(1e-6), bath, 0);
            List<Timed> steps = List.of(new Timed(stage, draw.log(0.1, 2) * a * a / 1e-9));
            tally.note(worst(lot, almost, new Start.Uniform(1), steps) / 1e-7);
            Course course = Timed.follow(lot, new Start.Uniform(1), steps);
            double kept = Draw.capacity(lot, 1) * (1 - course.value(new Probe.LotMean(), 0));
            balance.note(Math.abs(kept - volume * course.value(new Probe.Liquor(), 0)) / Draw.capacity(lot, 1));
        }
        tally.within(1, 12);
        balance.within(1e-11, 12);
    }

    private static Grade block(double a, double b, double c, double share) {
        List<Side> sides = List.of(new Side(Axis.SLAB, a, 0), new Side(Axis.SLAB, b, 1), new Side(Axis.SLAB, c, 2));
        return new Grade(sides, 1e-3 * share, 1);
    }

    private static List<Timed> steps(Draw draw, List<Grade> lot, Kind first) {
        return List.of(draw.grained(draw.stage(lot, first, 1)), draw.grained(draw.stage(lot, Kind.REST, 0)));
    }

    private static List<Timed> grained(List<Timed> steps, Double... factors) {
        return steps.stream()
                .map(step -> {
                    Stage stage = step.stage();
                    return step.with(new Stage(
                            stage.diffusivity(),
                            stage.partition(),
                            stage.surfaces().of(0),
                            stage.surroundings(),
                            stage.clinging(),
                            new Grain(Arrays.asList(factors))));
                })
                .toList();
    }

    private static double fourier(double fourier, double length, Timed step) {
        return fourier * length * length / step.stage().diffusivity();
    }

    /** Largest difference of readings, of the largest content. */
    private static double worst(List<Grade> lot, List<Grade> other, Start start, List<Timed> steps) {
        Course one = Timed.follow(lot, start, steps);
        Course two = Timed.follow(other, start, steps);
        double worst = 0;
        for (int k = 0; k < steps.size(); k++) {
            double scale =
                    Bounds.highest(start, steps)[k] * steps.get(k).stage().partition();
            for (int j = 0; j < lot.size(); j++) {
                for (Probe probe : List.of(
                        new Probe.Mean(j),
                        new Probe.At(j, 0),
                        new Probe.At(j, 0.6),
                        new Probe.Surface(j),
                        new Probe.Highest(j),
                        new Probe.Lowest(j))) {
                    worst = Math.max(worst, Math.abs(one.value(probe, k) - two.value(probe, k)) / scale);
                }
            }
        }
        return worst;
    }
}
