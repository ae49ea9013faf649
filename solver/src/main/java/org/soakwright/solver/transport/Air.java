package org.soakwright.solver.transport;

import java.util.ArrayList;
import java.util.List;
import org.soakwright.solver.Require;

/**
 * Moist air at 1 atm (101 325 Pa), as a mixture of ideal gases.
 *
 * @param temperature dry bulb, K; 273.15 to 373.15
 * @param humidity vapour pressure over that of saturation, 1; 0 to 1
 */
public record Air(double temperature, double humidity) {
    /** One standard atmosphere, Pa. */
    public static final double PRESSURE = 101_325;

    private static final double GAS_CONSTANT = 8.314462618;
    private static final double WATER_MOLAR_MASS = 0.01801528;
    private static final double AIR_MOLAR_MASS = 0.0289647;
    private static final double PRESSURE_ERROR = 0.0005;
    private static final double DENSITY_ERROR = 0.003;
    private static final double HUMIDITY_ERROR = 0.006;
    private static final double VISCOSITY_ERROR = 0.03;
    private static final double DIFFUSIVITY_ERROR = 0.05;

    private static final Range TEMPERATURE = new Range("temperature", 273.15, 373.15, "K", "moist air");
    private static final Range DIFFUSIVITY_TEMPERATURE =
            new Range("temperature", 282, 450, "K", "the diffusivity of water vapour in air (Marrero and Mason 1972)");

    public Air {
        TEMPERATURE.refuse(temperature);
        Require.notNegative("relative humidity", humidity, "1");
        if (humidity > 1) {
            throw new IllegalArgumentException("relative humidity must be at most 1, found " + humidity);
        }
        double vapour = humidity * saturation(temperature);
        if (vapour >= PRESSURE) {
            throw new IllegalArgumentException("vapour pressure must be below the pressure of " + PRESSURE
                    + " Pa, found " + vapour + " Pa: the air is all steam");
        }
    }

    /**
     * Vapour pressure of water, Pa: IAPWS-IF97 equation 30 (read), 273.15 K to 373.15 K; to 0.05 %. That air is present
     * raises it by up to 0.5 %, which is left out.
     */
    public static Quantity saturationPressure(double temperature) {
        TEMPERATURE.refuse(temperature);
        return new Quantity(saturation(temperature), PRESSURE_ERROR, List.of());
    }

    /** Partial pressure of the vapour, Pa. */
    public double vapourPressure() {
        return humidity * saturation(temperature);
    }

    /** Vapour per dry air, kg/kg; to 0.6 %, as the presence of air is left out. */
    public Quantity humidityRatio() {
        double vapour = vapourPressure();
        double ratio = WATER_MOLAR_MASS / AIR_MOLAR_MASS * vapour / (PRESSURE - vapour);
        return new Quantity(ratio, HUMIDITY_ERROR, List.of());
    }

    /** Density of the mixture, kg/m3; to 0.3 %. */
    public Quantity density() {
        double vapour = vapourPressure();
        double mass = (PRESSURE - vapour) * AIR_MOLAR_MASS + vapour * WATER_MOLAR_MASS;
        return new Quantity(mass / (GAS_CONSTANT * temperature), DENSITY_ERROR, List.of());
    }

    /**
     * Dynamic viscosity, Pa s: dry air after Sutherland (U.S. Standard Atmosphere 1976, from memory), vapour after
     * IAPWS R12-08 for the dilute gas (from memory), mixed after Wilke 1950 (from memory); to 3 %.
     */
    public Quantity viscosity() {
        double vapourShare = vapourPressure() / PRESSURE;
        double air = Gas.airViscosity(temperature);
        double vapour = Gas.vapourViscosity(temperature);
        double mixed = Gas.mixed(1 - vapourShare, air, AIR_MOLAR_MASS, vapour, WATER_MOLAR_MASS);
        return new Quantity(mixed, VISCOSITY_ERROR, List.of());
    }

    /**
     * Diffusivity of water vapour in air, m2/s: 1.87e-10 T^2.072 at 1 atm, Marrero and Mason 1972, J Phys Chem Ref Data
     * 1:3, 282 K to 450 K (from memory); to 5 %. Colder air is cautioned.
     */
    public Quantity vapourDiffusivity() {
        List<Caution> cautions = new ArrayList<>();
        DIFFUSIVITY_TEMPERATURE.note(temperature, cautions);
        return new Quantity(1.87e-10 * Math.pow(temperature, 2.072), DIFFUSIVITY_ERROR, cautions);
    }

    /** What a film meets. */
    public Fluid fluid() {
        return Fluid.of(density(), viscosity(), temperature);
    }

    private static double saturation(double temperature) {
        double theta = temperature - 0.23855557567849 / (temperature - 650.17534844798);
        double a = theta * theta + 1167.0521452767 * theta - 724213.16703206;
        double b = -17.073846940092 * theta * theta + 12020.82470247 * theta - 3232555.0322333;
        double c = 14.91510861353 * theta * theta - 4823.2657361591 * theta + 405113.40542057;
        double root = 2 * c / (-b + Math.sqrt(b * b - 4 * a * c));
        return 1e6 * root * root * root * root;
    }
}
