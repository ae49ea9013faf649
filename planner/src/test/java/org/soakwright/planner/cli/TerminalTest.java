package org.soakwright.planner.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.BufferedReader;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.InputStreamReader;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.Map;
import java.util.concurrent.TimeUnit;
import org.junit.jupiter.api.Assumptions;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** What only a process of its own can show: colour by environment, and being ended early. */
class TerminalTest {
    private static final String ESCAPE = "\u001b";
    private static final int ENDED_BY_TERM = 128 + 15;

    @TempDir
    Path folder = Path.of("");

    private static ProcessBuilder java(Class<?> main, String... args) {
        ProcessBuilder builder = new ProcessBuilder(
                Path.of(System.getProperty("java.home"), "bin", "java").toString(),
                "-cp",
                System.getProperty("java.class.path"),
                main.getName());
        builder.command().addAll(java.util.List.of(args));
        Map<String, String> environment = builder.environment();
        environment.keySet().removeAll(java.util.Set.of("NO_COLOR", "CLICOLOR", "CLICOLOR_FORCE", "JAVA_TOOL_OPTIONS"));
        environment.put("TERM", "xterm");
        return builder;
    }

    private static String printedBy(ProcessBuilder builder) throws IOException {
        Process process = builder.redirectError(ProcessBuilder.Redirect.DISCARD).start();
        return new String(process.getInputStream().readAllBytes(), StandardCharsets.UTF_8);
    }

    @Test
    void aPipeGetsNoColour() throws IOException {
        String sheet = printedBy(java(Soakwright.class, "follow", new Desk(folder).recipe("desalting.yaml")));
        assertTrue(sheet.contains("Targets"), sheet);
        assertFalse(sheet.contains(ESCAPE), sheet);
    }

    @Test
    void colourThatIsAskedForIsThereAndNoColorTakesItAway() throws IOException {
        String recipe = new Desk(folder).recipe("desalting.yaml");
        ProcessBuilder colourful = java(Soakwright.class, "follow", recipe);
        colourful.environment().put("CLICOLOR_FORCE", "1");
        assertTrue(printedBy(colourful).contains(ESCAPE));
        ProcessBuilder plain = java(Soakwright.class, "follow", recipe);
        plain.environment().putAll(Map.of("CLICOLOR_FORCE", "1", "NO_COLOR", "1"));
        String sheet = printedBy(plain);
        assertTrue(sheet.contains("Targets"), sheet);
        assertFalse(sheet.contains(ESCAPE), sheet);
    }

    @Test
    void endingEarlyClearsTheProgressLineAndSaysThatNothingWasWritten() throws Exception {
        Assumptions.assumeFalse(System.getProperty("os.name").startsWith("Windows"), "signals");
        Process process = java(Waiting.class).start();
        try (BufferedReader out =
                new BufferedReader(new InputStreamReader(process.getInputStream(), StandardCharsets.UTF_8))) {
            assertEquals("waiting", out.readLine());
            process.toHandle().destroy();
            String err = new String(process.getErrorStream().readAllBytes(), StandardCharsets.UTF_8);
            assertTrue(process.waitFor(30, TimeUnit.SECONDS));
            assertEquals(ENDED_BY_TERM, process.exitValue());
            assertEquals(
                    "\r\u001b[Ksoakwright: choosing durations, 25 %"
                            + "\r\u001b[Ksoakwright: interrupted; nothing was written\n",
                    err);
        }
    }

    @Test
    void workThatIsDoneIsNotInterrupted() {
        ByteArrayOutputStream err = new ByteArrayOutputStream();
        Session session = new Session(System.out, Desk.stream(err), false, true);
        session.line().at("quick work", 0.5);
        session.finish();
        session.interrupt();
        assertEquals("", err.toString(StandardCharsets.UTF_8), "no progress under a second, nothing to interrupt");
    }
}
