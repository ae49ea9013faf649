package org.soakwright.solver.chain;

import java.util.Arrays;
import java.util.List;
import org.soakwright.solver.shape.Grade;
import org.soakwright.solver.stage.Modes;

/** The pieces as loaded, in the modes of the first stage; found as far as it is asked for. */
final class Loading {
    private final List<Grade> lot;
    private final Start start;
    private final Modes modes;
    private double[] coefficient = new double[0];

    Loading(List<Grade> lot, Start start, Modes modes) {
        this.lot = lot;
        this.start = start;
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
        double content = start instanceof Start.Uniform uniform
                ? uniform.content()
                : ((Start.Polyline) start)
                        .points().stream()
                                .mapToDouble(Start.Point::content)
                                .max()
                                .orElse(0);
        return content / modes.conditions().partition();
    }

    private double of(int mode) {
        double partition = modes.conditions().partition();
        if (start instanceof Start.Uniform uniform) {
            return uniform.content() / partition * modes.uniform(mode);
        }
        double sum = 0;
        for (int j = 0; j < lot.size(); j++) {
            double amplitude = modes.amplitude(j, mode);
            if (amplitude != 0) {
                Grade grade = lot.get(j);
                sum += modes.capacity(j)
                        * amplitude
                        * Projection.mean(start, grade.axis(), modes.frequency(j, mode))
                        / partition;
            }
        }
        return sum;
    }
}
