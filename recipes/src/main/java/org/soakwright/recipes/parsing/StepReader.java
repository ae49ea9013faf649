package org.soakwright.recipes.parsing;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import org.jspecify.annotations.Nullable;
import org.soakwright.recipes.model.Air;
import org.soakwright.recipes.model.Consistency;
import org.soakwright.recipes.model.Declared;
import org.soakwright.recipes.model.Diffusivities;
import org.soakwright.recipes.model.Film;
import org.soakwright.recipes.model.Handling;
import org.soakwright.recipes.model.Liquor;
import org.soakwright.recipes.model.LiquorPrice;
import org.soakwright.recipes.model.Names;
import org.soakwright.recipes.model.Overrides;
import org.soakwright.recipes.model.Partition;
import org.soakwright.recipes.model.Quantity;
import org.soakwright.recipes.model.Reference;
import org.soakwright.recipes.model.Renewal;
import org.soakwright.recipes.model.Step;
import org.soakwright.recipes.model.StepHead;
import org.soakwright.recipes.model.Time;
import org.soakwright.recipes.text.Kind;
import org.soakwright.recipes.text.Nearest;
import org.soakwright.recipes.text.Problems;
import org.soakwright.recipes.text.Shown;
import org.soakwright.recipes.text.Tree;

/** Reads the steps, each against what the recipe declares. */
final class StepReader {
    private static final Map<String, Section> KINDS = kinds();
    private static final String TIME = "6 h or {from: 2 h, to: 24 h}";
    private static final String LIQUOR = "{ratio: 2 L/kg, others: 0}";
    private static final String FILM = "negligible, or {coefficient: 2e-6 m/s}";

    private final Known known;
    private final Values values;
    private final Problems problems;
    private final Declared declared;
    private final Consistency consistency;
    private final LiquorReader around;

    StepReader(Values values, Declared declared) {
        this.known = new Known(values);
        this.values = values;
        this.problems = values.problems();
        this.declared = declared;
        this.consistency = new Consistency(declared);
        this.around = new LiquorReader(values, declared);
    }

    private static Map<String, Section> kinds() {
        Map<String, Section> kinds = new LinkedHashMap<>();
        kinds.put("soak", Section.SOAK);
        kinds.put("rinse", Section.RINSE);
        kinds.put("rest", Section.REST);
        kinds.put("dry", Section.DRY);
        return kinds;
    }

    /** The name and kind of every step written, before any of them is read. */
    static Map<String, String> declared(@Nullable Tree tree, Problems problems) {
        Map<String, String> steps = new LinkedHashMap<>();
        List<Reference> names = new ArrayList<>();
        if (tree instanceof Tree.Items items) {
            for (Tree item : items.items()) {
                Tree.Entry kind = kind(item);
                if (kind != null && kind.value() instanceof Tree.Leaf leaf) {
                    steps.putIfAbsent(leaf.text(), kind.key());
                    names.add(new Reference(leaf.text(), item.place()));
                }
            }
        }
        problems.addAll(Names.duplicates("steps", names));
        return steps;
    }

    /** Whether any step written has the key. */
    static boolean anyHas(@Nullable Tree tree, String key) {
        return tree instanceof Tree.Items items
                && items.items().stream()
                        .anyMatch(item -> item instanceof Tree.Entries entries
                                && entries.entries().stream()
                                        .anyMatch(entry -> entry.key().equals(key)));
    }

    private static Tree.@Nullable Entry kind(Tree tree) {
        return tree instanceof Tree.Entries entries
                ? entries.entries().stream()
                        .filter(entry -> KINDS.containsKey(entry.key()))
                        .findFirst()
                        .orElse(null)
                : null;
    }

    List<Step> steps(Tree tree) {
        if (!(tree instanceof Tree.Items items)) {
            if (!(tree instanceof Tree.Broken)) {
                problems.add(
                        tree.place(), "steps is a list: found " + tree.label() + "; write such as - soak: first water");
            }
            return List.of();
        }
        if (items.items().isEmpty()) {
            problems.add(tree.place(), "steps is empty: found none; write such as - soak: first water");
        }
        List<Step> steps = new ArrayList<>();
        for (int i = 0; i < items.items().size(); i++) {
            Step step = step(items.items().get(i), i == 0);
            if (step != null) {
                steps.add(step);
            }
        }
        return steps;
    }

    private @Nullable Step step(Tree tree, boolean first) {
        Tree.Entry kind = kind(tree);
        Section section = kind == null ? null : KINDS.get(kind.key());
        if (kind == null || section == null) {
            withoutKind(tree);
            return null;
        }
        Fields fields = Fields.of(tree, section, problems);
        if (fields == null) {
            return null;
        }
        Handling handling = new HandlingReader(values).handling(fields);
        StepHead head = head(fields, kind, handling);
        Step step = switch (section) {
            case SOAK -> soak(fields, head, kind.key());
            case RINSE -> rinse(fields, head, kind.key());
            case REST -> head == null ? null : new Step.Rest(head);
            default -> dry(fields, head, kind.key());
        };
        if (step != null) {
            problems.addAll(consistency.of(step));
        }
        if (handling != null) {
            // Of a step that is broken otherwise the fills written are taken for several.
            int fills = step != null ? step.fills() : fields.known("fills") == null ? 1 : Renewal.MOST_FILLS;
            problems.addAll(Consistency.ofHandling(handling, fields.place("stays"), first, fills));
        }
        return step;
    }

    private void withoutKind(Tree tree) {
        if (tree instanceof Tree.Broken) {
            return;
        }
        String found = tree.label();
        String hint = "write such as - soak: first water";
        if (tree instanceof Tree.Entries entries && !entries.entries().isEmpty()) {
            String key = entries.entries().get(0).key();
            found = Shown.quoted(key);
            hint = Nearest.hint(key, KINDS.keySet());
        }
        problems.add(
                tree.place(),
                "a step begins with its kind and name, soak, rinse, rest or dry: found " + found + "; " + hint);
    }

    private @Nullable StepHead head(Fields fields, Tree.Entry kind, @Nullable Handling handling) {
        String name = values.name(kind.key(), kind.value(), "first water");
        Time time = new TimeReader(values).time(fields.need("time", TIME));
        Quantity temperature = known.temperature("temperature", fields.get("temperature"));
        Quantity gain = known.quantity("gain", fields.get("gain"), Kind.FRACTION);
        Overrides overrides = overrides(fields);
        Tree prices = fields.known("prices");
        LiquorPrice price = prices == null ? null : new PriceReader(values).ofStep(prices);
        if (overrides != null) {
            problems.addAll(consistency.ofTemperature(
                    fields.place(),
                    fields.has("temperature"),
                    overrides.diffusivity().keySet()));
        }
        boolean broken = (temperature == null && fields.has("temperature"))
                || (gain == null && fields.has("gain"))
                || (price == null && prices != null);
        return name == null || time == null || overrides == null || handling == null || broken
                ? null
                : problems.attempt(
                        () -> new StepHead(fields.place(), name, time, temperature, overrides, price, gain, handling));
    }

    private @Nullable Overrides overrides(Fields fields) {
        Map<String, Diffusivities> diffusivity = new LinkedHashMap<>();
        Map<String, Partition> partition = new LinkedHashMap<>();
        boolean allRead = true;
        for (Tree.Entry entry : bySpecies(fields.get("diffusivity"))) {
            Diffusivities value = new DiffusivityReader(values).ofStep(entry.key(), entry.value());
            allRead &= value != null;
            if (value != null) {
                diffusivity.put(entry.key(), value);
            }
        }
        for (Tree.Entry entry : bySpecies(fields.known("partition"))) {
            Partition value = new SpeciesReader(values).partition("the partition of " + entry.key(), entry.value());
            allRead &= value != null;
            if (value != null) {
                partition.put(entry.key(), value);
            }
        }
        Overrides overrides = problems.attempt(() -> new Overrides(diffusivity, partition));
        return allRead ? overrides : null;
    }

    private List<Tree.Entry> bySpecies(@Nullable Tree tree) {
        Set<String> names = declared.speciesNames();
        Fields fields = tree == null ? null : Fields.withSpecies(tree, Section.BY_SPECIES, names, problems);
        return fields == null
                ? List.of()
                : fields.all().stream()
                        .filter(entry -> names.contains(entry.key()))
                        .toList();
    }

    private @Nullable Step soak(Fields fields, @Nullable StepHead head, String kind) {
        Liquor liquor = around.liquor(
                around.fields(fields.need("liquor", LIQUOR), Section.SOAK_LIQUOR), fields.has("temperature"));
        Film film = film(fields, kind);
        Quantity dragOut = dragOut(fields);
        return head == null || liquor == null || film == null || (dragOut == null && fields.has("drag-out"))
                ? null
                : problems.attempt(() -> new Step.Soak(head, liquor, film, dragOut));
    }

    private @Nullable Step rinse(Fields fields, @Nullable StepHead head, String kind) {
        Fields liquorFields = around.fields(fields.need("liquor", LIQUOR), Section.RINSE_LIQUOR);
        Liquor liquor = around.liquor(liquorFields, fields.has("temperature"));
        Renewal renewal = around.renewal(fields, liquorFields);
        Film film = film(fields, kind);
        Quantity dragOut = dragOut(fields);
        return head == null
                        || liquor == null
                        || film == null
                        || renewal == null
                        || (dragOut == null && fields.has("drag-out"))
                ? null
                : problems.attempt(() -> new Step.Rinse(head, liquor, renewal, film, dragOut));
    }

    private @Nullable Step dry(Fields fields, @Nullable StepHead head, String kind) {
        Air air = around.air(fields.need("air", "{equilibrium: {water: 60 g/kg}}"));
        Film film = film(fields, kind);
        return head == null || air == null || film == null ? null : new Step.Dry(head, air, film);
    }

    private @Nullable Film film(Fields fields, String kind) {
        Film film = new FilmReader(values).film(fields.need("film", FILM));
        problems.addAll(consistency.of(film, kind, fields.place(), fields.has("temperature")));
        return film;
    }

    private @Nullable Quantity dragOut(Fields fields) {
        Quantity dragOut = values.checked(
                known.quantity("drag-out", fields.get("drag-out"), Kind.LIQUOR_RATIO),
                found -> found.notNegative("drag-out"));
        problems.addAll(consistency.ofDragOut(dragOut));
        return dragOut;
    }
}
