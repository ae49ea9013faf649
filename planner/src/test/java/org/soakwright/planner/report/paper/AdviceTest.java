package org.soakwright.planner.report.paper;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import org.soakwright.planner.batch.Checkpoint;
import org.soakwright.planner.batch.PullWindow;
import org.soakwright.planner.batch.Run;

/** What the operator is told about readings of the liquor, for deviations made up to see each case. */
class AdviceTest {
    private static final double HOUR = 3600;

    private final Run run = Batches.followed(Batches.DESALTING);
    private final Advice open = new Advice(run, List.of(), new Clock(Optional.empty()));

    private static Checkpoint.Deviation slow(double reading) {
        return new Checkpoint.Deviation(reading, 0.8, List.of(20 * HOUR, 24 * HOUR), OptionalDouble.of(8 * HOUR));
    }

    private static Checkpoint.Deviation fast(double reading) {
        return new Checkpoint.Deviation(reading, 1.25, List.of(14 * HOUR, 18 * HOUR), OptionalDouble.of(-4 * HOUR));
    }

    private static Checkpoint expecting(double reading, Checkpoint.Deviation... deviations) {
        return new Checkpoint(0, 6 * HOUR, 6 * HOUR, "salt", reading, List.of(deviations));
    }

    @Test
    void whereLongerDoesNoHarmTheLongerPlanServesReadingsOnTheWayToIt() {
        Advice.Given given = open.at(expecting(30, slow(26), fast(35)));
        // 3 % below what is expected is still as expected; above it all is well up to where the shorter plan holds.
        assertEquals("29.1 to 35.0", given.asPlanned().shown());
        assertEquals(
                "26.0 to 29.1 g/L: pieces give slowly. End at 20:00, then second water lasts 1 d. In all 8 h longer.",
                given.off().get(0));
        assertEquals(
                "35.0 to 40.0 g/L: pieces give fast. End at 14:00. In all 4 h shorter.",
                given.off().get(1));
    }

    @Test
    void noStepIsShortenedOnAReadingThatSlowPiecesMightGive() {
        assertTrue(open.at(expecting(30, slow(27), fast(26))).off().isEmpty(), "both below");
        assertTrue(open.at(expecting(30, fast(35))).off().isEmpty(), "only fast pieces are told");
        assertEquals(
                "29.1 to 30.9", open.at(expecting(30, fast(35))).asPlanned().shown());
    }

    @Test
    void wherePiecesStillHoldMuchASlowOneShowsInAHigherReading() {
        Advice.Given given = open.at(expecting(1, slow(1.2), fast(0.9)));
        assertEquals("0.900 to 1.03", given.asPlanned().shown());
        assertTrue(
                given.off().get(0).startsWith("1.03 to 1.20 g/L: pieces give slowly."),
                given.off().get(0));
        assertTrue(
                given.off().get(1).startsWith("0.800 to 0.900 g/L: pieces give fast."),
                given.off().get(1));
    }

    @Test
    void whereNoPlanIsLeftThePlannerIsCalled() {
        Checkpoint.Deviation lost = new Checkpoint.Deviation(26, 0.8, List.of(), OptionalDouble.empty());
        assertEquals(
                "29.1 g/L or less: pieces give slowly. No times that the recipe allows reach the targets from here. Call the"
                        + " planner, do not improvise.",
                open.at(expecting(30, lost, fast(35))).off().get(0));
    }

    @Test
    void aBatchThatIsLongEnoughForSlowPiecesGoesOn() {
        Checkpoint.Deviation shorter =
                new Checkpoint.Deviation(26, 0.8, List.of(16 * HOUR, 16 * HOUR), OptionalDouble.of(-4 * HOUR));
        assertTrue(
                open.at(expecting(30, shorter)).off().get(0).endsWith("Go on as planned, the steps are long enough."));
    }

    @Test
    void whereLongerHarmsEachPlanServesOnlyTheReadingItWasMadeFor() {
        // A band of contents: the later limit is real.
        Run banded = Batches.followed(
                Batches.DESALTING.replace("at-most: 55 g/kg}", "at-least: 20 g/kg, at-most: 60 g/kg}"));
        List<PullWindow> windows = PullWindow.of(banded);
        assertTrue(windows.stream().anyMatch(window -> window.latest().isPresent()), windows.toString());
        Advice closed = new Advice(banded, windows, new Clock(Optional.empty()));
        Advice.Given given = closed.at(expecting(30, slow(20), fast(40)));
        assertEquals("29.1 to 30.9", given.asPlanned().shown());
        assertTrue(
                given.off().get(0).startsWith("19.4 to 20.6 g/L:"), given.off().get(0));
        assertTrue(
                given.off().get(1).startsWith("38.8 to 41.2 g/L:"), given.off().get(1));
    }

    @Test
    void aLimitOnTheTotalTimeDoesNotMakeLongerStepsHarmful() {
        Run limited =
                Batches.followed(Batches.DESALTING.replace("minimise:", "  - {total: time, at-most: 48 h}\nminimise:"));
        List<PullWindow> windows = PullWindow.of(limited);
        assertTrue(windows.get(0).latest().isPresent());
        Advice advice = new Advice(limited, windows, new Clock(Optional.empty()));
        assertEquals(
                "29.1 to 35.0",
                advice.at(expecting(30, slow(26), fast(35))).asPlanned().shown());
    }
}
