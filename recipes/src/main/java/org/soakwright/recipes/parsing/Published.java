package org.soakwright.recipes.parsing;

import java.util.List;
import org.jspecify.annotations.Nullable;
import org.soakwright.recipes.library.Entry;
import org.soakwright.recipes.library.Library;
import org.soakwright.recipes.library.Property;
import org.soakwright.recipes.text.Nearest;
import org.soakwright.recipes.text.Place;
import org.soakwright.recipes.text.Problems;
import org.soakwright.recipes.text.Shown;

/** The published values that a recipe names. The library is read when the first one is named, and once. */
final class Published {
    private final Problems problems;

    Published(Problems problems) {
        this.problems = problems;
    }

    private static final class Shelf {
        static final Library LIBRARY = Library.load();
    }

    /** The entry of the name, of the property; null with a problem added where there is none. */
    @Nullable
    Entry entry(String name, Property property, Place place) {
        Entry entry = Shelf.LIBRARY.find(name).orElse(null);
        if (entry == null) {
            problems.add(
                    place,
                    "the library has no entry of this name: found " + Shown.quoted(name) + "; " + hint(name, property));
            return null;
        }
        if (entry.property() != property) {
            problems.add(
                    place,
                    "a " + property.word() + " is needed: found " + Shown.quoted(name) + ", which the library has as "
                            + spoken(entry.property()) + "; name another entry, or write the value");
            return null;
        }
        return entry;
    }

    /** The nearest name of those that would do. */
    private static String hint(String name, Property property) {
        List<String> names = Shelf.LIBRARY.entries().stream()
                .filter(entry -> entry.property() == property)
                .map(Entry::name)
                .toList();
        return Nearest.of(name, names)
                .map(nearest -> "did you mean \"" + nearest + "\"?")
                .orElse("it has no " + property.word() + " at all, write the value");
    }

    private static String spoken(Property property) {
        String word = property.word().replace('-', ' ');
        return (word.startsWith("a") ? "an " : "a ") + word;
    }
}
