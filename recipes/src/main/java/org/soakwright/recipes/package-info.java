/** The public face: a recipe file in, a recipe or its problems out. */
@NullMarked
package org.soakwright.recipes;

import org.jspecify.annotations.NullMarked;
