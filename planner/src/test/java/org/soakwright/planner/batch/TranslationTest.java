package org.soakwright.planner.batch;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;
import org.soakwright.recipes.model.Reading;
import org.soakwright.recipes.model.Recipe;
import org.soakwright.recipes.text.Unsound;

/** What is written is what is computed: hand-worked numbers. */
class TranslationTest {
    private static final double HOUR = 3600;

    /** Gomez et al. 2015, J. Food Eng. 149:188-194 (abstract): water in pork, 32.24 kJ/mol, ratio 1.639 from 2 to 12 Cel by Arrhenius. */
    @Test
    void diffusivityFollowsArrhenius() {
        Recipe recipe = Recipes.of(
                Recipes.LOINS.replace(
                                "at: 5 Cel, activation-energy: 22 kJ/mol", "at: 2 Cel, activation-energy: 32.24 kJ/mol")
                        + "steps:",
                Recipes.water("one", "ratio: 2 L/kg", "6 h").replace("4 Cel", "12 Cel"));
        double d =
                Translation.diffusivity(recipe.species().get(0), recipe.steps().get(0));
        assertEquals(1.639, d / 8e-10, 5e-4);
    }

    @Test
    void aStepsOwnDiffusivityIsNotScaled() {
        Recipe recipe = Recipes.of(
                Recipes.LOINS + "steps:",
                Recipes.water("one", "ratio: 2 L/kg", "6 h, diffusivity: {salt: 6e-10 m2/s}, partition: {salt: 0.7}"));
        assertEquals(
                6e-10,
                Translation.diffusivity(recipe.species().get(0), recipe.steps().get(0)));
        assertEquals(
                0.7,
                Translation.partition(recipe.species().get(0), recipe.steps().get(0)));
    }

    /**
     * After very long: solute 190 g/kg x 600 kg = 114 kg over K V_pieces + V_liquor = 0.8 x 600/1120 + 1.2 m3 = 1.628571 m3 gives
     * 70.0 g/L in the liquor and 0.8 x 70.0/1120 = 50.0 g/kg in the piece.
     */
    @Test
    void aLongSoakEndsAtTheBalancesEquilibrium() {
        Recipe recipe = Recipes.of(Recipes.LOINS + "steps:", Recipes.water("one", "ratio: 2 L/kg", "4000 h"));
        StepEnd end = new Batch(recipe).follow(4000 * HOUR).end(0);
        assertEquals(70.0, end.liquor().get(0).end(), 1e-9);
        assertEquals(50.0, end.means().get(0).value(), 1e-9);
        assertEquals(50.0, end.pieces().get(1).species().get(0).value(Reading.CORE), 1e-9);
    }

    /** 600 kg x 0.05 L/kg = 30 L of 70 g/L join 1200 L of clean water: 30 x 70/1230 = 1.707317 g/L at the start. */
    @Test
    void whatClingsJoinsTheNextLiquorAcrossARest() {
        Recipe recipe = Recipes.of(
                Recipes.LOINS + "between: 20 min\nsteps:",
                Recipes.water("one", "ratio: 2 L/kg", "4000 h, drag-out: 0.05 L/kg"),
                "  - {rest: room, temperature: 4 Cel, time: 10 h}",
                Recipes.water("two", "ratio: 2 L/kg", "4000 h"));
        Run run = new Batch(recipe).follow(4000 * HOUR, 10 * HOUR, 4000 * HOUR);
        assertEquals(30 * 70.0 / 1230, run.end(2).liquor().get(0).start(), 1e-9);
        // (114 - 1.2 x 70) kg, all but what stayed behind, over 0.428571 + 1.23 m3.
        assertEquals(
                (114 - 1.17 * 70) / (0.8 * 600 / 1120 + 1.23),
                run.end(2).liquor().get(0).end(),
                1e-9);
    }

    @Test
    void fillsShareTheTimeAndAreCountedEach() {
        Recipe fills = Recipes.of(
                Recipes.LOINS + "steps:",
                "  - {rinse: three, liquor: {ratio: 1 L/kg, salt: 0 g/L}, fills: 3, temperature: 4 Cel,"
                        + " film: {coefficient: 2e-6 m/s}, time: 9 h}");
        Recipe soaks = Recipes.of(
                Recipes.LOINS + "steps:",
                Recipes.water("a", "ratio: 1 L/kg", "3 h"),
                Recipes.water("b", "ratio: 1 L/kg", "3 h"),
                Recipes.water("c", "ratio: 1 L/kg", "3 h"));
        Run one = new Batch(fills).follow(9 * HOUR);
        Run three = new Batch(soaks).follow(3 * HOUR, 3 * HOUR, 3 * HOUR);
        assertEquals(
                three.end(2).means().get(0).value(), one.end(0).means().get(0).value(), 1e-10);
        assertEquals(1.8, one.totals().liquorM3().orElseThrow(), 1e-12);
    }

    /** 2 x 20 min between three steps; 600 kg x 2 L/kg twice plus 1200 L and 10 L/min for 2 h. */
    @Test
    void totalsAddUp() {
        Recipe recipe = Recipes.of(
                Recipes.LOINS + "between: 20 min\nsteps:",
                Recipes.water("one", "ratio: 2 L/kg", "6 h"),
                Recipes.water("two", "ratio: 2 L/kg", "6 h, prices: {supply: 1 EUR/m3, disposal: 2 EUR/m3}"),
                "  - {rinse: running, liquor: {volume: 1200 L, flow: 10 L/min, salt: 0 g/L}, temperature: 4 Cel,"
                        + " film: {coefficient: 4e-6 m/s}, time: 2 h}",
                "prices: {time: 40 EUR/h, liquor: 5 EUR/m3}");
        Totals totals = new Batch(recipe).follow(6 * HOUR, 6 * HOUR, 2 * HOUR).totals();
        assertEquals(14 * HOUR + 2400, totals.seconds(), 1e-9);
        assertEquals(1.2 + 1.2 + 1.2 + 1.2, totals.liquorM3().orElseThrow(), 1e-9);
        assertEquals(
                40 * (14 + 2.0 / 3) + 5 * 1.2 + 3 * 1.2 + 5 * 2.4, totals.cost().orElseThrow(), 1e-9);
    }

    @Test
    void onlyWhatExchangesWithAirMovesInADryer() {
        Recipe recipe = Recipes.of(
                "language: 1",
                "title: Drying",
                "product: [other]",
                "lot: {mass: 10 kg, density: 1000 kg/m3, pieces: [{shape: slab, thickness: 4 mm}]}",
                "species:",
                "  salt: {start: 20 g/kg, diffusivity: 1e-9 m2/s, partition: 1}",
                "  water: {start: 700 g/kg, diffusivity: 1e-9 m2/s, partition: 0.7, exchanges-with: [air]}",
                "steps:",
                "  - {dry: oven, air: {equilibrium: {water: 60 g/kg}}, film: negligible, temperature: 60 Cel, time: 40 h}");
        StepEnd end = new Batch(recipe).follow(40 * HOUR).end(0);
        assertEquals(20, end.means().get(0).value(), 1e-10);
        assertEquals(60, end.means().get(1).value(), 1e-6);
        assertTrue(end.liquor().isEmpty());
    }

    @Test
    void aStepTooShortToComputeIsRefusedAtItsTime() {
        Recipe recipe = Recipes.of(
                Recipes.LOINS.replace("26 mm", "2600 mm") + "steps:", Recipes.water("one", "ratio: 2 L/kg", "2 s"));
        Unsound refused = assertThrows(Unsound.class, () -> new Batch(recipe).follow(2));
        String said = refused.problems().get(0).toString();
        assertTrue(said.startsWith("test.yaml:16:"), said);
        assertTrue(
                said.contains("the time of one is too short to be computed for salt by this version: found 2 s"), said);
        assertTrue(said.contains("; write at least "), said);
    }
}
