package org.soakwright.planner.report;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNull;

import java.io.IOException;
import java.util.List;
import java.util.Map;
import org.jspecify.annotations.Nullable;
import org.junit.jupiter.api.Test;
import org.soakwright.planner.batch.Checked;
import org.soakwright.recipes.Outcome;
import org.soakwright.recipes.Recipes;
import org.soakwright.recipes.model.Recipe;

/** The groups are those of J. Crank, The Mathematics of Diffusion, 2nd ed. 1975, sections 4.3.5, 4.3.6: D t/l^2, L and alpha. */
class CheckJsonTest {
    private static final String RECIPE = """
            language: 1
            title: Two conditions
            product: [other]
            lot:
              mass: 100 kg
              density: 1000 kg/m3
              pieces:
                - {name: plate, shape: slab, thickness: 20 mm, share: 100 %}
            species:
              dye: {start: 10 g/kg, diffusivity: 1e-9 m2/s, partition: 0.5}
            steps:
              - soak: bath
                liquor: {volume: 150 L, dye: 0 g/L}
                film: {coefficient: 2e-6 m/s}
                time: {from: 1e4 s, to: 5e4 s, grain: 1e4 s}
              - soak: brook
                liquor: {volume: unlimited, dye: 0 g/L}
                film: negligible
                time: 1e5 s
              - rest: shelf
                time: 1e3 s
            """;

    private static Map<String, @Nullable Object> checked() throws IOException {
        Recipe recipe = ((Outcome.Accepted) Recipes.read("recipe.yaml", RECIPE)).recipe();
        return Json.object(CheckJson.of(new Stamp("0.1.0", "00ff"), Checked.of(recipe)));
    }

    @Test
    void theGroupsHaveTheNamesOfTheLanguage() throws IOException {
        assertEquals(
                List.of("soakwright", "title", "inputs-sha256", "groups", "shapes", "fits", "cautions"),
                Json.names(checked()));
        assertEquals(
                List.of("step", "species", "piece", "Fo", "Bi", "capacity-ratio", "regime"),
                Json.names(checked(), "groups", 0));
    }

    /** D t/l^2 with l = 10 mm: 1e-9 x 1e4 / 1e-4. */
    @Test
    void aFreeTimeGivesARangeOfFourierNumbers() throws IOException {
        assertEquals(0.1, Json.number(checked(), "groups", 0, "Fo", 0), 1e-12);
        assertEquals(0.5, Json.number(checked(), "groups", 0, "Fo", 1), 1e-12);
        assertEquals(1.0, Json.number(checked(), "groups", 1, "Fo", 0), 1e-12);
        assertEquals(1.0, Json.number(checked(), "groups", 1, "Fo", 1), 1e-12);
    }

    /** k l/(K D) = 2e-6 x 0.01 / (0.5 x 1e-9); V/(K v) = 0.15 m3 / (0.5 x 0.1 m3). */
    @Test
    void theFilmAndTheBathAreMeasuredAgainstThePiece() throws IOException {
        assertEquals(40.0, Json.number(checked(), "groups", 0, "Bi"), 1e-9);
        assertEquals(3.0, Json.number(checked(), "groups", 0, "capacity-ratio"), 1e-12);
        assertEquals("infinite", Json.at(checked(), "groups", 1, "Bi"));
        assertNull(Json.at(checked(), "groups", 1, "capacity-ratio"));
        assertEquals(0.0, Json.number(checked(), "groups", 2, "Bi"));
        assertNull(Json.at(checked(), "groups", 2, "capacity-ratio"));
    }
}
