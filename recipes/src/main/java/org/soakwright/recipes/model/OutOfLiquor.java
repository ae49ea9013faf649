package org.soakwright.recipes.model;

import java.util.ArrayList;
import java.util.List;
import org.soakwright.recipes.text.Problem;

/** What a step without liquor cannot state, because nothing would come of it. */
final class OutOfLiquor {
    private OutOfLiquor() {}

    static List<Problem> problems(Step step) {
        List<Problem> problems = new ArrayList<>();
        step.head()
                .overrides()
                .partition()
                .values()
                .forEach(partition -> problems.add(new Problem(
                        partition.place(),
                        "a " + step.kind() + " has no liquor, so a partition means nothing there; remove it")));
        LiquorPrice price = step.head().price();
        if (price != null) {
            problems.add(new Problem(
                    price.place(), "a " + step.kind() + " has no liquor, so it has no price of one; remove prices"));
        }
        return problems;
    }
}
