package org.soakwright.planner.batch;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.soakwright.recipes.library.Facts;
import org.soakwright.recipes.library.RecipeFacts;
import org.soakwright.recipes.library.StepKind;
import org.soakwright.recipes.model.Goal;
import org.soakwright.recipes.model.Reading;
import org.soakwright.recipes.model.Recipe;
import org.soakwright.recipes.text.Unsound;

/** A lot that stays in its vessel rests drained while the liquor changes: the same as a rest written out, in every number. */
class HandlingTest {
    private static final double HOUR = 3600;
    private static final double MINUTE = 60;
    private static final String DRAGGING = ", drag-out: 0.05 L/kg";
    private static final String STAYS = ", stays: true, changeover: {drain: 20 min, refill: 30 min}";
    private static final String TARGETS = "targets: [{species: salt, reading: mean, at-most: 60 g/kg}]";

    private static String rest(String name, String time) {
        return "  - {rest: " + name + ", temperature: 4 Cel, time: " + time + "}";
    }

    private static String fills(int count, String time) {
        return "  - {rinse: fills, liquor: {ratio: 1 L/kg, salt: 0 g/L}, fills: " + count
                + ", temperature: 4 Cel, film: {coefficient: 2e-6 m/s}, time: " + time + "}";
    }

    /** Step by step, every reading of every grade and what the liquor began and ended with. */
    private static void assertAlike(StepEnd expected, StepEnd found) {
        for (int i = 0; i < expected.liquor().size(); i++) {
            assertEquals(expected.liquor().get(i).start(), found.liquor().get(i).start(), 1e-12);
            assertEquals(expected.liquor().get(i).end(), found.liquor().get(i).end(), 1e-12 * 190);
        }
        assertEquals(expected.means().get(0).value(), found.means().get(0).value(), 1e-12 * 190);
        for (int j = 0; j < expected.pieces().size(); j++) {
            for (Reading reading : Reading.values()) {
                assertEquals(
                        expected.pieces().get(j).species().get(0).value(reading),
                        found.pieces().get(j).species().get(0).value(reading),
                        1e-11 * 190,
                        reading.word());
            }
        }
    }

    @Test
    void aChangeoverBeforeAStepIsARestWrittenOut() {
        Recipe stays = Recipes.of(
                Recipes.LOINS + "between: 15 min\nsteps:",
                Recipes.water("one", "ratio: 2 L/kg", "6 h" + DRAGGING),
                Recipes.water("two", "ratio: 2 L/kg", "8 h" + DRAGGING + STAYS),
                Recipes.water("three", "ratio: 3 L/kg", "5 h"));
        Recipe rests = Recipes.of(
                Recipes.LOINS + "steps:",
                Recipes.water("one", "ratio: 2 L/kg", "6 h" + DRAGGING),
                rest("drained", "50 min"),
                Recipes.water("two", "ratio: 2 L/kg", "8 h" + DRAGGING),
                rest("moved", "15 min"),
                Recipes.water("three", "ratio: 3 L/kg", "5 h"));
        Run found = new Batch(stays).follow(6 * HOUR, 8 * HOUR, 5 * HOUR);
        Run expected = new Batch(rests).follow(6 * HOUR, 50 * MINUTE, 8 * HOUR, 15 * MINUTE, 5 * HOUR);
        for (int i = 0; i < 3; i++) {
            assertAlike(expected.end(2 * i), found.end(i));
            assertEquals(expected.end(2 * i).from(), found.end(i).from());
            assertEquals(expected.end(2 * i).to(), found.end(i).to());
        }
        assertEquals(expected.totals(), found.totals());
    }

    /** The lot is lifted for neither of the two: no time passes between them. */
    @Test
    void aStepThatStaysWithoutAChangeoverFollowsAtOnce() {
        Recipe stays = Recipes.of(
                Recipes.LOINS + "between: 15 min\nsteps:",
                Recipes.water("one", "ratio: 2 L/kg", "6 h"),
                "  - {rest: in the empty vessel, temperature: 4 Cel, time: 2 h, stays: true}",
                Recipes.water("two", "ratio: 2 L/kg", "8 h, stays: false"));
        Recipe lifted = Recipes.of(
                Recipes.LOINS + "steps:",
                Recipes.water("one", "ratio: 2 L/kg", "6 h"),
                rest("in the empty vessel", "2 h"),
                rest("moved", "15 min"),
                Recipes.water("two", "ratio: 2 L/kg", "8 h"));
        Run found = new Batch(stays).follow(6 * HOUR, 2 * HOUR, 8 * HOUR);
        Run expected = new Batch(lifted).follow(6 * HOUR, 2 * HOUR, 15 * MINUTE, 8 * HOUR);
        assertAlike(expected.end(3), found.end(2));
        assertEquals(6 * HOUR, found.end(1).from());
        assertEquals(16.25 * HOUR, found.totals().seconds());
    }

    @Test
    void fillsWithAChangeoverAreSoaksWithRests() {
        Recipe fills = Recipes.of(
                Recipes.LOINS + "between: 15 min\nsteps:",
                fills(3, "9 h" + DRAGGING + ", changeover: {drain: 20 min, refill: 0 min}"),
                Recipes.water("last", "ratio: 2 L/kg", "4 h"));
        String soak = "3 h" + DRAGGING;
        Recipe soaks = Recipes.of(
                Recipes.LOINS + "steps:",
                Recipes.water("a", "ratio: 1 L/kg", soak),
                rest("a b", "20 min"),
                Recipes.water("b", "ratio: 1 L/kg", soak),
                rest("b c", "20 min"),
                Recipes.water("c", "ratio: 1 L/kg", soak),
                rest("moved", "15 min"),
                Recipes.water("last", "ratio: 2 L/kg", "4 h"));
        Run found = new Batch(fills).follow(9 * HOUR, 4 * HOUR);
        Run expected =
                new Batch(soaks).follow(3 * HOUR, 20 * MINUTE, 3 * HOUR, 20 * MINUTE, 3 * HOUR, 15 * MINUTE, 4 * HOUR);
        assertAlike(expected.end(4), found.end(0));
        assertAlike(expected.end(6), found.end(1));
        assertEquals(expected.totals(), found.totals());
        StepEnd end = found.end(0);
        assertEquals(9 * HOUR, end.seconds());
        for (int f = 0; f < 3; f++) {
            assertEquals(expected.end(2 * f).from(), end.fillFrom(f));
            assertEquals(expected.end(2 * f).to(), end.fillTo(f));
        }
        assertEquals(expected.end(4).to(), end.to());
        assertEquals(expected.end(6).from(), found.end(1).from());
    }

    /** A step of fills that stays takes the changeover before it as well: 40 min, then two waters of 4 h, 40 min between them at a pace of their own. */
    @Test
    void fillsThatStayHaveTheChangeoverBeforeThemToo() {
        String own = ", diffusivity: {salt: 2e-9 m2/s}";
        Recipe fills = Recipes.of(
                Recipes.LOINS + "between: 15 min\nsteps:",
                Recipes.water("first", "ratio: 2 L/kg", "4 h"),
                fills(2, "8 h" + own + ", stays: true, changeover: {drain: 0 min, refill: 40 min}"));
        Recipe soaks = Recipes.of(
                Recipes.LOINS + "between: 40 min\nsteps:",
                Recipes.water("first", "ratio: 2 L/kg", "4 h"),
                Recipes.water("a", "ratio: 1 L/kg", "4 h" + own),
                Recipes.water("b", "ratio: 1 L/kg", "4 h" + own));
        Run found = new Batch(fills).follow(4 * HOUR, 8 * HOUR);
        Run expected = new Batch(soaks).follow(4 * HOUR, 4 * HOUR, 4 * HOUR);
        assertAlike(expected.end(2), found.end(1));
        assertEquals(expected.totals(), found.totals());
    }

    /** 40 EUR/h for 6 h, 50 min, 8 h; 5 EUR/m3 for 600 kg x 2 L/kg twice: 40 x 14.8333 + 5 x 2.4 = 605.33 EUR. */
    @Test
    void theTimeOfAChangeoverIsPaidFor() {
        Recipe recipe = Recipes.of(
                Recipes.LOINS + "between: 15 min\nsteps:",
                Recipes.water("one", "ratio: 2 L/kg", "6 h"),
                Recipes.water("two", "ratio: 2 L/kg", "8 h" + STAYS),
                "prices: {time: 40 EUR/h, liquor: 5 EUR/m3}");
        Totals totals = new Batch(recipe).follow(6 * HOUR, 8 * HOUR).totals();
        assertEquals(14 * HOUR + 3000, totals.seconds());
        assertEquals(605.0 + 1.0 / 3, totals.cost().orElseThrow(), 1e-9);
    }

    /** Even where the temperature changes, the drained pieces keep that of the liquor that went. */
    @Test
    void drainedPiecesRestAtTheConditionsOfTheStepBefore() {
        String cold = "  - {soak: cold, liquor: {ratio: 2 L/kg, salt: 0 g/L}, temperature: 12 Cel, film: negligible,"
                + " time: 6 h" + STAYS.replace("20 min", "2 h").replace("30 min", "4 h") + "}";
        Recipe stays = Recipes.of(Recipes.LOINS + "steps:", Recipes.water("one", "ratio: 2 L/kg", "6 h"), cold);
        Recipe colder = Recipes.of(
                Recipes.LOINS + "steps:",
                Recipes.water("one", "ratio: 2 L/kg", "6 h"),
                rest("drained", "6 h"),
                cold.replace(", stays: true, changeover: {drain: 2 h, refill: 4 h}", ""));
        Recipe warmer = Recipes.of(
                Recipes.LOINS + "steps:",
                Recipes.water("one", "ratio: 2 L/kg", "6 h"),
                rest("drained", "6 h").replace("4 Cel", "12 Cel"),
                cold.replace(", stays: true, changeover: {drain: 2 h, refill: 4 h}", ""));
        double found = core(new Batch(stays).follow(6 * HOUR, 6 * HOUR), 1);
        assertEquals(core(new Batch(colder).follow(6 * HOUR, 6 * HOUR, 6 * HOUR), 2), found, 1e-9);
        assertTrue(Math.abs(core(new Batch(warmer).follow(6 * HOUR, 6 * HOUR, 6 * HOUR), 2) - found) > 0.1);
    }

    private static double core(Run run, int step) {
        return run.end(step).pieces().get(1).species().get(0).value(Reading.CORE);
    }

    @Test
    void thePlanIsThatOfTheRestsWrittenOut() {
        String free = "{from: 2 h, to: 16 h, grain: 30 min}";
        Recipe stays = Recipes.of(
                Recipes.LOINS + "between: 15 min\nsteps:",
                Recipes.water("one", "ratio: 2 L/kg", free + DRAGGING),
                Recipes.water("two", "ratio: 2 L/kg", free + STAYS),
                TARGETS);
        Recipe rests = Recipes.of(
                Recipes.LOINS + "steps:",
                Recipes.water("one", "ratio: 2 L/kg", free + DRAGGING),
                rest("drained", "50 min"),
                Recipes.water("two", "ratio: 2 L/kg", free),
                TARGETS);
        Plan plan = Planner.plan(stays, Progress.NONE);
        Plan written = Planner.plan(rests, Progress.NONE);
        assertTrue(plan.run().meetsTargets());
        assertEquals(written.run().totals().seconds(), plan.run().totals().seconds());
        assertEquals(written.run().seconds()[0], plan.run().seconds()[0]);
        assertEquals(written.run().seconds()[2], plan.run().seconds()[1]);
    }

    @Test
    void derivativesAreThoseOfDifferencesWhereFillsArePartedByChangeovers() {
        Recipe recipe = Recipes.of(
                Recipes.LOINS + "between: 15 min\nsteps:",
                Recipes.water("one", "ratio: 2 L/kg", "{from: 2 h, to: 16 h}" + DRAGGING),
                fills(3, "{from: 2 h, to: 16 h}" + DRAGGING + STAYS),
                TARGETS);
        Batch batch = new Batch(recipe);
        double[] at = {6 * HOUR, 9 * HOUR};
        for (Requirement requirement : batch.requirements()) {
            double[] slope = batch.follow(at).statedGradient(requirement);
            for (int i = 0; i < at.length; i++) {
                double[] more = at.clone();
                double[] less = at.clone();
                more[i] += 20;
                less[i] -= 20;
                double difference = (batch.follow(more).stated(requirement)
                                - batch.follow(less).stated(requirement))
                        / 40;
                assertEquals(1, slope[i] / difference, 1e-6);
            }
        }
    }

    /** In unlimited water without a gap the best can be proven so; drained pieces are not described by the tangents' bound. */
    @Test
    void tangentsBoundOnlyWhereThePiecesAreNeverDrained() {
        String plenty = "  - {rinse: NAME, liquor: {volume: unlimited, salt: 0 g/L}, temperature: 4 Cel,"
                + " film: {coefficient: 2e-6 m/s}, time: {from: 1 h, to: 30 h}HANDLING}";
        String first = plenty.replace("NAME", "one").replace("HANDLING", "");
        String second = plenty.replace("NAME", "two");
        for (String between : List.of("", "between: 20 min\n")) {
            assertTrue(Convexity.holds(Recipes.of(
                    Recipes.LOINS + between + "steps:", first, second.replace("HANDLING", ", stays: true"), TARGETS)));
            assertFalse(Convexity.holds(
                    Recipes.of(Recipes.LOINS + between + "steps:", first, second.replace("HANDLING", STAYS), TARGETS)));
            assertEquals(
                    between.isEmpty(),
                    Convexity.holds(Recipes.of(
                            Recipes.LOINS + between + "steps:", first, second.replace("HANDLING", ""), TARGETS)));
        }
    }

    @Test
    void whatIsHeldOrAttendedChangesNothingHere() {
        Recipe plain = Recipes.of(
                Recipes.LOINS + "between: 15 min\nsteps:",
                Recipes.water("one", "ratio: 2 L/kg", "{from: 2 h, to: 40 h, grain: 30 min}"),
                TARGETS);
        Recipe said = Recipes.of(
                Recipes.LOINS + "between: 15 min\nsteps:",
                Recipes.water(
                        "one",
                        "ratio: 2 L/kg",
                        "{from: 2 h, to: 40 h, grain: 30 min}, attended: true, hold-at-most: 2 h"),
                TARGETS);
        Run expected = Planner.plan(plain, Progress.NONE).run();
        Run found = Planner.plan(said, Progress.NONE).run();
        assertEquals(expected.totals(), found.totals());
        assertAlike(expected.end(0), found.end(0));
    }

    /** Moved by its density alone, a water knows what the pieces were like when it came, drained for an hour or just poured on. */
    @Test
    void stillLiquorIsMovedByPiecesThatWereDrained() {
        String salted = Recipes.LOINS.replace("partition: 0.8", "partition: 0.8\n    substance: sodium chloride");
        String still = "  - {soak: still, liquor: {ratio: 2 L/kg, salt: 0 g/L}, temperature: 4 Cel,"
                + " film: {still: true, length: 20 cm}, time: 8 hHANDLING}";
        Recipe stays = Recipes.of(
                salted + "steps:",
                fills(2, "4 h, changeover: {drain: 20 min, refill: 30 min}"),
                still.replace("HANDLING", STAYS));
        Recipe rests = Recipes.of(
                salted + "steps:",
                Recipes.water("a", "ratio: 1 L/kg", "2 h"),
                rest("a b", "50 min"),
                Recipes.water("b", "ratio: 1 L/kg", "2 h"),
                rest("drained", "50 min"),
                still.replace("HANDLING", ""));
        assertEquals(
                new Batch(rests).films().difference(4, 1).orElseThrow(),
                new Batch(stays).films().difference(1, 1).orElseThrow(),
                1e-12);
    }

    /** Three fills of 3 h parted by 50 min: read when the first and the second are let go, at 3 h and 6 h 50 min of the step. */
    @Test
    void aReadingOfFillsHasItsTimeByTheClock() {
        Recipe recipe = Recipes.of(
                Recipes.LOINS + "steps:",
                fills(3, "9 h, changeover: {drain: 20 min, refill: 30 min}"),
                Recipes.water("last", "ratio: 4 L/kg", "{from: 4 h, to: 80 h, grain: 30 min}"),
                TARGETS);
        Run run = Planner.plan(recipe, Progress.NONE).run();
        List<Checkpoint> checkpoints = Checkpoint.of(run);
        Recipe soaks = Recipes.of(
                Recipes.LOINS + "steps:",
                Recipes.water("a", "ratio: 1 L/kg", "3 h"),
                rest("a b", "50 min"),
                Recipes.water("b", "ratio: 1 L/kg", "3 h"));
        Run apart = new Batch(soaks).follow(3 * HOUR, 50 * MINUTE, 3 * HOUR);
        for (int i = 0; i < 2; i++) {
            assertEquals((i + 1) * 3 * HOUR, checkpoints.get(i).seconds());
            assertEquals(apart.end(2 * i).to(), checkpoints.get(i).clock());
            assertEquals(
                    apart.end(2 * i).liquor().get(0).end(), checkpoints.get(i).expected(), 1e-9);
        }
    }

    /** Cautions count the drained time as rest at the temperature of its liquor: 3 h of fills, 2 x 50 min, 25 min before the last. */
    @Test
    void cautionsKnowHowLongThePiecesAreDrained() {
        Recipe recipe = Recipes.of(
                Recipes.LOINS + "between: 15 min\nsteps:",
                fills(3, "3 h, changeover: {drain: 20 min, refill: 30 min}"),
                Recipes.water(
                        "last", "ratio: 4 L/kg", "2 h, stays: true, changeover: {drain: 10 min, refill: 15 min}"));
        List<Facts.Stay> stays =
                new RecipeFacts(recipe, new double[] {3 * HOUR, 2 * HOUR}, RecipeFacts.Ends.unknown()).steps();
        assertEquals(
                List.of(StepKind.RINSE, StepKind.REST, StepKind.REST, StepKind.SOAK),
                stays.stream().map(Facts.Stay::kind).toList());
        assertEquals(
                List.of(3 * HOUR, 100 * MINUTE, 25 * MINUTE, 2 * HOUR),
                stays.stream().map(Facts.Stay::seconds).toList());
        assertEquals(
                new Batch(recipe).cost().of(Goal.TIME, new double[] {3 * HOUR, 2 * HOUR}),
                stays.stream().mapToDouble(Facts.Stay::seconds).sum());
    }

    @Test
    void aChangeoverTooShortToComputeIsRefusedAtItsPlace() {
        String huge = Recipes.LOINS.replace("26 mm", "2600 mm").replace("18 mm", "2600 mm");
        String quick = "changeover: {drain: 1 s, refill: 1 s}";
        assertSaid(
                "test.yaml:17:",
                "the changeover before two is too short to be computed for salt by this version: found 2 s",
                new double[] {4000 * HOUR, 4000 * HOUR},
                huge + "steps:",
                Recipes.water("one", "ratio: 2 L/kg", "4000 h"),
                Recipes.water("two", "ratio: 2 L/kg", "4000 h, stays: true, " + quick));
        assertSaid(
                "test.yaml:16:",
                "the changeover between the fills of fills is too short to be computed for salt by this version: found 2 s",
                new double[] {8000 * HOUR},
                huge + "steps:",
                fills(2, "8000 h, " + quick));
        assertSaid(
                "test.yaml:15:10:",
                "the time between steps is too short to be computed for salt by this version: found 2 s",
                new double[] {4000 * HOUR, 4000 * HOUR},
                huge + "between: 2 s\nsteps:",
                Recipes.water("one", "ratio: 2 L/kg", "4000 h"),
                Recipes.water("two", "ratio: 2 L/kg", "4000 h"));
    }

    private static void assertSaid(String place, String text, double[] seconds, String... lines) {
        Recipe recipe = Recipes.of(lines);
        Unsound refused = assertThrows(Unsound.class, () -> new Batch(recipe).follow(seconds));
        String said = refused.problems().get(0).toString();
        assertTrue(said.startsWith(place), said);
        assertTrue(said.contains(text), said);
        assertTrue(said.contains("; write at least "), said);
    }
}
