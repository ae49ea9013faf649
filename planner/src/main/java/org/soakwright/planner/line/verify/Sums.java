package org.soakwright.planner.line.verify;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.OptionalLong;
import org.soakwright.recipes.model.line.Line;
import org.soakwright.recipes.model.line.Order;

/** Whether what is said of each lot's time and of the whole is what its steps and moves make. */
final class Sums {
    /** What sums may be off by: rounding. */
    private static final double ROUNDING = 1e-9;

    private final Line line;
    private final Wall wall;
    private final Faults faults;

    Sums(Line line, Wall wall, Faults faults) {
        this.line = line;
        this.wall = wall;
        this.faults = faults;
    }

    void lots(List<Cargo> cargoes) {
        for (Cargo cargo : cargoes) {
            for (int i = 0; i < cargo.entries().size(); i++) {
                lot(cargo, cargo.entries().get(i), cargo.orders().get(i));
            }
        }
    }

    private void lot(Cargo cargo, Result.Entry entry, Order order) {
        moment(
                entry,
                "is loaded",
                entry.loaded(),
                cargo.first().stint().from() - line.moves().seconds());
        moment(entry, "is done", entry.done(), done(cargo));
        moment(entry, "is ready", entry.ready(), order.ready().toInstant().getEpochSecond());
        OptionalLong due = order.due() == null
                ? OptionalLong.empty()
                : OptionalLong.of(order.due().toInstant().getEpochSecond());
        if (!due.equals(entry.due())) {
            faults.add(entry.name() + " is due " + told(entry.due()) + ", " + told(due) + " would be right.");
        }
        if (entry.late() != late(cargo, order)) {
            faults.add(entry.name() + " is late by " + Faults.number(entry.late()) + " s, " + late(cargo, order)
                    + " s would be right.");
        }
    }

    private void moment(Result.Entry entry, String what, long found, long right) {
        if (found != right) {
            faults.add(
                    entry.name() + " " + what + " at " + wall.at(found) + ", " + wall.at(right) + " would be right.");
        }
    }

    private String told(OptionalLong due) {
        return due.isPresent() ? "at " + wall.at(due.getAsLong()) : "never";
    }

    private long done(Cargo cargo) {
        return cargo.last().stint().until() + line.moves().seconds();
    }

    private long late(Cargo cargo, Order order) {
        return order.due() == null
                ? 0
                : Math.max(0, done(cargo) - order.due().toInstant().getEpochSecond());
    }

    /**
     * The whole of it.
     *
     * @param cost of all loads; empty where it could not be counted
     */
    void whole(Result result, List<Cargo> cargoes, OptionalDouble cost) {
        long starts = line.starts().toInstant().getEpochSecond();
        long makespan = 0;
        double lateness = 0;
        boolean met = true;
        for (Cargo cargo : cargoes) {
            makespan = Math.max(makespan, done(cargo) - starts);
            for (Order order : cargo.orders()) {
                lateness += late(cargo, order) * order.priority().doubleValue();
            }
            met &= cargo.entries().stream().allMatch(Result.Entry::met);
        }
        equal("makespan-seconds", result.makespan(), (double) makespan);
        equal("lateness-seconds", result.lateness(), lateness);
        long nights = result.moves().stream()
                .filter(move -> wall.isNight(move.start()))
                .count();
        equal("night-moves", result.nightMoves(), (double) nights);
        if (result.bound().orElse(0) > makespan) {
            faults.add("bound-seconds is " + Faults.number(result.bound().orElse(0)) + ", no more than the makespan of "
                    + makespan + " would be right.");
        }
        if (result.boundLateness().orElse(0) > lateness * (1 + ROUNDING) + ROUNDING) {
            faults.add("bound-lateness-seconds is "
                    + Faults.number(result.boundLateness().orElse(0)) + ", no more than the lateness of "
                    + Faults.number(lateness) + " would be right.");
        }
        boolean good = met && lateness == 0 && result.stops() == 0;
        if (result.met() != good) {
            faults.add("The result is said to be " + (result.met() ? "" : "not ") + "met, " + (good ? "" : "not ")
                    + "met would be right: " + (met ? "every" : "not every") + " target is met and "
                    + (lateness == 0 ? "no lot is late" : "a lot is late") + ".");
        }
        cost(result, cost);
    }

    private void cost(Result result, OptionalDouble cost) {
        List<String> currencies = line.recipes().values().stream()
                .flatMap(recipe -> recipe.currency().stream())
                .distinct()
                .toList();
        Optional<String> currency = currencies.size() == 1 ? Optional.of(currencies.get(0)) : Optional.empty();
        if (!currency.equals(result.currency())) {
            faults.add("currency is " + result.currency().orElse("none") + ", " + currency.orElse("none")
                    + " would be right.");
        }
        if (currency.isEmpty()) {
            if (result.cost().isPresent()) {
                faults.add("cost is " + Faults.number(result.cost().getAsDouble())
                        + ", none would be right where recipes do not share one currency.");
            }
        } else if (cost.isPresent()) {
            if (result.cost().isPresent()) {
                equal("cost", result.cost().getAsDouble(), cost.getAsDouble());
            } else {
                faults.add("cost is missing, " + Faults.number(cost.getAsDouble()) + " would be right.");
            }
        }
    }

    private void equal(String what, double found, double right) {
        if (!(Math.abs(found - right) <= ROUNDING * Math.abs(right))) {
            faults.add(what + " is " + Faults.number(found) + ", " + Faults.number(right) + " would be right.");
        }
    }
}
