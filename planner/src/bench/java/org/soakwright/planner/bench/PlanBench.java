package org.soakwright.planner.bench;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.Param;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.Setup;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;
import org.soakwright.planner.batch.Planner;
import org.soakwright.planner.batch.Progress;
import org.soakwright.recipes.Outcome;
import org.soakwright.recipes.Recipes;
import org.soakwright.recipes.model.Recipe;

/**
 * A whole plan, from a recipe already read to its explanation. Run from the planner folder. So much code takes the compiler longer
 * to warm up than a kernel.
 */
@State(Scope.Thread)
@Warmup(iterations = 5, time = 2)
public class PlanBench {
    private static final String THREE_WATERS = """
            language: 1
            title: Three waters
            product: [food]
            lot:
              mass: 600 kg
              density: 1120 kg/m3
              pieces:
                - {name: thin, shape: slab, thickness: 18 mm, share: 40 %}
                - {name: thick, shape: slab, thickness: 26 mm, share: 60 %}
            species:
              salt: {start: 190 g/kg, diffusivity: 8e-10 m2/s, partition: 0.8}
            steps:
              - soak: first water
                liquor: {ratio: 3 L/kg, salt: 0 g/L}
                temperature: 4 Cel
                film: {coefficient: 2e-6 m/s}
                time: {from: 4 h, to: 36 h, grain: 15 min}
              - soak: second water
                liquor: {ratio: 3 L/kg, salt: 0 g/L}
                temperature: 4 Cel
                film: {coefficient: 2e-6 m/s}
                time: {from: 4 h, to: 36 h, grain: 15 min}
              - soak: third water
                liquor: {ratio: 3 L/kg, salt: 0 g/L}
                temperature: 4 Cel
                film: {coefficient: 2e-6 m/s}
                time: {from: 4 h, to: 36 h, grain: 15 min}
            targets:
              - {species: salt, reading: mean, at-most: 25 g/kg}
            minimise: time
            """;

    @Param({"three waters", "loin-desalting", "cord-brining", "bead-washing", "wheel-brining", "brick-desalination"})
    public String recipe = "";

    private final List<Recipe> read = new ArrayList<>();

    @Setup
    public void prepare() {
        Outcome outcome = recipe.equals("three waters")
                ? Recipes.read(recipe, THREE_WATERS)
                : Recipes.read(Path.of("..", "recipes", "examples", recipe + ".yaml"));
        if (outcome instanceof Outcome.Refused refused) {
            throw new IllegalStateException(refused.problems().toString());
        }
        read.add(((Outcome.Accepted) outcome).recipe());
        if (!Planner.plan(read.get(0), Progress.NONE).met()) {
            throw new IllegalStateException("no plan for " + recipe + " meets its targets");
        }
    }

    @Benchmark
    public Object plan() {
        return Planner.plan(read.get(0), Progress.NONE);
    }
}
