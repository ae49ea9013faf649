package org.soakwright.recipes.model;

import java.util.ArrayList;
import java.util.Collections;
import java.util.EnumSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
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
        @Nullable Prices prices) {
    public Recipe {
        species = List.copyOf(species);
        steps = List.copyOf(steps);
        targets = List.copyOf(targets);
        minimise = List.copyOf(minimise);
        Declared declared = declared(products, lot, species, steps, prices);
        List<Problem> problems = new ArrayList<>(RecipeRules.counts(place, title, products, species, steps, minimise));
        problems.addAll(RecipeRules.agreement(declared, place, species, steps, targets, minimise));
        problems.addAll(Consistency.ofBetween(between));
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

    /** The same recipe with other steps. */
    public Recipe withSteps(List<Step> others) {
        return new Recipe(place, title, products, lot, species, between, others, targets, minimise, prices);
    }
}
