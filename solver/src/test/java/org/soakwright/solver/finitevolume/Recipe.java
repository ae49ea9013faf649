package org.soakwright.solver.finitevolume;

import java.util.List;

/** A lot, the profile all its bodies start with, and the steps it goes through. */
record Recipe(List<Body> lot, List<Corner> start, List<Step> steps) {}
