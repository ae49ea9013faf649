package org.soakwright.planner.report.picture;

import java.awt.BasicStroke;
import java.awt.Color;
import java.awt.Font;
import java.awt.Stroke;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/**
 * The one visual language: what is drawn in which colour, stroke and size. Colours are chosen in Oklab, so that lightness alone tells
 * them apart: series get lighter in the order of {@link #LADDER}, contents darker as they rise, later steps farther from the ground.
 */
final class Look {
    /** How many different series there are before colours come again; dashes come again later. */
    static final int SERIES = 6;

    /** How many places an order of steps is shown in. */
    static final int ORDER = 12;

    /** How many contents are told apart. */
    static final int SHADES = 256;

    static final float LINE = 2.2f;
    static final int WIDTH = 880;

    static final Font TITLE = Typeface.SEMIBOLD.deriveFont(17f);
    static final Font STRONG = Typeface.SEMIBOLD.deriveFont(12f);
    static final Font TEXT = Typeface.REGULAR.deriveFont(12f);
    static final Font SUBTITLE = Typeface.REGULAR.deriveFont(13f);
    static final Font SMALL = Typeface.REGULAR.deriveFont(11f);

    /** Series in the order in which they are used, by their place on the ladder: the first ones lie far apart. */
    private static final int[] LADDER = {0, 4, 1, 3, 2, 5};

    private static final float[][] DASHES = {{}, {8, 5}, {2, 4.5f}, {11, 4, 2, 4}, {5, 4}, {14, 5}, {8, 4, 2, 4, 2, 4}};

    private static final Oklab[] SERIES_LIGHT = {
        Oklab.ofPolar(0.29, 0.101, 271),
        Oklab.ofPolar(0.385, 0.088, 60),
        Oklab.ofPolar(0.46, 0.161, 297),
        Oklab.ofPolar(0.535, 0.074, 165),
        Oklab.ofPolar(0.6, 0.126, 245),
        Oklab.ofPolar(0.66, 0.134, 105)
    };
    private static final Oklab[] SERIES_DARK = {
        Oklab.ofPolar(0.62, 0.124, 285),
        Oklab.ofPolar(0.685, 0.096, 68),
        Oklab.ofPolar(0.75, 0.132, 311),
        Oklab.ofPolar(0.815, 0.13, 165),
        Oklab.ofPolar(0.88, 0.07, 234),
        Oklab.ofPolar(0.94, 0.12, 105)
    };

    /** From no content to the most: clean, then through the colours of deepening water. */
    private static final Oklab[] CONTENT = {
        Oklab.ofPolar(0.965, 0.025, 100),
        Oklab.ofPolar(0.86, 0.065, 165),
        Oklab.ofPolar(0.72, 0.095, 195),
        Oklab.ofPolar(0.57, 0.105, 230),
        Oklab.ofPolar(0.42, 0.12, 262),
        Oklab.ofPolar(0.27, 0.105, 285)
    };

    private static final Look LIGHT = new Look(
            Theme.LIGHT,
            new Oklab[] {
                new Oklab(1, 0, 0),
                Oklab.ofPolar(0.25, 0.02, 265),
                Oklab.ofPolar(0.5, 0.02, 260),
                Oklab.ofPolar(0.925, 0.005, 260),
                Oklab.ofPolar(0.94, 0.015, 240),
                Oklab.ofPolar(0.54, 0.19, 32),
                Oklab.ofPolar(0.97, 0.008, 240),
                Oklab.ofPolar(0.82, 0.012, 250)
            },
            SERIES_LIGHT,
            Oklab.ofPolar(0.65, 0.105, 205),
            Oklab.ofPolar(0.26, 0.1, 288));
    private static final Look DARK = new Look(
            Theme.DARK,
            new Oklab[] {
                Oklab.ofPolar(0.22, 0.015, 260),
                Oklab.ofPolar(0.94, 0.01, 260),
                Oklab.ofPolar(0.74, 0.015, 260),
                Oklab.ofPolar(0.34, 0.015, 260),
                Oklab.ofPolar(0.305, 0.02, 250),
                Oklab.ofPolar(0.7, 0.165, 38),
                Oklab.ofPolar(0.262, 0.018, 255),
                Oklab.ofPolar(0.44, 0.015, 255)
            },
            SERIES_DARK,
            Oklab.ofPolar(0.63, 0.1, 262),
            Oklab.ofPolar(0.95, 0.06, 160));
    private static final Look GREY = new Look(
            Theme.GREY,
            new Oklab[] {
                new Oklab(1, 0, 0),
                new Oklab(0.2, 0, 0),
                new Oklab(0.48, 0, 0),
                new Oklab(0.925, 0, 0),
                new Oklab(0.94, 0, 0),
                new Oklab(0.01, 0, 0),
                new Oklab(0.97, 0, 0),
                new Oklab(0.82, 0, 0)
            },
            SERIES_LIGHT,
            new Oklab(0.645, 0, 0),
            new Oklab(0.24, 0, 0));

    private final Color ground;
    private final Color ink;
    private final Color muted;
    private final Color grid;
    private final Color ribbon;
    private final Color limit;
    private final Color pause;
    private final Color closed;
    private final List<Color> series = new ArrayList<>();
    private final List<Color> order = new ArrayList<>();
    private final List<Color> contents;

    private Look(Theme theme, Oklab[] roles, Oklab[] ladder, Oklab earliest, Oklab latest) {
        boolean grey = theme == Theme.GREY;
        ground = roles[0].color();
        ink = roles[1].color();
        muted = roles[2].color();
        grid = roles[3].color();
        ribbon = roles[4].color();
        limit = roles[5].color();
        pause = roles[6].color();
        closed = roles[7].color();
        for (int place : LADDER) {
            series.add((grey ? ladder[place].grey() : ladder[place]).color());
        }
        for (int i = 0; i < ORDER; i++) {
            order.add(earliest.towards(latest, (double) i / (ORDER - 1)).color());
        }
        contents = evenly(CONTENT, SHADES).stream()
                .map(shade -> (grey ? shade.grey() : shade).color())
                .toList();
    }

    static Look of(Theme theme) {
        return switch (theme) {
            case LIGHT -> LIGHT;
            case DARK -> DARK;
            case GREY -> GREY;
        };
    }

    Color ground() {
        return ground;
    }

    /** Letters. */
    Color ink() {
        return ink;
    }

    /** Letters of the second rank. */
    Color muted() {
        return muted;
    }

    Color grid() {
        return grid;
    }

    /** The ground of a step. */
    Color ribbon() {
        return ribbon;
    }

    /** What must not be crossed. */
    Color limit() {
        return limit;
    }

    /** Between {@link #ground} and {@link #ribbon}. */
    Color pause() {
        return pause;
    }

    /** What cannot be used. */
    Color closed() {
        return closed;
    }

    Color series(int index) {
        return series.get(index % SERIES);
    }

    /** Of the steps of a chain of so many. */
    Color order(int index, int count) {
        return order.get(count == 1 ? ORDER - 1 : Math.round((float) index * (ORDER - 1) / (count - 1)));
    }

    /** From no content to the most. */
    List<Color> contents() {
        return contents;
    }

    static Stroke line(int series) {
        return dashed(LINE, DASHES[series % DASHES.length]);
    }

    static Stroke dashed(float width, float... dashes) {
        return dashes.length == 0
                ? new BasicStroke(width, BasicStroke.CAP_ROUND, BasicStroke.JOIN_ROUND)
                : new BasicStroke(width, BasicStroke.CAP_ROUND, BasicStroke.JOIN_ROUND, 1, dashes, 0);
    }

    /** Every colour but the contents by what it is for, in a fixed order. */
    Map<String, Color> roles() {
        Map<String, Color> roles = new LinkedHashMap<>();
        roles.put("ground", ground);
        roles.put("ink", ink);
        roles.put("muted", muted);
        roles.put("grid", grid);
        roles.put("ribbon", ribbon);
        roles.put("limit", limit);
        roles.put("pause", pause);
        roles.put("closed", closed);
        for (int i = 0; i < SERIES; i++) {
            roles.put("series-" + i, series.get(i));
        }
        for (int i = 0; i < ORDER; i++) {
            roles.put("order-" + i, order.get(i));
        }
        return roles;
    }

    static String hex(Color color) {
        return String.format(java.util.Locale.ROOT, "#%06x", color.getRGB() & 0xffffff);
    }

    /** So many colours at equal distances along straight lines between anchors. */
    private static List<Oklab> evenly(Oklab[] anchors, int count) {
        double[] along = new double[anchors.length];
        for (int i = 1; i < anchors.length; i++) {
            along[i] = along[i - 1] + anchors[i - 1].distance(anchors[i]);
        }
        List<Oklab> colors = new ArrayList<>();
        int leg = 1;
        for (int i = 0; i < count; i++) {
            double wanted = along[anchors.length - 1] * i / (count - 1);
            while (leg < anchors.length - 1 && along[leg] < wanted) {
                leg++;
            }
            colors.add(
                    anchors[leg - 1].towards(anchors[leg], (wanted - along[leg - 1]) / (along[leg] - along[leg - 1])));
        }
        return colors;
    }
}
