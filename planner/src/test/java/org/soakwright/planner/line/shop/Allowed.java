package org.soakwright.planner.line.shop;

import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.SortedMap;
import java.util.TreeMap;

/** Whether a schedule keeps the rules of its shop. Knows only the rules: sweeps over what is taken, moment by moment. */
final class Allowed {
    private Allowed() {}

    static void check(Schedule schedule) {
        Shop shop = schedule.shop();
        Map<Integer, SortedMap<Long, Long>> stations = new HashMap<>();
        SortedMap<Long, Long> heads = new TreeMap<>();
        SortedMap<Long, Long> hoist = new TreeMap<>();
        for (Placed placed : schedule.jobs()) {
            alone(shop, placed);
            int first = 0;
            for (int k = 0; k < placed.job().size(); k++) {
                boolean leaves = k + 1 == placed.job().size()
                        || !placed.job().phase(k + 1).before().stays();
                if (leaves) {
                    Station station = shop.stations().get(placed.visit(k).station());
                    take(
                            stations.computeIfAbsent(placed.visit(k).station(), s -> new TreeMap<>()),
                            placed.visit(first).start(),
                            placed.visit(k).end() + station.turnaround(),
                            station.holdsMany() ? placed.job().amount() : 1);
                    first = k + 1;
                }
            }
            for (Placed.Task task : placed.tasks(shop.carriage())) {
                take(heads, task.from(), task.until(), task.heads(shop.carriage()));
                take(hoist, task.from(), task.until(), task.needsHoist() ? 1 : 0);
            }
        }
        stations.forEach((index, taken) -> {
            Station station = shop.stations().get(index);
            for (int i = 0; i < station.closed().size(); i++) {
                take(
                        taken,
                        station.closed().from(i),
                        station.closed().to(i),
                        station.holdsMany() ? station.limit() : 1);
            }
            assertTrue(most(taken) <= (station.holdsMany() ? station.limit() : 1), station.name() + " is full");
        });
        assertTrue(most(hoist) <= shop.carriage().atOnce(), "the hoist is busy");
        take(heads, -Moments.NEVER, Moments.NEVER, shop.staffing().most());
        for (Staffing.Level level : shop.staffing().levels()) {
            take(heads, level.from(), level.until(), -level.heads());
        }
        assertTrue(most(heads) <= shop.staffing().most(), "nobody is there for it");
    }

    private static void alone(Shop shop, Placed placed) {
        Job job = placed.job();
        assertTrue(placed.begins(shop.carriage()) >= job.ready(), job.name() + " is not ready");
        assertTrue(
                job.physics().read(placed.times()).met(),
                () -> job.name() + " misses with " + Arrays.toString(placed.times()));
        for (int k = 0; k < job.size(); k++) {
            Phase phase = job.phase(k);
            Placed.Visit visit = placed.visit(k);
            assertTrue(
                    phase.stations().contains(visit.station()), job.name() + " is in a station that does not serve it");
            assertTrue(phase.lasting().contains(visit.seconds()), job.name() + " lasts what it may not");
            assertTrue(!phase.attended() || isInside(shop.staffing().shifts(), visit), job.name() + " is left alone");
            if (k > 0) {
                long gap = visit.start() - placed.visit(k - 1).end();
                Joint joint = phase.before();
                boolean joined = joint instanceof Joint.Lift lift
                        ? gap >= lift.least() && gap <= lift.most()
                        : gap == (joint instanceof Joint.Change change ? change.seconds() : 0)
                                && visit.station() == placed.visit(k - 1).station();
                assertTrue(joined, job.name() + " comes to phase " + k + " after " + gap + " s");
            }
        }
    }

    private static boolean isInside(Moments shifts, Placed.Visit visit) {
        for (int i = 0; i < shifts.size(); i++) {
            if (shifts.from(i) <= visit.start() && visit.end() <= shifts.to(i)) {
                return true;
            }
        }
        return false;
    }

    private static void take(Map<Long, Long> changes, long from, long until, long amount) {
        changes.merge(from, amount, Long::sum);
        changes.merge(until, -amount, Long::sum);
    }

    private static long most(SortedMap<Long, Long> changes) {
        long now = 0;
        long most = 0;
        for (long change : List.copyOf(changes.values())) {
            now += change;
            most = Math.max(most, now);
        }
        return most;
    }
}
