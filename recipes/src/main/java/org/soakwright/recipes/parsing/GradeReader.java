package org.soakwright.recipes.parsing;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import org.jspecify.annotations.Nullable;
import org.soakwright.recipes.model.Grade;
import org.soakwright.recipes.model.Quantity;
import org.soakwright.recipes.model.Reference;
import org.soakwright.recipes.model.Shape;
import org.soakwright.recipes.model.Side;
import org.soakwright.recipes.model.Spread;
import org.soakwright.recipes.text.Kind;
import org.soakwright.recipes.text.Problems;
import org.soakwright.recipes.text.Tree;

/** Reads one grade of pieces. */
final class GradeReader {
    private static final Set<String> WORDS_OF_TARGETS = Set.of("each", "lot");

    private final Values values;
    private final Problems problems;
    private final boolean only;
    private final @Nullable Spread spreadOfLot;
    private final List<Reference> names = new ArrayList<>();
    private final Map<String, Shape> shapes = new LinkedHashMap<>();

    GradeReader(Values values, boolean only, @Nullable Spread spreadOfLot) {
        this.values = values;
        this.problems = values.problems();
        this.only = only;
        this.spreadOfLot = spreadOfLot;
    }

    /** Its name, once it is read, though the rest may be broken. */
    List<Reference> names() {
        return names;
    }

    /** Its shape by its name, once it is read, as far as both could be. */
    Map<String, Shape> shapes() {
        return shapes;
    }

    @Nullable
    Grade grade(Tree tree) {
        Fields fields = Fields.of(tree, Section.GRADE, problems);
        if (fields == null) {
            return null;
        }
        Shape shape = values.word("shape", fields.need("shape", "slab"), Shape.class);
        String name = name(fields, shape);
        List<Side> sides = shape == null ? null : new SidesReader(values, fields, shape).sides();
        Spread own = values.spread("spread", fields.get("spread"));
        Quantity share = share(fields);
        boolean shareKnown = share != null || (only && !fields.has("share"));
        boolean spreadKnown = own != null || !fields.has("spread");
        if (shape == null || name == null || sides == null || !shareKnown || !spreadKnown) {
            return null;
        }
        double fraction = share == null ? 1 : share.si();
        Spread spread = own == null ? spreadOfLot : own;
        return problems.attempt(() -> new Grade(fields.place(), name, shape, sides, fraction, null, spread, null));
    }

    private @Nullable String name(Fields fields, @Nullable Shape shape) {
        Tree tree = fields.get("name");
        if (tree == null && only) {
            return named(shape == null ? "piece" : shape.word(), fields, shape);
        }
        String name = values.name("name", tree == null ? fields.need("name", "thin") : tree, "thin");
        if (name == null || tree == null) {
            return null;
        }
        if (WORDS_OF_TARGETS.contains(name)) {
            problems.add(
                    tree.place(),
                    "a grade cannot be named " + name + ", which targets use for something else; choose another name");
        }
        return named(name, fields, shape);
    }

    private String named(String name, Fields fields, @Nullable Shape shape) {
        names.add(new Reference(name, fields.place()));
        if (shape != null) {
            shapes.put(name, shape);
        }
        return name;
    }

    private @Nullable Quantity share(Fields fields) {
        Tree tree = only ? fields.get("share") : fields.need("share", "40 %");
        return values.quantity("share", tree, Kind.FRACTION);
    }
}
