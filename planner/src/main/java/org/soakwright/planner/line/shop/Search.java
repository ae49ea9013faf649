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

    private static final int MOST_OFF = 6;
    private static final int MOST_EARLIER = 12;
    private static final int MANY = 40;

    /** How many placings in a hundred give way to another job; more among few jobs, whose orders are soon tried. */
    private static final int FEWEST_WHIMS = 4;

    /** How many changes in a hundred place all that come after a job anew. */
    private static final int REORDERING = 12;

    /** How many changes ago a schedule may have been as good as the next one must be. */
    private static final int MEMORY = 100;

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

    /** Jobs on a floor; some may be off it while they are moved. */
    private static final class State {
        private final Floor floor;
        private final Placement.@Nullable Outcome[] at;
        private final double[][] parts;
        private Score score = new Score(List.of());

        State(Floor floor, int jobs) {
            this(floor, new Placement.Outcome[jobs], new double[jobs][]);
        }

        private State(Floor floor, Placement.@Nullable Outcome[] at, double[][] parts) {
            this.floor = floor;
            this.at = at;
            this.parts = parts;
        }

        State copy() {
            return new State(floor.copy(), at.clone(), parts.clone());
        }

        Placement.Outcome of(int job) {
            Placement.Outcome outcome = at[job];
            if (outcome == null) {
                throw new IllegalStateException("job " + job + " is off the floor");
            }
            return outcome;
        }

        void takeOff(int job) {
            floor.remove(of(job).placed());
            at[job] = null;
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
            int slot = (int) (change % MEMORY);
            Score limit = memory[slot].compareTo(now.score) > 0 ? memory[slot] : now.score;
            State next = random.nextInt(100) < REORDERING ? reordered(now, limit) : changed(now, limit);
            if (next != null) {
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
        State state = new State(new Floor(shop), jobs.size());
        for (int j : order) {
            Placed proposed = schedule.jobs().get(j);
            long[] style =
                    proposed.visits().stream().mapToLong(Placed.Visit::seconds).toArray();
            Placement.Outcome like = placement.like(state.floor, jobs.get(j), style);
            long wanted = proposed.finishes(shop.carriage());
            if (like == null || like.placed().finishes(shop.carriage()) > wanted) {
                Placement.Outcome own = placement.place(state.floor, jobs.get(j), -1);
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
            put(state, j, like);
        }
        state.score = score(state);
        return found(state);
    }

    /** A schedule made by somebody else, whose jobs are these in their order. */
    public Found of(Schedule schedule) {
        return found(state(schedule));
    }

    private State state(Schedule schedule) {
        State state = new State(new Floor(shop), jobs.size());
        for (int j = 0; j < jobs.size(); j++) {
            Placed placed = schedule.jobs().get(j);
            put(state, j, new Placement.Outcome(placed, placement.isMet(placed), 0));
        }
        state.score = score(state);
        return state;
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
        // Many jobs take long to place, and the first rules are mostly the best.
        for (Comparator<Integer> rule : jobs.size() > MANY ? rules.subList(0, 2) : rules) {
            int[] order = IntStream.range(0, jobs.size())
                    .boxed()
                    .sorted(rule.thenComparing(Comparator.naturalOrder()))
                    .mapToInt(Integer::intValue)
                    .toArray();
            State state = placed(order);
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

    /** All jobs placed in an order, each in its best style. */
    private State placed(int[] order) {
        State state = new State(new Floor(shop), jobs.size());
        for (int job : order) {
            put(state, job, -1);
        }
        state.score = score(state);
        return state;
    }

    private void put(State state, int job, int style) {
        if (!put(state, job, style, Placement.Whim.NONE)) {
            throw new Unplaceable(jobs.get(job));
        }
    }

    /** Whether a job could be put on. */
    private boolean put(State state, int job, int style, Placement.Whim whim) {
        Placement.Outcome outcome = placement.place(state.floor, jobs.get(job), style, whim);
        if (outcome != null) {
            put(state, job, outcome);
        }
        return outcome != null;
    }

    private void put(State state, int job, Placement.Outcome outcome) {
        state.floor.put(outcome.placed());
        state.at[job] = outcome;
        state.parts[job] = parts(outcome);
    }

    /** Puts jobs on again, as long as what comes of it can still be within a limit. */
    private @Nullable State putOn(State state, int[] off, int[] styles, boolean whims, Score limit) {
        for (int i = 0; i < off.length; i++) {
            if (!put(state, off[i], styles[i], whims ? whim(state, off[i]) : Placement.Whim.NONE)) {
                return null;
            }
            state.score = score(state);
            if (state.score.compareTo(limit) > 0) {
                return null;
            }
        }
        return state;
    }

    /**
     * One job earlier or later in the order in which they begin, and all that come after it placed anew: what was left between them closes, and
     * what no small change mends has a chance.
     */
    private @Nullable State reordered(State state, Score limit) {
        int n = jobs.size();
        int[] order = IntStream.range(0, n)
                .boxed()
                .sorted(Comparator.comparingLong(
                                (Integer j) -> state.of(j).placed().begins(shop.carriage()))
                        .thenComparing(Comparator.naturalOrder()))
                .mapToInt(Integer::intValue)
                .toArray();
        int job = seed(state);
        int from = 0;
        while (order[from] != job) {
            from++;
        }
        int to = random.nextInt(4) > 0
                ? Math.max(0, from - random.nextInt(MOST_EARLIER + 1))
                : Math.min(n - 1, from + random.nextInt(MOST_EARLIER + 1));
        if (to < from) {
            System.arraycopy(order, to, order, to + 1, from - to);
        } else {
            System.arraycopy(order, from + 1, order, from, to - from);
        }
        order[to] = job;
        int first = Math.min(from, to);
        boolean free = random.nextInt(4) == 0;
        State next = state.copy();
        int[] off = Arrays.copyOfRange(order, first, n);
        int[] styles = new int[off.length];
        for (int i = 0; i < off.length; i++) {
            styles[i] = free ? -1 : state.of(off[i]).style();
            next.takeOff(off[i]);
        }
        return putOn(next, off, styles, false, limit);
    }

    private @Nullable State changed(State state, Score limit) {
        int[] off = near(state, seed(state), 1 + random.nextInt(Math.min(MOST_OFF, jobs.size())));
        State next = state.copy();
        for (int job : off) {
            next.takeOff(job);
        }
        int order = random.nextInt(3);
        if (order == 0) {
            sortByDue(off);
        } else if (order == 1) {
            shuffle(off);
        }
        int[] styles = new int[off.length];
        for (int i = 0; i < off.length; i++) {
            int count = Outlook.styles(jobs.get(off[i])).size();
            styles[i] = random.nextInt(4) == 0
                    ? -1
                    : random.nextBoolean() ? state.of(off[i]).style() : random.nextInt(count);
        }
        return putOn(next, off, styles, true, limit);
    }

    /** Mostly none; else a job gives way to another: it comes after something that the other does, or does without a station. */
    private Placement.Whim whim(State state, int job) {
        if (random.nextInt(100) >= Math.max(FEWEST_WHIMS, 100 / (jobs.size() + 1))) {
            return Placement.Whim.NONE;
        }
        if (random.nextInt(3) == 0) {
            return new Placement.Whim(
                    -Moments.NEVER, random.nextInt(shop.stations().size()));
        }
        int other = random.nextInt(jobs.size());
        Placement.Outcome outcome = state.at[other];
        if (outcome == null || other == job) {
            return Placement.Whim.NONE;
        }
        List<Placed.Visit> visits = outcome.placed().visits();
        Placed.Visit visit = visits.get(random.nextInt(visits.size()));
        return new Placement.Whim(
                (random.nextBoolean() ? visit.start() : visit.end())
                        - random.nextInt(2) * shop.carriage().takes(),
                -1);
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

    /** What one job adds to a score, in its order. */
    private double[] parts(Placement.Outcome outcome) {
        double[] parts = new double[aims.size() + 2];
        Schedule alone = new Schedule(shop, List.of(outcome.placed()));
        parts[0] = outcome.met() ? 0 : 1;
        for (int i = 0; i < aims.size(); i++) {
            parts[i + 1] = aims.get(i).of(alone);
        }
        parts[aims.size() + 1] = outcome.placed().finishes(shop.carriage());
        return parts;
    }

    /** Of the jobs that are on the floor; more jobs make no number less. */
    private Score score(State state) {
        double[] sum = new double[aims.size() + 2];
        for (int j = 0; j < state.parts.length; j++) {
            if (state.at[j] != null) {
                for (int i = 0; i < sum.length; i++) {
                    double part = state.parts[j][i];
                    boolean last = i > 0 && i <= aims.size() && aims.get(i - 1) == Aim.MAKESPAN;
                    sum[i] = last ? Math.max(sum[i], part) : sum[i] + part;
                }
            }
        }
        return new Score(Arrays.stream(sum).boxed().toList());
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
