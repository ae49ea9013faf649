package org.soakwright.planner.batch;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import org.soakwright.solver.shape.Axis;

/**
 * Dimensionless groups in words, of the side with the shortest way out.
 *
 * @param ways every side; the first is the one the numbers belong to
 */
record Regime(List<Way> ways, double foLow, double foHigh) {
    /**
     * One side.
     *
     * @param pace its D/L^2 over that of the side with the shortest way out, 1
     */
    record Way(Axis axis, double biot, double pace) {}

    /** Below it the contents inside one piece differ by less than about 5 %, so that only the film matters. */
    private static final double FILM_DECIDES = 0.1;

    /** Above it the film slows the slowest mode of a slab by less than 5 %: (1.5325/1.5708)^2 = 0.95. */
    private static final double INSIDE_DECIDES = 40;

    /** Before it the core has changed by less than 4 % of what it will, even in a sphere without a film. */
    private static final double CORE_UNTOUCHED = 0.05;

    /** From three e-foldings of the slowest mode on, less than about 5 % of the change is still to come. */
    private static final double NEARLY_DONE = 3;

    /** Below it a closed bath takes up less than three quarters of what plenty of liquor would: r/(1 + r). */
    private static final double LITTLE_LIQUOR = 3;

    /** Such as {@code film and inside share; early to under way; bath fills up}; the ratio is a closed bath's. */
    String inWords(OptionalDouble capacityRatio) {
        List<String> words = new ArrayList<>();
        words.add(resistance());
        String first = progress(foLow);
        String last = progress(foHigh);
        words.add(first.equals(last) ? first : first + " to " + last);
        if (capacityRatio.isPresent() && capacityRatio.getAsDouble() < LITTLE_LIQUOR) {
            words.add("bath fills up");
        }
        return String.join("; ", words);
    }

    private String resistance() {
        double biot = ways.get(0).biot();
        if (biot == 0) {
            return "evens out";
        }
        if (biot < FILM_DECIDES) {
            return "film decides";
        }
        return biot > INSIDE_DECIDES ? "inside decides" : "film and inside share";
    }

    private String progress(double fo) {
        if (fo * slowest() > NEARLY_DONE) {
            return "late";
        }
        return fo < CORE_UNTOUCHED ? "early" : "under way";
    }

    /**
     * Rate of the slowest mode over D/L^2, in plenty of liquor: of all sides together, as their modes multiply; sealed, of the side that takes
     * longest. Film and inside are taken as resistances in series: exact where either is alone, and in between low by at most 5 % in a
     * slab, 8 % in a cylinder and 11 % in a sphere, so that "late" is never said too soon. A closed bath is quicker still.
     */
    private double slowest() {
        if (ways.get(0).biot() == 0) {
            return ways.stream()
                    .mapToDouble(way -> way.pace() * Math.pow(way.axis().slopeZero(1), 2))
                    .min()
                    .orElseThrow();
        }
        return ways.stream().mapToDouble(Regime::through).sum();
    }

    private static double through(Way way) {
        double open = way.axis().waveZero(1);
        return way.pace() / (1 / (open * open) + 1 / ((way.axis().power() + 1) * way.biot()));
    }
}
