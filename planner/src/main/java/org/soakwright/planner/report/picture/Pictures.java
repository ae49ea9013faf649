package org.soakwright.planner.report.picture;

import java.util.ArrayList;
import java.util.List;
import org.soakwright.planner.batch.Plan;
import org.soakwright.planner.batch.Run;
import org.soakwright.planner.batch.Trace;

/** The pictures of a batch, in the order in which they are to be looked at. */
public final class Pictures {
    /** Depths that a trace should have to look smooth. */
    public static final int LAYERS = 49;

    private Pictures() {}

    /** Of a plan: what decides is marked. */
    public static List<Picture> of(Plan plan) {
        return of(Trace.of(plan.run(), LAYERS), plan.binds());
    }

    /** Of a recipe followed as written. */
    public static List<Picture> of(Run run) {
        return of(Trace.of(run, LAYERS), List.of());
    }

    /**
     * Of a run that has been traced: the depth-time map of each grade and species ({@code map-GRADE-SPECIES}), then {@code profiles},
     * {@code readings} where a target limits one, {@code liquor} where there is one, {@code balance}.
     *
     * @param trace of {@link #LAYERS} depths or more
     * @param binds names of the targets that decide, as in {@link Plan#binds()}
     */
    public static List<Picture> of(Trace trace, List<String> binds) {
        History history = new History(trace);
        Clock clock = new Clock(history.ends());
        List<Picture> pictures = new ArrayList<>();
        for (int j = 0; j < history.grades().size(); j++) {
            for (int s = 0; s < history.recipe().species().size(); s++) {
                pictures.add(new DepthMap(history, clock, s, j).picture());
            }
        }
        pictures.add(new Profiles(history).picture());
        Readings readings = new Readings(history, clock, binds);
        if (!readings.isEmpty()) {
            pictures.add(readings.picture());
        }
        LiquorCourse liquor = new LiquorCourse(history, clock);
        if (!liquor.isEmpty()) {
            pictures.add(liquor.picture());
        }
        pictures.add(new Ledger(history).picture());
        return List.copyOf(pictures);
    }

    /** The colours of {@link Picture#inline()} pictures as CSS custom properties: light, dark by preference, grey on paper. */
    public static String stylesheet() {
        return Svg.stylesheet();
    }
}
