package org.soakwright.solver.finitevolume;

/**
 * A corner of the profile at the start. Corners lie on nodes of every mesh used: a kink between nodes would spoil the
 * extrapolation.
 *
 * @param eighth the node at this many eighths of the mesh, 0 to 8
 * @param content kg/m3
 */
record Corner(int eighth, double content) {}
