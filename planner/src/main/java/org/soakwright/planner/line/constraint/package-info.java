/**
 * A shop as a constraint program: improves a schedule and proves how good any can be. The only place that knows the constraint solver, which is
 * native code and may be missing.
 */
@NullMarked
package org.soakwright.planner.line.constraint;

import org.jspecify.annotations.NullMarked;
