package org.soakwright.planner.batch;

import java.util.Arrays;
import java.util.stream.Collectors;
import org.soakwright.recipes.Outcome;
import org.soakwright.recipes.model.Recipe;

/** Small recipes for tests of the planner: a lot, then the steps and targets that a test is about. */
final class Recipes {
    private Recipes() {}

    static Recipe of(String... lines) {
        String text = Arrays.stream(lines).collect(Collectors.joining("\n", "", "\n"));
        Outcome outcome = org.soakwright.recipes.Recipes.read("test.yaml", text);
        if (outcome instanceof Outcome.Refused refused) {
            throw new AssertionError(refused.problems() + "\n" + text);
        }
        return ((Outcome.Accepted) outcome).recipe();
    }

    /** Two grades of salted slabs, 190 g/kg, the properties at 5 Cel. */
    static final String LOINS = """
            language: 1
            title: Loins
            product: [food]
            lot:
              mass: 600 kg
              density: 1120 kg/m3
              pieces:
                - {name: thin, shape: slab, thickness: 18 mm, share: 40 %}
                - {name: thick, shape: slab, thickness: 26 mm, share: 60 %}
            species:
              salt:
                start: 190 g/kg
                diffusivity: {value: 8e-10 m2/s, at: 5 Cel, activation-energy: 22 kJ/mol}
                partition: 0.8
            """;

    static String water(String name, String volume, String time) {
        return "  - {soak: " + name + ", liquor: {" + volume
                + ", salt: 0 g/L}, temperature: 4 Cel, film: {coefficient: 2e-6 m/s}, time: " + time + "}";
    }
}
