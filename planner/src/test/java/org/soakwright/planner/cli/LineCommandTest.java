package org.soakwright.planner.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.soakwright.planner.line.HandmadePlan;

/** The command that plans a line: exit statuses, and where its output goes. */
class LineCommandTest {
    @TempDir
    Path folder = Path.of("");

    private Desk desk = new Desk(folder);

    @BeforeEach
    void sitDown() {
        desk = new Desk(folder);
    }

    /** A hall with one lot that is due at a time of 24 October 2026. */
    private String hall(String due) throws IOException {
        Path from = HandmadePlan.FILE.resolveSibling("cords.yaml");
        Files.copy(from, desk.path("cords.yaml"));
        Path line = desk.path("hall.yaml");
        Files.writeString(line, """
                title: One tub
                starts: 2026-10-23T06:00
                zone: Europe/Oslo
                vessels:
                  tub: {count: 1, serves: [soak, rinse], volume: {gross: 1200 L, usable: 90 %%}}
                  cold-room: {count: 1, serves: [rest], capacity: 900 kg}
                moves: {takes: 15 min, at-once: 1}
                lots:
                  - {lot: C1, recipe: cords.yaml, mass: 150 kg, due: 2026-10-24T%s}
                """.formatted(due));
        return line.toString();
    }

    @Test
    void aLineInTimeIsDone() throws IOException {
        Desk.Printed printed = desk.give("line", hall("18:00"), "--effort", "0");
        assertEquals("", printed.err());
        assertEquals(Exit.DONE, printed.status());
        assertTrue(printed.out().startsWith("One tub\n"), printed.out());
    }

    @Test
    void aLateLotIsShownInTheBestScheduleFound() throws IOException {
        String line = hall("18:00");
        Files.writeString(
                Path.of(line), Files.readString(Path.of(line)).replace("2026-10-24T18:00", "2026-10-23T06:30"));
        Desk.Printed printed = desk.give("line", line, "--effort", "0", "--decoupled");
        assertEquals("", printed.err());
        assertEquals(Exit.NO_PLAN, printed.status());
        assertTrue(printed.out().contains("1 of 1 lot is late: C1."), printed.out());
    }

    @Test
    void aCautionStopsALineUntilSomebodyAnswersForIt() throws IOException {
        String line = hall("18:00");
        Path cords = desk.path("cords.yaml");
        String warm = Files.readString(cords).replaceAll("temperature: [0-9]+ Cel", "temperature: 30 Cel");
        Files.writeString(cords, warm.replace("from: 2 h", "from: 6 h"));
        Desk.Printed stopped = desk.give("line", line, "--effort", "0");
        assertEquals(Exit.NO_PLAN, stopped.status(), stopped.err());
        assertTrue(stopped.out().contains("This is not a plan to use."), stopped.out());
        desk.give(
                "line", line, "--effort", "0", "--report", desk.path("stopped").toString());
        String sheets = Files.readString(desk.path("stopped").resolve("lot-sheets.html"));
        assertTrue(sheets.contains("NOT A PLAN: stopped by a caution"), sheets);
        Files.writeString(cords, Files.readString(cords) + "allowed-by: E. Vik, quality\n");
        Desk.Printed allowed = desk.give("line", line, "--effort", "0");
        assertEquals(Exit.DONE, allowed.status(), allowed.out());
    }

    @Test
    void jsonOnStandardOutputStandsAloneAndRepeats() throws IOException {
        String line = hall("18:00");
        Desk.Printed printed = desk.give("line", line, "--effort", "0", "--json", "-");
        assertTrue(printed.out().startsWith("{\n  \"soakwright\" : "), printed.out());
        assertTrue(printed.out().endsWith("}\n"));
        assertEquals(printed, desk.give("line", line, "--effort", "0", "--json", "-"));
    }

    @Test
    void aReportIsWrittenAndReplacedByALaterOne() throws IOException {
        String line = hall("18:00");
        String report = desk.path("week").toString();
        for (int i = 0; i < 2; i++) {
            assertEquals(
                    new Desk.Printed(Exit.DONE, "", ""),
                    desk.give("line", line, "--effort", "0", "--quiet", "--report", report));
        }
        for (String name : List.of("index.html", "dispatch.html", "lot-sheets.html", "moves.ics", "result.json")) {
            assertTrue(Files.size(desk.path("week").resolve(name)) > 0, name);
        }
        assertEquals(
                desk.give("line", line, "--effort", "0", "--json", "-").out(),
                Files.readString(desk.path("week").resolve("result.json")));
    }

    @ParameterizedTest
    @ValueSource(strings = {"much", "-1", "3601", "NaN", ""})
    void anEffortThatIsNoneIsRefused(String effort) throws IOException {
        Desk.Printed printed = desk.give("line", hall("18:00"), "--effort", effort);
        assertEquals(Exit.BAD_INPUT, printed.status());
        assertEquals(
                "soakwright: --effort \"" + effort + "\" is no number from 0 to 3600, such as 30\n", printed.err());
        assertEquals("", printed.out());
    }

    @Test
    void problemsOfALineAreTold() throws IOException {
        String line = hall("25:00");
        Desk.Printed printed = desk.give("line", line);
        assertEquals(Exit.BAD_INPUT, printed.status());
        assertTrue(printed.err().startsWith("hall.yaml:9:"), printed.err());
        assertTrue(printed.err().endsWith("soakwright: 1 problem; nothing was computed\n"), printed.err());
    }

    @Test
    void aLineThatDoesNotExistIsAProblem() {
        Desk.Printed printed = desk.give("line", desk.path("nowhere.yaml").toString());
        assertEquals(Exit.BAD_INPUT, printed.status());
        assertTrue(printed.err().startsWith("nowhere.yaml"), printed.err());
    }

    @Test
    void aCheckWritesNoReport() throws IOException {
        Desk.Printed printed = desk.give(
                "line",
                hall("18:00"),
                "--verify",
                "x.json",
                "--report",
                desk.path("r").toString());
        assertEquals(Exit.BAD_INPUT, printed.status());
        assertEquals("soakwright: --verify writes no report; leave --report out\n", printed.err());
    }
}
