/**
 * Many lots on few vessels: a line's recipes turned into jobs, scheduled, followed exactly with their real times, explained.
 */
@NullMarked
package org.soakwright.planner.line;

import org.jspecify.annotations.NullMarked;
