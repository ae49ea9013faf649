package org.soakwright.planner.line;

/**
 * What a lot goes through without anybody's doing: a step, or one of its fills.
 *
 * @param step from 0
 * @param fill from 0
 * @param fills how many the step has; 1 for none
 */
public record Leg(int step, int fill, int fills) {
    public boolean isLast() {
        return fill == fills - 1;
    }
}
