package org.soakwright.recipes.model;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.jspecify.annotations.Nullable;
import org.junit.jupiter.api.Test;
import org.soakwright.recipes.text.Kind;
import org.soakwright.recipes.text.Place;
import org.soakwright.recipes.text.Unsound;

class GradeTest {
    private static final Place HERE = new Place("f", 1, 1);

    private static Grade brick(String thickness, String width, String length) {
        return Given.grade(
                "block",
                Shape.BRICK,
                1,
                Given.side(Dimension.THICKNESS, thickness),
                Given.side(Dimension.WIDTH, width),
                Given.side(Dimension.LENGTH, length));
    }

    private static Grade wheel(String diameter, String length) {
        return Given.grade(
                "wheel",
                Shape.SHORT_CYLINDER,
                1,
                Given.side(Dimension.DIAMETER, diameter),
                Given.side(Dimension.LENGTH, length));
    }

    private static Grade ball(String diameter, @Nullable Spread spread, @Nullable Quantity weight) {
        return new Grade(
                HERE, "ball", Shape.SPHERE, List.of(Given.side(Dimension.DIAMETER, diameter)), 1, weight, spread, null);
    }

    @Test
    void theShortestSideIsTheOneWithTheShortestWayOut() {
        assertEquals(Dimension.WIDTH, brick("65", "40", "215").shortest().dimension());
        assertEquals(0.02, brick("65", "40", "215").depth());
        assertEquals(Dimension.DIAMETER, wheel("30", "30").shortest().dimension(), "the first of equals");
        // On a tray a wheel of 50 mm is as deep as one of 100 mm between two open ends.
        Side onTray = new Side(Dimension.LENGTH, Given.quantity("50", "mm", Kind.LENGTH), Faces.ONE);
        Grade sealed = Given.grade("wheel", Shape.SHORT_CYLINDER, 1, Given.side(Dimension.DIAMETER, "80"), onTray);
        assertEquals(Dimension.DIAMETER, sealed.shortest().dimension());
        assertEquals(0.04, sealed.depth());
    }

    @Test
    void aBallAndACylinderFillTheirBoxAsArchimedesFound() {
        double box = brick("30", "30", "30").volumeM3().orElseThrow();
        double cylinder = wheel("30", "30").volumeM3().orElseThrow();
        assertEquals(27e-6, box, 1e-18);
        assertEquals(Math.PI / 4, cylinder / box, 1e-15);
        // On the Sphere and Cylinder I, 34, porism: a ball is two thirds of the cylinder around it.
        assertEquals(2.0 / 3, ball("30", null, null).volumeM3().orElseThrow() / cylinder, 1e-15);
    }

    @Test
    void aSlabAndALongCylinderHaveNoVolume() {
        assertTrue(Given.grade("a", Shape.SLAB, 1, Given.side(Dimension.THICKNESS, "8"))
                .volumeM3()
                .isEmpty());
        assertTrue(Given.grade("a", Shape.CYLINDER, 1, Given.side(Dimension.DIAMETER, "8"))
                .volumeM3()
                .isEmpty());
        assertThrows(IllegalStateException.class, () -> Shape.SLAB.volumeM3(0.008));
    }

    @Test
    void aGradeHasTheSidesOfItsShapeInTheirOrder() {
        Unsound unsound = assertThrows(
                Unsound.class,
                () -> Given.grade(
                        "a",
                        Shape.SHORT_CYLINDER,
                        1,
                        Given.side(Dimension.LENGTH, "8"),
                        Given.side(Dimension.DIAMETER, "8")));
        assertEquals(
                "f:1:1: the sides of a short-cylinder are diameter, length: found length, diameter",
                unsound.problems().get(0).toString());
    }

    @Test
    void aRoundSideHasNoFaceToSeal() {
        Unsound unsound = assertThrows(
                Unsound.class, () -> new Side(Dimension.DIAMETER, Given.quantity("8", "mm", Kind.LENGTH), Faces.ONE));
        assertEquals(
                "a diameter has no faces to seal", unsound.problems().get(0).what());
    }

    @Test
    void everySideButABallsHasItsDirection() {
        assertEquals(List.of(Grain.THICKNESS), Shape.SLAB.grains());
        assertEquals(List.of(Grain.ACROSS), Shape.CYLINDER.grains());
        assertEquals(List.of(), Shape.SPHERE.grains());
        assertEquals(List.of(Grain.ACROSS, Grain.ALONG), Shape.SHORT_CYLINDER.grains());
        assertEquals(List.of(Grain.THICKNESS, Grain.WIDTH, Grain.LENGTH), Shape.BRICK.grains());
        Grade ball = ball("8", null, null);
        assertNull(ball.grain(ball.shortest()));
    }

    @Test
    void theAveragePieceIsSmallerThanTheMedianByMass() {
        // Hatch and Choate (J. Franklin Inst. 207:369, 1929, from memory): the ball of average volume has the median
        // diameter by
        // mass times
        // exp(-1.5 ln^2 of the geometric standard deviation). Here exp(sigma) = 1.2, so that cv^2 = exp(ln^2 1.2) - 1.
        double sigma = Math.log(1.2);
        Spread spread = new Spread(Given.fraction(Math.sqrt(Math.expm1(sigma * sigma))));
        double median = ball("8", null, null).averageM3().orElseThrow();
        double average = ball("8", spread, null).averageM3().orElseThrow();
        assertEquals(Math.exp(-1.5 * sigma * sigma), Math.cbrt(average / median), 1e-14);
    }

    @Test
    void aCountWithASpreadAddsUpPieceByPiece() {
        Spread spread = new Spread(Given.fraction(0.3));
        Grade grade = ball("8", spread, null);
        // 100 000 parts of equal mass, each at the middle of its share of the lognormal; the count is the sum of
        // theirs.
        double pieces = 0;
        int parts = 100_000;
        double step = 16.0 / parts;
        for (int i = 0; i < parts; i++) {
            double z = -8 + (i + 0.5) * step;
            double mass = Math.exp(-z * z / 2) / Math.sqrt(2 * Math.PI) * step;
            pieces += mass / (grade.volumeM3().orElseThrow() * Math.exp(3 * spread.sigma() * z));
        }
        Lot lot = new Lot(HERE, new Amount.ByCount(1000, HERE), null, null, List.of(grade));
        assertEquals(1000 / pieces, lot.volumeM3(), 1e-9 * lot.volumeM3());
    }

    @Test
    void aWeightAndADensityCountPiecesOfAnyShape() {
        Quantity weight = Given.quantity("350", "g", Kind.MASS);
        Grade slice = new Grade(
                HERE,
                "slice",
                Shape.SLAB,
                List.of(Given.side(Dimension.THICKNESS, "18")),
                1,
                weight,
                new Spread(Given.fraction(0.1)),
                null);
        Quantity density = Given.quantity("1120", "kg/m3", Kind.DENSITY);
        Lot lot = new Lot(HERE, new Amount.ByCount(200, HERE), density, null, List.of(slice));
        assertEquals(70, lot.massKg().orElseThrow(), 1e-12, "the weight is that of the average piece");
        assertThrows(Unsound.class, () -> new Lot(HERE, new Amount.ByCount(200, HERE), null, null, List.of(slice)));
    }

    @Test
    void aWeightMayDifferByATenthFromTheSizes() {
        Quantity density = Given.quantity("1000", "kg/m3", Kind.DENSITY);
        Amount amount = new Amount.ByMass(Given.quantity("10", "kg", Kind.MASS));
        // A ball of 100 mm is 523.6 mL.
        for (String near : List.of("475", "523.6", "575")) {
            Grade grade = ball("100", null, Given.quantity(near, "g", Kind.MASS));
            assertEquals(
                    1,
                    new Lot(HERE, amount, density, null, List.of(grade))
                            .grades()
                            .size());
        }
        for (String far : List.of("471", "577")) {
            Grade grade = ball("100", null, Given.quantity(far, "g", Kind.MASS));
            Unsound unsound = assertThrows(Unsound.class, () -> new Lot(HERE, amount, density, null, List.of(grade)));
            assertEquals(
                    "f:1:1: a weight that contradicts the sizes: found \"" + far
                            + " g\" where sizes and density make 523.6 g; correct one of them, they may differ by 10 %",
                    unsound.problems().get(0).toString());
        }
    }

    @Test
    void aSpreadLiesAboveZeroAndUpToSixtyPercent() {
        assertEquals(0.6, new Spread(Given.fraction(0.6)).cv().si());
        // cv^2 = exp(sigma^2) - 1 (Aitchison and Brown, The Lognormal Distribution, 1957, chapter 2, from memory).
        assertEquals(Math.sqrt(Math.log(1.36)), new Spread(Given.fraction(0.6)).sigma(), 1e-15);
        for (double cv : new double[] {0, -0.1, 0.600001}) {
            assertThrows(Unsound.class, () -> new Spread(Given.fraction(cv)));
        }
    }
}
