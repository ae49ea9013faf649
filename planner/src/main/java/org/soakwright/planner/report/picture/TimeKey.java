package org.soakwright.planner.report.picture;

import java.awt.geom.Rectangle2D;
import org.jspecify.annotations.Nullable;

/** What colours and patterns of a {@link TimeChart} mean. */
final class TimeKey {
    private static final double LINE = 18;
    private static final double SWATCH = 14;

    private final TimeChart.Subject subject;
    private final int lines;

    TimeKey(TimeChart.Subject subject) {
        this.subject = subject;
        lines = walk(null, 0);
    }

    double height() {
        return lines * LINE + 10;
    }

    void on(Sheet sheet, double top) {
        walk(sheet, top);
    }

    /** Draws every entry where there is a sheet, and counts the lines. */
    private int walk(@Nullable Sheet sheet, double top) {
        Pen pen = new Pen(sheet, top);
        for (int kind = 0; kind < subject.kinds().size(); kind++) {
            int own = kind;
            pen.entry(subject.kinds().get(kind), (on, box) -> on.fill(box, TimePanels.colour(on.look(), own)));
        }
        if (subject.rows().stream()
                .anyMatch(row -> row.stays().stream()
                        .anyMatch(stay ->
                                stay.after().length() > 0 || !stay.changes().isEmpty()))) {
            pen.entry(
                    "changeover or turnaround",
                    (on, box) -> TimePanels.hatch(on, box, on.look().muted()));
        }
        if (subject.rows().stream().anyMatch(row -> !row.closed().isEmpty())) {
            pen.entry("outage", (on, box) -> on.fill(box, on.look().closed()));
        }
        if (!subject.away().isEmpty()) {
            pen.entry("nobody there", (on, box) -> on.fill(box, on.look().ribbon()));
        }
        if (!subject.pauses().isEmpty()) {
            pen.entry("break", (on, box) -> {
                on.fill(box, on.look().pause());
                on.draw(box, on.look().grid(), Look.dashed(1));
            });
        }
        if (subject.rows().stream().anyMatch(row -> !row.late().isEmpty())) {
            pen.entry("late from here on", (on, box) -> {
                TimePanels.flag(on, box.getX() + 1, box.getY(), box.getMaxY());
                TimePanels.under(on, box.getX() + 1, box.getMaxX(), box.getMaxY() - 1);
            });
        }
        return pen.line + 1;
    }

    /** A place in lines of entries. */
    private static final class Pen {
        private final @Nullable Sheet sheet;
        private final double top;
        private double x;
        private int line;

        Pen(@Nullable Sheet sheet, double top) {
            this.sheet = sheet;
            this.top = top;
        }

        interface Sample {
            void on(Sheet sheet, Rectangle2D box);
        }

        void entry(String words, Sample sample) {
            String fitted = Typeface.fitted(words, Look.TEXT, Look.WIDTH / 2.0);
            double width = SWATCH + 6 + Typeface.width(fitted, Look.TEXT) + 18;
            if (x > 0 && x + width > Look.WIDTH) {
                x = 0;
                line++;
            }
            if (sheet != null) {
                double y = top + line * LINE;
                sample.on(sheet, new Rectangle2D.Double(x, y, SWATCH, 11));
                sheet.text(
                        fitted,
                        x + SWATCH + 6,
                        y + 10,
                        Sheet.Anchor.LEFT,
                        Look.TEXT,
                        sheet.look().ink());
            }
            x += width;
        }
    }
}
