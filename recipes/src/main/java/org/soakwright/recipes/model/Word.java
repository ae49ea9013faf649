package org.soakwright.recipes.model;

import java.util.Collection;
import java.util.Locale;
import java.util.stream.Collectors;

/** A choice the language writes as one lower-case word. */
public interface Word {
    String name();

    /** As written in a recipe. */
    default String word() {
        return name().toLowerCase(Locale.ROOT).replace('_', '-');
    }

    /** Several, as listed in a message. */
    static String list(Collection<? extends Word> words) {
        return words.stream().map(Word::word).collect(Collectors.joining(", "));
    }
}
