package org.soakwright.recipes;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.security.MessageDigest;
import java.util.HexFormat;
import java.util.List;
import java.util.Objects;
import java.util.Random;
import java.util.stream.Collectors;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.soakwright.recipes.model.Dimension;
import org.soakwright.recipes.model.Fit;
import org.soakwright.recipes.model.Grade;
import org.soakwright.recipes.model.Lot;
import org.soakwright.recipes.model.Side;
import org.soakwright.recipes.text.Problem;

/** Pieces that were weighed or measured instead of having their sizes stated. */
class MeasuredPiecesTest {
    private static final String RECIPE = """
            language: 1
            title: Bench soak
            product: [other]
            lot:
              count: 1000
              density: 1000 kg/m3
              pieces:
                - GRADE
            species:
              salt: {start: 60 g/kg, diffusivity: 8e-10 m2/s, partition: 0.8}
            steps:
              - soak: water
                liquor: {ratio: 3 L/kg, salt: 0 g/L}
                film: negligible
                time: 3 h
            """;

    @TempDir
    private Path folder;

    private Outcome read(String grade) throws IOException {
        Path recipe = folder.resolve("recipe.yaml");
        Files.writeString(recipe, RECIPE.replace("GRADE", grade));
        return Recipes.read(recipe);
    }

    private Lot lot(String grade) throws IOException {
        return assertInstanceOf(Outcome.Accepted.class, read(grade)).recipe().lot();
    }

    private String refusal(String grade) throws IOException {
        return assertInstanceOf(Outcome.Refused.class, read(grade)).problems().stream()
                .map(problem -> problem.toString()
                        .replace(folder + folder.getFileSystem().getSeparator(), ""))
                .collect(Collectors.joining("\n"));
    }

    private void list(String name, String text) throws IOException {
        Files.writeString(folder.resolve(name), text);
    }

    private static double millimetres(Grade grade, Dimension dimension) {
        return grade.sides().stream()
                .filter(side -> side.dimension() == dimension)
                .mapToDouble(side -> side.size().si() * 1000)
                .findFirst()
                .orElseThrow();
    }

    @Test
    void aBallOfWaterThatWeighsASixthOfPiKilogramsIsADecimetreWide() throws IOException {
        Grade ball =
                lot("{shape: sphere, weight: 0.5235987755982988 kg}").grades().get(0);
        assertEquals(100, millimetres(ball, Dimension.DIAMETER), 1e-9);
        Side side = ball.shortest();
        assertEquals("100 mm", side.size().toString(), "four digits are shown");
        assertEquals(Objects.requireNonNull(ball.weight()).place(), side.size().place());
    }

    @Test
    void proportionsAndAWeightMakeABrickAndAWheel() throws IOException {
        Grade brick = lot("{shape: brick, weight: 10 g, proportions: [1, 2.5, 4]}")
                .grades()
                .get(0);
        assertEquals(10, millimetres(brick, Dimension.THICKNESS), 1e-12);
        assertEquals(25, millimetres(brick, Dimension.WIDTH), 1e-12);
        assertEquals(40, millimetres(brick, Dimension.LENGTH), 1e-12);
        Grade wheel = lot("{shape: short-cylinder, weight: 3.141592653589793 kg, proportions: [2, 1]}")
                .grades()
                .get(0);
        assertEquals(200, millimetres(wheel, Dimension.DIAMETER), 1e-10);
        assertEquals(100, millimetres(wheel, Dimension.LENGTH), 1e-10);
    }

    @Test
    void aWeightIsThatOfTheAveragePieceAlsoWhereSizesSpread() throws IOException {
        Lot spread = lot("{shape: sphere, weight: 30 g, spread: 25 %}");
        Lot even = lot("{shape: sphere, weight: 30 g}");
        assertEquals(30, spread.massKg().orElseThrow(), 1e-12);
        double sigma = Objects.requireNonNull(spread.grades().get(0).spread()).sigma();
        assertEquals(
                Math.exp(1.5 * sigma * sigma),
                spread.grades().get(0).depth() / even.grades().get(0).depth(),
                1e-12,
                "the median by mass is the larger");
    }

    @Test
    void aListGivesTheMedianAndTheSpread() throws IOException {
        // Logarithms to base 2 of the thickness are 0, 1, 2, 3, 4 tenths: mean 2, standard deviation sqrt(2.5) tenths.
        list("thickness.csv", "thickness [mm]\n" + doublings(5) + "\n");
        Grade grade = lot("{shape: slab, measured: thickness.csv, weight: 20 g}")
                .grades()
                .get(0);
        double sigma = Math.sqrt(2.5) * Math.log(2) / 10;
        assertEquals(8 * Math.pow(2, 0.2), millimetres(grade, Dimension.THICKNESS), 1e-9);
        assertEquals(sigma, Objects.requireNonNull(grade.spread()).sigma(), 1e-9);
        Fit fit = Objects.requireNonNull(grade.fit());
        assertEquals("thickness.csv", fit.file());
        assertEquals(5, fit.pieces());
        assertEquals(5, fit.worth(), 1e-12);
        assertEquals(8 * Math.pow(2, 0.2), fit.median().value().doubleValue(), 1e-9);
        assertEquals(Math.sqrt(Math.expm1(sigma * sigma)), fit.cv(), 1e-9);
        // Two fifths are measured up to the second of the five, 1 / sqrt(2.5) standard deviations below the middle,
        // where a normal
        // distribution has 0.2635: between 0.2643 at 0.63 and 0.2611 at 0.64 (Abramowitz and Stegun, table 26.1).
        assertEquals(0.4 - 0.2635, fit.worst(), 5e-5);
        assertEquals(Fit.Verdict.LOGNORMAL, fit.verdict());
    }

    private static String doublings(int count) {
        return IntStream.range(0, count)
                .mapToObj(i -> String.valueOf(8 * Math.pow(2, i / 10.0)))
                .collect(Collectors.joining("\n"));
    }

    @Test
    void aListMakesGradesOfEqualMass() throws IOException {
        list(
                "thickness.csv",
                "thickness [mm],weight [g]\n"
                        + IntStream.range(0, 12)
                                .mapToObj(i -> (10 + i) + "," + (i < 6 ? 20 : 40))
                                .collect(Collectors.joining("\n")));
        Lot lot = lot("{name: loin, shape: slab, measured: {file: thickness.csv, grades: 2}}");
        assertEquals(
                List.of("loin-1", "loin-2"),
                lot.grades().stream().map(Grade::name).toList());
        for (Grade grade : lot.grades()) {
            assertEquals(0.5, grade.share());
            assertEquals("thickness.csv", Objects.requireNonNull(grade.fit()).file());
        }
        Grade thin = lot.grades().get(0);
        Grade thick = lot.grades().get(1);
        // 360 g in all. The first 180 g are 120 g in six pieces of 10 to 15 mm, 40 g of 16 mm and half of the piece of
        // 17 mm.
        assertEquals(
                Math.exp((20 * Math.log(10 * 11 * 12 * 13 * 14 * 15) + 40 * Math.log(16) + 20 * Math.log(17)) / 180),
                millimetres(thin, Dimension.THICKNESS),
                1e-9);
        assertEquals(8, Objects.requireNonNull(thin.fit()).pieces());
        assertEquals(5, Objects.requireNonNull(thick.fit()).pieces());
        assertEquals(0.180 / 7.5, Objects.requireNonNull(thin.weight()).si(), 1e-12);
        assertEquals(0.180 / 4.5, Objects.requireNonNull(thick.weight()).si(), 1e-12);
        assertEquals(1000 * 0.360 / 12, lot.massKg().orElseThrow(), 1e-9, "a thousand pieces like the twelve");
        assertTrue(Objects.requireNonNull(thin.spread()).sigma()
                > Objects.requireNonNull(thick.spread()).sigma());
    }

    @Test
    void whereTheSizeTellsTheWeightLargePiecesCountForMore() throws IOException {
        list("balls.csv", "diameter (cm)\n1\n1\n1\n1\n2\n");
        Grade ball = lot("{shape: sphere, measured: balls.csv}").grades().get(0);
        // Four of volume 1 and one of volume 8: two thirds of the mass are 2 cm wide.
        assertEquals(10 * Math.pow(2, 2.0 / 3), millimetres(ball, Dimension.DIAMETER), 1e-9);
        list("rods.csv", "diameter (cm)\n1\n1\n1\n1\n2\n");
        Grade rod = lot("{shape: cylinder, measured: rods.csv, weight: 30 g}")
                .grades()
                .get(0);
        assertEquals(
                10 * Math.pow(2, 1.0 / 5),
                millimetres(rod, Dimension.DIAMETER),
                1e-9,
                "a rod says nothing of its length");
    }

    @Test
    void anyOneSizeMayBeMeasuredAndTheOthersKeepTheirProportions() throws IOException {
        list("length.csv", "length [mm]\n40\n40\n40\n40\n40\n");
        Grade brick = lot("{shape: brick, measured: length.csv, proportions: [1, 2.5, 4]}")
                .grades()
                .get(0);
        assertEquals(10, millimetres(brick, Dimension.THICKNESS), 1e-9);
        assertEquals(25, millimetres(brick, Dimension.WIDTH), 1e-9);
        assertNull(brick.spread(), "pieces all alike do not spread");
        assertEquals(0, Objects.requireNonNull(brick.fit()).worst());
    }

    @Test
    void aTextHasNoListsBesideIt() {
        List<Problem> problems = assertInstanceOf(
                        Outcome.Refused.class,
                        Recipes.read(
                                "text", RECIPE.replace("GRADE", "{shape: slab, measured: thickness.csv, weight: 9 g}")))
                .problems();
        assertEquals(
                "[text:8:31: a list lies beside a recipe file, and this recipe was read from no file: found \"thickness.csv\";"
                        + " state the size, such as thickness: 18 mm]",
                problems.toString());
    }

    @Test
    void theFingerprintCoversTheLists() throws Exception {
        list("thickness.csv", "thickness [mm]\n" + doublings(5) + "\n");
        String grade = "{shape: slab, measured: thickness.csv, weight: 20 g}";
        String before = assertInstanceOf(Outcome.Accepted.class, read(grade)).sha256();
        String sums = sha256(Files.readAllBytes(folder.resolve("recipe.yaml"))) + "\n"
                + sha256(Files.readAllBytes(folder.resolve("thickness.csv"))) + "  thickness.csv\n";
        assertEquals(sha256(sums.getBytes(StandardCharsets.UTF_8)), before);
        list("thickness.csv", "thickness [mm]\n" + doublings(5) + "\n# again\n");
        assertNotEquals(
                before, assertInstanceOf(Outcome.Accepted.class, read(grade)).sha256());
    }

    private static String sha256(byte[] bytes) throws Exception {
        return HexFormat.of().formatHex(MessageDigest.getInstance("SHA-256").digest(bytes));
    }

    @Test
    void aLinkLeadsNoListOutOfTheFolder(@TempDir Path elsewhere) throws IOException {
        Files.writeString(elsewhere.resolve("secret.csv"), "thickness [mm]\n" + doublings(5) + "\n");
        Files.createSymbolicLink(folder.resolve("list.csv"), elsewhere.resolve("secret.csv"));
        assertEquals(
                "recipe.yaml:8:31: a list lies in the folder of its recipe or below it: found \"list.csv\"; write its name,"
                        + " such as thickness.csv",
                refusal("{shape: slab, measured: list.csv, weight: 9 g}"));
    }

    @Test
    void aListHoldsAHundredThousandPieces() throws IOException {
        list("long.csv", "thickness [mm]\n" + "12.25\n".repeat(99_999) + "12.26\n");
        String grade = "{shape: slab, measured: long.csv, weight: 9 g}";
        assertEquals(
                100_000,
                Objects.requireNonNull(lot(grade).grades().get(0).fit()).pieces());
        list("long.csv", "thickness [mm]\n" + "12.25\n".repeat(100_001));
        assertEquals(
                "long.csv:100002:1: a list holds 100000 pieces at most: found more; keep a sample", refusal(grade));
        list("long.csv", "thickness [mm]\n" + "0012.2500000000\n".repeat(600_000));
        assertEquals(
                "long.csv: the file is too large: found more than 8 MiB; a list of 100 000 pieces needs less",
                refusal(grade));
    }

    @Test
    void ofAListInTheWrongFormOnlyTheFirstProblemsAreTold() throws IOException {
        list("wrong.csv", "thickness [mm]\n" + "much\n".repeat(90_000));
        List<String> lines = refusal("{shape: slab, measured: wrong.csv, weight: 9 g}")
                .lines()
                .toList();
        assertEquals(21, lines.size());
        assertEquals("wrong.csv: there may be more to correct after the first 20 problems", lines.get(0));
        list("wrong.csv", "a,".repeat(500_000));
        assertEquals(
                20,
                refusal("{shape: slab, measured: wrong.csv, weight: 9 g}")
                        .lines()
                        .count());
        list("wrong.csv", " ".repeat(4_000_000) + "[");
        assertEquals(
                1,
                refusal("{shape: slab, measured: wrong.csv, weight: 9 g}")
                        .lines()
                        .count());
    }

    @Test
    void piecesAnAtomThinAndAMountainThickAreNoGrade() throws IOException {
        list("wild.csv", "thickness [m]\n1e-9\n1e-9\n1e-9\n1e6\n1e6\n1e6\n");
        assertEquals(
                "recipe.yaml:8:31: the pieces differ too much for one grade: found a spread of more than 1000 % where 60 % is"
                        + " the most; make grades of the list, such as {file: wild.csv, grades: 3}",
                refusal("{shape: slab, measured: wild.csv, weight: 9 g}"));
    }

    @Test
    void noDamageToAListEverEscapesAsAnException() throws IOException {
        String whole =
                "# Loins\nthickness [mm], weight [g]\n14.2, 310\n15.8, 352\n16.4, 371\n17.3, 402\n18.4, 420\n18.8, 446\n";
        Random random = new Random(20260102);
        int refused = 0;
        for (int trial = 0; trial < 1000; trial++) {
            list("damaged.csv", Damage.to(whole, random));
            refused += read("{shape: slab, measured: damaged.csv}") instanceof Outcome.Refused ? 1 : 0;
        }
        assertTrue(refused > 300 && refused < 1000, "some damage only changes a figure: " + refused);
    }
}
