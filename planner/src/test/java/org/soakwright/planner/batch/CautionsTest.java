package org.soakwright.planner.batch;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.soakwright.recipes.model.Recipe;

/** Cautions come when product and conditions call for them, and some forbid to use a plan. */
class CautionsTest {
    private static Recipe warm(String time, String more) {
        return Recipes.of(
                Recipes.LOINS + more + "steps:",
                Recipes.water("one", "ratio: 2 L/kg", time).replace("temperature: 4 Cel", "temperature: 30 Cel"));
    }

    private static boolean anySays(List<String> cautions, String words) {
        return cautions.stream().anyMatch(caution -> caution.contains(words));
    }

    @Test
    void fiveHoursAtThirtyDegreesStopAPlanForFood() {
        Cautions cautions = Cautions.of(warm("5 h", ""));
        assertEquals(1, cautions.stops().size());
        assertTrue(cautions.stops().get(0).startsWith("Here steps between 21 °C and 57 °C last 5 h together"));
        assertTrue(cautions.shown().containsAll(cautions.stops()));
    }

    @Test
    void fourHoursDoNot() {
        assertTrue(Cautions.of(warm("4 h", "")).stops().isEmpty());
    }

    @Test
    void whatIsDueIsShownWithItsSource() {
        List<String> shown = Cautions.of(warm("1 h", "")).shown();
        assertTrue(anySays(shown, "time in between lets microbes grow (FDA Food Code 3-501.16"), shown.toString());
        assertFalse(anySays(shown, "static"), shown.toString());
    }

    @Test
    void whoeverAnswersForAPlanLiftsTheStopAndTheCautionStays() {
        Recipe answered = Recipes.of(
                Recipes.LOINS + "allowed-by: E. Vik\nsteps:",
                Recipes.water("one", "ratio: 2 L/kg", "5 h").replace("temperature: 4 Cel", "temperature: 30 Cel"));
        Cautions cautions = Cautions.of(answered);
        assertTrue(cautions.stops().isEmpty());
        assertTrue(
                anySays(cautions.shown(), "longer than any rule of time allows"),
                cautions.shown().toString());
    }

    @Test
    void fishWhoseWaterPhaseIsTooWeakIsCautionedAtItsLowest() {
        Recipe fish = Recipes.of(
                Recipes.LOINS
                                .replace("title: Loins", "title: Salmon loins")
                                .replace("start: 190 g/kg", "start: 20 g/kg")
                                .replace("  density:", "  moisture: {start: 70 %, end: 70 %}\n  density:")
                        + "steps:",
                "  - {rest: cold room, temperature: 2 Cel, time: 5 h}");
        List<String> shown = Cautions.of(new Batch(fish).follow(5 * 3600)).shown();
        // 20/(20 + 700) is 2.8 %.
        assertTrue(anySays(shown, "the lowest reading is below 3.5 %"), shown.toString());
    }
}
