/** Results as people and programs read them: sheets for the terminal and JSON. */
@org.jspecify.annotations.NullMarked
package org.soakwright.planner.report;
