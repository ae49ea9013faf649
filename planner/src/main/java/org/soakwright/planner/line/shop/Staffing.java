package org.soakwright.planner.line.shop;

import java.util.List;

/**
 * Who is there when.
 *
 * @param most most heads at any time
 * @param levels rising in time; before the first and after the last nobody is there
 * @param shifts when somebody is there, breaks included
 * @param nights when a move counts as one at night
 */
public record Staffing(long most, List<Level> levels, Moments shifts, Moments nights) {
    /** As many as are needed, always. */
    public static final Staffing UNLIMITED = new Staffing(
            Long.MAX_VALUE / 4,
            List.of(new Level(-Moments.NEVER, Moments.NEVER, Long.MAX_VALUE / 4)),
            Moments.ALWAYS,
            Moments.NONE);

    /** So many heads from one moment until another. */
    public record Level(long from, long until, long heads) {}

    public Staffing {
        levels = List.copyOf(levels);
    }
}
