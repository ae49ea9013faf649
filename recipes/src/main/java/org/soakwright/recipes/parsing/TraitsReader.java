package org.soakwright.recipes.parsing;

import java.util.LinkedHashMap;
import java.util.Map;
import org.jspecify.annotations.Nullable;
import org.soakwright.recipes.model.Diffusivity;
import org.soakwright.recipes.model.Faces;
import org.soakwright.recipes.model.Quantity;
import org.soakwright.recipes.model.Skin;
import org.soakwright.recipes.model.Substance;
import org.soakwright.recipes.model.Traits;
import org.soakwright.recipes.text.Kind;
import org.soakwright.recipes.text.Problems;
import org.soakwright.recipes.text.Tree;

/** Reads what a species is, how it moves in the liquor, and the skin that holds it back. */
final class TraitsReader {
    private final Known known;
    private final Values values;
    private final Problems problems;

    TraitsReader(Values values) {
        this.known = new Known(values);
        this.values = values;
        this.problems = values.problems();
    }

    @Nullable
    Traits traits(String species, Fields fields) {
        Substance substance = values.word("substance", fields.get("substance"), Substance.class);
        Quantity molarMass = known.quantity("molar-mass", fields.get("molar-mass"), Kind.MOLAR_MASS);
        Tree inLiquorTree = fields.get("in-liquor");
        Diffusivity inLiquor =
                inLiquorTree == null ? null : new DiffusivityReader(values).inLiquor(species, inLiquorTree);
        boolean broken = (substance == null && fields.has("substance"))
                || (molarMass == null && fields.has("molar-mass"))
                || (inLiquor == null && inLiquorTree != null);
        Tree skins = fields.get("skin");
        if (skins instanceof Tree.Entries entries && !isOne(entries)) {
            Map<String, Skin> byGrade = skins(entries);
            return byGrade == null || broken
                    ? null
                    : problems.attempt(() -> new Traits(substance, molarMass, inLiquor, byGrade, null));
        }
        Skin skin = skins == null ? null : skin(skins);
        return broken || (skin == null && skins != null)
                ? null
                : problems.attempt(() -> new Traits(substance, molarMass, inLiquor, Map.of(), skin));
    }

    private static boolean isOne(Tree.Entries entries) {
        return entries.entries().isEmpty()
                || entries.entries().stream()
                        .anyMatch(entry ->
                                Section.SKIN.keys().contains(entry.key()) || !(entry.value() instanceof Tree.Entries));
    }

    private @Nullable Map<String, Skin> skins(Tree.Entries entries) {
        Map<String, Skin> skins = new LinkedHashMap<>();
        boolean allRead = true;
        for (Tree.Entry entry : entries.entries()) {
            Skin skin = skin(entry.value());
            allRead &= skin != null;
            if (skin != null) {
                skins.put(entry.key(), skin);
            }
        }
        return allRead ? skins : null;
    }

    private @Nullable Skin skin(Tree tree) {
        Fields fields = Fields.of(tree, Section.SKIN, problems);
        if (fields == null) {
            return null;
        }
        Quantity permeance = known.quantity("permeance", fields.need("permeance", "2e-8 m/s"), Kind.PERMEANCE);
        Faces face = values.word("face", fields.need("face", "both"), Faces.class);
        return permeance == null || face == null
                ? null
                : problems.attempt(() -> new Skin(fields.place(), permeance, face));
    }
}
