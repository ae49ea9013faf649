package org.soakwright.planner.report.picture;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.awt.Graphics2D;
import java.awt.geom.Rectangle2D;
import java.awt.image.BufferedImage;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import javax.imageio.ImageIO;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;
import org.soakwright.planner.batch.EachGrade;
import org.soakwright.planner.batch.Run;
import org.soakwright.planner.batch.StepEnd;
import org.soakwright.planner.batch.TargetState;
import org.soakwright.recipes.model.Reading;

/** Every picture of every example and of a crowded recipe, in every theme; they are left in target/pictures to be looked at. */
class PicturesTest {
    private static final Path FOLDER = Path.of("target", "pictures");

    static Stream<Arguments> pictures() {
        return Batches.all().entrySet().stream()
                .flatMap(batch -> batch.getValue().stream()
                        .map(picture -> Arguments.of(batch.getKey() + "-" + picture.id(), picture)));
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("pictures")
    void noLineOfTextTouchesAnother(String name, Picture picture) throws Exception {
        List<Drawn.Line> lines = new Drawn(picture.svg(Theme.LIGHT)).lines();
        for (int i = 0; i < lines.size(); i++) {
            for (int j = 0; j < i; j++) {
                assertFalse(
                        lines.get(i).box().intersects(lines.get(j).box()),
                        name + ": " + lines.get(i) + " and " + lines.get(j));
            }
        }
        for (Theme theme : Theme.values()) {
            assertEquals(lines, new Drawn(picture.svg(theme)).lines(), "every theme says the same at the same places");
        }
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("pictures")
    void nothingIsCutAtTheBorder(String name, Picture picture) throws Exception {
        Drawn drawn = new Drawn(picture.svg(Theme.LIGHT));
        Rectangle2D canvas = drawn.canvas();
        assertEquals(picture.width(), canvas.getWidth());
        assertEquals(picture.height(), canvas.getHeight());
        Stream.concat(drawn.lines().stream().map(Drawn.Line::box), drawn.shapes().stream())
                .forEach(box -> assertTrue(holds(canvas, box), name + ": " + box));
    }

    /** A line of no height lies in no rectangle for AWT. */
    private static boolean holds(Rectangle2D canvas, Rectangle2D box) {
        return box.getMinX() >= canvas.getMinX()
                && box.getMaxX() <= canvas.getMaxX()
                && box.getMinY() >= canvas.getMinY()
                && box.getMaxY() <= canvas.getMaxY();
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("pictures")
    void aFileStandsAloneAndIsSmall(String name, Picture picture) throws Exception {
        Files.createDirectories(FOLDER);
        for (Theme theme : Theme.values()) {
            String svg = picture.svg(theme);
            Files.writeString(
                    FOLDER.resolve(name + "-" + theme.name().toLowerCase(java.util.Locale.ROOT) + ".svg"), svg);
            boolean shaded = picture.id().startsWith("map-") || picture.id().startsWith("section-");
            assertTrue(svg.length() < (shaded ? 120_000 : 40_000), name + ": " + svg.length());
            assertFalse(svg.contains("url("), "what is referred to is elsewhere");
            assertFalse(svg.contains(" id="));
            Set<String> addresses = new HashSet<>();
            Matcher matcher = Pattern.compile("https?://[^\"]+").matcher(svg);
            while (matcher.find()) {
                addresses.add(matcher.group());
            }
            assertEquals(Set.of("http://www.w3.org/2000/svg"), addresses);
            assertEquals(svg, picture.svg(theme), "the same bytes every time");
        }
        String page = picture.inline();
        new Drawn(page);
        Matcher colors = Pattern.compile("(?:fill|stroke)=\"([^\"]+)\"").matcher(page);
        while (colors.find()) {
            assertTrue(colors.group(1).equals("none") || colors.group(1).startsWith("var(--soak-"), colors.group());
            String variable = colors.group(1).replace("var(", "").replace(")", ":");
            assertTrue(
                    colors.group(1).equals("none") || Pictures.stylesheet().contains(variable),
                    variable + " is not in the stylesheet");
        }
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("pictures")
    void whatIsSaidIsAWholeSentence(String name, Picture picture) {
        for (String text : List.of(picture.caption(), picture.altText())) {
            assertTrue(text.endsWith(".") && !text.endsWith(".."), text);
            assertTrue(Character.isUpperCase(text.charAt(0)), text);
            assertFalse(text.contains("NaN") || text.contains("Infinity"), text);
        }
        assertFalse(
                picture.caption().substring(0, picture.caption().length() - 1).contains(". "), picture.caption());
        assertTrue(picture.id().matches("[a-z0-9-]+"), picture.id());
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("pictures")
    void anySurfaceCanBeDrawnOn(String name, Picture picture) throws IOException {
        Files.createDirectories(FOLDER);
        for (Theme theme : Theme.values()) {
            BufferedImage image = new BufferedImage(picture.width(), picture.height(), BufferedImage.TYPE_INT_RGB);
            Graphics2D g = image.createGraphics();
            picture.draw(g, theme);
            g.dispose();
            assertEquals(Look.of(theme).ground().getRGB(), image.getRGB(1, 1));
            assertEquals(Look.of(theme).ground().getRGB(), image.getRGB(picture.width() - 2, picture.height() - 2));
            if (theme == Theme.LIGHT) {
                ImageIO.write(image, "png", FOLDER.resolve(name + ".png").toFile());
            }
        }
    }

    @Test
    void thereIsAMapForEachGradeAndSpeciesThenTheOtherFour() {
        assertEquals(
                List.of("map-thin-salt", "map-thick-salt", "profiles", "readings", "liquor", "balance"),
                ids("loin-desalting"));
        assertEquals(
                List.of(
                        "map-bead-lactose",
                        "map-bead-ethanol",
                        "map-bead-salt",
                        "profiles",
                        "readings",
                        "liquor",
                        "balance"),
                ids("bead-washing"));
        assertEquals(10, new HashSet<>(ids("crowded")).size());
    }

    @Test
    void piecesOfSeveralSidesAreCutAndThoseThatDifferAreSpread() {
        assertEquals(
                List.of(
                        "map-tall-salt",
                        "section-tall-salt",
                        "map-low-salt",
                        "section-low-salt",
                        "profiles",
                        "readings",
                        "spread",
                        "liquor",
                        "balance"),
                ids("wheel-brining"));
        assertEquals(
                List.of("map-brick-sulfate", "section-brick-sulfate", "profiles", "readings", "liquor", "balance"),
                ids("brick-desalination").subList(4, 10));
        assertEquals(
                3,
                ids("corners").stream().filter(id -> id.startsWith("section-")).count(),
                "a slab is not cut");
    }

    @Test
    void aMapNamesItsStepsAxesUnitsAndLimits() throws Exception {
        List<String> texts = texts("loin-desalting", "map-thick-salt");
        assertTrue(texts.containsAll(List.of(
                "Salt in thick, by depth and time",
                "1  first water",
                "4  running water",
                "depth from the wetted face, mm",
                "13",
                "content, g/kg",
                "running clock, h:min",
                "52:15",
                "mean ≤ 25 g/kg",
                "highest ≤ 40 g/kg",
                "core 38.33",
                "mean 24.98")));
    }

    @Test
    void theLineOfALimitMeetsTheCoreWhenTheCaptionSaysSo() throws Exception {
        Picture map = picture("loin-desalting", "map-thick-salt");
        // The batch sheet has the highest content of the thick grade at 38.33 g/kg when the batch ends, 52:15.
        Matcher said =
                Pattern.compile("the core comes to 40 g/kg at (\\d+):(\\d+)").matcher(map.caption());
        assertTrue(said.find(), map.caption());
        double hours = Integer.parseInt(said.group(1)) + Integer.parseInt(said.group(2)) / 60.0;
        String red = Look.hex(Look.of(Theme.LIGHT).limit());
        double right = 0;
        Drawn drawn = new Drawn(map.svg(Theme.LIGHT));
        for (var path : drawn.elements("path")) {
            // The core is the foot of the map.
            Matcher foot = Pattern.compile("([\\d.]+) 316(?![\\d.])").matcher(path.getAttribute("d"));
            if (path.getAttribute("stroke").equals(red) && foot.find()) {
                right = Double.parseDouble(foot.group(1));
            }
        }
        assertEquals(52 + hours / 52.25 * (732 - 52), right, 2);
    }

    @Test
    void profilesNameEachStepAtItsLine() throws Exception {
        List<String> texts = texts("loin-desalting", "profiles");
        for (String grade : List.of("salt in thin, g/kg", "salt in thick, g/kg")) {
            assertTrue(texts.contains(grade));
        }
        for (String step : List.of("1 first water", "2 second water", "3 third water", "4 running water")) {
            assertEquals(2, texts.stream().filter(step::equals).count(), step);
        }
        assertEquals(2, texts.stream().filter("mm from the middle"::equals).count());
        assertEquals(
                8,
                new Drawn(picture("loin-desalting", "profiles").svg(Theme.LIGHT))
                        .elements("path").stream()
                                .filter(path ->
                                        path.getAttribute("stroke-width").equals("2.2"))
                                .count());
    }

    @Test
    void readingsShowTheLimitAndWhatDecides() throws Exception {
        List<String> texts = texts("loin-desalting", "readings");
        assertTrue(texts.containsAll(
                List.of("salt mean, g/kg", "salt highest, g/kg", "at most 25", "thick 24.98, decides", "thin 5.675")));
        assertTrue(picture("loin-desalting", "readings").caption().startsWith("What decides: salt mean, thick"));
        assertTrue(texts("bead-washing", "readings")
                .contains("lactose mean, % of start (each line is ten times the next)"));
    }

    @Test
    void aMissedTargetIsSaidToBeMissed() throws Exception {
        assertTrue(picture("crowded", "readings").caption().startsWith("Missed: "));
        assertTrue(texts("crowded", "readings").stream().anyMatch(text -> text.contains("missed")));
    }

    @Test
    void theLiquorIsBrokenWhereItIsMadeUpAnew() throws Exception {
        Drawn drawn = new Drawn(picture("bead-washing", "liquor").svg(Theme.LIGHT));
        List<org.w3c.dom.Element> lines = new ArrayList<>(drawn.elements("path"));
        lines.removeIf(path -> path.getAttribute("d").length() < 100);
        // Two fills and a flow of three species.
        assertEquals(9, lines.size());
        assertTrue(drawn.texts().containsAll(List.of("lactose in the liquor, g/L", "10.78", "2.993", "0.3226")));
    }

    @Test
    void bothSidesOfTheBalanceEndAtOneLine() throws Exception {
        Drawn drawn = new Drawn(picture("loin-desalting", "balance").svg(Theme.LIGHT));
        String pieces = Look.hex(Look.of(Theme.LIGHT).series(0));
        String liquors = Look.hex(Look.of(Theme.LIGHT).series(1));
        List<org.w3c.dom.Element> bars = new ArrayList<>(drawn.elements("rect"));
        bars.removeIf(bar -> !List.of(pieces, liquors).contains(bar.getAttribute("fill")));
        assertEquals(6, bars.size());
        double end = right(bars.get(0));
        assertEquals(end, right(bars.get(5)), 0.2);
        for (int i = 2; i < 6; i++) {
            assertEquals(right(bars.get(i - 1)), Double.parseDouble(bars.get(i).getAttribute("x")), 0.2);
        }
        // 600 kg of loins with 190 g/kg.
        assertEquals(3, drawn.texts().stream().filter("114.0 kg"::equals).count());
        assertTrue(drawn.texts().contains("salt, kg"));
    }

    @Test
    void aMapOfSeveralSidesSaysWhichWayItTakes() throws Exception {
        assertTrue(texts("wheel-brining", "map-tall-salt")
                .containsAll(List.of(
                        "Shade: the content along the length, a piece as stated. Above: the steps. Below: core, mean and"
                                + " face. Lines: contents that targets name.",
                        "depth from the flat face, mm",
                        "47.5",
                        "mean ≥ 15 g/kg in 95 %",
                        "Mean: over all pieces of the grade.")));
        assertTrue(picture("wheel-brining", "map-tall-salt")
                .caption()
                .startsWith(
                        "In a piece of tall as stated, from the core along the length, the core goes from 1.000 to "));
        assertTrue(texts("brick-desalination", "map-brick-sulfate")
                .containsAll(List.of("depth from the face, along the width, mm", "51", "Mean: of the whole piece.")));
        assertTrue(texts("brick-desalination", "profiles").contains("mm from the core along the width"));
        assertTrue(texts("corners", "map-plate-chloride").contains("depth from the wetted face, mm"));
    }

    /** 250 mm across and 95 mm long; 102 mm wide and 65 mm thick, lying on its sealed face. */
    @Test
    void aCutHasTheProportionsOfThePiece() throws Exception {
        double wheel = 250.0 / 95;
        double brick = 102.0 / 65;
        for (org.w3c.dom.Element image : cuts("wheel-brining", "section-tall-salt", 2)) {
            assertEquals(wheel, size(image, "width") / size(image, "height"), wheel / size(image, "height"));
        }
        for (org.w3c.dom.Element image : cuts("brick-desalination", "section-brick-sulfate", 3)) {
            assertEquals(brick, size(image, "width") / size(image, "height"), brick / size(image, "height"));
        }
        assertTrue(texts("wheel-brining", "section-tall-salt")
                .containsAll(List.of("1  brine, 21:00", "across: diameter, mm; down: length, mm", "250", "95")));
        assertTrue(texts("brick-desalination", "section-brick-sulfate")
                .containsAll(List.of("sealed face", "across: width, mm; down: thickness, mm", "102", "65")));
        assertFalse(texts("wheel-brining", "section-tall-salt").contains("sealed face"));
    }

    /** The images but the last, which is the scale. */
    private static List<org.w3c.dom.Element> cuts(String batch, String id, int steps) throws Exception {
        List<org.w3c.dom.Element> images = new Drawn(picture(batch, id).svg(Theme.LIGHT)).elements("image");
        assertEquals(steps + 1, images.size());
        return images.subList(0, steps);
    }

    private static double size(org.w3c.dom.Element image, String side) {
        return Double.parseDouble(image.getAttribute(side));
    }

    @Test
    void aMapAndACutHaveOneScale() throws Exception {
        for (String grade : List.of("tall", "low")) {
            List<String> map = texts("wheel-brining", "map-" + grade + "-salt");
            List<String> cut = texts("wheel-brining", "section-" + grade + "-salt");
            assertTrue(map.containsAll(List.of("0", "20", "40", "60", "80", "100")));
            assertTrue(cut.containsAll(List.of("0", "20", "40", "60", "80", "100")));
        }
    }

    @Test
    void aCutTellsWhatItsCoreAndItsCornersHold() throws Exception {
        Run run = Batches.followed("brick-desalination");
        StepEnd.Content content = run.end(2).pieces().get(0).species().get(2);
        String core = Words.number(content.value(Reading.CORE));
        assertTrue(texts("brick-desalination", "section-brick-sulfate").stream()
                .anyMatch(text -> text.startsWith("core " + core + ", corners 0.0")));
        String caption = picture("brick-desalination", "section-brick-sulfate").caption();
        assertTrue(
                caption.startsWith("Cut through the core along width and thickness: when third bath ends, brick holds "
                        + core + " g/L at the core and "),
                caption);
    }

    @Test
    void aFlatCutIsStillShaded() throws Exception {
        for (org.w3c.dom.Element image : cuts("corners", "section-disc-chloride", 3)) {
            // 240 mm by 6 mm.
            assertEquals(680, size(image, "width"));
            assertEquals(17, size(image, "height"));
        }
    }

    @Test
    void theSpreadSaysWhatTheShareReadsAndHowManyKeepTheLimit() throws Exception {
        List<String> texts = texts("wheel-brining", "spread");
        TargetState tall = EachGrade.of(Batches.followed("wheel-brining")).get(0);
        assertTrue(texts.containsAll(List.of(
                "salt mean: pieces that read so much or more, % by mass",
                "95 %",
                "at least 15 g/kg",
                "95 % read " + Words.number(tall.value()) + " or more",
                "salt range: pieces that read so much or less, % by mass")));
        assertTrue(texts("corners", "spread").stream().anyMatch(text -> text.endsWith(", missed")));
        assertEquals(
                "Of tall, 95 % of the pieces, by mass, have a salt mean of " + Words.number(tall.value())
                        + " g/kg or more, and 97.5 % keep the limit, at least 15 g/kg.",
                picture("wheel-brining", "spread").caption());
    }

    private static double right(org.w3c.dom.Element bar) {
        return Double.parseDouble(bar.getAttribute("x")) + Double.parseDouble(bar.getAttribute("width"));
    }

    private static List<String> ids(String batch) {
        return pictures(batch).stream().map(Picture::id).toList();
    }

    private static List<String> texts(String batch, String id) throws Exception {
        return new Drawn(picture(batch, id).svg(Theme.LIGHT)).texts();
    }

    private static Picture picture(String batch, String id) {
        return pictures(batch).stream()
                .filter(picture -> picture.id().equals(id))
                .findFirst()
                .orElseThrow();
    }

    private static List<Picture> pictures(String batch) {
        return java.util.Objects.requireNonNull(Batches.all().get(batch));
    }
}
