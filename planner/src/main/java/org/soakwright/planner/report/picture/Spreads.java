package org.soakwright.planner.report.picture;

import java.awt.Color;
import java.awt.Graphics2D;
import java.awt.geom.Line2D;
import java.awt.geom.Rectangle2D;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;

/** How many of the pieces that differ read how much of what targets limit, and how many keep the limit. */
final class Spreads {
    private static final int LEFT = 52;
    private static final int RIGHT = 260;
    private static final int FIELD_HEIGHT = 132;
    private static final int HEAD = 30;
    private static final int FOOT = 44;
    private static final double LINE = 16;
    private static final double APART = 5;
    private static final double SAMPLE = 26;
    private static final Scale PERCENT = Scale.linear(0, 100, 5);

    private final List<Spreading> spreadings;
    private final List<Integer> heights = new ArrayList<>();
    private final int height;

    Spreads(History history, List<String> binds) {
        spreadings = Spreading.of(history, binds);
        int sum = 0;
        for (Spreading one : spreadings) {
            double key = LINE + (3 * LINE + APART) * one.pieces().size();
            heights.add(Math.max(FIELD_HEIGHT, (int) key));
            sum += HEAD + heights.get(heights.size() - 1) + FOOT;
        }
        height = (int) Sheet.TOP + sum;
    }

    boolean isEmpty() {
        return spreadings.isEmpty();
    }

    Picture picture() {
        return new Picture("spread", title(), caption(), altText(), Look.WIDTH, height, this::draw);
    }

    private static String title() {
        return "How the pieces differ";
    }

    private void draw(Graphics2D g, Theme theme) {
        Sheet sheet = new Sheet(g, theme, Look.WIDTH, height);
        sheet.head(
                title(),
                "Curve: how many pieces, by mass, read how much. Dashed: the limit. Dot: what the target reads. Cross: it is"
                        + " missed.");
        double top = Sheet.TOP + HEAD;
        for (int i = 0; i < spreadings.size(); i++) {
            Rectangle2D area = new Rectangle2D.Double(LEFT, top, Look.WIDTH - LEFT - RIGHT, heights.get(i));
            draw(sheet, spreadings.get(i), area);
            top += heights.get(i) + FOOT + HEAD;
        }
    }

    private static void draw(Sheet sheet, Spreading one, Rectangle2D area) {
        Look look = sheet.look();
        Reach reach = Reach.of(one);
        Panel panel = new Panel(area, Scale.linear(reach.low(), reach.high(), 7), PERCENT);
        for (double level : levels(one)) {
            panel.line(
                    new double[] {reach.low(), reach.high()},
                    new double[] {level, level},
                    look.muted(),
                    Look.dashed(1.2f, 1, 4));
        }
        for (OptionalDouble limit : List.of(one.atLeast(), one.atMost())) {
            if (limit.isPresent() && reach.holds(limit.getAsDouble())) {
                double at = limit.getAsDouble();
                panel.line(new double[] {at, at}, new double[] {0, 100}, look.limit(), Look.dashed(1.6f, 6, 4));
            }
        }
        for (Spreading.Pieces pieces : one.pieces()) {
            panel.line(
                    values(reach, pieces),
                    shares(one, pieces),
                    look.series(pieces.series()),
                    Look.line(pieces.series()));
        }
        panel.on(sheet);
        String so = one.isFromAbove() ? "so much or more" : "so much or less";
        panel.nameRows(sheet, one.name() + ": pieces that read " + so + ", % by mass");
        panel.nameColumns(sheet, one.name() + ", " + one.unit());
        for (Spreading.Pieces pieces : one.pieces()) {
            Color color = look.series(pieces.series());
            for (double[] point : marked(one, pieces)) {
                Readings.mark(sheet, panel.x(point[0]), panel.y(point[1]), pieces.met(), pieces.decides(), color);
            }
        }
        for (double level : levels(one)) {
            sheet.text(
                    Words.plain(level, level % 1 == 0 ? 1 : 0.1) + " %",
                    area.getMaxX() + 6,
                    panel.y(level) + 4,
                    Sheet.Anchor.LEFT,
                    Look.SMALL,
                    look.muted());
        }
        key(sheet, one, reach, area);
    }

    /** What lines and marks stand for, beside the field. */
    private static void key(Sheet sheet, Spreading one, Reach reach, Rectangle2D area) {
        Look look = sheet.look();
        double x = area.getMaxX() + 46;
        double y = area.getY() + 4;
        double room = Look.WIDTH - x - SAMPLE - 8;
        sheet.draw(new Line2D.Double(x, y - 4, x + SAMPLE, y - 4), look.limit(), Look.dashed(1.6f, 6, 4));
        words(
                sheet,
                one.limits() + reach.beyond(one.atMost()) + reach.beyond(one.atLeast()),
                x + SAMPLE + 8,
                y,
                room,
                look.ink());
        for (Spreading.Pieces pieces : one.pieces()) {
            y += LINE + APART;
            sheet.draw(
                    new Line2D.Double(x, y - 4, x + SAMPLE, y - 4),
                    look.series(pieces.series()),
                    Look.line(pieces.series()));
            double named = room - Typeface.width(pieces.verdict(), Look.TEXT);
            String name = Typeface.fitted(pieces.grade(), Look.TEXT, named);
            words(sheet, name + pieces.verdict(), x + SAMPLE + 8, y, room, look.ink());
            y += LINE;
            String read = one.share().isPresent()
                    ? one.many() + " read " + one.read(pieces, "")
                    : "average " + Words.number(pieces.read());
            words(sheet, read, x + SAMPLE + 8, y, room, look.ink());
            y += LINE;
            String kept = Spreading.percent(one.kept(pieces))
                    + (one.sure().isEmpty() ? " keep the limit" : " at stated values");
            words(sheet, kept, x + SAMPLE + 8, y, room, look.muted());
        }
    }

    private static void words(Sheet sheet, String text, double x, double y, double room, Color color) {
        sheet.text(Typeface.fitted(text, Look.TEXT, room), x, y, Sheet.Anchor.LEFT, Look.TEXT, color);
    }

    /** Shares that the target names, as the curve counts them, %. */
    private static List<Double> levels(Spreading one) {
        if (one.share().isEmpty()) {
            return List.of();
        }
        double inside = 100 * one.inside();
        return one.isBand() ? List.of(inside, 100 - inside) : List.of(inside);
    }

    /** What the target reads of the pieces: values and shares, %. */
    private static List<double[]> marked(Spreading one, Spreading.Pieces pieces) {
        List<double[]> points = new ArrayList<>();
        if (one.isBand() && one.share().isPresent()) {
            for (double share : new double[] {1 - one.inside(), one.inside()}) {
                points.add(new double[] {pieces.atMost(share), 100 * share});
            }
        } else {
            double share = pieces.below(pieces.read());
            if (one.share().isPresent() && !one.sure().isEmpty()) {
                // What so many samples keep lies beside the curve, which is drawn at stated values.
                share = one.isFromAbove() ? 1 - one.inside() : one.inside();
            }
            points.add(new double[] {pieces.read(), 100 * (one.isFromAbove() ? 1 - share : share)});
        }
        return points;
    }

    private static double[] values(Reach reach, Spreading.Pieces pieces) {
        double[] own = pieces.values();
        double[] values = new double[own.length + 2];
        System.arraycopy(own, 0, values, 1, own.length);
        values[0] = reach.low();
        values[values.length - 1] = reach.high();
        return values;
    }

    private static double[] shares(Spreading one, Spreading.Pieces pieces) {
        double[] own = pieces.below();
        double[] shares = new double[own.length + 2];
        for (int i = 0; i < own.length; i++) {
            shares[i + 1] = 100 * own[i];
        }
        shares[shares.length - 1] = 100;
        if (one.isFromAbove()) {
            for (int i = 0; i < shares.length; i++) {
                shares[i] = 100 - shares[i];
            }
        }
        return shares;
    }

    private String caption() {
        Spreading said = spreadings.get(0);
        Spreading.Pieces of = said.pieces().get(0);
        int most = -1;
        for (Spreading one : spreadings) {
            for (Spreading.Pieces pieces : one.pieces()) {
                int weight = (pieces.met() ? 0 : 4)
                        + (pieces.decides() ? 2 : 0)
                        + (one.share().isPresent() ? 1 : 0);
                if (weight > most) {
                    most = weight;
                    said = one;
                    of = pieces;
                }
            }
        }
        return sentence(said, of) + ".";
    }

    private static String sentence(Spreading one, Spreading.Pieces pieces) {
        String unit = " " + one.unit();
        String kept = Spreading.percent(one.kept(pieces));
        if (one.share().isEmpty()) {
            return "The " + one.name() + " of " + pieces.grade() + " is " + Words.number(pieces.read()) + unit
                    + " on average, and " + kept + " of the pieces, by mass, keep the limit, " + one.limits();
        }
        return "Of " + pieces.grade() + ", " + one.many() + " of the pieces, by mass, have a " + one.name() + " of "
                + one.read(pieces, unit) + ", and " + kept + " keep the limit, " + one.limits();
    }

    private String altText() {
        StringBuilder text =
                new StringBuilder("How many of the pieces, by mass, read how much of what each target limits.");
        for (Spreading one : spreadings) {
            for (Spreading.Pieces pieces : one.pieces()) {
                text.append(' ')
                        .append(Words.capital(sentence(one, pieces)))
                        .append("; a twentieth read ")
                        .append(Words.number(pieces.atMost(0.05)))
                        .append(" or less, half ")
                        .append(Words.number(pieces.atMost(0.5)))
                        .append(" or less, a twentieth ")
                        .append(Words.number(pieces.atMost(0.95)))
                        .append(" or more")
                        .append(pieces.met() ? pieces.decides() ? ": met, decides." : ": met." : ": missed.");
            }
        }
        return text.toString();
    }
}
