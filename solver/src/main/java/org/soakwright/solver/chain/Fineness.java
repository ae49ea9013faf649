package org.soakwright.solver.chain;

import java.util.ArrayList;
import java.util.List;
import org.soakwright.solver.shape.Grade;
import org.soakwright.solver.shape.Side;
import org.soakwright.solver.stage.Mesh;

/**
 * How finely the sides of a lot are cut, and with polynomials of what degree.
 *
 * @param steps of each side of each grade, the Fourier number for which it is cut in powers of {@link #FACTOR}, at most 0; or
 *     {@link #SEALED}
 * @param degree of the polynomials of pieces of several sides
 * @param blur what sides cut coarser than asked may cost, a share of the driving difference
 */
record Fineness(List<Integer> steps, int degree, double blur) {
    /** Shortest stages within this factor are cut alike. */
    static final double FACTOR = 4;

    /** Unknowns of all grades together that a stage is given, some twenty milliseconds; and more for every further grade. */
    static final int MOST_UNKNOWNS = 60_000;

    private static final int MOST_MORE = 2_500;

    /** A sketch is given so many times fewer: it is for looking. */
    private static final int OF_A_SKETCH = 4;

    /** One axis costs so little that even the core of a sphere, where a polynomial is held least, can be sharp. */
    private static final int MORE_ON_ONE_AXIS = 4;

    /** The degree goes no lower to save unknowns. */
    private static final int LEAST_DEGREE = 7;

    /** Instead of a step: through this side so little can pass in all stages together that it is taken for sealed. */
    static final int SEALED = 1;

    /** Share of its content that may pass through a side taken for sealed. */
    private static final double NOTHING = 5e-7;

    /** With a lower degree a reading may be off by more than 1e-5 of the driving difference. */
    private static final int SHARP_DEGREE = 9;

    /** Of the driving difference: what may be given away before a stage is refused. */
    private static final double MOST_BLUR = 1e-5;

    private static final double MOST_BLUR_OF_MANY = 2e-4;

    /** How far the degree goes down at a time. */
    private static final int STEP = 2;

    /** A rest at whose end nothing is read is not resolved when it is so much shorter than the other stages: it leaves less than 1e-6. */
    private static final double FLEETING = 0.01;

    Fineness {
        steps = List.copyOf(steps);
    }

    /** For given durations: as asked for, or where that takes too many unknowns as little coarser as will do. */
    static Fineness of(RitzChain chain, double[] seconds) {
        List<Integer> asked = asked(chain, seconds);
        List<Integer> steps = new ArrayList<>(asked);
        int degree = chain.degree();
        while (unknowns(chain, steps, degree) > most(chain)) {
            double cheapest = Double.POSITIVE_INFINITY;
            for (int i = 0; i < steps.size(); i++) {
                cheapest = Math.min(cheapest, next(asked, steps, i));
            }
            if (degree > LEAST_DEGREE && cheapest > lowering(degree)) {
                degree -= STEP;
            } else if (Double.isFinite(cheapest)) {
                // All that are alike together, so that the order of grades and sides does not matter.
                double most = cheapest;
                List<Integer> before = List.copyOf(steps);
                for (int i = 0; i < steps.size(); i++) {
                    steps.set(i, before.get(i) + (next(asked, before, i) == most ? 1 : 0));
                }
            } else {
                break;
            }
        }
        double blur = 0;
        for (int i = 0; i < steps.size(); i++) {
            blur += steps.get(i) == SEALED ? NOTHING : cost(asked.get(i), steps.get(i));
        }
        return new Fineness(steps, degree, blur);
    }

    /**
     * Refuses durations that ask for more than is kept, so that readings would be blurred.
     *
     * @throws StageTooShort naming the stage that asks for the finest elements, and how long it would have to be
     */
    static void require(RitzChain chain, double[] seconds) {
        Fineness found = of(chain, seconds);
        if (found.blur <= (many(chain) ? MOST_BLUR_OF_MANY : MOST_BLUR)
                && found.degree >= Math.min(sharp(chain), chain.degree())) {
            return;
        }
        int shortest = 0;
        for (int k = 0; k < seconds.length; k++) {
            double one = chain.conditions(k).pace(chain.lot().get(0), 0) * seconds[k];
            double best = chain.conditions(shortest).pace(chain.lot().get(0), 0) * seconds[shortest];
            if (!chain.passing(k) && (one < best || chain.passing(shortest))) {
                shortest = k;
            }
        }
        double[] longer = seconds.clone();
        longer[shortest] *= 1.5;
        double enough = longer[shortest];
        try {
            require(chain, longer);
        } catch (StageTooShort still) {
            enough = still.stage() == shortest ? still.shortest() : enough;
        }
        double unknowns = unknowns(chain, asked(chain, seconds), sharp(chain));
        throw new StageTooShort(shortest, seconds[shortest], unknowns, most(chain), enough);
    }

    private static double next(List<Integer> asked, List<Integer> steps, int side) {
        return steps.get(side) >= 0 ? Double.POSITIVE_INFINITY : cost(asked.get(side), steps.get(side) + 1);
    }

    /** The same with a lower degree, which shows the error. */
    Fineness lower() {
        return new Fineness(steps, Math.max(2, degree - STEP), blur);
    }

    /** The degree of a grade's polynomials. */
    int degree(Grade grade) {
        return degree(grade, degree);
    }

    private static int degree(Grade grade, int degree) {
        return degree + (grade.oneAxis() ? MORE_ON_ONE_AXIS : 0);
    }

    /**
     * What a side cut coarser may cost: some hundred times more with every step, up to what the outermost element's ends hold, which follow
     * the surroundings at once. A rule of thumb, on the large side of what was measured.
     */
    private static double cost(int asked, int step) {
        if (step == asked || asked == SEALED) {
            return 0;
        }
        double layer = Math.pow(FACTOR, 0.5 * asked);
        return Math.min(0.01 * Math.pow(FACTOR, 0.5 * step), layer * 1e-8 * Math.pow(100, step - asked));
    }

    /** What the next lower degree may cost by the same rule: three times more with every degree. */
    private static double lowering(int degree) {
        return 1e-7 * Math.pow(3, 13 - (degree - STEP));
    }

    /** A side's elements. */
    static Mesh mesh(Side side, int step, int degree, double... corners) {
        return step == SEALED ? new Mesh(new double[] {0, 1}, 2) : cut(side, Math.pow(FACTOR, step), degree, corners);
    }

    private static Mesh cut(Side side, double fourier, int degree, double... corners) {
        return side.twoFaced() ? Mesh.betweenFaces(fourier, degree, corners) : Mesh.of(fourier, degree, corners);
    }

    /** Many grades are mostly classes of one, of which averages and shares are asked, not single places. */
    private static int sharp(RitzChain chain) {
        return many(chain) ? LEAST_DEGREE : SHARP_DEGREE;
    }

    private static boolean many(RitzChain chain) {
        return chain.lot().size() > Chain.MANY;
    }

    private static int most(RitzChain chain) {
        int most = MOST_UNKNOWNS + MOST_MORE * (chain.lot().size() - 1);
        return chain.degree() < LEAST_DEGREE ? most / OF_A_SKETCH : most;
    }

    private static double unknowns(RitzChain chain, List<Integer> steps, int degree) {
        double sum = 0;
        int at = 0;
        for (Grade grade : chain.lot()) {
            double product = 1;
            for (int i = 0; i < grade.sides().size(); i++) {
                double fourier = Math.pow(FACTOR, steps.get(at++));
                product *= cut(grade.sides().get(i), fourier, degree(grade, degree))
                        .size();
            }
            sum += product;
        }
        return sum;
    }

    /** Of each side the shortest stage's Fourier number, rounded down to a power of the factor. */
    private static List<Integer> asked(RitzChain chain, double[] seconds) {
        List<Integer> asked = new ArrayList<>();
        for (Grade grade : chain.lot()) {
            for (int i = 0; i < grade.sides().size(); i++) {
                double together = 0;
                double passing = Double.POSITIVE_INFINITY;
                double least = Double.POSITIVE_INFINITY;
                for (int k = 0; k < seconds.length; k++) {
                    double fourier = chain.conditions(k).pace(grade, i) * seconds[k];
                    together += fourier;
                    if (chain.passing(k) && Launches.rests(chain.stage(k))) {
                        passing = Math.min(passing, fourier);
                    } else {
                        least = Math.min(least, fourier);
                    }
                }
                if (passing > FLEETING * least || least == Double.POSITIVE_INFINITY) {
                    least = Math.min(least, passing);
                }
                Side side = grade.sides().get(i);
                double ends = side.twoFaced() ? 2 : side.axis().power() + 1;
                double passed = ends * 2 * Math.sqrt(together / Math.PI);
                asked.add(
                        passed < NOTHING && !grade.oneAxis()
                                ? SEALED
                                : (int) Math.floor(Math.min(0, Math.log(least) / Math.log(FACTOR))));
            }
        }
        return asked;
    }
}
