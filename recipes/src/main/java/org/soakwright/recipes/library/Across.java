package org.soakwright.recipes.library;

import org.soakwright.recipes.model.Word;

/** Why a source gives a range instead of one value. */
public enum Across implements Word {
    /** The first value belongs to the lowest temperature of the entry, the last to the highest. */
    TEMPERATURE,
    /** Different samples, varieties or species under the same conditions. */
    SAMPLES,
    /** Different conditions, such as liquors, treatments or contents; temperature may be among them. */
    CONDITIONS,
    /** What was read does not say. */
    UNSAID
}
