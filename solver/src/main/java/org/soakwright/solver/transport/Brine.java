package org.soakwright.solver.transport;

import java.util.List;

/**
 * Sodium chloride in water, 273.15 K to 373.15 K, mass fraction up to 0.3.
 *
 * <ul>
 *   <li>Density and viscosity: Laliberté 2009 (read), density measured up to a fraction of 0.266, 273 K to 413 K;
 *       viscosity up to 0.2645, 278 K to 427 K. Against handbook tables the density is within 0.05 % at 293 K and 0.25
 *       % up to 373 K, the viscosity within 1.5 % at 293 K; over all solutions the paper says 3.7 % (one standard
 *       deviation).
 *   <li>Water activity: Møller 1988 (read), 273 K to 573 K, to saturation; 0.3 % from comparison with other tables.
 *   <li>Saturation: Sparrow 2003, Desalination 159:161, equation 5, 273 K to 723 K (read in a public code); within 0.3
 *       % of the CRC Handbook up to 373 K.
 * </ul>
 */
record Brine() implements Solution {
    private static final double ICE_POINT = 273.15;
    private static final double MOLAR_MASS = 0.058443;
    private static final double MOST_FRACTION = 0.30;
    private static final double DENSITY_ERROR = 0.0025;
    private static final double VISCOSITY_ERROR = 0.037;
    private static final double ACTIVITY_ERROR = 0.003;
    private static final double SATURATION_ERROR = 0.003;

    private static final Range TEMPERATURE = new Range("temperature", ICE_POINT, 373.15, "K", "brine");
    private static final Range FRACTION = new Range("mass fraction", 0, MOST_FRACTION, "1", "brine");
    private static final Range DENSITY_FRACTION =
            new Range("mass fraction", 0, 0.2659, "1", "the density of brine (Laliberté 2009)");
    private static final Range VISCOSITY_FRACTION =
            new Range("mass fraction", 0, 0.2645, "1", "the viscosity of brine (Laliberté 2009)");
    private static final Range VISCOSITY_TEMPERATURE =
            new Range("temperature", 278.15, 427.15, "K", "the viscosity of brine (Laliberté 2009)");

    private static final Laliberte LALIBERTE = new Laliberte(
            new double[] {
                -0.00324112223655149, 0.0636354335906616, 1.01371399467365, 0.0145951015210159, 3317.34854426537
            },
            new double[] {
                16.221788633396,
                1.32293086770011,
                1.48485985010431,
                0.00746912559657377,
                30.7802007540575,
                2.05826852322558
            });

    @Override
    public Quantity density(double fraction, double temperature) {
        List<Caution> cautions = check(fraction, temperature);
        DENSITY_FRACTION.note(fraction, cautions);
        return new Quantity(LALIBERTE.density(fraction, temperature), DENSITY_ERROR, cautions);
    }

    @Override
    public Quantity viscosity(double fraction, double temperature) {
        List<Caution> cautions = check(fraction, temperature);
        VISCOSITY_FRACTION.note(fraction, cautions);
        VISCOSITY_TEMPERATURE.note(temperature, cautions);
        return new Quantity(LALIBERTE.viscosity(fraction, temperature), VISCOSITY_ERROR, cautions);
    }

    @Override
    public Quantity waterActivity(double fraction, double temperature) {
        List<Caution> cautions = check(fraction, temperature);
        double molality = fraction / (1 - fraction) / MOLAR_MASS;
        return new Quantity(Pitzer.waterActivity(molality, temperature), ACTIVITY_ERROR, cautions);
    }

    @Override
    public Quantity saturation(double temperature) {
        TEMPERATURE.refuse(temperature);
        double celsius = temperature - ICE_POINT;
        double fraction = 0.2628 + 62.75e-6 * celsius + 1.084e-6 * celsius * celsius;
        return new Quantity(fraction, SATURATION_ERROR, List.of());
    }

    @Override
    public double molarMass() {
        return MOLAR_MASS;
    }

    @Override
    public double mostFraction() {
        return MOST_FRACTION;
    }

    private List<Caution> check(double fraction, double temperature) {
        TEMPERATURE.refuse(temperature);
        FRACTION.refuse(fraction);
        return Dissolved.beyondSaturation(this, fraction, temperature);
    }
}
