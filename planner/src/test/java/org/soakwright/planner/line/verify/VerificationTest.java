package org.soakwright.planner.line.verify;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static org.junit.jupiter.params.provider.Arguments.arguments;

import java.nio.file.Path;
import java.time.OffsetDateTime;
import java.util.List;
import java.util.Set;
import java.util.stream.Stream;
import org.jspecify.annotations.Nullable;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.soakwright.planner.line.HandmadePlan;
import org.soakwright.recipes.model.line.Line;

/** Whatever rule of a line a result breaks, the checker says so; and says nothing of a result that breaks none. */
class VerificationTest {
    private static final String HALL = "small-hall.yaml";
    private static final String LOINS = "thin-loins.yaml";
    private static final String CORDS = "cords.yaml";

    /** Told for people alone, or of things that are not checked. */
    private static final Set<String> UNCHECKED = Set.of(
            "soakwright",
            "title",
            "zone",
            "inputs-sha256",
            "liquor",
            "liquor-by-day",
            "notes",
            "cautions",
            "stops",
            "why-late",
            "limited-by",
            "species",
            "reading",
            "grade",
            "unit");

    private static final Line LINE = HandmadePlan.line();

    @TempDir
    Path folder = Path.of("");

    private static void assertFault(String sentence, Verification.Verdict verdict) {
        assertTrue(verdict.faults().contains(sentence), () -> String.join("\n", verdict.faults()));
    }

    @Test
    void nothingIsSaidAgainstAPlanThatKeepsEveryRule() {
        assertEquals(new Verification.Verdict(List.of(), 5, 18, 23, 5), Verification.of(LINE, new Tampered().text()));
    }

    static Stream<Arguments> changes() {
        return Stream.of(
                // Orders and loads.
                change(
                        440,
                        "Lot L1 is made in 2 of 2 parts with 890 kg together, 900 kg would be right.",
                        "lots",
                        0,
                        "mass-kg"),
                change(1, "Lot L1 has a part 1 of 2, each from 1 to 2 once would be right.", "lots", 1, "part"),
                change("L9", "Lot \"L9\" is no lot of the line, one of its 5 would be right.", "lots", 5, "lot"),
                change("L9", "Lot L2 is not in the result, all its 400 kg made would be right.", "lots", 5, "lot"),
                change("cords.yaml", "L2 follows \"cords.yaml\", thin-loins.yaml would be right.", "lots", 5, "recipe"),
                change(-1, "C2 weighs -1 kg, more than nothing would be right.", "lots", 3, "mass-kg"),
                change(
                        "C1 + C2",
                        "L2 of thin-loins.yaml shares a load with C1 of cords.yaml, one recipe a load would be right.",
                        "lots",
                        5,
                        "load"),
                change("C1 + C2", "L2 goes together with others as C1 + C2, alone would be right.", "lots", 5, "load"),
                change(
                        "2026-10-24T10:00+02:00",
                        "C2 has other times or targets than C1 in the same load, the same would be right.",
                        "lots",
                        3,
                        "done"),
                // Steps.
                change(
                        "rinsing",
                        "L2 goes through soak first water, rinse rinsing, rinse washing, fill 2, rinse running water; soak first water, rinse washing in fills 1 to 2, rinse running water would be right.",
                        "lots",
                        5,
                        "steps",
                        1,
                        "name"),
                change(
                        3,
                        "L2 goes through soak first water, rinse washing, rinse washing, fill 3, rinse running water; soak first water, rinse washing in fills 1 to 2, rinse running water would be right.",
                        "lots",
                        5,
                        "steps",
                        2,
                        "fill"),
                change(
                        "soak",
                        "L2 goes through soak first water, rinse washing, rinse washing, fill 2, soak running water; soak first water, rinse washing in fills 1 to 2, rinse running water would be right.",
                        "lots",
                        5,
                        "steps",
                        3,
                        "kind"),
                change(
                        60,
                        "L2: running water in trough 1 says it lasts 1 min, 10 h 15 min from its start to its end would be right.",
                        "lots",
                        5,
                        "steps",
                        3,
                        "seconds"),
                change(
                        "2026-10-24T21:40+02:00",
                        "L2: running water in trough 1 ends at 2026-10-24T21:40+02:00 and starts at 2026-10-24T21:45+02:00, an end after its start would be right.",
                        "lots",
                        5,
                        "steps",
                        3,
                        "end"),
                change(
                        "2026-10-24T22:00+02:00",
                        "L2: running water in trough 1 starts 30 min after washing, fill 2 ended, from 15 min to 25 min after it would be right.",
                        "lots",
                        5,
                        "steps",
                        3,
                        "start"),
                change(
                        "2026-10-24T18:49+02:00",
                        "L2: washing, fill 2 in tank 1 starts 49 min after washing, fill 1 ended, 50 min after it would be right.",
                        "lots",
                        5,
                        "steps",
                        2,
                        "start"),
                change(
                        "2026-10-25T06:59+01:00",
                        "L2: running water in trough 1 has a latest pull of 2026-10-25T06:59+01:00, its end at 2026-10-25T07:00+01:00 and its slack later would be right.",
                        "lots",
                        5,
                        "steps",
                        3,
                        "latest-pull"),
                // Vessels.
                change(
                        "tank 7",
                        "L2: washing, fill 1 is in \"tank 7\", which the line does not have; one of tank would be right.",
                        "lots",
                        5,
                        "steps",
                        1,
                        "vessel"),
                change(
                        "tub",
                        "L2: running water is in tub, which does not serve this rinse; one of trough would be right.",
                        "lots",
                        5,
                        "steps",
                        3,
                        "vessel"),
                change(
                        "tank 2",
                        "L2: washing, fill 1 in tank 2 comes after first water in tank 1, staying there would be right.",
                        "lots",
                        5,
                        "steps",
                        1,
                        "vessel"),
                change(
                        "trough 1",
                        "L1 (2 of 2) lands in trough 1 at 2026-10-23T21:45+02:00, where L1 (1 of 2) is until 2026-10-24T08:00+02:00; 2026-10-24T08:20+02:00 or later would be right.",
                        "lots",
                        1,
                        "steps",
                        3,
                        "vessel"),
                change(
                        "tank 2",
                        "L2 is in tank 2 from 2026-10-24T06:15+02:00 to 2026-10-24T21:30+02:00, out of it from 2026-10-24T08:00+02:00 to 2026-10-24T18:00+02:00 would be right.",
                        "lots",
                        5,
                        "steps",
                        0,
                        "vessel"),
                // Moves.
                change(
                        "trough 2",
                        "L2: the transfer from tank 1 to trough 1 is missing, one from 2026-10-24T21:30+02:00 to 2026-10-24T21:45+02:00 would be right.",
                        "moves",
                        21,
                        "to"),
                change(
                        "trough 2",
                        "L2: the transfer from tank 1 to trough 2 at 2026-10-24T21:30+02:00 leads nowhere, none would be right.",
                        "moves",
                        21,
                        "to"),
                change(
                        "2026-10-24T21:46+02:00",
                        "L2: the transfer from tank 1 to trough 1 goes from 2026-10-24T21:30+02:00 to 2026-10-24T21:46+02:00, 2026-10-24T21:30+02:00 to 2026-10-24T21:45+02:00 would be right.",
                        "moves",
                        21,
                        "end"),
                change(
                        "2026-10-25T07:16+01:00",
                        "L2: the unload from trough 1 goes from 2026-10-25T07:00+01:00 to 2026-10-25T07:16+01:00, 2026-10-25T07:00+01:00 to 2026-10-25T07:15+01:00 would be right.",
                        "moves",
                        22,
                        "end"),
                change(
                        "2026-10-24T18:51+02:00",
                        "L2: the changeover from tank 1 to tank 1 goes from 2026-10-24T18:00+02:00 to 2026-10-24T18:51+02:00, 2026-10-24T18:00+02:00 to 2026-10-24T18:50+02:00 would be right.",
                        "moves",
                        20,
                        "end"),
                change(
                        "L9",
                        "The unload from trough 1 at 2026-10-25T07:00+01:00 is of \"L9\", one of the loads would be right.",
                        "moves",
                        22,
                        "lot"),
                change(
                        "lift",
                        "L2: the lift from trough 1 at 2026-10-25T07:00+01:00 leads nowhere, none would be right.",
                        "moves",
                        22,
                        "kind"),
                change(
                        2,
                        "L2: the unload from trough 1 at 2026-10-25T07:00+01:00 takes 2 heads, 1 would be right.",
                        "moves",
                        22,
                        "heads"),
                change(
                        false,
                        "L2: the unload from trough 1 at 2026-10-25T07:00+01:00 takes no hoist, one would be right.",
                        "moves",
                        22,
                        "hoist"),
                change(
                        true,
                        "L2: the changeover from tank 1 to tank 1 at 2026-10-24T18:00+02:00 takes a hoist, none would be right.",
                        "moves",
                        20,
                        "hoist"),
                change(
                        "2026-10-25T06:00+01:00",
                        "L2: the unload from trough 1 at 2026-10-25T07:00+01:00 ends at 2026-10-25T06:00+01:00, after its start would be right.",
                        "moves",
                        22,
                        "end"),
                change(
                        "2026-10-23T06:10+02:00",
                        "At 2026-10-23T06:10+02:00 2 loads are on the move with the load to tank 1 of L1 (1 of 2), the load to tank 2 of L1 (2 of 2), at most 1 at once would be right.",
                        "moves",
                        1,
                        "start"),
                change(
                        "2026-10-24T22:01+02:00",
                        "At 2026-10-24T22:00+02:00 1 head of the crew is needed for the transfer from tank 1 to trough 1 of L2, at most 0 would be right.",
                        "moves",
                        21,
                        "end"),
                // What is said of the lots and the whole.
                change(
                        "2026-10-24T06:01+02:00",
                        "L2 is loaded at 2026-10-24T06:01+02:00, 2026-10-24T06:00+02:00 would be right.",
                        "lots",
                        5,
                        "loaded"),
                change(
                        "2026-10-25T07:16+01:00",
                        "L2 is done at 2026-10-25T07:16+01:00, 2026-10-25T07:15+01:00 would be right.",
                        "lots",
                        5,
                        "done"),
                change(
                        "2026-10-24T05:01+02:00",
                        "L2 is ready at 2026-10-24T05:01+02:00, 2026-10-24T05:00+02:00 would be right.",
                        "lots",
                        5,
                        "ready"),
                change(null, "L2 is due never, at 2026-10-25T12:00+01:00 would be right.", "lots", 5, "due"),
                change(4499, "C3, ж; urgent is late by 4499 s, 4500 s would be right.", "lots", 4, "late-seconds"),
                change(1, "makespan-seconds is 1, 180900 would be right.", "makespan-seconds"),
                change(8999, "lateness-seconds is 8999, 9000 would be right.", "lateness-seconds"),
                change(1, "night-moves is 1, 0 would be right.", "night-moves"),
                change(3148.94, "cost is 3148.94, 3148.95 would be right.", "cost"),
                change(null, "cost is missing, 3148.95 would be right.", "cost"),
                change("NOK", "currency is NOK, EUR would be right.", "currency"),
                change(
                        180901,
                        "bound-seconds is 180901, no more than the makespan of 180900 would be right.",
                        "bound-seconds"),
                change(
                        9001,
                        "bound-lateness-seconds is 9001, no more than the lateness of 9000 would be right.",
                        "bound-lateness-seconds"),
                change(
                        true,
                        "The result is said to be met, not met would be right: every target is met and a lot is late.",
                        "met"),
                // Targets.
                change(false, "L2 is said to miss its targets, meeting them all would be right.", "lots", 5, "met"),
                change(
                        13,
                        "L2: salt mean, thick is said to be 13 g/kg, 13.50492583 g/kg would be right.",
                        "lots",
                        5,
                        "targets",
                        0,
                        "value"),
                change(
                        26,
                        "L2: salt mean, thick is held to at most 26 g/kg, at most 25 g/kg would be right.",
                        "lots",
                        5,
                        "targets",
                        0,
                        "at-most"),
                change(List.of(), "L2 shows 0 targets, 1 would be right.", "lots", 5, "targets"),
                change(
                        false,
                        "L2: salt mean, thick is said to be missed with 13.50492583 g/kg, met, held to at most 25 g/kg, would be right.",
                        "lots",
                        5,
                        "targets",
                        0,
                        "met"));
    }

    private static Arguments change(@Nullable Object value, String sentence, Object... path) {
        return arguments(value, sentence, List.of(path));
    }

    @ParameterizedTest
    @MethodSource("changes")
    void aChangedValueIsFound(@Nullable Object value, String sentence, List<Object> path) {
        assertFault(
                sentence,
                Verification.of(LINE, new Tampered().with(value, path.toArray()).text()));
    }

    @Test
    void whatIsTakenAwayOrToldTwiceIsFound() {
        assertFault(
                "Lot L2 is not in the result, all its 400 kg made would be right.",
                Verification.of(LINE, new Tampered().without("lots", 5).text()));
        assertFault(
                "Lot L2 has a part 1 of 1, each from 1 to 1 once would be right.",
                Verification.of(LINE, new Tampered().twice("lots", 5).text()));
        assertFault(
                "Lot L1 is made in 1 of 2 parts with 450 kg together, 900 kg would be right.",
                Verification.of(LINE, new Tampered().without("lots", 1).text()));
        assertFault(
                "L2 goes through soak first water, rinse washing, rinse washing, fill 2; soak first water, rinse washing"
                        + " in fills 1 to 2, rinse running water would be right.",
                Verification.of(
                        LINE, new Tampered().without("lots", 5, "steps", 3).text()));
        assertFault(
                "L2: the unload from trough 1 is missing, one from 2026-10-25T07:00+01:00 to 2026-10-25T07:15+01:00"
                        + " would be right.",
                Verification.of(LINE, new Tampered().without("moves", 22).text()));
        assertFault(
                "L2: the unload from trough 1 at 2026-10-25T07:00+01:00 leads nowhere, none would be right.",
                Verification.of(LINE, new Tampered().twice("moves", 22).text()));
    }

    static Stream<Arguments> rules() {
        return Stream.of(
                arguments(
                        HALL,
                        "usable: 90 %}\n    turnaround",
                        "usable: 60 %}\n    turnaround",
                        "L1 (1 of 2): first water fills tank 1 with 1301.785714 L of pieces and liquor, at most 1200 L would be right."),
                arguments(
                        HALL,
                        "capacity: 900 kg",
                        "capacity: 400 kg",
                        "cold-room holds 450 kg at 2026-10-23T19:15+02:00 with C1 + C2, C3, ж; urgent, at most 400 kg would be right."),
                arguments(
                        HALL,
                        "capacity: 900 kg",
                        "capacity: 240 kg",
                        "C1 + C2: maturing brings 250 kg into cold-room, at most 240 kg would be right."),
                arguments(
                        HALL,
                        "turnaround: 40 min",
                        "turnaround: 10 h",
                        "L2 lands in tank 1 at 2026-10-24T06:15+02:00, where L1 (1 of 2) is until 2026-10-23T21:00+02:00; 2026-10-24T07:00+02:00 or later would be right."),
                arguments(
                        HALL,
                        "vessel: 2",
                        "vessel: every",
                        "L2 is in tank 1 from 2026-10-24T06:15+02:00 to 2026-10-24T21:30+02:00, out of it from 2026-10-24T08:00+02:00 to 2026-10-24T18:00+02:00 would be right."),
                arguments(
                        HALL,
                        "to: \"22:00\", heads: 2",
                        "to: \"22:00\", heads: 1",
                        "At 2026-10-23T17:30+02:00 2 heads of the crew are needed for the changeover from tank 1 to tank 1 of L1 (1 of 2), the changeover from tank 2 to tank 2 of L1 (2 of 2), at most 1 would be right."),
                arguments(
                        HALL,
                        "from: \"10:00\", to: \"10:30\"",
                        "from: \"12:14\", to: \"12:30\"",
                        "At 2026-10-23T12:14+02:00 1 head of the crew is needed for the load to tub of C1 + C2, at most 0 would be right."),
                arguments(
                        HALL,
                        "heads: 1, hangs",
                        "heads: 2, hangs",
                        "L2: the unload from trough 1 at 2026-10-25T07:00+01:00 takes 1 head, 2 would be right."),
                arguments(
                        HALL,
                        "takes: 15 min",
                        "takes: 16 min",
                        "C1 + C2: dip in sink starts 15 min after brine ended, from 16 min to 26 min after it would be right."),
                arguments(
                        HALL,
                        "ready: 2026-10-24T05:00",
                        "ready: 2026-10-24T07:00",
                        "L2 is loaded at 2026-10-24T06:00+02:00, after L2 is ready at 2026-10-24T07:00+02:00 would be right."),
                arguments(
                        HALL,
                        "starts: 2026-10-23T06:00",
                        "starts: 2026-10-23T06:30",
                        "L1 (1 of 2) is loaded at 2026-10-23T06:00+02:00, after the line starts at 2026-10-23T06:30+02:00 would be right."),
                arguments(
                        HALL,
                        "ready: 2026-10-23T12:00}",
                        "ready: 2026-10-23T12:00, alone: true}",
                        "C2 goes together with others as C1 + C2, alone would be right."),
                arguments(HALL, "priority: 2", "priority: 3", "lateness-seconds is 9000, 13500 would be right."),
                arguments(
                        LOINS,
                        "between: 15 min",
                        "between: 30 min",
                        "L2: running water in trough 1 starts 15 min after washing, fill 2 ended, from 30 min to 40 min after it would be right."),
                arguments(
                        LOINS,
                        "refill: 30 min",
                        "refill: 25 min",
                        "L2: washing, fill 2 in tank 1 starts 50 min after washing, fill 1 ended, 45 min after it would be right."),
                arguments(
                        LOINS,
                        "    stays: true\n",
                        "",
                        "L2: washing, fill 1 in tank 1 starts 50 min after first water ended, from 15 min to 25 min after it would be right."),
                arguments(
                        LOINS,
                        "fills: 2",
                        "fills: 3",
                        "L2 goes through soak first water, rinse washing, rinse washing, fill 2, rinse running water; soak first water, rinse washing in fills 1 to 3, rinse running water would be right."),
                arguments(
                        LOINS,
                        "to: 24 h}",
                        "to: 24 h}\n    attended: true",
                        "L2: running water in trough 1 is attended and nobody is on shift at 2026-10-24T22:00+02:00, wholly within crew hours would be right."),
                arguments(
                        LOINS,
                        "{from: 30 min, to: 24 h}",
                        "9 h\n    hold-at-most: 1 h",
                        "L2: running water in trough 1 lasts 10 h 15 min, 9 h held at most 1 h longer would be right."),
                arguments(
                        LOINS,
                        "{from: 30 min, to: 24 h}",
                        "{any-of: [9 h, 11 h]}\n    hold-at-most: 0 min",
                        "L2: running water in trough 1 lasts 10 h 15 min, 9 h held at most no time longer would be right."),
                arguments(
                        LOINS,
                        "{from: 30 min, to: 24 h}",
                        "11 h",
                        "L2: running water in trough 1 lasts 10 h 15 min, at least 11 h would be right."),
                arguments(
                        LOINS,
                        "{from: 2 h, to: 36 h}\n  - rinse: running",
                        "{from: 2 h, to: 5 h}\n    hold-at-most: 40 min\n  - rinse: running",
                        "L2: washing, fill 1 in tank 1 lasts 3 h 10 min, 2 h 30 min a fill held at most 20 min longer would be right."),
                arguments(
                        LOINS,
                        "{from: 2 h, to: 36 h}\n  - rinse: running",
                        "{from: 6 h, to: 36 h}\n  - rinse: running",
                        "L2: washing, fill 2 in tank 1 lasts 2 h 40 min, at least 3 h a fill would be right."),
                arguments(
                        LOINS,
                        "at-most: 25 g/kg",
                        "at-most: 13.5 g/kg",
                        "L2: salt mean, thick is said to be met with 13.50492583 g/kg, missed, held to at most 13.5 g/kg, would be right."),
                arguments(
                        LOINS,
                        "at-most: 25 g/kg",
                        "at-most: 13.5 g/kg",
                        "L2 is said to meet its targets, missing salt mean, thick would be right."),
                arguments(
                        LOINS,
                        "value: 8e-10",
                        "value: 8.1e-10",
                        "L2: salt mean, thick is said to be 13.50492583 g/kg, 13.18217977 g/kg would be right."),
                arguments(
                        LOINS,
                        "drag-out: 0.05",
                        "drag-out: 0.06",
                        "L2: salt mean, thick is said to be 13.50492583 g/kg, 13.51479732 g/kg would be right."),
                arguments(
                        CORDS,
                        "{from: 10 min, to: 4 h}",
                        "{from: 10 min, to: 4 h, grain: 40 min}\n    hold-at-most: 4 min",
                        "C1 + C2: brine in tub lasts 2 h 15 min, 2 h 10 min held at most 4 min longer would be right."));
    }

    @ParameterizedTest
    @MethodSource("rules")
    void aStricterRuleIsFoundToBeBroken(String file, String from, String to, String sentence) {
        assertFault(sentence, Verification.of(Tampered.hall(folder, file, from, to), new Tampered().text()));
    }

    @Test
    void vesselsTogetherDrawNoMoreThanThereIs() {
        Line steady = Tampered.hall(
                folder,
                HALL,
                "    turnaround: 40 min\n",
                "    turnaround: 40 min\n    draws: {power: 2 kW}\n",
                "lots:",
                "utilities: {power: 3 kW}\nlots:");
        assertFault(
                "Of power 4 kW are drawn at 2026-10-23T06:30+02:00 by tank 1, tank 2, at most 3 kW would be right.",
                Verification.of(steady, new Tampered().text()));
        Line flowing = Tampered.hall(
                folder,
                HALL,
                "turnaround: 20 min}",
                "turnaround: 20 min, draws: {water: flow}}",
                "lots:",
                "utilities: {water: 9 L/min}\nlots:");
        assertFault(
                "Of water 10 L/min are drawn at 2026-10-23T21:45+02:00 by L1 (1 of 2) in trough 1, L1 (2 of 2) in trough"
                        + " 2, at most 9 L/min would be right.",
                Verification.of(flowing, new Tampered().text()));
    }

    @Test
    void aVesselDrawsOnceHoweverManyLoadsAreInIt() {
        Line room = Tampered.hall(
                folder,
                HALL,
                "capacity: 900 kg",
                "capacity: 900 kg, draws: {power: 2 kW}",
                "lots:",
                "utilities: {power: 3 kW}\nlots:");
        assertTrue(Verification.of(room, new Tampered().text()).isFine());
    }

    @Test
    void aConfidenceIsJudgedBySamples() {
        String uncertain = "{value: 8e-10 m2/s, give-or-take: 15 %, at: 5 Cel";
        Line loose = Tampered.hall(
                folder,
                LOINS,
                "{value: 8e-10 m2/s, at: 5 Cel",
                uncertain,
                "at-most: 25 g/kg",
                "at-most: 25 g/kg, confidence: 90 %");
        assertEquals(List.of(), Verification.of(loose, new Tampered().text()).faults());
        Line tight = Tampered.hall(
                folder,
                LOINS,
                "{value: 8e-10 m2/s, at: 5 Cel",
                uncertain,
                "at-most: 25 g/kg",
                "at-most: 14 g/kg, confidence: 90 %");
        assertFault(
                "L2 is said to meet its targets, missing salt mean with 90 % confidence, thick would be right.",
                Verification.of(tight, new Tampered().text()));
    }

    @Test
    void everyValueThatIsCheckedMatters() {
        for (List<Object> path : new Tampered().leaves()) {
            if (path.stream().anyMatch(UNCHECKED::contains)) {
                continue;
            }
            Tampered tampered = new Tampered();
            Object was = tampered.get(path.toArray());
            tampered.with(other(was), path.toArray());
            assertFalse(Verification.of(LINE, tampered.text()).isFine(), () -> path + " was " + was);
        }
    }

    private static @Nullable Object other(@Nullable Object value) {
        if (value instanceof Double number) {
            // Bounds are checked from one side.
            return number + 10_000;
        }
        if (value instanceof Boolean truth) {
            return !truth;
        }
        if (value instanceof String text && text.matches("20\\d\\d-.*T.*")) {
            return OffsetDateTime.parse(text).minusMinutes(1).toString();
        }
        return value == null ? "2026-10-24T12:00+02:00" : value + "x";
    }

    @Test
    void noDamageIsThrownAt() {
        Object[] damages = {null, -7.5, 1e300, "x", List.of(1.0)};
        for (List<Object> path : new Tampered().everything()) {
            boolean alike = path.size() > 2 && path.get(1) instanceof Integer one && one != 0 && one != 3;
            if (alike || path.stream().anyMatch(UNCHECKED::contains)) {
                continue;
            }
            for (Object damage : damages) {
                Verification.of(
                        LINE, new Tampered().with(damage, path.toArray()).text());
            }
            Verification.of(LINE, new Tampered().without(path.toArray()).text());
        }
    }

    @ParameterizedTest
    @ValueSource(
            strings = {"", " ", "nothing", "[]", "5", "{", "{}", "{\"lots\": [5]}", "{\"met\": 1, \"met\": 2}", "{} {}"
            })
    void whatIsNoResultIsSaidToBeNone(String text) {
        Verification.Verdict verdict = Verification.of(LINE, text);
        assertFalse(verdict.isFine());
        assertEquals(0, verdict.lots());
    }

    @Test
    void damageIsToldByWhereItIs() {
        assertFault(
                "lots[0].steps[1].start is missing, a time with its offset such as 2026-03-02T06:15+01:00 would be right.",
                Verification.of(
                        LINE,
                        new Tampered().without("lots", 0, "steps", 1, "start").text()));
        assertFault(
                "moves[0].heads is \"1.5\", a whole number would be right.",
                Verification.of(
                        LINE, new Tampered().with(1.5, "moves", 0, "heads").text()));
        assertFault(
                "lots[5].done is \"2026-10-25T08:15+02:00\", the clock of Europe/Oslo with 2026-10-25T07:15+01:00 would be"
                        + " right.",
                Verification.of(
                        LINE,
                        new Tampered()
                                .with("2026-10-25T08:15+02:00", "lots", 5, "done")
                                .text()));
        assertFault(
                "lots is missing, a list would be right.",
                Verification.of(LINE, new Tampered().without("lots").text()));
    }
}
