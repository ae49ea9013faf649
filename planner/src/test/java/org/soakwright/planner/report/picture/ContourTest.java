package org.soakwright.planner.report.picture;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.awt.geom.Point2D;
import java.util.List;
import org.junit.jupiter.api.Test;

class ContourTest {
    @Test
    void aSlopeHasOneStraightLine() {
        double[][] slope = new double[8][5];
        for (int i = 0; i < 8; i++) {
            for (int j = 0; j < 5; j++) {
                slope[i][j] = i + 0.5 * j;
            }
        }
        List<List<Point2D>> lines = Contour.of(slope, 3.25);
        assertEquals(1, lines.size());
        for (Point2D point : lines.get(0)) {
            assertEquals(3.25, point.getX() + 0.5 * point.getY(), 1e-12);
        }
        double low = Math.min(lines.get(0).get(0).getY(), last(lines.get(0)).getY());
        double high = Math.max(lines.get(0).get(0).getY(), last(lines.get(0)).getY());
        assertEquals(0, low);
        assertEquals(4, high);
    }

    @Test
    void aHillHasAClosedLineAroundIt() {
        double[][] hill = new double[41][41];
        for (int i = 0; i < 41; i++) {
            for (int j = 0; j < 41; j++) {
                hill[i][j] = -Math.hypot(i - 20, j - 20);
            }
        }
        List<List<Point2D>> lines = Contour.of(hill, -12.3);
        assertEquals(1, lines.size());
        assertTrue(lines.get(0).get(0).distance(last(lines.get(0))) < 1e-12);
        for (Point2D point : lines.get(0)) {
            // A chord of a cell lies within 1/(8 r) of the circle.
            assertEquals(12.3, point.distance(20, 20), 1 / (8 * 12.0));
        }
    }

    @Test
    void aLevelThatIsNowhereHasNoLine() {
        assertTrue(Contour.of(new double[6][6], 1).isEmpty());
    }

    private static Point2D last(List<Point2D> line) {
        return line.get(line.size() - 1);
    }
}
