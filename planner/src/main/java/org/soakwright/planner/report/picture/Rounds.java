package org.soakwright.planner.report.picture;

/** Round numbers for marking axes. */
final class Rounds {
    private static final double[] CLOCK = {
        1, 2, 5, 10, 15, 30, 60, 120, 300, 600, 900, 1800, 3600, 7200, 10800, 14400, 21600, 43200, 86400, 172800,
        345600, 604800
    };

    private Rounds() {}

    /** The least of 1, 2, 5 times a power of ten that divides a length into no more than so many parts. */
    static double step(double length, int most) {
        double least = length / most;
        double power = Math.pow(10, Math.floor(Math.log10(least) + 1e-9));
        for (int mantissa : new int[] {1, 2, 5}) {
            if (mantissa * power >= least * (1 - 1e-9)) {
                return mantissa * power;
            }
        }
        return 10 * power;
    }

    /** The same for seconds, in minutes, hours and days. */
    static double clockStep(double seconds, int most) {
        for (double step : CLOCK) {
            if (step * most >= seconds) {
                return step;
            }
        }
        double week = CLOCK[CLOCK.length - 1];
        return week * Math.ceil(seconds / most / week);
    }
}
