package org.soakwright.recipes.model;

import java.util.ArrayList;
import java.util.Collections;
import java.util.EnumSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.function.UnaryOperator;
import java.util.stream.Collectors;
import org.jspecify.annotations.Nullable;
import org.soakwright.recipes.text.Place;
import org.soakwright.recipes.text.Problem;

/**
 * A whole recipe, all of whose parts agree.
 *
 * @param products which cautions apply; one or more
 * @param species one or more, of different names
 * @param between drain and transfer between steps; null is none
 * @param steps one or more, of different names, in the order they happen
 * @param allowedBy who answers for the plan in spite of a caution that stops it; null is nobody
 * @param confidence of every target on pieces, liquor or mass that states none; null is none
 * @param minimise what is to be least, first first; one or more
 */
public record Recipe(
        Place place,
        String title,
        Set<Product> products,
        Lot lot,
        List<Species> species,
        @Nullable Quantity between,
        List<Step> steps,
        List<Target> targets,
        List<Goal> minimise,
        @Nullable Prices prices,
        @Nullable String allowedBy,
        @Nullable Quantity confidence) {
    public Recipe {
        Rules.confidence(confidence);
        species = List.copyOf(species);
        steps = List.copyOf(steps);
        targets = List.copyOf(targets);
        minimise = List.copyOf(minimise);
        Declared declared = declared(products, lot, species, steps, prices);
        List<Problem> problems = new ArrayList<>(RecipeRules.counts(place, title, products, species, steps, minimise));
        problems.addAll(RecipeRules.agreement(declared, place, species, steps, targets, minimise));
        problems.addAll(Consistency.ofBetween(between));
        problems.addAll(Water.problems(lot.moisture(), species));
        problems.addAll(HandlingRules.problems(steps));
        problems.addAll(Clinging.problems(steps, lot.massKg()));
        problems.addAll(Counting.problems(steps, targets, minimise, prices));
        Rules.require(problems);
        products = Collections.unmodifiableSet(EnumSet.copyOf(products));
    }

    private static Declared declared(
            Set<Product> products, Lot lot, List<Species> species, List<Step> steps, @Nullable Prices prices) {
        Map<String, String> kinds = new LinkedHashMap<>();
        steps.forEach(step -> kinds.put(step.name(), step.kind()));
        Map<String, Shape> shapes = new LinkedHashMap<>();
        lot.grades().forEach(grade -> shapes.put(grade.name(), grade.shape()));
        return new Declared(
                products,
                species.stream().map(Species::name).collect(Collectors.toSet()),
                species,
                kinds,
                shapes.keySet(),
                shapes,
                lot.density() != null,
                lot.moisture() != null,
                steps.stream().anyMatch(step -> step.head().gain() != null),
                prices != null || steps.stream().anyMatch(step -> step.head().price() != null));
    }

    public Optional<Species> species(String name) {
        return species.stream().filter(one -> one.name().equals(name)).findFirst();
    }

    public Optional<Step> step(String name) {
        return steps.stream().filter(one -> one.name().equals(name)).findFirst();
    }

    /** The price of the liquor of a step, its own or the recipe's; empty where there is none. */
    public Optional<LiquorPrice> liquorPrice(Step step) {
        return LiquorPrice.of(step, prices);
    }

    /** What lies between a step, from 0, and the one before it; nothing before the first. */
    public Gap gapBefore(int step) {
        Handling handling = steps.get(step).head().handling();
        if (step == 0) {
            return new Gap.None();
        }
        if (handling.stays()) {
            return handling.changeover() == null ? new Gap.None() : new Gap.Refilling(handling.changeover());
        }
        return between == null ? new Gap.None() : new Gap.Transfer(between);
    }

    /** The currency of its prices; empty where there are none. */
    public Optional<String> currency() {
        return Counting.currency(steps, targets, prices);
    }

    /** The same recipe for another lot. */
    public Recipe withLot(Lot other) {
        return new Recipe(
                place,
                title,
                products,
                other,
                species,
                between,
                steps,
                targets,
                minimise,
                prices,
                allowedBy,
                confidence);
    }

    /** The same recipe with other steps, and nothing between them but what they say. */
    public Recipe running(List<Step> others) {
        return new Recipe(
                place, title, products, lot, species, null, others, targets, minimise, prices, allowedBy, confidence);
    }

    /** All that lies before, between and within steps, s: from the first of them, from 0, up to but without the other. */
    public double gapSeconds(int from, int to) {
        double sum = 0;
        for (int i = from; i < to; i++) {
            Step step = steps.get(i);
            sum += gapBefore(i).seconds()
                    + (step.fills() - 1) * step.gapBetweenFills().seconds();
        }
        return sum;
    }

    /** The same recipe with other steps. */
    public Recipe withSteps(List<Step> others) {
        return new Recipe(
                place,
                title,
                products,
                lot,
                species,
                between,
                others,
                targets,
                minimise,
                prices,
                allowedBy,
                confidence);
    }

    /** The same recipe with other species and steps. */
    public Recipe with(List<Species> otherSpecies, List<Step> others) {
        return new Recipe(
                place,
                title,
                products,
                lot,
                otherSpecies,
                between,
                others,
                targets,
                minimise,
                prices,
                allowedBy,
                confidence);
    }

    /** The same recipe with other targets. */
    public Recipe withTargets(List<Target> others) {
        return new Recipe(
                place, title, products, lot, species, between, steps, others, minimise, prices, allowedBy, confidence);
    }

    /** The species that is the water of the pieces: the one whose substance it is, else the one named so. */
    public Optional<Species> water() {
        return species.stream()
                .filter(one -> one.traits().substance() == Substance.WATER)
                .findFirst()
                .or(() -> species.stream().filter(Species::isWater).findFirst());
    }

    /** How surely a target is to be met; empty where nobody says, and for totals of what is planned. */
    public Optional<Quantity> confidence(Target target) {
        return target instanceof Target.OfTotal
                ? Optional.empty()
                : Optional.ofNullable(target.confidence() == null ? confidence : target.confidence());
    }

    /** With every measured quantity changed; times, counts, shares, prices and limits stay. */
    public Recipe each(UnaryOperator<Quantity> change) {
        return new Recipe(
                place,
                title,
                products,
                lot.each(change),
                species.stream().map(one -> one.each(change)).toList(),
                between,
                steps.stream().map(step -> step.each(change)).toList(),
                targets,
                minimise,
                prices,
                allowedBy,
                confidence);
    }

    /** Every quantity with a give-or-take, in the order of the file, each with a name of its own. */
    public List<Uncertain> uncertain() {
        return new Doubts(this).all();
    }
}
