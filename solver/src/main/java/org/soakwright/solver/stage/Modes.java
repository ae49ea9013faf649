package org.soakwright.solver.stage;

import java.util.Arrays;
import java.util.List;
import org.soakwright.solver.shape.Axis;
import org.soakwright.solver.shape.Grade;

/**
 * The orthonormal modes of one stage, slowest first, found as they are asked for. With S = partition times volume of a
 * grade and V the liquor's volume, modes are orthonormal in the sum over grades of S mean(theta theta') plus V b b',
 * where theta is the content of a piece divided by the partition and b the content of the liquor.
 *
 * <p>Not safe for use by several threads at once.
 */
public final class Modes {
    /** Poles closer than this, relatively, are one pole: beyond it their difference is known well enough to be used. */
    private static final double SAME_POLE = 4e-15;

    private final List<Grade> lot;
    private final Conditions conditions;
    private final PlainRoots[] roots;
    private final double slowestOfQuickest;
    private double complete = -1;
    private double lastPole;
    private int size;
    private double[] rate = new double[16];
    private double[] liquor = new double[16];
    private final double[][] amplitude;
    private final double[][] frequency;
    private final double[][] wave;
    private final double[][] slope;
    private final double[][] mean;
    private double[] uniform = new double[16];

    public Modes(List<Grade> lot, Conditions conditions) {
        this.lot = List.copyOf(lot);
        this.conditions = conditions;
        int grades = lot.size();
        roots = new PlainRoots[grades];
        double quickest = 0;
        for (int j = 0; j < grades; j++) {
            roots[j] = new PlainRoots(lot.get(j), conditions.of(j));
            roots[j].upTo(0);
            quickest = Math.max(quickest, roots[j].rate(0));
        }
        slowestOfQuickest = quickest;
        amplitude = new double[grades][16];
        frequency = new double[grades][16];
        wave = new double[grades][16];
        slope = new double[grades][16];
        mean = new double[grades][16];
    }

    public Conditions conditions() {
        return conditions;
    }

    /** How many grades there are. */
    public int grades() {
        return lot.size();
    }

    /** K times volume of a grade, m3 of liquor that would hold as much. */
    public double capacity(int grade) {
        return conditions.partition() * lot.get(grade).volume();
    }

    /** The largest of the grades' slowest rates, 1/s, each grade taken alone in unlimited liquor. */
    public double slowestOfQuickest() {
        return slowestOfQuickest;
    }

    /** How many modes have a rate at or below the limit, roughly, without finding them. */
    public double estimate(double limit) {
        double count = 0;
        for (Grade grade : lot) {
            count += Math.sqrt(limit / conditions.pace(grade)) / Math.PI;
        }
        return count;
    }

    /** Finds all modes with rates at or below the limit, 1/s; answers how many there are. */
    public int upTo(double limit) {
        if (limit > complete) {
            double target = Math.max(limit, 1.5 * complete);
            if (conditions.coupled()) {
                growCoupled(target);
            } else {
                growPlain(target);
            }
            complete = target;
        }
        int n = Arrays.binarySearch(rate, 0, size, limit);
        n = n >= 0 ? n : -n - 1;
        while (n < size && rate[n] <= limit) {
            n++;
        }
        return n;
    }

    /** Number of modes found so far. */
    public int found() {
        return size;
    }

    /** Rate of decay of a mode, 1/s. */
    public double rate(int mode) {
        return rate[mode];
    }

    /** Content of the liquor in a mode, 0 where pieces and liquor are not coupled. */
    public double liquor(int mode) {
        return liquor[mode];
    }

    /** Amplitude of a grade's wave in a mode. */
    public double amplitude(int grade, int mode) {
        return amplitude[grade][mode];
    }

    /** Frequency of a grade's wave in a mode: theta is amplitude times u(frequency times x). */
    public double frequency(int grade, int mode) {
        return frequency[grade][mode];
    }

    /** theta of a grade in a mode at a position from 0, the core, to 1, the surface. */
    public double at(int grade, int mode, double position) {
        double a = amplitude[grade][mode];
        if (a == 0 || position == 0) {
            return a;
        }
        return a * (position == 1 ? wave[grade][mode] : lot.get(grade).axis().wave(frequency[grade][mode] * position));
    }

    /** Mean of a grade's theta in a mode. */
    public double mean(int grade, int mode) {
        return mean[grade][mode];
    }

    /** What theta = 1 in every piece, without liquor, has of a mode. */
    public double uniform(int mode) {
        return uniform[mode];
    }

    /** What one unit of content in the liquor alone has of a mode. */
    public double poured(int mode) {
        return liquor[mode] == 0 ? 0 : volume() * liquor[mode];
    }

    /** Inner product of the pieces' part of a mode of these with one of another stage's, in these modes' capacities. */
    public double overlap(int mode, Modes other, int otherMode) {
        double sum = 0;
        for (int j = 0; j < roots.length; j++) {
            double product = amplitude[j][mode] * other.amplitude[j][otherMode];
            if (product != 0) {
                Axis axis = lot.get(j).axis();
                sum += capacity(j)
                        * product
                        * Overlap.of(
                                axis,
                                frequency[j][mode],
                                wave[j][mode],
                                slope[j][mode],
                                other.frequency[j][otherMode],
                                other.wave[j][otherMode],
                                other.slope[j][otherMode]);
            }
        }
        return sum;
    }

    /** Largest departure from orthonormality seen between each of the first modes and itself or the next two. */
    public double defect(int modes) {
        double worst = 0;
        for (int n = 0; n < modes; n++) {
            for (int m = n; m < Math.min(n + 3, modes); m++) {
                double product = overlap(n, this, m);
                if (liquor[n] != 0) {
                    product += volume() * liquor[n] * liquor[m];
                }
                worst = Math.max(worst, Math.abs(product - (n == m ? 1 : 0)));
            }
        }
        return worst;
    }

    private double volume() {
        return ((Bath.Vessel) conditions.bath()).volume();
    }

    private void growPlain(double target) {
        List<Pole> poles = Pole.upTo(roots, target);
        for (Pole pole : poles) {
            if (pole.rate() > complete) {
                add(pole.rate(), 0);
                set(pole, 1 / Math.sqrt(capacity(pole.grade()) * meanSquare(pole)));
            }
        }
    }

    private void growCoupled(double target) {
        Secular secular = new Secular(lot, conditions, roots);
        List<List<Pole>> groups =
                Pole.groups(roots, Pole.upTo(roots, betweenPoles(Math.max(target, slowestOfQuickest()))), SAME_POLE);
        boolean closed = ((Bath.Vessel) conditions.bath()).flow() == 0;
        if (size == 0 && closed) {
            secular.atRest();
            addCoupled(secular, 0);
        }
        double lower = lastPole;
        for (List<Pole> group : groups) {
            double pole = group.get(0).rate();
            if (pole <= lastPole) {
                continue;
            }
            if (lower > 0 || !closed) {
                addCoupled(secular, secular.between(lower, pole));
            }
            addUncoupled(group);
            lower = pole;
        }
        lastPole = lower;
        // The gap above the last pole is left for the next growth; what was promised must lie below it.
        if (lastPole < target) {
            double beyond = Double.POSITIVE_INFINITY;
            for (PlainRoots plain : roots) {
                beyond = Math.min(beyond, plain.rate(plain.upTo(lastPole)));
            }
            growCoupled(beyond);
        }
    }

    /** The limit, or more where it would part poles that count as one: their modes are found together. */
    private double betweenPoles(double limit) {
        double last = 0;
        double next = Double.POSITIVE_INFINITY;
        for (PlainRoots plain : roots) {
            int n = plain.upTo(limit);
            last = n == 0 ? last : Math.max(last, plain.rate(n - 1));
            next = Math.min(next, plain.rate(n));
        }
        return next - last > SAME_POLE * last ? limit : betweenPoles(next);
    }

    private void addCoupled(Secular secular, double lambda) {
        double scale = 1 / Math.sqrt(secular.squaredNorm());
        add(lambda, scale);
        for (int j = 0; j < roots.length; j++) {
            Wave at = secular.waves[j];
            set(j, scale * secular.amplitude(j), at.z, at.u, at.v);
        }
    }

    /**
     * Grades that share a pole can decay against each other without the liquor noticing: the amplitudes orthogonal to
     * the coupling, as columns of a Householder reflection.
     */
    private void addUncoupled(List<Pole> group) {
        int members = group.size();
        if (members == 1) {
            return;
        }
        double[] weight = new double[members];
        double[] coupling = new double[members];
        for (int i = 0; i < members; i++) {
            Pole pole = group.get(i);
            PlainRoots plain = roots[pole.grade()];
            weight[i] = Math.sqrt(capacity(pole.grade()) * meanSquare(pole));
            coupling[i] = capacity(pole.grade())
                    * plain.pace
                    * (plain.axis.power() + 1)
                    * plain.z(pole.index())
                    * plain.v(pole.index())
                    / weight[i];
        }
        double norm = 0;
        for (double c : coupling) {
            norm += c * c;
        }
        coupling[0] += Math.copySign(Math.sqrt(norm), coupling[0]);
        double square = 0;
        for (double c : coupling) {
            square += c * c;
        }
        for (int column = 1; column < members; column++) {
            add(group.get(0).rate(), 0);
            for (int i = 0; i < members; i++) {
                double beta = (i == column ? 1 : 0) - 2 * coupling[i] * coupling[column] / square;
                set(group.get(i), beta / weight[i]);
            }
        }
    }

    private double meanSquare(Pole pole) {
        PlainRoots plain = roots[pole.grade()];
        int n = pole.index();
        return plain.axis.meanSquare(plain.z(n), plain.u(n), plain.v(n));
    }

    private void set(Pole pole, double value) {
        PlainRoots plain = roots[pole.grade()];
        int n = pole.index();
        set(pole.grade(), value, plain.z(n), plain.u(n), plain.v(n));
    }

    private void set(int grade, double value, double z, double u, double v) {
        int mode = size - 1;
        amplitude[grade][mode] = value;
        frequency[grade][mode] = z;
        wave[grade][mode] = u;
        slope[grade][mode] = v;
        mean[grade][mode] = value * lot.get(grade).axis().mean(z, v);
        uniform[mode] += capacity(grade) * mean[grade][mode];
    }

    private void add(double lambda, double content) {
        if (size == rate.length) {
            rate = Arrays.copyOf(rate, 2 * size);
            liquor = Arrays.copyOf(liquor, 2 * size);
            uniform = Arrays.copyOf(uniform, 2 * size);
            for (int j = 0; j < roots.length; j++) {
                amplitude[j] = Arrays.copyOf(amplitude[j], 2 * size);
                frequency[j] = Arrays.copyOf(frequency[j], 2 * size);
                wave[j] = Arrays.copyOf(wave[j], 2 * size);
                slope[j] = Arrays.copyOf(slope[j], 2 * size);
                mean[j] = Arrays.copyOf(mean[j], 2 * size);
            }
        }
        rate[size] = lambda;
        liquor[size] = content;
        size++;
    }
}
