package org.soakwright.solver.finitevolume;

import java.util.List;

/**
 * The semi-discrete law of one step, M dy/dt = -K y, for departures y from a state of rest: one symmetric tridiagonal block per
 * body, each tied by its last node to a shared bath (or to a bath that stays at zero).
 *
 * <p>Advanced exactly in time by the inverse Laplace transform on the parabola of Weideman and Trefethen (Mathematics of
 * Computation 76, 2007, 1341-1356; from memory): 32 nodes leave about 1e-14, whatever the stiffness.
 */
final class Arrow {
    private static final int NODES = 32;

    private final List<Block> blocks;
    private final double bathMass;
    private final double bathLoss;

    /** The nodes of one body: the mass of each, the links between neighbours, the tie of the last one to the bath. */
    static final class Block {
        private final double[] mass;
        private final double[] link;
        private final double tie;

        Block(double[] mass, double[] link, double tie) {
            this.mass = mass;
            this.link = link;
            this.tie = tie;
        }
    }

    /**
     * The law of a step.
     *
     * @param bathMass 0 for a bath that stays at zero
     * @param bathLoss what leaves the bath with the flow
     */
    Arrow(List<Block> blocks, double bathMass, double bathLoss) {
        this.blocks = blocks;
        this.bathMass = bathMass;
        this.bathLoss = bathLoss;
    }

    /** Replaces the contents of the bodies' nodes, and answers the bath's content, after the given time. */
    double advance(List<double[]> contents, double bath, double seconds) {
        List<double[]> start = contents.stream().map(double[]::clone).toList();
        contents.forEach(c -> java.util.Arrays.fill(c, 0));
        double bathAfter = 0;
        double width = 2 * Math.PI / NODES;
        for (int k = 0; k < NODES / 2; k++) {
            double theta = (k + 0.5) * width;
            double scale = NODES / seconds;
            Complex z = new Complex(scale * (0.1309 - 0.1194 * theta * theta), scale * 0.2500 * theta);
            Complex slope = new Complex(-scale * 2 * 0.1194 * theta, scale * 0.2500);
            // Twice the real part of exp(z t) z'/(2 pi i) times the resolvent, for the node and its mirror image.
            Complex weight = z.times(seconds)
                    .exp()
                    .times(slope)
                    .times(new Complex(0, -1))
                    .times(width / Math.PI);
            bathAfter += addResolvent(z, weight, start, bath, contents);
        }
        return bathAfter;
    }

    private double addResolvent(Complex z, Complex weight, List<double[]> start, double bath, List<double[]> result) {
        Complex diagonal = z.times(bathMass).plus(bathLoss);
        Complex load = new Complex(bathMass * bath, 0);
        Complex[][] pivot = new Complex[blocks.size()][];
        Complex[][] right = new Complex[blocks.size()][];
        for (int j = 0; j < blocks.size(); j++) {
            Block block = blocks.get(j);
            double[] y = start.get(j);
            int last = block.mass.length - 1;
            pivot[j] = new Complex[last + 1];
            right[j] = new Complex[last + 1];
            for (int i = 0; i <= last; i++) {
                double ties = (i > 0 ? block.link[i - 1] : 0) + (i < last ? block.link[i] : block.tie);
                Complex p = z.times(block.mass[i]).plus(ties);
                Complex r = new Complex(block.mass[i] * y[i], 0);
                if (i > 0) {
                    Complex factor = pivot[j][i - 1].reciprocal().times(block.link[i - 1]);
                    p = p.minus(factor.times(block.link[i - 1]));
                    r = r.plus(factor.times(right[j][i - 1]));
                }
                pivot[j][i] = p;
                right[j][i] = r;
            }
            Complex back = pivot[j][last].reciprocal().times(block.tie);
            diagonal = diagonal.plus(block.tie).minus(back.times(block.tie));
            load = load.plus(back.times(right[j][last]));
        }
        Complex ofBath = bathMass == 0 ? Complex.ZERO : load.times(diagonal.reciprocal());
        for (int j = 0; j < blocks.size(); j++) {
            Block block = blocks.get(j);
            int last = block.mass.length - 1;
            double[] sum = result.get(j);
            Complex value = Complex.ZERO;
            for (int i = last; i >= 0; i--) {
                Complex from = i == last ? ofBath.times(block.tie) : value.times(block.link[i]);
                value = right[j][i].plus(from).times(pivot[j][i].reciprocal());
                sum[i] += value.times(weight).re();
            }
        }
        return ofBath.times(weight).re();
    }
}
