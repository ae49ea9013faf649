package org.soakwright.planner.report.picture;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import org.soakwright.planner.batch.Batch;
import org.soakwright.planner.batch.StepTimes;
import org.soakwright.recipes.model.Recipe;

/** Pieces that only rest keep the start content that they were loaded with: what is drawn is the lognormal of the recipe. */
class SpreadingTest {
    private static final double SIGMA = Math.sqrt(Math.log1p(0.1 * 0.1));

    private static Spreading resting(String target) {
        Recipe recipe = Batches.read("resting", """
                language: 1
                title: Pieces at rest
                product: [other]
                lot:
                  mass: 3 kg
                  density: 1000 kg/m3
                  pieces: [{name: slab, shape: slab, thickness: 10 mm}]
                species:
                  salt: {start: {value: 100 g/kg, varies: 10 %}, diffusivity: 1e-9 m2/s, partition: 1}
                steps:
                  - rest: night
                    time: 8 h
                targets:
                  - {species: salt, reading: mean, TARGET}
                minimise: time
                """.replace("TARGET", target));
        return Spreading.of(Batches.history(new Batch(recipe).follow(StepTimes.definite(recipe))), List.of())
                .get(0);
    }

    /** M. Abramowitz, I. A. Stegun, Handbook of Mathematical Functions, 1964, table 26.1: P(1) = 0.84134, P(1.645) = 0.95002. */
    @Test
    void asManyKeepTheLimitAsTheNormalTableSays() {
        Spreading most = resting("at-most: " + 100 * Math.exp(SIGMA) + " g/kg, share: 95 %");
        assertEquals(0.84134, most.kept(most.pieces().get(0)), 2e-4);
        assertEquals(100 * Math.exp(1.64485 * SIGMA), most.pieces().get(0).read(), 0.01);
        assertFalse(most.pieces().get(0).met());
        assertEquals(", missed", most.pieces().get(0).verdict());
        Spreading least = resting("at-least: " + 100 * Math.exp(-SIGMA) + " g/kg, share: 80 %");
        assertEquals(0.84134, least.kept(least.pieces().get(0)), 2e-4);
        assertTrue(least.isFromAbove() && least.pieces().get(0).met());
    }

    @Test
    void aBandMayBeMissedByHalfOfTheRestOnEachSide() {
        Spreading band = resting("at-least: 80 g/kg, at-most: 120 g/kg, share: 90 %");
        assertEquals(0.95, band.inside(), 1e-12);
        assertEquals("80 to 120 g/kg", band.limits());
        // 1.645 standard deviations to either side.
        assertEquals("84.87 to 117.8 g/kg", band.read(band.pieces().get(0), " g/kg"));
    }

    @Test
    void withoutAShareTheAverageCounts() {
        Spreading average = resting("at-most: 120 g/kg");
        assertEquals(OptionalDouble.empty(), average.share());
        // The mean of a lognormal lies above its median.
        assertEquals(
                100 * Math.exp(0.5 * SIGMA * SIGMA), average.pieces().get(0).read(), 0.01);
    }

    @Test
    void sharesAreNeverRoundedToAllOrNone() {
        assertEquals("84.1 %", Spreading.percent(0.8413));
        assertEquals("over 99.9 %", Spreading.percent(0.99997));
        assertEquals("under 0.1 %", Spreading.percent(0.0001));
    }

    @Test
    void aLimitFarOffIsNamedAndDoesNotSqueezeTheCurve() {
        Spreading near = resting("at-most: 150 g/kg");
        assertTrue(Reach.of(near).holds(150));
        assertEquals("", Reach.of(near).beyond(near.atMost()));
        Spreading far = resting("at-most: 900 g/kg");
        assertFalse(Reach.of(far).holds(900));
        assertEquals("; 900 far right", Reach.of(far).beyond(far.atMost()));
    }

    @Test
    void readingsThatCannotBeToldApartAreNotDrawnApart() {
        Spreading.Pieces alike =
                new Spreading.Pieces("slab", 0, new double[] {50, 50.001}, new double[] {0, 1}, 50, true, false);
        Reach reach = Reach.of(new Spreading(
                "salt mean",
                "g/kg",
                OptionalDouble.empty(),
                OptionalDouble.of(60),
                OptionalDouble.empty(),
                "",
                List.of(alike)));
        assertTrue(reach.high() - reach.low() > 0.5, reach.toString());
        assertEquals("; 10 far left", reach.beyond(OptionalDouble.of(10)));
    }
}
