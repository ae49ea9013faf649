package org.soakwright.planner.batch;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.soakwright.recipes.Outcome;
import org.soakwright.recipes.Recipes;
import org.soakwright.recipes.model.Recipe;

/** No durations that meet their targets sum to less than what is called the least; proofs of lines rest on it. */
class LeastTimeTest {
    private static final String HEAD = """
            language: 1
            title: Bricks in tubs
            product: [other]
            lot: {mass: 300 kg, density: 1100 kg/m3, pieces: [{name: thin, shape: slab, thickness: 9 mm, share: 50 %},
              {name: rods, shape: cylinder, diameter: 12 mm, share: 50 %}]}
            """;
    private static final String OUT = """
            species: {salt: {start: 100 g/kg, diffusivity: 9e-10 m2/s, partition: 0.7}}
            steps:
              - soak: first
                liquor: {ratio: 2 L/kg, salt: 1 g/L}
                film: {coefficient: 4e-6 m/s}
                drag-out: 0.1 L/kg
                time: 3 h
              - rest: pause
                diffusivity: {salt: 4e-10 m2/s}
                time: 1 h
              - soak: second
                liquor: {ratio: 3 L/kg, salt: 0 g/L}
                film: {coefficient: 2e-6 m/s}
                partition: {salt: 0.9}
                time: 3 h
              - rinse: running
                liquor: {volume: 400 L, flow: 20 L/min, salt: 0.5 g/L}
                film: {coefficient: 6e-6 m/s}
                diffusivity: {salt: 12e-10 m2/s}
                time: 2 h
              - rest: room
                time: 4 h
            """;
    private static final String IN = """
            species: {salt: {start: 5 g/kg, diffusivity: 9e-10 m2/s, partition: 0.7}}
            steps:
              - soak: weak brine
                liquor: {ratio: 2 L/kg, salt: 90 g/L}
                film: {coefficient: 4e-6 m/s}
                time: 3 h
              - soak: strong brine
                liquor: {ratio: 3 L/kg, salt: 150 g/L}
                film: negligible
                time: 3 h
              - rest: room
                time: 4 h
            """;

    private static Recipe recipe(String text) {
        Outcome outcome = Recipes.read("made.yaml", text);
        if (outcome instanceof Outcome.Refused refused) {
            throw new AssertionError(refused.problems());
        }
        return ((Outcome.Accepted) outcome).recipe();
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                OUT + "targets: [{species: salt, reading: mean, at-most: 35 g/kg}]",
                OUT + "targets: [{species: salt, reading: highest, at-most: 45 g/kg}]",
                OUT + "targets: [{species: salt, reading: core, at-most: 50 g/kg, after: running}]",
                OUT + "targets: [{species: salt, reading: mean, at-most: 40 g/kg, grade: lot}]",
                IN + "targets: [{species: salt, reading: mean, at-least: 40 g/kg}]",
                IN + "targets: [{species: salt, reading: lowest, at-least: 20 g/kg}]",
                IN + "targets: [{species: salt, reading: core, at-least: 15 g/kg, after: strong brine}]",
            })
    void whateverMeetsTheTargetTakesAtLeastSoLong(String text) {
        Recipe recipe = recipe(HEAD + text);
        List<LeastTime.Bound> bounds = LeastTime.of(recipe);
        assertEquals(1, bounds.size());
        Batch batch = new Batch(recipe);
        SplittableRandom random = new SplittableRandom(text.hashCode());
        int met = 0;
        double nearest = Double.POSITIVE_INFINITY;
        for (int i = 0; i < 3000; i++) {
            double[] seconds = new double[recipe.steps().size()];
            double sum = 0;
            for (int k = 0; k < seconds.length; k++) {
                seconds[k] = 60 * Math.exp(random.nextDouble() * Math.log(1500));
                sum += bounds.get(0).weights()[k] * seconds[k];
            }
            if (batch.follow(seconds).meetsTargets()) {
                met++;
                nearest = Math.min(nearest, sum / bounds.get(0).seconds());
            }
        }
        assertTrue(met > 100 && met < 2900, met + " of 3000 met it");
        assertTrue(nearest >= 1, "one takes only " + nearest + " of the least");
    }

    @Test
    void inEndlessCleanLiquorTheLeastTimeIsTheLeastThereIs() {
        Recipe recipe = recipe(HEAD + """
                        species: {salt: {start: 100 g/kg, diffusivity: 9e-10 m2/s, partition: 0.7}}
                        steps:
                          - rinse: running
                            liquor: {volume: unlimited, salt: 0 g/L}
                            film: {coefficient: 4e-6 m/s}
                            time: {from: 10 min, to: 60 h, grain: 1 min}
                        targets: [{species: salt, reading: mean, at-most: 20 g/kg}]
                        """);
        double planned = Planner.plan(recipe, Progress.NONE).run().seconds()[0];
        LeastTime.Bound bound = LeastTime.of(recipe).get(0);
        assertEquals(1, bound.weights()[0]);
        assertTrue(bound.seconds() <= planned && bound.seconds() > planned - 61, bound.seconds() + " of " + planned);
    }

    @Test
    void nothingIsClaimedWhereItWouldNotHold() {
        String grows = IN + "targets: [{species: salt, reading: mean, at-most: 60 g/kg}]";
        assertEquals(List.of(), LeastTime.of(recipe(HEAD + grows)));
        String range = OUT + "targets: [{species: salt, reading: range, at-most: 10 g/kg}]";
        assertEquals(List.of(), LeastTime.of(recipe(HEAD + range)));
    }
}
