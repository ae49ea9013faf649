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
}
