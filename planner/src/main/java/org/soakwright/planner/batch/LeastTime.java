package org.soakwright.planner.batch;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.stream.DoubleStream;
import org.jspecify.annotations.Nullable;
import org.soakwright.planner.conditions.Known;
import org.soakwright.recipes.model.Content;
import org.soakwright.recipes.model.Counted;
import org.soakwright.recipes.model.Diffusivities;
import org.soakwright.recipes.model.Diffusivity;
import org.soakwright.recipes.model.Film;
import org.soakwright.recipes.model.Handling;
import org.soakwright.recipes.model.Limits;
import org.soakwright.recipes.model.Liquor;
import org.soakwright.recipes.model.LiquorVolume;
import org.soakwright.recipes.model.Medium;
import org.soakwright.recipes.model.Overrides;
import org.soakwright.recipes.model.Quantity;
import org.soakwright.recipes.model.Reading;
import org.soakwright.recipes.model.Recipe;
import org.soakwright.recipes.model.Renewal;
import org.soakwright.recipes.model.Species;
import org.soakwright.recipes.model.Start;
import org.soakwright.recipes.model.Step;
import org.soakwright.recipes.model.StepHead;
import org.soakwright.recipes.model.Target;
import org.soakwright.recipes.model.Time;
import org.soakwright.recipes.model.Traits;
import org.soakwright.recipes.text.Kind;
import org.soakwright.recipes.text.Place;
import org.soakwright.recipes.text.Unit;
import org.soakwright.recipes.text.Unsound;

/**
 * What no choice of durations can beat, from one fact: a content diffuses from high to low, so it stays above what it would be had the piece lain
 * all that time, drained or not, in an endless liquor as lean as the leanest of its steps behind the thinnest of their films (and below what the
 * richest would make of it). There the content depends on the sum of diffusivity times time alone, and falls with it, so a target asks for a least
 * sum. It holds for mean, core and highest where at most is asked, mean, core and lowest where at least is.
 */
public final class LeastTime {
    private static final Unit SQUARE_METRE_PER_SECOND =
            Kind.DIFFUSIVITY.unit("m2/s").orElseThrow();
    private static final Unit METRE_PER_SECOND = Kind.SPEED.unit("m/s").orElseThrow();
    private static final Unit KG_PER_M3 = Kind.PER_VOLUME.unit("kg/m3").orElseThrow();
    private static final Unit SECOND = Kind.DURATION.unit("s").orElseThrow();

    /** How closely the least time is sought, as a part of it; the side that is too short is given. */
    private static final double NEAR = 1e-5;

    private static final double LONGEST = 36_525.0 * 86_400;
    private static final double SHORTEST = 1;

    private final Recipe recipe;
    private final Target.OfPieces target;
    private final Species species;
    private final boolean upper;

    private LeastTime(Recipe recipe, Target.OfPieces target, Species species, boolean upper) {
        this.recipe = recipe;
        this.target = target;
        this.species = species;
        this.upper = upper;
    }

    /**
     * The durations of the steps weighed by these sum to no less than so much.
     *
     * @param weights one for each step, from 0 to 1
     * @param seconds s
     */
    public record Bound(double[] weights, double seconds) {}

    /** For every target of a recipe without time between its steps for which anything is known. */
    public static List<Bound> of(Recipe written) {
        Recipe recipe = Known.of(written).recipe();
        List<Bound> bounds = new ArrayList<>();
        if (recipe.lot().temperature() != null) {
            // Pieces that come warm move faster than their steps say.
            return bounds;
        }
        for (Target any : recipe.targets()) {
            if (any instanceof Target.OfPieces target
                    && target.counted().equals(Counted.AS_LOADED)
                    && recipe.confidence(target).isEmpty()) {
                Species species = recipe.species(target.species().name()).orElseThrow();
                for (boolean upper : new boolean[] {true, false}) {
                    if (isKnown(target, upper)) {
                        new LeastTime(recipe, target, species, upper).bound().ifPresent(bounds::add);
                    }
                }
            }
        }
        return bounds;
    }

    private static boolean isKnown(Target.OfPieces target, boolean upper) {
        Reading reading = target.reading();
        boolean average = reading == Reading.MEAN || reading == Reading.CORE;
        return upper
                ? target.limits().atMost() != null && (average || reading == Reading.HIGHEST)
                : target.limits().atLeast() != null && (average || reading == Reading.LOWEST);
    }

    private Optional<Bound> bound() {
        List<Step> steps = recipe.steps();
        int last =
                target.after() == null ? steps.size() - 1 : index(target.after().name());
        double fastest = 0;
        double outside = Double.NaN;
        double film = 0;
        int first = -1;
        int end = -1;
        for (int i = 0; i <= last; i++) {
            if (!(Translation.stated(species, steps.get(i)) instanceof Diffusivities.Alike)) {
                return Optional.empty();
            }
            double diffusivity = Translation.diffusivity(species, steps.get(i));
            fastest = Math.max(fastest, diffusivity);
            Double pulls = pulls(steps.get(i));
            if (pulls != null) {
                outside = Double.isNaN(outside) ? pulls : upper ? Math.min(outside, pulls) : Math.max(outside, pulls);
                film = Math.max(film, openness(steps.get(i)) / diffusivity);
                first = first < 0 ? i : first;
                end = i;
            }
        }
        if (first < 0 || (upper ? outside > least() : outside < most())) {
            return Optional.empty();
        }
        // A uniform start rests without changing; a mean does not change in a rest at the end.
        int from = species.start() instanceof Start.Uniform ? first : 0;
        int to = target.reading() == Reading.MEAN ? end : last;
        double[] weights = new double[steps.size()];
        for (int i = from; i <= to; i++) {
            weights[i] = Translation.diffusivity(species, steps.get(i)) / fastest;
        }
        double seconds = seconds(fastest, outside, film * fastest);
        return seconds > 0 ? Optional.of(new Bound(weights, seconds)) : Optional.empty();
    }

    private int index(String name) {
        for (int i = 0; i < recipe.steps().size(); i++) {
            if (recipe.steps().get(i).name().equals(name)) {
                return i;
            }
        }
        throw new IllegalStateException("no step " + name);
    }

    /** The content towards which a step pulls the surface, kg/m3 of piece; null where nothing is exchanged. */
    private @Nullable Double pulls(Step step) {
        if (step instanceof Step.Wet wet && species.exchangesWith(Medium.LIQUOR)) {
            return Translation.partition(species, step) * wet.liquor().kgPerM3(species.name());
        }
        if (step instanceof Step.Dry dry && species.exchangesWith(Medium.AIR)) {
            Content equilibrium = dry.air().equilibrium().get(species.name());
            return equilibrium == null ? 0.0 : recipe.lot().kgPerM3(equilibrium);
        }
        return null;
    }

    /** Film coefficient over partition, m/s of content of the piece; without end where that is not stated or there is a skin to count. */
    private double openness(Step step) {
        Film film = step instanceof Step.Wet wet ? wet.film() : ((Step.Dry) step).film();
        if (film instanceof Film.Coefficient stated) {
            return stated.value().si() / (step instanceof Step.Wet ? Translation.partition(species, step) : 1);
        }
        return Double.POSITIVE_INFINITY;
    }

    private double least() {
        return starts().min().orElse(0);
    }

    private double most() {
        return starts().max().orElse(0);
    }

    private DoubleStream starts() {
        if (species.startVaries() != null) {
            return DoubleStream.of(0, Double.MAX_VALUE);
        }
        return species.start() instanceof Start.Uniform uniform
                ? DoubleStream.of(recipe.lot().kgPerM3(uniform.content()))
                : ((Start.Profile) species.start())
                        .points().stream().mapToDouble(point -> recipe.lot().kgPerM3(point.content()));
    }

    /** The least time in which an endless liquor meets the target; 0 where it does so at once. */
    private double seconds(double diffusivity, double outside, double openness) {
        Batch endless = new Batch(endless(diffusivity, outside, openness));
        double high = 3600;
        while (!meets(endless, high)) {
            high *= 2;
            if (high > LONGEST) {
                // Nothing meets it; whoever plans the recipe is told so there.
                return 0;
            }
        }
        double low = 0;
        while (high - low > NEAR * high && high > SHORTEST) {
            double middle = 0.5 * (low + high);
            if (meets(endless, middle)) {
                high = middle;
            } else {
                low = middle;
            }
        }
        return low;
    }

    private static boolean meets(Batch batch, double seconds) {
        try {
            return Arrays.stream(batch.follow(seconds).misses().values()).allMatch(miss -> miss <= 1e-7);
        } catch (Unsound tooShort) {
            return false;
        }
    }

    /** One step in endless liquor, for this species and this side of this target alone. */
    private Recipe endless(double diffusivity, double outside, double openness) {
        Place place = recipe.place();
        Step of = recipe.steps().get(0);
        double partition = species.partition().value();
        StepHead head = new StepHead(
                place,
                "endless",
                new Time.Fixed(Quantity.ofSi(3600, SECOND, place)),
                of.temperature(),
                new Overrides(
                        Map.of(
                                species.name(),
                                new Diffusivities.Alike(
                                        Diffusivity.of(Quantity.ofSi(diffusivity, SQUARE_METRE_PER_SECOND, place)))),
                        Map.of()),
                null,
                null,
                Handling.NONE);
        Liquor liquor = new Liquor(
                place,
                new LiquorVolume.Unlimited(place),
                Map.of(species.name(), new Content(Quantity.ofSi(outside / partition, KG_PER_M3, place))),
                true,
                null);
        Film film = Double.isInfinite(openness)
                ? new Film.Negligible()
                : new Film.Coefficient(Quantity.ofSi(openness * partition, METRE_PER_SECOND, place));
        Limits limits = target.limits();
        Target own = new Target.OfPieces(
                target.place(),
                target.species(),
                target.reading(),
                new Limits(
                        limits.place(),
                        limits.basis(),
                        upper ? limits.atMost() : null,
                        upper ? null : limits.atLeast()),
                target.grade(),
                null,
                target.share(),
                target.counted(),
                null);
        // Without skins: whatever holds back less only makes it quicker.
        Traits bare = new Traits(
                species.traits().substance(),
                species.traits().molarMass(),
                species.traits().inLiquor(),
                Map.of(),
                null);
        Species wet = new Species(
                species.place(),
                species.name(),
                species.start(),
                species.startVaries(),
                species.diffusivity(),
                species.diffusivityVaries(),
                species.partition(),
                bare,
                Set.of(Medium.LIQUOR));
        return recipe.withTargets(List.of(own))
                .with(List.of(wet), List.of(new Step.Rinse(head, liquor, new Renewal.Plenty(), film, null)));
    }
}
