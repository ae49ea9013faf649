package org.soakwright.recipes.library;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;
import org.jspecify.annotations.Nullable;
import org.soakwright.recipes.text.Kind;
import org.soakwright.recipes.text.Nearest;
import org.soakwright.recipes.text.Problems;
import org.soakwright.recipes.text.Shown;
import org.soakwright.recipes.text.Tree;
import org.soakwright.recipes.text.Unsound;

/** Reads the entries of one file. Each part that cannot be read adds its problem and is left out. */
final class EntryReader {
    private static final List<String> KEYS = List.of(
            "species",
            "material",
            "composition",
            "direction",
            "relative-to",
            "property",
            "value",
            "temperature",
            "activation-energy",
            "method",
            "trust",
            "source",
            "at",
            "note");

    private final Problems problems;
    private final Map<String, Publication> publications = new LinkedHashMap<>();

    EntryReader(Problems problems) {
        this.problems = problems;
    }

    List<Entry> entries(Tree tree) {
        Card file = new Card("a file of the library", tree, List.of("sources", "entries"));
        for (Tree.Entry source : Card.entries("sources", file.need("sources"))) {
            Publication publication = problems.attempt(() -> publication(source));
            if (publication != null) {
                publications.put(source.key(), publication);
            }
        }
        return Card.entries("entries", file.need("entries")).stream()
                .flatMap(one -> Stream.ofNullable(problems.attempt(() -> entry(one))))
                .toList();
    }

    private static Publication publication(Tree.Entry source) {
        Card card = new Card("a source", source.value(), List.of("author", "year", "title", "in", "read"));
        Tree year = card.get("year");
        return new Publication(
                source.place(),
                card.optional("author"),
                year == null ? null : Shelf.whole("year", year),
                card.text("title"),
                card.optional("in"),
                card.word("read", Read.class));
    }

    private Entry entry(Tree.Entry one) {
        Card card = new Card("an entry", one.value(), KEYS);
        Subject subject = new Subject(
                card.text("species"),
                card.text("material"),
                card.optional("composition"),
                card.optional("direction"),
                card.optional("relative-to"));
        Property property = card.word("property", Property.class);
        Origin origin = new Origin(
                card.word("trust", Trust.class),
                card.optional("method"),
                publication(card),
                card.text("at"),
                card.optional("note"));
        return new Entry(
                one.place(),
                one.key(),
                subject,
                property,
                figure(card.need("value"), property.kind().orElse(null)),
                card.span("temperature", Kind.TEMPERATURE),
                card.span("activation-energy", Kind.MOLAR_ENERGY),
                origin);
    }

    private Publication publication(Card card) {
        String name = card.text("source");
        Publication publication = publications.get(name);
        if (publication == null) {
            throw new Unsound(
                    card.need("source").place(),
                    "unknown source: found " + Shown.quoted(name) + "; " + Nearest.hint(name, publications.keySet()));
        }
        return publication;
    }

    private static Figure figure(Tree tree, @Nullable Kind kind) {
        if (tree instanceof Tree.Leaf) {
            return new Figure.One(Card.quantity("value", tree, kind), null);
        }
        if (tree instanceof Tree.Items items) {
            return new Figure.ByTemperature(
                    tree.place(),
                    items.items().stream().map(item -> point(item, kind)).toList());
        }
        Card card = new Card("a value", tree, List.of("value", "give-or-take", "from", "to", "across"));
        if (card.get("value") != null) {
            return new Figure.One(
                    Card.quantity("value", card.need("value"), kind),
                    Card.quantity("give-or-take", card.need("give-or-take"), kind));
        }
        Span span =
                new Span(Card.quantity("from", card.need("from"), kind), Card.quantity("to", card.need("to"), kind));
        return new Figure.Range(span, card.word("across", Across.class));
    }

    private static Figure.Point point(Tree tree, @Nullable Kind kind) {
        if (tree instanceof Tree.Items pair && pair.items().size() == 2) {
            return new Figure.Point(
                    Card.quantity("temperature", pair.items().get(0), Kind.TEMPERATURE),
                    Card.quantity("value", pair.items().get(1), kind));
        }
        throw new Unsound(
                tree.place(),
                "a value by temperature is a pair: found " + tree.label() + "; write such as [4 Cel, 2.1e-10 m2/s]");
    }
}
