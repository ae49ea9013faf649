package org.soakwright.planner.conditions;

import java.util.List;
import org.jspecify.annotations.Nullable;
import org.soakwright.recipes.model.Diffusivity;
import org.soakwright.solver.transport.Quantity;
import org.soakwright.solver.transport.Scaling;

/** What a stated diffusivity is at a temperature. */
public final class Movement {
    private Movement() {}

    /**
     * The diffusivity, m2/s.
     *
     * @param temperature null where none is stated: then it must not matter
     */
    public static double at(Diffusivity stated, org.soakwright.recipes.model.@Nullable Quantity temperature) {
        return temperature == null || !stated.dependsOnTemperature()
                ? stated.value().si()
                : Sources.at(temperature, () -> raw(stated, temperature.si())).value();
    }

    /** The diffusivity at a temperature in K, with whatever there is to caution. */
    public static Quantity at(Diffusivity stated, double temperature) {
        return Sources.at(stated.value(), () -> raw(stated, temperature));
    }

    private static Quantity raw(Diffusivity stated, double temperature) {
        double value = stated.value().si();
        Diffusivity.Law law = stated.law();
        if (law instanceof Diffusivity.Law.Activated activated) {
            return new Scaling.Arrhenius(
                            value, activated.at().si(), activated.energy().si())
                    .at(temperature);
        }
        if (law instanceof Diffusivity.Law.Viscous viscous) {
            Scaling scaling = Sources.at(
                    viscous.at(),
                    () -> new Scaling.StokesEinstein(value, viscous.at().si()));
            return scaling.at(temperature);
        }
        if (law instanceof Diffusivity.Law.Measured measured) {
            return new Scaling.Measured(measured.points().stream()
                            .map(point -> new Scaling.Point(
                                    point.temperature().si(), point.value().si()))
                            .toList())
                    .at(temperature);
        }
        return new Quantity(value, 0, List.of());
    }
}
