package org.soakwright.recipes.model;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertSame;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Map;
import java.util.Set;
import org.junit.jupiter.api.Test;
import org.soakwright.recipes.text.Kind;
import org.soakwright.recipes.text.Place;
import org.soakwright.recipes.text.Unsound;

class DiffusivitiesTest {
    private static final Place HERE = new Place("f", 1, 1);
    private static final Diffusivity SLOW = diffusivity("2e-10");
    private static final Diffusivity FAST = diffusivity("3e-10");
    private static final Diffusivity WARMING = new Diffusivity(
            Given.quantity("3e-10", "m2/s", Kind.DIFFUSIVITY),
            new Diffusivity.Law.Activated(
                    Given.quantity("5", "Cel", Kind.TEMPERATURE), Given.quantity("22", "kJ/mol", Kind.MOLAR_ENERGY)),
            null);

    private static Diffusivity diffusivity(String value) {
        return Diffusivity.of(Given.quantity(value, "m2/s", Kind.DIFFUSIVITY));
    }

    private static Diffusivities byGrain(Diffusivity along, Diffusivity across) {
        return new Diffusivities.ByGrain(HERE, Map.of(Grain.ALONG, along, Grain.ACROSS, across));
    }

    @Test
    void oneValueHoldsInEveryDirectionAndInNone() {
        Diffusivities alike = new Diffusivities.Alike(SLOW);
        assertSame(SLOW, alike.of(Grain.WIDTH));
        assertSame(SLOW, alike.of(null));
        assertEquals(List.of(SLOW), alike.all());
    }

    @Test
    void aDirectionHasItsOwnValueAndAnotherHasNone() {
        Diffusivities wood = byGrain(FAST, SLOW);
        assertSame(FAST, wood.of(Grain.ALONG));
        assertSame(SLOW, wood.of(Grain.ACROSS));
        assertThrows(IllegalStateException.class, () -> wood.of(Grain.WIDTH));
        assertThrows(IllegalStateException.class, () -> wood.of(null));
        assertThrows(Unsound.class, () -> new Diffusivities.ByGrain(HERE, Map.of()));
    }

    @Test
    void eachDirectionIsChangedInItsPlace() {
        Diffusivities changed = byGrain(FAST, SLOW).map(one -> one.equals(FAST) ? SLOW : FAST);
        assertSame(SLOW, changed.of(Grain.ALONG));
        assertSame(FAST, changed.of(Grain.ACROSS));
        assertSame(FAST, new Diffusivities.Alike(SLOW).map(one -> FAST).of(null));
    }

    @Test
    void oneWarmingDirectionMakesTheTemperatureMatter() {
        assertTrue(byGrain(WARMING, SLOW).dependsOnTemperature());
        assertFalse(byGrain(FAST, SLOW).dependsOnTemperature());
    }

    @Test
    void aStepsOwnDiffusivityDoesNotWarm() {
        Map<String, Diffusivities> warming = Map.of("salt", byGrain(WARMING, SLOW));
        Unsound unsound = assertThrows(Unsound.class, () -> new Overrides(warming, Map.of()));
        assertEquals(
                "f:1:1: a step's own diffusivity holds at its temperature; write value, and give-or-take where it is known, alone",
                unsound.problems().get(0).toString());
    }

    @Test
    void aSpeciesVariesOnlyWhereThereIsSomethingToVary() {
        Spread spread = new Spread(Given.fraction(0.06));
        Start none = new Start.Uniform(new Content(Given.quantity("0", "g/kg", Kind.PER_MASS)));
        assertEquals(
                "a start of nothing is the same in every piece; remove varies, or write a content",
                refusal(none, spread));
        Content content = new Content(Given.quantity("190", "g/kg", Kind.PER_MASS));
        Start profile =
                new Start.Profile(HERE, List.of(new Start.Point(0, content, HERE), new Start.Point(1, content, HERE)));
        assertEquals(
                "a profile cannot vary from piece to piece; write one content, or remove varies",
                refusal(profile, spread));
        Species varying = species(new Start.Uniform(content), spread);
        assertSame(
                spread, varying.withDiffusivity(new Diffusivities.Alike(FAST)).startVaries());
    }

    private static String refusal(Start start, Spread spread) {
        return assertThrows(Unsound.class, () -> species(start, spread))
                .problems()
                .get(0)
                .what();
    }

    private static Species species(Start start, Spread spread) {
        return new Species(
                HERE,
                "salt",
                start,
                spread,
                new Diffusivities.Alike(SLOW),
                null,
                new Partition(Given.fraction(0.8)),
                Traits.NONE,
                Set.of(Medium.LIQUOR));
    }
}
