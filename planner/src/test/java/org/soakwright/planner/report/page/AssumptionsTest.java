package org.soakwright.planner.report.page;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.soakwright.recipes.Outcome;
import org.soakwright.recipes.Recipes;

/** What is taken of the time between liquors is what is computed. */
class AssumptionsTest {
    private static List<String> resting(String between, String second, String fills) {
        String text = """
                language: 1
                title: Slices
                product: [other]
                lot: {mass: 10 kg, density: 1100 kg/m3, pieces: [{name: slice, shape: slab, thickness: 8 mm}]}
                species: {salt: {start: 60 g/kg, diffusivity: 8e-10 m2/s, partition: 0.8}}
                BETWEENsteps:
                  - {soak: first, liquor: {ratio: 2 L/kg, salt: 0 g/L}, film: negligible, time: 6 h}
                  - {soak: second, liquor: {ratio: 2 L/kg, salt: 0 g/L}, film: negligible, time: 6 hSECOND}
                  - {rinse: last, liquor: {ratio: 2 L/kg, salt: 0 g/L}, fills: 3, film: negligible, time: 6 hFILLS}
                """.replace("BETWEEN", between).replace("SECOND", second).replace("FILLS", fills);
        Outcome.Accepted accepted = assertInstanceOf(Outcome.Accepted.class, Recipes.read("test.yaml", text), text);
        return Assumptions.of(accepted.recipe()).stream()
                .filter(point -> point.contains("rest"))
                .toList();
    }

    @Test
    void transfersAndChangeoversAreEachSaidWhereTheyAre() {
        String changed = ", changeover: {drain: 20 min, refill: 30 min}";
        String moved =
                " the pieces rest for 15 min at the temperature of the step before; nothing leaves or enters them.";
        assertEquals(List.of(), resting("", ", stays: true", ""));
        assertEquals(List.of("Between steps" + moved), resting("between: 15 min\n", "", ""));
        assertEquals(
                List.of(
                        "Between steps in different vessels" + moved,
                        "While a vessel is drained and refilled, before second and between the fills of last, the pieces rest"
                                + " in it at the temperature of the liquor that goes; nothing leaves or enters them."),
                resting("between: 15 min\n", ", stays: true" + changed, changed));
        assertEquals(
                List.of("Between steps in different vessels" + moved),
                resting("between: 15 min\n", ", stays: true", ""));
    }
}
