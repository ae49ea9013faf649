/** Pictures of a batch: one look, drawn as SVG or on any surface. */
@org.jspecify.annotations.NullMarked
package org.soakwright.planner.report.picture;
