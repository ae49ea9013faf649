package org.soakwright.planner.line.shop;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.IntStream;

/**
 * Shops as the literature knows them: fixed durations, machines that do one thing at a time, moves in no time. The literature's unit is a minute
 * here, for a search stretches nothing by less.
 */
final class ClassicalShop {
    private static final int ROOMY = 1_200_000;

    static final long MINUTE = 60;

    /** What happens between two machines. */
    enum Between {
        /** Jobs wait anywhere: a store that holds all of them, which they can pass in no time. */
        STORE,
        /** A job stays on its machine until the next one is free. */
        BLOCKED,
        /** A job goes on at once. */
        NO_WAIT
    }

    private ClassicalShop() {}

    /** One operation: a machine from 0 and its duration. */
    record Operation(int machine, long minutes) {}

    /** What is made where. */
    record Problem(Shop shop, List<Job> jobs) {
        Search search() {
            return new Search(shop, jobs, List.of(Aim.MAKESPAN));
        }
    }

    /** All jobs go through the machines in their order: a row a job. */
    static Problem flow(long[][] minutes, Between between) {
        List<List<Operation>> jobs = new ArrayList<>();
        for (long[] row : minutes) {
            jobs.add(IntStream.range(0, row.length)
                    .mapToObj(machine -> new Operation(machine, row[machine]))
                    .toList());
        }
        return of(jobs, between);
    }

    static Problem of(List<List<Operation>> jobs, Between between) {
        int machines = 1
                + jobs.stream()
                        .flatMap(List::stream)
                        .mapToInt(Operation::machine)
                        .max()
                        .orElseThrow();
        List<Station> stations = new ArrayList<>();
        for (int m = 0; m < machines; m++) {
            stations.add(new Station("machine " + m, m, 0, 0, Moments.NONE));
        }
        stations.add(new Station("store", machines, ROOMY, 0, Moments.NONE));
        List<Job> made = new ArrayList<>();
        for (int j = 0; j < jobs.size(); j++) {
            made.add(new Job(
                    "job " + j, 0, List.of(), 1, phases(jobs.get(j), machines, between), Physics.NONE, Tariff.NONE));
        }
        return new Problem(new Shop(stations, Staffing.UNLIMITED, Carriage.NONE, List.of()), made);
    }

    private static List<Phase> phases(List<Operation> operations, int store, Between between) {
        Joint.Lift atOnce = new Joint.Lift(0, 0);
        List<Phase> phases = new ArrayList<>();
        for (Operation operation : operations) {
            if (between == Between.STORE && !phases.isEmpty()) {
                phases.add(Phase.of(List.of(store), Moments.of(0, ROOMY), false, atOnce));
            }
            long least = MINUTE * operation.minutes();
            phases.add(Phase.of(
                    List.of(operation.machine()),
                    Moments.of(least, between == Between.BLOCKED ? ROOMY : least),
                    false,
                    atOnce));
        }
        return phases;
    }
}
