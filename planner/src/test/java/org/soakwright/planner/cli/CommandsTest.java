package org.soakwright.planner.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.OutputStream;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Assumptions;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Exit statuses, and where the output of a command goes and does not go. */
class CommandsTest {
    @TempDir
    Path folder = Path.of("");

    private Desk desk = new Desk(folder);

    @BeforeEach
    void sitDown() {
        desk = new Desk(folder);
    }

    @ParameterizedTest
    @ValueSource(strings = {"check", "follow", "plan"})
    void jsonOnStandardOutputStandsAlone(String command) throws IOException {
        Desk.Printed printed = desk.give(command, desk.recipe("desalting.yaml"), "--json", "-");
        assertEquals(Exit.DONE, printed.status());
        assertEquals("", printed.err());
        assertTrue(printed.out().startsWith("{\n  \"soakwright\" : "), printed.out());
        assertTrue(printed.out().endsWith("}\n"), printed.out());
        assertFalse(printed.out().contains("Cautions"), "no sheet");
    }

    @Test
    void jsonInAFileIsWhatStandardOutputWouldShow() throws IOException {
        String recipe = desk.recipe("desalting.yaml");
        Path file = desk.path("plan.json");
        Desk.Printed printed = desk.give("plan", recipe, "--json", file.toString());
        assertEquals(Exit.DONE, printed.status());
        assertEquals(desk.give("plan", recipe).out(), printed.out(), "the sheet is still shown");
        assertEquals(desk.give("plan", recipe, "--json", "-").out(), Files.readString(file));
        assertEquals(List.of("desalting.yaml", "plan.json"), names());
    }

    @Test
    void aPlanThatACautionStopsIsNoPlan() throws IOException {
        Path warm = desk.path("warm.yaml");
        String text = Files.readString(Path.of(desk.recipe("desalting.yaml")));
        Files.writeString(warm, text.replaceAll("temperature: [0-9]+ Cel", "temperature: 30 Cel"));
        Desk.Printed stopped = desk.give("plan", warm.toString());
        assertEquals(Exit.NO_PLAN, stopped.status());
        assertTrue(stopped.out().contains("This is not a plan to use."), stopped.out());
        desk.give("plan", warm.toString(), "--report", desk.path("stopped").toString());
        String floor = Files.readString(desk.path("stopped").resolve("batch-sheet.html"));
        assertTrue(floor.contains("NOT A PLAN: stopped by a caution"), floor);
        Files.writeString(warm, Files.readString(warm) + "\nallowed-by: E. Vik, quality\n");
        Desk.Printed allowed = desk.give("plan", warm.toString());
        assertFalse(allowed.out().contains("This is not a plan to use."), allowed.out());
        assertTrue(allowed.out().contains("longer than any rule of time allows"), allowed.out());
        assertTrue(allowed.out().contains("allowed by E. Vik, quality"), allowed.out());
    }

    @Test
    void quietSaysNothingButProblems() throws IOException {
        Desk.Printed printed = desk.give("plan", desk.recipe("out-of-reach.yaml"), "--quiet");
        assertEquals(new Desk.Printed(Exit.NO_PLAN, "", ""), printed);
        assertFalse(
                desk.give("check", desk.recipe("broken.yaml"), "--quiet").err().isEmpty());
    }

    @Test
    void anEarlierResultIsReplaced() throws IOException {
        String recipe = desk.recipe("desalting.yaml");
        Path file = desk.path("result.json");
        desk.give("check", recipe, "--json", file.toString(), "--quiet");
        assertEquals(
                Exit.DONE,
                desk.give("follow", recipe, "--json", file.toString(), "--quiet")
                        .status());
        assertTrue(Files.readString(file).contains("\"proof\" : null"));
    }

    @Test
    void anEmptyFileIsFilled() throws IOException {
        Path file = Files.createFile(desk.path("result.json"));
        assertEquals(
                Exit.DONE,
                desk.give("check", desk.recipe("desalting.yaml"), "--json", file.toString(), "--quiet")
                        .status());
        assertTrue(Files.size(file) > 0);
    }

    @Test
    void aFileThatIsNoResultIsKept() throws IOException {
        String recipe = desk.recipe("desalting.yaml");
        String before = Files.readString(Path.of(recipe));
        Desk.Printed printed = desk.give("plan", recipe, "--json", recipe);
        assertEquals(Exit.BAD_INPUT, printed.status());
        assertEquals(
                "soakwright: --json desalting.yaml exists and is no result of soakwright, so it is kept; name another"
                        + " file\n",
                printed.err());
        assertEquals("", printed.out());
        assertEquals(before, Files.readString(Path.of(recipe)));
    }

    @Test
    void aFolderIsNeverReplaced() throws IOException {
        Path existing = Files.createDirectory(desk.path("results"));
        Desk.Printed printed = desk.give("plan", desk.recipe("desalting.yaml"), "--json", existing.toString());
        assertEquals(Exit.BAD_INPUT, printed.status());
        assertEquals("soakwright: --json results is a folder; name a file in it, such as result.json\n", printed.err());
        assertTrue(Files.isDirectory(existing));
    }

    @Test
    void aFolderThatDoesNotExistIsNotMadeUp() throws IOException {
        String file = desk.path("nowhere").resolve("result.json").toString();
        Desk.Printed printed = desk.give("plan", desk.recipe("desalting.yaml"), "--json", file);
        assertEquals(Exit.BAD_INPUT, printed.status());
        assertTrue(printed.err().contains("lies in a folder that does not exist; create it first"), printed.err());
        assertEquals(List.of("desalting.yaml"), names());
    }

    @Test
    void aFullDiskEndsWithAMessage() throws IOException {
        Assumptions.assumeTrue(Files.exists(Path.of("/dev/full")), "a device that is always full");
        Desk.Printed printed = desk.give("check", desk.recipe("desalting.yaml"), "--json", "/dev/full");
        assertEquals(Exit.FAILED, printed.status());
        assertTrue(printed.err().startsWith("soakwright: --json /dev/full could not be written ("), printed.err());
        assertEquals(1, printed.err().lines().count(), printed.err());
    }

    @Test
    void aClosedPipeEndsWithAMessage() throws IOException {
        OutputStream closed = new OutputStream() {
            @Override
            public void write(int b) throws IOException {
                throw new IOException("Broken pipe");
            }
        };
        ByteArrayOutputStream err = new ByteArrayOutputStream();
        int status = Soakwright.run(
                new String[] {"check", desk.recipe("desalting.yaml")},
                new PrintStream(closed, false, StandardCharsets.UTF_8),
                Desk.stream(err));
        assertEquals(Exit.FAILED, status);
        assertEquals(
                "soakwright: the output could not be written in full: the pipe was closed or the disk is full; write to a"
                        + " place with room\n",
                err.toString(StandardCharsets.UTF_8));
    }

    @Test
    void aFaultOfTheProgramIsOneLineWithARemedy() throws IOException {
        Assumptions.assumeTrue(System.getenv("SOAKWRIGHT_TRACE") == null, "traces are not asked for");
        PrintStream faulty = new PrintStream(OutputStream.nullOutputStream(), false, StandardCharsets.UTF_8) {
            @Override
            public void print(String text) {
                throw new IllegalStateException("out of order");
            }
        };
        ByteArrayOutputStream err = new ByteArrayOutputStream();
        int status = Soakwright.run(new String[] {"check", desk.recipe("desalting.yaml")}, faulty, Desk.stream(err));
        assertEquals(Exit.FAILED, status);
        assertEquals(
                "soakwright: internal error: java.lang.IllegalStateException: out of order; this is a fault of the program:"
                        + " please report it with the recipe, SOAKWRIGHT_TRACE=1 shows where\n",
                err.toString(StandardCharsets.UTF_8));
    }

    @Test
    void aMissingRecipeIsBadInput() {
        Desk.Printed printed = desk.give("plan", desk.path("none.yaml").toString());
        assertEquals(Exit.BAD_INPUT, printed.status());
        assertEquals("""
                none.yaml: there is no such file; check the name and the folder
                soakwright: 1 problem; nothing was computed
                """, printed.err());
    }

    @Test
    void everyCommandTellsItsVersion() {
        String version = desk.give("--version").out();
        assertTrue(version.matches("soakwright \\S+\\R"), version);
        assertEquals(version, desk.give("plan", "--version").out());
    }

    private List<String> names() throws IOException {
        try (Stream<Path> files = Files.list(folder)) {
            return files.map(file -> file.getFileName().toString()).sorted().toList();
        }
    }
}
