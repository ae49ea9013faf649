/** Places, problems, units and the YAML tree: how what people write becomes text with a place and numbers with a unit. */
@NullMarked
package org.soakwright.recipes.text;

import org.jspecify.annotations.NullMarked;
