package org.soakwright.solver.transport;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.soakwright.solver.transport.Check.ICE_POINT;
import static org.soakwright.solver.transport.Check.assertRefused;
import static org.soakwright.solver.transport.Check.assertRelative;
import static org.soakwright.solver.transport.Check.texts;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class ScalingTest {
    /**
     * T/viscosity from 1.61e-9 m2/s at 25 C (Robinson and Stokes), computed apart at 30 digits with the viscosity of
     * IAPWS.
     */
    @ParameterizedTest
    @CsvSource({
        "0, 7.3265e-10",
        "4, 8.4984e-10",
        "10, 1.042e-9",
        "20, 1.4067e-9",
        "25, 1.61e-9",
        "40, 2.3057e-9",
        "60, 3.4356e-9",
        "80, 4.7938e-9"
    })
    void saltMovesQuickerInWarmWater(double celsius, double diffusivity) {
        Scaling salt = new Scaling.StokesEinstein(1.61e-9, 298.15);
        assertRelative(diffusivity, salt.at(ICE_POINT + celsius).value(), 1e-4, "at " + celsius);
    }

    /**
     * Treybal, Mass-Transfer Operations, table 2.2 (from memory): sodium chloride in water at 18 C, 0.05 kmol/m3,
     * 1.26e-9 m2/s; at infinite dilution it is some percent more.
     */
    @Test
    void theScaledDiffusivityIsWithinWhatItSays() {
        Quantity salt = new Scaling.StokesEinstein(1.61e-9, 298.15).at(ICE_POINT + 18);
        assertRelative(1.26e-9, salt.value(), salt.within(), "at 18 C");
    }

    /** Gómez and others 2015, J Food Eng 149:188 (abstract read): water in pork, 2 C and 12 C, 32.24 kJ/mol fitted. */
    @Test
    void porkFollowsItsActivationEnergy() {
        Scaling water = new Scaling.Arrhenius(5.96e-9, ICE_POINT + 2, 32.24e3);
        assertRelative(9.82e-9, water.at(ICE_POINT + 12).value(), 1e-2, "at 12 C");
    }

    /** Akoy 2014, Int Food Res J 21(5) (abstract read): moisture in mango, 60 C and 80 C, 37.99 kJ/mol fitted. */
    @Test
    void mangoFollowsItsActivationEnergy() {
        Scaling moisture = new Scaling.Arrhenius(4.97e-10, ICE_POINT + 60, 37.99e3);
        assertRelative(10.83e-10, moisture.at(ICE_POINT + 80).value(), 1e-2, "at 80 C");
    }

    /** Turhan and Kaletunç 1992 as listed by Floury and others 2010 (read): salt in white cheese, 4, 12.5 and 20 C. */
    @Test
    void measuredPointsAreMetAndJoined() {
        Scaling.Measured cheese = new Scaling.Measured(List.of(
                new Scaling.Point(ICE_POINT + 20, 4e-10),
                new Scaling.Point(ICE_POINT + 4, 2.1e-10),
                new Scaling.Point(ICE_POINT + 12.5, 3e-10)));
        assertRelative(2.1e-10, cheese.at(ICE_POINT + 4).value(), 1e-14, "coldest");
        assertRelative(3e-10, cheese.at(ICE_POINT + 12.5).value(), 1e-14, "middle");
        assertRelative(4e-10, cheese.at(ICE_POINT + 20).value(), 1e-14, "warmest");
        assertEquals(List.of(), cheese.at(ICE_POINT + 15).cautions());
        double last = 0;
        for (double celsius = 0; celsius < 30; celsius++) {
            double next = cheese.at(ICE_POINT + celsius).value();
            assertEquals(1, Math.signum(next - last));
            last = next;
        }
    }

    @Test
    void betweenTwoPointsItIsAnActivationEnergy() {
        Scaling energy = new Scaling.Arrhenius(1e-10, 280, 30e3);
        Scaling points = new Scaling.Measured(List.of(
                new Scaling.Point(280, 1e-10),
                new Scaling.Point(300, energy.at(300).value())));
        for (double t = 270; t < 310; t += 3) {
            assertRelative(energy.at(t).value(), points.at(t).value(), 1e-13, "at " + t);
        }
    }

    @Test
    void farFromWhatIsKnownIsCautioned() {
        Scaling points = new Scaling.Measured(List.of(new Scaling.Point(280, 1e-10), new Scaling.Point(290, 2e-10)));
        assertEquals(
                List.of("temperature 275 K is outside 280 to 290 K, the range of the measured diffusivities"),
                texts(points.at(275).cautions()));
        assertEquals(
                List.of(
                        "temperature 330 K is outside 250 to 310 K, the range of an activation energy stated in the middle "
                                + "of it"),
                texts(new Scaling.Arrhenius(1e-10, 280, 20e3).at(330).cautions()));
    }

    @Test
    void whatSaysNothingIsRefused() {
        assertRefused(
                "diffusivity needs at least two measured temperatures, found 1",
                () -> new Scaling.Measured(List.of(new Scaling.Point(280, 1e-10))));
        assertRefused(
                "measured temperatures must differ, found 280.0 K twice",
                () -> new Scaling.Measured(List.of(new Scaling.Point(280, 1e-10), new Scaling.Point(280, 2e-10))));
        assertRefused(
                "activation energy must be at least 0 and finite, found -1.0 J/mol",
                () -> new Scaling.Arrhenius(1e-10, 280, -1));
        assertRefused(
                "temperature must be from 253.15 to 383.15 K for liquid water (IAPWS SR6-08), found 450 K",
                () -> new Scaling.StokesEinstein(1e-10, 450));
    }
}
