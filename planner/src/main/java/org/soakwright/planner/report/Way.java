package org.soakwright.planner.report;

import org.soakwright.recipes.model.Grade;
import org.soakwright.recipes.model.Species;

/**
 * The shortest way through pieces of a grade along which a profile of a species runs, from position 0 to 1: from the core to the wetted
 * face or, where a skin covers one of two faces, from that face through the core to the bare one.
 *
 * @param fromSkin whether it begins at the face with the skin
 */
public record Way(Grade grade, boolean fromSkin) {
    public static Way of(Species species, Grade grade) {
        return new Way(
                grade,
                species.hasUnlikeFaces(grade)
                        && grade.shortest().equals(grade.sides().get(0)));
    }

    /** How long it is, mm. */
    public double millimetres() {
        return 1000 * (fromSkin ? grade.shortest().size().si() : grade.depth());
    }

    /** Position of the core. */
    public double core() {
        return fromSkin ? 0.5 : 0;
    }

    /** The content at the core, of contents at evenly spaced positions. */
    public double core(double[] profile) {
        return at(profile, core());
    }

    /** The content at the surface: between unlike faces the mean of both. */
    public double surface(double[] profile) {
        return fromSkin ? (profile[0] + bare(profile)) / 2 : bare(profile);
    }

    /** The content at the face without a skin. */
    public static double bare(double[] profile) {
        return profile[profile.length - 1];
    }

    /** In straight lines between evenly spaced positions. */
    public static double at(double[] profile, double position) {
        double at = position * (profile.length - 1);
        int i = Math.min(profile.length - 2, (int) at);
        return profile[i] + (at - i) * (profile[i + 1] - profile[i]);
    }
}
