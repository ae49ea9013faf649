package org.soakwright.planner.line.verify;

import java.util.List;
import org.soakwright.recipes.model.Recipe;
import org.soakwright.recipes.model.Step;
import org.soakwright.recipes.model.line.Order;

/**
 * What goes through the line together.
 *
 * @param orders whose lots, or parts of lots, they are
 * @param recipe with the mass of all of them
 * @param parts every step and fill of the recipe
 */
record Cargo(String name, List<Result.Entry> entries, List<Order> orders, Recipe recipe, double kg, List<Part> parts) {
    /**
     * A step or one of its fills.
     *
     * @param index which step of the recipe, from 0
     * @param fill from 0
     */
    record Part(Step step, int index, int fill, Result.Stint stint) {
        String name() {
            return step.fills() == 1 ? step.name() : step.name() + ", fill " + (fill + 1);
        }

        /** Whether the lot is lifted into it: it is no later fill, and the step does not say that the lot stays. */
        boolean isLifted() {
            return fill == 0 && !step.head().handling().stays();
        }
    }

    /** Of the first of them; all agree. */
    Result.Entry entry() {
        return entries.get(0);
    }

    Part first() {
        return parts.get(0);
    }

    Part last() {
        return parts.get(parts.size() - 1);
    }
}
