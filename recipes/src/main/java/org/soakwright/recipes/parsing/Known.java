package org.soakwright.recipes.parsing;

import java.util.List;
import org.jspecify.annotations.Nullable;
import org.soakwright.recipes.model.Content;
import org.soakwright.recipes.model.Per;
import org.soakwright.recipes.model.Quantity;
import org.soakwright.recipes.text.Kind;
import org.soakwright.recipes.text.Problems;
import org.soakwright.recipes.text.Tree;

/** Reads values that are measured, so that a give-or-take may stand beside them. */
final class Known {
    private static final List<Kind> OF_PIECES = List.of(Kind.PER_MASS, Kind.PER_VOLUME);
    private static final List<Kind> OF_LIQUOR =
            List.of(Kind.PER_MASS, Kind.PER_VOLUME, Kind.PER_AMOUNT, Kind.SATURATION);

    private final Values values;
    private final Problems problems;

    Known(Values values) {
        this.values = values;
        this.problems = values.problems();
    }

    @Nullable
    Quantity quantity(String what, @Nullable Tree tree, Kind kind) {
        return quantity(what, tree, List.of(kind));
    }

    /** A temperature that matter can have. */
    @Nullable
    Quantity temperature(String what, @Nullable Tree tree) {
        return values.checked(quantity(what, tree, Kind.TEMPERATURE), Quantity::possible);
    }

    /** A plain number. */
    @Nullable
    Quantity number(String what, @Nullable Tree tree, String example) {
        Fields fields = opened(tree);
        return fields == null
                ? values.plain(what, tree, example)
                : beside(values.plain(what, fields.need("value", example), example), fields, Kind.FRACTION);
    }

    private @Nullable Quantity quantity(String what, @Nullable Tree tree, List<Kind> kinds) {
        Fields fields = opened(tree);
        if (fields == null) {
            return values.quantity(what, tree, kinds);
        }
        Quantity value = values.quantity(what, fields.need("value", kinds.get(0).example()), kinds);
        return beside(value, fields, kinds.get(0) == Kind.TEMPERATURE ? Kind.TEMPERATURE_DIFFERENCE : Kind.FRACTION);
    }

    /** The keys of a value with a give-or-take; null where it is written otherwise. */
    private @Nullable Fields opened(@Nullable Tree tree) {
        return tree instanceof Tree.Entries entries && !Values.isFree(entries) && Values.has(entries, GIVE_OR_TAKE)
                ? Fields.of(tree, Section.KNOWN, problems)
                : null;
    }

    static final String GIVE_OR_TAKE = "give-or-take";

    /** The value with the give-or-take that stands beside it. */
    @Nullable
    Quantity beside(@Nullable Quantity value, Fields fields) {
        return beside(value, fields, Kind.FRACTION);
    }

    private @Nullable Quantity beside(@Nullable Quantity value, Fields fields, Kind kind) {
        Tree tree = fields.known(GIVE_OR_TAKE);
        if (tree == null) {
            return value;
        }
        Quantity giveOrTake = values.quantity(GIVE_OR_TAKE, tree, kind);
        return value == null || giveOrTake == null ? null : problems.attempt(() -> value.with(giveOrTake));
    }

    /** What a liquor holds. */
    @Nullable
    Content ofLiquor(String what, @Nullable Tree tree) {
        Quantity amount = quantity(what, tree, OF_LIQUOR);
        return amount == null ? null : problems.attempt(() -> new Content(amount));
    }

    /** What a piece holds at a point, counted as loaded. */
    @Nullable
    Content ofPiece(String what, @Nullable Tree tree) {
        Quantity amount = quantity(what, tree, OF_PIECES);
        return amount == null ? null : problems.attempt(() -> new Content(amount));
    }

    /** What a piece holds, as loaded or per dry mass. */
    @Nullable
    Content ofPiece(String what, @Nullable Tree tree, Section section) {
        if (!(tree instanceof Tree.Entries entries) || Values.isFree(entries)) {
            return ofPiece(what, tree);
        }
        Fields fields = Fields.of(tree, section, problems);
        if (fields == null) {
            return null;
        }
        Quantity amount = beside(
                values.quantity(what, fields.need("value", OF_PIECES.get(0).example()), OF_PIECES), fields);
        Per per = fields.has("per") ? values.word("per", fields.get("per"), Per.class) : Per.LOADED;
        return amount == null || per == null ? null : problems.attempt(() -> new Content(amount, per));
    }
}
