package org.soakwright.recipes.model.line;

import java.math.BigDecimal;
import java.time.ZonedDateTime;
import java.util.ArrayList;
import java.util.List;
import org.jspecify.annotations.Nullable;
import org.soakwright.recipes.model.Quantity;
import org.soakwright.recipes.model.Recipe;
import org.soakwright.recipes.text.Place;
import org.soakwright.recipes.text.Problem;
import org.soakwright.recipes.text.Shown;
import org.soakwright.recipes.text.Unsound;

/**
 * A lot to be made.
 *
 * @param lot its name
 * @param recipeFile as the line names it
 * @param recipe its lot has a density; its mass is another's
 * @param mass of this lot as loaded, kg, above zero
 * @param ready when it may begin
 * @param due when it is to be done; null is no matter when
 * @param priority what a minute of its lateness weighs, above 0 and up to a million
 * @param alone whether it must not share the load of a vessel with other lots of its recipe
 */
public record Order(
        Place place,
        String lot,
        String recipeFile,
        Recipe recipe,
        Quantity mass,
        ZonedDateTime ready,
        @Nullable ZonedDateTime due,
        BigDecimal priority,
        boolean alone) {
    private static final BigDecimal MOST_PRIORITY = BigDecimal.valueOf(1_000_000);

    public Order {
        List<Problem> problems = new ArrayList<>();
        if (lot.isBlank()) {
            problems.add(new Problem(place, "the lot has no name; write one such as L1"));
        }
        problems.addAll(ifNoDensity(recipe));
        if (due != null) {
            problems.addAll(ifDueTooEarly(place, ready, due));
        }
        problems.addAll(ifNoPriority(place, priority));
        if (!problems.isEmpty()) {
            throw new Unsound(problems);
        }
        mass.positive("the mass");
        Minutes.require("ready", ready, place);
        Minutes.require("due", due, place);
    }

    /** A lot by mass needs it; said at the lot of the recipe, so once for all that follow it. */
    public static List<Problem> ifNoDensity(Recipe recipe) {
        return recipe.lot().density() != null
                ? List.of()
                : List.of(new Problem(
                        recipe.lot().place(),
                        "a lot of a line is given by mass, which needs the density of the pieces: found none; add density"
                                + " to the lot, such as 1120 kg/m3"));
    }

    /** Nothing is due before it is ready. */
    public static List<Problem> ifDueTooEarly(Place place, ZonedDateTime ready, ZonedDateTime due) {
        return !due.toInstant().isBefore(ready.toInstant())
                ? List.of()
                : List.of(new Problem(
                        place,
                        "a lot is due after it is ready: found due \"" + due.toLocalDateTime() + "\" before ready \""
                                + ready.toLocalDateTime()
                                + "\"; correct one of them, ready is the start of the line where it is not stated"));
    }

    /** It weighs something, and not all there is. */
    public static List<Problem> ifNoPriority(Place place, BigDecimal priority) {
        return priority.signum() > 0 && priority.compareTo(MOST_PRIORITY) <= 0
                ? List.of()
                : List.of(new Problem(
                        place,
                        "a priority lies above 0 and up to 1000000: found \"" + Shown.number(priority)
                                + "\"; write such as 2, or leave it out for 1"));
    }
}
