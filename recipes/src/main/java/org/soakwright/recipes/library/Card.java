package org.soakwright.recipes.library;

import java.util.Arrays;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.jspecify.annotations.Nullable;
import org.soakwright.recipes.model.Quantity;
import org.soakwright.recipes.model.Word;
import org.soakwright.recipes.text.Kind;
import org.soakwright.recipes.text.Measurement;
import org.soakwright.recipes.text.Nearest;
import org.soakwright.recipes.text.Place;
import org.soakwright.recipes.text.Shown;
import org.soakwright.recipes.text.Tree;
import org.soakwright.recipes.text.Unit;
import org.soakwright.recipes.text.Unsound;

/** The keys and values of one part of a data file. What is wrong in it is thrown, the first thing first. */
final class Card {
    private final String what;
    private final Place place;
    private final Map<String, Tree> values = new LinkedHashMap<>();

    /** With any keys, for a part whose keys are names. */
    Card(String what, Tree tree) {
        this.what = what;
        this.place = tree.place();
        entries(what, tree).forEach(entry -> values.put(entry.key(), entry.value()));
    }

    Card(String what, Tree tree, List<String> known) {
        this(what, tree);
        for (Tree.Entry entry : entries(what, tree)) {
            if (!known.contains(entry.key())) {
                throw new Unsound(
                        entry.place(),
                        "unknown key in " + what + ": found " + Shown.quoted(entry.key()) + "; "
                                + Nearest.hint(entry.key(), known));
            }
        }
    }

    static List<Tree.Entry> entries(String what, Tree tree) {
        if (tree instanceof Tree.Entries found) {
            return found.entries();
        }
        throw new Unsound(tree.place(), what + " is written as keys and values: found " + tree.label());
    }

    Place place() {
        return place;
    }

    @Nullable
    Tree get(String key) {
        return values.get(key);
    }

    Tree need(String key) {
        Tree value = values.get(key);
        if (value == null) {
            throw new Unsound(place, what + " needs " + key + ": found none");
        }
        return value;
    }

    /** The text of a key that must be there. */
    String text(String key) {
        return text(key, need(key));
    }

    /** The text of a key, empty where it is not there. */
    String optional(String key) {
        Tree value = values.get(key);
        return value == null ? "" : text(key, value);
    }

    static String text(String key, Tree tree) {
        if (tree instanceof Tree.Leaf leaf && !leaf.text().isBlank()) {
            return leaf.text().strip();
        }
        throw new Unsound(tree.place(), key + " is text: found " + tree.label());
    }

    /** One text, or several in a list. */
    List<String> texts(String key) {
        Tree tree = need(key);
        return tree instanceof Tree.Items items
                ? items.items().stream().map(item -> text(key, item)).toList()
                : List.of(text(key, tree));
    }

    <E extends Enum<E> & Word> E word(String key, Class<E> choices) {
        return word(key, text(key), need(key).place(), choices);
    }

    <E extends Enum<E> & Word> List<E> words(String key, Class<E> choices) {
        return texts(key).stream()
                .map(text -> word(key, text, need(key).place(), choices))
                .toList();
    }

    private static <E extends Enum<E> & Word> E word(String key, String text, Place place, Class<E> choices) {
        List<String> known =
                Arrays.stream(choices.getEnumConstants()).map(Word::word).toList();
        int index = known.indexOf(text);
        if (index < 0) {
            throw new Unsound(
                    place, key + ": found " + Shown.quoted(text) + "; write one of " + String.join(", ", known));
        }
        return choices.getEnumConstants()[index];
    }

    /** A value of the kind; null where the key is not there. */
    @Nullable
    Quantity quantity(String key, Kind kind) {
        Tree tree = values.get(key);
        return tree == null ? null : quantity(key, tree, kind);
    }

    /** A value of the kind; a plain number where that is null. */
    static Quantity quantity(String key, Tree tree, @Nullable Kind kind) {
        String text = text(key, tree);
        Measurement measured = Measurement.of(text)
                .orElseThrow(() -> new Unsound(tree.place(), key + ": " + Measurement.whyNot(text)));
        Unit unit = kind == null
                ? measured.unit().isEmpty() ? Unit.ONE : null
                : kind.unit(measured.unit()).orElse(null);
        if (unit == null) {
            throw new Unsound(
                    tree.place(),
                    key + ": found " + Shown.quoted(text) + ", where "
                            + (kind == null
                                    ? "a plain number is needed"
                                    : kind.label() + " is needed; write such as " + kind.example()));
        }
        return new Quantity(measured.number(), unit, tree.place(), measured.written());
    }

    /** One value or {@code {from: …, to: …}}; null where the key is not there. */
    @Nullable
    Span span(String key, Kind kind) {
        Tree tree = values.get(key);
        return tree == null ? null : span(key, tree, kind);
    }

    static Span span(String key, Tree tree, @Nullable Kind kind) {
        if (tree instanceof Tree.Leaf) {
            return Span.of(quantity(key, tree, kind));
        }
        Card ends = new Card(key, tree, List.of("from", "to"));
        return new Span(quantity("from", ends.need("from"), kind), quantity("to", ends.need("to"), kind));
    }
}
