package org.soakwright.planner.report.picture;

import java.awt.geom.Point2D;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import org.jspecify.annotations.Nullable;

/** Where a surface over a grid has one height, as lines: each cell's crossings, by straight lines along its edges, joined end to end. */
final class Contour {
    private final double[][] heights;
    private final double level;
    private final List<List<Point2D>> lines = new ArrayList<>();

    private Contour(double[][] heights, double level) {
        this.heights = heights;
        this.level = level;
    }

    /** Lines in grid coordinates, column across and row down, for heights by column then row. */
    static List<List<Point2D>> of(double[][] heights, double level) {
        Contour contour = new Contour(heights, level);
        contour.cross();
        return contour.lines;
    }

    private void cross() {
        for (int i = 0; i + 1 < heights.length; i++) {
            for (int j = 0; j + 1 < heights[i].length; j++) {
                List<Point2D> crossings = new ArrayList<>(4);
                edge(crossings, i, j, i + 1, j);
                edge(crossings, i + 1, j, i + 1, j + 1);
                edge(crossings, i + 1, j + 1, i, j + 1);
                edge(crossings, i, j + 1, i, j);
                for (int k = 0; k + 1 < crossings.size(); k += 2) {
                    join(crossings.get(k), crossings.get(k + 1));
                }
            }
        }
    }

    private void edge(List<Point2D> crossings, int i, int j, int m, int n) {
        // Always from the same end, so that both cells find the very same point.
        if (m < i || n < j) {
            edge(crossings, m, n, i, j);
            return;
        }
        double a = heights[i][j];
        double b = heights[m][n];
        if (a >= level != b >= level) {
            double share = (level - a) / (b - a);
            crossings.add(new Point2D.Double(i + share * (m - i), j + share * (n - j)));
        }
    }

    private void join(Point2D from, Point2D to) {
        List<Point2D> line = touching(from, null);
        if (line == null) {
            line = touching(to, null);
            if (line == null) {
                lines.add(new ArrayList<>(List.of(from, to)));
            } else {
                endAt(line, to);
                line.add(from);
            }
            return;
        }
        endAt(line, from);
        List<Point2D> other = touching(to, line);
        if (other == null) {
            line.add(to);
            return;
        }
        endAt(other, to);
        Collections.reverse(other);
        line.addAll(other);
        lines.remove(indexOf(other));
    }

    /** A line other than one that begins or ends there. */
    private @Nullable List<Point2D> touching(Point2D end, @Nullable List<Point2D> except) {
        for (int i = lines.size() - 1; i >= 0; i--) {
            List<Point2D> line = lines.get(i);
            boolean same = except != null && indexOf(except) == i;
            if (!same && (line.get(line.size() - 1).equals(end) || line.get(0).equals(end))) {
                return line;
            }
        }
        return null;
    }

    /** By which object it is: two lines may look the same. */
    @SuppressWarnings("ReferenceEquality")
    private int indexOf(List<Point2D> line) {
        int i = 0;
        while (lines.get(i) != line) {
            i++;
        }
        return i;
    }

    private static void endAt(List<Point2D> line, Point2D end) {
        if (!line.get(line.size() - 1).equals(end)) {
            Collections.reverse(line);
        }
    }
}
