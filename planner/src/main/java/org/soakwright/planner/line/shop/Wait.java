package org.soakwright.planner.line.shop;

import java.util.ArrayList;
import java.util.List;
import org.jspecify.annotations.Nullable;

/**
 * Time in which a job only waited: its pieces could have gone on, or begun.
 *
 * @param phase the one it waited for; as many as there are for leaving the last station
 * @param since from when it could have gone, s
 * @param until when it went, s
 * @param reason why it did not go a minute earlier
 * @param by the job that was in the way; null where none was
 * @param station the one that was taken; -1 where it was something else
 */
public record Wait(
        int phase,
        long since,
        long until,
        Reason reason,
        @Nullable Placed by,
        int station) {
    private static final long MINUTE = 60;

    /** Shorter ones explain nothing, s. */
    private static final long WORTH_TELLING = 600;

    /** Why a job did not go on earlier. */
    public enum Reason {
        /** Every station it could go to was taken, or closed. */
        STATION,
        /** Nobody was there. */
        PEOPLE,
        /** Hoist or hands were needed elsewhere. */
        HOIST,
        /** Nothing just then: what came after would not have fitted. */
        LATER
    }

    public long seconds() {
        return until - since;
    }

    /** The waits of a job of a schedule, the last first. */
    public static List<Wait> of(Schedule schedule, Placed placed) {
        Floor floor = new Floor(schedule.shop());
        schedule.jobs().stream().filter(other -> !other.isOf(placed.job())).forEach(floor::put);
        List<Wait> waits = new ArrayList<>();
        Job job = placed.job();
        for (int k = job.size(); k >= 0; k--) {
            long until = k == 0
                    ? placed.begins(schedule.shop().carriage())
                    : placed.visit(k - 1).end();
            long since = k == 0 ? job.ready() : until - spare(placed, k - 1);
            if (until - since >= WORTH_TELLING) {
                waits.add(why(schedule, floor, placed, k, since, until));
            }
        }
        return waits;
    }

    /** How much shorter a phase could be, with all else as it is. */
    private static long spare(Placed placed, int k) {
        long low = 0;
        long high = placed.visit(k).seconds() - placed.job().phase(k).shortest() + 1;
        while (high - low > MINUTE) {
            long middle = (low + high) / 2;
            long[] times = placed.times();
            times[2 * k] -= middle;
            if (placed.job().phase(k).lasting().contains(times[2 * k])
                    && placed.job().physics().read(times).met()) {
                low = middle;
            } else {
                high = middle;
            }
        }
        return low;
    }

    private static Wait why(Schedule schedule, Floor floor, Placed placed, int k, long since, long until) {
        Carriage carriage = schedule.shop().carriage();
        Job job = placed.job();
        boolean leaves = k == job.size();
        long gap = leaves || k == 0 ? carriage.takes() : placed.visit(k).start() - until;
        boolean lifted = leaves || k == 0 || !job.phase(k).before().stays();
        long earlier = until - MINUTE;
        if (gap > 0 && !carriage.isFree()) {
            Moments free = lifted ? floor.lifts(earlier, until + gap) : floor.hands(earlier, until + gap);
            if (!free.lasting(gap).contains(earlier)) {
                Floor empty = new Floor(schedule.shop());
                Moments staffed = lifted ? empty.lifts(earlier, until + gap) : empty.hands(earlier, until + gap);
                boolean nobody = !staffed.lasting(gap).contains(earlier);
                return new Wait(
                        k,
                        since,
                        until,
                        nobody ? Reason.PEOPLE : Reason.HOIST,
                        nobody ? null : lifting(schedule, placed, earlier, earlier + gap),
                        -1);
            }
        }
        if (!leaves && lifted) {
            long landing = placed.visit(k).start() - MINUTE;
            boolean any = job.phase(k).stations().stream()
                    .anyMatch(station ->
                            floor.room(station, job, landing, landing + MINUTE).contains(landing));
            if (!any) {
                int station = placed.visit(k).station();
                return new Wait(k, since, until, Reason.STATION, before(schedule, placed, station, landing), station);
            }
        }
        return new Wait(k, since, until, Reason.LATER, null, -1);
    }

    private static @Nullable Placed lifting(Schedule schedule, Placed placed, long from, long until) {
        return schedule.tasks().stream()
                .filter(task -> !task.placed().isOf(placed.job()) && task.from() < until && task.until() > from)
                .map(Placed.Task::placed)
                .findFirst()
                .orElse(null);
    }

    /** The job that was in a station last. */
    private static @Nullable Placed before(Schedule schedule, Placed placed, int station, long moment) {
        Placed last = null;
        long latest = -Moments.NEVER;
        for (Placed other : schedule.jobs()) {
            for (Placed.Visit visit : other.visits()) {
                if (!other.isOf(placed.job())
                        && visit.station() == station
                        && visit.start() <= moment
                        && visit.end() > latest) {
                    latest = visit.end();
                    last = other;
                }
            }
        }
        return last;
    }
}
