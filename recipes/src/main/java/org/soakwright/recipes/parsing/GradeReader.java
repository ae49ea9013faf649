package org.soakwright.recipes.parsing;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import org.jspecify.annotations.Nullable;
import org.soakwright.recipes.model.Dimension;
import org.soakwright.recipes.model.Faces;
import org.soakwright.recipes.model.Grade;
import org.soakwright.recipes.model.Quantity;
import org.soakwright.recipes.model.Reference;
import org.soakwright.recipes.model.Shape;
import org.soakwright.recipes.model.Side;
import org.soakwright.recipes.model.Spread;
import org.soakwright.recipes.text.Kind;
import org.soakwright.recipes.text.Place;
import org.soakwright.recipes.text.Problems;
import org.soakwright.recipes.text.Tree;

/** Reads what stands under one grade: one grade of pieces, or several where a measured list is to make them. */
final class GradeReader {
    private static final Set<String> WORDS_OF_TARGETS = Set.of("each", "lot");

    private final Values values;
    private final Problems problems;
    private final Lists lists;
    private final LotReader.Common common;
    private final List<Reference> names = new ArrayList<>();
    private final Map<String, Shape> shapes = new LinkedHashMap<>();

    GradeReader(Values values, Lists lists, LotReader.Common common) {
        this.values = values;
        this.problems = values.problems();
        this.lists = lists;
        this.common = common;
    }

    /** Their names, once they are read, though the rest may be broken. */
    List<Reference> names() {
        return names;
    }

    /** Their shapes by name, once they are read, as far as both could be. */
    Map<String, Shape> shapes() {
        return shapes;
    }

    /** One or more; none, with a problem added, where they are not whole. */
    List<Grade> grades(Tree tree) {
        Fields fields = Fields.of(tree, Section.GRADE, problems);
        if (fields == null) {
            return List.of();
        }
        Shape shape = values.word("shape", fields.need("shape", "slab"), Shape.class);
        Measured measured = Measured.read(values, fields.get("measured"));
        List<String> named = names(fields, shape, measured == null ? 1 : measured.grades());
        Map<Dimension, Faces> faces = shape == null ? null : new FacesReader(values, fields, shape).faces();
        List<Sized> sized = shape == null ? null : sized(fields, shape, measured);
        Quantity share = share(fields);
        boolean shareKnown = share != null || (common.only() && !fields.has("share"));
        if (shape == null || faces == null || sized == null || !shareKnown || named.size() != sized.size()) {
            return List.of();
        }
        double fraction = (share == null ? 1 : share.si()) / sized.size();
        List<Grade> grades = new ArrayList<>();
        for (int i = 0; i < sized.size(); i++) {
            Grade grade = grade(fields.place(), named.get(i), shape, faces, sized.get(i), fraction);
            if (grade != null) {
                grades.add(grade);
            }
        }
        return grades.size() == sized.size() ? grades : List.of();
    }

    private @Nullable Grade grade(
            Place place, String name, Shape shape, Map<Dimension, Faces> faces, Sized sized, double share) {
        List<Side> sides = new ArrayList<>();
        for (int i = 0; i < sized.sizes().size(); i++) {
            Dimension dimension = shape.dimensions().get(i);
            sides.add(new Side(dimension, sized.sizes().get(i), faces.getOrDefault(dimension, Faces.BOTH)));
        }
        return problems.attempt(
                () -> new Grade(place, name, shape, sides, share, sized.weight(), sized.spread(), sized.fit()));
    }

    private @Nullable List<Sized> sized(Fields fields, Shape shape, @Nullable Measured measured) {
        SizeReader sizes = new SizeReader(values, fields, shape);
        boolean ownSizes = sizes.noneOfOtherShapes();
        Quantity weight = values.checked(
                new Known(values).quantity("weight", fields.get("weight"), Kind.MASS),
                found -> found.positive("the weight"));
        Spread own = values.spread("spread", fields.get("spread"));
        boolean broken = (weight == null && fields.has("weight")) || (own == null && fields.has("spread"));
        if (measured != null) {
            List<Sized> read = new MeasuredReader(values, lists, fields, shape).sized(measured, weight, common);
            return broken || !ownSizes ? null : read;
        }
        Spread spread = own == null ? common.spread() : own;
        List<Quantity> read =
                !ownSizes ? null : sizes.areWeighed() ? fromWeight(sizes, fields, weight, spread) : sizes.stated();
        return broken || read == null ? null : List.of(new Sized(read, weight, spread, null));
    }

    private @Nullable List<Quantity> fromWeight(
            SizeReader sizes, Fields fields, @Nullable Quantity weight, @Nullable Spread spread) {
        if (!common.statesDensity()) {
            problems.add(
                    fields.place("weight"),
                    "sizes from a weight need the density of the pieces: found none; add density to the lot, such as"
                            + " 1120 kg/m3, or write the sizes");
        }
        return sizes.fromWeight(weight, spread, common.density());
    }

    private List<String> names(Fields fields, @Nullable Shape shape, int count) {
        String name = name(fields, shape);
        if (name == null || count == 0) {
            return List.of();
        }
        List<String> all = new ArrayList<>();
        for (int i = 1; i <= count; i++) {
            all.add(count == 1 ? name : name + "-" + i);
        }
        all.forEach(one -> {
            names.add(new Reference(one, fields.place()));
            if (shape != null) {
                shapes.put(one, shape);
            }
        });
        return all;
    }

    private @Nullable String name(Fields fields, @Nullable Shape shape) {
        Tree tree = fields.get("name");
        if (tree == null && common.only()) {
            return shape == null ? "piece" : shape.word();
        }
        String name = values.name("name", tree == null ? fields.need("name", "thin") : tree, "thin");
        if (name != null && tree != null && WORDS_OF_TARGETS.contains(name)) {
            problems.add(
                    tree.place(),
                    "a grade cannot be named " + name + ", which targets use for something else; choose another name");
        }
        return name;
    }

    private @Nullable Quantity share(Fields fields) {
        Tree tree = common.only() ? fields.get("share") : fields.need("share", "40 %");
        return values.quantity("share", tree, Kind.FRACTION);
    }
}
