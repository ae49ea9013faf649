package org.soakwright.recipes.parsing;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import org.jspecify.annotations.Nullable;
import org.soakwright.recipes.model.Quantity;
import org.soakwright.recipes.model.Time;
import org.soakwright.recipes.text.Kind;
import org.soakwright.recipes.text.Problems;
import org.soakwright.recipes.text.Tree;
import org.soakwright.recipes.text.Unit;

/** Reads the time of a step: fixed, a range, or one of several. */
final class TimeReader {

    private final Values values;
    private final Problems problems;

    TimeReader(Values values) {
        this.values = values;
        this.problems = values.problems();
    }

    @Nullable
    Time time(@Nullable Tree tree) {
        if (tree instanceof Tree.Entries entries) {
            List<String> keys = entries.entries().stream().map(Tree.Entry::key).toList();
            if (keys.contains("any-of")) {
                return anyOf(tree);
            }
            if (keys.contains("from") || keys.contains("to")) {
                return between(tree);
            }
        }
        Quantity duration = duration("time", tree);
        return duration == null ? null : problems.attempt(() -> new Time.Fixed(duration));
    }

    private @Nullable Time between(Tree tree) {
        Fields fields = Fields.of(tree, Section.TIME_BETWEEN, problems);
        if (fields == null) {
            return null;
        }
        Quantity from = duration("from", fields.need("from", "2 h"));
        Quantity to = duration("to", fields.need("to", "24 h"));
        Quantity planned = duration("planned", fields.get("planned"));
        Quantity grain = fields.has("grain") ? duration("grain", fields.get("grain")) : oneMinute(fields);
        boolean broken = planned == null && fields.has("planned");
        return from == null || to == null || grain == null || broken
                ? null
                : problems.attempt(() -> new Time.Between(fields.place(), from, to, grain, planned));
    }

    private static Quantity oneMinute(Fields fields) {
        Unit minute = Kind.DURATION.unit("min").orElseThrow();
        return new Quantity(BigDecimal.ONE, minute, fields.place());
    }

    private @Nullable Time anyOf(Tree tree) {
        Fields fields = Fields.of(tree, Section.TIME_ANY_OF, problems);
        Tree offered = fields == null ? null : fields.get("any-of");
        if (fields == null || offered == null) {
            return null;
        }
        Quantity planned = duration("planned", fields.get("planned"));
        if (!(offered instanceof Tree.Items items)) {
            problems.add(offered.place(), "any-of is a list: found " + offered.label() + "; write such as [6 h, 9 h]");
            return null;
        }
        List<Quantity> durations = new ArrayList<>();
        for (Tree item : items.items()) {
            Quantity duration = duration("any-of", item);
            if (duration != null) {
                durations.add(duration);
            }
        }
        boolean broken = durations.size() < items.items().size() || (planned == null && fields.has("planned"));
        return broken ? null : problems.attempt(() -> new Time.AnyOf(fields.place(), durations, planned));
    }

    private @Nullable Quantity duration(String what, @Nullable Tree tree) {
        return values.quantity(what, tree, Kind.DURATION);
    }
}
