package org.soakwright.recipes.text;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.BigDecimal;
import java.util.Arrays;
import java.util.Map;
import java.util.Objects;
import java.util.stream.Stream;
import javax.measure.format.UnitFormat;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;
import systems.uom.ucum.format.UCUMFormat;

/** The table of units against the Unified Code for Units of Measure as the systems-ucum library knows it. */
class UnitTableTest {
    private static final UnitFormat UCUM =
            Objects.requireNonNull(UCUMFormat.getInstance(UCUMFormat.Variant.CASE_SENSITIVE));

    /** The UCUM expression of each kind's SI unit. */
    private static final Map<Kind, String> SI = Map.ofEntries(
            Map.entry(Kind.DURATION, "s"),
            Map.entry(Kind.LENGTH, "m"),
            Map.entry(Kind.MASS, "kg"),
            Map.entry(Kind.VOLUME, "m3"),
            Map.entry(Kind.DENSITY, "kg/m3"),
            Map.entry(Kind.DIFFUSIVITY, "m2/s"),
            Map.entry(Kind.SPEED, "m/s"),
            Map.entry(Kind.FLOW, "m3/s"),
            Map.entry(Kind.LIQUOR_RATIO, "m3/kg"),
            Map.entry(Kind.MOLAR_ENERGY, "J/mol"),
            Map.entry(Kind.TEMPERATURE, "K"),
            Map.entry(Kind.PER_MASS, "kg/kg"),
            Map.entry(Kind.PER_VOLUME, "kg/m3"),
            Map.entry(Kind.FRACTION, "1"),
            Map.entry(Kind.PERMEANCE, "m/s"),
            Map.entry(Kind.VELOCITY, "m/s"),
            Map.entry(Kind.POWER_PER_VOLUME, "W/m3"),
            Map.entry(Kind.PER_AMOUNT, "mol/m3"),
            Map.entry(Kind.MOLAR_MASS, "kg/mol"),
            Map.entry(Kind.TEMPERATURE_DIFFERENCE, "K"),
            Map.entry(Kind.SATURATION, "1"),
            Map.entry(Kind.POWER, "W"),
            Map.entry(Kind.MASS_FLOW, "kg/s"));

    static Stream<Arguments> everyUnit() {
        return Arrays.stream(Kind.values())
                .flatMap(kind -> kind.units().stream().map(unit -> Arguments.of(kind, unit)));
    }

    @ParameterizedTest
    @MethodSource("everyUnit")
    void everyUnitIsWhatUcumSaysItIs(Kind kind, Unit unit) throws Exception {
        // What a percentage is of is to UCUM an annotation, in braces, which its library does not read.
        javax.measure.Unit<?> theirs = UCUM.parse(unit.symbol().replace(" of saturation", ""));
        javax.measure.Unit<?> si = UCUM.parse(Objects.requireNonNull(SI.get(kind)));
        for (String value : new String[] {"0", "1", "7.5", "1234"}) {
            BigDecimal number = new BigDecimal(value);
            double expected = theirs.getConverterToAny(si).convert(number).doubleValue();
            assertEquals(expected, unit.toSi(number), Math.abs(expected) * 1e-15, () -> value + " " + unit);
        }
    }

    @ParameterizedTest
    @MethodSource("everyUnit")
    void goingThroughSiAndBackChangesNothing(Kind kind, Unit unit) {
        double back = unit.fromSi(unit.toSi(new BigDecimal("37.25")));
        assertEquals(37.25, back, 37.25 * 4e-16 * (kind == Kind.TEMPERATURE ? 10 : 1));
    }

    @ParameterizedTest
    @MethodSource("everyUnit")
    void aSymbolHasOneMeaningWithinAKind(Kind kind, Unit unit) {
        assertEquals(
                1,
                kind.units().stream()
                        .filter(other -> other.symbol().equals(unit.symbol()))
                        .count());
    }

    @Test
    void everyExampleAndEveryUsualUnitIsAccepted() {
        for (Kind kind : Kind.values()) {
            Measurement example = Measurement.of(kind.example()).orElseThrow();
            assertTrue(kind.unit(example.unit()).isPresent(), kind::example);
            for (String usual : kind.usual().split(", ", -1)) {
                assertTrue(kind.unit(usual).isPresent(), () -> kind + " " + usual);
            }
        }
    }

    @Test
    void theDegreeSignIsReadAsCel() {
        assertEquals("Cel", Kind.TEMPERATURE.unit("°C").orElseThrow().symbol());
    }

    @Test
    void decimalsConvertWithOneRounding() {
        assertEquals(0.0123, Unit.of("mm", "1e-3").toSi(new BigDecimal("12.3")));
        assertEquals(281.15, Kind.TEMPERATURE.unit("Cel").orElseThrow().toSi(new BigDecimal("8")));
    }

    @Test
    void moneyPerHourIsMoneyPerSecond() {
        Unit perHour = Unit.currency("EUR").per(Kind.DURATION.unit("h").orElseThrow());
        assertEquals("EUR/h", perHour.symbol());
        assertEquals(0.01, perHour.toSi(new BigDecimal("36")));
    }
}
