package org.soakwright.planner.report;

import java.util.ArrayList;
import java.util.List;

/** Reads a text of comma-separated values as RFC 4180 describes it, and refuses any other. */
public final class CsvText {
    private CsvText() {}

    /** Rows of cells, the header among them. */
    public static List<List<String>> read(String text) {
        List<List<String>> rows = new ArrayList<>();
        List<String> row = new ArrayList<>();
        int at = 0;
        while (at < text.length()) {
            StringBuilder cell = new StringBuilder();
            if (text.charAt(at) == '"') {
                at++;
                while (text.charAt(at) != '"' || text.startsWith("\"\"", at)) {
                    at += text.charAt(at) == '"' ? 1 : 0;
                    cell.append(text.charAt(at++));
                }
                at++;
            } else {
                while (text.charAt(at) != ',' && text.charAt(at) != '\r') {
                    if (text.charAt(at) == '"' || text.charAt(at) == '\n') {
                        throw new AssertionError("bare quote or line feed at " + at);
                    }
                    cell.append(text.charAt(at++));
                }
            }
            row.add(cell.toString());
            if (text.startsWith("\r\n", at)) {
                rows.add(List.copyOf(row));
                row.clear();
                at += 2;
            } else if (text.charAt(at) == ',') {
                at++;
            } else {
                throw new AssertionError("neither comma nor end of line at " + at);
            }
        }
        if (!row.isEmpty()) {
            throw new AssertionError("the last line has no end");
        }
        return rows;
    }
}
