package org.soakwright.planner.batch;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.soakwright.recipes.library.RecipeFacts;
import org.soakwright.recipes.model.Phase;
import org.soakwright.recipes.model.Quantity;
import org.soakwright.recipes.model.Reading;
import org.soakwright.recipes.model.Recipe;
import org.soakwright.recipes.model.Species;
import org.soakwright.recipes.text.Place;
import org.soakwright.recipes.text.Unsound;

/** What the pieces of a run hold at its end, for the cautions to be tested on. */
final class RunEnds implements RecipeFacts.Ends {
    private final Run run;

    RunEnds(Run run) {
        this.run = run;
    }

    @Override
    public List<Double> piece(String species, Reading reading) {
        Recipe recipe = run.batch().recipe();
        Quantity density = recipe.lot().density();
        if (density == null) {
            return List.of();
        }
        StepEnd end = run.end(recipe.steps().size() - 1);
        return end.pieces().stream()
                .flatMap(piece -> piece.species().stream())
                .filter(content -> content.species().equals(species))
                .map(content -> content.value(reading) / recipe.lot().express(density.si(), content.unit()))
                .toList();
    }

    @Override
    public List<Double> waterPhase(String species, Reading reading) {
        Batch batch = run.batch();
        Recipe recipe = batch.recipe();
        int index = recipe.species().stream().map(Species::name).toList().indexOf(species);
        Weighing weighing = Weighing.of(recipe).filter(Weighing::tellsWater).orElse(null);
        if (weighing == null || index < 0 || recipe.species().get(index).isWater()) {
            return List.of();
        }
        State state = run.state(batch.lastStage(recipe.steps().size() - 1), false);
        List<Double> phases = new ArrayList<>();
        for (int j = 0; j < recipe.lot().grades().size(); j++) {
            phase(weighing, index, j, reading)
                    .flatMap(measure -> read(measure, state))
                    .ifPresent(phases::add);
        }
        return phases;
    }

    /** Empty where there is no water: then there is no phase to judge. */
    private static Optional<Double> read(Measure measure, State state) {
        try {
            return Optional.of(measure.read(state).value());
        } catch (Unsound none) {
            return Optional.empty();
        }
    }

    /** Empty for an extreme that is not computed: in pieces of several sides, or that differ by more than size, where the water is a species. */
    private Optional<Measure> phase(Weighing weighing, int species, int grade, Reading reading) {
        Population pieces = run.batch().classes(species).populations().get(grade);
        Place place = run.batch().recipe().species().get(species).place();
        boolean extreme = reading == Reading.HIGHEST || reading == Reading.LOWEST;
        if (!extreme || weighing.waterSpecies().isEmpty()) {
            Gauge gauge = new Gauge.Average(grade, pieces, reading);
            return Optional.of(new Measure.InPhase(place, weighing, species, gauge, reading, Phase.WATER));
        }
        boolean oneSide = run.batch().recipe().lot().grades().get(grade).sides().size() == 1;
        return oneSide && weighing.sharesClasses(species)
                ? Optional.of(new Measure.ExtremeOfPhase(
                        place, weighing, species, pieces, grade, reading == Reading.HIGHEST, Phase.WATER))
                : Optional.empty();
    }
}
