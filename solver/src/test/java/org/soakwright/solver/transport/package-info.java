/** Checks of the correlations against tables, worked examples and other formulas of the same thing. */
@org.jspecify.annotations.NullMarked
package org.soakwright.solver.transport;
