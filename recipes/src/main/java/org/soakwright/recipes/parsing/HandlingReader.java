package org.soakwright.recipes.parsing;

import org.jspecify.annotations.Nullable;
import org.soakwright.recipes.model.Changeover;
import org.soakwright.recipes.model.Handling;
import org.soakwright.recipes.model.Quantity;
import org.soakwright.recipes.text.Kind;
import org.soakwright.recipes.text.Problems;
import org.soakwright.recipes.text.Tree;

/** Reads how the lot comes to a step and what the step asks of those who work there. */
final class HandlingReader {
    private final Values values;
    private final Problems problems;

    HandlingReader(Values values) {
        this.values = values;
        this.problems = values.problems();
    }

    @Nullable
    Handling handling(Fields step) {
        Boolean stays = truth("stays", step);
        Tree changing = step.get("changeover");
        Changeover changeover = changing == null ? null : changeover(changing);
        Boolean attended = truth("attended", step);
        Quantity hold = values.quantity("hold-at-most", step.get("hold-at-most"), Kind.DURATION);
        boolean broken = (changeover == null && changing != null) || (hold == null && step.has("hold-at-most"));
        return stays == null || attended == null || broken
                ? null
                : problems.attempt(() -> new Handling(stays, changeover, attended, hold));
    }

    /** Not written is not so. */
    private @Nullable Boolean truth(String key, Fields step) {
        return step.has(key) ? values.truth(key, step.get(key)) : Boolean.FALSE;
    }

    private @Nullable Changeover changeover(Tree tree) {
        Fields fields = Fields.of(tree, Section.CHANGEOVER, problems);
        if (fields == null) {
            return null;
        }
        Quantity drain = values.quantity("drain", fields.need("drain", "20 min"), Kind.DURATION);
        Quantity refill = values.quantity("refill", fields.need("refill", "30 min"), Kind.DURATION);
        return drain == null || refill == null
                ? null
                : problems.attempt(() -> new Changeover(fields.place(), drain, refill));
    }
}
