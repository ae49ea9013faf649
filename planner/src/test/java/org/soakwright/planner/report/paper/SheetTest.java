package org.soakwright.planner.report.paper;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.soakwright.planner.batch.Checkpoint;
import org.soakwright.planner.batch.PullWindow;
import org.soakwright.planner.batch.Run;
import org.soakwright.recipes.model.Reading;

/** What the sheet says, against what the batch computes and against arithmetic of the recipe. */
class SheetTest {
    private final Run desalting = Batches.planned(Batches.DESALTING).run();
    private final Sheet sheet = Batches.sheet(desalting, Optional.of(Batches.START));

    private static Sheet.Moment moment(Sheet.Part part, String what) {
        return part.moments().stream()
                .filter(one -> one.what().equals(what))
                .findFirst()
                .orElseThrow();
    }

    private static String all(List<String> lines) {
        return String.join("\n", lines);
    }

    @Test
    void everyStepStartsAndEndsWhenTheBatchSays() {
        assertEquals(2, sheet.parts().size());
        for (int i = 0; i < 2; i++) {
            Sheet.Part part = sheet.parts().get(i);
            assertEquals(desalting.end(i).from(), moment(part, "Start").seconds());
            assertEquals(desalting.end(i).to(), moment(part, "End").seconds());
        }
        double second = desalting.seconds()[0] + 20 * 60;
        assertEquals(second, moment(sheet.parts().get(1), "Start").seconds());
    }

    @Test
    void momentsComeInTheOrderOfTime() {
        for (Sheet.Part part : Batches.sheet(Batches.followed(Batches.BRINING), Optional.empty())
                .parts()) {
            double before = -1;
            for (Sheet.Moment moment : part.moments()) {
                assertTrue(moment.seconds() >= before, part.name());
                before = moment.seconds();
            }
        }
    }

    @Test
    void theLotDisplacesItsVolume() {
        // 600 kg of 1120 kg/m3 are 535.7 L; 2 L/kg are 1200 L; 0.05 L/kg of 600 kg cling: 30 L.
        assertTrue(all(sheet.parts().get(0).makeUp())
                .contains("Level with the lot in: 1736 L (535.7 L of pieces, 1200 L of liquor)."));
        assertTrue(all(sheet.parts().get(1).makeUp())
                .contains("1766 L (535.7 L of pieces, 1200 L of liquor, 30 L clinging from before)."));
    }

    @Test
    void solutesAreWeighedFromStrengthAndVolume() {
        List<Sheet.Part> parts = Batches.sheet(Batches.followed(Batches.BRINING), Optional.empty())
                .parts();
        // 1500 L of 180 g/L; 100 L of 5 g/L, three times; 80 L and 2 L/min for 10 min of 5 g/L.
        assertTrue(parts.get(0).makeUp().get(0).startsWith("Make up 1500 L; salt 180 g/L, dissolve 270 kg."));
        assertTrue(
                parts.get(1)
                        .makeUp()
                        .get(0)
                        .startsWith(
                                "Make up 3 fills of 100 L, 300 L in all; salt 5 g/L, dissolve 0.5 kg in each fill, 1.5 kg in all."));
        assertTrue(
                parts.get(2)
                        .makeUp()
                        .get(0)
                        .startsWith(
                                "Make up 80 L, then let 2 L/min run through: 100 L in 10 min in all; salt 5 g/L, dissolve 0.5 kg."));
        // 250 kg of 1000 kg/m3 are 250 L; an overflowing vessel keeps its level.
        assertTrue(all(parts.get(2).makeUp()).contains("It overflows with the lot in at 330 L"));
        assertEquals(List.of(), parts.get(3).makeUp());
    }

    @Test
    void everyFillHasItsTime() {
        Sheet.Part fills = Batches.sheet(Batches.followed(Batches.BRINING), Optional.of(Batches.START))
                .parts()
                .get(1);
        // From 30 min on, a third of 45 min each.
        assertEquals("0:45", moment(fills, "Fill 2").clock());
        assertEquals("1:00", moment(fills, "Fill 3").clock());
        assertEquals("Fri 27 Feb 19:00", moment(fills, "Fill 3").wall());
        assertEquals("drain, then 100 L fresh", moment(fills, "Fill 3").planned());
    }

    /** From 1:00 on, 30 min after the tank was left alone: 15 min a fill, 10 and 20 min to drain and refill between them, out at 2:45. */
    @Test
    void aLotThatStaysIsDrainedAndRefilledByTheClock() {
        String staying = Batches.BRINING
                .replace(
                        "    fills: 3\n",
                        "    fills: 3\n    stays: true\n    changeover: {drain: 10 min, refill: 20 min}\n")
                .replace("  - rest: room\n", "  - rest: room\n    stays: true\n    attended: true\n");
        Sheet stays = Batches.sheet(Batches.followed(staying), Optional.empty());
        Sheet.Part tank = stays.parts().get(0);
        Sheet.Part fills = stays.parts().get(1);
        assertEquals(
                "pieces stay: 10 min to drain, 20 min to refill",
                moment(tank, "End").planned());
        assertEquals(
                "the pieces stayed, the liquor is in", moment(fills, "Start").planned());
        assertEquals(
                List.of("Start 1:00", "Drain 1:15", "Fill 2 1:45", "Drain 2:00", "Fill 3 2:30", "End 2:45"),
                fills.moments().stream()
                        .filter(one -> !one.what().equals("Read"))
                        .map(one -> one.what() + " " + one.clock())
                        .toList());
        assertEquals("10 min to drain, 20 min to refill", moment(fills, "Drain").planned());
        assertEquals("100 L fresh", moment(fills, "Fill 2").planned());
        assertTrue(fills.doing().contains("rinse, 45 min in liquor"), fills.doing());
        assertEquals("pieces out", moment(fills, "End").planned());
        assertEquals("pieces stay", moment(stays.parts().get(2), "End").planned());
        assertEquals("the pieces stayed", moment(stays.parts().get(3), "Start").planned());
        assertEquals("Takes 14 h 55 min.", stays.timing().get(0));
        assertTrue(stays.timing().contains("Somebody attends room: on a line in crew hours only."));
    }

    @Test
    void readingsAreExpectedAsTheCheckpointsSay() {
        List<Checkpoint> checkpoints = Checkpoint.of(desalting);
        List<Sheet.Moment> reads = sheet.parts().stream()
                .flatMap(part -> part.moments().stream())
                .filter(moment -> moment.what().equals("Read"))
                .toList();
        assertEquals(4, reads.size());
        for (int i = 0; i < 4; i++) {
            Checkpoint checkpoint = checkpoints.get(i);
            double from = desalting.end(checkpoint.step()).from();
            assertEquals(from + checkpoint.seconds(), reads.get(i).seconds());
            assertEquals("g/L", reads.get(i).unit());
            double shown = Double.parseDouble(reads.get(i).planned().split(" ", -1)[1]);
            assertEquals(checkpoint.expected(), shown, 0.005 * checkpoint.expected());
        }
    }

    @Test
    void windowsAreTheOnesComputed() {
        PullWindow window = PullWindow.of(desalting).get(0);
        String said = moment(sheet.parts().get(0), "End").notes().get(0);
        Clock clock = new Clock(Optional.of(Batches.START));
        assertEquals(
                "Window: not before " + clock.both(window.earliest()) + ", not after "
                        + clock.both(window.latest().orElseThrow()) + ".",
                said);
    }

    @Test
    void targetsShowWhatIsExpectedOfEachGrade() {
        assertEquals(3, sheet.targets().size());
        for (int grade = 0; grade < 2; grade++) {
            Sheet.TargetLine line = sheet.targets().get(grade);
            double mean = desalting.end(1).pieces().get(grade).species().get(0).value(Reading.MEAN);
            assertEquals(desalting.end(1).pieces().get(grade).name(), line.grade());
            assertEquals(mean, Double.parseDouble(line.expected().split(" ", -1)[0]), 0.0005 * mean);
            assertEquals("at most 55 g/kg", line.limit());
        }
        assertEquals("thick", sheet.targets().get(2).grade());
    }

    @Test
    void samplesAreTakenAsTheReadingNeeds() {
        String how = all(sheet.sampling());
        assertTrue(how.contains("salt mean, thin and thick. Homogenise whole pieces, each grade by itself."), how);
        assertTrue(how.contains("salt highest, thick. Cut a plug through the whole thickness into thin layers"), how);
        String cords = all(Batches.sheet(Batches.followed(Batches.BRINING), Optional.empty())
                .sampling());
        assertTrue(cords.contains("After room, at 13:25: salt core. Cut a plug from around the axis."), cords);
        assertTrue(cords.contains("the highest less the lowest counts"), cords);
        assertTrue(cords.contains("At the end of brine tank, before the liquor is drained"), cords);
    }

    @Test
    void piecesOfSeveralSidesAreSampledWhereTheyDiffer() {
        Sheet rounds = Batches.sheet(Batches.followed(Batches.ROUNDS), Optional.empty());
        assertEquals(
                List.of(
                        "300 kg, 277.8 L of pieces: 40 % block, bricks of 40 x 60 x 90 mm, thickness sealed on one face; 60 % round,"
                                + " short cylinders 90 mm across, 110 mm long.",
                        "Pieces differ: sizes spread by 6 %. What is expected is the average over a grade, unless a share is"
                                + " named."),
                rounds.lot());
        String how = all(rounds.sampling());
        for (String said : List.of(
                "salt mean, block and round. Homogenise each piece alone, each grade by itself. Of the pieces 90 %, by mass,"
                        + " are to keep the limit, each read alone.",
                "salt core, block. Cut a plug from the core: half the width and half the length in, at the sealed face of the"
                        + " thickness, each grade by itself. Pieces differ: the average of several counts.",
                "salt lowest, round. Cut what lies between the core and the edge of a flat face into small parts, assay each;"
                        + " the lowest counts, each grade by itself.",
                "salt mean, lot. Assay pieces of all grades, taken in the shares in which they are loaded, each alone: 80 % of"
                        + " them, by mass, are to keep the limit.")) {
            assertTrue(how.contains(said), how);
        }
    }

    @Test
    void aMissedPlanIsNoneAndIsNotReleased() {
        Sheet missed = Batches.sheet(
                Batches.followed(Batches.DESALTING.replace("at-most: 55 g/kg", "at-most: 5 g/kg")), Optional.empty());
        assertEquals("NOT A PLAN: misses 2 targets", missed.banner());
        assertTrue(
                missed.misses().get(0).startsWith("salt mean, thin is "),
                missed.misses().get(0));
        assertFalse(missed.signatures().contains("Released"));
        assertTrue(sheet.signatures().contains("Released"));
        for (Sheet.Part part : missed.parts()) {
            assertTrue(part.doing().startsWith("NOT A PLAN"));
            assertTrue(part.moments().stream().allMatch(moment -> moment.notes().isEmpty()), "no window, no advice");
        }
    }

    @Test
    void withoutTargetsNothingIsLimitedAndNothingShortened() {
        String untargeted = Batches.DESALTING.replaceAll("(?s)targets:.*minimise", "minimise");
        Sheet open = Batches.sheet(Batches.followed(untargeted), Optional.empty());
        assertEquals(List.of(), open.targets());
        for (Sheet.Part part : open.parts()) {
            assertEquals(List.of(), moment(part, "End").notes());
            assertEquals(List.of(), moment(part, "Read").notes());
        }
    }

    @Test
    void theSheetSaysThatTimesOfDayKnowNoZone() {
        assertTrue(all(sheet.timing()).contains("Times of day are local, with 60 minutes to every hour"));
        assertFalse(all(Batches.sheet(desalting, Optional.empty()).timing()).contains("Times of day"));
    }

    @Test
    void whatIsCountedOtherwiseIsAssayedOtherwise() {
        String lot = "lot:\n  mass: 600 kg\n";
        assertTrue(Batches.DESALTING.contains(lot));
        String head = Batches.DESALTING
                .substring(0, Batches.DESALTING.indexOf("targets:"))
                .replace(lot, lot + "  moisture: {start: 50 %, end: 60 %}\n");
        Sheet counted = Batches.sheet(Batches.followed(head + """
                targets:
                  - {species: salt, reading: mean, phase: water, at-most: 90 %, confidence: 80 %}
                  - {species: salt, reading: mean, per: dry, at-most: 900 g/kg}
                  - {species: salt, reading: mean, per: present, at-most: 900 g/kg}
                  - {species: salt, reading: mean, at-most: 900 g/kg}
                  - {total: mass, at-least: 10 kg}
                """), Optional.empty());
        String sampling = all(counted.sampling());
        assertTrue(sampling.contains("the limit is salt over salt and water together."), sampling);
        assertTrue(sampling.contains("the limit is salt per kg of all that is not water."), sampling);
        assertTrue(sampling.contains("Count it per kg of the sample as it is."), sampling);
        assertTrue(sampling.contains("The limit is per kg as loaded: take what is found"), sampling);
        assertTrue(sampling.contains("weigh the whole lot"), sampling);
        Sheet.TargetLine first = counted.targets().get(0);
        assertEquals("salt mean in the water phase", first.target());
        assertEquals("at most 90 %, 80 % sure", first.limit());
        Sheet.TargetLine mass = counted.targets().get(counted.targets().size() - 1);
        assertEquals("mass of the lot", mass.target());
        assertEquals("kg", mass.unit());
        Sheet.Part last = counted.parts().get(counted.parts().size() - 1);
        assertTrue(moment(last, "End").planned().endsWith("the lot weighs " + mass.expected()), mass.expected());
        assertFalse(moment(sheet.parts().get(0), "End").planned().contains("weighs"));
    }
}
