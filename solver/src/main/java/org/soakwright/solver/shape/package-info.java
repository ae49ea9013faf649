/** The geometry of diffusion: one axis and the grades of pieces built on it. */
@org.jspecify.annotations.NullMarked
package org.soakwright.solver.shape;
