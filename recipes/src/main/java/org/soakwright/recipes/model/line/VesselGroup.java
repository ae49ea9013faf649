package org.soakwright.recipes.model.line;

import java.util.ArrayList;
import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.stream.IntStream;
import org.jspecify.annotations.Nullable;
import org.soakwright.recipes.model.Quantity;
import org.soakwright.recipes.model.Reference;
import org.soakwright.recipes.model.Step;
import org.soakwright.recipes.text.Place;
import org.soakwright.recipes.text.Problem;
import org.soakwright.recipes.text.Unsound;

/**
 * Vessels that are alike: tanks, troughs, rooms.
 *
 * @param count how many, 1 to 999
 * @param kinds the kinds of steps that they serve: soak, rinse, rest, dry
 * @param steps the names of steps that they serve besides
 * @param volume what each holds of pieces and liquor together; null where that limits nothing
 * @param capacity the mass that each holds of many lots at once, kg, above zero; null where lots are alone
 * @param turnaround from a load's leaving until the next one lands in the same vessel, or the same one again, whole minutes; null is
 *     none
 * @param draws what each draws while a lot is in it, by the name of the utility
 */
public record VesselGroup(
        Place place,
        String name,
        int count,
        Set<String> kinds,
        List<Reference> steps,
        @Nullable Volume volume,
        @Nullable Quantity capacity,
        @Nullable Quantity turnaround,
        List<Outage> outages,
        Map<String, Draw> draws) {
    /** The kinds that a step can be of. */
    public static final List<String> KINDS = List.of("soak", "rinse", "rest", "dry");

    /** More than any hall has. */
    public static final int MOST = 999;

    public VesselGroup {
        kinds = Collections.unmodifiableSet(new LinkedHashSet<>(kinds));
        steps = List.copyOf(steps);
        outages = List.copyOf(outages);
        draws = Collections.unmodifiableMap(new LinkedHashMap<>(draws));
        List<Problem> problems = new ArrayList<>();
        if (name.isBlank()) {
            problems.add(new Problem(place, "vessels have no name; write one such as tank"));
        }
        if (count < 1 || count > MOST) {
            problems.add(new Problem(
                    place,
                    "there are 1 to " + MOST + " vessels of a kind: found " + count + "; write such as count: 3"));
        }
        if (!KINDS.containsAll(kinds)) {
            problems.add(new Problem(
                    place,
                    "steps are of the kinds " + String.join(", ", KINDS) + ": found " + String.join(", ", kinds)
                            + "; write one of them, or the name of a step"));
        }
        if (kinds.isEmpty() && steps.isEmpty()) {
            problems.add(new Problem(place, name + " serves no step; write such as serves: [soak, rinse]"));
        }
        for (Outage outage : outages) {
            if (outage.vessel() > count) {
                problems.add(new Problem(
                        outage.place(),
                        "there is no such vessel: found " + outage.vessel() + " of " + count + "; write 1 to "
                                + count));
            }
        }
        problems.addAll(Minutes.ifNone("a turnaround", turnaround, "40 min"));
        if (capacity != null && !(capacity.si() > 0)) {
            problems.add(new Problem(
                    capacity.place(),
                    "the capacity must be above zero: found \"" + capacity + "\"; write such as 4000 kg"));
        }
        if (!problems.isEmpty()) {
            throw new Unsound(problems);
        }
    }

    /** What the vessel of a number, from 1, is called: {@code tank 2}; of one alone the group's name. */
    public String vessel(int number) {
        if (number < 1 || number > count) {
            throw new IllegalArgumentException("vessels of " + name + " count from 1 to " + count + ": " + number);
        }
        return count == 1 ? name : name + " " + number;
    }

    /** The names of all. */
    public List<String> vesselNames() {
        return IntStream.rangeClosed(1, count).mapToObj(this::vessel).toList();
    }

    /** Whether the step may run in it, by its kind or by its name. */
    public boolean serves(Step step) {
        return kinds.contains(step.kind())
                || steps.stream().anyMatch(one -> one.name().equals(step.name()));
    }

    /** Whether many lots may be in it at once. */
    public boolean isShared() {
        return capacity != null;
    }

    public long turnaroundSeconds() {
        return turnaround == null ? 0 : Math.round(turnaround.si());
    }
}
