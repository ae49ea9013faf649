package org.soakwright.solver.finitevolume;

import java.util.ArrayList;
import java.util.List;

/**
 * The end of a step.
 *
 * @param profiles one for each kind of body
 * @param liquor content of the liquor last met, kg/m3
 * @param drive largest difference that has driven anything so far, kg/m3 in liquor
 */
record Snapshot(List<Profile> profiles, double liquor, double drive) {
    /** The sum of a times this and b times the other, whose mesh may be finer by a whole factor. */
    Snapshot combine(double a, Snapshot other, double b) {
        List<Profile> sums = new ArrayList<>();
        for (int j = 0; j < profiles.size(); j++) {
            sums.add(profiles.get(j).combine(a, other.profiles.get(j), b));
        }
        return new Snapshot(sums, a * liquor + b * other.liquor, Math.max(drive, other.drive));
    }
}
