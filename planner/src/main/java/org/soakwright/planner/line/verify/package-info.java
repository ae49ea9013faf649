/**
 * Checks a result of {@code line} against the line as written. Plain and slow on purpose: it shares no code with whatever made the schedule, so that
 * both are wrong in the same way only by chance.
 */
@NullMarked
package org.soakwright.planner.line.verify;

import org.jspecify.annotations.NullMarked;
