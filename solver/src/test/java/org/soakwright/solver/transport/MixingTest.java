package org.soakwright.solver.transport;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static org.soakwright.solver.transport.Check.assertRefused;
import static org.soakwright.solver.transport.Check.assertRelative;
import static org.soakwright.solver.transport.Check.texts;
import static org.soakwright.solver.transport.Liquors.ofSchmidt;
import static org.soakwright.solver.transport.Liquors.speed;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class MixingTest {
    private static final double DIAMETER = 0.005;
    private static final Body.Sphere BEAD = new Body.Sphere(DIAMETER);

    private static Estimate bed(double reynolds, double schmidt, double voids) {
        return Film.packed(BEAD, ofSchmidt(schmidt), new Bed(speed(reynolds, DIAMETER), voids));
    }

    /** Wakao and Funazkri (read), computed apart at Re 10 and Sc 600; a gas here, so Sc is that of one. */
    @Test
    void aBedInGas() {
        double moving = (38.93543 - 2) * Math.cbrt(0.7 / 600);
        Estimate film = bed(10, 0.7, 0.4);
        assertRelative(2 + moving, film.groups().sherwood(), 1e-6, "bed");
        assertEquals(List.of(Correlation.BED), film.correlations());
    }

    /**
     * Geankoplis, 3rd ed., example 7.3-4, p 449 (result read; inputs from memory): benzoic acid spheres of 6.375 mm,
     * voids 0.436, 5.514e-7 m3/s through 66.7 mm; 4.55e-6 m/s computed, 4.665e-6 measured.
     */
    @Test
    void aBedOfAWorkedExample() {
        Medium water = new Medium(new Fluid(996.7, 0.8718e-3, 299), 1.2454e-9);
        double speed = 5.514e-7 / (Math.PI / 4 * 0.0667 * 0.0667);
        Estimate film = Film.packed(new Body.Sphere(6.375e-3), water, new Bed(speed, 0.436));
        assertEquals(1.150, film.groups().reynolds(), 0.005);
        assertEquals(702.3, film.groups().schmidt(), 0.5);
        assertEquals(4.55e-6, film.coefficient(), 0.01e-6);
        assertRelative(4.665e-6, film.coefficient(), 0.03, "measured");
        assertEquals(List.of(), film.cautions());
    }

    /** Dutta, Principles of Mass Transfer, example 3.8, p 104 (read): Re 185.26, Sc 950, voids 0.4, Sh 225.5428. */
    @Test
    void aQuickBedOfAWorkedExample() {
        Estimate film = bed(185.26, 950, 0.4);
        assertRelative(225.5428, film.groups().sherwood(), 2e-5, "bed, Re printed to five digits");
        assertEquals(List.of(Correlation.BED_QUICK), film.correlations());
    }

    @Test
    void aBedTurnsByStepsThatAreStated() {
        double step = 1e-9;
        double slow = bed(55 * (1 - step), 800, 0.4).coefficient();
        double quick = bed(55 * (1 + step), 800, 0.4).coefficient();
        assertEquals(0.96, quick / slow, 0.005);
        assertEquals(
                0.8,
                bed(1500 * (1 + step), 800, 0.35).coefficient()
                        / bed(1500, 800, 0.35).coefficient(),
                0.01);
        assertEquals(
                1.71,
                bed(1500 * (1 + step), 800, 0.75).coefficient()
                        / bed(1500, 800, 0.75).coefficient(),
                0.01);
    }

    /** Geankoplis, 3rd ed., example 9.10-1, p 559 (read): cylinders of 6.35 by 25.4 mm count as 13.47 mm. */
    @Test
    void aPieceInABedCountsAsTheSphereOfItsSurface() {
        Body.Bounded piece = new Body.ShortCylinder(6.35e-3, 25.4e-3);
        assertEquals(0.01347, piece.equalSurface(), 0.5e-5);
        Estimate film = Film.packed(piece, ofSchmidt(800), new Bed(0.001, 0.4));
        assertEquals(piece.equalSurface(), film.groups().length());
        assertEquals(
                Film.packed(new Body.Sphere(piece.equalSurface()), ofSchmidt(800), new Bed(0.001, 0.4))
                        .coefficient(),
                film.coefficient());
    }

    @Test
    void aBedThatHardlyMovesIsRaisedToDiffusion() {
        Estimate film = bed(0.0001, 200, 0.5);
        assertRelative(2, film.groups().sherwood(), 1e-14, "Sh");
        assertEquals(
                List.of(
                        "Reynolds number 0.0001 is outside 0.0016 to 55, the range of bed with slow liquor "
                                + "(Wilson and Geankoplis 1966)",
                        "bed with slow liquor (Wilson and Geankoplis 1966) gives 5.9174E-7 m/s, less than diffusion "
                                + "alone: raised to 0.000002 m/s"),
                texts(film.cautions()));
    }

    /**
     * Levins and Glastonbury, coefficients read: 1 W/kg, 1 mm, 1e-6 m2/s, 1.5e-9 m2/s, a third of the tank; 1.086053e-4
     * m/s.
     */
    @Test
    void suspendedBeads() {
        Medium liquor = new Medium(new Fluid(1000, 1e-3, 293), 1.5e-9);
        Estimate film = Film.suspended(new Body.Sphere(1e-3), liquor, new Stirring(1, 1.0 / 3));
        assertRelative(100, film.groups().reynolds(), 1e-12, "eddies");
        assertRelative(72.40351, film.groups().sherwood(), 1e-6, "Sh");
        assertRelative(1.086053e-4, film.coefficient(), 1e-6, "film");
    }

    /**
     * Geankoplis, 3rd ed., example 7.4-1, p 451 (result read; inputs from memory): oxygen from bubbles of 0.1 mm in
     * water at 37 C, 2.29e-4 m/s.
     */
    @Test
    void smallBubblesRise() {
        Medium water = new Medium(new Fluid(994, 6.947e-4, 310), 3.25e-9);
        Estimate film = Film.sinking(new Body.Sphere(1e-4), water, 994 - 1.13);
        assertRelative(2.289883e-4, film.coefficient(), 1e-4, "film");
        assertEquals(List.of(), film.cautions());
        assertEquals(
                List.of("diameter 0.002 m is above 0.0006 m, where small pieces that sink or rise "
                        + "(Calderbank and Moo-Young 1961) ends"),
                texts(Film.sinking(new Body.Sphere(2e-3), water, 100).cautions()));
    }

    /**
     * For pieces of some centimetres the two ways to a stirred tank agree to a third at the same power: one grows with
     * d^-0.17, the other does not know the size.
     */
    @ParameterizedTest
    @CsvSource({"0.01, 0.1", "0.02, 0.1", "0.02, 1", "0.05, 1"})
    void twoWaysToAStirredTankAgree(double diameter, double powerPerMass) {
        Medium liquor = ofSchmidt(700);
        Body.Sphere piece = new Body.Sphere(diameter);
        Estimate stirred = Film.stirred(piece, liquor, powerPerMass * Liquors.DENSITY);
        double suspended = Film.suspended(piece, liquor, new Stirring(powerPerMass, 1.0 / 3))
                .coefficient();
        assertRelative(suspended, stirred.coefficient(), stirred.within(), "film");
    }

    /** 0.13 (1 W/kg 1e-6 m2/s)^(1/4) 667^(-2/3) by hand: 5.386e-5 m/s, for a fillet as for a bead. */
    @Test
    void aStirredFilmKnowsNoSize() {
        Medium liquor = ofSchmidt(667);
        List<Body> bodies = List.of(
                new Body.Plate(0.2),
                new Body.Lying(0.2, 0.1),
                new Body.Cylinder(0.01),
                BEAD,
                new Body.Brick(0.01, 0.02, 0.03));
        for (Body body : bodies) {
            Estimate film = Film.stirred(body, liquor, 1000);
            assertRelative(5.386e-5, film.coefficient(), 2e-4, body.toString());
            assertEquals(
                    List.of("the range of pieces in stirred liquor (Calderbank and Moo-Young 1961) is not known here"),
                    texts(film.cautions()));
        }
    }

    @Test
    void strongerStirringAndQuickerFlowMakeStrongerFilms() {
        for (double strength = 1e-3; strength < 10; strength *= 3) {
            Stirring weak = new Stirring(strength, 0.4);
            Stirring strong = new Stirring(3 * strength, 0.4);
            Medium liquor = ofSchmidt(900);
            assertTrue(Film.suspended(BEAD, liquor, strong).coefficient()
                    > Film.suspended(BEAD, liquor, weak).coefficient());
            assertTrue(Film.stirred(BEAD, liquor, 3000 * strength).coefficient()
                    > Film.stirred(BEAD, liquor, 1000 * strength).coefficient());
            assertTrue(bed(30 * strength, 900, 0.4).coefficient()
                    > bed(10 * strength, 900, 0.4).coefficient());
        }
    }

    @Test
    void whatCannotBeIsRefused() {
        assertRefused("share of voids must be above 0 and below 1, found 1.0", () -> new Bed(0.1, 1));
        assertRefused("impeller over tank must be above 0 and below 1, found 0.0", () -> new Stirring(1, 0));
        assertRefused(
                "power per volume must be above 0 and finite, found 0.0 W/m3",
                () -> Film.stirred(BEAD, ofSchmidt(700), 0));
        assertRefused(
                "density difference must be at least 0 and finite, found -1.0 kg/m3",
                () -> Film.sinking(BEAD, ofSchmidt(700), -1));
    }
}
