package org.soakwright.planner.line.verify;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import org.soakwright.recipes.model.Amount;
import org.soakwright.recipes.model.Handling;
import org.soakwright.recipes.model.Lot;
import org.soakwright.recipes.model.Quantity;
import org.soakwright.recipes.model.Recipe;
import org.soakwright.recipes.model.Renewal;
import org.soakwright.recipes.model.Step;
import org.soakwright.recipes.model.StepHead;
import org.soakwright.recipes.model.Time;
import org.soakwright.recipes.text.Kind;
import org.soakwright.recipes.text.Place;
import org.soakwright.recipes.text.Unit;

/**
 * What really happens to a load as a recipe without any choice: each fill is a soak of its own, each gap a rest at the conditions of the step before.
 *
 * @param seconds of each step of the recipe
 */
record Unrolled(Recipe recipe, double[] seconds) {
    private static final Unit SECOND = Kind.DURATION.unit("s").orElseThrow();
    private static final Unit KILOGRAM = Kind.MASS.unit("kg").orElseThrow();

    /** The recipe for a load of so many kg. */
    static Recipe weighing(Recipe recipe, double kg) {
        Lot lot = recipe.lot();
        Amount amount =
                new Amount.ByMass(Quantity.ofSi(kg, KILOGRAM, lot.amount().place()));
        return recipe.withLot(new Lot(
                lot.place(),
                amount,
                lot.density(),
                lot.temperature(),
                lot.moisture(),
                lot.thermalDiffusivity(),
                lot.grades()));
    }

    static Unrolled of(Cargo cargo) {
        List<Step> steps = new ArrayList<>();
        Set<String> names = new HashSet<>();
        cargo.recipe().steps().forEach(step -> names.add(step.name()));
        long until = cargo.first().stint().from();
        for (Cargo.Part part : cargo.parts()) {
            long gap = part.stint().from() - until;
            if (gap > 0) {
                steps.add(rest(steps.get(steps.size() - 1), "gap " + steps.size(), names, gap));
            }
            steps.add(alone(part, names));
            until = part.stint().until();
        }
        double[] seconds =
                steps.stream().mapToDouble(step -> step.time().seconds(0)).toArray();
        return new Unrolled(cargo.recipe().running(steps), seconds);
    }

    private static Step alone(Cargo.Part part, Set<String> names) {
        StepHead head = part.step().head();
        int fills = part.step().fills();
        // Readings after a step are those after its last fill.
        String name = part.fill() + 1 == fills ? head.name() : unused(head.name() + " " + (part.fill() + 1), names);
        Quantity gain = head.gain();
        StepHead own = new StepHead(
                head.place(),
                name,
                lasting(part.stint().lasts(), head.place()),
                head.temperature(),
                head.overrides(),
                head.price(),
                gain == null ? null : gain.times(1.0 / fills),
                Handling.NONE);
        if (part.step() instanceof Step.Rinse rinse && rinse.renewal() instanceof Renewal.Fills) {
            return new Step.Soak(own, rinse.liquor(), rinse.film(), rinse.dragOut());
        }
        return part.step().with(own);
    }

    private static Step rest(Step before, String name, Set<String> names, long seconds) {
        StepHead head = before.head();
        return new Step.Rest(new StepHead(
                head.place(),
                unused(name, names),
                lasting(seconds, head.place()),
                head.temperature(),
                head.overrides(),
                null,
                null,
                Handling.NONE));
    }

    private static Time lasting(long seconds, Place place) {
        return new Time.Fixed(Quantity.ofSi((double) seconds, SECOND, place));
    }

    private static String unused(String wanted, Set<String> names) {
        String name = wanted;
        while (!names.add(name)) {
            name += "'";
        }
        return name;
    }
}
