package org.soakwright.planner.line.shop;

import java.util.ArrayList;
import java.util.List;
import java.util.SplittableRandom;
import java.util.stream.IntStream;

/** A drawn shop of few jobs whose every number is a multiple of a step of time: small enough to try everything. */
record TinyShop(Shop shop, List<Job> jobs) {
    /** Ten minutes. */
    static final long STEP = 600;

    /** Nothing is tried that ends later. */
    static final int STEPS = 62;

    /**
     * Draws a shop.
     *
     * @param physics whether the longer one phase of a job lasts the shorter another may be
     */
    static TinyShop drawn(SplittableRandom random, boolean physics) {
        int stations = 2 + random.nextInt(2);
        List<Station> made = new ArrayList<>();
        for (int s = 0; s < stations; s++) {
            Moments closed = Moments.NONE;
            if (random.nextInt(4) == 0) {
                long from = STEP * random.nextInt(12);
                closed = Moments.of(from, from + STEP * (1 + random.nextInt(3)));
            }
            made.add(new Station("station " + s, s, 0, STEP * random.nextInt(2), closed));
        }
        boolean people = random.nextInt(3) > 0;
        Carriage carriage = people ? new Carriage(STEP, 1, 1) : Carriage.NONE;
        Staffing staffing = people ? shifts(random) : Staffing.UNLIMITED;
        List<Job> jobs = new ArrayList<>();
        int count = physics ? 2 : 2 + random.nextInt(2);
        for (int j = 0; j < count; j++) {
            jobs.add(job(random, "job " + j, stations, people, physics));
        }
        return new TinyShop(new Shop(made, staffing, carriage, List.of()), jobs);
    }

    /** One person by day, a break of one step, and nobody at night. */
    private static Staffing shifts(SplittableRandom random) {
        List<Staffing.Level> levels = new ArrayList<>();
        Moments.Builder shifts = new Moments.Builder(4);
        long from = 0;
        while (from < 20 * STEPS * STEP) {
            long noon = from + STEP * (4 + random.nextInt(4));
            long until = noon + STEP * (4 + random.nextInt(4));
            levels.add(new Staffing.Level(from, noon, 1));
            levels.add(new Staffing.Level(noon + STEP, until, 1));
            shifts.add(from, until);
            from = until + STEP * (2 + random.nextInt(5));
        }
        return new Staffing(1, levels, shifts.built(), Moments.NONE);
    }

    private static Job job(SplittableRandom random, String name, int stations, boolean people, boolean physics) {
        int n = physics ? 2 : 1 + random.nextInt(3);
        List<Phase> phases = new ArrayList<>();
        for (int k = 0; k < n; k++) {
            long least = STEP * (1 + random.nextInt(3));
            long most = physics ? 9 * STEP : least + STEP * random.nextInt(5);
            boolean stays = k > 0 && random.nextInt(5) == 0;
            Joint before = stays
                    ? people ? new Joint.Change(STEP) : new Joint.Onward()
                    : people ? new Joint.Lift(STEP, STEP * (1 + random.nextInt(2))) : new Joint.Lift(0, 0);
            List<Integer> where = stays
                    ? phases.get(k - 1).stations()
                    : IntStream.range(0, stations)
                            .filter(s -> random.nextInt(3) > 0)
                            .boxed()
                            .toList();
            phases.add(Phase.of(
                    where.isEmpty() ? List.of(random.nextInt(stations)) : where,
                    Moments.of(least, most),
                    random.nextInt(6) == 0,
                    before));
        }
        long due = STEP * (3 + random.nextInt(15));
        return new Job(
                name,
                STEP * random.nextInt(4),
                List.of(new Job.Due(due, 1 + random.nextInt(2))),
                1,
                phases,
                physics ? Washing.drawn(random, phases) : Physics.NONE,
                Tariff.NONE);
    }

    /** Makespan alone, or lateness alone. */
    List<Aim> aims(boolean late) {
        return List.of(late ? Aim.LATENESS : Aim.MAKESPAN);
    }
}
