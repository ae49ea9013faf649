package org.soakwright.planner.line.verify;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import org.soakwright.planner.batch.Batch;
import org.soakwright.planner.batch.Progress;
import org.soakwright.planner.batch.Run;
import org.soakwright.planner.batch.TargetState;
import org.soakwright.recipes.text.Unsound;

/** Whether the targets of a load stand as the result says: followed exactly with its real times, and judged where a confidence is asked for. */
final class Judge {
    /** Both follow the same chain; what they differ by is rounding of times that are whole seconds. */
    private static final double ROUNDING = 1e-7;

    private final Faults faults;
    private int targets;
    private OptionalDouble cost = OptionalDouble.of(0);

    Judge(Faults faults) {
        this.faults = faults;
    }

    int targets() {
        return targets;
    }

    /** Of all loads judged so far; empty where one could not be followed. */
    OptionalDouble cost() {
        return cost;
    }

    void check(Cargo cargo) {
        Result.Entry entry = cargo.entry();
        Run run;
        try {
            Unrolled unrolled = Unrolled.of(cargo);
            run = new Batch(unrolled.recipe()).follow(unrolled.seconds());
            double own = run.totals().cost().orElse(0);
            cost = cost.isPresent() ? OptionalDouble.of(cost.getAsDouble() + own) : cost;
            if (isUncertain(run)) {
                run = run.judged(Progress.NONE);
            }
        } catch (Unsound unsound) {
            cost = OptionalDouble.empty();
            faults.add(cargo.name() + " cannot be followed with these times: " + unsound.getMessage() + ".");
            return;
        }
        List<TargetState> states = run.targets();
        if (states.size() != entry.targets().size()) {
            faults.add(cargo.name() + " shows " + entry.targets().size() + " targets, " + states.size()
                    + " would be right.");
            return;
        }
        List<String> missed = new ArrayList<>();
        for (int i = 0; i < states.size(); i++) {
            compare(cargo, states.get(i), entry.targets().get(i), isSure(run, states.get(i)));
            if (!states.get(i).met()) {
                missed.add(states.get(i).name());
            }
        }
        for (Result.Entry one : cargo.entries()) {
            if (one.met() != missed.isEmpty()) {
                faults.add(one.name() + " is said to " + (one.met() ? "meet" : "miss") + " its targets, "
                        + (missed.isEmpty() ? "meeting them all" : "missing " + String.join(" and ", missed))
                        + " would be right.");
            }
        }
    }

    private static boolean isUncertain(Run run) {
        return run.targets().stream().anyMatch(state -> isSure(run, state));
    }

    /** Whether it is to hold with a confidence: read off samples and not one exact number. */
    private static boolean isSure(Run run, TargetState state) {
        return run.batch().recipe().confidence(state.target()).isPresent();
    }

    private void compare(Cargo cargo, TargetState state, Result.Reached reached, boolean sure) {
        targets++;
        String what = cargo.name() + ": " + state.name();
        if (!state.atMost().equals(reached.atMost()) || !state.atLeast().equals(reached.atLeast())) {
            faults.add(what + " is held to " + limits(reached.atMost(), reached.atLeast(), state.unit()) + ", "
                    + limits(state.atMost(), state.atLeast(), state.unit()) + " would be right.");
        }
        double scale = Math.max(
                Math.abs(state.value()),
                Math.max(state.atMost().orElse(0), state.atLeast().orElse(0)));
        if (!sure && !(Math.abs(state.value() - reached.value()) <= ROUNDING * scale)) {
            faults.add(what + " is said to be " + Faults.number(reached.value()) + " " + state.unit() + ", "
                    + Faults.number(state.value()) + " " + state.unit() + " would be right.");
        }
        if (state.met() != reached.met()) {
            faults.add(what + " is said to be " + (reached.met() ? "met" : "missed") + " with "
                    + Faults.number(state.value()) + " " + state.unit() + ", " + (state.met() ? "met" : "missed")
                    + ", held to "
                    + limits(state.atMost(), state.atLeast(), state.unit()) + ", would be right.");
        }
    }

    private static String limits(OptionalDouble atMost, OptionalDouble atLeast, String unit) {
        List<String> sides = new ArrayList<>();
        atLeast.ifPresent(limit -> sides.add("at least " + Faults.number(limit)));
        atMost.ifPresent(limit -> sides.add("at most " + Faults.number(limit)));
        return sides.isEmpty() ? "no limit" : String.join(" and ", sides) + " " + unit;
    }
}
