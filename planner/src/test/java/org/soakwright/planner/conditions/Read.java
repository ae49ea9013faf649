package org.soakwright.planner.conditions;

import static org.junit.jupiter.api.Assertions.assertThrows;

import org.soakwright.recipes.Outcome;
import org.soakwright.recipes.Recipes;
import org.soakwright.recipes.model.Recipe;
import org.soakwright.recipes.text.Unsound;

/** Recipes of one species and one soak. */
final class Read {
    private Read() {}

    static Recipe soak(String species, String liquor, String temperature) {
        String text = text(species, liquor, temperature);
        Outcome outcome = Recipes.read("test.yaml", text);
        if (outcome instanceof Outcome.Refused refused) {
            throw new AssertionError(refused.problems() + "\n" + text);
        }
        return ((Outcome.Accepted) outcome).recipe();
    }

    /** What is said of one that must be refused, when it is read or made known. */
    static String refusal(String species, String liquor, String temperature) {
        Outcome outcome = Recipes.read("test.yaml", text(species, liquor, temperature));
        if (outcome instanceof Outcome.Refused refused) {
            return refused.problems().get(0).toString();
        }
        Recipe recipe = ((Outcome.Accepted) outcome).recipe();
        return assertThrows(Unsound.class, () -> Known.of(recipe))
                .problems()
                .get(0)
                .toString();
    }

    private static String text(String species, String liquor, String temperature) {
        return String.join(
                "\n",
                "language: 1",
                "title: One",
                "product: [other]",
                "lot: {mass: 100 kg, density: 1000 kg/m3, pieces: [{shape: slab, thickness: 8 mm}]}",
                "species:",
                "  salt: {start: 0 g/kg, partition: 0.8, " + species + "}",
                "steps:",
                "  - soak: bath",
                "    liquor: {ratio: 3 L/kg, " + liquor + "}",
                "    film: negligible",
                "    time: 6 h",
                temperature.isEmpty() ? "" : "    temperature: " + temperature,
                "");
    }
}
