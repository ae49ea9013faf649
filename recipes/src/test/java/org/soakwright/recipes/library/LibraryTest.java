package org.soakwright.recipes.library;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.HashSet;
import java.util.List;
import java.util.Objects;
import java.util.Set;
import java.util.TreeSet;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;

/** The data of the library. Any mistake in it fails here with the place in its file. */
class LibraryTest {
    private static final Path FOLDER = Path.of("library");
    private static final double GAS_CONSTANT = 8.314462618;

    /** Around all figures of the library by a factor of ten: a slip of unit or power shows. */
    private static final double SMALLEST = 1e-15;

    private static final double LARGEST = 1.3e-6;

    private static final Library LIBRARY = Library.load();

    @Test
    void everyFileOfTheFolderIsPackagedAndRead() throws IOException {
        try (Stream<Path> files = Files.list(FOLDER)) {
            Set<String> names =
                    files.map(file -> file.getFileName().toString()).collect(Collectors.toCollection(TreeSet::new));
            Set<String> expected = new TreeSet<>(Library.FILES);
            expected.add("cautions.yaml");
            assertEquals(expected, names);
        }
    }

    @Test
    void thirtyEntriesOrMoreStandOnASourceThatWasOpened() {
        long read = LIBRARY.entries().stream()
                .filter(entry -> entry.origin().isRead())
                .count();
        assertTrue(read >= 30, "read: " + read);
        assertEquals(87, read);
        assertEquals(91, LIBRARY.entries().size());
    }

    @Test
    void whatIsFromMemorySaysSo() {
        List<String> remembered = LIBRARY.entries().stream()
                .filter(entry -> !entry.origin().isRead())
                .map(Entry::name)
                .toList();
        assertEquals(
                List.of(
                        "salt-in-gouda-1974",
                        "salt-in-pork-in-general",
                        "salt-in-water-dilute",
                        "salt-in-water-strong"),
                remembered);
        for (String name : remembered) {
            assertEquals("from memory", entry(name).origin().trust().word());
        }
    }

    @Test
    void aFigureIsKeptAsItsSourcePrintsIt() {
        Entry romano = entry("salt-in-romano-1983");
        assertEquals("0.23 cm2/d", romano.figure().toString());
        assertEquals(
                "Guinee and Fox 1983, Journal of Dairy Research 50",
                romano.origin().publication().toString());
        assertEquals(
                "Salt diffusion in brick structures - Part I - measurements with NaCl 2003,"
                        + " Journal of Materials Science 38(9), 2055-2061",
                entry("salt-in-brick-new-red").origin().publication().toString());
        assertEquals(
                "0.499e-5 cm2/s give or take 0.004e-5 cm2/s",
                entry("salt-in-brick-new-red").figure().toString());
        assertEquals(
                "1.06e-10 m2/s to 1.88e-10 m2/s across temperature",
                entry("salt-in-sbrinz").figure().toString());
        assertEquals(
                "2.1e-10 m2/s at 4 Cel, 3e-10 m2/s at 12.5 Cel, 4e-10 m2/s at 20 Cel",
                entry("salt-in-white-cheese").figure().toString());
    }

    @Test
    void twoSourcesForOneThingStandSideBySide() {
        assertEquals(List.of("salt-in-romano-1983"), names(LIBRARY.alike(entry("salt-in-romano-review"))));
        assertEquals(List.of("salt-in-white-cheese"), names(LIBRARY.alike(entry("salt-in-white-cheese-second-study"))));
        assertEquals(List.of("salt-in-gouda-model"), names(LIBRARY.alike(entry("salt-in-gouda-1974"))));
        assertEquals(
                List.of("water-in-pork-2015", "water-in-pork-along", "water-in-pork-salting", "water-in-pork-drying"),
                names(LIBRARY.alike(entry("water-in-pork-across"))));
        assertEquals(List.of(), LIBRARY.alike(entry("salt-in-cheddar")));
    }

    @Test
    void anUnknownNameIsAnsweredWithTheNearest() {
        assertTrue(LIBRARY.find("salt-in-fetta").isEmpty());
        assertEquals("did you mean \"salt-in-feta\"?", LIBRARY.hint("salt-in-fetta"));
    }

    @Test
    void aDiffusivityLiesWherePublishedOnesDo() {
        for (Entry entry : of(Property.DIFFUSIVITY)) {
            assertTrue(entry.figure().least() > SMALLEST && entry.figure().most() < LARGEST, entry::toString);
        }
        for (Entry entry : of(Property.ACTIVATION_ENERGY)) {
            assertTrue(entry.figure().least() > 5e3 && entry.figure().most() < 100e3, entry::toString);
        }
    }

    /**
     * Arrhenius' law from one end of a range to the other, where a source prints both; the two ends carry two to four digits, the activation
     * energy is fitted through more than the ends.
     */
    @Test
    void theEndsOfARangeAgreeWithTheActivationEnergyPrintedBesideThem() {
        Set<String> disagree = new HashSet<>();
        int agree = 0;
        for (Entry entry : of(Property.DIFFUSIVITY)) {
            Span energy = entry.activationEnergy();
            if (energy == null || !energy.isOne() || !isAcrossTemperature(entry)) {
                continue;
            }
            double made = Math.exp(energy.from().si() / GAS_CONSTANT * inverseKelvins(entry));
            double printed = entry.figure().most() / entry.figure().least();
            if (Math.abs(made / printed - 1) < 0.02) {
                agree++;
            } else {
                disagree.add(entry.name());
            }
        }
        assertEquals(7, agree);
        assertEquals(Set.of("nitrite-in-pork"), disagree, "and its note says so");
        assertTrue(entry("nitrite-in-pork").origin().note().contains("they disagree, do not use both"));
    }

    private static boolean isAcrossTemperature(Entry entry) {
        return entry.figure() instanceof Figure.ByTemperature
                || (entry.figure() instanceof Figure.Range range && range.across() == Across.TEMPERATURE);
    }

    private static double inverseKelvins(Entry entry) {
        if (entry.figure() instanceof Figure.ByTemperature table) {
            return 1 / table.points().get(0).temperature().si()
                    - 1
                            / table.points()
                                    .get(table.points().size() - 1)
                                    .temperature()
                                    .si();
        }
        Span temperature = Objects.requireNonNull(entry.temperature());
        return 1 / temperature.from().si() - 1 / temperature.to().si();
    }

    /** Guinee and Fox 1983 print 0.23 cm2/d; Floury and others 2010, Table II, give 2.54e-10 to 3.35e-10 m2/s for the same cheese. */
    @Test
    void theTwoFiguresForRomanoAgreeAcrossTheirUnits() {
        Figure measured = entry("salt-in-romano-1983").figure();
        Figure compiled = entry("salt-in-romano-review").figure();
        assertEquals(2.662e-10, measured.least(), 0.001e-10);
        assertTrue(compiled.least() < measured.least() && measured.most() < compiled.most());
    }

    /** The abstract prints two values of D and, apart from them, an exponent of -5437.2 K over the temperature. */
    @Test
    void theTwoFiguresForLeachedWaxAgreeWithTheExponentOfTheirSource() {
        Figure.ByTemperature wax =
                (Figure.ByTemperature) entry("wax-in-fe-6ni-4cu").figure();
        Figure.Point cool = wax.points().get(0);
        Figure.Point warm = wax.points().get(1);
        double exponent = Math.log(warm.value().si() / cool.value().si())
                / (1 / cool.temperature().si() - 1 / warm.temperature().si());
        assertEquals(5437.2, exponent, 0.005 * 5437.2, "four digits of D over five kelvins");
    }

    /** Floury and others 2010, Table II: 0.063e-10 m2/s for each degree, which leads from 1.06e-10 at 7 to 1.88e-10 at 20 Cel. */
    @Test
    void theEndsForSbrinzAgreeWithTheSlopeOfTheirSource() {
        Figure sbrinz = entry("salt-in-sbrinz").figure();
        assertEquals(sbrinz.most(), sbrinz.least() + 13 * 0.063e-10, 0.005e-10);
    }

    @Test
    void everySourceIsUsedAndEveryEntrySaysWhereInIt() throws IOException {
        for (String file : Library.FILES) {
            String text = Files.readString(FOLDER.resolve(file));
            List<String> keys = text.substring(text.indexOf("\nsources:"), text.indexOf("\nentries:"))
                    .lines()
                    .filter(line -> line.matches(" {2}[a-z].*:"))
                    .map(line -> line.strip().replace(":", ""))
                    .toList();
            assertNotEquals(List.of(), keys, file);
            for (String key : keys) {
                assertTrue(text.contains("\n    source: " + key + "\n"), file + " does not use " + key);
            }
        }
        for (Entry entry : LIBRARY.entries()) {
            assertFalse(entry.origin().at().isEmpty(), entry.name());
        }
    }

    private static Entry entry(String name) {
        return LIBRARY.find(name).orElseThrow();
    }

    private static List<Entry> of(Property property) {
        return LIBRARY.entries().stream()
                .filter(entry -> entry.property() == property)
                .toList();
    }

    private static List<String> names(List<Entry> entries) {
        return entries.stream().map(Entry::name).toList();
    }
}
