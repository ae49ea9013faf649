package org.soakwright.recipes.library;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Path;
import java.util.List;
import java.util.Set;
import java.util.stream.Collectors;
import org.junit.jupiter.api.Test;
import org.soakwright.recipes.Outcome;
import org.soakwright.recipes.Recipes;
import org.soakwright.recipes.model.Reading;
import org.soakwright.recipes.model.Recipe;

/** What the examples say of themselves, and which cautions that makes due. */
class RecipeFactsTest {
    private static final CautionBook BOOK = CautionBook.load();

    private static Recipe recipe(String name) {
        return assertInstanceOf(Outcome.Accepted.class, Recipes.read(Path.of("examples", name + ".yaml")))
                .recipe();
    }

    private static Facts facts(String name) {
        Recipe recipe = recipe(name);
        double[] longest = recipe.steps().stream()
                .mapToDouble(step -> step.time().seconds(step.time().choices() - 1))
                .toArray();
        return new RecipeFacts(recipe, longest, RecipeFacts.Ends.unknown());
    }

    private static List<String> due(String name) {
        return BOOK.due(facts(name)).stream().map(Caution::id).toList();
    }

    @Test
    void waterOnLoinsIsKeptColdAndHoldsNoBrine() {
        Facts loins = facts("loin-desalting");
        assertEquals(0, loins.liquor("salt").orElseThrow());
        assertTrue(loins.names().contains("first water") && loins.names().contains("thick"));
        assertEquals(
                List.of("estimate", "food-water", "food-holding", "fish-water-phase", "confined-space"),
                due("loin-desalting"));
    }

    @Test
    void brinedCheeseIsHeldBetweenColdAndHot() {
        List<String> wheels = due("wheel-brining");
        assertTrue(
                wheels.containsAll(
                        List.of("food-held", "food-held-long", "brine-listeria", "brine-allergens", "confined-space")),
                wheels::toString);
        assertTrue(
                wheels.stream().noneMatch(id -> id.startsWith("fish") || id.equals("food-held-warm")),
                wheels::toString);
    }

    @Test
    void noExampleIsStopped() {
        for (String name :
                List.of("bead-washing", "brick-desalination", "cord-brining", "loin-desalting", "wheel-brining")) {
            assertEquals(List.of(), BOOK.stopping(facts(name)), name);
        }
    }

    @Test
    void nitrateInABrickIsNoFood() {
        assertEquals(List.of("estimate"), due("brick-desalination"));
    }

    @Test
    void theTimeBetweenStepsIsARestAsWarmAsTheStepBeforeIt() {
        Recipe cords = recipe("cord-brining");
        double[] hours = cords.steps().stream().mapToDouble(step -> 3600).toArray();
        List<Facts.Stay> stays = new RecipeFacts(cords, hours, RecipeFacts.Ends.unknown()).steps();
        assertEquals(2 * cords.steps().size() - 1, stays.size());
        assertEquals(new Facts.Stay(StepKind.REST, stays.get(0).kelvin(), 600), stays.get(1));
        assertEquals(285.15, stays.get(1).kelvin().orElseThrow());
    }

    @Test
    void whatThePiecesEndWithComesFromTheRun() {
        Recipe loins = recipe("loin-desalting");
        RecipeFacts.Ends ends = new RecipeFacts.Ends() {
            @Override
            public List<Double> piece(String species, Reading reading) {
                return List.of(0.02, 0.03);
            }

            @Override
            public List<Double> waterPhase(String species, Reading reading) {
                return reading == Reading.LOWEST ? List.of(0.031) : List.of();
            }
        };
        Facts facts = new RecipeFacts(loins, new double[loins.steps().size()], ends);
        assertEquals(List.of(0.02, 0.03), facts.piece("salt", Reading.MEAN));
        assertEquals(
                Set.of("fish-water-phase", "fish-water-phase-low", "fish-botulinum"),
                BOOK.due(facts).stream()
                        .map(Caution::id)
                        .filter(id -> id.startsWith("fish"))
                        .collect(Collectors.toSet()));
    }

    @Test
    void everyStepHasItsDuration() {
        IllegalArgumentException wrong = assertThrows(
                IllegalArgumentException.class,
                () -> new RecipeFacts(recipe("wheel-brining"), new double[9], RecipeFacts.Ends.unknown()));
        assertEquals("9 durations for 2 steps", wrong.getMessage());
    }
}
