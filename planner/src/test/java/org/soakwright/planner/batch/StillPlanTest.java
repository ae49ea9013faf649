package org.soakwright.planner.batch;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.soakwright.recipes.model.Recipe;
import org.soakwright.recipes.model.Species;

/** A plan in still liquor: its films belong to the durations that it chose, and what a film is worth is what leaving it out saves. */
class StillPlanTest {
    private static final Recipe STILL = Recipes.of(
            Recipes.LOINS.replace("    start: 190 g/kg", "    substance: sodium chloride\n    start: 190 g/kg")
                    + "steps:",
            "  - {soak: one, liquor: {ratio: 2 L/kg, salt: 0 g/L}, temperature: 4 Cel, film: {still: true, length: 200 mm},"
                    + " time: {from: 1 h, to: 40 h}}",
            "targets:",
            "  - {species: salt, reading: mean, at-most: 80 g/kg}");

    @Test
    void itsFilmsAreThoseOfItsOwnDurations() {
        Plan plan = Planner.plan(STILL, Progress.NONE);
        assertTrue(plan.met());
        Batch own = plan.run().batch();
        Species salt = own.recipe().species().get(0);
        Films anew = Films.of(own.recipe(), plan.run().seconds());
        for (int j = 0; j < 2; j++) {
            double used = own.films().estimate(0, salt, j).orElseThrow().coefficient();
            double found = anew.estimate(0, salt, j).orElseThrow().coefficient();
            assertEquals(found, used, 1e-3 * found);
        }
        Run again = own.resettled(plan.run().seconds()).follow(plan.run().seconds());
        assertTrue(again.meetsTargets());
    }

    @Test
    void aPlanIsTheSameFromWhateverPlannedTimeItStarts() {
        double[] chosen = Planner.plan(STILL, Progress.NONE).run().seconds();
        Recipe elsewhere = Recipes.of(
                Recipes.LOINS.replace("    start: 190 g/kg", "    substance: sodium chloride\n    start: 190 g/kg")
                        + "steps:",
                "  - {soak: one, liquor: {ratio: 2 L/kg, salt: 0 g/L}, temperature: 4 Cel, film: {still: true, length: 200"
                        + " mm}, time: {from: 1 h, to: 40 h, planned: 39 h}}",
                "targets:",
                "  - {species: salt, reading: mean, at-most: 80 g/kg}");
        assertArrayEquals(chosen, Planner.plan(elsewhere, Progress.NONE).run().seconds(), 60);
    }

    /** Without the film the lot is after less time where it is with it; a hundredth is what the straight line costs. */
    @Test
    void aFilmIsWorthTheTimeThatItsAbsenceSaves() {
        double[] seconds = {6 * 3600};
        Batch with = new Batch(STILL);
        FilmFound film = FilmFound.of(with, seconds).get(0);
        double worth = film.worthSeconds().orElseThrow();
        Recipe bare = Recipes.of(
                Recipes.LOINS + "steps:",
                "  - {soak: one, liquor: {ratio: 2 L/kg, salt: 0 g/L}, temperature: 4 Cel, film: negligible, time: 6 h}");
        double saved =
                new Batch(bare).follow(seconds[0] - worth).end(0).means().get(0).value();
        double reached = with.follow(seconds).end(0).means().get(0).value();
        assertTrue(worth > 600 && worth < 3600, film.toString());
        assertEquals(reached, saved, 0.01 * reached);
    }

    @Test
    void aFilmOutsideItsCorrelationIsCautionedInEveryRun() {
        Recipe quick = Recipes.of(
                Recipes.LOINS.replace("    start: 190 g/kg", "    substance: sodium chloride\n    start: 190 g/kg")
                        + "steps:",
                "  - {soak: one, liquor: {ratio: 2 L/kg, salt: 0 g/L}, temperature: 4 Cel, film: {speed: 10 m/s, length: 2 m},"
                        + " time: 6 h}");
        List<String> shown = Cautions.of(new Batch(quick).follow(6 * 3600)).shown();
        assertTrue(shown.stream().anyMatch(one -> one.startsWith("Film of one: ")), shown.toString());
    }

    @Test
    void aValueThatOverrulesTheLibraryIsCautioned() {
        Recipe overruled = Recipes.of(
                Recipes.LOINS.replace(
                                "diffusivity: {value: 8e-10 m2/s, at: 5 Cel, activation-energy: 22 kJ/mol}",
                                "diffusivity: {from: salt-in-feta, value: 8e-10 m2/s}")
                        + "steps:",
                Recipes.water("one", "ratio: 2 L/kg", "6 h"));
        List<String> shown = Cautions.of(overruled).shown();
        assertTrue(
                shown.stream().anyMatch(one -> one.startsWith("The diffusivity of salt is computed with 8e-10 m2/s")),
                shown.toString());
        Published published = Checked.of(overruled).published().get(0);
        assertEquals("salt-in-feta", published.entry().name());
    }

    @Test
    void aFlammableBatchSaysWhatItsOvenDrivesOff() {
        Recipe drying = Recipes.of(
                Recipes.LOINS
                                .replace("[food]", "[flammable]")
                                .replace("partition: 0.8", "partition: 0.8\n    exchanges-with: [air]")
                        + "steps:",
                "  - {dry: oven, air: {equilibrium: {salt: 0 g/kg}}, film: negligible, temperature: 40 Cel, time: 30 h}");
        Run run = new Batch(drying).follow(30 * 3600);
        double left = run.end(0).means().get(0).value();
        double driven = 600 * (190 - left) / 1000;
        String said = Cautions.of(run).shown().stream()
                .filter(one -> one.startsWith("Here oven drives off"))
                .findFirst()
                .orElseThrow();
        assertTrue(
                said.startsWith(String.format(java.util.Locale.ROOT, "Here oven drives off %.1f kg of salt, ", driven)),
                said);
    }
}
