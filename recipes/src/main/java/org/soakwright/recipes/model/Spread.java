package org.soakwright.recipes.model;

import java.util.List;
import org.soakwright.recipes.text.Place;
import org.soakwright.recipes.text.Problem;

/**
 * How much something differs from piece to piece: lognormal, the stated value its median by mass.
 *
 * @param cv coefficient of variation, above 0 up to 0.6
 */
public record Spread(Quantity cv) {
    /** Wider than any sorted lot; beyond it one bell of logarithms describes a mixture badly. */
    public static final double MOST = 0.6;

    public Spread {
        Rules.require(problems("a spread", cv));
    }

    /**
     * A spread under another name.
     *
     * @param what to call it in the message
     */
    public static Spread of(String what, Quantity cv) {
        Rules.require(problems(what, cv));
        return new Spread(cv);
    }

    private static List<Problem> problems(String what, Quantity cv) {
        return cv.si() > 0 && cv.si() <= MOST
                ? List.of()
                : List.of(new Problem(
                        cv.place(), what + " lies above 0 % and up to 60 %: found \"" + cv + "\"; write such as 6 %"));
    }

    /** The standard deviation of the natural logarithm. */
    public double sigma() {
        return Math.sqrt(Math.log1p(cv.si() * cv.si()));
    }

    /**
     * The volume of the average piece over that of the piece of median size by mass, where this is a spread of size with
     * the proportions kept: many small pieces weigh as much as a few large ones. The mean of size^-3 over a lognormal.
     */
    public double averagePerMedianVolume() {
        return Math.exp(-4.5 * sigma() * sigma());
    }

    public Place place() {
        return cv.place();
    }
}
