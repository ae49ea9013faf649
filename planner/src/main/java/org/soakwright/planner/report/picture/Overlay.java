package org.soakwright.planner.report.picture;

import java.awt.Graphics2D;
import java.awt.geom.Ellipse2D;
import java.awt.geom.Rectangle2D;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.soakwright.planner.batch.Durations;
import org.soakwright.planner.batch.Trace;

/** Two batches over one running clock: the lot's mean of each species, a field for each. */
public final class Overlay {
    private static final int LEFT = 52;
    private static final int RIGHT = 96;
    private static final int ONE_FIELD = 260;
    private static final int SHARED_FIELD = 150;
    private static final int ROW_GAP = 38;
    private static final double TOP = Sheet.TOP + 26;
    /** Fewer points than these are ends of steps: they are marked. */
    private static final int FEW = 24;

    private final List<Field> fields;
    private final double end;
    private final int fieldHeight;
    private final int height;

    /**
     * Contents over the running clock.
     *
     * @param clocks s, rising
     * @param contents in the unit of the field
     */
    public record Course(double[] clocks, double[] contents) {
        public Course {
            if (clocks.length != contents.length || clocks.length == 0) {
                throw new IllegalArgumentException(clocks.length + " clocks, " + contents.length + " contents");
            }
        }

        /** Whether it is made of a few moments such as step ends. */
        private boolean isSparse() {
            return clocks.length < FEW;
        }

        /** Between moments in a straight line. */
        private double at(double clock) {
            int i = 1;
            while (i < clocks.length - 1 && clocks[i] < clock) {
                i++;
            }
            if (clocks.length == 1 || clock <= clocks[0]) {
                return contents[0];
            }
            double share = (clock - clocks[i - 1]) / (clocks[i] - clocks[i - 1]);
            return contents[i - 1] + share * (contents[i] - contents[i - 1]);
        }

        private double lastClock() {
            return clocks[clocks.length - 1];
        }

        private double last() {
            return contents[contents.length - 1];
        }
    }

    /** One species; at least one of the two is there. */
    public record Field(String species, String unit, Optional<Course> a, Optional<Course> b) {
        private List<Course> courses() {
            List<Course> all = new ArrayList<>();
            a.ifPresent(all::add);
            b.ifPresent(all::add);
            return all;
        }
    }

    private Overlay(List<Field> fields) {
        this.fields = List.copyOf(fields);
        end = fields.stream()
                .flatMap(field -> field.courses().stream())
                .mapToDouble(Course::lastClock)
                .max()
                .orElseThrow();
        fieldHeight = fields.size() == 1 ? ONE_FIELD : SHARED_FIELD;
        height = (int) TOP + fields.size() * (fieldHeight + ROW_GAP) + 24;
    }

    /** The lot's mean of a species, from 0, as it was loaded, to the end. */
    public static Course lotMean(Trace trace, int species) {
        History history = new History(trace);
        return new Course(history.clocks(), history.lotMeans(species));
    }

    /**
     * The picture.
     *
     * @param fields one or more
     */
    public static Picture of(List<Field> fields) {
        Overlay overlay = new Overlay(fields);
        return new Picture(
                "course",
                title(),
                overlay.caption(),
                overlay.altText(),
                Look.WIDTH,
                overlay.height,
                (g, theme) -> overlay.draw(g, theme));
    }

    private static String title() {
        return "What the lot holds, both batches";
    }

    private void draw(Graphics2D g, Theme theme) {
        Sheet sheet = new Sheet(g, theme, Look.WIDTH, height);
        boolean dots =
                fields.stream().flatMap(field -> field.courses().stream()).anyMatch(Course::isSparse);
        sheet.head(
                title(), "Solid: A. Dashed: B." + (dots ? " Dots: ends of steps, all that is known of a result." : ""));
        int width = Look.WIDTH - LEFT - RIGHT;
        for (int i = 0; i < fields.size(); i++) {
            Field field = fields.get(i);
            double most = 0;
            double least = Double.POSITIVE_INFINITY;
            for (Course course : field.courses()) {
                most = Math.max(most, History.highest(course.contents()));
                least = Math.min(least, History.lowest(course.contents()));
            }
            Panel panel = new Panel(
                    new Rectangle2D.Double(LEFT, TOP + i * (fieldHeight + ROW_GAP), width, fieldHeight),
                    clock(),
                    Scale.holding(least, most, 5));
            draw(sheet, panel, field);
            if (i == fields.size() - 1) {
                panel.nameColumns(sheet, "running clock, h:min");
            }
        }
    }

    private Scale clock() {
        double step = Rounds.clockStep(end, 9);
        List<Scale.Tick> ticks = new ArrayList<>();
        for (long i = 0; i * step < 0.93 * end; i++) {
            ticks.add(new Scale.Tick(i * step, Durations.clock(i * step)));
        }
        ticks.add(new Scale.Tick(end, Durations.clock(end)));
        return new Scale.Placed(ticks, clock -> clock / end);
    }

    private static void draw(Sheet sheet, Panel panel, Field field) {
        Look look = sheet.look();
        field.a().ifPresent(course -> panel.line(course.clocks(), course.contents(), look.series(0), Look.line(0)));
        field.b().ifPresent(course -> panel.line(course.clocks(), course.contents(), look.series(1), Look.line(1)));
        panel.on(sheet);
        panel.nameRows(sheet, field.species() + ", mean of the lot, " + field.unit());
        field.a().ifPresent(course -> finish(sheet, panel, course, field.b(), 0, "A"));
        field.b().ifPresent(course -> finish(sheet, panel, course, field.a(), 1, "B"));
    }

    /** Marks the end, and writes beside it, or where the other one goes on, on the side of it that is free. */
    private static void finish(
            Sheet sheet, Panel panel, Course course, Optional<Course> other, int series, String name) {
        for (int i = course.isSparse() ? 0 : course.clocks().length - 1; i < course.clocks().length; i++) {
            double x = panel.x(course.clocks()[i]);
            double y = panel.y(course.contents()[i]);
            sheet.fill(
                    new Ellipse2D.Double(x - 3.5, y - 3.5, 7, 7), sheet.look().series(series));
        }
        String text = name + "  " + Words.number(course.last());
        double x = panel.x(course.lastClock());
        double y = panel.y(course.last());
        Optional<Course> passing = other.filter(one -> one.lastClock() > course.lastClock());
        if (passing.isPresent()) {
            boolean below = passing.get().at(course.lastClock()) >= course.last()
                    && y + 20 < panel.area().getMaxY();
            write(sheet, text, x, y + (below ? 20 : -12), Sheet.Anchor.CENTRE, below ? 16 : -16);
        } else {
            write(sheet, text, x + 9, y + 4, Sheet.Anchor.LEFT, -16);
        }
    }

    private static void write(Sheet sheet, String text, double x, double y, Sheet.Anchor anchor, double step) {
        double baseline = y;
        for (int i = 0; i < 4 && !sheet.isFree(text, x, baseline, anchor, Look.STRONG); i++) {
            baseline += step;
        }
        sheet.text(text, x, baseline, anchor, Look.STRONG, sheet.look().ink());
    }

    private String caption() {
        List<String> parts = new ArrayList<>();
        for (Field field : fields) {
            List<String> said = new ArrayList<>();
            field.a().ifPresent(course -> said.add("A ends at " + ending(course, field)));
            field.b().ifPresent(course -> said.add("B at " + ending(course, field)));
            parts.add(Words.capital(field.species()) + ": " + String.join(", ", said));
        }
        return String.join(". ", parts) + ".";
    }

    private static String ending(Course course, Field field) {
        return Words.number(course.last()) + " " + field.unit() + " after " + Durations.practical(course.lastClock());
    }

    private String altText() {
        StringBuilder text =
                new StringBuilder("The mean content of the lot over the running clock, both batches in one field.");
        for (Field field : fields) {
            text.append(' ').append(Words.capital(field.species())).append(", ").append(field.unit());
            field.a().ifPresent(course -> text.append("; A from ").append(span(course)));
            field.b().ifPresent(course -> text.append("; B from ").append(span(course)));
            text.append('.');
        }
        return text.toString();
    }

    private static String span(Course course) {
        return Words.number(course.contents()[0]) + " at " + Durations.clock(course.clocks()[0]) + " to "
                + Words.number(course.last()) + " at " + Durations.clock(course.lastClock());
    }
}
