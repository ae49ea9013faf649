package org.soakwright.recipes.library;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.Stream;
import org.soakwright.recipes.text.Nearest;
import org.soakwright.recipes.text.Problems;
import org.soakwright.recipes.text.Shown;
import org.soakwright.recipes.text.Tree;
import org.soakwright.recipes.text.Unsound;

/** Reads the cautions of one file. Each part that cannot be read adds its problem and is left out. */
final class CautionReader {
    private final Problems problems;
    private final Map<String, Authority> authorities = new LinkedHashMap<>();
    private final Map<String, WordList> lists = new LinkedHashMap<>();
    private final ConditionReader conditions = new ConditionReader(lists);

    CautionReader(Problems problems) {
        this.problems = problems;
    }

    List<Caution> cautions(Tree tree) {
        Card file = new Card("a file of cautions", tree, List.of("words", "sources", "cautions"));
        Card words = new Card("words", file.need("words"));
        for (Tree.Entry list : Card.entries("words", file.need("words"))) {
            lists.put(list.key(), new WordList(list.key(), words.texts(list.key())));
        }
        for (Tree.Entry source : Card.entries("sources", file.need("sources"))) {
            Optional.ofNullable(problems.attempt(() -> authority(source)))
                    .ifPresent(authority -> authorities.put(source.key(), authority));
        }
        return Card.entries("cautions", file.need("cautions")).stream()
                .flatMap(one -> Stream.ofNullable(problems.attempt(() -> caution(one))))
                .toList();
    }

    private static Authority authority(Tree.Entry source) {
        Card card = new Card("a source", source.value(), List.of("document", "section", "dated", "seen", "read"));
        return new Authority(
                source.place(),
                card.text("document"),
                card.optional("section"),
                card.text("dated"),
                card.optional("seen"),
                card.word("read", Read.class));
    }

    private Caution caution(Tree.Entry one) {
        Card card = new Card("a caution", one.value(), List.of("when", "text", "stop", "because", "source"));
        return new Caution(
                one.place(),
                one.key(),
                conditions.condition(card.need("when")),
                card.text("text"),
                weight(card),
                source(card));
    }

    private static Weight weight(Card card) {
        Tree stop = card.get("stop");
        if (stop == null) {
            return new Weight.Shown();
        }
        if (!Card.text("stop", stop).equals("true")) {
            throw new Unsound(stop.place(), "stop is true or not there: found " + stop.label() + "; remove it");
        }
        return new Weight.Stops(card.text("because"));
    }

    private Authority source(Card card) {
        String name = card.text("source");
        Authority authority = authorities.get(name);
        if (authority == null) {
            throw new Unsound(
                    card.need("source").place(),
                    "unknown source: found " + Shown.quoted(name) + "; " + Nearest.hint(name, authorities.keySet()));
        }
        return authority;
    }
}
