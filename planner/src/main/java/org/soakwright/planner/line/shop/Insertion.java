package org.soakwright.planner.line.shop;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import org.jspecify.annotations.Nullable;

/**
 * Finds the earliest completion of one job on a floor whose other jobs stay where they are, given the least and most that each phase may last.
 *
 * <p>Forward, the set of all moments at which the job can have landed and can leave is carried from phase to phase, through every free window of
 * every station: nothing is missed, so the completion found is the earliest there is. Backward, every event is put as late as that completion
 * allows: pieces hang about in no station without need. The sets are cut off at a moment that is doubled until there is a completion.
 */
final class Insertion {
    private static final int MOST_DOUBLINGS = 12;
    private static final int MOST_RETURNS = 20;
    private static final long HALF_A_DAY = 43_200;

    private final Floor floor;
    private final Job job;
    private final long[] least;
    private final long[] most;
    private final List<Placed.Visit> done;
    private final long takes;
    private final Set<Bar> barred = new HashSet<>();

    /** A station that a phase must not be in. */
    private record Bar(int phase, int station) {}

    /**
     * Of the phases that are not done yet.
     *
     * @param done the first phases, which stay as they are
     * @param least of every phase, s; allowed durations
     * @param most of every phase, s
     */
    Insertion(Floor floor, Job job, List<Placed.Visit> done, long[] least, long[] most) {
        this.floor = floor;
        this.job = job;
        this.done = done;
        this.least = least.clone();
        this.most = most;
        takes = floor.shop().carriage().takes();
    }

    /** Keeps the job out of a station wherever it has another. */
    Insertion without(int station) {
        for (int k = 0; station >= 0 && k < job.size(); k++) {
            List<Integer> stations = job.phase(k).stations();
            if (stations.size() > 1 && stations.contains(station)) {
                barred.add(new Bar(k, station));
            }
        }
        return this;
    }

    /** A free window of a station with the moments at which the job can land in it and leave it. */
    private record Window(
            int station,
            long from,
            long to,
            Moments calm,
            Moments landing,
            Moments leaving,
            @Nullable Window same) {}

    /**
     * The placement with the earliest completion; null where there is none. A job that comes back to a station must find it turned around too,
     * which the sets do not know: where it would not, that station is barred to that phase, or what comes between made longer, and it is placed
     * again. Then an earlier completion may be missed.
     */
    @Nullable
    Placed place(long notBefore) {
        for (int tries = 0; tries < MOST_RETURNS; tries++) {
            Placed placed = earliest(notBefore);
            if (placed == null || !isBack(placed)) {
                return placed;
            }
        }
        return null;
    }

    /** Whether a job is back in a station too early; sees to it that it will not be. */
    private boolean isBack(Placed placed) {
        for (int k = Math.max(1, done.size()); k < job.size(); k++) {
            int station = placed.visit(k).station();
            Station one = floor.shop().stations().get(station);
            if (job.phase(k).before().stays()) {
                continue;
            }
            for (int before = k - 1; before >= 0; before--) {
                long missing = placed.visit(before).end()
                        + one.turnaround()
                        - placed.visit(k).start();
                if (placed.visit(before).station() == station && missing > 0) {
                    part(k, before, station, missing);
                    return true;
                }
            }
        }
        return false;
    }

    /** Elsewhere, or else later, or else it was elsewhere before. */
    private void part(int k, int before, int station, long missing) {
        if (job.phase(k).stations().stream()
                .anyMatch(other -> other != station && !barred.contains(new Bar(k, other)))) {
            barred.add(new Bar(k, station));
        } else if (before < k - 1 && k - 1 >= done.size() && least[k - 1] + missing <= most[k - 1]) {
            least[k - 1] += missing;
        } else {
            int first = before;
            while (first > 0 && job.phase(first).before().stays()) {
                first--;
            }
            barred.add(new Bar(first, station));
        }
    }

    private @Nullable Placed earliest(long notBefore) {
        long begin =
                done.isEmpty() ? Math.max(job.ready(), notBefore) : done.get(0).start();
        long span = takes * 2;
        for (int k = 0; k < job.size(); k++) {
            span += least[k] + (k > 0 ? job.leastGap(k) : 0);
        }
        long until = begin + span + span / 4 + HALF_A_DAY;
        for (int tries = 0; tries < MOST_DOUBLINGS; tries++) {
            Placed placed = place(begin, until);
            if (placed != null) {
                return placed;
            }
            until += until - begin;
        }
        return null;
    }

    private @Nullable Placed place(long begin, long until) {
        Moments lifts = floor.lifts(begin, until);
        Moments hands = null;
        List<List<Window>> windows = new ArrayList<>();
        for (int k = 0; k < job.size(); k++) {
            Phase phase = job.phase(k);
            List<Window> now = new ArrayList<>();
            if (k < done.size()) {
                now.add(fixed(k, begin, until));
            } else if (k > 0 && phase.before().stays()) {
                hands = hands == null ? floor.hands(begin, until) : hands;
                for (Window before : windows.get(k - 1)) {
                    Moments supplied = floor.supplied(job.phase(k - 1), before.station(), begin, until);
                    Moments landing = onward(before, phase.before(), hands.and(supplied));
                    add(now, k, before.station(), before.from(), before.to(), landing, before, begin, until);
                }
            } else {
                Moments arriving = k == 0
                        ? lifts.lasting(takes).shifted(takes)
                        : landing(leaving(windows.get(k - 1)), lifts, (Joint.Lift) phase.before());
                if (!arriving.isEmpty()) {
                    for (int station : phase.stations()) {
                        Moments there = k == 0 ? arriving : arriving(windows.get(k - 1), k, station, arriving, lifts);
                        if (!there.isEmpty()) {
                            rooms(now, k, station, there, begin, until);
                        }
                    }
                }
            }
            if (now.isEmpty()) {
                return null;
            }
            windows.add(now);
        }
        return backward(windows, lifts);
    }

    /** When the job can land in a station, which it must not have left just before: not until it has been turned around. */
    private Moments arriving(List<Window> before, int k, int station, Moments fromAny, Moments lifts) {
        long turnaround = floor.shop().stations().get(station).turnaround();
        Joint.Lift lift = (Joint.Lift) job.phase(k).before();
        if (turnaround <= lift.least() || before.stream().noneMatch(window -> window.station() == station)) {
            return fromAny;
        }
        List<Window> others =
                before.stream().filter(window -> window.station() != station).toList();
        Moments arriving = others.isEmpty() ? Moments.NONE : landing(leaving(others), lifts, lift);
        if (turnaround > lift.most()) {
            return arriving;
        }
        List<Window> same =
                before.stream().filter(window -> window.station() == station).toList();
        return arriving.or(landing(leaving(same), lifts, new Joint.Lift(turnaround, lift.most())));
    }

    private Window fixed(int k, long begin, long until) {
        Placed.Visit visit = done.get(k);
        Moments room = floor.room(visit.station(), job, begin, Math.max(until, visit.end()));
        int around = room.interval(visit.end());
        return new Window(
                visit.station(),
                room.from(around),
                room.to(around),
                Moments.ALWAYS,
                Moments.of(visit.start(), visit.start()),
                Moments.of(visit.end(), visit.end()),
                null);
    }

    private void rooms(List<Window> now, int k, int station, Moments arriving, long begin, long until) {
        if (!barred.isEmpty() && barred.contains(new Bar(k, station))) {
            return;
        }
        Moments room = floor.room(station, job, begin, until);
        for (int i = room.interval(arriving.first()); i < room.size() && room.from(i) <= arriving.last(); i++) {
            Moments landing = arriving.within(room.from(i), room.to(i));
            add(now, k, station, room.from(i), room.to(i), landing, null, begin, until);
        }
    }

    private void add(
            List<Window> now,
            int k,
            int station,
            long from,
            long to,
            Moments landing,
            @Nullable Window same,
            long begin,
            long until) {
        if (landing.isEmpty()) {
            return;
        }
        long last = Math.min(to, until);
        Moments calm = floor.conditions(job.phase(k), station, begin, until);
        Moments lasting = job.phase(k).lasting().within(least[k], most[k]);
        if (calm.size() == 1) {
            Moments leaving = landing.within(calm.from(0), calm.to(0))
                    .plus(lasting)
                    .within(calm.from(0), Math.min(last, calm.to(0)));
            if (!leaving.isEmpty()) {
                now.add(new Window(station, from, to, calm, landing, leaving, same));
            }
            return;
        }
        Moments leaving = Moments.NONE;
        for (int i = calm.interval(landing.first()); i < calm.size() && calm.from(i) <= landing.last(); i++) {
            Moments within = landing.within(calm.from(i), calm.to(i)).plus(lasting);
            leaving = leaving.or(within.within(calm.from(i), Math.min(last, calm.to(i))));
        }
        if (!leaving.isEmpty()) {
            now.add(new Window(station, from, to, calm, landing, leaving, same));
        }
    }

    private static Moments leaving(List<Window> windows) {
        if (windows.size() == 1) {
            return windows.get(0).leaving();
        }
        List<Moments> sets = new ArrayList<>(windows.size());
        for (Window window : windows) {
            sets.add(window.leaving());
        }
        return Moments.any(sets);
    }

    private static Moments onward(Window before, Joint joint, Moments hands) {
        if (joint instanceof Joint.Change change) {
            return before.leaving()
                    .and(hands.lasting(change.seconds()))
                    .shifted(change.seconds())
                    .within(before.from(), before.to());
        }
        return before.leaving();
    }

    private static Moments landing(Moments leaving, Moments lifts, Joint.Lift lift) {
        if (lift.most() == lift.least()) {
            return leaving.and(lifts.lasting(lift.least())).shifted(lift.least());
        }
        Moments.Builder landing = new Moments.Builder(leaving.size());
        for (int i = lifts.interval(leaving.first()); i < lifts.size() && lifts.from(i) <= leaving.last(); i++) {
            long to = lifts.to(i);
            for (int j = leaving.interval(lifts.from(i)); j < leaving.size() && leaving.from(j) <= to; j++) {
                long from = Math.max(lifts.from(i), leaving.from(j)) + lift.least();
                if (from <= to) {
                    landing.add(from, Math.min(to, leaving.to(j) + lift.most()));
                }
            }
        }
        return landing.built();
    }

    private @Nullable Placed backward(List<List<Window>> windows, Moments lifts) {
        int n = job.size();
        Moments out = lifts.lasting(takes);
        Window at = null;
        long end = Moments.NEVER;
        for (Window window : windows.get(n - 1)) {
            Moments leaving = window.leaving().and(out);
            if (!leaving.isEmpty() && leaving.first() < end) {
                end = leaving.first();
                at = window;
            }
        }
        if (at == null) {
            return null;
        }
        Placed.Visit[] visits = new Placed.Visit[n];
        for (int k = 0; k < done.size(); k++) {
            visits[k] = done.get(k);
        }
        for (int k = n - 1; k >= done.size(); k--) {
            long start = start(at, k, end);
            visits[k] = new Placed.Visit(at.station(), start, end);
            if (k == done.size()) {
                break;
            }
            Joint joint = job.phase(k).before();
            if (joint.stays() && at.same() != null) {
                at = at.same();
                end = start - job.leastGap(k);
                continue;
            }
            Window from = null;
            long latest = -Moments.NEVER;
            for (Window before : windows.get(k - 1)) {
                long leave = leave(before, start, from(before, at, joint), lifts);
                if (leave > latest) {
                    latest = leave;
                    from = before;
                }
            }
            if (from == null) {
                throw new IllegalStateException(job.name() + " landed from nowhere");
            }
            at = from;
            end = latest;
        }
        return new Placed(job, List.of(visits));
    }

    /**
     * The landing from which a window can be left at a moment: the latest, for who hangs about elsewhere is in nobody's way; the earliest in a
     * station that holds many, where waiting keeps others out least.
     */
    private long start(Window at, int k, long end) {
        Moments lasting = job.phase(k).lasting().within(least[k], most[k]);
        int calm = at.calm().interval(end);
        long earliest = Math.max(at.calm().from(calm), at.from());
        long best = -Moments.NEVER;
        if (floor.shop().stations().get(at.station()).holdsMany()) {
            for (int i = lasting.size() - 1; i >= 0; i--) {
                long landed = at.landing().atOrAfter(Math.max(earliest, end - lasting.to(i)));
                if (landed <= end - lasting.from(i)) {
                    return landed;
                }
            }
        }
        for (int i = 0; i < lasting.size(); i++) {
            long landed = at.landing().atOrBefore(end - lasting.from(i));
            if (landed >= earliest && landed >= end - lasting.to(i)) {
                best = Math.max(best, landed);
            }
        }
        if (best == -Moments.NEVER) {
            throw new IllegalStateException(job.name() + " left where it never landed");
        }
        return best;
    }

    /** How a job comes from one window to another: back to the same station not before that is turned around; null where it cannot. */
    private @Nullable Joint from(Window before, Window to, Joint joint) {
        long turnaround = floor.shop().stations().get(to.station()).turnaround();
        return joint instanceof Joint.Lift lift && before.station() == to.station() && lift.least() < turnaround
                ? turnaround > lift.most() ? null : new Joint.Lift(turnaround, lift.most())
                : joint;
    }

    /** The latest moment at which a window can be left so as to land at another. */
    private static long leave(Window before, long landing, @Nullable Joint joint, Moments lifts) {
        if (joint == null) {
            return -Moments.NEVER;
        }
        if (!(joint instanceof Joint.Lift lift)) {
            return before.leaving().contains(landing) ? landing : -Moments.NEVER;
        }
        int i = lifts.interval(landing);
        if (i == lifts.size() || lifts.from(i) > landing) {
            return -Moments.NEVER;
        }
        long leave = before.leaving().atOrBefore(landing - lift.least());
        return leave >= landing - lift.most() && leave >= lifts.from(i) ? leave : -Moments.NEVER;
    }
}
