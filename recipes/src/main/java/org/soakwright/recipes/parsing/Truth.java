package org.soakwright.recipes.parsing;

import org.soakwright.recipes.model.Word;

/** A yes or a no. */
enum Truth implements Word {
    TRUE,
    FALSE
}
