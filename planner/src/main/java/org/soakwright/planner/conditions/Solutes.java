package org.soakwright.planner.conditions;

import java.util.Optional;
import java.util.OptionalDouble;
import org.soakwright.recipes.model.Quantity;
import org.soakwright.recipes.model.Species;
import org.soakwright.recipes.model.Substance;
import org.soakwright.solver.transport.Scaling;
import org.soakwright.solver.transport.Solution;

/** What is known of the solutes that a recipe can name. */
final class Solutes {
    private static final double ROOM = 298.15;

    /** Sodium chloride in water at 25 Cel, dilute to 1 mol/L, m2/s: 1.48e-9 to 1.51e-9 (Robinson and Stokes 1959, from memory). */
    private static final double SODIUM_CHLORIDE = 1.49e-9;

    /** Sucrose in water at 25 Cel, dilute, m2/s (Gosting and Morris 1949: 5.226e-10, from memory). */
    private static final double SUCROSE = 5.23e-10;

    private Solutes() {}

    /** Its solution in water, where that is known. */
    static Optional<Solution> solution(Species species) {
        Substance substance = species.traits().substance();
        if (substance == Substance.SODIUM_CHLORIDE) {
            return Optional.of(Solution.brine());
        }
        return substance == Substance.SUCROSE ? Optional.of(Solution.sugar()) : Optional.empty();
    }

    /** kg/mol; empty where the recipe does not say. */
    static OptionalDouble molarMass(Species species) {
        Quantity stated = species.traits().molarMass();
        if (stated != null) {
            return OptionalDouble.of(stated.si());
        }
        return solution(species)
                .map(known -> OptionalDouble.of(known.molarMass()))
                .orElse(OptionalDouble.empty());
    }

    /** How it moves in the liquor at a temperature in K; empty where nothing says. */
    static Optional<org.soakwright.solver.transport.Quantity> inLiquor(Species species, double temperature) {
        if (species.traits().inLiquor() != null) {
            return Optional.of(Movement.at(species.traits().inLiquor(), temperature));
        }
        Substance substance = species.traits().substance();
        if (substance == null || !substance.hasKnownLiquor()) {
            return Optional.empty();
        }
        double dilute = substance == Substance.SUCROSE ? SUCROSE : SODIUM_CHLORIDE;
        return Optional.of(new Scaling.StokesEinstein(dilute, ROOM).at(temperature));
    }
}
