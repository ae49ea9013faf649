package org.soakwright.planner.batch;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.stream.IntStream;
import org.soakwright.planner.batch.doubt.Draws;
import org.soakwright.planner.batch.doubt.Percentile;
import org.soakwright.recipes.text.Unsound;
import org.soakwright.solver.chain.Course;
import org.soakwright.solver.chain.StageTooShort;

/** Where the readings of a run may lie at every moment of its trace, when values are not known exactly. */
public final class Bands {
    /** Parts of the samples that read at most the lower and the upper edge. */
    public static final double LOW = 0.05;

    public static final double HIGH = 0.95;

    private static final int SAMPLES = 256;
    private static final int DEAR_SAMPLES = 32;

    private final Run run;
    private final List<double[]> low;
    private final List<double[]> high;

    /**
     * Of one target, at each moment, in the target's unit; NaN where too early in a stage to tell.
     *
     * @param low what 5 % of the samples read at most
     * @param high what 95 % of the samples read at most
     */
    public record Band(double[] low, double[] high) {}

    private Bands(Run run, List<double[]> low, List<double[]> high) {
        this.run = run;
        this.low = low;
        this.high = high;
    }

    /** Empty where every value is known. Samples that cannot be followed are left out; {@link Outlook#refused} counts them. */
    public static Optional<Bands> of(Trace trace) {
        Run run = trace.run();
        Uncertainty uncertainty = Uncertainty.of(run.batch().written());
        if (uncertainty.isEmpty()) {
            return Optional.empty();
        }
        boolean dear = run.batch().isDear();
        Draws draws = new Draws(uncertainty.size(), 1, dear ? DEAR_SAMPLES : SAMPLES);
        List<double[]> looks = trace.durations();
        int requirements = run.batch().requirements().size();
        double[][][] read = new double[draws.size()][][];
        IntStream.range(0, draws.size()).parallel().forEach(i -> {
            try {
                read[i] = read(run, run.batch().sample(uncertainty.drawn(draws.normals(i)), dear), looks);
            } catch (Unsound impossible) {
                read[i] = new double[0][];
            }
        });
        List<double[]> low = new ArrayList<>();
        List<double[]> high = new ArrayList<>();
        for (int r = 0; r < requirements; r++) {
            int requirement = r;
            low.add(edge(read, requirement, looks.size(), LOW));
            high.add(edge(read, requirement, looks.size(), HIGH));
        }
        return Optional.of(new Bands(run, low, high));
    }

    /** By look, then by requirement. */
    private static double[][] read(Run run, Batch sample, List<double[]> looks) {
        double[][] read = new double[looks.size()][run.batch().requirements().size()];
        for (int i = 0; i < read.length; i++) {
            double[] upTo = looks.get(i);
            List<Course> courses = new ArrayList<>();
            try {
                for (int s = 0; s < sample.recipe().species().size(); s++) {
                    courses.add(sample.chain(s).follow(sample.effective(s, upTo)));
                }
            } catch (StageTooShort early) {
                Arrays.fill(read[i], Double.NaN);
                continue;
            }
            State state =
                    new State(sample, courses, upTo, run.batch().exchanging(run.seconds()), upTo.length - 1, false);
            for (int r = 0; r < read[i].length; r++) {
                Requirement own = sample.requirements().get(r);
                read[i][r] = own.ofPieces()
                        ? Ensemble.comparable(run.batch().requirements().get(r), own) * Batch.read(own, state)
                        : Double.NaN;
            }
        }
        return read;
    }

    private static double[] edge(double[][][] read, int requirement, int looks, double level) {
        double[] edge = new double[looks];
        for (int i = 0; i < looks; i++) {
            int look = i;
            double[] values = Arrays.stream(read)
                    .filter(sample -> sample.length > 0)
                    .mapToDouble(sample -> sample[look][requirement])
                    .filter(value -> !Double.isNaN(value))
                    .toArray();
            edge[i] = 2 * values.length < read.length
                    ? Double.NaN
                    : Percentile.of(values, 1, level).value();
        }
        return edge;
    }

    /**
     * Of a target on pieces.
     *
     * @param state of the run, as {@link EachGrade} tells it
     */
    public Band of(TargetState state) {
        List<Requirement> requirements = run.batch().requirements();
        for (int r = 0; r < requirements.size(); r++) {
            TargetState own = TargetState.of(run, requirements.get(r));
            Requirement requirement = requirements.get(r);
            if (requirement.ofPieces()
                    && own.target().equals(state.target())
                    && own.grade().equals(state.grade())
                    && own.value() == state.value()) {
                return new Band(inUnit(requirement, low.get(r)), inUnit(requirement, high.get(r)));
            }
        }
        throw new IllegalArgumentException("no target on pieces of this run: " + state.name());
    }

    private double[] inUnit(Requirement requirement, double[] si) {
        return Arrays.stream(si)
                .map(value -> Double.isNaN(value)
                        ? value
                        : TargetState.of(run, requirement, value).value())
                .toArray();
    }
}
