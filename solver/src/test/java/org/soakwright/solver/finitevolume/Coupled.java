package org.soakwright.solver.finitevolume;

import java.util.ArrayList;
import java.util.List;

/**
 * Bodies in a bath they share. Each wave goes towards what the bath would make of it, dy/dt = rate (uniform b - y), and the bath
 * takes what they give. In Laplace's variable that is one division; inverted on the parabola of Weideman and Trefethen
 * (Mathematics of Computation 76, 2007, 1341-1356; from memory), where 32 nodes leave about 1e-14.
 */
final class Coupled {
    private static final int NODES = 32;

    private final List<Share> shares;
    private final double mass;
    private final double loss;
    /** What the shares hold of each wave after the time asked for. */
    final List<double[]> after = new ArrayList<>();

    /**
     * The law of a phase.
     *
     * @param mass of the bath and whatever surface belongs to it
     * @param loss what leaves the bath with the flow
     */
    Coupled(List<Share> shares, double mass, double loss) {
        this.shares = shares;
        this.mass = mass;
        this.loss = loss;
        shares.forEach(s -> after.add(new double[s.rate.value.length]));
    }

    /** Fills what is after, and answers the bath's departure. */
    double advance(double bath, double seconds) {
        double bathAfter = 0;
        double width = 2 * Math.PI / NODES;
        for (int k = 0; k < NODES / 2; k++) {
            double theta = (k + 0.5) * width;
            double scale = NODES / seconds;
            Complex z = new Complex(scale * (0.1309 - 0.1194 * theta * theta), scale * 0.2500 * theta);
            Complex slope = new Complex(-scale * 2 * 0.1194 * theta, scale * 0.2500);
            // Twice the real part of exp(z t) z'/(2 pi i) times the transform, for the node and its mirror image.
            Complex weight = z.times(seconds)
                    .exp()
                    .times(slope)
                    .times(new Complex(0, -1))
                    .times(width / Math.PI);
            Complex transform = bath(z, bath);
            bathAfter += transform.times(weight).re();
            for (int j = 0; j < shares.size(); j++) {
                add(shares.get(j), z, weight, transform, after.get(j));
            }
        }
        return bathAfter;
    }

    private Complex bath(Complex z, double bath) {
        Complex load = new Complex(mass * bath, 0);
        Complex diagonal = z.times(mass).plus(loss);
        for (Share share : shares) {
            double[] rate = share.rate.value;
            double[] uniform = share.uniform.value;
            double[] held = share.held.value;
            double givenRe = 0;
            double givenIm = 0;
            double takenRe = 0;
            double takenIm = 0;
            for (int n = 0; n < rate.length; n++) {
                double re = z.re() + rate[n];
                double pull = rate[n] * uniform[n] / (re * re + z.im() * z.im());
                givenRe += pull * held[n] * re;
                givenIm -= pull * held[n] * z.im();
                takenRe += pull * uniform[n] * re;
                takenIm -= pull * uniform[n] * z.im();
            }
            load = load.plus(new Complex(givenRe, givenIm).times(share.capacity));
            diagonal = diagonal.plus(new Complex(takenRe, takenIm).times(z).times(share.capacity));
        }
        return load.times(diagonal.reciprocal());
    }

    private static void add(Share share, Complex z, Complex weight, Complex bath, double[] sum) {
        Complex pulled = bath.times(weight);
        for (int n = 0; n < sum.length; n++) {
            double rate = share.rate.value[n];
            double drawn = rate * share.uniform.value[n];
            double re = z.re() + rate;
            double square = re * re + z.im() * z.im();
            double topRe = drawn * pulled.re() + share.held.value[n] * weight.re();
            double topIm = drawn * pulled.im() + share.held.value[n] * weight.im();
            sum[n] += (topRe * re + topIm * z.im()) / square;
        }
    }
}
