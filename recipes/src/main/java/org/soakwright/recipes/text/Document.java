package org.soakwright.recipes.text;

/** What a file is to hold, for its size and for messages. */
public enum Document {
    RECIPE("recipe", 1 << 20, "a recipe needs a few kilobytes", 10_000, "a recipe needs a few hundred", "language: 1"),
    LINE("line", 2 << 20, "a line of 5000 lots needs less", 100_000, "a line of 5000 lots needs fewer", "a title"),
    LIST("list", 8 << 20, "a list of 100 000 pieces needs less", 0, "", ""),
    LOTS("list", 2 << 20, "a list of 5000 lots needs less", 0, "", ""),
    RESULT("result", 64 << 20, "a result of 5000 lots needs less", 0, "", "");

    final String label;

    /** The largest read. */
    final int mostBytes;

    final String enoughBytes;

    /** Far more than any; bounds the work and the problems of a hostile file. */
    final int mostValues;

    final String enoughValues;

    /** How one begins. */
    final String first;

    Document(String label, int mostBytes, String enoughBytes, int mostValues, String enoughValues, String first) {
        this.label = label;
        this.mostBytes = mostBytes;
        this.enoughBytes = enoughBytes;
        this.mostValues = mostValues;
        this.enoughValues = enoughValues;
        this.first = first;
    }
}
