package org.soakwright.planner.bench;

import java.util.ArrayList;
import java.util.List;
import java.util.SplittableRandom;
import org.soakwright.solver.chain.Chain;
import org.soakwright.solver.chain.Course;
import org.soakwright.solver.chain.Probe;
import org.soakwright.solver.chain.Stage;
import org.soakwright.solver.chain.Start;
import org.soakwright.solver.chain.Surroundings;
import org.soakwright.solver.shape.Axis;
import org.soakwright.solver.shape.Grade;
import org.soakwright.solver.stage.Surface;

/**
 * The problem that both methods are timed on: slabs of one grade through five soaks, each in pure liquor of its own volume and
 * behind its own film; wanted is the mean at the end and its derivatives by the five durations.
 *
 * @param fourier Fourier number D t/L^2 of a soak, about
 */
record FiveSoaks(double fourier) {
    static final int SOAKS = 5;
    /** Half-thickness, m. */
    static final double LENGTH = 9e-3;
    /** m2/s. */
    static final double DIFFUSIVITY = 8e-10;
    /** Content of the pieces over content of the liquor at equilibrium. */
    static final double PARTITION = 0.8;
    /** Of all pieces, m3. */
    static final double VOLUME = 0.5;
    /** Content of the pieces as loaded, and the difference that drives everything, kg/m3. */
    static final double START = 200;

    private static final double[] LIQUOR = {1.2, 1.0, 1.5, 0.8, 1.1};
    private static final double[] FILM = {2e-6, 3e-6, 1.5e-6, 4e-6, 2.5e-6};

    private static final long SEED = 19_580;

    /** Liquor of a soak, m3. */
    static double liquor(int soak) {
        return LIQUOR[soak];
    }

    /** Film coefficient of a soak, m/s. */
    static double film(int soak) {
        return FILM[soak];
    }

    /** What is timed: nothing may be remembered from the call before. */
    double[][] choices() {
        return choices(64, 1.05);
    }

    /**
     * Choices of the five durations, s.
     *
     * @param span the most by which a duration is multiplied or divided
     */
    double[][] choices(int number, double span) {
        SplittableRandom random = new SplittableRandom(SEED);
        double seconds = fourier * LENGTH * LENGTH / DIFFUSIVITY;
        double[][] choices = new double[number][SOAKS];
        for (double[] choice : choices) {
            for (int k = 0; k < SOAKS; k++) {
                choice[k] = seconds * Math.pow(span, 2 * random.nextDouble() - 1);
            }
        }
        return choices;
    }

    static Chain chain() {
        List<Stage> stages = new ArrayList<>();
        for (int k = 0; k < SOAKS; k++) {
            Surroundings bath = new Surroundings.Vessel(LIQUOR[k], 0, 0, 0);
            stages.add(new Stage(DIFFUSIVITY, PARTITION, new Surface.Film(FILM[k]), bath, 0));
        }
        return Chain.of(List.of(new Grade(Axis.SLAB, LENGTH, VOLUME)), new Start.Uniform(START), stages);
    }

    /** By the chain: the mean at the end, kg/m3, and its derivatives by the durations, kg/m3 per s. */
    static Answer answer(Chain chain, double[] seconds) {
        Course course = chain.follow(seconds);
        Probe mean = new Probe.Mean(0);
        return new Answer(course.value(mean, SOAKS - 1), course.gradient(mean, SOAKS - 1));
    }

    /** A value, kg/m3, and its derivatives by the durations, kg/m3 per s. */
    record Answer(double value, double[] gradient) {
        /** The largest difference in value, or in a derivative times its duration, kg/m3. */
        double distance(Answer other, double[] seconds) {
            double most = Math.abs(value - other.value);
            for (int k = 0; k < seconds.length; k++) {
                most = Math.max(most, seconds[k] * Math.abs(gradient[k] - other.gradient[k]));
            }
            return most;
        }
    }
}
