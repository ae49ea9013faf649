package org.soakwright.recipes.text;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Objects;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class YamlReaderTest {
    private final Problems problems = new Problems();

    @Test
    void everyScalarIsTextWithItsPlace() {
        Tree.Entries tree = assertInstanceOf(
                Tree.Entries.class, YamlReader.read("f", "lot: 0412\nwhen: 12:30:00\nyes: no\n", problems));
        List<String> texts = tree.entries().stream()
                .map(entry -> entry.key() + "=" + ((Tree.Leaf) entry.value()).text())
                .toList();
        assertEquals(List.of("lot=0412", "when=12:30:00", "yes=no"), texts);
        assertEquals(new Place("f", 2, 7), tree.entries().get(1).value().place());
        assertEquals(List.of(), problems.sorted());
    }

    @Test
    void aKeyThatStandsTwiceIsReportedAndTheFirstIsKept() {
        Tree.Entries tree = (Tree.Entries) Objects.requireNonNull(YamlReader.read("f", "a: 1\nb: 2\na: 3\n", problems));
        assertEquals("1", ((Tree.Leaf) tree.entries().get(0).value()).text());
        assertEquals(
                "[f:3:1: the key \"a\" stands twice: found the first at line 1; keep one]",
                problems.sorted().toString());
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "!!java.net.URL [\"http://localhost/\"]",
                "a: !!binary aGVsbG8=",
                "a: !x {b: c}",
                "a: ! b",
                "a: &x b",
                "a: *x",
                "<<: {a: b}",
                "? [a]\n: b",
                "a: !%B x",
                "a: \"\\q\"",
                "a: [1, 2",
                "a: 'open",
                "\ta: 1",
                "a: 1\n--- \nb: 2",
                "%YAML 9.9\n---\na: 1",
                "...",
                "&",
                "*",
                "?\t-",
                "",
                "# nothing",
                "---"
            })
    void whatIsNotPlainYamlIsAProblemAndNeverAnException(String text) {
        Tree tree = YamlReader.read("f", text, problems);
        if (text.equals("---")) {
            assertEquals("", ((Tree.Leaf) Objects.requireNonNull(tree)).text(), "an empty document is an empty value");
        } else {
            assertEquals(1, problems.sorted().size(), () -> problems.sorted().toString());
        }
    }

    @ParameterizedTest
    @ValueSource(strings = {"[", "{", "- ", "? ", "a: [", "[{"})
    void depthIsBoundedBeforeItCosts(String opening) {
        assertNull(YamlReader.read("f", opening.repeat(100_000), problems));
        assertEquals(1, problems.sorted().size());
    }

    @Test
    void lengthIsBoundedBeforeItCosts() {
        assertNull(YamlReader.read("f", "- a\n".repeat(200_000), problems));
        assertEquals(
                "[f:10000:3: too long: found more than 10000 keys and values; a recipe needs a few hundred]",
                problems.sorted().toString());
    }

    @Test
    void unknownKeysComeFirstAndTheRestFollowsTheFile() {
        problems.add(new Place("f", 2, 1), "second");
        problems.add(new Place("f", 1, 9), "first");
        problems.unknownKey(new Place("f", 7, 1), "unknown");
        problems.add(new Place("f", 1, 9), "first");
        assertEquals(
                "[f:7:1: unknown, f:1:9: first, f:2:1: second]",
                problems.sorted().toString());
    }

    @Test
    void theFingerprintIsTheOneOfTheBytes() {
        // FIPS 180-4 with its published example "abc" (NIST, SHA256.pdf of the cryptographic examples).
        Source source = Source.of("f", "abc".getBytes(StandardCharsets.UTF_8));
        assertEquals("ba7816bf8f01cfea414140de5dae2223b00361a396177a9cb410ff61f20015ad", source.sha256());
    }

    @Test
    void aFileLargerThanOneMebibyteIsNotRead() {
        Unsound unsound = assertThrows(Unsound.class, () -> Source.of("f", new byte[Source.MOST_BYTES + 1]));
        assertEquals(
                "f: the file is too large: found more than 1 MiB; a recipe needs a few kilobytes",
                unsound.problems().get(0).toString());
    }
}
