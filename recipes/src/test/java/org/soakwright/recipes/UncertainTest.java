package org.soakwright.recipes;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Objects;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.soakwright.recipes.model.Diffusivity;
import org.soakwright.recipes.model.Quantity;
import org.soakwright.recipes.model.Recipe;
import org.soakwright.recipes.model.Species;
import org.soakwright.recipes.model.Step;
import org.soakwright.recipes.model.Uncertain;
import org.soakwright.recipes.text.Place;

/** A recipe all of whose measured values can be changed at once, and says which of them are not known exactly. */
class UncertainTest {
    private static final Path CORPUS = Path.of("src/test/resources/org/soakwright/recipes/accepted");

    static List<Path> accepted() throws IOException {
        return CorpusTest.accepted();
    }

    private static Recipe recipe(Path file) {
        return assertInstanceOf(Outcome.Accepted.class, Recipes.read(file)).recipe();
    }

    private static Recipe doubtful() {
        return recipe(CORPUS.resolve("every-doubt.yaml"));
    }

    private static Quantity slower(Quantity quantity) {
        return quantity.isTemperature() ? quantity : quantity.withSi(0.999 * quantity.si());
    }

    @ParameterizedTest
    @MethodSource("accepted")
    void aRecipeInWhichNothingChangesStaysEqual(Path file) {
        Recipe recipe = recipe(file);
        assertEquals(recipe, recipe.each(quantity -> quantity));
    }

    @ParameterizedTest
    @MethodSource("accepted")
    void aRecipeInWhichEveryValueIsPutInItsOwnPlaceMeansTheSame(Path file) {
        Recipe recipe = recipe(file);
        List<Double> before = new ArrayList<>();
        List<Double> after = new ArrayList<>();
        Recipe again = recipe.each(quantity -> {
            before.add(quantity.si());
            return quantity.withSi(quantity.si());
        });
        again.each(quantity -> {
            after.add(quantity.si());
            return quantity;
        });
        assertEquals(before, after);
        assertEquals(List.of(), again.uncertain());
    }

    @ParameterizedTest
    @MethodSource("accepted")
    void everyMeasuredValueChangesAndNothingElse(Path file) {
        Recipe recipe = recipe(file);
        Recipe changed = recipe.each(UncertainTest::slower);
        assertNotEquals(recipe, changed);
        assertEquals(
                recipe.steps().stream().map(Step::time).toList(),
                changed.steps().stream().map(Step::time).toList());
        assertEquals(recipe.targets(), changed.targets());
        assertEquals(recipe.prices(), changed.prices());
        assertEquals(recipe.between(), changed.between());
        assertEquals(
                recipe.lot().grades().stream().map(grade -> grade.share()).toList(),
                changed.lot().grades().stream().map(grade -> grade.share()).toList());
    }

    @ParameterizedTest
    @MethodSource("accepted")
    void whatIsListedAsUncertainIsWhatCanBeChanged(Path file) {
        Recipe recipe = recipe(file);
        List<Place> changeable = new ArrayList<>();
        recipe.each(quantity -> {
            if (quantity.giveOrTake() != null && !changeable.contains(quantity.place())) {
                changeable.add(quantity.place());
            }
            return quantity;
        });
        List<Place> listed =
                recipe.uncertain().stream().map(one -> one.quantity().place()).toList();
        assertEquals(changeable.stream().sorted().toList(), listed);
    }

    @Test
    void everyDoubtOfTheFileIsListedOnceInItsOrderUnderANameOfItsOwn() throws IOException {
        List<Uncertain> uncertain = doubtful().uncertain();
        String text = java.nio.file.Files.readString(CORPUS.resolve("every-doubt.yaml"));
        assertEquals(text.split("give-or-take", -1).length - 1, uncertain.size());
        List<String> names = uncertain.stream().map(Uncertain::name).toList();
        assertEquals(names.size(), new HashSet<>(names).size(), names::toString);
        assertEquals("mass of the lot", names.get(0));
        assertEquals("equilibrium of nitrate in shelf", names.get(names.size() - 1));
        assertTrue(
                names.containsAll(List.of(
                        "diffusivity of salt",
                        "diffusivity of salt in brine",
                        "diffusivity of nitrate thickness",
                        "diffusivity of nitrate in the liquor",
                        "activation energy of the diffusivity of salt",
                        "ratio of brine",
                        "thickness of slice",
                        "permeance of the skin of slim for nitrate")),
                names::toString);
    }

    @Test
    void aGiveOrTakeIsKelvinsForATemperatureAndAShareForTheRest() {
        for (Uncertain one : doubtful().uncertain()) {
            Quantity known = Objects.requireNonNull(one.quantity().giveOrTake());
            assertEquals(
                    one.quantity().isTemperature() ? "K" : "%", known.unit().symbol(), one::name);
        }
    }

    @Test
    void pointsRiseAndFallTogether() {
        Recipe recipe = doubtful();
        Recipe changed = recipe.each(UncertainTest::slower);
        Diffusivity.Law.Measured before = line(recipe);
        Diffusivity.Law.Measured after = line(changed);
        for (int i = 0; i < 2; i++) {
            assertEquals(
                    0.999 * before.points().get(i).value().si(),
                    after.points().get(i).value().si(),
                    1e-24);
            assertEquals(
                    before.points().get(i).temperature(), after.points().get(i).temperature());
        }
    }

    private static Diffusivity.Law.Measured line(Recipe recipe) {
        Species nitrate = recipe.species("nitrate").orElseThrow();
        return (Diffusivity.Law.Measured)
                Objects.requireNonNull(nitrate.traits().inLiquor()).law();
    }

    @Test
    void aValuePutInAnothersPlaceIsShownInItsUnitAndTakenForExact() {
        Quantity ratio = doubtful().uncertain().stream()
                .filter(one -> one.name().equals("ratio of brine"))
                .findFirst()
                .orElseThrow()
                .quantity();
        assertEquals("17 %", Objects.requireNonNull(ratio.giveOrTake()).toString());
        Quantity other = ratio.withSi(0.0025);
        assertEquals("2.5 L/kg", other.toString());
        assertEquals(0.0025, other.si());
        assertEquals(ratio.place(), other.place());
        assertNull(other.giveOrTake());
        assertEquals(ratio.giveOrTake(), ratio.times(2).giveOrTake());
        assertEquals(0.004, ratio.times(2).si());
    }
}
