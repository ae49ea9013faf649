package org.soakwright.planner.line.shop;

/**
 * One vessel or room.
 *
 * @param name as it is called on the floor
 * @param group which alike ones it belongs to, from 0
 * @param limit how much it holds at once, in the unit of the jobs' amounts; 0 where it holds one job whatever its amount
 * @param turnaround from a job's leaving until the next may land, s
 * @param closed when it cannot be used
 */
public record Station(String name, int group, long limit, long turnaround, Moments closed) {
    public boolean holdsMany() {
        return limit > 0;
    }

    /** What a job takes of it. */
    long share(Job job) {
        return holdsMany() ? job.amount() : 1;
    }
}
