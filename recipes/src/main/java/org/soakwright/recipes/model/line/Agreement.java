package org.soakwright.recipes.model.line;

import java.time.Duration;
import java.time.Instant;
import java.time.ZonedDateTime;
import java.util.ArrayList;
import java.util.Collection;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import java.util.Set;
import java.util.stream.Stream;
import org.soakwright.recipes.model.LiquorVolume;
import org.soakwright.recipes.model.Names;
import org.soakwright.recipes.model.Quantity;
import org.soakwright.recipes.model.Recipe;
import org.soakwright.recipes.model.Reference;
import org.soakwright.recipes.model.Step;
import org.soakwright.recipes.model.Word;
import org.soakwright.recipes.text.Kind;
import org.soakwright.recipes.text.Nearest;
import org.soakwright.recipes.text.Place;
import org.soakwright.recipes.text.Problem;
import org.soakwright.recipes.text.Unit;

/**
 * Whether the parts of a line agree with each other. Each can be asked about alone, so that a reader learns of every
 * disagreement even where other parts are broken; a {@link Line} asks about all of them.
 */
public final class Agreement {
    /** More than a hall makes in months. */
    public static final int MOST_ORDERS = 5000;

    /** Bounds how far ahead anybody plans, and looks for a crew. */
    private static final Duration AHEAD = Duration.ofDays(366);

    private static final Unit LITRE = Kind.VOLUME.unit("L").orElseThrow();

    private Agreement() {}

    static List<Problem> counts(
            Place place, String title, List<VesselGroup> vessels, List<Order> orders, List<LineGoal> minimise) {
        List<Problem> problems = new ArrayList<>();
        if (title.isBlank()) {
            problems.add(new Problem(place, "the line has no title; write one"));
        }
        if (vessels.isEmpty()) {
            problems.add(new Problem(place, "the line has no vessels; write at least one"));
        }
        if (orders.isEmpty()) {
            problems.add(new Problem(place, "the line has no lots; write at least one"));
        }
        problems.addAll(ifTooMany(place, orders.size()));
        if (minimise.isEmpty() || minimise.stream().distinct().count() < minimise.size()) {
            problems.add(new Problem(
                    place,
                    "minimise names each goal once, and one at least: found " + Word.list(minimise) + "; write such as"
                            + " lateness"));
        }
        return problems;
    }

    /** A line has only so many lots. */
    public static List<Problem> ifTooMany(Place place, int lots) {
        return lots <= MOST_ORDERS
                ? List.of()
                : List.of(new Problem(
                        place,
                        "a line has at most " + MOST_ORDERS + " lots: found " + (lots > MOST_ORDERS + 1 ? lots : "more")
                                + "; plan them in parts"));
    }

    /** No two single vessels are called the same, nor two utilities. */
    public static List<Problem> ofNames(List<VesselGroup> vessels, List<Utility> utilities) {
        List<Problem> problems = new ArrayList<>(Names.duplicates(
                "vessels",
                vessels.stream()
                        .flatMap(group -> group.vesselNames().stream().map(name -> new Reference(name, group.place())))
                        .toList()));
        problems.addAll(Names.duplicates(
                "utilities",
                utilities.stream()
                        .map(one -> new Reference(one.name(), one.place()))
                        .toList()));
        return problems;
    }

    /** Lots have names of their own, and are ready within a year. */
    public static List<Problem> ofOrders(List<Order> orders, ZonedDateTime starts) {
        List<Problem> problems = new ArrayList<>(Names.duplicates(
                "lots",
                orders.stream()
                        .map(order -> new Reference(order.lot(), order.place()))
                        .toList()));
        orders.forEach(order -> problems.addAll(ifTooFar(order.place(), order.ready(), starts)));
        return problems;
    }

    /** Nobody plans further ahead. */
    public static List<Problem> ifTooFar(Place place, ZonedDateTime ready, ZonedDateTime starts) {
        return !ready.toInstant().isAfter(starts.toInstant().plus(AHEAD))
                ? List.of()
                : List.of(new Problem(
                        place,
                        "a lot is ready within " + AHEAD.toDays() + " d of the start of the line: found \""
                                + ready.toLocalDateTime() + "\", where it starts \"" + starts.toLocalDateTime()
                                + "\"; correct one of them"));
    }

    /** Steps that vessels serve by name are steps of some recipe. */
    public static List<Problem> ofServes(VesselGroup group, Collection<Recipe> recipes) {
        Set<String> known = new LinkedHashSet<>(VesselGroup.KINDS);
        recipes.forEach(recipe -> recipe.steps().forEach(step -> known.add(step.name())));
        return group.steps().stream()
                .filter(step -> !known.contains(step.name()))
                .map(step -> new Problem(
                        step.place(),
                        "neither a kind of step nor a step of any recipe of the line: found \"" + step + "\"; "
                                + Nearest.hint(step.name(), known)))
                .toList();
    }

    /** Lots that share a vessel do not share a liquor; a liquor has room. Said of the first step that shows it. */
    public static List<Problem> ofLiquor(VesselGroup group, Map<String, Recipe> recipes) {
        for (Map.Entry<String, Recipe> entry : recipes.entrySet()) {
            for (Step step : entry.getValue().steps()) {
                boolean ownLiquor =
                        step instanceof Step.Wet wet && !wet.liquor().isUnlimited();
                if (!ownLiquor || !group.serves(step)) {
                    continue;
                }
                String which =
                        group.name() + " also serves " + named(step, entry.getKey()) + ", in a liquor of its own";
                if (group.capacity() != null) {
                    return List.of(new Problem(
                            group.capacity().place(),
                            "lots within a capacity would share their liquor: found that " + which
                                    + "; write volume instead of capacity, or serve that step by a group of its own"));
                }
                if (group.volume() == null) {
                    return List.of(new Problem(
                            group.place(),
                            "a vessel that holds a liquor has a volume: found none, and " + which
                                    + "; write such as volume: {gross: 2500 L, usable: 90 %}"));
                }
            }
        }
        return List.of();
    }

    /** What is drawn is there, counted alike, and no more than there is. */
    public static List<Problem> ofDraws(VesselGroup group, Collection<Utility> utilities, Map<String, Recipe> recipes) {
        return DrawRules.of(group, utilities, recipes);
    }

    /** Every step has a vessel, and every liquor of a stated volume fits one. */
    public static List<Problem> unserved(Place place, List<VesselGroup> vessels, Map<String, Recipe> recipes) {
        List<Problem> problems = new ArrayList<>();
        recipes.forEach((file, recipe) -> recipe.steps().forEach(step -> {
            List<VesselGroup> serving =
                    vessels.stream().filter(group -> group.serves(step)).toList();
            if (serving.isEmpty()) {
                problems.add(new Problem(
                        place,
                        "no vessel serves " + named(step, file) + "; add " + step.kind()
                                + " or the name of the step to what some vessel serves"));
            } else {
                problems.addAll(ifNoRoom(place, step, file, serving));
            }
        }));
        return problems;
    }

    private static List<Problem> ifNoRoom(Place place, Step step, String file, List<VesselGroup> serving) {
        OptionalDouble largest = serving.stream()
                .flatMap(group -> Stream.ofNullable(group.volume()))
                .mapToDouble(Volume::usableM3)
                .max();
        return step instanceof Step.Wet wet
                        && wet.liquor().volume() instanceof LiquorVolume.Volume stated
                        && largest.isPresent()
                        && stated.value().si() >= largest.getAsDouble()
                ? List.of(new Problem(
                        place,
                        "no vessel has room for the liquor of " + named(step, file) + ", and pieces besides: found "
                                + stated.value() + " where the largest that serves it takes "
                                + Quantity.derived(largest.getAsDouble(), LITRE, place)
                                + "; serve it by a larger one, or write the liquor as a ratio"))
                : List.of();
    }

    /** A cost is counted where there are prices, and in one currency. */
    public static List<Problem> ofGoals(List<LineGoal> goals, Map<String, Recipe> recipes, Place place) {
        if (!goals.contains(LineGoal.COST)) {
            return List.of();
        }
        List<String> currencies = recipes.values().stream()
                .flatMap(recipe -> recipe.currency().stream())
                .distinct()
                .toList();
        if (currencies.size() == 1) {
            return List.of();
        }
        return List.of(new Problem(
                place,
                currencies.isEmpty()
                        ? "a line's cost needs prices in some recipe: found none; add such as prices: {time: 40 EUR/h},"
                                + " or leave cost out of minimise"
                        : "a line's cost is counted in one currency: found " + String.join(", ", currencies)
                                + " in its recipes; write them all in one, or minimise without cost"));
    }

    /** At some time within a year there are enough of them for a move. */
    public static List<Problem> ofCrew(Crew crew, Moves moves, Instant starts) {
        int most = crew.spans(starts, starts.plus(AHEAD)).stream()
                .mapToInt(Span::heads)
                .max()
                .orElse(0);
        return most >= moves.heads()
                ? List.of()
                : List.of(new Problem(
                        crew.place(),
                        "the crew never suffices for a move: found at most " + most + " heads at once within "
                                + AHEAD.toDays() + " d of the start where a move needs " + moves.heads()
                                + "; correct the hours, or the heads of moves"));
    }

    static String named(Step step, String file) {
        return "the " + step.kind() + " \"" + step.name() + "\" of " + file;
    }
}
