/** JSON text read into plain values, for whoever reads results back. */
@NullMarked
package org.soakwright.planner.json;

import org.jspecify.annotations.NullMarked;
