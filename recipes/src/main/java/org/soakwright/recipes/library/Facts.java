package org.soakwright.recipes.library;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import org.soakwright.recipes.model.Product;
import org.soakwright.recipes.model.Reading;

/** What cautions are tested on. What is not known is empty, and no condition on it holds. SI throughout. */
public interface Facts {
    Set<Product> products();

    /** In the order they happen. */
    List<Stay> steps();

    /** The names of all species. */
    Set<String> species();

    /** What people call things: the title, the grades, the steps. */
    Set<String> names();

    /** The most that any fresh liquor holds of a species, kg/m3. */
    OptionalDouble liquor(String species);

    /** The largest liquor, m3; empty too where every one is unlimited. */
    OptionalDouble vessel();

    /** A reading of a species at the end in each grade, kg per kg of piece. */
    List<Double> piece(String species, Reading reading);

    /** A reading of species/(species + water) at the end in each grade, kg/kg. */
    List<Double> waterPhase(String species, Reading reading);

    /** Who answers for the plan in spite of a caution that stops it; empty for nobody. */
    default Optional<String> allowedBy() {
        return Optional.empty();
    }

    /** How long something stays in one step, and how warm. */
    record Stay(StepKind kind, OptionalDouble kelvin, double seconds) {}
}
