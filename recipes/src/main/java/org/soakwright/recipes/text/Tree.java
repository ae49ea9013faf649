package org.soakwright.recipes.text;

import java.util.List;

/** A YAML document as text with places: no tags, no anchors, no types. */
public sealed interface Tree {
    Place place();

    /** What it is called in a message. */
    String label();

    /** One value, as text; empty where nothing was written. */
    record Leaf(Place place, String text) implements Tree {
        @Override
        public String label() {
            return text.isEmpty() ? "nothing" : Shown.quoted(text);
        }
    }

    /** A list. */
    record Items(Place place, List<Tree> items) implements Tree {
        public Items {
            items = List.copyOf(items);
        }

        @Override
        public String label() {
            return "a list";
        }
    }

    /** Keys and values in the order written, no key twice. */
    record Entries(Place place, List<Entry> entries) implements Tree {
        public Entries {
            entries = List.copyOf(entries);
        }

        @Override
        public String label() {
            return "keys and values";
        }
    }

    /** Something already reported, about which nothing more is to be said. */
    record Broken(Place place) implements Tree {
        @Override
        public String label() {
            return "something unreadable";
        }
    }

    /** A key, its place and its value. */
    record Entry(Place place, String key, Tree value) {}
}
