package org.soakwright.planner.line.shop;

import java.util.Collections;
import java.util.List;

/**
 * What happens to a job in one station without anybody's doing.
 *
 * @param stations where it may happen, rising; the same as those of the phase before where the job stays
 * @param lasting how long it may last, s
 * @param attended whether it must lie within hours in which somebody is there
 * @param before how the job comes to it from the phase before; not asked of the first
 * @param draws what it takes of each utility there, in the order of the shop's: a list for each of the stations
 */
public record Phase(List<Integer> stations, Moments lasting, boolean attended, Joint before, List<List<Long>> draws) {
    private static final long MINUTE = 60;

    public Phase {
        stations = List.copyOf(stations);
        draws = List.copyOf(draws);
        if (stations.isEmpty() || lasting.isEmpty() || lasting.first() < 0) {
            throw new IllegalArgumentException("a phase has a station and a duration");
        }
        if (draws.size() != stations.size()) {
            throw new IllegalArgumentException("a phase draws something in each of its stations");
        }
    }

    /** In stations that draw nothing. */
    public static Phase of(List<Integer> stations, Moments lasting, boolean attended, Joint before) {
        return new Phase(stations, lasting, attended, before, Collections.nCopies(stations.size(), List.of()));
    }

    /** What it takes of a utility in one of its stations. */
    long draw(int station, int utility) {
        List<Long> there = draws.get(stations.indexOf(station));
        return there.isEmpty() ? 0 : there.get(utility);
    }

    /** The shortest, s. */
    public long shortest() {
        return lasting.first();
    }

    public long longest() {
        return lasting.last();
    }

    /** The shortest duration allowed that is no shorter than another, in whole minutes where that is allowed; the longest where none is. */
    public long atLeast(double seconds) {
        long whole = (long) Math.ceil(Math.max(seconds, (double) shortest()) - 1e-6);
        long minutes = (whole + MINUTE - 1) / MINUTE * MINUTE;
        if (lasting.contains(minutes)) {
            return minutes;
        }
        long next = lasting.atOrAfter(whole);
        return next == Moments.NEVER ? longest() : next;
    }
}
