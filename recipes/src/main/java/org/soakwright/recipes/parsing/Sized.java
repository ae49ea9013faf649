package org.soakwright.recipes.parsing;

import java.util.List;
import org.jspecify.annotations.Nullable;
import org.soakwright.recipes.model.Fit;
import org.soakwright.recipes.model.Quantity;
import org.soakwright.recipes.model.Spread;

/** What is known of the size of a grade's pieces, whether stated, weighed or measured. */
record Sized(
        List<Quantity> sizes,
        @Nullable Quantity weight,
        @Nullable Spread spread,
        @Nullable Fit fit) {}
