package org.soakwright.planner.report.paper;

import java.util.regex.Pattern;

/** Keeps numbers and their units on one line. */
final class Glue {
    static final char NO_BREAK = '\u00a0';

    private static final Pattern NUMBER_AND_UNIT =
            Pattern.compile("(?<=\\d) (?=(?:d|h|min|s|m3|L|kg|g|mm|cm|%|°C|L/min|g/L|g/kg|kg/m3)(?![\\p{Alnum}]))");

    private Glue() {}

    /** The same text with spaces at which no line may end. */
    static String of(String text) {
        return NUMBER_AND_UNIT.matcher(text).replaceAll(String.valueOf(NO_BREAK));
    }
}
