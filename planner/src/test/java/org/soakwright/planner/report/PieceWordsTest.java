package org.soakwright.planner.report;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.soakwright.recipes.Outcome;
import org.soakwright.recipes.Recipes;
import org.soakwright.recipes.model.Grade;
import org.soakwright.recipes.model.Recipe;

/** How pieces of every shape are spoken of. */
class PieceWordsTest {
    private static Recipe recipe(String pieces, String lot, String salt) {
        Outcome outcome = Recipes.read(
                "recipe.yaml", """
                language: 1
                title: Shapes
                product: [other]
                lot:
                  mass: 3 kg
                  density: 1000 kg/m3
                  pieces: [PIECES]
                LOT
                species:
                  salt: {start: START, partition: 1}
                  sugar: {start: 0 g/kg, diffusivity: 1e-9 m2/s, partition: 1}
                steps:
                  - rest: night
                    time: 8 h
                targets: []
                minimise: time
                """.replace("PIECES", pieces).replace("LOT", lot).replace("START", salt));
        if (outcome instanceof Outcome.Refused refused) {
            throw new AssertionError(refused.problems());
        }
        return ((Outcome.Accepted) outcome).recipe();
    }

    private static Recipe recipe(String pieces) {
        return recipe(pieces, "", "10 g/kg, diffusivity: 1e-9 m2/s");
    }

    private static Grade grade(String keys) {
        return recipe("{name: a, " + keys + "}").lot().grades().get(0);
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "shape: slab, thickness: 18 mm | a, slab of 18 mm",
                "shape: slab, thickness: 18 mm, faces: one | a, slab of 18 mm with one face sealed",
                "shape: cylinder, diameter: 10 mm | a, cylinder of 10 mm",
                "shape: sphere, diameter: 3 mm | a, sphere of 3 mm",
                "shape: short-cylinder, diameter: 250 mm, length: 95 mm | a, short cylinders 250 mm across, 95 mm long",
                "shape: short-cylinder, diameter: 25 cm, length: 95 mm, faces: one"
                        + " | a, short cylinders 25 cm across, 95 mm long, one flat face sealed",
                "shape: brick, thickness: 65 mm, width: 102 mm, length: 215 mm | a, bricks of 65 x 102 x 215 mm",
                "shape: brick, thickness: 65 mm, width: 102 mm, length: 21.5 cm"
                        + " | a, bricks of 65 mm x 102 mm x 21.5 cm",
                "shape: brick, thickness: 65 mm, width: 102 mm, length: 215 mm, faces: {thickness: one}"
                        + " | a, bricks of 65 x 102 x 215 mm, thickness sealed on one face",
                "shape: brick, thickness: 6 mm, width: 9 mm, length: 9 mm, faces: {thickness: one, width: one}"
                        + " | a, bricks of 6 x 9 x 9 mm, thickness and width sealed on one face each",
            })
    void aGradeIsCalledByItsSizes(String keys, String words) {
        assertEquals(words, PieceWords.grade(grade(keys)));
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "shape: short-cylinder, diameter: 250 mm, length: 95 mm | along the length | flat face",
                "shape: short-cylinder, diameter: 60 mm, length: 95 mm | along the radius | round side",
                "shape: short-cylinder, diameter: 150 mm, length: 95 mm, faces: one | along the radius | round side",
                "shape: brick, thickness: 65 mm, width: 102 mm, length: 215 mm | along the thickness | face",
                "shape: brick, thickness: 65 mm, width: 102 mm, length: 215 mm, faces: {thickness: one}"
                        + " | along the width | face",
            })
    void theShortestWayLeadsOutOfTheCore(String keys, String way, String face) {
        assertTrue(PieceWords.hasSeveralSides(grade(keys)));
        assertEquals(way, PieceWords.way(grade(keys)));
        assertEquals(face, PieceWords.face(grade(keys)));
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "shape: slab, thickness: 18 mm | the middle of the thickness",
                "shape: slab, thickness: 18 mm, faces: one | the sealed face",
                "shape: cylinder, diameter: 10 mm | around the axis",
                "shape: short-cylinder, diameter: 250 mm, length: 95 mm"
                        + " | the core: on the axis, half the length (47.5 mm) in",
                "shape: short-cylinder, diameter: 250 mm, length: 95 mm, faces: one"
                        + " | the core: on the axis, at the sealed flat face",
                "shape: brick, thickness: 65 mm, width: 102 mm, length: 215 mm, faces: {thickness: one}"
                        + " | the core: half the width (51 mm) and half the length (107.5 mm) in, at the sealed face of the thickness",
                "shape: brick, thickness: 6 mm, width: 9 mm, length: 9 mm, faces: {thickness: one, width: one, length: one}"
                        + " | the core: where the sealed faces of thickness, width and length meet",
            })
    void theCoreHasItsPlace(String keys, String place) {
        assertEquals(place, PieceWords.core(grade(keys)));
    }

    @Test
    void whereSizesDifferNoHalfIsMeasured() {
        Recipe recipe = recipe(
                "{name: a, shape: short-cylinder, diameter: 250 mm, length: 95 mm}",
                "  spread: 3 %",
                "10 g/kg, diffusivity: 1e-9 m2/s");
        assertEquals(
                "the core: on the axis, half the length in",
                PieceWords.core(recipe.lot().grades().get(0)));
    }

    @Test
    void whatDiffersFromPieceToPieceIsNamed() {
        String slab = "{name: a, shape: slab, thickness: 18 mm}";
        Recipe alike = recipe(slab);
        assertEquals(Optional.empty(), PieceWords.differences(alike));
        assertFalse(
                PieceWords.differ(alike.lot().grades().get(0), alike.species().get(0)));
        Recipe spread = recipe(slab, "  spread: 3 %", "10 g/kg, diffusivity: 1e-9 m2/s");
        assertEquals(Optional.of("Pieces differ: sizes spread by 3 %."), PieceWords.differences(spread));
        assertTrue(
                PieceWords.differ(spread.lot().grades().get(0), spread.species().get(1)));
        Recipe start = recipe(slab, "", "{value: 10 g/kg, varies: 6 %}, diffusivity: 1e-9 m2/s");
        assertEquals(Optional.of("Pieces differ: salt at the start varies by 6 %."), PieceWords.differences(start));
        assertFalse(
                PieceWords.differ(start.lot().grades().get(0), start.species().get(1)), "sugar does not");
        Recipe all = recipe(
                slab, "  spread: 3 %", "{value: 10 g/kg, varies: 6 %}, diffusivity: {value: 1e-9 m2/s, varies: 10 %}");
        assertEquals(
                Optional.of(
                        "Pieces differ: sizes spread by 3 %; salt at the start varies by 6 %, its diffusivity by 10 %."),
                PieceWords.differences(all));
        Recipe pace = recipe(slab, "", "10 g/kg, diffusivity: {value: 1e-9 m2/s, varies: 10 %}");
        assertEquals(
                Optional.of("Pieces differ: the diffusivity of salt varies by 10 %."), PieceWords.differences(pace));
    }
}
