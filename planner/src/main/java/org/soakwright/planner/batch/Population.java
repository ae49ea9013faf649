package org.soakwright.planner.batch;

import java.util.List;

/**
 * The pieces of one grade as classes: every combination of the classes of what varies, the last running fastest.
 *
 * @param first index of the first class among all of the lot
 * @param share of the lot's mass
 * @param variations what differs from piece to piece; the first is the one along which readings differ most
 */
record Population(int first, double share, List<Variation> variations) {
    Population {
        variations = List.copyOf(variations);
    }

    /** How many classes there are. */
    int count() {
        return variations.stream().mapToInt(Variation::count).reduce(1, (a, b) -> a * b);
    }

    boolean varies() {
        return !variations.isEmpty();
    }

    /** Which class of a variation a class belongs to. */
    int node(int index, int variation) {
        int after = index;
        for (int v = variations.size() - 1; v > variation; v--) {
            after /= variations.get(v).count();
        }
        return after % variations.get(variation).count();
    }

    /** What part of the grade's mass a class stands for. */
    double weight(int index) {
        double weight = 1;
        for (int v = 0; v < variations.size(); v++) {
            weight *= variations.get(v).weights()[node(index, v)];
        }
        return weight;
    }

    /** The class of the pieces that are as the recipe states, among all of the lot. */
    int median() {
        return first + count() / 2;
    }
}
