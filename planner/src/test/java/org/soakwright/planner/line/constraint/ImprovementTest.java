package org.soakwright.planner.line.constraint;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static org.junit.jupiter.api.Assumptions.assumeTrue;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Collections;
import java.util.List;
import java.util.SplittableRandom;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.soakwright.planner.line.shop.Aim;
import org.soakwright.planner.line.shop.Carriage;
import org.soakwright.planner.line.shop.Job;
import org.soakwright.planner.line.shop.Joint;
import org.soakwright.planner.line.shop.Moments;
import org.soakwright.planner.line.shop.Phase;
import org.soakwright.planner.line.shop.Physics;
import org.soakwright.planner.line.shop.Search;
import org.soakwright.planner.line.shop.Shop;
import org.soakwright.planner.line.shop.Staffing;
import org.soakwright.planner.line.shop.Station;
import org.soakwright.planner.line.shop.Tariff;

/** What the constraint program says of small shops, held against every order there is. */
class ImprovementTest {
    private static final List<Aim> MAKESPAN = List.of(Aim.MAKESPAN);

    @BeforeEach
    void isThere() {
        assumeTrue(Native.loads(), "no native part on this platform");
    }

    /** Jobs that each go through every station in turn and hold it until the next is free. */
    private static List<Job> jobs(long[][] minutes, Physics physics) {
        List<Job> jobs = new ArrayList<>();
        for (int j = 0; j < minutes.length; j++) {
            List<Phase> phases = new ArrayList<>();
            for (int k = 0; k < minutes[j].length; k++) {
                phases.add(Phase.of(
                        List.of(k), Moments.of(60 * minutes[j][k], Moments.NEVER), false, new Joint.Lift(0, 0)));
            }
            jobs.add(new Job("J" + j, 0, List.of(), 1, phases, physics, Tariff.NONE));
        }
        return jobs;
    }

    private static Shop shop(int stations) {
        List<Station> all = new ArrayList<>();
        for (int s = 0; s < stations; s++) {
            all.add(new Station("S" + s, s, 0, 0, Moments.NONE));
        }
        return new Shop(all, Staffing.UNLIMITED, Carriage.NONE, List.of());
    }

    /** The makespan of an order, minutes: a job leaves a station when it is done and the next is free. */
    private static long blocking(long[][] minutes, List<Integer> order) {
        int stations = minutes[0].length;
        long[] free = new long[stations];
        for (int j : order) {
            long at = free[0];
            for (int k = 0; k < stations; k++) {
                long done = at + minutes[j][k];
                long leaves = k + 1 < stations ? Math.max(done, free[k + 1]) : done;
                free[k] = leaves;
                at = leaves;
            }
        }
        return free[stations - 1];
    }

    private static long least(long[][] minutes, List<Integer> left, List<Integer> order) {
        if (left.isEmpty()) {
            return blocking(minutes, order);
        }
        long least = Long.MAX_VALUE;
        for (Integer j : left) {
            List<Integer> fewer = new ArrayList<>(left);
            fewer.remove(j);
            List<Integer> longer = new ArrayList<>(order);
            longer.add(j);
            least = Math.min(least, least(minutes, fewer, longer));
        }
        return least;
    }

    @Test
    void smallShopsEndAtTheirOptimumAndItIsProven() {
        SplittableRandom random = new SplittableRandom(7);
        for (int draw = 0; draw < 8; draw++) {
            long[][] minutes = new long[6][3];
            for (long[] job : minutes) {
                Arrays.setAll(job, k -> random.nextLong(5, 90));
            }
            long optimum = 60 * least(minutes, List.of(0, 1, 2, 3, 4, 5), List.of());
            Shop shop = shop(3);
            List<Job> jobs = jobs(minutes, Physics.NONE);
            Search search = new Search(shop, jobs, MAKESPAN);
            Improvement.Outcome outcome = new Improvement(shop, jobs, MAKESPAN, search).of(search.best(0), 2, 100);
            assertEquals(optimum, outcome.found().schedule().makespan());
            assertEquals((double) optimum, outcome.makespan().orElse(0));
        }
    }

    /** Two baths of which one makes up for the other: the product of what each leaves, at most a limit. Convex, but that is not told. */
    private record TwoBaths(double limit) implements Physics {
        @Override
        public Reading read(long[] times) {
            // Left of a bath after t hours: 0.1 + 0.9 exp(-t / 2).
            double[] slopes = new double[times.length];
            double sum = -Math.log(limit);
            for (int k = 0; k < 2; k++) {
                double e = 0.9 * Math.exp(-times[2 * k] / 7200.0);
                sum += Math.log(0.1 + e);
                slopes[2 * k] = -e / 7200 / (0.1 + e);
            }
            return new Reading(new double[] {sum}, new double[][] {slopes});
        }

        @Override
        public List<long[]> styles() {
            return List.of(new long[] {9000, 9000}, new long[] {15_000, 5400}, new long[] {5400, 15_000});
        }
    }

    @Test
    void whatIsProposedMeetsThePhysicsAndIsNoWorse() {
        long[][] minutes = new long[6][2];
        for (long[] job : minutes) {
            Arrays.fill(job, 20);
        }
        Shop shop = shop(2);
        List<Job> jobs = jobs(minutes, new TwoBaths(0.12));
        Search search = new Search(shop, jobs, MAKESPAN);
        Search.Found first = search.best(0);
        Improvement.Outcome outcome = new Improvement(shop, jobs, MAKESPAN, search).of(first, 2, 500);
        assertTrue(outcome.found().score().compareTo(first.score()) <= 0);
        outcome.found()
                .schedule()
                .jobs()
                .forEach(placed ->
                        assertTrue(placed.job().physics().read(placed.times()).met()));
        // Nothing certain is told of these baths, so the bound knows only the shortest durations.
        assertEquals(60.0 * 20 * 7, outcome.makespan().orElse(0));
        assertTrue(outcome.found().schedule().makespan() > 60 * 20 * 7);
    }

    @Test
    void theSameWorkGivesTheSameSchedule() {
        SplittableRandom random = new SplittableRandom(11);
        long[][] minutes = new long[9][4];
        for (long[] job : minutes) {
            Arrays.setAll(job, k -> random.nextLong(5, 90));
        }
        List<Object> ends = new ArrayList<>();
        for (int run = 0; run < 2; run++) {
            Shop shop = shop(4);
            List<Job> jobs = jobs(minutes, Physics.NONE);
            Search search = new Search(shop, jobs, MAKESPAN);
            Improvement.Outcome outcome = new Improvement(shop, jobs, MAKESPAN, search).of(search.best(0), 0.2, 100);
            ends.add(outcome.found().schedule().jobs().stream()
                    .map(placed -> placed.visits())
                    .toList());
        }
        assertEquals(1, Collections.frequency(ends, ends.get(0)) - 1);
    }
}
