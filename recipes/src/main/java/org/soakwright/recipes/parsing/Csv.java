package org.soakwright.recipes.parsing;

import java.util.ArrayList;
import java.util.List;
import org.soakwright.recipes.text.Place;
import org.soakwright.recipes.text.Shown;
import org.soakwright.recipes.text.Unsound;

/** One line of separated values: cells may be quoted, a quote within them doubled. No cell spans lines. */
final class Csv {
    /** A cell without the space around it, and where it begins. */
    record Cell(Place place, String text) {}

    private final String file;
    private final int number;
    private final String line;
    private final char separator;
    private int at;

    private Csv(String file, int number, String line, char separator) {
        this.file = file;
        this.number = number;
        this.line = line;
        this.separator = separator;
    }

    /** Semicolons where the header has one outside of quotes, else commas. */
    static char separator(String header) {
        boolean quoted = false;
        for (int i = 0; i < header.length(); i++) {
            char c = header.charAt(i);
            quoted ^= c == '"';
            if (c == ';' && !quoted) {
                return ';';
            }
        }
        return ',';
    }

    /**
     * The cells of a line, one at least.
     *
     * @throws Unsound where quotes do not match
     */
    static List<Cell> cells(String file, int number, String line, char separator) {
        return new Csv(file, number, line, separator).cells();
    }

    private List<Cell> cells() {
        List<Cell> cells = new ArrayList<>();
        cells.add(cell());
        while (at < line.length()) {
            at++;
            cells.add(cell());
        }
        return cells;
    }

    /** Up to the next separator or the end. */
    private Cell cell() {
        while (at < line.length() && line.charAt(at) != separator && Character.isWhitespace(line.charAt(at))) {
            at++;
        }
        Place place = new Place(file, number, line.codePointCount(0, at) + 1);
        if (at < line.length() && line.charAt(at) == '"') {
            return new Cell(place, quoted(place));
        }
        int end = line.indexOf(separator, at);
        String text = line.substring(at, end < 0 ? line.length() : end);
        at += text.length();
        return new Cell(place, text.strip());
    }

    private String quoted(Place place) {
        int start = at;
        StringBuilder text = new StringBuilder();
        for (at++; at < line.length(); at++) {
            if (line.charAt(at) != '"') {
                text.append(line.charAt(at));
            } else if (at + 1 < line.length() && line.charAt(at + 1) == '"') {
                text.append('"');
                at++;
            } else {
                at++;
                ends(place, start);
                return text.toString().strip();
            }
        }
        throw new Unsound(
                place,
                "a quote that is not closed: found " + Shown.quoted(line.substring(start))
                        + "; close it on the same line");
    }

    private void ends(Place place, int start) {
        while (at < line.length() && line.charAt(at) != separator) {
            if (!Character.isWhitespace(line.charAt(at))) {
                throw new Unsound(
                        place,
                        "a quoted cell ends with its quote: found " + Shown.quoted(line.substring(start))
                                + "; double the quotes within it");
            }
            at++;
        }
    }
}
