package org.soakwright.solver.transport;

import java.util.ArrayList;
import java.util.List;

/**
 * The mass fraction at which a solution holds a given content: w = content / density(w), repeated until a step is within a
 * hundred units in the last place: closer, the rounding of the density may go round in circles. The density rises by
 * less than half of itself while w goes from 0 to 1, so each step is at most a third of the one before, and one more is
 * good to a few units.
 */
final class Dissolved {
    private static final int MOST_EVALUATIONS = 100;
    private static final double ROUNDING = 1e-14;

    private Dissolved() {}

    static Quantity fraction(Solution solution, double content, double temperature) {
        double most = solution.mostFraction();
        double mostContent = solution.content(most, temperature).value();
        new Range("content", 0, mostContent, "kg/m3", "the fraction of a solution").refuse(content);
        double fraction =
                Math.min(most, content / solution.density(0, temperature).value());
        for (int i = 0; i < MOST_EVALUATIONS; i++) {
            Quantity density = solution.density(fraction, temperature);
            double next = Math.min(most, content / density.value());
            if (Math.abs(next - fraction) <= ROUNDING * next) {
                double last = content / solution.density(next, temperature).value();
                return new Quantity(Math.min(most, last), density.within(), density.cautions());
            }
            fraction = next;
        }
        throw new NotSettled("mass fraction of " + Figure.shown(content, "kg/m3"), MOST_EVALUATIONS, fraction, "1");
    }

    /** The caution that there is more solute than stays dissolved, if so. */
    static List<Caution> beyondSaturation(Solution solution, double fraction, double temperature) {
        List<Caution> cautions = new ArrayList<>();
        double most = solution.saturation(temperature).value();
        new Range("mass fraction", 0, most, "1", "what stays dissolved").note(fraction, cautions);
        return cautions;
    }
}
