package org.soakwright.recipes.model;

import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import org.soakwright.recipes.text.Place;
import org.soakwright.recipes.text.Problem;

/** What makes a recipe whole. */
final class RecipeRules {
    private RecipeRules() {}

    static List<Problem> counts(
            Place place,
            String title,
            Set<Product> products,
            List<Species> species,
            List<Step> steps,
            List<Goal> minimise) {
        List<Problem> problems = new ArrayList<>();
        if (title.isBlank()) {
            problems.add(new Problem(place, "the recipe has no title; write one"));
        }
        if (products.isEmpty()) {
            problems.add(new Problem(place, "the recipe has no product; write such as product: [food]"));
        }
        if (species.isEmpty()) {
            problems.add(new Problem(place, "the recipe has no species; write at least one"));
        }
        if (steps.isEmpty()) {
            problems.add(new Problem(place, "the recipe has no steps; write at least one soak, rinse, rest or dry"));
        }
        if (minimise.isEmpty()) {
            problems.add(new Problem(place, "minimise names nothing; write time, cost or liquor"));
        }
        problems.addAll(Names.duplicates(
                "species",
                species.stream()
                        .map(one -> new Reference(one.name(), one.place()))
                        .toList()));
        problems.addAll(Names.duplicates(
                "steps",
                steps.stream()
                        .map(step -> new Reference(step.name(), step.place()))
                        .toList()));
        return problems;
    }

    static List<Problem> agreement(
            Declared declared,
            Place place,
            List<Species> species,
            List<Step> steps,
            List<Target> targets,
            List<Goal> minimise) {
        Consistency consistency = new Consistency(declared);
        List<Problem> problems = new ArrayList<>();
        species.forEach(one -> problems.addAll(consistency.of(one)));
        steps.forEach(step -> problems.addAll(consistency.of(step)));
        targets.forEach(target -> problems.addAll(consistency.of(target)));
        minimise.forEach(goal -> problems.addAll(consistency.of(goal, place)));
        return problems;
    }
}
