/** The batch sheet for whoever runs the batch, as a page and as paper. */
@org.jspecify.annotations.NullMarked
package org.soakwright.planner.report.paper;
