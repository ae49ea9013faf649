package org.soakwright.solver.shape;

import java.util.List;
import org.soakwright.solver.Require;

/**
 * How much quicker the solute moves along each direction of a piece than the stage's diffusivity says, as in muscle or wood.
 *
 * @param factors by direction, 1; above 0; directions beyond the last have the factor 1
 */
public record Grain(List<Double> factors) {
    /** The same in every direction. */
    public static final Grain NONE = new Grain(List.of());

    public Grain {
        factors = List.copyOf(factors);
        for (double factor : factors) {
            Require.positive("factor of a direction", factor, "1");
        }
    }

    /** The factor along a side. */
    public double of(Side side) {
        return side.direction() < factors.size() ? factors.get(side.direction()) : 1;
    }
}
