package org.soakwright.solver.identities;

import static org.junit.jupiter.api.Assertions.assertTrue;

/** Counts the draws of one property and keeps the worst and the mean square of what it measures. */
final class Tally {
    private final String property;
    private int draws;
    private int skipped;
    private double worst;
    private double squares;
    private int worstDraw;

    Tally(String property) {
        this.property = property;
    }

    /** Notes a departure from the property, at least 0. */
    void note(double departure) {
        assertTrue(departure >= 0 && Double.isFinite(departure), () -> property + ": departure " + departure);
        if (departure > worst) {
            worst = departure;
            worstDraw = draws + skipped;
        }
        squares += departure * departure;
        draws++;
    }

    /** Notes a draw that needs more modes than are kept, or to which the property does not apply. */
    void skip() {
        skipped++;
    }

    int draws() {
        return draws;
    }

    /** Prints one line, and fails where the worst is above the budget or too few draws counted. */
    void within(double budget, int leastDraws) {
        String line = String.format(
                java.util.Locale.ROOT,
                "%s: %d draws (%d more skipped), worst %.2g of %.0e, rms %.1g",
                property,
                draws,
                skipped,
                worst,
                budget,
                Math.sqrt(squares / Math.max(1, draws)));
        System.out.println(line);
        assertTrue(draws >= leastDraws, line + "; too few draws");
        assertTrue(worst <= budget, line + "; at draw " + worstDraw);
    }
}
