/**
 * What physics says: diffusion of solutes in solid pieces through a chain of stages. SI doubles go in, readings come
 * out; no file, no unit text and no clock is known here.
 */
@org.jspecify.annotations.NullMarked
package org.soakwright.solver;
