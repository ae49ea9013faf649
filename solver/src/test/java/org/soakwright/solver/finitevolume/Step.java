package org.soakwright.solver.finitevolume;

/**
 * A step of constant conditions.
 *
 * @param kind what the bodies meet
 * @param seconds how long
 * @param diffusivity m2/s
 * @param partition content of a body over content around it at equilibrium
 * @param film m/s; infinite where there is no resistance; of no account at rest
 * @param volume m3 poured, where the liquor is limited
 * @param content kg/m3 of the liquor poured, of the unlimited liquor, or at equilibrium with air
 * @param flow m3/s running through, where it flows
 * @param feed kg/m3 of what runs in
 * @param clinging m3 taken along to the next liquor
 */
record Step(
        Kind kind,
        double seconds,
        double diffusivity,
        double partition,
        double film,
        double volume,
        double content,
        double flow,
        double feed,
        double clinging) {
    /** Surroundings that a body can meet. */
    enum Kind {
        CLOSED,
        FLOWING,
        UNLIMITED,
        AIR,
        REST;

        boolean limited() {
            return this == CLOSED || this == FLOWING;
        }
    }

    static Step rest(double seconds, double diffusivity, double partition) {
        return new Step(Kind.REST, seconds, diffusivity, partition, 0, 0, 0, 0, 0, 0);
    }

    static Step unlimited(double seconds, double diffusivity, double partition, double film, double content) {
        return new Step(Kind.UNLIMITED, seconds, diffusivity, partition, film, 0, content, 0, 0, 0);
    }

    boolean open() {
        return kind != Kind.REST && Double.isInfinite(film);
    }
}
