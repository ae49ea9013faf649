package org.soakwright.solver.transport;

import java.util.ArrayList;
import java.util.List;
import java.util.function.DoubleUnaryOperator;

/**
 * Liquid water at atmospheric pressure, after IAPWS SR6-08 (2011), 253.15 K to 383.15 K; temperatures outside are
 * refused. Below 273.15 K and above 373.12 K water is liquid only as long as nothing disturbs it, which is cautioned.
 * The pressure of the source is 0.1 MPa; 1 atm changes the density by less than a part in a million.
 */
public final class Water {
    private static final double DENSITY_ERROR = 1e-5;
    private static final double VISCOSITY_ERROR = 0.01;
    private static final double EXPANSION_ERROR = 0.01;
    private static final Range RANGE = new Range("temperature", 253.15, 383.15, "K", "liquid water (IAPWS SR6-08)");
    private static final Range LIQUID = new Range("temperature", 273.15, 373.12, "K", "water that stays liquid");

    private Water() {}

    /** Density, kg/m3; to 1e-5 of it. */
    public static Quantity density(double temperature) {
        return new Quantity(check(temperature, LiquidWater::density), DENSITY_ERROR, cautions(temperature));
    }

    /** Dynamic viscosity, Pa s; to 1 % (from memory of the release). */
    public static Quantity viscosity(double temperature) {
        return new Quantity(check(temperature, LiquidWater::viscosity), VISCOSITY_ERROR, cautions(temperature));
    }

    /** Dynamic viscosity over density, m2/s; to 1 %. */
    public static Quantity kinematicViscosity(double temperature) {
        return viscosity(temperature).over(density(temperature));
    }

    /**
     * Relative gain in volume per kelvin, 1/K; below 277.13 K negative. To 1 % (from memory), except close to 277.13 K,
     * where it vanishes.
     */
    public static Quantity expansion(double temperature) {
        return new Quantity(check(temperature, LiquidWater::expansion), EXPANSION_ERROR, cautions(temperature));
    }

    /** Water at a temperature, K. */
    public static Fluid fluid(double temperature) {
        return Fluid.of(density(temperature), viscosity(temperature), temperature);
    }

    private static double check(double temperature, DoubleUnaryOperator property) {
        RANGE.refuse(temperature);
        return property.applyAsDouble(temperature);
    }

    private static List<Caution> cautions(double temperature) {
        List<Caution> cautions = new ArrayList<>();
        LIQUID.note(temperature, cautions);
        return cautions;
    }
}
