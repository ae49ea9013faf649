/** The arithmetic of what is not known exactly, on plain numbers: draws, chances, percentiles, shares of variance. Knows no recipe. */
@org.jspecify.annotations.NullMarked
package org.soakwright.planner.batch.doubt;
