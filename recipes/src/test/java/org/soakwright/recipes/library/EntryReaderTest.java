package org.soakwright.recipes.library;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.stream.Collectors;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.soakwright.recipes.text.Problem;
import org.soakwright.recipes.text.Source;
import org.soakwright.recipes.text.Unsound;

/** What is wrong in a data file is said with its place. */
class EntryReaderTest {
    private static final String WHOLE = """
            sources:
              bench: {author: Quilvane, year: 2024, title: Bench notes, in: notebook 3, read: table}
            entries:
              salt-in-tile:
                species: salt
                material: tile
                property: diffusivity
                value: 4e-10 m2/s
                temperature: 20 Cel
                trust: measured
                source: bench
                at: page 12
            """;

    private static Source source(String file, String text) {
        return Source.of(file, text.getBytes(StandardCharsets.UTF_8));
    }

    private static String problems(String... texts) {
        List<Source> sources = IntStream.range(0, texts.length)
                .mapToObj(i -> source("f" + i, texts[i]))
                .toList();
        return assertThrows(Unsound.class, () -> Library.of(sources)).problems().stream()
                .map(Problem::toString)
                .collect(Collectors.joining("\n"));
    }

    private static Entry only(String text) {
        return Library.of(List.of(source("f", text))).entries().iterator().next();
    }

    @Test
    void aWholeEntryIsReadAsWritten() {
        Entry entry = only(WHOLE);
        assertEquals(
                new Subject("salt", "tile", "", "", ""),
                entry.subject(),
                "composition, direction and reference are empty");
        assertEquals(4e-10, entry.figure().single().orElseThrow().si());
        assertEquals("20 Cel", String.valueOf(entry.temperature()));
        assertEquals("f:4:3", entry.place().toString());
    }

    @Test
    void aPlainNumberIsAPartition() {
        Entry entry = only(WHOLE.replace("diffusivity", "partition").replace("4e-10 m2/s", "0.3"));
        assertEquals(0.3, entry.figure().least());
        assertEquals(Property.PARTITION, entry.property());
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "value: 4e-10 m2/s | value: 4e-10 m/s | f0:8:12: value: found \"4e-10 m/s\", where a diffusivity is needed; write such as 8e-10 m2/s",
                "value: 4e-10 m2/s | value: 0 m2/s | f0:8:12: a value must be above zero: found \"0 m2/s\"",
                "value: 4e-10 m2/s | value: {from: 4e-10 m2/s, to: 1e-10 m2/s, across: samples} | f0:8:35: a range rises: found \"1e-10 m2/s\" after \"4e-10 m2/s\"; write the smaller value first",
                "value: 4e-10 m2/s | value: {from: 1e-10 m2/s, to: 4e-10 m2/s} | f0:8:12: a value needs across: found none",
                "value: 4e-10 m2/s | value: {from: 1e-10 m2/s, to: 4e-10 m2/s, across: temperature} | f0:4:3: a range across temperature needs two temperatures; write from and to",
                "value: 4e-10 m2/s | value: [[4 Cel, 1e-10 m2/s], [4 Cel, 2e-10 m2/s]] | f0:8:35: temperatures rise: found \"4 Cel\" after \"4 Cel\"",
                "value: 4e-10 m2/s | value: [[4 Cel, 1e-10 m2/s], [8 Cel, 2e-10 m2/s]] | f0:9:18: values by temperature have theirs: found another beside them; remove it",
                "property: diffusivity | property: difusivity | f0:7:15: property: found \"difusivity\"; write one of diffusivity, diffusivity-ratio, activation-energy, partition, lower-flammable-limit",
                "property: diffusivity | property: partition | f0:8:12: value: found \"4e-10 m2/s\", where a plain number is needed",
                "trust: measured | trust: from memory | f0:2:3: a figure is from memory exactly when nothing of its source was read: found trust \"from memory\" where read is \"table\"; correct one of them",
                "read: table | read: memory | f0:2:3: a figure is from memory exactly when nothing of its source was read: found trust \"measured\" where read is \"memory\"; correct one of them",
                "source: bench | source: bensh | f0:11:13: unknown source: found \"bensh\"; did you mean \"bench\"?",
                "at: page 12 | att: page 12 | f0:12:5: unknown key in an entry: found \"att\"; did you mean \"at\"?",
                "trust: measured | direction: across | f0:5:5: an entry needs trust: found none",
                "salt-in-tile: | tile-with-salt: | f0:4:3: a name is in lower case with hyphens and begins with its species: found \"tile-with-salt\"; write such as salt-in-brick",
                "year: 2024 | year: last | f0:2:35: year is a whole number: found \"last\"; write such as 2010",
                "year: 2024 | year: 20244 | f0:2:3: a year lies from 1850 to 2100: found 20244; write such as 2010",
                "temperature: 20 Cel | relative-to: water | f0:4:3: `relative-to` belongs to a diffusivity-ratio, and every one needs it",
                "temperature: 20 Cel | temperature: -300 Cel | f0:9:18: a temperature lies above absolute zero, -273.15 Cel: found \"-300 Cel\"",
                "sources: | sorces: | f0:1:1: unknown key in a file of the library: found \"sorces\"; did you mean \"sources\"?"
            })
    void whatIsWrongIsSaidAtItsPlace(String right, String wrong, String expected) {
        String first = problems(WHOLE.replace(right, wrong)).lines().findFirst().orElseThrow();
        assertEquals(expected, first);
    }

    @Test
    void anActivationEnergyStandsOnlyBesideADiffusivity() {
        String ratio = WHOLE.replace("diffusivity", "partition")
                .replace("4e-10 m2/s", "0.3")
                .replace("trust:", "activation-energy: 20 kJ/mol\n    trust:");
        assertEquals(
                "f0:10:24: an activation energy stands beside a diffusivity: found it beside partition; make it an entry of"
                        + " its own",
                problems(ratio));
    }

    @Test
    void oneNameInTwoFilesIsFoundInBoth() {
        assertEquals(
                "f1:4:3: two entries have one name: found salt-in-tile at f0:4:3 already; rename one",
                problems(WHOLE, WHOLE));
    }

    @Test
    void everyMistakeOfEveryFileIsSaidAtOnce() {
        String two = problems(WHOLE.replace("4e-10 m2/s", "much"), WHOLE.replace("salt-in-tile", "Salt-in-tile"));
        assertEquals(
                "f0:8:12: value: found \"much\", which does not begin with a plain number\n"
                        + "f1:4:3: a name is in lower case with hyphens and begins with its species: found"
                        + " \"Salt-in-tile\"; write such as salt-in-brick",
                two);
    }

    @Test
    void dataThatCannotBeReadAreAFaultOfTheBuildAndNotOfARecipe() {
        IllegalStateException fault = assertThrows(
                IllegalStateException.class,
                () -> Shelf.sound(() -> Library.of(List.of(source("f", WHOLE.replace("4e-10", "much"))))));
        assertEquals(
                "the library cannot be read: [f:8:12: value: found \"much m2/s\", which does not begin with a plain number]",
                fault.getMessage());
    }
}
