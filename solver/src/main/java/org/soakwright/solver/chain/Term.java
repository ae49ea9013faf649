package org.soakwright.solver.chain;

import java.util.ArrayList;
import java.util.List;
import org.soakwright.solver.shape.Grade;

/** Part of a reading of pieces of several sides: a weight times one reading of each side, all as of a grade 0. */
record Term(double weight, List<Probe> bySide) {
    private static final Probe MEAN = new Probe.Mean(0);
    private static final Probe CORE = new Probe.At(0, 0);
    private static final Probe SURFACE = new Probe.At(0, 1);

    static List<Term> mean(Grade grade) {
        return List.of(new Term(1, all(grade, MEAN)));
    }

    /** At a position on the shortest way from the core. */
    static List<Term> at(Grade grade, double position) {
        List<Probe> sides = all(grade, CORE);
        sides.set(grade.shortest(), new Probe.At(0, position));
        return List.of(new Term(1, sides));
    }

    /** At a place, by side. */
    static List<Term> at(double[] place) {
        List<Probe> sides = new ArrayList<>();
        for (double position : place) {
            sides.add(new Probe.At(0, position));
        }
        return List.of(new Term(1, sides));
    }

    /** Over the wetted area: every side's faces by their share of it. */
    static List<Term> surface(Grade grade) {
        List<Term> terms = new ArrayList<>();
        for (int i = 0; i < grade.sides().size(); i++) {
            List<Probe> sides = all(grade, MEAN);
            sides.set(i, SURFACE);
            terms.add(new Term(grade.wetted(i), sides));
        }
        return terms;
    }

    private static List<Probe> all(Grade grade, Probe probe) {
        List<Probe> sides = new ArrayList<>();
        grade.sides().forEach(side -> sides.add(probe));
        return sides;
    }
}
