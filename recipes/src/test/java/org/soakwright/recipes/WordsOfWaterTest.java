package org.soakwright.recipes;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Path;
import java.util.List;
import java.util.Objects;
import org.junit.jupiter.api.Test;
import org.soakwright.recipes.model.Content;
import org.soakwright.recipes.model.Counted;
import org.soakwright.recipes.model.Faces;
import org.soakwright.recipes.model.Film;
import org.soakwright.recipes.model.Liquor;
import org.soakwright.recipes.model.Per;
import org.soakwright.recipes.model.Phase;
import org.soakwright.recipes.model.Recipe;
import org.soakwright.recipes.model.Start;
import org.soakwright.recipes.model.Step;
import org.soakwright.recipes.model.Substance;
import org.soakwright.recipes.model.Target;
import org.soakwright.recipes.model.Traits;

/** What the words for water, mass, substances, films and skins become. */
class WordsOfWaterTest {
    private static final Recipe COUNT = recipe("every-count");
    private static final Recipe GAIN = recipe("every-gain");
    private static final Recipe LIQUOR = recipe("every-liquor");

    private static Recipe recipe(String name) {
        Path file = Path.of("src/test/resources/org/soakwright/recipes/accepted", name + ".yaml");
        return assertInstanceOf(Outcome.Accepted.class, Recipes.read(file)).recipe();
    }

    @Test
    void theWaterIsTheSpeciesWhoseSubstanceItIsElseTheOneNamedSo() {
        assertEquals("moisture", COUNT.water().orElseThrow().name());
        assertEquals("water", recipe("every-key").water().orElseThrow().name());
        assertTrue(GAIN.water().isEmpty());
    }

    @Test
    void aStartPerDryMassKeepsWhatItIsCountedAgainst() {
        Content content =
                ((Start.Uniform) COUNT.species("moisture").orElseThrow().start()).content();
        assertEquals(Per.DRY, content.per());
        assertEquals(1.8, content.si());
        assertEquals("1.8 kg/kg", content.toString());
    }

    @Test
    void aTargetSaysWhatItCountsAgainst() {
        assertEquals(
                List.of(
                        Counted.AS_LOADED,
                        new Counted.OfPiece(Per.PRESENT),
                        new Counted.OfPiece(Per.DRY),
                        new Counted.InPhase(Phase.WATER),
                        new Counted.InPhase(Phase.MOISTURE)),
                COUNT.targets().stream()
                        .filter(Target.OfPieces.class::isInstance)
                        .map(target -> ((Target.OfPieces) target).counted())
                        .toList());
    }

    @Test
    void aTargetsOwnConfidenceGoesBeforeTheRecipes() {
        assertEquals("E. Vik, quality", COUNT.allowedBy());
        assertEquals(
                List.of("90 %", "95 %", "90 %", "90 %", "90 %", "80 %", "90 %"),
                COUNT.targets().stream()
                        .map(target -> COUNT.confidence(target).orElseThrow().toString())
                        .toList());
        Recipe everyKey = recipe("every-key");
        assertTrue(everyKey.targets().stream()
                .noneMatch(target -> everyKey.confidence(target).isPresent()));
    }

    @Test
    void aLimitOnTheMassIsAMassOrAShareOfTheStart() {
        Target.OfMass mass = (Target.OfMass) COUNT.targets().get(5);
        assertEquals(540, Objects.requireNonNull(mass.atLeast()).si());
        assertFalse(mass.ofStart());
        Target.OfMass share = (Target.OfMass) COUNT.targets().get(6);
        assertEquals(0.9, Objects.requireNonNull(share.atLeast()).si());
        assertTrue(share.ofStart());
        assertEquals("water", Objects.requireNonNull(share.after()).name());
    }

    @Test
    void gainAndMoistureAreParts() {
        assertEquals(
                List.of(0.12, 0.0, -0.085),
                GAIN.steps().stream()
                        .map(step -> Objects.requireNonNull(step.head().gain()).si())
                        .toList());
        assertEquals(0.56, Objects.requireNonNull(GAIN.lot().moisture()).start().si());
        assertEquals(0.78, Objects.requireNonNull(GAIN.lot().moisture()).end().si());
    }

    @Test
    void aSkinBelongsToItsGradeOrToAll() {
        Traits byGrade = GAIN.species("salt").orElseThrow().traits();
        assertEquals(2e-8, byGrade.skin("slice").orElseThrow().permeance().si(), 1e-22);
        assertEquals(Faces.ONE, byGrade.skin("block").orElseThrow().face());
        assertTrue(byGrade.skin("other").isEmpty());
        Traits all = COUNT.species("salt").orElseThrow().traits();
        assertEquals(0.02 / 86400, all.skin("ball").orElseThrow().permeance().si(), 1e-20);
        assertTrue(COUNT.species("moisture").orElseThrow().traits().skin("ball").isEmpty());
    }

    @Test
    void aLiquorTellsWhatIsByVolumeAndByMassOnlyWithItsDensity() {
        assertFalse(tells(0, "salt"), "a share of saturation");
        assertEquals("75 % of saturation", content(0, "salt").toString());
        assertEquals(0.75, content(0, "salt").si());
        assertFalse(tells(1, "salt"), "by mass without a density");
        assertTrue(tells(3, "sugar"), "by mass with one");
        assertEquals(345, liquor(3).kgPerM3("sugar"), 1e-12);
        assertFalse(tells(4, "salt"), "by amount");
        assertEquals(2000, content(4, "salt").si());
        assertThrows(IllegalStateException.class, () -> liquor(4).kgPerM3("salt"));
    }

    private static Liquor liquor(int step) {
        return ((Step.Wet) LIQUOR.steps().get(step)).liquor();
    }

    private static Content content(int step, String species) {
        return Objects.requireNonNull(liquor(step).contents().get(species));
    }

    private static boolean tells(int step, String species) {
        return liquor(step).tells(content(step, species));
    }

    @Test
    void aFilmIsWorkedOutFromWhatMovesTheLiquor() {
        assertEquals(
                0.12,
                Objects.requireNonNull(
                                assertInstanceOf(Film.Still.class, film(0)).length())
                        .si());
        Film.Past past = assertInstanceOf(Film.Past.class, film(1));
        assertEquals(0.05, past.speed().si());
        assertFalse(past.alsoStill());
        assertTrue(assertInstanceOf(Film.Past.class, film(2)).alsoStill());
        assertEquals(40, assertInstanceOf(Film.Stirred.class, film(3)).power().si());
        Film.Packed packed = assertInstanceOf(Film.Packed.class, film(4));
        assertEquals(0.002, packed.speed().si());
        assertEquals(0.4, packed.voids().si());
    }

    private static Film film(int step) {
        return ((Step.Wet) LIQUOR.steps().get(step)).film();
    }

    @Test
    void aSubstanceIsWrittenInWords() {
        assertEquals("sodium chloride", Substance.SODIUM_CHLORIDE.word());
        assertEquals(
                Substance.SUCROSE,
                LIQUOR.species("sugar").orElseThrow().traits().substance());
        assertTrue(Substance.SUCROSE.hasKnownLiquor());
        assertFalse(Substance.WATER.hasKnownLiquor());
    }
}
