package org.soakwright.planner.batch;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.soakwright.recipes.model.Recipe;

/** Contents against other masses than that loaded, contents of the water phase, and what the lot weighs. */
class MeasureTest {
    private static String[] head(String lot, String... species) {
        List<String> lines = new ArrayList<>(List.of(
                "language: 1",
                "title: Measures",
                "product: [other]",
                "lot: {density: 1000 kg/m3, " + lot
                        + ", pieces: [{name: slice, shape: slab, thickness: 4 mm, share: 100 %}]}",
                "species:"));
        for (String one : species) {
            lines.add("  " + one);
        }
        return lines.toArray(String[]::new);
    }

    private static Recipe recipe(String[] head, String... rest) {
        List<String> lines = new ArrayList<>(List.of(head));
        lines.addAll(List.of(rest));
        return Recipes.of(lines.toArray(String[]::new));
    }

    private static List<TargetState> targets(Recipe recipe) {
        return new Batch(recipe).follow(StepTimes.definite(recipe)).targets();
    }

    private static void assertValues(Recipe recipe, double tolerance, double... values) {
        List<TargetState> states = targets(recipe);
        assertEquals(values.length, states.size());
        for (int i = 0; i < values.length; i++) {
            assertEquals(
                    values[i], states.get(i).value(), tolerance, states.get(i).name());
        }
    }

    /** Treybal, Mass-Transfer Operations, illustration 12.1, p 660: per 1000 kg dried from 80 % to 5 % moisture 3750 kg are evaporated. */
    @ParameterizedTest
    @ValueSource(
            strings = {
                "water: {start: 800 g/kg, diffusivity: 1e-9 m2/s, partition: 1, exchanges-with: [air]}",
                "water: {start: {value: 4 kg/kg, per: dry}, diffusivity: 1e-9 m2/s, partition: 1, exchanges-with: [air]}",
                "wet: {start: 80 %, substance: water, diffusivity: 1e-9 m2/s, partition: 1, exchanges-with: [air]}"
            })
    void dryingLeavesTheBooksMass(String water) {
        String name = water.substring(0, water.indexOf(':'));
        // 5/95 kg per kg dry
        Recipe recipe = recipe(
                head("mass: 4750 kg", water),
                "steps:",
                "  - {dry: oven, air: {equilibrium: {" + name
                        + ": {value: 0.05263157894736842 kg/kg, per: dry}}}, film: negligible, temperature: 60 Cel, time: 20 h}",
                "targets:",
                "  - {total: mass, at-most: 1000.1 kg}",
                "  - {total: mass, at-most: 22 %, of: start}",
                "  - {species: " + name + ", reading: mean, at-most: 5.1 %, per: present}",
                "  - {species: " + name + ", reading: mean, at-most: 6 %, per: dry}",
                "  - {species: " + name + ", reading: mean, at-most: 6 %}");
        assertValues(recipe, 1e-6, 1000, 100 * 1000.0 / 4750, 5, 100 * 0.05 / 0.95, 100 * 50.0 / 4750);
    }

    /** 30 g per kg loaded, 12 % heavier: 30/1.12 = 26.7857 g per kg present. A loss of 8.5 % of the mass as loaded then: 30/1.035 = 28.9855. */
    @Test
    void aGainDilutesFromTheEndOfItsStepOn() {
        Recipe recipe = recipe(
                head("mass: 100 kg", "salt: {start: 30 g/kg, diffusivity: 1e-9 m2/s, partition: 1}"),
                "steps:",
                "  - {rest: swell, gain: 12 %, time: 1 h}",
                "  - {rest: drain, gain: -8.5 %, time: 1 h}",
                "  - {rest: wait, time: 1 h}",
                "targets:",
                "  - {species: salt, reading: mean, at-most: 30 g/kg, per: present, after: swell}",
                "  - {species: salt, reading: core, at-most: 30 g/kg, per: present, after: drain}",
                "  - {species: salt, reading: mean, at-most: 30 g/kg, per: present}",
                "  - {species: salt, reading: mean, at-most: 31 g/kg}",
                "  - {total: mass, at-least: 100 kg, after: swell}",
                "  - {total: mass, at-least: 103 kg, after: drain}",
                "  - {total: mass, at-least: 103 %, of: start}");
        assertValues(recipe, 1e-9, 30 / 1.12, 30 / 1.035, 30 / 1.035, 30, 112, 103.5, 103.5);
    }

    /**
     * From 56 % to 78 % of water with 20 g/kg of salt that stays: dry 0.44 kg per kg loaded is 22 % of 2 kg. Half way in time the water is 67
     * %, 0.44/0.33 = 1.33333 kg.
     */
    @Test
    void aMoistureThatRisesKeepsTheDryMatter() {
        Recipe recipe = recipe(
                head(
                        "mass: 100 kg, moisture: {start: 56 %, end: 78 %}",
                        "salt: {start: 20 g/kg, diffusivity: 1e-9 m2/s, partition: 1}"),
                "steps:",
                "  - {rest: one, time: 3 h}",
                "  - {rest: two, time: 3 h}",
                "targets:",
                "  - {total: mass, at-least: 1 kg, after: one}",
                "  - {total: mass, at-least: 1 kg}",
                "  - {species: salt, reading: mean, at-most: 20 g/kg, per: present}",
                "  - {species: salt, reading: mean, at-most: 100 g/kg, per: dry}",
                "  - {species: salt, reading: mean, at-most: 20 %, phase: water}",
                "  - {species: salt, reading: highest, at-most: 20 %, phase: moisture}");
        // 20/2, 20/0.44, 0.02/(0.02 + 1.56), 0.02/1.56
        assertValues(recipe, 1e-9, 100 * 0.44 / 0.33, 200, 10, 20 / 0.44, 100 * 0.02 / 1.58, 100 * 0.02 / 1.56);
    }

    /** The same, all salt washed out: dry 0.42 of 0.44 kg stays, 22 % of 1.909091 kg. A salt that enters to 100 g/kg: 0.52/0.22 = 2.363636. */
    @Test
    void saltThatLeavesOrEntersIsDryMatterToo() {
        for (String liquor : List.of("0", "100")) {
            Recipe recipe = recipe(
                    head(
                            "mass: 100 kg, moisture: {start: 56 %, end: 78 %}",
                            "salt: {start: 20 g/kg, diffusivity: 1e-9 m2/s, partition: 1}"),
                    "steps:",
                    "  - {soak: one, liquor: {volume: unlimited, salt: " + liquor
                            + " g/L}, film: negligible, time: 40 h}",
                    "targets:",
                    "  - {total: mass, at-least: 1 kg}");
            assertValues(recipe, 1e-8, 100 * (0.42 + (liquor.equals("0") ? 0 : 0.1)) / 0.22);
        }
    }

    /** 2.5 % salt with 70 % water: 2.5/72.5 = 3.44828 % of the water phase, 3.5714 g per 100 g of water; the limit of 3.5 % is missed. */
    @ParameterizedTest
    @ValueSource(strings = {"", ", moisture: {start: 70 %, end: 70 %}"})
    void waterPhaseSalt(String moisture) {
        String salt = "salt: {start: 25 g/kg, diffusivity: 1e-9 m2/s, partition: 1}";
        String water = "water: {start: 70 %, diffusivity: 1e-9 m2/s, partition: 1, exchanges-with: [air]}";
        Recipe recipe = recipe(
                moisture.isEmpty() ? head("mass: 100 kg", salt, water) : head("mass: 100 kg" + moisture, salt),
                "steps:",
                "  - {rest: one, time: 1 h}",
                "targets:",
                "  - {species: salt, reading: mean, at-least: 3.5 %, phase: water}",
                "  - {species: salt, reading: core, at-least: 3.5 %, phase: water}",
                "  - {species: salt, reading: surface, at-least: 3.5 %, phase: moisture}",
                "  - {species: salt, reading: lowest, at-least: 3.5 %, phase: moisture}",
                "  - {species: salt, reading: range, at-most: 1 %, phase: water}",
                "  - {species: salt, reading: mean, grade: lot, at-least: 34 g/kg, phase: water}");
        double water100 = 100 * 2.5 / 72.5;
        double moist = 100 * 2.5 / 70;
        assertValues(recipe, 1e-9, water100, water100, moist, moist, 0, 10 * water100);
        assertTrue(!targets(recipe).get(0).met() && targets(recipe).get(2).met());
    }

    /** What a limit of 3.5 % asks of 70 % water: 70 x 3.5/96.5 = 2.53886 % salt; with 65 % 2.35751 %. */
    @ParameterizedTest
    @ValueSource(strings = {"70, 25.3887, 25.3885", "65, 23.5752, 23.5750"})
    void theSaltThatALimitAsksFor(String row) {
        String[] cells = row.split(", ", -1);
        for (int i = 1; i <= 2; i++) {
            Recipe recipe = recipe(
                    head(
                            "mass: 100 kg, moisture: {start: " + cells[0] + " %, end: " + cells[0] + " %}",
                            "salt: {start: " + cells[i] + " g/kg, diffusivity: 1e-9 m2/s, partition: 1}"),
                    "steps:",
                    "  - {rest: one, time: 1 h}",
                    "targets:",
                    "  - {species: salt, reading: mean, at-least: 3.5 %, phase: water}");
            assertEquals(i == 1, targets(recipe).get(0).met(), cells[i]);
        }
    }

    private static Recipe cured(String... targets) {
        String[] rest = new String[5 + targets.length];
        rest[0] = "steps:";
        rest[1] =
                "  - {soak: brine, liquor: {ratio: 2 L/kg, salt: 150 g/L, water: 900 g/L}, film: {coefficient: 2e-6 m/s}, time: 20 min}";
        rest[2] = "  - {rest: even out, time: 5 min}";
        rest[3] = "  - {dry: room, air: {equilibrium: {water: 200 g/kg}}, film: {coefficient: 3e-7 m/s}, time: 40 min}";
        rest[4] = "targets:";
        System.arraycopy(targets, 0, rest, 5, targets.length);
        return recipe(
                head(
                        "mass: 100 kg",
                        "salt: {start: 5 g/kg, diffusivity: 8e-10 m2/s, partition: 0.8}",
                        "water: {start: 70 %, diffusivity: 3e-10 m2/s, partition: 0.75, exchanges-with: both}"),
                rest);
    }

    /** The water leaves by the surface while the salt still goes in: neither is extreme where their ratio is. Against 20 001 places. */
    @ParameterizedTest
    @ValueSource(strings = {"brine", "even out", "room"})
    void theExtremesOfAPhaseAreThoseOfADenseProfile(String after) {
        for (String phase : List.of("water", "moisture")) {
            String end = ", phase: " + phase + ", after: " + after + "}";
            Recipe recipe = cured(
                    "  - {species: salt, reading: highest, at-most: 10 %" + end,
                    "  - {species: salt, reading: lowest, at-most: 10 %" + end,
                    "  - {species: salt, reading: range, at-most: 10 %" + end);
            Batch batch = new Batch(recipe);
            Run run = batch.follow(StepTimes.definite(recipe));
            double[] places = new double[20_001];
            for (int i = 0; i < places.length; i++) {
                places[i] = i / 20_000.0;
            }
            int stage = batch.lastStage(batch.step(after));
            double[] salt = run.course(0).profile(0, stage, places);
            double[] water = run.course(1).profile(0, stage, places);
            double high = 0;
            double low = 1;
            for (int i = 0; i < places.length; i++) {
                double ratio = salt[i] / (phase.equals("water") ? salt[i] + water[i] : water[i]);
                high = Math.max(high, ratio);
                low = Math.min(low, ratio);
            }
            List<TargetState> states = run.targets();
            assertEquals(100 * high, states.get(0).value(), 1e-6);
            assertEquals(100 * low, states.get(1).value(), 1e-6);
            assertEquals(100 * (high - low), states.get(2).value(), 1e-6);
        }
    }

    /** With a skin on one face the salt's places run from face to face, those of the bare water from the core: x and |2x - 1| are one place. */
    @Test
    void aSkinOnOneFaceDoesNotMixUpPlaces() {
        for (boolean saltCovered : List.of(true, false)) {
            String skin = ", skin: {permeance: 1e-8 m/s, face: one}";
            Recipe recipe = recipe(
                    head(
                            "mass: 100 kg",
                            "salt: {start: 60 g/kg, diffusivity: 8e-10 m2/s, partition: 0.8" + (saltCovered ? skin : "")
                                    + "}",
                            "water: {start: 70 %, diffusivity: 3e-10 m2/s, partition: 0.75, exchanges-with: both"
                                    + (saltCovered ? "" : skin) + "}"),
                    "steps:",
                    "  - {soak: one, liquor: {ratio: 3 L/kg, salt: 0 g/L, water: 800 g/L}, film: negligible, time: 30 min}",
                    "targets:",
                    "  - {species: salt, reading: highest, at-most: 20 %, phase: moisture}",
                    "  - {species: salt, reading: lowest, at-most: 20 %, phase: moisture}");
            Batch batch = new Batch(recipe);
            Run run = batch.follow(1800);
            double[] through = new double[20_001];
            double[] folded = new double[through.length];
            for (int i = 0; i < through.length; i++) {
                through[i] = i / 20_000.0;
                folded[i] = Math.abs(2 * through[i] - 1);
            }
            double[] salt = run.course(0).profile(0, 0, saltCovered ? through : folded);
            double[] water = run.course(1).profile(0, 0, saltCovered ? folded : through);
            double high = 0;
            double low = 1;
            for (int i = 0; i < through.length; i++) {
                high = Math.max(high, salt[i] / water[i]);
                low = Math.min(low, salt[i] / water[i]);
            }
            assertEquals(100 * high, run.targets().get(0).value(), 1e-5);
            assertEquals(100 * low, run.targets().get(1).value(), 1e-5);
        }
    }

    /** Every measure's derivative by every step's time, against central differences of half a second. */
    @Test
    void whatIsReadFollowsTheTimesAsItSays() {
        List<String> targets = new ArrayList<>(List.of("  - {total: mass, at-most: 100 kg}"));
        for (String reading : List.of("mean", "core", "surface", "highest", "lowest", "range")) {
            targets.add("  - {species: salt, reading: " + reading + ", at-most: 10 %, phase: water}");
            targets.add("  - {species: salt, reading: " + reading + ", at-most: 10 %, phase: moisture, after: brine}");
            targets.add("  - {species: salt, reading: " + reading + ", at-most: 10 %, per: present}");
            targets.add("  - {species: salt, reading: " + reading + ", at-most: 50 %, per: dry, after: even out}");
        }
        assertSlopes(cured(targets.toArray(String[]::new)));
    }

    /** With a moisture the share of the whole time that is over counts as well. */
    @Test
    void soItDoesWhereAMoistureIsStated() {
        Recipe recipe = recipe(
                head(
                        "mass: 100 kg, moisture: {start: 56 %, end: 78 %}",
                        "salt: {start: 20 g/kg, diffusivity: 8e-10 m2/s, partition: 0.8}"),
                "between: 5 min",
                "steps:",
                "  - {soak: one, liquor: {ratio: 2 L/kg, salt: 90 g/L}, film: {coefficient: 2e-6 m/s}, time: 20 min}",
                "  - {rinse: two, liquor: {ratio: 2 L/kg, salt: 0 g/L}, fills: 3, film: {coefficient: 2e-6 m/s}, time: 30 min}",
                "  - {rest: three, time: 30 min}",
                "targets:",
                "  - {species: salt, reading: mean, at-most: 10 %, phase: water, after: one}",
                "  - {species: salt, reading: lowest, at-most: 10 %, phase: moisture, after: two}",
                "  - {species: salt, reading: mean, at-most: 10 %, per: present, after: two}",
                "  - {species: salt, reading: surface, at-most: 10 %, per: dry, after: one}",
                "  - {total: mass, at-most: 300 kg, after: two}",
                "  - {total: mass, at-most: 300 %, of: start}");
        assertSlopes(recipe);
    }

    private static void assertSlopes(Recipe recipe) {
        Batch batch = new Batch(recipe);
        double[] seconds = StepTimes.definite(recipe);
        Run run = batch.follow(seconds);
        for (Requirement requirement : batch.requirements()) {
            double[] slopes = run.statedGradient(requirement);
            double most = 0;
            double[] differences = new double[seconds.length];
            for (int i = 0; i < seconds.length; i++) {
                double[] later = seconds.clone();
                double[] earlier = seconds.clone();
                later[i] += 0.5;
                earlier[i] -= 0.5;
                differences[i] = batch.follow(later).stated(requirement)
                        - batch.follow(earlier).stated(requirement);
                most = Math.max(most, Math.abs(differences[i]));
            }
            for (int i = 0; i < seconds.length; i++) {
                assertEquals(
                        differences[i],
                        slopes[i],
                        2e-5 * most + 1e-12,
                        TargetState.name(recipe, requirement) + " by " + i);
            }
        }
    }

    @Test
    void derivativesOfSumsProductsAndRatios() {
        Dual x = new Dual(3, new double[] {1, 0});
        Dual y = new Dual(4, new double[] {0, 1});
        assertDual(7, 1, 1, x.plus(y));
        assertDual(-1, 1, -1, x.minus(y));
        assertDual(12, 4, 3, x.times(y));
        assertDual(0.75, 0.25, -0.1875, x.over(y));
        assertDual(5, 1, 0, x.plus(2));
        assertDual(6, 2, 0, x.times(2));
        // x y/(x + y) by x is (y/(x + y))^2.
        assertDual(12.0 / 7, 16.0 / 49, 9.0 / 49, x.times(y).over(x.plus(y)));
    }

    private static void assertDual(double value, double first, double second, Dual found) {
        assertEquals(value, found.value(), 1e-14);
        assertEquals(first, found.slopes()[0], 1e-14);
        assertEquals(second, found.slopes()[1], 1e-14);
    }
}
