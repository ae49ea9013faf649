package org.soakwright.recipes.parsing;

import java.util.ArrayList;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import org.jspecify.annotations.Nullable;
import org.soakwright.recipes.model.Dimension;
import org.soakwright.recipes.model.Faces;
import org.soakwright.recipes.model.Quantity;
import org.soakwright.recipes.model.Shape;
import org.soakwright.recipes.model.Side;
import org.soakwright.recipes.model.Word;
import org.soakwright.recipes.text.Kind;
import org.soakwright.recipes.text.Problems;
import org.soakwright.recipes.text.Tree;

/** Reads the sizes and the faces of a grade whose shape is known. */
final class SidesReader {
    private final Values values;
    private final Problems problems;
    private final Fields fields;
    private final Shape shape;

    SidesReader(Values values, Fields fields, Shape shape) {
        this.values = values;
        this.problems = values.problems();
        this.fields = fields;
        this.shape = shape;
    }

    /** One side for each dimension of the shape. */
    @Nullable
    List<Side> sides() {
        List<Quantity> sizes = sizes();
        Map<Dimension, Faces> faces = faces();
        return sizes == null || faces == null ? null : sides(sizes, faces);
    }

    private @Nullable List<Side> sides(List<Quantity> sizes, Map<Dimension, Faces> faces) {
        List<Side> sides = new ArrayList<>();
        for (int i = 0; i < sizes.size(); i++) {
            Dimension dimension = shape.dimensions().get(i);
            Quantity size = sizes.get(i);
            Side side = problems.attempt(() -> new Side(dimension, size, faces.getOrDefault(dimension, Faces.BOTH)));
            if (side != null) {
                sides.add(side);
            }
        }
        return sides.size() == sizes.size() ? sides : null;
    }

    private @Nullable List<Quantity> sizes() {
        boolean noneWrong = true;
        for (Dimension dimension : Dimension.values()) {
            if (fields.has(dimension.word()) && !shape.dimensions().contains(dimension)) {
                problems.add(
                        fields.place(dimension.word()),
                        "a " + shape.word() + " has no " + dimension.word() + ": found one; " + right());
                noneWrong = false;
            }
        }
        List<Quantity> sizes = new ArrayList<>();
        for (Dimension dimension : shape.dimensions()) {
            String key = dimension.word();
            Tree tree = noneWrong ? fields.need(key, "12 mm") : fields.get(key);
            Quantity size = values.quantity(key, tree, Kind.LENGTH);
            if (size != null) {
                sizes.add(size);
            }
        }
        return noneWrong && sizes.size() == shape.dimensions().size() ? sizes : null;
    }

    private String right() {
        List<Dimension> missing = shape.dimensions().stream()
                .filter(dimension -> !fields.has(dimension.word()))
                .toList();
        return missing.isEmpty()
                ? "keep only " + Word.list(shape.dimensions())
                : "write such as " + missing.get(0).word() + ": 12 mm";
    }

    private @Nullable Map<Dimension, Faces> faces() {
        Tree tree = fields.get("faces");
        Map<Dimension, Faces> faces = new EnumMap<>(Dimension.class);
        if (tree == null) {
            return faces;
        }
        List<Dimension> withFaces = shape.withFaces();
        if (withFaces.isEmpty()) {
            problems.add(fields.place("faces"), "a " + shape.word() + " has no face to seal: found faces; remove it");
            return null;
        }
        if (tree instanceof Tree.Entries entries && entries.entries().stream().noneMatch(SidesReader::wraps)) {
            return facesBySide(tree, faces);
        }
        Faces all = values.word("faces", tree, Faces.class);
        if (all == Faces.ONE && withFaces.size() > 1) {
            problems.add(
                    tree.place(),
                    "a " + shape.word() + " has faces on " + Word.list(withFaces)
                            + ": found one without its side; name it, such as {"
                            + withFaces.get(0).word() + ": one}");
            return null;
        }
        if (all == null) {
            return null;
        }
        withFaces.forEach(dimension -> faces.put(dimension, all));
        return faces;
    }

    private static boolean wraps(Tree.Entry entry) {
        return entry.key().equals("value");
    }

    private @Nullable Map<Dimension, Faces> facesBySide(Tree tree, Map<Dimension, Faces> faces) {
        Fields bySide = Fields.of(tree, Section.FACES, problems);
        if (bySide == null) {
            return null;
        }
        boolean allRead = true;
        if (bySide.all().isEmpty()) {
            problems.add(tree.place(), "faces names no side: found none; write such as " + example());
            allRead = false;
        }
        for (Dimension dimension : Dimension.values()) {
            Tree stated = bySide.known(dimension.word());
            Faces one = values.word("faces", stated, Faces.class);
            if (stated != null && !shape.dimensions().contains(dimension)) {
                problems.add(
                        bySide.place(dimension.word()),
                        "a " + shape.word() + " has no " + dimension.word() + ": found its faces; write such as "
                                + example());
                allRead = false;
            } else if (one != null) {
                faces.put(dimension, one);
            }
            allRead &= one != null || stated == null;
        }
        return allRead ? faces : null;
    }

    private String example() {
        return "{" + shape.withFaces().get(0).word() + ": one}";
    }
}
