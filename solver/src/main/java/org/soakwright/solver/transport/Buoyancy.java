package org.soakwright.solver.transport;

import java.util.List;
import org.soakwright.solver.Require;

/**
 * How much denser the liquor is at the surface than away from it, kg/m3; negative where it is lighter.
 *
 * @param byContent what the solute does
 * @param byTemperature what warmth does; 0 at one temperature
 */
public record Buoyancy(double byContent, double byTemperature) {
    /** Up to this share of the solute's, warmth changes the film by less than the film is known to. */
    private static final double SMALL = 0.1;

    public Buoyancy {
        Require.finite("density difference by content", byContent, "kg/m3");
        Require.finite("density difference by temperature", byTemperature, "kg/m3");
    }

    /** At one temperature. */
    public Buoyancy(double byContent) {
        this(byContent, 0);
    }

    /** Size of the difference, kg/m3. */
    public double size() {
        return Math.abs(byContent + byTemperature);
    }

    /**
     * Warmth spreads a hundred times quicker than solutes do and drives a thicker layer: the sum of the two is only an
     * estimate when warmth does more than a tenth (Gebhart and Pera 1971, from memory).
     */
    List<Caution> cautions() {
        if (Math.abs(byTemperature) <= SMALL * Math.abs(byContent)) {
            return List.of();
        }
        if (byContent * byTemperature < 0) {
            return List.of(new Caution.Note("temperature moves the liquor against its content, by "
                    + Figure.shown(byTemperature, "kg/m3") + " against " + Figure.shown(byContent, "kg/m3")
                    + ": the film may be anything between what either gives"));
        }
        return List.of(new Caution.Note("temperature moves the liquor too, by " + Figure.shown(byTemperature, "kg/m3")
                + " beside " + Figure.shown(byContent, "kg/m3") + " of the content: their sum is an estimate"));
    }
}
