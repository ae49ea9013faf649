package org.soakwright.planner.report;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

/** A table in plain text, never wider than a sheet as long as the numbers fit. */
final class TableText {
    private static final String INDENT = "  ";
    private static final String GAP = "  ";
    private static final int NARROWEST_TEXT = 8;

    private final Table table;
    private final List<Table.Column> columns;
    /** Under headings rows stand a little to the right. */
    private final String indent;
    /** One for each row; a heading has a single cell. */
    private final List<String[]> cells = new ArrayList<>();

    private TableText(Table table) {
        this.table = table;
        columns = table.columns();
        indent = table.rows().stream().anyMatch(Table.Row::isHeading) ? INDENT + INDENT : INDENT;
    }

    static List<String> lines(Table table, Style style) {
        return new TableText(table).lines(style);
    }

    private List<String> lines(Style style) {
        fill();
        int[] widths = widths();
        List<String> lines = new ArrayList<>();
        if (columns.stream().anyMatch(column -> !column.header().isEmpty())) {
            String[] header = columns.stream().map(Table.Column::header).toArray(String[]::new);
            lines.add(style.faint(line(header, widths, Style.PLAIN)));
        }
        for (int i = 0; i < cells.size(); i++) {
            String[] row = cells.get(i);
            boolean heading = table.rows().get(i).isHeading();
            lines.add(heading ? Prose.clipped(INDENT + row[0], Prose.WIDTH) : line(row, widths, style));
        }
        return lines;
    }

    private void fill() {
        for (Table.Row row : table.rows()) {
            cells.add(row.cells().toArray(String[]::new));
        }
        for (int j = 0; j < columns.size(); j++) {
            int[] shifts = table.shifts(j);
            for (int i = 0; i < shifts.length; i++) {
                if (!table.rows().get(i).isHeading()) {
                    String[] row = cells.get(i);
                    row[j] = table.repeats(i, j) ? "" : " ".repeat(shifts[i]) + row[j];
                }
            }
        }
    }

    private String line(String[] row, int[] widths, Style style) {
        StringBuilder line = new StringBuilder(indent);
        StringBuilder pending = new StringBuilder();
        for (int j = 0; j < row.length; j++) {
            String text = Prose.clipped(row[j], widths[j]);
            if (!text.isEmpty()) {
                line.append(pending).append(painted(columns.get(j), text, style));
                pending.setLength(0);
            }
            pending.append(" ".repeat(widths[j] - Prose.length(text))).append(GAP);
        }
        return line.toString();
    }

    private static String painted(Table.Column column, String text, Style style) {
        if (column.kind() != Table.Kind.VERDICT) {
            return text;
        }
        return Table.isGood(text) ? style.good(text) : style.bad(text);
    }

    private int[] widths() {
        int[] widths = new int[columns.size()];
        for (int j = 0; j < widths.length; j++) {
            widths[j] = Prose.length(columns.get(j).header());
            for (int i = 0; i < cells.size(); i++) {
                if (!table.rows().get(i).isHeading()) {
                    widths[j] = Math.max(widths[j], Prose.length(cells.get(i)[j]));
                }
            }
        }
        int room = Prose.WIDTH - indent.length() - GAP.length() * (widths.length - 1);
        while (Arrays.stream(widths).sum() > room) {
            int widest = widestText(widths);
            if (widest < 0) {
                break;
            }
            widths[widest]--;
        }
        return widths;
    }

    private int widestText(int[] widths) {
        int widest = -1;
        for (int j = 0; j < widths.length; j++) {
            if (columns.get(j).kind() != Table.Kind.NUMBER
                    && widths[j] > NARROWEST_TEXT
                    && (widest < 0 || widths[j] > widths[widest])) {
                widest = j;
            }
        }
        return widest;
    }
}
