package org.soakwright.recipes.model;

import java.util.Comparator;
import java.util.List;
import java.util.OptionalDouble;
import java.util.function.UnaryOperator;
import org.jspecify.annotations.Nullable;
import org.soakwright.recipes.text.Place;
import org.soakwright.recipes.text.Unsound;

/**
 * Pieces of one shape and, but for their spread, one size.
 *
 * @param sides one for each of the shape's dimensions, in their order; with a spread, those of the median by mass
 * @param share of the lot's mass, above 0 up to 1
 * @param weight of the average piece; null is not stated
 * @param spread of the size of the pieces, all sides alike; null is none
 * @param fit how well the spread describes the sizes measured; null where none were
 */
public record Grade(
        Place place,
        String name,
        Shape shape,
        List<Side> sides,
        double share,
        @Nullable Quantity weight,
        @Nullable Spread spread,
        @Nullable Fit fit) {
    public Grade {
        Rules.named("a grade", name, place);
        sides = List.copyOf(sides);
        List<Dimension> measured = sides.stream().map(Side::dimension).toList();
        if (!measured.equals(shape.dimensions())) {
            throw new Unsound(
                    place,
                    "the sides of a " + shape.word() + " are " + Word.list(shape.dimensions()) + ": found "
                            + Word.list(measured));
        }
        if (!(share > 0 && share <= 1)) {
            throw new Unsound(place, "a share lies above 0 % and up to 100 %: found " + Rules.percent(share));
        }
        Rules.positive("the weight", weight);
    }

    /** With its sizes and its weight changed. */
    public Grade each(UnaryOperator<Quantity> change) {
        List<Side> changed = sides.stream().map(side -> side.each(change)).toList();
        return new Grade(place, name, shape, changed, share, Quantity.each(weight, change), spread, fit);
    }

    /** The side whose solute has the shortest way out; the first of several. */
    public Side shortest() {
        return sides.stream().min(Comparator.comparingDouble(Side::depth)).orElseThrow();
    }

    /** Metres from the wetted face of the shortest side to the core. */
    public double depth() {
        return shortest().depth();
    }

    /** The direction of diffusion of one of its sides; null for a sphere, which has none. */
    public @Nullable Grain grain(Side side) {
        return shape.grain(side.dimension());
    }

    /** The volume of a piece of the sizes stated; empty for a slab and a long cylinder. */
    public OptionalDouble volumeM3() {
        return shape.isFinite()
                ? OptionalDouble.of(shape.volumeM3(
                        sides.stream().mapToDouble(side -> side.size().si()).toArray()))
                : OptionalDouble.empty();
    }

    /**
     * The volume of the average piece: with a spread it is smaller than that of the sizes stated, which are the median by mass.
     */
    public OptionalDouble averageM3() {
        OptionalDouble volume = volumeM3();
        return spread == null || volume.isEmpty()
                ? volume
                : OptionalDouble.of(volume.getAsDouble() * spread.averagePerMedianVolume());
    }
}
