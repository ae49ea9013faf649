package org.soakwright.recipes.model;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.jspecify.annotations.Nullable;
import org.junit.jupiter.api.Test;
import org.soakwright.recipes.text.Place;
import org.soakwright.recipes.text.Unsound;

class TimeTest {
    private static final Place HERE = new Place("f", 1, 1);

    private static Time.Between between(Quantity from, Quantity to, Quantity grain, @Nullable Quantity planned) {
        return new Time.Between(HERE, from, to, grain, planned);
    }

    @Test
    void aRangeOffersEveryGrainUpToItsEnd() {
        Time time = between(Given.time("4", "h"), Given.time("5", "h"), Given.time("15", "min"), null);
        assertEquals(5, time.choices());
        assertEquals(14400, time.seconds(0));
        assertEquals(18000, time.seconds(4));
        assertTrue(time.isFree());
        assertTrue(time.definite().isEmpty());
    }

    @Test
    void aRangeEndsBeforeAGrainThatWouldPassIt() {
        Time time = between(Given.time("1", "h"), Given.time("2", "h"), Given.time("25", "min"), null);
        assertEquals(3, time.choices());
        assertEquals(3600 + 50 * 60, time.seconds(2));
    }

    @Test
    void theEndBelongsToTheRangeThoughDecimalsDoNotDivide() {
        Time time = between(Given.time("0.1", "h"), Given.time("0.7", "h"), Given.time("0.1", "h"), null);
        assertEquals(7, time.choices());
    }

    @Test
    void aRangeHasAMillionChoicesAtMost() {
        assertEquals(
                1_000_000,
                between(Given.time("1", "s"), Given.time("1000000", "s"), Given.time("1", "s"), null)
                        .choices());
        assertThrows(
                Unsound.class,
                () -> between(Given.time("1", "s"), Given.time("1000001", "s"), Given.time("1", "s"), null));
    }

    @Test
    void thePlannedTimeIsTheDefiniteOne() {
        Quantity planned = Given.time("90", "min");
        assertEquals(
                planned,
                between(Given.time("1", "h"), Given.time("2", "h"), Given.time("1", "min"), planned)
                        .definite()
                        .orElseThrow());
        assertThrows(
                Unsound.class,
                () -> between(
                        Given.time("1", "h"), Given.time("2", "h"), Given.time("1", "min"), Given.time("3", "h")));
    }

    @Test
    void severalTimesAreOfferedRising() {
        Time time = new Time.AnyOf(HERE, List.of(Given.time("9", "h"), Given.time("6", "h")), null);
        assertEquals(21600, time.seconds(0));
        assertEquals(32400, time.seconds(1));
        assertThrows(Unsound.class, () -> new Time.AnyOf(HERE, List.of(), null));
        assertThrows(Unsound.class, () -> new Time.AnyOf(HERE, List.of(Given.time("9", "h")), Given.time("8", "h")));
    }

    @Test
    void aFixedTimeIsTheOnlyChoice() {
        Time time = new Time.Fixed(Given.time("12", "h"));
        assertFalse(time.isFree());
        assertEquals(1, time.choices());
        assertEquals(43200, time.seconds(0));
        assertThrows(Unsound.class, () -> new Time.Fixed(Given.time("0", "h")));
    }
}
