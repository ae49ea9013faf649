package org.soakwright.planner.report.page;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import org.junit.jupiter.api.Test;

class HtmlTest {
    @Test
    void textIsNeverMarkup() {
        assertEquals(
                "<p title=\"&quot;&#39;&lt;\">&lt;script&gt;alert(&quot;x&quot;)&lt;/script&gt; &amp;amp;</p>\n",
                new Html()
                        .leaf("p", "<script>alert(\"x\")</script> &amp;", "title", "\"'<")
                        .toString());
    }

    /** HTML Living Standard, 13.2.3.5: controls other than white space, noncharacters and surrogates are errors in the input. */
    @Test
    void whatNoPageMayHoldIsReplaced() {
        assertEquals(
                "<p>a\ufffdb\ufffdc\ufffdd\ufffde</p>\n",
                new Html().leaf("p", "a\u0000b\u001bc\ud800d\uffffe").toString());
    }

    @Test
    void wordsWrittenTheOtherWayDoNotDisturbTheirNeighbours() {
        assertEquals(
                "<p>salt <bdi>\u0645\u0644\u062d</bdi></p>\n",
                new Html()
                        .open("p")
                        .words("salt ")
                        .words("\u0645\u0644\u062d")
                        .close()
                        .toString());
    }

    /** The checker that pages are held against finds what is wrong, style sheets included. */
    @Test
    void theCheckerChecks() {
        String sound = "<!DOCTYPE html><html lang=\"en\"><head><title>t</title><style>p{color:red}</style></head><body>"
                + "<p>x</p></body></html>";
        PageCheck.assertValid(sound);
        for (String[] fault : new String[][] {{"<p>", "<p><p id=\"a b\">"}, {"color", "colour"}, {"</p>", "</b>"}}) {
            assertThrows(AssertionError.class, () -> PageCheck.assertValid(sound.replace(fault[0], fault[1])));
        }
    }

    @Test
    void nothingStaysOpen() {
        assertThrows(IllegalStateException.class, () -> new Html().open("p").toString());
    }
}
