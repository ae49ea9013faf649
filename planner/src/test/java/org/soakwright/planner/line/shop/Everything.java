package org.soakwright.planner.line.shop;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.List;
import org.jspecify.annotations.Nullable;

/**
 * Tries every schedule of a tiny shop on its steps of time: all ways of every job alone, then all of them together. Knows the rules and nothing of
 * how jobs are placed. A resource is a word of which each bit is a step.
 */
final class Everything {
    private final Shop shop;
    private final List<Job> jobs;
    private final boolean late;
    private final int horizon;
    private final int takes;
    private final int resources;
    private final long staffed;
    private final long attended;
    private long best;

    /** A job's way: what it takes of each resource, stations first, then the hoist and the one person. */
    private record Way(long[] taken, long value) {}

    private Everything(TinyShop tiny, boolean late, int horizon, long below) {
        shop = tiny.shop();
        jobs = tiny.jobs();
        this.late = late;
        this.horizon = horizon;
        takes = (int) (shop.carriage().takes() / TinyShop.STEP);
        resources = shop.stations().size() + 1;
        staffed = staffed();
        attended = attended();
        best = below;
    }

    /** The least of an aim that is below a value, in steps; the value where there is none. */
    static long below(TinyShop tiny, boolean late, int horizon, long value) {
        Everything all = new Everything(tiny, late, horizon, value);
        List<List<Way>> ways = new ArrayList<>();
        for (Job job : all.jobs) {
            List<Way> own = new ArrayList<>();
            all.extend(job, 0, new int[job.size()], new int[job.size()], new int[job.size()], own);
            own.sort(Comparator.comparingLong(Way::value));
            ways.add(own);
        }
        ways.sort(Comparator.comparingInt(List::size));
        all.combine(ways, 0, new long[all.resources], 0);
        return all.best;
    }

    /** When a job can be out at the earliest, in steps, if others stay where they are; the horizon if not before. */
    static long earliest(TinyShop tiny, Job job, List<Placed> others, int horizon) {
        Everything all = new Everything(tiny, false, horizon, horizon);
        long[] taken = new long[all.resources];
        for (Placed placed : others) {
            int n = placed.job().size();
            int[] stations = new int[n];
            int[] starts = new int[n];
            int[] ends = new int[n];
            for (int k = 0; k < n; k++) {
                stations[k] = placed.visit(k).station();
                starts[k] = (int) (placed.visit(k).start() / TinyShop.STEP);
                ends[k] = (int) (placed.visit(k).end() / TinyShop.STEP);
            }
            Way way = all.way(placed.job(), stations, starts, ends);
            if (way == null) {
                throw new IllegalArgumentException(placed + " is against the rules");
            }
            for (int r = 0; r < all.resources; r++) {
                taken[r] |= way.taken()[r];
            }
        }
        List<Way> ways = new ArrayList<>();
        int n = job.size();
        all.extend(job, 0, new int[n], new int[n], new int[n], ways);
        ways.sort(Comparator.comparingLong(Way::value));
        for (Way way : ways) {
            if (all.fits(way.taken(), taken)) {
                return way.value();
            }
        }
        return horizon;
    }

    private long staffed() {
        long bits = 0;
        for (int t = 0; t < 64; t++) {
            for (Staffing.Level level : shop.staffing().levels()) {
                long at = t * TinyShop.STEP;
                if (level.from() <= at && at + TinyShop.STEP <= level.until()) {
                    bits |= 1L << t;
                }
            }
        }
        return bits;
    }

    private long attended() {
        long bits = 0;
        Moments shifts = shop.staffing().shifts();
        for (int t = 0; t < 64; t++) {
            for (int i = 0; i < shifts.size(); i++) {
                long at = t * TinyShop.STEP;
                if (shifts.from(i) <= at && at + TinyShop.STEP <= shifts.to(i)) {
                    bits |= 1L << t;
                }
            }
        }
        return bits;
    }

    private static long bits(int from, int until) {
        long bits = 0;
        for (int t = from; t < until; t++) {
            bits |= 1L << t;
        }
        return bits;
    }

    private void extend(Job job, int k, int[] stations, int[] starts, int[] ends, List<Way> ways) {
        if (k == job.size()) {
            Way way = way(job, stations, starts, ends);
            if (way != null && way.value() < best) {
                ways.add(way);
            }
            return;
        }
        Phase phase = job.phase(k);
        int ready = (int) (job.ready() / TinyShop.STEP);
        int first = k == 0 ? ready + takes : ends[k - 1];
        for (int start = first; start <= horizon - takes; start++) {
            if (k > 0 && !isJoined(phase.before(), start - ends[k - 1])) {
                continue;
            }
            for (int station : phase.stations()) {
                if (k > 0 && phase.before().stays() && station != stations[k - 1]) {
                    continue;
                }
                for (int end = start; end <= horizon - takes; end++) {
                    if (phase.lasting().contains((end - start) * TinyShop.STEP)) {
                        stations[k] = station;
                        starts[k] = start;
                        ends[k] = end;
                        extend(job, k + 1, stations, starts, ends, ways);
                    }
                }
            }
        }
    }

    private static boolean isJoined(Joint joint, int steps) {
        long gap = steps * TinyShop.STEP;
        if (joint instanceof Joint.Lift lift) {
            return gap >= lift.least() && gap <= lift.most();
        }
        return gap == (joint instanceof Joint.Change change ? change.seconds() : 0);
    }

    /** What a way takes; null where it is against a rule that concerns the job alone. */
    private @Nullable Way way(Job job, int[] stations, int[] starts, int[] ends) {
        long[] taken = new long[resources];
        long hands = takes > 0 ? bits(starts[0] - takes, starts[0]) : 0;
        long[] times = new long[2 * job.size() - 1];
        int from = 0;
        for (int k = 0; k < job.size(); k++) {
            times[2 * k] = (ends[k] - starts[k]) * TinyShop.STEP;
            if (job.phase(k).attended() && !isWithinAShift(starts[k], ends[k])) {
                return null;
            }
            boolean leaves = k + 1 == job.size() || !job.phase(k + 1).before().stays();
            if (leaves) {
                Station station = shop.stations().get(stations[k]);
                long own = bits(starts[from], ends[k] + (int) (station.turnaround() / TinyShop.STEP));
                if ((own & (taken[stations[k]] | closed(station))) != 0) {
                    return null;
                }
                taken[stations[k]] |= own;
                from = k + 1;
            }
            if (k > 0) {
                times[2 * k - 1] = (starts[k] - ends[k - 1]) * TinyShop.STEP;
                boolean needsHands = job.phase(k).before() instanceof Joint.Change
                        || (job.phase(k).before() instanceof Joint.Lift && takes > 0);
                long task = needsHands ? bits(ends[k - 1], starts[k]) : 0;
                if ((hands & task) != 0) {
                    return null;
                }
                hands |= task;
            }
        }
        int end = ends[job.size() - 1];
        if (takes > 0) {
            hands |= bits(end, end + takes);
            if ((hands & ~staffed) != 0) {
                return null;
            }
            taken[resources - 1] = hands;
        }
        if (!job.physics().read(times).met()) {
            return null;
        }
        double value = late ? job.lateness((end + takes) * TinyShop.STEP) / TinyShop.STEP : end + takes;
        return new Way(taken, Math.round(value));
    }

    private boolean isWithinAShift(int start, int end) {
        return start == end
                ? shop.staffing().shifts().contains(start * TinyShop.STEP)
                : (bits(start, end) & ~attended) == 0;
    }

    private static long closed(Station station) {
        long bits = 0;
        for (int i = 0; i < station.closed().size(); i++) {
            bits |= bits((int) (station.closed().from(i) / TinyShop.STEP), (int)
                    (station.closed().to(i) / TinyShop.STEP));
        }
        return bits;
    }

    private void combine(List<List<Way>> ways, int job, long[] taken, long value) {
        if (job == ways.size()) {
            best = value;
            return;
        }
        for (Way way : ways.get(job)) {
            long sum = late ? value + way.value() : Math.max(value, way.value());
            if (sum >= best) {
                return;
            }
            if (fits(way.taken(), taken)) {
                long[] more = Arrays.copyOf(taken, resources);
                for (int r = 0; r < resources; r++) {
                    more[r] |= way.taken()[r];
                }
                combine(ways, job + 1, more, sum);
            }
        }
    }

    private boolean fits(long[] one, long[] other) {
        for (int r = 0; r < resources; r++) {
            if ((one[r] & other[r]) != 0) {
                return false;
            }
        }
        return true;
    }
}
