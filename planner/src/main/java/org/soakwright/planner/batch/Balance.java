package org.soakwright.planner.batch;

import java.util.ArrayList;
import java.util.List;
import org.soakwright.recipes.model.Recipe;
import org.soakwright.recipes.model.Species;
import org.soakwright.solver.chain.Course;
import org.soakwright.solver.chain.Probe;
import org.soakwright.solver.chain.Stage;
import org.soakwright.solver.chain.Surroundings;

/**
 * Where the solute of one species came from and where it went over the whole batch, kg.
 *
 * @param sources pieces as loaded, then what each liquor brought
 * @param sinks pieces at the end, then what each step took away
 * @param closed whether every sink was computed on its own, so that the defect says something; false where unlimited liquor, air or
 *     running liquor takes what is missing
 */
public record Balance(String species, List<Entry> sources, List<Entry> sinks, boolean closed) {
    /** An amount of solute and what it belongs to. */
    public record Entry(String name, double kilograms) {}

    public Balance {
        sources = List.copyOf(sources);
        sinks = List.copyOf(sinks);
    }

    /** Sources less sinks, kg; zero but for rounding. */
    public double defect() {
        return sum(sources) - sum(sinks);
    }

    private static double sum(List<Entry> entries) {
        return entries.stream().mapToDouble(Entry::kilograms).sum();
    }

    static Balance of(Run run, int s) {
        Batch batch = run.batch();
        Recipe recipe = batch.recipe();
        Species species = recipe.species().get(s);
        Course course = run.course(s);
        double volume = recipe.lot().volumeM3();
        double[] seconds = run.seconds();
        List<Entry> sources = new ArrayList<>();
        List<Entry> sinks = new ArrayList<>();
        double inside = volume * StartContent.of(recipe, species, -1);
        sources.add(new Entry("pieces as loaded", inside));
        double[] brought = new double[recipe.steps().size()];
        double[] taken = new double[recipe.steps().size()];
        double clinging = 0;
        double clingingContent = 0;
        boolean closed = true;
        for (int k = 0; k < batch.slots().size(); k++) {
            Stage stage = batch.stage(s, k);
            int step = batch.slots().get(k).step();
            double now = volume * course.value(new Probe.LotMean(), k);
            double released = inside - now;
            inside = now;
            Surroundings around = stage.surroundings();
            if (around instanceof Surroundings.Vessel vessel) {
                double end = course.value(new Probe.Liquor(), k);
                double run0 = vessel.flow() * batch.slots().get(k).seconds(seconds);
                brought[step] += vessel.volume() * vessel.content() + run0 * vessel.feed();
                double carried = clinging * clingingContent;
                if (vessel.flow() > 0) {
                    closed = false;
                    taken[step] += released
                            + carried
                            + vessel.volume() * vessel.content()
                            + run0 * vessel.feed()
                            - stage.clinging() * end;
                } else {
                    taken[step] += (vessel.volume() + clinging - stage.clinging()) * end;
                }
                clinging = stage.clinging();
                clingingContent = end;
            } else if (around instanceof Surroundings.Plenty plenty) {
                closed = false;
                taken[step] += released + clinging * clingingContent - stage.clinging() * plenty.content();
                clinging = stage.clinging();
                clingingContent = plenty.content();
            } else if (around instanceof Surroundings.Air) {
                closed = false;
                taken[step] += released;
            }
        }
        for (int i = 0; i < brought.length; i++) {
            String name = recipe.steps().get(i).name();
            if (brought[i] != 0) {
                sources.add(new Entry(name, brought[i]));
            }
            if (taken[i] != 0) {
                sinks.add(new Entry(name, taken[i]));
            }
        }
        if (clinging > 0) {
            sinks.add(new Entry("clinging at the end", clinging * clingingContent));
        }
        sinks.add(0, new Entry("pieces at the end", inside));
        return new Balance(species.name(), sources, sinks, closed);
    }
}
