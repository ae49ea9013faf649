package org.soakwright.solver.transport;

import java.util.ArrayList;
import java.util.List;
import org.soakwright.solver.Require;

/**
 * A film.
 *
 * @param coefficient on the liquor's side, m/s; above 0
 * @param groups what it was computed from
 * @param correlations what it was computed by; several where films act together
 * @param within how far measured films lie from it, as a share of it
 * @param cautions what lies outside the range of the correlations; empty inside
 */
public record Estimate(
        double coefficient, Groups groups, List<Correlation> correlations, double within, List<Caution> cautions) {
    public Estimate {
        correlations = List.copyOf(correlations);
        cautions = List.copyOf(cautions);
        Require.positive("film coefficient", coefficient, "m/s");
        Require.notNegative("error", within, "1");
    }

    /** Whether nothing lies outside. */
    public boolean inside() {
        return cautions.isEmpty();
    }

    /** The same film with more to be said of it. */
    Estimate and(List<Caution> more) {
        return new Estimate(coefficient, groups, correlations, within, Quantity.join(cautions, more));
    }

    /** Cubes add: Churchill 1977, AIChE J 23:10; Incropera and DeWitt, equation 9.64 with n = 3 (from memory). */
    static Estimate together(Estimate past, Estimate still) {
        double coefficient = Math.cbrt(cube(past.coefficient) + cube(still.coefficient));
        Groups groups = new Groups(
                past.groups.length(),
                past.groups.reynolds(),
                past.groups.schmidt(),
                still.groups.grashof() * cube(past.groups.length() / still.groups.length()),
                past.groups.sherwood() * coefficient / past.coefficient);
        List<Correlation> both = new ArrayList<>(past.correlations);
        both.addAll(still.correlations);
        double within = Math.max(past.within, still.within);
        return new Estimate(coefficient, groups, both, within, Quantity.join(past.cautions, still.cautions));
    }

    private static double cube(double x) {
        return x * x * x;
    }
}
