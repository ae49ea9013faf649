package org.soakwright.planner.line;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import org.soakwright.planner.line.shop.Joint;
import org.soakwright.recipes.model.Amount;
import org.soakwright.recipes.model.Changeover;
import org.soakwright.recipes.model.Gap;
import org.soakwright.recipes.model.Handling;
import org.soakwright.recipes.model.Lot;
import org.soakwright.recipes.model.Quantity;
import org.soakwright.recipes.model.Recipe;
import org.soakwright.recipes.model.Renewal;
import org.soakwright.recipes.model.Step;
import org.soakwright.recipes.model.StepHead;
import org.soakwright.recipes.model.Time;
import org.soakwright.recipes.model.line.Moves;
import org.soakwright.recipes.text.Kind;
import org.soakwright.recipes.text.Place;
import org.soakwright.recipes.text.Unit;

/**
 * A recipe as it runs on a line: every fill and every gap is a step of its own, since each may last as long as it has to. Gaps are rests at the
 * conditions of the step before.
 *
 * @param written with the mass of the load
 * @param run the same, step by step as it runs
 * @param legs in order
 * @param joints how each leg is come to; the first is not asked
 * @param steps which step of {@code run} each leg is
 * @param gaps which step of {@code run} the gap before each leg is; -1 for none
 */
record Route(Recipe written, Recipe run, List<Leg> legs, List<Joint> joints, int[] steps, int[] gaps) {
    private static final Unit SECOND = Kind.DURATION.unit("s").orElseThrow();
    private static final Unit KILOGRAM = Kind.MASS.unit("kg").orElseThrow();

    static Route of(Recipe recipe, double kg, Moves moves) {
        Recipe written = weighing(recipe, kg);
        return new Builder(written, moves).built();
    }

    /** The recipe for a load of so many kg. */
    static Recipe weighing(Recipe recipe, double kg) {
        Lot lot = recipe.lot();
        Lot other = new Lot(
                lot.place(),
                new Amount.ByMass(Quantity.ofSi(kg, KILOGRAM, lot.amount().place())),
                lot.density(),
                lot.temperature(),
                lot.moisture(),
                lot.thermalDiffusivity(),
                lot.grades());
        return recipe.withLot(other);
    }

    /** The step of a leg. */
    String name(int leg) {
        return written.steps().get(legs.get(leg).step()).name();
    }

    int size() {
        return legs.size();
    }

    /** Durations of the steps of {@code run}, from those of legs and gaps by turns. */
    double[] seconds(long[] times) {
        double[] seconds = new double[run.steps().size()];
        for (int k = 0; k < size(); k++) {
            seconds[steps[k]] = times[2 * k];
            if (gaps[k] >= 0) {
                seconds[gaps[k]] = times[2 * k - 1];
            }
        }
        return seconds;
    }

    /** Derivatives by the steps of {@code run}, as derivatives by legs and gaps by turns. */
    double[] byTimes(double[] bySteps) {
        double[] byTimes = new double[2 * size() - 1];
        for (int k = 0; k < size(); k++) {
            byTimes[2 * k] = bySteps[steps[k]];
            if (gaps[k] >= 0) {
                byTimes[2 * k - 1] = bySteps[gaps[k]];
            }
        }
        return byTimes;
    }

    private static final class Builder {
        private final Recipe written;
        private final Moves moves;
        private final List<Step> run = new ArrayList<>();
        private final Set<String> names = new HashSet<>();
        private final List<Leg> legs = new ArrayList<>();
        private final List<Joint> joints = new ArrayList<>();
        private final List<Integer> steps = new ArrayList<>();
        private final List<Integer> gaps = new ArrayList<>();

        Builder(Recipe written, Moves moves) {
            this.written = written;
            this.moves = moves;
            written.steps().forEach(step -> names.add(step.name()));
        }

        Route built() {
            for (int i = 0; i < written.steps().size(); i++) {
                int fills = written.steps().get(i).fills();
                for (int f = 0; f < fills; f++) {
                    add(i, f, fills);
                }
            }
            return new Route(
                    written,
                    written.running(run),
                    List.copyOf(legs),
                    List.copyOf(joints),
                    steps.stream().mapToInt(Integer::intValue).toArray(),
                    gaps.stream().mapToInt(Integer::intValue).toArray());
        }

        private void add(int i, int fill, int fills) {
            Step step = written.steps().get(i);
            Joint joint = joint(i, fill);
            int gap = -1;
            if (!legs.isEmpty() && isGap(joint)) {
                Step before = run.get(run.size() - 1);
                gap = run.size();
                run.add(rest(before, name("between " + before.name() + " and " + step.name())));
            }
            legs.add(new Leg(i, fill, fills));
            joints.add(joint);
            steps.add(run.size());
            gaps.add(gap);
            run.add(leg(step, fill, fills));
        }

        private static boolean isGap(Joint joint) {
            return joint instanceof Joint.Change || (joint instanceof Joint.Lift lift && lift.least() > 0);
        }

        private Joint joint(int i, int fill) {
            Gap gap = fill > 0 ? written.steps().get(i).gapBetweenFills() : written.gapBefore(i);
            if (gap instanceof Gap.Refilling refilling) {
                return change(refilling.changeover());
            }
            if (fill > 0 || written.steps().get(i).head().handling().stays()) {
                return new Joint.Onward();
            }
            long least = Math.max(moves.seconds(), (long) Math.ceil(gap.seconds()));
            return new Joint.Lift(least, least == 0 ? 0 : least + moves.hangsSeconds());
        }

        private static Joint change(Changeover changeover) {
            return new Joint.Change((long) Math.ceil(changeover.seconds()));
        }

        private Step leg(Step step, int fill, int fills) {
            StepHead head = step.head();
            Quantity gain = head.gain();
            StepHead own = new StepHead(
                    head.place(),
                    fill == fills - 1 ? head.name() : name(head.name() + ", fill " + (fill + 1)),
                    fixed(nominal(head.time()) / fills, head.time().place()),
                    head.temperature(),
                    head.overrides(),
                    head.price(),
                    gain == null ? null : gain.times(1.0 / fills),
                    Handling.NONE);
            return step instanceof Step.Rinse rinse && rinse.renewal() instanceof Renewal.Fills
                    ? new Step.Soak(own, rinse.liquor(), rinse.film(), rinse.dragOut())
                    : step.with(own);
        }

        private static Step rest(Step before, String name) {
            StepHead head = before.head();
            return new Step.Rest(new StepHead(
                    head.place(),
                    name,
                    fixed(1800, head.time().place()),
                    head.temperature(),
                    head.overrides(),
                    null,
                    null,
                    Handling.NONE));
        }

        private static Time fixed(double seconds, Place place) {
            return new Time.Fixed(Quantity.ofSi(seconds, SECOND, place));
        }

        /** Where a film depends on how long it works, it is that of such a time. */
        private static double nominal(Time time) {
            return time.definite()
                    .map(Quantity::si)
                    .orElse(Math.sqrt(time.seconds(0) * time.seconds(time.choices() - 1)));
        }

        private String name(String wanted) {
            String name = wanted;
            while (!names.add(name)) {
                name += "'";
            }
            return name;
        }
    }
}
