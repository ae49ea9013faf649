package org.soakwright.solver.chain;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import org.soakwright.solver.shape.Grade;

/** Part of a reading of pieces of several sides: a weight times one reading of each side, all as of a grade 0. */
record Term(double weight, List<Probe> bySide) {
    private static final Probe MEAN = new Probe.Mean(0);

    static List<Term> mean(Grade grade) {
        return List.of(new Term(1, means(grade)));
    }

    static List<Term> core(Grade grade) {
        return List.of(new Term(1, cores(grade)));
    }

    /** At a position on the shortest way. */
    static List<Term> at(Grade grade, double position) {
        List<Probe> sides = cores(grade);
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
            // Two faces are of one size.
            double[] faces = grade.sides().get(i).twoFaced() ? new double[] {0, 1} : new double[] {1};
            for (double face : faces) {
                List<Probe> sides = means(grade);
                sides.set(i, new Probe.At(0, face));
                terms.add(new Term(grade.wetted(i) / faces.length, sides));
            }
        }
        return terms;
    }

    private static List<Probe> means(Grade grade) {
        return new ArrayList<>(Collections.nCopies(grade.sides().size(), MEAN));
    }

    private static List<Probe> cores(Grade grade) {
        List<Probe> sides = new ArrayList<>();
        grade.sides().forEach(side -> sides.add(new Probe.At(0, side.core())));
        return sides;
    }
}
