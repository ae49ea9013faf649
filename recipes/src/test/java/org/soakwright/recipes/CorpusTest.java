package org.soakwright.recipes;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;
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
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.soakwright.recipes.text.Problems;
import org.soakwright.recipes.text.Source;
import org.soakwright.recipes.text.Tree;
import org.soakwright.recipes.text.Unsound;
import org.soakwright.recipes.text.YamlReader;

/**
 * The reader and the shipped JSON Schema, held against the same files. A refused file has beside it the exact problems
 * it gives; where the schema cannot tell, the first line there says so.
 */
class CorpusTest {
    private static final Path CORPUS = Path.of("src/test/resources/org/soakwright/recipes");
    private static final Path EXAMPLES = Path.of("examples");
    private static final String UNSEEN = "# schema cannot see this";
    private static final Schema SCHEMA = schema();

    private static Schema schema() {
        try (InputStream in = Recipes.class.getResourceAsStream(Recipes.SCHEMA)) {
            return SchemaRegistry.withDefaultDialect(SpecificationVersion.DRAFT_2020_12)
                    .getSchema(Objects.requireNonNull(in));
        } catch (IOException e) {
            throw new IllegalStateException(e);
        }
    }

    static List<Path> accepted() throws IOException {
        return Stream.concat(yamlFiles(CORPUS.resolve("accepted")).stream(), yamlFiles(EXAMPLES).stream())
                .toList();
    }

    static List<Path> refused() throws IOException {
        return yamlFiles(CORPUS.resolve("refused"));
    }

    private static List<Path> yamlFiles(Path folder) throws IOException {
        try (Stream<Path> files = Files.list(folder)) {
            return files.filter(file -> file.toString().endsWith(".yaml"))
                    .sorted()
                    .toList();
        }
    }

    @Test
    void theCorporaAndTheExamplesAreThere() throws IOException {
        assertTrue(accepted().size() >= 12, "accepted: " + accepted());
        assertTrue(refused().size() >= 120, "refused: " + refused().size());
    }

    @ParameterizedTest
    @MethodSource("accepted")
    void anAcceptedFileIsARecipeToTheReaderAndToTheSchema(Path file) {
        assertInstanceOf(
                Outcome.Accepted.class,
                Recipes.read(file),
                () -> Recipes.read(file).toString());
        Tree tree = Objects.requireNonNull(tree(file));
        assertEquals(List.of(), SCHEMA.validate(TreeAsJson.asText(tree)), "every scalar as text");
        assertEquals(List.of(), SCHEMA.validate(TreeAsJson.withNumbers(tree)), "bare numbers as an editor sees them");
    }

    @ParameterizedTest
    @MethodSource("refused")
    void aRefusedFileGivesExactlyItsProblems(Path file) throws IOException {
        Outcome.Refused refused = assertInstanceOf(Outcome.Refused.class, Recipes.read(file));
        String found = refused.problems().stream()
                .map(problem -> problem.toString()
                        .substring(Objects.requireNonNull(file.getParent())
                                        .toString()
                                        .length()
                                + 1))
                .collect(Collectors.joining("\n"));
        assertEquals(expected(file).filter(line -> !line.equals(UNSEEN)).collect(Collectors.joining("\n")), found);
    }

    @ParameterizedTest
    @MethodSource("refused")
    void theSchemaRefusesWhatItCanSee(Path file) throws IOException {
        boolean unseen = expected(file).findFirst().filter(UNSEEN::equals).isPresent();
        Tree tree = tree(file);
        List<Error> errors = tree == null ? List.of() : SCHEMA.validate(TreeAsJson.asText(tree));
        assertEquals(unseen, errors.isEmpty(), () -> file + ": schema errors " + errors);
    }

    private static Stream<String> expected(Path file) throws IOException {
        Path companion = Path.of(file.toString().replaceFirst("\\.yaml$", ".txt"));
        assertTrue(Files.exists(companion), () -> companion + " is missing");
        return Files.readAllLines(companion).stream();
    }

    /** The YAML as places and text; null where it is not even that. */
    private static @Nullable Tree tree(Path file) {
        try {
            Source source = Source.of(file);
            return YamlReader.read(source.file(), source.text(), new Problems());
        } catch (Unsound unsound) {
            return null;
        }
    }
}
