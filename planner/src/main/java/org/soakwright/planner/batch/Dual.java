package org.soakwright.planner.batch;

import java.util.function.DoubleBinaryOperator;

/**
 * A number and how it follows the durations of the steps: what is worked out of such numbers follows by itself.
 *
 * @param value in SI
 * @param slopes by step, per second; empty where nobody asks for them
 */
record Dual(double value, double[] slopes) {
    static Dual constant(double value, int steps) {
        return new Dual(value, new double[steps]);
    }

    Dual plus(Dual other) {
        return new Dual(value + other.value, combined(other, (own, its) -> own + its));
    }

    Dual minus(Dual other) {
        return new Dual(value - other.value, combined(other, (own, its) -> own - its));
    }

    Dual times(Dual other) {
        return new Dual(value * other.value, combined(other, (own, its) -> own * other.value + its * value));
    }

    Dual over(Dual other) {
        double ratio = value / other.value;
        return new Dual(ratio, combined(other, (own, its) -> (own - its * ratio) / other.value));
    }

    Dual plus(double more) {
        return new Dual(value + more, slopes);
    }

    Dual times(double factor) {
        double[] scaled = slopes.clone();
        for (int i = 0; i < scaled.length; i++) {
            scaled[i] *= factor;
        }
        return new Dual(factor * value, scaled);
    }

    private double[] combined(Dual other, DoubleBinaryOperator rule) {
        double[] combined = new double[slopes.length];
        for (int i = 0; i < combined.length; i++) {
            combined[i] = rule.applyAsDouble(slopes[i], other.slopes[i]);
        }
        return combined;
    }
}
