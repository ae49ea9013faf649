package org.soakwright.planner.report.picture;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.soakwright.planner.batch.Section;
import org.soakwright.recipes.model.Faces;
import org.soakwright.recipes.model.Grade;
import org.soakwright.recipes.model.Side;

/** A cut of four contents: 1 at the core, 2 at the face across, 3 at the face down, 4 where they meet. */
class CutFaceTest {
    private static final double[] ENDS = {0, 1};

    private static CutFace cut(Faces across, Faces down) {
        Grade brick = Batches.example("brick-desalination").lot().grades().get(0);
        Side thickness = brick.sides().get(0);
        Side width = brick.sides().get(1);
        Section.End end = new Section.End(0, new double[][] {{1, 2}, {3, 4}});
        return new CutFace(new Section(
                Batches.example("brick-desalination").species().get(0),
                brick,
                new Side(width.dimension(), width.size(), across),
                new Side(thickness.dimension(), thickness.size(), down),
                ENDS,
                ENDS,
                List.of(end),
                Batches.example("brick-desalination").species().get(0).start().unit()));
    }

    private static double[][] whole(CutFace cut) {
        return cut.whole(cut.ends().get(0));
    }

    @Test
    void aPieceWettedAllRoundIsMirroredAboutItsCore() {
        CutFace cut = cut(Faces.BOTH, Faces.BOTH);
        assertArrayEquals(new double[][] {{4, 2, 4}, {3, 1, 3}, {4, 2, 4}}, whole(cut));
        assertEquals(102, cut.width(), 1e-9);
        assertEquals(65, cut.height(), 1e-9);
        assertEquals(0.5, cut.coreAcross());
        assertEquals(0.5, cut.coreDown());
    }

    @Test
    void aPieceSealedBelowStandsOnItsCore() {
        CutFace cut = cut(Faces.BOTH, Faces.ONE);
        assertArrayEquals(new double[][] {{4, 2}, {3, 1}, {4, 2}}, whole(cut));
        assertTrue(cut.isUnlikeBelow());
        assertFalse(cut.isUnlikeLeft());
        assertEquals(1, cut.coreDown());
    }

    @Test
    void aPieceSealedAtTheSideIsTurnedToLieOnIt() {
        CutFace cut = cut(Faces.ONE, Faces.BOTH);
        assertArrayEquals(new double[][] {{4, 3}, {2, 1}, {4, 3}}, whole(cut));
        assertEquals(65, cut.width(), 1e-9);
        assertEquals(102, cut.height(), 1e-9);
        assertTrue(cut.isUnlikeBelow());
        assertEquals(3, cut.middleOfFace(cut.ends().get(0), true), "the face that was down is across now");
        assertEquals(2, cut.middleOfFace(cut.ends().get(0), false));
    }

    @Test
    void aPieceSealedOnBothSidesHasItsCoreInTheCorner() {
        CutFace cut = cut(Faces.ONE, Faces.ONE);
        assertArrayEquals(new double[][] {{3, 1}, {4, 2}}, whole(cut));
        assertTrue(cut.isUnlikeBelow() && cut.isUnlikeLeft());
        assertEquals(0, cut.coreAcross());
        assertEquals(1, cut.coreDown());
    }

    /** 1 at the left to 3 at the right, the middles of four columns lie at 1/8, 3/8, 5/8 and 7/8. */
    @Test
    void betweenPointsTheImageRunsStraight() {
        double[][] image = CutFace.resampled(new double[][] {{1, 1}, {3, 3}}, 4, 1);
        assertArrayEquals(new double[][] {{1.25}, {1.75}, {2.25}, {2.75}}, image);
    }
}
