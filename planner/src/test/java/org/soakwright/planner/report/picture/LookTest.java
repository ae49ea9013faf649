package org.soakwright.planner.report.picture;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.awt.BasicStroke;
import java.awt.Color;
import java.util.Arrays;
import java.util.HashSet;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

class LookTest {
    /** Web Content Accessibility Guidelines 2.2, success criteria 1.4.3 and 1.4.11. */
    private static final double READABLE = 4.5;

    private static final double VISIBLE = 3;

    /** About five of the least differences that are seen side by side, 0.02 in Oklab. */
    private static final double APART = 0.1;

    /**
     * G. M. Machado, M. M. Oliveira, L. A. F. Fernandes, A physiologically-based model for simulation of color vision deficiency, IEEE
     * Transactions on Visualization and Computer Graphics 15 (2009) 1291: severity 1.0, on linear light.
     */
    private static final double[][] PROTANOPIA = {
        {0.152286, 1.052583, -0.204868}, {0.114503, 0.786281, 0.099216}, {-0.003882, -0.048116, 1.051998}
    };

    private static final double[][] DEUTERANOPIA = {
        {0.367322, 0.860646, -0.227968}, {0.280085, 0.672501, 0.047413}, {-0.011820, 0.042940, 0.968881}
    };
    private static final double[][] ALL = {{1, 0, 0}, {0, 1, 0}, {0, 0, 1}};

    @ParameterizedTest
    @EnumSource(Theme.class)
    void lettersAreReadable(Theme theme) {
        Look look = Look.of(theme);
        for (Color ground : List.of(look.ground(), look.ribbon())) {
            assertTrue(contrast(look.ink(), ground) >= READABLE);
        }
        assertTrue(contrast(look.muted(), look.ground()) >= READABLE);
    }

    @ParameterizedTest
    @EnumSource(Theme.class)
    void linesAreVisible(Theme theme) {
        Look look = Look.of(theme);
        for (int i = 0; i < Look.SERIES; i++) {
            assertTrue(contrast(look.series(i), look.ground()) >= VISIBLE, theme + " series " + i);
        }
        for (int i = 0; i < Look.ORDER; i++) {
            assertTrue(contrast(look.order(i, Look.ORDER), look.ground()) >= VISIBLE, theme + " step " + i);
        }
        assertTrue(contrast(look.limit(), look.ground()) >= VISIBLE);
    }

    @ParameterizedTest
    @EnumSource(
            value = Theme.class,
            names = {"LIGHT", "DARK"})
    void seriesDifferToEveryEye(Theme theme) {
        Look look = Look.of(theme);
        for (double[][] eye : List.of(ALL, PROTANOPIA, DEUTERANOPIA)) {
            for (int i = 0; i < Look.SERIES; i++) {
                for (int j = 0; j < i; j++) {
                    double distance = seen(eye, look.series(i)).distance(seen(eye, look.series(j)));
                    assertTrue(distance >= APART, theme + ": " + i + " and " + j + " are " + distance + " apart");
                }
            }
        }
    }

    @ParameterizedTest
    @EnumSource(Theme.class)
    void seriesDifferInLightnessAndDash(Theme theme) {
        Look look = Look.of(theme);
        for (int i = 0; i < Look.SERIES; i++) {
            for (int j = 0; j < i; j++) {
                double one = Oklab.of(look.series(i)).lightness();
                double other = Oklab.of(look.series(j)).lightness();
                assertTrue(Math.abs(one - other) > 0.05, theme + ": " + i + " and " + j);
                float[] dash = ((BasicStroke) Look.line(i)).getDashArray();
                assertTrue(!Arrays.equals(dash, ((BasicStroke) Look.line(j)).getDashArray()));
            }
        }
    }

    @ParameterizedTest
    @EnumSource(Theme.class)
    void moreContentIsDarkerAllTheWay(Theme theme) {
        List<Color> shades = Look.of(theme).contents();
        for (int i = 2; i < shades.size(); i++) {
            // Fewer greys than shades lie between: two neighbours may share one, three not.
            assertTrue(luminance(shades.get(i)) <= luminance(shades.get(i - 1)), theme + " at " + i);
            assertTrue(luminance(shades.get(i)) < luminance(shades.get(i - 2)), theme + " at " + i);
        }
    }

    @Test
    void equalStepsOfContentLookEqual() {
        List<Color> shades = Look.of(Theme.LIGHT).contents();
        int stride = 15;
        double first = Oklab.of(shades.get(0)).distance(Oklab.of(shades.get(stride)));
        for (int i = stride; i + stride < shades.size(); i += stride) {
            double step = Oklab.of(shades.get(i)).distance(Oklab.of(shades.get(i + stride)));
            // A corner of the path cuts a step short; 8-bit colours add about a hundredth.
            assertEquals(first, step, 0.12 * first, "at " + i);
        }
    }

    @Test
    void greyIsGrey() {
        for (Color color : Look.of(Theme.GREY).contents()) {
            assertTrue(color.getRed() == color.getGreen() && color.getGreen() == color.getBlue());
        }
        Look.of(Theme.GREY).roles().forEach((role, color) -> assertEquals(color.getRed(), color.getBlue(), role));
    }

    @Test
    void laterStepsAreFartherFromTheGround() {
        for (Theme theme : Theme.values()) {
            Look look = Look.of(theme);
            for (int i = 1; i < Look.ORDER; i++) {
                assertTrue(contrast(look.order(i, Look.ORDER), look.ground())
                        > contrast(look.order(i - 1, Look.ORDER), look.ground()));
            }
        }
    }

    @Test
    void noColourHasTwoRolesSoThatPagesCanNameThem() {
        var roles = Look.of(Theme.LIGHT).roles();
        assertEquals(roles.size(), new HashSet<>(roles.values()).size());
        assertNotEquals(0, roles.size());
    }

    private static Oklab seen(double[][] eye, Color color) {
        double[] light = {Oklab.linear(color.getRed()), Oklab.linear(color.getGreen()), Oklab.linear(color.getBlue())};
        int[] seen = new int[3];
        for (int i = 0; i < 3; i++) {
            seen[i] = Oklab.encoded(eye[i][0] * light[0] + eye[i][1] * light[1] + eye[i][2] * light[2]);
        }
        return Oklab.of(new Color(seen[0], seen[1], seen[2]));
    }

    private static double contrast(Color one, Color other) {
        double a = luminance(one);
        double b = luminance(other);
        return (Math.max(a, b) + 0.05) / (Math.min(a, b) + 0.05);
    }

    private static double luminance(Color color) {
        return 0.2126 * Oklab.linear(color.getRed())
                + 0.7152 * Oklab.linear(color.getGreen())
                + 0.0722 * Oklab.linear(color.getBlue());
    }
}
