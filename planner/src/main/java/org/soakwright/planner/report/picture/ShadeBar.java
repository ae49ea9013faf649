package org.soakwright.planner.report.picture;

import java.awt.geom.Rectangle2D;

/** What the shades stand for: a bar of them beside its scale. */
final class ShadeBar {
    private static final double WIDTH = 14;
    private static final int STEPS = 128;

    private ShadeBar() {}

    static void on(Sheet sheet, double x, double top, double height, Scale contents, String unit) {
        Look look = sheet.look();
        double[][] ramp = new double[1][STEPS];
        for (int j = 0; j < STEPS; j++) {
            ramp[0][j] = 1 - (j + 0.5) / STEPS;
        }
        Rectangle2D bar = new Rectangle2D.Double(x, top, WIDTH, height);
        Panel scale = new Panel(bar, contents, contents);
        scale.image(Shades.image(ramp, look.contents()));
        scale.on(sheet);
        sheet.text("content, " + unit, x, top - 13, Sheet.Anchor.LEFT, Look.STRONG, look.ink());
        for (Scale.Tick tick : contents.ticks()) {
            sheet.text(
                    tick.label(),
                    bar.getMaxX() + 7,
                    scale.y(tick.value()) + 4,
                    Sheet.Anchor.LEFT,
                    Look.TEXT,
                    look.muted());
        }
    }
}
