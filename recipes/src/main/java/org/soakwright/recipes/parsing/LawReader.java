package org.soakwright.recipes.parsing;

import java.util.ArrayList;
import java.util.List;
import org.jspecify.annotations.Nullable;
import org.soakwright.recipes.library.Entry;
import org.soakwright.recipes.library.Figure;
import org.soakwright.recipes.library.Property;
import org.soakwright.recipes.library.Span;
import org.soakwright.recipes.model.Diffusivity;
import org.soakwright.recipes.model.Quantity;
import org.soakwright.recipes.text.Kind;
import org.soakwright.recipes.text.Place;
import org.soakwright.recipes.text.Problems;
import org.soakwright.recipes.text.Tree;

/** Reads the keys of one diffusivity: its value, the way it changes with temperature, or the entry that has both. */
final class LawReader {
    private static final String EXAMPLE = "8e-10 m2/s";
    private static final String POINT = "[5 Cel, 8e-10 m2/s]";
    private static final List<String> OF_VALUES = List.of("at", "activation-energy", "scaling");

    private final Known known;
    private final Values values;
    private final Problems problems;
    private final Fields fields;
    private final String what;

    LawReader(Values values, Fields fields, String what) {
        this.known = new Known(values);
        this.values = values;
        this.problems = values.problems();
        this.fields = fields;
        this.what = what;
    }

    /** What the keys say of the temperature; a null that was written is broken. */
    private record Warmth(@Nullable Quantity at, @Nullable Quantity energy, boolean viscous, boolean broken) {}

    @Nullable
    Diffusivity diffusivity() {
        if (fields.has("points")) {
            return stated(points());
        }
        Quantity value = fields.has("value") || !fields.has("from") ? value() : null;
        Warmth warmth = warmth();
        if (fields.has("from")) {
            return published(value, warmth);
        }
        return value == null || warmth.broken() || !complete(warmth) ? null : made(value, warmth, null);
    }

    private @Nullable Quantity value() {
        Quantity value = known.beside(values.quantity(what, fields.need("value", EXAMPLE), Kind.DIFFUSIVITY), fields);
        return values.checked(value, found -> found.positive("a diffusivity"));
    }

    private Warmth warmth() {
        Quantity at = known.temperature("at", fields.get("at"));
        Quantity energy = values.checked(
                known.quantity("activation-energy", fields.get("activation-energy"), Kind.MOLAR_ENERGY),
                Quantity::activating);
        boolean viscous = scaling();
        boolean broken = (at == null && fields.has("at"))
                || (energy == null && fields.has("activation-energy"))
                || (!viscous && fields.has("scaling"));
        if (fields.has("scaling") && fields.has("activation-energy")) {
            problems.add(
                    fields.place("scaling"),
                    what + " changes with temperature in one way: found scaling beside activation-energy; keep one");
            broken = true;
        }
        return new Warmth(at, energy, viscous, broken);
    }

    private boolean scaling() {
        Tree tree = fields.get("scaling");
        Tree.Leaf leaf = values.leaf("scaling", tree, "viscosity");
        if (leaf != null && !leaf.text().equals("viscosity")) {
            problems.add(leaf.place(), "scaling can only be viscosity: found " + leaf.label());
            return false;
        }
        return leaf != null;
    }

    /** Whether a way to change has its temperature, and a temperature its way. */
    private boolean complete(Warmth warmth) {
        Quantity at = warmth.at();
        Quantity energy = warmth.energy();
        if (at == null && energy != null) {
            problems.add(
                    energy.place(),
                    "an activation energy needs the temperature its diffusivity belongs to; add at, such as 5 Cel");
            return false;
        }
        if (at == null && warmth.viscous()) {
            problems.add(
                    fields.place("scaling"),
                    "scaling needs the temperature its diffusivity belongs to; add at, such as 5 Cel");
            return false;
        }
        if (at != null && energy == null && !warmth.viscous()) {
            problems.add(
                    at.place(),
                    "`at` says nothing without an activation energy; add activation-energy, such as 22 kJ/mol, or"
                            + " scaling: viscosity, or remove `at`");
            return false;
        }
        return true;
    }

    private @Nullable Diffusivity made(Quantity value, Warmth warmth, @Nullable String from) {
        Quantity at = warmth.at();
        Quantity energy = warmth.energy();
        return problems.attempt(() -> {
            Diffusivity.Law law = at == null
                    ? new Diffusivity.Law.Constant()
                    : warmth.viscous() || energy == null
                            ? new Diffusivity.Law.Viscous(at)
                            : new Diffusivity.Law.Activated(at, energy);
            return new Diffusivity(value, law, from);
        });
    }

    private @Nullable Diffusivity stated(@Nullable List<Diffusivity.Point> points) {
        List<String> others = new ArrayList<>(List.of("value", "from"));
        others.addAll(OF_VALUES);
        boolean alone = none(others, "points have their own values and temperatures");
        return points == null || !alone ? null : measured(points, null);
    }

    /** Whether none of the keys is there, with a problem added at each that is. */
    private boolean none(List<String> keys, String why) {
        List<String> found = keys.stream().filter(fields::has).toList();
        found.forEach(key -> problems.add(fields.place(key), why + ": found " + key + " beside them; remove it"));
        return found.isEmpty();
    }

    /** The point at the lowest temperature carries the give-or-take of all. */
    private @Nullable Diffusivity measured(List<Diffusivity.Point> points, @Nullable String from) {
        Diffusivity line = problems.attempt(() -> Diffusivity.of(new Diffusivity.Law.Measured(points), from));
        if (line == null || !fields.has(Known.GIVE_OR_TAKE)) {
            return line;
        }
        Quantity first = known.beside(line.value(), fields);
        return first == null ? null : line.each(quantity -> quantity.equals(line.value()) ? first : quantity);
    }

    private @Nullable List<Diffusivity.Point> points() {
        Tree tree = fields.get("points");
        if (!(tree instanceof Tree.Items items) || items.items().size() < 2) {
            if (tree != null && !(tree instanceof Tree.Broken)) {
                problems.add(
                        tree.place(),
                        what + ": points is a list of two or more: found "
                                + (tree instanceof Tree.Items few ? few.items().size() : tree.label())
                                + "; write such as [" + POINT + ", [15 Cel, 1.1e-9 m2/s]]");
            }
            return null;
        }
        List<Diffusivity.Point> points = new ArrayList<>();
        for (Tree item : items.items()) {
            Diffusivity.Point point = point(item);
            if (point != null) {
                points.add(point);
            }
        }
        return points.size() == items.items().size() ? points : null;
    }

    private Diffusivity.@Nullable Point point(Tree tree) {
        if (!(tree instanceof Tree.Items pair) || pair.items().size() != 2) {
            if (!(tree instanceof Tree.Broken)) {
                problems.add(
                        tree.place(),
                        what + ": a point is a temperature and a diffusivity: found " + tree.label()
                                + "; write such as " + POINT);
            }
            return null;
        }
        Quantity temperature = values.quantity("a point", pair.items().get(0), Kind.TEMPERATURE);
        Quantity value = values.quantity("a point", pair.items().get(1), Kind.DIFFUSIVITY);
        return temperature == null || value == null
                ? null
                : problems.attempt(() -> new Diffusivity.Point(temperature, value));
    }

    private @Nullable Diffusivity published(@Nullable Quantity value, Warmth stated) {
        Tree tree = fields.get("from");
        String name = values.name("from", tree, "salt-in-feta");
        Place place = tree == null ? fields.place() : tree.place();
        Entry entry = name == null ? null : new Published(problems).entry(name, Property.DIFFUSIVITY, place);
        boolean broken = stated.broken() || (value == null && fields.has("value"));
        if (name == null || entry == null || broken) {
            return null;
        }
        if (value == null && entry.figure() instanceof Figure.ByTemperature line) {
            boolean alone = none(OF_VALUES, "the points of " + name + " have their own temperatures");
            return alone
                    ? measured(
                            line.points().stream()
                                    .map(point -> new Diffusivity.Point(
                                            moved(point.temperature(), place), moved(point.value(), place)))
                                    .toList(),
                            name)
                    : null;
        }
        Quantity taken = value == null ? taken(entry, place) : value;
        if (taken == null) {
            return null;
        }
        Warmth warmth = warmth(entry, stated, place);
        return warmth.broken() || !complete(warmth) ? null : made(taken, warmth, name);
    }

    /** The one value of an entry, with the give-or-take that the recipe states. */
    private @Nullable Quantity taken(Entry entry, Place place) {
        Quantity single = entry.figure().single().orElse(null);
        if (single == null) {
            problems.add(
                    place,
                    "the library gives a range for " + entry.name() + ": found " + entry.figure()
                            + "; add value, such as "
                            + (entry.figure() instanceof Figure.Range range
                                    ? range.span().from()
                                    : EXAMPLE));
            return null;
        }
        return known.beside(moved(single, place), fields);
    }

    /** What the recipe states goes before what the entry says. */
    private Warmth warmth(Entry entry, Warmth stated, Place place) {
        Span foundEnergy = entry.activationEnergy();
        Span foundAt = entry.temperature();
        if (stated.energy() == null && !stated.viscous() && foundEnergy == null) {
            return stated;
        }
        Quantity energy = stated.energy();
        if (energy == null && !stated.viscous() && foundEnergy != null) {
            energy = one("activation-energy", entry, foundEnergy, place);
        }
        Quantity at = stated.at();
        if (at == null && foundAt != null) {
            at = one("at", entry, foundAt, place);
        }
        boolean broken = (energy == null && !stated.viscous()) || (at == null && foundAt != null);
        if (at == null && foundAt == null && !broken) {
            problems.add(
                    place,
                    "the library does not say at which temperature " + entry.name()
                            + " was found; add at, such as 5 Cel");
            broken = true;
        }
        return new Warmth(at, energy, stated.viscous(), broken);
    }

    private @Nullable Quantity one(String key, Entry entry, Span found, Place place) {
        if (!found.isOne()) {
            problems.add(
                    place,
                    "the library gives the " + (key.equals("at") ? "temperature" : "activation energy") + " of "
                            + entry.name()
                            + " as a range: found " + found + "; add " + key
                            + ", such as " + found.from());
            return null;
        }
        return moved(found.from(), place);
    }

    /** A value of the library stands in the recipe where its name does. */
    private static Quantity moved(Quantity quantity, Place place) {
        return new Quantity(quantity.value(), quantity.unit(), place, quantity.written());
    }
}
