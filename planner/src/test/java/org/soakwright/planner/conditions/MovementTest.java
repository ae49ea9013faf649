package org.soakwright.planner.conditions;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.soakwright.recipes.model.Diffusivity;
import org.soakwright.recipes.model.Quantity;
import org.soakwright.recipes.model.Recipe;
import org.soakwright.recipes.model.Step;

/** Diffusivities at the temperatures of steps. */
class MovementTest {
    private static Diffusivity stated(Recipe recipe) {
        return recipe.species().get(0).diffusivity().all().get(0);
    }

    private static double at(String diffusivity, String temperature) {
        Recipe recipe = Read.soak("diffusivity: " + diffusivity, "salt: 0 g/L", temperature);
        return Movement.at(stated(recipe), recipe.steps().get(0).temperature());
    }

    private static boolean cautioned(String diffusivity, String temperature) {
        Recipe recipe = Read.soak("diffusivity: " + diffusivity, "salt: 0 g/L", temperature);
        Step step = recipe.steps().get(0);
        Quantity there = step.temperature();
        return there != null
                && !Movement.at(stated(recipe), there.si()).cautions().isEmpty();
    }

    /**
     * exp(E/R (1/T1 - 1/T2)), R = 8.314463 J/mol K: Akoy 2014, Int Food Res J 21(5) (abstract), mango 37.99 kJ/mol from 60 to 80 Cel 2.174 (its
     * own values 4.97e-10 and 10.83e-10: 2.179); Gomez et al. 2015, J Food Eng 149:188 (abstract), nitrite in pork 60.32 kJ/mol from 2 to
     * 12 Cel 2.52; Gomez et al. 2017, J Food Eng 214:69 (abstract), nitrate 96.44 kJ/mol 4.39, water across the fibres 31.86 kJ/mol 1.63;
     * Xiong et al. 1991 (constants in a public code), pasta 6.391e-8 exp(-21760/RT), 1.50e-11 at 40 and 3.11e-11 m2/s at 70 Cel.
     */
    @ParameterizedTest
    @CsvSource({
        "37.99, 60, 80, 2.174",
        "60.32, 2, 12, 2.52",
        "96.44, 2, 12, 4.39",
        "31.86, 2, 12, 1.63",
        "21.76, 40, 70, 2.077"
    })
    void anActivationEnergyIsThatOfItsRatio(String energy, String from, String to, double ratio) {
        double found =
                at("{value: 1e-10 m2/s, at: " + from + " Cel, activation-energy: " + energy + " kJ/mol}", to + " Cel");
        assertEquals(ratio, found / 1e-10, 2.5e-3 * ratio);
    }

    /** 6.391e-8 exp(-21760/(8.314463 x 313.15)) = 1.49964e-11 and at 343.15 K 3.11390e-11. */
    @Test
    void aPrefactorAndItsEnergyAgree() {
        assertEquals(
                3.11390e-11,
                at("{value: 1.49964e-11 m2/s, at: 40 Cel, activation-energy: 21.76 kJ/mol}", "70 Cel"),
                1e-5 * 3.11390e-11);
    }

    /** Stokes and Einstein from 1.61e-9 m2/s at 25 Cel, sodium chloride in water, viscosity after IAPWS SR6-08: computed apart. */
    @ParameterizedTest
    @CsvSource({
        "0, 7.3265e-10",
        "4, 8.4984e-10",
        "10, 1.042e-9",
        "12.5, 1.128e-9",
        "18, 1.3293e-9",
        "25, 1.61e-9",
        "40, 2.3057e-9",
        "60, 3.4356e-9",
        "80, 4.7938e-9"
    })
    void withTheViscosityOfWater(String celsius, double diffusivity) {
        assertEquals(
                diffusivity,
                at("{value: 1.61e-9 m2/s, at: 25 Cel, scaling: viscosity}", celsius + " Cel"),
                4e-4 * diffusivity);
    }

    /**
     * Between 4 Cel (2.1e-10) and 12.5 Cel (3e-10 m2/s) at 8 Cel: share (1/277.15 - 1/281.15)/(1/277.15 - 1/285.65) = 0.478117, so 2.1e-10
     * (3/2.1)^0.478117 = 2.49045e-10; straight in T it would be 2.5235e-10. At a point it is the point; the second pair counts beyond 12.5.
     */
    @Test
    void pointsAreStraightInOneOverT() {
        String points = "{points: [[4 Cel, 2.1e-10 m2/s], [20 Cel, 4e-10 m2/s], [12.5 Cel, 3e-10 m2/s]]}";
        assertEquals(2.49045e-10, at(points, "8 Cel"), 1e-5 * 2.49e-10);
        assertEquals(3e-10, at(points, "12.5 Cel"), 1e-22);
        assertEquals(4e-10, at(points, "20 Cel"), 1e-22);
        assertTrue(!cautioned(points, "8 Cel") && !cautioned(points, "4 Cel") && !cautioned(points, "20 Cel"));
        assertTrue(cautioned(points, "3 Cel") && cautioned(points, "21 Cel"));
    }

    /**
     * The library's own numbers. Floury et al. 2010, Dairy Sci Technol 90:477, table II: white cheese 2.1e-10, 3e-10, 4e-10 at 4, 12.5, 20 Cel;
     * Camembert 2.54e-10 at 14; Feta 2.3e-10 at 13.
     */
    @ParameterizedTest
    @CsvSource({
        "{from: salt-in-white-cheese}, 4, 2.1e-10",
        "{from: salt-in-white-cheese}, 12.5, 3e-10",
        "{from: salt-in-white-cheese}, 20, 4e-10",
        "{from: salt-in-camembert}, 14, 2.54e-10",
        "{from: salt-in-camembert}, 4, 2.54e-10",
        "{from: salt-in-feta}, 13, 2.3e-10"
    })
    void anEntryOfTheLibraryIsItsSource(String entry, String celsius, double diffusivity) {
        assertEquals(diffusivity, at(entry, celsius + " Cel"), 1e-9 * diffusivity);
    }

    /** Akoy's own energy takes 4.97e-10 at 60 Cel to 2.174 times that at 80; caffeine in coffee 48.95 kJ/mol: 50 Cel over 60 is 0.5787. */
    @Test
    void anEntryBringsItsActivationEnergy() {
        assertEquals(
                4.97e-10 * 2.174,
                at("{from: water-in-mango, value: 4.97e-10 m2/s, at: 60 Cel}", "80 Cel"),
                1e-3 * 10.8e-10);
        assertEquals(0.5787 * 9e-11, at("{from: caffeine-in-coffee, value: 9e-11 m2/s}", "50 Cel"), 1e-3 * 5.2e-11);
    }

    @Test
    void anEntryThatIsARangeAsksForAValue() {
        String said = Read.refusal("diffusivity: {from: salt-in-cheese-in-general}", "salt: 0 g/L", "8 Cel");
        assertTrue(said.startsWith("test.yaml:6:") && said.contains("1e-10") && said.contains("add value"), said);
    }
}
