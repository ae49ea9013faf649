package org.soakwright.solver.transport;

import org.soakwright.solver.Require;

/**
 * One solute in water at atmospheric pressure. Mass fractions are solute over solution, temperatures K. A state beyond
 * saturation, or beyond what was measured, comes with a caution; far beyond it is refused with {@link OutOfRange}.
 */
public sealed interface Solution permits Brine, Sugar {
    /** Sodium chloride in water. */
    static Solution brine() {
        return new Brine();
    }

    /** Sucrose in water. */
    static Solution sugar() {
        return new Sugar();
    }

    /** Density, kg/m3. */
    Quantity density(double fraction, double temperature);

    /** Dynamic viscosity, Pa s. */
    Quantity viscosity(double fraction, double temperature);

    /** Vapour pressure over that of pure water, 1. */
    Quantity waterActivity(double fraction, double temperature);

    /** Mass fraction of the saturated solution, 1. */
    Quantity saturation(double temperature);

    /** Molar mass of the solute, kg/mol. */
    double molarMass();

    /** The largest mass fraction that is computed, 1. */
    double mostFraction();

    /** Solute in a volume of solution, kg/m3 (the same number in g/L). */
    default Quantity content(double fraction, double temperature) {
        return density(fraction, temperature).times(fraction);
    }

    /** Solute in a volume of solution, mol/m3. */
    default Quantity molarity(double fraction, double temperature) {
        return content(fraction, temperature).times(1 / molarMass());
    }

    /** Solute in a volume of saturated solution, kg/m3. */
    default Quantity saturationContent(double temperature) {
        Quantity fraction = saturation(temperature);
        return density(fraction.value(), temperature).times(fraction);
    }

    /** Mass fraction over that of the saturated solution of the same temperature, 1. */
    default Quantity degreeOfSaturation(double fraction, double temperature) {
        Require.notNegative("mass fraction", fraction, "1");
        Quantity saturation = saturation(temperature);
        return new Quantity(fraction / saturation.value(), saturation.within(), saturation.cautions());
    }

    /**
     * Mass fraction of a solution that holds so much solute in a volume, kg/m3: {@link #content} the other way round.
     */
    default Quantity fraction(double content, double temperature) {
        return Dissolved.fraction(this, content, temperature);
    }

    /** What a film meets. */
    default Fluid fluid(double fraction, double temperature) {
        return Fluid.of(density(fraction, temperature), viscosity(fraction, temperature), temperature);
    }
}
