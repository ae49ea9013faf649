package org.soakwright.planner.line.constraint;

import com.google.ortools.sat.LinearArgument;
import com.google.ortools.sat.LinearExpr;
import com.google.ortools.sat.Literal;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import org.soakwright.planner.line.shop.Job;
import org.soakwright.planner.line.shop.Placed;
import org.soakwright.planner.line.shop.Schedule;
import org.soakwright.planner.line.shop.Shop;

/** Whatever uses a station or the only hoist after another in a schedule keeps to that order: what is left to find are times. */
final class Turns {
    private final Model model;
    private final Shop shop;
    private final long tick;

    private Turns(Model model, Shop shop, long tick) {
        this.model = model;
        this.shop = shop;
        this.tick = tick;
    }

    /** Adds that to a model. */
    static void keep(Model model, Shop shop, long tick, Schedule schedule) {
        new Turns(model, shop, tick).keep(schedule);
    }

    private void keep(Schedule schedule) {
        List<List<Turn>> byStation = new ArrayList<>();
        shop.stations().forEach(station -> byStation.add(new ArrayList<>()));
        List<Turn> lifts = new ArrayList<>();
        for (Placed placed : schedule.jobs()) {
            Job job = placed.job();
            int first = 0;
            for (int k = 0; k < job.size(); k++) {
                if (k + 1 == job.size() || !job.phase(k + 1).before().stays()) {
                    int station = placed.visit(k).station();
                    byStation
                            .get(station)
                            .add(new Turn(
                                    placed.visit(first).start(),
                                    model.start(job, first),
                                    model.end(job, k),
                                    shop.stations().get(station).turnaround() / tick));
                    keepPool(job, first, model.pools().of(station));
                    first = k + 1;
                }
            }
            lifts(placed, lifts);
        }
        for (int s = 0; s < byStation.size(); s++) {
            if (!shop.stations().get(s).holdsMany()) {
                keepOrder(byStation.get(s));
            }
        }
        if (shop.carriage().atOnce() == 1) {
            keepOrder(lifts);
        }
    }

    /**
     * Somebody's turn.
     *
     * @param was when it began, by which turns are ordered
     * @param after from its end until the next may begin, ticks
     */
    private record Turn(long was, LinearArgument from, LinearArgument to, long after) {}

    private void keepPool(Job job, int phase, int pool) {
        Map<Integer, Literal> in = model.in(job, phase);
        if (in.size() > 1) {
            model.model().addBoolOr(List.of(Objects.requireNonNull(in.get(pool))));
        }
    }

    private void lifts(Placed placed, List<Turn> lifts) {
        long takes = shop.carriage().takes() / tick;
        if (takes == 0) {
            return;
        }
        Job job = placed.job();
        LinearExpr begin =
                LinearExpr.newBuilder().add(model.start(job, 0)).add(-takes).build();
        lifts.add(new Turn(placed.begins(shop.carriage()), begin, model.start(job, 0), 0));
        for (int k = 1; k < job.size(); k++) {
            if (!job.phase(k).before().stays()) {
                lifts.add(new Turn(placed.visit(k - 1).end(), model.end(job, k - 1), model.start(job, k), 0));
            }
        }
        lifts.add(new Turn(placed.visit(job.size() - 1).end(), model.end(job, job.size() - 1), model.out(job), 0));
    }

    private void keepOrder(List<Turn> turns) {
        turns.sort(Comparator.comparingLong(Turn::was));
        for (int i = 1; i < turns.size(); i++) {
            Turn before = turns.get(i - 1);
            model.model()
                    .addGreaterOrEqual(
                            turns.get(i).from(),
                            LinearExpr.newBuilder()
                                    .add(before.to())
                                    .add(before.after())
                                    .build());
        }
    }
}
