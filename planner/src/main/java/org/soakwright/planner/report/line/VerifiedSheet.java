package org.soakwright.planner.report.line;

import java.util.ArrayList;
import java.util.List;
import org.soakwright.planner.line.verify.Verification;
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

    /** For people. */
    public static String of(Line line, Verification.Verdict verdict, Style style) {
        List<Section> sections = new ArrayList<>();
        if (!verdict.isFine()) {
            sections.add(Section.of("broken", "Against it", verdict.faults()));
        }
        return BatchSheet.of(
                new Findings(line.title(), List.of(), List.of(answer(verdict)), verdict.isFine(), sections), style);
    }

    private static String answer(Verification.Verdict verdict) {
        if (!verdict.isFine()) {
            return count(verdict.faults().size(), "fault") + " found in the result.";
        }
        return "Nothing against it: " + count(verdict.lots(), "lot") + ", "
                + count(verdict.steps(), "step") + ", " + count(verdict.moves(), "move") + ", "
                + count(verdict.targets(), "target") + " checked.";
    }

    private static String count(int number, String what) {
        return number + " " + what + (number == 1 ? "" : "s");
    }

    /** For programs. */
    public static String json(Stamp stamp, Line line, Verification.Verdict verdict) {
        return JsonText.object(json -> {
            json.string("soakwright", stamp.version());
            json.string("title", line.title());
            json.string("inputs-sha256", stamp.sha256());
            json.truth("verified", verdict.isFine());
            json.whole("lots", verdict.lots());
            json.whole("steps", verdict.steps());
            json.whole("moves", verdict.moves());
            json.whole("targets", verdict.targets());
            json.strings("faults", verdict.faults());
        });
    }
}
