package org.soakwright.planner.batch;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.function.DoubleUnaryOperator;
import org.junit.jupiter.api.Test;
import org.soakwright.recipes.model.Recipe;
import org.soakwright.recipes.text.Unsound;

/** Pieces that come to a step colder or warmer than it is: their solute moves as if the step had been shorter or longer. */
class WarmingTest {
    private static final double HALF = 0.013;
    private static final double THERMAL = 1.4e-7;
    private static final double ENERGY = 22e3;
    private static final double GAS = 8.314462618;

    private static Recipe loins(String temperature, String... steps) {
        String lot = Recipes.LOINS
                .replace("    - {name: thin, shape: slab, thickness: 18 mm, share: 40 %}\n", "")
                .replace("share: 60 %", "share: 100 %")
                .replace(
                        "  density:",
                        "  temperature: " + temperature + "\n  thermal-diffusivity: 1.4e-7 m2/s\n  density:");
        return Recipes.of(lot + "steps:", String.join("\n", steps));
    }

    private static String bath(String name, String temperature, String time) {
        return "  - {soak: " + name + ", liquor: {volume: unlimited, salt: 0 g/L}, temperature: " + temperature
                + ", film: negligible, time: " + time + "}";
    }

    /** 8e-10 m2/s at 5 Cel. */
    private static double diffusivity(double kelvin) {
        return 8e-10 * Math.exp(-ENERGY / GAS * (1 / kelvin - 1 / 278.15));
    }

    private static double mean(Recipe recipe, double... seconds) {
        Batch batch = new Batch(recipe);
        Run run = batch.follow(seconds);
        return run.end(seconds.length - 1).means().get(0).value() / 190;
    }

    /**
     * Half a slab, its surface held at nothing, temperature and content at once: warmth by its series, the solute by Crank and Nicolson's
     * steps on cells that grow inwards.
     */
    private static double mean(double from, double to, double seconds, DoubleUnaryOperator start) {
        int cells = 120;
        int steps = 500;
        double[] faces = new double[cells + 1];
        for (int i = 0; i <= cells; i++) {
            double depth = 1 - (double) i / cells;
            faces[i] = HALF * (1 - depth * depth);
        }
        double[] content = new double[cells];
        for (int i = 0; i < cells; i++) {
            content[i] = start.applyAsDouble((faces[i] + faces[i + 1]) / (2 * HALF));
        }
        for (int n = 0; n < steps; n++) {
            double begin = seconds * n * n / ((double) steps * steps);
            double end = seconds * (n + 1) * (n + 1) / ((double) steps * steps);
            // The first steps are damped: the surface jumps.
            content = step(
                    content, faces, temperatures(from, to, (begin + end) / 2, faces), end - begin, n < 4 ? 1 : 0.5);
        }
        double sum = 0;
        for (int i = 0; i < cells; i++) {
            sum += content[i] * (faces[i + 1] - faces[i]);
        }
        return sum / HALF;
    }

    private static double[] temperatures(double from, double to, double seconds, double[] faces) {
        double[] kelvins = new double[faces.length];
        for (int i = 0; i < faces.length - 1; i++) {
            double left = 0;
            for (int n = 0; n < 60; n++) {
                double root = (n + 0.5) * Math.PI;
                double decay = Math.exp(-root * root * THERMAL * seconds / (HALF * HALF));
                left += 2 * (n % 2 == 0 ? 1 : -1) / root * Math.cos(root * faces[i] / HALF) * decay;
            }
            kelvins[i] = to + (from - to) * left;
        }
        kelvins[faces.length - 1] = to;
        return kelvins;
    }

    private static double[] step(double[] content, double[] faces, double[] kelvins, double seconds, double weight) {
        int cells = content.length;
        double[] passing = new double[cells + 1];
        for (int i = 1; i <= cells; i++) {
            double here = (faces[i - 1] + faces[i]) / 2;
            double next = i == cells ? faces[cells] : (faces[i] + faces[i + 1]) / 2;
            passing[i] = diffusivity(kelvins[i]) / (next - here);
        }
        double[] lower = new double[cells];
        double[] middle = new double[cells];
        double[] upper = new double[cells];
        double[] right = new double[cells];
        for (int i = 0; i < cells; i++) {
            double width = faces[i + 1] - faces[i];
            double before = i == 0 ? 0 : content[i - 1];
            double after = i == cells - 1 ? 0 : content[i + 1];
            double rate = (passing[i] * (before - content[i]) + passing[i + 1] * (after - content[i])) / width;
            right[i] = content[i] + (1 - weight) * seconds * rate;
            lower[i] = -weight * seconds * passing[i] / width;
            upper[i] = -weight * seconds * passing[i + 1] / width;
            middle[i] = 1 - lower[i] - upper[i];
        }
        for (int i = 1; i < cells; i++) {
            double factor = lower[i] / middle[i - 1];
            middle[i] -= factor * upper[i - 1];
            right[i] -= factor * right[i - 1];
        }
        right[cells - 1] /= middle[cells - 1];
        for (int i = cells - 2; i >= 0; i--) {
            right[i] = (right[i] - upper[i] * right[i + 1]) / middle[i];
        }
        return right;
    }

    /** Seconds by which a step is shorter than its clock, from means with and without warming. */
    private static double lag(double with, double without, double bitLater, double bit) {
        return (with - without) / ((without - bitLater) / bit);
    }

    @Test
    void aColdUniformPieceIsDelayedByAboutWhatItsWarmingSkinSays() {
        double seconds = 4 * 3600;
        double with = mean(278.15, 298.15, seconds, x -> 1);
        double without = mean(298.15, 298.15, seconds, x -> 1);
        double later = mean(298.15, 298.15, seconds + 60, x -> 1);
        double wanted = lag(with, without, later, 60);
        double found = Warming.of(loins("5 Cel", bath("warm", "25 Cel", "{from: 10 min, to: 4 h}")))
                .lag(0, 0)
                .of(seconds);
        assertEquals(38, wanted, 1);
        assertTrue(found > 0.65 * wanted && found < wanted, found + " for " + wanted);
    }

    @Test
    void aProfileThatReachesThroughIsDelayedByTwoThirdsOfWhatTheMeanTemperatureSays() {
        double seconds = 4 * 3600;
        DoubleUnaryOperator wave = x -> Math.cos(Math.PI / 2 * x);
        double with = mean(278.15, 298.15, seconds, wave);
        double without = mean(298.15, 298.15, seconds, wave);
        double later = mean(298.15, 298.15, seconds + 60, wave);
        double wanted = lag(with, without, later, 60);
        Recipe recipe = loins("5 Cel", bath("cold", "5 Cel", "40 h"), bath("warm", "25 Cel", "4 h"));
        double found = Warming.of(recipe).lag(0, 1).of(seconds);
        assertEquals(wanted, found, 0.15 * wanted);
    }

    /** 40 h at 5 Cel leave one wave; then the followed mean is that of the second step's own elements, begun cold. */
    @Test
    void whatIsFollowedIsWhatWarmsUp() {
        double cold = mean(278.15, 278.15, 40 * 3600, x -> 1);
        double followed =
                mean(loins("5 Cel", bath("cold", "5 Cel", "40 h"), bath("warm", "25 Cel", "4 h")), 40 * 3600, 4 * 3600);
        DoubleUnaryOperator wave = x -> cold * Math.PI / 2 * Math.cos(Math.PI / 2 * x);
        double with = mean(278.15, 298.15, 4 * 3600, wave);
        double without = mean(298.15, 298.15, 4 * 3600, wave);
        assertEquals(with, followed, 0.2 * (with - without));
    }

    @Test
    void aWarmPieceIsAheadOfAColdStep() {
        Warming warming = Warming.of(loins("25 Cel", bath("cold", "5 Cel", "20 min")));
        assertTrue(warming.lag(0, 0).of(1200) < -10, warming.said().toString());
        assertTrue(warming.said().get(0).startsWith("Included: the pieces come to cold at 25.0 °C, which is at 5 Cel"));
    }

    @Test
    void aLotAlmostAtTheStepsTemperatureIsSaidToBe() {
        Recipe recipe = loins("3 Cel", bath("one", "4 Cel", "6 h"));
        Warming warming = Warming.of(recipe);
        assertEquals(0, warming.lag(0, 0).of(6 * 3600), 0);
        String said = warming.said().get(0);
        assertTrue(said.startsWith("Left out: the pieces come to one at 3.0 °C"), said);
        assertTrue(Cautions.of(recipe).shown().contains(said));
    }

    @Test
    void theRateOfALagIsItsDerivative() {
        Warming warming = Warming.of(loins("5 Cel", bath("warm", "25 Cel", "10 min")));
        double slope = (warming.lag(0, 0).effective(601) - warming.lag(0, 0).effective(599)) / 2;
        assertEquals(slope, warming.lag(0, 0).rate(600), 1e-7);
    }

    @Test
    void aFrozenLotIsRefusedAtItsPlace() {
        Unsound refused = assertThrows(Unsound.class, () -> new Batch(loins("-18 Cel", bath("one", "4 Cel", "6 h"))));
        assertTrue(
                refused.problems().get(0).toString().contains("freezing and thawing are not computed"),
                refused.problems().toString());
    }
}
