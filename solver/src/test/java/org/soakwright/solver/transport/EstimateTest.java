package org.soakwright.solver.transport;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static org.soakwright.solver.transport.Check.assertRefused;
import static org.soakwright.solver.transport.Check.assertRelative;

import java.util.List;
import org.junit.jupiter.api.Test;

class EstimateTest {
    private static final Medium LIQUOR = Liquors.ofSchmidt(1000);

    @Test
    void twoMotionsTogetherAreMoreThanEither() {
        Estimate past = Film.past(new Body.Plate(0.1), LIQUOR, 0.02);
        Estimate still = Film.still(new Body.Plate(0.1), LIQUOR, new Buoyancy(3));
        Estimate both = Film.together(past, still);
        assertTrue(both.coefficient() > past.coefficient() && both.coefficient() > still.coefficient());
        assertTrue(both.coefficient() < past.coefficient() + still.coefficient());
        assertEquals(List.of(Correlation.PLATE_LAMINAR, Correlation.STANDING_PLATE), both.correlations());
        assertEquals(past.groups().reynolds(), both.groups().reynolds());
        assertRelative(still.groups().grashof(), both.groups().grashof(), 1e-14, "Gr");
        assertRelative(
                both.coefficient() * 0.1 / LIQUOR.diffusivity(), both.groups().sherwood(), 1e-14, "Sh");
    }

    /** Two equal cubes: a film of 2^(1/3). */
    @Test
    void equalMotionsAddByTheirCubes() {
        Estimate one = Film.past(new Body.Sphere(0.01), LIQUOR, 0.1);
        assertRelative(Math.cbrt(2), Film.together(one, one).coefficient() / one.coefficient(), 1e-15, "factor");
    }

    @Test
    void theStrongerOneWinsWhenTheOtherIsWeak() {
        Estimate quick = Film.past(new Body.Sphere(0.01), LIQUOR, 1);
        Estimate still = Film.still(new Body.Sphere(0.01), LIQUOR, new Buoyancy(0.01));
        assertRelative(quick.coefficient(), Film.together(quick, still).coefficient(), 0.01, "quick");
    }

    @Test
    void cautionsOfBothAreKeptOnce() {
        Fluid cold = Solution.brine().fluid(0.05, 275);
        Medium medium = new Medium(cold, 9e-10);
        Estimate both = Film.together(
                Film.past(new Body.Plate(0.1), medium, 0.05), Film.still(new Body.Plate(0.1), medium, new Buoyancy(1)));
        assertEquals(cold.cautions(), both.cautions());
    }

    /** Brine of 5 % at 8 C running past a fillet of 0.2 m at 5 cm/s: some 1e-6 to 1e-5 m/s, as plants find. */
    @Test
    void aFilmOfAPlantHasTheRightSize() {
        Medium brine = new Medium(Solution.brine().fluid(0.05, 281.15), 1e-9);
        Estimate film = Film.past(new Body.Plate(0.2), brine, 0.05);
        assertTrue(film.coefficient() > 1e-6 && film.coefficient() < 1e-5, "film " + film.coefficient());
        assertTrue(film.inside());
    }

    @Test
    void aFilmOfNothingIsRefused() {
        Groups groups = new Groups(0.1, 1, 1, 0, 1);
        assertRefused(
                "film coefficient must be above 0 and finite, found 0.0 m/s",
                () -> new Estimate(0, groups, List.of(), 0, List.of()));
    }

    @Test
    void aCautionMustBeOne() {
        assertRefused(
                "temperature 5.0 K is not outside its range",
                () -> new Caution.Outside("temperature", 5, 0, 10, "K", "x"));
    }
}
