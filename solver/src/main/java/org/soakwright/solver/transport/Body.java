package org.soakwright.solver.transport;

import org.soakwright.solver.Require;

/** A piece as the liquor meets it; lengths in m, above 0. */
public sealed interface Body {
    /**
     * The least film coefficient over diffusivity, 1/m: what diffusion alone carries into unlimited liquor once it is
     * steady; 0 for bodies without end.
     */
    double pureDiffusion();

    /** A body that ends on every side. */
    sealed interface Bounded extends Body {
        /** Whole surface, m2. */
        double area();

        /** Longest over shortest side, 1. */
        double aspect();

        /** Diameter of the sphere of the same surface, m. */
        default double equalSurface() {
            return Math.sqrt(area() / Math.PI);
        }
    }

    /**
     * A flat face that the liquor runs along; in still liquor it stands.
     *
     * @param length of the way along it: in the direction of the flow, or its height in still liquor
     */
    record Plate(double length) implements Body {
        public Plate {
            Require.positive("length", length, "m");
        }

        @Override
        public double pureDiffusion() {
            return 0;
        }
    }

    /**
     * A thin flat piece that lies, wet above and below, in a liquor that reaches both.
     *
     * @param length in the direction of the flow, if there is one
     * @param width across
     */
    record Lying(double length, double width) implements Body {
        public Lying {
            Require.positive("length", length, "m");
            Require.positive("width", width, "m");
        }

        /**
         * That of a disc of the same area, 8 D times its radius over both faces: no flat piece of that area has less
         * (Pólya and Szegő 1951, from memory).
         */
        @Override
        public double pureDiffusion() {
            return 4 / Math.sqrt(Math.PI * length * width);
        }
    }

    /** A long cylinder: across the flow, lying in still liquor. */
    record Cylinder(double diameter) implements Body {
        public Cylinder {
            Require.positive("diameter", diameter, "m");
        }

        @Override
        public double pureDiffusion() {
            return 0;
        }
    }

    /** A sphere. */
    record Sphere(double diameter) implements Bounded {
        public Sphere {
            Require.positive("diameter", diameter, "m");
        }

        @Override
        public double area() {
            return Math.PI * diameter * diameter;
        }

        @Override
        public double aspect() {
            return 1;
        }

        /** Sh = 2. */
        @Override
        public double pureDiffusion() {
            return 2 / diameter;
        }
    }

    /** A cylinder whose ends count. */
    record ShortCylinder(double diameter, double length) implements Bounded {
        public ShortCylinder {
            Require.positive("diameter", diameter, "m");
            Require.positive("length", length, "m");
        }

        @Override
        public double area() {
            return Math.PI * diameter * (length + diameter / 2);
        }

        @Override
        public double aspect() {
            return Math.max(diameter, length) / Math.min(diameter, length);
        }

        @Override
        public double pureDiffusion() {
            return Equivalent.pureDiffusion(Math.PI / 4 * diameter * diameter * length, area());
        }
    }

    /** A brick. */
    record Brick(double thickness, double width, double length) implements Bounded {
        public Brick {
            Require.positive("thickness", thickness, "m");
            Require.positive("width", width, "m");
            Require.positive("length", length, "m");
        }

        @Override
        public double area() {
            return 2 * (thickness * width + width * length + length * thickness);
        }

        @Override
        public double aspect() {
            double longest = Math.max(thickness, Math.max(width, length));
            return longest / Math.min(thickness, Math.min(width, length));
        }

        @Override
        public double pureDiffusion() {
            return Equivalent.pureDiffusion(thickness * width * length, area());
        }
    }
}
