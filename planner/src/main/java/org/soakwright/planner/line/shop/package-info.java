/**
 * Jobs on stations, in whole seconds from the line's start: what may happen when, and in which order it had better. Knows no recipe, no file and no
 * time zone; what goes on inside a piece is asked of a {@link org.soakwright.planner.line.shop.Physics}.
 */
@NullMarked
package org.soakwright.planner.line.shop;

import org.jspecify.annotations.NullMarked;
