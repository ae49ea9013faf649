/** A lot carried through successive stages: profiles, readings, gradients and the error they were reached with. */
@org.jspecify.annotations.NullMarked
package org.soakwright.solver.chain;
