package org.soakwright.planner.line.constraint;

import java.util.List;
import org.soakwright.planner.line.shop.Job;
import org.soakwright.planner.line.shop.Joint;
import org.soakwright.planner.line.shop.Moments;
import org.soakwright.planner.line.shop.Phase;
import org.soakwright.planner.line.shop.Shop;
import org.soakwright.planner.line.shop.Staffing;
import org.soakwright.planner.line.shop.Station;

/** A minute, or less where stated times are no whole minutes: what a constraint program counts in. */
final class Ticks {
    private static final long MINUTE = 60;

    private Ticks() {}

    static long of(Shop shop, List<Job> jobs) {
        long tick = gcd(MINUTE, shop.carriage().takes());
        for (Station station : shop.stations()) {
            tick = gcd(gcd(tick, station.turnaround()), all(station.closed()));
        }
        for (Staffing.Level level : shop.staffing().levels()) {
            tick = gcd(gcd(tick, finite(level.from())), finite(level.until()));
        }
        tick = gcd(tick, all(shop.staffing().shifts()));
        for (Job job : jobs) {
            tick = gcd(tick, job.ready());
            for (Phase phase : job.phases()) {
                tick = gcd(tick, all(phase.lasting()));
                if (phase.before() instanceof Joint.Lift lift) {
                    tick = gcd(gcd(tick, lift.least()), lift.most());
                } else if (phase.before() instanceof Joint.Change change) {
                    tick = gcd(tick, change.seconds());
                }
            }
        }
        return Math.max(1, tick);
    }

    private static long all(Moments moments) {
        long tick = 0;
        for (int i = 0; i < moments.size(); i++) {
            tick = gcd(gcd(tick, finite(moments.from(i))), finite(moments.to(i)));
        }
        return tick;
    }

    private static long finite(long moment) {
        return Math.abs(moment) >= Moments.NEVER / 2 ? 0 : moment;
    }

    private static long gcd(long a, long b) {
        return b == 0 ? Math.abs(a) : gcd(b, a % b);
    }
}
