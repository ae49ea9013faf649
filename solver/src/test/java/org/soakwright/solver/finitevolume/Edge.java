package org.soakwright.solver.finitevolume;

/**
 * One way out of a body of several.
 *
 * @param power 0 towards a plate's face, 1 radially in a cylinder, 2 in a sphere
 * @param length m, from the core to the wetted face
 * @param direction which of a phase's factors holds along it
 * @param twoFaced whether it goes from face to face instead, the back at 0; its length is then the thickness
 */
record Edge(int power, double length, int direction, boolean twoFaced) {
    Edge(int power, double length, int direction) {
        this(power, length, direction, false);
    }

    double depth() {
        return twoFaced ? length / 2 : length;
    }

    /** Node or place of the core, over the whole length. */
    double core() {
        return twoFaced ? 0.5 : 0;
    }
}
