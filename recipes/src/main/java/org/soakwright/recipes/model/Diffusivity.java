package org.soakwright.recipes.model;

import java.util.List;
import org.jspecify.annotations.Nullable;
import org.soakwright.recipes.text.Unsound;

/**
 * How fast a species moves in the piece.
 *
 * @param value m2/s, above zero
 * @param at the temperature the value belongs to; given exactly when the activation energy is
 * @param activationEnergy J/mol, from 0 to 500 kJ/mol; without it the value holds at every temperature
 */
public record Diffusivity(
        Quantity value, @Nullable Quantity at, @Nullable Quantity activationEnergy) {
    public Diffusivity {
        Rules.requireAll(List.of(
                Rules.ifNotPositive("a diffusivity", value),
                Rules.ifNoTemperature(at),
                Rules.ifNoActivationEnergy(activationEnergy)));
        if (at == null && activationEnergy != null) {
            throw new Unsound(
                    activationEnergy.place(),
                    "an activation energy needs the temperature its diffusivity belongs to; add at, such as 5 Cel");
        }
        if (at != null && activationEnergy == null) {
            throw new Unsound(
                    at.place(),
                    "`at` says nothing without an activation energy; add activation-energy, such as 22 kJ/mol, or"
                            + " remove `at`");
        }
    }

    /** Whether the diffusivity of a step depends on its temperature. */
    public boolean dependsOnTemperature() {
        return activationEnergy != null;
    }
}
