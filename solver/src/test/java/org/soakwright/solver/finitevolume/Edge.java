package org.soakwright.solver.finitevolume;

/**
 * One way out of a body of several.
 *
 * @param power 0 towards a plate's face, 1 radially in a cylinder, 2 in a sphere
 * @param length m, from the core to the wetted face
 * @param direction which of a phase's factors holds along it
 */
record Edge(int power, double length, int direction) {}
