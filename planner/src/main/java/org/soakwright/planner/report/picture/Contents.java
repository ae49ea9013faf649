package org.soakwright.planner.report.picture;

import java.util.Optional;
import org.soakwright.planner.batch.Section;

/** What shades stand for, alike in the map and in the cut of a species in a grade. */
final class Contents {
    private static final int MOST_TICKS = 5;

    private Contents() {}

    static Scale scale(History history, int species, int grade, Optional<Section> section) {
        double most = section.map(CutFace::most).orElse(0.0);
        double least = section.map(CutFace::least).orElse(Double.POSITIVE_INFINITY);
        for (double[] profile : history.profiles(species, grade)) {
            most = Math.max(most, History.highest(profile));
            least = Math.min(least, History.lowest(profile));
        }
        return Scale.holding(least, most, MOST_TICKS);
    }
}
