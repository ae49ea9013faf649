package org.soakwright.recipes.library;

import java.util.Collection;
import java.util.List;
import java.util.Locale;
import java.util.regex.Pattern;

/** Words for one thing, found as whole words in what people write, whatever the case and the marks between. */
public record WordList(String name, List<String> words) {
    private static final Pattern BETWEEN = Pattern.compile("[^\\p{L}\\p{N}]+");

    public WordList {
        words = List.copyOf(words);
    }

    boolean in(String text) {
        String plain = plain(text);
        return words.stream().anyMatch(word -> plain.contains(plain(word)));
    }

    boolean inAny(Collection<String> texts) {
        return texts.stream().anyMatch(this::in);
    }

    private static String plain(String text) {
        return " "
                + BETWEEN.matcher(text.toLowerCase(Locale.ROOT)).replaceAll(" ").strip() + " ";
    }
}
