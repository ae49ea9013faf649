package org.soakwright.planner.batch;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.soakwright.planner.conditions.Movement;
import org.soakwright.recipes.model.Diffusivity;
import org.soakwright.recipes.model.Medium;
import org.soakwright.recipes.model.Quantity;
import org.soakwright.recipes.model.Recipe;
import org.soakwright.recipes.model.Species;
import org.soakwright.recipes.model.Step;
import org.soakwright.solver.transport.Caution;
import org.soakwright.solver.transport.Estimate;

/** Where what was worked out of a recipe lies outside what its sources cover. */
final class Reservations {
    private Reservations() {}

    /** Each kind said once of a step, in the order of steps and species. */
    static List<String> of(Recipe recipe, Films films) {
        Map<String, String> said = new LinkedHashMap<>();
        for (int i = 0; i < recipe.steps().size(); i++) {
            Step step = recipe.steps().get(i);
            for (Species species : recipe.species()) {
                movement(species, step, said);
                if (species.exchangesWith(Medium.LIQUOR)) {
                    for (int j = 0; j < recipe.lot().grades().size(); j++) {
                        film(films, i, species, j, step, said);
                    }
                }
            }
        }
        return List.copyOf(said.values());
    }

    private static void movement(Species species, Step step, Map<String, String> said) {
        Quantity temperature = step.temperature();
        if (temperature == null) {
            return;
        }
        for (Diffusivity stated : Translation.stated(species, step).all()) {
            if (stated.dependsOnTemperature()) {
                for (Caution caution : Movement.at(stated, temperature.si()).cautions()) {
                    add("Diffusivity of " + species.name() + " in " + step.name(), caution, said);
                }
            }
        }
    }

    private static void film(Films films, int index, Species species, int grade, Step step, Map<String, String> said) {
        films.estimate(index, species, grade)
                .map(Estimate::cautions)
                .orElse(List.of())
                .forEach(caution -> add("Film of " + step.name(), caution, said));
    }

    /** Grades and species that lie outside in the same way are one. */
    private static void add(String what, Caution caution, Map<String, String> said) {
        String kind = caution instanceof Caution.Outside outside ? outside.what() + outside.source() : caution.text();
        said.putIfAbsent(what + kind, what + ": " + caution.text() + ".");
    }
}
