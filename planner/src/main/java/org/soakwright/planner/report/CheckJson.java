package org.soakwright.planner.report;

import java.io.IOException;
import java.util.List;
import org.soakwright.planner.batch.AsInfinite;
import org.soakwright.planner.batch.Groups;
import org.soakwright.recipes.model.Fit;
import org.soakwright.recipes.model.Grade;
import org.soakwright.recipes.model.Recipe;

/**
 * The dimensionless groups of a recipe as JSON: one object, pretty-printed, with a line feed at its end. All groups are numbers without a
 * unit; {@code Bi} is the word "infinite" where there is no film, {@code capacity-ratio} null where no volume of liquor is stated.
 */
public final class CheckJson {
    private CheckJson() {}

    public static String of(
            Stamp stamp, Recipe recipe, List<Groups.Group> groups, List<AsInfinite> shapes, List<String> cautions) {
        return JsonText.object(json -> {
            json.string("soakwright", stamp.version());
            json.string("title", recipe.title());
            json.string("inputs-sha256", stamp.sha256());
            json.array("groups", () -> {
                for (Groups.Group group : groups) {
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
                for (AsInfinite shape : shapes) {
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
            json.strings("cautions", cautions);
        });
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
