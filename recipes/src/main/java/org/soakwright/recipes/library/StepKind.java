package org.soakwright.recipes.library;

import org.soakwright.recipes.model.Step;
import org.soakwright.recipes.model.Word;

/** The kinds of step that a caution tells apart. */
public enum StepKind implements Word {
    SOAK,
    RINSE,
    REST,
    DRY;

    public static StepKind of(Step step) {
        if (step instanceof Step.Soak) {
            return SOAK;
        }
        if (step instanceof Step.Rinse) {
            return RINSE;
        }
        return step instanceof Step.Rest ? REST : DRY;
    }
}
