package org.soakwright.solver.identities;

import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.soakwright.solver.chain.Chain;
import org.soakwright.solver.chain.Course;
import org.soakwright.solver.chain.Probe;
import org.soakwright.solver.chain.Sensitivity;
import org.soakwright.solver.chain.StageTooShort;
import org.soakwright.solver.chain.Start;
import org.soakwright.solver.chain.Surroundings;
import org.soakwright.solver.shape.Grade;

/** The adjoint's derivatives are those that small changes show, through drag-out, rests and changes of partition. */
class GradientTest {
    /** Relative change of a duration: of the fourth-order difference's two errors, neither exceeds about 1e-11. */
    private static final double CHANGE = 2e-3;

    @Test
    void derivativesByDurationAgreeWithDifferences() {
        Draw draw = new Draw(801);
        Tally tally = new Tally("derivatives by duration");
        for (int i = 0; i < 200; i++) {
            Case drawn = drawn(draw);
            int last = drawn.steps.size() - 1;
            List<Probe> probes = List.of(
                    new Probe.Mean(0),
                    new Probe.LotMean(),
                    new Probe.At(drawn.lot.size() - 1, draw.between(0, 1)),
                    new Probe.At(0, 1),
                    new Probe.Liquor());
            try {
                Chain chain = Timed.chain(drawn.lot, drawn.start, drawn.steps);
                for (Probe probe : probes) {
                    tally.note(byDuration(chain, drawn, probe, draw.below(last + 1)));
                }
            } catch (StageTooShort refused) {
                tally.skip();
            }
        }
        tally.within(1e-10, 600);
    }

    @Test
    void derivativesOfExtremaAgreeWithDifferencesWhereTheirPlaceMovesSmoothly() {
        Draw draw = new Draw(802);
        Tally tally = new Tally("derivatives of highest, lowest and range by duration");
        int inside = 0;
        for (int i = 0; i < 150; i++) {
            Case drawn = drawn(draw);
            int last = drawn.steps.size() - 1;
            int which = draw.below(last + 1);
            try {
                Chain chain = Timed.chain(drawn.lot, drawn.start, drawn.steps);
                boolean highestJumps = jumps(chain, drawn, which, true);
                boolean lowestJumps = jumps(chain, drawn, which, false);
                if (highestJumps || lowestJumps) {
                    tally.skip();
                    continue;
                }
                Course course = chain.follow(Timed.seconds(drawn.steps));
                double place = course.place(new Probe.Highest(0), last)[0];
                inside += place > 0 && place < 1 ? 1 : 0;
                tally.note(byDuration(chain, drawn, new Probe.Highest(0), which));
                tally.note(byDuration(chain, drawn, new Probe.Lowest(0), which));
                tally.note(byDuration(chain, drawn, new Probe.Range(0), which));
            } catch (StageTooShort refused) {
                tally.skip();
            }
        }
        System.out.println("  of which highest strictly inside: " + inside);
        tally.within(1e-8, 200);
        assertTrue(inside >= 5, "highest inside in " + inside + " draws only");
    }

    @Test
    void derivativesByContentAndFeedAgreeWithDifferences() {
        Draw draw = new Draw(803);
        Tally byContent = new Tally("derivatives by content");
        Tally byFeed = new Tally("derivatives by feed");
        for (int i = 0; i < 200; i++) {
            Case drawn = drawn(draw);
            int last = drawn.steps.size() - 1;
            int which = draw.below(last + 1);
            Surroundings around = drawn.steps.get(which).stage().surroundings();
            double step = 7;
            List<Timed> more = changed(drawn.steps, which, step, 0);
            List<Timed> richer = changed(drawn.steps, which, 0, step);
            double scale = scale(drawn, last);
            try {
                Course course = Timed.follow(drawn.lot, drawn.start, drawn.steps);
                Course withMore = Timed.follow(drawn.lot, drawn.start, more);
                for (Probe probe :
                        List.of(new Probe.Mean(0), new Probe.LotMean(), new Probe.At(0, 0.7), new Probe.Liquor())) {
                    Sensitivity found = course.sensitivity(probe, last);
                    double before = course.value(probe, last);
                    double difference = withMore.value(probe, last) - before;
                    byContent.note(Math.abs(found.byContent()[which] * step - difference) / scale);
                    if (around instanceof Surroundings.Vessel vessel && vessel.flow() > 0) {
                        double fed =
                                Timed.follow(drawn.lot, drawn.start, richer).value(probe, last) - before;
                        byFeed.note(Math.abs(found.byFeed()[which] * step - fed) / scale);
                    } else {
                        byFeed.note(Math.abs(found.byFeed()[which]));
                    }
                }
            } catch (StageTooShort refused) {
                byContent.skip();
                byFeed.skip();
            }
        }
        byContent.within(2e-14, 500);
        byFeed.within(2e-14, 500);
    }

    private record Case(List<Grade> lot, Start start, List<Timed> steps) {}

    private static Case drawn(Draw draw) {
        List<Grade> lot = draw.lot(3);
        List<Timed> steps = new ArrayList<>();
        int count = 1 + draw.below(4);
        for (int k = 0; k < count; k++) {
            steps.add(draw.clinging(draw.stage(lot, draw.kind(), 1)));
        }
        return new Case(lot, draw.start(), steps);
    }

    /** The departure of one derivative, as a change of the reading when the duration changes by itself. */
    private static double byDuration(Chain chain, Case drawn, Probe probe, int which) {
        int last = drawn.steps.size() - 1;
        double[] seconds = Timed.seconds(drawn.steps);
        double[] value = new double[5];
        for (int i = -2; i <= 2; i++) {
            double[] changed = seconds.clone();
            changed[which] *= 1 + i * CHANGE;
            value[i + 2] = chain.follow(changed).value(probe, last);
        }
        double difference = (8 * (value[3] - value[1]) - (value[4] - value[0])) / (12 * CHANGE);
        double found = chain.follow(seconds).gradient(probe, last)[which] * seconds[which];
        return Math.abs(found - difference) / scale(drawn, last);
    }

    /** Whether the extremum of the first grade changes to another place, rather than moving a little. */
    private static boolean jumps(Chain chain, Case drawn, int which, boolean highest) {
        int last = drawn.steps.size() - 1;
        double least = 1;
        double most = 0;
        for (int i = -2; i <= 2; i++) {
            double[] changed = Timed.seconds(drawn.steps);
            changed[which] *= 1 + i * CHANGE;
            Course course = chain.follow(changed);
            double place =
                    highest ? course.place(new Probe.Highest(0), last)[0] : course.place(new Probe.Lowest(0), last)[0];
            least = Math.min(least, place);
            most = Math.max(most, place);
        }
        boolean leavesAnEnd = (least == 0) != (most == 0) || (least == 1) != (most == 1);
        return most - least > 0.02 || leavesAnEnd;
    }

    private static double scale(Case drawn, int last) {
        double theta = Bounds.highest(drawn.start, drawn.steps)[last];
        return theta * Math.max(1, drawn.steps.get(last).stage().partition());
    }

    private static List<Timed> changed(List<Timed> steps, int which, double content, double feed) {
        List<Timed> changed = new ArrayList<>(steps);
        Surroundings around = steps.get(which).stage().surroundings();
        Surroundings other = around;
        if (around instanceof Surroundings.Vessel v) {
            other = new Surroundings.Vessel(v.volume(), v.content() + content, v.flow(), v.feed() + feed);
        } else if (around instanceof Surroundings.Plenty plenty) {
            other = new Surroundings.Plenty(plenty.content() + content);
        } else if (around instanceof Surroundings.Air air) {
            other = new Surroundings.Air(air.equilibrium() + content);
        }
        changed.set(which, steps.get(which).with(other));
        return changed;
    }
}
