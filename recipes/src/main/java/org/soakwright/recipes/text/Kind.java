package org.soakwright.recipes.text;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/**
 * What a value can be, the units it may be written in, and an example for whoever has to correct one. This is the whole
 * table of units; tests compare each entry with the UCUM library.
 */
public enum Kind {
    DURATION("a duration", "6 h", "s, min, h, d, wk", Atoms.TIME),
    LENGTH("a length", "12 mm", "mm, cm, m, um", Atoms.LENGTH),
    MASS("a mass", "600 kg", "kg, g, t", Atoms.MASS),
    VOLUME("a volume", "1200 L", "L, mL, m3", Atoms.VOLUME),
    DENSITY("a density", "1120 kg/m3", "kg/m3, g/cm3, kg/L", Atoms.quotients(Atoms.MASS, Atoms.VOLUME)),
    DIFFUSIVITY("a diffusivity", "8e-10 m2/s", "m2/s, cm2/s, mm2/h", Atoms.quotients(Atoms.AREA, Atoms.TIME)),
    SPEED("a film coefficient", "2e-6 m/s", "m/s, mm/s, cm/h", Atoms.quotients(Atoms.LENGTH, Atoms.TIME)),
    FLOW("a flow", "10 L/min", "L/min, L/h, m3/h", Atoms.quotients(Atoms.VOLUME, Atoms.TIME)),
    LIQUOR_RATIO("a volume per mass", "2 L/kg", "L/kg, mL/g, m3/t", Atoms.quotients(Atoms.VOLUME, Atoms.MASS)),
    MOLAR_ENERGY("an energy per amount", "22 kJ/mol", "kJ/mol, J/mol", Atoms.MOLAR_ENERGY),
    TEMPERATURE("a temperature", "4 Cel", "Cel, K", Atoms.TEMPERATURE),
    PER_MASS("a content by mass", "190 g/kg", "g/kg, mg/kg, %", Atoms.CONTENT_BY_MASS),
    PER_VOLUME("a content by volume", "30 g/L", "g/L, mg/L, kg/m3", Atoms.quotients(Atoms.MASS, Atoms.VOLUME)),
    FRACTION("a share", "5 %", "%, [ppth]", Atoms.FRACTION),
    PERMEANCE("a permeance", "2e-8 m/s", "m/s, mm/s, cm/h", Atoms.quotients(Atoms.LENGTH, Atoms.TIME)),
    VELOCITY("a speed", "0.05 m/s", "m/s, cm/s, mm/s, m/h", Atoms.quotients(Atoms.LENGTH, Atoms.TIME)),
    POWER_PER_VOLUME("a power per volume", "40 W/m3", "W/m3, kW/m3, W/L", Atoms.quotients(Atoms.POWER, Atoms.VOLUME)),
    PER_AMOUNT("an amount per volume", "2 mol/L", "mol/L, mmol/L, mol/m3", Atoms.quotients(Atoms.AMOUNT, Atoms.VOLUME)),
    MOLAR_MASS("a molar mass", "58.44 g/mol", "g/mol, kg/mol", Atoms.quotients(Atoms.MASS, List.of(Atoms.MOLE))),
    TEMPERATURE_DIFFERENCE("a difference in temperature", "2 K", "K", List.of(Unit.of("K", "1"))),
    SATURATION("a share of saturation", "75 % of saturation", "% of saturation", Atoms.SATURATION),
    POWER("a power", "40 kW", "kW, W", Atoms.POWER),
    MASS_FLOW("a mass per time", "300 kg/h", "kg/h, kg/min, t/h", Atoms.quotients(Atoms.MASS, Atoms.TIME));

    private final String label;
    private final String example;
    private final String usual;

    @SuppressWarnings("ImmutableEnumChecker") // only ever a List.of or a List.copyOf
    private final List<Unit> units;

    @SuppressWarnings("ImmutableEnumChecker") // filled once, in the constructor
    private final Map<String, Unit> bySymbol = new HashMap<>();

    Kind(String label, String example, String usual, List<Unit> units) {
        this.label = label;
        this.example = example;
        this.usual = usual;
        this.units = units;
        units.forEach(unit -> bySymbol.put(unit.symbol(), unit));
    }

    /** With its article, for messages. */
    public String label() {
        return label;
    }

    /** A value of this kind as one would write it. */
    public String example() {
        return example;
    }

    /** The units most often written, as a list for messages. */
    public String usual() {
        return usual;
    }

    public List<Unit> units() {
        return units;
    }

    /** The unit of this kind with the symbol, if there is one; {@code °C} is read as {@code Cel}. */
    public Optional<Unit> unit(String symbol) {
        String ucum = symbol.equals("°C") ? "Cel" : symbol;
        return Optional.ofNullable(bySymbol.get(ucum));
    }

    /** Whether the unit is one of this kind. */
    public boolean has(Unit unit) {
        return bySymbol.containsKey(unit.symbol());
    }

    /** Base units and their exact sizes: metres, kilograms, seconds, kelvins, moles. */
    private static final class Atoms {
        static final List<Unit> TIME = List.of(
                Unit.of("s", "1"),
                Unit.of("min", "60"),
                Unit.of("h", "3600"),
                Unit.of("d", "86400"),
                Unit.of("wk", "604800"));
        static final List<Unit> LENGTH =
                List.of(Unit.of("mm", "1e-3"), Unit.of("cm", "1e-2"), Unit.of("m", "1"), Unit.of("um", "1e-6"));
        static final List<Unit> AREA =
                List.of(Unit.of("m2", "1"), Unit.of("cm2", "1e-4"), Unit.of("mm2", "1e-6"), Unit.of("um2", "1e-12"));
        static final List<Unit> MASS =
                List.of(Unit.of("kg", "1"), Unit.of("g", "1e-3"), Unit.of("mg", "1e-6"), Unit.of("t", "1e3"));
        static final List<Unit> VOLUME = List.of(
                Unit.of("L", "1e-3"),
                Unit.of("mL", "1e-6"),
                Unit.of("dL", "1e-4"),
                Unit.of("hL", "1e-1"),
                Unit.of("m3", "1"),
                Unit.of("cm3", "1e-6"));
        static final List<Unit> POWER = List.of(Unit.of("W", "1"), Unit.of("kW", "1e3"), Unit.of("mW", "1e-3"));
        static final Unit MOLE = Unit.of("mol", "1");
        static final List<Unit> AMOUNT = List.of(MOLE, Unit.of("mmol", "1e-3"));

        /** In UCUM this is %{of saturation}; people write no braces. */
        static final List<Unit> SATURATION = List.of(Unit.of("% of saturation", "1e-2"));

        static final List<Unit> MOLAR_ENERGY = List.of(Unit.of("kJ/mol", "1e3"), Unit.of("J/mol", "1"));
        static final List<Unit> TEMPERATURE =
                List.of(new Unit("Cel", BigDecimal.ONE, BigDecimal.ONE, new BigDecimal("273.15")), Unit.of("K", "1"));
        static final List<Unit> FRACTION = List.of(Unit.of("%", "1e-2"), Unit.of("[ppth]", "1e-3"), Unit.ONE);
        static final List<Unit> CONTENT_BY_MASS = List.of(
                Unit.of("g/kg", "1e-3"),
                Unit.of("%", "1e-2"),
                Unit.of("mg/kg", "1e-6"),
                Unit.of("mg/g", "1e-3"),
                Unit.of("kg/kg", "1"),
                Unit.of("g/g", "1"),
                Unit.of("kg/t", "1e-3"),
                Unit.of("g/t", "1e-6"),
                Unit.of("[ppth]", "1e-3"),
                Unit.of("[ppm]", "1e-6"));

        private Atoms() {}

        static List<Unit> quotients(List<Unit> numerators, List<Unit> denominators) {
            List<Unit> quotients = new ArrayList<>();
            for (Unit numerator : numerators) {
                for (Unit denominator : denominators) {
                    quotients.add(numerator.per(denominator));
                }
            }
            return List.copyOf(quotients);
        }
    }

    /** The kind that has a unit of this symbol, for saying what was found instead. */
    static Optional<Kind> having(String symbol) {
        return Arrays.stream(values())
                .filter(kind -> kind.unit(symbol).isPresent())
                .findFirst();
    }
}
