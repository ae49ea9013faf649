package org.soakwright.planner.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static org.soakwright.planner.cli.Screens.assertShown;

import java.io.IOException;
import java.nio.file.Path;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.soakwright.planner.line.HandmadePlan;
import org.soakwright.planner.report.Style;
import org.soakwright.planner.report.line.LineSheet;

/** What people see, character by character. */
class ScreensTest {
    private static final int WIDEST = 100;

    @TempDir
    Path folder = Path.of("");

    private Desk desk = new Desk(folder);

    @BeforeEach
    void sitDown() {
        desk = new Desk(folder);
    }

    @Test
    void helpLeadsWithAnExample() throws IOException {
        Desk.Printed printed = desk.give("--help");
        assertEquals(Exit.DONE, printed.status());
        assertTrue(printed.out().startsWith("Example:"));
        assertShown("help.txt", printed.out());
    }

    @ParameterizedTest
    @ValueSource(strings = {"check", "follow", "plan", "compare", "line"})
    void everyCommandHelpsWithAnExample(String command) throws IOException {
        Desk.Printed printed = desk.give(command, "--help");
        assertEquals(Exit.DONE, printed.status());
        assertTrue(printed.out().startsWith("Example:"));
        assertShown("help-" + command + ".txt", printed.out());
    }

    @ParameterizedTest
    @CsvSource({
        "plan,   desalting.yaml,    0, plan-met.txt",
        "plan,   out-of-reach.yaml, 1, plan-missed.txt",
        "plan,   too-tight.yaml,    1, plan-missed-with-remedies.txt",
        "follow, desalting.yaml,    0, follow-missed.txt",
        "follow, washing.yaml,      0, follow-washing.txt",
        "follow, rounds.yaml,       0, follow-rounds.txt",
        "check,  washing.yaml,      0, check.txt",
        "check,  unplanned.yaml,    0, check-free.txt",
    })
    void aSheetReadsAsItIsMeantTo(String command, String recipe, int status, String screen) throws IOException {
        Desk.Printed printed = desk.give(command, desk.recipe(recipe));
        assertEquals(status, printed.status());
        assertEquals("", printed.err());
        assertTrue(printed.out().lines().allMatch(line -> line.codePointCount(0, line.length()) <= WIDEST));
        assertShown(screen, printed.out());
    }

    @ParameterizedTest
    @CsvSource({
        "unplanned.yaml, desalting.yaml,    compare-two-plans.txt",
        "desalting.yaml, washing.yaml,      compare-unlike.txt",
        "odd-names.yaml, desalting.yaml,    compare-odd-names.txt",
        "rounds.yaml,    blocks.yaml,       compare-rounds.txt",
    })
    void aComparisonReadsAsItIsMeantTo(String a, String b, String screen) throws IOException {
        Desk.Printed printed = desk.give("compare", desk.recipe(a), desk.recipe(b));
        assertEquals(Exit.DONE, printed.status());
        assertEquals("", printed.err());
        assertTrue(printed.out().lines().allMatch(line -> line.codePointCount(0, line.length()) <= WIDEST));
        assertShown(screen, printed.out());
    }

    /** Plans put together by hand, so that screens do not change with how plans are made. */
    @Test
    void aLineReadsAsItIsMeantTo() throws IOException {
        assertFits("line.txt", LineSheet.of(HandmadePlan.of(), Style.PLAIN));
    }

    @Test
    void aLineThatMissesReadsAsItIsMeantTo() throws IOException {
        assertFits("line-missing.txt", LineSheet.of(HandmadePlan.missing(), Style.PLAIN));
    }

    private static void assertFits(String screen, String shown) throws IOException {
        assertTrue(shown.lines().allMatch(line -> line.codePointCount(0, line.length()) <= WIDEST));
        assertShown(screen, shown);
    }

    @Test
    void timesOfDayStandBesideTheClock() throws IOException {
        Desk.Printed printed = desk.give("follow", desk.recipe("desalting.yaml"), "--start", "2026-12-31T18:00");
        assertTrue(printed.out().lines().allMatch(line -> line.codePointCount(0, line.length()) <= WIDEST));
        assertShown("follow-started.txt", printed.out());
    }

    @ParameterizedTest
    @CsvSource({
        "check,  broken.yaml,    problems.txt",
        "plan,   broken.yaml,    problems.txt",
        "follow, unplanned.yaml, problems-unplanned.txt",
        "check,  hasty.yaml,     problems-hasty.txt",
    })
    void everyProblemIsNamedWithItsPlace(String command, String recipe, String screen) throws IOException {
        Desk.Printed printed = desk.give(command, desk.recipe(recipe));
        assertEquals(Exit.BAD_INPUT, printed.status());
        assertEquals("", printed.out());
        assertShown(screen, printed.err());
    }

    @ParameterizedTest
    @CsvSource({
        "'plna x.yaml',          misuse-command.txt",
        "'plan --jsn a.json x',  misuse-option.txt",
        "'plan',                 misuse-no-recipe.txt",
        "'plan a.yaml b.yaml',   misuse-two-recipes.txt",
        "'plan a.yaml --json',   misuse-no-file.txt",
        "'compare a.yaml',       misuse-no-second.txt",
        "'compare a b c',        misuse-three.txt",
        "'line',                 misuse-no-line.txt",
        "'line a.yaml b.yaml',   misuse-two-lines.txt",
    })
    void aMisspeltCommandLineGetsAHint(String line, String screen) throws IOException {
        Desk.Printed printed = desk.give(line.split(" ", -1));
        assertEquals(Exit.BAD_INPUT, printed.status());
        assertEquals("", printed.out());
        assertShown(screen, printed.err());
    }

    @Test
    void noCommandShowsTheHelpAsAProblem() {
        Desk.Printed printed = desk.give();
        assertEquals(Exit.BAD_INPUT, printed.status());
        assertEquals("", printed.out());
        assertEquals(desk.give("--help").out(), printed.err());
    }
}
