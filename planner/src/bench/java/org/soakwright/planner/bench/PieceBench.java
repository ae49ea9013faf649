package org.soakwright.planner.bench;

import java.util.List;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.Param;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.Setup;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;
import org.soakwright.solver.chain.Chain;
import org.soakwright.solver.chain.Course;
import org.soakwright.solver.chain.Probe;
import org.soakwright.solver.chain.Stage;
import org.soakwright.solver.chain.Start;
import org.soakwright.solver.chain.Surroundings;
import org.soakwright.solver.shape.Axis;
import org.soakwright.solver.shape.Grade;
import org.soakwright.solver.shape.Side;
import org.soakwright.solver.stage.Surface;

/**
 * Pieces of several sides: a wheel of 250 x 95 mm through four closed brines of a day, a brick of 65 x 102 x 215 mm through three waters of a
 * week. Every call has durations of its own, so that nothing followed before can serve.
 */
@State(Scope.Thread)
@Warmup(iterations = 3, time = 1)
public class PieceBench {
    private static final double DAY = 86400;

    @Param({"wheel, shared brine", "brick, unlimited water", "brick, shared water"})
    public String recipe = "";

    private List<Grade> lot = List.of();
    private List<Stage> stages = List.of();
    private double[] seconds = {};
    private Chain chain = FiveSoaks.chain();
    private int next;

    @Setup
    public void prepare() {
        boolean wheel = recipe.startsWith("wheel");
        lot = wheel
                ? List.of(new Grade(List.of(new Side(Axis.CYLINDER, 0.125), new Side(Axis.SLAB, 0.0475)), 0.55, 1))
                : List.of(new Grade(
                        List.of(new Side(Axis.SLAB, 0.0325), new Side(Axis.SLAB, 0.051), new Side(Axis.SLAB, 0.1075)),
                        0.05,
                        1));
        Surroundings around = wheel
                ? new Surroundings.Vessel(1.5, 200, 0, 0)
                : recipe.endsWith("shared water") ? new Surroundings.Vessel(0.07, 0, 0, 0) : new Surroundings.Plenty(0);
        double clinging = around instanceof Surroundings.Vessel ? 0.002 : 0;
        Stage stage = wheel
                ? new Stage(2.3e-10, 0.42, new Surface.Film(2e-6), around, clinging)
                : new Stage(4e-10, 0.3, new Surface.Open(), around, clinging);
        stages = wheel ? List.of(stage, stage, stage, stage) : List.of(stage, stage, stage);
        seconds = stages.stream().mapToDouble(one -> wheel ? DAY : 7 * DAY).toArray();
        chain = fresh();
    }

    private Chain fresh() {
        return Chain.of(lot, new Start.Uniform(recipe.startsWith("wheel") ? 1 : 2), stages);
    }

    private Course followed(Chain along) {
        next = (next + 1) % 4096;
        double[] times = seconds.clone();
        for (int k = 0; k < times.length; k++) {
            times[k] *= 1 + 1e-5 * (next + k);
        }
        return along.follow(times);
    }

    @Benchmark
    public double value() {
        return followed(chain).value(new Probe.Mean(0), stages.size() - 1);
    }

    @Benchmark
    public double valueAndGradient() {
        Course course = followed(chain);
        Probe mean = new Probe.Mean(0);
        return course.value(mean, stages.size() - 1) + course.gradient(mean, stages.size() - 1)[0];
    }

    @Benchmark
    public double setUpAndValue() {
        return followed(fresh()).value(new Probe.Mean(0), stages.size() - 1);
    }
}
