package org.soakwright.planner.report;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.soakwright.planner.batch.Batch;
import org.soakwright.planner.batch.Checked;
import org.soakwright.planner.batch.Run;
import org.soakwright.recipes.Outcome;
import org.soakwright.recipes.Recipes;
import org.soakwright.recipes.model.Recipe;

/** What lies between steps is said once, as it is computed. */
class HandlingWordsTest {
    private static Recipe recipe(String between, String second, String third, String fills) {
        String soak =
                "  - {soak: %s, liquor: {ratio: 2 L/kg, salt: 0 g/L}, film: {coefficient: 2e-6 m/s}, time: 6 h%s}\n";
        String text = """
                language: 1
                title: Slices
                product: [other]
                lot: {mass: 10 kg, density: 1100 kg/m3, pieces: [{name: slice, shape: slab, thickness: 8 mm}]}
                species: {salt: {start: 60 g/kg, diffusivity: 8e-10 m2/s, partition: 0.8}}
                """ + between + "steps:\n" + soak.formatted("first", "") + soak.formatted("second", second)
                + soak.formatted("third", third)
                + "  - {rinse: fills, liquor: {ratio: 1 L/kg, salt: 0 g/L}, fills: 3, film: negligible, time: 90 min"
                + fills + "}\n";
        return assertInstanceOf(Outcome.Accepted.class, Recipes.read("test.yaml", text), text)
                .recipe();
    }

    private static final String CHANGED = ", changeover: {drain: 20 min, refill: 30 min}";

    @Test
    void nothingIsSaidOfARecipeThatSaysNothing() {
        Recipe plain = recipe("between: 20 min\n", "", "", "");
        assertEquals(List.of(), HandlingWords.of(plain));
        assertEquals(Optional.of("steps"), HandlingWords.transferred(plain));
        assertEquals(Optional.empty(), HandlingWords.transferred(recipe("", "", "", "")));
    }

    @Test
    void everyWayIsSaidOnce() {
        Recipe recipe = recipe(
                "between: 20 min\n",
                ", stays: true, attended: true" + CHANGED,
                ", stays: true, hold-at-most: 2 h" + CHANGED,
                ", attended: true, hold-at-most: 0 min, changeover: {drain: 15 min, refill: 0 min}");
        assertEquals(
                List.of(
                        "Before second and third the pieces stay in the vessel of the step before: 20 min to drain, 30 min to"
                                + " refill; the clock counts them.",
                        "Between the fills of fills the pieces stay drained: 15 min to drain; the clock counts them, the time of the step does"
                                + " not.",
                        "Somebody attends second and fills: on a line in crew hours only.",
                        "A line may hold third up to 2 h longer.",
                        "A line may hold fills no longer than the recipe says."),
                HandlingWords.of(recipe));
        assertEquals(Optional.of("steps in different vessels"), HandlingWords.transferred(recipe));
    }

    @Test
    void aLotThatNeverLeavesItsVesselIsNotTransferred() {
        Recipe recipe = recipe("between: 20 min\n", ", stays: true", ", stays: true", ", stays: true");
        assertEquals(Optional.empty(), HandlingWords.transferred(recipe));
        assertEquals(
                List.of(
                        "Before second, third and fills the pieces stay in the vessel of the step before: it begins at once."),
                HandlingWords.of(recipe));
    }

    /** The time of fills is that in liquor; the clock has run 2 x 35 min more, from 20 min after the 18 h and 50 min twice: 20:00 to 22:40. */
    @Test
    void checkAndSheetSayItAndTheClockCountsIt() {
        Recipe recipe = recipe(
                "between: 20 min\n",
                ", stays: true" + CHANGED,
                ", stays: true" + CHANGED,
                ", changeover: {drain: 15 min, refill: 20 min}");
        String checked = CheckSheet.of(Checked.of(recipe), Style.PLAIN);
        assertTrue(checked.contains("Handling\n"), checked);
        assertTrue(checked.contains("Before second and third the pieces stay"), checked);
        Run run = new Batch(recipe).follow(6 * 3600, 6 * 3600, 6 * 3600, 90 * 60);
        Section steps =
                Findings.of(run, Optional.empty()).section(Findings.STEPS).orElseThrow();
        String shown = String.join("\n", steps.lines(Style.PLAIN));
        assertTrue(shown.contains("1 h 30 min  20:00 – 22:40"), shown);
        assertTrue(
                shown.contains(
                        "Between steps in different vessels 20 min to drain and transfer; the clock counts them."),
                shown);
    }
}
