package org.soakwright.planner.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.stream.Stream;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** {@code --report}, {@code --start} and {@code compare}: what they write, what they tell and what they leave alone. */
class ReportCommandTest {
    @TempDir
    Path folder = Path.of("");

    private Desk desk = new Desk(folder);

    @BeforeEach
    void sitDown() {
        desk = new Desk(folder);
    }

    private String report() {
        return desk.path("report").toString();
    }

    @ParameterizedTest
    @CsvSource({"follow, desalting.yaml, 0", "plan, desalting.yaml, 0", "plan, out-of-reach.yaml, 1"})
    void aReportIsWrittenAndToldOf(String command, String recipe, int status) throws IOException {
        String file = desk.recipe(recipe);
        Desk.Printed printed = desk.give(command, file, "--report", report());
        assertEquals(status, printed.status());
        assertEquals("", printed.err());
        String sheet = desk.give(command, file).out();
        assertTrue(
                printed.out().startsWith(sheet + "\nWritten\n  report/\n    index.html batch-sheet.html"),
                printed.out());
        assertTrue(printed.out().lines().allMatch(line -> line.length() <= Help.WIDTH), printed.out());
        assertTrue(Files.size(desk.path("report/index.html")) > 0);
        assertTrue(Files.size(desk.path("report/batch-sheet.pdf")) > 0);
        assertEquals(desk.give(command, file, "--json", "-").out(), Files.readString(desk.path("report/result.json")));
    }

    @Test
    void whatIsToldIsWhatIsThere() throws IOException {
        String out = desk.give("follow", desk.recipe("desalting.yaml"), "--report", report())
                .out();
        String told = out.substring(out.indexOf("\nWritten\n"));
        try (Stream<Path> files = Files.walk(desk.path("report"))) {
            files.filter(Files::isRegularFile)
                    .forEach(file -> assertTrue(told.contains(String.valueOf(file.getFileName())), file.toString()));
        }
    }

    @Test
    void aQuietReportIsNotToldOf() throws IOException {
        Desk.Printed printed = desk.give("follow", desk.recipe("desalting.yaml"), "--report", report(), "--quiet");
        assertEquals(new Desk.Printed(Exit.DONE, "", ""), printed);
        assertTrue(Files.exists(desk.path("report/index.html")));
    }

    @Test
    void aReportAndAResultCannotHaveOneName() throws IOException {
        Desk.Printed printed =
                desk.give("follow", desk.recipe("desalting.yaml"), "--report", report(), "--json", report());
        assertEquals(Exit.BAD_INPUT, printed.status());
        assertTrue(printed.err().contains("--json and --report both name report"), printed.err());
        assertTrue(Files.notExists(desk.path("report")));
    }

    @Test
    void jsonOnStandardOutputStandsAloneBesideAReport() throws IOException {
        Desk.Printed printed = desk.give("follow", desk.recipe("desalting.yaml"), "--report", report(), "--json", "-");
        assertEquals(printed.out(), Files.readString(desk.path("report/result.json")));
    }

    @Test
    void aSecondReportReplacesTheFirst() throws IOException {
        desk.give("follow", desk.recipe("desalting.yaml"), "--report", report());
        assertTrue(Files.exists(desk.path("report/pictures/map-tail-salt.svg")));
        assertEquals(
                Exit.DONE,
                desk.give("follow", desk.recipe("washing.yaml"), "--report", report())
                        .status());
        assertFalse(Files.exists(desk.path("report/pictures/map-tail-salt.svg")), "of the first");
        assertTrue(Files.exists(desk.path("report/pictures/map-bead-lye.svg")));
    }

    @Test
    void whatIsSomeoneElsesIsKeptBeforeAnythingIsComputed() throws IOException {
        Files.createDirectory(desk.path("report"));
        Files.writeString(desk.path("report/index.html"), "mine");
        Desk.Printed printed = desk.give("plan", desk.recipe("broken.yaml"), "--report", report());
        assertEquals(Exit.BAD_INPUT, printed.status());
        assertEquals(
                "soakwright: --report report holds the file index.html, which is no part of a report, so it is kept; name a"
                        + " new or empty folder\n",
                printed.err());
        assertEquals("mine", Files.readString(desk.path("report/index.html")));
    }

    @Test
    void aFileIsNoFolderForAReport() throws IOException {
        String recipe = desk.recipe("desalting.yaml");
        Desk.Printed printed = desk.give("plan", recipe, "--report", recipe);
        assertEquals(Exit.BAD_INPUT, printed.status());
        assertEquals("soakwright: --report desalting.yaml is a file; name a folder\n", printed.err());
    }

    @Test
    void badInputWritesNoReport() throws IOException {
        assertEquals(
                Exit.BAD_INPUT,
                desk.give("plan", desk.recipe("broken.yaml"), "--report", report())
                        .status());
        assertFalse(Files.exists(desk.path("report")));
    }

    @ParameterizedTest
    @ValueSource(strings = {"1987-02-28T23:59", "2026-03-02 06:00", "2026-03-02T06:00:00", " 2028-02-29T00:00 "})
    void aStartIsADateWithATimeOfDay(String start) throws IOException {
        Desk.Printed printed = desk.give("follow", desk.recipe("desalting.yaml"), "--start", start);
        assertEquals(Exit.DONE, printed.status());
        assertTrue(printed.out().contains("  Starts  "), printed.out());
    }

    @ParameterizedTest
    @CsvSource({
        "tomorrow,                 is no date with a time of day",
        "2026-03-02,               is no date with a time of day",
        "06:00,                    is no date with a time of day",
        "02/03/2026 06:00,         is no date with a time of day",
        "12026-03-02T06:00,        is no date with a time of day",
        "2026-02-30T06:00,         is on no calendar or clock",
        "2026-03-02T24:00,         is on no calendar or clock",
        "2026-03-02T06:00Z,        names a zone; write the local time alone",
        "2026-03-02T06:00+01:00,   names a zone; write the local time alone",
    })
    void aMalformedStartIsBadInput(String start, String why) throws IOException {
        Desk.Printed printed = desk.give("plan", desk.recipe("desalting.yaml"), "--start", start);
        assertEquals(Exit.BAD_INPUT, printed.status());
        assertEquals("", printed.out());
        assertEquals("soakwright: --start \"" + start + "\" " + why + ", such as 2026-03-02T06:00\n", printed.err());
    }

    @Test
    void aRecipeEqualsTheResultItGives() throws IOException {
        String recipe = desk.recipe("desalting.yaml");
        String result = desk.path("result.json").toString();
        desk.give("follow", recipe, "--json", result);
        Desk.Printed printed = desk.give("compare", recipe, result);
        assertEquals(Exit.DONE, printed.status(), printed.err());
        assertTrue(printed.out().contains("(desalting.yaml, followed as written)"), printed.out());
        assertTrue(printed.out().contains("(result.json, a result)"), printed.out());
        assertTrue(
                printed.out().contains("B takes the same time, needs the same amount of liquor and costs the same."),
                printed.out());
    }

    @Test
    void aRecipeWithTimesLeftOpenIsPlanned() throws IOException {
        Desk.Printed printed = desk.give("compare", desk.recipe("unplanned.yaml"), desk.recipe("desalting.yaml"));
        assertEquals(Exit.DONE, printed.status(), printed.err());
        assertTrue(printed.out().contains("(unplanned.yaml, planned)"), printed.out());
        assertTrue(printed.out().contains("(desalting.yaml, followed as written)"), printed.out());
    }

    @Test
    void comparingWritesAReportToo() throws IOException {
        String recipe = desk.recipe("desalting.yaml");
        Desk.Printed printed = desk.give("compare", recipe, desk.recipe("washing.yaml"), "--report", report());
        assertEquals(Exit.DONE, printed.status(), printed.err());
        for (String name : new String[] {"index.html", "comparison.json", "tables/steps.csv", "pictures/course.svg"}) {
            assertTrue(Files.size(desk.path("report").resolve(name)) > 0, name);
        }
        assertEquals(
                desk.give("compare", recipe, desk.path("washing.yaml").toString(), "--json", "-")
                        .out(),
                Files.readString(desk.path("report/comparison.json")));
    }

    @Test
    void whatIsNoResultIsToldByItsPlace() throws IOException {
        String recipe = desk.recipe("desalting.yaml");
        String checked = desk.path("checked.json").toString();
        desk.give("check", recipe, "--json", checked);
        Desk.Printed printed = desk.give("compare", recipe, checked);
        assertEquals(Exit.BAD_INPUT, printed.status());
        assertEquals("""
                checked.json: this is no result of follow or plan: "steps" is missing, a list would be right
                soakwright: 1 problem; nothing was computed
                """, printed.err());
    }
}
