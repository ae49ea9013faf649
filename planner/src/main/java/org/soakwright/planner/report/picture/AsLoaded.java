package org.soakwright.planner.report.picture;

import java.util.Objects;
import java.util.Optional;
import java.util.OptionalDouble;
import org.soakwright.planner.batch.TargetState;
import org.soakwright.recipes.model.Counted;
import org.soakwright.recipes.model.Limits;
import org.soakwright.recipes.model.Moisture;
import org.soakwright.recipes.model.Per;
import org.soakwright.recipes.model.Phase;
import org.soakwright.recipes.model.Quantity;
import org.soakwright.recipes.model.Reading;
import org.soakwright.recipes.model.Recipe;
import org.soakwright.recipes.model.Species;
import org.soakwright.recipes.model.Start;
import org.soakwright.recipes.model.Target;

/** What a target on pieces, or on the mass of the lot, would have read before anything happened to them. */
final class AsLoaded {
    private final History history;
    private final Recipe recipe;
    private final Target.OfPieces target;
    private final int species;
    private final int grade;

    private AsLoaded(History history, Target.OfPieces target, int grade) {
        this.history = history;
        this.target = target;
        this.grade = grade;
        recipe = history.recipe();
        species = Watched.species(history, target.species().name());
    }

    /** In the target's unit; empty where only a distribution or a search through the piece would tell. */
    static OptionalDouble read(History history, TargetState state) {
        int grade = Watched.grade(history, state.grade().orElse(""));
        return state.target() instanceof Target.OfMass mass
                ? OptionalDouble.of(mass(history.recipe(), mass))
                : new AsLoaded(history, (Target.OfPieces) state.target(), grade).read();
    }

    private static double mass(Recipe recipe, Target.OfMass target) {
        Quantity like = target.atMost() != null ? target.atMost() : Objects.requireNonNull(target.atLeast());
        return like.unit().fromSi(target.ofStart() ? 1 : recipe.lot().massKg().orElseThrow());
    }

    private OptionalDouble read() {
        OptionalDouble start = history.readAtStart(species, grade, target);
        if (start.isEmpty() || target.counted().equals(Counted.AS_LOADED)) {
            return start.isEmpty()
                    ? start
                    : OptionalDouble.of(start.getAsDouble() / Bound.perTargetUnit(history, species, grade, target));
        }
        Limits limits = target.limits();
        double solute = perLoaded(species, start.getAsDouble());
        if (target.counted() instanceof Counted.OfPiece piece && piece.per() == Per.PRESENT) {
            return OptionalDouble.of(limits.unit().fromSi(solute));
        }
        boolean dry = target.counted() instanceof Counted.OfPiece;
        OptionalDouble water = water(dry ? Reading.MEAN : target.reading());
        if (water.isEmpty() || (!dry && target.reading() == Reading.RANGE)) {
            return OptionalDouble.empty();
        }
        boolean ofBoth = target.counted() instanceof Counted.InPhase in && in.phase() == Phase.WATER;
        double against = dry ? 1 - water.getAsDouble() : water.getAsDouble() + (ofBoth ? solute : 0);
        return against > 0 ? OptionalDouble.of(limits.unit().fromSi(solute / against)) : OptionalDouble.empty();
    }

    /** Of a reading in the unit of its species, kg per kg as loaded. */
    private double perLoaded(int of, double value) {
        Species one = recipe.species().get(of);
        double perKgPerM3 = recipe.lot().express(1, one.start().unit());
        return value
                / perKgPerM3
                / Objects.requireNonNull(recipe.lot().density()).si();
    }

    private OptionalDouble water(Reading reading) {
        Moisture moisture = recipe.lot().moisture();
        if (moisture != null) {
            return OptionalDouble.of(moisture.start().si());
        }
        Optional<Species> water = recipe.water();
        if (water.isEmpty() || (isSearchedFor(reading) && !isUniform(water.get()))) {
            return OptionalDouble.empty();
        }
        int of = recipe.species().indexOf(water.get());
        return OptionalDouble.of(
                perLoaded(of, grade < 0 ? history.lotMeans(of)[0] : history.readings(of, grade, reading)[0]));
    }

    /** Extremes of a share lie where neither part of it need be extreme. */
    private static boolean isSearchedFor(Reading reading) {
        return reading == Reading.HIGHEST || reading == Reading.LOWEST;
    }

    private static boolean isUniform(Species species) {
        return species.start() instanceof Start.Uniform;
    }
}
