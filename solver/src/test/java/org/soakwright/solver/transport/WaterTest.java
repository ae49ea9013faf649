package org.soakwright.solver.transport;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static org.soakwright.solver.transport.Check.ICE_POINT;
import static org.soakwright.solver.transport.Check.assertRefused;
import static org.soakwright.solver.transport.Check.assertRelative;
import static org.soakwright.solver.transport.Check.texts;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class WaterTest {
    /**
     * IAPWS SR6-08, table 8: 997.047013 kg/m3 at 298.15 K (read as a quotation); its viscosity there, 889.996773679 uPa
     * s, from memory; 260 K as printed by another implementation of the release.
     */
    @Test
    void theReleaseIsReproducedAtItsCheckValues() {
        assertEquals(997.047013, Water.density(298.15).value(), 0.5e-6);
        assertEquals(889.996773679e-6, Water.viscosity(298.15).value(), 0.5e-15);
        assertEquals(997.0683602710492, Water.density(260).value(), 1e-9);
        assertEquals(
                889.996773679e-6 / 997.047013, Water.kinematicViscosity(298.15).value(), 1e-15);
    }

    /**
     * Tanaka and others 2001, Metrologia 38:301, the formula of the CIPM for 0 C to 40 C at 1 atm, good to a part in a
     * million (from memory); 0.1 MPa is 0.6 parts in a million less.
     */
    @ParameterizedTest
    @CsvSource({"0.5", "4", "10", "20", "30", "40"})
    void densityIsThatOfTheMetrologists(double celsius) {
        double off = celsius - 3.983035;
        double cipm = 999.974950 * (1 - off * off * (celsius + 301.797) / (522528.9 * (celsius + 69.34881)));
        assertRelative(cipm, Water.density(ICE_POINT + celsius).value(), 2e-6, "density at " + celsius);
    }

    /** Standard Handbook of Petroleum and Natural Gas Engineering, table 5-1 (read), mPa s. */
    @ParameterizedTest
    @CsvSource({
        "0, 1.787",
        "10, 1.307",
        "20, 1.002",
        "30, 0.7975",
        "40, 0.6529",
        "50, 0.5468",
        "60, 0.4665",
        "70, 0.4042",
        "80, 0.3547",
        "90, 0.3147",
        "100, 0.2818"
    })
    void viscosityIsThatOfAHandbook(double celsius, double printed) {
        assertRelative(1e-3 * printed, Water.viscosity(ICE_POINT + celsius).value(), 3e-3, "at " + celsius);
    }

    /** 207e-6 1/K at 20 C and 257e-6 at 25 C stand in many handbooks (from memory); densest at 3.98 C. */
    @Test
    void waterExpandsAboveFourDegreesAndShrinksBelow() {
        assertEquals(207e-6, Water.expansion(ICE_POINT + 20).value(), 1e-6);
        assertEquals(257e-6, Water.expansion(ICE_POINT + 25).value(), 1e-6);
        assertTrue(Water.expansion(ICE_POINT + 3.97).value() < 0);
        assertTrue(Water.expansion(ICE_POINT + 3.99).value() > 0);
    }

    @ParameterizedTest
    @CsvSource({"0", "15", "60", "99"})
    void expansionIsTheSlopeOfTheDensity(double celsius) {
        double step = 0.01;
        double warm = Water.density(ICE_POINT + celsius + step).value();
        double cold = Water.density(ICE_POINT + celsius - step).value();
        double slope =
                (cold - warm) / (2 * step) / Water.density(ICE_POINT + celsius).value();
        assertEquals(slope, Water.expansion(ICE_POINT + celsius).value(), 1e-9);
    }

    @Test
    void warmerWaterIsThinner() {
        for (double t = 254; t < 383; t++) {
            assertTrue(Water.viscosity(t + 1).value() < Water.viscosity(t).value(), "at " + t);
        }
    }

    @Test
    void whatTheReleaseDoesNotCoverIsRefused() {
        String message = "temperature must be from 253.15 to 383.15 K for liquid water (IAPWS SR6-08), found 400 K";
        assertRefused(message, () -> Water.density(400));
        assertRefused(message.replace("400", "NaN"), () -> Water.viscosity(Double.NaN));
    }

    @Test
    void waterThatMightFreezeIsCautioned() {
        assertEquals(
                List.of("temperature 270 K is outside 273.15 to 373.12 K, the range of water that stays liquid"),
                texts(Water.fluid(270).cautions()));
        assertEquals(List.of(), Water.fluid(280).cautions());
    }
}
