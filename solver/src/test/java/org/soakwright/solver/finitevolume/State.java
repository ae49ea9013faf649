package org.soakwright.solver.finitevolume;

import java.util.ArrayList;
import java.util.List;

/**
 * The end of a phase.
 *
 * @param fields one for each kind of body
 * @param liquor content of the liquor last met, kg/m3
 * @param drive largest difference that has driven anything so far, kg/m3 in liquor
 */
record State(List<Field> fields, double liquor, double drive) {
    /** The sum of a times this and b times the other, whose mesh may be finer by a whole factor. */
    State combine(double a, State other, double b) {
        List<Field> sums = new ArrayList<>();
        for (int j = 0; j < fields.size(); j++) {
            sums.add(fields.get(j).combine(a, other.fields.get(j), b));
        }
        return new State(sums, a * liquor + b * other.liquor, Math.max(drive, other.drive));
    }

    /** Mean over the lot. */
    double lotMean(List<Solid> lot) {
        double held = 0;
        double volume = 0;
        for (int j = 0; j < lot.size(); j++) {
            held += lot.get(j).volume() * fields.get(j).mean();
            volume += lot.get(j).volume();
        }
        return held / volume;
    }
}
