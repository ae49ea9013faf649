package org.soakwright.planner.batch;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.soakwright.recipes.model.Reading;
import org.soakwright.recipes.model.Recipe;
import org.soakwright.solver.stage.Surface;

/** Skins: layers that a species passes slowly, behind the film. */
class SkinsTest {
    private static final double HOUR = 3600;

    private static String[] lines(String pieces, String skin, String film) {
        return new String[] {
            "language: 1",
            "title: Skins",
            "product: [other]",
            "lot: {mass: 100 kg, density: 1000 kg/m3, pieces: [" + pieces + "]}",
            "species:",
            "  salt: {start: 60 g/kg, diffusivity: 8e-10 m2/s, partition: 0.8, exchanges-with: both" + skin + "}",
            "steps:",
            "  - {soak: bath, liquor: {volume: unlimited, salt: 0 g/L}, film: " + film + ", time: 6 h}",
            "  - {dry: shelf, air: {equilibrium: {salt: 10 g/kg}}, film: {coefficient: 3e-8 m/s}, time: 6 h}"
        };
    }

    private static final String SLAB = "{name: a, shape: slab, thickness: 8 mm, share: 100 %}";

    private static Recipe recipe(String pieces, String skin, String film) {
        return Recipes.of(lines(pieces, skin, film));
    }

    private static Surface surface(Recipe recipe, int step, int grade) {
        return Films.of(recipe, StepTimes.nominal(recipe))
                .surface(step, recipe.species().get(0), grade);
    }

    private static double film(Surface surface) {
        return ((Surface.Film) surface).coefficient();
    }

    private static double mean(Recipe recipe) {
        return new Batch(recipe)
                .follow(6 * HOUR, 6 * HOUR)
                .end(0)
                .pieces()
                .get(0)
                .species()
                .get(0)
                .value(Reading.MEAN);
    }

    /** 1/(1/2e-6 + 1/5e-7) = 4e-7 m/s; with nothing before it, the skin alone. */
    @Test
    void filmAndSkinAreInSeries() {
        String skin = ", skin: {permeance: 5e-7 m/s, face: both}";
        assertEquals(4e-7, film(surface(recipe(SLAB, skin, "{coefficient: 2e-6 m/s}"), 0, 0)), 1e-20);
        assertEquals(5e-7, film(surface(recipe(SLAB, skin, "negligible"), 0, 0)), 1e-20);
    }

    /**
     * In air the contents are the piece's: a difference of so much in the piece is one of 1/0.8 in liquor, so the skin's 5e-7 m/s are
     * 6.25e-7; with the film 1/(1/3e-8 + 1/6.25e-7) = 2.862595e-8 m/s.
     */
    @Test
    void inAirASkinCountsContentsOfThePiece() {
        String skin = ", skin: {permeance: 5e-7 m/s, face: both}";
        assertEquals(2.862595e-8, film(surface(recipe(SLAB, skin, "negligible"), 1, 0)), 1e-14);
    }

    /**
     * One term of the slab's series is all that is left after 6 h: zeta tan zeta = Bi = 4e-7 x 4e-3/(0.8 x 8e-10) = 2.5, zeta =
     * 1.1422268547824 (by Brent's method in SciPy); mean 2 Bi^2/(zeta^2 (zeta^2 + Bi^2 + Bi)) exp(-zeta^2 Fo), Fo = 1.08: 0.232858103;
     * the second term is 1.2e-8.
     */
    @Test
    void whatPassesASkinIsWhatAFilmOfBothPasses() {
        Recipe recipe = recipe(SLAB, ", skin: {permeance: 5e-7 m/s, face: both}", "{coefficient: 2e-6 m/s}");
        assertEquals(SERIES, mean(recipe), 1e-8);
    }

    private static final double SERIES = 60 * 0.23285811468;

    @Test
    void aSkinThatLetsAllThroughIsNone() {
        double bare = mean(recipe(SLAB, "", "{coefficient: 2e-6 m/s}"));
        assertEquals(
                bare, mean(recipe(SLAB, ", skin: {permeance: 1 m/s, face: both}", "{coefficient: 2e-6 m/s}")), 2e-4);
    }

    @Test
    void aSkinThatLetsNothingThroughSeals() {
        assertEquals(60, mean(recipe(SLAB, ", skin: {permeance: 1e-15 m/s, face: both}", "negligible")), 1e-5);
    }

    /** A face behind a skin that lets nothing through is a sealed one: `faces: one`. */
    @Test
    void aTightSkinOnOneFaceIsASealedFace() {
        String one = SLAB.replace("8 mm", "8 mm, faces: one");
        double sealed = mean(recipe(one, "", "{coefficient: 2e-6 m/s}"));
        double covered = mean(recipe(SLAB, ", skin: {permeance: 1e-15 m/s, face: one}", "{coefficient: 2e-6 m/s}"));
        assertEquals(sealed, covered, 1e-4);
        double open = mean(recipe(SLAB, ", skin: {permeance: 1 m/s, face: one}", "{coefficient: 2e-6 m/s}"));
        assertEquals(mean(recipe(SLAB, "", "{coefficient: 2e-6 m/s}")), open, 2e-4);
        assertTrue(sealed > open + 5);
    }

    /** A brick with a tight skin on one of its largest faces: a brick with that face sealed. */
    @Test
    void aTightSkinOnOneFaceOfABrickIsASealedFace() {
        String brick = "{name: a, shape: brick, thickness: 8 mm, width: 12 mm, length: 20 mm, share: 100 %}";
        String one = brick.replace("20 mm", "20 mm, faces: {thickness: one}");
        double sealed = mean(recipe(one, "", "{coefficient: 2e-6 m/s}"));
        double covered = mean(recipe(brick, ", skin: {permeance: 1e-15 m/s, face: one}", "{coefficient: 2e-6 m/s}"));
        assertEquals(sealed, covered, 1e-4);
    }

    @Test
    void everyGradeHasItsOwnSkin() {
        String two =
                "{name: a, shape: slab, thickness: 8 mm, share: 50 %}, {name: b, shape: slab, thickness: 8 mm, share: 50 %}";
        Recipe recipe = recipe(two, ", skin: {b: {permeance: 5e-7 m/s, face: both}}", "{coefficient: 2e-6 m/s}");
        assertEquals(2e-6, film(surface(recipe, 0, 0)), 0);
        assertEquals(4e-7, film(surface(recipe, 0, 1)), 1e-20);
        List<StepEnd.Piece> pieces =
                new Batch(recipe).follow(6 * HOUR, 6 * HOUR).end(0).pieces();
        double bare = mean(recipe(SLAB, "", "{coefficient: 2e-6 m/s}"));
        assertEquals(bare, pieces.get(0).species().get(0).value(Reading.MEAN), 1e-9);
        assertEquals(SERIES, pieces.get(1).species().get(0).value(Reading.MEAN), 1e-8);
    }

    @Test
    void aSkinIsRefusedWhereItMeansNothing() {
        String[] ball =
                lines("{shape: sphere, diameter: 8 mm}", ", skin: {permeance: 5e-7 m/s, face: one}", "negligible");
        assertTrue(Refused.said(ball).contains("face: both"), Refused.said(ball));
        String[] faceless = lines(SLAB, ", skin: {permeance: 5e-7 m/s}", "negligible");
        assertTrue(Refused.said(faceless).startsWith("test.yaml:6:"), Refused.said(faceless));
        String[] sealed = lines(SLAB, ", skin: {permeance: 0 m/s, face: both}", "negligible");
        assertTrue(Refused.said(sealed).startsWith("test.yaml:6:"), Refused.said(sealed));
    }
}
