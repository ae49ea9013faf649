package org.soakwright.recipes.parsing;

import java.time.ZonedDateTime;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import org.jspecify.annotations.Nullable;
import org.soakwright.recipes.model.Quantity;
import org.soakwright.recipes.model.Reference;
import org.soakwright.recipes.model.line.Draw;
import org.soakwright.recipes.model.line.Outage;
import org.soakwright.recipes.model.line.Utility;
import org.soakwright.recipes.model.line.VesselGroup;
import org.soakwright.recipes.model.line.Volume;
import org.soakwright.recipes.text.Kind;
import org.soakwright.recipes.text.Place;
import org.soakwright.recipes.text.Problems;
import org.soakwright.recipes.text.Tree;

/** Reads the vessels of a line and the utilities they share. */
final class VesselReader {
    private static final String EVERY = "every";
    private static final String OUTAGES = "[{vessel: 2, from: 2026-03-03T06:00, to: 2026-03-03T14:00}]";

    private final Values values;
    private final Problems problems;
    private final Moments moments;

    VesselReader(Values values, Moments moments) {
        this.values = values;
        this.problems = values.problems();
        this.moments = moments;
    }

    /** Null where any is broken. */
    @Nullable
    List<VesselGroup> vessels(Tree tree) {
        Fields fields = Fields.open(tree, LineSection.VESSELS, problems);
        if (fields == null) {
            return null;
        }
        if (fields.all().isEmpty()) {
            problems.add(
                    fields.place(),
                    "a line has vessels: found none; write such as tank: {count: 3, serves: [soak], volume: {gross: 2500 L,"
                            + " usable: 90 %}}");
        }
        List<VesselGroup> groups = new ArrayList<>();
        for (Tree.Entry entry : fields.all()) {
            VesselGroup group = values.isName("the name of a vessel", entry.key(), entry.place()) ? group(entry) : null;
            if (group != null) {
                groups.add(group);
            }
        }
        return groups.size() < fields.all().size() || groups.isEmpty() ? null : groups;
    }

    /** What of a group names the steps it serves. */
    private record Served(Set<String> kinds, List<Reference> steps) {}

    private @Nullable VesselGroup group(Tree.Entry entry) {
        Fields fields = Fields.of(entry.value(), LineSection.VESSEL, problems);
        if (fields == null) {
            return null;
        }
        Integer count = values.whole("count", fields.need("count", "3"), "3");
        Served served = served(fields.need("serves", "[soak, rinse]"));
        Tree volumeTree = fields.get("volume");
        Volume volume = volumeTree == null ? null : volume(volumeTree);
        Quantity capacity = values.quantity("capacity", fields.get("capacity"), Kind.MASS);
        Quantity turnaround = values.quantity("turnaround", fields.get("turnaround"), Kind.DURATION);
        List<Outage> outages = values.each("outages", fields.get("outages"), OUTAGES, one -> outage(one, count));
        Map<String, Draw> draws = draws(fields.get("draws"));
        boolean broken = (volume == null && volumeTree != null)
                || (capacity == null && fields.has("capacity"))
                || (turnaround == null && fields.has("turnaround"));
        return count == null || served == null || outages == null || draws == null || broken
                ? null
                : problems.attempt(() -> new VesselGroup(
                        entry.place(),
                        entry.key(),
                        count,
                        served.kinds(),
                        served.steps(),
                        volume,
                        capacity,
                        turnaround,
                        outages,
                        draws));
    }

    private @Nullable Served served(@Nullable Tree tree) {
        if (tree == null) {
            return null;
        }
        List<Tree> items = tree instanceof Tree.Items list ? list.items() : List.of(tree);
        Set<String> kinds = new LinkedHashSet<>();
        Map<String, Reference> steps = new LinkedHashMap<>();
        boolean whole = true;
        for (Tree item : items) {
            String name = values.name("serves", item, "[soak, rinse]");
            if (name == null) {
                whole = false;
                continue;
            }
            boolean isNew = VesselGroup.KINDS.contains(name)
                    ? kinds.add(name)
                    : steps.putIfAbsent(name, new Reference(name, item.place())) == null;
            if (!isNew) {
                problems.add(item.place(), "serves names \"" + name + "\" twice; keep one");
                whole = false;
            }
        }
        if (items.isEmpty()) {
            problems.add(tree.place(), "serves: found an empty list; write such as [soak, rinse]");
        }
        return whole && !items.isEmpty() ? new Served(kinds, List.copyOf(steps.values())) : null;
    }

    private @Nullable Volume volume(Tree tree) {
        Fields fields = Fields.of(tree, LineSection.VESSEL_VOLUME, problems);
        if (fields == null) {
            return null;
        }
        Quantity gross = values.quantity("gross", fields.need("gross", "2500 L"), Kind.VOLUME);
        Quantity usable = values.quantity("usable", fields.need("usable", "90 %"), Kind.FRACTION);
        return gross == null || usable == null
                ? null
                : problems.attempt(() -> new Volume(fields.place(), gross, usable));
    }

    private @Nullable Outage outage(Tree tree, @Nullable Integer count) {
        Fields fields = Fields.of(tree, LineSection.OUTAGE, problems);
        if (fields == null) {
            return null;
        }
        Integer vessel = vessel(fields, count);
        ZonedDateTime from = moments.dateTime("from", fields.need("from", "2026-03-03T06:00"));
        ZonedDateTime to = moments.dateTime("to", fields.need("to", "2026-03-03T14:00"));
        Tree reasonTree = fields.get("reason");
        String reason = values.name("reason", reasonTree, "inspection");
        boolean broken = reason == null && reasonTree != null;
        return vessel == null || from == null || to == null || broken
                ? null
                : problems.attempt(() -> new Outage(fields.place(), vessel, from, to, reason));
    }

    /** Which of the group: it has to be said where there are several. */
    private @Nullable Integer vessel(Fields fields, @Nullable Integer count) {
        Tree tree = fields.get("vessel");
        if (tree == null) {
            if (count == null || count == 1) {
                return Outage.EVERY;
            }
            problems.add(
                    fields.place(),
                    "an outage is of one vessel or of every one: found " + count
                            + " and none named; write such as vessel: 2, or vessel: every");
            return null;
        }
        if (tree instanceof Tree.Leaf leaf && leaf.text().equals(EVERY)) {
            return Outage.EVERY;
        }
        Integer vessel = values.whole("vessel", tree, "2, or every");
        if (vessel != null && (vessel < 1 || (count != null && vessel > count))) {
            problems.add(
                    tree.place(),
                    "there is no such vessel: found " + tree.label() + (count == null ? "" : " of " + count)
                            + "; write a number from 1, or every");
            return null;
        }
        return vessel;
    }

    private @Nullable Map<String, Draw> draws(@Nullable Tree tree) {
        Map<String, Draw> draws = new LinkedHashMap<>();
        Fields fields = tree == null ? null : Fields.open(tree, LineSection.DRAWS, problems);
        if (fields == null) {
            return tree == null ? draws : null;
        }
        boolean whole = true;
        for (Tree.Entry entry : fields.all()) {
            Draw draw = draw(entry);
            whole &= draw != null;
            if (draw != null) {
                draws.put(entry.key(), draw);
            }
        }
        return whole ? draws : null;
    }

    private @Nullable Draw draw(Tree.Entry entry) {
        Place place = entry.value().place();
        if (entry.value() instanceof Tree.Leaf leaf && leaf.text().equals("flow")) {
            return new Draw.Flow(place);
        }
        Quantity value = values.quantity(entry.key(), entry.value(), Utility.KINDS);
        return value == null ? null : problems.attempt(() -> new Draw.Steady(value));
    }

    /** Null where any is broken. */
    @Nullable
    List<Utility> utilities(@Nullable Tree tree) {
        Fields fields = tree == null ? null : Fields.open(tree, LineSection.UTILITIES, problems);
        if (fields == null) {
            return tree == null ? List.of() : null;
        }
        List<Utility> utilities = new ArrayList<>();
        for (Tree.Entry entry : fields.all()) {
            boolean named = values.isName("the name of a utility", entry.key(), entry.place());
            Quantity atMost = values.quantity(entry.key(), entry.value(), Utility.KINDS);
            Utility utility = atMost == null || !named
                    ? null
                    : problems.attempt(() -> new Utility(entry.place(), entry.key(), atMost));
            if (utility != null) {
                utilities.add(utility);
            }
        }
        return utilities.size() < fields.all().size() ? null : utilities;
    }
}
