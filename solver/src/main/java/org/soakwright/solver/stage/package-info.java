/** One stage of a chain: what the pieces meet, and the orthogonal modes in which that stage decays. */
@org.jspecify.annotations.NullMarked
package org.soakwright.solver.stage;
