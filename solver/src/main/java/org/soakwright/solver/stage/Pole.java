package org.soakwright.solver.stage;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;

/** One rate of one grade taken alone. */
record Pole(double rate, int grade, int index) {
    /** All poles at or below the limit, slowest first, equal ones in the order of the grades. */
    static List<Pole> upTo(PlainRoots[] roots, double limit) {
        List<Pole> poles = new ArrayList<>();
        for (int j = 0; j < roots.length; j++) {
            int count = roots[j].upTo(limit);
            for (int n = 0; n < count; n++) {
                poles.add(new Pole(roots[j].rate(n), j, n));
            }
        }
        poles.sort(Comparator.comparingDouble(Pole::rate).thenComparingInt(Pole::grade));
        return poles;
    }

    /** Poles that agree relatively are gathered, and the roots told to use the first one's rate for all. */
    static List<List<Pole>> groups(PlainRoots[] roots, List<Pole> poles, double same) {
        List<List<Pole>> groups = new ArrayList<>();
        double at = Double.NEGATIVE_INFINITY;
        for (Pole pole : poles) {
            if (pole.rate - at <= same * at) {
                roots[pole.grade].takeRate(pole.index, at);
                groups.get(groups.size() - 1).add(new Pole(at, pole.grade, pole.index));
            } else {
                List<Pole> group = new ArrayList<>();
                group.add(pole);
                groups.add(group);
                at = pole.rate;
            }
        }
        return groups;
    }
}
