package org.soakwright.planner.bench;

import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.Param;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.Setup;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;

/** Value and gradient of {@link FiveSoaks} by the tuned rival, its tuning not timed. */
@State(Scope.Thread)
@Warmup(iterations = 2, time = 1)
public class RivalBench {
    @Param({"0.1", "0.01", "0.001"})
    public double fo;

    /** Share of the driving difference that value and gradient are within. */
    @Param({"1e-6", "1e-9"})
    public double within;

    private Effort effort = new Effort(4, 0, 1, 1);
    private Rival rival = new Rival(effort);
    private double[][] choices = {};
    private int next;

    @Setup
    public void prepare() {
        FiveSoaks problem = new FiveSoaks(fo);
        effort = Effort.cheapest(problem, within);
        rival = new Rival(effort);
        choices = problem.choices();
        rival.checkGradient(choices[0]);
        System.err.println("\nFo " + fo + ", within " + within + ": " + effort);
    }

    private double[] choice() {
        next = (next + 1) % choices.length;
        return choices[next];
    }

    @Benchmark
    public Object warm() {
        return rival.answer(choice());
    }

    @Benchmark
    public Object withSetUp() {
        return new Rival(effort).answer(choice());
    }
}
