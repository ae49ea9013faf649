package org.soakwright.solver.published;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.BigDecimal;
import java.util.List;
import java.util.function.DoubleUnaryOperator;
import org.apache.commons.math3.analysis.solvers.BrentSolver;
import org.soakwright.solver.chain.Chain;
import org.soakwright.solver.chain.Course;
import org.soakwright.solver.chain.Probe;
import org.soakwright.solver.chain.Reading;
import org.soakwright.solver.chain.Stage;
import org.soakwright.solver.chain.Start;
import org.soakwright.solver.chain.Surroundings;
import org.soakwright.solver.shape.Axis;
import org.soakwright.solver.shape.Grade;
import org.soakwright.solver.stage.Bath;
import org.soakwright.solver.stage.Conditions;
import org.soakwright.solver.stage.Modes;
import org.soakwright.solver.stage.Surface;

/**
 * The groups in which tables are printed, as a lot of unit length, volume, diffusivity and partition: time is then X =
 * D t/L^2, the film coefficient Bi, the liquor's volume Crank's alpha, and the square of a root the rate of its mode.
 */
final class Dimensionless {
    static final Probe MEAN = new Probe.Mean(0);
    static final Probe CORE = new Probe.At(0, 0);
    static final Probe SURFACE = new Probe.At(0, 1);
    static final Probe LIQUOR = new Probe.Liquor();

    private static final int MOST_EVALUATIONS = 200;

    private Dimensionless() {}

    static List<Grade> lot(Axis axis) {
        return List.of(new Grade(axis, 1, 1));
    }

    static Surface film(double biot) {
        return Double.isInfinite(biot) ? new Surface.Open() : new Surface.Film(biot);
    }

    static Stage plenty(double biot, double content) {
        return new Stage(1, 1, film(biot), new Surroundings.Plenty(content), 0);
    }

    static Stage closedBath(double biot, double alpha, double content) {
        return new Stage(1, 1, film(biot), new Surroundings.Vessel(alpha, content, 0, 0), 0);
    }

    /** Modes in unlimited liquor. */
    static Modes plainModes(Axis axis, double biot) {
        return new Modes(lot(axis), new Conditions(1, 1, film(biot), new Bath.Unlimited()));
    }

    /** Modes in a closed bath; the first is at rest. */
    static Modes bathModes(Axis axis, double biot, double alpha) {
        return new Modes(lot(axis), new Conditions(1, 1, film(biot), new Bath.Vessel(alpha, 0)));
    }

    static Chain chain(Axis axis, double start, Stage... stages) {
        return Chain.of(lot(axis), new Start.Uniform(start), List.of(stages));
    }

    /** Pieces of content 1 in liquor of content 0. */
    static Course leached(Axis axis, double biot, double x) {
        return chain(axis, 1, plenty(biot, 0)).follow(x);
    }

    /** Duration of a single stage at which the reading has fallen or risen to the target. */
    static double timeUntil(Chain chain, Probe probe, double target, double least, double most) {
        DoubleUnaryOperator excess = t -> chain.follow(t).value(probe, 0) - target;
        return new BrentSolver(1e-13, 1e-300, 1e-17).solve(MOST_EVALUATIONS, excess::applyAsDouble, least, most);
    }

    static void assertRelative(double expected, double actual, double tolerance, String what) {
        assertEquals(expected, actual, tolerance * Math.abs(expected), what);
    }

    /** The value is right to the given digits, and no farther off than the solver itself says. */
    static void assertHonest(BigDecimal reference, Reading reading, double tolerance, String what) {
        double off = reference.subtract(new BigDecimal(reading.value())).abs().doubleValue();
        assertTrue(off <= tolerance, () -> what + " is off by " + off + ", more than " + tolerance);
        assertTrue(off <= reading.error(), () -> what + " is off by " + off + ", but claims " + reading.error());
    }
}
