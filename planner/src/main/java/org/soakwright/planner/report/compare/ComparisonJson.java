package org.soakwright.planner.report.compare;

import java.io.IOException;
import java.util.Optional;
import org.soakwright.planner.report.JsonText;

/**
 * Two batches side by side as JSON: one object, pretty-printed, with a line feed at its end. Times are seconds, liquor litres; a difference
 * is what B has more than A, null where there is none to tell.
 */
public final class ComparisonJson {
    private ComparisonJson() {}

    /**
     * The text.
     *
     * @param version of this program
     */
    public static String of(String version, Comparison comparison) {
        return JsonText.object(json -> {
            json.string("soakwright", version);
            json.object("a", () -> side(json, comparison.a()));
            json.object("b", () -> side(json, comparison.b()));
            json.object("totals", () -> {
                json.object("seconds", () -> measure(json, comparison.seconds()));
                json.object("liquor-litres", () -> measure(json, comparison.litres()));
                json.object("cost", () -> {
                    json.numberOrNull("a", comparison.a().cost());
                    json.numberOrNull("b", comparison.b().cost());
                    json.numberOrNull("difference", comparison.cost().difference());
                    json.stringOrNull("currency-a", comparison.a().currency());
                    json.stringOrNull("currency-b", comparison.b().currency());
                });
            });
            json.array("steps", () -> {
                for (Comparison.StepRow row : comparison.steps()) {
                    json.element(() -> {
                        json.string("step", row.step());
                        json.string("kind", row.kind());
                        json.object("seconds", () -> measure(json, row.seconds()));
                    });
                }
            });
            json.array("ends", () -> {
                for (Comparison.EndRow row : comparison.ends()) {
                    json.element(() -> {
                        json.string("step", row.step());
                        json.string("species", row.species());
                        json.string("in", row.where());
                        content(json, row.content());
                    });
                }
            });
            json.array("readings", () -> {
                for (Comparison.ReadingRow row : comparison.readings()) {
                    json.element(() -> {
                        json.string("species", row.species());
                        json.string("grade", row.grade());
                        json.string("reading", row.reading());
                        content(json, row.content());
                    });
                }
            });
            json.array("targets", () -> {
                for (Comparison.TargetRow row : comparison.targets()) {
                    json.element(() -> {
                        json.string("target", row.target());
                        json.string("limit", row.limit());
                        content(json, row.value());
                        met(json, "met-a", row.a());
                        met(json, "met-b", row.b());
                    });
                }
            });
        });
    }

    private static void side(JsonText json, Side side) throws IOException {
        json.string("file", side.file());
        json.string("how", side.how());
        json.string("title", side.title());
        json.string("inputs-sha256", side.sha256());
        json.truth("met", side.met());
    }

    private static void measure(JsonText json, Measure measure) throws IOException {
        json.numberOrNull("a", measure.a());
        json.numberOrNull("b", measure.b());
        json.numberOrNull("difference", measure.difference());
    }

    private static void content(JsonText json, Measure measure) throws IOException {
        measure(json, measure);
        json.string("unit", measure.unit());
    }

    private static void met(JsonText json, String name, Optional<Side.Target> target) throws IOException {
        if (target.isPresent()) {
            json.truth(name, target.get().met());
        } else {
            json.nothing(name);
        }
    }
}
