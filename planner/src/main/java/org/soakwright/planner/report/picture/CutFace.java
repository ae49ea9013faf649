package org.soakwright.planner.report.picture;

import java.util.Arrays;
import java.util.List;
import org.soakwright.planner.batch.Section;
import org.soakwright.planner.report.Way;
import org.soakwright.recipes.model.Faces;
import org.soakwright.recipes.model.Side;

/**
 * A cut through the core as it is laid out: whole, from face to face, with a face that is sealed or has a skin at the foot where one of its
 * sides has such a face. What was computed runs from the core, the sealed face or the one with the skin outwards.
 */
final class CutFace {
    private final Section section;
    private final boolean turned;

    CutFace(Section section) {
        this.section = section;
        // A piece that is sealed on one face, or has a skin on one, is shown lying on it.
        turned = begins(section.across()) != From.CORE && begins(section.down()) == From.CORE;
    }

    /** What the contents of a side begin at. */
    enum From {
        CORE,
        SEALED_FACE,
        SKIN
    }

    private From begins(Side side) {
        if (side.faces() == Faces.ONE) {
            return From.SEALED_FACE;
        }
        boolean first = side.equals(section.grade().sides().get(0));
        return first && section.species().hasUnlikeFaces(section.grade()) ? From.SKIN : From.CORE;
    }

    /** What lies at the foot; the core is no face, so nothing special does. */
    From below() {
        return begins(down());
    }

    From left() {
        return begins(across());
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

    /** Whether the face at the foot is unlike that above. */
    boolean isUnlikeBelow() {
        return below() != From.CORE;
    }

    boolean isUnlikeLeft() {
        return left() != From.CORE;
    }

    /** Where the core lies, as a share of the width from the left. */
    double coreAcross() {
        return left() == From.SEALED_FACE ? 0 : 0.5;
    }

    /** Where the core lies, as a share of the height from above. */
    double coreDown() {
        return below() == From.SEALED_FACE ? 1 : 0.5;
    }

    List<Section.End> ends() {
        return section.ends();
    }

    double core(Section.End end) {
        return Way.at(down(end, core(section.across())), core(section.down()));
    }

    /** Position on a side. */
    private double core(Side side) {
        return begins(side) == From.SKIN ? 0.5 : 0;
    }

    /** Contents by position down, at a position across as they were computed. */
    private static double[] down(Section.End end, double across) {
        return Arrays.stream(end.contents())
                .mapToDouble(row -> Way.at(row, across))
                .toArray();
    }

    /** Where the two faces of the cut meet that are wetted and bare. */
    double corner(Section.End end) {
        double[] last = end.contents()[end.contents().length - 1];
        return last[last.length - 1];
    }

    double middleOfFace(Section.End end, boolean faceAcross) {
        boolean first = faceAcross != turned;
        return first
                ? Way.at(down(end, 1), core(section.down()))
                : Way.at(end.contents()[end.contents().length - 1], core(section.across()));
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
        int columns = isUnlikeLeft() ? acrossPoints : 2 * acrossPoints - 1;
        int rows = isUnlikeBelow() ? downPoints : 2 * downPoints - 1;
        double[][] whole = new double[columns][rows];
        for (int i = 0; i < columns; i++) {
            int a = isUnlikeLeft() ? i : Math.abs(i - (acrossPoints - 1));
            for (int j = 0; j < rows; j++) {
                int d = isUnlikeBelow() ? downPoints - 1 - j : Math.abs(j - (downPoints - 1));
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
