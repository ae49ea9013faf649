/**
 * Published correlations: films around pieces in moving, still, stirred and percolating liquor; water, brine, sugar
 * solution and moist air; diffusivities carried to another temperature. Each says its range, its source and how far it
 * may be off, and whether the source was read or stands here from memory; what lies outside a range is refused or
 * comes with a caution.
 */
@org.jspecify.annotations.NullMarked
package org.soakwright.solver.transport;
