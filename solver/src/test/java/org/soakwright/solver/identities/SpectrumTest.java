package org.soakwright.solver.identities;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.soakwright.solver.chain.Chain;
import org.soakwright.solver.chain.Course;
import org.soakwright.solver.chain.Probe;
import org.soakwright.solver.chain.Stage;
import org.soakwright.solver.chain.StageTooShort;
import org.soakwright.solver.chain.Start;
import org.soakwright.solver.chain.Surroundings;
import org.soakwright.solver.shape.Axis;
import org.soakwright.solver.shape.Grade;
import org.soakwright.solver.stage.Bath;
import org.soakwright.solver.stage.Conditions;
import org.soakwright.solver.stage.Modes;
import org.soakwright.solver.stage.Surface;

/** Poles that almost coincide, and liquor that hardly notices the pieces, leave the modes complete and orthonormal. */
class SpectrumTest {
    private static final double DIFFUSIVITY = 1e-9;
    private static final double LENGTH = 4e-3;
    private static final double PACE = DIFFUSIVITY / (LENGTH * LENGTH);
    /** Rates up to that of 25 half-waves in the reference length. */
    private static final double LIMIT = PACE * Math.pow(25 * Math.PI, 2);

    @Test
    void gradesOfAlmostOneSizeKeepTheirModesOrthonormal() {
        Draw draw = new Draw(901);
        for (int decade = -15; decade <= -1; decade++) {
            Tally tally = new Tally(
                    String.format(Locale.ROOT, "all pairs of modes, size gap 1e%d to 1e%d", decade - 1, decade));
            for (int i = 0; i < 24; i++) {
                double gap = draw.log(Math.pow(10, decade - 1), Math.pow(10, decade));
                Axis axis = draw.axis();
                List<Grade> lot = new ArrayList<>();
                for (int j = 0; j <= 1 + i % 2; j++) {
                    lot.add(new Grade(axis, LENGTH * (1 + j * gap), 1e-3 * draw.log(0.1, 10)));
                }
                Modes modes = new Modes(lot, conditions(draw, lot, 1e-3, 1e3, i));
                tally.note(gramDefect(modes, modes.upTo(LIMIT)));
            }
            tally.within(1e-12, 24);
        }
    }

    @Test
    void shapesThatSharePolesKeepTheirModesOrthonormal() {
        Draw draw = new Draw(902);
        Tally tally = new Tally("all pairs of modes, shapes and sizes with common poles");
        for (int i = 0; i < 60; i++) {
            List<Grade> lot = commensurate(draw, i);
            Modes modes = new Modes(lot, conditions(draw, lot, 1e-3, 1e3, 0));
            tally.note(gramDefect(modes, modes.upTo(LIMIT)));
        }
        tally.within(1e-12, 60);
    }

    @Test
    void noModeIsMissedHoweverTheSpectrumGrows() {
        Draw draw = new Draw(903);
        Tally tally = new Tally("modes missed in growing spectra");
        for (int i = 0; i < 400; i++) {
            List<Grade> lot = i % 2 == 0 ? commensurate(draw, i) : twins(draw);
            Conditions coupled = conditions(draw, lot, 1e-2, 1e2, i % 4 < 2 ? 0 : 1);
            if (coupled.biot(lot.get(0)) < 0.1) {
                // Modes so weakly coupled that their rates round to those of the poles cannot be counted by rate.
                tally.skip();
                continue;
            }
            Modes plain = new Modes(
                    lot,
                    new Conditions(
                            DIFFUSIVITY, coupled.partition(), coupled.surfaces().of(0), new Bath.Unlimited()));
            Modes modes = new Modes(lot, coupled);
            double limit = PACE * draw.log(0.1, 10);
            while (limit < LIMIT) {
                modes.upTo(limit);
                limit *= draw.between(1.1, 4);
            }
            // Each gap between poles holds one mode and each pole of m grades m - 1 more, so that at the last of any
            // close poles there are as many modes as poles.
            plain.upTo(2 * LIMIT);
            int poles = plain.upTo(LIMIT);
            while (plain.rate(poles) - plain.rate(poles - 1) < 1e-9 * plain.rate(poles)) {
                poles++;
            }
            tally.note(Math.abs(poles - modes.upTo(plain.rate(poles - 1))));
        }
        tally.within(0, 250);
    }

    @Test
    void whatAChainWasAskedBeforeDoesNotMatter() {
        Draw draw = new Draw(906);
        Tally tally = new Tally("readings of used chains against fresh ones");
        Start start = new Start.Polyline(List.of(new Start.Point(0, 1), new Start.Point(1, 0)));
        for (int i = 0; i < 50; i++) {
            List<Grade> lot = commensurate(draw, i);
            Timed first = draw.stage(lot, Draw.Kind.CLOSED, 0);
            Timed second = draw.stage(lot, Draw.Kind.FLOWING, 0);
            Surface none = new Surface.Open();
            List<Timed> steps = Stream.of(first, second)
                    .map(s -> s.with(new Stage(
                            s.stage().diffusivity(),
                            s.stage().partition(),
                            none,
                            s.stage().surroundings(),
                            0)))
                    .toList();
            try {
                Course fresh = Timed.follow(lot, start, steps);
                Chain used = Timed.chain(lot, start, steps);
                double[] seconds = Timed.seconds(steps);
                for (double longer = draw.log(30, 3000); longer > 1; longer /= draw.between(1.2, 8)) {
                    used.follow(longer * seconds[0], longer * seconds[1]);
                }
                Course course = used.follow(seconds);
                double worst = 0;
                for (int j = 0; j < lot.size(); j++) {
                    for (int k = 0; k < 2; k++) {
                        Probe probe = new Probe.At(j, 0.9);
                        worst = Math.max(worst, Math.abs(fresh.value(probe, k) - course.value(probe, k)));
                    }
                }
                tally.note(worst);
            } catch (StageTooShort refused) {
                tally.skip();
            }
        }
        tally.within(1e-11, 40);
    }

    @Test
    void muchLiquorLeavesModesOrthonormalAndTheBalanceWhole() {
        for (double much : new double[] {1e6, 1e9}) {
            Draw draw = new Draw(904);
            Tally gram = new Tally(String.format(Locale.ROOT, "all pairs of modes, V/S %.0e", much));
            Tally balance = new Tally(String.format(Locale.ROOT, "balance of the pieces' solute, V/S %.0e", much));
            for (int i = 0; i < 60; i++) {
                List<Grade> lot = draw.lot(4);
                Conditions conditions = conditions(draw, lot, much, 1.0001 * much, i % 2);
                Modes modes = new Modes(lot, conditions);
                gram.note(gramDefect(modes, modes.upTo(conditions.pace(lot.get(0)) * 4000)));
                Timed step = draw.stage(lot, Draw.Kind.CLOSED, 0);
                double volume = much * Draw.capacity(lot, step.stage().partition());
                step = step.with(new Surroundings.Vessel(volume, 0, 0, 0))
                        .lasting(Math.max(
                                step.seconds(),
                                1e-3
                                        * lot.get(0).length()
                                        * lot.get(0).length()
                                        / step.stage().diffusivity()));
                Course course = Timed.follow(lot, new Start.Uniform(1), List.of(step));
                double pieces = Draw.capacity(lot, 1);
                double lost = pieces * (1 - course.value(new Probe.LotMean(), 0));
                balance.note(Math.abs(lost - volume * course.value(new Probe.Liquor(), 0)) / pieces);
            }
            gram.within(1e-13, 60);
            balance.within(1e-14, 60);
        }
    }

    @Test
    void theStatedDefectIsOfTheSizeOfTheWorstPair() {
        Draw draw = new Draw(905);
        Tally tally = new Tally("worst pair of modes over the stated defect and rounding");
        for (int i = 0; i < 100; i++) {
            List<Grade> lot = draw.lot(4);
            Modes modes = new Modes(lot, conditions(draw, lot, 1e-3, 1e6, i % 2));
            int count = modes.upTo(LIMIT);
            tally.note(gramDefect(modes, count) / (modes.defect(count) + 32 * 0x1p-53));
        }
        tally.within(10, 100);
    }

    /** Pairs of which every second or third pole agrees: slabs of 1 and 3, a slab and a sphere of twice its size. */
    private static List<Grade> commensurate(Draw draw, int turn) {
        double a = draw.log(0.5, 2) * LENGTH;
        double b = draw.log(0.1, 10);
        return switch (turn % 3) {
            case 0 -> List.of(new Grade(Axis.SLAB, a, 1e-3), new Grade(Axis.SLAB, 3 * a, 1e-3 * b));
            case 1 -> List.of(new Grade(Axis.SLAB, a, 1e-3), new Grade(Axis.SPHERE, 2 * a, 1e-3 * b));
            default ->
                List.of(
                        new Grade(Axis.SPHERE, a, 1e-3),
                        new Grade(Axis.SPHERE, 2 * a, 1e-3 * b),
                        new Grade(Axis.SPHERE, 3 * a, 1e-3));
        };
    }

    /** Two grades whose sizes differ in the last places only. */
    private static List<Grade> twins(Draw draw) {
        Axis axis = draw.axis();
        double a = draw.log(0.5, 2) * LENGTH;
        return List.of(
                new Grade(axis, a, 1e-3), new Grade(axis, a * (1 + draw.log(1e-16, 1e-12)), 1e-3 * draw.log(0.1, 10)));
    }

    /** Turn 0: without film; else Bi 1e-6 to 1e6. Even turns closed, odd ones flowing. */
    private static Conditions conditions(Draw draw, List<Grade> lot, double least, double most, int turn) {
        double partition = draw.log(0.1, 10);
        Surface surface = turn == 0
                ? new Surface.Open()
                : new Surface.Film(draw.log(1e-6, 1e6) * partition * DIFFUSIVITY / LENGTH);
        double volume = Draw.capacity(lot, partition) * draw.log(least, most);
        double flow = turn % 2 == 0 ? 0 : volume * PACE * draw.log(1e-3, 1e3);
        return new Conditions(DIFFUSIVITY, partition, surface, new Bath.Vessel(volume, flow));
    }

    private static double gramDefect(Modes modes, int count) {
        double volume = ((Bath.Vessel) modes.conditions().bath()).volume();
        double worst = 0;
        for (int n = 0; n < count; n++) {
            for (int m = n; m < count; m++) {
                double product = modes.overlap(n, modes, m) + volume * modes.liquor(n) * modes.liquor(m);
                worst = Math.max(worst, Math.abs(product - (n == m ? 1 : 0)));
            }
        }
        return worst;
    }
}
