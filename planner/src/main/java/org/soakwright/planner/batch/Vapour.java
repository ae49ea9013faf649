package org.soakwright.planner.batch;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import org.soakwright.recipes.model.Medium;
import org.soakwright.recipes.model.Product;
import org.soakwright.recipes.model.Recipe;
import org.soakwright.recipes.model.Species;
import org.soakwright.recipes.model.Step;
import org.soakwright.solver.chain.Probe;

/** What a flammable batch gives off while it dries: the exhaust is made for the fastest hour, which is the first of a step. */
final class Vapour {
    private static final double HOUR = 3600;

    private Vapour() {}

    /** A sentence for each dry step and each species that leaves in it. */
    static List<String> of(Run run) {
        Recipe recipe = run.batch().recipe();
        List<String> said = new ArrayList<>();
        if (!recipe.products().contains(Product.FLAMMABLE)) {
            return said;
        }
        for (int i = 0; i < recipe.steps().size(); i++) {
            for (int s = 0; s < recipe.species().size(); s++) {
                Species species = recipe.species().get(s);
                if (recipe.steps().get(i) instanceof Step.Dry step
                        && species.exchangesWith(Medium.AIR)
                        && !species.isWater()) {
                    double[] seconds = run.seconds();
                    double whole = released(run, s, i, seconds[i]);
                    double first = released(run, s, i, Math.min(HOUR, seconds[i]));
                    if (whole > 0) {
                        said.add("Here " + step.name() + " drives off " + kilograms(whole) + " of " + species.name()
                                + ", "
                                + kilograms(first) + " of it in its first "
                                + Durations.practical(Math.min(HOUR, seconds[i]))
                                + ": the exhaust must keep that hour below 25 % of the lower flammable limit of what"
                                + " leaves, as a licensed engineer computes it.");
                    }
                }
            }
        }
        return said;
    }

    /** What leaves the pieces from the beginning of a step, kg. */
    private static double released(Run run, int species, int step, double seconds) {
        Batch batch = run.batch();
        int stage = batch.lastStage(step);
        double[] upTo = Arrays.copyOf(
                batch.slots().stream()
                        .mapToDouble(slot -> slot.seconds(run.seconds()))
                        .toArray(),
                stage + 1);
        upTo[stage] = seconds;
        double after =
                batch.chain(species).follow(batch.effective(species, upTo)).value(new Probe.LotMean(), stage);
        double before = stage == 0
                ? StartContent.of(batch.recipe(), batch.recipe().species().get(species), -1)
                : run.course(species).value(new Probe.LotMean(), stage - 1);
        return (before - after) * batch.recipe().lot().volumeM3();
    }

    private static String kilograms(double kg) {
        return String.format(Locale.ROOT, kg < 1 ? "%.0f g" : "%.1f kg", kg < 1 ? 1000 * kg : kg);
    }
}
