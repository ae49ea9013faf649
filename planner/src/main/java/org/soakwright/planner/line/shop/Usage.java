package org.soakwright.planner.line.shop;

import java.util.Arrays;

/** How much of something is taken over time, of which no more than a limit may be: a station, heads, a hoist, steam. */
final class Usage {
    private final long limit;
    /** {@code taken[i]} holds from {@code at[i]} until {@code at[i + 1]}. */
    private long[] at;

    private long[] taken;
    private int size;

    Usage(long limit) {
        this.limit = limit;
        at = new long[16];
        taken = new long[16];
        at[0] = -Moments.NEVER;
        size = 1;
    }

    private Usage(Usage other) {
        limit = other.limit;
        at = other.at.clone();
        taken = other.taken.clone();
        size = other.size;
    }

    Usage copy() {
        return new Usage(this);
    }

    long limit() {
        return limit;
    }

    /** Takes an amount from one moment until another; a negative amount gives it back. */
    void take(long from, long until, long amount) {
        if (from >= until || amount == 0) {
            return;
        }
        int first = cut(from);
        int after = cut(until);
        for (int i = first; i < after; i++) {
            taken[i] += amount;
        }
        join(after);
        join(first);
    }

    /** The place of a moment, made a place of its own. */
    private int cut(long moment) {
        int i = place(moment);
        if (at[i] == moment) {
            return i;
        }
        if (size == at.length) {
            at = Arrays.copyOf(at, 2 * size);
            taken = Arrays.copyOf(taken, 2 * size);
        }
        System.arraycopy(at, i + 1, at, i + 2, size - i - 1);
        System.arraycopy(taken, i + 1, taken, i + 2, size - i - 1);
        at[i + 1] = moment;
        taken[i + 1] = taken[i];
        size++;
        return i + 1;
    }

    private void join(int i) {
        if (i > 0 && i < size && taken[i] == taken[i - 1]) {
            System.arraycopy(at, i + 1, at, i, size - i - 1);
            System.arraycopy(taken, i + 1, taken, i, size - i - 1);
            size--;
        }
    }

    private int place(long moment) {
        int found = Arrays.binarySearch(at, 0, size, moment);
        return found >= 0 ? found : -found - 2;
    }

    /** Where so much more could be taken throughout, between two moments. */
    Moments room(long amount, long from, long to) {
        if (amount > limit || from > to) {
            return Moments.NONE;
        }
        Moments.Builder room = new Moments.Builder(8);
        for (int i = place(from); i < size && at[i] <= to; i++) {
            if (taken[i] + amount <= limit) {
                room.add(Math.max(from, at[i]), Math.min(to, i + 1 < size ? at[i + 1] : Moments.NEVER));
            }
        }
        return room.built();
    }
}
