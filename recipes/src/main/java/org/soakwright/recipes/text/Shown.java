package org.soakwright.recipes.text;

/** Text from a file as it may appear in a message: one line, quoted, of bounded length, nothing a terminal would obey. */
public final class Shown {
    private static final int LONGEST = 60;

    private Shown() {}

    public static String quoted(String text) {
        return "\"" + plain(text, LONGEST) + "\"";
    }

    /** Without quotes, cut after as many characters. */
    static String plain(String text, int longest) {
        StringBuilder shown = new StringBuilder();
        text.codePoints().limit(longest).forEach(c -> {
            if (isPlain(c)) {
                shown.appendCodePoint(c);
            } else {
                shown.append(String.format("\\u%04x", c));
            }
        });
        boolean cut = text.codePointCount(0, text.length()) > longest;
        return shown.append(cut ? "…" : "").toString();
    }

    /** Whether every character is one that prints on a line. */
    public static boolean isOneLine(String text) {
        return text.codePoints().allMatch(Shown::isPlain);
    }

    private static boolean isPlain(int c) {
        int type = Character.getType(c);
        return type != Character.CONTROL
                && type != Character.FORMAT
                && type != Character.SURROGATE
                && type != Character.LINE_SEPARATOR
                && type != Character.PARAGRAPH_SEPARATOR
                && type != Character.UNASSIGNED;
    }
}
