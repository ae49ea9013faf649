package org.soakwright.planner.report;

import java.util.ArrayList;
import java.util.List;

/** Sentences broken into lines. */
final class Prose {
    /** The widest line of any sheet, in characters. */
    static final int WIDTH = 100;

    private Prose() {}

    static List<String> lines(String text) {
        return lines("", "", text);
    }

    /** A point of a list. */
    static List<String> point(String text) {
        return lines("  - ", "    ", text);
    }

    /** Breaks at spaces only; a word longer than a line stands alone. */
    static List<String> lines(String firstIndent, String indent, String text) {
        List<String> lines = new ArrayList<>();
        StringBuilder line = new StringBuilder(firstIndent);
        boolean empty = true;
        for (String word : text.strip().split(" +", -1)) {
            if (!empty && length(line) + 1 + length(word) > WIDTH) {
                lines.add(line.toString());
                line = new StringBuilder(indent);
                empty = true;
            }
            line.append(empty ? "" : " ").append(word);
            empty = false;
        }
        lines.add(line.toString());
        return lines;
    }

    static int length(CharSequence text) {
        return Character.codePointCount(text, 0, text.length());
    }

    /** At most so many characters, an ellipsis for what is left out. */
    static String clipped(String text, int most) {
        return length(text) <= most ? text : text.substring(0, text.offsetByCodePoints(0, most - 1)) + "…";
    }
}
