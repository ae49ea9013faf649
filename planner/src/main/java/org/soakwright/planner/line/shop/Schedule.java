package org.soakwright.planner.line.shop;

import java.util.Comparator;
import java.util.List;

/** Every job placed, in the order in which they were given. */
public record Schedule(Shop shop, List<Placed> jobs) {
    public Schedule {
        jobs = List.copyOf(jobs);
    }

    /** When the last job is out, s from the line's start. */
    public long makespan() {
        return jobs.stream()
                .mapToLong(placed -> placed.finishes(shop.carriage()))
                .max()
                .orElse(0);
    }

    /** How long after the first moment that somebody waits for a job is out, s. */
    public long late(Placed placed) {
        return Math.max(0, placed.finishes(shop.carriage()) - placed.job().due());
    }

    /** Lateness times weight, over all jobs. */
    public double lateness() {
        return jobs.stream()
                .mapToDouble(placed -> placed.job().lateness(placed.finishes(shop.carriage())))
                .sum();
    }

    /** What people do, by time. */
    public List<Placed.Task> tasks() {
        return jobs.stream()
                .flatMap(placed -> placed.tasks(shop.carriage()).stream())
                .sorted(Comparator.comparingLong(Placed.Task::from)
                        .thenComparing(task -> task.placed().job().name())
                        .thenComparingInt(Placed.Task::phase))
                .toList();
    }

    /** Tasks that begin at night. */
    public long atNight() {
        Moments nights = shop.staffing().nights();
        return tasks().stream().filter(task -> nights.contains(task.from())).count();
    }
}
