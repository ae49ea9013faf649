package org.soakwright.planner.report.picture;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.awt.Color;
import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class OklabTest {
    /** W3C, CSS Color Module Level 4, the sRGB colours of its OKLab examples; the figures are quoted from memory. */
    @ParameterizedTest
    @CsvSource({
        "255, 255, 255, 1.00000,  0.00000,  0.00000",
        "255,   0,   0, 0.62796,  0.22486,  0.12585",
        "  0, 255,   0, 0.86644, -0.23389,  0.17950",
        "  0,   0, 255, 0.45201, -0.03246, -0.31153",
        "  0, 128,   0, 0.51975, -0.14030,  0.10768"
    })
    void coloursLieWhereTheyArePublishedToLie(int red, int green, int blue, double lightness, double a, double b) {
        Oklab found = Oklab.of(new Color(red, green, blue));
        assertEquals(lightness, found.lightness(), 1e-4);
        assertEquals(a, found.a(), 1e-4);
        assertEquals(b, found.b(), 1e-4);
    }

    @Test
    void everyColourComesBack() {
        SplittableRandom random = new SplittableRandom(3);
        for (int i = 0; i < 2000; i++) {
            Color color = new Color(random.nextInt(0x1000000));
            assertEquals(color, Oklab.of(color).color());
        }
    }
}
