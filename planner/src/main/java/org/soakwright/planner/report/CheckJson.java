package org.soakwright.planner.report;

import java.util.List;
import org.soakwright.planner.batch.Groups;

/**
 * The dimensionless groups of a recipe as JSON: one object, pretty-printed, with a line feed at its end. All groups are numbers without a
 * unit; {@code Bi} is the word "infinite" where there is no film, {@code capacity-ratio} null where no volume of liquor is stated.
 */
public final class CheckJson {
    private CheckJson() {}

    public static String of(Stamp stamp, String title, List<Groups.Group> groups, List<String> cautions) {
        return JsonText.object(json -> {
            json.string("soakwright", stamp.version());
            json.string("title", title);
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
            json.strings("cautions", cautions);
        });
    }
}
