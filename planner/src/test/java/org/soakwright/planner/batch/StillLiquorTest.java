package org.soakwright.planner.batch;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.function.DoubleUnaryOperator;
import org.junit.jupiter.api.Test;
import org.soakwright.planner.conditions.Known;
import org.soakwright.recipes.model.Recipe;
import org.soakwright.solver.transport.Estimate;

/** Liquor that only its own density moves: how dense it gets beside the pieces, and the film that comes of it, are one. */
class StillLiquorTest {
    /** Sodium chloride in water at 20 Cel: mass fraction and kg/m3 (CRC Handbook of Chemistry and Physics, from memory). */
    private static final double[][] BRINE = {
        {0, 998.2},
        {0.01, 1005.3},
        {0.02, 1012.5},
        {0.04, 1026.8},
        {0.06, 1041.3},
        {0.08, 1055.9},
        {0.10, 1070.7},
        {0.12, 1085.7},
        {0.14, 1100.8}
    };

    /** m2/s at 20 Cel: 1.49e-9 at 25 Cel times 293.15/298.15 times 0.889997/1.00157 mPa s of water. */
    private static final double SALT = 1.30181e-9;

    /** Of water at 20 Cel, m2/s. */
    private static final double WATER = 1.00157e-3 / 998.2;

    private static final String SLAB = "shape: slab, thickness: 8 mm";
    private static final String STILL = "{still: true, length: 120 mm}";

    private static Recipe bath(String piece, String start, String liquor, String film) {
        return Recipes.of(lines(piece, start, liquor, film));
    }

    private static String[] lines(String piece, String start, String liquor, String film) {
        return new String[] {
            "language: 1",
            "title: Still",
            "product: [other]",
            "lot: {mass: 100 kg, density: 1000 kg/m3, pieces: [{" + piece + "}]}",
            "species:",
            "  salt: {start: " + start + ", diffusivity: 8e-10 m2/s, partition: 0.8, substance: sodium chloride}",
            "steps:",
            "  - {soak: bath, liquor: {" + liquor + "}, film: " + film + ", temperature: 20 Cel, time: 6 h}"
        };
    }

    /** kg/m3 of a brine that holds so many kg/m3 of salt: straight between the table's. */
    private static double density(double content) {
        for (int i = 1; i < BRINE.length; i++) {
            double low = BRINE[i - 1][0] * BRINE[i - 1][1];
            double high = BRINE[i][0] * BRINE[i][1];
            if (content <= high) {
                return BRINE[i - 1][1] + (content - low) / (high - low) * (BRINE[i][1] - BRINE[i - 1][1]);
            }
        }
        throw new AssertionError("no density of " + content);
    }

    /** What a film of a coefficient leaves. */
    private record Left(double away, double more, double largest) {}

    /** Volumes of a piece that get thinner outwards, backward steps of time that grow, one bath; nothing of it is the solver's. */
    private static Left left(
            int power, double length, DoubleUnaryOperator start, double fill, double bathPerPiece, double film) {
        int cells = 150;
        int steps = 3000;
        double[] faces = new double[cells + 1];
        for (int i = 0; i <= cells; i++) {
            double depth = 1 - (double) i / cells;
            faces[i] = length * (1 - depth * depth);
        }
        double[] content = new double[cells];
        for (int i = 0; i < cells; i++) {
            content[i] = start.applyAsDouble((faces[i] + faces[i + 1]) / (2 * length));
        }
        double bath = fill;
        double whole = 6 * 3600;
        double sizes = 0;
        double squares = 0;
        double baths = 0;
        double largest = 0;
        for (int n = 0; n < steps; n++) {
            double dt = whole * (2 * n + 1) / ((double) steps * steps);
            double[][] system = new double[cells][3];
            double[] right = new double[cells];
            double outward = 0;
            for (int i = 0; i < cells; i++) {
                double volume = (Math.pow(faces[i + 1], power + 1) - Math.pow(faces[i], power + 1)) / (power + 1);
                double in = i == 0 ? 0 : Math.pow(faces[i], power) * 8e-10 / ((faces[i + 1] - faces[i - 1]) / 2);
                double width = faces[i + 1] - faces[i];
                double out = Math.pow(faces[i + 1], power)
                        * (i == cells - 1
                                ? 1 / (width / 2 / 8e-10 + 0.8 / film)
                                : 8e-10 / ((faces[i + 2] - faces[i]) / 2));
                outward = out;
                system[i][0] = -in * dt / volume;
                system[i][2] = i == cells - 1 ? 0 : -out * dt / volume;
                system[i][1] = 1 + (in + out) * dt / volume;
                right[i] = content[i] + (i == cells - 1 ? out * dt / volume * 0.8 * bath : 0);
            }
            for (int i = 1; i < cells; i++) {
                double factor = system[i][0] / system[i - 1][1];
                system[i][1] -= factor * system[i - 1][2];
                right[i] -= factor * right[i - 1];
            }
            for (int i = cells - 1; i >= 0; i--) {
                right[i] = (right[i] - (i == cells - 1 ? 0 : system[i][2] * right[i + 1])) / system[i][1];
            }
            content = right;
            double rate = outward * (content[cells - 1] - 0.8 * bath);
            double more = rate / Math.pow(length, power) / film;
            bath += rate * dt * (power + 1) / Math.pow(length, power + 1) / bathPerPiece;
            sizes += Math.abs(more) * dt;
            squares += more * more * dt;
            baths += bath * dt;
            largest = Math.max(largest, Math.abs(more));
        }
        return new Left(baths / whole, squares / sizes, largest);
    }

    private static Films films(Recipe recipe) {
        Recipe known = Known.of(recipe).recipe();
        return Films.of(known, StepTimes.nominal(known));
    }

    private static Estimate film(Recipe recipe) {
        return films(recipe).estimate(0, recipe.species().get(0), 0).orElseThrow();
    }

    /** Churchill and Chu 1975, laminar: 0.68 + 0.670 Ra^(1/4) / [1 + (0.492/Sc)^(9/16)]^(4/9) over the height. */
    private static double standing(double height, double difference, double viscosity, double density) {
        double schmidt = viscosity / SALT;
        double rayleigh = 9.80665 * difference / density * Math.pow(height, 3) / (viscosity * SALT);
        double sherwood =
                0.68 + 0.670 * Math.pow(rayleigh, 0.25) / Math.pow(1 + Math.pow(0.492 / schmidt, 9.0 / 16), 4.0 / 9);
        return sherwood * SALT / height;
    }

    /** What a film leaves, in kg/m3 of liquor; entering salt makes it lighter at the pieces. */
    private static double denser(Left left, int sign) {
        return Math.abs(density(left.away() + sign * left.more()) - density(left.away()));
    }

    /** 60 g/kg in clean water, three times as much: the liquor sinks along a slab that stands 120 mm high. */
    @Test
    void whatSaltThatLeavesMakesOfItsFilmIsThatFilm() {
        Recipe recipe = bath(SLAB, "60 g/kg", "ratio: 3 L/kg, salt: 0 g/L", STILL);
        double coefficient = film(recipe).coefficient();
        double left = denser(left(0, 0.004, x -> 60, 0, 3, coefficient), 1);
        assertEquals(left, films(recipe).difference(0, 0).orElseThrow(), 0.015 * left);
        double again = standing(0.12, left, WATER, 998.2);
        assertEquals(again, coefficient, 0.005 * again);
    }

    /** None in a brine of 10 %: 107.07 g/L, 1070.7 kg/m3, 1.193 mPa s (CRC Handbook, from memory). It takes salt from the liquor, which rises. */
    @Test
    void whatSaltThatEntersMakesOfItsFilmIsThatFilm() {
        Recipe recipe = bath(SLAB, "0 g/kg", "ratio: 3 L/kg, salt: 107.07 g/L", STILL);
        double coefficient = film(recipe).coefficient();
        double left = denser(left(0, 0.004, x -> 0, 107.07, 3, coefficient), -1);
        assertEquals(left, films(recipe).difference(0, 0).orElseThrow(), 0.03 * left);
        double again = standing(0.12, left, 1.193e-3 / 1070.7, 1070.7);
        assertEquals(again, coefficient, 0.01 * again);
    }

    /** Balls, by Churchill 1983: 2 + 0.589 Ra^(1/4) / [1 + (0.469/Sc)^(9/16)]^(4/9). */
    @Test
    void aBallsFilmIsWhatItLeaves() {
        Recipe recipe =
                bath("shape: sphere, diameter: 20 mm", "60 g/kg", "ratio: 3 L/kg, salt: 0 g/L", "{still: true}");
        double coefficient = film(recipe).coefficient();
        double left = denser(left(2, 0.01, x -> 60, 0, 3, coefficient), 1);
        assertEquals(left, films(recipe).difference(0, 0).orElseThrow(), 0.015 * left);
        double rayleigh = 9.80665 * left / 998.2 * Math.pow(0.02, 3) / (WATER * SALT);
        double sherwood =
                2 + 0.589 * Math.pow(rayleigh, 0.25) / Math.pow(1 + Math.pow(0.469 * SALT / WATER, 9.0 / 16), 4.0 / 9);
        assertEquals(sherwood * SALT / 0.02, coefficient, 0.005 * coefficient);
    }

    /** Behind a skin of 1e-6 m/s the liquor meets only what comes through: of the difference to the surface what the film has of both. */
    @Test
    void aSkinLeavesLessToMoveTheLiquor() {
        String[] lines = lines(SLAB, "60 g/kg", "ratio: 3 L/kg, salt: 0 g/L", STILL);
        double bare = films(Recipes.of(lines)).difference(0, 0).orElseThrow();
        lines[5] = lines[5].replace("substance:", "skin: {permeance: 1e-6 m/s, face: both}, substance:");
        Recipe recipe = Recipes.of(lines);
        double coefficient = film(recipe).coefficient();
        double both = 1 / (1 / coefficient + 1 / 1e-6);
        Left across = left(0, 0.004, x -> 60, 0, 3, both);
        double outside = denser(new Left(across.away(), across.more() * both / coefficient, 0), 1);
        assertEquals(outside, films(recipe).difference(0, 0).orElseThrow(), 0.03 * outside);
        assertTrue(outside < bare);
        assertEquals(standing(0.12, outside, WATER, 998.2), coefficient, 0.01 * coefficient);
    }

    /** A tight skin on one of two faces: the other is as bare as ever, and the liquor at both is moved by half as much on average. */
    @Test
    void aSkinOnOneFaceHidesThatFace() {
        String[] lines = lines(SLAB, "60 g/kg", "volume: unlimited, salt: 0 g/L", "{still: true, length: 120 mm}");
        String[] covered = lines.clone();
        covered[5] = lines[5].replace("substance:", "skin: {permeance: 1e-15 m/s, face: one}, substance:");
        Recipe recipe = Recipes.of(covered);
        double coefficient = film(recipe).coefficient();
        double half = denser(left(0, 0.008, x -> 60, 0, 1e12, coefficient), 1) / 2;
        assertEquals(half, films(recipe).difference(0, 0).orElseThrow(), 0.02 * half);
    }

    /** 60 g/kg are in equilibrium with 75 g/L. */
    @Test
    void nearEquilibriumLittleMoves() {
        Recipe near = bath(SLAB, "60 g/kg", "ratio: 3 L/kg, salt: 74.9 g/L", STILL);
        double coefficient = film(near).coefficient();
        double left = denser(left(0, 0.004, x -> 60, 74.9, 3, coefficient), 1);
        assertEquals(left, films(near).difference(0, 0).orElseThrow(), 0.03 * left);
        Recipe at = bath(SLAB, "60 g/kg", "ratio: 3 L/kg, salt: 75 g/L", STILL);
        assertEquals(0, films(at).difference(0, 0).orElseThrow(), 1e-9);
        assertEquals(0.68 * SALT / 0.12, film(at).coefficient(), 0.02 * 0.68 * SALT / 0.12);
    }

    /** Salt goes in at first and comes out later: what it makes lighter and denser must not be divided by what is left of both. */
    @Test
    void aDifferenceThatTurnsIsNoLargerThanItEverWas() {
        Recipe recipe = bath(SLAB, "{profile: [[0, 100 g/kg], [1, 0 g/kg]]}", "volume: unlimited, salt: 55 g/L", STILL);
        double coefficient = film(recipe).coefficient();
        Left turning = left(0, 0.004, x -> 100 * (1 - x), 55, 1e12, coefficient);
        double found = films(recipe).difference(0, 0).orElseThrow();
        assertTrue(found < density(55) - density(0), "found " + found);
        assertEquals(denser(turning, 1), found, 0.05 * found);
    }

    /** 10 um: were the first difference of 75 g/L, 52 kg/m3, to last, Ra would be 4e-4 and Sh 2.08. */
    @Test
    void aTinyBallIsLeftByDiffusionAlone() {
        Recipe recipe =
                bath("shape: sphere, diameter: 0.01 mm", "60 g/kg", "ratio: 3 L/kg, salt: 0 g/L", "{still: true}");
        double sherwood = film(recipe).groups().sherwood();
        assertTrue(sherwood >= 2 && sherwood < 2.05, "Sh " + sherwood);
    }

    /** Cubes add; the film beside a flow is thinner, so less is left to move by density. */
    @Test
    void slowFlowAndDensityActTogether() {
        String piece = "shape: cylinder, diameter: 20 mm";
        Recipe both = bath(piece, "60 g/kg", "ratio: 3 L/kg, salt: 0 g/L", "{still: true, speed: 1 mm/s}");
        Recipe flow = bath(piece, "60 g/kg", "ratio: 3 L/kg, salt: 0 g/L", "{speed: 1 mm/s}");
        Recipe still = bath(piece, "60 g/kg", "ratio: 3 L/kg, salt: 0 g/L", "{still: true}");
        double difference = films(both).difference(0, 0).orElseThrow();
        double rayleigh = 9.80665 * difference / 998.2 * Math.pow(0.02, 3) / (WATER * SALT);
        double sherwood = 0.36
                + 0.518 * Math.pow(rayleigh, 0.25) / Math.pow(1 + Math.pow(0.559 * SALT / WATER, 9.0 / 16), 4.0 / 9);
        double cubes = Math.cbrt(
                Math.pow(sherwood * SALT / 0.02, 3) + Math.pow(film(flow).coefficient(), 3));
        assertEquals(cubes, film(both).coefficient(), 1e-3 * cubes);
        assertTrue(difference < films(still).difference(0, 0).orElseThrow());
        double left = denser(left(1, 0.01, x -> 60, 0, 3, cubes), 1);
        assertEquals(left, difference, 0.015 * left);
    }

    /**
     * At 3 Cel into 20 Cel, nothing dissolved that has a weight: a slab of 8 mm has lost all but a share whose integral over time is
     * a^2/(3 alpha) = (4 mm)^2/(3 x 1.4e-7 m2/s) = 38.095 s, of 6 h 0.0017637, so 0.029982 K, at 2.068e-4 1/K (water at 20 Cel, CRC
     * Handbook, from memory) of 998.2 kg/m3 6.189e-3 kg/m3.
     */
    @Test
    void coldPiecesMakeTheLiquorSink() {
        String[] lines = lines(SLAB, "60 g/kg", "ratio: 3 L/kg, salt: 0 g/L", STILL);
        lines[3] = lines[3].replace("{mass", "{temperature: 3 Cel, thermal-diffusivity: 1.4e-7 m2/s, mass");
        lines[5] = lines[5].replace("substance: sodium chloride", "in-liquor: 1.3e-9 m2/s");
        assertEquals(6.189e-3, films(Recipes.of(lines)).difference(0, 0).orElseThrow(), 0.01 * 6.189e-3);
    }

    /** Cold and salty pieces both make it sink: the sum; warm and salty ones work against each other, which is cautioned. */
    @Test
    void warmthAndSaltAdd() {
        String[] lines = lines(SLAB, "60 g/kg", "ratio: 3 L/kg, salt: 74.9 g/L", STILL);
        double salt = films(Recipes.of(lines)).difference(0, 0).orElseThrow();
        lines[3] = lines[3].replace("{mass", "{temperature: 3 Cel, thermal-diffusivity: 1.4e-7 m2/s, mass");
        double cold = films(Recipes.of(lines)).difference(0, 0).orElseThrow();
        assertTrue(cold > salt && cold < salt + 6.5e-3, salt + " " + cold);
        assertTrue(film(Recipes.of(lines)).cautions().toString().contains("their sum is an estimate"));
        lines[3] = lines[3].replace("3 Cel", "37 Cel");
        assertTrue(films(Recipes.of(lines)).difference(0, 0).orElseThrow() < salt);
        assertTrue(film(Recipes.of(lines)).cautions().toString().contains("against its content"));
    }

    /** Each grade has its own; a second water finds less to give. */
    @Test
    void everyGradeAndStepHasItsOwn() {
        String[] lines = lines(SLAB, "60 g/kg", "ratio: 3 L/kg, salt: 0 g/L", STILL);
        lines[3] =
                "lot: {mass: 100 kg, density: 1000 kg/m3, pieces: [{name: a, shape: slab, thickness: 8 mm, share: 50 %},"
                        + " {name: b, shape: slab, thickness: 24 mm, share: 50 %}]}";
        String[] two = java.util.Arrays.copyOf(lines, lines.length + 1);
        two[lines.length] = lines[7].replace("bath", "again");
        Films films = films(Recipes.of(two));
        double thin = films.difference(0, 0).orElseThrow();
        double thick = films.difference(0, 1).orElseThrow();
        assertTrue(Math.abs(thin - thick) > 0.01 * thick, thin + " " + thick);
        assertTrue(films.difference(1, 0).orElseThrow() < 0.5 * thin);
    }

    @Test
    void whereNothingIsKnownToMoveTheLiquorTheFilmIsRefusedAtItsPlace() {
        String[] lines = lines(SLAB, "60 g/kg", "ratio: 3 L/kg, salt: 0 g/L", STILL);
        lines[5] = lines[5].replace("substance: sodium chloride", "in-liquor: 1.3e-9 m2/s");
        String said = Refused.said(lines);
        assertTrue(
                said.startsWith("test.yaml:8:") && said.contains("nothing here is known to move still liquor"), said);
    }
}
