package org.soakwright.recipes.parsing;

import java.math.BigDecimal;
import java.time.ZonedDateTime;
import java.util.ArrayList;
import java.util.Collections;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import org.jspecify.annotations.Nullable;
import org.soakwright.recipes.model.Names;
import org.soakwright.recipes.model.Quantity;
import org.soakwright.recipes.model.Recipe;
import org.soakwright.recipes.model.Reference;
import org.soakwright.recipes.model.line.Agreement;
import org.soakwright.recipes.model.line.Order;
import org.soakwright.recipes.text.Kind;
import org.soakwright.recipes.text.Place;
import org.soakwright.recipes.text.Problem;
import org.soakwright.recipes.text.Problems;
import org.soakwright.recipes.text.Source;
import org.soakwright.recipes.text.Tree;

/** Reads the lots of a line, written into it or in a list beside it, and the recipes they follow, each once. */
final class OrderReader {
    private static final String LOTS = "[{lot: L1, recipe: loin-desalting.yaml, mass: 600 kg, due: 2026-03-05T18:00}]";

    private final Values values;
    private final Problems problems;
    private final Moments moments;
    private final LineFiles files;
    private final @Nullable ZonedDateTime starts;
    private final Map<String, Recipe> recipes = new LinkedHashMap<>();
    private final Set<String> unread = new HashSet<>();
    private final List<Reference> names = new ArrayList<>();
    private boolean whole = true;

    /** @param starts of the line; null where it could not be read: then no lot is held against it */
    OrderReader(Values values, Moments moments, LineFiles files, @Nullable ZonedDateTime starts) {
        this.values = values;
        this.problems = values.problems();
        this.moments = moments;
        this.files = files;
        this.starts = starts;
    }

    /** Every recipe that could be read, by its name, once the lots are read. */
    Map<String, Recipe> recipes() {
        return Collections.unmodifiableMap(recipes);
    }

    /** Whether the recipe of every lot could be read. */
    boolean knowsAllRecipes() {
        return whole && unread.isEmpty();
    }

    /** Those that could be read. */
    List<Order> orders(Tree tree) {
        List<Order> orders = new ArrayList<>();
        if (tree instanceof Tree.Leaf leaf) {
            orders.addAll(listed(leaf));
        } else if (tree instanceof Tree.Items items) {
            if (items.items().isEmpty()) {
                problems.add(tree.place(), "a line has lots: found an empty list; write such as " + LOTS);
            }
            orders.addAll(all(items.items(), Integer.MAX_VALUE, tree.place()));
        } else {
            whole = false;
            if (!(tree instanceof Tree.Broken)) {
                problems.add(
                        tree.place(),
                        "lots is a list, or the name of one: found " + tree.label() + "; write such as " + LOTS
                                + ", or orders.csv");
            }
        }
        problems.addAll(Names.duplicates("lots", names));
        return orders;
    }

    private List<Order> listed(Tree.Leaf leaf) {
        String name = values.name("lots", leaf, "orders.csv");
        Source source = name == null ? null : problems.attempt(() -> files.lots(name, leaf.place()));
        LotList list = source == null ? null : new LotList(source, problems);
        List<Tree> rows = list == null ? null : list.rows();
        whole &= list != null && rows != null && list.isWhole();
        return source == null || rows == null ? List.of() : all(rows, LotList.MOST_PROBLEMS, Place.of(source.file()));
    }

    /** @param mostBroken after so many that cannot be read the rest is left unread */
    private List<Order> all(List<Tree> trees, int mostBroken, Place place) {
        List<Problem> tooMany = Agreement.ifTooMany(place, trees.size());
        problems.addAll(tooMany);
        List<Order> orders = new ArrayList<>();
        int broken = 0;
        for (Tree tree : tooMany.isEmpty() ? trees : List.<Tree>of()) {
            Order order = order(tree);
            if (order != null) {
                orders.add(order);
            } else if (++broken >= mostBroken) {
                problems.add(place, "there may be more to correct after the first " + broken + " lots that are wrong");
                break;
            }
        }
        whole &= tooMany.isEmpty() && broken < mostBroken;
        return orders;
    }

    private @Nullable Order order(Tree tree) {
        Fields fields = Fields.of(tree, LineSection.ORDER, problems);
        if (fields == null) {
            whole = false;
            return null;
        }
        Tree lotTree = fields.need("lot", "L1");
        String lot = values.name("lot", lotTree, "L1");
        if (lotTree != null && lot != null) {
            names.add(new Reference(lot, lotTree.place()));
        }
        Tree recipeTree = fields.need("recipe", "loin-desalting.yaml");
        String file = values.name("recipe", recipeTree, "loin-desalting.yaml");
        Recipe recipe = recipeTree == null || file == null ? null : recipe(file, recipeTree.place());
        whole &= file != null;
        Quantity mass = values.checked(
                values.quantity("mass", fields.need("mass", "600 kg"), Kind.MASS), found -> found.positive("the mass"));
        Times times = times(fields);
        BigDecimal priority = priority(fields.get("priority"));
        Truth alone = fields.has("alone") ? values.word("alone", fields.get("alone"), Truth.class) : Truth.FALSE;
        return lot == null
                        || file == null
                        || recipe == null
                        || mass == null
                        || times == null
                        || priority == null
                        || alone == null
                ? null
                : problems.attempt(() -> new Order(
                        fields.place(),
                        lot,
                        file,
                        recipe,
                        mass,
                        times.ready(),
                        times.due(),
                        priority,
                        alone == Truth.TRUE));
    }

    private record Times(ZonedDateTime ready, @Nullable ZonedDateTime due) {}

    /** Null where one is broken, or they contradict each other. */
    private @Nullable Times times(Fields fields) {
        Tree readyTree = fields.get("ready");
        Tree dueTree = fields.get("due");
        ZonedDateTime ready = readyTree == null ? starts : moments.dateTime("ready", readyTree);
        ZonedDateTime due = moments.dateTime("due", dueTree);
        if (ready == null || (due == null && dueTree != null)) {
            return null;
        }
        List<Problem> found = new ArrayList<>();
        if (dueTree != null && due != null) {
            found.addAll(Order.ifDueTooEarly(dueTree.place(), ready, due));
        }
        if (readyTree != null && starts != null) {
            found.addAll(Agreement.ifTooFar(readyTree.place(), ready, starts));
        }
        problems.addAll(found);
        return found.isEmpty() ? new Times(ready, due) : null;
    }

    private @Nullable BigDecimal priority(@Nullable Tree tree) {
        if (tree == null) {
            return BigDecimal.ONE;
        }
        BigDecimal priority = values.number("priority", tree, "2");
        List<Problem> found = priority == null ? List.of() : Order.ifNoPriority(tree.place(), priority);
        problems.addAll(found);
        return found.isEmpty() ? priority : null;
    }

    /** Said once of a recipe that cannot be read, at the first lot that follows it. */
    private @Nullable Recipe recipe(String name, Place place) {
        Recipe known = recipes.get(name);
        if (known != null || unread.contains(name)) {
            return known;
        }
        Recipe read = problems.attempt(() -> files.recipe(name, place));
        if (read == null) {
            unread.add(name);
            return null;
        }
        recipes.put(name, read);
        return read;
    }
}
