package org.soakwright.solver.chain;

import java.util.List;

/**
 * A chain followed for one choice of durations. Readings can be taken at the end of every stage, with their error and their
 * derivatives by every duration.
 */
public abstract sealed class Course permits WaveCourse, LaunchCourse, ProductCourse, RitzCourse {
    /** Number of stages followed. */
    public abstract int size();

    /** Modes evaluated in a stage. */
    public abstract int modes(int stage);

    /** A reading at the end of a stage, from 0. */
    public abstract Reading read(Probe probe, int stage);

    /** Content of the liquor at the beginning of a stage, with what clung to the pieces mixed in; kg/m3. */
    public abstract double liquorAtStart(int stage);

    /** The value alone of {@link #read}. */
    public abstract double value(Probe probe, int stage);

    /**
     * Contents of one grade's pieces at the end of a stage, on the shortest way from the core to the surface, or from back to front.
     *
     * @param positions 0, the core, sealed face or back, to 1, the wetted surface
     * @return kg/m3 of piece, by position
     */
    public abstract double[] profile(int grade, int stage, double... positions);

    /**
     * Contents on a cut through the core along two of a grade's sides at the end of a stage.
     *
     * @param first the side across, from 0
     * @param second the side down, from 0, another one
     * @param across positions along the first, 0, the core or back, to 1, the surface
     * @param down positions along the second
     * @return kg/m3 of piece, by position down, then across
     */
    public abstract double[][] section(int grade, int stage, int first, int second, double[] across, double[] down);

    /** Where the content is highest: by side, from 0, the core or back, to 1, the surface. */
    public abstract double[] place(Probe.Highest probe, int stage);

    /** Where the content is lowest: by side, from 0, the core or back, to 1, the surface. */
    public abstract double[] place(Probe.Lowest probe, int stage);

    /** Derivatives of a reading by durations and by the contents of all liquors. */
    public abstract Sensitivity sensitivity(Probe probe, int stage);

    /**
     * Derivatives of a reading by the durations of all stages up to its own, kg/m3 per second. For extrema the place is held: by
     * the envelope theorem that is the derivative wherever it exists.
     */
    public double[] gradient(Probe probe, int stage) {
        return sensitivity(probe, stage).bySeconds();
    }

    /** Derivatives of a sum of readings by the durations of all stages up to its own, kg/m3 per second. */
    public double[] gradient(List<Part> sum, int stage) {
        double[] gradient = new double[stage + 1];
        for (Part part : sum) {
            double[] one = gradient(part.probe(), stage);
            for (int k = 0; k < one.length; k++) {
                gradient[k] += part.weight() * one[k];
            }
        }
        return gradient;
    }
}
