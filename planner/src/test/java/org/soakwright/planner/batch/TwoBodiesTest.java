package org.soakwright.planner.batch;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.api.Test;
import org.soakwright.recipes.model.Recipe;

/**
 * Incropera and DeWitt, 6th ed., example 14.7, p 913: a patch of 50 x 50 mm on skin, 100 kg/m3 in it, 1e-13 m2/s in the patch and 2e-13 in the
 * skin, which holds half as much in equilibrium; 28.7 mg pass in 7 d. A recipe has pieces in a liquor that is mixed, so two bodies that
 * touch cannot be written; but neither has an end here, so their common face keeps the content that it takes at once: 100/(1 + 0.5
 * 2^(1/2)) = 58.5786 kg/m3 on the patch's side. Each of the two, in plenty of that liquor, must give the book's dose.
 */
class TwoBodiesTest {
    private static final double WEEK = 7 * 86_400.0;

    private static double milligrams(String species) {
        Recipe recipe = Recipes.of(
                "language: 1",
                "title: Patch",
                "product: [other]",
                "lot: {volume: 25 mL, pieces: [{shape: slab, thickness: 10 mm, faces: one}]}",
                "species:",
                "  drug: {" + species + "}",
                "steps:",
                "  - {soak: wear, liquor: {volume: unlimited, drug: 58.57864376269049 g/L}, film: negligible, time: 7 d}");
        double end = new Batch(recipe).follow(WEEK).end(0).means().get(0).value();
        return end * 25e-6 * 1e6;
    }

    @Test
    void thePatchLosesTheBooksDose() {
        double lost = 100 * 25e-6 * 1e6 - milligrams("start: 100 kg/m3, diffusivity: 1e-13 m2/s, partition: 1");
        assertEquals(28.7, lost, 0.05);
        assertEquals(28.7359, lost, 1e-4);
    }

    @Test
    void theSkinGainsIt() {
        double gained = milligrams("start: 0 kg/m3, diffusivity: 2e-13 m2/s, partition: 0.5");
        assertEquals(28.7359, gained, 1e-4);
    }
}
