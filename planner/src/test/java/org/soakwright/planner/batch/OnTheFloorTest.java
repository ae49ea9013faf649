package org.soakwright.planner.batch;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.soakwright.recipes.model.Recipe;
import org.soakwright.recipes.model.Step;

/** What an operator may do when things do not go as planned: pull windows and checkpoints, each followed again here. */
class OnTheFloorTest {
    private static Recipe desalting() {
        return Recipes.of(
                Recipes.LOINS + "between: 20 min\nsteps:",
                Recipes.water("first", "ratio: 4 L/kg", "{from: 4 h, to: 40 h, grain: 15 min}"),
                Recipes.water("second", "ratio: 4 L/kg", "{from: 4 h, to: 40 h, grain: 15 min}"),
                "targets:",
                "  - {species: salt, reading: mean, at-most: 30 g/kg}",
                "  - {species: salt, reading: mean, at-least: 9 g/kg, grade: thin}");
    }

    /** Two waters and one limit. */
    private static Recipe leaching() {
        return Recipes.of(
                Recipes.LOINS + "steps:",
                Recipes.water("first", "ratio: 4 L/kg", "{from: 4 h, to: 40 h, grain: 15 min}"),
                Recipes.water("second", "ratio: 4 L/kg", "{from: 4 h, to: 40 h, grain: 15 min}"),
                "targets:",
                "  - {species: salt, reading: mean, at-most: 30 g/kg}");
    }

    @Test
    void insideThePullWindowTargetsAreMetAndAMinuteOutsideMissed() {
        Run run = Planner.plan(desalting(), Progress.NONE).run();
        List<PullWindow> windows = PullWindow.of(run);
        assertEquals(2, windows.size());
        for (PullWindow window : windows) {
            double planned = run.seconds()[window.step()];
            assertTrue(
                    window.earliest() <= planned && planned <= window.latest().orElseThrow());
            assertTrue(meets(run, window.step(), window.earliest()));
            assertTrue(meets(run, window.step(), window.latest().orElseThrow()));
            assertFalse(meets(run, window.step(), window.earliest() - 61));
            assertFalse(meets(run, window.step(), window.latest().orElseThrow() + 61));
        }
    }

    private static boolean meets(Run run, int step, double seconds) {
        double[] changed = run.seconds();
        changed[step] = seconds;
        return run.batch().follow(changed).meetsTargets();
    }

    @Test
    void aMissedRunHasNoPullWindow() {
        assertTrue(
                PullWindow.of(new Batch(desalting()).follow(4 * 3600, 4 * 3600)).isEmpty());
    }

    @Test
    void checkpointsComeTwiceInEveryVesselAndSayWhatToDo() {
        Recipe recipe = leaching();
        Run run = Planner.plan(recipe, Progress.NONE).run();
        List<Checkpoint> checkpoints = Checkpoint.of(run);
        assertEquals(
                List.of(0, 0, 1, 1), checkpoints.stream().map(Checkpoint::step).toList());
        for (Checkpoint checkpoint : checkpoints) {
            double planned = run.seconds()[checkpoint.step()];
            assertTrue(checkpoint.seconds() > 0 && checkpoint.seconds() < planned);
            for (Checkpoint.Deviation deviation : checkpoint.deviations()) {
                boolean slow = deviation.factor() < 1;
                assertEquals(slow, deviation.added().orElseThrow() > 0, deviation.toString());
                assertTrue(deviation.seconds().get(checkpoint.step()) >= checkpoint.seconds());
                // The advice, followed with the slower or faster pieces that the reading speaks of, meets the target.
                assertTrue(followed(recipe, deviation).meetsTargets());
                assertTrue(Math.abs(deviation.reading() / checkpoint.expected() - 1) > 0.03);
            }
        }
        // In the first water slow pieces show as a low reading; in the second, slower and fuller ones hardly show at
        // all.
        assertEquals(2, checkpoints.get(0).deviations().size());
        assertTrue(checkpoints.get(0).deviations().get(0).reading()
                < checkpoints.get(0).expected());
        assertTrue(checkpoints.get(3).deviations().size() < 2);
    }

    /** Three fills of 3 h: a third and two thirds of the step are the ends of the first and the second. */
    @Test
    void fillsAreReadAsTheSoaksTheyAre() {
        Recipe fills = Recipes.of(
                Recipes.LOINS + "steps:",
                "  - {rinse: three, liquor: {ratio: 3 L/kg, salt: 0 g/L}, fills: 3, temperature: 4 Cel,"
                        + " film: {coefficient: 2e-6 m/s}, drag-out: 0.1 L/kg, time: 9 h}",
                Recipes.water("last", "ratio: 4 L/kg", "{from: 4 h, to: 80 h, grain: 30 min}"),
                "targets:",
                "  - {species: salt, reading: mean, at-most: 30 g/kg}");
        Recipe soaks = Recipes.of(
                Recipes.LOINS + "steps:",
                Recipes.water("a", "ratio: 3 L/kg", "3 h, drag-out: 0.1 L/kg"),
                Recipes.water("b", "ratio: 3 L/kg", "3 h, drag-out: 0.1 L/kg"));
        Run run = Planner.plan(fills, Progress.NONE).run();
        List<Checkpoint> checkpoints = Checkpoint.of(run);
        Run apart = new Batch(soaks).follow(3 * 3600, 3 * 3600);
        for (int i = 0; i < 2; i++) {
            assertEquals(0, checkpoints.get(i).step());
            assertEquals((i + 1) * 3 * 3600, checkpoints.get(i).seconds());
            assertEquals(apart.end(i).liquor().get(0).end(), checkpoints.get(i).expected(), 1e-9);
            for (Checkpoint.Deviation deviation : checkpoints.get(i).deviations()) {
                assertEquals(9 * 3600, deviation.seconds().get(0));
                assertEquals(deviation.factor() < 1, deviation.seconds().get(1) > run.seconds()[1]);
            }
        }
        assertFalse(checkpoints.get(0).deviations().isEmpty());
    }

    /** The plan sits on its limit: at the explained reading itself, going on misses it as much as following slow pieces says. */
    @Test
    void goingOnWithSlowPiecesEndsWhereFollowingThemSays() {
        Recipe recipe = leaching();
        Run run = Planner.plan(recipe, Progress.NONE).run();
        Checkpoint checkpoint = Checkpoint.of(run).get(0);
        Checkpoint.Deviation slow = checkpoint.deviations().get(0);
        TargetState missed = checkpoint.goingOnAt(run, slow, slow.reading()).orElseThrow();
        Recipe slower = Recipes.of(
                Recipes.LOINS.replace("8e-10", "6.4e-10") + "steps:",
                Recipes.water("first", "ratio: 4 L/kg", "4 h"),
                Recipes.water("second", "ratio: 4 L/kg", "4 h"));
        double mean = new Batch(slower)
                .follow(run.seconds())
                .end(1)
                .pieces()
                .get(1)
                .species()
                .get(0)
                .value(org.soakwright.recipes.model.Reading.MEAN);
        assertEquals("salt mean, thick", missed.name());
        assertEquals(mean, missed.value(), 1e-9);
        assertTrue(missed.value() > 30);
        assertTrue(checkpoint.goingOnAt(run, slow, checkpoint.expected()).isEmpty());
    }

    private static Run followed(Recipe recipe, Checkpoint.Deviation deviation) {
        double d = 8e-10 * deviation.factor();
        Recipe other = Recipes.of(
                Recipes.LOINS.replace("8e-10", Double.toString(d)) + "steps:",
                Recipes.water("first", "ratio: 4 L/kg", "4 h"),
                Recipes.water("second", "ratio: 4 L/kg", "4 h"),
                "targets:",
                "  - {species: salt, reading: mean, at-most: 30 g/kg}");
        assertEquals(
                recipe.steps().stream().map(Step::name).toList(),
                other.steps().stream().map(Step::name).toList());
        return new Batch(other)
                .follow(deviation.seconds().stream()
                        .mapToDouble(Double::doubleValue)
                        .toArray());
    }

    @Test
    void theBalanceOfClosedBathsClosesOnItsOwn() {
        Run run = Planner.plan(desalting(), Progress.NONE).run();
        Balance balance = run.balance(0);
        assertTrue(balance.closed());
        assertEquals(114, balance.sources().get(0).kilograms(), 1e-9);
        assertEquals(0, balance.defect(), 1e-11);
    }

    @Test
    void aTraceEndsWhereTheRunDoes() {
        Run run = new Batch(desalting()).follow(10 * 3600, 12 * 3600);
        Trace trace = Trace.of(run, 21);
        Trace.Moment last = trace.moments().get(trace.moments().size() - 1);
        assertEquals(22 * 3600 + 1200, last.clock(), 1e-6);
        assertEquals(
                run.end(1).pieces().get(1).species().get(0).value(org.soakwright.recipes.model.Reading.CORE),
                last.sights().get(0).profiles()[1][0],
                1e-9);
        double before = 0;
        for (Trace.Moment moment : trace.moments()) {
            assertTrue(moment.clock() > before);
            before = moment.clock();
        }
    }
}
