package org.soakwright.planner.report;

import java.util.ArrayList;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/** Rows under a header, as content: {@link TableText} and pages show it. Cells are words and figures ready to be read. */
public final class Table {
    private static final Pattern NUMBER = Pattern.compile("([-+~]?[0-9]+)(.*)");

    /** How the cells of a column are to be read. */
    public enum Kind {
        /** Words. */
        TEXT,
        /** Figures, perhaps with a unit, to be aligned on their decimal points. */
        NUMBER,
        /** Words that say whether something is good: {@link #isGood}. */
        VERDICT
    }

    /**
     * One column.
     *
     * @param header as shown where room is short; may be empty
     * @param spoken the header in full
     * @param grouped whether a cell like the one above it, in a row whose grouped cells before it are like those above as well,
     *     need not be said again
     */
    public record Column(String header, String spoken, Kind kind, boolean grouped) {}

    /** One row; a heading is a single cell above the rows that follow. */
    public record Row(List<String> cells, boolean isHeading) {
        public Row {
            cells = List.copyOf(cells);
        }
    }

    private final List<Column> columns = new ArrayList<>();
    private final List<Row> rows = new ArrayList<>();

    public Table text(String header) {
        return column(header, header, Kind.TEXT, false);
    }

    /** Text that is said once for the rows it belongs to. */
    public Table group(String header) {
        return column(header, header, Kind.TEXT, true);
    }

    public Table number(String header) {
        return column(header, header, Kind.NUMBER, false);
    }

    public Table verdict(String spoken) {
        return column("", spoken, Kind.VERDICT, false);
    }

    public Table column(String header, String spoken, Kind kind, boolean grouped) {
        columns.add(new Column(header, spoken, kind, grouped));
        return this;
    }

    public void row(List<String> cells) {
        if (cells.size() != columns.size()) {
            throw new IllegalArgumentException(columns.size() + " cells wanted, found " + cells);
        }
        rows.add(new Row(cells, false));
    }

    /** A line of its own above the rows that follow. */
    public void heading(String text) {
        rows.add(new Row(List.of(text), true));
    }

    public List<Column> columns() {
        return List.copyOf(columns);
    }

    public List<Row> rows() {
        return List.copyOf(rows);
    }

    /** Whether a sheet is wide enough for all of it. */
    public boolean fitsASheet() {
        return TableText.fits(this);
    }

    public boolean isEmpty() {
        return rows.isEmpty();
    }

    /** Whether a cell of a grouped column repeats what stands above it. */
    public boolean repeats(int row, int column) {
        if (row == 0 || rows.get(row).isHeading() || rows.get(row - 1).isHeading()) {
            return false;
        }
        for (int i = 0; i <= column; i++) {
            boolean matters = columns.get(i).grouped();
            if (matters
                    && !rows.get(row)
                            .cells()
                            .get(i)
                            .equals(rows.get(row - 1).cells().get(i))) {
                return false;
            }
        }
        return columns.get(column).grouped();
    }

    /** What a row is about: its first column of words. */
    public int headColumn() {
        for (int i = 0; i < columns.size(); i++) {
            if (columns.get(i).kind() == Kind.TEXT) {
                return i;
            }
        }
        return 0;
    }

    /** For each row how many characters its cell of a column of figures lacks before the decimal point, compared with the longest. */
    public int[] shifts(int column) {
        int[] shifts = new int[rows.size()];
        if (columns.get(column).kind() != Kind.NUMBER) {
            return shifts;
        }
        int longest = 0;
        for (Row row : rows) {
            longest = Math.max(longest, row.isHeading() ? 0 : whole(row.cells().get(column)));
        }
        for (int i = 0; i < shifts.length; i++) {
            int whole = rows.get(i).isHeading() ? 0 : whole(rows.get(i).cells().get(column));
            shifts[i] = whole == 0 ? 0 : longest - whole;
        }
        return shifts;
    }

    /** Characters before the decimal point; 0 where there is no number. */
    private static int whole(String cell) {
        Matcher matcher = NUMBER.matcher(cell);
        return matcher.matches() ? matcher.group(1).length() : 0;
    }

    /** Whether a verdict is a good one. */
    public static boolean isGood(String verdict) {
        return verdict.startsWith("met");
    }
}
