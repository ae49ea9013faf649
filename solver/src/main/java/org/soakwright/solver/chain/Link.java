package org.soakwright.solver.chain;

import org.soakwright.solver.stage.Bath;
import org.soakwright.solver.stage.Modes;

/**
 * One stage in its place in the chain. The state there is theta = offset + sum of coefficients times modes, and the content of the
 * liquor last met; a link takes it from the end of the stage before to its own beginning, which is an affine map.
 */
final class Link {
    final Stage stage;
    final Modes modes;
    /** Content of the surroundings from which theta is counted. */
    final double offset;
    /** Content of the liquor as poured. */
    final double fresh;
    /** Share of the liquor last met in this stage's starting liquor. */
    final double mixed;
    /** Partition of the stage before over this one's. */
    final double ratio;

    private final Entry entry;
    private int examined;
    private double defect;

    /** Where the modes' coefficients come from. */
    sealed interface Entry {
        /** The pieces as loaded: coefficients of their theta in these modes. */
        record Loaded(Loading loading) implements Entry {}

        /** The end of the stage before. */
        record Carried(Carry carry, double offset) implements Entry {}
    }

    Link(Stage stage, Modes modes, double mixed, double ratio, Entry entry) {
        this.stage = stage;
        this.modes = modes;
        this.mixed = mixed;
        this.ratio = ratio;
        this.entry = entry;
        offset = stage.offset();
        fresh = stage.surroundings() instanceof Surroundings.Vessel vessel
                ? vessel.content()
                : stage.surroundings() instanceof Surroundings.Plenty ? offset : 0;
    }

    /** How many modes matter after so long: all that {@link Chain#DECAYED} leaves, and each grade's slowest. */
    int needed(double seconds, int index) {
        double spread = Chain.DECAYED / seconds;
        double limit = modes.slowestOfQuickest() + spread;
        if (modes.estimate(limit) > Chain.MOST_MODES) {
            limit = spread;
            double estimate = modes.estimate(limit);
            if (estimate > Chain.MOST_MODES) {
                double excess = estimate / Chain.MOST_MODES;
                throw new StageTooShort(index, seconds, estimate, Chain.MOST_MODES, seconds * excess * excess);
            }
        }
        return Math.max(1, modes.upTo(limit));
    }

    /** Departure of the modes from orthonormality, looked for among as many as are in use. */
    double defect(int count) {
        if (count > examined) {
            examined = count;
            defect = modes.defect(count);
        }
        return defect;
    }

    /** A bound on the norm of what enters the stage, all modes counted. */
    double mostEntering(double normBefore, double clinging) {
        double inside = 0;
        for (int j = 0; j < modes.grades(); j++) {
            inside += modes.capacity(j);
        }
        double shift = entry instanceof Entry.Carried carried
                ? Math.abs(ratio * carried.offset - offset)
                : ((Entry.Loaded) entry).loading.most() + Math.abs(offset);
        double poured = Math.abs((1 - mixed) * fresh + mixed * clinging - offset);
        return normBefore * Math.sqrt(ratio) + Math.sqrt(inside) * shift + rootVolume() * poured;
    }

    /** Root of the liquor's volume, its weight in the norm of a state; 0 where there is no vessel. */
    double rootVolume() {
        return modes.conditions().bath() instanceof Bath.Vessel vessel ? Math.sqrt(vessel.volume()) : 0;
    }

    /** Coefficients at the beginning of the stage, from those at the end of the stage before. */
    double[] begin(int count, double[] before, int beforeCount, double clinging) {
        double[] c = new double[count];
        double shift = -offset;
        if (entry instanceof Entry.Carried carried) {
            double[][] column = carried.carry.of(beforeCount, count);
            for (int n = 0; n < beforeCount; n++) {
                double y = before[n];
                double[] col = column[n];
                for (int m = 0; m < count; m++) {
                    c[m] += y * col[m];
                }
            }
            shift += ratio * carried.offset;
        } else {
            ((Entry.Loaded) entry).loading.addTo(c);
        }
        double pour = stage.surroundings() instanceof Surroundings.Vessel
                ? (1 - mixed) * fresh + mixed * clinging - offset
                : 0;
        for (int m = 0; m < count; m++) {
            c[m] += shift * modes.uniform(m) + pour * modes.poured(m);
        }
        return c;
    }

    /** The adjoint of the modes' part of {@link #begin}. */
    double[] back(double[] adjoint, int count, int beforeCount) {
        double[] q = new double[beforeCount];
        double[][] column = ((Entry.Carried) entry).carry.of(beforeCount, count);
        for (int n = 0; n < beforeCount; n++) {
            q[n] = dot(column[n], adjoint, count);
        }
        return q;
    }

    /** Derivative of the result by the clinging content, given its derivatives by the coefficients. */
    double byPoured(double[] adjoint, int count) {
        double sum = 0;
        if (stage.surroundings() instanceof Surroundings.Vessel) {
            for (int m = 0; m < count; m++) {
                sum += adjoint[m] * modes.poured(m);
            }
        }
        return sum;
    }

    /** Derivative of the result by theta everywhere in the pieces, given its derivatives by the coefficients. */
    double byUniform(double[] adjoint, int count) {
        double sum = 0;
        for (int m = 0; m < count; m++) {
            sum += adjoint[m] * modes.uniform(m);
        }
        return sum;
    }

    /** In four sums: one would wait for itself at every addition. */
    static double dot(double[] a, double[] b, int count) {
        double s0 = 0;
        double s1 = 0;
        double s2 = 0;
        double s3 = 0;
        int i = 0;
        for (; i + 3 < count; i += 4) {
            s0 += a[i] * b[i];
            s1 += a[i + 1] * b[i + 1];
            s2 += a[i + 2] * b[i + 2];
            s3 += a[i + 3] * b[i + 3];
        }
        for (; i < count; i++) {
            s0 += a[i] * b[i];
        }
        return s0 + s1 + (s2 + s3);
    }
}
