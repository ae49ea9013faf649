package org.soakwright.solver.transport;

/** Lengths that stand for a body in a correlation. */
final class Equivalent {
    private Equivalent() {}

    /**
     * Diffusion from a body into unlimited liquor over its surface, per diffusivity, 1/m, taken from the sphere of the
     * same volume: no body of that volume loses less (Pólya and Szegő 1951, from memory). Cubes and cylinders as long
     * as wide lose 6 to 8 % more.
     */
    static double pureDiffusion(double volume, double area) {
        double radius = Math.cbrt(3 * volume / (4 * Math.PI));
        return 4 * Math.PI * radius / area;
    }

    /** The least girth that a body can turn to the flow, m. */
    static double girth(Body.Bounded body) {
        if (body instanceof Body.Brick brick) {
            double longest = Math.max(brick.thickness(), Math.max(brick.width(), brick.length()));
            return 2 * (brick.thickness() + brick.width() + brick.length() - longest);
        }
        if (body instanceof Body.ShortCylinder piece) {
            return Math.min(Math.PI * piece.diameter(), 2 * (piece.diameter() + piece.length()));
        }
        return Math.PI * body.equalSurface();
    }
}
