package org.soakwright.planner.batch;

import org.soakwright.recipes.model.Per;
import org.soakwright.recipes.model.Phase;
import org.soakwright.recipes.model.Quantity;
import org.soakwright.recipes.model.Reading;
import org.soakwright.recipes.text.Place;
import org.soakwright.recipes.text.Unit;
import org.soakwright.recipes.text.Unsound;

/** A number worked out of more than one reading, or of a reading and the mass of the pieces; SI. */
sealed interface Measure {
    Dual read(State state);

    /** The grade read, from 0; -1 for the lot. */
    int grade();

    /** kg per kg of piece as loaded: less than this is nothing, and against nothing no content is counted. */
    double NOTHING = 1e-9;

    /**
     * One over the other.
     *
     * @param what is below
     * @param place of the target
     * @throws Unsound where nothing is below
     */
    private static Dual ratio(Dual above, Dual below, String what, Place place) {
        if (below.value() > NOTHING) {
            return above.over(below);
        }
        throw new Unsound(
                place,
                "the target counts against " + what
                        + ", and there is none where it is read: found " + shown(below.value())
                        + " kg per kg of piece as loaded; count per loaded, or read another place");
    }

    private static String shown(double value) {
        return Quantity.derived(value, Unit.ONE, Place.of("")).written();
    }

    /** The mass of the lot, kg. */
    record MassOfLot(Weighing weighing, double loadedKg) implements Measure {
        @Override
        public Dual read(State state) {
            return weighing.mass(state, -1).times(loadedKg);
        }

        @Override
        public int grade() {
            return -1;
        }
    }

    /** What a gauge of a species reads, kg per kg of the mass at present or of all in it that is not water. */
    record PerMass(Place place, Weighing weighing, int species, Gauge gauge, Per per) implements Measure {
        @Override
        public Dual read(State state) {
            Dual content = weighing.perLoaded(state.read(species, gauge));
            Dual mass = weighing.mass(state, gauge.grade());
            boolean dry = per == Per.DRY;
            String what = dry ? "the dry mass" : "the mass at present";
            Dual counted = dry ? mass.minus(weighing.water(state, gauge.grade(), Reading.MEAN)) : mass;
            Dual ratio = ratio(content, counted, what, place);
            if (isMean() && ratio.value() > 1 + NOTHING) {
                throw new Unsound(
                        place,
                        what + " is less than what the target finds in it: found " + shown(ratio.value())
                                + " kg per kg; correct the gains, the moisture or the contents of the recipe");
            }
            return ratio;
        }

        private boolean isMean() {
            return gauge instanceof Gauge.OfLot
                    || (gauge instanceof Gauge.Average average && average.reading() == Reading.MEAN);
        }

        @Override
        public int grade() {
            return gauge.grade();
        }
    }

    /** The same beside the water that is there: over both, or over the water alone. Where the water is a species, it is read where the solute is. */
    record InPhase(Place place, Weighing weighing, int species, Gauge gauge, Reading reading, Phase phase)
            implements Measure {
        @Override
        public Dual read(State state) {
            return of(
                    weighing.perLoaded(state.read(species, gauge)),
                    weighing.water(state, gauge.grade(), reading),
                    phase,
                    place);
        }

        @Override
        public int grade() {
            return gauge.grade();
        }

        static Dual of(Dual solute, Dual water, Phase phase, Place place) {
            return ratio(solute, phase == Phase.WATER ? solute.plus(water) : water, "water", place);
        }
    }

    /**
     * The highest or lowest of a phase anywhere in a grade's pieces, averaged by mass, where the water is a species.
     *
     * @param pieces of one side
     */
    record ExtremeOfPhase(
            Place place, Weighing weighing, int species, Population pieces, int grade, boolean highest, Phase phase)
            implements Measure {
        @Override
        public Dual read(State state) {
            Dual sum = state.number(0);
            for (int i = 0; i < pieces.count(); i++) {
                Extreme extreme = new Extreme(state, weighing, species, grade, pieces.first() + i, phase, place);
                sum = sum.plus(extreme.read(highest).times(pieces.weight(i)));
            }
            return sum;
        }
    }

    /** Highest less lowest of a phase. */
    record Between(Measure highest, Measure lowest) implements Measure {
        @Override
        public Dual read(State state) {
            return highest.read(state).minus(lowest.read(state));
        }

        @Override
        public int grade() {
            return highest.grade();
        }
    }
}
