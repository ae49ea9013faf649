package org.soakwright.planner.batch;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import org.soakwright.planner.conditions.Currents;
import org.soakwright.planner.conditions.Lag;
import org.soakwright.planner.conditions.Warmth;
import org.soakwright.recipes.model.Medium;
import org.soakwright.recipes.model.Quantity;
import org.soakwright.recipes.model.Recipe;
import org.soakwright.recipes.model.Species;
import org.soakwright.recipes.model.Step;
import org.soakwright.recipes.text.Unsound;
import org.soakwright.solver.chain.Chain;
import org.soakwright.solver.chain.Course;
import org.soakwright.solver.chain.Probe;
import org.soakwright.solver.chain.StageTooShort;
import org.soakwright.solver.transport.Buoyancy;

/**
 * What moves a liquor that nothing stirs: what the pieces give off makes it denser or lighter beside them, the stronger the film the less. The
 * difference is its mean size over the step, weighted by itself, since a large one carries more. Found by going half way from each difference to
 * the one that its film leaves; films go with about the fourth root of the difference, so that this comes to rest. Done when every
 * grade's moves by less than {@link #SMALL} of itself or of what it was at first; after {@link #MOST_ROUNDS} the recipe is refused.
 */
final class StillLiquor {
    private static final double SMALL = 1e-4;
    private static final int MOST_ROUNDS = 60;

    /** Looks at the surface in each stage, each in the middle of its part of the time. */
    private static final int LOOKS = 12;

    /**
     * Of time, in whose root the looks are even: once the film is behind, the difference falls with the root of time, and its square counts
     * as much from a thousandth of the step to a hundredth as from there to a tenth. Good to 1 % of the difference, a quarter of that of the film.
     */
    private static final int POWER = 4;

    private final Recipe recipe;
    private final Films films;
    private final int step;
    private final double[] seconds;
    private final Currents currents;
    private final List<Species> weighing;
    private final List<Translation.Slot> slots;

    StillLiquor(Recipe recipe, Films films, int step, double[] seconds) {
        this.recipe = recipe;
        this.films = films;
        this.step = step;
        this.seconds = seconds;
        Step.Wet wet = (Step.Wet) recipe.steps().get(step);
        currents = new Currents(recipe, wet, (org.soakwright.recipes.model.Film.Computed) wet.film());
        weighing = Currents.weighing(recipe).stream()
                .filter(species -> species.exchangesWith(Medium.LIQUOR))
                .toList();
        slots = new Translation(recipe, films).slots();
        if (weighing.isEmpty() && warmer(0).isEmpty()) {
            throw new Unsound(
                    ((org.soakwright.recipes.model.Film.Computed) wet.film()).place(),
                    "nothing here is known to move still liquor; add substance: sodium chloride or sucrose to a species, or"
                            + " write another film, such as {speed: 0.05 m/s}");
        }
    }

    /** Finds what moves the liquor beside the pieces of each grade, and puts it into the films. */
    void settle() {
        int grades = recipe.lot().grades().size();
        double[] first = new double[grades];
        for (int j = 0; j < grades; j++) {
            films.set(step, j, new Buoyancy(1));
        }
        for (int round = 0; round < MOST_ROUNDS; round++) {
            List<Buoyancy> left = left();
            boolean rests = round > 0;
            for (int j = 0; j < grades; j++) {
                Buoyancy next = left.get(j);
                double now = films.difference(step, j).orElseThrow();
                first[j] = round == 0 ? next.size() : first[j];
                rests &= Math.abs(next.size() - now) <= SMALL * Math.max(first[j], now);
                // The first is only a guess, and goes.
                double half = round == 0 || next.size() == 0 ? 1 : (now + next.size()) / (2 * next.size());
                films.set(step, j, new Buoyancy(half * next.byContent(), half * next.byTemperature()));
            }
            if (rests) {
                return;
            }
        }
        throw new Unsound(
                recipe.steps().get(step).place(),
                "the film of " + recipe.steps().get(step).name()
                        + " does not settle; state its coefficient, such as 2e-6 m/s");
    }

    private List<Buoyancy> left() {
        List<Map<Species, Double>> away = new ArrayList<>();
        List<Map<Species, Double>> more = new ArrayList<>();
        int grades = recipe.lot().grades().size();
        for (int j = 0; j < grades; j++) {
            away.add(new LinkedHashMap<>());
            more.add(new LinkedHashMap<>());
        }
        for (Species species : weighing) {
            Chain chain = new Translation(recipe, films).plain(species, step);
            double partition = Translation.partition(species, recipe.steps().get(step));
            for (int j = 0; j < grades; j++) {
                double[] mean = mean(chain, species, j, partition);
                away.get(j).put(species, mean[0]);
                more.get(j).put(species, mean[1]);
            }
        }
        List<Buoyancy> left = new ArrayList<>();
        for (int j = 0; j < grades; j++) {
            left.add(currents.buoyancy(away.get(j), more.get(j), warmer(j).orElse(0)));
        }
        return left;
    }

    /** What the liquor holds, and what it holds more beside a grade's pieces, kg/m3. */
    private double[] mean(Chain chain, Species species, int grade, double partition) {
        double liquor = 0;
        double net = 0;
        double sizes = 0;
        double squares = 0;
        double time = 0;
        double[] done = new double[0];
        Beside beside = new Beside(
                grade,
                partition,
                films.inFilm(step, species, grade),
                Films.twoFaced(species, recipe.lot().grades().get(grade)));
        for (int k = 0; k < chain.size(); k++) {
            double whole = slots.get(k).seconds(seconds);
            double[] upTo = java.util.Arrays.copyOf(done, k + 1);
            boolean own = slots.get(k).step() == step && !slots.get(k).isGap();
            for (int i = 0; own && i < LOOKS; i++) {
                upTo[k] = whole * Math.pow((i + 0.5) / LOOKS, POWER);
                double lasting = whole * (Math.pow((i + 1.0) / LOOKS, POWER) - Math.pow((double) i / LOOKS, POWER));
                Optional<Look> look = look(chain, beside, upTo);
                if (look.isPresent()) {
                    double difference = look.get().more();
                    liquor += lasting * look.get().away();
                    net += lasting * difference;
                    sizes += lasting * Math.abs(difference);
                    squares += lasting * difference * difference;
                    time += lasting;
                }
            }
            upTo[k] = whole;
            done = upTo;
        }
        return new double[] {time == 0 ? 0 : liquor / time, sizes == 0 ? 0 : Math.signum(net) * squares / sizes};
    }

    /** Contents of the liquor: away from the pieces, and more beside them, kg/m3. */
    private record Look(double away, double more) {}

    /** Empty so early in a stage that it would need more modes than are kept: such a look says little of the whole step. */
    private static Optional<Look> look(Chain chain, Beside beside, double[] upTo) {
        try {
            Course course = chain.follow(upTo);
            int stage = upTo.length - 1;
            double away = course.value(new Probe.Liquor(), stage);
            return Optional.of(new Look(away, beside.more(course, stage, away)));
        } catch (StageTooShort early) {
            return Optional.empty();
        }
    }

    /**
     * The liquor beside a grade's pieces.
     *
     * @param inFilm the part of what lies between surface and liquor that the film has, where a skin covers it
     * @param oneCovered whether the skin covers the back alone
     */
    private record Beside(int grade, double partition, double inFilm, boolean oneCovered) {
        double more(Course course, int stage, double away) {
            if (!oneCovered) {
                return inFilm * (course.value(new Probe.Surface(grade), stage) / partition - away);
            }
            double back = course.value(new Probe.At(grade, 0), stage) / partition - away;
            double front = course.value(new Probe.At(grade, 1), stage) / partition - away;
            return (inFilm * back + front) / 2;
        }
    }

    /** What the pieces are warmer than the liquor over the first step, K; empty where the lot states no other temperature. */
    private OptionalDouble warmer(int grade) {
        Quantity lot = recipe.lot().temperature();
        Quantity there = recipe.steps().get(step).temperature();
        if (step > 0 || lot == null || there == null || lot.si() == there.si()) {
            return OptionalDouble.empty();
        }
        Warmth warmth = Warming.warmth(recipe, recipe.lot().grades().get(grade));
        return OptionalDouble.of((lot.si() - there.si()) * Lag.mean(warmth, seconds[0]));
    }
}
