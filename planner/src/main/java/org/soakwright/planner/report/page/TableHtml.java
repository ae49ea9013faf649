package org.soakwright.planner.report.page;

import java.util.List;
import org.soakwright.planner.report.Table;

/** A table as markup: headers with their scope, grouped cells said once, figures on their decimal points. */
final class TableHtml {
    private final Html html;
    private final Table table;
    private final List<Table.Column> columns;
    private final int[][] shifts;
    /** Columns that hold anything: paper has no need of the others. */
    private final boolean[] shown;

    private TableHtml(Html html, Table table) {
        this.html = html;
        this.table = table;
        columns = table.columns();
        shifts = new int[columns.size()][];
        shown = new boolean[columns.size()];
        for (int j = 0; j < shifts.length; j++) {
            shifts[j] = table.shifts(j);
            int column = j;
            shown[j] = table.rows().stream()
                    .anyMatch(
                            row -> !row.isHeading() && !row.cells().get(column).isBlank());
        }
    }

    static void write(Html html, String labelledBy, Table table) {
        html.open("table", "aria-labelledby", labelledBy);
        new TableHtml(html, table).write();
        html.close();
    }

    private void write() {
        html.open("thead").open("tr");
        for (int j = 0; j < columns.size(); j++) {
            if (shown[j]) {
                html.open("th", "scope", "col", "class", kind(columns.get(j)))
                        .words(columns.get(j).spoken())
                        .close();
            }
        }
        html.close().close();
        html.open("tbody");
        for (int i = 0; i < table.rows().size(); i++) {
            Table.Row row = table.rows().get(i);
            if (row.isHeading()) {
                heading(i, row);
            } else {
                row(i, row);
            }
        }
        html.close();
    }

    /** Each heading begins a body of its own. */
    private void heading(int i, Table.Row row) {
        if (i > 0) {
            html.close().open("tbody");
        }
        html.open("tr");
        html.open("th", "scope", "rowgroup", "class", "heading", "colspan", Integer.toString(count(shown)))
                .words(row.cells().get(0))
                .close();
        html.close();
    }

    private void row(int i, Table.Row row) {
        html.open("tr");
        for (int j = 0; j < columns.size(); j++) {
            if (shown[j] && !table.repeats(i, j)) {
                cell(i, j, row.cells().get(j).strip());
            }
        }
        html.close();
    }

    private void cell(int i, int j, String content) {
        Table.Column column = columns.get(j);
        int rows = 1;
        while (i + rows < table.rows().size() && table.repeats(i + rows, j)) {
            rows++;
        }
        boolean head = j == table.headColumn();
        String kind = kind(column);
        if (column.kind() == Table.Kind.VERDICT) {
            kind += Table.isGood(content) ? " good" : " bad";
        } else if (shifts[j][i] > 0) {
            kind += " shift-" + Math.min(shifts[j][i], 6);
        }
        if (rows > 1) {
            String scope = head ? "rowgroup" : "";
            open(head, scope, kind, "rowspan", Integer.toString(rows));
        } else {
            open(head, "row", kind);
        }
        html.words(content).close();
    }

    private void open(boolean head, String scope, String kind, String... more) {
        String[] first = head ? new String[] {"scope", scope, "class", kind} : new String[] {"class", kind};
        String[] all = java.util.Arrays.copyOf(first, first.length + more.length);
        System.arraycopy(more, 0, all, first.length, more.length);
        html.open(head ? "th" : "td", all);
    }

    private static int count(boolean[] all) {
        int count = 0;
        for (boolean one : all) {
            count += one ? 1 : 0;
        }
        return count;
    }

    private static String kind(Table.Column column) {
        return switch (column.kind()) {
            case TEXT -> "text";
            case NUMBER -> "number";
            case VERDICT -> "verdict";
        };
    }
}
