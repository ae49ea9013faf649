package org.soakwright.planner.report;

import java.io.IOException;
import org.soakwright.planner.batch.AsInfinite;
import org.soakwright.planner.batch.Checked;
import org.soakwright.planner.batch.FilmFound;
import org.soakwright.planner.batch.Groups;
import org.soakwright.planner.batch.Published;
import org.soakwright.planner.conditions.Conversion;
import org.soakwright.recipes.library.Entry;
import org.soakwright.recipes.model.Fit;
import org.soakwright.recipes.model.Grade;
import org.soakwright.recipes.model.Recipe;

/**
 * The dimensionless groups of a recipe as JSON: one object, pretty-printed, with a line feed at its end. All groups are numbers without a
 * unit; {@code Bi} is the word "infinite" where there is no film, {@code capacity-ratio} null where no volume of liquor is stated.
 */
public final class CheckJson {
    private CheckJson() {}

    public static String of(Stamp stamp, Checked checked) {
        Recipe recipe = checked.recipe();
        return JsonText.object(json -> {
            json.string("soakwright", stamp.version());
            json.string("title", recipe.title());
            json.string("inputs-sha256", stamp.sha256());
            json.array("groups", () -> {
                for (Groups.Group group : checked.groups()) {
                    json.element(() -> {
                        json.string("step", group.step());
                        json.string("species", group.species());
                        json.string("piece", group.piece());
                        json.numbers("Fo", group.foLow(), group.foHigh());
                        if (Double.isInfinite(group.biot())) {
                            json.string("Bi", "infinite");
                        } else {
                            json.number("Bi", group.biot());
                        }
                        json.numberOrNull("capacity-ratio", group.capacityRatio());
                        json.string("regime", group.regime());
                    });
                }
            });
            json.array("shapes", () -> {
                for (AsInfinite shape : checked.shapes()) {
                    json.element(() -> {
                        json.string("piece", shape.grade());
                        json.string("taken-for", shape.taken().word());
                        json.numberOrNull("seconds", shape.seconds());
                        json.numberOrNull("seconds-as-taken", shape.taking());
                    });
                }
            });
            json.array("fits", () -> {
                for (Grade grade : recipe.lot().grades()) {
                    Fit fit = grade.fit();
                    if (fit != null) {
                        json.element(() -> fit(json, grade.name(), fit));
                    }
                }
            });
            json.array("conversions", () -> {
                for (Conversion conversion : checked.conversions()) {
                    json.element(() -> {
                        json.string("what", conversion.what());
                        json.string("written", conversion.written());
                        json.string("becomes", conversion.becomes());
                        json.string("how", conversion.how());
                    });
                }
            });
            json.array("films", () -> {
                for (FilmFound film : checked.films()) {
                    json.element(() -> film(json, film));
                }
            });
            json.array("library", () -> {
                for (Published published : checked.published()) {
                    json.element(() -> {
                        json.string("what", published.what());
                        json.string("used", published.used().value().toString());
                        json.string("entry", published.entry().name());
                        json.strings(
                                "others",
                                published.others().stream().map(Entry::name).toList());
                    });
                }
            });
            json.strings("cautions", checked.cautions());
        });
    }

    private static void film(JsonText json, FilmFound film) throws IOException {
        json.string("step", film.step());
        json.string("species", film.species());
        json.string("piece", film.piece());
        json.number("Re", film.reynolds());
        json.number("Sc", film.schmidt());
        json.number("Gr", film.grashof());
        json.number("Sh", film.sherwood());
        json.number("coefficient", film.coefficient());
        json.string("unit", "m/s");
        json.number("within", film.within());
        json.numberOrNull("density-difference", film.denser());
        json.numberOrNull("worth-seconds", film.worthSeconds());
        json.string("correlations", film.correlations());
        json.strings("cautions", film.cautions());
    }

    private static void fit(JsonText json, String piece, Fit fit) throws IOException {
        json.string("piece", piece);
        json.string("file", fit.file());
        json.number("pieces", fit.pieces());
        json.number("median", fit.median().si());
        json.string("unit", "m");
        json.number("spread", fit.cv());
        json.number("largest-gap", fit.worst());
        json.number("by-chance", fit.limit());
    }
}
