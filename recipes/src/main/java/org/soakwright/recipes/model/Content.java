package org.soakwright.recipes.model;

import org.soakwright.recipes.text.Place;
import org.soakwright.recipes.text.Unit;

/** How much of a species is in a piece or a liquor: kg/kg or kg/m3 in SI, zero or more. */
public record Content(Quantity amount) {
    public Content {
        Rules.require(Rules.ifNoContent("a content", amount));
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

    @Override
    public String toString() {
        return amount.toString();
    }
}
