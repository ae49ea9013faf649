package org.soakwright.planner.conditions;

import java.util.ArrayList;
import java.util.List;
import org.soakwright.recipes.model.Diffusivities;
import org.soakwright.recipes.model.Diffusivity;
import org.soakwright.recipes.model.Quantity;
import org.soakwright.recipes.model.Recipe;
import org.soakwright.recipes.model.Species;
import org.soakwright.recipes.model.Step;

/** What the diffusivities of a recipe become at the temperatures of its steps. */
final class Movements {
    private Movements() {}

    /** One for each diffusivity that depends on temperature and each temperature. */
    static List<Conversion> of(Recipe recipe) {
        List<Conversion> conversions = new ArrayList<>();
        for (Species species : recipe.species()) {
            for (Diffusivity stated : species.diffusivity().all()) {
                List<Double> seen = new ArrayList<>();
                for (Step step : recipe.steps()) {
                    Quantity temperature = step.temperature();
                    Diffusivities own = step.head().overrides().diffusivity().get(species.name());
                    if (temperature != null
                            && own == null
                            && stated.dependsOnTemperature()
                            && !seen.contains(temperature.si())) {
                        seen.add(temperature.si());
                        conversions.add(one(species, stated, temperature));
                    }
                }
            }
        }
        return conversions;
    }

    private static Conversion one(Species species, Diffusivity stated, Quantity temperature) {
        double value = Movement.at(stated, temperature);
        return new Conversion(
                "diffusivity of " + species.name() + " at " + temperature,
                written(stated),
                Quantity.derived(value, stated.value().unit(), stated.place()).toString(),
                how(stated.law()));
    }

    private static String written(Diffusivity stated) {
        String from = stated.from() == null ? "" : " (" + stated.from() + ")";
        if (stated.law() instanceof Diffusivity.Law.Activated activated) {
            return stated.value() + " at " + activated.at() + from;
        }
        if (stated.law() instanceof Diffusivity.Law.Viscous viscous) {
            return stated.value() + " at " + viscous.at() + from;
        }
        return stated.value() + from;
    }

    private static String how(Diffusivity.Law law) {
        if (law instanceof Diffusivity.Law.Activated activated) {
            return "Arrhenius' law with " + activated.energy();
        }
        if (law instanceof Diffusivity.Law.Measured measured) {
            return "the logarithm straight in 1/T between " + measured.points().size() + " points";
        }
        return "with temperature over the viscosity of water, assumed where nothing of the material is known";
    }
}
