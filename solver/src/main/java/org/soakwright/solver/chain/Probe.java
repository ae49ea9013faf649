package org.soakwright.solver.chain;

import org.soakwright.solver.Require;

/** What can be read at the end of a stage: contents of pieces in kg/m3 of piece, of the liquor in kg/m3. */
public sealed interface Probe {
    /** The grade read; -1 where it is not one grade. */
    default int grade() {
        return -1;
    }

    /** The same reading of another grade. */
    default Probe of(int other) {
        if (this instanceof At at) {
            return new At(other, at.position);
        }
        if (this instanceof Core) {
            return new Core(other);
        }
        if (this instanceof Surface) {
            return new Surface(other);
        }
        if (this instanceof Highest) {
            return new Highest(other);
        }
        if (this instanceof Lowest) {
            return new Lowest(other);
        }
        if (this instanceof Range) {
            return new Range(other);
        }
        return new Mean(other);
    }

    /** Mean over one grade's pieces. */
    record Mean(int grade) implements Probe {}

    /** Mean over the lot, by volume. */
    record LotMean() implements Probe {}

    /** Where every end that exchanges is farthest: the core, a sealed face, the middle between two faces. */
    record Core(int grade) implements Probe {}

    /**
     * At one place of one grade's pieces, on the shortest way from the core to the surface; where that lies between two faces, from back to
     * front.
     *
     * @param position 0, the core, sealed face or back, to 1, the wetted surface
     */
    record At(int grade, double position) implements Probe {
        public At {
            Require.notNegative("position", position, "1");
            if (position > 1) {
                throw new IllegalArgumentException("position must be at most 1, found " + position);
            }
        }
    }

    /** Mean over the wetted surface of one grade's pieces. */
    record Surface(int grade) implements Probe {}

    /** Largest content anywhere in one grade's pieces. */
    record Highest(int grade) implements Probe {}

    /** Smallest content anywhere in one grade's pieces. */
    record Lowest(int grade) implements Probe {}

    /** Highest less lowest. */
    record Range(int grade) implements Probe {}

    /** The liquor last met. */
    record Liquor() implements Probe {}
}
