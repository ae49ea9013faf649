package org.soakwright.recipes.parsing;

import java.util.List;
import org.jspecify.annotations.Nullable;
import org.soakwright.recipes.model.Film;
import org.soakwright.recipes.model.Quantity;
import org.soakwright.recipes.text.Kind;
import org.soakwright.recipes.text.Problems;
import org.soakwright.recipes.text.Tree;

/** Reads the film between the pieces and what is around them. */
final class FilmReader {
    private static final String WAYS = "{coefficient: 2e-6 m/s} or {speed: 0.05 m/s}";

    private final Known known;
    private final Values values;
    private final Problems problems;

    FilmReader(Values values) {
        this.known = new Known(values);
        this.values = values;
        this.problems = values.problems();
    }

    @Nullable
    Film film(@Nullable Tree tree) {
        if (tree instanceof Tree.Entries) {
            Fields fields = Fields.of(tree, Section.FILM, problems);
            return fields == null ? null : film(fields);
        }
        if (tree instanceof Tree.Leaf leaf && leaf.text().equals("negligible")) {
            return new Film.Negligible();
        }
        if (tree != null && !(tree instanceof Tree.Broken)) {
            boolean still = tree instanceof Tree.Leaf leaf && leaf.text().equals("still");
            problems.add(
                    tree.place(),
                    "film: found " + tree.label() + "; write "
                            + (still ? "{still: true}" : "negligible, or such as " + WAYS));
        }
        return null;
    }

    private @Nullable Film film(Fields fields) {
        boolean flows = fields.has("still") || fields.has("speed");
        List<String> ways = List.of("coefficient", "stirred", "packed", fields.has("still") ? "still" : "speed");
        if (ways.stream().noneMatch(fields::has)) {
            problems.add(
                    fields.place(),
                    "a film needs what it comes from: found "
                            + (fields.has("length") ? "only its length" : "nothing") + "; write negligible, or such as "
                            + WAYS);
            return null;
        }
        String way = fields.oneOf(ways, WAYS);
        boolean alone = ways.stream().filter(fields::has).count() == 1;
        Quantity length = known.quantity("length", fields.get("length"), Kind.LENGTH);
        boolean broken = !alone || (length == null && fields.has("length"));
        if (fields.has("length") && alone && !flows && !fields.has("stirred")) {
            problems.add(
                    fields.place("length"),
                    "length goes with still, speed or stirred: found it beside " + way + "; remove it");
            broken = true;
        }
        Film film = flows
                ? flowing(fields, length)
                : fields.has("stirred")
                        ? stirred(fields, length)
                        : fields.has("packed") ? packed(fields) : coefficient(fields);
        return broken ? null : film;
    }

    private @Nullable Film coefficient(Fields fields) {
        Quantity value = known.quantity("coefficient", fields.get("coefficient"), Kind.SPEED);
        return value == null ? null : problems.attempt(() -> new Film.Coefficient(value));
    }

    private @Nullable Film flowing(Fields fields, @Nullable Quantity length) {
        boolean still = fields.has("still");
        Tree.Leaf leaf = values.leaf("still", fields.get("still"), "true");
        if (leaf != null && !leaf.text().equals("true")) {
            problems.add(
                    leaf.place(),
                    "still can only be true: found " + leaf.label() + "; remove it, or write speed, such as 0.05 m/s");
            return null;
        }
        Quantity speed = known.quantity("speed", fields.get("speed"), Kind.VELOCITY);
        if ((leaf == null && still) || (speed == null && fields.has("speed"))) {
            return null;
        }
        return problems.attempt(() -> speed == null
                ? new Film.Still(fields.place(), length)
                : new Film.Past(fields.place(), speed, still, length));
    }

    private @Nullable Film stirred(Fields fields, @Nullable Quantity length) {
        Tree tree = fields.get("stirred");
        Fields stirred = tree == null ? null : Fields.of(tree, Section.STIRRED, problems);
        Quantity power = stirred == null
                ? null
                : known.quantity("power", stirred.need("power", "40 W/m3"), Kind.POWER_PER_VOLUME);
        return power == null ? null : problems.attempt(() -> new Film.Stirred(fields.place(), power, length));
    }

    private @Nullable Film packed(Fields fields) {
        Tree tree = fields.get("packed");
        Fields packed = tree == null ? null : Fields.of(tree, Section.PACKED, problems);
        if (packed == null) {
            return null;
        }
        Quantity speed = known.quantity("speed", packed.need("speed", "2 mm/s"), Kind.VELOCITY);
        Quantity voids = known.quantity("void", packed.need("void", "40 %"), Kind.FRACTION);
        return speed == null || voids == null
                ? null
                : problems.attempt(() -> new Film.Packed(fields.place(), speed, voids));
    }
}
