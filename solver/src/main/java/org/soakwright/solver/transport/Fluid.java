package org.soakwright.solver.transport;

import java.util.List;
import org.soakwright.solver.Require;

/**
 * What a liquor or the air is like. Correlations mean it halfway between the surface and the bulk (the film's mean),
 * unless they say otherwise.
 *
 * @param density kg/m3; above 0
 * @param viscosity dynamic, Pa s; above 0
 * @param temperature K; above 0
 * @param cautions of the properties it was made from
 */
public record Fluid(double density, double viscosity, double temperature, List<Caution> cautions) {
    public Fluid {
        cautions = List.copyOf(cautions);
        Require.positive("density", density, "kg/m3");
        Require.positive("viscosity", viscosity, "Pa s");
        Require.positive("temperature", temperature, "K");
    }

    /** A fluid of known properties. */
    public Fluid(double density, double viscosity, double temperature) {
        this(density, viscosity, temperature, List.of());
    }

    static Fluid of(Quantity density, Quantity viscosity, double temperature) {
        List<Caution> cautions = Quantity.join(density.cautions(), viscosity.cautions());
        return new Fluid(density.value(), viscosity.value(), temperature, cautions);
    }

    /** Viscosity over density, m2/s. */
    public double kinematicViscosity() {
        return viscosity / density;
    }
}
