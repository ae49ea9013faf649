package org.soakwright.recipes;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** What the guide shows is read as it stands: whole recipes, parts of one in their place, lists under their name. */
class GuideTest {
    private static final Pattern BLOCK = Pattern.compile("```(\\w+)(?: (\\S+))?\n(.*?\n)```", Pattern.DOTALL);

    private static final String FRAME = """
            language: 1
            title: Bench soak
            product: [other]
            lot:
              mass: 120 kg
              density: 1080 kg/m3
              pieces:
            PIECES
            species:
            SPECIES
            steps:
            STEPS
            targets:
            TARGETS
            """;

    private record Block(String language, String part, String text) {}

    private static List<Block> blocks() throws IOException {
        List<Block> blocks = new ArrayList<>();
        Matcher matcher = BLOCK.matcher(Files.readString(Path.of("guide.md")));
        while (matcher.find()) {
            String part = matcher.group(2);
            blocks.add(new Block(matcher.group(1), part == null ? "" : part, matcher.group(3)));
        }
        return blocks;
    }

    private static String whole(Block block) {
        String wheel = "- {shape: short-cylinder, diameter: 250 mm, length: 95 mm}";
        String salt = "salt: {start: 190 g/kg, diffusivity: 8e-10 m2/s, partition: 0.8, substance: sodium chloride}";
        String step = "- soak: first water\n  liquor: {ratio: 3 L/kg, others: 0}\n  temperature: 4 Cel\n"
                + "  film: negligible\n  time: 9 h";
        String target = "- {species: salt, reading: mean, at-most: 24 g/kg}";
        return FRAME.replace("PIECES", part(block, "pieces", wheel))
                .replace("SPECIES", part(block, "species", salt))
                .replace("STEPS", part(block, "steps", step))
                .replace("TARGETS", part(block, "targets", target));
    }

    private static String part(Block block, String name, String otherwise) {
        return (block.part().equals(name) ? block.text() : otherwise).indent(4);
    }

    @Test
    void everyExampleInTheGuideIsRead(@TempDir Path folder) throws IOException {
        int read = 0;
        for (Block block : blocks()) {
            if (block.language().equals("csv")) {
                Files.writeString(folder.resolve(block.part()), block.text());
                continue;
            }
            assertEquals("yaml", block.language());
            if (block.part().equals("line")) {
                continue;
            }
            Path recipe = folder.resolve("recipe.yaml");
            Files.writeString(recipe, block.part().isEmpty() ? block.text() : whole(block));
            assertInstanceOf(
                    Outcome.Accepted.class,
                    Recipes.read(recipe),
                    () -> Recipes.read(recipe).toString());
            read++;
        }
        assertEquals(9, read, "two recipes and seven parts");
    }

    @Test
    void theLineInTheGuideIsReadWithItsListAndTheFirstRecipe(@TempDir Path folder) throws IOException {
        for (Block block : blocks()) {
            boolean first = block.language().equals("yaml") && !Files.exists(folder.resolve("fillets.yaml"));
            String name = block.part().equals("line") ? "line.yaml" : first ? "fillets.yaml" : block.part();
            if (first || block.language().equals("csv") || block.part().equals("line")) {
                Files.writeString(folder.resolve(name), block.text());
            }
        }
        Path line = folder.resolve("line.yaml");
        LineOutcome.Accepted accepted = assertInstanceOf(
                LineOutcome.Accepted.class,
                Lines.read(line),
                () -> Lines.read(line).toString());
        assertEquals(3, accepted.line().orders().size());
    }
}
