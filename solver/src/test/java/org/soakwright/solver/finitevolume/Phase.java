package org.soakwright.solver.finitevolume;

import java.util.List;

/**
 * A step, and how the diffusivity differs by direction.
 *
 * @param grain factors on the step's diffusivity by direction; 1 beyond the last
 */
record Phase(Step step, List<Double> grain) {
    static Phase even(Step step) {
        return new Phase(step, List.of());
    }

    double diffusivity(Solid solid, Edge edge) {
        double factor = edge.direction() < grain.size() ? grain.get(edge.direction()) : 1;
        return step.diffusivity() * solid.ease() * factor;
    }
}
