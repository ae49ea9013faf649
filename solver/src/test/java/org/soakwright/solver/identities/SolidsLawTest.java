package org.soakwright.solver.identities;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Random;
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
import org.soakwright.solver.shape.Grade;
import org.soakwright.solver.shape.Side;
import org.soakwright.solver.stage.Surface;

/** What must hold of lots with pieces of several sides, however they are drawn. */
class SolidsLawTest {
    private static final Probe LIQUOR = new Probe.Liquor();
    private static final Probe LOT = new Probe.LotMean();

    @Test
    void twoPartsOfAStageMakeTheWhole() {
        for (Kind kind : Kind.values()) {
            Draw draw = new Draw(1110 + kind.name().hashCode());
            Tally tally = new Tally("several sides: semigroup, " + kind);
            Tally honest = new Tally("several sides: semigroup, " + kind + ", over the stated errors");
            for (int i = 0; i < 16; i++) {
                List<Grade> lot = draw.solids(1 + i % 2);
                Start start = new Start.Uniform(draw.between(0, Draw.MOST));
                // Something uneven to begin with, in a bath of its own.
                Timed soak = draw.grained(draw.stage(lot, Kind.CLOSED, 1));
                Timed step = draw.grained(draw.stage(lot, kind, 1));
                Timed first = step.lasting(step.seconds() * draw.between(0.1, 0.9));
                Timed second = step.lasting(step.seconds() - first.seconds());
                Course whole = Timed.follow(lot, start, List.of(soak, step));
                if (step.stage().surroundings() instanceof Surroundings.Vessel vessel) {
                    double liquor =
                            Timed.follow(lot, start, List.of(soak, first)).value(LIQUOR, 1);
                    second = second.with(new Surroundings.Vessel(
                            vessel.volume(), Math.max(0, liquor), vessel.flow(), vessel.feed()));
                }
                Course parts = Timed.follow(lot, start, List.of(soak, first, second));
                compare(whole, 1, parts, 2, lot, Bounds.highest(start, List.of(soak, step))[1], tally, honest);
            }
            tally.within(1e-6, 16);
            honest.within(1, 16);
        }
    }

    /** A short transfer need not be resolved for its own sake: what comes after it is as good. */
    @Test
    void aPassingTransferIsFeltAfterwardsAllTheSame() {
        Draw draw = new Draw(1160);
        Tally tally = new Tally("several sides: after a passing transfer");
        Tally honest = new Tally("several sides: after a passing transfer, over the stated errors");
        for (int i = 0; i < 16; i++) {
            List<Grade> lot = draw.solids(1 + i % 2);
            Start start = new Start.Uniform(draw.between(0, Draw.MOST));
            List<Timed> steps = new ArrayList<>();
            for (Kind kind : List.of(Kind.CLOSED, Kind.REST, Kind.CLOSED)) {
                Timed step = draw.grained(draw.stage(lot, kind, 1));
                double length = lot.get(0).length();
                double unit = length * length / step.stage().diffusivity();
                steps.add(step.lasting(unit * (kind == Kind.REST ? draw.log(1e-5, 1e-3) : draw.log(0.03, 1))));
            }
            List<Start> starts = Collections.nCopies(lot.size(), start);
            List<Stage> stages = steps.stream().map(Timed::stage).toList();
            Course one = Timed.follow(lot, start, steps);
            Course other = Chain.of(lot, starts, stages, Set.of(1)).follow(Timed.seconds(steps));
            compare(one, 2, other, 2, lot, Bounds.highest(start, steps)[2], tally, honest);
        }
        honest.within(1, 16);
        tally.within(1e-6, 16);
    }

    @Test
    void theOrderOfTheGradesDoesNotMatter() {
        Draw draw = new Draw(1120);
        Tally tally = new Tally("several sides: order of the grades");
        for (int i = 0; i < 24; i++) {
            List<Grade> lot = draw.solids(2 + i % 2);
            List<Integer> places = new ArrayList<>();
            for (int j = 0; j < lot.size(); j++) {
                places.add(j);
            }
            Collections.shuffle(places, new Random(i));
            Start start = new Start.Uniform(draw.between(0, Draw.MOST));
            List<Timed> steps = steps(draw, lot);
            Course one = Timed.follow(lot, start, steps);
            Course other = Timed.follow(places.stream().map(lot::get).toList(), start, steps);
            tally.note(worst(one, places, other, start, steps));
        }
        tally.within(1e-11, 24);
    }

    /** Bricks may be followed less finely where there are more of them: they must then say so. */
    @Test
    void aGradeMayBeSplitIntoTwoEqualOnes() {
        Draw draw = new Draw(1130);
        Tally tally = new Tally("several sides: a grade of two sides split in two");
        Tally honest = new Tally("several sides: a grade split in two, over the stated errors");
        for (int i = 0; i < 32; i++) {
            List<Grade> lot = draw.solids(1 + i % 2);
            Grade grade = lot.get(0);
            double part = draw.between(0.01, 0.99);
            List<Grade> split = new ArrayList<>(lot);
            split.set(0, new Grade(grade.sides(), part * grade.volume(), grade.ease()));
            split.add(new Grade(grade.sides(), (1 - part) * grade.volume(), grade.ease()));
            List<Integer> places = new ArrayList<>();
            for (int j = 0; j < lot.size(); j++) {
                places.add(j);
            }
            places.add(0);
            Start start = new Start.Uniform(draw.between(0, Draw.MOST));
            List<Timed> steps = steps(draw, lot);
            Course one = Timed.follow(lot, start, steps);
            Course other = Timed.follow(split, start, steps);
            int last = steps.size() - 1;
            double theta = Bounds.highest(start, steps)[last];
            compare(one, last, other, last, lot, theta, new Tally("unused"), honest);
            if (lot.stream().allMatch(g -> g.sides().size() < 3)) {
                tally.note(worst(one, places, other, start, steps));
            }
        }
        tally.within(1e-11, 12);
        honest.within(1, 32);
    }

    @Test
    void sizesAndTimesScaleTogether() {
        Draw draw = new Draw(1140);
        Tally tally = new Tally("several sides: scaling of sizes and times");
        for (int i = 0; i < 24; i++) {
            List<Grade> lot = draw.solids(1 + i % 3);
            List<Integer> places = new ArrayList<>();
            for (int j = 0; j < lot.size(); j++) {
                places.add(j);
            }
            Start start = new Start.Uniform(draw.between(0, Draw.MOST));
            List<Timed> steps = steps(draw, lot);
            double a = draw.log(0.05, 20);
            List<Grade> larger = lot.stream().map(grade -> scaled(grade, a)).toList();
            Course one = Timed.follow(lot, start, steps);
            Course other = Timed.follow(
                    larger, start, steps.stream().map(step -> scaled(step, a)).toList());
            tally.note(worst(one, places, other, start, steps));
        }
        tally.within(1e-11, 24);
    }

    /** From pieces to pieces through clean liquor each step is self-adjoint: see {@link ReciprocityTest}. */
    @Test
    void theOrderOfTheStepsDoesNotChangeWhatTheLotKeeps() {
        Draw draw = new Draw(1150);
        Tally tally = new Tally("several sides: reciprocity of the steps");
        for (int i = 0; i < 40; i++) {
            List<Grade> lot = draw.solids(1 + i % 3);
            Start start = new Start.Uniform(1);
            List<Timed> steps = new ArrayList<>();
            int count = 2 + draw.below(3);
            for (int k = 0; k < count; k++) {
                steps.add(draw.grained(draw.stage(lot, draw.kind(), 0)));
            }
            List<Timed> reversed = new ArrayList<>(steps);
            Collections.reverse(reversed);
            double there = Timed.follow(lot, start, steps).value(LOT, count - 1);
            tally.note(Math.abs(there - Timed.follow(lot, start, reversed).value(LOT, count - 1)));
        }
        tally.within(1e-11, 40);
    }

    /** In unlimited clean liquor with one film throughout: a product of convex logarithms is one. See {@link ConvexityTest}. */
    @Test
    void theLogarithmOfTheMeanIsConvexInTheDurations() {
        Draw draw = new Draw(1307);
        Tally chords = new Tally("several sides: log(mean) above its chords");
        for (int i = 0; i < 60; i++) {
            List<Grade> lot = draw.solids(1 + i % 3);
            Stage stage = draw.stage(lot, Kind.PLENTY, 0).stage();
            double unit = lot.get(0).length() * lot.get(0).length() / stage.diffusivity();
            double[] t = {unit * draw.log(1e-3, 3), unit * draw.log(1e-3, 3)};
            double[] u = {unit * draw.log(1e-3, 3), unit * draw.log(1e-3, 3)};
            double[] middle = {0.5 * (t[0] + u[0]), 0.5 * (t[1] + u[1])};
            Chain chain = Chain.of(lot, new Start.Uniform(1), List.of(stage, stage));
            Probe mean = new Probe.LotMean();
            double a = Math.log(chain.follow(t).value(mean, 1));
            double b = Math.log(chain.follow(u).value(mean, 1));
            double m = Math.log(chain.follow(middle).value(mean, 1));
            chords.note(Math.max(0, m - 0.5 * (a + b)) / (1 + Math.abs(a) + Math.abs(b)));
        }
        chords.within(1e-14, 60);
    }

    private static List<Timed> steps(Draw draw, List<Grade> lot) {
        List<Timed> steps = new ArrayList<>();
        int count = 1 + draw.below(3);
        for (int k = 0; k < count; k++) {
            steps.add(draw.clinging(draw.grained(draw.stage(lot, draw.kind(), 1))));
        }
        return steps;
    }

    private static Grade scaled(Grade grade, double a) {
        List<Side> sides = grade.sides().stream().map(side -> side.scaled(a)).toList();
        return new Grade(sides, a * a * a * grade.volume(), grade.ease());
    }

    /** Sizes times a, volumes times a^3, times times a^2: Bi, V/S and Qt/V are kept. */
    private static Timed scaled(Timed step, double a) {
        Stage stage = step.stage();
        Surface surface = stage.surfaces().of(0) instanceof Surface.Film film
                ? new Surface.Film(film.coefficient() / a)
                : stage.surfaces().of(0);
        Surroundings around = stage.surroundings() instanceof Surroundings.Vessel v
                ? new Surroundings.Vessel(a * a * a * v.volume(), v.content(), a * v.flow(), v.feed())
                : stage.surroundings();
        double clinging = a * a * a * stage.clinging();
        return new Timed(
                new Stage(stage.diffusivity(), stage.partition(), surface, around, clinging, stage.grain()),
                a * a * step.seconds());
    }

    private static List<Probe> probes(int grade) {
        return List.of(
                new Probe.Mean(grade),
                new Probe.At(grade, 0),
                new Probe.At(grade, 0.6),
                new Probe.Surface(grade),
                new Probe.Highest(grade),
                new Probe.Lowest(grade));
    }

    private static void compare(
            Course one, int k, Course other, int m, List<Grade> lot, double theta, Tally tally, Tally honest) {
        List<Probe> probes = new ArrayList<>(List.of(LIQUOR, LOT));
        for (int j = 0; j < lot.size(); j++) {
            probes.addAll(probes(j));
        }
        double worst = 0;
        double dishonest = 0;
        for (Probe probe : probes) {
            Reading a = one.read(probe, k);
            Reading b = other.read(probe, m);
            double difference = Math.abs(a.value() - b.value());
            // Where so much cannot be promised the stated error says so, and is what counts.
            boolean promised = a.error() + b.error() < 1e-6 * theta;
            worst = Math.max(worst, promised ? difference / theta : 0);
            dishonest = Math.max(dishonest, difference / (a.error() + b.error() + 0x1p-52 * theta));
        }
        tally.note(worst);
        honest.note(dishonest);
    }

    /** Largest difference at the ends of all steps; places says which grade of the first each of the second is. */
    private static double worst(Course one, List<Integer> places, Course other, Start start, List<Timed> steps) {
        double[] bounds = Bounds.highest(start, steps);
        double worst = 0;
        for (int k = 0; k < steps.size(); k++) {
            double inPieces = bounds[k] * steps.get(k).stage().partition();
            worst = Math.max(worst, Math.abs(one.value(LIQUOR, k) - other.value(LIQUOR, k)) / bounds[k]);
            for (int j = 0; j < places.size(); j++) {
                List<Probe> here = probes(places.get(j));
                List<Probe> there = probes(j);
                for (int p = 0; p < here.size(); p++) {
                    double difference = Math.abs(one.value(here.get(p), k) - other.value(there.get(p), k));
                    worst = Math.max(worst, difference / inPieces);
                }
            }
        }
        return worst;
    }
}
