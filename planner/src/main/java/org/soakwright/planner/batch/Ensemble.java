package org.soakwright.planner.batch;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Objects;
import java.util.stream.IntStream;
import org.jspecify.annotations.Nullable;
import org.soakwright.planner.batch.doubt.Draws;
import org.soakwright.planner.batch.doubt.SmoothPercentile;
import org.soakwright.recipes.text.Unsound;

/**
 * The recipe drawn some hundred times, each prepared once: what is planned on. Prepared when first followed; not safe for use by several
 * threads at once, though its members are followed by several.
 */
final class Ensemble {
    /** Enough for a percentile good to about 1 % of its distance from the median; what remains is put right by a margin. */
    static final int SAMPLES = 256;

    private final Batch stated;
    private @Nullable List<Batch> members;
    private int refused;
    private String refusal = "";

    Ensemble(Batch stated) {
        this.stated = stated;
    }

    /** Those that are recipes. */
    private List<Batch> members() {
        if (members == null) {
            Uncertainty uncertainty = Uncertainty.of(stated.written());
            Draws draws = new Draws(uncertainty.size(), 1, SAMPLES);
            Batch[] drawn = new Batch[draws.size()];
            Unsound[] refusals = new Unsound[draws.size()];
            IntStream.range(0, drawn.length).parallel().forEach(i -> {
                try {
                    drawn[i] = stated.sample(uncertainty.drawn(draws.normals(i)), false);
                } catch (Unsound impossible) {
                    refusals[i] = impossible;
                }
            });
            members = Arrays.stream(drawn).filter(Objects::nonNull).toList();
            refused = draws.size() - members.size();
            refusal = Arrays.stream(refusals)
                    .filter(Objects::nonNull)
                    .findFirst()
                    .map(Throwable::getMessage)
                    .orElse("");
        }
        return members;
    }

    /**
     * Every member followed.
     *
     * @throws Unsound when a step is too short to be computed for one
     */
    List<Run> follow(double[] stepSeconds) {
        List<Batch> all = members();
        Run[] runs = new Run[all.size()];
        Unsound[] tooShort = new Unsound[all.size()];
        IntStream.range(0, runs.length).parallel().forEach(i -> {
            try {
                runs[i] = all.get(i).follow(stepSeconds);
            } catch (Unsound refusedHere) {
                tooShort[i] = refusedHere;
            }
        });
        Arrays.stream(tooShort).filter(Objects::nonNull).findFirst().ifPresent(first -> {
            throw first;
        });
        return List.of(runs);
    }

    /**
     * What a requirement reads at a level, and how that follows its members: those refused are beyond any limit.
     *
     * @param runs of {@link #follow}
     * @param index of the requirement
     */
    Weighed weighed(List<Run> runs, Requirement stated, int index, double level) {
        int wanted = runs.size() + refused;
        double rank = level * wanted - (stated.upper() ? 0 : refused);
        if (!(rank > 0 && rank < runs.size())) {
            throw Assurance.tooOftenRefused(this.stated.recipe(), stated, refused, wanted, refusal);
        }
        double[] values = new double[runs.size()];
        double[] factors = new double[runs.size()];
        IntStream.range(0, values.length).parallel().forEach(i -> {
            Requirement own = runs.get(i).batch().requirements().get(index);
            factors[i] = comparable(stated, own);
            values[i] = factors[i] * runs.get(i).stated(own);
        });
        double[] weights = new SmoothPercentile(values.length, rank / values.length).weights(values);
        double sum = 0;
        List<Part> parts = new ArrayList<>();
        for (int i = 0; i < values.length; i++) {
            sum += weights[i] * values[i];
            if (weights[i] > LEAST) {
                parts.add(new Part(runs.get(i), weights[i] * factors[i]));
            }
        }
        return new Weighed(sum, parts);
    }

    /** A member that counts less is left out of derivatives. */
    private static final double LEAST = 1e-9;

    record Part(Run run, double weight) {}

    record Weighed(double value, List<Part> parts) {}

    /** A reading of a sample times this stands to the stated limit as it stands to its own. */
    static double comparable(Requirement stated, Requirement own) {
        return stated.limit() == own.limit() || !(stated.limit() > 0) || !(own.limit() > 0)
                ? 1
                : stated.limit() / own.limit();
    }

    /** Derivative by the duration of each step. */
    double[] gradient(Weighed weighed, int index, int steps) {
        double[][] each = new double[weighed.parts().size()][];
        IntStream.range(0, each.length).parallel().forEach(i -> {
            Run run = weighed.parts().get(i).run();
            each[i] = run.statedGradient(run.batch().requirements().get(index));
        });
        double[] sum = new double[steps];
        for (int i = 0; i < each.length; i++) {
            for (int k = 0; k < steps; k++) {
                sum[k] += weighed.parts().get(i).weight() * each[i][k];
            }
        }
        return sum;
    }
}
