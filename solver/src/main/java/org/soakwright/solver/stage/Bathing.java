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
    private final double seconds;
    /** (V + sum S H + Q/z), the balance of a unit change of the liquor, by node. */
    private final double[] balanceRe = new double[Contour.COUNT];

    private final double[] balanceIm = new double[Contour.COUNT];

    /** Prepares a passage of so many seconds, above 0. */
    public Bathing(List<Product> lot, Bath.Vessel vessel, double seconds) {
        this.lot = lot;
        this.seconds = seconds;
        flow = vessel.flow();
        contour = new Contour(seconds);
        for (int k = 0; k < Contour.COUNT; k++) {
            double size = contour.re[k] * contour.re[k] + contour.im[k] * contour.im[k];
            balanceRe[k] = vessel.volume() + flow * contour.re[k] / size;
            balanceIm[k] = -flow * contour.im[k] / size;
        }
        for (Product grade : lot) {
            respond(grade);
        }
    }

    /** Adds S H(z), H = missing + sum of v v rate/(z + rate). */
    private void respond(Product grade) {
        double[] rate = grade.rates();
        double[] uniform = grade.uniform();
        double missing = grade.missing();
        for (int k = 0; k < Contour.COUNT; k++) {
            double zr = contour.re[k];
            double zi = contour.im[k];
            double re = 0;
            double im = 0;
            for (int n = 0; n < rate.length; n++) {
                double r = zr + rate[n];
                double w = uniform[n] * uniform[n] * rate[n] / (r * r + zi * zi);
                re += w * r;
                im -= w * zi;
            }
            balanceRe[k] += grade.capacity() * (missing + re);
            balanceIm[k] += grade.capacity() * im;
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
            given(lot.get(j), begin[j], re, im);
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
            over(lot.get(j), pushRe, pushIm, end[j]);
            double[] rate = lot.get(j).rates();
            double[] uniform = lot.get(j).uniform();
            for (int n = 0; n < rate.length; n++) {
                end[j][n] = begin[j][n] * Math.exp(-rate[n] * seconds) - uniform[n] * end[j][n];
            }
        }
        return new Passage(begin, end, after, re, im);
    }

    /** Adds S times the sum of rate v y/(z + rate): what the pieces give of their own. */
    private void given(Product grade, double[] y, double[] sumRe, double[] sumIm) {
        double[] rate = grade.rates();
        double[] uniform = grade.uniform();
        double capacity = grade.capacity();
        double[] strength = new double[rate.length];
        for (int n = 0; n < rate.length; n++) {
            strength[n] = capacity * rate[n] * uniform[n] * y[n];
        }
        sums(rate, strength, sumRe, sumIm);
    }

    private void sums(double[] rate, double[] strength, double[] sumRe, double[] sumIm) {
        for (int k = 0; k < Contour.COUNT; k++) {
            double zr = contour.re[k];
            double zi = contour.im[k];
            double re = 0;
            double im = 0;
            for (int n = 0; n < rate.length; n++) {
                double r = zr + rate[n];
                double w = strength[n] / (r * r + zi * zi);
                re += w * r;
                im -= w * zi;
            }
            sumRe[k] += re;
            sumIm[k] += im;
        }
    }

    /** Adds the real part of the sum over nodes of push/(z + rate). */
    private void over(Product grade, double[] pushRe, double[] pushIm, double[] out) {
        double[] rate = grade.rates();
        for (int k = 0; k < Contour.COUNT; k++) {
            double zr = contour.re[k];
            double zi = contour.im[k];
            double a = pushRe[k];
            double b = pushIm[k];
            for (int n = 0; n < rate.length; n++) {
                double r = zr + rate[n];
                out[n] += (a * r + b * zi) / (r * r + zi * zi);
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
            sums(lot.get(j).rates(), strength, re, im);
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
            over(grade, re, im, first[j]);
            for (int n = 0; n < rate.length; n++) {
                double kept = pieces[j][n] * Math.exp(-rate[n] * seconds);
                first[j][n] = kept + grade.capacity() * rate[n] * uniform[n] * first[j][n];
                slope -= rate[n] * kept * passage.begin[j][n];
            }
        }
        return new Answer(first, before, slope);
    }
}
