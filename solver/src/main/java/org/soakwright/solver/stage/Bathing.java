package org.soakwright.solver.stage;

import java.util.List;

/**
 * Pieces and one liquor changing each other for a given time. The state is the content b of the liquor and what the pieces differ from
 * it, y, both counted from the feed. Each y decays and is driven by the liquor's change, which follows from the balance
 * of the solute; both are solved as Laplace transforms and brought back on a {@link Contour}, at a cost that does not depend on how quick
 * the modes are, and without asking whether rates coincide.
 */
public final class Bathing {
    private final List<Product> lot;
    private final Contour contour;
    private final double flow;
    /** (V + sum S H + Q/z), the balance of a unit change of the liquor, by node. */
    private final double[] balanceRe = new double[Contour.COUNT];

    private final double[] balanceIm = new double[Contour.COUNT];
    /** 1/|z + rate|^2 by grade, node and mode: every sum asks for it. */
    private final double[][][] inverse;
    /** What each mode keeps on its own, by grade. */
    private final double[][] kept;

    /** Prepares a passage of so many seconds, above 0. */
    public Bathing(List<Product> lot, Bath.Vessel vessel, double seconds) {
        this.lot = lot;
        flow = vessel.flow();
        contour = new Contour(seconds);
        for (int k = 0; k < Contour.COUNT; k++) {
            double size = contour.re[k] * contour.re[k] + contour.im[k] * contour.im[k];
            balanceRe[k] = vessel.volume() + flow * contour.re[k] / size;
            balanceIm[k] = -flow * contour.im[k] / size;
        }
        inverse = new double[lot.size()][Contour.COUNT][];
        kept = new double[lot.size()][];
        for (int j = 0; j < lot.size(); j++) {
            double[] rate = lot.get(j).rates();
            kept[j] = new double[rate.length];
            for (int n = 0; n < rate.length; n++) {
                kept[j][n] = Math.exp(-rate[n] * seconds);
            }
            for (int k = 0; k < Contour.COUNT; k++) {
                inverse[j][k] = inverse(rate, contour.re[k], contour.im[k]);
            }
            respond(j);
        }
    }

    private static double[] inverse(double[] rate, double re, double im) {
        double[] inverse = new double[rate.length];
        for (int n = 0; n < rate.length; n++) {
            double r = re + rate[n];
            inverse[n] = 1 / (r * r + im * im);
        }
        return inverse;
    }

    /** Adds S H(z), H = missing + sum of v v rate/(z + rate). */
    private void respond(int grade) {
        Product product = lot.get(grade);
        double[] uniform = product.uniform();
        double[] strength = new double[uniform.length];
        for (int n = 0; n < strength.length; n++) {
            strength[n] = product.capacity() * product.rates()[n] * uniform[n] * uniform[n];
        }
        sums(grade, strength, balanceRe, balanceIm);
        for (int k = 0; k < Contour.COUNT; k++) {
            balanceRe[k] += product.capacity() * product.missing();
        }
    }

    /** One passage: where it ended, and the transform of the liquor's change, which the way back needs. */
    public static final class Passage {
        private final double[][] begin;
        private final double[][] end;
        private final double liquor;
        private final double[] changeRe;
        private final double[] changeIm;

        private Passage(double[][] begin, double[][] end, double liquor, double[] changeRe, double[] changeIm) {
            this.begin = begin;
            this.end = end;
            this.liquor = liquor;
            this.changeRe = changeRe;
            this.changeIm = changeIm;
        }

        /** Of the pieces at the end, by grade; what they differ from the liquor. */
        public double[][] end() {
            return end;
        }

        /** Content of the liquor at the end, from the feed. */
        public double liquor() {
            return liquor;
        }
    }

    /** From the beginning to the end. */
    public Passage pass(double[][] begin, double liquor) {
        double[] re = new double[Contour.COUNT];
        double[] im = new double[Contour.COUNT];
        for (int j = 0; j < begin.length; j++) {
            given(j, begin[j], re, im);
        }
        double after = liquor;
        double[] pushRe = new double[Contour.COUNT];
        double[] pushIm = new double[Contour.COUNT];
        for (int k = 0; k < Contour.COUNT; k++) {
            double zr = contour.re[k];
            double zi = contour.im[k];
            double size = zr * zr + zi * zi;
            double topRe = re[k] - flow * liquor * zr / size;
            double topIm = im[k] + flow * liquor * zi / size;
            double below = balanceRe[k] * balanceRe[k] + balanceIm[k] * balanceIm[k];
            re[k] = (topRe * balanceRe[k] + topIm * balanceIm[k]) / below;
            im[k] = (topIm * balanceRe[k] - topRe * balanceIm[k]) / below;
            pushRe[k] = contour.weightRe[k] * re[k] - contour.weightIm[k] * im[k];
            pushIm[k] = contour.weightRe[k] * im[k] + contour.weightIm[k] * re[k];
            after += (pushRe[k] * zr + pushIm[k] * zi) / size;
        }
        double[][] end = new double[begin.length][];
        for (int j = 0; j < begin.length; j++) {
            end[j] = new double[begin[j].length];
            over(j, pushRe, pushIm, end[j]);
            double[] uniform = lot.get(j).uniform();
            for (int n = 0; n < uniform.length; n++) {
                end[j][n] = begin[j][n] * kept[j][n] - uniform[n] * end[j][n];
            }
        }
        return new Passage(begin, end, after, re, im);
    }

    /** Adds S times the sum of rate v y/(z + rate): what the pieces give of their own. */
    private void given(int grade, double[] y, double[] sumRe, double[] sumIm) {
        Product product = lot.get(grade);
        double[] rate = product.rates();
        double[] uniform = product.uniform();
        double capacity = product.capacity();
        double[] strength = new double[rate.length];
        for (int n = 0; n < rate.length; n++) {
            strength[n] = capacity * rate[n] * uniform[n] * y[n];
        }
        sums(grade, strength, sumRe, sumIm);
    }

    /** Adds the sum of strength/(z + rate), at every node. */
    private void sums(int grade, double[] strength, double[] sumRe, double[] sumIm) {
        double[] rate = lot.get(grade).rates();
        double[] weak = new double[rate.length];
        for (int k = 0; k < Contour.COUNT; k++) {
            double[] by = inverse[grade][k];
            for (int n = 0; n < rate.length; n++) {
                weak[n] = strength[n] * by[n];
            }
            double all = 0;
            double all2 = 0;
            double quick = 0;
            double quick2 = 0;
            int n = 0;
            // In pairs: one sum would wait for itself at every addition.
            for (; n + 1 < rate.length; n += 2) {
                all += weak[n];
                all2 += weak[n + 1];
                quick += weak[n] * rate[n];
                quick2 += weak[n + 1] * rate[n + 1];
            }
            if (n < rate.length) {
                all += weak[n];
                quick += weak[n] * rate[n];
            }
            sumRe[k] += contour.re[k] * (all + all2) + (quick + quick2);
            sumIm[k] -= contour.im[k] * (all + all2);
        }
    }

    /** Adds the real part of the sum over nodes of push/(z + rate). */
    private void over(int grade, double[] pushRe, double[] pushIm, double[] out) {
        double[] rate = lot.get(grade).rates();
        for (int k = 0; k < Contour.COUNT; k++) {
            double[] by = inverse[grade][k];
            double a = pushRe[k];
            double b = a * contour.re[k] + pushIm[k] * contour.im[k];
            for (int n = 0; n < rate.length; n++) {
                out[n] += (a * rate[n] + b) * by[n];
            }
        }
    }

    /** How a result answers to the beginning of a passage and to its duration. */
    public record Answer(double[][] pieces, double liquor, double seconds) {}

    /**
     * The way back: the transpose of {@link #pass}.
     *
     * @param pieces derivatives of the result by the coefficients at the end
     * @param liquor derivative by the liquor's content at the end
     */
    public Answer back(Passage passage, double[][] pieces, double liquor) {
        double[] re = new double[Contour.COUNT];
        double[] im = new double[Contour.COUNT];
        double slope = 0;
        for (int j = 0; j < pieces.length; j++) {
            double[] strength = new double[pieces[j].length];
            double[] uniform = lot.get(j).uniform();
            for (int n = 0; n < strength.length; n++) {
                strength[n] = -pieces[j][n] * uniform[n];
            }
            sums(j, strength, re, im);
        }
        double before = liquor;
        for (int k = 0; k < Contour.COUNT; k++) {
            double zr = contour.re[k];
            double zi = contour.im[k];
            double size = zr * zr + zi * zi;
            double answerRe = re[k] + liquor * zr / size;
            double answerIm = im[k] - liquor * zi / size;
            double gammaRe = contour.weightRe[k] * answerRe - contour.weightIm[k] * answerIm;
            double gammaIm = contour.weightRe[k] * answerIm + contour.weightIm[k] * answerRe;
            double throughRe = gammaRe * passage.changeRe[k] - gammaIm * passage.changeIm[k];
            double throughIm = gammaRe * passage.changeIm[k] + gammaIm * passage.changeRe[k];
            slope += zr * throughRe - zi * throughIm;
            double below = balanceRe[k] * balanceRe[k] + balanceIm[k] * balanceIm[k];
            re[k] = (gammaRe * balanceRe[k] + gammaIm * balanceIm[k]) / below;
            im[k] = (gammaIm * balanceRe[k] - gammaRe * balanceIm[k]) / below;
            before -= flow * (re[k] * zr + im[k] * zi) / size;
        }
        double[][] first = new double[pieces.length][];
        for (int j = 0; j < pieces.length; j++) {
            Product grade = lot.get(j);
            double[] rate = grade.rates();
            double[] uniform = grade.uniform();
            first[j] = new double[rate.length];
            over(j, re, im, first[j]);
            for (int n = 0; n < rate.length; n++) {
                double own = pieces[j][n] * kept[j][n];
                first[j][n] = own + grade.capacity() * rate[n] * uniform[n] * first[j][n];
                slope -= rate[n] * own * passage.begin[j][n];
            }
        }
        return new Answer(first, before, slope);
    }
}
