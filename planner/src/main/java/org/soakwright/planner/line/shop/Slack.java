package org.soakwright.planner.line.shop;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import org.jspecify.annotations.Nullable;

/**
 * How much longer a phase can last with everything else of a schedule in place: the job is in its next station later by as much, and leaves that
 * as planned.
 *
 * @param latest when it can end at the latest, s
 * @param reason what stops it from ending later
 * @param by the job that is in the way; null where none is
 */
public record Slack(long latest, Reason reason, @Nullable Job by) {
    /** Nobody looks further, s. */
    private static final long FAR = 14 * 86_400L;

    private static final long MINUTE = 60;

    /** What stops a phase from lasting longer. */
    public enum Reason {
        /** Another job needs its station. */
        STATION,
        /** Nobody is there to lift. */
        PEOPLE,
        /** The hoist, or everybody's hands, are needed elsewhere. */
        HOIST,
        /** It may not last longer. */
        LONGEST,
        /** The next phase may not last shorter. */
        NEXT,
        /** What is asked of the pieces would be missed. */
        PHYSICS,
        /** Somebody waits for the job. */
        DUE,
        /** A utility, or somebody who attends, is not there for longer. */
        CONDITIONS,
        /** Nothing within two weeks. */
        NOTHING
    }

    /** Of every phase of every job of a schedule, in its order. */
    public static List<List<Slack>> of(Schedule schedule) {
        Floor floor = new Floor(schedule.shop());
        schedule.jobs().forEach(floor::put);
        Floor empty = new Floor(schedule.shop());
        List<List<Slack>> all = new ArrayList<>();
        for (Placed placed : schedule.jobs()) {
            floor.remove(placed);
            List<Slack> own = new ArrayList<>();
            for (int k = 0; k < placed.job().size(); k++) {
                own.add(new Finder(schedule, placed, floor, empty, k).slack());
            }
            all.add(List.copyOf(own));
            floor.put(placed);
        }
        return List.copyOf(all);
    }

    /** Narrows it down, one reason after the other. */
    private static final class Finder {
        private final Schedule schedule;
        private final Placed placed;
        private final Floor floor;
        private final Floor empty;
        private final int k;
        private final Job job;
        private final long end;
        private long latest;
        private Reason reason = Reason.NOTHING;

        Finder(Schedule schedule, Placed placed, Floor floor, Floor empty, int k) {
            this.schedule = schedule;
            this.placed = placed;
            this.floor = floor;
            this.empty = empty;
            this.k = k;
            job = placed.job();
            end = placed.visit(k).end();
            latest = end + FAR;
        }

        Slack slack() {
            Placed.Visit visit = placed.visit(k);
            Phase phase = job.phase(k);
            until(visit.start() + reach(phase.lasting(), visit.seconds()), Reason.LONGEST);
            boolean last = k + 1 == job.size();
            if (last) {
                long due = job.due() - schedule.shop().carriage().takes();
                until(due >= end ? due : latest, Reason.DUE);
                handled(
                        floor.lifts(end, latest + FAR),
                        schedule.shop().carriage().takes());
            } else {
                next();
            }
            if (last || !job.phase(k + 1).before().stays()) {
                Moments room = floor.room(visit.station(), job, visit.start(), latest + FAR);
                until(reach(room, end), Reason.STATION);
            }
            Moments calm = floor.conditions(phase, visit.station(), visit.start(), latest + FAR);
            until(reach(calm, end), Reason.CONDITIONS);
            physics(last);
            return new Slack(latest, reason, reason == Reason.STATION ? follower(visit.station()) : null);
        }

        private void until(long moment, Reason why) {
            if (moment < latest) {
                latest = Math.max(end, moment);
                reason = why;
            }
        }

        /** The end of the interval in which a moment lies; the moment itself where none does. */
        private static long reach(Moments moments, long moment) {
            int i = moments.interval(moment);
            return i < moments.size() && moments.from(i) <= moment ? Math.min(Moments.NEVER, moments.to(i)) : moment;
        }

        private void next() {
            Placed.Visit after = placed.visit(k + 1);
            Moments lasting = job.phase(k + 1).lasting();
            int i = lasting.interval(after.seconds());
            until(end + after.seconds() - lasting.from(i), Reason.NEXT);
            long gap = after.start() - end;
            if (!job.phase(k + 1).before().stays()) {
                handled(floor.lifts(end, latest + FAR), gap);
            } else if (gap > 0) {
                handled(floor.hands(end, latest + FAR), gap);
            }
        }

        /** People and hoist from the end for so long. */
        private void handled(Moments windows, long seconds) {
            if (seconds == 0 || schedule.shop().carriage().isFree()) {
                return;
            }
            long moment = reach(windows.lasting(seconds), end);
            boolean staffed = reach(empty.lifts(end, moment + FAR).lasting(seconds), end) > moment;
            until(moment, staffed ? Reason.HOIST : Reason.PEOPLE);
        }

        private void physics(boolean last) {
            if (job.physics() == Physics.NONE || meets(latest - end, last)) {
                return;
            }
            long low = 0;
            long high = latest - end;
            while (high - low > MINUTE) {
                long middle = (low + high) / 2;
                if (meets(middle, last)) {
                    low = middle;
                } else {
                    high = middle;
                }
            }
            until(end + low / MINUTE * MINUTE, Reason.PHYSICS);
        }

        private boolean meets(long later, boolean last) {
            long[] times = placed.times();
            times[2 * k] += later;
            if (!last) {
                times[2 * k + 2] -= later;
            }
            return Arrays.stream(times).allMatch(time -> time >= 0)
                    && job.physics().read(times).met();
        }

        /** The next job in the station. */
        private @Nullable Job follower(int station) {
            Job next = null;
            long first = Moments.NEVER;
            for (Placed other : schedule.jobs()) {
                for (Placed.Visit visit : other.visits()) {
                    if (!other.isOf(job)
                            && visit.station() == station
                            && visit.start() >= end
                            && visit.start() < first) {
                        first = visit.start();
                        next = other.job();
                    }
                }
            }
            return next;
        }
    }
}
