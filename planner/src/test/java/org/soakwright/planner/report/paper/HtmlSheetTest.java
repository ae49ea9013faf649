package org.soakwright.planner.report.paper;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.StringReader;
import java.util.Optional;
import javax.xml.parsers.DocumentBuilder;
import javax.xml.parsers.DocumentBuilderFactory;
import org.junit.jupiter.api.Test;
import org.soakwright.planner.batch.Run;
import org.w3c.dom.Document;
import org.xml.sax.InputSource;

/** The page, read back by the platform's XML parser. */
class HtmlSheetTest {
    private static Document parsed(String html) throws Exception {
        DocumentBuilder builder = DocumentBuilderFactory.newInstance().newDocumentBuilder();
        return builder.parse(new InputSource(new StringReader(html)));
    }

    private static String words(String text) {
        return text.replaceAll("[\\s\\u00a0]+", " ").strip();
    }

    @Test
    void thePageIsWellFormedWhateverNamesAre() throws Exception {
        Run run = Batches.followed(Batches.large(3));
        Sheet sheet = Batches.sheet(run, Optional.of(Batches.START));
        Document page = parsed(HtmlSheet.of(sheet));
        assertEquals(
                words(sheet.title()),
                words(page.getElementsByTagName("h1").item(0).getTextContent()));
        assertEquals(0, page.getElementsByTagName("b").getLength(), "names are no markup");
        assertTrue(page.getDocumentElement().getTextContent().contains("<b>round</b> & sound"));
    }

    @Test
    void everythingTheSheetSaysIsOnThePage() throws Exception {
        Sheet sheet = Batches.sheet(Batches.planned(Batches.DESALTING).run(), Optional.of(Batches.START));
        String text = words(parsed(HtmlSheet.of(sheet)).getDocumentElement().getTextContent());
        for (Sheet.Part part : sheet.parts()) {
            assertTrue(text.contains(part.name()) && text.contains(part.doing()), part.name());
            part.makeUp().forEach(line -> assertTrue(text.contains(line), line));
            for (Sheet.Moment moment : part.moments()) {
                assertTrue(text.contains(moment.what() + " " + moment.clock() + " " + moment.wall()), moment.what());
                moment.notes().forEach(note -> assertTrue(text.contains(note), note));
            }
        }
        sheet.targets().forEach(line -> assertTrue(text.contains(line.expected()), line.toString()));
        sheet.cautions().forEach(line -> assertTrue(text.contains(line), line));
        sheet.sampling().forEach(line -> assertTrue(text.contains(line), line));
        sheet.signatures().forEach(line -> assertTrue(text.contains(line), line));
        assertTrue(text.contains(sheet.footer()));
    }

    @Test
    void itAsksForNothingFromElsewhere() {
        String html = HtmlSheet.of(Batches.sheet(Batches.followed(Batches.BRINING), Optional.empty()));
        assertFalse(html.contains("http"), "no address");
        assertFalse(html.contains("src="), "no source");
        assertFalse(html.contains("url("), "no style from elsewhere");
    }

    @Test
    void boxesAreThereToBeFilledIn() throws Exception {
        Sheet sheet = Batches.sheet(Batches.followed(Batches.BRINING), Optional.empty());
        String html = HtmlSheet.of(sheet);
        int boxes = html.split("class=\"box\"", -1).length - 1;
        long moments =
                sheet.parts().stream().mapToLong(part -> part.moments().size()).sum();
        long found =
                sheet.targets().stream().filter(line -> !line.unit().isEmpty()).count();
        // Lot code and load; a vessel each; actual and initials each; what is found; signatures.
        assertEquals(2 + sheet.parts().size() + 2 * moments + found + 3, boxes);
    }

    @Test
    void aMissedPlanSaysSoAcrossTheTop() {
        Sheet missed = Batches.sheet(
                Batches.followed(Batches.DESALTING.replace("at-most: 55 g/kg", "at-most: 5 g/kg")), Optional.empty());
        String html = HtmlSheet.of(missed);
        assertTrue(html.indexOf("NOT A PLAN: misses 2 targets") < html.indexOf("<h1>"));
        assertFalse(html.contains("Released"));
    }

    @Test
    void whatXmlCannotSayIsReplacedVisibly() {
        assertEquals("a\ufffdb &lt;&amp;&gt;&quot;", HtmlSheet.escaped("a\u0000b <&>\""));
        assertEquals("\ufffd", HtmlSheet.escaped("\ud800"));
    }
}
