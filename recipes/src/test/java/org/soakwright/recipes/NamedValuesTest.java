package org.soakwright.recipes;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Path;
import java.util.List;
import java.util.Objects;
import org.junit.jupiter.api.Test;
import org.soakwright.recipes.model.Diffusivities;
import org.soakwright.recipes.model.Diffusivity;
import org.soakwright.recipes.model.Grain;
import org.soakwright.recipes.model.Recipe;

/** What becomes of the ways to write a diffusivity, and of the entries of the library that a recipe names. */
class NamedValuesTest {
    private static final Recipe RECIPE = ((Outcome.Accepted)
                    Recipes.read(Path.of("src/test/resources/org/soakwright/recipes/accepted/every-diffusivity.yaml")))
            .recipe();

    private static Diffusivities all(String species) {
        return RECIPE.species(species).orElseThrow().diffusivity();
    }

    private static Diffusivity of(String species) {
        return all(species).all().get(0);
    }

    @Test
    void aNamedValueIsTheLibrarysAtTheRecipesPlace() {
        Diffusivity named = of("named");
        assertEquals("salt-in-camembert", named.from());
        assertEquals(2.54e-10, named.value().si());
        assertEquals(
                "every-diffusivity.yaml",
                Path.of(named.place().file()).getFileName().toString());
        assertFalse(named.dependsOnTemperature(), "the entry gives no activation energy");
        assertNull(of("plain").from());
    }

    @Test
    void anEntryByTemperatureBecomesPoints() {
        Diffusivity named = of("named-points");
        Diffusivity.Law.Measured line = assertInstanceOf(Diffusivity.Law.Measured.class, named.law());
        assertEquals(
                List.of("4 Cel", "12.5 Cel", "20 Cel"),
                line.points().stream()
                        .map(point -> point.temperature().toString())
                        .toList());
        assertEquals(2.1e-10, named.value().si());
        assertTrue(named.dependsOnTemperature());
    }

    @Test
    void aRangeTakesTheValueStatedWithinItOrNot() {
        assertEquals(3e-10, of("named-range").value().si());
        assertEquals(9e-10, of("named-outside").value().si());
        assertEquals("salt-in-cheese-in-general", of("named-outside").from());
    }

    @Test
    void theTemperatureOfAnEntryBelongsToItsActivationEnergy() {
        Diffusivity.Law.Activated law = assertInstanceOf(
                Diffusivity.Law.Activated.class, of("named-warming").law());
        assertEquals("60 Cel", law.at().toString());
        assertEquals("48.95 kJ/mol", law.energy().toString());
    }

    @Test
    void whatIsStatedGoesBeforeTheEntry() {
        assertEquals(
                new Diffusivity.Law.Viscous(
                        ((Diffusivity.Law.Viscous) of("named-scaled").law()).at()),
                of("named-scaled").law());
        Diffusivity.Law.Activated law = assertInstanceOf(
                Diffusivity.Law.Activated.class, of("named-activated").law());
        assertEquals("14 Cel", law.at().toString());
        assertEquals("22 kJ/mol", law.energy().toString());
        assertEquals(
                "20 %",
                Objects.requireNonNull(of("named-activated").value().giveOrTake())
                        .toString());
    }

    @Test
    void pointsAreKeptByRisingTemperatureWithTheirDoubtOnTheFirst() {
        Diffusivity measured = of("measured");
        assertEquals(
                List.of("5 Cel", "278.2 K", "15 Cel"),
                ((Diffusivity.Law.Measured) measured.law())
                        .points().stream()
                                .map(point -> point.temperature().toString())
                                .toList());
        Diffusivity across = all("by-direction").of(Grain.ACROSS);
        assertEquals(8e-10, across.value().si());
        assertEquals("20 %", Objects.requireNonNull(across.value().giveOrTake()).toString());
    }

    @Test
    void somethingTwiceAsFastIsSoAtEveryTemperature() {
        Diffusivity twice = of("measured").times(2);
        assertEquals(1.6e-9, twice.value().si(), 1e-24);
        Diffusivity.Law.Measured line = (Diffusivity.Law.Measured) twice.law();
        assertEquals(2.2e-9, line.points().get(2).value().si(), 1e-24);
        assertEquals(of("activated").law(), of("activated").times(2).law());
    }
}
