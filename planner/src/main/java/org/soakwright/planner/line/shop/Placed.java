package org.soakwright.planner.line.shop;

import java.util.ArrayList;
import java.util.List;

/** A job with a station and two moments for each phase: landed or begun, and over. */
public record Placed(Job job, List<Visit> visits) {
    public Placed {
        visits = List.copyOf(visits);
        if (visits.size() != job.size()) {
            throw new IllegalArgumentException(job.size() + " visits wanted, found " + visits.size());
        }
    }

    /** One phase in one station, s. */
    public record Visit(int station, long start, long end) {
        public long seconds() {
            return end - start;
        }
    }

    /** Whether it places a job; jobs are told apart by name. */
    boolean isOf(Job other) {
        return job.name().equals(other.name());
    }

    public Visit visit(int k) {
        return visits.get(k);
    }

    /** When its first move begins. */
    public long begins(Carriage carriage) {
        return visits.get(0).start() - carriage.takes();
    }

    /** When it is out of its last station. */
    public long finishes(Carriage carriage) {
        return visits.get(visits.size() - 1).end() + carriage.takes();
    }

    /** Durations and gaps by turns. */
    public long[] times() {
        long[] times = new long[2 * visits.size() - 1];
        for (int k = 0; k < visits.size(); k++) {
            times[2 * k] = visits.get(k).seconds();
            if (k > 0) {
                times[2 * k - 1] = visits.get(k).start() - visits.get(k - 1).end();
            }
        }
        return times;
    }

    /** What people do for it, in order; none where moves are free. */
    public List<Task> tasks(Carriage carriage) {
        List<Task> tasks = new ArrayList<>();
        long takes = carriage.takes();
        if (!carriage.isFree()) {
            tasks.add(new Task(
                    this, 0, Task.Kind.LOAD, begins(carriage), visits.get(0).start()));
        }
        for (int k = 1; k < visits.size(); k++) {
            long from = visits.get(k - 1).end();
            long until = visits.get(k).start();
            Joint joint = job.phase(k).before();
            if (joint instanceof Joint.Lift && !carriage.isFree()) {
                tasks.add(new Task(this, k, Task.Kind.TRANSFER, from, until));
            } else if (joint instanceof Joint.Change) {
                tasks.add(new Task(this, k, Task.Kind.CHANGE, from, until));
            }
        }
        if (!carriage.isFree()) {
            long end = visits.get(visits.size() - 1).end();
            tasks.add(new Task(this, visits.size(), Task.Kind.UNLOAD, end, end + takes));
        }
        return tasks;
    }

    /**
     * Something people do.
     *
     * @param phase the one it leads to; as many as there are for unloading
     */
    public record Task(Placed placed, int phase, Kind kind, long from, long until) {
        /** What is done. */
        public enum Kind {
            LOAD,
            TRANSFER,
            CHANGE,
            UNLOAD
        }

        public boolean needsHoist() {
            return kind != Kind.CHANGE;
        }

        /** How many people; a change needs one. */
        public long heads(Carriage carriage) {
            return kind == Kind.CHANGE ? 1 : carriage.heads();
        }
    }
}
