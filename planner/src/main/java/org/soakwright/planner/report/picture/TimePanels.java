package org.soakwright.planner.report.picture;

import java.awt.BasicStroke;
import java.awt.Color;
import java.awt.Graphics2D;
import java.awt.geom.Line2D;
import java.awt.geom.Path2D;
import java.awt.geom.Rectangle2D;
import java.util.Comparator;
import java.util.List;

/** Draws a {@link TimeChart}: panels below each other, vessels below each other in each. */
final class TimePanels {
    private static final double HEAD = 38;
    private static final double NIGHT = 4;
    private static final double PANEL_GAP = 22;
    private static final double PADDING = 3;
    private static final double LEAST_NAME = 50;
    private static final double MOST_NAME = 150;
    private static final double HATCH = 4;
    private static final double WORK_LANE = 9;

    /** Light on dark and dark on light with at least 4.5 to 1 in every theme: bars carry letters. */
    private static final int[] COLOURS = {0, 3, 4, 2};

    private final TimeChart.Subject subject;
    private final List<TimeChart.Span> panels;
    private final String title;
    private final double left;
    private final TimeKey key;
    private final double rowsHeight;
    private final double workHeight;

    TimePanels(TimeChart.Subject subject, List<TimeChart.Span> panels, String title) {
        this.subject = subject;
        this.panels = panels;
        this.title = title;
        double widest = Typeface.width(subject.workName(), Look.TEXT);
        double rows = 0;
        for (TimeChart.Row row : subject.rows()) {
            widest = Math.max(widest, Typeface.width(row.name(), Look.TEXT));
            rows += height(row);
        }
        left = Math.ceil(Math.max(LEAST_NAME, Math.min(MOST_NAME, widest)) + 10);
        rowsHeight = rows;
        workHeight = subject.work().isEmpty() ? 0 : 2 * PADDING + WORK_LANE * Math.max(1, subject.workLanes()) + 4;
        key = new TimeKey(subject);
    }

    int height() {
        return (int) Math.ceil(Sheet.TOP + key.height() + panels.size() * panelHeight());
    }

    private double panelHeight() {
        return HEAD + rowsHeight + workHeight + PANEL_GAP;
    }

    private static double lane(TimeChart.Row row) {
        return row.lanes() <= 1 ? 17 : row.lanes() <= 3 ? 14 : row.lanes() <= 8 ? 11 : 7;
    }

    private static double height(TimeChart.Row row) {
        return 2 * PADDING + Math.max(1, row.lanes()) * lane(row);
    }

    void on(Graphics2D g, Theme theme) {
        Sheet sheet = new Sheet(g, theme, Look.WIDTH, height());
        sheet.head(title, subject.subtitle());
        key.on(sheet, Sheet.TOP);
        double top = Sheet.TOP + key.height();
        for (TimeChart.Span panel : panels) {
            new Field(sheet, panel, top).draw();
            top += panelHeight();
        }
    }

    static Color colour(Look look, int kind) {
        return kind < TimeChart.KINDS ? look.series(COLOURS[kind]) : look.muted();
    }

    /** Slanted lines over an area, cut at its edges: pictures hold no clips. */
    static void hatch(Sheet sheet, Rectangle2D area, Color color) {
        BasicStroke stroke = new BasicStroke(0.8f);
        double rise = area.getHeight();
        double first = Math.floor((area.getMinX() - rise) / HATCH) * HATCH;
        for (double x = first; x < area.getMaxX(); x += HATCH) {
            double from = Math.max(x, area.getMinX());
            double to = Math.min(x + rise, area.getMaxX());
            if (to > from) {
                sheet.draw(
                        new Line2D.Double(from, area.getMaxY() - (from - x), to, area.getMaxY() - (to - x)),
                        color,
                        stroke);
            }
        }
    }

    /** Where something was due. */
    static void flag(Sheet sheet, double at, double top, double bottom) {
        Look look = sheet.look();
        Path2D flag = new Path2D.Double();
        flag.moveTo(at - 1, top);
        flag.lineTo(at + 6, top);
        flag.lineTo(at - 1, top + 6);
        flag.closePath();
        sheet.fill(flag, look.limit());
        sheet.draw(new Line2D.Double(at, top, at, bottom), look.limit(), new BasicStroke(2));
    }

    /** Under what is late. */
    static void under(Sheet sheet, double from, double until, double y) {
        sheet.draw(
                new Line2D.Double(from, y, Math.max(until, from + 1), y),
                sheet.look().limit(),
                Look.dashed(2, 3, 3));
    }

    /** One panel. */
    private final class Field {
        private final Sheet sheet;
        private final Look look;
        private final TimeChart.Span span;
        private final double top;
        private final double bottom;

        Field(Sheet sheet, TimeChart.Span span, double top) {
            this.sheet = sheet;
            this.span = span;
            this.top = top + HEAD;
            look = sheet.look();
            bottom = this.top + rowsHeight + workHeight;
        }

        private double x(long moment) {
            return left + (double) (moment - span.from()) / span.length() * (Look.WIDTH - left);
        }

        private Rectangle2D box(TimeChart.Span time, double y, double height) {
            TimeChart.Span shown = time.within(span);
            return new Rectangle2D.Double(x(shown.from()), y, x(shown.until()) - x(shown.from()), height);
        }

        void draw() {
            shade(subject.away(), look.ribbon());
            shade(subject.pauses(), look.pause());
            for (TimeChart.Span night : subject.nights()) {
                if (night.meets(span)) {
                    sheet.fill(box(night, top - NIGHT, NIGHT - 1), look.muted());
                }
            }
            hours();
            days();
            double y = top;
            for (TimeChart.Row row : subject.rows()) {
                row(row, y);
                y += height(row);
                rule(y);
            }
            work(y);
        }

        private void shade(List<TimeChart.Span> spans, Color color) {
            for (TimeChart.Span one : spans) {
                if (one.meets(span)) {
                    sheet.fill(box(one, top, bottom - top), color);
                }
            }
        }

        private void rule(double y) {
            sheet.draw(new Line2D.Double(left, y, Look.WIDTH, y), look.grid(), new BasicStroke(1));
        }

        /** Each day's name from its beginning on, where the one before leaves room. */
        private void days() {
            double free = left;
            for (int i = 0; i < subject.days().size(); i++) {
                TimeChart.Mark day = subject.days().get(i);
                long next = i + 1 < subject.days().size()
                        ? subject.days().get(i + 1).moment()
                        : span.until();
                if (day.moment() >= span.until() || next <= span.from()) {
                    continue;
                }
                double at = Math.max(left, x(day.moment()));
                if (day.moment() > span.from()) {
                    sheet.draw(new Line2D.Double(at, top - HEAD + 8, at, bottom), look.muted(), new BasicStroke(0.7f));
                }
                double end = x(Math.min(next, span.until()));
                double width = Typeface.width(day.label(), Look.STRONG);
                if (at >= free
                        && at + width + 4 <= Math.max(end, Math.min(Look.WIDTH, at + width + 4))
                        && width + 4 <= end - at + 40) {
                    sheet.text(day.label(), at + 4, top - HEAD + 18, Sheet.Anchor.LEFT, Look.STRONG, look.ink());
                    free = at + width + 8;
                }
            }
        }

        private void hours() {
            double free = left - 100;
            for (TimeChart.Mark hour : subject.hours()) {
                if (hour.moment() < span.from() || hour.moment() > span.until()) {
                    continue;
                }
                double at = x(hour.moment());
                sheet.draw(new Line2D.Double(at, top, at, bottom), look.grid(), new BasicStroke(1));
                double half = Typeface.width(hour.label(), Look.SMALL) / 2;
                if (at - half > free && at + half <= Look.WIDTH) {
                    sheet.text(hour.label(), at, top - NIGHT - 3, Sheet.Anchor.CENTRE, Look.SMALL, look.muted());
                    free = at + half + 5;
                }
            }
        }

        private void row(TimeChart.Row row, double y) {
            double height = height(row);
            sheet.text(
                    Typeface.fitted(row.name(), Look.TEXT, left - 10),
                    left - 8,
                    y + height / 2 + 4,
                    Sheet.Anchor.RIGHT,
                    Look.TEXT,
                    look.ink());
            for (TimeChart.Named out : row.closed()) {
                if (out.span().meets(span)) {
                    Rectangle2D box = box(out.span(), y + 1, height - 2);
                    sheet.fill(box, look.closed());
                    write(List.of(out.label()), box, look.ink());
                }
            }
            double lane = lane(row);
            for (TimeChart.Stay stay : row.stays()) {
                stay(stay, y + PADDING + stay.lane() * lane, lane - 1);
            }
            for (TimeChart.Late late : row.late()) {
                late(late, y + PADDING + late.lane() * lane, lane);
            }
        }

        private void late(TimeChart.Late late, double y, double lane) {
            TimeChart.Span shown = late.span().within(span);
            boolean begins = late.span().from() >= span.from() && late.span().from() < span.until();
            if (late.first() && begins) {
                flag(sheet, x(late.span().from()), y - 2, y + lane + 1);
            }
            if (shown.length() > 0) {
                under(sheet, x(shown.from()), x(shown.until()), y + lane);
            }
        }

        private void stay(TimeChart.Stay stay, double y, double height) {
            Color color = colour(look, stay.kind());
            for (TimeChart.Span change : stay.changes()) {
                if (change.meets(span)) {
                    hatch(sheet, box(change, y, height), color);
                }
            }
            if (stay.after().length() > 0 && stay.after().meets(span)) {
                hatch(sheet, box(stay.after(), y + 2, height - 4), look.muted());
            }
            for (TimeChart.Span leg : stay.legs()) {
                if (leg.meets(span)) {
                    Rectangle2D box = box(leg, y, height);
                    // Legs that follow each other at once stay apart, and none is too short to be seen.
                    double width = Math.max(1, box.getWidth() > 3 ? box.getWidth() - 0.8 : box.getWidth());
                    sheet.fill(new Rectangle2D.Double(box.getX(), y, width, height), color);
                }
            }
            stay.legs().stream()
                    .filter(leg -> leg.meets(span))
                    .max(Comparator.comparingLong(leg -> leg.within(span).length()))
                    .ifPresent(leg -> write(stay.labels(), box(leg, y, height), look.ground()));
        }

        /** The longest of several texts that fits. */
        private void write(List<String> texts, Rectangle2D box, Color color) {
            if (box.getHeight() < Look.SMALL.getSize2D() - 1) {
                return;
            }
            for (String text : texts) {
                if (Typeface.width(text, Look.SMALL) + 5 <= box.getWidth()) {
                    sheet.text(text, box.getCenterX(), box.getCenterY() + 4, Sheet.Anchor.CENTRE, Look.SMALL, color);
                    return;
                }
            }
        }

        private void work(double y) {
            if (subject.work().isEmpty()) {
                return;
            }
            sheet.text(
                    Typeface.fitted(subject.workName(), Look.TEXT, left - 10),
                    left - 8,
                    y + workHeight / 2 + 4,
                    Sheet.Anchor.RIGHT,
                    Look.TEXT,
                    look.muted());
            for (TimeChart.Tick tick : subject.work()) {
                if (tick.span().meets(span)) {
                    Rectangle2D box = box(tick.span(), y + PADDING + 2 + tick.lane() * WORK_LANE, WORK_LANE - 1.5);
                    Rectangle2D seen = new Rectangle2D.Double(
                            box.getX(), box.getY(), Math.max(1.2, box.getWidth() - 0.4), box.getHeight());
                    if (tick.strong()) {
                        sheet.fill(seen, look.ink());
                    } else {
                        hatch(sheet, seen, look.ink());
                    }
                }
            }
            rule(y + workHeight);
        }
    }
}
