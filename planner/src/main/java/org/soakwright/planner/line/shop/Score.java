package org.soakwright.planner.line.shop;

import java.util.List;

/**
 * Numbers of which the first that differs decides; less is better: jobs that miss, then the aims in order, then, so that a search knows where to go,
 * when all jobs are out on average.
 */
public record Score(List<Double> values) implements Comparable<Score> {
    private static final double SAME = 1e-9;

    public Score {
        values = List.copyOf(values);
    }

    @Override
    public int compareTo(Score other) {
        for (int i = 0; i < values.size(); i++) {
            double mine = values.get(i);
            double theirs = other.values.get(i);
            if (Math.abs(mine - theirs) > SAME * Math.max(1, Math.abs(mine))) {
                return Double.compare(mine, theirs);
            }
        }
        return 0;
    }
}
