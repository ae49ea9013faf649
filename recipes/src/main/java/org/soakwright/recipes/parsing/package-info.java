/** From the YAML tree to the model: the keys of the language, read with every problem of a file in one pass. */
@NullMarked
package org.soakwright.recipes.parsing;

import org.jspecify.annotations.NullMarked;
