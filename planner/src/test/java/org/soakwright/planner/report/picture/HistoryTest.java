package org.soakwright.planner.report.picture;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.soakwright.planner.batch.Batch;
import org.soakwright.planner.batch.Planner;
import org.soakwright.planner.batch.Run;
import org.soakwright.planner.batch.StepEnd;
import org.soakwright.recipes.model.Reading;
import org.soakwright.recipes.model.Recipe;

class HistoryTest {
    private static final History LOINS = Batches.history(
            Planner.plan(Batches.example("loin-desalting"), (what, share) -> {}).run());

    /** The mean of a + b x over a slab, a cylinder and a sphere is a + b/2, a + 2b/3 and a + 3b/4. */
    @Test
    void aStraightStartHasTheMeanOfGeometry() {
        Recipe recipe = Batches.read("three", """
                language: 1
                title: Three shapes
                product: [other]
                lot:
                  mass: 3 kg
                  density: 1000 kg/m3
                  pieces:
                    - {name: slab, shape: slab, thickness: 10 mm, share: 30 %}
                    - {name: cylinder, shape: cylinder, diameter: 10 mm, share: 30 %}
                    - {name: sphere, shape: sphere, diameter: 10 mm, share: 40 %}
                species:
                  salt: {start: {profile: [[0, 10 g/kg], [1, 130 g/kg]]}, diffusivity: 1e-9 m2/s, partition: 1}
                steps:
                  - rest: night
                    time: 8 h
                targets: []
                minimise: time
                """);
        Loaded loaded = new Loaded(recipe, 0);
        assertEquals(70, loaded.mean(recipe.lot().grades().get(0)), 1e-10);
        assertEquals(90, loaded.mean(recipe.lot().grades().get(1)), 1e-10);
        assertEquals(100, loaded.mean(recipe.lot().grades().get(2)), 1e-10);
    }

    @Test
    void whatIsDrawnAtTheEndOfAStepIsWhatTheTablesSay() {
        for (History history : List.of(LOINS, Batches.history(Batches.crowded()))) {
            for (int k = 0; k < history.ends().size(); k++) {
                StepEnd end = history.ends().get(k);
                int at = history.momentAt(end.to());
                for (int j = 0; j < history.grades().size(); j++) {
                    for (int s = 0; s < history.recipe().species().size(); s++) {
                        StepEnd.Content content = end.pieces().get(j).species().get(s);
                        double most = content.value(Reading.HIGHEST);
                        for (Reading reading : List.of(Reading.MEAN, Reading.CORE, Reading.SURFACE)) {
                            assertEquals(
                                    content.value(reading),
                                    history.readings(s, j, reading)[at],
                                    1e-6 * most + 2 * content.error());
                        }
                        // Read between 49 depths.
                        assertEquals(most, history.readings(s, j, Reading.HIGHEST)[at], 0.01 * most);
                    }
                }
            }
        }
    }

    @Test
    void theLiquorOfEachFillIsALineOfItsOwn() {
        assertEquals(4, LOINS.fills(0).size());
        History crowded = Batches.history(Batches.crowded());
        // Leach, dip, four fills, column and brook.
        assertEquals(8, crowded.fills(0).size());
        for (History.Fill fill : crowded.fills(0)) {
            for (int i = 1; i < fill.clocks().length; i++) {
                assertTrue(fill.clocks()[i] > fill.clocks()[i - 1]);
            }
        }
        Run run = Batches.crowded();
        assertEquals(run.end(2).liquor().get(0).end(), crowded.fills(0).get(5).last(), 1e-9);
        assertEquals(1, crowded.fills(0).get(0).contents()[0], "the leach is made up with 1 g/L of wax");
    }

    private static final List<History> OF_SEVERAL_SIDES = List.of(
            Batches.history(Batches.followed("wheel-brining")),
            Batches.history(Batches.followed("brick-desalination")),
            Batches.history(Batches.corners()));

    /** What pieces hold at most: no reading of pieces that only give can rise above it. */
    @Test
    void piecesThatOnlyGiveAreNeverSeenToHoldMoreThanAsLoaded() {
        History bricks = OF_SEVERAL_SIDES.get(1);
        for (int s = 0; s < 3; s++) {
            double loaded = bricks.readings(s, 0, Reading.HIGHEST)[0];
            for (double highest : bricks.readings(s, 0, Reading.HIGHEST)) {
                assertTrue(highest <= 1.001 * loaded, highest + " of " + loaded);
            }
        }
    }

    @Test
    void targetsOnSharesAndOnOtherWaysThanTheShortestAreFollowedToo() {
        for (History history : OF_SEVERAL_SIDES) {
            for (Watched watched : Watched.of(history, List.of())) {
                watched.courses().stream()
                        .filter(course -> !course.label().equals("liquor"))
                        .forEach(course -> assertTrue(
                                course.pieces().get(0).clocks().length >= history.clocks().length - 1, course.name()));
            }
        }
    }

    @Test
    void aCourseEndsAtTheValueOfItsTarget() {
        List<History> all = new ArrayList<>(OF_SEVERAL_SIDES);
        all.addAll(List.of(LOINS, Batches.history(Batches.crowded())));
        for (History history : all) {
            for (Watched watched : Watched.of(history, List.of())) {
                for (Watched.Course course : watched.courses()) {
                    Watched.Piece last = course.pieces().get(course.pieces().size() - 1);
                    int i = 0;
                    while (i < last.clocks().length - 1 && last.clocks()[i] < course.readAt() - 1e-6) {
                        i++;
                    }
                    double most = History.highest(last.values());
                    assertEquals(course.value(), last.values()[i], 0.01 * most + 1e-12, course.name());
                }
            }
        }
    }

    /** Two hours a fill, 50 min between them: in liquor from 0:00, 2:50 and 5:40 on. */
    @Test
    void betweenFillsThereIsNoLiquorToDraw() {
        Recipe recipe = Batches.read("fills", """
                language: 1
                title: Fills
                product: [other]
                lot: {mass: 10 kg, density: 1100 kg/m3, pieces: [{name: slice, shape: slab, thickness: 8 mm}]}
                species: {salt: {start: 60 g/kg, diffusivity: 8e-10 m2/s, partition: 0.8}}
                steps:
                  - rinse: fills
                    liquor: {ratio: 2 L/kg, salt: 0 g/L}
                    fills: 3
                    changeover: {drain: 20 min, refill: 30 min}
                    film: negligible
                    time: 6 h
                """);
        History history = Batches.history(new Batch(recipe).follow(6 * 3600));
        List<History.Fill> fills = history.fills(0);
        assertEquals(3, fills.size());
        for (int f = 0; f < 3; f++) {
            double from = f * (2 * 3600 + 50 * 60);
            double[] clocks = fills.get(f).clocks();
            assertTrue(clocks[0] >= from && clocks[0] < from + 600, f + ": " + clocks[0]);
            assertEquals(from + 2 * 3600, clocks[clocks.length - 1], 1e-6);
        }
        assertEquals(6 * 3600 + 100 * 60, history.end());
    }
}
