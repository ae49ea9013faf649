/** Checks of the solver against printed tables, worked examples and references of higher precision. */
@org.jspecify.annotations.NullMarked
package org.soakwright.solver.published;
