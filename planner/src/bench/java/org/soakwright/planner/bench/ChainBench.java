package org.soakwright.planner.bench;

import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.Param;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.Setup;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;
import org.soakwright.solver.chain.Chain;

/** Value and gradient of {@link FiveSoaks} by the chain. */
@State(Scope.Thread)
@Warmup(iterations = 2, time = 1)
public class ChainBench {
    @Param({"0.1", "0.05", "0.01", "0.001"})
    public double fo;

    private Chain chain = FiveSoaks.chain();
    private double[][] choices = {};
    private int next;

    @Setup
    public void prepare() {
        chain = FiveSoaks.chain();
        choices = new FiveSoaks(fo).choices();
    }

    private double[] choice() {
        next = (next + 1) % choices.length;
        return choices[next];
    }

    @Benchmark
    public Object warm() {
        return FiveSoaks.answer(chain, choice());
    }

    @Benchmark
    public Object withSetUp() {
        return FiveSoaks.answer(FiveSoaks.chain(), choice());
    }
}
