package org.soakwright.recipes.parsing;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class NormalTest {
    /** Abramowitz and Stegun, Handbook of Mathematical Functions (1964), table 26.1. */
    @ParameterizedTest
    @CsvSource({
        "0.00, 0.500000000000000",
        "0.50, 0.691462461274013",
        "1.00, 0.841344746068543",
        "1.50, 0.933192798731142",
        "2.00, 0.977249868051821",
        "3.00, 0.998650101968370"
    })
    void theShareUpToIsTheTabulatedOne(double x, double published) {
        assertEquals(published, Normal.upTo(x), 1.5e-15);
        assertEquals(1 - published, Normal.upTo(-x), 1.5e-15);
    }

    @Test
    void farOutNothingIsLeft() {
        assertEquals(1, Normal.upTo(1e300));
        assertEquals(0, Normal.upTo(-1e300));
        assertEquals(1, Normal.upTo(8.999), 1e-15);
    }
}
