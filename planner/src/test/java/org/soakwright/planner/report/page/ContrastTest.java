package org.soakwright.planner.report.page;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.junit.jupiter.api.Test;

/** WCAG 2.2, success criterion 1.4.3: letters stand out from their ground by 4.5 to 1 or more, in light and in dark. */
class ContrastTest {
    private static final Pattern VARIABLE = Pattern.compile("--([a-z0-9-]+): ?(#[0-9a-f]{6}|var\\(--([a-z0-9-]+)\\));");

    /** The colours of a page's style sheet, those for dark screens over the others where wanted. */
    private static Map<String, String> colours(boolean dark) throws IOException {
        String page = Reports.text(Reports.followed(Reports.recipe("washing.yaml")), "index.html");
        String style = page.substring(page.indexOf("<style>"), page.indexOf("</style>"));
        Map<String, String> colours = new HashMap<>();
        for (String block : style.split("(?=@media)", -1)) {
            boolean isDark = block.startsWith("@media (prefers-color-scheme");
            // What follows the end of a media block is for every screen again.
            int end = isDark ? block.replace("} }", "}}").replace("}\n}", "}}").indexOf("}}") : 0;
            if (block.startsWith("@media print")) {
                end = block.replace("}\n}", "}}").indexOf("}}");
            }
            take(colours, isDark && dark ? block : block.substring(Math.max(0, end)));
        }
        return colours;
    }

    private static void take(Map<String, String> colours, String rules) {
        Matcher matcher = VARIABLE.matcher(rules);
        while (matcher.find()) {
            colours.put(matcher.group(1), matcher.group(2));
        }
    }

    private static String resolved(Map<String, String> colours, String name) {
        String value = colours.getOrDefault(name, "missing: " + name);
        return value.startsWith("var(") ? resolved(colours, value.substring(6, value.length() - 1)) : value;
    }

    /** WCAG 2.2, definitions of relative luminance and contrast ratio. */
    private static double contrast(String one, String other) {
        double a = luminance(one);
        double b = luminance(other);
        return (Math.max(a, b) + 0.05) / (Math.min(a, b) + 0.05);
    }

    private static double luminance(String hex) {
        int rgb = Integer.parseInt(hex.substring(1), 16);
        return 0.2126 * linear(rgb >> 16) + 0.7152 * linear(rgb >> 8 & 255) + 0.0722 * linear(rgb & 255);
    }

    private static double linear(int channel) {
        double c = channel / 255.0;
        return c <= 0.04045 ? c / 12.92 : Math.pow((c + 0.055) / 1.055, 2.4);
    }

    @Test
    void theFormulaIsThatOfTheStandard() {
        assertEquals(21, contrast("#000000", "#ffffff"), 1e-12);
        // Often quoted as the lightest grey that passes on white: 4.54 to 1, from memory.
        assertEquals(4.54, contrast("#767676", "#ffffff"), 0.005);
    }

    @Test
    void lettersCanBeReadInLightAndInDark() throws IOException {
        for (boolean dark : new boolean[] {false, true}) {
            Map<String, String> colours = colours(dark);
            for (String ground : List.of("page", "panel")) {
                for (String letters : List.of("text", "second", "link", "good", "bad")) {
                    double contrast = contrast(resolved(colours, letters), resolved(colours, ground));
                    assertTrue(
                            contrast >= 4.5,
                            letters + " on " + ground + (dark ? " in dark: " : " in light: ") + contrast);
                }
            }
        }
        assertTrue(!colours(true).equals(colours(false)), "two sets of colours");
    }
}
