package org.soakwright.planner.report.picture;

import java.awt.Color;
import java.awt.Graphics2D;
import java.awt.geom.Ellipse2D;
import java.awt.geom.Line2D;
import java.awt.geom.Rectangle2D;
import java.util.ArrayList;
import java.util.List;
import org.soakwright.planner.batch.Durations;

/** The course of what targets read, with their limits, and where each is read. */
final class Readings {
    private static final int LEFT = 52;
    private static final int RIGHT = 176;
    private static final int FIELD_HEIGHT = 132;
    private static final int ROW_GAP = 38;
    private static final int MOST_NAMED = 3;

    private final History history;
    private final Clock clock;
    private final Ribbon ribbon;
    private final List<Watched> watched;
    private final List<Integer> heights = new ArrayList<>();
    private final int height;

    Readings(History history, Clock clock, List<String> binds) {
        this.history = history;
        this.clock = clock;
        ribbon = new Ribbon(clock, history.ends(), Look.WIDTH - LEFT - RIGHT);
        watched = Watched.of(history, binds);
        int sum = 0;
        for (Watched one : watched) {
            int labels = one.courses().size() + one.limits().size();
            heights.add(Math.max(FIELD_HEIGHT, (int) (Labels.SPACING * labels)));
            sum += heights.get(heights.size() - 1) + ROW_GAP;
        }
        height = (int) (Sheet.TOP + Ribbon.HEIGHT) + sum + 42 + ribbon.keyHeight();
    }

    boolean isEmpty() {
        return watched.isEmpty();
    }

    Picture picture() {
        return new Picture("readings", title(), caption(), altText(), Look.WIDTH, height, this::draw);
    }

    private static String title() {
        return "How each target is reached";
    }

    private void draw(Graphics2D g, Theme theme) {
        Sheet sheet = new Sheet(g, theme, Look.WIDTH, height);
        boolean doubted = watched.stream()
                .flatMap(one -> one.courses().stream())
                .anyMatch(course -> !course.edges().isEmpty());
        sheet.head(
                title(),
                "Dashed: the limit. Dot: where it is read" + (sure() ? ", as surely as asked" : "")
                        + ". Ring: it decides. Cross: it is missed."
                        + (doubted ? " Dotted: 5 and 95 % of what may be." : ""));
        int width = Look.WIDTH - LEFT - RIGHT;
        double top = Sheet.TOP + Ribbon.HEIGHT + ROW_GAP;
        for (int i = 0; i < watched.size(); i++) {
            Watched one = watched.get(i);
            Panel panel = new Panel(new Rectangle2D.Double(LEFT, top, width, heights.get(i)), clock, one.scale());
            if (i == 0) {
                ribbon.over(sheet, panel, Sheet.TOP);
            } else {
                ribbon.through(sheet, panel);
            }
            draw(sheet, panel, one);
            top += heights.get(i) + ROW_GAP;
            if (i == watched.size() - 1) {
                panel.nameColumns(sheet, clock.name());
                ribbon.key(sheet, panel);
            }
        }
    }

    /** Whether dots of targets with a confidence lie beside their lines, which are drawn at stated values. */
    private boolean sure() {
        return history.run().outlook().isPresent()
                && history.targets().stream()
                        .anyMatch(state ->
                                history.recipe().confidence(state.target()).isPresent());
    }

    private void draw(Sheet sheet, Panel panel, Watched one) {
        Look look = sheet.look();
        Labels labels = new Labels(panel.area().getMaxX(), RIGHT);
        for (Watched.Limit limit : one.limits()) {
            panel.line(
                    new double[] {0, history.end()},
                    new double[] {limit.value(), limit.value()},
                    look.limit(),
                    Look.dashed(1.6f, 6, 4));
            labels.add(limit.text(), panel.y(limit.value()), look.limit());
        }
        for (Watched.Course course : one.courses()) {
            for (Watched.Piece edge : one.shown(course.edges())) {
                panel.line(edge.clocks(), edge.values(), look.series(course.series()), Look.dashed(0.9f, 1.5f, 3));
            }
            for (Watched.Piece piece : one.shown(course.pieces())) {
                panel.line(piece.clocks(), piece.values(), look.series(course.series()), Look.line(course.series()));
            }
        }
        panel.on(sheet);
        panel.nameRows(
                sheet,
                one.name() + ", " + one.unit() + (one.spansOrders() ? " (each line is ten times the next)" : ""));
        for (Watched.Course course : one.courses()) {
            Color color = look.series(course.series());
            mark(sheet, panel.x(course.readAt()), panel.y(course.value()), course.met(), course.decides(), color);
            Watched.Piece last = course.pieces().get(course.pieces().size() - 1);
            double late = history.end() * (1 - 1e-9);
            if (last.clocks()[last.clocks().length - 1] < late) {
                valueBeside(sheet, panel, course);
                continue;
            }
            String when = course.readAt() < late ? " at " + Durations.clock(course.readAt()) : "";
            labels.add(
                    course.label(),
                    Words.number(course.value()) + when + course.verdict(),
                    panel.y(last.values()[last.values().length - 1]),
                    color);
        }
        labels.on(sheet, panel.area().getY(), panel.area().getMaxY());
    }

    private static void valueBeside(Sheet sheet, Panel panel, Watched.Course course) {
        String text = Words.number(course.value()) + course.verdict();
        double x = panel.x(course.readAt());
        double y = panel.y(course.value());
        for (double baseline : new double[] {y - 11, y + 20}) {
            for (double aside : new double[] {0, 22, -22, 48, -48}) {
                if (baseline > panel.area().getY()
                        && baseline < panel.area().getMaxY()
                        && sheet.isFree(text, x + aside, baseline, Sheet.Anchor.CENTRE, Look.TEXT)) {
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

    /** A dot where a target is read, ringed where it decides; a cross where it is missed. */
    static void mark(Sheet sheet, double x, double y, boolean met, boolean decides, Color color) {
        Look look = sheet.look();
        if (!met) {
            sheet.draw(new Line2D.Double(x - 5, y - 5, x + 5, y + 5), look.ground(), Look.dashed(5));
            sheet.draw(new Line2D.Double(x - 5, y + 5, x + 5, y - 5), look.ground(), Look.dashed(5));
            sheet.draw(new Line2D.Double(x - 5, y - 5, x + 5, y + 5), look.limit(), Look.dashed(Look.LINE));
            sheet.draw(new Line2D.Double(x - 5, y + 5, x + 5, y - 5), look.limit(), Look.dashed(Look.LINE));
            return;
        }
        sheet.fill(new Ellipse2D.Double(x - 3.5, y - 3.5, 7, 7), color);
        if (decides) {
            sheet.draw(new Ellipse2D.Double(x - 7, y - 7, 14, 14), look.limit(), Look.dashed(2));
        }
    }

    private String caption() {
        List<String> deciding = new ArrayList<>();
        List<String> missed = new ArrayList<>();
        for (Watched one : watched) {
            for (Watched.Course course : one.courses()) {
                String said = course.name() + ", at " + Words.number(course.value()) + " " + one.unit() + " by "
                        + Durations.clock(course.readAt()) + ", the end of " + course.step();
                if (!course.met()) {
                    missed.add(said);
                } else if (course.decides()) {
                    deciding.add(said);
                }
            }
        }
        if (!missed.isEmpty()) {
            return "Missed: " + few(missed) + ".";
        }
        if (!deciding.isEmpty()) {
            return "What decides: " + few(deciding) + ".";
        }
        int count = watched.stream().mapToInt(one -> one.courses().size()).sum();
        return count == 1 ? "The reading keeps its limit." : "All " + count + " readings keep their limits.";
    }

    private static String few(List<String> all) {
        int more = all.size() - MOST_NAMED;
        return String.join("; ", all.subList(0, Math.min(MOST_NAMED, all.size())))
                + (more > 0 ? "; and " + more + " more" : "");
    }

    private String altText() {
        StringBuilder text =
                new StringBuilder("Course of each target's reading over the running clock, with its limit.");
        for (Watched one : watched) {
            for (Watched.Course course : one.courses()) {
                Watched.Piece first = course.pieces().get(0);
                text.append(' ')
                        .append(Words.capital(course.name()))
                        .append(": from ")
                        .append(Words.number(first.values()[0]))
                        .append(" to ")
                        .append(Words.number(course.value()))
                        .append(' ')
                        .append(one.unit())
                        .append(" at ")
                        .append(Durations.clock(course.readAt()));
                for (Watched.Limit limit : one.limits()) {
                    text.append(", ").append(limit.text());
                }
                text.append(course.met() ? course.decides() ? ": met, decides." : ": met." : ": missed.");
            }
        }
        return text.toString();
    }
}
