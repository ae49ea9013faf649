package org.soakwright.planner.line.shop;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.List;
import java.util.SplittableRandom;
import java.util.stream.IntStream;
import org.jspecify.annotations.Nullable;

/**
 * Schedules by placing jobs one after the other, and then again and again taking some that are near each other off the floor and placing them
 * anew. A change is kept where it is no worse than what was had a number of changes ago, so that the search leaves what is only nearly best.
 * Ends after a number of placings, not of seconds: the same shop gives the same schedule.
 */
public final class Search {
    private static final long SEED = 20_261_201;
    private static final int MEMORY = 30;
    private static final int MOST_OFF = 6;
    private static final int MOST_EARLIER = 12;

    /**
     * Every so many changes all jobs are placed anew in the order in which they begin, but for one that comes earlier: what was left between them
     * closes, and what no small change mends has a chance.
     */
    private static final int REORDERING = 8;

    private final Shop shop;
    private final List<Job> jobs;
    private final List<Aim> aims;
    private final Placement placement = new Placement();
    private final SplittableRandom random = new SplittableRandom(SEED);
    private @Nullable State best;

    public Search(Shop shop, List<Job> jobs, List<Aim> aims) {
        this.shop = shop;
        this.jobs = List.copyOf(jobs);
        this.aims = List.copyOf(aims);
    }

    /**
     * What was found.
     *
     * @param missing jobs whose physics is not met
     * @param placings how often a job was placed
     */
    public record Found(Schedule schedule, Score score, long missing, long placings) {}

    /** A job can be placed nowhere, however late. */
    public static final class Unplaceable extends RuntimeException {
        private static final long serialVersionUID = 1;
        private final transient Job job;

        Unplaceable(Job job) {
            super(job.name() + " can be placed nowhere");
            this.job = job;
        }

        public Job job() {
            return job;
        }
    }

    /** Jobs on a floor. */
    private static final class State {
        private Floor floor;
        private final Placement.@Nullable Outcome[] at;
        private Score score;

        State(Floor floor, Placement.@Nullable Outcome[] at, Score score) {
            this.floor = floor;
            this.at = at;
            this.score = score;
        }

        Placement.Outcome of(int job) {
            Placement.Outcome outcome = at[job];
            if (outcome == null) {
                throw new IllegalStateException("job " + job + " is off the floor");
            }
            return outcome;
        }
    }

    /**
     * The best schedule found so far; goes on from what was found before.
     *
     * @param effort placings to spend in all; the first schedules are made in any case
     */
    public Found best(long effort) {
        State found = improved(best == null ? first() : best, effort);
        best = found;
        return found(found);
    }

    /**
     * Goes on from a schedule made by somebody else, whose jobs are these in their order; what is best so far stays so unless that gets better.
     *
     * @param placings to spend
     */
    public Found from(Schedule schedule, long placings) {
        State found = improved(state(schedule), placement.placings() + placings);
        if (best == null || found.score.compareTo(best.score) < 0) {
            best = found;
        }
        return found(found);
    }

    private State improved(State start, long until) {
        State found = start;
        State now = start;
        Score[] memory = new Score[MEMORY];
        Arrays.fill(memory, now.score);
        for (long change = 0; placement.placings() < until && jobs.size() > 1; change++) {
            State next = change % REORDERING == REORDERING - 1 ? reordered(now) : changed(now);
            int slot = (int) (change % MEMORY);
            if (next.score.compareTo(memory[slot]) <= 0 || next.score.compareTo(now.score) <= 0) {
                now = next;
            }
            if (now.score.compareTo(memory[slot]) < 0) {
                memory[slot] = now.score;
            }
            if (now.score.compareTo(found.score) < 0) {
                found = now;
            }
        }
        return found;
    }

    /** The schedule that comes of placing the jobs in an order. */
    public Found inOrder(List<Integer> order) {
        return found(placed(order.stream().mapToInt(Integer::intValue).toArray(), null));
    }

    /**
     * The schedule that comes of placing the jobs in the order of another schedule with durations like its own, which may miss what is asked: as much
     * longer or shorter as it takes, or in a style of their own where that is out earlier.
     */
    public Found like(Schedule schedule) {
        int[] order = IntStream.range(0, jobs.size())
                .boxed()
                .sorted(Comparator.comparingLong(
                                (Integer j) -> schedule.jobs().get(j).begins(shop.carriage()))
                        .thenComparing(Comparator.naturalOrder()))
                .mapToInt(Integer::intValue)
                .toArray();
        Floor floor = new Floor(shop);
        Placement.Outcome[] at = new Placement.Outcome[jobs.size()];
        for (int j : order) {
            Placed proposed = schedule.jobs().get(j);
            long[] style =
                    proposed.visits().stream().mapToLong(Placed.Visit::seconds).toArray();
            Placement.Outcome like = placement.like(floor, jobs.get(j), style);
            long wanted = proposed.finishes(shop.carriage());
            if (like == null || like.placed().finishes(shop.carriage()) > wanted) {
                Placement.Outcome own = placement.place(floor, jobs.get(j), -1);
                like = like == null
                                || (own != null
                                        && own.placed().finishes(shop.carriage())
                                                < like.placed().finishes(shop.carriage()))
                        ? own
                        : like;
            }
            if (like == null) {
                throw new Unplaceable(jobs.get(j));
            }
            floor.put(like.placed());
            at[j] = like;
        }
        return found(scored(floor, at));
    }

    /** A schedule made by somebody else, whose jobs are these in their order. */
    public Found of(Schedule schedule) {
        return found(state(schedule));
    }

    private State state(Schedule schedule) {
        Floor floor = new Floor(shop);
        Placement.Outcome[] at = new Placement.Outcome[jobs.size()];
        for (int j = 0; j < at.length; j++) {
            Placed placed = schedule.jobs().get(j);
            floor.put(placed);
            at[j] = new Placement.Outcome(placed, placement.isMet(placed), 0);
        }
        return scored(floor, at);
    }

    /** Times that were followed on the way, those nearest to just meeting everything first. */
    public List<Followed> followed(Physics physics) {
        return placement.followed(physics);
    }

    private Found found(State state) {
        return new Found(schedule(state), state.score, missing(state), placement.placings());
    }

    private State first() {
        Comparator<Integer> byDue =
                Comparator.comparingLong((Integer j) -> jobs.get(j).due());
        Comparator<Integer> byReady = Comparator.comparingLong(j -> jobs.get(j).ready());
        Comparator<Integer> byLength = Comparator.comparingLong(j -> -length(jobs.get(j)));
        Comparator<Integer> byWeight =
                Comparator.comparingDouble(j -> -jobs.get(j).weight());
        Comparator<Integer> bySlack = Comparator.comparingLong(j -> jobs.get(j).due() - length(jobs.get(j)));
        List<Comparator<Integer>> rules = List.of(
                byDue.thenComparing(byWeight).thenComparing(byLength),
                bySlack.thenComparing(byReady),
                byReady.thenComparing(byDue),
                byWeight.thenComparing(byDue));
        State best = null;
        for (Comparator<Integer> rule : rules) {
            int[] order = IntStream.range(0, jobs.size())
                    .boxed()
                    .sorted(rule.thenComparing(Comparator.naturalOrder()))
                    .mapToInt(Integer::intValue)
                    .toArray();
            State state = placed(order, null);
            best = best == null || state.score.compareTo(best.score) < 0 ? state : best;
        }
        if (best == null) {
            throw new IllegalStateException("no rule");
        }
        return best;
    }

    private static long length(Job job) {
        return Arrays.stream(Outlook.styles(job).get(0)).sum();
    }

    /** All jobs placed in an order; in the styles they have, or the best. */
    private State placed(int[] order, @Nullable State styled) {
        Floor floor = new Floor(shop);
        Placement.Outcome[] at = new Placement.Outcome[jobs.size()];
        for (int job : order) {
            at[job] = put(
                    floor, jobs.get(job), styled == null ? -1 : styled.of(job).style());
        }
        return scored(floor, at);
    }

    private Placement.Outcome put(Floor floor, Job job, int style) {
        Placement.Outcome outcome = placement.place(floor, job, style);
        if (outcome == null) {
            throw new Unplaceable(job);
        }
        floor.put(outcome.placed());
        return outcome;
    }

    private State reordered(State state) {
        List<Integer> order = new ArrayList<>(IntStream.range(0, jobs.size())
                .boxed()
                .sorted(Comparator.comparingLong(
                                (Integer j) -> state.of(j).placed().begins(shop.carriage()))
                        .thenComparing(Comparator.naturalOrder()))
                .toList());
        if (random.nextInt(4) > 0) {
            Integer job = seed(state);
            int at = order.indexOf(job);
            order.remove(job);
            order.add(at - random.nextInt(Math.min(at, MOST_EARLIER) + 1), job);
        }
        return placed(order.stream().mapToInt(Integer::intValue).toArray(), random.nextInt(4) == 0 ? null : state);
    }

    private State changed(State state) {
        int[] off = near(state, seed(state), 1 + random.nextInt(Math.min(MOST_OFF, jobs.size())));
        Floor floor = state.floor.copy();
        for (int job : off) {
            floor.remove(state.of(job).placed());
        }
        Placement.Outcome[] at = state.at.clone();
        int order = random.nextInt(3);
        if (order == 0) {
            sortByDue(off);
        } else if (order == 1) {
            shuffle(off);
        }
        for (int job : off) {
            int styles = Outlook.styles(jobs.get(job)).size();
            int style = random.nextInt(4) == 0
                    ? -1
                    : random.nextBoolean() ? state.of(job).style() : random.nextInt(styles);
            at[job] = put(floor, jobs.get(job), style);
        }
        return scored(floor, at);
    }

    private void sortByDue(int[] off) {
        int[] sorted = Arrays.stream(off)
                .boxed()
                .sorted(Comparator.comparingLong((Integer j) -> jobs.get(j).due()))
                .mapToInt(Integer::intValue)
                .toArray();
        System.arraycopy(sorted, 0, off, 0, off.length);
    }

    /** A job that is late or among the last to be out, or any. */
    private int seed(State state) {
        int seed = random.nextInt(jobs.size());
        if (random.nextInt(2) == 0) {
            return seed;
        }
        double worst = badness(state, seed);
        for (int i = 0; i < 3; i++) {
            int other = random.nextInt(jobs.size());
            if (badness(state, other) > worst) {
                worst = badness(state, other);
                seed = other;
            }
        }
        return seed;
    }

    private double badness(State state, int job) {
        Placement.Outcome outcome = state.of(job);
        long finishes = outcome.placed().finishes(shop.carriage());
        return (outcome.met() ? 0 : 1e15) + 1e3 * jobs.get(job).lateness(finishes) + finishes;
    }

    /** A job and others that are on the floor about the same time. */
    private int[] near(State state, int seed, int count) {
        int[] off = new int[count];
        boolean[] taken = new boolean[jobs.size()];
        off[0] = seed;
        taken[seed] = true;
        long middle = middle(state, seed);
        for (int i = 1; i < count; i++) {
            int best = -1;
            long nearest = Long.MAX_VALUE;
            for (int tries = 0; tries < 4; tries++) {
                int other = random.nextInt(jobs.size());
                long distance = Math.abs(middle(state, other) - middle);
                if (!taken[other] && distance < nearest) {
                    nearest = distance;
                    best = other;
                }
            }
            if (best < 0) {
                return Arrays.copyOf(off, i);
            }
            taken[best] = true;
            off[i] = best;
        }
        return off;
    }

    private long middle(State state, int job) {
        Placed placed = state.of(job).placed();
        return (placed.begins(shop.carriage()) + placed.finishes(shop.carriage())) / 2;
    }

    private void shuffle(int[] values) {
        for (int i = values.length - 1; i > 0; i--) {
            int j = random.nextInt(i + 1);
            int kept = values[i];
            values[i] = values[j];
            values[j] = kept;
        }
    }

    private State scored(Floor floor, Placement.@Nullable Outcome[] at) {
        State state = new State(floor, at, new Score(List.of()));
        state.score = Score.of(schedule(state), aims, missing(state));
        return state;
    }

    private long missing(State state) {
        return IntStream.range(0, jobs.size()).filter(j -> !state.of(j).met()).count();
    }

    private Schedule schedule(State state) {
        List<Placed> placed = new ArrayList<>();
        for (int j = 0; j < jobs.size(); j++) {
            placed.add(state.of(j).placed());
        }
        return new Schedule(shop, placed);
    }
}
