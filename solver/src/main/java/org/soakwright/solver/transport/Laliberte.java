package org.soakwright.solver.transport;

/**
 * Density and viscosity of a solution of one solute by apparent properties of the solute: Laliberté and Cooper 2004, J
 * Chem Eng Data 49:1141 (density), Laliberté 2007, J Chem Eng Data 52:321 (viscosity), with the coefficients of
 * Laliberté 2009, J Chem Eng Data 54:1725 (coefficients read in a public copy of its table; equations from memory).
 * The water in it is here that of IAPWS, so that nothing dissolved is pure water; the paper's own differs by 1e-5 in
 * density and 1 % in viscosity.
 *
 * @param c of the density, with t in degrees Celsius
 * @param v of the viscosity in mPa s, with t in degrees Celsius
 */
record Laliberte(double[] c, double[] v) {
    private static final double ICE_POINT = 273.15;

    double density(double fraction, double temperature) {
        double celsius = temperature - ICE_POINT;
        double warm = celsius + c[4];
        double apparent = (c[0] * fraction + c[1]) * Math.exp(1e-6 * warm * warm) / (fraction + c[2] + c[3] * celsius);
        return 1 / ((1 - fraction) / LiquidWater.density(temperature) + fraction / apparent);
    }

    double viscosity(double fraction, double temperature) {
        double celsius = temperature - ICE_POINT;
        double exponent = (v[0] * Math.pow(fraction, v[1]) + v[2]) / (v[3] * celsius + 1);
        double solute = 1e-3 * Math.exp(exponent) / (v[4] * Math.pow(fraction, v[5]) + 1);
        return Math.pow(LiquidWater.viscosity(temperature), 1 - fraction) * Math.pow(solute, fraction);
    }
}
