package org.soakwright.planner.bench;

import java.util.ArrayList;
import java.util.List;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.Param;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.Setup;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;
import org.soakwright.planner.batch.Batch;
import org.soakwright.planner.batch.Progress;
import org.soakwright.planner.batch.Run;
import org.soakwright.recipes.Outcome;
import org.soakwright.recipes.Recipes;

/** Some ten thousand samples of eleven values of four closed waters, one grade, behind films: chances, percentiles and shares. */
@State(Scope.Thread)
@Warmup(iterations = 3, time = 2)
public class DoubtBench {
    private static final String HEAD = """
            language: 1
            title: Four waters
            product: [food]
            lot:
              mass: 600 kg
              density: {value: 1120 kg/m3, give-or-take: 2 %}
              pieces:
                - {name: thin, shape: slab, thickness: 18 mm, share: 100 %}
            species:
              salt:
                start: 190 g/kg
                diffusivity: {value: 8e-10 m2/s, give-or-take: 20 %}
                partition: {value: 0.8, give-or-take: 10 %}
            steps:
            """;

    private static final String STEP = """
              - soak: NAME
                liquor: {ratio: {value: 3 L/kg, give-or-take: 3 %}, salt: 0 g/L}
                temperature: 4 Cel
                film: {coefficient: {value: 2e-6 m/s, give-or-take: 30 %}}
                time: TIME
            """;

    private static final String TARGETS = """
            targets:
              - {species: salt, reading: mean, at-most: 60 g/kg}
            minimise: time
            """;

    /** Fourier number of a step, about. */
    @Param({"0.1", "0.05"})
    public double fourier;

    private final List<Run> followed = new ArrayList<>();

    @Setup
    public void prepare() {
        double seconds = fourier * 9e-3 * 9e-3 / 8e-10;
        StringBuilder text = new StringBuilder(HEAD);
        for (String name : List.of("first", "second", "third", "fourth")) {
            text.append(STEP.replace("NAME", name).replace("TIME", Math.round(seconds / 60) + " min"));
        }
        Outcome outcome = Recipes.read("four-waters.yaml", text + TARGETS);
        if (outcome instanceof Outcome.Refused refused) {
            throw new IllegalStateException(refused.problems().toString());
        }
        Batch batch = new Batch(((Outcome.Accepted) outcome).recipe());
        followed.add(batch.follow(seconds, seconds, seconds, seconds));
    }

    @Benchmark
    public Object judge() {
        return followed.get(0).judged(Progress.NONE);
    }
}
