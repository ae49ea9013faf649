package org.soakwright.solver.chain;

import java.util.List;
import org.apache.commons.math3.analysis.integration.gauss.GaussIntegrator;
import org.apache.commons.math3.analysis.integration.gauss.GaussIntegratorFactory;
import org.soakwright.solver.chain.Start.Point;
import org.soakwright.solver.shape.Axis;

/**
 * Mean of a start profile times a standing wave over the body: by Gauss-Legendre quadrature on each straight piece, cut so that
 * no panel spans more than half a wave.
 */
final class Projection {
    private static final GaussIntegrator RULE = new GaussIntegratorFactory().legendreHighPrecision(12);

    private Projection() {}

    static double mean(Start start, Axis axis, double z) {
        if (start instanceof Start.Uniform uniform) {
            return uniform.content() * axis.mean(z, axis.slope(z));
        }
        List<Point> points = ((Start.Polyline) start).points();
        double sum = 0;
        for (int i = 1; i < points.size(); i++) {
            sum += segment(points.get(i - 1), points.get(i), axis, z);
        }
        return (axis.power() + 1) * sum;
    }

    private static double segment(Point from, Point to, Axis axis, double z) {
        double length = to.position() - from.position();
        double rise = (to.content() - from.content()) / length;
        int panels = 1 + (int) (z * length / Math.PI);
        double half = 0.5 * length / panels;
        double sum = 0;
        for (int p = 0; p < panels; p++) {
            double middle = from.position() + (2 * p + 1) * half;
            for (int i = 0; i < RULE.getNumberOfPoints(); i++) {
                double x = middle + half * RULE.getPoint(i);
                double content = from.content() + rise * (x - from.position());
                sum += half * RULE.getWeight(i) * content * Math.pow(x, axis.power()) * axis.wave(z * x);
            }
        }
        return sum;
    }
}
