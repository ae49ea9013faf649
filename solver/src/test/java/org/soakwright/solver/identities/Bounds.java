package org.soakwright.solver.identities;

import java.util.List;
import org.soakwright.solver.chain.Start;
import org.soakwright.solver.chain.Surroundings;

/** The range that contents cannot leave, in liquor equivalents, stage by stage: what errors are measured against. */
final class Bounds {
    private Bounds() {}

    /** Largest theta or liquor content that each stage can begin with. */
    static double[] highest(Start start, List<Timed> steps) {
        double[] highest = new double[steps.size()];
        double content = start instanceof Start.Uniform uniform
                ? uniform.content()
                : ((Start.Polyline) start)
                        .points().stream()
                                .mapToDouble(Start.Point::content)
                                .max()
                                .orElseThrow();
        double liquor = 0;
        for (int k = 0; k < highest.length; k++) {
            double partition = steps.get(k).stage().partition();
            Surroundings around = steps.get(k).stage().surroundings();
            double high = content / partition;
            if (around instanceof Surroundings.Vessel vessel) {
                high = Math.max(Math.max(high, liquor), Math.max(vessel.content(), vessel.feed()));
            } else if (around instanceof Surroundings.Plenty plenty) {
                high = Math.max(high, plenty.content());
            } else if (around instanceof Surroundings.Air air) {
                high = Math.max(high, air.equilibrium());
            }
            highest[k] = high;
            content = partition * high;
            liquor = around instanceof Surroundings.Vessel || around instanceof Surroundings.Plenty ? high : liquor;
        }
        return highest;
    }
}
