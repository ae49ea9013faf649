package org.soakwright.planner.batch;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.List;

/** Goes through every point of a small grid, best first. */
final class WholeGrid {
    /** A grid with no more points is gone through whole. */
    static final int MOST_POINTS = 4096;

    private WholeGrid() {}

    /** The best point that meets the targets, of equals the one with most room; else a nearest miss. */
    static Found best(Grid grid, Landscape landscape, Merit merit) {
        List<double[]> points = points(grid);
        points.sort(((Comparator<double[]>) merit::compare).thenComparing(Arrays::compare));
        Found best = null;
        List<Found> missed = new ArrayList<>();
        for (double[] point : points) {
            if (best != null && merit.compare(point, best.free()) > 0) {
                return best;
            }
            Found found = Found.of(landscape, point);
            if (found.met() && (best == null || found.miss() < best.miss())) {
                best = found;
            }
            missed.add(found);
        }
        return best != null ? best : nearest(missed);
    }

    /** Of the points that miss by all but the least, the one that comes first. */
    private static Found nearest(List<Found> missed) {
        double least = missed.stream().mapToDouble(Found::miss).min().orElseThrow();
        return missed.stream()
                .filter(found -> found.miss() <= least + Found.ALIKE)
                .findFirst()
                .orElseThrow();
    }

    private static List<double[]> points(Grid grid) {
        List<double[]> points = new ArrayList<>();
        int[] choice = new int[grid.size()];
        while (true) {
            points.add(grid.values(choice));
            int a = choice.length - 1;
            while (a >= 0 && ++choice[a] == grid.choices(a)) {
                choice[a--] = 0;
            }
            if (a < 0) {
                return points;
            }
        }
    }
}
