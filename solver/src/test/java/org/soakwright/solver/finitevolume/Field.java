package org.soakwright.solver.finitevolume;

import java.util.List;

/**
 * What one kind of body of several axes holds at the end of a phase, kg/m3.
 *
 * @param nodes contents, by axis from core to surface
 * @param rulers where the nodes are, by axis
 * @param mean over the volume
 * @param wetted mean over the wetted surface
 * @param solid what holds it
 */
record Field(Tensor nodes, List<Ruler> rulers, double mean, double wetted, Solid solid) {
    /** A times this and b times the other, whose mesh may be finer by a whole factor. */
    Field combine(double a, Field other, double b) {
        double[] sum = new double[nodes.value.length];
        int factor = (other.nodes.size[0] - 1) / (nodes.size[0] - 1);
        for (int i = 0; i < sum.length; i++) {
            int[] fine = nodes.index(i);
            for (int k = 0; k < fine.length; k++) {
                fine[k] *= factor;
            }
            sum[i] = a * nodes.value[i] + b * other.nodes.at(fine);
        }
        Tensor sums = new Tensor(nodes.size, sum);
        return new Field(sums, rulers, a * mean + b * other.mean, a * wetted + b * other.wetted, solid);
    }

    double core() {
        return at(cores());
    }

    /** On the shortest way from the core or the back, 0, to the surface, 1. */
    double on(double position) {
        double[] place = cores();
        place[solid.shortest()] = position;
        return at(place);
    }

    private double[] cores() {
        return solid.edges().stream().mapToDouble(Edge::core).toArray();
    }

    /** Anywhere: each axis from the core, 0, to the surface, 1. */
    double at(double[] place) {
        double[][] weight = new double[place.length][];
        int[] first = new int[place.length];
        for (int a = 0; a < place.length; a++) {
            weight[a] = rulers.get(a).weights(place[a]);
            first[a] = rulers.get(a).first(place[a]);
        }
        return sum(weight, first, 0, new int[place.length]);
    }

    private double sum(double[][] weight, int[] first, int axis, int[] index) {
        if (axis == index.length) {
            return nodes.at(index);
        }
        double sum = 0;
        for (int i = 0; i < weight[axis].length; i++) {
            if (weight[axis][i] != 0) {
                index[axis] = first[axis] + i;
                sum += weight[axis][i] * sum(weight, first, axis + 1, index);
            }
        }
        return sum;
    }

    double highest() {
        return Summit.of(this, 1);
    }

    double lowest() {
        return -Summit.of(this, -1);
    }
}
