package org.soakwright.planner.line;

import java.util.List;
import java.util.OptionalDouble;
import java.util.OptionalLong;
import org.soakwright.planner.line.shop.Schedule;
import org.soakwright.recipes.model.line.Line;

/**
 * A line scheduled.
 *
 * @param loads in the order in which their first moves begin
 * @param proof how good it is known to be
 * @param notes what its reader should know: how it was made, and what could not be done
 */
public record LinePlan(
        Line line, Clock clock, Schedule schedule, List<LoadPlan> loads, Proof proof, List<String> notes) {
    public LinePlan {
        loads = List.copyOf(loads);
        notes = List.copyOf(notes);
    }

    /**
     * What no schedule can beat, from relaxations that hold for certain.
     *
     * @param lateness weighted, s
     * @param makespan among schedules that are no later, s; empty where nothing is known
     */
    public record Proof(OptionalDouble lateness, OptionalLong makespan) {}

    /** Whether every target is met and no lot late. */
    public boolean keepsEverything() {
        return loads.stream().allMatch(LoadPlan::met) && schedule.lateness() == 0;
    }

    /** How late a lot is that shares a load, s. */
    public long late(LoadPlan load, Load.Share share) {
        if (share.order().due() == null) {
            return 0;
        }
        return Math.max(
                0,
                load.placed().finishes(schedule.shop().carriage())
                        - clock.seconds(share.order().due()));
    }

    public String vessel(int station) {
        return schedule.shop().stations().get(station).name();
    }
}
