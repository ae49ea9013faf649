package org.soakwright.recipes.library;

import java.util.ArrayList;
import java.util.EnumSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import org.jspecify.annotations.Nullable;
import org.soakwright.recipes.library.Condition.Steps;
import org.soakwright.recipes.model.Product;
import org.soakwright.recipes.model.Quantity;
import org.soakwright.recipes.model.Reading;
import org.soakwright.recipes.text.Kind;
import org.soakwright.recipes.text.Nearest;
import org.soakwright.recipes.text.Shown;
import org.soakwright.recipes.text.Tree;
import org.soakwright.recipes.text.Unsound;

/** Reads when a caution is due: {@code always}, or keys that all have to hold. */
final class ConditionReader {
    private static final List<String> KEYS =
            List.of("any", "product", "species", "called", "step", "held", "liquor", "vessel", "piece", "water-phase");

    private final Map<String, WordList> lists;

    ConditionReader(Map<String, WordList> lists) {
        this.lists = lists;
    }

    Condition condition(Tree tree) {
        if (tree instanceof Tree.Leaf leaf && leaf.text().equals("always")) {
            return new Condition.All(List.of());
        }
        Card card = new Card("when", tree, KEYS);
        List<Condition> parts = new ArrayList<>();
        for (Tree.Entry entry : Card.entries("when", tree)) {
            parts.add(part(entry.key(), entry.value(), card));
        }
        if (parts.isEmpty()) {
            throw new Unsound(tree.place(), "when holds nothing; write always, or such as {product: food}");
        }
        return parts.size() == 1 ? parts.get(0) : new Condition.All(parts);
    }

    private Condition part(String key, Tree value, Card when) {
        return switch (key) {
            case "any" -> new Condition.Any(choices(value));
            case "product" -> new Condition.OfProduct(set(Product.class, when.words(key, Product.class)));
            case "species" -> new Condition.OfSpecies(list(key, value));
            case "called" -> new Condition.Called(list(key, value));
            case "step" -> step(value);
            case "held" -> held(value);
            case "vessel" -> new Condition.InVessel(window(card(key, value), Kind.VOLUME));
            default -> content(key, value);
        };
    }

    private List<Condition> choices(Tree value) {
        if (value instanceof Tree.Items items && items.items().size() > 1) {
            return items.items().stream().map(this::condition).toList();
        }
        throw new Unsound(value.place(), "any is a list of two or more: found " + value.label());
    }

    private Condition content(String key, Tree value) {
        Card card = card(key, value);
        WordList words = list("of", card.need("of"));
        if (key.equals("liquor")) {
            return new Condition.InLiquor(words, window(card, Kind.PER_VOLUME));
        }
        Reading reading = card.word("reading", Reading.class);
        Window window = window(card, Kind.PER_MASS);
        return key.equals("piece")
                ? new Condition.InPiece(words, reading, window)
                : new Condition.InWaterPhase(words, reading, window);
    }

    private static Card card(String key, Tree value) {
        List<String> known = switch (key) {
            case "step", "held" -> List.of("kind", "above", "below", "longer-than");
            case "vessel" -> List.of("above", "below");
            case "liquor" -> List.of("of", "above", "below");
            default -> List.of("of", "reading", "above", "below");
        };
        return new Card(key, value, known);
    }

    private static Condition step(Tree value) {
        Card card = card("step", value);
        return new Condition.OneStep(steps(card), card.quantity("longer-than", Kind.DURATION));
    }

    private static Condition held(Tree value) {
        Card card = card("held", value);
        return new Condition.Held(steps(card), Card.quantity("longer-than", card.need("longer-than"), Kind.DURATION));
    }

    private static Steps steps(Card card) {
        List<StepKind> kinds = card.get("kind") == null ? List.of() : card.words("kind", StepKind.class);
        return new Steps(set(StepKind.class, kinds), bounds(card, Kind.TEMPERATURE));
    }

    private static Window window(Card card, Kind kind) {
        Window window = bounds(card, kind);
        if (window.isOpen()) {
            throw new Unsound(
                    card.place(), "this needs above or below: found neither; write such as above: " + kind.example());
        }
        return window;
    }

    private static Window bounds(Card card, Kind kind) {
        @Nullable Quantity above = card.quantity("above", kind);
        @Nullable Quantity below = card.quantity("below", kind);
        return new Window(above, below);
    }

    private static <E extends Enum<E>> Set<E> set(Class<E> type, List<E> elements) {
        Set<E> set = EnumSet.noneOf(type);
        set.addAll(elements);
        return set;
    }

    private WordList list(String key, Tree value) {
        String name = Card.text(key, value);
        WordList list = lists.get(name);
        if (list == null) {
            throw new Unsound(
                    value.place(),
                    key + " names a list of words: found " + Shown.quoted(name) + "; "
                            + Nearest.hint(name, lists.keySet()));
        }
        return list;
    }
}
