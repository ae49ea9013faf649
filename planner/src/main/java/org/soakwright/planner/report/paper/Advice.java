package org.soakwright.planner.report.paper;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.soakwright.planner.batch.Checkpoint;
import org.soakwright.planner.batch.Durations;
import org.soakwright.planner.batch.PullWindow;
import org.soakwright.planner.batch.Run;
import org.soakwright.planner.batch.StepEnd;
import org.soakwright.planner.report.Figures;
import org.soakwright.recipes.model.Target;

/**
 * What to do about a reading of the liquor. Each plan computed for pieces that are slow or fast is offered for the readings it is good
 * for and no others. Where longer does no harm, the longer one also serves readings on the way to it, and the shorter one those somewhat
 * beyond it; elsewhere each serves only readings that cannot be told from the one it was made for. For the rest nobody has computed
 * anything, and the sheet says so.
 */
final class Advice {
    static final String OTHERWISE =
            "A reading in none of the ranges given: stir and read again. If it stays, call the planner, do not"
                    + " improvise.";

    static final String RECORD =
            "* Slow and fast pieces hardly show in this reading: write it down, nothing follows from it.";

    private static final String NO_PLAN =
            "No times that the recipe allows reach the targets from here. Call the planner, do not improvise.";

    /** Readings nearer to each other than this, relatively, are the same: meters and samples are no better. */
    private static final double SAME = 0.03;

    private static final int DIGITS = 3;
    private static final double MINUTE = 60;

    private final Run run;
    private final Clock clock;
    private final List<Target> contents;
    private final boolean longerIsHarmless;

    Advice(Run run, List<PullWindow> windows, Clock clock) {
        this.run = run;
        this.clock = clock;
        contents = run.batch().recipe().targets().stream()
                .filter(target -> !(target instanceof Target.OfTotal))
                .toList();
        longerIsHarmless = isOpen(windows) || isOpen(PullWindow.of(withoutTotals()));
    }

    private static boolean isOpen(List<PullWindow> windows) {
        return windows.stream().allMatch(PullWindow::open);
    }

    /** What a plan takes in all is known whatever the pieces do: only limits on contents can make longer steps harmful. */
    private Run withoutTotals() {
        return run.withTargets(contents);
    }

    /** Readings from one to another, in g/L. */
    record Range(double from, double to) {
        static Range between(double one, double other) {
            return new Range(Math.max(0, Math.min(one, other)), Math.max(one, other));
        }

        /** Rounded inwards: no reading shown lies outside. */
        String shown() {
            String low = inward(from, RoundingMode.CEILING);
            String high = inward(to, RoundingMode.FLOOR);
            return new BigDecimal(low).compareTo(new BigDecimal(high)) > 0
                    ? figure(from) + " to " + figure(to)
                    : low + " to " + high;
        }

        private static String inward(double value, RoundingMode mode) {
            // Twelve digits first: a bound that is a round number stays one.
            BigDecimal exact = new BigDecimal(value).round(new MathContext(12));
            int scale = Math.max(0, DIGITS - (exact.precision() - exact.scale()));
            return exact.signum() == 0 ? "0" : exact.setScale(scale, mode).toPlainString();
        }
    }

    /**
     * For one checkpoint, the readings with which to go on as planned, and what to do at others.
     *
     * @param telling whether pieces that are slow or fast show in the reading at all
     */
    record Given(Range asPlanned, boolean telling, List<String> off) {}

    static String figure(double value) {
        return Figures.rounded(value, DIGITS);
    }

    Given at(Checkpoint checkpoint) {
        List<Checkpoint.Deviation> told = contents.isEmpty() ? List.of() : told(checkpoint);
        Range asPlanned = Range.between(edge(checkpoint, told, -1), edge(checkpoint, told, 1));
        List<String> off = new ArrayList<>();
        for (Checkpoint.Deviation deviation : told) {
            String pieces = "pieces " + verb(checkpoint) + (isSlow(deviation) ? " slowly. " : " fast. ");
            off.add(
                    deviation.added().isPresent()
                            ? range(checkpoint, deviation).shown() + " g/L: " + pieces
                                    + remedy(checkpoint.step(), deviation)
                            : beyond(checkpoint, deviation) + ": " + pieces + NO_PLAN);
        }
        told.stream()
                .filter(Advice::isSlow)
                .findFirst()
                .ifPresent(slow -> goingOn(checkpoint, slow, asPlanned).ifPresent(off::add));
        return new Given(asPlanned, !told.isEmpty(), List.copyOf(off));
    }

    /** A plan that just meets its targets leaves slow pieces no room: what going on costs at the slow end of the range. */
    private Optional<String> goingOn(Checkpoint checkpoint, Checkpoint.Deviation slow, Range asPlanned) {
        String[] shown = asPlanned.shown().split(" to ", -1);
        double read = Double.parseDouble(side(checkpoint, slow) < 0 ? shown[0] : shown[1]);
        return checkpoint
                .goingOnAt(run, slow, read)
                .map(missed -> "Going on with " + figure(read) + " g/L would end with " + missed.name() + " at "
                        + figure(missed.value()) + " " + missed.unit() + ", its limit "
                        + figure(
                                missed.atMost().orElseGet(() -> missed.atLeast().orElseThrow()))
                        + ": then as for slow pieces, or assay before release.");
    }

    private static boolean isSlow(Checkpoint.Deviation deviation) {
        return deviation.factor() < 1;
    }

    /**
     * The deviations that a reading tells, those with the same plan left out. No step is shortened on a reading that slow pieces might give as well:
     * fast ones are told only where slow ones lie on the other side of what is expected.
     */
    private List<Checkpoint.Deviation> told(Checkpoint checkpoint) {
        List<Checkpoint.Deviation> all = checkpoint.deviations();
        boolean opposite = all.size() == 2 && side(checkpoint, all.get(0)) * side(checkpoint, all.get(1)) < 0;
        return all.stream()
                .filter(one -> opposite || (all.size() == 1 && isSlow(one)))
                .filter(one ->
                        isSlow(one) || one.added().isEmpty() || !changed(one).isEmpty())
                .toList();
    }

    private static double side(Checkpoint checkpoint, Checkpoint.Deviation deviation) {
        return Math.signum(deviation.reading() - checkpoint.expected());
    }

    private static double gap(Checkpoint checkpoint, Checkpoint.Deviation deviation) {
        return Math.abs(deviation.reading() - checkpoint.expected());
    }

    /** As far as a reading is as expected, below (-1) or above (1). */
    private double edge(Checkpoint checkpoint, List<Checkpoint.Deviation> told, double side) {
        double same = SAME * checkpoint.expected();
        Optional<Checkpoint.Deviation> beyond =
                told.stream().filter(one -> side(checkpoint, one) == side).findFirst();
        double reach = beyond.map(one -> longerIsHarmless && !isSlow(one)
                        ? gap(checkpoint, one)
                        : Math.min(same, 0.5 * gap(checkpoint, one)))
                .orElse(same);
        return checkpoint.expected() + side * reach;
    }

    /** The readings that a deviation's plan is good for. */
    private Range range(Checkpoint checkpoint, Checkpoint.Deviation deviation) {
        double side = side(checkpoint, deviation);
        double reading = deviation.reading();
        if (longerIsHarmless) {
            double near = edge(checkpoint, List.of(deviation), side);
            double far = isSlow(deviation) ? reading : reading + side * gap(checkpoint, deviation);
            return Range.between(near, far);
        }
        double same = Math.min(SAME * reading, 0.5 * gap(checkpoint, deviation));
        return Range.between(reading - same, reading + same);
    }

    /** Where a deviation has no plan, nothing is known beyond what is as expected. */
    private String beyond(Checkpoint checkpoint, Checkpoint.Deviation deviation) {
        double side = side(checkpoint, deviation);
        return figure(edge(checkpoint, List.of(deviation), side)) + " g/L or " + (side < 0 ? "less" : "more");
    }

    private String verb(Checkpoint checkpoint) {
        StepEnd.Liquor liquor = run.end(checkpoint.step()).liquor().stream()
                .filter(one -> one.species().equals(checkpoint.species()))
                .findFirst()
                .orElseThrow();
        return liquor.end() >= liquor.start() ? "give" : "take up";
    }

    /** {@code End at 13:15, then second water lasts 17 h 45 min. In all 13 h 15 min longer.} */
    private String remedy(int step, Checkpoint.Deviation deviation) {
        List<Integer> changed = changed(deviation);
        boolean nothingLonger =
                changed.stream().allMatch(i -> deviation.seconds().get(i) < run.seconds()[i]);
        if (changed.isEmpty() || (isSlow(deviation) && longerIsHarmless && nothingLonger)) {
            return "Go on as planned, the steps are long enough.";
        }
        List<String> parts = new ArrayList<>();
        if (changed.get(0) != step) {
            parts.add("End this step as planned");
        }
        for (int i : changed) {
            double seconds = deviation.seconds().get(i);
            parts.add(
                    i == step
                            ? "End at " + clock.both(run.end(i).ending(seconds))
                            : run.end(i).step().name() + " lasts " + Durations.practical(seconds));
        }
        double added = deviation.added().orElseThrow();
        String total = Math.abs(added) < MINUTE
                ? "as long"
                : Durations.practical(Math.abs(added)) + (added > 0 ? " longer" : " shorter");
        return String.join(", then ", parts) + ". In all " + total + ".";
    }

    /** The steps that last otherwise than planned. */
    private List<Integer> changed(Checkpoint.Deviation deviation) {
        List<Integer> changed = new ArrayList<>();
        for (int i = 0; i < deviation.seconds().size(); i++) {
            if (Math.abs(deviation.seconds().get(i) - run.seconds()[i]) >= MINUTE) {
                changed.add(i);
            }
        }
        return changed;
    }
}
