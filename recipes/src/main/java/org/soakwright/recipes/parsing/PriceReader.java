package org.soakwright.recipes.parsing;

import org.jspecify.annotations.Nullable;
import org.soakwright.recipes.model.LiquorPrice;
import org.soakwright.recipes.model.Prices;
import org.soakwright.recipes.model.Quantity;
import org.soakwright.recipes.text.Kind;
import org.soakwright.recipes.text.Problems;
import org.soakwright.recipes.text.Tree;

/** Reads prices, of the recipe and of a step. */
final class PriceReader {
    private static final String PER_TIME = "40 EUR/h";
    private static final String PER_VOLUME = "3.1 EUR/m3";

    private final Values values;
    private final Problems problems;

    PriceReader(Values values) {
        this.values = values;
        this.problems = values.problems();
    }

    @Nullable
    Prices ofRecipe(Tree tree) {
        Fields fields = Fields.of(tree, Section.PRICES, problems);
        if (fields == null) {
            return null;
        }
        Quantity time = values.money("the price of time", fields.get("time"), Kind.DURATION, PER_TIME);
        Tree liquor = fields.get("liquor");
        LiquorPrice price = liquor == null ? null : ofLiquor(liquor);
        boolean broken = (time == null && fields.has("time")) || (price == null && liquor != null);
        return broken ? null : problems.attempt(() -> new Prices(fields.place(), time, price));
    }

    /** {@code {liquor: …}} or {@code {supply: …, disposal: …}}. */
    @Nullable
    LiquorPrice ofStep(Tree tree) {
        Fields fields = Fields.of(tree, Section.STEP_PRICES, problems);
        if (fields == null) {
            return null;
        }
        Tree liquor = fields.get("liquor");
        if (liquor == null) {
            return split(fields);
        }
        if (fields.has("supply") || fields.has("disposal")) {
            problems.add(
                    fields.place(),
                    "the prices of a step are liquor, or supply and disposal: found both; keep one form");
            return null;
        }
        return ofLiquor(liquor);
    }

    private @Nullable LiquorPrice ofLiquor(Tree tree) {
        if (tree instanceof Tree.Entries entries
                && entries.entries().stream().noneMatch(entry -> entry.key().equals("value"))) {
            Fields fields = Fields.of(tree, Section.LIQUOR_PRICE, problems);
            return fields == null ? null : split(fields);
        }
        Quantity price = values.money("the price of liquor", tree, Kind.VOLUME, PER_VOLUME);
        return price == null ? null : problems.attempt(() -> new LiquorPrice(price.place(), price, null));
    }

    private @Nullable LiquorPrice split(Fields fields) {
        Quantity supply = values.money("the price of supply", fields.get("supply"), Kind.VOLUME, PER_VOLUME);
        Quantity disposal = values.money("the price of disposal", fields.get("disposal"), Kind.VOLUME, PER_VOLUME);
        boolean broken = (supply == null && fields.has("supply")) || (disposal == null && fields.has("disposal"));
        return broken ? null : problems.attempt(() -> new LiquorPrice(fields.place(), supply, disposal));
    }
}
