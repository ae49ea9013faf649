package org.soakwright.planner.batch;

import java.util.ArrayList;
import java.util.List;
import org.soakwright.planner.conditions.Known;
import org.soakwright.recipes.library.Caution;
import org.soakwright.recipes.library.CautionBook;
import org.soakwright.recipes.library.Facts;
import org.soakwright.recipes.library.RecipeFacts;
import org.soakwright.recipes.model.Recipe;

/**
 * What whoever runs the batch should know beside the numbers: the usual cautions that are due, and what was left out.
 *
 * @param shown all of them, each a sentence or two with its source
 * @param stops those of them that forbid to use the plan until somebody answers for it
 */
public record Cautions(List<String> shown, List<String> stops) {
    /** Below it a food is kept cold, K: 5 Cel, FDA Food Code 3-501.16 (2009 edition, read as adopted by Washington). */
    static final double COLD = 278.15;

    /** The book, read when it is first asked for. */
    private static final class Shelf {
        static final CautionBook BOOK = CautionBook.load();
    }

    public Cautions {
        shown = List.copyOf(shown);
        stops = List.copyOf(stops);
    }

    /** For a recipe not followed yet: where times are free, counted is the longest that there can be. */
    public static Cautions of(Recipe recipe) {
        boolean free = recipe.steps().stream().anyMatch(step -> step.time().isFree());
        Recipe known = Known.of(recipe).recipe();
        Facts facts = new RecipeFacts(known, StepTimes.longest(known), RecipeFacts.Ends.unknown());
        Films films = Films.of(known, StepTimes.nominal(known));
        return of(
                facts,
                free ? "up to " : "",
                found(known, films, Warming.of(known).said()));
    }

    /** For a recipe followed. */
    public static Cautions of(Run run) {
        Recipe recipe = run.batch().recipe();
        RecipeFacts facts = new RecipeFacts(recipe, run.seconds(), new RunEnds(run));
        List<String> found = new ArrayList<>(Vapour.of(run));
        found.addAll(found(recipe, run.batch().films(), run.batch().warming()));
        return of(facts, "", found);
    }

    /** What was found of this very recipe: what lies outside its sources, and what warming is worth. */
    private static List<String> found(Recipe known, Films films, List<String> warming) {
        List<String> found = new ArrayList<>(Reservations.of(known, films));
        Published.of(known).forEach(one -> one.overruled().ifPresent(found::add));
        found.addAll(warming);
        return found;
    }

    private static Cautions of(Facts facts, String hedge, List<String> found) {
        List<String> shown = new ArrayList<>();
        for (Caution caution : Shelf.BOOK.due(facts)) {
            shown.add(words(caution, facts, hedge));
        }
        shown.addAll(found);
        List<String> stops = Shelf.BOOK.stopping(facts).stream()
                .map(caution -> words(caution, facts, hedge))
                .toList();
        return new Cautions(shown, stops);
    }

    private static String words(Caution caution, Facts facts, String hedge) {
        return caution.shown(facts, seconds -> hedge + Durations.practical(seconds));
    }
}
