package org.soakwright.planner.line.constraint;

import java.util.ArrayList;
import java.util.IdentityHashMap;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.soakwright.planner.line.shop.Aim;
import org.soakwright.planner.line.shop.Job;
import org.soakwright.planner.line.shop.Physics;
import org.soakwright.planner.line.shop.Placed;
import org.soakwright.planner.line.shop.Schedule;
import org.soakwright.planner.line.shop.Score;
import org.soakwright.planner.line.shop.Search;
import org.soakwright.planner.line.shop.Shop;

/**
 * Makes a schedule better by constraint programming, and shows how good any can be. The physics stands in the program as tangents of what was
 * followed exactly; what the program proposes is followed, and where a job misses, a tangent there is added and the program solved again. Its order
 * of jobs is tried by the search too, which knows the physics itself. Bounds come from another program, in which only what is certain stands.
 */
public final class Improvement {
    private static final int MOST_ROUNDS = 12;
    private static final int MOST_IDLE = 2;
    private static final int MOST_RETIMINGS = 8;
    private static final double RETIMING = 0.05;
    private static final double FOR_PROOF = 0.35;

    /** Tangents at what was followed on the way: how near to just meeting everything, and how many of each physics. */
    private static final double NEAR = 0.2;

    private static final int MOST_FOLLOWED = 50;
    private static final int FEWEST_FOLLOWED = 6;
    private static final int MOST_CUTS = 1000;

    /** What reading a program takes for each phase, counted as work. */
    private static final double READING = 5e-4;

    /** A tangent asks for a little more than to be met, so that times that just miss do not come again. */
    private static final double BEYOND = 2e-5;

    /** Beyond so many phases a program takes longer to read than anybody waits. */
    private static final int MOST_PHASES = 2500;

    private final Shop shop;
    private final List<Job> jobs;
    private final List<Aim> aims;
    private final Search search;
    private final IdentityHashMap<Physics, List<Physics.Cut>> cuts = new IdentityHashMap<>();
    private boolean convex = true;

    public Improvement(Shop shop, List<Job> jobs, List<Aim> aims, Search search) {
        this.shop = shop;
        this.jobs = List.copyOf(jobs);
        this.aims = List.copyOf(aims);
        this.search = search;
        for (Job job : jobs) {
            convex &= job.physics() == Physics.NONE || job.physics().convex();
        }
    }

    /**
     * What came of it.
     *
     * @param lateness no schedule has less, s times weight
     * @param makespan no schedule no later than the one found has less, s
     * @param tooLarge whether there is more than a program takes
     */
    public record Outcome(Search.Found found, OptionalDouble lateness, OptionalDouble makespan, boolean tooLarge) {}

    /**
     * Improves a schedule that meets everything.
     *
     * @param work deterministic work to spend, about a second each
     * @param placings of the search to spend on what the program proposes
     */
    public Outcome of(Search.Found first, double work, long placings) {
        boolean tooLarge = jobs.stream().mapToInt(Job::size).sum() > MOST_PHASES;
        if (tooLarge || work <= 0 || first.missing() > 0 || !Native.loads()) {
            return new Outcome(first, OptionalDouble.empty(), OptionalDouble.empty(), tooLarge);
        }
        first.schedule().jobs().forEach(this::cutAt);
        jobs.stream().map(Job::physics).distinct().forEach(this::cutWhereFollowed);
        Program program = new Program(
                shop,
                jobs,
                aims.stream()
                        .filter(aim -> aim != Aim.COST || aim == aims.get(0))
                        .toList());
        Search.Found best = first;
        OptionalDouble lateness = OptionalDouble.empty();
        OptionalDouble makespan = OptionalDouble.empty();
        Schedule hint = first.schedule();
        int idle = 0;
        double left = convex ? work : work * (1 - FOR_PROOF);
        for (int round = 0; round < MOST_ROUNDS && left > 0; round++) {
            double share = convex ? left : round == 0 ? left / 3 : left / 4;
            Program.Answer answer = program.solve(best.schedule(), hint, cuts, share);
            left -= share + reading();
            if (convex) {
                lateness = larger(lateness, answer.lateness());
                makespan = larger(makespan, answer.makespan());
            }
            if (answer.schedule().isEmpty()) {
                hint = best.schedule();
                continue;
            }
            Schedule proposed = answer.schedule().get();
            boolean met = judge(proposed);
            Optional<Schedule> timed = met ? answer.schedule() : retimed(program, best.schedule(), proposed);
            Search.Found next = timed.isPresent() ? search.of(timed.get()) : search.like(proposed);
            next = search.from(next.schedule(), placings / MOST_ROUNDS);
            idle = next.score().compareTo(best.score()) < 0 ? 0 : idle + 1;
            best = better(best, next);
            next.schedule().jobs().forEach(this::cutAt);
            hint = next.schedule();
            if (met && (convex || idle >= MOST_IDLE)) {
                break;
            }
        }
        if (!convex) {
            Program.Answer proof =
                    program.solve(best.schedule(), best.schedule(), new IdentityHashMap<>(), work * FOR_PROOF);
            lateness = proof.lateness();
            makespan = proof.makespan();
        }
        return new Outcome(best, lateness, makespan, false);
    }

    private double reading() {
        return READING * jobs.stream().mapToInt(Job::size).sum();
    }

    /** A schedule in the order of another whose times meet everything; empty where so many tangents do not lead to one. */
    private Optional<Schedule> retimed(Program program, Schedule known, Schedule order) {
        Optional<Schedule> timed = Optional.of(order);
        for (int i = 0; i < MOST_RETIMINGS && timed.isPresent(); i++) {
            timed = program.retimed(known, timed.get(), cuts, RETIMING);
            if (timed.isPresent() && judge(timed.get())) {
                return timed;
            }
        }
        return Optional.empty();
    }

    private static OptionalDouble larger(OptionalDouble one, OptionalDouble other) {
        return one.isEmpty() || (other.isPresent() && other.getAsDouble() > one.getAsDouble()) ? other : one;
    }

    private static Search.Found better(Search.Found one, Search.Found other) {
        Score mine = one.score();
        return other.score().compareTo(mine) < 0 ? other : one;
    }

    /** Whether every job meets what is asked; those that do not leave a tangent behind. */
    private boolean judge(Schedule schedule) {
        boolean met = true;
        for (Placed placed : schedule.jobs()) {
            if (!placed.job().physics().read(placed.times()).met()) {
                met = false;
                cutAt(placed);
            }
        }
        return met;
    }

    private void cutWhereFollowed(Physics physics) {
        search.followed(physics).stream()
                .filter(followed -> Math.abs(followed.reading().worst()) < NEAR)
                .limit(Math.max(FEWEST_FOLLOWED, Math.min(MOST_FOLLOWED, MOST_CUTS / jobs.size())))
                .forEach(followed -> cut(physics, followed.times(), followed.reading()));
    }

    private void cutAt(Placed placed) {
        long[] times = placed.times();
        cut(placed.job().physics(), times, placed.job().physics().read(times));
    }

    private void cut(Physics physics, long[] times, Physics.Reading reading) {
        List<Physics.Cut> own = cuts.computeIfAbsent(physics, any -> new ArrayList<>());
        for (int r = 0; r < reading.misses().length; r++) {
            own.add(Model.tangent(times, reading.misses()[r] + BEYOND, reading.slopes()[r]));
        }
    }
}
