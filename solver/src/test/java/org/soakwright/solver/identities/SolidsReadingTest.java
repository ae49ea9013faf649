package org.soakwright.solver.identities;

import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.soakwright.solver.chain.Chain;
import org.soakwright.solver.chain.Course;
import org.soakwright.solver.chain.Part;
import org.soakwright.solver.chain.Probe;
import org.soakwright.solver.chain.Sensitivity;
import org.soakwright.solver.chain.Stage;
import org.soakwright.solver.chain.Start;
import org.soakwright.solver.chain.Surroundings;
import org.soakwright.solver.identities.Draw.Kind;
import org.soakwright.solver.shape.Grade;
import org.soakwright.solver.stage.Surface;

/** Derivatives, extrema and ranges of pieces of several sides. */
class SolidsReadingTest {
    /** As in {@link GradientTest}: the fourth-order difference's own error is about 1e-11. */
    private static final double CHANGE = 2e-3;

    private record Case(List<Grade> lot, Start start, List<Timed> steps) {
        Chain chain() {
            return Timed.chain(lot, start, steps);
        }

        int last() {
            return steps.size() - 1;
        }

        double scale() {
            double theta = Bounds.highest(start, steps)[last()];
            return theta * Math.max(1, steps.get(last()).stage().partition());
        }
    }

    /** Turn by turn with a liquor shared by all, and without. */
    private static Case drawn(Draw draw, int turn) {
        List<Grade> lot = draw.solids(1 + turn % 3);
        List<Timed> steps = new ArrayList<>();
        int count = 1 + draw.below(3);
        for (int k = 0; k < count; k++) {
            Kind kind = turn % 2 == 0
                    ? draw.kind()
                    : List.of(Kind.PLENTY, Kind.AIR, Kind.REST).get(draw.below(3));
            steps.add(draw.clinging(draw.grained(draw.stage(lot, kind, 1))));
        }
        return new Case(lot, new Start.Uniform(draw.between(0, Draw.MOST)), steps);
    }

    private static List<Probe> probes(Case drawn, Draw draw) {
        int grade = draw.below(drawn.lot.size());
        return List.of(
                new Probe.Mean(0),
                new Probe.LotMean(),
                new Probe.At(grade, draw.between(0, 1)),
                new Probe.Surface(0),
                new Probe.Liquor());
    }

    @Test
    void derivativesByDurationAgreeWithDifferences() {
        Draw draw = new Draw(1301);
        Tally tally = new Tally("several sides: derivatives by duration");
        for (int i = 0; i < 48; i++) {
            Case drawn = drawn(draw, i);
            Chain chain = drawn.chain();
            double[] seconds = Timed.seconds(drawn.steps);
            int which = draw.below(seconds.length);
            for (Probe probe : probes(drawn, draw)) {
                tally.note(departure(chain, drawn, probe, seconds, which));
            }
        }
        tally.within(1e-9, 48);
    }

    @Test
    void derivativesOfExtremaAgreeWithDifferencesWhereTheirPlaceMovesSmoothly() {
        Draw draw = new Draw(1302);
        Tally tally = new Tally("several sides: derivatives of highest, lowest and range by duration");
        for (int i = 0; i < 48; i++) {
            Case drawn = drawn(draw, i);
            Chain chain = drawn.chain();
            double[] seconds = Timed.seconds(drawn.steps);
            int which = draw.below(seconds.length);
            if (jumps(chain, drawn, seconds, which)) {
                tally.skip();
                continue;
            }
            for (Probe probe : List.of(new Probe.Highest(0), new Probe.Lowest(0), new Probe.Range(0))) {
                tally.note(departure(chain, drawn, probe, seconds, which));
            }
        }
        tally.within(1e-8, 60);
    }

    /** Whether an extremum of the first grade changes to another place, rather than moving a little. */
    private static boolean jumps(Chain chain, Case drawn, double[] seconds, int which) {
        boolean jumps = false;
        for (boolean highest : new boolean[] {true, false}) {
            double[][] places = new double[5][];
            for (int i = -2; i <= 2; i++) {
                double[] changed = seconds.clone();
                changed[which] *= 1 + i * CHANGE;
                Course course = chain.follow(changed);
                places[i + 2] = highest
                        ? course.place(new Probe.Highest(0), drawn.last())
                        : course.place(new Probe.Lowest(0), drawn.last());
            }
            for (int s = 0; s < places[0].length; s++) {
                int side = s;
                double least =
                        Arrays.stream(places).mapToDouble(p -> p[side]).min().orElseThrow();
                double most =
                        Arrays.stream(places).mapToDouble(p -> p[side]).max().orElseThrow();
                boolean leavesAnEnd = (least == 0) != (most == 0) || (least == 1) != (most == 1);
                jumps |= most - least > 0.02 || leavesAnEnd;
            }
        }
        return jumps;
    }

    private static double departure(Chain chain, Case drawn, Probe probe, double[] seconds, int which) {
        double[] value = new double[5];
        for (int i = -2; i <= 2; i++) {
            double[] changed = seconds.clone();
            changed[which] *= 1 + i * CHANGE;
            value[i + 2] = chain.follow(changed).value(probe, drawn.last());
        }
        double difference = (8 * (value[3] - value[1]) - (value[4] - value[0])) / (12 * CHANGE);
        double found = chain.follow(seconds).gradient(probe, drawn.last())[which] * seconds[which];
        return Math.abs(found - difference) / drawn.scale();
    }

    @Test
    void theDerivativeOfASumIsTheSumOfTheDerivatives() {
        Draw draw = new Draw(1304);
        Tally tally = new Tally("several sides: derivatives of sums");
        for (int i = 0; i < 24; i++) {
            Case drawn = drawn(draw, i);
            Course course = Timed.follow(drawn.lot, drawn.start, drawn.steps);
            List<Part> sum = List.of(
                    new Part(0.3, new Probe.Mean(0)),
                    new Part(-1.7, new Probe.Range(0)),
                    new Part(2, new Probe.Liquor()));
            double[] whole = course.gradient(sum, drawn.last());
            for (int k = 0; k <= drawn.last(); k++) {
                double parts = 0;
                for (Part part : sum) {
                    parts += part.weight() * course.gradient(part.probe(), drawn.last())[k];
                }
                double seconds = drawn.steps.get(k).seconds();
                tally.note(Math.abs(whole[k] - parts) * seconds / drawn.scale());
            }
        }
        tally.within(1e-13, 24);
    }

    @Test
    void derivativesByContentAndFeedAgreeWithDifferences() {
        Draw draw = new Draw(1303);
        Tally byContent = new Tally("several sides: derivatives by content");
        Tally byFeed = new Tally("several sides: derivatives by feed");
        for (int i = 0; i < 48; i++) {
            Case drawn = drawn(draw, i);
            int which = draw.below(drawn.steps.size());
            double step = 7;
            double[] seconds = Timed.seconds(drawn.steps);
            Course course = drawn.chain().follow(seconds);
            Course more = changed(drawn, which, step, 0).chain().follow(seconds);
            Course richer = changed(drawn, which, 0, step).chain().follow(seconds);
            for (Probe probe : probes(drawn, draw)) {
                Sensitivity found = course.sensitivity(probe, drawn.last());
                double before = course.value(probe, drawn.last());
                double gained = more.value(probe, drawn.last()) - before;
                double fed = richer.value(probe, drawn.last()) - before;
                byContent.note(Math.abs(found.byContent()[which] * step - gained) / drawn.scale());
                byFeed.note(Math.abs(found.byFeed()[which] * step - fed) / drawn.scale());
            }
        }
        byContent.within(1e-11, 200);
        byFeed.within(1e-11, 200);
    }

    private static Case changed(Case drawn, int which, double content, double feed) {
        List<Timed> steps = new ArrayList<>(drawn.steps);
        Surroundings around = steps.get(which).stage().surroundings();
        Surroundings other = around;
        if (around instanceof Surroundings.Vessel v) {
            double fed = v.flow() > 0 ? v.feed() + feed : v.feed();
            other = new Surroundings.Vessel(v.volume(), v.content() + content, v.flow(), fed);
        } else if (around instanceof Surroundings.Plenty plenty) {
            other = new Surroundings.Plenty(plenty.content() + content);
        } else if (around instanceof Surroundings.Air air) {
            other = new Surroundings.Air(air.equilibrium() + content);
        }
        steps.set(which, steps.get(which).with(other));
        return new Case(drawn.lot, drawn.start, steps);
    }

    /** Nothing leaves the range of what a stage begins with and what runs in by more than the stated error. */
    @Test
    void noStageWidensTheRangeOfContents() {
        Draw draw = new Draw(1305);
        Tally tally = new Tally("several sides: overshoot beyond what begins and runs in, over the stated errors");
        for (int i = 0; i < 40; i++) {
            Case drawn = drawn(draw, i);
            Course course = Timed.follow(drawn.lot, drawn.start, drawn.steps);
            double low = ((Start.Uniform) drawn.start).content();
            double high = low;
            for (int k = 0; k <= drawn.last(); k++) {
                double partition = drawn.steps.get(k).stage().partition();
                Surroundings around = drawn.steps.get(k).stage().surroundings();
                List<Double> met = new ArrayList<>();
                if (around instanceof Surroundings.Vessel vessel) {
                    met.add(course.liquorAtStart(k));
                    met.add(vessel.flow() > 0 ? vessel.feed() : course.liquorAtStart(k));
                } else if (around instanceof Surroundings.Plenty plenty) {
                    met.add(plenty.content());
                } else if (around instanceof Surroundings.Air air) {
                    met.add(air.equilibrium());
                }
                low = met.stream().mapToDouble(c -> c * partition).reduce(low, Math::min);
                high = met.stream().mapToDouble(c -> c * partition).reduce(high, Math::max);
                double lowest = Double.POSITIVE_INFINITY;
                double highest = 0;
                for (int j = 0; j < drawn.lot.size(); j++) {
                    var least = course.read(new Probe.Lowest(j), k);
                    var most = course.read(new Probe.Highest(j), k);
                    double rounding = 1e-14 * high;
                    tally.note(Math.max(0, low - least.value()) / (least.error() + rounding));
                    tally.note(Math.max(0, most.value() - high) / (most.error() + rounding));
                    lowest = Math.min(lowest, least.value());
                    highest = Math.max(highest, most.value());
                }
                low = Math.max(low, lowest);
                high = Math.min(high, highest);
            }
        }
        tally.within(1, 150);
    }

    /** Cuts through the core, looked at closely, while a ring of salt travels inwards. */
    @Test
    void nothingOnACutExceedsTheExtrema() {
        Draw draw = new Draw(1306);
        Tally tally = new Tally("several sides: cuts beyond the extrema");
        int inside = 0;
        double[] looks = new double[161];
        for (int p = 0; p < looks.length; p++) {
            looks[p] = p / (looks.length - 1.0);
        }
        for (int i = 0; i < 60; i++) {
            Grade grade = draw.solid(1);
            Surface film = i % 3 == 0 ? new Surface.Open() : new Surface.Film(draw.log(0.3, 30));
            Surroundings brine = i % 2 == 0 ? new Surroundings.Plenty(100) : new Surroundings.Vessel(1e-3, 100, 0, 0);
            List<Stage> stages =
                    List.of(new Stage(1, 1, film, brine, 0), new Stage(1, 1, film, new Surroundings.Plenty(0), 0));
            Course course = Chain.of(List.of(grade), new Start.Uniform(0), stages)
                    .follow(draw.between(0.02, 0.2), draw.log(2e-3, 0.1));
            double highest = course.value(new Probe.Highest(0), 1);
            double lowest = course.value(new Probe.Lowest(0), 1);
            double[] place = course.place(new Probe.Highest(0), 1);
            inside += Arrays.stream(place).anyMatch(x -> x > 0.01 && x < 0.99) ? 1 : 0;
            double worst = 0;
            for (int first = 0; first < grade.sides().size(); first++) {
                for (int second = 0; second < first; second++) {
                    for (double[] row : course.section(0, 1, first, second, looks, looks)) {
                        for (double content : row) {
                            worst = Math.max(worst, Math.max(content - highest, lowest - content));
                        }
                    }
                }
            }
            tally.note(worst / 100);
        }
        tally.within(1e-9, 60);
        assertTrue(inside > 15, "highest inside in " + inside + " draws only");
    }
}
