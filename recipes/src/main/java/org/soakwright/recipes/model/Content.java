package org.soakwright.recipes.model;

import java.util.function.UnaryOperator;
import org.soakwright.recipes.text.Place;
import org.soakwright.recipes.text.Unit;
import org.soakwright.recipes.text.Unsound;

/**
 * How much of a species is in a piece or a liquor, zero or more: kg/kg, kg/m3, mol/m3 or a part of saturation in SI.
 *
 * @param per of a content of pieces by mass, what it is counted against
 */
public record Content(Quantity amount, Per per) {
    public Content {
        if (per == Per.PRESENT) {
            throw new Unsound(
                    amount.place(),
                    "a content is stated per loaded or per dry: found per present; as loaded both are one, write per:"
                            + " loaded");
        }
        if (per == Per.DRY && Basis.of(amount.unit()) != Basis.PER_MASS) {
            throw new Unsound(
                    amount.place(), "`per: dry` counts by mass: found \"" + amount + "\"; write such as 1.8 kg/kg");
        }
        Rules.require(per == Per.DRY ? Rules.ifNoDryContent(amount) : Rules.ifNoContent("a content", amount));
    }

    /** Per kg as loaded, or by volume. */
    public Content(Quantity amount) {
        this(amount, Per.LOADED);
    }

    public Basis basis() {
        return Basis.of(amount.unit());
    }

    public double si() {
        return amount.si();
    }

    public Unit unit() {
        return amount.unit();
    }

    public Place place() {
        return amount.place();
    }

    public Content each(UnaryOperator<Quantity> change) {
        return new Content(change.apply(amount), per);
    }

    @Override
    public String toString() {
        return amount.toString();
    }
}
