package org.soakwright.planner.report.picture;

import java.awt.Graphics2D;

/** A finished picture, ready to be drawn in any theme. Safe for use by several threads. */
public final class Picture {
    /** What draws it within its margin; the origin is the top left of what is inside. */
    interface Drawing {
        void on(Graphics2D g, Theme theme);
    }

    private final String id;
    private final String title;
    private final String caption;
    private final String altText;
    private final int width;
    private final int height;
    private final Drawing drawing;
    private String inside = "";

    Picture(String id, String title, String caption, String altText, int width, int height, Drawing drawing) {
        this.id = id;
        this.title = title;
        this.caption = caption;
        this.altText = altText;
        this.width = width + 2 * Sheet.MARGIN;
        this.height = height + 2 * Sheet.MARGIN;
        this.drawing = drawing;
        Typeface.prepare();
    }

    /** Lower-case letters, digits and hyphens; different for each picture of a batch: {@code map-thick-salt}. Fit for a file name. */
    public String id() {
        return id;
    }

    /** As it also stands in the picture. */
    public String title() {
        return title;
    }

    /** One plain sentence that says what to see, written from the numbers. */
    public String caption() {
        return caption;
    }

    /** For those who do not see it: what is drawn against what, and its main numbers. */
    public String altText() {
        return altText;
    }

    /** In px. */
    public int width() {
        return width;
    }

    /** In px. */
    public int height() {
        return height;
    }

    /** A file of its own that needs nothing else; the same bytes on every machine. */
    public String svg(Theme theme) {
        return Svg.file(this, theme);
    }

    /**
     * An {@code <svg>} element to stand in a page, without a prolog: its colours are those of {@link Pictures#stylesheet()}, so that one
     * element serves screens, light or dark, and paper. It has no ids.
     */
    public String inline() {
        return Svg.element(this);
    }

    /** Draws it with its origin at the top left, its ground included; scale before for other sizes than width by height. */
    public void draw(Graphics2D g, Theme theme) {
        Graphics2D own = (Graphics2D) g.create();
        own.translate(Sheet.MARGIN, Sheet.MARGIN);
        drawing.on(own, theme);
        own.dispose();
    }

    /** The light drawing as SVG, drawn once for file and page. */
    synchronized String inside() {
        if (inside.isEmpty()) {
            inside = Svg.inside(this);
        }
        return inside;
    }

    /** The same with its origin inside the margin. */
    void drawInside(Graphics2D g, Theme theme) {
        drawing.on(g, theme);
    }
}
