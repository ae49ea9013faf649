package org.soakwright.planner.report.line;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.IdentityHashMap;
import java.util.List;
import java.util.Optional;
import org.soakwright.planner.line.LinePlan;
import org.soakwright.planner.line.LoadPlan;
import org.soakwright.planner.line.shop.Carriage;
import org.soakwright.planner.line.shop.Placed;
import org.soakwright.planner.line.shop.Staffing;

/** What people do, by time, and who is free meanwhile. */
final class Moves {
    private final Carriage carriage;
    private final Staffing staffing;
    private final List<Placed.Task> tasks = new ArrayList<>();
    private long longest;

    private Moves(LinePlan plan) {
        carriage = plan.schedule().shop().carriage();
        staffing = plan.schedule().shop().staffing();
    }

    static List<Move> of(LinePlan plan) {
        Moves all = new Moves(plan);
        IdentityHashMap<Placed.Task, LoadPlan> loads = new IdentityHashMap<>();
        for (LoadPlan load : plan.loads()) {
            for (Placed.Task task : load.placed().tasks(all.carriage)) {
                all.tasks.add(task);
                loads.put(task, load);
                all.longest = Math.max(all.longest, task.until() - task.from());
            }
        }
        Comparator<Placed.Task> byTime = Comparator.comparingLong(Placed.Task::from);
        all.tasks.sort(byTime.thenComparing(task -> task.placed().job().name()).thenComparingInt(Placed.Task::phase));
        List<Move> moves = new ArrayList<>();
        for (Placed.Task task : all.tasks) {
            moves.add(all.move(task, java.util.Objects.requireNonNull(loads.get(task))));
        }
        return List.copyOf(moves);
    }

    private Move move(Placed.Task task, LoadPlan load) {
        List<LoadPlan.LegPlan> legs = load.legs();
        boolean out = task.kind() == Placed.Task.Kind.UNLOAD;
        Optional<String> from = task.phase() == 0
                ? Optional.empty()
                : Optional.of(legs.get(task.phase() - 1).vessel());
        return new Move(
                task.kind(),
                load,
                out ? Optional.empty() : Optional.of(legs.get(task.phase())),
                from,
                out ? Optional.empty() : Optional.of(legs.get(task.phase()).vessel()),
                task.from(),
                task.until(),
                task.heads(carriage),
                free(task),
                lifts(task),
                task.needsHoist(),
                task.phase());
    }

    /** Those there and not busy, at the moment of the task at which they are fewest. */
    private long free(Placed.Task task) {
        List<Placed.Task> near = near(task);
        long least = Long.MAX_VALUE;
        for (long moment : moments(task, near)) {
            long there = staffing.levels().stream()
                    .filter(level -> level.from() <= moment && moment < level.until())
                    .mapToLong(Staffing.Level::heads)
                    .sum();
            long busy = near.stream()
                    .filter(other -> isOn(other, moment))
                    .mapToLong(other -> other.heads(carriage))
                    .sum();
            least = Math.min(least, there - busy);
        }
        return Math.max(0, least);
    }

    private long lifts(Placed.Task task) {
        List<Placed.Task> near = near(task);
        long most = 0;
        for (long moment : moments(task, near)) {
            most = Math.max(
                    most,
                    near.stream()
                            .filter(other -> other.needsHoist() && isOn(other, moment))
                            .count());
        }
        return most;
    }

    private static boolean isOn(Placed.Task task, long moment) {
        return task.from() <= moment && moment < task.until();
    }

    /** All that can be on while it lasts. */
    private List<Placed.Task> near(Placed.Task task) {
        return tasks.subList(firstFrom(task.from() - longest), firstFrom(task.until()));
    }

    /** The first task that begins at a moment or later. */
    private int firstFrom(long moment) {
        int low = 0;
        int high = tasks.size();
        while (low < high) {
            int middle = (low + high) >>> 1;
            if (tasks.get(middle).from() < moment) {
                low = middle + 1;
            } else {
                high = middle;
            }
        }
        return low;
    }

    /** Its beginning and whenever something changes while it lasts. */
    private List<Long> moments(Placed.Task task, List<Placed.Task> near) {
        List<Long> moments = new ArrayList<>(List.of(task.from()));
        for (Placed.Task other : near) {
            if (other.from() > task.from() && other.from() < task.until()) {
                moments.add(other.from());
            }
        }
        for (Staffing.Level level : staffing.levels()) {
            if (level.from() > task.from() && level.from() < task.until()) {
                moments.add(level.from());
            }
        }
        return moments;
    }
}
