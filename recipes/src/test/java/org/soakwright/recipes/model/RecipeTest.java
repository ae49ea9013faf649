package org.soakwright.recipes.model;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.BigDecimal;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import org.jspecify.annotations.Nullable;
import org.junit.jupiter.api.Test;
import org.soakwright.recipes.Outcome;
import org.soakwright.recipes.Recipes;
import org.soakwright.recipes.text.Kind;
import org.soakwright.recipes.text.Place;
import org.soakwright.recipes.text.Unsound;

/** A recipe changed in memory is held to the same rules as one that is read. */
class RecipeTest {
    private static final Place HERE = new Place("f", 1, 1);
    private static final Recipe RECIPE =
            ((Outcome.Accepted) Recipes.read(Path.of("examples/loin-desalting.yaml"))).recipe();

    private static String refusal(Runnable change) {
        return assertThrows(Unsound.class, change::run).problems().get(0).what();
    }

    private static Recipe withFirst(Step step) {
        List<Step> steps = new ArrayList<>(RECIPE.steps());
        steps.set(0, step);
        return RECIPE.withSteps(steps);
    }

    private static Step.Soak first() {
        return (Step.Soak) RECIPE.steps().get(0);
    }

    @Test
    void aStepTakesAnotherTime() {
        Step step = first().with(first().head().withTime(new Time.Fixed(Given.time("9", "h"))));
        assertEquals(32400, withFirst(step).steps().get(0).time().seconds(0));
    }

    @Test
    void foodKeepsItsTemperature() {
        Step cold = first().with(first().head().withTemperature(null));
        assertEquals(
                "the step has no temperature, and the diffusivity of salt depends on it; add one such as 4 Cel",
                refusal(() -> withFirst(cold)));
    }

    @Test
    void twoStepsNeverShareAName() {
        assertTrue(refusal(() -> withFirst(RECIPE.steps().get(1))).startsWith("two steps have one name"));
    }

    @Test
    void aRecipeHasSteps() {
        assertTrue(refusal(() -> RECIPE.withSteps(List.of())).startsWith("the recipe has no steps"));
    }

    @Test
    void aRinseStandsForFlowOrFillsOrPlenty() {
        Step.Rinse rinse = assertInstanceOf(Step.Rinse.class, RECIPE.steps().get(3));
        assertTrue(refusal(() -> rinse.with(new Renewal.Plenty())).startsWith("a rinse needs fresh liquor"));
        assertEquals(3, ((Renewal.Fills) rinse.with(new Renewal.Fills(3, HERE)).renewal()).count());
        assertEquals("fills is a whole number from 1 to 1000: found 0", refusal(() -> new Renewal.Fills(0, HERE)));
    }

    @Test
    void aLiquorByMassIsCountedThroughItsDensity() {
        Map<String, Content> salt = Map.of("salt", new Content(Given.quantity("3", "%", Kind.PER_MASS)));
        LiquorVolume volume = new LiquorVolume.Volume(Given.quantity("1200", "L", Kind.VOLUME));
        Quantity density = Given.quantity("1020", "kg/m3", Kind.DENSITY);
        assertEquals(30.6, new Liquor(HERE, volume, salt, false, density).kgPerM3("salt"), 1e-12);
        assertEquals(0, new Liquor(HERE, volume, Map.of(), true, null).kgPerM3("salt"));
        Liquor unknown = new Liquor(HERE, volume, salt, false, null);
        assertThrows(IllegalStateException.class, () -> unknown.kgPerM3("salt"), "nobody says what 3 % weigh");
    }

    @Test
    void lessClingsThanThereIsLiquor() {
        Step.Soak soak = first();
        Quantity all = Given.quantity("2", "L/kg", Kind.LIQUOR_RATIO);
        Step.Soak clinging = new Step.Soak(soak.head(), soak.liquor(), soak.film(), all);
        assertEquals(
                "more would cling than the liquor holds: found \"2 L/kg\"; write less than 2 L/kg, which is the whole liquor",
                refusal(() -> withFirst(clinging)));
        LiquorVolume volume = new LiquorVolume.Volume(Given.quantity("1201", "L", Kind.VOLUME));
        Liquor larger = new Liquor(HERE, volume, Map.of(), true, null);
        assertEquals(all, ((Step.Soak) withFirst(clinging.with(larger)).steps().get(0)).dragOut());
    }

    @Test
    void aBandHasItsLimitsInOrderAndInOneBasis() {
        Quantity low = Given.quantity("10", "g/kg", Kind.PER_MASS);
        Quantity high = Given.quantity("2", "%", Kind.PER_MASS);
        assertEquals("%", limits(high, low).unit().symbol());
        assertThrows(Unsound.class, () -> limits(low, high));
        assertThrows(Unsound.class, () -> limits(high, Given.quantity("1", "g/L", Kind.PER_VOLUME)));
        assertThrows(Unsound.class, () -> limits(null, null));
    }

    private static Limits limits(@Nullable Quantity atMost, @Nullable Quantity atLeast) {
        return new Limits(HERE, Basis.PER_MASS, atMost, atLeast);
    }

    @Test
    void aLotAsAWholeHasOnlyAMean() {
        Limits limits = limits(Given.quantity("2", "%", Kind.PER_MASS), null);
        Reference salt = new Reference("salt", HERE);
        assertThrows(
                Unsound.class,
                () -> new Target.OfPieces(HERE, salt, Reading.CORE, limits, new GradeScope.WholeLot(), null, null));
    }

    @Test
    void aValueShowsAsOneWouldWriteIt() {
        assertEquals(
                "8e-10 m2/s", Given.quantity("8e-10", "m2/s", Kind.DIFFUSIVITY).toString());
        assertEquals(
                "90.0 min",
                Quantity.ofSi(5400, Kind.DURATION.unit("min").orElseThrow(), HERE)
                        .toString());
        assertThrows(
                Unsound.class,
                () -> new Quantity(new BigDecimal("1e400"), Kind.MASS.unit("kg").orElseThrow(), HERE));
    }
}
