package org.soakwright.recipes.parsing;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import org.jspecify.annotations.Nullable;
import org.soakwright.recipes.model.Amount;
import org.soakwright.recipes.model.Grade;
import org.soakwright.recipes.model.Lot;
import org.soakwright.recipes.model.Moisture;
import org.soakwright.recipes.model.Names;
import org.soakwright.recipes.model.Quantity;
import org.soakwright.recipes.model.Reference;
import org.soakwright.recipes.model.Shape;
import org.soakwright.recipes.model.Spread;
import org.soakwright.recipes.text.Kind;
import org.soakwright.recipes.text.Problems;
import org.soakwright.recipes.text.Tree;

/** Reads the lot and its grades. */
final class LotReader {
    private static final String PIECES = "[{name: thin, shape: slab, thickness: 18 mm, share: 100 %}]";

    private final Lists lists;
    private final Known known;
    private final Values values;
    private final Problems problems;
    private final Map<String, Shape> shapes = new LinkedHashMap<>();
    private final List<Reference> names = new ArrayList<>();
    private boolean hasDensity = true;
    private boolean hasMoisture;
    private @Nullable Moisture moisture;

    /**
     * What every grade needs of its lot.
     *
     * @param only whether there is one entry alone, which needs no name and no share
     * @param density null where there is none, or it could not be read
     */
    record Common(
            boolean only,
            boolean statesDensity,
            @Nullable Quantity density,
            @Nullable Spread spread) {}

    LotReader(Values values, Lists lists) {
        this.lists = lists;
        this.known = new Known(values);
        this.values = values;
        this.problems = values.problems();
    }

    /** The names of every grade written, once the lot is read. */
    Set<String> gradeNames() {
        Set<String> all = new LinkedHashSet<>();
        names.forEach(name -> all.add(name.name()));
        return all;
    }

    /** The shape of every grade whose shape could be read, once the lot is. */
    Map<String, Shape> shapes() {
        return shapes;
    }

    /** Whether the lot states a density, once it is read; a lot that could not be opened has the benefit of the doubt. */
    boolean hasDensity() {
        return hasDensity;
    }

    /** Whether the lot states a moisture, once it is read. */
    boolean hasMoisture() {
        return hasMoisture;
    }

    /** The moisture, once the lot is read; null where there is none or it is broken. */
    @Nullable
    Moisture moisture() {
        return moisture;
    }

    @Nullable
    Lot lot(Tree tree) {
        Fields fields = Fields.of(tree, Section.LOT, problems);
        if (fields == null) {
            return null;
        }
        Amount amount = amount(fields);
        // A mass without one is reported once, at the lot.
        hasDensity = fields.has("density") || fields.has("mass") || fields.has("containers");
        Quantity density = values.checked(
                known.quantity("density", fields.get("density"), Kind.DENSITY), found -> found.positive("the density"));
        Quantity temperature = known.temperature("temperature", fields.get("temperature"));
        Quantity thermal = known.quantity("thermal-diffusivity", fields.get("thermal-diffusivity"), Kind.DIFFUSIVITY);
        Tree moistureTree = fields.get("moisture");
        hasMoisture = moistureTree != null;
        moisture = moistureTree == null ? null : moisture(moistureTree);
        Moisture read = moisture;
        Spread spread = values.spread("spread", fields.get("spread"));
        Tree pieces = fields.need("pieces", PIECES);
        boolean only = pieces instanceof Tree.Items items && items.items().size() == 1;
        List<Grade> grades = grades(pieces, new Common(only, fields.has("density"), density, spread));
        problems.addAll(Names.duplicates("grades", names));
        boolean broken = (density == null && fields.has("density"))
                || (temperature == null && fields.has("temperature"))
                || (thermal == null && fields.has("thermal-diffusivity"))
                || (read == null && hasMoisture)
                || (spread == null && fields.has("spread"));
        return amount == null || grades == null || broken
                ? null
                : problems.attempt(() -> new Lot(fields.place(), amount, density, temperature, read, thermal, grades));
    }

    private @Nullable Moisture moisture(Tree tree) {
        Fields fields = Fields.of(tree, Section.MOISTURE, problems);
        if (fields == null) {
            return null;
        }
        Quantity start = known.quantity("the moisture at the start", fields.need("start", "56 %"), Kind.FRACTION);
        Quantity end = known.quantity("the moisture at the end", fields.need("end", "78 %"), Kind.FRACTION);
        return start == null || end == null ? null : problems.attempt(() -> new Moisture(fields.place(), start, end));
    }

    private @Nullable Amount amount(Fields fields) {
        String key = fields.oneOf(List.of("mass", "volume", "count", "containers"), "mass: 600 kg");
        if (key == null) {
            return null;
        }
        Tree tree = fields.get(key);
        if (tree != null && key.equals("count")) {
            Long count = values.count("count", tree, "500");
            return count == null ? null : problems.attempt(() -> new Amount.ByCount(count, tree.place()));
        }
        if (key.equals("containers")) {
            return containers(tree);
        }
        boolean mass = key.equals("mass");
        Quantity quantity = known.quantity(key, tree, mass ? Kind.MASS : Kind.VOLUME);
        if (quantity == null) {
            return null;
        }
        return problems.attempt(() -> mass ? new Amount.ByMass(quantity) : new Amount.ByVolume(quantity));
    }

    private @Nullable Amount containers(@Nullable Tree tree) {
        Fields fields = tree == null ? null : Fields.of(tree, Section.CONTAINERS, problems);
        if (fields == null) {
            return null;
        }
        Long count = values.count("count", fields.need("count", "24"), "24");
        Quantity each = known.quantity("each", fields.need("each", "25 kg"), Kind.MASS);
        return count == null || each == null
                ? null
                : problems.attempt(() -> new Amount.InContainers(fields.place(), count, each));
    }

    private @Nullable List<Grade> grades(@Nullable Tree tree, Common common) {
        if (tree instanceof Tree.Items items) {
            boolean allRead = true;
            List<Grade> grades = new ArrayList<>();
            for (Tree item : items.items()) {
                GradeReader reader = new GradeReader(values, lists, common);
                List<Grade> read = reader.grades(item);
                names.addAll(reader.names());
                shapes.putAll(reader.shapes());
                grades.addAll(read);
                allRead &= !read.isEmpty();
            }
            return allRead ? grades : null;
        }
        if (tree != null && !(tree instanceof Tree.Broken)) {
            problems.add(
                    tree.place(), "pieces is a list of grades: found " + tree.label() + "; write such as " + PIECES);
        }
        return null;
    }
}
