package org.soakwright.planner.report.line;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.IdentityHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import org.jspecify.annotations.Nullable;
import org.soakwright.planner.line.LinePlan;
import org.soakwright.planner.line.Load;
import org.soakwright.planner.line.LoadPlan;
import org.soakwright.planner.line.shop.Aim;
import org.soakwright.planner.line.shop.Carriage;
import org.soakwright.recipes.model.Recipe;
import org.soakwright.recipes.model.line.Order;

/** A planned line as it is to be told: every lot, move and fill once, in the order of time. */
final class Account {
    private final LinePlan plan;
    private final List<Lot> lots = new ArrayList<>();
    private final IdentityHashMap<LoadPlan, List<Lot>> byLoad = new IdentityHashMap<>();
    private final IdentityHashMap<LoadPlan.LegPlan, List<Supply>> byLeg = new IdentityHashMap<>();
    private final List<Move> moves;
    private final List<Supply> supplies;
    private final Warnings warnings;

    /**
     * A lot, or the part of one that is in a load.
     *
     * @param loaded when its first move begins, s
     * @param done when it is out of its last vessel, s
     * @param late s
     */
    record Lot(LoadPlan load, Load.Share share, long loaded, long done, long late) {
        String name() {
            return share.name();
        }

        Order order() {
            return share.order();
        }

        List<String> why() {
            return late > 0 ? load.late() : List.of();
        }
    }

    Account(LinePlan plan) {
        this.plan = plan;
        Carriage carriage = plan.schedule().shop().carriage();
        for (LoadPlan load : plan.loads()) {
            for (Load.Share share : load.load().shares()) {
                Lot lot = new Lot(
                        load,
                        share,
                        load.placed().begins(carriage),
                        load.placed().finishes(carriage),
                        plan.late(load, share));
                lots.add(lot);
                byLoad.computeIfAbsent(load, key -> new ArrayList<>()).add(lot);
            }
        }
        warnings = new Warnings(plan.loads());
        moves = Moves.of(plan);
        supplies = Supplies.of(plan);
        supplies.forEach(supply ->
                byLeg.computeIfAbsent(supply.leg(), key -> new ArrayList<>()).add(supply));
    }

    LinePlan plan() {
        return plan;
    }

    List<Lot> lots() {
        return List.copyOf(lots);
    }

    List<Move> moves() {
        return moves;
    }

    List<Supply> supplies() {
        return supplies;
    }

    /** The lots that share a load. */
    List<Lot> lots(LoadPlan load) {
        return byLoad.getOrDefault(load, List.of());
    }

    /** What a leg needs, as it begins and day by day. */
    List<Supply> supplies(LoadPlan.LegPlan leg) {
        return byLeg.getOrDefault(leg, List.of());
    }

    /** The one of a load that is latest; empty where none is late. */
    Optional<Lot> latest(LoadPlan load) {
        return lots(load).stream().filter(lot -> lot.late() > 0).max(Comparator.comparingLong(Lot::late));
    }

    /** Out of their last vessel after they were due. */
    List<Lot> lateLots() {
        return lots.stream().filter(lot -> lot.late() > 0).toList();
    }

    List<LoadPlan> missing() {
        return plan.loads().stream().filter(load -> !load.met()).toList();
    }

    Warnings warnings() {
        return warnings;
    }

    /** What forbids to use the plan until somebody answers for it, each with whose it is. */
    List<String> stops() {
        return words(warnings.stops());
    }

    /** Every caution once, with whose it is. */
    List<String> cautions() {
        return words(warnings.shown());
    }

    private List<String> words(List<Warnings.Warning> some) {
        return some.stream()
                .map(warning -> warnings.whose(warning, this::recipeTitle) + warning.words())
                .toList();
    }

    /** Whether every target is met, no lot late and nothing forbids to use it. */
    boolean isGood() {
        return plan.keepsEverything() && stops().isEmpty();
    }

    /** Each recipe once, by its file, in the order of the lots. */
    List<String> recipeFiles() {
        return List.copyOf(plan.line().recipes().keySet());
    }

    String recipeTitle(String file) {
        Recipe recipe = plan.line().recipes().get(file);
        return recipe == null ? file : recipe.title();
    }

    /** What all prices are in; empty where there are none, or several. */
    Optional<String> currency() {
        Set<String> found = new LinkedHashSet<>();
        plan.line().recipes().values().forEach(recipe -> recipe.currency().ifPresent(found::add));
        return found.size() == 1 ? found.stream().findFirst() : Optional.empty();
    }

    OptionalDouble cost() {
        return currency().isPresent() ? OptionalDouble.of(Aim.COST.of(plan.schedule())) : OptionalDouble.empty();
    }

    /** When the first of a load's lots is due, s; null where none is. */
    @Nullable
    Long due(LoadPlan load) {
        return load.load().shares().stream()
                .map(share -> share.order().due())
                .filter(java.util.Objects::nonNull)
                .map(due -> plan.clock().seconds(due))
                .min(Comparator.naturalOrder())
                .orElse(null);
    }
}
