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

class BrineTest {
    private static final Solution BRINE = Solution.brine();
    private static final double ROOM = ICE_POINT + 20;

    /**
     * CRC Handbook of Chemistry and Physics, 102nd ed., concentrative properties at 20 C (read): kg/m3, mPa s, mol/L.
     */
    @ParameterizedTest
    @CsvSource({
        "0.01, 1005.3, 1.020, 0.172", "0.02, 1012.5, 1.036, 0.346", "0.05, 1034.0, 1.085, 0.885",
        "0.10, 1070.7, 1.193, 1.832", "0.15, 1108.5, 1.352, 2.845", "0.20, 1147.8, 1.557, 3.928",
        "0.25, 1188.7, 1.902, 5.085", "0.26, 1197.2, 1.990, 5.326"
    })
    void brineIsThatOfTheHandbook(double fraction, double density, double viscosity, double molarity) {
        assertRelative(density, BRINE.density(fraction, ROOM).value(), 5e-4, "density");
        assertRelative(1e-3 * viscosity, BRINE.viscosity(fraction, ROOM).value(), 1.5e-2, "viscosity");
        assertEquals(molarity, 1e-3 * BRINE.molarity(fraction, ROOM).value(), 2.5e-3, "mol/L");
    }

    /**
     * International Critical Tables as in Perry's Chemical Engineers' Handbook (from memory), kg/m3 at 0, 10, 25, 40,
     * 60, 80 and 100 C. The column of 10 C was also read, in a copy that heads it 15 C.
     */
    @ParameterizedTest
    @CsvSource({
        "0.01, 1007.47, 1007.07, 1004.09, 999.08, 990.0, 978.5, 965.1",
        "0.04, 1030.38, 1029.20, 1025.30, 1019.77, 1010.3, 998.8, 985.5",
        "0.12, 1092.44, 1089.46, 1083.65, 1076.99, 1066.7, 1054.9, 1042.0",
        "0.20, 1156.63, 1152.54, 1145.33, 1137.74, 1126.8, 1114.6, 1101.7",
        "0.26, 1207.09, 1202.54, 1194.43, 1186.14, 1174.7, 1162.6, 1149.2"
    })
    void warmBrineIsLighter(
            double fraction,
            double at0,
            double at10,
            double at25,
            double at40,
            double at60,
            double at80,
            double at100) {
        double[] celsius = {0, 10, 25, 40, 60, 80, 100};
        double[] printed = {at0, at10, at25, at40, at60, at80, at100};
        for (int i = 0; i < celsius.length; i++) {
            double tolerance = celsius[i] <= 60 ? 1e-3 : 2.5e-3;
            Quantity density = BRINE.density(fraction, ICE_POINT + celsius[i]);
            assertRelative(printed[i], density.value(), tolerance, "at " + celsius[i]);
            assertTrue(tolerance <= density.within());
        }
    }

    /**
     * Sea water of 35 g/kg thins with warmth as brine of the same strength does, being 2.2 % thicker at 20 C: 1.906, 1.397,
     * 1.220, 1.077 and 0.861 mPa s at 0, 10, 15, 20 and 30 C (ITTC, from memory).
     */
    @ParameterizedTest
    @CsvSource({"0, 1.906", "10, 1.397", "15, 1.220", "30, 0.861"})
    void brineThinsWithWarmthAsTheSeaDoes(double celsius, double sea) {
        double thinner = BRINE.viscosity(0.035, ICE_POINT + celsius).value()
                / BRINE.viscosity(0.035, ROOM).value();
        assertRelative(sea / 1.077, thinner, 3e-3, "at " + celsius);
    }

    /** Pitzer's equation with his parameters of 25 C (0.0765, 0.2664, 0.00127), computed apart. */
    @ParameterizedTest
    @CsvSource({"0.01, 0.99426", "0.05, 0.97021", "0.10, 0.93515", "0.15, 0.89234", "0.20, 0.83936", "0.264, 0.75268"})
    void waterActivityIsThatOfPitzer(double fraction, double activity) {
        assertEquals(activity, BRINE.waterActivity(fraction, 298.15).value(), 3e-4);
    }

    /** FDA Fish and Fishery Products Hazards and Controls Guidance, table A-1: 5 % goes with 0.97, 10 % with 0.935. */
    @Test
    void theFoodInspectorsPairsHold() {
        assertEquals(0.97, BRINE.waterActivity(0.05, 298.15).value(), 1e-3);
        assertEquals(0.935, BRINE.waterActivity(0.10, 298.15).value(), 1e-3);
    }

    /**
     * Freezing points of the CRC Handbook (read), K below 0 C, turned into the activity over ice: -log10 a = 0.004207 d
     * + 2.1e-6 d^2 (Robinson and Stokes, Electrolyte Solutions, from memory).
     */
    @ParameterizedTest
    @CsvSource({"0.02, 1.19", "0.05, 3.05", "0.10, 6.56"})
    void coldBrineFreezesWhereItsWaterActivitySays(double fraction, double depression) {
        double ice = Math.pow(10, -(0.004207 * depression + 2.1e-6 * depression * depression));
        Quantity activity = BRINE.waterActivity(fraction, ICE_POINT);
        assertRelative(ice, activity.value(), 2e-3, "activity");
        assertTrue(activity.within() >= 2e-3);
    }

    /** CRC Handbook, solubility of inorganic compounds by temperature (from memory), mass percent. */
    @ParameterizedTest
    @CsvSource({"0, 26.28", "10, 26.32", "20, 26.41", "30, 26.52", "40, 26.67", "60, 27.03", "80, 27.50", "100, 28.05"})
    void soMuchSaltDissolves(double celsius, double percent) {
        Quantity saturation = BRINE.saturation(ICE_POINT + celsius);
        assertRelative(percent / 100, saturation.value(), 3e-3, "saturation");
        assertTrue(saturation.within() >= 3e-3);
    }

    /** 26.4 % at 20 C is 100 degrees of the salometer (food industry, from memory). */
    @Test
    void fullBrineIsFull() {
        assertEquals(1, BRINE.degreeOfSaturation(0.264, ROOM).value(), 3e-3);
        assertEquals(
                0.5,
                BRINE.degreeOfSaturation(BRINE.saturation(ROOM).value() / 2, ROOM)
                        .value(),
                1e-15);
        Quantity full = BRINE.saturationContent(ROOM);
        assertEquals(full.value(), BRINE.saturation(ROOM).value() * 1200.5, 0.5);
    }

    @Test
    void aContentTellsTheFractionThatHasIt() {
        for (double celsius : new double[] {0, 4, 20, 60, 100}) {
            for (double fraction : new double[] {0, 1e-6, 0.01, 0.1, 0.2, 0.26, 0.3}) {
                double content = BRINE.content(fraction, ICE_POINT + celsius).value();
                double back = BRINE.fraction(content, ICE_POINT + celsius).value();
                assertEquals(fraction, back, 1e-15, celsius + " C, " + fraction);
            }
        }
    }

    @Test
    void withoutSaltBrineIsWater() {
        for (double t = 274; t < 373; t += 7) {
            assertRelative(Water.density(t).value(), BRINE.density(0, t).value(), 1e-15, "density");
            assertRelative(Water.viscosity(t).value(), BRINE.viscosity(0, t).value(), 1e-15, "viscosity");
            assertEquals(1, BRINE.waterActivity(0, t).value());
        }
    }

    @Test
    void moreSaltIsHeavierThickerAndDrier() {
        for (double t = 274; t < 373; t += 9) {
            for (double w = 0; w < 0.29; w += 0.01) {
                assertTrue(
                        BRINE.density(w + 0.01, t).value() > BRINE.density(w, t).value());
                assertTrue(BRINE.viscosity(w + 0.01, t).value()
                        > BRINE.viscosity(w, t).value());
                assertTrue(BRINE.waterActivity(w + 0.01, t).value()
                        < BRINE.waterActivity(w, t).value());
            }
        }
    }

    @Test
    void coldAndOverfullBrineIsCautioned() {
        assertEquals(List.of(), BRINE.fluid(0.1, ICE_POINT + 8).cautions());
        assertEquals(
                List.of("temperature 276.15 K is outside 278.15 to 427.15 K, the range of the viscosity of brine "
                        + "(Laliberté 2009)"),
                texts(BRINE.fluid(0.1, ICE_POINT + 3).cautions()));
        assertEquals(
                List.of(
                        "mass fraction 0.29 is outside 0 to 0.26449, the range of what stays dissolved",
                        "mass fraction 0.29 is outside 0 to 0.2659, the range of the density of brine (Laliberté 2009)"),
                texts(BRINE.density(0.29, ROOM).cautions()));
    }

    @Test
    void whatIsNotBrineIsRefused() {
        assertRefused("mass fraction must be from 0 to 0.3 for brine, found 0.4", () -> BRINE.density(0.4, ROOM));
        assertRefused(
                "temperature must be from 273.15 to 373.15 K for brine, found 263.15 K",
                () -> BRINE.viscosity(0.1, ICE_POINT - 10));
        assertRefused(
                "content must be from 0 to 368.96 kg/m3 for the fraction of a solution, found 500 kg/m3",
                () -> BRINE.fraction(500, ROOM));
        assertRefused(
                "content must be from 0 to 368.96 kg/m3 for the fraction of a solution, found -1 kg/m3",
                () -> BRINE.fraction(-1, ROOM));
    }
}
