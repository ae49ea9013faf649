package org.soakwright.solver.identities;

import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.soakwright.solver.chain.Course;
import org.soakwright.solver.chain.Probe;
import org.soakwright.solver.chain.StageTooShort;
import org.soakwright.solver.chain.Start;
import org.soakwright.solver.chain.Surroundings;
import org.soakwright.solver.shape.Grade;

/** In a stage nothing rises above, or falls below, all that it began with or that runs in. */
class MaximumPrincipleTest {
    @Test
    void noStageWidensTheRangeOfContents() {
        Draw draw = new Draw(601);
        Tally tally = new Tally("maximum principle, overshoot");
        for (int i = 0; i < 160; i++) {
            List<Grade> lot = draw.lot(2);
            Start start = draw.start();
            List<Timed> steps = new ArrayList<>();
            int count = 1 + draw.below(3);
            for (int k = 0; k < count; k++) {
                steps.add(draw.clinging(draw.stage(lot, draw.kind(), 1)));
            }
            try {
                tally.note(overshoot(Timed.follow(lot, start, steps), lot, start, steps));
            } catch (StageTooShort refused) {
                tally.skip();
            }
        }
        tally.within(2e-13, 120);
    }

    private static double overshoot(Course course, List<Grade> lot, Start start, List<Timed> steps) {
        double[] scale = Bounds.highest(start, steps);
        double low = contents(start).stream().mapToDouble(c -> c).min().orElseThrow();
        double high = contents(start).stream().mapToDouble(c -> c).max().orElseThrow();
        double liquor = 0;
        double clinging = 0;
        double worst = 0;
        for (int k = 0; k < steps.size(); k++) {
            double partition = steps.get(k).stage().partition();
            Surroundings around = steps.get(k).stage().surroundings();
            List<Double> met = new ArrayList<>();
            if (around instanceof Surroundings.Vessel vessel) {
                met.add((vessel.volume() * vessel.content() + clinging * liquor) / (vessel.volume() + clinging));
                if (vessel.flow() > 0) {
                    met.add(vessel.feed());
                }
            } else if (around instanceof Surroundings.Plenty plenty) {
                met.add(plenty.content());
            } else if (around instanceof Surroundings.Air air) {
                met.add(air.equilibrium());
            }
            double floor = met.stream().mapToDouble(c -> c).reduce(low / partition, Math::min);
            double ceiling = met.stream().mapToDouble(c -> c).reduce(high / partition, Math::max);
            low = Double.POSITIVE_INFINITY;
            high = Double.NEGATIVE_INFINITY;
            for (int j = 0; j < lot.size(); j++) {
                low = Math.min(low, course.value(new Probe.Lowest(j), k));
                high = Math.max(high, course.value(new Probe.Highest(j), k));
            }
            worst = Math.max(worst, (floor - low / partition) / scale[k]);
            worst = Math.max(worst, (high / partition - ceiling) / scale[k]);
            if (around instanceof Surroundings.Vessel || around instanceof Surroundings.Plenty) {
                liquor = course.value(new Probe.Liquor(), k);
                clinging = steps.get(k).stage().clinging();
                worst = Math.max(worst, Math.max(floor - liquor, liquor - ceiling) / scale[k]);
            }
        }
        return worst;
    }

    private static List<Double> contents(Start start) {
        return start instanceof Start.Uniform uniform
                ? List.of(uniform.content())
                : ((Start.Polyline) start)
                        .points().stream().map(Start.Point::content).toList();
    }
}
