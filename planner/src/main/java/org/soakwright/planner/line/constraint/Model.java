package org.soakwright.planner.line.constraint;

import com.google.ortools.sat.BoolVar;
import com.google.ortools.sat.CpModel;
import com.google.ortools.sat.CumulativeConstraint;
import com.google.ortools.sat.IntVar;
import com.google.ortools.sat.IntervalVar;
import com.google.ortools.sat.LinearArgument;
import com.google.ortools.sat.LinearExpr;
import com.google.ortools.sat.Literal;
import com.google.ortools.util.Domain;
import java.util.ArrayList;
import java.util.IdentityHashMap;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import org.soakwright.planner.line.shop.Carriage;
import org.soakwright.planner.line.shop.Job;
import org.soakwright.planner.line.shop.Joint;
import org.soakwright.planner.line.shop.Moments;
import org.soakwright.planner.line.shop.Phase;
import org.soakwright.planner.line.shop.Physics;
import org.soakwright.planner.line.shop.Placed;
import org.soakwright.planner.line.shop.Schedule;
import org.soakwright.planner.line.shop.Shop;
import org.soakwright.planner.line.shop.Staffing;
import org.soakwright.planner.line.shop.Station;

/**
 * A shop's rules as constraints on when phases start and end, in ticks. Alike stations are one pool of which several can be taken; which of
 * them a job gets is settled afterwards. A station that is closed at times, or holds many, is a pool of its own. Physics comes in as linear cuts.
 */
final class Model {
    /** What the largest weight of a cut becomes. */
    private static final long FINE = 1_000_000;

    private final CpModel model = new CpModel();
    private final Shop shop;
    private final Pools pools;
    private final long tick;
    private final long horizon;
    private final IdentityHashMap<Job, Unknowns> unknowns = new IdentityHashMap<>();
    private final Map<Integer, List<Taken>> byPool = new LinkedHashMap<>();
    private final List<Taken> heads = new ArrayList<>();
    private final List<Taken> hoist = new ArrayList<>();
    private final List<Taken> watched = new ArrayList<>();
    private final List<List<Taken>> utilities = new ArrayList<>();
    private final Moments lifting;
    private final Moments handling;

    /**
     * What is to be found of a job.
     *
     * @param in whether a phase is in each pool that it can be in
     */
    private record Unknowns(IntVar[] starts, IntVar[] ends, List<Map<Integer, Literal>> in) {}

    private record Taken(IntervalVar interval, long amount) {}

    /**
     * The rules without any physics.
     *
     * @param tick s
     * @param horizon s; nothing happens later
     */
    Model(Shop shop, List<Job> jobs, long tick, long horizon) {
        this.shop = shop;
        pools = new Pools(shop);
        this.tick = tick;
        this.horizon = horizon / tick;
        lifting = staffed(shop.carriage().heads());
        handling = staffed(1);
        shop.utilities().forEach(utility -> utilities.add(new ArrayList<>()));
        jobs.forEach(this::add);
        stations();
        people();
        cumulative(hoist, shop.carriage().atOnce());
        for (int u = 0; u < utilities.size(); u++) {
            cumulative(utilities.get(u), shop.utilities().get(u));
        }
    }

    Pools pools() {
        return pools;
    }

    CpModel model() {
        return model;
    }

    IntVar start(Job job, int phase) {
        return of(job).starts()[phase];
    }

    IntVar end(Job job, int phase) {
        return of(job).ends()[phase];
    }

    /** Whether a phase is in each pool that it can be in. */
    Map<Integer, Literal> in(Job job, int phase) {
        return of(job).in().get(phase);
    }

    private Unknowns of(Job job) {
        Unknowns own = unknowns.get(job);
        if (own == null) {
            throw new IllegalArgumentException(job.name() + " is not of this model");
        }
        return own;
    }

    /** When a job is out of its last station, ticks. */
    LinearExpr out(Job job) {
        return LinearExpr.newBuilder()
                .add(end(job, job.size() - 1))
                .add(shop.carriage().takes() / tick)
                .build();
    }

    private Moments staffed(long needed) {
        if (needed == 0) {
            return Moments.of(0, horizon * tick);
        }
        Moments.Builder there = new Moments.Builder(16);
        for (Staffing.Level level : shop.staffing().levels()) {
            long from = Math.max(0, level.from());
            long until = Math.min(horizon * tick, level.until());
            if (level.heads() >= needed && from < until) {
                there.add(from, until);
            }
        }
        return there.built();
    }

    private Domain domain(Moments moments) {
        long[] bounds = new long[2 * moments.size()];
        for (int i = 0; i < moments.size(); i++) {
            bounds[2 * i] = Math.floorDiv(moments.from(i) + tick - 1, tick);
            bounds[2 * i + 1] = Math.min(horizon, Math.floorDiv(moments.to(i), tick));
        }
        return Domain.fromFlatIntervals(bounds);
    }

    private void add(Job job) {
        int n = job.size();
        long takes = shop.carriage().takes();
        IntVar[] start = new IntVar[n];
        IntVar[] end = new IntVar[n];
        for (int k = 0; k < n; k++) {
            start[k] = model.newIntVarFromDomain(domain(startable(job, k)), job.name() + " from " + k);
            end[k] = model.newIntVarFromDomain(domain(endable(job, k)), job.name() + " to " + k);
        }
        List<Map<Integer, Literal>> in = new ArrayList<>();
        unknowns.put(job, new Unknowns(start, end, in));
        int first = 0;
        for (int k = 0; k < n; k++) {
            Phase phase = job.phase(k);
            if (k > 0) {
                join(job, k, start[k], end[k - 1]);
            }
            in.add(k > 0 && phase.before().stays() ? in.get(k - 1) : choice(job, k));
            lasting(job, k);
            boolean leaves = k + 1 == n || !job.phase(k + 1).before().stays();
            if (leaves) {
                occupy(job, first, k);
                first = k + 1;
            }
        }
        if (takes > 0) {
            lift(fixed(LinearExpr.newBuilder().add(start[0]).add(-takes / tick).build(), takes, job.name()));
            lift(fixed(LinearExpr.newBuilder().add(end[n - 1]).build(), takes, job.name()));
        }
    }

    /** Landings of the first phase, and of those that a lift or a change of fixed length leads to, lie in hours with people. */
    private Moments startable(Job job, int k) {
        long takes = shop.carriage().takes();
        if (k == 0) {
            return takes == 0
                    ? Moments.of(job.ready(), horizon * tick)
                    : lifting.within(job.ready(), horizon * tick).lasting(takes).shifted(takes);
        }
        return Moments.of(job.ready(), horizon * tick);
    }

    private Moments endable(Job job, int k) {
        long takes = shop.carriage().takes();
        if (k + 1 == job.size()) {
            return takes == 0 ? Moments.of(job.ready(), horizon * tick) : lifting.lasting(takes);
        }
        Joint next = job.phase(k + 1).before();
        if (next instanceof Joint.Lift lift && takes > 0) {
            return lifting.lasting(lift.least());
        }
        return next instanceof Joint.Change change
                ? handling.lasting(change.seconds())
                : Moments.of(job.ready(), horizon * tick);
    }

    private void join(Job job, int k, IntVar start, IntVar before) {
        Joint joint = job.phase(k).before();
        if (joint instanceof Joint.Lift lift) {
            if (lift.least() == lift.most()) {
                model.addEquality(
                        start,
                        LinearExpr.newBuilder()
                                .add(before)
                                .add(lift.least() / tick)
                                .build());
                if (lift.least() > 0 && !shop.carriage().isFree()) {
                    lift(fixed(before, lift.least(), job.name()));
                }
            } else {
                IntVar length =
                        model.newIntVar(lift.least() / tick, lift.most() / tick, job.name() + " in the air " + k);
                lift(model.newIntervalVar(before, length, start, job.name()));
            }
        } else {
            long gap = job.leastGap(k);
            model.addEquality(
                    start, LinearExpr.newBuilder().add(before).add(gap / tick).build());
            if (gap > 0) {
                heads.add(new Taken(fixed(before, gap, job.name()), 1));
                drawnOn(job, k - 1, before, gap);
            }
        }
    }

    /** What a phase draws goes on while people change what is around the job. */
    private void drawnOn(Job job, int k, LinearArgument from, long gap) {
        for (int u = 0; u < utilities.size(); u++) {
            for (Map.Entry<Integer, Literal> in : in(job, k).entrySet()) {
                long draw = draw(job.phase(k), in.getKey(), u);
                if (draw > 0) {
                    IntervalVar there = in(job, k).size() == 1
                            ? fixed(from, gap, job.name())
                            : model.newOptionalFixedSizeIntervalVar(from, gap / tick, in.getValue(), job.name());
                    utilities.get(u).add(new Taken(there, draw));
                }
            }
        }
    }

    private IntervalVar fixed(LinearArgument from, long seconds, String name) {
        return model.newFixedSizeIntervalVar(from, seconds / tick, name);
    }

    private void lift(IntervalVar interval) {
        Carriage carriage = shop.carriage();
        hoist.add(new Taken(interval, 1));
        if (carriage.heads() > 0) {
            heads.add(new Taken(interval, carriage.heads()));
        }
    }

    private Map<Integer, Literal> choice(Job job, int k) {
        Set<Integer> open = new LinkedHashSet<>();
        job.phase(k).stations().forEach(station -> open.add(pools.of(station)));
        Map<Integer, Literal> in = new LinkedHashMap<>();
        if (open.size() == 1) {
            in.put(open.iterator().next(), model.trueLiteral());
            return in;
        }
        for (int pool : open) {
            BoolVar literal = model.newBoolVar(job.name() + " " + k + " in " + pool);
            in.put(pool, literal);
        }
        model.addExactlyOne(in.values());
        return in;
    }

    private void lasting(Job job, int k) {
        Phase phase = job.phase(k);
        Domain allowed = domain(phase.lasting().within(0, horizon * tick));
        IntVar length = model.newIntVarFromDomain(allowed, job.name() + " lasts " + k);
        IntervalVar interval = model.newIntervalVar(start(job, k), length, end(job, k), job.name());
        if (phase.attended()) {
            watched.add(new Taken(interval, 1));
        }
        for (int u = 0; u < utilities.size(); u++) {
            for (Map.Entry<Integer, Literal> in : in(job, k).entrySet()) {
                long draw = draw(phase, in.getKey(), u);
                if (draw > 0) {
                    IntervalVar there = in(job, k).size() == 1
                            ? interval
                            : model.newOptionalIntervalVar(
                                    start(job, k), length, end(job, k), in.getValue(), job.name());
                    utilities.get(u).add(new Taken(there, draw));
                }
            }
        }
    }

    /** Alike stations draw alike. */
    private long draw(Phase phase, int pool, int utility) {
        for (int i = 0; i < phase.stations().size(); i++) {
            if (pools.of(phase.stations().get(i)) == pool) {
                List<Long> draws = phase.draws().get(i);
                return draws.isEmpty() ? 0 : draws.get(utility);
            }
        }
        return 0;
    }

    private void occupy(Job job, int first, int last) {
        Map<Integer, Literal> in = in(job, first);
        in.forEach((pool, literal) -> {
            Station station = shop.stations().get(pools.stations(pool).get(0));
            long turnaround = station.turnaround() / tick;
            IntVar length = model.newIntVar(0, horizon + turnaround, job.name() + " takes " + first);
            LinearExpr over =
                    LinearExpr.newBuilder().add(end(job, last)).add(turnaround).build();
            IntervalVar interval = in.size() == 1
                    ? model.newIntervalVar(start(job, first), length, over, job.name())
                    : model.newOptionalIntervalVar(start(job, first), length, over, literal, job.name());
            byPool.computeIfAbsent(pool, any -> new ArrayList<>())
                    .add(new Taken(interval, station.holdsMany() ? job.amount() : 1));
        });
    }

    private void stations() {
        byPool.forEach((pool, taken) -> {
            long capacity = 0;
            for (int s : pools.stations(pool)) {
                Station station = shop.stations().get(s);
                long own = station.holdsMany() ? station.limit() : 1;
                capacity += own;
                for (int i = 0; i < station.closed().size(); i++) {
                    block(taken, station.closed().from(i), station.closed().to(i), own);
                }
            }
            cumulative(taken, capacity);
        });
    }

    private void block(List<Taken> taken, long from, long until, long amount) {
        long first = Math.max(0, from / tick);
        long after = Math.min(2 * horizon, until / tick);
        if (first < after && amount > 0) {
            taken.add(new Taken(model.newFixedInterval(first, after - first, "closed"), amount));
        }
    }

    private void people() {
        long most = shop.staffing().most();
        if (!heads.isEmpty() && most < Moments.NEVER) {
            long at = 0;
            for (Staffing.Level level : shop.staffing().levels()) {
                block(heads, at, Math.max(at, level.from()), most);
                block(heads, Math.max(at, level.from()), level.until(), most - level.heads());
                at = Math.max(at, level.until());
            }
            block(heads, at, 2 * horizon * tick, most);
            cumulative(heads, most);
        }
        if (!watched.isEmpty()) {
            long many = watched.size();
            Moments shifts = shop.staffing().shifts();
            long at = 0;
            for (int i = 0; i < shifts.size(); i++) {
                block(watched, at, Math.max(at, shifts.from(i)), many);
                at = Math.max(at, shifts.to(i));
            }
            block(watched, at, 2 * horizon * tick, many);
            cumulative(watched, many);
        }
    }

    private void cumulative(List<Taken> taken, long capacity) {
        long sum = taken.stream().mapToLong(Taken::amount).sum();
        if (sum <= capacity) {
            return;
        }
        if (capacity == 1) {
            model.addNoOverlap(taken.stream().map(Taken::interval).toList());
            return;
        }
        CumulativeConstraint cumulative = model.addCumulative(capacity);
        taken.forEach(one -> cumulative.addDemand(one.interval(), one.amount()));
    }

    /** Times weighed sum to no less than so much. Rounded so that no times that satisfy it are lost. */
    void cut(Job job, Physics.Cut cut) {
        double largest = 0;
        for (double weight : cut.weights()) {
            largest = Math.max(largest, Math.abs(weight));
        }
        if (largest == 0) {
            return;
        }
        double scale = FINE / largest;
        var sum = LinearExpr.newBuilder();
        for (int i = 0; i < cut.weights().length; i++) {
            long weight = (long) Math.ceil(cut.weights()[i] * scale);
            int k = i / 2;
            if (i % 2 == 0) {
                sum.addTerm(end(job, k), weight).addTerm(start(job, k), -weight);
            } else {
                sum.addTerm(start(job, k + 1), weight).addTerm(end(job, k), -weight);
            }
        }
        model.addGreaterOrEqual(sum.build(), (long) Math.floor(cut.atLeast() * scale / tick));
    }

    /** Times at and beyond which a linear miss is met, from its tangent there. */
    static Physics.Cut tangent(long[] times, double miss, double[] slopes) {
        double[] weights = new double[slopes.length];
        double atLeast = miss;
        for (int i = 0; i < slopes.length; i++) {
            weights[i] = -slopes[i];
            atLeast -= slopes[i] * times[i];
        }
        return new Physics.Cut(weights, atLeast);
    }

    /** Begins the search from a schedule. */
    void hint(Schedule schedule) {
        for (Placed placed : schedule.jobs()) {
            Job job = placed.job();
            for (int k = 0; k < job.size(); k++) {
                model.addHint(start(job, k), placed.visit(k).start() / tick);
                model.addHint(end(job, k), placed.visit(k).end() / tick);
                Map<Integer, Literal> in = in(job, k);
                if (in.size() > 1 && (k == 0 || !job.phase(k).before().stays())) {
                    int own = pools.of(placed.visit(k).station());
                    in.forEach((pool, literal) -> model.addHint(literal, pool == own));
                }
            }
        }
    }
}
