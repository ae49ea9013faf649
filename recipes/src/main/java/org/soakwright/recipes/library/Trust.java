package org.soakwright.recipes.library;

import org.soakwright.recipes.model.Word;

/** How far a figure is to be trusted, the best first. */
public enum Trust implements Word {
    /** By those who publish it. */
    MEASURED,
    /** Taken over from others' measurements by a review or a table. */
    COMPILED,
    /** Worked out or guessed by those who publish it. */
    ESTIMATED,
    /** No source was opened: remembered, to be looked up before it decides anything. */
    FROM_MEMORY;

    @Override
    public String word() {
        return Word.super.word().replace('-', ' ');
    }
}
