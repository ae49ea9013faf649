package org.soakwright.planner.line.shop;

import java.util.ArrayList;
import java.util.List;

/** Who has what when, as jobs are put on it one by one. */
final class Floor {
    private final Shop shop;
    private final List<Usage> stations;
    private final Usage heads;
    private final Usage hoist;
    private final List<Usage> utilities;

    Floor(Shop shop) {
        this.shop = shop;
        stations = new ArrayList<>();
        for (Station station : shop.stations()) {
            Usage usage = new Usage(station.holdsMany() ? station.limit() : 1);
            for (int i = 0; i < station.closed().size(); i++) {
                usage.take(station.closed().from(i), station.closed().to(i), usage.limit());
            }
            stations.add(usage);
        }
        heads = new Usage(shop.staffing().most());
        heads.take(-Moments.NEVER, Moments.NEVER, shop.staffing().most());
        shop.staffing().levels().forEach(level -> heads.take(level.from(), level.until(), -level.heads()));
        hoist = new Usage(shop.carriage().atOnce());
        utilities = shop.utilities().stream().map(Usage::new).toList();
    }

    private Floor(Floor other) {
        shop = other.shop;
        stations = new ArrayList<>(other.stations.stream().map(Usage::copy).toList());
        heads = other.heads.copy();
        hoist = other.hoist.copy();
        utilities = other.utilities.stream().map(Usage::copy).toList();
    }

    Floor copy() {
        return new Floor(this);
    }

    Shop shop() {
        return shop;
    }

    void put(Placed placed) {
        change(placed, 1);
    }

    void remove(Placed placed) {
        change(placed, -1);
    }

    private void change(Placed placed, int sign) {
        Job job = placed.job();
        int first = 0;
        for (int k = 0; k < job.size(); k++) {
            Placed.Visit visit = placed.visit(k);
            // What is drawn goes on while people change what is around the job.
            long drawnUntil = k + 1 < job.size() && job.phase(k + 1).before() instanceof Joint.Change
                    ? placed.visit(k + 1).start()
                    : visit.end();
            for (int u = 0; u < utilities.size(); u++) {
                utilities
                        .get(u)
                        .take(visit.start(), drawnUntil, sign * job.phase(k).draw(visit.station(), u));
            }
            if (k + 1 == job.size() || !job.phase(k + 1).before().stays()) {
                Station station = shop.stations().get(visit.station());
                stations.get(visit.station())
                        .take(
                                placed.visit(first).start(),
                                visit.end() + station.turnaround(),
                                sign * station.share(job));
                first = k + 1;
            }
        }
        for (Placed.Task task : placed.tasks(shop.carriage())) {
            heads.take(task.from(), task.until(), sign * task.heads(shop.carriage()));
            if (task.needsHoist()) {
                hoist.take(task.from(), task.until(), sign);
            }
        }
    }

    /** Where a job fits into a station, its turnaround included, between two moments. */
    Moments room(int station, Job job, long from, long to) {
        Station one = shop.stations().get(station);
        return stations.get(station)
                .room(one.share(job), from, to + one.turnaround())
                .lasting(one.turnaround());
    }

    /** When a lift may go on. */
    Moments lifts(long from, long to) {
        if (shop.carriage().isFree()) {
            return Moments.of(from, to);
        }
        return heads.room(shop.carriage().heads(), from, to).and(hoist.room(1, from, to));
    }

    /** When somebody has a hand free. */
    Moments hands(long from, long to) {
        return heads.room(1, from, to);
    }

    /** When a phase may go on for what it draws and for whom it needs. */
    Moments conditions(Phase phase, int station, long from, long to) {
        Moments good = supplied(phase, station, from, to);
        return phase.attended() ? good.and(shop.staffing().shifts()) : good;
    }

    /** When there is what a phase draws. */
    Moments supplied(Phase phase, int station, long from, long to) {
        Moments good = Moments.of(from, to);
        for (int u = 0; u < utilities.size(); u++) {
            long draw = phase.draw(station, u);
            if (draw > 0) {
                good = good.and(utilities.get(u).room(draw, from, to));
            }
        }
        return good;
    }
}
