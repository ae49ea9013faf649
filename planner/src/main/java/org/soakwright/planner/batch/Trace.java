package org.soakwright.planner.batch;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.soakwright.recipes.model.Reading;
import org.soakwright.recipes.model.Recipe;
import org.soakwright.solver.chain.Chain;
import org.soakwright.solver.chain.Course;
import org.soakwright.solver.chain.Probe;
import org.soakwright.solver.chain.StageTooShort;

/**
 * A run looked at in between: profiles and readings of every species in every grade over the running clock, denser where a stage has
 * just begun. Contents are in the species' own unit, liquors in g/L.
 */
public final class Trace {
    private static final int PER_STEP = 28;
    private static final int PER_GAP = 6;
    private static final int FEWEST = 4;

    /** Looks where a sketch of the chain shows what modes in their thousands would, however early a look is. */
    private static final int OF_SKETCHES = 14;

    /** What the first look of a stage may need: looks as squares need as many times the end's modes as there are looks. */
    private static final int MOST_MODES = 300;

    private final Run run;
    private final double[] depths;
    private final List<Moment> moments;
    private final List<double[]> read;
    private final List<double[]> durations;

    /**
     * One look.
     *
     * @param step the step it belongs to; a gap belongs to the step before
     * @param gap whether it lies between steps or fills, the pieces in nothing
     * @param clock s since the start of the batch
     */
    public record Moment(int step, boolean gap, double clock, List<Sight> sights) {}

    /**
     * One species at one moment.
     *
     * @param liquor g/L of the liquor the pieces are in; NaN where they are in none
     * @param profiles by grade, then by depth
     * @param means by grade
     */
    public record Sight(double liquor, double[][] profiles, double[] means) {}

    /** One look with what every requirement on pieces would read there, kg/m3; NaN for others. */
    private record Look(Moment moment, double[] read, double[] upTo) {}

    private Trace(Run run, double[] depths, List<Look> looks) {
        this.run = run;
        this.depths = depths;
        moments = looks.stream().map(Look::moment).toList();
        read = looks.stream().map(Look::read).toList();
        durations = looks.stream().map(Look::upTo).toList();
    }

    public Run run() {
        return run;
    }

    /** Positions of the profiles: 0, the core or sealed face, to 1, the wetted surface. */
    public double[] depths() {
        return depths.clone();
    }

    /** In the order of the clock; a stage's beginning is shown as the profile it began with. */
    public List<Moment> moments() {
        return moments;
    }

    /** At each moment, how long the stages so far have lasted, s. */
    List<double[]> durations() {
        return durations;
    }

    /**
     * What a target on pieces would read at each moment, in its own unit.
     *
     * @param state of the run, as {@link EachGrade} tells it
     */
    public double[] course(TargetState state) {
        List<Requirement> requirements = run.batch().requirements();
        for (int r = 0; r < requirements.size(); r++) {
            // Of a band the side is meant that the state tells of.
            if (requirements.get(r).ofPieces()
                    && run.batch()
                            .recipe()
                            .targets()
                            .get(requirements.get(r).target())
                            .equals(state.target())
                    && TargetState.of(run, requirements.get(r)).grade().equals(state.grade())
                    && TargetState.of(run, requirements.get(r)).value() == state.value()) {
                double si = run.value(requirements.get(r));
                // Values are proportional to kg/m3: what the target shows over what it read.
                double unit = si == 0 ? 1 : state.value() / si;
                int index = r;
                return read.stream().mapToDouble(look -> unit * look[index]).toArray();
            }
        }
        throw new IllegalArgumentException("no target on pieces of this run: " + state.name());
    }

    /**
     * Follows the run again at many moments.
     *
     * @param layers how many depths, at least 2
     */
    public static Trace of(Run run, int layers) {
        double[] depths = new double[layers];
        for (int i = 0; i < layers; i++) {
            depths[i] = (double) i / (layers - 1);
        }
        Batch batch = run.batch();
        double[] seconds = run.seconds();
        List<Look> looks = new ArrayList<>();
        double clock = 0;
        double all = batch.exchanging(run.seconds());
        double[] done = new double[0];
        for (int k = 0; k < batch.slots().size(); k++) {
            Translation.Slot slot = batch.slots().get(k);
            boolean gap = slot.isGap();
            double whole = slot.seconds(seconds);
            int count = gap ? PER_GAP : Math.max(PER_GAP, (int) Math.ceil(PER_STEP * slot.part()));
            int modes = modes(run, k);
            count = modes > Chain.MOST_MODES || batch.isDear()
                    ? Math.min(count, OF_SKETCHES)
                    : Math.max(FEWEST, Math.min(count, MOST_MODES / modes));
            double[] upTo = java.util.Arrays.copyOf(done, k + 1);
            for (int i = 1; i <= count; i++) {
                // Squares: the profile moves with the root of time.
                upTo[k] = whole * i * i / ((double) count * count);
                look(batch, slot.step(), gap, clock + upTo[k], all, upTo, depths)
                        .ifPresent(looks::add);
            }
            done = upTo;
            clock += whole;
        }
        return new Trace(run, depths, looks);
    }

    private static int modes(Run run, int stage) {
        int most = 1;
        for (int s = 0; s < run.batch().recipe().species().size(); s++) {
            most = Math.max(most, run.course(s).modes(stage));
        }
        return most;
    }

    /** Empty so early in a stage that the profile would need more modes than are kept: the next look will do. */
    private static Optional<Look> look(
            Batch batch, int step, boolean gap, double clock, double whole, double[] upTo, double[] depths) {
        try {
            return Optional.of(see(batch, step, gap, clock, whole, upTo, depths));
        } catch (StageTooShort early) {
            return Optional.empty();
        }
    }

    private static Look see(
            Batch batch, int step, boolean gap, double clock, double whole, double[] upTo, double[] depths) {
        Recipe recipe = batch.recipe();
        int stage = upTo.length - 1;
        List<Sight> sights = new ArrayList<>();
        List<Course> courses = new ArrayList<>();
        for (int s = 0; s < recipe.species().size(); s++) {
            Chain sketch = batch.chain(s).sketch();
            // So early a look that even a sketch would be blurred is left out.
            double[] own = batch.effective(s, upTo);
            sketch.require(own);
            Course course = sketch.follow(own);
            courses.add(course);
            List<Population> populations = batch.classes(s).populations();
            // Contents are proportional to kg/m3, and there are many: one exact conversion serves them all.
            double unit =
                    recipe.lot().express(1, recipe.species().get(s).start().unit());
            int grades = recipe.lot().grades().size();
            double[][] profiles = new double[grades][];
            double[] means = new double[grades];
            for (int j = 0; j < grades; j++) {
                profiles[j] = course.profile(populations.get(j).median(), stage, depths);
                for (int i = 0; i < depths.length; i++) {
                    profiles[j][i] *= unit;
                }
                means[j] = unit * new Gauge.Average(j, populations.get(j), Reading.MEAN).value(course, stage);
            }
            boolean wet = batch.stage(s, stage).wets();
            sights.add(new Sight(wet ? course.value(new Probe.Liquor(), stage) : Double.NaN, profiles, means));
        }
        State state = new State(batch, courses, upTo, whole, stage, false);
        double[] read = batch.requirements().stream()
                .mapToDouble(requirement -> requirement.ofPieces() ? Batch.read(requirement, state) : Double.NaN)
                .toArray();
        return new Look(new Moment(step, gap, clock, List.copyOf(sights)), read, upTo.clone());
    }
}
