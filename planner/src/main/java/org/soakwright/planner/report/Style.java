package org.soakwright.planner.report;

/** How a sheet sets words apart. Chosen by whoever knows what the sheet is written to; the words are the same in both. */
public enum Style {
    /** Not at all: for files, pipes and people who want no colour. */
    PLAIN,
    /** By the escape sequences of ECMA-48 that terminals obey. */
    ANSI;

    private static final String OFF = "\u001b[0m";

    String heading(String text) {
        return with("\u001b[1m", text);
    }

    String faint(String text) {
        return with("\u001b[2m", text);
    }

    String good(String text) {
        return with("\u001b[32m", text);
    }

    String bad(String text) {
        return with("\u001b[1;31m", text);
    }

    private String with(String on, String text) {
        return this == PLAIN || text.isBlank() ? text : on + text + OFF;
    }
}
