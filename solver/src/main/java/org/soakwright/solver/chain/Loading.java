package org.soakwright.solver.chain;

import java.util.Arrays;
import java.util.List;
import org.soakwright.solver.shape.Grade;
import org.soakwright.solver.stage.Modes;

/** The pieces as loaded, in the modes of the first stage; found as far as it is asked for. */
final class Loading {
    private final List<Grade> lot;
    private final List<Start> starts;
    private final Modes modes;
    private double[] coefficient = new double[0];

    Loading(List<Grade> lot, List<Start> starts, Modes modes) {
        this.lot = lot;
        this.starts = starts;
        this.modes = modes;
    }

    void addTo(double[] c) {
        int known = coefficient.length;
        if (c.length > known) {
            coefficient = Arrays.copyOf(coefficient, c.length);
            for (int m = known; m < c.length; m++) {
                coefficient[m] = of(m);
            }
        }
        for (int m = 0; m < c.length; m++) {
            c[m] += coefficient[m];
        }
    }

    /** Largest theta anywhere. */
    double most() {
        return starts.stream().mapToDouble(Start::most).max().orElseThrow()
                / modes.conditions().partition();
    }

    private double of(int mode) {
        double partition = modes.conditions().partition();
        double sum = 0;
        for (int j = 0; j < lot.size(); j++) {
            double mean = starts.get(j) instanceof Start.Uniform uniform
                    ? uniform.content() * modes.mean(j, mode)
                    : modes.amplitude(j, mode)
                            * Projection.mean(starts.get(j), lot.get(j).axis(), modes.frequency(j, mode));
            sum += modes.capacity(j) * mean / partition;
        }
        return sum;
    }
}
