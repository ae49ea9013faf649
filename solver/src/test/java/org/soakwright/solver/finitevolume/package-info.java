/**
 * A second way to the same answers: finite volumes, exact in time, extrapolated in the mesh. It has its own records for
 * what goes in and shares no code with the solver; only the tests that compare the two know both.
 *
 * <p>Bodies of several axes are followed as products of each axis's waves ({@link org.soakwright.solver.finitevolume.Solids}), on
 * finite volumes or on elements of a high degree, which reach the volumes' limit with far fewer nodes. One axis followed both
 * ways, a law assembled cell by cell and Newman's products check that form itself.
 */
@org.jspecify.annotations.NullMarked
package org.soakwright.solver.finitevolume;
