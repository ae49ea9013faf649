package org.soakwright.solver.stage;

/**
 * Inversion of a Laplace transform at one time: a midpoint rule on the parabola of Weideman and Trefethen (Math. Comp. 76 (2007) 1341),
 * which encloses every real rate there may be; f(t) is the real part of the sum of weight times transform. With 32 nodes, of which
 * those below the real axis are mirror images, the error is below 1e-12 of the transform's scale.
 */
final class Contour {
    private static final int NODES = 32;

    static final int COUNT = NODES / 2;

    final double[] re = new double[COUNT];
    final double[] im = new double[COUNT];
    final double[] weightRe = new double[COUNT];
    final double[] weightIm = new double[COUNT];

    Contour(double seconds) {
        double scale = NODES / seconds;
        for (int k = 0; k < COUNT; k++) {
            double angle = (2 * k + 1) * Math.PI / NODES;
            re[k] = scale * (0.1309 - 0.1194 * angle * angle);
            im[k] = scale * 0.25 * angle;
            double slopeRe = -scale * 0.2388 * angle;
            double slopeIm = scale * 0.25;
            double size = 2.0 / NODES * Math.exp(re[k] * seconds);
            double cos = Math.cos(im[k] * seconds);
            double sin = Math.sin(im[k] * seconds);
            // exp(z t) z' / i
            weightRe[k] = size * (cos * slopeIm + sin * slopeRe);
            weightIm[k] = size * (sin * slopeIm - cos * slopeRe);
        }
    }
}
