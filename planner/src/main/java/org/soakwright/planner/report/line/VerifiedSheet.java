package org.soakwright.planner.report.line;

import java.util.ArrayList;
import java.util.List;
import org.soakwright.planner.report.BatchSheet;
import org.soakwright.planner.report.Findings;
import org.soakwright.planner.report.JsonText;
import org.soakwright.planner.report.Section;
import org.soakwright.planner.report.Stamp;
import org.soakwright.planner.report.Style;
import org.soakwright.recipes.model.line.Line;

/** What a check of a schedule against the rules of its line found. */
public final class VerifiedSheet {
    private VerifiedSheet() {}

    /**
     * For people.
     *
     * @param broken a sentence for each rule that is broken
     */
    public static String of(Line line, List<String> broken, Style style) {
        List<Section> sections = new ArrayList<>();
        if (!broken.isEmpty()) {
            sections.add(Section.of("broken", "Rules that it breaks", broken));
        }
        String answer = broken.isEmpty()
                ? "The result breaks no rule of the line."
                : "The result breaks " + broken.size() + (broken.size() == 1 ? " rule" : " rules") + " of the line.";
        return BatchSheet.of(new Findings(line.title(), List.of(), List.of(answer), broken.isEmpty(), sections), style);
    }

    /** For programs. */
    public static String json(Stamp stamp, Line line, List<String> broken) {
        return JsonText.object(json -> {
            json.string("soakwright", stamp.version());
            json.string("title", line.title());
            json.string("inputs-sha256", stamp.sha256());
            json.truth("verified", broken.isEmpty());
            json.strings("broken", broken);
        });
    }
}
