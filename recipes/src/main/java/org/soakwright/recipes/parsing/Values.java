package org.soakwright.recipes.parsing;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Set;
import java.util.function.Function;
import java.util.function.UnaryOperator;
import java.util.stream.Collectors;
import org.jspecify.annotations.Nullable;
import org.soakwright.recipes.model.Quantity;
import org.soakwright.recipes.model.Spread;
import org.soakwright.recipes.model.Word;
import org.soakwright.recipes.text.Kind;
import org.soakwright.recipes.text.Measurement;
import org.soakwright.recipes.text.Place;
import org.soakwright.recipes.text.Problems;
import org.soakwright.recipes.text.Shown;
import org.soakwright.recipes.text.Tree;
import org.soakwright.recipes.text.Unit;

/** Reads single values; each reader returns null where it has added a problem, or where there is nothing to read. */
final class Values {
    private static final int LONGEST_NAME = 200;
    private static final Set<String> FREE = Set.of("from", "to", "any-of", "grain", "planned");
    private static final List<Kind> CONTENTS = List.of(Kind.PER_MASS, Kind.PER_VOLUME);

    private final Problems problems;

    Values(Problems problems) {
        this.problems = problems;
    }

    /** The text of a value, written bare or as {@code {value: …}}. */
    Tree.@Nullable Leaf leaf(String what, @Nullable Tree tree, String example) {
        if (tree instanceof Tree.Leaf leaf) {
            return leaf;
        }
        if (tree instanceof Tree.Entries entries) {
            if (isFree(entries)) {
                problems.add(
                        tree.place(),
                        what + ": free values other than time are not computed yet by this version; write a fixed one"
                                + " such as " + example);
                return null;
            }
            Fields fields = Fields.of(exact(what, entries), Section.VALUE, problems);
            Tree value = fields == null ? null : fields.need("value", example);
            if (value instanceof Tree.Leaf leaf) {
                return leaf;
            }
            tree = value;
        }
        if (tree != null && !(tree instanceof Tree.Broken)) {
            problems.add(tree.place(), what + " is one value: found " + tree.label() + "; write such as " + example);
        }
        return null;
    }

    /** Without a give-or-take, which does not belong to every value. */
    private Tree exact(String what, Tree.Entries entries) {
        List<Tree.Entry> others = new ArrayList<>();
        for (Tree.Entry entry : entries.entries()) {
            if (entry.key().equals(Known.GIVE_OR_TAKE)) {
                problems.add(
                        entry.place(),
                        "give-or-take is for what is measured, such as a diffusivity or a ratio: found it at " + what
                                + "; remove it");
            } else {
                others.add(entry);
            }
        }
        return new Tree.Entries(entries.place(), others);
    }

    static boolean has(Tree.Entries entries, String key) {
        return entries.entries().stream().anyMatch(entry -> entry.key().equals(key));
    }

    /** Whether the keys leave the value to the planner. */
    static boolean isFree(Tree.Entries entries) {
        return entries.entries().stream().anyMatch(entry -> FREE.contains(entry.key()));
    }

    @Nullable
    Quantity quantity(String what, @Nullable Tree tree, Kind kind) {
        return quantity(what, tree, List.of(kind));
    }

    /** The quantity, if there is one and it passes the check. */
    @Nullable
    Quantity checked(@Nullable Quantity quantity, UnaryOperator<Quantity> check) {
        return quantity == null ? null : problems.attempt(() -> check.apply(quantity));
    }

    /** How surely something is to be. */
    @Nullable
    Quantity confidence(@Nullable Tree tree) {
        return checked(quantity("confidence", tree, Kind.FRACTION), Quantity::sure);
    }

    /** How much something differs from piece to piece, under the name of its key. */
    @Nullable
    Spread spread(String key, @Nullable Tree tree) {
        Quantity cv = quantity(key, tree, Kind.FRACTION);
        return cv == null ? null : problems.attempt(() -> Spread.of("`" + key + "`", cv));
    }

    @Nullable
    Quantity contentQuantity(String what, @Nullable Tree tree) {
        return quantity(what, tree, CONTENTS);
    }

    @Nullable
    Quantity quantity(String what, @Nullable Tree tree, List<Kind> kinds) {
        Tree.Leaf leaf = leaf(what, tree, kinds.get(0).example());
        if (leaf == null) {
            return null;
        }
        String remedy = Measurement.remedy(kinds);
        Measurement measured = measurement(what, leaf, remedy);
        if (measured == null) {
            return null;
        }
        Unit unit = kinds.stream()
                .flatMap(kind -> kind.unit(measured.unit()).stream())
                .findFirst()
                .orElse(null);
        if (unit == null) {
            problems.add(
                    leaf.place(),
                    what + ": " + Measurement.wrongUnit(leaf.text(), measured.unit(), kinds) + "; " + remedy);
            return null;
        }
        return made(what, leaf, measured, unit, remedy);
    }

    private @Nullable Quantity made(String what, Tree.Leaf leaf, Measurement measured, Unit unit, String remedy) {
        if (Quantity.isTooLarge(measured.number(), unit)) {
            problems.add(
                    leaf.place(),
                    what + ": found " + Shown.quoted(leaf.text()) + ", " + Quantity.TOO_LARGE + "; " + remedy);
            return null;
        }
        return new Quantity(measured.number(), unit, leaf.place(), measured.written());
    }

    private @Nullable Measurement measurement(String what, Tree.Leaf leaf, String remedy) {
        Measurement measured = Measurement.of(leaf.text()).orElse(null);
        if (measured == null) {
            problems.add(leaf.place(), what + ": " + Measurement.whyNot(leaf.text()) + "; " + remedy);
        }
        return measured;
    }

    /** Money, or money per a unit of the kind: {@code 120 EUR}, {@code 40 EUR/h}. */
    @Nullable
    Quantity money(String what, @Nullable Tree tree, @Nullable Kind per, String example) {
        String remedy = "write " + (per == null ? "money" : "a price") + " such as " + example;
        Tree.Leaf leaf = leaf(what, tree, example);
        Measurement measured = leaf == null ? null : measurement(what, leaf, remedy);
        if (leaf == null || measured == null) {
            return null;
        }
        Unit unit = moneyUnit(measured.unit(), per);
        if (unit == null) {
            problems.add(
                    leaf.place(),
                    what + ": found " + Shown.quoted(leaf.text()) + ", where a three-letter currency"
                            + (per == null ? "" : " per " + per.label().replaceFirst("^an? ", ""))
                            + " is needed; " + remedy);
            return null;
        }
        return made(what, leaf, measured, unit, remedy);
    }

    private static @Nullable Unit moneyUnit(String symbol, @Nullable Kind per) {
        int slash = symbol.indexOf('/');
        String currency = slash < 0 ? symbol : symbol.substring(0, slash);
        if (!Unit.isCurrency(currency) || (slash < 0) != (per == null)) {
            return null;
        }
        if (per == null) {
            return Unit.currency(currency);
        }
        return per.unit(symbol.substring(slash + 1))
                .map(unit -> Unit.currency(currency).per(unit))
                .orElse(null);
    }

    /** A number without a unit. */
    @Nullable
    BigDecimal number(String what, @Nullable Tree tree, String example) {
        Quantity number = plain(what, tree, example);
        return number == null ? null : number.value();
    }

    @Nullable
    Quantity plain(String what, @Nullable Tree tree, String example) {
        Tree.Leaf leaf = leaf(what, tree, example);
        String remedy = "write a plain number such as " + example;
        Measurement measured = leaf == null ? null : measurement(what, leaf, remedy);
        if (leaf == null || measured == null) {
            return null;
        }
        if (!measured.unit().isEmpty()) {
            problems.add(leaf.place(), what + " has no unit: found " + Shown.quoted(leaf.text()) + "; " + remedy);
            return null;
        }
        if (measured.number().signum() != 0 && measured.number().doubleValue() == 0) {
            problems.add(
                    leaf.place(),
                    what + ": found " + Shown.quoted(leaf.text()) + ", too small to be told from zero; " + remedy);
            return null;
        }
        return made(what, leaf, measured, Unit.ONE, remedy);
    }

    /** A whole number. */
    @Nullable
    Long count(String what, @Nullable Tree tree, String example) {
        Quantity number = plain(what, tree, example);
        if (number == null) {
            return null;
        }
        try {
            return number.value().longValueExact();
        } catch (ArithmeticException e) {
            problems.add(
                    number.place(),
                    what + " is a whole number: found \"" + number.written() + "\"; write such as " + example);
            return null;
        }
    }

    /** Whether something is so: {@code true} or {@code false}. */
    @Nullable
    Boolean truth(String what, @Nullable Tree tree) {
        Tree.Leaf leaf = leaf(what, tree, "true");
        if (leaf == null) {
            return null;
        }
        if (!leaf.text().equals("true") && !leaf.text().equals("false")) {
            problems.add(leaf.place(), what + ": found " + leaf.label() + "; write true or false");
            return null;
        }
        return leaf.text().equals("true");
    }

    /** A whole number that an int holds; anything larger is as wrong as the largest. */
    @Nullable
    Integer whole(String what, @Nullable Tree tree, String example) {
        Long count = count(what, tree, example);
        return count == null ? null : Integer.valueOf((int) Math.max(-1, Math.min(count, Integer.MAX_VALUE)));
    }

    /** Every item of a list; none where nothing is written; null where the list or an item is broken. */
    <T> @Nullable List<T> each(String what, @Nullable Tree tree, String example, Function<Tree, @Nullable T> read) {
        if (tree == null) {
            return List.of();
        }
        if (!(tree instanceof Tree.Items items)) {
            if (!(tree instanceof Tree.Broken)) {
                problems.add(tree.place(), what + " is a list: found " + tree.label() + "; write such as " + example);
            }
            return null;
        }
        List<T> all = new ArrayList<>();
        for (Tree item : items.items()) {
            T one = read.apply(item);
            if (one != null) {
                all.add(one);
            }
        }
        return all.size() < items.items().size() ? null : all;
    }

    /** A name or a title: text on one line, never wrapped in {@code {value: …}}. */
    @Nullable
    String name(String what, @Nullable Tree tree, String example) {
        if (tree instanceof Tree.Leaf leaf) {
            return isName(what, leaf.text(), leaf.place()) ? leaf.text() : null;
        }
        if (tree != null && !(tree instanceof Tree.Broken)) {
            problems.add(tree.place(), what + " is text: found " + tree.label() + "; write such as " + example);
        }
        return null;
    }

    /** Whether the text may be a name, with a problem added where it may not. */
    boolean isName(String what, String text, Place place) {
        if (text.isBlank() || text.length() > LONGEST_NAME || !Shown.isOneLine(text)) {
            problems.add(
                    place,
                    what + " is text on one line, of 1 to " + LONGEST_NAME + " characters: found "
                            + (text.isEmpty() ? "nothing" : Shown.quoted(text)));
            return false;
        }
        return true;
    }

    /** One of the words of a choice. */
    <E extends Enum<E> & Word> @Nullable E word(String what, @Nullable Tree tree, Class<E> choices) {
        List<String> words = words(choices);
        Tree.Leaf leaf = leaf(what, tree, words.get(0));
        if (leaf == null) {
            return null;
        }
        for (E choice : choices.getEnumConstants()) {
            if (choice.word().equals(leaf.text())) {
                return choice;
            }
        }
        problems.add(leaf.place(), what + ": found " + leaf.label() + "; write " + String.join(", ", words));
        return null;
    }

    /** One word, or a list of different ones. */
    <E extends Enum<E> & Word> List<E> someWords(String what, @Nullable Tree tree, Class<E> choices) {
        if (!(tree instanceof Tree.Items items)) {
            E only = word(what, tree, choices);
            return only == null ? List.of() : List.of(only);
        }
        if (items.items().isEmpty()) {
            problems.add(tree.place(), what + ": found an empty list; write " + String.join(", ", words(choices)));
        }
        List<E> found = new ArrayList<>();
        for (Tree item : items.items()) {
            E choice = word(what, item, choices);
            if (choice != null && found.contains(choice)) {
                problems.add(item.place(), what + " names " + choice.word() + " twice; keep one");
            } else if (choice != null) {
                found.add(choice);
            }
        }
        return found;
    }

    static <E extends Enum<E> & Word> List<String> words(Class<E> choices) {
        return Arrays.stream(choices.getEnumConstants()).map(Word::word).collect(Collectors.toList());
    }

    Problems problems() {
        return problems;
    }
}
