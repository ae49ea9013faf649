package org.soakwright.planner.batch;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import org.soakwright.planner.conditions.Known;
import org.soakwright.recipes.model.Medium;
import org.soakwright.recipes.model.Recipe;
import org.soakwright.recipes.model.Renewal;
import org.soakwright.recipes.model.Species;
import org.soakwright.recipes.model.Step;
import org.soakwright.solver.shape.Grade;
import org.soakwright.solver.stage.Bath;
import org.soakwright.solver.stage.Conditions;
import org.soakwright.solver.stage.Surface;

/** The dimensionless groups of a recipe: what decides each step, before anything is followed. */
public final class Groups {
    private Groups() {}

    /**
     * The groups of one step for one species in one grade.
     *
     * @param foLow Fourier number D t/L^2 at the shortest duration the step may take, 1; L is the shortest way from
     *     the wetted surface to the core, t the whole time of the step, all fills together
     * @param foHigh the same at the longest
     * @param biot k L/(K D), 1; 0 where nothing passes the surface, infinite where there is no film
     * @param capacityRatio volume of liquor over partition times volume of all pieces, 1, of one fill; empty where the
     *     surroundings are unlimited or there are none
     * @param regime what that means, in words
     */
    public record Group(
            String step,
            String species,
            String piece,
            double foLow,
            double foHigh,
            double biot,
            OptionalDouble capacityRatio,
            String regime) {}

    /** Every group, in the order of steps, then species, then grades. */
    public static List<Group> of(Recipe recipe) {
        Recipe known = Known.of(recipe).recipe();
        Films films = Films.of(known, StepTimes.nominal(known));
        return of(known, films);
    }

    private static List<Group> of(Recipe recipe, Films films) {
        double[] shortest = StepTimes.shortest(recipe);
        double[] longest = StepTimes.longest(recipe);
        List<Grade> lot = new Translation(recipe, films).lot();
        List<Group> groups = new ArrayList<>();
        for (int i = 0; i < recipe.steps().size(); i++) {
            Step step = recipe.steps().get(i);
            for (Species species : recipe.species()) {
                OptionalDouble ratio = capacityRatio(recipe, species, step);
                for (int j = 0; j < lot.size(); j++) {
                    Grade grade = lot.get(j);
                    // Neither the pace nor the Biot number asks about the bath.
                    Conditions conditions = new Conditions(
                            Translation.diffusivity(species, step),
                            step instanceof Step.Dry ? 1 : Translation.partition(species, step),
                            exchanges(species, step) ? films.surface(i, species, j) : new Surface.Sealed(),
                            new Bath.Unlimited(),
                            Translation.grain(species, step));
                    int side = grade.shortest();
                    double biot = conditions.biot(grade, side);
                    double low = conditions.pace(grade, side) * shortest[i];
                    double high = conditions.pace(grade, side) * longest[i];
                    String piece = recipe.lot().grades().get(j).name();
                    String regime = new Regime(ways(conditions, grade), low, high)
                            .inWords(isClosed(step) ? ratio : OptionalDouble.empty());
                    groups.add(new Group(step.name(), species.name(), piece, low, high, biot, ratio, regime));
                }
            }
        }
        return List.copyOf(groups);
    }

    /** The side with the shortest way out first. */
    private static List<Regime.Way> ways(Conditions conditions, Grade grade) {
        int shortest = grade.shortest();
        double pace = conditions.pace(grade, shortest);
        List<Regime.Way> ways = new ArrayList<>();
        for (int i = 0; i < grade.sides().size(); i++) {
            Regime.Way way = new Regime.Way(
                    grade.sides().get(i).axis(), conditions.biot(grade, i), conditions.pace(grade, i) / pace);
            ways.add(i == shortest ? 0 : ways.size(), way);
        }
        return ways;
    }

    private static boolean exchanges(Species species, Step step) {
        return (step instanceof Step.Wet && species.exchangesWith(Medium.LIQUOR))
                || (step instanceof Step.Dry && species.exchangesWith(Medium.AIR));
    }

    private static OptionalDouble capacityRatio(Recipe recipe, Species species, Step step) {
        if (!(step instanceof Step.Wet wet) || !species.exchangesWith(Medium.LIQUOR)) {
            return OptionalDouble.empty();
        }
        OptionalDouble volume = wet.liquor().volumeM3(recipe.lot());
        double pieces = Translation.partition(species, step) * recipe.lot().volumeM3();
        return volume.isPresent() ? OptionalDouble.of(volume.getAsDouble() / pieces) : OptionalDouble.empty();
    }

    private static boolean isClosed(Step step) {
        return !(step instanceof Step.Rinse rinse && rinse.renewal() instanceof Renewal.Flow);
    }
}
