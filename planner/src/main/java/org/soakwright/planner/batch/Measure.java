package org.soakwright.planner.batch;

import org.soakwright.recipes.model.Per;
import org.soakwright.recipes.model.Phase;
import org.soakwright.recipes.model.Reading;

/** A number worked out of more than one reading, or of a reading and the mass of the pieces; SI. */
sealed interface Measure {
    Dual read(State state);

    /** The grade read, from 0; -1 for the lot. */
    int grade();

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
    record PerMass(Weighing weighing, int species, Gauge gauge, Per per) implements Measure {
        @Override
        public Dual read(State state) {
            Dual content = weighing.perLoaded(state.read(species, gauge));
            Dual mass = weighing.mass(state, gauge.grade());
            return content.over(per == Per.DRY ? mass.minus(weighing.water(state, gauge.grade(), Reading.MEAN)) : mass);
        }

        @Override
        public int grade() {
            return gauge.grade();
        }
    }

    /** The same beside the water that is there: over both, or over the water alone. Where the water is a species, it is read where the solute is. */
    record InPhase(Weighing weighing, int species, Gauge gauge, Reading reading, Phase phase) implements Measure {
        @Override
        public Dual read(State state) {
            return of(
                    weighing.perLoaded(state.read(species, gauge)),
                    weighing.water(state, gauge.grade(), reading),
                    phase);
        }

        @Override
        public int grade() {
            return gauge.grade();
        }

        static Dual of(Dual solute, Dual water, Phase phase) {
            return solute.over(phase == Phase.WATER ? solute.plus(water) : water);
        }
    }

    /**
     * The highest or lowest of a phase anywhere in a grade's pieces, averaged by mass, where the water is a species.
     *
     * @param pieces of one side
     */
    record ExtremeOfPhase(Weighing weighing, int species, Population pieces, int grade, boolean highest, Phase phase)
            implements Measure {
        @Override
        public Dual read(State state) {
            Dual sum = state.number(0);
            for (int i = 0; i < pieces.count(); i++) {
                Extreme extreme = new Extreme(state, weighing, species, pieces.first() + i, phase);
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
