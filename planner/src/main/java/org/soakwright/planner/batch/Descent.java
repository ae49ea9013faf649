package org.soakwright.planner.batch;

import java.util.Arrays;
import java.util.List;

/**
 * Sequential quadratic programming over the free durations, each scaled to 0..1 on its range. Every requirement's straight line may
 * be overstepped by one common amount at a price, so each step has a solution and an infeasible recipe ends at its nearest miss.
 * The curvature is built up by damped BFGS updates (M. J. D. Powell 1978); steps are kept within a region that grows and shrinks as the
 * subproblem keeps its promise. Ends when a step is below {@link #STEP} of the range or promises less than {@link #PROMISE}, or after {@link #MOST_STEPS} steps.
 */
final class Descent {
    static final double STEP = 1e-9;
    /** A promise of less, as a share of the goal's span, ends a search too. */
    static final double PROMISE = 1e-10;

    static final int MOST_STEPS = 60;
    /** A miss below this counts as met on the way; the grid is judged without it. */
    static final double MET = 1e-9;

    private static final double FIRST_PRICE = 10;
    private static final double HIGHEST_PRICE = 1e5;
    private static final double FIRST_TRUST = 0.5;

    private final Box box;
    private final Landscape landscape;
    private final double[] goal;
    private final boolean nearest;
    private final List<Linear.Cap> caps;
    private final int size;

    private Descent(Box box, Landscape landscape, Linear goal, boolean nearest, List<Linear.Cap> caps) {
        this.box = box;
        this.landscape = landscape;
        this.nearest = nearest;
        this.caps = caps;
        size = box.size();
        this.goal = scaled(goal);
    }

    /** Towards the least goal that meets the requirements within the box, no cap exceeded. */
    static Descent toLeast(Linear goal, Box box, Landscape landscape, List<Linear.Cap> caps) {
        return new Descent(box, landscape, goal, false, caps);
    }

    /** Towards the smallest largest miss within the box, no cap exceeded. */
    static Descent toNearest(Box box, Landscape landscape, List<Linear.Cap> caps) {
        return new Descent(box, landscape, new Linear(new double[box.size()]), true, caps);
    }

    /**
     * Where a search ended.
     *
     * @param free durations of the free steps, s
     * @param miss the largest miss there
     * @param multipliers price of each requirement in the goal
     */
    record End(double[] free, double miss, double[] multipliers) {
        boolean met() {
            return miss <= MET;
        }
    }

    private double[] scaled(Linear sum) {
        double[] scaled = new double[size];
        for (int a = 0; a < size; a++) {
            scaled[a] = sum.weights()[a] * box.range(a);
        }
        return scaled;
    }

    private double cost(double[] u) {
        double sum = 0;
        for (int a = 0; a < size; a++) {
            sum += goal[a] * u[a];
        }
        return sum;
    }

    /** Goes down from durations, brought into the box. */
    End from(double[] start) {
        double[] u = box.shares(start);
        double[][] curvature = new double[size][size];
        for (int a = 0; a < size; a++) {
            curvature[a][a] = 0.1;
        }
        double price = FIRST_PRICE;
        double trust = FIRST_TRUST;
        Run run = landscape.run(box.at(u));
        double[] misses = landscape.misses(run);
        double[][] slopes = slopes(run);
        double[] multipliers = new double[misses.length];
        for (int i = 0; i < MOST_STEPS; i++) {
            Subproblem.Step step = subproblem(u, misses, slopes, curvature, price, trust);
            double length = length(step.move());
            double promised = merit(u, misses, price)
                    - (nearest ? step.over() : cost(u) + cost(step.move()) + price * Math.max(0, step.over()));
            if (length <= STEP || promised <= PROMISE) {
                multipliers = step.multipliers();
                if (nearest || Landscape.largest(misses) <= MET || price >= HIGHEST_PRICE) {
                    break;
                }
                // At rest outside the requirements: they were too cheap, or cannot be met from here.
                price *= 100;
                trust = FIRST_TRUST;
                continue;
            }
            double[] next = moved(u, step.move());
            Run nextRun = landscape.run(box.at(next));
            double[] nextMisses = landscape.misses(nextRun);
            double before = merit(u, misses, price);
            double kept = before - merit(next, nextMisses, price);
            if (kept < 0.7 * promised && Landscape.largest(nextMisses) > MET) {
                // The requirements bend: the same step with their lines moved to where they were found.
                double[] bent = bent(nextMisses, slopes, step.move());
                double[] other = moved(
                        u, subproblem(u, bent, slopes, curvature, price, trust).move());
                Run otherRun = landscape.run(box.at(other));
                double[] otherMisses = landscape.misses(otherRun);
                double otherKept = before - merit(other, otherMisses, price);
                if (otherKept > kept) {
                    next = other;
                    nextRun = otherRun;
                    nextMisses = otherMisses;
                    kept = otherKept;
                }
            }
            if (kept < 0.1 * promised) {
                trust = 0.25 * length;
            } else if (kept > 0.7 * promised) {
                trust = Math.max(trust, 2.5 * length);
            }
            if (kept > 0) {
                multipliers = step.multipliers();
                double[][] nextSlopes = slopes(nextRun);
                if (nearest || step.over() <= MET) {
                    bend(curvature, u, next, slopes, nextSlopes, multipliers);
                }
                u = next;
                misses = nextMisses;
                slopes = nextSlopes;
            } else if (trust <= STEP) {
                break;
            }
        }
        return new End(box.at(u), Landscape.largest(misses), multipliers);
    }

    private static double[] bent(double[] found, double[][] slopes, double[] move) {
        double[] bent = found.clone();
        for (int i = 0; i < bent.length; i++) {
            for (int a = 0; a < move.length; a++) {
                bent[i] -= slopes[i][a] * move[a];
            }
        }
        return bent;
    }

    private static double length(double[] move) {
        double length = 0;
        for (double x : move) {
            length = Math.max(length, Math.abs(x));
        }
        return length;
    }

    private double merit(double[] u, double[] misses, double price) {
        double worst = Landscape.largest(misses);
        return nearest ? worst : cost(u) + price * Math.max(0, worst);
    }

    private double[] moved(double[] u, double[] move) {
        double[] moved = new double[size];
        for (int a = 0; a < size; a++) {
            moved[a] = Math.min(1, Math.max(0, u[a] + move[a]));
        }
        return moved;
    }

    private double[][] slopes(Run run) {
        double[][] slopes = landscape.gradients(run);
        for (double[] row : slopes) {
            for (int a = 0; a < size; a++) {
                row[a] *= box.range(a);
            }
        }
        return slopes;
    }

    private Subproblem.Step subproblem(
            double[] u, double[] misses, double[][] slopes, double[][] curvature, double price, double trust) {
        double[] free = box.at(u);
        double[][] capRows = new double[caps.size()][];
        double[] capRoom = new double[caps.size()];
        for (int i = 0; i < capRows.length; i++) {
            capRows[i] = scaled(caps.get(i).sum());
            capRoom[i] = caps.get(i).limit() - caps.get(i).sum().of(free);
        }
        return new Subproblem(u, goal, misses, slopes, curvature, nearest, capRows, capRoom).solve(price, trust);
    }

    private void bend(
            double[][] b, double[] from, double[] to, double[][] slopes, double[][] nextSlopes, double[] multipliers) {
        double[] s = new double[size];
        double[] y = new double[size];
        double[] bs = new double[size];
        for (int a = 0; a < size; a++) {
            s[a] = to[a] - from[a];
            for (int i = 0; i < multipliers.length; i++) {
                y[a] += multipliers[i] * (nextSlopes[i][a] - slopes[i][a]);
            }
        }
        double sbs = 0;
        double sy = 0;
        for (int a = 0; a < size; a++) {
            for (int c = 0; c < size; c++) {
                bs[a] += b[a][c] * s[c];
            }
            sbs += s[a] * bs[a];
            sy += s[a] * y[a];
        }
        if (!(sbs > 0)) {
            return;
        }
        double theta = sy >= 0.2 * sbs ? 1 : 0.8 * sbs / (sbs - sy);
        double sr = 0;
        double[] r = new double[size];
        for (int a = 0; a < size; a++) {
            r[a] = theta * y[a] + (1 - theta) * bs[a];
            sr += s[a] * r[a];
        }
        double[][] old = Arrays.stream(b).map(double[]::clone).toArray(double[][]::new);
        double trace = 0;
        for (int a = 0; a < size; a++) {
            for (int c = 0; c < size; c++) {
                b[a][c] += r[a] * r[c] / sr - bs[a] * bs[c] / sbs;
            }
            trace += b[a][a];
        }
        if (!(trace < 1e8) || !(trace > 0)) {
            for (int a = 0; a < size; a++) {
                b[a] = old[a];
            }
            return;
        }
        // Keeps the matrix safely positive where the goal is linear and the requirements straight.
        for (int a = 0; a < size; a++) {
            b[a][a] = Math.max(b[a][a], 1e-6);
        }
    }
}
