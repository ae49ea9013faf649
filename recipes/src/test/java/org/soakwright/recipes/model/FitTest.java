package org.soakwright.recipes.model;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.soakwright.recipes.text.Kind;

class FitTest {
    private static Fit fit(double worth, double worst) {
        return new Fit("a.csv", 5, worth, Given.quantity("8", "mm", Kind.LENGTH), 0.06, worst);
    }

    /**
     * Lilliefors, J. Am. Stat. Assoc. 62:399 (1967), table 1, 5 % level; checked against reprints, which agree. His values came
     * from simulation and are known to be off by up to a few hundredths of themselves (Dallal and Wilkinson 1986).
     */
    @ParameterizedTest
    @CsvSource({
        "5, 0.337",
        "6, 0.319",
        "7, 0.300",
        "8, 0.285",
        "9, 0.271",
        "10, 0.258",
        "11, 0.249",
        "12, 0.242",
        "13, 0.234",
        "14, 0.227",
        "15, 0.220",
        "16, 0.213",
        "17, 0.206",
        "18, 0.200",
        "19, 0.195",
        "20, 0.190",
        "30, 0.161"
    })
    void theLimitIsThatOfLilliefors(int pieces, double published) {
        assertEquals(published, fit(pieces, 0).limit(), 0.025 * published);
    }

    @ParameterizedTest
    @CsvSource({"50", "1000", "100000"})
    void forManyPiecesItFallsAsTheirRoot(int pieces) {
        assertEquals(
                0.886 / Math.sqrt(pieces),
                fit(pieces, 0).limit(),
                0.011 * fit(pieces, 0).limit());
    }

    @Test
    void aGapThatChanceSeldomMakesIsDoubtful() {
        double limit = fit(40, 0).limit();
        assertEquals(Fit.Verdict.LOGNORMAL, fit(40, limit).verdict());
        assertEquals(Fit.Verdict.DOUBTFUL, fit(40, limit * 1.0001).verdict());
        assertEquals("doubtful", fit(40, 0.5).verdict().word());
    }

    @Test
    void aFitStandsOnPieces() {
        assertThrows(IllegalArgumentException.class, () -> fit(0, 0.1));
        assertThrows(IllegalArgumentException.class, () -> fit(5, 1.1));
        assertThrows(IllegalArgumentException.class, () -> fit(5, Double.NaN));
    }
}
