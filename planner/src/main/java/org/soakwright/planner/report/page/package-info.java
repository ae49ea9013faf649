/** Reports: pages that stand alone, tables for spreadsheets, and the folder they go into together. */
@org.jspecify.annotations.NullMarked
package org.soakwright.planner.report.page;
