package org.soakwright.planner.report.paper;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
import java.util.stream.Collectors;
import org.apache.pdfbox.Loader;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.text.PDFTextStripper;
import org.apache.pdfbox.text.TextPosition;
import org.junit.jupiter.api.Test;
import org.soakwright.planner.batch.Plan;
import org.soakwright.planner.batch.Run;

/** The paper, read back by the library's own text extraction. */
class PdfSheetTest {
    /** Every character with its place. */
    private static final class Characters extends PDFTextStripper {
        private final List<List<TextPosition>> pages = new ArrayList<>();

        @Override
        protected void processTextPosition(TextPosition text) {
            while (pages.size() < getCurrentPageNo()) {
                pages.add(new ArrayList<>());
            }
            if (!text.getUnicode().isBlank()) {
                pages.get(getCurrentPageNo() - 1).add(text);
            }
            super.processTextPosition(text);
        }

        static List<List<TextPosition>> of(PDDocument document) throws IOException {
            Characters characters = new Characters();
            characters.getText(document);
            return characters.pages;
        }
    }

    private static String text(PDDocument document) throws IOException {
        return words(new PDFTextStripper().getText(document));
    }

    private static String words(String text) {
        return text.replaceAll("[\\s\\u00a0]+", " ").strip();
    }

    /** Words in the order printed, without the spaces where lines and cells end. */
    private static String letters(String text) {
        return text.replaceAll("[\\s\\u00a0]+", "");
    }

    private static Sheet large(int steps) {
        Run run = Batches.followed(Batches.large(steps));
        return Batches.sheet(run, Optional.of(Batches.START));
    }

    @Test
    void everyStepAndNumberIsOnThePaper() throws IOException {
        Sheet sheet = Batches.sheet(Batches.planned(Batches.DESALTING).run(), Optional.of(Batches.START));
        try (PDDocument document = Loader.loadPDF(Batches.pdf(sheet))) {
            String text = text(document);
            String letters = letters(text);
            for (Sheet.Part part : sheet.parts()) {
                assertTrue(text.contains(part.name()), part.name());
                assertTrue(text.contains(words(part.doing())), part.doing());
                part.makeUp().forEach(line -> assertTrue(letters.contains(letters(line)), line));
                part.notes().forEach(line -> assertTrue(letters.contains(letters(line)), line));
                for (Sheet.Moment moment : part.moments()) {
                    assertTrue(
                            text.contains(moment.what() + " " + moment.clock() + " " + moment.wall()), moment.what());
                    assertTrue(letters.contains(letters(moment.planned())), moment.planned());
                    moment.notes().forEach(line -> assertTrue(letters.contains(letters(line)), line));
                }
            }
            for (Sheet.TargetLine line : sheet.targets()) {
                assertTrue(letters.contains(letters(String.join("", line.words()))), line.toString());
            }
            List<String> lines = new ArrayList<>(sheet.cautions());
            lines.addAll(sheet.sampling());
            lines.addAll(sheet.timing());
            lines.addAll(sheet.signatures());
            lines.add(sheet.footer());
            lines.forEach(line -> assertTrue(letters.contains(letters(line)), line));
        }
    }

    @Test
    void aShortBatchFitsOnePage() throws IOException {
        String oneBath = Batches.DESALTING
                .replaceAll("(?s)  - soak: second.*?targets", "targets")
                .replaceAll("at-most: \\d+", "at-most: 180");
        Sheet sheet = Batches.sheet(Batches.planned(oneBath).run(), Optional.of(Batches.START));
        assertTrue(sheet.isPlan());
        try (PDDocument document = Loader.loadPDF(Batches.pdf(sheet))) {
            assertEquals(1, document.getNumberOfPages());
            assertTrue(text(document).contains("page 1 of 1"));
            // A4 to the point.
            assertEquals(595, document.getPage(0).getMediaBox().getWidth(), 0.5);
            assertEquals(842, document.getPage(0).getMediaBox().getHeight(), 0.5);
        }
    }

    @Test
    void aLongBatchGoesOverPagesThatAllSayWhatTheyAre() throws IOException {
        Sheet sheet = large(12);
        try (PDDocument document = Loader.loadPDF(Batches.pdf(sheet))) {
            int pages = document.getNumberOfPages();
            assertTrue(pages > 3, "pages: " + pages);
            for (int page = 1; page <= pages; page++) {
                PDFTextStripper stripper = new PDFTextStripper();
                stripper.setStartPage(page);
                stripper.setEndPage(page);
                String text = words(stripper.getText(document));
                assertTrue(text.contains("page " + page + " of " + pages), text);
                assertTrue(text.contains("Lot code"), text);
                assertTrue(text.contains("Washing & <salting>"), text);
            }
            String text = text(document);
            for (int step = 1; step <= 12; step++) {
                assertTrue(text.contains("bath " + step + " of a plant"), "step " + step);
            }
        }
    }

    @Test
    void nothingLiesOutsideThePageAndNoTextOnOther() throws IOException {
        List<Sheet> sheets = List.of(
                large(12),
                Batches.sheet(Batches.followed(Batches.large(3)), Optional.empty()),
                Batches.sheet(Batches.planned(Batches.DESALTING).run(), Optional.of(Batches.START)),
                Batches.sheet(Batches.followed(Batches.BRINING), Optional.of(Batches.START)));
        for (Sheet sheet : sheets) {
            try (PDDocument document = Loader.loadPDF(Batches.pdf(sheet))) {
                for (List<TextPosition> page : Characters.of(document)) {
                    assertTrue(page.size() > 100);
                    page.forEach(PdfSheetTest::assertWithinMargins);
                    assertNoneOverlap(page);
                }
            }
        }
    }

    private static void assertWithinMargins(TextPosition text) {
        double right = text.getXDirAdj() + text.getWidthDirAdj();
        assertTrue(
                text.getXDirAdj() >= Setting.LEFT - 0.5 && right <= Setting.LEFT + Setting.WIDTH + 0.5,
                text::getUnicode);
        assertTrue(text.getYDirAdj() > 20 && text.getYDirAdj() < Setting.PAGE_HEIGHT - 20, text::getUnicode);
    }

    /** Two characters overlap where their advance widths do and their baselines are nearer than x-height. */
    private static void assertNoneOverlap(List<TextPosition> page) {
        for (int i = 0; i < page.size(); i++) {
            TextPosition one = page.get(i);
            for (int j = i + 1; j < page.size(); j++) {
                TextPosition other = page.get(j);
                double across =
                        Math.min(one.getXDirAdj() + one.getWidthDirAdj(), other.getXDirAdj() + other.getWidthDirAdj())
                                - Math.max(one.getXDirAdj(), other.getXDirAdj());
                double apart = Math.abs(one.getYDirAdj() - other.getYDirAdj());
                double height = 0.8 * Math.min(one.getFontSizeInPt(), other.getFontSizeInPt());
                assertTrue(
                        across < 0.3 || apart > height,
                        () -> one.getUnicode() + " on " + other.getUnicode() + " at " + one.getXDirAdj() + ", "
                                + one.getYDirAdj());
            }
        }
    }

    @Test
    void bodyIsAtLeast9PointAndStepLinesAtLeast10() throws IOException {
        Sheet sheet = Batches.sheet(Batches.planned(Batches.DESALTING).run(), Optional.of(Batches.START));
        try (PDDocument document = Loader.loadPDF(Batches.pdf(sheet))) {
            Map<Double, List<TextPosition>> lines = new TreeMap<>();
            for (TextPosition text : Characters.of(document).get(0)) {
                lines.computeIfAbsent((double) text.getYDirAdj(), y -> new ArrayList<>())
                        .add(text);
            }
            int stepLines = 0;
            for (List<TextPosition> line : lines.values()) {
                String words = line.stream().map(TextPosition::getUnicode).collect(Collectors.joining());
                boolean step = words.matches("(Start|Read|End)[0-9]+:.*");
                stepLines += step ? 1 : 0;
                for (TextPosition text : line) {
                    boolean footer = text.getYDirAdj() > Setting.BOTTOM;
                    boolean unitInABox = text.getXDirAdj() > Setting.LEFT + 0.6 * Setting.WIDTH
                            && "g/Lk".contains(text.getUnicode());
                    assertTrue(footer || unitInABox || text.getFontSizeInPt() >= (step ? 10 : 9), words);
                }
            }
            assertEquals(8, stepLines);
        }
    }

    @Test
    void equalSheetsAreEqualFilesWithoutATime() throws IOException {
        Plan plan = Batches.planned(Batches.DESALTING);
        ByteArrayOutputStream one = new ByteArrayOutputStream();
        ByteArrayOutputStream other = new ByteArrayOutputStream();
        BatchPaper.of(plan, Batches.STAMP, Optional.of(Batches.START)).pdf(one);
        BatchPaper.of(Batches.planned(Batches.DESALTING), Batches.STAMP, Optional.of(Batches.START))
                .pdf(other);
        assertArrayEquals(one.toByteArray(), other.toByteArray());
        try (PDDocument document = Loader.loadPDF(one.toByteArray())) {
            assertNull(document.getDocumentInformation().getCreationDate());
            assertNull(document.getDocumentInformation().getModificationDate());
        }
    }

    @Test
    void aMissedPlanSaysSoOnEveryPage() throws IOException {
        Sheet sheet = Batches.sheet(
                Batches.followed(Batches.large(12).replace("at-most: 25 g/kg", "at-most: 0.001 g/kg")),
                Optional.empty());
        try (PDDocument document = Loader.loadPDF(Batches.pdf(sheet))) {
            assertTrue(document.getNumberOfPages() > 1);
            for (int page = 1; page <= document.getNumberOfPages(); page++) {
                PDFTextStripper stripper = new PDFTextStripper();
                stripper.setStartPage(page);
                stripper.setEndPage(page);
                assertTrue(words(stripper.getText(document)).contains("NOT A PLAN: misses 4 targets"), "page " + page);
            }
            assertTrue(!text(document).contains("Released"));
        }
    }

    @Test
    void theStreamStaysOpen() throws IOException {
        boolean[] closed = {false};
        ByteArrayOutputStream out = new ByteArrayOutputStream() {
            @Override
            public void close() {
                closed[0] = true;
            }
        };
        PdfSheet.write(Batches.sheet(Batches.followed(Batches.BRINING), Optional.empty()), out);
        assertEquals(false, closed[0]);
    }
}
