package org.soakwright.planner.report.picture;

import java.awt.geom.Line2D;
import java.awt.geom.Rectangle2D;
import java.util.ArrayList;
import java.util.List;
import org.soakwright.planner.batch.StepEnd;

/** The steps above whatever runs over the clock, and what their numbers stand for where there is no room for their names. */
final class Ribbon {
    static final double HEIGHT = 21;

    private static final int KEY_LINE = 15;
    private static final double PADDING = 10;
    /** More fills than that are not told apart. */
    private static final int MOST_FILLS = 24;

    private final List<StepEnd> ends;
    private final List<String> shown = new ArrayList<>();
    private final List<String> key = new ArrayList<>();

    /**
     * Steps by the clock.
     *
     * @param width of the clock, px
     */
    Ribbon(Clock clock, List<StepEnd> ends, double width) {
        this.ends = ends;
        for (int i = 0; i < ends.size(); i++) {
            StepEnd end = ends.get(i);
            double room = (clock.at(end.to()) - clock.at(end.from())) * width;
            String number = Integer.toString(i + 1);
            String whole = number + "  " + end.step().name();
            String fitted = Typeface.fitted(whole, Look.TEXT, room - PADDING);
            if (fitted.equals(whole)) {
                shown.add(whole);
                continue;
            }
            shown.add(
                    Typeface.width(number, Look.TEXT) > room
                            ? ""
                            : fitted.length() > number.length() + 6 ? fitted : number);
            explain(number + " " + end.step().name(), width);
        }
    }

    private void explain(String entry, double width) {
        int last = key.size() - 1;
        String longer = last < 0 ? entry : key.get(last) + ",  " + entry;
        if (last < 0 || Typeface.width(longer, Look.SMALL) > width) {
            key.add(Typeface.fitted(entry, Look.SMALL, width));
        } else {
            key.set(last, longer);
        }
    }

    /** What the key takes below the name of the clock's axis, px. */
    int keyHeight() {
        return key.isEmpty() ? 0 : KEY_LINE * key.size() + 4;
    }

    /** The steps over a panel that has the clock across, and their ends through it. */
    void over(Sheet sheet, Panel panel, double top) {
        Look look = sheet.look();
        for (int i = 0; i < ends.size(); i++) {
            StepEnd end = ends.get(i);
            double from = panel.x(end.from());
            double to = panel.x(end.to());
            double gap = to - from > 6 ? 1 : 0;
            sheet.fill(new Rectangle2D.Double(from + gap, top, to - from - 2 * gap, HEIGHT), look.ribbon());
            int fills = end.step().fills();
            for (int f = 1; f < fills && fills <= MOST_FILLS; f++) {
                double left = panel.x(end.fillTo(f - 1));
                double right = panel.x(end.fillFrom(f));
                sheet.fill(new Rectangle2D.Double(left - 0.5, top, Math.max(1, right - left), HEIGHT), look.ground());
            }
            sheet.text(shown.get(i), (from + to) / 2, top + 15, Sheet.Anchor.CENTRE, Look.TEXT, look.ink());
        }
        through(sheet, panel);
    }

    /** The ends of the steps. */
    void through(Sheet sheet, Panel panel) {
        ends.stream().limit(ends.size() - 1).forEach(end -> {
            double at = panel.x(end.to());
            sheet.draw(
                    new Line2D.Double(at, panel.area().getY(), at, panel.area().getMaxY()),
                    sheet.look().grid(),
                    Look.dashed(1));
        });
    }

    /** The key below the lowest panel. */
    void key(Sheet sheet, Panel panel) {
        for (int i = 0; i < key.size(); i++) {
            double baseline = panel.area().getMaxY() + 54 + i * KEY_LINE;
            sheet.text(
                    key.get(i),
                    panel.area().getX(),
                    baseline,
                    Sheet.Anchor.LEFT,
                    Look.SMALL,
                    sheet.look().muted());
        }
    }
}
