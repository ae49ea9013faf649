package org.soakwright.planner.line.constraint;

import com.google.ortools.sat.CpSolver;
import com.google.ortools.sat.Literal;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.soakwright.planner.line.shop.Job;
import org.soakwright.planner.line.shop.Moments;
import org.soakwright.planner.line.shop.Placed;
import org.soakwright.planner.line.shop.Schedule;
import org.soakwright.planner.line.shop.Shop;
import org.soakwright.planner.line.shop.Station;

/** Single stations for a solution that only knows pools: by time, each gets the first that is free. One always is, since pools hold alike ones. */
final class Stations {
    private final Shop shop;
    private final Pools pools;
    private final List<List<Stay>> taken = new ArrayList<>();

    private Stations(Shop shop, Pools pools) {
        this.shop = shop;
        this.pools = pools;
        shop.stations().forEach(station -> taken.add(new ArrayList<>()));
    }

    private record Stay(int index, Job job, int first, int last, int pool, long start, long end) {}

    /** The schedule; empty where closed stations leave no way. */
    static Optional<Schedule> of(Shop shop, List<Job> jobs, Model model, CpSolver solver, long tick) {
        List<Stay> stays = new ArrayList<>();
        for (int j = 0; j < jobs.size(); j++) {
            Job job = jobs.get(j);
            int first = 0;
            for (int k = 0; k < job.size(); k++) {
                if (k + 1 == job.size() || !job.phase(k + 1).before().stays()) {
                    int pool = pool(model.in(job, first), solver);
                    stays.add(new Stay(
                            j,
                            job,
                            first,
                            k,
                            pool,
                            tick * solver.value(model.start(job, first)),
                            tick * solver.value(model.end(job, k))));
                    first = k + 1;
                }
            }
        }
        stays.sort(Comparator.comparingLong(Stay::start).thenComparingLong(Stay::end));
        Stations stations = new Stations(shop, model.pools());
        int[][] at = new int[jobs.size()][];
        for (int j = 0; j < at.length; j++) {
            at[j] = new int[jobs.get(j).size()];
        }
        for (Stay stay : stays) {
            int station = stations.free(stay);
            if (station < 0) {
                return Optional.empty();
            }
            stations.taken.get(station).add(stay);
            for (int k = stay.first(); k <= stay.last(); k++) {
                at[stay.index()][k] = station;
            }
        }
        List<Placed> placed = new ArrayList<>();
        for (int j = 0; j < at.length; j++) {
            Job job = jobs.get(j);
            List<Placed.Visit> visits = new ArrayList<>();
            for (int k = 0; k < job.size(); k++) {
                visits.add(new Placed.Visit(
                        at[j][k], tick * solver.value(model.start(job, k)), tick * solver.value(model.end(job, k))));
            }
            placed.add(new Placed(job, visits));
        }
        return Optional.of(new Schedule(shop, placed));
    }

    private static int pool(Map<Integer, Literal> in, CpSolver solver) {
        return in.entrySet().stream()
                .filter(one -> in.size() == 1 || solver.booleanValue(one.getValue()))
                .mapToInt(Map.Entry::getKey)
                .findFirst()
                .orElseThrow();
    }

    private int free(Stay stay) {
        for (int s : pools.stations(stay.pool())) {
            if (isFree(s, shop.stations().get(s), stay)) {
                return s;
            }
        }
        return -1;
    }

    private boolean isFree(int s, Station station, Stay stay) {
        long until = stay.end() + station.turnaround();
        Moments closed = station.closed();
        for (int i = 0; i < closed.size(); i++) {
            if (closed.from(i) < until && stay.start() < closed.to(i)) {
                return false;
            }
        }
        // Those there at its start were put first: what they share is greatest at some start among them.
        long sum = station.holdsMany() ? stay.job().amount() : 1;
        for (Stay other : taken.get(s)) {
            if (other.end() + station.turnaround() > stay.start()) {
                sum += station.holdsMany() ? other.job().amount() : 1;
            }
        }
        return sum <= (station.holdsMany() ? station.limit() : 1);
    }
}
