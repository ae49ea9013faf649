package org.soakwright.solver.finitevolume;

/** What one kind of body holds at the end of a step: contents at evenly spaced mesh coordinates, and their mean, kg/m3. */
final class Profile {
    private static final int STENCIL = 8;
    private static final double GOLDEN = (Math.sqrt(5) - 1) / 2;

    private final double[] nodes;
    private final double mean;

    Profile(double[] nodes, double mean) {
        this.nodes = nodes;
        this.mean = mean;
    }

    double mean() {
        return mean;
    }

    /** A times this and b times the other, whose mesh may be finer by a whole factor. */
    Profile combine(double a, Profile other, double b) {
        int factor = (other.nodes.length - 1) / (nodes.length - 1);
        double[] sum = new double[nodes.length];
        for (int i = 0; i < sum.length; i++) {
            sum[i] = a * nodes[i] + b * other.nodes[factor * i];
        }
        return new Profile(sum, a * mean + b * other.mean);
    }

    double core() {
        return nodes[0];
    }

    double surface() {
        return nodes[nodes.length - 1];
    }

    double highest() {
        return extreme(1);
    }

    double lowest() {
        return -extreme(-1);
    }

    /** Mesh coordinate, 0 to 1, of the node that is highest. */
    double highestNode() {
        return (double) top(1) / (nodes.length - 1);
    }

    private int top(double sign) {
        int best = 0;
        for (int i = 1; i < nodes.length; i++) {
            if (sign * nodes[i] > sign * nodes[best]) {
                best = i;
            }
        }
        return best;
    }

    /** The largest of sign times content: about the best node, by golden section on a polynomial through eight nodes. */
    private double extreme(double sign) {
        int best = top(sign);
        double low = Math.max(0, best - 1);
        double high = Math.min(nodes.length - 1, best + 1);
        while (high - low > 1e-7) {
            double left = high - GOLDEN * (high - low);
            double right = low + GOLDEN * (high - low);
            if (sign * at(left) > sign * at(right)) {
                high = right;
            } else {
                low = left;
            }
        }
        return Math.max(sign * nodes[best], sign * at(0.5 * (low + high)));
    }

    /** Lagrange's polynomial; the profile goes on evenly beyond the core. */
    private double at(double index) {
        int first = Math.min((int) Math.floor(index) - STENCIL / 2 + 1, nodes.length - STENCIL);
        double sum = 0;
        for (int i = first; i < first + STENCIL; i++) {
            double term = nodes[Math.abs(i)];
            for (int k = first; k < first + STENCIL; k++) {
                term *= k == i ? 1 : (index - k) / (i - k);
            }
            sum += term;
        }
        return sum;
    }
}
