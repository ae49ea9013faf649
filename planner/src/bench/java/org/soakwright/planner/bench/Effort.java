package org.soakwright.planner.bench;

import org.soakwright.planner.bench.FiveSoaks.Answer;
import org.soakwright.solver.chain.Chain;

/**
 * What a march spends.
 *
 * @param cells from core to surface
 * @param grading 0 for equal cells; the larger, the finer towards the surface
 * @param steps in a soak, those that damp included
 * @param damped steps that damp at the start of a soak
 */
record Effort(int cells, double grading, int steps, int damped) {
    private static final int MOST_CELLS = 200;
    private static final int MOST_STEPS = 200;
    private static final int MOST_DAMPED = 3;
    private static final double STRONGEST = 8;
    private static final int CHOICES = 16;

    /**
     * Position of a face, 0 at the core to 1 at the surface; halves are centres. Odd about the surface, so that errors have even
     * powers of the cells' size only.
     */
    double place(double face) {
        double depth = 1 - face / cells;
        return 1 - (grading == 0 ? depth : Math.sinh(grading * depth) / Math.sinh(grading));
    }

    Effort doubled() {
        return new Effort(2 * cells, grading, 2 * steps, damped);
    }

    /** Cells solved for in a soak, on both levels of an extrapolation. */
    private long cost() {
        return (long) cells * (steps + damped) + 2L * cells * (2L * steps + damped);
    }

    /**
     * The cheapest that keeps the extrapolated value, and each derivative times its duration, within a share of the driving
     * difference. It has to do so for durations from half to double: a planner asks for many with one set of cells and steps.
     */
    static Effort cheapest(FiveSoaks problem, double within) {
        double[][] choices = problem.choices(CHOICES, 2);
        Answer[] exact = new Answer[CHOICES];
        Chain chain = FiveSoaks.chain();
        for (int i = 0; i < CHOICES; i++) {
            exact[i] = FiveSoaks.answer(chain, choices[i]);
        }
        Effort best = new Effort(MOST_CELLS, 0, MOST_STEPS, MOST_DAMPED);
        boolean reached = false;
        for (double grading = STRONGEST; grading >= 0; grading -= 0.5) {
            for (int damped = 1; damped <= MOST_DAMPED; damped++) {
                int steps = MOST_STEPS;
                for (int cells = 4; cells <= MOST_CELLS; cells += 1 + cells / 24) {
                    // More cells never ask for more steps: down the stairs, as far as each tread reaches.
                    while (steps >= damped) {
                        Effort effort = new Effort(cells, grading, steps, damped);
                        if (effort.cost() < best.cost()) {
                            if (!effort.reaches(within, choices, exact)) {
                                break;
                            }
                            best = effort;
                            reached = true;
                        }
                        steps -= 1 + steps / 24;
                    }
                }
            }
        }
        if (!reached) {
            throw new IllegalStateException("no march comes within " + within + " of the chain");
        }
        return best;
    }

    private boolean reaches(double within, double[][] choices, Answer[] exact) {
        Rival rival = new Rival(this);
        for (int i = 0; i < choices.length; i++) {
            if (!(rival.answer(choices[i]).distance(exact[i], choices[i]) <= within * FiveSoaks.START)) {
                return false;
            }
        }
        return true;
    }
}
