package org.soakwright.planner.line;

import java.util.List;
import org.soakwright.planner.batch.Run;
import org.soakwright.planner.batch.TargetState;
import org.soakwright.planner.line.shop.Placed;

/**
 * A load with its times, followed exactly.
 *
 * @param run of the recipe in which every leg and every gap is a step of its own
 * @param targets how each target of the recipe stands
 * @param legs in order
 * @param late why the first of its lots that is late is so, from its end back to what began it; empty where none is
 */
public record LoadPlan(
        Load load, Placed placed, Run run, List<TargetState> targets, List<LegPlan> legs, List<String> late) {
    public LoadPlan {
        targets = List.copyOf(targets);
        legs = List.copyOf(legs);
        late = List.copyOf(late);
    }

    public boolean met() {
        return targets.stream().allMatch(TargetState::met);
    }

    /**
     * A leg on the clock.
     *
     * @param name of its step
     * @param runStep which step of {@link LoadPlan#run} it is, from 0
     * @param start s from the line's start
     * @param latestPull until when it can last with everything else of the schedule in place, s; its own end where it cannot last longer
     * @param reason what stops it from lasting longer
     */
    public record LegPlan(
            Leg leg, String name, int runStep, String vessel, long start, long end, long latestPull, String reason) {
        public long seconds() {
            return end - start;
        }

        /** How much longer it can last, s. */
        public long slack() {
            return latestPull - end;
        }
    }
}
