package org.soakwright.planner.report.compare;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.List;
import java.util.function.Function;
import org.junit.jupiter.api.Test;

class PairingTest {
    /** Names; two of the same first letter are alike. */
    private static List<String> pairs(List<String> a, List<String> b) {
        return Pairing.of(a, b, Function.identity(), (one, other) -> one.charAt(0) == other.charAt(0)).stream()
                .map(pair -> pair.a().orElse("-") + "|" + pair.b().orElse("-"))
                .toList();
    }

    @Test
    void sameNamesGoTogether() {
        assertEquals(List.of("s1|s1", "s2|s2"), pairs(List.of("s1", "s2"), List.of("s1", "s2")));
    }

    @Test
    void oneMoreStandsAlone() {
        assertEquals(List.of("s1|s1", "s2|-", "r|r"), pairs(List.of("s1", "s2", "r"), List.of("s1", "r")));
        assertEquals(List.of("s1|s1", "-|d", "r|r"), pairs(List.of("s1", "r"), List.of("s1", "d", "r")));
    }

    @Test
    void otherNamesOfTheSameKindGoTogetherBetweenThose() {
        assertEquals(
                List.of("s1|s9", "s2|s2", "d|-", "-|r"), pairs(List.of("s1", "s2", "d"), List.of("s9", "s2", "r")));
    }

    @Test
    void namesThatChangedPlacesAreNotCrossed() {
        assertEquals(List.of("a|-", "b|b", "-|a"), pairs(List.of("a", "b"), List.of("b", "a")));
    }

    @Test
    void nothingAgainstSomethingIsThatSomething() {
        assertEquals(List.of("-|a"), pairs(List.of(), List.of("a")));
        assertEquals(List.of(), pairs(List.of(), List.of()));
    }
}
