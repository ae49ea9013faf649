package org.soakwright.solver.chain;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import org.jspecify.annotations.Nullable;
import org.soakwright.solver.shape.Grade;
import org.soakwright.solver.stage.Conditions;

/**
 * A lot with pieces of several sides that share a liquor. Every grade is a product of its sides' polynomial modes; their space is cut as
 * finely as the shortest stage asks, so that short and long stages cost about the same. The polynomials' degree decides the error, which a
 * second following with a lower degree shows.
 */
final class RitzChain extends Chain {
    /** Within 1e-7 of the driving difference, means far within; held against the other chains by the tests of this package. */
    private static final int FINE = 13;

    /** Some 1e-4, for pictures. */
    private static final int ROUGH = 6;

    /** Spaces kept for later: each belongs to shortest stages within a factor of four. */
    private static final int MOST_SPACES = 4;

    private final List<Grade> lot;
    private final List<Start> starts;
    private final List<Stage> stages;
    private final Set<Integer> passing;
    private final int degree;
    private final double[] mixed;
    private final Conditions[] conditions;
    private final Map<Fineness, Space> spaces = new LinkedHashMap<>(8, 0.75f, true) {
        private static final long serialVersionUID = 1;

        @Override
        protected boolean removeEldestEntry(Map.Entry<Fineness, Space> eldest) {
            return size() > MOST_SPACES;
        }
    };
    private final Passages passages = new Passages();
    private @Nullable RitzChain sketch;

    RitzChain(List<Grade> lot, List<Start> starts, List<Stage> stages, Set<Integer> passing) {
        this(lot, starts, stages, passing, FINE);
    }

    RitzChain(List<Grade> lot, List<Start> starts, List<Stage> stages, Set<Integer> passing, int degree) {
        this.lot = lot;
        this.starts = starts;
        this.stages = stages;
        this.passing = passing;
        this.degree = degree;
        mixed = new double[stages.size()];
        conditions = new Conditions[stages.size()];
        double clinging = 0;
        for (int k = 0; k < mixed.length; k++) {
            mixed[k] = stages.get(k).mixed(clinging);
            conditions[k] = stages.get(k).conditions(clinging);
            clinging = stages.get(k).wets() ? stages.get(k).clinging() : clinging;
        }
    }

    @Override
    public List<Grade> lot() {
        return lot;
    }

    @Override
    public int size() {
        return stages.size();
    }

    @Override
    public Stage stage(int index) {
        return stages.get(index);
    }

    List<Start> starts() {
        return starts;
    }

    int degree() {
        return degree;
    }

    /** Whether a stage's end is of no interest. */
    boolean passing(int stage) {
        return passing.contains(stage);
    }

    Passages passages() {
        return passages;
    }

    double mixed(int stage) {
        return mixed[stage];
    }

    Conditions conditions(int stage) {
        return conditions[stage];
    }

    @Override
    public RitzCourse follow(double... seconds) {
        requireDurations(seconds, stages.size());
        return follow(Fineness.of(this, seconds), seconds);
    }

    RitzCourse follow(Fineness fineness, double... seconds) {
        return new RitzCourse(this, spaces.computeIfAbsent(fineness, key -> new Space(this, key)), seconds.clone());
    }

    @Override
    public void require(double... seconds) {
        Fineness.require(this, seconds);
    }

    @Override
    public Chain sketch() {
        if (sketch == null) {
            sketch = new RitzChain(lot, starts, stages, passing, ROUGH);
        }
        return sketch;
    }
}
