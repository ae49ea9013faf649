package org.soakwright.planner.report.paper;

import java.util.ArrayList;
import java.util.List;

/** How the sheet is set: margins, sizes and the few forms that everything on it has. In points. */
final class Setting {
    static final double PAGE_WIDTH = 595;
    static final double PAGE_HEIGHT = 842;
    static final double LEFT = 40;
    static final double WIDTH = PAGE_WIDTH - 2 * LEFT;
    static final double TOP = 28;
    static final double BOTTOM = PAGE_HEIGHT - 40;

    static final double TITLE = 16;
    static final double HEADING = 11.5;
    static final double STEP = 10;
    static final double BODY = 9;
    static final double SMALL = 8;

    static final double HAIR = 0.4;
    static final double LINE = 0.8;
    static final double BOLD = 2.5;
    static final double GAP = 6;

    private static final double ASCENT = 1.02;
    private static final double PADDING = 3;
    private static final int NO_LIMIT = Integer.MAX_VALUE;

    private static final double[] TARGETS = {90, 60, 80, 100, 84, 54, 80};
    private static final double[] MOMENTS = {42, 50, 94, 185, 90, 54};
    private static final double[] MOMENTS_WITHOUT_WALL = {42, 50, 279, 90, 54};

    final Face regular;
    final Face semibold;

    /** Of a row that something is written in by hand. */
    final double rowHeight;

    /** Of a box that stands by itself. */
    final double blankHeight;

    /** Between what does not belong together. */
    final double gap;

    private final double leading;

    /**
     * A setting.
     *
     * @param dense whether to save room, as far as that can be read and written in on the floor
     */
    Setting(Face regular, Face semibold, boolean dense) {
        this.regular = regular;
        this.semibold = semibold;
        rowHeight = dense ? 18 : 21;
        blankHeight = dense ? 18 : 20;
        leading = dense ? 1.17 : 1.32;
        gap = dense ? 3 : GAP;
    }

    /** A column: where it begins and how wide its text may be. */
    record Column(double x, double width) {
        /** Columns from shares of the width. */
        static List<Column> of(double... shares) {
            double sum = 0;
            for (double share : shares) {
                sum += share;
            }
            List<Column> columns = new ArrayList<>();
            double x = LEFT;
            for (double share : shares) {
                double width = WIDTH * share / sum;
                columns.add(new Column(x, width - GAP));
                x += width;
            }
            // Nothing stands right of the last.
            Column last = columns.remove(columns.size() - 1);
            columns.add(new Column(last.x(), last.width() + GAP));
            return columns;
        }

        static Column whole() {
            return new Column(LEFT, WIDTH);
        }
    }

    /** What stands in a column: words, or a box to be filled in with its unit; boxes fill their column. */
    record Cell(Column column, String text, boolean strong, boolean box) {
        static Cell words(Column column, String text) {
            return new Cell(column, text, false, false);
        }

        static Cell strong(Column column, String text) {
            return new Cell(column, text, true, false);
        }

        static Cell box(Column column, String unit) {
            return new Cell(column, unit, false, true);
        }
    }

    /** Shares of the width that the columns of a step's moments have. */
    static double[] moments(boolean wall) {
        return (wall ? MOMENTS : MOMENTS_WITHOUT_WALL).clone();
    }

    /** Shares of the width that the columns of the targets have. */
    static double[] targets() {
        return TARGETS.clone();
    }

    double leading(double size) {
        return size * leading;
    }

    /** Words over so many lines as they need. */
    Strip words(Column column, Face face, double size, String text) {
        return words(column, face, size, text, NO_LIMIT);
    }

    Strip words(Column column, Face face, double size, String text, int mostLines) {
        List<Mark> marks = new ArrayList<>();
        double y = 0;
        for (String line : face.wrapped(text, size, column.width(), mostLines)) {
            marks.add(new Mark.Words(column.x(), y + size * ASCENT, face, size, line));
            y += leading(size);
        }
        return new Strip(y, marks);
    }

    /** The same, each line by itself: a page may end after any. */
    List<Strip> lines(Column column, double size, String text) {
        return regular.wrapped(text, size, column.width(), NO_LIMIT).stream()
                .map(line -> new Strip(
                        leading(size), List.of(new Mark.Words(column.x(), size * ASCENT, regular, size, line))))
                .toList();
    }

    /** Lines over the whole width. */
    List<Strip> lines(double size, List<String> texts) {
        return texts.stream()
                .flatMap(text -> lines(Column.whole(), size, text).stream())
                .toList();
    }

    /** A point of a list. */
    List<Strip> point(String text) {
        List<Strip> lines = new ArrayList<>(lines(new Column(LEFT + 10, WIDTH - 10), BODY, text));
        Strip first = lines.get(0);
        List<Mark> marks = new ArrayList<>(first.marks());
        marks.add(0, new Mark.Words(LEFT, BODY * ASCENT, regular, BODY, "–"));
        lines.set(0, new Strip(first.height(), marks));
        return lines;
    }

    /** A row of cells, words and boxes in the middle of its height. */
    Strip row(double size, List<Cell> cells) {
        List<Strip> set = cells.stream()
                .map(cell -> cell.box()
                        ? Strip.gap(0)
                        : words(cell.column(), cell.strong() ? semibold : regular, size, cell.text()))
                .toList();
        double height = Math.max(
                rowHeight, set.stream().mapToDouble(Strip::height).max().orElse(0) + PADDING);
        List<Mark> marks = new ArrayList<>();
        marks.add(new Mark.Rule(LEFT, 0, WIDTH, HAIR));
        for (int i = 0; i < cells.size(); i++) {
            Cell cell = cells.get(i);
            if (cell.box()) {
                double boxHeight = Math.min(height, 1.5 * rowHeight) - 4;
                marks.addAll(box(cell.column(), 0.5 * (height - boxHeight), boxHeight, cell.text()));
            } else {
                double down = 0.5 * (height - set.get(i).height());
                set.get(i).marks().forEach(mark -> marks.add(mark.lowered(down)));
            }
        }
        return new Strip(height, marks);
    }

    /** A box to be filled in, its unit at the right. */
    List<Mark> box(Column column, double y, double height, String unit) {
        List<Mark> marks = new ArrayList<>();
        marks.add(new Mark.Frame(column.x(), y, column.width(), height, LINE));
        if (!unit.isEmpty()) {
            String shown = regular.wrapped(unit, SMALL, column.width() - 2 * PADDING, 1)
                    .get(0);
            double x = column.x() + column.width() - PADDING - regular.width(shown, SMALL);
            marks.add(new Mark.Words(x, y + 0.5 * height + 0.36 * SMALL, regular, SMALL, shown));
        }
        return marks;
    }

    /** A label and, right of it, its box, both ending at the right margin. */
    List<Mark> blank(Sheet.Blank blank, double y, double boxWidth) {
        List<Mark> marks = new ArrayList<>();
        double left = LEFT + WIDTH - boxWidth;
        double label = regular.width(blank.label(), BODY);
        marks.add(
                new Mark.Words(left - GAP - label, y + 0.5 * blankHeight + 0.36 * BODY, regular, BODY, blank.label()));
        marks.addAll(box(new Column(left, boxWidth), y, blankHeight, blank.unit()));
        return marks;
    }
}
