package org.soakwright.planner.report.page;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.soakwright.planner.batch.Run;
import org.soakwright.planner.batch.StepEnd;
import org.soakwright.planner.report.CsvText;
import org.soakwright.recipes.model.Reading;
import org.soakwright.recipes.model.Recipe;

/** What a report holds, and what a planner reads first. */
class ReportTest {
    /** Four steps, two grades: the most that the page may weigh. */
    private static final int HEAVIEST = 600_000;

    @Test
    void thePageOfTheLoinsIsSoundAndLight() throws IOException {
        Map<String, byte[]> files = Reports.planned(Reports.example("loin-desalting.yaml"));
        String page = soundAndLight(files);
        assertEquals(6, page.split("<figure ", -1).length - 1, "two maps, profiles, readings, liquor, balance");
    }

    @ParameterizedTest
    @ValueSource(strings = {"desalting.yaml", "washing.yaml", "odd-names.yaml"})
    void thePageOfARecipeFollowedIsSound(String recipe) throws IOException {
        Map<String, byte[]> files = Reports.followed(Reports.recipe(recipe));
        PageCheck.assertSound(Reports.text(files, "index.html"), files.keySet());
    }

    private static String soundAndLight(Map<String, byte[]> files) {
        String page = Reports.text(files, "index.html");
        PageCheck.assertSound(page, files.keySet());
        assertTrue(files.getOrDefault("index.html", new byte[0]).length < HEAVIEST, "too heavy");
        return page;
    }

    @Test
    void thePageOfPiecesThatDifferSaysHow() throws IOException {
        Recipe recipe = Reports.recipe("rounds.yaml");
        Map<String, byte[]> files = Reports.followed(recipe);
        String page = soundAndLight(files);
        for (String said : List.of(
                "<p class=\"about\">Pieces differ: sizes spread by 6 %; salt at the start varies by 20 %.</p>",
                "<figure id=\"picture-section-round-salt\">",
                "<figure id=\"picture-spread\">",
                ">How the pieces differ at the end of each step</h2>",
                "In a grade sizes spread by 6 %, all sides of a piece alike; pieces neither shrink nor swell",
                "short cylinders open on their round side and one flat face",
                "2 g/kg everywhere in the piece at the start, varying by 20 % from piece to piece",
                "diffusivity 3.2e-10 m²/s along the axis, 3e-10 m²/s across it and 3e-10 m²/s along the thickness at every",
                "and so is how far pieces are said to differ")) {
            assertTrue(page.contains(said), said);
        }
        assertFalse(page.contains("the same for every piece"));
        Run run = Reports.follow(recipe);
        List<List<String>> rows = CsvText.read(Reports.text(files, "tables/percentiles.csv"));
        assertEquals(
                List.of("step number", "step", "species", "grade", "reading", "1 %", "5 %"),
                rows.get(0).subList(0, 7));
        // Two steps of two grades with six readings each.
        assertEquals(1 + 2 * 2 * 6, rows.size());
        double fifth = run.end(0)
                .pieces()
                .get(0)
                .species()
                .get(0)
                .distribution()
                .getOrDefault(Reading.MEAN, List.of())
                .get(1);
        assertEquals(List.of("1", "brine", "salt", "slab", "mean"), rows.get(1).subList(0, 5));
        assertEquals(fifth, Double.parseDouble(rows.get(1).get(6)));
    }

    @Test
    void wherePiecesAreAlikeNothingIsSaidOfDifferences() throws IOException {
        Map<String, byte[]> files = Reports.followed(Reports.recipe("blocks.yaml"));
        String page = soundAndLight(files);
        assertFalse(page.contains("Pieces differ") || page.contains("picture-spread"));
        assertFalse(files.containsKey("tables/percentiles.csv"));
        assertTrue(page.contains("bricks open on every face but one of the thickness and one of the length"));
        assertTrue(page.contains("L from wetted surface to core, the shortest way."));
        assertTrue(Reports.text(files, "tables/course.csv").startsWith("clock [s],step,chloride in liquor [g/L],"));
        assertTrue(Reports.text(files, "tables/course.csv").contains("\"chloride middle of the face, block [g/L]\""));
    }

    @Test
    void thePageOfANearestMissSaysSoAndWhatWouldHelp() throws IOException {
        Map<String, byte[]> files = Reports.planned(Reports.recipe("too-tight.yaml"));
        String page = Reports.text(files, "index.html");
        PageCheck.assertSound(page, files.keySet());
        assertTrue(page.contains("<p class=\"kind\">Nearest miss, not a plan</p>"));
        assertTrue(page.contains("<section id=\"answer\" class=\"bad\""));
        assertTrue(page.contains(">What would help, each planned again</h2>"));
        assertFalse(page.contains(">What to do</h3>"), "nothing of it is to be done");
        assertTrue(files.containsKey("tables/remedies.csv"));
    }

    @Test
    void theAnswerComesFirst() throws IOException {
        String page = Reports.text(Reports.planned(Reports.recipe("desalting.yaml")), "index.html");
        List<String> parts = List.of(
                "<h1",
                "Every target is met in",
                ">What to do</h3>",
                ">How sure this is</h3>",
                "id=\"steps\"",
                "id=\"targets\"",
                "id=\"pictures\"",
                "id=\"expected\"",
                "id=\"assumptions\"",
                "id=\"groups\"",
                "id=\"cautions\"",
                "SHA-256 " + Reports.STAMP.sha256());
        int at = -1;
        for (String part : parts) {
            int next = page.indexOf(part);
            assertTrue(next > at, part);
            at = next;
        }
    }

    @Test
    void timesOfDayStandBesideTheClockWhereTheStartIsKnown() throws IOException {
        Recipe recipe = Reports.recipe("desalting.yaml");
        assertTrue(Reports.text(Reports.planned(recipe), "index.html").contains("from Mon 2 Mar 2026 06:00"));
        assertFalse(Reports.text(Reports.followed(recipe), "index.html").contains("Mar 2026"));
    }

    @Test
    void namesAreWordsAndNeverMarkup() throws IOException {
        Map<String, byte[]> files = Reports.followed(Reports.recipe("odd-names.yaml"));
        String page = Reports.text(files, "index.html");
        assertFalse(page.contains("<script") || page.contains("<img") || page.contains("<b>"));
        assertTrue(page.contains("&lt;script&gt;alert(&#39;x&#39;)&lt;/script&gt;"));
        files.keySet().forEach(name -> assertTrue(name.matches("[a-z0-9./-]+"), name));
    }

    @Test
    void everyFileIsThere() throws IOException {
        assertEquals(
                List.of(
                        "index.html",
                        "batch-sheet.html",
                        "batch-sheet.pdf",
                        "result.json",
                        "tables/steps.csv",
                        "tables/liquor.csv",
                        "tables/contents.csv",
                        "tables/targets.csv",
                        "tables/totals.csv",
                        "tables/per-hour.csv",
                        "tables/groups.csv",
                        "tables/balance.csv",
                        "tables/course.csv",
                        "pictures/map-tail-salt.svg",
                        "pictures/map-loin-salt.svg",
                        "pictures/profiles.svg",
                        "pictures/readings.svg",
                        "pictures/liquor.svg",
                        "pictures/balance.svg"),
                List.copyOf(Reports.planned(Reports.recipe("desalting.yaml")).keySet()));
    }

    @Test
    void theSameRecipeGivesTheSameBytes() throws IOException {
        Map<String, byte[]> first = Reports.planned(Reports.recipe("desalting.yaml"));
        Map<String, byte[]> second = Reports.planned(Reports.recipe("desalting.yaml"));
        assertEquals(first.keySet(), second.keySet());
        first.forEach((name, bytes) -> assertArrayEquals(bytes, second.get(name), name));
    }

    @Test
    void theTablesHoldTheNumbersInFull() throws IOException {
        Recipe recipe = Reports.recipe("odd-names.yaml");
        Run run = Reports.follow(recipe);
        List<List<String>> rows = CsvText.read(Reports.text(Reports.followed(recipe), "tables/contents.csv"));
        List<String> header = rows.get(0);
        assertEquals(
                List.of("step number", "step", "grade", "end [s]", "salt, \"fine\" mean [g/kg]"), header.subList(0, 5));
        assertEquals("'@ملح mean [g/kg]", header.get(10), "no formula");
        assertEquals("'=1+1", rows.get(1).get(2), "no formula");
        // Two steps, each of two grades and the lot.
        assertEquals(7, rows.size());
        for (int step = 0; step < 2; step++) {
            for (int grade = 0; grade < 2; grade++) {
                StepEnd.Content content =
                        run.end(step).pieces().get(grade).species().get(0);
                List<String> row = rows.get(1 + 3 * step + grade);
                assertEquals(content.value(Reading.MEAN), Double.parseDouble(row.get(4)));
                assertEquals(content.value(Reading.CORE), Double.parseDouble(row.get(5)));
            }
        }
    }

    @Test
    void everyTableIsReadBackInRowsOfOneLength() throws IOException {
        for (String recipe : List.of("desalting.yaml", "washing.yaml", "odd-names.yaml")) {
            Map<String, byte[]> files = Reports.followed(Reports.recipe(recipe));
            for (String name : files.keySet()) {
                if (name.endsWith(".csv")) {
                    List<List<String>> rows = CsvText.read(Reports.text(files, name));
                    assertTrue(rows.size() > 1, name);
                    rows.forEach(row -> assertEquals(rows.get(0).size(), row.size(), name));
                }
            }
        }
    }

    /** 200 kg at 180 g/kg: 36 kg came in, wherever they went. */
    @Test
    void theBalanceInTheTableCloses() throws IOException {
        Map<String, byte[]> files = Reports.followed(Reports.recipe("odd-names.yaml"));
        double from = 0;
        double to = 0;
        for (List<String> row : CsvText.read(Reports.text(files, "tables/balance.csv"))) {
            if (row.get(0).startsWith("salt")) {
                from += row.get(1).equals("from") ? Double.parseDouble(row.get(3)) : 0;
                to += row.get(1).equals("to") ? Double.parseDouble(row.get(3)) : 0;
            }
        }
        assertEquals(36, from, 1e-9);
        assertEquals(36, to, 1e-9);
    }
}
