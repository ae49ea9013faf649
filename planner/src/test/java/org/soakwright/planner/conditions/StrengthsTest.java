package org.soakwright.planner.conditions;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertSame;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.BigDecimal;
import java.util.Objects;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.soakwright.recipes.model.Content;
import org.soakwright.recipes.model.Quantity;
import org.soakwright.recipes.model.Recipe;
import org.soakwright.recipes.model.Species;
import org.soakwright.recipes.model.Step;
import org.soakwright.recipes.text.Place;
import org.soakwright.recipes.text.Unit;

/** Strengths of liquors as people write them, in g/L. */
class StrengthsTest {
    private static final String SALT = "diffusivity: 8e-10 m2/s, substance: sodium chloride";
    private static final String SUGAR = "diffusivity: 8e-10 m2/s, substance: sucrose";

    private static Content known(String species, String strength, String temperature) {
        Recipe recipe =
                Known.of(Read.soak(species, "salt: " + strength, temperature)).recipe();
        Content content = salt((Step.Wet) recipe.steps().get(0));
        assertEquals("g/L", content.unit().symbol());
        return content;
    }

    private static Content salt(Step.Wet step) {
        return Objects.requireNonNull(step.liquor().contents().get("salt"));
    }

    private static double gramsPerLitre(String species, String strength, String temperature) {
        return known(species, strength, temperature).si();
    }

    /**
     * International Critical Tables, as in Perry's Chemical Engineers' Handbook (read in a copy that heads the column of 10 Cel 15 Cel): 18 %
     * 1136.4, 20 % 1152.5 kg/m3 at 10 Cel, so 19 % 1144.4; 0.44 kg/m3 K more below (20 %: 1156.63 at 0 Cel, from memory), at 8 Cel 1145.3: 0.19
     * x 1145.3 = 217.6 g/L.
     */
    @Test
    void aBrineByMass() {
        assertEquals(217.6, gramsPerLitre(SALT, "19 %", "8 Cel"), 0.2);
        assertEquals(217.6, gramsPerLitre(SALT, "190 g/kg", "8 Cel"), 0.2);
    }

    /** CRC Handbook of Chemistry and Physics, concentrative properties at 20 Cel (from memory): g/L of solution. */
    @ParameterizedTest
    @CsvSource({"1, 10.05", "5, 51.7", "10, 107.1", "20, 229.6", "26, 311.27"})
    void aBrineOfTheHandbook(String percent, double gramsPerLitre) {
        assertEquals(gramsPerLitre, gramsPerLitre(SALT, percent + " %", "20 Cel"), 5e-4 * gramsPerLitre);
    }

    /** The same of sucrose: 40 % has 1176.5 kg/m3, 60 % 1286.5 (CRC Handbook, from memory). */
    @ParameterizedTest
    @CsvSource({"10, 103.8", "40, 470.6", "60, 771.9"})
    void aSyrupOfTheHandbook(String percent, double gramsPerLitre) {
        assertEquals(gramsPerLitre, gramsPerLitre(SUGAR, percent + " %", "20 Cel"), 5e-4 * gramsPerLitre);
    }

    /** 2 x 58.44 = 116.88 and 2 x 342.30 = 684.6 g/L; another molar mass where it is stated. No temperature is needed. */
    @Test
    void anAmount() {
        assertEquals(116.88, gramsPerLitre(SALT, "2 mol/L", ""), 0.01);
        assertEquals(684.6, gramsPerLitre(SUGAR, "2 mol/L", ""), 0.05);
        assertEquals(169.98, gramsPerLitre("diffusivity: 1e-9 m2/s, molar-mass: 84.99 g/mol", "2000 mmol/L", ""), 1e-9);
    }

    /**
     * Saturated at 20 Cel: 35.9 g per 100 g of water (CRC Handbook, from memory), 26.42 %; three quarters are 19.81 %, of 1146.3 kg/m3
     * (1131.9 at 18 %, 1147.8 at 20 %): 227.1 g/L. Sucrose: 2.02 kg per kg of water (from memory), 66.9 %; three quarters 50.2 %, of 1230.7
     * kg/m3 (1229.6 at 50 %): 617.6 g/L, to the 1 % that solubilities of sucrose are known to.
     */
    @Test
    void aShareOfSaturation() {
        assertEquals(227.1, gramsPerLitre(SALT, "75 % of saturation", "20 Cel"), 0.004 * 227.1);
        assertEquals(617.6, gramsPerLitre(SUGAR, "75 % of saturation", "20 Cel"), 0.012 * 617.6);
    }

    /** A density that is stated is used, and what is in mass per volume is left alone. */
    @Test
    void whatTheLiquorTellsItselfStays() {
        Recipe recipe = Read.soak(SALT, "salt: 10 %, density: 1100 kg/m3", "8 Cel");
        assertSame(recipe, Known.of(recipe).recipe());
        assertEquals(110, ((Step.Wet) recipe.steps().get(0)).liquor().kgPerM3("salt"), 1e-12);
        assertTrue(Known.of(recipe).conversions().isEmpty());
    }

    @Test
    void whatIsNotKnownExactlyStaysSo() {
        Content content = known(SALT, "{value: 19 %, give-or-take: 4 %}", "8 Cel");
        Quantity giveOrTake = content.amount().giveOrTake();
        assertTrue(giveOrTake != null && giveOrTake.si() == 0.04, String.valueOf(giveOrTake));
    }

    /** Saturation at 8 Cel is 26.3 %, 316 g/L or so. */
    @ParameterizedTest
    @CsvSource({"27 %, 8 Cel", "330 g/L, 20 Cel", "6 mol/L, 8 Cel", "300 g/kg, 8 Cel"})
    void noLiquorHoldsMoreThanStaysDissolved(String strength, String temperature) {
        String said = Read.refusal(SALT, "salt: " + strength, temperature);
        assertTrue(said.startsWith("test.yaml:9:35: "), said);
        assertTrue(said.contains("cannot hold so much salt: found \"" + strength + "\", where saturation at"), said);
    }

    @ParameterizedTest
    @CsvSource({"26.2 %, 8 Cel", "315 g/L, 20 Cel", "5.3 mol/L, 20 Cel", "100 % of saturation, 8 Cel", "0 %, 8 Cel"})
    void whatStaysDissolvedIsHeld(String strength, String temperature) {
        Recipe recipe =
                Known.of(Read.soak(SALT, "salt: " + strength, temperature)).recipe();
        double si = ((Step.Wet) recipe.steps().get(0)).liquor().kgPerM3("salt");
        assertTrue(si < 320 && (si > 300 || strength.startsWith("0")), "found " + si);
    }

    /** Sucrose at 5 Cel: 64.9 % (from memory). */
    @Test
    void noSyrupEither() {
        String said = Read.refusal(SUGAR, "salt: 70 %", "5 Cel");
        assertTrue(said.startsWith("test.yaml:9:35: ") && said.contains("64.9 % by mass"), said);
    }

    @Test
    void whatStrengthsNeedIsSaid() {
        assertTrue(Read.refusal(SALT, "salt: 19 %", "").contains("temperature"));
        assertTrue(Read.refusal("diffusivity: 1e-9 m2/s", "salt: 19 %", "8 Cel").contains("density"));
        assertTrue(
                Read.refusal("diffusivity: 1e-9 m2/s", "salt: 2 mol/L", "8 Cel").contains("molar-mass"));
        assertTrue(Read.refusal("diffusivity: 1e-9 m2/s", "salt: 75 % of saturation", "8 Cel")
                .contains("substance"));
        assertTrue(Read.refusal(SALT, "salt: 120 % of saturation", "8 Cel").startsWith("test.yaml:9:35: "));
        assertTrue(Read.refusal(SALT, "salt: 75 % of saturation", "120 Cel").contains("no property is known there"));
    }

    /** Back in the unit that it came from. */
    @ParameterizedTest
    @CsvSource({"19 %", "190 g/kg", "2 mol/L", "75 % of saturation", "217.6 g/L", "0.2 %", "26.2 %"})
    void aStrengthComesBack(String strength) {
        Recipe recipe = Read.soak(SALT, "salt: " + strength, "8 Cel");
        Step.Wet step = (Step.Wet) recipe.steps().get(0);
        Species salt = recipe.species().get(0);
        Quantity written = salt(step).amount();
        double si = Strengths.kgPerM3(step, salt, written);
        assertEquals(
                written.value().doubleValue(),
                Strengths.express(step, salt, si, written),
                1e-12 * written.value().doubleValue());
    }

    /** Every strength that a tank may reach has an expression, down to none. */
    @Test
    void anyContentIsExpressed() {
        Recipe recipe = Read.soak(SALT, "salt: 19 %", "8 Cel");
        Step.Wet step = (Step.Wet) recipe.steps().get(0);
        Species salt = recipe.species().get(0);
        Unit percent = salt(step).unit();
        Quantity like = new Quantity(BigDecimal.ONE, percent, Place.of("test.yaml"), "1");
        double before = -1;
        for (int i = 0; i <= 3000; i++) {
            double found = Strengths.express(step, salt, 0.1 * i, like);
            assertTrue(found > before, "at " + 0.1 * i + " g/L found " + found);
            before = found;
        }
    }
}
