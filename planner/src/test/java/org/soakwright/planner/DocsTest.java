package org.soakwright.planner;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestFactory;
import org.junit.jupiter.api.io.TempDir;
import org.soakwright.planner.cli.Soakwright;
import org.soakwright.recipes.Outcome;
import org.soakwright.recipes.Recipes;

/** What the documents show is what the program does. */
class DocsTest {
    private static final Path TOP = Path.of("..");

    private record Printed(int status, String out, String err) {}

    private static Printed run(String... args) {
        ByteArrayOutputStream out = new ByteArrayOutputStream();
        ByteArrayOutputStream err = new ByteArrayOutputStream();
        int status = Soakwright.run(
                args,
                new PrintStream(out, true, StandardCharsets.UTF_8),
                new PrintStream(err, true, StandardCharsets.UTF_8));
        return new Printed(status, out.toString(StandardCharsets.UTF_8), err.toString(StandardCharsets.UTF_8));
    }

    /** Fenced blocks of a language, in order. */
    private static List<String> blocks(String document, String language) {
        List<String> blocks = new ArrayList<>();
        Matcher matcher = Pattern.compile("```" + language + "\n(.*?)\n```", Pattern.DOTALL)
                .matcher(document);
        while (matcher.find()) {
            blocks.add(matcher.group(1));
        }
        return blocks;
    }

    @Test
    void theReadmesFirstCommandPrintsWhatTheReadmeShows() throws IOException {
        String readme = Files.readString(TOP.resolve("README.md"));
        String command = blocks(readme, "sh").get(0);
        String recipe = command.substring(command.lastIndexOf(' ') + 1);
        Printed printed = run("plan", TOP.resolve(recipe).toString());
        assertEquals(0, printed.status(), printed.err());
        assertEquals(blocks(readme, "text").get(0).strip(), printed.out().strip());
    }

    /** The pictures' bytes do not depend on the machine, so the one shown can be held against the one written. */
    @Test
    void theReadmesPictureIsWhatTheReportWrites(@TempDir Path folder) throws IOException {
        Path report = folder.resolve("report");
        Printed printed = run(
                "plan", TOP.resolve("recipes/examples/loin-desalting.yaml").toString(), "--report", report.toString());
        assertEquals(0, printed.status(), printed.err());
        assertEquals(
                Files.readString(report.resolve("pictures/map-thick-salt.svg")),
                Files.readString(TOP.resolve("planner/docs/depth-time-map.svg")));
    }

    @Test
    void theGuidesRecipesAreRecipes() throws IOException {
        List<String> recipes = blocks(Files.readString(TOP.resolve("recipes/guide.md")), "yaml");
        assertFalse(recipes.isEmpty());
        for (String recipe : recipes) {
            assertInstanceOf(Outcome.Accepted.class, Recipes.read("guide.yaml", recipe));
        }
    }

    @TestFactory
    Stream<DynamicTest> everyExampleCanBeCheckedFollowedAndPlanned() throws IOException {
        List<Path> examples;
        try (Stream<Path> files = Files.list(TOP.resolve("recipes/examples"))) {
            examples = files.filter(file -> file.toString().endsWith(".yaml"))
                    .filter(file -> !isLine(file))
                    .sorted()
                    .toList();
        }
        assertFalse(examples.isEmpty());
        return examples.stream()
                .flatMap(example -> Stream.of("check", "follow", "plan")
                        .map(command -> DynamicTest.dynamicTest(command + " " + example.getFileName(), () -> {
                            Printed printed = run(command, example.toString());
                            assertEquals("", printed.err());
                            assertEquals(0, printed.status());
                        })));
    }

    private static boolean isLine(Path file) {
        try {
            return Files.readString(file).contains("\nvessels:\n");
        } catch (IOException e) {
            throw new IllegalStateException(e);
        }
    }
}
