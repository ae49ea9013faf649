package org.soakwright.recipes.parsing;

import java.util.EnumMap;
import java.util.Map;
import org.jspecify.annotations.Nullable;
import org.soakwright.recipes.model.Diffusivities;
import org.soakwright.recipes.model.Diffusivity;
import org.soakwright.recipes.model.Grain;
import org.soakwright.recipes.model.Quantity;
import org.soakwright.recipes.text.Kind;
import org.soakwright.recipes.text.Problems;
import org.soakwright.recipes.text.Tree;

/** Reads a diffusivity: one value, or one for each direction of the grain. */
final class DiffusivityReader {
    private final Known known;
    private final Values values;
    private final Problems problems;

    DiffusivityReader(Values values) {
        this.known = new Known(values);
        this.values = values;
        this.problems = values.problems();
    }

    @Nullable
    Diffusivities ofSpecies(String species, @Nullable Tree tree) {
        String what = what(species);
        return tree instanceof Tree.Entries entries && byGrain(entries)
                ? byGrain(what, Fields.of(tree, Section.GRAIN, problems), Section.DIRECTION)
                : alike(one(what, tree, Section.DIFFUSIVITY));
    }

    /** As a step states it: without a temperature of its own. */
    @Nullable
    Diffusivities ofStep(String species, Tree tree) {
        String what = what(species);
        return tree instanceof Tree.Entries entries && byGrain(entries)
                ? byGrain(what, Fields.of(tree, Section.STEP_GRAIN, problems), Section.KNOWN)
                : alike(one(what, tree, Section.KNOWN));
    }

    /** In the liquor around the pieces. */
    @Nullable
    Diffusivity inLiquor(String species, Tree tree) {
        return one(what(species) + " in the liquor", tree, Section.IN_LIQUOR);
    }

    private static String what(String species) {
        return "the diffusivity of " + species;
    }

    private static boolean byGrain(Tree.Entries entries) {
        return entries.entries().stream()
                .anyMatch(entry -> Section.STEP_GRAIN.keys().contains(entry.key()));
    }

    private static boolean names(Tree.Entries entries) {
        return Values.has(entries, "from") && !Values.has(entries, "to");
    }

    private static @Nullable Diffusivities alike(@Nullable Diffusivity value) {
        return value == null ? null : new Diffusivities.Alike(value);
    }

    private @Nullable Diffusivities byGrain(String what, @Nullable Fields fields, Section section) {
        if (fields == null) {
            return null;
        }
        Map<Grain, Diffusivity> read = new EnumMap<>(Grain.class);
        boolean allRead = true;
        for (Grain grain : Grain.values()) {
            Tree tree = fields.get(grain.word());
            Diffusivity value = one(what + " " + grain.word(), tree, section);
            allRead &= value != null || tree == null;
            if (value != null) {
                read.put(grain, value);
            }
        }
        return allRead ? problems.attempt(() -> new Diffusivities.ByGrain(fields.place(), read)) : null;
    }

    private @Nullable Diffusivity one(String what, @Nullable Tree tree, Section section) {
        if (section == Section.KNOWN && tree instanceof Tree.Entries entries && names(entries)) {
            problems.add(
                    entries.place(),
                    "a step states its own diffusivity as a value: found from; write such as 8e-10 m2/s");
            return null;
        }
        if (section == Section.KNOWN || !(tree instanceof Tree.Entries entries)) {
            Quantity value = known.quantity(what, tree, Kind.DIFFUSIVITY);
            return value == null ? null : problems.attempt(() -> Diffusivity.of(value));
        }
        if (Values.has(entries, "to") || Values.has(entries, "any-of")) {
            values.quantity(what, tree, Kind.DIFFUSIVITY);
            return null;
        }
        Fields fields = Fields.of(tree, section, problems);
        return fields == null ? null : new LawReader(values, fields, what).diffusivity();
    }
}
