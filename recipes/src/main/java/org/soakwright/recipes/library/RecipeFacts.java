package org.soakwright.recipes.library;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.soakwright.recipes.model.Grade;
import org.soakwright.recipes.model.Liquor;
import org.soakwright.recipes.model.Product;
import org.soakwright.recipes.model.Quantity;
import org.soakwright.recipes.model.Reading;
import org.soakwright.recipes.model.Recipe;
import org.soakwright.recipes.model.Species;
import org.soakwright.recipes.model.Step;

/** What a recipe says of itself, and what a run of it ends with. */
public final class RecipeFacts implements Facts {
    private final Recipe recipe;
    private final double[] seconds;
    private final Ends ends;

    /** What the pieces hold at the end, in each grade; empty where it was not computed. */
    public interface Ends {
        /** For a recipe not followed yet. */
        static Ends unknown() {
            return new Ends() {
                @Override
                public List<Double> piece(String species, Reading reading) {
                    return List.of();
                }

                @Override
                public List<Double> waterPhase(String species, Reading reading) {
                    return List.of();
                }
            };
        }

        /** As {@link Facts#piece}. */
        List<Double> piece(String species, Reading reading);

        /** As {@link Facts#waterPhase}. */
        List<Double> waterPhase(String species, Reading reading);
    }

    /**
     * The facts of a recipe.
     *
     * @param seconds how long each of its steps lasts
     */
    public RecipeFacts(Recipe recipe, double[] seconds, Ends ends) {
        if (seconds.length != recipe.steps().size()) {
            throw new IllegalArgumentException(
                    seconds.length + " durations for " + recipe.steps().size() + " steps");
        }
        this.recipe = recipe;
        this.seconds = seconds.clone();
        this.ends = ends;
    }

    @Override
    public Optional<String> allowedBy() {
        return Optional.ofNullable(recipe.allowedBy());
    }

    @Override
    public Set<Product> products() {
        return recipe.products();
    }

    /**
     * What lies between steps is a rest as warm as the step before it. The fills of a step are one stay, all that lies between them another: a
     * caution about long stays is not lost where a changeover parts one.
     */
    @Override
    public List<Stay> steps() {
        List<Stay> stays = new ArrayList<>();
        for (int i = 0; i < seconds.length; i++) {
            Step step = recipe.steps().get(i);
            Quantity temperature = step.temperature();
            OptionalDouble kelvin = temperature == null ? OptionalDouble.empty() : OptionalDouble.of(temperature.si());
            stays.add(new Stay(StepKind.of(step), kelvin, seconds[i]));
            rest(stays, kelvin, (step.fills() - 1) * step.gapBetweenFills().seconds());
            rest(stays, kelvin, i < seconds.length - 1 ? recipe.gapBefore(i + 1).seconds() : 0);
        }
        return stays;
    }

    private static void rest(List<Stay> stays, OptionalDouble kelvin, double seconds) {
        if (seconds > 0) {
            stays.add(new Stay(StepKind.REST, kelvin, seconds));
        }
    }

    @Override
    public Set<String> species() {
        return recipe.species().stream().map(Species::name).collect(Collectors.toSet());
    }

    @Override
    public Set<String> names() {
        Set<String> names = new HashSet<>(Set.of(recipe.title()));
        recipe.lot().grades().stream().map(Grade::name).forEach(names::add);
        recipe.steps().stream().map(Step::name).forEach(names::add);
        return names;
    }

    @Override
    public OptionalDouble liquor(String species) {
        return liquors().mapToDouble(liquor -> liquor.kgPerM3(species)).max();
    }

    @Override
    public OptionalDouble vessel() {
        return liquors()
                .map(liquor -> liquor.volumeM3(recipe.lot()))
                .filter(OptionalDouble::isPresent)
                .mapToDouble(OptionalDouble::getAsDouble)
                .max();
    }

    private Stream<Liquor> liquors() {
        return recipe.steps().stream().filter(Step.Wet.class::isInstance).map(step -> ((Step.Wet) step).liquor());
    }

    @Override
    public List<Double> piece(String species, Reading reading) {
        return ends.piece(species, reading);
    }

    @Override
    public List<Double> waterPhase(String species, Reading reading) {
        return ends.waterPhase(species, reading);
    }
}
