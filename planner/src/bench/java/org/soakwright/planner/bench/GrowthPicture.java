package org.soakwright.planner.bench;

import java.util.List;
import java.util.Locale;

/** Seconds over lots, both by logarithm, as SVG; a dashed line shows what growing as the lots do would be. */
final class GrowthPicture {
    private static final int WIDTH = 560;
    private static final int HEIGHT = 340;
    private static final int LEFT = 60;
    private static final int BOTTOM = 290;

    private GrowthPicture() {}

    /** A line planned. */
    record Point(int lots, double seconds) {}

    static String of(List<Point> points) {
        StringBuilder svg = new StringBuilder(String.format(
                Locale.ROOT,
                "<svg xmlns=\"http://www.w3.org/2000/svg\" viewBox=\"0 0 %d %d\" font-family=\"sans-serif\" font-size=\"12\">%n"
                        + "<rect width=\"100%%\" height=\"100%%\" fill=\"white\"/>%n"
                        + "<text x=\"%d\" y=\"22\" font-size=\"14\">Seconds until every lot has a valid place, by the number of lots</text>%n",
                WIDTH,
                HEIGHT,
                LEFT));
        for (double seconds : new double[] {0.1, 1, 10, 100}) {
            svg.append(String.format(
                    Locale.ROOT,
                    "<line x1=\"%d\" x2=\"%d\" y1=\"%.1f\" y2=\"%.1f\" stroke=\"#ddd\"/><text x=\"%d\" y=\"%.1f\" text-anchor=\"end\">%s s</text>%n",
                    LEFT,
                    WIDTH - 20,
                    y(seconds),
                    y(seconds),
                    LEFT - 8,
                    y(seconds) + 4,
                    seconds < 1 ? "0.1" : String.format(Locale.ROOT, "%.0f", seconds)));
        }
        StringBuilder line = new StringBuilder();
        for (Point point : points) {
            line.append(String.format(Locale.ROOT, "%.1f,%.1f ", x(point.lots()), y(point.seconds())));
            svg.append(String.format(
                    Locale.ROOT,
                    "<circle cx=\"%.1f\" cy=\"%.1f\" r=\"4\" fill=\"#1f3f8f\"/><text x=\"%.1f\" y=\"%d\" text-anchor=\"middle\">%d</text>%n",
                    x(point.lots()),
                    y(point.seconds()),
                    x(point.lots()),
                    BOTTOM + 20,
                    point.lots()));
        }
        Point first = points.get(0);
        Point last = points.get(points.size() - 1);
        double alike = first.seconds() * last.lots() / first.lots();
        svg.append(String.format(
                Locale.ROOT,
                "<polyline points=\"%s\" fill=\"none\" stroke=\"#1f3f8f\" stroke-width=\"2\"/>%n"
                        + "<line x1=\"%.1f\" y1=\"%.1f\" x2=\"%.1f\" y2=\"%.1f\" stroke=\"#888\" stroke-dasharray=\"5 4\"/>%n"
                        + "<text x=\"%d\" y=\"%d\" text-anchor=\"middle\">lots</text>%n</svg>%n",
                line.toString().strip(),
                x(first.lots()),
                y(first.seconds()),
                x(last.lots()),
                y(alike),
                (LEFT + WIDTH) / 2,
                BOTTOM + 40));
        return svg.toString();
    }

    private static double x(int lots) {
        return LEFT + 20 + (WIDTH - LEFT - 60) * Math.log(lots / 20.0) / Math.log(640 / 20.0);
    }

    private static double y(double seconds) {
        return BOTTOM - (BOTTOM - 50) * Math.log(seconds / 0.1) / Math.log(100 / 0.1);
    }
}
