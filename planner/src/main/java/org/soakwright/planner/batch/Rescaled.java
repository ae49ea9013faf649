package org.soakwright.planner.batch;

import java.math.BigDecimal;
import java.util.LinkedHashMap;
import java.util.Map;
import org.soakwright.recipes.model.Diffusivities;
import org.soakwright.recipes.model.Overrides;
import org.soakwright.recipes.model.Quantity;
import org.soakwright.recipes.model.Step;
import org.soakwright.recipes.model.StepHead;

/** Parts of a recipe with a number multiplied, for asking what if. */
final class Rescaled {
    private Rescaled() {}

    static Quantity times(Quantity quantity, double factor) {
        return new Quantity(quantity.value().multiply(BigDecimal.valueOf(factor)), quantity.unit(), quantity.place());
    }

    static Diffusivities times(Diffusivities diffusivities, double factor) {
        return diffusivities.map(one -> one.times(factor));
    }

    /** A step's own diffusivity of a species multiplied, where it has one. */
    static Step step(Step step, String species, double factor) {
        StepHead head = step.head();
        Diffusivities own = head.overrides().diffusivity().get(species);
        if (own == null) {
            return step;
        }
        Map<String, Diffusivities> diffusivity =
                new LinkedHashMap<>(head.overrides().diffusivity());
        diffusivity.put(species, times(own, factor));
        return step.with(
                head.withOverrides(new Overrides(diffusivity, head.overrides().partition())));
    }
}
