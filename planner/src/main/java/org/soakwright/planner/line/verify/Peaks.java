package org.soakwright.planner.line.verify;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.TreeSet;
import java.util.function.LongToDoubleFunction;
import java.util.stream.Collectors;

/** What is used of something that has a limit, by whom and when. */
final class Peaks {
    private final List<Use> uses = new ArrayList<>();

    /** From one moment until before another. */
    record Use(String who, long from, long until, double amount) {}

    /**
     * A time in which more is used than there is.
     *
     * @param from its first moment
     * @param who they are, then
     */
    record Excess(long from, double used, double limit, String who) {}

    void add(String who, long from, long until, double amount) {
        if (from < until && amount > 0) {
            uses.add(new Use(who, from, until, amount));
        }
    }

    /**
     * Every time in which more is used than the limit, which may change at whole minutes.
     *
     * @param each whether the limit has to be asked at every minute
     */
    List<Excess> over(LongToDoubleFunction limit, boolean each) {
        List<Use> sorted = new ArrayList<>(uses);
        sorted.sort(Comparator.comparingLong(Use::from).thenComparing(Use::who));
        TreeSet<Long> moments = new TreeSet<>();
        for (Use use : sorted) {
            moments.add(use.from());
            moments.add(use.until());
            for (long at = Wall.nextMinute(use.from()); each && at < use.until(); at += Wall.MINUTE) {
                moments.add(at);
            }
        }
        List<Excess> found = new ArrayList<>();
        List<Use> on = new ArrayList<>();
        int next = 0;
        String last = "";
        for (long at : moments) {
            on.removeIf(use -> use.until() <= at);
            while (next < sorted.size() && sorted.get(next).from() <= at) {
                on.add(sorted.get(next));
                next++;
            }
            double used = on.stream().mapToDouble(Use::amount).sum();
            String who = on.stream().map(Use::who).distinct().sorted().collect(Collectors.joining(", "));
            boolean over = used > limit.applyAsDouble(at);
            if (over && !who.equals(last)) {
                found.add(new Excess(at, used, limit.applyAsDouble(at), who));
            }
            last = over ? who : "";
        }
        return found;
    }
}
