/** Published property values and usual cautions, each with its source; read from data files packaged beside these classes. */
@NullMarked
package org.soakwright.recipes.library;

import org.jspecify.annotations.NullMarked;
