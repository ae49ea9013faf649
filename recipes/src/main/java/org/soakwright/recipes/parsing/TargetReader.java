package org.soakwright.recipes.parsing;

import java.util.ArrayList;
import java.util.List;
import java.util.function.Function;
import org.jspecify.annotations.Nullable;
import org.soakwright.recipes.model.Basis;
import org.soakwright.recipes.model.Consistency;
import org.soakwright.recipes.model.Counted;
import org.soakwright.recipes.model.Declared;
import org.soakwright.recipes.model.Goal;
import org.soakwright.recipes.model.GradeScope;
import org.soakwright.recipes.model.Limits;
import org.soakwright.recipes.model.Per;
import org.soakwright.recipes.model.Phase;
import org.soakwright.recipes.model.Quantity;
import org.soakwright.recipes.model.Reading;
import org.soakwright.recipes.model.Reference;
import org.soakwright.recipes.model.Target;
import org.soakwright.recipes.text.Kind;
import org.soakwright.recipes.text.Problem;
import org.soakwright.recipes.text.Problems;
import org.soakwright.recipes.text.Tree;

/** Reads the targets, each against what the recipe declares. */
final class TargetReader {
    private static final String EXAMPLE = "- {species: salt, reading: mean, at-most: 25 g/kg}";

    private final Values values;
    private final Problems problems;
    private final Consistency consistency;

    TargetReader(Values values, Declared declared) {
        this.values = values;
        this.problems = values.problems();
        this.consistency = new Consistency(declared);
    }

    List<Target> targets(@Nullable Tree tree) {
        if (tree != null && !(tree instanceof Tree.Items) && !(tree instanceof Tree.Broken)) {
            problems.add(tree.place(), "targets is a list: found " + tree.label() + "; write such as " + EXAMPLE);
        }
        List<Target> targets = new ArrayList<>();
        if (tree instanceof Tree.Items items) {
            for (Tree item : items.items()) {
                Target target = target(item);
                if (target != null) {
                    problems.addAll(consistency.of(target));
                    targets.add(target);
                }
            }
        }
        return targets;
    }

    private @Nullable Target target(Tree tree) {
        if (isOfMass(tree)) {
            return ofMass(Fields.of(tree, Section.MASS_TARGET, problems));
        }
        if (has(tree, "total")) {
            return total(Fields.of(tree, Section.TOTAL_TARGET, problems));
        }
        return has(tree, "liquor")
                ? ofLiquor(Fields.of(tree, Section.LIQUOR_TARGET, problems))
                : ofPieces(Fields.of(tree, Section.PIECE_TARGET, problems));
    }

    private static boolean has(Tree tree, String key) {
        return tree instanceof Tree.Entries entries
                && entries.entries().stream().anyMatch(entry -> entry.key().equals(key));
    }

    private @Nullable Target ofPieces(@Nullable Fields fields) {
        if (fields == null) {
            return null;
        }
        Reference species = reference("species", fields.need("species", "salt"), consistency::knownSpecies);
        Reading reading = values.word("reading", fields.need("reading", "mean"), Reading.class);
        Limits limits = limits(fields);
        GradeScope grade = grade(fields.get("grade"));
        Reference after = reference("after", fields.get("after"), consistency::knownStep);
        Quantity share = values.quantity("share", fields.get("share"), Kind.FRACTION);
        Counted counted = counted(fields);
        Quantity confidence = values.confidence(fields.get("confidence"));
        boolean broken = (after == null && fields.has("after"))
                || (share == null && fields.has("share"))
                || (confidence == null && fields.has("confidence"));
        return species == null || reading == null || limits == null || grade == null || counted == null || broken
                ? null
                : problems.attempt(() -> new Target.OfPieces(
                        fields.place(), species, reading, limits, grade, after, share, counted, confidence));
    }

    private @Nullable Target ofLiquor(@Nullable Fields fields) {
        if (fields == null) {
            return null;
        }
        Reference step = reference("liquor", fields.get("liquor"), consistency::knownStep);
        Reference species = reference("species", fields.need("species", "salt"), consistency::knownSpecies);
        boolean read = only("reading", fields.need("reading", "end"), "end");
        Limits limits = limits(fields);
        Quantity confidence = values.confidence(fields.get("confidence"));
        boolean broken = !read || (confidence == null && fields.has("confidence"));
        return step == null || species == null || limits == null || broken
                ? null
                : problems.attempt(() -> new Target.OfLiquor(fields.place(), step, species, limits, confidence));
    }

    /** Against what the limits count. */
    private @Nullable Counted counted(Fields fields) {
        if (fields.has("per") && fields.has("phase")) {
            problems.add(
                    fields.place("phase"),
                    "a limit counts against the piece or its water: found per and phase; keep one");
            return null;
        }
        if (fields.has("phase")) {
            Phase phase = values.word("phase", fields.get("phase"), Phase.class);
            return phase == null ? null : new Counted.InPhase(phase);
        }
        Per per = fields.has("per") ? values.word("per", fields.get("per"), Per.class) : Per.LOADED;
        return per == null ? null : new Counted.OfPiece(per);
    }

    private static boolean isOfMass(Tree tree) {
        Tree total = tree instanceof Tree.Entries entries ? value(entries, "total") : null;
        Tree bare = total instanceof Tree.Entries wrapped ? value(wrapped, "value") : total;
        return bare instanceof Tree.Leaf leaf && leaf.text().equals("mass");
    }

    private static @Nullable Tree value(Tree.Entries entries, String key) {
        return entries.entries().stream()
                .filter(entry -> entry.key().equals(key))
                .map(Tree.Entry::value)
                .findFirst()
                .orElse(null);
    }

    private @Nullable Target ofMass(@Nullable Fields fields) {
        if (fields == null) {
            return null;
        }
        boolean ofStart = fields.has("of");
        boolean startRead = !ofStart || only("of", fields.get("of"), "start");
        Kind kind = ofStart ? Kind.FRACTION : Kind.MASS;
        Quantity atMost = values.quantity("at-most", fields.get("at-most"), kind);
        Quantity atLeast = values.quantity("at-least", fields.get("at-least"), kind);
        Reference after = reference("after", fields.get("after"), consistency::knownStep);
        Quantity confidence = values.confidence(fields.get("confidence"));
        boolean broken = !startRead
                || (atMost == null && fields.has("at-most"))
                || (atLeast == null && fields.has("at-least"))
                || (after == null && fields.has("after"))
                || (confidence == null && fields.has("confidence"));
        return broken
                ? null
                : problems.attempt(
                        () -> new Target.OfMass(fields.place(), ofStart, atMost, atLeast, after, confidence));
    }

    private @Nullable Target total(@Nullable Fields fields) {
        if (fields == null) {
            return null;
        }
        Goal total = values.word("total", fields.get("total"), Goal.class);
        Tree tree = fields.need("at-most", total == Goal.COST ? "120 EUR" : total == Goal.LIQUOR ? "3 m3" : "36 h");
        if (total == null) {
            return null;
        }
        Quantity limit = switch (total) {
            case TIME -> values.quantity("at-most", tree, Kind.DURATION);
            case LIQUOR -> values.quantity("at-most", tree, Kind.VOLUME);
            case COST -> values.money("at-most", tree, null, "120 EUR");
        };
        return limit == null ? null : problems.attempt(() -> new Target.OfTotal(fields.place(), total, limit));
    }

    private @Nullable Limits limits(Fields fields) {
        boolean ofStart = fields.has("of");
        boolean startRead = !ofStart || only("of", fields.get("of"), "start");
        Quantity atMost = limit("at-most", fields.get("at-most"), ofStart);
        Quantity atLeast = limit("at-least", fields.get("at-least"), ofStart);
        boolean broken = (atMost == null && fields.has("at-most")) || (atLeast == null && fields.has("at-least"));
        if (broken || !startRead) {
            return null;
        }
        Quantity either = atMost == null ? atLeast : atMost;
        Basis basis = ofStart || either == null ? Basis.OF_START : Basis.of(either.unit());
        return problems.attempt(() -> new Limits(fields.place(), basis, atMost, atLeast));
    }

    private @Nullable Quantity limit(String key, @Nullable Tree tree, boolean ofStart) {
        return ofStart ? values.quantity(key, tree, Kind.FRACTION) : values.contentQuantity(key, tree);
    }

    private @Nullable GradeScope grade(@Nullable Tree tree) {
        if (tree == null) {
            return new GradeScope.Each();
        }
        Reference reference = reference("grade", tree, grade -> List.of());
        if (reference == null) {
            return null;
        }
        return switch (reference.name()) {
            case "each" -> new GradeScope.Each();
            case "lot" -> new GradeScope.WholeLot();
            default -> {
                problems.addAll(consistency.knownGrade(reference));
                yield new GradeScope.Named(reference);
            }
        };
    }

    private @Nullable Reference reference(String what, @Nullable Tree tree, Function<Reference, List<Problem>> check) {
        String name = values.name(what, tree, what.equals("species") ? "salt" : "first water");
        if (name == null || tree == null) {
            return null;
        }
        Reference reference = new Reference(name, tree.place());
        problems.addAll(check.apply(reference));
        return reference;
    }

    private boolean only(String what, @Nullable Tree tree, String word) {
        Tree.Leaf leaf = values.leaf(what, tree, word);
        if (leaf != null && !leaf.text().equals(word)) {
            problems.add(leaf.place(), what + " can only be " + word + ": found " + leaf.label());
            return false;
        }
        return leaf != null;
    }
}
