package org.soakwright.solver.transport;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static org.soakwright.solver.transport.Check.ICE_POINT;
import static org.soakwright.solver.transport.Check.assertRefused;
import static org.soakwright.solver.transport.Check.assertRelative;
import static org.soakwright.solver.transport.Check.texts;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class AirTest {
    /** IAPWS-IF97, table 35 (read): 0.353658941e-2 MPa at 300 K. */
    @Test
    void saturationIsReproducedAtItsCheckValue() {
        assertEquals(0.353658941e4, Air.saturationPressure(300).value(), 0.5e-5);
    }

    /** Buck 1981 with his revision of 1996 (read), within 0.05 % up to 90 C. */
    @ParameterizedTest
    @CsvSource({"0", "5", "20", "40", "60", "90"})
    void saturationIsThatOfTheMeteorologists(double celsius) {
        double buck = 611.21 * Math.exp((18.678 - celsius / 234.5) * (celsius / (257.14 + celsius)));
        Quantity pressure = Air.saturationPressure(ICE_POINT + celsius);
        assertRelative(buck, pressure.value(), 5e-4, "at " + celsius);
        assertTrue(pressure.within() >= 5e-4);
    }

    /**
     * Geankoplis, Transport Processes and Unit Operations, 3rd ed., chapter 9, chart of humidity (read): kg/kg at
     * saturation.
     */
    @ParameterizedTest
    @CsvSource({"26.7, 0.0225, 0.0003", "28.9, 0.026, 0.0006", "40.5, 0.0505, 0.0003"})
    void saturatedAirHoldsSoMuchWater(double celsius, double printed, double chart) {
        assertEquals(printed, new Air(ICE_POINT + celsius, 1).humidityRatio().value(), chart);
    }

    /**
     * Geankoplis, 3rd ed., example 9.3-1 (read): 2.76 kPa of vapour at 26.7 C, where 3.50 saturate, are 0.01742 kg/kg.
     */
    @Test
    void humidityIsThatOfAWorkedExample() {
        Air air = new Air(
                ICE_POINT + 26.7,
                2.76 / (Air.saturationPressure(ICE_POINT + 26.7).value() / 1000));
        assertEquals(2760, air.vapourPressure(), 1e-9);
        assertEquals(0.01742, air.humidityRatio().value(), 1e-5);
    }

    /** Geankoplis, 3rd ed., equation 9.3-7 (read): humid volume (2.83e-3 + 4.56e-3 H) T m3 per kg of dry air. */
    @ParameterizedTest
    @CsvSource({"10, 0.5", "20, 0", "20, 0.6", "40, 0.8", "60, 0.3"})
    void densityIsThatOfTheHumidVolume(double celsius, double humidity) {
        Air air = new Air(ICE_POINT + celsius, humidity);
        double ratio = air.humidityRatio().value();
        double volume = (2.83e-3 + 4.56e-3 * ratio) * (ICE_POINT + celsius);
        assertRelative((1 + ratio) / volume, air.density().value(), 3e-3, "density");
    }

    /** Dry air of 20 C and 1 atm weighs 1.204 kg/m3 (handbooks, from memory). */
    @Test
    void dampAirIsLighterAndThinnerThanDry() {
        Air dry = new Air(293.15, 0);
        assertEquals(1.204, dry.density().value(), 0.5e-3);
        for (double humidity = 0; humidity < 0.95; humidity += 0.1) {
            Air damp = new Air(333.15, humidity);
            Air damper = new Air(333.15, humidity + 0.1);
            assertTrue(damper.density().value() < damp.density().value());
            assertTrue(damper.viscosity().value() < damp.viscosity().value());
        }
    }

    /** Incropera and DeWitt, table A.4 (read): 184.6e-7 Pa s at 300 K. */
    @Test
    void dryAirIsAsThickAsPrinted() {
        assertRelative(184.6e-7, new Air(300, 0).viscosity().value(), 1e-3, "viscosity");
    }

    /**
     * IAPWS R12-08, check values at 1 kg/m3 (from memory): 32.619287 uPa s at 873.15 K, 14.538324 at 433.15 K, where
     * crowding makes steam up to a percent thinner than the dilute gas.
     */
    @Test
    void vapourIsAsThickAsTheReleaseSays() {
        assertRelative(32.619287e-6, Gas.vapourViscosity(873.15), 2e-3, "873 K");
        double crowded = 14.538324e-6 / Gas.vapourViscosity(433.15);
        assertTrue(crowded < 1 && crowded > 0.99, "by " + crowded);
    }

    @Test
    void aMixtureOfOneGasIsThatGas() {
        assertRelative(Gas.airViscosity(300), Gas.mixed(1, Gas.airViscosity(300), 29, 1e-5, 18), 1e-15, "first");
        assertRelative(1e-5, Gas.mixed(0, 2e-5, 29, 1e-5, 18), 1e-15, "second");
        assertRelative(1e-5, Gas.mixed(0.3, 1e-5, 18, 1e-5, 18), 1e-15, "twice the same");
    }

    /** Incropera and DeWitt, table A.8 (read): 0.26e-4 m2/s at 298 K, printed to two digits. */
    @Test
    void vapourSpreadsAsPrinted() {
        Quantity diffusivity = new Air(298, 0.5).vapourDiffusivity();
        assertEquals(0.26e-4, diffusivity.value(), 0.05e-4 * 0.26 + 0.005e-4);
        assertEquals(List.of(), diffusivity.cautions());
        assertEquals(
                List.of(
                        "temperature 275 K is outside 282 to 450 K, the range of the diffusivity of water vapour in air "
                                + "(Marrero and Mason 1972)"),
                texts(new Air(275, 0.5).vapourDiffusivity().cautions()));
    }

    @Test
    void whatIsNotMoistAirIsRefused() {
        assertRefused(
                "temperature must be from 273.15 to 373.15 K for moist air, found 263 K", () -> new Air(263, 0.5));
        assertRefused("relative humidity must be at most 1, found 1.1", () -> new Air(293, 1.1));
        assertRefused("relative humidity must be at least 0 and finite, found -0.1 1", () -> new Air(293, -0.1));
        String message = String.valueOf(assertThrows(IllegalArgumentException.class, () -> new Air(373.15, 1))
                .getMessage());
        assertTrue(
                message.startsWith("vapour pressure must be below the pressure of 101325.0 Pa, found 1014"), message);
        assertTrue(message.endsWith(" Pa: the air is all steam"), message);
    }
}
