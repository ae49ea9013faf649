package org.soakwright.planner.report.picture;

import java.awt.Color;
import java.awt.Graphics2D;
import java.awt.Image;
import java.awt.Stroke;
import java.awt.geom.Rectangle2D;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import org.jfree.chart.annotations.XYDataImageAnnotation;
import org.jfree.chart.axis.AxisSpace;
import org.jfree.chart.axis.AxisState;
import org.jfree.chart.axis.NumberAxis;
import org.jfree.chart.axis.NumberTick;
import org.jfree.chart.plot.XYPlot;
import org.jfree.chart.renderer.xy.XYLineAndShapeRenderer;
import org.jfree.chart.ui.Layer;
import org.jfree.chart.ui.RectangleEdge;
import org.jfree.chart.ui.RectangleInsets;
import org.jfree.chart.ui.TextAnchor;
import org.jfree.data.xy.DefaultXYDataset;

/** A field of a picture between two axes: lines, or an image, over a grid. */
final class Panel {
    private static final double TICK_GAP = 8;

    private final Rectangle2D area;
    private final Scale x;
    private final Scale y;
    private final List<Line> lines = new ArrayList<>();
    private final List<Image> images = new ArrayList<>();

    private record Line(double[] xs, double[] ys, Color color, Stroke stroke) {}

    Panel(Rectangle2D area, Scale x, Scale y) {
        this.area = area;
        this.x = x;
        this.y = y;
    }

    Rectangle2D area() {
        return area;
    }

    double x(double value) {
        return area.getX() + x.at(value) * area.getWidth();
    }

    double y(double value) {
        return area.getMaxY() - y.at(value) * area.getHeight();
    }

    void line(double[] xs, double[] ys, Color color, Stroke stroke) {
        lines.add(new Line(xs.clone(), ys.clone(), color, stroke));
    }

    /** Fills the field. */
    void image(Image image) {
        images.add(image);
    }

    /** The name of the vertical axis, above it, and its marks; the unit belongs into the name. */
    void nameRows(Sheet sheet, String name) {
        Look look = sheet.look();
        sheet.text(name, area.getX() - nameIndent(), area.getY() - 13, Sheet.Anchor.LEFT, Look.STRONG, look.ink());
        for (Scale.Tick tick : y.ticks()) {
            sheet.text(
                    tick.label(),
                    area.getX() - TICK_GAP,
                    y(tick.value()) + 4,
                    Sheet.Anchor.RIGHT,
                    Look.TEXT,
                    look.muted());
        }
    }

    private double nameIndent() {
        return Math.min(area.getX(), 48);
    }

    /** The marks of the horizontal axis and its name below them. */
    void nameColumns(Sheet sheet, String name) {
        Look look = sheet.look();
        for (Scale.Tick tick : x.ticks()) {
            double at = x(tick.value());
            sheet.text(tick.label(), at, area.getMaxY() + 17, Sheet.Anchor.CENTRE, Look.TEXT, look.muted());
        }
        sheet.text(name, area.getMaxX(), area.getMaxY() + 35, Sheet.Anchor.RIGHT, Look.STRONG, look.ink());
    }

    void on(Sheet sheet) {
        Look look = sheet.look();
        DefaultXYDataset data = new DefaultXYDataset();
        XYLineAndShapeRenderer renderer = new XYLineAndShapeRenderer(true, false);
        renderer.setDrawSeriesLineAsPath(true);
        for (int i = 0; i < lines.size(); i++) {
            Line line = lines.get(i);
            data.addSeries(Integer.toString(i), shares(line));
            renderer.setSeriesPaint(i, line.color());
            renderer.setSeriesStroke(i, line.stroke());
        }
        for (Image image : images) {
            renderer.addAnnotation(new XYDataImageAnnotation(image, 0, 0, 1, 1), Layer.BACKGROUND);
        }
        XYPlot plot = new XYPlot(data, new Axis(x), new Axis(y), renderer);
        plot.setInsets(RectangleInsets.ZERO_INSETS);
        plot.setAxisOffset(RectangleInsets.ZERO_INSETS);
        plot.setFixedDomainAxisSpace(new AxisSpace());
        plot.setFixedRangeAxisSpace(new AxisSpace());
        plot.setBackgroundPaint(null);
        plot.setOutlineVisible(false);
        plot.setDomainGridlinesVisible(false);
        plot.setRangeGridlinesVisible(images.isEmpty());
        plot.setRangeGridlinePaint(look.grid());
        plot.setRangeGridlineStroke(Look.dashed(1));
        plot.draw(sheet.graphics(), area, null, null, null);
    }

    private double[][] shares(Line line) {
        int count = line.xs().length;
        double[] across = new double[count];
        double[] up = new double[count];
        double[] xs = new double[count];
        double[] ys = new double[count];
        for (int i = 0; i < count; i++) {
            across[i] = x.at(line.xs()[i]);
            up[i] = y.at(line.ys()[i]);
            xs[i] = across[i] * area.getWidth();
            ys[i] = up[i] * area.getHeight();
        }
        boolean[] kept = Bends.kept(xs, ys);
        double[][] points = new double[2][count];
        int n = 0;
        for (int i = 0; i < count; i++) {
            if (kept[i]) {
                points[0][n] = across[i];
                points[1][n++] = up[i];
            }
        }
        return new double[][] {Arrays.copyOf(points[0], n), Arrays.copyOf(points[1], n)};
    }

    /** An axis of shares: it puts the grid where the scale has its marks and draws nothing itself. */
    private static final class Axis extends NumberAxis {
        private static final long serialVersionUID = 1;

        private final transient Scale scale;

        Axis(Scale scale) {
            this.scale = scale;
            setAutoRange(false);
            setRange(0, 1);
            setVisible(true);
            setAxisLineVisible(false);
            setTickMarksVisible(false);
            setTickLabelsVisible(false);
        }

        @Override
        @SuppressWarnings("rawtypes")
        public List refreshTicks(Graphics2D g, AxisState state, Rectangle2D area, RectangleEdge edge) {
            List<NumberTick> ticks = new ArrayList<>();
            for (Scale.Tick tick : scale.ticks()) {
                ticks.add(new NumberTick(scale.at(tick.value()), "", TextAnchor.CENTER, TextAnchor.CENTER, 0));
            }
            return ticks;
        }
    }
}
