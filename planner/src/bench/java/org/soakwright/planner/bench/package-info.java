/** How long the solver and the planner take, and how long another method would: timed on request, no part of the product. */
@org.jspecify.annotations.NullMarked
package org.soakwright.planner.bench;
