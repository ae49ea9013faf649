/** Two batches side by side, each known by its result. */
@org.jspecify.annotations.NullMarked
package org.soakwright.planner.report.compare;
