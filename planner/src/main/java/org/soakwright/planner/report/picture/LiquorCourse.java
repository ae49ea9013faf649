package org.soakwright.planner.report.picture;

import java.awt.Graphics2D;
import java.awt.geom.Ellipse2D;
import java.awt.geom.Rectangle2D;
import java.util.ArrayList;
import java.util.List;

/** What the liquor holds over the clock, a field for each species; where it is made up anew the line breaks. */
final class LiquorCourse {
    private static final int LEFT = 52;
    private static final int RIGHT = 24;
    private static final int ONE_FIELD = 220;
    private static final int SHARED_FIELD = 118;
    private static final int ROW_GAP = 36;

    private final History history;
    private final Clock clock;
    private final Ribbon ribbon;
    private final List<Field> fields = new ArrayList<>();
    private final int fieldHeight;
    private final int height;

    private record Field(int species, List<History.Fill> fills, Scale contents) {}

    LiquorCourse(History history, Clock clock) {
        this.history = history;
        this.clock = clock;
        ribbon = new Ribbon(clock, history.ends(), Look.WIDTH - LEFT - RIGHT);
        for (int s = 0; s < history.recipe().species().size(); s++) {
            List<History.Fill> fills = history.fills(s);
            double most = 0;
            double least = Double.POSITIVE_INFINITY;
            for (History.Fill fill : fills) {
                most = Math.max(most, History.highest(fill.contents()));
                least = Math.min(least, History.lowest(fill.contents()));
            }
            if (!fills.isEmpty()) {
                fields.add(new Field(s, fills, Scale.holding(least, most, 5)));
            }
        }
        fieldHeight = fields.size() == 1 ? ONE_FIELD : SHARED_FIELD;
        height = (int) (Sheet.TOP + Ribbon.HEIGHT) + fields.size() * (fieldHeight + ROW_GAP) + 42 + ribbon.keyHeight();
    }

    /** Whether there is a liquor to show. */
    boolean isEmpty() {
        return fields.isEmpty();
    }

    Picture picture() {
        return new Picture("liquor", title(), caption(), altText(), Look.WIDTH, height, this::draw);
    }

    private static String title() {
        return "What the liquor holds";
    }

    private void draw(Graphics2D g, Theme theme) {
        Sheet sheet = new Sheet(g, theme, Look.WIDTH, height);
        sheet.head(
                title(),
                "A line begins, hollow, when the pieces meet fresh liquor and ends, full, when they part from it.");
        int width = Look.WIDTH - LEFT - RIGHT;
        double top = Sheet.TOP + Ribbon.HEIGHT + ROW_GAP;
        for (int i = 0; i < fields.size(); i++) {
            Panel panel = new Panel(
                    new Rectangle2D.Double(LEFT, top + i * (fieldHeight + ROW_GAP), width, fieldHeight),
                    clock,
                    fields.get(i).contents());
            if (i == 0) {
                ribbon.over(sheet, panel, Sheet.TOP);
            } else {
                ribbon.through(sheet, panel);
            }
            draw(sheet, panel, fields.get(i), i);
            if (i == fields.size() - 1) {
                panel.nameColumns(sheet, clock.name());
                ribbon.key(sheet, panel);
            }
        }
    }

    private void draw(Sheet sheet, Panel panel, Field field, int index) {
        Look look = sheet.look();
        for (History.Fill fill : field.fills()) {
            panel.line(fill.clocks(), fill.contents(), look.series(index), Look.line(index));
        }
        panel.on(sheet);
        panel.nameRows(sheet, history.recipe().species().get(field.species()).name() + " in the liquor, g/L");
        for (History.Fill fill : field.fills()) {
            int last = fill.clocks().length - 1;
            if (fill.begun()) {
                dot(sheet, panel, fill, 0, index);
            }
            dot(sheet, panel, fill, last, index);
        }
        for (History.Fill fill : field.fills()) {
            name(sheet, panel, fill, field.fills());
        }
    }

    private static void dot(Sheet sheet, Panel panel, History.Fill fill, int at, int index) {
        Look look = sheet.look();
        double x = panel.x(fill.clocks()[at]);
        double y = panel.y(fill.contents()[at]);
        sheet.fill(new Ellipse2D.Double(x - 3.5, y - 3.5, 7, 7), look.series(index));
        if (at == 0) {
            sheet.fill(new Ellipse2D.Double(x - 1.8, y - 1.8, 3.6, 3.6), look.ground());
        }
    }

    /** The content at the end, beside it where there is room. */
    private static void name(Sheet sheet, Panel panel, History.Fill fill, List<History.Fill> all) {
        int last = fill.clocks().length - 1;
        String text = Words.number(fill.contents()[last]);
        double x = panel.x(fill.clocks()[last]);
        double y = panel.y(fill.contents()[last]);
        boolean rises = fill.contents()[last] >= fill.contents()[0];
        double width = Typeface.width(text, Look.TEXT);
        double above = y - 8;
        double below = y + 17;
        double[] baselines = rises ? new double[] {above, below} : new double[] {below, above};
        for (double baseline : baselines) {
            for (double aside : new double[] {0, -10, 10, -24, 24}) {
                boolean inside = baseline < panel.area().getMaxY() - 1
                        && baseline > panel.area().getY() - 6;
                boolean covers = covers(panel, all, Sheet.box(x + aside - width / 2, baseline, width, Look.TEXT));
                if (inside && !covers && sheet.isFree(text, x + aside, baseline, Sheet.Anchor.CENTRE, Look.TEXT)) {
                    sheet.text(
                            text,
                            x + aside,
                            baseline,
                            Sheet.Anchor.CENTRE,
                            Look.TEXT,
                            sheet.look().ink());
                    return;
                }
            }
        }
    }

    private static boolean covers(Panel panel, List<History.Fill> fills, Rectangle2D box) {
        for (History.Fill fill : fills) {
            for (int i = 0; i < fill.clocks().length; i++) {
                if (box.contains(panel.x(fill.clocks()[i]), panel.y(fill.contents()[i]))) {
                    return true;
                }
            }
        }
        return false;
    }

    private String caption() {
        Field field = fields.get(0);
        History.Fill most = field.fills().get(0);
        for (Field other : fields) {
            for (History.Fill fill : other.fills()) {
                if (change(fill) > change(most)) {
                    most = fill;
                    field = other;
                }
            }
        }
        String species = history.recipe().species().get(field.species()).name();
        return "The liquor changes most in "
                + history.ends().get(most.step()).step().name()
                + (most.begun() ? ", from " + Words.number(most.contents()[0]) : "") + " to "
                + Words.number(most.last()) + " g/L " + species + ".";
    }

    private static double change(History.Fill fill) {
        return Math.abs(fill.last() - fill.contents()[0]);
    }

    private String altText() {
        StringBuilder text =
                new StringBuilder("Content of the liquor over the running clock, at the start and the end of");
        text.append(" each fill.");
        for (Field field : fields) {
            text.append(' ')
                    .append(Words.capital(
                            history.recipe().species().get(field.species()).name()))
                    .append(": ");
            for (int i = 0; i < field.fills().size(); i++) {
                History.Fill fill = field.fills().get(i);
                text.append(i == 0 ? "" : "; ")
                        .append(history.ends().get(fill.step()).step().name())
                        .append(fill.begun() ? " from " + Words.number(fill.contents()[0]) : "")
                        .append(" to ")
                        .append(Words.number(fill.last()))
                        .append(" g/L");
            }
            text.append('.');
        }
        return text.toString();
    }
}
