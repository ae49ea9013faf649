package org.soakwright.recipes;

import static org.junit.jupiter.api.Assertions.assertInstanceOf;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.soakwright.recipes.text.Document;

/** The reader of recipes and their shipped JSON Schema, held against the same files. */
class CorpusTest {
    private static final Corpus CORPUS = new Corpus(Document.RECIPE, Recipes.SCHEMA);

    static List<Path> accepted() throws IOException {
        return Stream.concat(
                        Corpus.yamlFiles(Corpus.FOLDER.resolve("accepted")).stream(),
                        Corpus.examples(Document.RECIPE).stream())
                .toList();
    }

    static List<Path> refused() throws IOException {
        return Corpus.yamlFiles(Corpus.FOLDER.resolve("refused"));
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
        CORPUS.assertAcceptedBySchema(file);
    }

    @ParameterizedTest
    @MethodSource("refused")
    void aRefusedFileGivesExactlyItsProblems(Path file) throws IOException {
        Outcome.Refused refused = assertInstanceOf(Outcome.Refused.class, Recipes.read(file));
        Corpus.assertExactly(file, refused.problems());
    }

    @ParameterizedTest
    @MethodSource("refused")
    void theSchemaRefusesWhatItCanSee(Path file) throws IOException {
        CORPUS.assertRefusedBySchemaIfItCanSee(file);
    }
}
