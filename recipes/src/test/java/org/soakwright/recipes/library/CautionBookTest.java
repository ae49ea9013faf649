package org.soakwright.recipes.library;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Set;
import java.util.stream.Collectors;
import org.junit.jupiter.api.Test;
import org.soakwright.recipes.model.Product;
import org.soakwright.recipes.model.Reading;

class CautionBookTest {
    private static final CautionBook BOOK = CautionBook.load();

    @Test
    void everyCautionHasADatedSourceAndSaysHowMuchOfItWasRead() {
        assertEquals(36, BOOK.all().size());
        for (Caution caution : BOOK.all()) {
            assertFalse(caution.source().dated().isBlank(), caution.id());
            assertTrue(
                    caution.source().read() == Read.MEMORY
                            || !caution.source().section().isEmpty(),
                    caution.id());
        }
        Set<String> remembered = BOOK.all().stream()
                .filter(caution -> caution.source().read() == Read.MEMORY)
                .filter(caution -> !caution.source().document().equals(Authority.COMMON_PRACTICE))
                .map(Caution::id)
                .collect(Collectors.toSet());
        assertEquals(
                Set.of("fish-water-phase", "fish-water-phase-low"), remembered, "from memory, though a code is named");
    }

    @Test
    void theBookCitesTheSourceBesideTheText() {
        assertEquals(
                "Have suitable facilities for drenching eyes and body within the work area (29 CFR 1910.151(c)).",
                shown("corrosive-drench", Situation.of(Product.CORROSIVE)));
        assertEquals(
                "Wear eye and skin protection, and keep to the safety data sheet (common practice).",
                shown("corrosive-protection", Situation.of(Product.CORROSIVE)));
    }

    @Test
    void theTimeThatACautionCountsStandsInItsText() {
        Situation warm = Situation.of(Product.FOOD).step(StepKind.SOAK, 12, 3).step(StepKind.REST, 30, 5);
        assertEquals(
                "Here steps between 5 °C and 57 °C last 8 h together: have a food safety plan that allows it"
                        + " (FDA Food Code 3-501.16).",
                shown("food-held", warm));
        assertEquals(
                "Here steps between 21 °C and 57 °C last 5 h together, longer than any rule of time allows: use this plan only"
                        + " where a licensed food safety plan allows it (FDA Food Code 3-501.19).",
                shown("food-held-warm", warm));
        for (Caution caution : BOOK.all()) {
            assertTrue(
                    !caution.text().contains("{") || caution.when().held(warm).isPresent(),
                    () -> caution.id() + " counts no time");
        }
    }

    @Test
    void twoCautionsStopAPlanAndSayWhy() {
        List<Caution> stopping = BOOK.all().stream()
                .filter(caution -> caution.weight() instanceof Weight.Stops)
                .toList();
        assertEquals(
                List.of("food-held-warm", "nitrite-over"),
                stopping.stream().map(Caution::id).toList());
        for (Caution caution : stopping) {
            assertTrue(((Weight.Stops) caution.weight()).because().length() > 40, caution.id());
            assertTrue(caution.source().read() == Read.TEXT, "a stop stands on a text that was read: " + caution.id());
        }
    }

    @Test
    void aStoppedPlanIsFreedByWhoeverAnswersForItButTheCautionStays() {
        Situation over = Situation.of(Product.FOOD).piece("nitrite", Reading.MEAN, 250e-6);
        assertEquals(
                List.of("nitrite-over"),
                BOOK.stopping(over).stream().map(Caution::id).toList());
        over.allowedBy("cure plan 12");
        assertEquals(List.of(), BOOK.stopping(over));
        assertTrue(BOOK.due(over).stream().anyMatch(caution -> caution.id().equals("nitrite-over")));
    }

    @Test
    void aPlanThatNothingSpeaksAgainstIsOnlyAnEstimate() {
        Situation plain = Situation.of(Product.OTHER).step(StepKind.SOAK, 20, 48);
        assertEquals(
                List.of("estimate"), BOOK.due(plain).stream().map(Caution::id).toList());
        assertEquals(List.of(), BOOK.stopping(plain));
    }

    @Test
    void everySourceAndEveryListOfWordsIsUsed() throws IOException {
        String text = Files.readString(Path.of("library/cautions.yaml"));
        String uses = text.substring(text.indexOf("\ncautions:"));
        List<String> sources = keys(text, "\nsources:", "\ncautions:");
        List<String> words = keys(text, "\nwords:", "\nsources:");
        assertTrue(sources.size() > 20 && words.size() >= 10);
        for (String source : sources) {
            assertTrue(uses.contains("\n    source: " + source + "\n"), source);
        }
        for (String list : words) {
            assertTrue(uses.matches("(?s).*(of|species|called): " + list + "\\b.*"), list);
        }
    }

    private static List<String> keys(String text, String from, String to) {
        return text.substring(text.indexOf(from), text.indexOf(to))
                .lines()
                .filter(line -> line.matches(" {2}[a-z-]+:.*"))
                .map(line -> line.strip().replaceFirst(":.*", ""))
                .toList();
    }

    private static String shown(String id, Situation situation) {
        return BOOK.find(id).orElseThrow().shown(situation, seconds -> Math.round(seconds / 3600) + " h");
    }
}
