package org.soakwright.solver.transport;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.util.List;
import org.junit.jupiter.api.function.Executable;

/** What the tests of this package share. */
final class Check {
    static final double ICE_POINT = 273.15;

    private Check() {}

    static void assertRelative(double expected, double actual, double tolerance, String what) {
        assertEquals(1, actual / expected, tolerance, what + ": expected " + expected + ", found " + actual);
    }

    static void assertRefused(String message, Executable call) {
        assertEquals(message, assertThrows(IllegalArgumentException.class, call).getMessage());
    }

    static List<String> texts(List<Caution> cautions) {
        return cautions.stream().map(Caution::text).toList();
    }
}
