package org.soakwright.planner.line.shop;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;

/** Sets of moments against the same sets as arrays of booleans. */
class MomentsTest {
    private static final int SPAN = 60;
    private static final int DRAWS = 4000;

    /** One moment of a set after another, from 0 to {@link #SPAN} - 1. */
    private static boolean[] drawn(SplittableRandom random) {
        boolean[] is = new boolean[SPAN];
        int share = 1 + random.nextInt(4);
        boolean now = random.nextBoolean();
        for (int t = 0; t < SPAN; t++) {
            now = random.nextInt(5) == 0 ? random.nextInt(4) < share : now;
            is[t] = now;
        }
        return is;
    }

    private static Moments set(boolean[] is) {
        Moments.Builder set = new Moments.Builder(4);
        for (int t = 0; t < SPAN; t++) {
            if (is[t]) {
                int until = t;
                while (until + 1 < SPAN && is[until + 1]) {
                    until++;
                }
                set.add(t, until);
                t = until;
            }
        }
        return set.built();
    }

    private static List<Integer> moments(Moments set, int from, int to) {
        List<Integer> moments = new ArrayList<>();
        for (int t = from; t <= to; t++) {
            if (set.contains(t)) {
                moments.add(t);
            }
        }
        return moments;
    }

    private interface Rule {
        boolean holds(int moment);
    }

    private static void same(Rule wanted, Moments found, int from, int to) {
        List<Integer> moments = new ArrayList<>();
        for (int t = from; t <= to; t++) {
            if (wanted.holds(t)) {
                moments.add(t);
            }
        }
        assertEquals(moments, moments(found, from, to));
        for (int i = 0; i < found.size(); i++) {
            assertTrue(found.from(i) <= found.to(i));
            assertTrue(i == 0 || found.from(i) > found.to(i - 1), "intervals rise and do not touch");
        }
    }

    private static boolean in(boolean[] is, long t) {
        return t >= 0 && t < SPAN && is[(int) t];
    }

    @Test
    void setsThatMeetJoinAndAreCutAreThoseOfTheirMoments() {
        SplittableRandom random = new SplittableRandom(1);
        for (int draw = 0; draw < DRAWS; draw++) {
            boolean[] one = drawn(random);
            boolean[] other = drawn(random);
            int from = random.nextInt(SPAN);
            int to = random.nextInt(SPAN);
            Moments set = set(one);
            same(t -> in(one, t) && in(other, t), set.and(set(other)), -1, SPAN);
            same(t -> in(one, t) || in(other, t), set.or(set(other)), -1, SPAN);
            same(t -> in(one, t) && t >= from && t <= to, set.within(from, to), -1, SPAN);
            same(t -> in(one, t - 7), set.shifted(7), -1, SPAN + 8);
            same(
                    t -> in(one, t) || in(other, t) || t == from,
                    Moments.any(List.of(set, set(other), Moments.of(from, from))),
                    -1,
                    SPAN);
        }
    }

    @Test
    void whatIsAddedToEveryMomentIsEverySum() {
        SplittableRandom random = new SplittableRandom(2);
        for (int draw = 0; draw < DRAWS; draw++) {
            boolean[] starts = drawn(random);
            boolean[] durations = drawn(random);
            same(
                    t -> {
                        for (int d = 0; d < SPAN; d++) {
                            if (durations[d] && in(starts, (long) t - d)) {
                                return true;
                            }
                        }
                        return false;
                    },
                    set(starts).plus(set(durations)),
                    -1,
                    2 * SPAN);
        }
    }

    @Test
    void whatLastsBeginsWhereItsWholeTimeIsInOneInterval() {
        SplittableRandom random = new SplittableRandom(3);
        for (int draw = 0; draw < DRAWS; draw++) {
            boolean[] is = drawn(random);
            int lasts = random.nextInt(9);
            same(
                    t -> {
                        boolean all = true;
                        for (int s = t; s <= t + lasts; s++) {
                            all &= in(is, s);
                        }
                        return all;
                    },
                    set(is).lasting(lasts),
                    -1,
                    SPAN);
        }
    }

    @Test
    void theNextAndTheLastMomentAreFoundFromAnywhere() {
        SplittableRandom random = new SplittableRandom(4);
        for (int draw = 0; draw < DRAWS; draw++) {
            boolean[] is = drawn(random);
            int moment = random.nextInt(-3, SPAN + 3);
            long after = Moments.NEVER;
            long before = -Moments.NEVER;
            for (int t = 0; t < SPAN; t++) {
                if (is[t] && t >= moment) {
                    after = Math.min(after, t);
                }
                if (is[t] && t <= moment) {
                    before = t;
                }
            }
            assertEquals(after, set(is).atOrAfter(moment));
            assertEquals(before, set(is).atOrBefore(moment));
        }
    }

    @Test
    void whatIsTakenIsWhatAnArrayCountsAndGivenBackIsGone() {
        SplittableRandom random = new SplittableRandom(5);
        for (int draw = 0; draw < DRAWS / 4; draw++) {
            int limit = 1 + random.nextInt(4);
            Usage usage = new Usage(limit);
            long[] taken = new long[SPAN];
            List<long[]> takings = new ArrayList<>();
            for (int i = 0; i < 25; i++) {
                if (!takings.isEmpty() && random.nextInt(3) == 0) {
                    long[] back = takings.remove(random.nextInt(takings.size()));
                    take(usage, taken, back[0], back[1], -back[2]);
                } else {
                    long from = random.nextInt(SPAN);
                    long[] more = {from, from + random.nextInt(SPAN - (int) from), 1 + random.nextInt(2)};
                    takings.add(more);
                    take(usage, taken, more[0], more[1], more[2]);
                }
                long amount = 1 + random.nextInt(limit);
                int from = random.nextInt(SPAN);
                int to = random.nextInt(from, SPAN);
                // Somebody leaves as another comes: a moment belongs to the room on both its sides.
                same(
                        t -> t >= from
                                && t <= to
                                && (fits(taken, t, amount, limit) || (t > from && fits(taken, t - 1, amount, limit))),
                        usage.copy().room(amount, from, to),
                        0,
                        SPAN - 1);
            }
            for (long[] back : takings) {
                take(usage, taken, back[0], back[1], -back[2]);
            }
            assertEquals(Moments.of(0, SPAN), usage.room(limit, 0, SPAN));
        }
    }

    private static void take(Usage usage, long[] taken, long from, long until, long amount) {
        usage.take(from, until, amount);
        for (int t = (int) from; t < until; t++) {
            taken[t] += amount;
        }
    }

    private static boolean fits(long[] taken, int moment, long amount, long limit) {
        return taken[moment] + amount <= limit;
    }
}
