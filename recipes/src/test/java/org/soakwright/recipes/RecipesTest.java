package org.soakwright.recipes;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;
import static org.junit.jupiter.api.Assertions.assertNotNull;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Objects;
import java.util.Random;
import java.util.Set;
import java.util.regex.MatchResult;
import java.util.regex.Pattern;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.soakwright.recipes.model.Goal;
import org.soakwright.recipes.model.Lot;
import org.soakwright.recipes.model.Medium;
import org.soakwright.recipes.model.Product;
import org.soakwright.recipes.model.Recipe;
import org.soakwright.recipes.model.Step;
import org.soakwright.recipes.text.Problem;

class RecipesTest {
    private static final Path LOINS = Path.of("examples/loin-desalting.yaml");
    private static final Path ACCEPTED = Path.of("src/test/resources/org/soakwright/recipes/accepted");
    private static final Path EVERY_PIECE = named("every-piece");
    private static final List<Path> EVERY = List.of(
            named("every-key"),
            EVERY_PIECE,
            named("every-liquor"),
            named("every-diffusivity"),
            named("every-doubt"),
            named("every-count"),
            named("every-gain"));

    private static Path named(String name) {
        return ACCEPTED.resolve(name + ".yaml");
    }

    @Test
    void aRecipeIsReadAsWritten() {
        Recipe recipe = accepted(LOINS).recipe();
        assertEquals("Desalting of dry-salted loins", recipe.title());
        assertEquals(Set.of(Product.FOOD), recipe.products());
        Lot lot = recipe.lot();
        assertEquals(600, lot.massKg().orElseThrow());
        assertEquals(600.0 / 1120, lot.volumeM3(), 1e-15);
        assertEquals(0.009, lot.grade("thin").orElseThrow().depth(), 1e-18);
        assertEquals(0.6, lot.grade("thick").orElseThrow().share());
        assertTrue(recipe.species("salt").orElseThrow().exchangesWith(Medium.LIQUOR));
        assertEquals(1200, Objects.requireNonNull(recipe.between()).si());
        Step.Soak soak = assertInstanceOf(Step.Soak.class, recipe.steps().get(0));
        assertEquals(1.2, soak.liquor().volumeM3(lot).orElseThrow(), 1e-12);
        assertEquals(277.15, Objects.requireNonNull(soak.temperature()).si());
        assertEquals(129, soak.time().choices(), "4 h to 36 h in quarters of an hour");
        assertEquals(List.of(Goal.TIME), recipe.minimise());
        assertEquals(3.1, recipe.liquorPrice(soak).orElseThrow().perM3(), 1e-15);
        assertEquals("EUR", Objects.requireNonNull(recipe.prices()).currency());
        assertEquals(40.0 / 3600, Objects.requireNonNull(recipe.prices()).perSecond(), 1e-17);
    }

    @Test
    void valuesKnowTheirPlace() {
        Recipe recipe = accepted(LOINS).recipe();
        assertEquals(LOINS + ":7:9", recipe.lot().amount().place().toString());
        assertEquals(LOINS + ":19:5", recipe.steps().get(0).place().toString());
    }

    @Test
    void theFingerprintChangesWithAnyByte(@TempDir Path folder) throws IOException {
        Path copy = folder.resolve("copy.yaml");
        Files.writeString(copy, Files.readString(LOINS));
        assertEquals(accepted(LOINS).sha256(), accepted(copy).sha256());
        Files.writeString(copy, Files.readString(LOINS) + "\n");
        assertTrue(!accepted(LOINS).sha256().equals(accepted(copy).sha256()));
    }

    @Test
    void aFileThatIsNotThereIsAProblemOfItsName(@TempDir Path folder) {
        Path missing = folder.resolve("loins.yaml");
        assertEquals(
                missing + ": there is no such file; check the name and the folder",
                only(Recipes.read(missing)).toString());
        assertEquals(
                folder + ": this is a folder; name a recipe file in it",
                only(Recipes.read(folder)).toString());
    }

    @Test
    void aLargeFileIsRefusedUnread(@TempDir Path folder) throws IOException {
        Path large = folder.resolve("large.yaml");
        Files.writeString(large, "# much\n".repeat(300_000));
        assertTrue(only(Recipes.read(large)).what().startsWith("the file is too large"));
    }

    @Test
    void noDamageToARecipeEverEscapesAsAnException() throws IOException {
        Random random = new Random(20260101);
        for (Path file : List.of(LOINS, EVERY_PIECE, named("every-doubt"), named("every-diffusivity"))) {
            String whole = Files.readString(file);
            int refused = 0;
            for (int trial = 0; trial < 2000; trial++) {
                String damaged = Damage.to(whole, random);
                if (Recipes.read("damaged", damaged) instanceof Outcome.Refused) {
                    refused++;
                }
            }
            assertTrue(refused > 1000, "most damage is noticed: " + refused);
        }
    }

    @Test
    void aNumberBeyondAllMeasureIsRefusedWhereverItStands() throws IOException {
        for (Path file : EVERY) {
            List<MatchResult> numbers = numbers(file);
            assertTrue(numbers.size() > 25, "numbers: " + numbers.size());
            for (MatchResult number : numbers) {
                for (String large : List.of("1e300", "-1e300", "1e999")) {
                    String changed = with(file, number, large);
                    Outcome outcome = Recipes.read("large", changed);
                    assertInstanceOf(Outcome.Refused.class, outcome, changed);
                }
            }
        }
    }

    @Test
    void aNumberNextToNothingIsReadOrRefusedButNeverFails() throws IOException {
        for (Path file : EVERY) {
            for (MatchResult number : numbers(file)) {
                for (String small : List.of("1e-300", "1e-999", "-1e-300", "0")) {
                    assertNotNull(Recipes.read("small", with(file, number, small)));
                }
            }
        }
    }

    private static List<MatchResult> numbers(Path file) throws IOException {
        Pattern number = Pattern.compile("(?<=[:\\[,] |\\[|\")[0-9][0-9.e-]*");
        return number.matcher(Files.readString(file)).results().toList();
    }

    private static String with(Path file, MatchResult number, String other) throws IOException {
        return new StringBuilder(Files.readString(file))
                .replace(number.start(), number.end(), other)
                .toString();
    }

    private static Outcome.Accepted accepted(Path file) {
        return assertInstanceOf(Outcome.Accepted.class, Recipes.read(file));
    }

    private static Problem only(Outcome outcome) {
        List<Problem> problems =
                assertInstanceOf(Outcome.Refused.class, outcome).problems();
        assertEquals(1, problems.size(), problems::toString);
        return problems.get(0);
    }
}
