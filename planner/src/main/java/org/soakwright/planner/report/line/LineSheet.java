package org.soakwright.planner.report.line;

import org.soakwright.planner.line.LinePlan;
import org.soakwright.planner.report.BatchSheet;
import org.soakwright.planner.report.Style;

/** A planned line on a terminal: plain text, lines of at most 100 characters. */
public final class LineSheet {
    private LineSheet() {}

    public static String of(LinePlan plan, Style style) {
        return BatchSheet.of(LineFindings.of(plan), style);
    }
}
