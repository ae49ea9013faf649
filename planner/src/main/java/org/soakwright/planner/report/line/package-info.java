/** What a planned line hands over: a sheet, JSON, a folder with chart, dispatch list, sheets of the lots, tables and a calendar. */
@org.jspecify.annotations.NullMarked
package org.soakwright.planner.report.line;
