package org.soakwright.solver.finitevolume;

import java.util.List;

/**
 * A lot of bodies of one or several axes, and the phases it goes through.
 *
 * @param start content of every body as loaded, kg/m3
 */
record Batch(List<Solid> lot, double start, List<Phase> phases) {}
