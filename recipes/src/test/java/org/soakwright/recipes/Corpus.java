package org.soakwright.recipes;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.networknt.schema.Error;
import com.networknt.schema.Schema;
import com.networknt.schema.SchemaRegistry;
import com.networknt.schema.SpecificationVersion;
import java.io.IOException;
import java.io.InputStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Objects;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.jspecify.annotations.Nullable;
import org.soakwright.recipes.text.Document;
import org.soakwright.recipes.text.Problem;
import org.soakwright.recipes.text.Problems;
import org.soakwright.recipes.text.Source;
import org.soakwright.recipes.text.Tree;
import org.soakwright.recipes.text.Unsound;
import org.soakwright.recipes.text.YamlReader;

/**
 * Files that a reader and a JSON Schema are both held against. A refused file has beside it the exact problems it gives;
 * where the schema cannot tell, the first line there says so.
 */
final class Corpus {
    static final Path FOLDER = Path.of("src/test/resources/org/soakwright/recipes");
    private static final String UNSEEN = "# schema cannot see this";

    private final Document document;
    private final Schema schema;

    Corpus(Document document, String schema) {
        this.document = document;
        try (InputStream in = Recipes.class.getResourceAsStream(schema)) {
            this.schema = SchemaRegistry.withDefaultDialect(SpecificationVersion.DRAFT_2020_12)
                    .getSchema(Objects.requireNonNull(in));
        } catch (IOException e) {
            throw new IllegalStateException(e);
        }
    }

    static List<Path> yamlFiles(Path folder) throws IOException {
        try (Stream<Path> files = Files.list(folder)) {
            return files.filter(file -> file.toString().endsWith(".yaml"))
                    .sorted()
                    .toList();
        }
    }

    /** The examples that are recipes, or those that are lines. */
    static List<Path> examples(Document document) throws IOException {
        return yamlFiles(Path.of("examples")).stream()
                .filter(file -> isLine(file) == (document == Document.LINE))
                .toList();
    }

    private static boolean isLine(Path file) {
        try {
            return Files.readString(file).contains("\nvessels:\n");
        } catch (IOException e) {
            throw new IllegalStateException(e);
        }
    }

    void assertAcceptedBySchema(Path file) {
        Tree tree = Objects.requireNonNull(tree(file));
        assertEquals(List.of(), schema.validate(TreeAsJson.asText(tree)), "every scalar as text");
        assertEquals(List.of(), schema.validate(TreeAsJson.withNumbers(tree)), "bare numbers as an editor sees them");
    }

    void assertRefusedBySchemaIfItCanSee(Path file) throws IOException {
        boolean unseen = expected(file).findFirst().filter(UNSEEN::equals).isPresent();
        Tree tree = tree(file);
        List<Error> errors = tree == null ? List.of() : schema.validate(TreeAsJson.asText(tree));
        assertEquals(unseen, errors.isEmpty(), () -> file + ": schema errors " + errors);
    }

    static void assertExactly(Path file, List<Problem> problems) throws IOException {
        int folder = Objects.requireNonNull(file.getParent()).toString().length() + 1;
        String found = problems.stream()
                .map(problem -> problem.toString().substring(folder))
                .collect(Collectors.joining("\n"));
        assertEquals(expected(file).filter(line -> !line.equals(UNSEEN)).collect(Collectors.joining("\n")), found);
    }

    private static Stream<String> expected(Path file) throws IOException {
        Path companion = Path.of(file.toString().replaceFirst("\\.yaml$", ".txt"));
        assertTrue(Files.exists(companion), () -> companion + " is missing");
        return Files.readAllLines(companion).stream();
    }

    /** The YAML as places and text; null where it is not even that. */
    private @Nullable Tree tree(Path file) {
        try {
            Source source = Source.of(file, document);
            return YamlReader.read(source.file(), source.text(), document, new Problems());
        } catch (Unsound unsound) {
            return null;
        }
    }
}
