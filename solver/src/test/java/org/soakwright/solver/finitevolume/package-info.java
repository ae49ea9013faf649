/**
 * A second way to the same answers: finite volumes, exact in time, extrapolated in the mesh. It has its own records for
 * what goes in and shares no code with the solver; only the tests that compare the two know both.
 */
@org.jspecify.annotations.NullMarked
package org.soakwright.solver.finitevolume;
