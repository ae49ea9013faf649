package org.soakwright.solver.finitevolume;

/**
 * Equal bodies of a lot.
 *
 * @param power 0 between plates, 1 in a long cylinder, 2 in a sphere
 * @param length m, from the core to the wetted surface
 * @param volume m3, of all these bodies
 * @param coat what sets the surface apart
 */
record Body(int power, double length, double volume, Coat coat) {
    Body(int power, double length, double volume) {
        this(power, length, volume, Coat.NONE);
    }

    Body in(Coat other) {
        return new Body(power, length, volume, other);
    }
}
