package org.soakwright.planner.report.picture;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.soakwright.planner.batch.Plan;
import org.soakwright.planner.batch.Run;
import org.soakwright.planner.batch.Section;
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
     * Of a run that has been traced: the depth-time map of each grade and species ({@code map-GRADE-SPECIES}), beside it the cut through
     * pieces of several sides ({@code section-GRADE-SPECIES}), then {@code profiles},
     * {@code readings} where a target limits one, {@code spread} where one limits pieces that differ, {@code liquor} where there is one, {@code balance}.
     *
     * @param trace of {@link #LAYERS} depths or more
     * @param binds names of the targets that decide, as in {@link Plan#binds()}
     */
    public static List<Picture> of(Trace trace, List<String> binds) {
        History history = new History(trace);
        Clock clock = new Clock(history.ends());
        List<Section> sections = Section.of(trace.run(), CrossSection.POINTS);
        List<Picture> pictures = new ArrayList<>();
        for (int j = 0; j < history.grades().size(); j++) {
            for (int s = 0; s < history.recipe().species().size(); s++) {
                Optional<Section> section = section(sections, history, s, j);
                Scale contents = Contents.scale(history, s, j, section);
                pictures.add(new DepthMap(history, clock, s, j, contents).picture());
                if (section.isPresent()) {
                    pictures.add(new CrossSection(history, s, j, section.get(), contents).picture());
                }
            }
        }
        pictures.add(new Profiles(history).picture());
        Readings readings = new Readings(history, clock, binds);
        if (!readings.isEmpty()) {
            pictures.add(readings.picture());
        }
        Spreads spreads = new Spreads(history, binds);
        if (!spreads.isEmpty()) {
            pictures.add(spreads.picture());
        }
        LiquorCourse liquor = new LiquorCourse(history, clock);
        if (!liquor.isEmpty()) {
            pictures.add(liquor.picture());
        }
        pictures.add(new Ledger(history).picture());
        return List.copyOf(pictures);
    }

    private static Optional<Section> section(List<Section> sections, History history, int species, int grade) {
        String speciesName = history.recipe().species().get(species).name();
        String gradeName = history.grades().get(grade).name();
        return sections.stream()
                .filter(section -> section.species().name().equals(speciesName)
                        && section.grade().name().equals(gradeName))
                .findFirst();
    }

    /** The colours of {@link Picture#inline()} pictures as CSS custom properties: light, dark by preference, grey on paper. */
    public static String stylesheet() {
        return Svg.stylesheet();
    }
}
