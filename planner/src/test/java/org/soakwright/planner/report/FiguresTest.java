package org.soakwright.planner.report;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class FiguresTest {
    @ParameterizedTest
    @CsvSource({
        "25, 25.00",
        "24.98765, 24.99",
        "999.96, 1000",
        "12345.6, 12346",
        "-0.41017, -0.4102",
        "0.00012345, 0.0001234",
        "0.000012346, 1.235e-5",
        "1e-18, ~0",
        "0, 0",
    })
    void aReadingHasFourSignificantDigits(double value, String shown) {
        assertEquals(shown, Figures.measured(value));
    }

    @ParameterizedTest
    @CsvSource({"600, 600", "1.2, 1.2", "0.45, 0.45", "1234.5, 1234", "100000, 100000"})
    void anAmountToMakeUpHasNoIdleZeros(double value, String shown) {
        assertEquals(shown, Figures.made(value));
    }

    @ParameterizedTest
    @CsvSource({"25.00003, 25, 25.00003", "25.4, 25, 25.40", "24.9999, 25, 24.9999", "0.09999999, 0.1, 0.09999999"})
    void aFailedLimitIsNeverShownAsIfItWereMet(double value, double limit, String shown) {
        assertEquals(shown, Figures.apart(value, limit));
    }
}
