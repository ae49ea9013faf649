package org.soakwright.planner.report.picture;

import java.util.Arrays;
import java.util.List;
import org.soakwright.planner.batch.Section;
import org.soakwright.recipes.model.Faces;
import org.soakwright.recipes.model.Side;

/**
 * A cut through the core as it is laid out: whole, from face to face, with what is sealed at the foot where one of its sides is. What was
 * computed runs from the core or the sealed face outwards.
 */
final class CutFace {
    private final Section section;
    private final boolean turned;

    CutFace(Section section) {
        this.section = section;
        // A piece that is sealed on one face is shown lying on it.
        turned = section.across().faces() == Faces.ONE && section.down().faces() == Faces.BOTH;
    }

    Side across() {
        return turned ? section.down() : section.across();
    }

    Side down() {
        return turned ? section.across() : section.down();
    }

    /** In mm, from face to face. */
    double width() {
        return 1000 * across().size().si();
    }

    double height() {
        return 1000 * down().size().si();
    }

    boolean isSealedBelow() {
        return down().faces() == Faces.ONE;
    }

    boolean isSealedLeft() {
        return across().faces() == Faces.ONE;
    }

    /** Where the core lies, as a share of the width from the left. */
    double coreAcross() {
        return isSealedLeft() ? 0 : 0.5;
    }

    /** Where the core lies, as a share of the height from above. */
    double coreDown() {
        return isSealedBelow() ? 1 : 0.5;
    }

    List<Section.End> ends() {
        return section.ends();
    }

    double core(Section.End end) {
        return end.contents()[0][0];
    }

    /** Where the two faces of the cut meet. */
    double corner(Section.End end) {
        double[] last = end.contents()[end.contents().length - 1];
        return last[last.length - 1];
    }

    double middleOfFace(Section.End end, boolean faceAcross) {
        double[][] contents = end.contents();
        boolean first = faceAcross != turned;
        return first ? contents[0][contents[0].length - 1] : contents[contents.length - 1][0];
    }

    static double least(Section section) {
        return section.ends().stream()
                .flatMap(end -> Arrays.stream(end.contents()))
                .mapToDouble(History::lowest)
                .min()
                .orElseThrow();
    }

    static double most(Section section) {
        return section.ends().stream()
                .flatMap(end -> Arrays.stream(end.contents()))
                .mapToDouble(History::highest)
                .max()
                .orElseThrow();
    }

    /** Contents by column from the left, then by row from above. */
    double[][] whole(Section.End end) {
        double[][] contents = end.contents();
        int acrossPoints = turned ? contents.length : contents[0].length;
        int downPoints = turned ? contents[0].length : contents.length;
        int columns = isSealedLeft() ? acrossPoints : 2 * acrossPoints - 1;
        int rows = isSealedBelow() ? downPoints : 2 * downPoints - 1;
        double[][] whole = new double[columns][rows];
        for (int i = 0; i < columns; i++) {
            int a = isSealedLeft() ? i : Math.abs(i - (acrossPoints - 1));
            for (int j = 0; j < rows; j++) {
                int d = isSealedBelow() ? downPoints - 1 - j : Math.abs(j - (downPoints - 1));
                whole[i][j] = turned ? contents[a][d] : contents[d][a];
            }
        }
        return whole;
    }

    /** Between points in straight lines, at the middles of so many columns and rows. */
    static double[][] resampled(double[][] whole, int columns, int rows) {
        double[][] image = new double[columns][rows];
        for (int i = 0; i < columns; i++) {
            double x = (i + 0.5) / columns * (whole.length - 1);
            int left = Math.min(whole.length - 2, (int) x);
            for (int j = 0; j < rows; j++) {
                double y = (j + 0.5) / rows * (whole[0].length - 1);
                int above = Math.min(whole[0].length - 2, (int) y);
                double first = between(whole[left], above, y - above);
                double second = between(whole[left + 1], above, y - above);
                image[i][j] = first + (x - left) * (second - first);
            }
        }
        return image;
    }

    private static double between(double[] column, int above, double share) {
        return column[above] + share * (column[above + 1] - column[above]);
    }
}
