package org.soakwright.planner.batch;

import java.util.Optional;

/**
 * A choice of durations, judged.
 *
 * @param met whether every target is met, as judged
 */
record Chosen(Run run, boolean met, Plan.Proof proof) {
    private static final int MOST_ROUNDS = 5;

    /** Rounds that find nothing within the targets before it is left at that. */
    private static final int MOST_MISSES = 2;

    /** Margins that differ by less, relatively, choose alike. */
    private static final double SETTLED = 1e-4;

    /**
     * Targets with a confidence are planned on few samples and judged by many. Where the two disagree, the margin between them is taken
     * to the next round: what is handed over was judged to meet the targets, or is a miss.
     */
    static Chosen of(Batch batch, Progress progress) {
        Chosen best = first(batch, progress);
        if (!batch.assurance().any()) {
            return best;
        }
        Chosen last = best;
        Batch before = batch;
        int misses = best.met ? 0 : 1;
        for (int round = 1; round < MOST_ROUNDS && misses < MOST_MISSES; round++) {
            Batch now = last.run.batch();
            if (settled(before, now)) {
                break;
            }
            last = first(now, progress).after(last.proof.evaluations());
            misses += last.met || best.met ? 0 : 1;
            best = last.isBetter(best) ? last : best;
            before = now;
        }
        return best;
    }

    private static Chosen first(Batch batch, Progress progress) {
        Planner planner = new Planner(batch, progress);
        Planner.Choice choice = planner.choose();
        Run run = planner.run(choice).judged(progress);
        return new Chosen(run, batch.assurance().any() ? run.meetsTargets() : choice.met(), choice.proof());
    }

    private Chosen after(long evaluations) {
        return new Chosen(run, met, proof.after(evaluations + proof.evaluations()));
    }

    private static boolean settled(Batch before, Batch after) {
        double[] old = before.assurance().margins();
        double[] now = after.assurance().margins();
        for (int r = 0; r < old.length; r++) {
            if (!(Math.abs(now[r] - old[r]) <= SETTLED * old[r])) {
                return false;
            }
        }
        return true;
    }

    private boolean isBetter(Chosen other) {
        if (met != other.met) {
            return met;
        }
        if (!met) {
            return largestMiss() < other.largestMiss();
        }
        Grid grid = new Grid(run.batch().recipe());
        return new Merit(run.batch(), grid).compare(grid.free(run.seconds()), grid.free(other.run.seconds())) < 0;
    }

    private double largestMiss() {
        Run judged = run;
        return judged.batch().requirements().stream()
                .mapToDouble(judged::miss)
                .max()
                .orElse(0);
    }

    /** Where a choice meets the targets. */
    Optional<Run> ifMet() {
        return met ? Optional.of(run) : Optional.empty();
    }
}
