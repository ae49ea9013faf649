package org.soakwright.solver.transport;

import java.util.List;

/**
 * Sucrose in water, 273.15 K to 373.15 K, mass fraction up to 0.85.
 *
 * <ul>
 *   <li>Density: the polynomial of ICUMSA (Specification and Standard SPS-4; coefficients read in two public codes), on
 *       the density of water; within 0.02 % of the CRC Handbook at 293 K up to 70 %.
 *   <li>Viscosity up to 40 %: Laliberté 2009 (read), measured 288 K to 328 K; from 50 % Génotelle 1978, as in
 *       Mathlouthi and Reiser, Sucrose, 1995 (read in public codes, the book from memory); between the two their
 *       logarithms are blended. Within 3 % of the CRC Handbook at 293 K up to 70 %, within 7 % of an older table of 20
 *       and 40 % from 288 K to 328 K, within 15 % of the same at 20, 40 and 60 % from 273 K to 358 K.
 *   <li>Water activity: Norrish 1966 with the constant 6.47 of Chirife 1980, measured at 298 K up to saturation (from
 *       memory); what temperature changes is small up to 80 % (Starzak and Mathlouthi 2006, read).
 *   <li>Saturation: Vavrinecz, 273 K to 373 K (from memory; of two public codes each prints one term otherwise, and
 *       what stands here agrees with a handbook's solubilities to 1 %).
 * </ul>
 */
record Sugar() implements Solution {
    private static final double ICE_POINT = 273.15;
    private static final double MOLAR_MASS = 0.342296;
    private static final double WATER_MOLAR_MASS = 0.01801528;
    private static final double NORRISH = 6.47;
    private static final double MOST_FRACTION = 0.85;
    private static final double DENSITY_ERROR = 0.0005;
    private static final double VISCOSITY_ERROR = 0.07;
    private static final double VISCOSITY_ERROR_OUTSIDE = 0.15;
    private static final double ACTIVITY_ERROR = 0.005;
    private static final double SATURATION_ERROR = 0.01;
    private static final double BLEND_FROM = 0.40;
    private static final double BLEND_TO = 0.50;

    private static final Range TEMPERATURE = new Range("temperature", ICE_POINT, 373.15, "K", "sugar solution");
    private static final Range FRACTION = new Range("mass fraction", 0, MOST_FRACTION, "1", "sugar solution");
    private static final Range VISCOSITY_TEMPERATURE =
            new Range("temperature", 288.15, 328.15, "K", "the viscosity of sugar solution (Laliberté 2009)");
    private static final Range ACTIVITY_TEMPERATURE =
            new Range("temperature", 283.15, 323.15, "K", "the water activity of sugar solution (Norrish, at 298 K)");

    /** By powers of (t - 20 C)/100 K, then of the mass fraction from its first on; kg/m3. */
    private static final double[][] ICUMSA = {
        {385.1761, 135.3705, 40.9299, -3.9643, 13.4853, -17.2890},
        {-46.2720, -7.1720, 1.1597, 5.1126, 17.5254},
        {59.7712, 7.2491, 12.3630, -35.4791},
        {-47.2207, -21.6977, 27.6301},
        {18.3184, 12.3081}
    };

    static final Laliberte LALIBERTE = new Laliberte(
            new double[] {532.919899042424, 13692.5881480438, 12.6127261369233, 0.0266415899284128, 649.049186827162},
            new double[] {
                16.2391830818804,
                1.46930910938613,
                3.28485782809427,
                0.0102845759149181,
                33.9389495762169,
                2.28172425556793
            });

    @Override
    public Quantity density(double fraction, double temperature) {
        List<Caution> cautions = check(fraction, temperature);
        double warm = (temperature - ICE_POINT - 20) / 100;
        double density = LiquidWater.density(temperature);
        double power = 1;
        for (double[] row : ICUMSA) {
            double sum = 0;
            for (int i = row.length - 1; i >= 0; i--) {
                sum = (sum + row[i]) * fraction;
            }
            density += power * sum;
            power *= warm;
        }
        return new Quantity(density, DENSITY_ERROR, cautions);
    }

    @Override
    public Quantity viscosity(double fraction, double temperature) {
        List<Caution> cautions = check(fraction, temperature);
        double share = Math.min(1, Math.max(0, (fraction - BLEND_FROM) / (BLEND_TO - BLEND_FROM)));
        double logarithm = 0;
        if (share < 1) {
            VISCOSITY_TEMPERATURE.note(temperature, cautions);
            logarithm += (1 - share) * Math.log(LALIBERTE.viscosity(fraction, temperature));
        }
        if (share > 0) {
            logarithm += share * Math.log(genotelle(fraction, temperature));
        }
        boolean measured = share == 0 && cautions.isEmpty();
        return new Quantity(Math.exp(logarithm), measured ? VISCOSITY_ERROR : VISCOSITY_ERROR_OUTSIDE, cautions);
    }

    @Override
    public Quantity waterActivity(double fraction, double temperature) {
        List<Caution> cautions = check(fraction, temperature);
        ACTIVITY_TEMPERATURE.note(temperature, cautions);
        double solute = fraction / MOLAR_MASS;
        double share = solute / (solute + (1 - fraction) / WATER_MOLAR_MASS);
        return new Quantity((1 - share) * Math.exp(-NORRISH * share * share), ACTIVITY_ERROR, cautions);
    }

    @Override
    public Quantity saturation(double temperature) {
        TEMPERATURE.refuse(temperature);
        double t = temperature - ICE_POINT;
        double percent = 64.447 + t * (0.08222 + t * (1.6169e-3 + t * (-1.558e-6 + t * -4.63e-8)));
        return new Quantity(percent / 100, SATURATION_ERROR, List.of());
    }

    @Override
    public double molarMass() {
        return MOLAR_MASS;
    }

    @Override
    public double mostFraction() {
        return MOST_FRACTION;
    }

    private static double genotelle(double fraction, double temperature) {
        double celsius = temperature - ICE_POINT;
        double percent = 100 * fraction;
        double molar = percent / (1900 - 18 * percent);
        double cold = (30 - celsius) / (91 + celsius);
        return 1e-3 * Math.pow(10, 22.46 * molar - 0.114 + cold * (1.1 + 43.1 * Math.pow(molar, 1.25)));
    }

    private List<Caution> check(double fraction, double temperature) {
        TEMPERATURE.refuse(temperature);
        FRACTION.refuse(fraction);
        return Dissolved.beyondSaturation(this, fraction, temperature);
    }
}
