package org.soakwright.planner.report;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.function.BiFunction;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/** Rows under a header, numbers aligned on their decimal points, never wider than a sheet as long as the numbers fit. */
final class Table {
    private static final String INDENT = "  ";
    private static final String GAP = "  ";
    private static final int NARROWEST_TEXT = 8;
    private static final Pattern NUMBER = Pattern.compile("([-+~]?[0-9]+)(.*)");

    private record Column(String header, boolean isNumber, BiFunction<Style, String, String> paint) {}

    private final List<Column> columns = new ArrayList<>();
    private final List<String[]> rows = new ArrayList<>();

    /** A column flush left, shortened where the table would be too wide. */
    Table text(String header) {
        return text(header, (style, text) -> text);
    }

    /** A column flush left, each cell painted. */
    Table text(String header, BiFunction<Style, String, String> paint) {
        columns.add(new Column(header, false, paint));
        return this;
    }

    /** A column on the decimal point. */
    Table number(String header) {
        columns.add(new Column(header, true, (style, text) -> text));
        return this;
    }

    void row(List<String> cells) {
        if (cells.size() != columns.size()) {
            throw new IllegalArgumentException(columns.size() + " cells wanted, found " + cells);
        }
        rows.add(cells.toArray(String[]::new));
    }

    /** A line of its own above the rows that follow. */
    void heading(String text) {
        rows.add(new String[] {text});
    }

    boolean isEmpty() {
        return rows.isEmpty();
    }

    List<String> lines(Style style) {
        alignNumbers();
        int[] widths = widths();
        List<String> lines = new ArrayList<>();
        String[] header = columns.stream().map(Column::header).toArray(String[]::new);
        lines.add(style.faint(line(header, widths, Style.PLAIN)));
        rows.forEach(row ->
                lines.add(isHeading(row) ? Prose.clipped(INDENT + row[0], Prose.WIDTH) : line(row, widths, style)));
        return lines;
    }

    private String line(String[] cells, int[] widths, Style style) {
        StringBuilder line = new StringBuilder(INDENT);
        StringBuilder pending = new StringBuilder();
        for (int i = 0; i < cells.length; i++) {
            String text = Prose.clipped(cells[i], widths[i]);
            if (!text.isEmpty()) {
                line.append(pending).append(columns.get(i).paint().apply(style, text));
                pending.setLength(0);
            }
            pending.append(" ".repeat(widths[i] - Prose.length(text))).append(GAP);
        }
        return line.toString();
    }

    private static boolean isHeading(String[] row) {
        return row.length == 1;
    }

    private List<String[]> cells() {
        return rows.stream().filter(row -> !isHeading(row)).toList();
    }

    private void alignNumbers() {
        for (int i = 0; i < columns.size(); i++) {
            if (columns.get(i).isNumber()) {
                int before = 0;
                for (String[] row : cells()) {
                    before = Math.max(before, whole(row[i]));
                }
                for (String[] row : cells()) {
                    int whole = whole(row[i]);
                    row[i] = whole == 0 ? row[i] : " ".repeat(before - whole) + row[i];
                }
            }
        }
    }

    /** Characters before the decimal point; 0 where there is no number. */
    private static int whole(String cell) {
        Matcher matcher = NUMBER.matcher(cell);
        return matcher.matches() ? matcher.group(1).length() : 0;
    }

    private int[] widths() {
        int[] widths = new int[columns.size()];
        for (int i = 0; i < widths.length; i++) {
            widths[i] = Prose.length(columns.get(i).header());
            for (String[] row : cells()) {
                widths[i] = Math.max(widths[i], Prose.length(row[i]));
            }
        }
        int room = Prose.WIDTH - INDENT.length() - GAP.length() * (widths.length - 1);
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
        for (int i = 0; i < widths.length; i++) {
            if (!columns.get(i).isNumber()
                    && widths[i] > NARROWEST_TEXT
                    && (widest < 0 || widths[i] > widths[widest])) {
                widest = i;
            }
        }
        return widest;
    }
}
