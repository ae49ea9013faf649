package org.soakwright.solver.identities;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.soakwright.solver.chain.Chain;
import org.soakwright.solver.chain.Course;
import org.soakwright.solver.chain.Probe;
import org.soakwright.solver.chain.Reading;
import org.soakwright.solver.chain.Sensitivity;
import org.soakwright.solver.chain.Stage;
import org.soakwright.solver.chain.StageTooShort;
import org.soakwright.solver.chain.Start;
import org.soakwright.solver.chain.Surroundings;
import org.soakwright.solver.identities.Draw.Kind;
import org.soakwright.solver.shape.Axis;
import org.soakwright.solver.shape.Grade;
import org.soakwright.solver.stage.Surface;
import org.soakwright.solver.stage.Surfaces;

/** Films and skins that differ by grade, in lots of one axis and of several, whichever way they are followed. */
class SurfacesByGradeTest {
    private static final Probe LIQUOR = new Probe.Liquor();
    private static final Probe LOT = new Probe.LotMean();
    private static final double CHANGE = 2e-3;

    /** Lots drawn in turn: of one axis, of several axes in shared liquors, of several axes in liquors that nothing changes. */
    private record Case(List<Grade> lot, Start start, List<Timed> steps) {
        Course follow() {
            return Timed.follow(lot, start, steps);
        }

        int last() {
            return steps.size() - 1;
        }

        Case with(List<Timed> others) {
            return new Case(lot, start, others);
        }
    }

    private static Case drawn(Draw draw, int turn, int least) {
        List<Grade> lot = turn % 3 == 0 ? draw.lot(4) : draw.solids(least + draw.below(2));
        while (lot.size() < least) {
            lot = draw.lot(4);
        }
        List<Timed> steps = new ArrayList<>();
        int count = 1 + draw.below(3);
        for (int k = 0; k < count; k++) {
            Kind kind = draw.kind();
            while (turn % 3 == 2 && (kind == Kind.CLOSED || kind == Kind.FLOWING)) {
                kind = draw.kind();
            }
            steps.add(dressed(draw, draw.clinging(draw.grained(draw.stage(lot, kind, 1))), lot.size()));
        }
        return new Case(lot, new Start.Uniform(draw.between(0, Draw.MOST)), steps);
    }

    /** Each grade with a surface of its own, now and then an open one. */
    private static Timed dressed(Draw draw, Timed timed, int grades) {
        if (timed.stage().surfaces().sealed()) {
            return timed;
        }
        double unit = timed.stage().partition() * timed.stage().diffusivity() / 4e-3;
        List<Surface> surfaces = new ArrayList<>();
        for (int j = 0; j < grades; j++) {
            surfaces.add(draw.below(4) == 0 ? new Surface.Open() : new Surface.Film(unit * draw.log(1e-2, 1e3)));
        }
        return with(timed, new Surfaces.ByGrade(surfaces));
    }

    private static Timed with(Timed timed, Surfaces surfaces) {
        Stage stage = timed.stage();
        return timed.with(new Stage(
                stage.diffusivity(),
                stage.partition(),
                surfaces,
                stage.surroundings(),
                stage.clinging(),
                stage.grain()));
    }

    /** A stage for grades in another order, or for more of them. */
    private static Timed arranged(Timed timed, List<Integer> places) {
        Surfaces surfaces = timed.stage().surfaces();
        return surfaces.sealed()
                ? timed
                : with(
                        timed,
                        new Surfaces.ByGrade(places.stream().map(surfaces::of).toList()));
    }

    @Test
    void alikeForEveryGradeIsOneForAll() {
        Draw draw = new Draw(2101);
        Tally tally = new Tally("surfaces alike by grade against one for all");
        for (int i = 0; i < 60; i++) {
            Case one = drawn(draw, i, 1);
            List<Timed> same = one.steps.stream()
                    .map(step -> with(
                            step, new Surfaces.Alike(step.stage().surfaces().of(0))))
                    .toList();
            List<Timed> each = same.stream()
                    .map(step -> with(
                            step,
                            new Surfaces.ByGrade(Collections.nCopies(
                                    one.lot.size(), step.stage().surfaces().of(0)))))
                    .toList();
            try {
                Course alike = one.with(same).follow();
                Course byGrade = one.with(each).follow();
                for (int k = 0; k <= one.last(); k++) {
                    for (Probe probe : probes(one.lot)) {
                        Reading a = alike.read(probe, k);
                        Reading b = byGrade.read(probe, k);
                        tally.note(Math.abs(a.value() - b.value()) + Math.abs(a.error() - b.error()));
                    }
                }
            } catch (StageTooShort refused) {
                tally.skip();
            }
        }
        tally.within(0, 800);
    }

    @Test
    void theOrderOfTheGradesDoesNotMatter() {
        Draw draw = new Draw(2102);
        Tally tally = new Tally("surfaces by grade: order of the grades");
        for (int i = 0; i < 60; i++) {
            Case one = drawn(draw, i, 2);
            List<Integer> places = new ArrayList<>();
            for (int j = 0; j < one.lot.size(); j++) {
                places.add(j);
            }
            Collections.shuffle(places, new Random(i));
            rearranged(one, places, one.lot, tally);
        }
        tally.within(1e-12, 50);
    }

    @Test
    void aGradeMayBeSplitIntoTwoOfTheSameFilm() {
        Draw draw = new Draw(2103);
        Tally tally = new Tally("surfaces by grade: a grade split in two");
        for (int i = 0; i < 60; i++) {
            Case one = drawn(draw, i, 1);
            if (one.lot.stream().anyMatch(grade -> grade.sides().size() == 3)) {
                // Bricks may be followed less finely where there are more of them.
                tally.skip();
                continue;
            }
            Grade grade = one.lot.get(0);
            double part = draw.between(0.01, 0.99);
            List<Grade> split = new ArrayList<>(one.lot);
            split.set(0, new Grade(grade.sides(), part * grade.volume(), grade.ease()));
            split.add(new Grade(grade.sides(), (1 - part) * grade.volume(), grade.ease()));
            List<Integer> places = new ArrayList<>();
            for (int j = 0; j < one.lot.size(); j++) {
                places.add(j);
            }
            places.add(0);
            rearranged(one, places, split, tally);
        }
        tally.within(1e-12, 35);
    }

    /** Follows the lot and another writing of it; places says which grade of the first each of the second is. */
    private static void rearranged(Case one, List<Integer> places, List<Grade> volumes, Tally tally) {
        List<Grade> lot = new ArrayList<>();
        for (int j = 0; j < places.size(); j++) {
            Grade same = one.lot.get(places.get(j));
            lot.add(
                    volumes == one.lot
                            ? same
                            : new Grade(same.sides(), volumes.get(j).volume(), same.ease()));
        }
        List<Timed> steps =
                one.steps.stream().map(step -> arranged(step, places)).toList();
        try {
            Course course = one.follow();
            Course other = Timed.follow(lot, one.start, steps);
            double worst = 0;
            double[] bounds = Bounds.highest(one.start, one.steps);
            for (int k = 0; k <= one.last(); k++) {
                double inPieces = bounds[k] * one.steps.get(k).stage().partition();
                worst = Math.max(worst, Math.abs(course.value(LIQUOR, k) - other.value(LIQUOR, k)) / bounds[k]);
                for (int j = 0; j < places.size(); j++) {
                    for (Probe probe : ofGrade(places.get(j))) {
                        double difference = Math.abs(course.value(probe, k) - other.value(probe.of(j), k));
                        worst = Math.max(worst, difference / inPieces);
                    }
                }
            }
            tally.note(worst);
        } catch (StageTooShort refused) {
            tally.skip();
        }
    }

    @Test
    void aClosedBathConservesTheSolute() {
        Draw draw = new Draw(2104);
        Tally tally = new Tally("surfaces by grade: balance of closed baths");
        for (int i = 0; i < 120; i++) {
            List<Grade> lot = i % 2 == 0 ? draw.lot(5) : draw.solids(1 + i % 3);
            double content = draw.between(0, Draw.MOST);
            Start start = new Start.Uniform(content);
            Timed first = dressed(draw, draw.clinging(draw.stage(lot, Kind.CLOSED, 1)), lot.size());
            Timed second = dressed(draw, draw.stage(lot, Kind.CLOSED, 1), lot.size());
            List<Timed> steps = List.of(first, second);
            try {
                Course course = Timed.follow(lot, start, steps);
                double pieces = Draw.capacity(lot, 1);
                double clinging = first.stage().clinging();
                double poured = vessel(second).volume();
                double loaded = pieces * content
                        + vessel(first).volume() * vessel(first).content();
                double between = pieces * course.value(LOT, 0) + vessel(first).volume() * course.value(LIQUOR, 0);
                double before = pieces * course.value(LOT, 0)
                        + clinging * course.value(LIQUOR, 0)
                        + poured * vessel(second).content();
                double after = pieces * course.value(LOT, 1) + (poured + clinging) * course.value(LIQUOR, 1);
                double[] bounds = Bounds.highest(start, steps);
                double first1 = Draw.capacity(lot, first.stage().partition())
                        + vessel(first).volume();
                double second1 = Draw.capacity(lot, second.stage().partition()) + poured + clinging;
                tally.note(Math.abs(between - loaded) / (first1 * bounds[0]));
                tally.note(Math.abs(after - before) / (second1 * bounds[1]));
            } catch (StageTooShort refused) {
                tally.skip();
            }
        }
        tally.within(1e-13, 150);
    }

    @Test
    void derivativesAgreeWithDifferences() {
        Draw draw = new Draw(2105);
        Tally byDuration = new Tally("surfaces by grade: derivatives by duration");
        Tally byContent = new Tally("surfaces by grade: derivatives by content");
        for (int i = 0; i < 90; i++) {
            Case one = drawn(draw, i, 2);
            int which = draw.below(one.steps.size());
            double scale = Bounds.highest(one.start, one.steps)[one.last()]
                    * Math.max(1, one.steps.get(one.last()).stage().partition());
            List<Probe> probes = List.of(new Probe.Mean(0), LOT, new Probe.Surface(1), new Probe.At(1, 0.4), LIQUOR);
            try {
                Chain chain = Timed.chain(one.lot, one.start, one.steps);
                Course course = chain.follow(Timed.seconds(one.steps));
                Course more = one.with(richer(one.steps, which, 7)).follow();
                for (Probe probe : probes) {
                    Sensitivity found = course.sensitivity(probe, one.last());
                    double seconds = one.steps.get(which).seconds();
                    byDuration.note(
                            Math.abs(found.bySeconds()[which] * seconds - slope(chain, one, probe, which)) / scale);
                    double gained = more.value(probe, one.last()) - course.value(probe, one.last());
                    byContent.note(Math.abs(found.byContent()[which] * 7 - gained) / scale);
                }
            } catch (StageTooShort refused) {
                byDuration.skip();
            }
        }
        byDuration.within(1e-10, 300);
        byContent.within(1e-13, 300);
    }

    private static double slope(Chain chain, Case one, Probe probe, int which) {
        double[] value = new double[5];
        for (int i = -2; i <= 2; i++) {
            double[] changed = Timed.seconds(one.steps);
            changed[which] *= 1 + i * CHANGE;
            value[i + 2] = chain.follow(changed).value(probe, one.last());
        }
        return (8 * (value[3] - value[1]) - (value[4] - value[0])) / (12 * CHANGE);
    }

    private static List<Timed> richer(List<Timed> steps, int which, double by) {
        List<Timed> changed = new ArrayList<>(steps);
        Surroundings around = steps.get(which).stage().surroundings();
        Surroundings richer = around;
        if (around instanceof Surroundings.Vessel v) {
            richer = new Surroundings.Vessel(v.volume(), v.content() + by, v.flow(), v.feed());
        } else if (around instanceof Surroundings.Plenty plenty) {
            richer = new Surroundings.Plenty(plenty.content() + by);
        } else if (around instanceof Surroundings.Air air) {
            richer = new Surroundings.Air(air.equilibrium() + by);
        }
        changed.set(which, steps.get(which).with(richer));
        return changed;
    }

    @Test
    void aThickerFilmHoldsBackItsOwnGradeAndLeavesMoreRoomToTheOthers() {
        List<Grade> lot = List.of(new Grade(Axis.SLAB, 4e-3, 1e-3), new Grade(Axis.SLAB, 4e-3, 1e-3));
        Surface bare = new Surface.Film(2e-6);
        Stage both = new Stage(1e-9, 1, bare, new Surroundings.Vessel(1e-3, 0, 0, 0), 0);
        Stage skinned = with(new Timed(both, 1), new Surfaces.ByGrade(List.of(bare, Surface.inSeries(2e-6, 2e-7))))
                .stage();
        Course alike = Timed.follow(lot, new Start.Uniform(80), List.of(new Timed(both, 7200)));
        Course apart = Timed.follow(lot, new Start.Uniform(80), List.of(new Timed(skinned, 7200)));
        assertTrue(apart.value(new Probe.Mean(1), 0) > alike.value(new Probe.Mean(1), 0) + 1);
        assertTrue(apart.value(new Probe.Mean(0), 0) < alike.value(new Probe.Mean(0), 0) - 1);
    }

    @Test
    void resistancesInSeriesAdd() {
        assertEquals(new Surface.Film(1.5e-6), Surface.inSeries(3e-6, 3e-6));
        assertEquals(new Surface.Film(4e-7), Surface.inSeries(Double.POSITIVE_INFINITY, 4e-7));
        assertEquals(
                "permeance must be above 0 and finite, found 0.0 m/s",
                assertThrows(IllegalArgumentException.class, () -> Surface.inSeries(3e-6, 0))
                        .getMessage());
        assertEquals(
                "film coefficient must be above 0 and finite, found -Infinity m/s",
                assertThrows(IllegalArgumentException.class, () -> Surface.inSeries(Double.NEGATIVE_INFINITY, 1e-6))
                        .getMessage());
    }

    @Test
    void whatDoesNotGoTogetherIsRefused() {
        Surface film = new Surface.Film(1e-6);
        assertEquals(
                "either all grades are sealed or none, found [Film[coefficient=1.0E-6], Sealed[]]",
                assertThrows(
                                IllegalArgumentException.class,
                                () -> new Surfaces.ByGrade(List.of(film, new Surface.Sealed())))
                        .getMessage());
        Stage stage = new Stage(
                1e-9,
                1,
                new Surfaces.ByGrade(List.of(film, film)),
                new Surroundings.Plenty(0),
                0,
                org.soakwright.solver.shape.Grain.NONE);
        List<Grade> lot = List.of(new Grade(Axis.SLAB, 4e-3, 1e-3));
        assertEquals(
                "a surface for each of 1 grades is wanted, or one for all; found 2",
                assertThrows(IllegalArgumentException.class, () -> Chain.of(lot, new Start.Uniform(1), List.of(stage)))
                        .getMessage());
    }

    private static List<Probe> probes(List<Grade> lot) {
        List<Probe> probes = new ArrayList<>(List.of(LIQUOR, LOT));
        for (int j = 0; j < lot.size(); j++) {
            probes.addAll(ofGrade(j));
        }
        return probes;
    }

    private static List<Probe> ofGrade(int grade) {
        return List.of(
                new Probe.Mean(grade), new Probe.At(grade, 0), new Probe.At(grade, 0.7), new Probe.Surface(grade));
    }

    private static Surroundings.Vessel vessel(Timed timed) {
        return (Surroundings.Vessel) timed.stage().surroundings();
    }
}
