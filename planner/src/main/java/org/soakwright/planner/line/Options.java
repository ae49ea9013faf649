package org.soakwright.planner.line;

/**
 * How a line is planned.
 *
 * @param effort how much work to spend on a better schedule; 1 takes one to four seconds of a common machine, most with many lots; 0
 *     makes the first ones only
 * @param decoupled whether every recipe keeps the times it has when planned alone, for comparison
 */
public record Options(double effort, boolean decoupled) {
    public static final double USUAL_EFFORT = 10;
    public static final double MOST_EFFORT = 3600;

    public Options {
        if (!(effort >= 0 && effort <= MOST_EFFORT)) {
            throw new IllegalArgumentException("an effort lies between 0 and " + MOST_EFFORT + ": " + effort);
        }
    }
}
