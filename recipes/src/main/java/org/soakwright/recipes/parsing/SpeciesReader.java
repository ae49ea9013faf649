package org.soakwright.recipes.parsing;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.EnumSet;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;
import org.jspecify.annotations.Nullable;
import org.soakwright.recipes.library.Entry;
import org.soakwright.recipes.library.Property;
import org.soakwright.recipes.model.Content;
import org.soakwright.recipes.model.Diffusivities;
import org.soakwright.recipes.model.Medium;
import org.soakwright.recipes.model.Partition;
import org.soakwright.recipes.model.Quantity;
import org.soakwright.recipes.model.Species;
import org.soakwright.recipes.model.Spread;
import org.soakwright.recipes.model.Start;
import org.soakwright.recipes.model.Traits;
import org.soakwright.recipes.text.Problems;
import org.soakwright.recipes.text.Tree;
import org.soakwright.recipes.text.Unit;

/** Reads the species and what the pieces hold of them. */
final class SpeciesReader {
    private static final String POINT = "[0, 190 g/kg]";
    private static final String PARTITION = "0.8";

    private final Known known;
    private final Values values;
    private final Problems problems;
    private final Set<String> names = new LinkedHashSet<>();

    SpeciesReader(Values values) {
        this.known = new Known(values);
        this.values = values;
        this.problems = values.problems();
    }

    /** The names of every species written, once they are read. */
    Set<String> names() {
        return names;
    }

    List<Species> species(Tree tree) {
        Fields fields = Fields.open(tree, Section.BY_SPECIES, problems);
        if (fields == null) {
            return List.of();
        }
        if (fields.all().isEmpty()) {
            problems.add(tree.place(), "species is empty: found none; write such as {salt: {start: 190 g/kg, …}}");
        }
        List<Species> species = new ArrayList<>();
        for (Tree.Entry entry : fields.all()) {
            Species one = one(entry);
            if (one != null) {
                species.add(one);
            }
        }
        return species;
    }

    private @Nullable Species one(Tree.Entry entry) {
        String name = entry.key();
        names.add(name);
        boolean named = values.isName("a species name", name, entry.place());
        if (Section.RINSE_LIQUOR.keys().contains(name)) {
            problems.add(
                    entry.place(),
                    "a species cannot be named " + name + ", which is a key of a liquor; choose another name");
        }
        Fields fields = Fields.of(entry.value(), Section.ONE_SPECIES, problems);
        if (fields == null) {
            return null;
        }
        Tree startTree = fields.need("start", "190 g/kg");
        Start start = start(name, startTree);
        Tree diffusivityTree = fields.need("diffusivity", "8e-10 m2/s");
        Diffusivities diffusivity = new DiffusivityReader(values).ofSpecies(name, diffusivityTree);
        Varies startVaries = varies(start instanceof Start.Profile ? null : startTree);
        Varies diffusivityVaries = varies(diffusivityTree);
        Set<Medium> media = media(fields.get("exchanges-with"));
        boolean inLiquor = media == null || media.contains(Medium.LIQUOR);
        Tree written = inLiquor ? fields.need("partition", "0.8") : fields.get("partition");
        Partition partition = written == null && !inLiquor
                ? new Partition(new Quantity(BigDecimal.ONE, Unit.ONE, fields.place()))
                : partition("the partition of " + name, written);
        Traits traits = new TraitsReader(values).traits(name, fields);
        boolean broken = startVaries.broken() || diffusivityVaries.broken();
        if (!named
                || start == null
                || diffusivity == null
                || media == null
                || partition == null
                || traits == null
                || broken) {
            return null;
        }
        return problems.attempt(() -> new Species(
                entry.place(),
                name,
                start,
                startVaries.spread(),
                diffusivity,
                diffusivityVaries.spread(),
                partition,
                traits,
                media));
    }

    /** What `varies` says beside a value. */
    private record Varies(@Nullable Spread spread, boolean broken) {}

    private Varies varies(@Nullable Tree tree) {
        Tree stated = tree instanceof Tree.Entries entries
                ? entries.entries().stream()
                        .filter(entry -> entry.key().equals("varies"))
                        .map(Tree.Entry::value)
                        .findFirst()
                        .orElse(null)
                : null;
        Spread spread = values.spread("varies", stated);
        return new Varies(spread, stated != null && spread == null);
    }

    private @Nullable Start start(String species, @Nullable Tree tree) {
        String what = "the start of " + species;
        if (tree instanceof Tree.Entries entries
                && entries.entries().stream().anyMatch(entry -> entry.key().equals("profile"))) {
            Fields fields = Fields.of(tree, Section.PROFILE, problems);
            Tree profile = fields == null ? null : fields.get("profile");
            return profile == null ? null : profile(what, profile);
        }
        Content content = known.ofPiece(what, tree, Section.START);
        return content == null ? null : new Start.Uniform(content);
    }

    private @Nullable Start profile(String what, Tree tree) {
        if (!(tree instanceof Tree.Items items)) {
            problems.add(
                    tree.place(),
                    what + ": a profile is a list of points: found " + tree.label() + "; write such as [" + POINT
                            + ", [1, 150 g/kg]]");
            return null;
        }
        List<Start.Point> points = new ArrayList<>();
        for (Tree item : items.items()) {
            Start.Point point = point(what, item);
            if (point != null) {
                points.add(point);
            }
        }
        return points.size() == items.items().size()
                ? problems.attempt(() -> new Start.Profile(tree.place(), points))
                : null;
    }

    private Start.@Nullable Point point(String what, Tree tree) {
        if (!(tree instanceof Tree.Items items) || items.items().size() != 2) {
            problems.add(
                    tree.place(),
                    what + ": a point is a position and a content: found " + tree.label() + "; write such as " + POINT);
            return null;
        }
        BigDecimal position = values.number(what + ": a position", items.items().get(0), "0.5");
        Content content = known.ofPiece(what, items.items().get(1));
        return position == null || content == null
                ? null
                : new Start.Point(position.doubleValue(), content, tree.place());
    }

    @Nullable
    Partition partition(String what, @Nullable Tree tree) {
        Quantity value =
                tree instanceof Tree.Entries entries && Values.has(entries, "from") && !Values.has(entries, "to")
                        ? published(what, entries)
                        : known.number(what, tree, PARTITION);
        return value == null ? null : problems.attempt(() -> new Partition(value));
    }

    private @Nullable Quantity published(String what, Tree.Entries entries) {
        Fields fields = Fields.of(entries, Section.PARTITION, problems);
        Tree from = fields == null ? null : fields.get("from");
        String name = values.name("from", from, "salt-in-curd");
        if (fields == null || from == null || name == null) {
            return null;
        }
        Entry entry = new Published(problems).entry(name, Property.PARTITION, from.place());
        if (fields.has("value")) {
            Quantity value = known.beside(values.plain(what, fields.get("value"), PARTITION), fields);
            return entry == null ? null : value;
        }
        Quantity single = entry == null ? null : entry.figure().single().orElse(null);
        if (entry != null && single == null) {
            problems.add(
                    from.place(),
                    "the library gives a range for " + name + ": found " + entry.figure() + "; add value, such as "
                            + PARTITION);
        }
        return single == null
                ? null
                : known.beside(new Quantity(single.value(), single.unit(), from.place(), single.written()), fields);
    }

    private @Nullable Set<Medium> media(@Nullable Tree tree) {
        if (tree == null) {
            return EnumSet.of(Medium.LIQUOR);
        }
        if (tree instanceof Tree.Leaf leaf && leaf.text().equals("both")) {
            return EnumSet.allOf(Medium.class);
        }
        List<Medium> media = values.someWords("exchanges-with", tree, Medium.class);
        return media.isEmpty() ? null : EnumSet.copyOf(media);
    }
}
