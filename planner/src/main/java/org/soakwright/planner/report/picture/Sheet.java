package org.soakwright.planner.report.picture;

import java.awt.Color;
import java.awt.Font;
import java.awt.Graphics2D;
import java.awt.Image;
import java.awt.RenderingHints;
import java.awt.Shape;
import java.awt.Stroke;
import java.awt.geom.Rectangle2D;
import java.util.ArrayList;
import java.util.List;

/** Where a picture is drawn: a ground with a title, and letters that know how wide they are. */
final class Sheet {
    /** Which point of a line of text is placed. */
    enum Anchor {
        LEFT(0),
        CENTRE(0.5),
        RIGHT(1);

        private final double share;

        Anchor(double share) {
            this.share = share;
        }
    }

    /** Of ground around what is drawn. */
    static final int MARGIN = 12;

    static final double TITLE_LINE = 15;
    static final double SUBTITLE_LINE = 36;
    /** Where what is below the titles begins. */
    static final double TOP = 52;

    private final Graphics2D g;
    private final Look look;
    private final int width;
    private final List<Rectangle2D> written = new ArrayList<>();

    Sheet(Graphics2D g, Theme theme, int width, int height) {
        this.g = g;
        this.width = width;
        look = Look.of(theme);
        g.setRenderingHint(RenderingHints.KEY_ANTIALIASING, RenderingHints.VALUE_ANTIALIAS_ON);
        g.setRenderingHint(RenderingHints.KEY_TEXT_ANTIALIASING, RenderingHints.VALUE_TEXT_ANTIALIAS_ON);
        g.setRenderingHint(RenderingHints.KEY_FRACTIONALMETRICS, RenderingHints.VALUE_FRACTIONALMETRICS_ON);
        g.setRenderingHint(RenderingHints.KEY_INTERPOLATION, RenderingHints.VALUE_INTERPOLATION_BILINEAR);
        g.setRenderingHint(RenderingHints.KEY_STROKE_CONTROL, RenderingHints.VALUE_STROKE_PURE);
        fill(new Rectangle2D.Double(-MARGIN, -MARGIN, width + 2 * MARGIN, height + 2 * MARGIN), look.ground());
    }

    Graphics2D graphics() {
        return g;
    }

    Look look() {
        return look;
    }

    void head(String title, String subtitle) {
        text(Typeface.fitted(title, Look.TITLE, width), 0, TITLE_LINE, Anchor.LEFT, Look.TITLE, look.ink());
        text(
                Typeface.fitted(subtitle, Look.SUBTITLE, width),
                0,
                SUBTITLE_LINE,
                Anchor.LEFT,
                Look.SUBTITLE,
                look.muted());
    }

    /** A remark in the last line. */
    void foot(String text, double x, double baseline, double most) {
        text(Typeface.fitted(text, Look.SMALL, most), x, baseline, Anchor.LEFT, Look.SMALL, look.muted());
    }

    void text(String text, double x, double baseline, Anchor anchor, Font font, Color color) {
        if (text.isEmpty()) {
            return;
        }
        double length = Typeface.width(text, font);
        double left = x - anchor.share * length;
        g.setFont(font);
        g.setColor(color);
        g.drawString(text, (float) left, (float) baseline);
        written.add(box(left, baseline, length, font));
    }

    /** Whether a line could be written there without touching another one. */
    boolean isFree(String text, double x, double baseline, Anchor anchor, Font font) {
        double length = Typeface.width(text, font);
        Rectangle2D box = box(x - anchor.share * length, baseline, length, font);
        return box.getMinX() >= 0
                && box.getMaxX() <= width
                && written.stream().noneMatch(other -> other.intersects(box));
    }

    /** From the top of the ascenders to the foot of the descenders. */
    static Rectangle2D box(double left, double baseline, double length, Font font) {
        double size = font.getSize2D();
        return new Rectangle2D.Double(left, baseline - 0.76 * size, length, size);
    }

    void fill(Shape shape, Color color) {
        g.setColor(color);
        g.fill(shape);
    }

    /** Fills an area of whole px, however flat. */
    void image(Image image, Rectangle2D area) {
        g.drawImage(image, (int) area.getX(), (int) area.getY(), (int) area.getWidth(), (int) area.getHeight(), null);
    }

    void draw(Shape shape, Color color, Stroke stroke) {
        g.setColor(color);
        g.setStroke(stroke);
        g.draw(shape);
    }
}
