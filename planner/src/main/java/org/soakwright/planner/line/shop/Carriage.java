package org.soakwright.planner.line.shop;

/**
 * How jobs are moved.
 *
 * @param takes one move, s; 0 where nobody is needed
 * @param atOnce most moves at a time
 * @param heads people that one move needs
 */
public record Carriage(long takes, long atOnce, long heads) {
    /** Jobs move by themselves and in no time. */
    public static final Carriage NONE = new Carriage(0, Long.MAX_VALUE / 4, 0);

    public boolean isFree() {
        return takes == 0;
    }
}
