package org.soakwright.recipes;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.math.BigDecimal;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.DayOfWeek;
import java.time.LocalDate;
import java.time.LocalTime;
import java.time.ZonedDateTime;
import java.util.List;
import java.util.Objects;
import java.util.Random;
import java.util.Set;
import java.util.regex.MatchResult;
import java.util.regex.Pattern;
import java.util.stream.Collectors;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.soakwright.recipes.model.line.Crew;
import org.soakwright.recipes.model.line.Draw;
import org.soakwright.recipes.model.line.ExceptionalDay;
import org.soakwright.recipes.model.line.Line;
import org.soakwright.recipes.model.line.LineGoal;
import org.soakwright.recipes.model.line.Order;
import org.soakwright.recipes.model.line.VesselGroup;
import org.soakwright.recipes.text.Problem;

/** What is written is what is held. */
class LinesTest {
    private static final Path ACCEPTED = Corpus.FOLDER.resolve("accepted-lines");

    private static final String LINE = """
            title: Hall
            starts: STARTS
            zone: Europe/Oslo
            vessels:
              tank: {count: 2, serves: [soak, rinse], volume: {gross: 2500 L, usable: 90 %}}
              cold-room: {count: 1, serves: rest, capacity: 4000 kg}
            moves: {takes: 15 min, at-once: 1}
            lots: LOTS
            """;

    @TempDir
    private Path folder;

    private static Line accepted(Path file) {
        return assertInstanceOf(
                        LineOutcome.Accepted.class,
                        Lines.read(file),
                        () -> Lines.read(file).toString())
                .line();
    }

    private LineOutcome read(String starts, String lots) throws IOException {
        Files.copy(ACCEPTED.resolve("recipes/soaking.yaml"), folder.resolve("soaking.yaml"));
        Path file = folder.resolve("line.yaml");
        Files.writeString(file, LINE.replace("STARTS", starts).replace("LOTS", lots));
        return Lines.read(file);
    }

    private static List<String> refusals(LineOutcome outcome) {
        return assertInstanceOf(LineOutcome.Refused.class, outcome).problems().stream()
                .map(Problem::what)
                .toList();
    }

    private static final String ONE = "[{lot: L1, recipe: soaking.yaml, mass: 300 kg}]";

    @Test
    void everyKeyIsHeld() {
        Line line = accepted(ACCEPTED.resolve("every-key.yaml"));
        assertEquals("2026-10-25T02:30+01:00[Europe/Oslo]", line.starts().toString());
        VesselGroup tank = line.vessels().get(0);
        assertEquals(List.of("tank 1", "tank 2", "tank 3"), tank.vesselNames());
        assertEquals(Set.of("soak"), tank.kinds());
        assertEquals("running water", tank.steps().get(0).name());
        assertEquals(2.25, Objects.requireNonNull(tank.volume()).usableM3(), 1e-15);
        assertEquals(0, tank.turnaroundSeconds());
        assertTrue(tank.outages().get(0).concerns(2));
        assertFalse(tank.outages().get(0).concerns(1));
        assertEquals("inspection", tank.outages().get(0).reason());
        assertTrue(tank.outages().get(1).concerns(3));
        assertInstanceOf(Draw.Flow.class, tank.draws().get("water"));
        assertInstanceOf(Draw.Steady.class, tank.draws().get("power"));
        assertEquals("cold-room", line.vessels().get(1).vessel(1));
        Crew crew = Objects.requireNonNull(line.crew());
        assertEquals(4, crew.hours().size());
        assertEquals(LocalTime.MIDNIGHT, crew.hours().get(3).to());
        assertEquals(
                "[FRIDAY, SATURDAY, SUNDAY, MONDAY]",
                ordered(crew.hours().get(3).days()));
        ExceptionalDay range = crew.except().get(1);
        assertEquals(LocalDate.parse("2026-11-03"), range.through());
        assertTrue(crew.except().get(0).isClosed());
        assertEquals(LocalTime.of(23, 0), crew.night().from());
        assertEquals(900, line.moves().seconds());
        assertEquals(600, line.moves().hangsSeconds());
        assertEquals(2, line.moves().heads());
        Order first = line.orders().get(0);
        assertEquals("0412", first.lot());
        assertEquals(new BigDecimal("2.5"), first.priority());
        assertTrue(first.alone());
        assertEquals(600, first.mass().si());
        Order second = line.orders().get(1);
        assertEquals(line.starts(), second.ready());
        assertNull(second.due());
        assertEquals(BigDecimal.ONE, second.priority());
        assertFalse(second.alone());
        assertEquals(
                List.of(LineGoal.NIGHT_MOVES, LineGoal.COST, LineGoal.MAKESPAN, LineGoal.LATENESS), line.minimise());
        assertEquals(
                List.of("recipes/soaking.yaml", "recipes/river.yaml"),
                List.copyOf(line.recipes().keySet()));
    }

    /** The weekend in the middle, as a range that wraps around it was written. */
    private static String ordered(Set<DayOfWeek> days) {
        return days.stream()
                .sorted((a, b) -> Integer.compare((a.getValue() + 2) % 7, (b.getValue() + 2) % 7))
                .toList()
                .toString();
    }

    @Test
    void withoutGoalsAllThatCanBeCountedIsLeast() throws IOException {
        Line line = assertInstanceOf(LineOutcome.Accepted.class, read("2026-03-02T06:00", ONE))
                .line();
        assertEquals(
                List.of(LineGoal.LATENESS, LineGoal.MAKESPAN, LineGoal.COST, LineGoal.NIGHT_MOVES), line.minimise());
        assertNull(line.crew());
        assertTrue(line.isNight(ZonedDateTime.parse("2026-03-02T22:00+01:00").toInstant()));
        assertEquals(List.of(LineGoal.LATENESS, LineGoal.MAKESPAN, LineGoal.NIGHT_MOVES), LineGoal.defaults(List.of()));
    }

    @Test
    void aListedLotIsWhatAWrittenOneIs() {
        Line line = accepted(ACCEPTED.resolve("listed-with-commas.yaml"));
        assertEquals(
                List.of("L1", "L \"2\"", "#3"),
                line.orders().stream().map(Order::lot).toList());
        Order second = line.orders().get(1);
        assertEquals(200, second.mass().si());
        assertTrue(second.place().toString().endsWith("commas.csv:5:1"));
        assertTrue(second.alone());
        assertEquals(new BigDecimal("2"), second.priority());
        assertEquals("2026-03-03T06:00+01:00[Europe/Oslo]", second.ready().toString());
        assertNull(second.due());
        Line german = accepted(ACCEPTED.resolve("listed-with-semicolons.yaml"));
        assertEquals(
                List.of("L1", "L;2"), german.orders().stream().map(Order::lot).toList());
        assertEquals(1200, german.orders().get(1).mass().si());
    }

    @Test
    void ofAnHourThatComesTwiceTheEarlierIsMeantUnlessTheOffsetIsWritten() throws IOException {
        Line line = assertInstanceOf(
                        LineOutcome.Accepted.class,
                        read(
                                "2026-10-25T02:30",
                                "[{lot: L1, recipe: soaking.yaml, mass: 1 kg, ready: 2026-10-25T02:30+02:00, due:"
                                        + " 2026-10-25T02:30+01:00}]"))
                .line();
        assertEquals("+02:00", line.starts().getOffset().toString());
        assertEquals(line.starts(), line.orders().get(0).ready());
        assertEquals(
                line.starts().plusHours(1),
                Objects.requireNonNull(line.orders().get(0).due()));
    }

    @Test
    void anHourThatTheClockLeavesOutIsRefused() throws IOException {
        assertEquals(
                List.of(
                        "starts: there is no such time, the clocks go from 02:00 to 03:00 that day in Europe/Oslo: found"
                                + " \"2026-03-29T02:30+01:00\"; write such as 2026-03-29T03:00"),
                refusals(read("2026-03-29T02:30+01:00", ONE)));
    }

    @Test
    void fiveThousandLotsAreALineAndOneMoreIsNot() throws IOException {
        Line line = assertInstanceOf(LineOutcome.Accepted.class, read("2026-03-02T06:00", written(5000)))
                .line();
        assertEquals(5000, line.orders().size());
        Files.writeString(
                folder.resolve("line.yaml"),
                LINE.replace("STARTS", "2026-03-02T06:00").replace("LOTS", "orders.csv"));
        Files.writeString(folder.resolve("orders.csv"), listed(5000));
        assertEquals(5000, accepted(folder.resolve("line.yaml")).orders().size());
        Files.writeString(folder.resolve("orders.csv"), listed(6000));
        assertEquals(
                List.of("a line has at most 5000 lots: found more; plan them in parts"),
                refusals(Lines.read(folder.resolve("line.yaml"))));
    }

    private static String written(int lots) {
        return IntStream.range(0, lots)
                .mapToObj(i -> "{lot: L" + i + ", recipe: soaking.yaml, mass: 300 kg, ready: 2026-03-02T06:00, due:"
                        + " 2026-03-05T18:00, priority: 2, alone: true}")
                .collect(Collectors.joining(", ", "[", "]"));
    }

    private static String listed(int lots) {
        return IntStream.range(0, lots)
                .mapToObj(i -> "L" + i + ",soaking.yaml,300 kg")
                .collect(Collectors.joining("\n", "lot,recipe,mass\n", "\n"));
    }

    @Test
    void theSumIsOfEveryFileRead() throws IOException {
        Files.writeString(folder.resolve("orders.csv"), listed(2));
        String before = sum(read("2026-03-02T06:00", "orders.csv"));
        Path line = folder.resolve("line.yaml");
        assertEquals(before, sum(Lines.read(line)));
        Files.writeString(folder.resolve("orders.csv"), listed(3));
        String otherLots = sum(Lines.read(line));
        assertNotEquals(before, otherLots);
        Path recipe = folder.resolve("soaking.yaml");
        Files.writeString(recipe, Files.readString(recipe).replace("time: 3 h", "time: 4 h"));
        assertNotEquals(otherLots, sum(Lines.read(line)));
    }

    private static String sum(LineOutcome outcome) {
        return assertInstanceOf(LineOutcome.Accepted.class, outcome).sha256();
    }

    @Test
    void aMissingFileIsAProblem() {
        assertEquals(
                List.of("there is no such file; check the name and the folder"),
                refusals(Lines.read(folder.resolve("nowhere.yaml"))));
    }

    @Test
    void anEmptyFileIsTold() throws IOException {
        Path file = folder.resolve("line.yaml");
        Files.writeString(file, "# nothing\n");
        assertEquals(List.of("the file is empty; write a line that begins with a title"), refusals(Lines.read(file)));
    }

    @Test
    void aRecipeIsToldThatLinesHaveVessels() {
        Outcome.Refused refused =
                assertInstanceOf(Outcome.Refused.class, Recipes.read(ACCEPTED.resolve("minimal.yaml")));
        assertTrue(refused.problems().stream()
                .anyMatch(problem -> problem.what().endsWith("found \"vessels\"; it belongs to the file of a line")));
    }

    @Test
    void noDamageToALineOrItsListEverEscapesAsAnException() throws IOException {
        String line = Files.readString(ACCEPTED.resolve("every-key.yaml"));
        String listing = Files.readString(ACCEPTED.resolve("listed-with-commas.yaml"));
        String list = Files.readString(ACCEPTED.resolve("lists/commas.csv"));
        Files.createDirectories(folder.resolve("lists"));
        Files.createDirectories(folder.resolve("recipes"));
        for (String recipe : List.of("recipes/soaking.yaml", "recipes/river.yaml")) {
            Files.copy(ACCEPTED.resolve(recipe), folder.resolve(recipe));
        }
        Path file = folder.resolve("line.yaml");
        Random random = new Random(20260302);
        int refused = 0;
        for (int trial = 0; trial < 1500; trial++) {
            Files.writeString(file, Damage.to(line, random));
            refused += Lines.read(file) instanceof LineOutcome.Refused ? 1 : 0;
        }
        assertTrue(refused > 750, "most damage to a line is noticed: " + refused);
        Files.writeString(file, listing);
        refused = 0;
        for (int trial = 0; trial < 1500; trial++) {
            Files.writeString(folder.resolve("lists/commas.csv"), Damage.to(list, random));
            refused += Lines.read(file) instanceof LineOutcome.Refused ? 1 : 0;
        }
        assertTrue(refused > 500, "much damage to a list is noticed: " + refused);
    }

    @Test
    void aNumberBeyondAllMeasureNeverEscapesAsAnException() throws IOException {
        String line = Files.readString(ACCEPTED.resolve("every-key.yaml"));
        Files.createDirectories(folder.resolve("recipes"));
        for (String recipe : List.of("recipes/soaking.yaml", "recipes/river.yaml")) {
            Files.copy(ACCEPTED.resolve(recipe), folder.resolve(recipe));
        }
        Path file = folder.resolve("line.yaml");
        List<MatchResult> numbers = Pattern.compile("(?<=: )[0-9.]+(?=[ ,}])")
                .matcher(line)
                .results()
                .toList();
        assertTrue(numbers.size() > 25, "numbers: " + numbers.size());
        for (MatchResult number : numbers) {
            for (String other : List.of("1e300", "-1e300", "-1")) {
                String changed = line.substring(0, number.start()) + other + line.substring(number.end());
                Files.writeString(file, changed);
                boolean isName = line.startsWith("lot: ", number.start() - 5);
                assertEquals(!isName, Lines.read(file) instanceof LineOutcome.Refused, changed);
            }
            for (String odd : List.of("1e-300", "99999999999")) {
                Files.writeString(file, line.substring(0, number.start()) + odd + line.substring(number.end()));
                Lines.read(file);
            }
        }
    }
}
