package org.soakwright.planner.report.picture;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.soakwright.planner.batch.Bands;
import org.soakwright.planner.batch.EachGrade;
import org.soakwright.planner.batch.Run;
import org.soakwright.planner.batch.StepEnd;
import org.soakwright.planner.batch.TargetState;
import org.soakwright.planner.batch.Trace;
import org.soakwright.planner.report.Way;
import org.soakwright.recipes.model.Grade;
import org.soakwright.recipes.model.Reading;
import org.soakwright.recipes.model.Recipe;
import org.soakwright.recipes.model.Species;
import org.soakwright.recipes.model.Step;
import org.soakwright.recipes.model.Target;

/** A traced run as rows of numbers over the running clock, from the start of the batch on. */
final class History {
    private final Trace trace;
    private final Recipe recipe;
    private final List<StepEnd> ends;
    private final double[] clocks;
    private final double[] depths;
    private final List<TargetState> targets;
    private final Optional<Bands> bands;

    History(Trace trace) {
        this.trace = trace;
        recipe = trace.run().batch().recipe();
        depths = trace.depths();
        ends = new ArrayList<>();
        for (int i = 0; i < recipe.steps().size(); i++) {
            ends.add(trace.run().end(i));
        }
        targets = EachGrade.of(trace.run());
        // Only where the run was judged: nothing is said of doubt otherwise.
        bands = trace.run().outlook().isPresent() ? Bands.of(trace) : Optional.empty();
        clocks = new double[trace.moments().size() + 1];
        for (int i = 1; i < clocks.length; i++) {
            clocks[i] = trace.moments().get(i - 1).clock();
        }
    }

    /**
     * What a liquor held from when the pieces came in, or it was made up anew, until they left or it was let go; g/L.
     *
     * @param begun whether the first content is that of the very beginning; else it is the first one looked at, soon after
     */
    record Fill(int step, boolean begun, double[] clocks, double[] contents) {
        double last() {
            return contents[contents.length - 1];
        }
    }

    Run run() {
        return trace.run();
    }

    Recipe recipe() {
        return recipe;
    }

    List<StepEnd> ends() {
        return ends;
    }

    List<Grade> grades() {
        return recipe.lot().grades();
    }

    /** Every target for each grade that it looks at. */
    List<TargetState> targets() {
        return targets;
    }

    /** From 0 on. */
    double[] clocks() {
        return clocks.clone();
    }

    double end() {
        return ends.get(ends.size() - 1).to();
    }

    /** From 0 to 1 along the {@link #way} through a piece. */
    double[] depths() {
        return depths.clone();
    }

    String unit(int species) {
        return recipe.species().get(species).start().unit().symbol();
    }

    /** Along which the profiles of a species in a grade run. */
    Way way(int species, int grade) {
        return Way.of(recipe.species().get(species), grades().get(grade));
    }

    /** By clock, then along the way through the piece; in the species' unit. */
    double[][] profiles(int species, int grade) {
        double[][] profiles = new double[clocks.length][];
        profiles[0] = new Loaded(recipe, species).profile(way(species, grade), depths);
        for (int i = 1; i < clocks.length; i++) {
            profiles[i] = trace.moments().get(i - 1).sights().get(species).profiles()[grade];
        }
        return profiles;
    }

    /** The profile when a step ends. */
    double[] profileAtEnd(int species, int grade, int step) {
        return profiles(species, grade)[momentAt(ends.get(step).to())];
    }

    /** One number of each profile by clock, in the species' unit. */
    double[] readings(int species, int grade, Reading reading) {
        double[] values = new double[clocks.length];
        double[][] profiles = profiles(species, grade);
        Way way = way(species, grade);
        for (int i = 0; i < values.length; i++) {
            double[] profile = profiles[i];
            values[i] = switch (reading) {
                case MEAN -> mean(species, grade, i);
                case CORE -> way.core(profile);
                case SURFACE -> way.surface(profile);
                case HIGHEST -> highest(profile);
                case LOWEST -> lowest(profile);
                case RANGE -> highest(profile) - lowest(profile);
            };
        }
        return values;
    }

    /** What a target on pieces would read at each clock but the first, in its own unit. */
    double[] course(TargetState state) {
        return trace.course(state);
    }

    /** Between what a target on pieces may read, values not known exactly, at each clock but the first; empty where they are known. */
    Optional<Bands.Band> band(TargetState state) {
        return bands.map(all -> all.of(state));
    }

    /** What it would have read as loaded, in the species' unit; empty where only a distribution would tell. Grade below 0 is the lot. */
    OptionalDouble readAtStart(int species, int grade, Target.OfPieces target) {
        Species loaded = recipe.species().get(species);
        boolean varies = loaded.startVaries() != null;
        if (target.share() != null && (varies || grade < 0)) {
            return OptionalDouble.empty();
        }
        if (grade < 0) {
            return OptionalDouble.of(lotMeans(species)[0]);
        }
        double value = readings(species, grade, target.reading())[0];
        if (!varies || target.reading() == Reading.MEAN) {
            return OptionalDouble.of(value);
        }
        Loaded start = new Loaded(recipe, species);
        return OptionalDouble.of(value * start.mean(grades().get(grade)) / start.core());
    }

    /** The lot's mean by clock, in the species' unit. */
    double[] lotMeans(int species) {
        double[] values = new double[clocks.length];
        for (int i = 0; i < values.length; i++) {
            for (int j = 0; j < grades().size(); j++) {
                values[i] += grades().get(j).share() * mean(species, j, i);
            }
        }
        return values;
    }

    private double mean(int species, int grade, int moment) {
        return moment == 0
                ? new Loaded(recipe, species).mean(grades().get(grade))
                : trace.moments().get(moment - 1).sights().get(species).means()[grade];
    }

    /** The liquors that a species was exchanged with, in the order of the clock. */
    List<Fill> fills(int species) {
        List<Fill> fills = new ArrayList<>();
        for (int k = 0; k < ends.size(); k++) {
            StepEnd end = ends.get(k);
            int count = end.step().fills();
            for (int f = 0; f < count; f++) {
                fill(species, k, end.fillFrom(f), end.fillTo(f), f == count - 1).ifPresent(fills::add);
            }
        }
        return fills;
    }

    private java.util.Optional<Fill> fill(int species, int step, double from, double to, boolean last) {
        double slack = 1e-9 * end();
        double[] at = new double[clocks.length + 1];
        double[] held = new double[clocks.length + 1];
        int n = 0;
        String name = recipe.species().get(species).name();
        OptionalDouble beginning = beginning(step, last, from, name);
        if (beginning.isPresent()) {
            at[n] = from;
            held[n++] = beginning.getAsDouble();
        }
        for (Trace.Moment moment : trace.moments()) {
            double liquor = moment.sights().get(species).liquor();
            boolean within = moment.clock() > from + slack && moment.clock() <= to + slack;
            if (within && moment.step() == step && !moment.gap() && !Double.isNaN(liquor)) {
                at[n] = moment.clock();
                held[n++] = liquor;
            }
        }
        return n < 2
                ? java.util.Optional.empty()
                : java.util.Optional.of(
                        new Fill(step, beginning.isPresent(), Arrays.copyOf(at, n), Arrays.copyOf(held, n)));
    }

    /** Known of the last fill of a step, and of the first liquor of all, which nothing clung to the pieces could change. */
    private OptionalDouble beginning(int step, boolean last, double from, String species) {
        if (last) {
            return ends.get(step).liquor().stream()
                    .filter(liquor -> liquor.species().equals(species))
                    .mapToDouble(StepEnd.Liquor::start)
                    .findFirst();
        }
        boolean first = from == ends.get(step).from()
                && ends.subList(0, step).stream().noneMatch(end -> end.step() instanceof Step.Wet);
        return first && ends.get(step).step() instanceof Step.Wet wet
                ? OptionalDouble.of(wet.liquor().kgPerM3(species))
                : OptionalDouble.empty();
    }

    /** The last look that is not later. */
    int momentAt(double clock) {
        int i = clocks.length - 1;
        while (i > 0 && clocks[i] > clock + 1e-9 * end()) {
            i--;
        }
        return i;
    }

    static double highest(double[] values) {
        return Arrays.stream(values).max().orElseThrow();
    }

    static double lowest(double[] values) {
        return Arrays.stream(values).min().orElseThrow();
    }
}
