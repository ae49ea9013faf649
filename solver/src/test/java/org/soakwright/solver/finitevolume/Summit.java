package org.soakwright.solver.finitevolume;

/** The highest place of a body: from the best node uphill along one axis after the other, until nothing is gained. */
final class Summit {
    private static final double GOLDEN = (Math.sqrt(5) - 1) / 2;
    private static final double PLACE = 1e-9;
    private static final int MOST_ROUNDS = 1000;

    private final Field field;
    private final double sign;
    private final double[] reach;
    private final double[] place;

    private Summit(Field field, double sign) {
        this.field = field;
        this.sign = sign;
        Tensor nodes = field.nodes();
        int best = 0;
        for (int i = 1; i < nodes.value.length; i++) {
            best = sign * nodes.value[i] > sign * nodes.value[best] ? i : best;
        }
        int[] index = nodes.index(best);
        reach = new double[index.length];
        place = new double[index.length];
        for (int a = 0; a < index.length; a++) {
            double[] node = field.rulers().get(a).node;
            reach[a] = index[a] == 0 ? node[1] : node[index[a]] - node[index[a] - 1];
            place[a] = node[index[a]];
        }
    }

    /** The largest of sign times content. */
    static double of(Field field, double sign) {
        Summit summit = new Summit(field, sign);
        double best = summit.value();
        for (int round = 0; round < MOST_ROUNDS; round++) {
            double before = best;
            for (int axis = 0; axis < summit.place.length; axis++) {
                summit.climb(axis);
            }
            best = summit.value();
            if (best - before <= 1e-15 * Math.abs(best)) {
                break;
            }
        }
        return best;
    }

    private void climb(int axis) {
        double before = place[axis];
        double reached = value();
        double from = Math.max(0, before - reach[axis]);
        double to = Math.min(1, before + reach[axis]);
        double left = to - GOLDEN * (to - from);
        double right = from + GOLDEN * (to - from);
        double atLeft = at(axis, left);
        double atRight = at(axis, right);
        while (to - from > PLACE) {
            if (atLeft > atRight) {
                to = right;
                right = left;
                atRight = atLeft;
                left = to - GOLDEN * (to - from);
                atLeft = at(axis, left);
            } else {
                from = left;
                left = right;
                atLeft = atRight;
                right = from + GOLDEN * (to - from);
                atRight = at(axis, right);
            }
        }
        place[axis] = at(axis, 0.5 * (from + to)) > reached ? 0.5 * (from + to) : before;
    }

    private double at(int axis, double there) {
        double before = place[axis];
        place[axis] = there;
        double value = value();
        place[axis] = before;
        return value;
    }

    private double value() {
        return sign * field.at(place);
    }
}
