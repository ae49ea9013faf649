package org.soakwright.recipes.parsing;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.jspecify.annotations.Nullable;
import org.soakwright.recipes.model.Air;
import org.soakwright.recipes.model.Consistency;
import org.soakwright.recipes.model.Content;
import org.soakwright.recipes.model.Declared;
import org.soakwright.recipes.model.Liquor;
import org.soakwright.recipes.model.LiquorVolume;
import org.soakwright.recipes.model.Quantity;
import org.soakwright.recipes.model.Renewal;
import org.soakwright.recipes.text.Kind;
import org.soakwright.recipes.text.Measurement;
import org.soakwright.recipes.text.Problems;
import org.soakwright.recipes.text.Tree;

/** Reads what surrounds the pieces: liquor and air. */
final class LiquorReader {
    private final Known known;
    private final Values values;
    private final Problems problems;
    private final Declared declared;
    private final Consistency consistency;

    LiquorReader(Values values, Declared declared) {
        this.known = new Known(values);
        this.values = values;
        this.problems = values.problems();
        this.declared = declared;
        this.consistency = new Consistency(declared);
    }

    /** The keys of a liquor in a step of the section. */
    @Nullable
    Fields fields(@Nullable Tree tree, Section section) {
        return tree == null ? null : Fields.withSpecies(tree, section, declared.speciesNames(), problems);
    }

    @Nullable
    Liquor liquor(@Nullable Fields fields, boolean statesTemperature) {
        if (fields == null) {
            return null;
        }
        LiquorVolume volume = volume(fields);
        Quantity density = known.quantity("density", fields.get("density"), Kind.DENSITY);
        boolean othersZero = othersZero(fields.get("others"));
        Map<String, Content> contents = new LinkedHashMap<>();
        boolean allRead = true;
        for (Tree.Entry entry : fields.all()) {
            if (declared.speciesNames().contains(entry.key())
                    && !Section.RINSE_LIQUOR.keys().contains(entry.key())) {
                Content content = known.ofLiquor(entry.key(), entry.value());
                if (content == null) {
                    allRead = false;
                } else {
                    contents.put(entry.key(), content);
                }
            }
        }
        boolean densityBroken = density == null && fields.has("density");
        LiquorVolume assumed = volume == null ? new LiquorVolume.Unlimited(fields.place()) : volume;
        Liquor liquor = densityBroken || !allRead
                ? null
                : problems.attempt(() -> new Liquor(fields.place(), assumed, contents, othersZero, density));
        if (liquor != null) {
            problems.addAll(consistency.of(liquor, statesTemperature));
        }
        return volume == null ? null : liquor;
    }

    private @Nullable LiquorVolume volume(Fields fields) {
        String key = fields.oneOf(List.of("ratio", "volume"), "ratio: 2 L/kg, volume: 1200 L or volume: unlimited");
        Tree tree = key == null ? null : fields.get(key);
        if (key == null || tree == null) {
            return null;
        }
        if (key.equals("volume")
                && tree instanceof Tree.Leaf leaf
                && leaf.text().equals("unlimited")) {
            return new LiquorVolume.Unlimited(leaf.place());
        }
        boolean ratio = key.equals("ratio");
        Quantity value = known.quantity(key, tree, ratio ? Kind.LIQUOR_RATIO : Kind.VOLUME);
        return value == null
                ? null
                : problems.attempt(() -> ratio ? new LiquorVolume.Ratio(value) : new LiquorVolume.Volume(value));
    }

    private boolean othersZero(@Nullable Tree tree) {
        if (tree == null) {
            return false;
        }
        Tree.Leaf leaf = values.leaf("others", tree, "0");
        boolean zero = leaf != null
                && Measurement.of(leaf.text())
                        .filter(found -> found.number().signum() == 0)
                        .filter(found -> found.unit().isEmpty()
                                || Kind.PER_VOLUME.unit(found.unit()).isPresent()
                                || Kind.PER_MASS.unit(found.unit()).isPresent())
                        .isPresent();
        if (leaf != null && !zero) {
            problems.add(
                    leaf.place(),
                    "others can only be 0: found " + leaf.label()
                            + "; name each species the liquor holds, such as salt:" + " 30 g/L");
        }
        return true;
    }

    /** How a rinse is renewed: by the flow of its liquor or by its fills. */
    @Nullable
    Renewal renewal(Fields step, @Nullable Fields liquor) {
        Tree fills = step.get("fills");
        Tree flow = liquor == null ? null : liquor.get("flow");
        if (fills != null && flow != null) {
            problems.add(fills.place(), "a rinse is renewed by fills or by flow: found both; keep one");
            return null;
        }
        if (fills != null) {
            return fills(fills);
        }
        if (flow != null) {
            Quantity rate = known.quantity("flow", flow, Kind.FLOW);
            return rate == null ? null : problems.attempt(() -> new Renewal.Flow(rate));
        }
        return liquor == null ? null : new Renewal.Plenty();
    }

    private @Nullable Renewal fills(Tree tree) {
        Long count = values.count("fills", tree, "3");
        return count == null ? null : problems.attempt(() -> Renewal.Fills.of(count, tree.place()));
    }

    @Nullable
    Air air(@Nullable Tree tree) {
        Fields fields = tree == null ? null : Fields.of(tree, Section.AIR, problems);
        Tree equilibrium = fields == null ? null : fields.need("equilibrium", "{water: 60 g/kg}");
        Fields contents = equilibrium == null
                ? null
                : Fields.withSpecies(equilibrium, Section.BY_SPECIES, declared.speciesNames(), problems);
        if (fields == null || contents == null) {
            return null;
        }
        Map<String, Content> read = new LinkedHashMap<>();
        for (Tree.Entry entry : contents.all()) {
            if (declared.speciesNames().contains(entry.key())) {
                Content content = known.ofPiece(entry.key(), entry.value(), Section.EQUILIBRIUM);
                if (content == null) {
                    return null;
                }
                read.put(entry.key(), content);
            }
        }
        Air air = new Air(fields.place(), read);
        problems.addAll(consistency.of(air));
        return air;
    }
}
