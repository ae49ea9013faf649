package org.soakwright.planner.line.verify;

import java.time.ZonedDateTime;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.OptionalDouble;
import java.util.stream.Collectors;
import org.soakwright.recipes.model.Renewal;
import org.soakwright.recipes.model.Step;
import org.soakwright.recipes.model.line.Draw;
import org.soakwright.recipes.model.line.Line;
import org.soakwright.recipes.model.line.Outage;
import org.soakwright.recipes.model.line.Utility;
import org.soakwright.recipes.model.line.VesselGroup;
import org.soakwright.recipes.text.Shown;

/** Whether every load is where it may be, with room enough, at every moment; and what its vessels draw. */
final class Vessels {
    /** What sums may be off by: rounding. */
    private static final double ROUNDING = 1e-9;

    private final Line line;
    private final Wall wall;
    private final Faults faults;
    private final Map<String, Vessel> known = new LinkedHashMap<>();

    /** One of a group, from 1. */
    private record Vessel(VesselGroup group, int number, List<Visit> visits) {
        String name() {
            return group.vessel(number);
        }
    }

    /** From landing to lifting. */
    private record Visit(Cargo cargo, long from, long until) {}

    Vessels(Line line, Wall wall, Faults faults) {
        this.line = line;
        this.wall = wall;
        this.faults = faults;
        for (VesselGroup group : line.vessels()) {
            for (int i = 1; i <= group.count(); i++) {
                known.put(group.vessel(i), new Vessel(group, i, new ArrayList<>()));
            }
        }
    }

    void check(List<Cargo> cargoes) {
        for (Cargo cargo : cargoes) {
            cargo.parts().forEach(part -> serves(cargo, part));
            visits(cargo);
        }
        for (Vessel vessel : known.values()) {
            outages(vessel);
            if (vessel.group().isShared()) {
                together(vessel);
            } else {
                oneByOne(vessel);
            }
        }
        line.utilities().forEach(utility -> drawn(utility, cargoes));
    }

    private void serves(Cargo cargo, Cargo.Part part) {
        Vessel vessel = known.get(part.stint().vessel());
        String what = cargo.name() + ": " + part.name();
        if (vessel == null) {
            faults.add(what + " is in " + Shown.quoted(part.stint().vessel())
                    + ", which the line does not have; one of "
                    + line.serving(part.step()).stream().map(VesselGroup::name).collect(Collectors.joining(", "))
                    + " would be right.");
            return;
        }
        VesselGroup group = vessel.group();
        if (!group.serves(part.step())) {
            faults.add(what + " is in " + vessel.name() + ", which does not serve this "
                    + part.step().kind() + "; one of "
                    + line.serving(part.step()).stream().map(VesselGroup::name).collect(Collectors.joining(", "))
                    + " would be right.");
        }
        if (group.volume() != null) {
            OptionalDouble liquor = part.step() instanceof Step.Wet wet
                    ? wet.liquor().volumeM3(cargo.recipe().lot())
                    : OptionalDouble.empty();
            double pieces = cargo.kg()
                    / Objects.requireNonNull(cargo.recipe().lot().density()).si();
            double usable = group.volume().usableM3();
            if (pieces + liquor.orElse(0) > usable * (1 + ROUNDING)) {
                faults.add(what + " fills " + vessel.name() + " with " + litres(pieces + liquor.orElse(0))
                        + " of pieces and liquor, at most " + litres(usable) + " would be right.");
            }
        }
        if (group.capacity() != null && cargo.kg() > group.capacity().si() * (1 + ROUNDING)) {
            faults.add(what + " brings " + Faults.number(cargo.kg()) + " kg into " + vessel.name() + ", at most "
                    + group.capacity() + " would be right.");
        }
    }

    private static String litres(double m3) {
        return Faults.number(m3 * 1000) + " L";
    }

    private void visits(Cargo cargo) {
        int first = 0;
        List<Cargo.Part> parts = cargo.parts();
        for (int k = 1; k <= parts.size(); k++) {
            if (k == parts.size() || parts.get(k).isLifted()) {
                Result.Stint begin = parts.get(first).stint();
                Vessel vessel = known.get(begin.vessel());
                if (vessel != null) {
                    vessel.visits()
                            .add(new Visit(
                                    cargo,
                                    begin.from(),
                                    parts.get(k - 1).stint().until()));
                }
                first = k;
            }
        }
    }

    private void outages(Vessel vessel) {
        for (Outage outage : vessel.group().outages()) {
            long from = second(outage.from());
            long to = second(outage.to());
            for (Visit visit : vessel.visits()) {
                if (outage.concerns(vessel.number()) && visit.from() < to && from < visit.until()) {
                    faults.add(visit.cargo().name() + " is in " + vessel.name() + " from " + wall.at(visit.from())
                            + " to " + wall.at(visit.until()) + ", out of it from " + wall.at(from) + " to "
                            + wall.at(to) + " would be right.");
                }
            }
        }
    }

    private static long second(ZonedDateTime time) {
        return time.toInstant().getEpochSecond();
    }

    private void oneByOne(Vessel vessel) {
        long turnaround = vessel.group().turnaroundSeconds();
        List<Visit> visits = vessel.visits();
        for (int i = 0; i < visits.size(); i++) {
            for (int j = 0; j < visits.size(); j++) {
                Visit one = visits.get(i);
                Visit other = visits.get(j);
                boolean earlier = one.from() < other.from() || (one.from() == other.from() && i < j);
                if (i != j && earlier && other.from() < one.until() + turnaround) {
                    faults.add(other.cargo().name() + " lands in " + vessel.name() + " at " + wall.at(other.from())
                            + ", where " + one.cargo().name() + " is until " + wall.at(one.until()) + "; "
                            + wall.at(one.until() + turnaround) + " or later would be right.");
                }
            }
        }
    }

    private void together(Vessel vessel) {
        double capacity = Objects.requireNonNull(vessel.group().capacity()).si();
        Peaks peaks = new Peaks();
        for (Visit visit : vessel.visits()) {
            // Its place is free again when the turnaround is over, for itself too.
            long until = visit.until() + vessel.group().turnaroundSeconds();
            peaks.add(visit.cargo().name(), visit.from(), until, visit.cargo().kg());
        }
        for (Peaks.Excess excess : peaks.over(at -> capacity * (1 + ROUNDING), false)) {
            faults.add(vessel.name() + " holds " + Faults.number(excess.used()) + " kg at " + wall.at(excess.from())
                    + " with " + excess.who() + ", at most " + vessel.group().capacity() + " would be right.");
        }
    }

    private void drawn(Utility utility, List<Cargo> cargoes) {
        Peaks peaks = new Peaks();
        for (Vessel vessel : known.values()) {
            if (vessel.group().draws().get(utility.name()) instanceof Draw.Steady steady) {
                steady(peaks, vessel, steady.value().si());
            }
        }
        for (Cargo cargo : cargoes) {
            for (Cargo.Part part : cargo.parts()) {
                Vessel vessel = known.get(part.stint().vessel());
                if (vessel != null
                        && vessel.group().draws().get(utility.name()) instanceof Draw.Flow
                        && part.step() instanceof Step.Rinse rinse
                        && rinse.renewal() instanceof Renewal.Flow flow) {
                    peaks.add(
                            cargo.name() + " in " + vessel.name(),
                            part.stint().from(),
                            part.stint().until(),
                            flow.rate().si());
                }
            }
        }
        double most = utility.atMost().si();
        for (Peaks.Excess excess : peaks.over(at -> most * (1 + ROUNDING), false)) {
            faults.add("Of " + utility.name() + " "
                    + Faults.number(utility.atMost().unit().fromSi(excess.used())) + " "
                    + utility.atMost().unit().symbol() + " are drawn at " + wall.at(excess.from()) + " by "
                    + excess.who() + ", at most " + utility.atMost() + " would be right.");
        }
    }

    /** A vessel draws while any lot is in it, be there one or many. */
    private static void steady(Peaks peaks, Vessel vessel, double value) {
        List<Visit> visits = new ArrayList<>(vessel.visits());
        visits.sort(java.util.Comparator.comparingLong(Visit::from));
        long drawnUntil = Long.MIN_VALUE;
        for (Visit visit : visits) {
            peaks.add(vessel.name(), Math.max(visit.from(), drawnUntil), visit.until(), value);
            drawnUntil = Math.max(drawnUntil, visit.until());
        }
    }
}
