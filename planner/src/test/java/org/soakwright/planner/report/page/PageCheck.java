package org.soakwright.planner.report.page;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import nu.validator.client.EmbeddedValidator;
import org.xml.sax.SAXException;

/** What every page of ours must be: valid HTML by the checker of the validator.nu project, whole without a network, usable by all. */
public final class PageCheck {
    private static final Pattern ID = Pattern.compile(" id=\"([^\"]*)\"");
    private static final Pattern LINK = Pattern.compile(" (?:href|src)=\"([^\"]*)\"");
    private static final Pattern HEADING = Pattern.compile("<h([1-6])[ >]");
    private static final Pattern HEADER_CELL = Pattern.compile("<th( [^>]*|)>");
    private static final Pattern SVG = Pattern.compile("<svg([^>]*)>");

    private PageCheck() {}

    /** Pages that lead to each other. */
    public static void assertSound(Map<String, String> pages, Set<String> files) {
        Set<String> known = new HashSet<>(files);
        pages.forEach((name, page) -> ids(page).forEach(id -> known.add(name + "#" + id)));
        pages.values().forEach(page -> assertSound(page, known));
    }

    static void assertSound(String page, Set<String> files) {
        assertValid(page);
        assertWhole(page, files);
        assertAccessible(page);
    }

    static void assertValid(String page) {
        // The checker greets on standard error unless it is told not to.
        System.setProperty("org.eclipse.jetty.util.log.announce", "false");
        EmbeddedValidator validator = new EmbeddedValidator();
        validator.setOutputFormat(EmbeddedValidator.OutputFormat.TEXT);
        try {
            String findings = validator.validate(new ByteArrayInputStream(page.getBytes(StandardCharsets.UTF_8)));
            assertTrue(findings.contains("No errors found."), findings);
        } catch (IOException | SAXException e) {
            throw new AssertionError(e);
        }
    }

    /** No address outside the folder, and none in it that is not there. */
    static void assertWhole(String page, Set<String> files) {
        String bare = page.replace("http://www.w3.org/2000/svg", "");
        assertFalse(bare.contains("http:") || bare.contains("https:") || bare.contains("//cdn"), "an address outside");
        assertFalse(bare.contains("@import") || bare.contains("url("), "a style sheet asks for more");
        assertFalse(bare.contains("<script"), "a script");
        Set<String> ids = ids(page);
        Matcher link = LINK.matcher(page);
        while (link.find()) {
            String to = link.group(1);
            boolean known =
                    to.startsWith("#") ? ids.contains(to.substring(1)) : to.startsWith("data:") || files.contains(to);
            assertTrue(known, "leads nowhere: " + to);
        }
    }

    private static Set<String> ids(String page) {
        Set<String> ids = new HashSet<>();
        Matcher id = ID.matcher(page);
        while (id.find()) {
            assertTrue(ids.add(id.group(1)), "twice: " + id.group(1));
        }
        return ids;
    }

    /** WCAG 2.2: 1.1.1 text alternatives, 1.3.1 headings and header cells, 2.4.1 a way past the links, 3.1.1 language. */
    static void assertAccessible(String page) {
        assertTrue(page.startsWith("<!DOCTYPE html>\n<html lang=\"en\">"));
        assertTrue(page.contains("class=\"skip\" href=\"#answer\""));
        List<Integer> levels = new ArrayList<>();
        Matcher heading = HEADING.matcher(page);
        while (heading.find()) {
            levels.add(Integer.parseInt(heading.group(1)));
        }
        assertEquals(1, levels.get(0));
        assertEquals(1, levels.stream().filter(level -> level == 1).count());
        for (int i = 1; i < levels.size(); i++) {
            assertTrue(levels.get(i) <= levels.get(i - 1) + 1, "a heading is left out: " + levels);
        }
        Matcher cell = HEADER_CELL.matcher(page);
        while (cell.find()) {
            assertTrue(cell.group(1).contains("scope=\""), "a header without scope: " + cell.group());
        }
        Matcher svg = SVG.matcher(page);
        while (svg.find()) {
            assertTrue(svg.group(1).contains("role=\"img\""), svg.group());
            assertTrue(svg.group(1).matches("(?s).* aria-label=\"[^\"]{40,}\".*"), "a picture without words");
        }
    }
}
