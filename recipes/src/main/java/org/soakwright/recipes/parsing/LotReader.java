package org.soakwright.recipes.parsing;

import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;
import org.jspecify.annotations.Nullable;
import org.soakwright.recipes.model.Amount;
import org.soakwright.recipes.model.Faces;
import org.soakwright.recipes.model.Grade;
import org.soakwright.recipes.model.Lot;
import org.soakwright.recipes.model.Names;
import org.soakwright.recipes.model.OneAxisShape;
import org.soakwright.recipes.model.Quantity;
import org.soakwright.recipes.model.Reference;
import org.soakwright.recipes.text.Kind;
import org.soakwright.recipes.text.Problems;
import org.soakwright.recipes.text.Shown;
import org.soakwright.recipes.text.Tree;

/** Reads the lot and its grades. */
final class LotReader {
    private static final String PIECES = "[{name: thin, shape: slab, thickness: 18 mm, share: 100 %}]";
    private static final Set<String> WORDS_OF_TARGETS = Set.of("each", "lot");
    private static final Set<String> LATER_SHAPES = Set.of("short-cylinder", "brick");

    private final Values values;
    private final Problems problems;
    private final List<Reference> names = new ArrayList<>();
    private boolean hasDensity = true;

    LotReader(Values values) {
        this.values = values;
        this.problems = values.problems();
    }

    /** The names of every grade written, once the lot is read. */
    Set<String> gradeNames() {
        Set<String> all = new LinkedHashSet<>();
        names.forEach(name -> all.add(name.name()));
        return all;
    }

    /** Whether the lot states a density, once it is read; a lot that could not be opened has the benefit of the doubt. */
    boolean hasDensity() {
        return hasDensity;
    }

    @Nullable
    Lot lot(Tree tree) {
        Fields fields = Fields.of(tree, Section.LOT, problems);
        if (fields == null) {
            return null;
        }
        Amount amount = amount(fields);
        hasDensity = fields.has("density") || fields.has("mass"); // a mass without one is reported once, at the lot
        Quantity density = values.checked(
                values.quantity("density", fields.get("density"), Kind.DENSITY),
                found -> found.positive("the density"));
        Quantity temperature = values.temperature(fields.get("temperature"));
        List<Grade> grades = grades(fields.need("pieces", PIECES));
        problems.addAll(Names.duplicates("grades", names));
        boolean broken =
                (density == null && fields.has("density")) || (temperature == null && fields.has("temperature"));
        return amount == null || grades == null || broken
                ? null
                : problems.attempt(() -> new Lot(fields.place(), amount, density, temperature, grades));
    }

    private @Nullable Amount amount(Fields fields) {
        String key = fields.oneOf(List.of("mass", "volume", "count"), "mass: 600 kg");
        if (key == null) {
            return null;
        }
        Tree tree = fields.get(key);
        if (tree != null && key.equals("count")) {
            Long count = values.count("count", tree, "500");
            return count == null ? null : problems.attempt(() -> new Amount.ByCount(count, tree.place()));
        }
        boolean mass = key.equals("mass");
        Quantity quantity = values.quantity(key, tree, mass ? Kind.MASS : Kind.VOLUME);
        if (quantity == null) {
            return null;
        }
        return problems.attempt(() -> mass ? new Amount.ByMass(quantity) : new Amount.ByVolume(quantity));
    }

    private @Nullable List<Grade> grades(@Nullable Tree tree) {
        if (tree instanceof Tree.Items items) {
            boolean only = items.items().size() == 1;
            List<Grade> grades = new ArrayList<>();
            for (Tree item : items.items()) {
                Grade grade = grade(item, only);
                if (grade != null) {
                    grades.add(grade);
                }
            }
            return grades.size() == items.items().size() ? grades : null;
        }
        if (tree != null && !(tree instanceof Tree.Broken)) {
            problems.add(
                    tree.place(), "pieces is a list of grades: found " + tree.label() + "; write such as " + PIECES);
        }
        return null;
    }

    private @Nullable Grade grade(Tree tree, boolean only) {
        Fields fields = Fields.of(tree, Section.GRADE, problems);
        if (fields == null) {
            return null;
        }
        OneAxisShape shape = shape(fields.need("shape", "slab"));
        String name = gradeName(fields, only, shape);
        Quantity size = shape == null ? null : size(fields, shape);
        Faces faces = fields.has("faces") ? values.word("faces", fields.get("faces"), Faces.class) : Faces.BOTH;
        Quantity share = share(fields, only);
        boolean shareKnown = share != null || (only && !fields.has("share"));
        if (shape == null || name == null || size == null || faces == null || !shareKnown) {
            return null;
        }
        if (shape != OneAxisShape.SLAB && fields.has("faces")) {
            problems.add(
                    fields.place("faces"), "only a slab has faces: found faces on a " + shape.word() + "; remove it");
            return null;
        }
        double fraction = share == null ? 1 : share.si();
        return problems.attempt(() -> new Grade(fields.place(), name, shape, size, faces, fraction));
    }

    private @Nullable String gradeName(Fields fields, boolean only, @Nullable OneAxisShape shape) {
        Tree tree = fields.get("name");
        if (tree == null && only) {
            String name = shape == null ? "piece" : shape.word();
            names.add(new Reference(name, fields.place()));
            return name;
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
        names.add(new Reference(name, fields.place()));
        return name;
    }

    private @Nullable OneAxisShape shape(@Nullable Tree tree) {
        if (tree instanceof Tree.Leaf leaf && LATER_SHAPES.contains(leaf.text())) {
            problems.add(
                    leaf.place(),
                    "shape: not computed yet by this version: found " + Shown.quoted(leaf.text())
                            + "; write slab, cylinder, sphere");
            return null;
        }
        return values.word("shape", tree, OneAxisShape.class);
    }

    private @Nullable Quantity size(Fields fields, OneAxisShape shape) {
        String right = shape.measure();
        String wrong = right.equals("thickness") ? "diameter" : "thickness";
        if (fields.has(wrong)) {
            problems.add(
                    fields.place(wrong),
                    "a " + shape.word() + " has no " + wrong + ": found one; "
                            + (fields.has(right) ? "keep only " + right : "write such as " + right + ": 12 mm"));
            return null;
        }
        return values.quantity(right, fields.need(right, "12 mm"), Kind.LENGTH);
    }

    private @Nullable Quantity share(Fields fields, boolean only) {
        Tree tree = only ? fields.get("share") : fields.need("share", "40 %");
        return values.quantity("share", tree, Kind.FRACTION);
    }
}
