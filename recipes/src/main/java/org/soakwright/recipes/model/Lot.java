package org.soakwright.recipes.model;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.UnaryOperator;
import org.jspecify.annotations.Nullable;
import org.soakwright.recipes.text.Place;
import org.soakwright.recipes.text.Unit;

/**
 * The product in the vessel: how much of it, in which grades.
 *
 * @param density of the piece as loaded; required with a mass, and wherever the recipe counts per mass
 * @param temperature of the product when it starts; null is not stated
 * @param moisture what part of the pieces is water, where no species is the water; null is not stated
 * @param thermalDiffusivity m2/s, above zero; null is not stated
 * @param grades one or more, of different names, whose shares sum to 1
 */
public record Lot(
        Place place,
        Amount amount,
        @Nullable Quantity density,
        @Nullable Quantity temperature,
        @Nullable Moisture moisture,
        @Nullable Quantity thermalDiffusivity,
        List<Grade> grades) {
    public Lot {
        grades = List.copyOf(grades);
        Rules.temperature(temperature);
        Rules.positive("a thermal diffusivity", thermalDiffusivity);
        LotRules.check(place, amount, density, grades);
    }

    /** A lot of which only the amount and the pieces are known. */
    public Lot(
            Place place,
            Amount amount,
            @Nullable Quantity density,
            @Nullable Quantity temperature,
            List<Grade> grades) {
        this(place, amount, density, temperature, null, null, grades);
    }

    /** With its quantities changed. */
    public Lot each(UnaryOperator<Quantity> change) {
        return new Lot(
                place,
                amount.each(change),
                Quantity.each(density, change),
                Quantity.each(temperature, change),
                moisture == null ? null : moisture.each(change),
                Quantity.each(thermalDiffusivity, change),
                grades.stream().map(grade -> grade.each(change)).toList());
    }

    /** The volume of all pieces, m3. */
    public double volumeM3() {
        if (amount instanceof Amount.ByVolume byVolume) {
            return byVolume.volume().si();
        }
        if (amount instanceof Amount.ByCount byCount) {
            double piecesPerM3 = grades.stream()
                    .mapToDouble(grade -> grade.share() / pieceM3(grade).orElseThrow())
                    .sum();
            return byCount.count() / piecesPerM3;
        }
        return ((Amount.Weighed) amount).kg() / densityKgPerM3();
    }

    /** The volume of the average piece of a grade: by its weight where it is stated, else by its sizes; empty for neither. */
    public OptionalDouble pieceM3(Grade grade) {
        return LotRules.pieceM3(grade, density);
    }

    /** The mass of all pieces as loaded, kg; empty without a density. */
    public OptionalDouble massKg() {
        if (amount instanceof Amount.Weighed weighed) {
            return OptionalDouble.of(weighed.kg());
        }
        return density == null ? OptionalDouble.empty() : OptionalDouble.of(volumeM3() * density.si());
    }

    public Optional<Grade> grade(String name) {
        return grades.stream().filter(grade -> grade.name().equals(name)).findFirst();
    }

    /** A content of the piece as kg/m3 of piece. */
    public double kgPerM3(Content content) {
        return content.basis() == Basis.PER_MASS ? content.si() * densityKgPerM3() : content.si();
    }

    /** A content of kg/m3 of piece as a number in the unit, by mass or by volume. */
    public double express(double kgPerM3, Unit unit) {
        return unit.fromSi(Basis.of(unit) == Basis.PER_MASS ? kgPerM3 / densityKgPerM3() : kgPerM3);
    }

    private double densityKgPerM3() {
        if (density == null) {
            throw new IllegalStateException("the lot has no density");
        }
        return density.si();
    }
}
