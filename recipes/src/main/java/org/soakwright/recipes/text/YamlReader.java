package org.soakwright.recipes.text;

import java.io.StringReader;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.jspecify.annotations.Nullable;
import org.yaml.snakeyaml.LoaderOptions;
import org.yaml.snakeyaml.error.Mark;
import org.yaml.snakeyaml.error.MarkedYAMLException;
import org.yaml.snakeyaml.error.YAMLException;
import org.yaml.snakeyaml.events.AliasEvent;
import org.yaml.snakeyaml.events.CollectionStartEvent;
import org.yaml.snakeyaml.events.Event;
import org.yaml.snakeyaml.events.NodeEvent;
import org.yaml.snakeyaml.events.ScalarEvent;
import org.yaml.snakeyaml.parser.Parser;
import org.yaml.snakeyaml.parser.ParserImpl;
import org.yaml.snakeyaml.reader.StreamReader;

/**
 * Reads one YAML document into a {@link Tree}. It works on the parser's events: nothing is ever constructed, resolved or
 * expanded, so tags, anchors, aliases and merge keys are only seen, reported and passed over.
 */
public final class YamlReader {
    /** Deeper than any recipe, shallow enough to recurse. */
    private static final int DEEPEST = 30;

    private static final int LONGEST_REASON = 160;

    private final String file;
    private final Problems problems;
    private final Parser events;
    private final Document document;
    private int values;

    private YamlReader(String file, String text, Document document, Problems problems) {
        LoaderOptions options = new LoaderOptions();
        options.setCodePointLimit(document.mostBytes);
        this.file = file;
        this.document = document;
        this.problems = problems;
        // The parser alone: constructing and resolving, which are never wanted, cost a good part of the start-up.
        this.events = new ParserImpl(new StreamReader(new StringReader(text)), options);
    }

    /** The recipe in the text; null, with the problem added, where there is none to read. */
    public static @Nullable Tree read(String file, String text, Problems problems) {
        return read(file, text, Document.RECIPE, problems);
    }

    /** The document in the text; null, with the problem added, where there is none to read. */
    public static @Nullable Tree read(String file, String text, Document document, Problems problems) {
        try {
            return new YamlReader(file, text, document, problems).document();
        } catch (Unsound unsound) {
            problems.addAll(unsound.problems());
        } catch (MarkedYAMLException e) {
            problems.add(place(file, e.getProblemMark()), notYaml(e));
        } catch (YAMLException | IllegalArgumentException | IndexOutOfBoundsException e) {
            // The scanner lets these two runtime exceptions escape for malformed tags and escapes.
            problems.add(Place.of(file), "this is not YAML; write plain keys and values such as title: Bench soak");
        }
        return null;
    }

    private static String notYaml(MarkedYAMLException e) {
        String begun = e.getContextMark() == null
                ? ""
                : " begun at line " + (e.getContextMark().getLine() + 1);
        String context = e.getContext() == null ? "" : " " + Shown.plain(e.getContext(), LONGEST_REASON) + begun + ":";
        String problem = e.getProblem() == null ? "it is malformed" : Shown.plain(e.getProblem(), LONGEST_REASON);
        return "this is not YAML:" + context + " " + problem
                + "; look for an unclosed quote or bracket, a missing space after a colon, or a tab";
    }

    private Tree document() {
        Event event = events.getEvent();
        while (event.is(Event.ID.StreamStart) || event.is(Event.ID.DocumentStart)) {
            event = events.getEvent();
        }
        if (event.is(Event.ID.StreamEnd)) {
            throw new Unsound(
                    Place.of(file),
                    "the file is empty; write a " + document.label + " that begins with " + document.first);
        }
        Tree root = node(event, 0);
        for (Event rest = events.getEvent(); !rest.is(Event.ID.StreamEnd); rest = events.getEvent()) {
            if (rest.is(Event.ID.DocumentStart)) {
                throw new Unsound(
                        place(rest),
                        "a second document begins here; one file holds one " + document.label + ", split it");
            }
        }
        return root;
    }

    private Tree node(Event event, int depth) {
        Place place = place(event);
        if (depth > DEEPEST) {
            throw new Unsound(
                    place,
                    "too deep: found more than " + DEEPEST + " levels; a " + document.label + " needs fewer than ten");
        }
        if (++values > document.mostValues) {
            throw new Unsound(
                    place,
                    "too long: found more than " + document.mostValues + " keys and values; " + document.enoughValues);
        }
        if (event instanceof AliasEvent alias) {
            problems.add(
                    place,
                    "aliases are not used here: found " + Shown.quoted("*" + alias.getAnchor())
                            + "; write the value out again");
            return new Tree.Broken(place);
        }
        boolean plain = isPlain(event, place);
        Tree tree = event instanceof ScalarEvent scalar
                ? new Tree.Leaf(place, scalar.getValue())
                : event.is(Event.ID.SequenceStart) ? items(place, depth) : entries(place, depth);
        return plain ? tree : new Tree.Broken(place);
    }

    /** Reports an anchor or a tag; a tag breaks the node, because it asks for a type. */
    private boolean isPlain(Event event, Place place) {
        if (event instanceof NodeEvent node && node.getAnchor() != null) {
            problems.add(
                    place, "anchors are not used here: found " + Shown.quoted("&" + node.getAnchor()) + "; remove it");
        }
        String tag = event instanceof ScalarEvent scalar
                ? scalar.getTag()
                : event instanceof CollectionStartEvent start ? start.getTag() : null;
        if (tag != null) {
            problems.add(
                    place, "tags are not used here: found " + Shown.quoted(tag) + "; remove it, every value is text");
        }
        return tag == null;
    }

    private Tree items(Place place, int depth) {
        List<Tree> items = new ArrayList<>();
        for (Event event = events.getEvent(); !event.is(Event.ID.SequenceEnd); event = events.getEvent()) {
            items.add(node(event, depth + 1));
        }
        return new Tree.Items(place, items);
    }

    private Tree entries(Place place, int depth) {
        Map<String, Tree.Entry> entries = new LinkedHashMap<>();
        for (Event event = events.getEvent(); !event.is(Event.ID.MappingEnd); event = events.getEvent()) {
            Tree key = node(event, depth + 1);
            Tree value = node(events.getEvent(), depth + 1);
            if (key instanceof Tree.Leaf leaf) {
                enter(entries, leaf, value);
            } else if (!(key instanceof Tree.Broken)) {
                problems.add(
                        key.place(), "a key is one word: found " + key.label() + "; write such as title: Bench soak");
            }
        }
        return new Tree.Entries(place, List.copyOf(entries.values()));
    }

    private void enter(Map<String, Tree.Entry> entries, Tree.Leaf key, Tree value) {
        if (key.text().equals("<<")) {
            problems.add(key.place(), "merge keys are not used here: found \"<<\"; write the keys out");
            return;
        }
        Tree.Entry first = entries.putIfAbsent(key.text(), new Tree.Entry(key.place(), key.text(), value));
        if (first != null) {
            problems.add(
                    key.place(),
                    "the key " + Shown.quoted(key.text()) + " stands twice: found the first at line "
                            + first.place().line() + "; keep one");
        }
    }

    private Place place(Event event) {
        return place(file, event.getStartMark());
    }

    private static Place place(String file, @Nullable Mark mark) {
        return mark == null ? Place.of(file) : new Place(file, mark.getLine() + 1, mark.getColumn() + 1);
    }
}
