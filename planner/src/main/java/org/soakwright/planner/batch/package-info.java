/** One batch: a recipe translated into chains, its targets, and the choice of what is free. */
@org.jspecify.annotations.NullMarked
package org.soakwright.planner.batch;
