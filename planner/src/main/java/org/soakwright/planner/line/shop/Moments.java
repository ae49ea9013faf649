package org.soakwright.planner.line.shop;

import java.util.Arrays;
import java.util.List;

/**
 * A set of moments, or of durations: closed intervals of whole seconds, rising, that do not touch. Immutable. Operations cost a pass over the
 * intervals, of which a set rarely has more than a few dozen.
 */
public final class Moments {
    /** Later than anything that happens. Far enough from overflow to be added up. */
    public static final long NEVER = Long.MAX_VALUE / 16;

    public static final Moments NONE = new Moments(new long[0]);
    public static final Moments ALWAYS = of(-NEVER, NEVER);

    private final long[] ends;

    private Moments(long[] ends) {
        this.ends = ends;
    }

    /** Between two moments, both included; none where the first is later. */
    public static Moments of(long from, long to) {
        return from > to ? NONE : new Moments(new long[] {from, to});
    }

    public boolean isEmpty() {
        return ends.length == 0;
    }

    /** How many intervals. */
    public int size() {
        return ends.length / 2;
    }

    public long from(int interval) {
        return ends[2 * interval];
    }

    public long to(int interval) {
        return ends[2 * interval + 1];
    }

    /** The first of a set that is not empty. */
    public long first() {
        return ends[0];
    }

    public long last() {
        return ends[ends.length - 1];
    }

    public boolean contains(long moment) {
        return atOrAfter(moment) == moment;
    }

    /** The first moment not before another; {@link #NEVER} for none. */
    public long atOrAfter(long moment) {
        int i = interval(moment);
        return i == size() ? NEVER : Math.max(moment, from(i));
    }

    /** The last moment not after another; minus {@link #NEVER} for none. */
    public long atOrBefore(long moment) {
        int i = interval(moment);
        if (i < size() && from(i) <= moment) {
            return moment;
        }
        return i == 0 ? -NEVER : to(i - 1);
    }

    /** The first interval that does not end before a moment. */
    int interval(long moment) {
        int low = 0;
        int high = size();
        while (low < high) {
            int middle = (low + high) >>> 1;
            if (to(middle) < moment) {
                low = middle + 1;
            } else {
                high = middle;
            }
        }
        return low;
    }

    /** Those between two moments. */
    public Moments within(long from, long to) {
        if (isEmpty() || from > to) {
            return NONE;
        }
        if (first() >= from && last() <= to) {
            return this;
        }
        Builder kept = new Builder(size());
        for (int i = interval(from); i < size() && from(i) <= to; i++) {
            kept.add(Math.max(from, from(i)), Math.min(to, to(i)));
        }
        return kept.built();
    }

    public Moments shifted(long by) {
        long[] moved = ends.clone();
        for (int i = 0; i < moved.length; i++) {
            moved[i] += by;
        }
        return new Moments(moved);
    }

    public Moments and(Moments other) {
        Builder both = new Builder(Math.max(size(), other.size()));
        int i = 0;
        int j = 0;
        while (i < size() && j < other.size()) {
            long from = Math.max(from(i), other.from(j));
            long to = Math.min(to(i), other.to(j));
            if (from <= to) {
                both.add(from, to);
            }
            if (to(i) < other.to(j)) {
                i++;
            } else {
                j++;
            }
        }
        return both.built();
    }

    public Moments or(Moments other) {
        if (isEmpty() || other.isEmpty()) {
            return isEmpty() ? other : this;
        }
        Builder any = new Builder(size() + other.size());
        int i = 0;
        int j = 0;
        while (i < size() || j < other.size()) {
            boolean mine = j == other.size() || (i < size() && from(i) <= other.from(j));
            any.add(mine ? from(i) : other.from(j), mine ? to(i) : other.to(j));
            if (mine) {
                i++;
            } else {
                j++;
            }
        }
        return any.built();
    }

    /** The moments of any of several sets. */
    static Moments any(List<Moments> sets) {
        int count = 0;
        for (Moments set : sets) {
            count += set.ends.length;
        }
        long[] all = new long[count];
        int length = 0;
        for (Moments set : sets) {
            System.arraycopy(set.ends, 0, all, length, set.ends.length);
            length += set.ends.length;
        }
        return merged(all);
    }

    /** Intervals in any order, put in order by insertion: they come in a few rising runs that hardly overlap. */
    private static Moments merged(long[] ends) {
        for (int i = 2; i < ends.length; i += 2) {
            long from = ends[i];
            long to = ends[i + 1];
            int j = i - 2;
            while (j >= 0 && ends[j] > from) {
                ends[j + 2] = ends[j];
                ends[j + 3] = ends[j + 1];
                j -= 2;
            }
            ends[j + 2] = from;
            ends[j + 3] = to;
        }
        Builder any = new Builder(ends.length / 2);
        for (int i = 0; i < ends.length; i += 2) {
            any.add(ends[i], ends[i + 1]);
        }
        return any.built();
    }

    /** Every moment of this plus every duration of another set. */
    public Moments plus(Moments durations) {
        if (durations.size() == 1) {
            return plus(durations.from(0), durations.to(0));
        }
        Moments sum = NONE;
        for (int d = 0; d < durations.size(); d++) {
            sum = sum.or(plus(durations.from(d), durations.to(d)));
        }
        return sum;
    }

    /** Every moment of this plus every duration between two. */
    public Moments plus(long least, long most) {
        Builder sum = new Builder(size());
        for (int i = 0; i < size(); i++) {
            sum.add(from(i) + least, Math.min(NEVER, to(i) + most));
        }
        return sum.built();
    }

    /** The moments at which something that lasts so long may begin and never leave the interval it began in. */
    public Moments lasting(long seconds) {
        Builder kept = new Builder(size());
        for (int i = 0; i < size(); i++) {
            if (to(i) - from(i) >= seconds) {
                kept.add(from(i), to(i) - seconds);
            }
        }
        return kept.built();
    }

    @Override
    public boolean equals(Object other) {
        return other instanceof Moments moments && Arrays.equals(ends, moments.ends);
    }

    @Override
    public int hashCode() {
        return Arrays.hashCode(ends);
    }

    @Override
    public String toString() {
        return Arrays.toString(ends);
    }

    /** Puts intervals together, added by rising beginning; what touches becomes one. */
    public static final class Builder {
        private long[] ends;
        private int length;

        public Builder(int expected) {
            ends = new long[Math.max(2, 2 * expected)];
        }

        public void add(long from, long to) {
            if (length > 0 && from <= ends[length - 1]) {
                ends[length - 1] = Math.max(ends[length - 1], to);
                return;
            }
            if (length == ends.length) {
                ends = Arrays.copyOf(ends, 2 * length);
            }
            ends[length++] = from;
            ends[length++] = to;
        }

        public Moments built() {
            return length == 0 ? NONE : new Moments(length == ends.length ? ends : Arrays.copyOf(ends, length));
        }
    }
}
