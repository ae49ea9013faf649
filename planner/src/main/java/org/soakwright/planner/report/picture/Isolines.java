package org.soakwright.planner.report.picture;

import java.awt.Stroke;
import java.awt.geom.Path2D;
import java.awt.geom.Point2D;
import java.awt.geom.Rectangle2D;
import java.awt.geom.RoundRectangle2D;
import java.util.ArrayList;
import java.util.List;

/** Lines on shades where the content is one that a target names. */
final class Isolines {
    static final float SEAM = 4;

    private final Sheet sheet;
    private final Rectangle2D field;
    private final List<List<Point2D>> drawn = new ArrayList<>();
    private final List<Named> longest = new ArrayList<>();

    private record Named(List<Point2D> line, String text) {}

    Isolines(Sheet sheet, Rectangle2D field) {
        this.sheet = sheet;
        this.field = field;
    }

    /** The lines of one content, in px, to be named by {@link #name}. */
    void add(List<List<Point2D>> lines, String text) {
        List<Point2D> most = List.of();
        for (List<Point2D> line : lines) {
            draw(sheet, line, Look.dashed(SEAM), Look.dashed(1.8f));
            drawn.add(line);
            most = span(line) > span(most) ? line : most;
        }
        longest.add(new Named(most, text));
    }

    /** Set off from the shades by a seam of ground. */
    static void draw(Sheet sheet, List<Point2D> line, Stroke seam, Stroke stroke) {
        Path2D path = new Path2D.Double();
        path.moveTo(line.get(0).getX(), line.get(0).getY());
        line.stream().skip(1).forEach(point -> path.lineTo(point.getX(), point.getY()));
        sheet.draw(path, sheet.look().ground(), seam);
        sheet.draw(path, sheet.look().limit(), stroke);
    }

    private static double span(List<Point2D> line) {
        return line.isEmpty() ? 0 : line.get(0).distance(line.get(line.size() - 1)) + line.size() / 1000.0;
    }

    /** Names the longest line of each content upon itself, where the name covers no other. */
    void name() {
        for (Named own : longest) {
            name(own, drawn.stream().filter(line -> line != own.line()).toList());
        }
    }

    private void name(Named own, List<List<Point2D>> others) {
        List<Point2D> line = own.line();
        String text = own.text();
        double width = Typeface.width(text, Look.SMALL) + 10;
        for (int i = 0; i < 40 && !line.isEmpty(); i++) {
            // From the middle outwards.
            double share = 0.5 + (i % 2 == 0 ? 0.0125 : -0.0125) * i;
            Point2D at = line.get((int) Math.rint(share * (line.size() - 1)));
            for (double aside : new double[] {0, 1, -1}) {
                double left = at.getX() - width / 2 + aside * (width / 2 + 8);
                RoundRectangle2D ground = new RoundRectangle2D.Double(left, at.getY() - 8.5, width, 17, 6, 6);
                Rectangle2D kept = new Rectangle2D.Double(left - 3, at.getY() - 11, width + 6, 22);
                if (field.contains(ground.getBounds2D())
                        && others.stream().flatMap(List::stream).noneMatch(kept::contains)
                        && sheet.isFree(text, left + 5, at.getY() + 4, Sheet.Anchor.LEFT, Look.SMALL)) {
                    sheet.fill(ground, sheet.look().ground());
                    sheet.text(
                            text,
                            left + 5,
                            at.getY() + 4,
                            Sheet.Anchor.LEFT,
                            Look.SMALL,
                            sheet.look().ink());
                    return;
                }
            }
        }
    }
}
