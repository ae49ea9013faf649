package org.soakwright.planner.report.picture;

import java.awt.Color;

/**
 * A colour by how it looks: lightness from 0, black, to 1, white, and two opponent axes, in which equal distances look about equal.
 * Björn Ottosson, A perceptual color space for image processing, 2020.
 */
record Oklab(double lightness, double a, double b) {
    static Oklab ofPolar(double lightness, double chroma, double hueDegrees) {
        double hue = Math.toRadians(hueDegrees);
        return new Oklab(lightness, chroma * Math.cos(hue), chroma * Math.sin(hue));
    }

    static Oklab of(Color color) {
        double r = linear(color.getRed());
        double g = linear(color.getGreen());
        double b = linear(color.getBlue());
        double l = Math.cbrt(0.4122214708 * r + 0.5363325363 * g + 0.0514459929 * b);
        double m = Math.cbrt(0.2119034982 * r + 0.6806995451 * g + 0.1073969566 * b);
        double s = Math.cbrt(0.0883024619 * r + 0.2817188376 * g + 0.6299787005 * b);
        return new Oklab(
                0.2104542553 * l + 0.7936177850 * m - 0.0040720468 * s,
                1.9779984951 * l - 2.4285922050 * m + 0.4505937099 * s,
                0.0259040371 * l + 0.7827717662 * m - 0.8086757660 * s);
    }

    /** The nearest colour of a screen. */
    Color color() {
        double l = cube(lightness + 0.3963377774 * a + 0.2158037573 * b);
        double m = cube(lightness - 0.1055613458 * a - 0.0638541728 * b);
        double s = cube(lightness - 0.0894841775 * a - 1.2914855480 * b);
        return new Color(
                encoded(4.0767416621 * l - 3.3077115913 * m + 0.2309699292 * s),
                encoded(-1.2684380046 * l + 2.6097574011 * m - 0.3413193965 * s),
                encoded(-0.0041960863 * l - 0.7034186147 * m + 1.7076147010 * s));
    }

    Oklab grey() {
        return new Oklab(lightness, 0, 0);
    }

    Oklab towards(Oklab other, double share) {
        return new Oklab(
                lightness + share * (other.lightness - lightness),
                a + share * (other.a - a),
                b + share * (other.b - b));
    }

    double distance(Oklab other) {
        return Math.sqrt(square(lightness - other.lightness) + square(a - other.a) + square(b - other.b));
    }

    /** The linear light of an 8-bit component, IEC 61966-2-1. */
    static double linear(int component) {
        double c = component / 255.0;
        return c <= 0.04045 ? c / 12.92 : Math.pow((c + 0.055) / 1.055, 2.4);
    }

    static int encoded(double linear) {
        double within = Math.max(0, Math.min(1, linear));
        double c = within <= 0.0031308 ? 12.92 * within : 1.055 * Math.pow(within, 1 / 2.4) - 0.055;
        return (int) Math.round(255 * c);
    }

    private static double cube(double x) {
        return x * x * x;
    }

    private static double square(double x) {
        return x * x;
    }
}
