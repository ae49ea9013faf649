package org.soakwright.planner.report.picture;

import java.awt.Graphics2D;
import java.awt.Stroke;
import java.awt.geom.Line2D;
import java.awt.geom.Point2D;
import java.awt.geom.Rectangle2D;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.Stream;
import org.soakwright.planner.batch.Durations;
import org.soakwright.planner.batch.Section;
import org.soakwright.planner.batch.StepEnd;
import org.soakwright.planner.report.PieceWords;
import org.soakwright.recipes.model.Grade;

/** One species in one grade of several sides: the whole cut through the core in its true proportions when each step ends. */
final class CrossSection {
    /** Of each half of a side: how many points are looked at. */
    static final int POINTS = 33;

    private static final int LEFT = 52;
    private static final int RIGHT = 148;
    private static final int GAP = 28;
    private static final int MOST_COLUMNS = 4;
    /** A cut that is smaller than this is given a row with fewer others. */
    private static final double LEAST_HEIGHT = 90;

    private static final double MOST_HEIGHT = 260;
    private static final int HEAD = 40;
    private static final int SEALED_LINE = 15;
    private static final int TICKS = 26;
    private static final int ROW_GAP = 16;
    private static final int BAR_HEIGHT = 132;
    private static final float BOUND = 1.8f;
    private static final double FLAT = 40;
    private static final double PX_PER_CELL = 2.5;
    private static final float[][] DASHES = {{}, {7, 5}, {2, 4.5f}, {11, 4, 2, 4}};

    private final History history;
    private final int species;
    private final Grade grade;
    private final CutFace cut;
    private final Scale contents;
    private final List<Bound> bounds = new ArrayList<>();
    private final List<double[][]> wholes = new ArrayList<>();
    private final int columns;
    private final int rows;
    private final int slot;
    private final int width;
    private final int height;

    /**
     * A picture of a cut.
     *
     * @param contents what the shades stand for
     */
    CrossSection(History history, int species, int gradeIndex, Section section, Scale contents) {
        this.history = history;
        this.species = species;
        this.contents = contents;
        grade = history.grades().get(gradeIndex);
        cut = new CutFace(section);
        cut.ends().forEach(end -> wholes.add(cut.whole(end)));
        for (Bound bound : Bound.of(history, species, gradeIndex)) {
            if (wholes.stream()
                    .anyMatch(whole -> !Contour.of(whole, bound.level()).isEmpty())) {
                bounds.add(bound);
            }
        }
        columns = columns();
        rows = (cut.ends().size() + columns - 1) / columns;
        slot = slot(columns);
        double scale = scale(columns);
        // An image lies on whole px.
        width = Math.max(1, (int) Math.rint(scale * cut.width()));
        height = Math.max(1, (int) Math.rint(scale * cut.height()));
    }

    private int columns() {
        int most = Math.min(MOST_COLUMNS, cut.ends().size());
        for (int c = most; c > 1; c--) {
            if (scale(c) * cut.height() >= LEAST_HEIGHT) {
                return c;
            }
        }
        return 1;
    }

    private static int slot(int columns) {
        return (Look.WIDTH - LEFT - RIGHT - GAP * (columns - 1)) / columns;
    }

    /** px per mm. */
    private double scale(int columns) {
        return Math.min(slot(columns) / cut.width(), MOST_HEIGHT / cut.height());
    }

    Picture picture() {
        return new Picture(
                "section-" + Words.identifier(grade.name()) + "-" + Words.identifier(name()),
                title(),
                caption(),
                altText(),
                Look.WIDTH,
                wholeHeight(),
                this::draw);
    }

    private int rowHeight() {
        return HEAD + height + (cut.isUnlikeBelow() ? SEALED_LINE : 0) + ROW_GAP;
    }

    private int wholeHeight() {
        int fields = rows * rowHeight() + TICKS;
        return (int) Sheet.TOP + Math.max(fields, HEAD + BAR_HEIGHT + ROW_GAP) + (bounds.isEmpty() ? 14 : 36);
    }

    private String name() {
        return history.recipe().species().get(species).name();
    }

    private String title() {
        return Words.capital(name()) + " in " + grade.name() + ", cut through the core";
    }

    private String sides() {
        return cut.across().dimension().word() + " and "
                + cut.down().dimension().word();
    }

    private void draw(Graphics2D g, Theme theme) {
        Sheet sheet = new Sheet(g, theme, Look.WIDTH, wholeHeight());
        Look look = sheet.look();
        sheet.head(
                title(),
                "Shade: the content when each step ends. Cross: the core."
                        + (cut.isUnlikeBelow() ? " Thick edge: " + Words.list(unlike()) + "." : "")
                        + (differs() ? " A piece as stated." : ""));
        for (int i = 0; i < wholes.size(); i++) {
            int x = LEFT + i % columns * (slot + GAP);
            int y = (int) Sheet.TOP + i / columns * rowHeight() + HEAD;
            draw(sheet, i, new Rectangle2D.Double(x, y, width, height));
        }
        double top = Sheet.TOP + HEAD;
        ShadeBar.on(sheet, Look.WIDTH - RIGHT + 22.0, top, BAR_HEIGHT, contents, history.unit(species));
        double baseline = Sheet.TOP + rows * rowHeight() + TICKS;
        sheet.text(
                "across: " + cut.across().dimension().word() + ", mm; down: "
                        + cut.down().dimension().word() + ", mm",
                LEFT,
                baseline,
                Sheet.Anchor.LEFT,
                Look.STRONG,
                look.ink());
        key(sheet, baseline + 22);
    }

    private void draw(Sheet sheet, int step, Rectangle2D area) {
        Look look = sheet.look();
        StepEnd end = history.ends().get(step);
        Panel panel = new Panel(area, Scale.full(cut.width(), ticks(area.getWidth(), 46)), downScale(area));
        double[][] whole = wholes.get(step);
        double[][] shares = CutFace.resampled(
                whole, (int) Math.ceil(area.getWidth() / PX_PER_CELL), (int) Math.ceil(area.getHeight() / PX_PER_CELL));
        for (double[] column : shares) {
            java.util.Arrays.setAll(column, j -> contents.at(column[j]));
        }
        sheet.image(Shades.image(shares, look.contents()), area);
        // On a cut that is nearly a line itself, seams would leave nothing to be seen.
        boolean flat = Math.min(area.getWidth(), area.getHeight()) < FLAT;
        for (int b = 0; b < bounds.size(); b++) {
            for (List<Point2D> line : Contour.of(whole, bounds.get(b).level())) {
                Isolines.draw(
                        sheet,
                        placed(area, whole, line),
                        Look.dashed(flat ? 2 : Isolines.SEAM),
                        dashed(b, flat ? 1.2f : BOUND));
            }
        }
        edges(sheet, area);
        heading(sheet, step, end, area);
        if (step % columns == 0) {
            panel.nameRows(sheet, "");
        }
        if (step + columns >= wholes.size()) {
            for (Scale.Tick tick :
                    Scale.full(cut.width(), ticks(area.getWidth(), 46)).ticks()) {
                sheet.text(
                        tick.label(),
                        panel.x(tick.value()),
                        area.getMaxY() + 17 + (cut.isUnlikeBelow() ? SEALED_LINE : 0),
                        Sheet.Anchor.CENTRE,
                        Look.TEXT,
                        look.muted());
            }
        }
    }

    private static int ticks(double length, double each) {
        return Math.max(1, (int) (length / each));
    }

    /** A cut too flat for two marks has its whole height marked only. */
    private Scale downScale(Rectangle2D area) {
        Scale full = Scale.full(cut.height(), ticks(area.getHeight(), 22)).reversed();
        if (area.getHeight() >= 22) {
            return full;
        }
        List<Scale.Tick> last =
                full.ticks().subList(full.ticks().size() - 1, full.ticks().size());
        return new Scale.Placed(last, full::at);
    }

    private static List<Point2D> placed(Rectangle2D area, double[][] whole, List<Point2D> line) {
        double[] xs = new double[line.size()];
        double[] ys = new double[line.size()];
        for (int i = 0; i < xs.length; i++) {
            xs[i] = area.getX() + area.getWidth() * line.get(i).getX() / (whole.length - 1);
            ys[i] = area.getY() + area.getHeight() * line.get(i).getY() / (whole[0].length - 1);
        }
        boolean[] kept = Bends.kept(xs, ys);
        List<Point2D> placed = new ArrayList<>();
        for (int i = 0; i < xs.length; i++) {
            if (kept[i]) {
                placed.add(new Point2D.Double(xs[i], ys[i]));
            }
        }
        return placed;
    }

    private static Stroke dashed(int bound, float width) {
        return Look.dashed(width, DASHES[bound % DASHES.length]);
    }

    /** The wetted faces thin, the sealed ones thick, and the core. */
    private void edges(Sheet sheet, Rectangle2D area) {
        Look look = sheet.look();
        sheet.draw(area, look.muted(), Look.dashed(1));
        if (cut.isUnlikeBelow()) {
            sheet.fill(new Rectangle2D.Double(area.getX() - 1, area.getMaxY(), area.getWidth() + 2, 4), look.ink());
            sheet.text(edges(), area.getX(), area.getMaxY() + 16, Sheet.Anchor.LEFT, Look.SMALL, look.ink());
        }
        if (cut.isUnlikeLeft()) {
            sheet.fill(new Rectangle2D.Double(area.getX() - 4, area.getY() - 1, 4, area.getHeight() + 5), look.ink());
        }
        double x = area.getX() + cut.coreAcross() * area.getWidth();
        double y = area.getY() + cut.coreDown() * area.getHeight();
        for (Line2D arm : List.of(new Line2D.Double(x - 5, y, x + 5, y), new Line2D.Double(x, y - 5, x, y + 5))) {
            sheet.draw(arm, look.ground(), Look.dashed(4.5f));
        }
        for (Line2D arm : List.of(new Line2D.Double(x - 5, y, x + 5, y), new Line2D.Double(x, y - 5, x, y + 5))) {
            sheet.draw(arm, look.ink(), Look.dashed(1.8f));
        }
    }

    private void heading(Sheet sheet, int step, StepEnd end, Rectangle2D area) {
        Look look = sheet.look();
        String clock = ", " + Durations.clock(end.to());
        double room = slot - Typeface.width(clock, Look.STRONG);
        sheet.text(
                Typeface.fitted((step + 1) + "  " + end.step().name(), Look.STRONG, room) + clock,
                area.getX(),
                area.getY() - 23,
                Sheet.Anchor.LEFT,
                Look.STRONG,
                look.ink());
        Section.End held = cut.ends().get(step);
        sheet.text(
                "core " + Words.number(cut.core(held)) + (hasSkin() ? ", bare corners " : ", corners ")
                        + Words.number(cut.corner(held)),
                area.getX(),
                area.getY() - 8,
                Sheet.Anchor.LEFT,
                Look.SMALL,
                look.muted());
    }

    /** Which line stands for which content. */
    private void key(Sheet sheet, double baseline) {
        double x = LEFT;
        for (int b = 0; b < bounds.size(); b++) {
            String text = bounds.get(b).text();
            sheet.draw(
                    new Line2D.Double(x, baseline - 4, x + 26, baseline - 4),
                    sheet.look().limit(),
                    dashed(b, BOUND));
            sheet.text(
                    text,
                    x + 34,
                    baseline,
                    Sheet.Anchor.LEFT,
                    Look.TEXT,
                    sheet.look().ink());
            x += 34 + Typeface.width(text, Look.TEXT) + 24;
        }
    }

    /** What kinds of thick edges there are. */
    private List<String> unlike() {
        return Stream.of(cut.below(), cut.left())
                .filter(from -> from != CutFace.From.CORE)
                .map(CrossSection::word)
                .distinct()
                .toList();
    }

    private static String word(CutFace.From from) {
        return from == CutFace.From.SKIN ? "with a skin" : "sealed";
    }

    /** {@code sealed face}, {@code with a skin below, sealed left}. */
    private String edges() {
        if (!cut.isUnlikeLeft()) {
            return cut.below() == CutFace.From.SKIN ? "face with skin" : "sealed face";
        }
        return cut.below() == cut.left()
                ? word(cut.below()) + ": below and left"
                : word(cut.below()) + " below, " + word(cut.left()) + " left";
    }

    private boolean hasSkin() {
        return cut.below() == CutFace.From.SKIN || cut.left() == CutFace.From.SKIN;
    }

    private boolean differs() {
        return PieceWords.differ(grade, history.recipe().species().get(species));
    }

    private String caption() {
        Section.End last = cut.ends().get(cut.ends().size() - 1);
        String unit = " " + history.unit(species);
        return "Cut through the core along " + sides() + ": when "
                + history.ends().get(last.step()).step().name() + " ends, "
                + (differs() ? "a piece of " + grade.name() + " as stated" : grade.name()) + " holds "
                + Words.number(cut.core(last)) + unit + " at the core and " + Words.number(cut.corner(last)) + unit
                + " where two " + (hasSkin() ? "bare " : "") + "faces of the cut meet.";
    }

    private String altText() {
        String unit = " " + history.unit(species);
        StringBuilder text = new StringBuilder("Cut of " + grade.name() + " through the core, "
                + cut.across().dimension().word() + " " + cut.across().size() + " across, "
                + cut.down().dimension().word() + " " + cut.down().size() + " down"
                + (cut.isUnlikeBelow() ? ", " + edges() : "")
                + ": " + name() + " when each step ends.");
        for (Section.End end : cut.ends()) {
            text.append(' ')
                    .append(Words.capital(history.ends().get(end.step()).step().name()))
                    .append(": core ")
                    .append(Words.number(cut.core(end)))
                    .append(unit)
                    .append(", middle of the wetted face across ")
                    .append(Words.number(cut.middleOfFace(end, true)))
                    .append(unit)
                    .append(", middle of the wetted face down ")
                    .append(Words.number(cut.middleOfFace(end, false)))
                    .append(unit)
                    .append(", corners ")
                    .append(Words.number(cut.corner(end)))
                    .append(unit)
                    .append('.');
        }
        return text.toString();
    }
}
