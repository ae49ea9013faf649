package org.soakwright.planner.report.paper;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.util.List;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.junit.jupiter.api.Test;

class FaceTest {
    @Test
    void widthsAreThoseOfTheLibraryThatDraws() throws IOException {
        try (PDDocument document = new PDDocument();
                Face face = Face.of(Face.REGULAR, document)) {
            for (String text : List.of("first water", "Office file: 12 °C", "1200 L, 0.05 L/kg", "Промывка")) {
                String shown = face.shown(text);
                // The library keeps widths in whole thousandths of the size.
                assertEquals(
                        face.font().getStringWidth(shown) / 100, face.width(shown, 10), 0.005 * text.length(), text);
            }
        }
    }

    @Test
    void whatTheFontLacksIsSeenToBeMissing() throws IOException {
        try (PDDocument document = new PDDocument();
                Face face = Face.of(Face.SEMIBOLD, document)) {
            assertEquals("pH\u00a07 \ufffd\ufffd ok", face.shown("pH\u00a07 洗浄 ok"));
            assertEquals("a \ufffd b", face.shown("a\t\ud83d\ude00\nb"));
            assertEquals("a\ufffdb", face.shown("a\u0007b"));
        }
    }

    @Test
    void linesBreakAtSpacesAndInsideWordsThatAreTooLong() throws IOException {
        try (PDDocument document = new PDDocument();
                Face face = Face.of(Face.REGULAR, document)) {
            assertEquals(List.of("first", "water"), face.wrapped("first water", 10, face.width("first wat", 10), 9));
            List<String> lines = face.wrapped("in " + "o".repeat(50), 10, 100, 99);
            assertEquals("in " + "o".repeat(50), lines.get(0) + " " + String.join("", lines.subList(1, lines.size())));
            lines.forEach(line -> assertTrue(face.width(line, 10) <= 100, line));
        }
    }

    @Test
    void whatDoesNotFitEndsInAnEllipsis() throws IOException {
        try (PDDocument document = new PDDocument();
                Face face = Face.of(Face.REGULAR, document)) {
            List<String> lines = face.wrapped("one two three four five six", 10, 40, 2);
            assertEquals(2, lines.size());
            assertTrue(lines.get(1).endsWith("…"), lines.toString());
            assertTrue(face.width(lines.get(1), 10) <= 40);
        }
    }

    @Test
    void aNumberStaysWithItsUnit() {
        assertEquals(
                "17\u00a0h 45\u00a0min, 1200\u00a0L at 4\u00a0°C, 2 steps",
                Glue.of("17 h 45 min, 1200 L at 4 °C, 2 steps"));
    }
}
