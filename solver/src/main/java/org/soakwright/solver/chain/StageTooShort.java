package org.soakwright.solver.chain;

/** A stage so short that its profile would need more modes than are kept. */
public final class StageTooShort extends IllegalArgumentException {
    private static final long serialVersionUID = 1;

    private final int stage;
    private final int most;
    private final double shortest;

    StageTooShort(int stage, double seconds, double modes, int most, double shortest) {
        super("stage " + stage + " of " + seconds + " s needs " + Math.round(modes) + " modes, more than " + most
                + "; from " + shortest + " s on it can be computed");
        this.stage = stage;
        this.most = most;
        this.shortest = shortest;
    }

    /** How many modes would have been kept. */
    public int most() {
        return most;
    }

    /** Which stage, from 0. */
    public int stage() {
        return stage;
    }

    /** The shortest duration that can be computed, s, to within the precision of an estimate. */
    public double shortest() {
        return shortest;
    }
}
