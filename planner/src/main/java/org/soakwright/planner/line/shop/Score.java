package org.soakwright.planner.line.shop;

import java.util.ArrayList;
import java.util.List;

/** Numbers of which the first that differs decides; less is better. */
public record Score(List<Double> values) implements Comparable<Score> {
    private static final double SAME = 1e-9;

    public Score {
        values = List.copyOf(values);
    }

    /** Jobs that miss, then the aims in order, then, so that a search knows where to go, when all jobs are out on average. */
    static Score of(Schedule schedule, List<Aim> aims, long missing) {
        List<Double> values = new ArrayList<>();
        values.add((double) missing);
        aims.forEach(aim -> values.add(aim.of(schedule)));
        values.add(schedule.jobs().stream()
                .mapToDouble(placed -> placed.finishes(schedule.shop().carriage()))
                .sum());
        return new Score(values);
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
