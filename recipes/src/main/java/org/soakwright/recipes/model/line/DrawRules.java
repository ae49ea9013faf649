package org.soakwright.recipes.model.line;

import java.util.ArrayList;
import java.util.Collection;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.soakwright.recipes.model.Quantity;
import org.soakwright.recipes.model.Recipe;
import org.soakwright.recipes.model.Renewal;
import org.soakwright.recipes.model.Step;
import org.soakwright.recipes.text.Kind;
import org.soakwright.recipes.text.Nearest;
import org.soakwright.recipes.text.Problem;

/** What vessels draw is there, counted as the utility is, and no more than there is of it. */
final class DrawRules {
    private DrawRules() {}

    static List<Problem> of(VesselGroup group, Collection<Utility> utilities, Map<String, Recipe> recipes) {
        List<Problem> problems = new ArrayList<>();
        group.draws().forEach((name, draw) -> {
            Optional<Utility> utility =
                    utilities.stream().filter(one -> one.name().equals(name)).findFirst();
            if (utility.isEmpty()) {
                problems.add(unknown(name, draw, utilities));
            } else if (draw instanceof Draw.Steady steady) {
                problems.addAll(steady(steady.value(), utility.get()));
            } else {
                problems.addAll(flow(draw, utility.get(), group, recipes));
            }
        });
        return problems;
    }

    private static Problem unknown(String name, Draw draw, Collection<Utility> utilities) {
        List<String> known = utilities.stream().map(Utility::name).toList();
        return new Problem(
                draw.place(),
                "no utility has this name: found \"" + name + "\"; " + Nearest.hint(name, known)
                        + (known.isEmpty() ? ", write such as utilities: {water: 60 L/min}" : ""));
    }

    private static List<Problem> steady(Quantity value, Utility utility) {
        if (!utility.kind().has(value.unit())) {
            return List.of(new Problem(
                    value.place(),
                    "what is drawn of " + utility.name() + " is "
                            + utility.kind().label() + " like its limit of "
                            + utility.atMost() + ": found \"" + value + "\"; write such as "
                            + utility.kind().example()));
        }
        return value.si() <= utility.atMost().si()
                ? List.of()
                : List.of(new Problem(
                        value.place(),
                        "one vessel draws more of " + utility.name() + " than there is: found \"" + value
                                + "\" where at most " + utility.atMost() + " is; correct one of them"));
    }

    /** Of running water in plenty nobody knows how much flows. */
    private static List<Problem> flow(Draw draw, Utility utility, VesselGroup group, Map<String, Recipe> recipes) {
        if (utility.kind() != Kind.FLOW) {
            return List.of(new Problem(
                    draw.place(),
                    "the flow of a rinse cannot be drawn of " + utility.name() + ", whose limit is " + utility.atMost()
                            + "; write such as " + utility.kind().example()));
        }
        List<Problem> problems = new ArrayList<>();
        recipes.forEach((file, recipe) -> recipe.steps().stream()
                .filter(group::serves)
                .forEach(step -> {
                    if (step instanceof Step.Rinse rinse && rinse.renewal() instanceof Renewal.Plenty) {
                        problems.add(new Problem(
                                draw.place(),
                                "the flow of " + Agreement.named(step, file)
                                        + " is not stated: found running water in plenty; write its flow, or what the"
                                        + " vessel draws, such as "
                                        + utility.kind().example()));
                    } else if (step instanceof Step.Rinse rinse
                            && rinse.renewal() instanceof Renewal.Flow flowing
                            && flowing.rate().si() > utility.atMost().si()) {
                        problems.add(new Problem(
                                draw.place(),
                                Agreement.named(step, file) + " takes more of " + utility.name()
                                        + " than there is: found " + flowing.rate() + " where at most "
                                        + utility.atMost() + " is; correct one of them"));
                    }
                }));
        return problems;
    }
}
