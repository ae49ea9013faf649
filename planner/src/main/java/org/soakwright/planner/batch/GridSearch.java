package org.soakwright.planner.batch;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;

/** Looks for the best point of the grid: by going through all of it, or around where a descent ended. */
final class GridSearch {
    /** A grid this small is gone through whole. */
    static final int WHOLE = 4096;

    /** A value counts as within its limit when it is so by this much, relatively: room for the numerical error. */
    static final double ROOM = 1e-11;

    private static final int MOST_IMPROVEMENTS = 12;
    private static final int MOST_NEIGHBOURS = 400;

    private final Grid grid;
    private final Landscape landscape;
    private final Merit merit;

    GridSearch(Grid grid, Landscape landscape, Merit merit) {
        this.grid = grid;
        this.landscape = landscape;
        this.merit = merit;
    }

    /** A point of the grid that was followed. */
    record Found(double[] free, double miss) {
        boolean met() {
            return miss <= -ROOM;
        }
    }

    /** Every point, best first; the first that meets the requirements (of equals the one with most room), else the nearest miss. */
    Found whole() {
        List<double[]> points = new ArrayList<>();
        int[] choice = new int[grid.size()];
        do {
            points.add(grid.values(choice));
        } while (advance(choice));
        points.sort(this::order);
        return first(points).orElseGet(() -> nearestMiss(points));
    }

    private boolean advance(int[] choice) {
        for (int a = choice.length - 1; a >= 0; a--) {
            if (++choice[a] < grid.choices(a)) {
                return true;
            }
            choice[a] = 0;
        }
        return false;
    }

    private int order(double[] a, double[] b) {
        int byMerit = merit.compare(a, b);
        return byMerit != 0 ? byMerit : Arrays.compare(a, b);
    }

    private Optional<Found> first(List<double[]> sorted) {
        Found best = null;
        for (double[] point : sorted) {
            if (best != null && merit.compare(point, best.free) > 0) {
                break;
            }
            double miss = landscape.worst(point);
            if (miss <= -ROOM && (best == null || miss < best.miss)) {
                best = new Found(point, miss);
            }
        }
        return Optional.ofNullable(best);
    }

    private Found nearestMiss(List<double[]> points) {
        return points.stream()
                .map(point -> new Found(point, landscape.worst(point)))
                .min(Comparator.comparingDouble(Found::miss))
                .orElseThrow();
    }

    /**
     * The best point of the grid that the descents lead to. From the relaxed optimum outwards; then, as long as the relaxation
     * allows anything better than what was found, around there.
     *
     * @param relaxed where the best descent ended, meeting the requirements
     * @param inside a place that meets the requirements with as much room as there is
     */
    Optional<Found> around(double[] relaxed, double[] inside) {
        // What is better than the relaxed optimum cannot meet the requirements, as far as that optimum is known.
        double floor = merit.blended(relaxed) - 1e-7;
        Optional<Found> found = Optional.empty();
        for (double share = 0; found.isEmpty() && share <= 1; share = share == 0 ? 1.0 / 64 : 2 * share) {
            double[] at = relaxed.clone();
            for (int a = 0; a < at.length; a++) {
                at[a] += share * (inside[a] - relaxed[a]);
            }
            found = first(neighbours(at, null).stream()
                    .filter(point -> merit.blended(point) >= floor)
                    .toList());
        }
        for (int i = 0; found.isPresent() && i < MOST_IMPROVEMENTS; i++) {
            Optional<Found> better = better(found.get(), relaxed);
            if (better.isEmpty()) {
                break;
            }
            found = better;
        }
        return found;
    }

    /** The nearest miss on the grid around where the relaxation misses least. */
    Found closest(double[] relaxed) {
        return nearestMiss(neighbours(relaxed, null));
    }

    private Optional<Found> better(Found known, double[] from) {
        double[] start = new double[from.length];
        for (int a = 0; a < start.length; a++) {
            start[a] = (from[a] - grid.low(a)) / (grid.high(a) - grid.low(a));
        }
        double ceiling = merit.blended(known.free) - smallestGain();
        Descent.End end = new Descent(grid, landscape, merit.weights(), true, ceiling).from(start);
        if (end.miss() > -ROOM) {
            return Optional.empty();
        }
        return first(neighbours(end.free(), known.free));
    }

    /** The least by which one grid point can be better than another, or a trifle where grains differ. */
    private double smallestGain() {
        double grain = 0;
        double weight = merit.weights()[0];
        for (int a = 0; a < grid.size(); a++) {
            if (merit.weights()[a] != weight) {
                return 1e-9;
            }
            for (int c = 1; c < Math.min(3, grid.choices(a)); c++) {
                grain = divisor(grain, Math.rint(grid.value(a, c) - grid.value(a, c - 1)));
            }
        }
        return 0.999 * weight * Math.max(grain, 0);
    }

    private static double divisor(double a, double b) {
        return b == 0 ? a : divisor(b, a % b);
    }

    /** Grid points around a place, best first; only those better than a known one if it is given. */
    private List<double[]> neighbours(double[] at, double @org.jspecify.annotations.Nullable [] known) {
        int reach = 0;
        while (Math.pow(2.0 * (reach + 1) + 2, at.length) <= MOST_NEIGHBOURS) {
            reach++;
        }
        int[] low = new int[at.length];
        int[] high = new int[at.length];
        for (int a = 0; a < at.length; a++) {
            int below = grid.below(a, at[a]);
            low[a] = Math.max(0, below - reach);
            high[a] = Math.min(grid.choices(a) - 1, below + 1 + reach);
        }
        List<double[]> points = new ArrayList<>();
        int[] choice = low.clone();
        while (true) {
            double[] values = grid.values(choice);
            if (known == null || merit.compare(values, known) < 0) {
                points.add(values);
            }
            int a = at.length - 1;
            while (a >= 0 && choice[a] == high[a]) {
                choice[a] = low[a];
                a--;
            }
            if (a < 0) {
                points.sort(this::order);
                return points;
            }
            choice[a]++;
        }
    }
}
