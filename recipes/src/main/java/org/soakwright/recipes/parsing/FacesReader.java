package org.soakwright.recipes.parsing;

import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import org.jspecify.annotations.Nullable;
import org.soakwright.recipes.model.Dimension;
import org.soakwright.recipes.model.Faces;
import org.soakwright.recipes.model.Shape;
import org.soakwright.recipes.model.Word;
import org.soakwright.recipes.text.Problems;
import org.soakwright.recipes.text.Tree;

/** Reads which faces of a grade are wetted, whose shape is known. */
final class FacesReader {
    private final Values values;
    private final Problems problems;
    private final Fields fields;
    private final Shape shape;

    FacesReader(Values values, Fields fields, Shape shape) {
        this.values = values;
        this.problems = values.problems();
        this.fields = fields;
        this.shape = shape;
    }

    /** Those stated; a side that is not named has both. */
    @Nullable
    Map<Dimension, Faces> faces() {
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
        if (tree instanceof Tree.Entries entries && entries.entries().stream().noneMatch(FacesReader::wraps)) {
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
