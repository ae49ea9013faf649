package org.soakwright.recipes;

import static org.junit.jupiter.api.Assertions.assertFalse;
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

/** The reader of lines and their shipped JSON Schema, held against the same files. */
class LineCorpusTest {
    private static final Corpus CORPUS = new Corpus(Document.LINE, Lines.SCHEMA);

    static List<Path> accepted() throws IOException {
        return Stream.concat(
                        Corpus.yamlFiles(Corpus.FOLDER.resolve("accepted-lines")).stream(),
                        Corpus.examples(Document.LINE).stream())
                .toList();
    }

    static List<Path> refused() throws IOException {
        return Corpus.yamlFiles(Corpus.FOLDER.resolve("refused-lines"));
    }

    @Test
    void theCorporaAndTheExampleAreThere() throws IOException {
        assertFalse(Corpus.examples(Document.LINE).isEmpty());
        assertTrue(accepted().size() >= 8, "accepted: " + accepted());
        assertTrue(refused().size() >= 60, "refused: " + refused().size());
    }

    @ParameterizedTest
    @MethodSource("accepted")
    void anAcceptedFileIsALineToTheReaderAndToTheSchema(Path file) {
        assertInstanceOf(
                LineOutcome.Accepted.class,
                Lines.read(file),
                () -> Lines.read(file).toString());
        CORPUS.assertAcceptedBySchema(file);
    }

    @ParameterizedTest
    @MethodSource("refused")
    void aRefusedFileGivesExactlyItsProblems(Path file) throws IOException {
        LineOutcome.Refused refused = assertInstanceOf(LineOutcome.Refused.class, Lines.read(file));
        Corpus.assertExactly(file, refused.problems());
    }

    @ParameterizedTest
    @MethodSource("refused")
    void theSchemaRefusesWhatItCanSee(Path file) throws IOException {
        CORPUS.assertRefusedBySchemaIfItCanSee(file);
    }
}
