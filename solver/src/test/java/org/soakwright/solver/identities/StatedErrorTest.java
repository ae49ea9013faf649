package org.soakwright.solver.identities;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.soakwright.solver.chain.Course;
import org.soakwright.solver.chain.Probe;
import org.soakwright.solver.chain.Reading;
import org.soakwright.solver.chain.Stage;
import org.soakwright.solver.chain.Start;
import org.soakwright.solver.chain.Surroundings;
import org.soakwright.solver.shape.Axis;
import org.soakwright.solver.shape.Grade;
import org.soakwright.solver.shape.Side;
import org.soakwright.solver.stage.Surface;

/** The error stated with a reading bounds its distance from the series summed to thirty digits. */
class StatedErrorTest {
    private static final MathContext DIGITS = new MathContext(40);
    private static final BigDecimal PI = new BigDecimal("3.14159265358979323846264338327950288419716939937510582");

    @Test
    void slabsAndSpheresInUnlimitedLiquorLieWithinTheirStatedError() {
        Draw draw = new Draw(1001);
        Tally honest = new Tally("true error over stated error");
        Tally useful = new Tally("stated error of a content of 100");
        for (int i = 0; i < 300; i++) {
            Axis axis = i % 2 == 0 ? Axis.SLAB : Axis.SPHERE;
            Grade grade = new Grade(axis, draw.log(1e-3, 1e-2), 1e-3);
            double diffusivity = draw.log(1e-11, 1e-8);
            double unit = grade.length() * grade.length() / diffusivity;
            // Two steps alike, so that the carried profile is part of what is stated.
            Stage stage = new Stage(diffusivity, 0.7, new Surface.Open(), new Surroundings.Plenty(0), 0);
            double t = unit * draw.log(5e-4, 20);
            double u = unit * draw.log(5e-4, 20);
            Start start = new Start.Uniform(100);
            Course course = Timed.follow(List.of(grade), start, List.of(new Timed(stage, t), new Timed(stage, u)));
            BigDecimal length = new BigDecimal(grade.length());
            BigDecimal fourier = new BigDecimal(diffusivity)
                    .multiply(new BigDecimal(t).add(new BigDecimal(u)))
                    .divide(length.multiply(length), DIGITS);
            for (boolean core : new boolean[] {false, true}) {
                Reading reading = course.read(core ? new Probe.At(0, 0) : new Probe.Mean(0), 1);
                BigDecimal exact = series(axis, core, fourier).multiply(new BigDecimal(100));
                double error =
                        new BigDecimal(reading.value()).subtract(exact).abs().doubleValue();
                honest.note(error / reading.error());
                useful.note(reading.error());
            }
        }
        honest.within(1, 600);
        useful.within(1e-8, 600);
    }

    /**
     * Newman's products of the same series, for bars and bricks of slabs. A closed bath in equilibrium with the pieces comes first in
     * every other draw: it changes nothing, but pieces that share a liquor are followed in another way.
     */
    @Test
    void barsAndBricksInUnlimitedLiquorLieWithinTheirStatedError() {
        Draw draw = new Draw(1002);
        Tally products = new Tally("bars and bricks by products: true error over stated error");
        Tally polynomials = new Tally("bars and bricks by polynomials: true error over stated error");
        Tally useful = new Tally("bars and bricks: stated error of a content of 100");
        for (int i = 0; i < 120; i++) {
            List<Side> sides = new ArrayList<>();
            double diffusivity = draw.log(1e-11, 1e-8);
            double length = draw.log(1e-3, 1e-2);
            for (int s = i / 2 % 2; s < 3; s++) {
                sides.add(new Side(Axis.SLAB, length * draw.log(0.5, 2)));
            }
            Stage stage = new Stage(diffusivity, 0.7, new Surface.Open(), new Surroundings.Plenty(0), 0);
            Stage still =
                    new Stage(diffusivity, 0.7, new Surface.Open(), new Surroundings.Vessel(1e-3, 100 / 0.7, 0, 0), 0);
            double unit = length * length / diffusivity;
            double t = unit * draw.log(5e-3, 1);
            double u = unit * draw.log(5e-3, 1);
            List<Timed> steps = new ArrayList<>(List.of(new Timed(stage, t), new Timed(stage, u)));
            if (i % 2 == 1) {
                steps.add(0, new Timed(still, t));
            }
            Course course = Timed.follow(List.of(new Grade(sides, 1e-3, 1)), new Start.Uniform(100), steps);
            for (boolean core : new boolean[] {false, true}) {
                BigDecimal exact = new BigDecimal(100);
                for (Side side : sides) {
                    BigDecimal reach = new BigDecimal(side.length());
                    BigDecimal fourier = new BigDecimal(diffusivity)
                            .multiply(new BigDecimal(t).add(new BigDecimal(u)))
                            .divide(reach.multiply(reach), DIGITS);
                    exact = exact.multiply(series(Axis.SLAB, core, fourier), DIGITS);
                }
                Reading reading = course.read(core ? new Probe.At(0, 0) : new Probe.Mean(0), course.size() - 1);
                double error =
                        new BigDecimal(reading.value()).subtract(exact).abs().doubleValue();
                (i % 2 == 0 ? products : polynomials).note(error / reading.error());
                if (i % 2 == 0) {
                    useful.note(reading.error());
                }
            }
        }
        products.within(1, 120);
        useful.within(1e-8, 120);
        polynomials.within(1, 120);
    }

    /**
     * What is left of 1, in the mean or at the core: J. Crank, The Mathematics of Diffusion, 2nd edition, equations 4.17 and 4.18
     * for the slab, 6.19 and 6.20 for the sphere (series and numbers from memory).
     */
    private static BigDecimal series(Axis axis, boolean core, BigDecimal fourier) {
        boolean slab = axis == Axis.SLAB;
        BigDecimal pace = PI.multiply(PI).multiply(fourier);
        BigDecimal sum = BigDecimal.ZERO;
        for (int n = 1; n < 2000; n++) {
            BigDecimal wave = slab ? new BigDecimal(n).subtract(new BigDecimal("0.5")) : new BigDecimal(n);
            BigDecimal square = wave.multiply(wave);
            BigDecimal decay = exp(square.multiply(pace).negate());
            BigDecimal weight;
            if (core) {
                BigDecimal two = new BigDecimal(n % 2 == 1 ? 2 : -2);
                weight = slab ? two.divide(wave.multiply(PI), DIGITS) : two;
            } else {
                weight = new BigDecimal(slab ? 2 : 6).divide(square.multiply(PI).multiply(PI), DIGITS);
            }
            sum = sum.add(weight.multiply(decay, DIGITS), DIGITS);
            if (decay.compareTo(sum.abs().movePointLeft(32)) < 0) {
                return sum;
            }
        }
        throw new AssertionError("the series has not ended");
    }

    private static BigDecimal exp(BigDecimal x) {
        int halvings = 20;
        BigDecimal small = x.divide(new BigDecimal(1 << halvings), DIGITS);
        BigDecimal term = BigDecimal.ONE;
        BigDecimal sum = BigDecimal.ONE;
        for (int k = 1; k < 25; k++) {
            term = term.multiply(small, DIGITS).divide(new BigDecimal(k), DIGITS);
            sum = sum.add(term, DIGITS);
        }
        for (int i = 0; i < halvings; i++) {
            sum = sum.multiply(sum, DIGITS);
        }
        return sum;
    }
}
