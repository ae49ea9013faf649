package org.soakwright.recipes.parsing;

import java.util.Collection;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import org.jspecify.annotations.Nullable;
import org.soakwright.recipes.text.Nearest;
import org.soakwright.recipes.text.Place;
import org.soakwright.recipes.text.Problems;
import org.soakwright.recipes.text.Shown;
import org.soakwright.recipes.text.Tree;

/** The keys and values of one section; unknown keys and keys of later versions are reported as it is opened. */
final class Fields {
    private final Keys section;
    private final Tree.Entries entries;
    private final Map<String, Tree.Entry> byKey = new LinkedHashMap<>();
    private final Problems problems;

    private Fields(Keys section, Tree.Entries entries, Problems problems) {
        this.section = section;
        this.entries = entries;
        this.problems = problems;
        entries.entries().forEach(entry -> byKey.put(entry.key(), entry));
    }

    static @Nullable Fields of(Tree tree, Keys section, Problems problems) {
        Fields fields = open(tree, section, problems);
        if (fields != null) {
            fields.checkKeys(section.keys());
        }
        return fields;
    }

    /** With the species' names as keys beside those of the section; where none could be read, any may stand. */
    static @Nullable Fields withSpecies(Tree tree, Keys section, Collection<String> names, Problems problems) {
        Fields fields = open(tree, section, problems);
        if (fields != null && !names.isEmpty()) {
            Set<String> known = new LinkedHashSet<>(section.keys());
            known.addAll(names);
            fields.checkKeys(known);
        }
        return fields;
    }

    /** Whatever its keys; for a section whose keys are names being declared. */
    static @Nullable Fields open(Tree tree, Keys section, Problems problems) {
        if (tree instanceof Tree.Entries entries) {
            return new Fields(section, entries, problems);
        }
        if (!(tree instanceof Tree.Broken)) {
            String key = section.keys().isEmpty() ? "name" : section.keys().get(0);
            problems.add(
                    tree.place(),
                    section.label() + " is written as keys and values: found " + tree.label() + "; write such as {"
                            + key + ": …}");
        }
        return null;
    }

    private void checkKeys(Collection<String> known) {
        entries.entries().forEach(entry -> checkKey(entry, known));
    }

    private void checkKey(Tree.Entry entry, Collection<String> known) {
        String key = entry.key();
        if (known.contains(key)) {
            return;
        }
        if (section.later().contains(key)) {
            problems.add(entry.place(), key + ": not computed yet by this version; remove it");
            return;
        }
        String home = section.home(key);
        String hint =
                home.isEmpty() || home.equals(section.label()) ? Nearest.hint(key, known) : "it belongs to " + home;
        problems.unknownKey(
                entry.place(), "unknown key in " + section.label() + ": found " + Shown.quoted(key) + "; " + hint);
    }

    Place place() {
        return entries.place();
    }

    /** Where the key stands; the section itself where it does not. */
    Place place(String key) {
        Tree.Entry entry = byKey.get(key);
        return entry == null ? place() : entry.place();
    }

    boolean has(String key) {
        return byKey.containsKey(key);
    }

    Collection<Tree.Entry> all() {
        return byKey.values();
    }

    @Nullable
    Tree get(String key) {
        Tree.Entry entry = byKey.get(key);
        return entry == null ? null : entry.value();
    }

    /** The value of a key, unless the key does not belong here. */
    @Nullable
    Tree known(String key) {
        return section.keys().contains(key) ? get(key) : null;
    }

    /** The value of a key that must be there. */
    @Nullable
    Tree need(String key, String example) {
        Tree value = get(key);
        if (value == null) {
            problems.add(
                    place(), section.label() + " needs " + key + ": found none; write such as " + key + ": " + example);
        }
        return value;
    }

    /** The one key of several that is there, and no other; null with a problem otherwise. */
    @Nullable
    String oneOf(List<String> keys, String example) {
        List<String> found = keys.stream().filter(this::has).toList();
        if (found.isEmpty()) {
            problems.add(
                    place(),
                    section.label() + " needs " + String.join(" or ", keys) + ": found none; write such as " + example);
            return null;
        }
        for (String extra : found.subList(1, found.size())) {
            problems.add(
                    place(extra),
                    section.label() + " takes only one of " + String.join(", ", keys) + ": found " + extra + " beside "
                            + found.get(0) + "; keep one");
        }
        return found.get(0);
    }
}
