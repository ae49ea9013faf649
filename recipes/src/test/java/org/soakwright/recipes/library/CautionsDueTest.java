package org.soakwright.recipes.library;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static org.soakwright.recipes.library.StepKind.DRY;
import static org.soakwright.recipes.library.StepKind.REST;
import static org.soakwright.recipes.library.StepKind.RINSE;
import static org.soakwright.recipes.library.StepKind.SOAK;
import static org.soakwright.recipes.model.Product.CORROSIVE;
import static org.soakwright.recipes.model.Product.FLAMMABLE;
import static org.soakwright.recipes.model.Product.FOOD;
import static org.soakwright.recipes.model.Product.OTHER;
import static org.soakwright.recipes.model.Reading.HIGHEST;
import static org.soakwright.recipes.model.Reading.LOWEST;
import static org.soakwright.recipes.model.Reading.MEAN;

import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** Every caution of the book beside the least that makes it due, and beside neighbours that do not. */
class CautionsDueTest {
    private static final CautionBook BOOK = CautionBook.load();

    private record Case(String id, Situation due, List<Situation> notDue) {
        @Override
        public String toString() {
            return id;
        }
    }

    private static Case of(String id, Situation due, Situation... notDue) {
        return new Case(id, due, List.of(notDue));
    }

    private static Situation food() {
        return Situation.of(FOOD);
    }

    private static Situation other() {
        return Situation.of(OTHER);
    }

    private static Situation flammable() {
        return Situation.of(FLAMMABLE);
    }

    private static Situation fish() {
        return food().called("Brining of Cod, large");
    }

    private static Situation fishBrine() {
        return fish().liquor("salt", 120);
    }

    static Stream<Case> cases() {
        return Stream.of(ofFood(), ofBrine(), ofNitrite(), ofCorrosives(), ofWhatBurns(), ofTanks())
                .flatMap(List::stream);
    }

    private static List<Case> ofFood() {
        return List.of(
                of("estimate", other()),
                of("food-water", food().step(SOAK, 4, 1), food().step(REST, 4, 1), other().step(SOAK, 4, 1)),
                of("food-holding", food(), other(), Situation.of(CORROSIVE)),
                of(
                        "food-held",
                        food().step(REST, 5.1, 1),
                        food().step(REST, 5, 1),
                        food().step(REST, 57, 1),
                        food().stepOfUnknownTemperature(REST, 1),
                        other().step(REST, 20, 1)),
                of(
                        "food-held-long",
                        food().step(SOAK, 12, 2).step(REST, 30, 2.1),
                        food().step(SOAK, 12, 2).step(REST, 30, 2),
                        food().step(SOAK, 12, 2).step(REST, 4, 9),
                        other().step(SOAK, 12, 5)),
                of(
                        "food-held-warm",
                        food().step(DRY, 40, 3).step(DRY, 21.5, 1.5),
                        food().step(DRY, 40, 3).step(DRY, 21, 9),
                        food().step(DRY, 40, 4),
                        food().step(DRY, 60, 9),
                        other().step(DRY, 40, 9)),
                of("food-cooling", food().step(RINSE, 58, 1), food().step(RINSE, 57, 1), other().step(RINSE, 58, 1)));
    }

    private static List<Case> ofBrine() {
        return List.of(
                of("brine-listeria", food().liquor("salt", 31), food().liquor("salt", 30), other().liquor("salt", 31)),
                of(
                        "brine-allergens",
                        food().liquor("NaCl", 31),
                        food().liquor("sugar", 31),
                        other().liquor("NaCl", 31)),
                of(
                        "fish-brine-start",
                        fishBrine().step(SOAK, 15.7, 1),
                        fishBrine().step(SOAK, 15.6, 1),
                        fishBrine().step(DRY, 25, 1),
                        food().liquor("salt", 120).step(SOAK, 15.7, 1),
                        fish().liquor("salt", 0).step(SOAK, 15.7, 1)),
                of(
                        "fish-brine-long",
                        fishBrine().step(SOAK, 3.4, 4.1),
                        fishBrine().step(SOAK, 3.3, 4.1),
                        fishBrine().step(SOAK, 3.4, 4),
                        fishBrine().step(SOAK, 3.4, 3).step(SOAK, 3.4, 3)),
                of(
                        "fish-brine-reuse",
                        fishBrine(),
                        food().called("Brining of codes").liquor("salt", 120),
                        fish().species("salt")),
                of("fish-water-phase", fish().species("salt"), fish().species("saltpetre"), food().species("salt")),
                of(
                        "fish-water-phase-low",
                        fish().waterPhase("salt", LOWEST, 0.05, 0.0349),
                        fish().waterPhase("salt", LOWEST, 0.05, 0.035),
                        fish().waterPhase("salt", MEAN, 0.0349),
                        fish().species("salt")),
                of(
                        "fish-botulinum",
                        fish().waterPhase("salt", LOWEST, 0.049),
                        fish().waterPhase("salt", LOWEST, 0.05),
                        food().waterPhase("salt", LOWEST, 0.049)),
                of(
                        "fish-uneviscerated",
                        food().called("uneviscerated whitefish"),
                        food().called("eviscerated whitefish")));
    }

    private static List<Case> ofNitrite() {
        return List.of(
                of(
                        "nitrite",
                        food().species("sodium nitrate"),
                        food().species("salt"),
                        other().species("sodium nitrate")),
                of(
                        "nitrite-over",
                        food().piece("nitrite", MEAN, 100e-6, 201e-6),
                        food().piece("nitrite", MEAN, 100e-6, 200e-6),
                        food().piece("nitrite", HIGHEST, 201e-6),
                        food().piece("nitrate", MEAN, 201e-6),
                        food().species("nitrite"),
                        other().piece("nitrite", MEAN, 201e-6)),
                of(
                        "nitrate-over",
                        food().piece("nitrate", MEAN, 501e-6),
                        food().piece("nitrate", MEAN, 500e-6),
                        food().piece("nitrite", MEAN, 501e-6)),
                of(
                        "food-acidified",
                        food().species("acetic-acid"),
                        food().species("acidity"),
                        other().species("acid")));
    }

    private static List<Case> ofCorrosives() {
        Situation solution = Situation.of(CORROSIVE);
        return List.of(
                of("corrosive-protection", solution, food()),
                of("corrosive-drench", other().species("NaOH"), other().species("salt")),
                of("corrosive-washing", other().species("nitric acid"), other().species("acetic acid")),
                of("caustic-into-water", food().species("Sodium_Hydroxide"), food().species("sodium chloride")),
                of("caustic-in-food", food().species("lye"), other().species("lye"), Situation.of(CORROSIVE, FOOD)),
                of("acid-into-water", other().species("HCl"), solution, other().species("citric acid")),
                of("acid-hydrogen", other().species("sulfuric acid"), solution, other().species("sulfate")),
                of("acid-hydrofluoric", other().species("hydrofluoric acid"), other().species("hydrochloric acid")));
    }

    private static List<Case> ofWhatBurns() {
        Situation leach = other().called("heptane leach");
        return List.of(
                of("flammable-ignition", leach, other().species("ethanol"), other().called("water leach")),
                of("flammable-bonding", flammable(), other(), food()),
                of("flammable-smoking", flammable().step(SOAK, 40, 1), flammable(), other().step(SOAK, 40, 1)),
                of("flammable-tank", flammable().step(RINSE, 40, 1), flammable().step(DRY, 40, 1)),
                of(
                        "flammable-dryer",
                        flammable().step(DRY, 40, 1),
                        flammable().step(REST, 40, 1),
                        other().step(DRY, 40, 1)),
                of(
                        "flammable-vapour",
                        flammable().stepOfUnknownTemperature(DRY, 1),
                        flammable().step(SOAK, 40, 1)),
                of("food-solvent", Situation.of(FOOD, FLAMMABLE), food(), flammable()));
    }

    private static List<Case> ofTanks() {
        return List.of(of("confined-space", other().vessel(1001), other().vessel(1000), other()));
    }

    @ParameterizedTest
    @MethodSource("cases")
    void aCautionIsDueHereAndNotNextDoor(Case one) {
        Caution caution = BOOK.find(one.id()).orElseThrow();
        assertTrue(caution.isDue(one.due()));
        for (Situation neighbour : one.notDue()) {
            assertFalse(
                    caution.isDue(neighbour), () -> "neighbour " + one.notDue().indexOf(neighbour));
        }
        assertTrue(one.id().equals("estimate") || !one.notDue().isEmpty());
    }

    @Test
    void everyCautionOfTheBookIsHere() {
        assertEquals(
                BOOK.all().stream().map(Caution::id).toList(),
                cases().map(Case::id).toList());
    }
}
