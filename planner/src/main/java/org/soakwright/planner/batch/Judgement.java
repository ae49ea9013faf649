package org.soakwright.planner.batch;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.stream.IntStream;
import org.jspecify.annotations.Nullable;
import org.soakwright.planner.batch.doubt.Chance;
import org.soakwright.planner.batch.doubt.Draws;
import org.soakwright.planner.batch.doubt.Percentile;
import org.soakwright.planner.batch.doubt.Shares;
import org.soakwright.recipes.model.Quantity;
import org.soakwright.recipes.model.Recipe;
import org.soakwright.recipes.model.Target;
import org.soakwright.recipes.text.Unsound;

/**
 * A run judged by many samples of what is not known exactly: in rounds, so that the error of sampling shows. The same whatever the number of
 * threads.
 *
 * @param held what each requirement with a confidence is held to, in SI, comparable with the stated limit; NaN for others
 */
record Judgement(Outlook outlook, double[] held) {
    private static final int ROUNDS = 20;

    /** 20 rounds of 512: some ten thousand. Fewer where all of them would take longer than the budget, down to 640. */
    private static final int MOST_PER_ROUND = 512;

    private static final int FEWEST_PER_ROUND = 32;

    /** Processor time for all samples, microseconds, by {@link Run#effort}. */
    private static final double BUDGET = 8e6;

    /** Where following is dear: in a sketch, in fewer rounds of fewer. */
    private static final int DEAR_ROUNDS = 8;

    private static final int DEAR_PER_ROUND = 32;

    /** Samples beyond a percentile, at least. */
    private static final double FEWEST_BEYOND = 2.5;

    /** Readings below this part of the largest have no logarithm worth explaining. */
    private static final double ABOVE_ZERO = 1e-9;

    static Judgement of(Run run, Uncertainty uncertainty, Progress progress) {
        return new Sampled(run, uncertainty, progress).judged();
    }

    /** What the samples read. */
    private static final class Sampled {
        private final Run run;
        private final Uncertainty uncertainty;
        private final Draws draws;
        private final boolean dear;
        private final List<Requirement> requirements;
        /** By requirement, then by sample; comparable with the stated limit. */
        private final double[][] values;

        private final boolean[][] passes;
        private final Unsound[] refusals;

        Sampled(Run run, Uncertainty uncertainty, Progress progress) {
            this.run = run;
            this.uncertainty = uncertainty;
            dear = run.batch().isDear();
            draws = dear
                    ? new Draws(uncertainty.size(), DEAR_ROUNDS, DEAR_PER_ROUND)
                    : new Draws(uncertainty.size(), ROUNDS, perRound(run.effort()));
            requirements = run.batch().requirements();
            values = new double[requirements.size()][draws.size()];
            passes = new boolean[requirements.size()][draws.size()];
            refusals = new Unsound[draws.size()];
            double[] seconds = run.seconds();
            int perRound = draws.size() / draws.rounds();
            for (int r = 0; r < draws.rounds(); r++) {
                progress.at("following what is not known exactly", (double) r / draws.rounds());
                IntStream.range(r * perRound, (r + 1) * perRound).parallel().forEach(i -> sample(i, seconds));
            }
        }

        /** A percentile beyond nearly all samples says nothing. */
        private void requireEnough(int requirement) {
            double level = run.batch().assurance().level(requirement);
            double beyond = Math.min(level, 1 - level) * draws.size();
            if (beyond < FEWEST_BEYOND) {
                Recipe recipe = run.batch().recipe();
                Target target =
                        recipe.targets().get(requirements.get(requirement).target());
                throw new Unsound(
                        recipe.confidence(target).map(Quantity::place).orElse(target.place()),
                        "so high a confidence cannot be told from the " + draws.size()
                                + " samples that are followed of this recipe; write at most "
                                + Math.floor(1000 * (1 - FEWEST_BEYOND / draws.size())) / 10 + " %");
            }
        }

        private static int perRound(double effort) {
            int perRound = MOST_PER_ROUND;
            while (perRound > FEWEST_PER_ROUND && ROUNDS * perRound * effort > BUDGET) {
                perRound /= 2;
            }
            return perRound;
        }

        private void sample(int i, double[] seconds) {
            try {
                Recipe drawn = uncertainty.drawn(draws.normals(i));
                Run own = follow(drawn, seconds);
                for (int r = 0; r < values.length; r++) {
                    Requirement requirement = own.batch().requirements().get(r);
                    double value = own.stated(requirement);
                    passes[r][i] = requirement.allows(value);
                    values[r][i] = value * Ensemble.comparable(requirements.get(r), requirement);
                }
            } catch (Unsound impossible) {
                refusals[i] = impossible;
            }
        }

        private Run follow(Recipe drawn, double[] seconds) {
            if (dear) {
                try {
                    return run.batch().sample(drawn, true).follow(seconds);
                } catch (Unsound blurred) {
                    // Too short for a sketch is not yet too short.
                    return run.batch().sample(drawn, false).follow(seconds);
                }
            }
            return run.batch().sample(drawn, false).follow(seconds);
        }

        Judgement judged() {
            int[] followed = IntStream.range(0, refusals.length)
                    .filter(i -> refusals[i] == null)
                    .toArray();
            @Nullable
            Shares shares = Shares.possible(draws.dimensions(), followed.length) ? new Shares(draws, followed) : null;
            double[] held = new double[requirements.size()];
            double[] errors = new double[requirements.size()];
            Arrays.fill(held, Double.NaN);
            for (int r : run.batch().assurance().held()) {
                Percentile percentile = held(r, refusals.length - followed.length);
                held[r] = percentile.value();
                errors[r] = percentile.error();
            }
            run.batch().assurance().held().forEach(this::requireEnough);
            Map<List<Object>, List<Integer>> byGrade = new LinkedHashMap<>();
            for (int r = 0; r < requirements.size(); r++) {
                Optional<String> grade =
                        TargetState.of(run, requirements.get(r)).grade();
                byGrade.computeIfAbsent(List.of(requirements.get(r).target(), grade), key -> new ArrayList<>())
                        .add(r);
            }
            List<Outlook.Prospect> prospects = byGrade.values().stream()
                    .map(sides -> prospect(sides, followed, errors, shares))
                    .toList();
            Recipe recipe = run.batch().recipe();
            List<Chance> chances = new ArrayList<>();
            for (int t = 0; t < recipe.targets().size(); t++) {
                int target = t;
                chances.add(chance(IntStream.range(0, requirements.size())
                        .filter(r -> requirements.get(r).target() == target)
                        .toArray()));
            }
            Outlook outlook = new Outlook(
                    chance(IntStream.range(0, requirements.size()).toArray()),
                    refusals.length - followed.length,
                    Arrays.stream(refusals).filter(Objects::nonNull).findFirst().map(Throwable::getMessage),
                    dear,
                    run.batch().assurance().any() ? run.batch().assurance().samples() : 0,
                    chances,
                    prospects,
                    IntStream.range(0, uncertainty.size())
                            .mapToObj(uncertainty::name)
                            .toList());
            return new Judgement(outlook, held);
        }

        private Chance chance(int[] together) {
            boolean[] all = new boolean[draws.size()];
            for (int i = 0; i < all.length; i++) {
                all[i] = refusals[i] == null;
                for (int r : together) {
                    all[i] &= passes[r][i];
                }
            }
            return Chance.of(all, draws.rounds());
        }

        /** Samples that could not be followed count as beyond any limit. */
        private Percentile held(int r, int refused) {
            Requirement requirement = requirements.get(r);
            double beyond = requirement.upper() ? Double.POSITIVE_INFINITY : Double.NEGATIVE_INFINITY;
            double[] all = values[r].clone();
            for (int i = 0; i < all.length; i++) {
                all[i] = refusals[i] == null ? all[i] : beyond;
            }
            Percentile percentile =
                    Percentile.of(all, draws.rounds(), run.batch().assurance().level(r));
            if (Double.isInfinite(percentile.value())) {
                throw Assurance.tooOftenRefused(
                        run.batch().recipe(),
                        requirement,
                        refused,
                        draws.size(),
                        Arrays.stream(refusals)
                                .filter(Objects::nonNull)
                                .findFirst()
                                .map(Throwable::getMessage)
                                .orElse(""));
            }
            return percentile;
        }

        private Outlook.Prospect prospect(
                List<Integer> sides, int[] followed, double[] errors, @Nullable Shares shares) {
            int nearest = sides.get(0);
            for (int r : sides) {
                if (run.miss(requirements.get(r)) > run.miss(requirements.get(nearest))) {
                    nearest = r;
                }
            }
            Requirement requirement = requirements.get(nearest);
            double[] read = values[nearest];
            double[] own = Arrays.stream(followed).mapToDouble(i -> read[i]).toArray();
            Target target = run.batch().recipe().targets().get(requirement.target());
            TargetState state = TargetState.of(run, requirement);
            double unit = TargetState.of(run, requirement, 1).value()
                    - TargetState.of(run, requirement, 0).value();
            boolean holds = run.batch().assurance().holds(nearest);
            return new Outlook.Prospect(
                    target,
                    state.grade(),
                    TargetState.name(run.batch().recipe(), requirement, ""),
                    chance(sides.stream().mapToInt(r -> r).toArray()),
                    holds
                            ? OptionalDouble.of(run.batch()
                                    .recipe()
                                    .confidence(target)
                                    .orElseThrow()
                                    .si())
                            : OptionalDouble.empty(),
                    own.length == 0
                            ? List.of()
                            : Outlook.LEVELS.stream()
                                    .map(level -> TargetState.of(
                                                    run,
                                                    requirement,
                                                    Percentile.of(own, 1, level).value())
                                            .value())
                                    .toList(),
                    holds && Double.isFinite(errors[nearest])
                            ? OptionalDouble.of(Math.abs(unit) * errors[nearest])
                            : OptionalDouble.empty(),
                    state.unit(),
                    shares == null
                            ? List.of()
                            : Arrays.stream(shares.of(explained(own))).boxed().toList());
        }

        private static double[] explained(double[] read) {
            double most = Arrays.stream(read).map(Math::abs).max().orElse(0);
            boolean positive = Arrays.stream(read).allMatch(value -> value > ABOVE_ZERO * most);
            return positive ? Arrays.stream(read).map(Math::log).toArray() : read;
        }
    }
}
