package org.soakwright.recipes.text;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.BigDecimal;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class MeasurementTest {
    @ParameterizedTest
    @CsvSource({
        "6 h, 6, h",
        "8e-10 m2/s, 8e-10, m2/s",
        "5%, 5, %",
        "12   mm, 12, mm",
        "+1.50E+3 kg, 1500, kg",
        "-3 Cel, -3, Cel",
        "0.051 1, 0.051, 1",
        "0.051, 0.051, ''",
        "007 d, 7, d"
    })
    void aNumberAndItsUnitAreReadApart(String text, BigDecimal number, String unit) {
        Measurement found = Measurement.of(text).orElseThrow();
        assertEquals(0, number.compareTo(found.number()));
        assertEquals(unit, found.unit());
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "",
                "h",
                ".5 h",
                "5. h",
                "1,5 h",
                "1_000 kg",
                "12:30:00",
                "NaN",
                ".inf",
                "Infinity kg",
                "1e9999 kg",
                "--1 h",
                "٣ h",
                "123456789012345678901 kg"
            })
    void whatIsNoPlainNumberIsNotRead(String text) {
        assertFalse(Measurement.of(text).isPresent());
    }

    @Test
    void aDecimalCommaIsNamed() {
        assertEquals("found \"1,5 h\" with a comma, decimals take a point", Measurement.whyNot("1,5 h"));
    }

    @Test
    void aValueThatIsNotFiniteIsNamed() {
        assertEquals("found \".NaN\", which is not a finite number", Measurement.whyNot(".NaN"));
        assertEquals("found \"-inf kg\", which is not a finite number", Measurement.whyNot("-inf kg"));
    }

    @Test
    void aNumberTooLongOrTooLargeIsCalledThat() {
        assertEquals("found \"1e9999 kg\", a number too large or too small to hold", Measurement.whyNot("1e9999 kg"));
        assertEquals(
                "found \"123456789012345678901 kg\", a number too long to hold, of more than 20 digits before or after"
                        + " its point",
                Measurement.whyNot("123456789012345678901 kg"));
        assertEquals("found \"h\", which does not begin with a plain number", Measurement.whyNot("h"));
    }

    @Test
    void aNumberIsKeptAsWritten() {
        assertEquals("1.50E+3", Measurement.of("1.50E+3 kg").orElseThrow().written());
        assertEquals("0", Shown.number(0.0));
        assertEquals("-0.8", Shown.number(-0.8));
        assertEquals("1e300", Shown.number(1e300));
    }

    @Test
    void aWrongUnitIsNamedByWhatItMeasures() {
        assertEquals(
                "found \"6 kg\", a mass, where a duration is needed",
                Measurement.wrongUnit("6 kg", "kg", List.of(Kind.DURATION)));
        assertEquals(
                "found \"6 hrs\" in an unknown unit, where a duration is needed",
                Measurement.wrongUnit("6 hrs", "hrs", List.of(Kind.DURATION)));
        assertEquals("found \"6\" without a unit", Measurement.wrongUnit("6", "", List.of(Kind.DURATION)));
    }

    @Test
    void theRemedyGivesAnExampleAndTheUnits() {
        assertEquals(
                "write a duration such as 6 h (units such as s, min, h, d, wk)",
                Measurement.remedy(List.of(Kind.DURATION)));
    }

    @Test
    void theNearestWordIsFoundByEditDistance() {
        assertEquals(2, Nearest.distance("kiten", "sitten"));
        assertEquals(1, Nearest.distance("raeding", "reading"), "a swap of neighbours is one edit");
        assertEquals("did you mean \"thickness\"?", Nearest.hint("thicknes", List.of("name", "thickness")));
        assertEquals(
                "known are salt, water; the nearest is \"salt\"", Nearest.hint("lactose", List.of("salt", "water")));
    }

    @Test
    void whatIsShownStaysOnOneShortLineAndCommandsNoTerminal() {
        assertEquals("\"a\\u000ab\\u001b[31m\"", Shown.quoted("a\nb\u001b[31m"));
        assertEquals(63, Shown.quoted("x".repeat(500)).length());
        assertTrue(Shown.isOneLine("Løin 5 °C"));
        assertFalse(Shown.isOneLine("a\u202eb"), "a direction override would disguise a name");
    }
}
