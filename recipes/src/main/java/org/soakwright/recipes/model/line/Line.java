package org.soakwright.recipes.model.line;

import java.time.Instant;
import java.time.LocalDateTime;
import java.time.ZoneId;
import java.time.ZonedDateTime;
import java.util.ArrayList;
import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.jspecify.annotations.Nullable;
import org.soakwright.recipes.model.Recipe;
import org.soakwright.recipes.model.Step;
import org.soakwright.recipes.text.Place;
import org.soakwright.recipes.text.Problem;
import org.soakwright.recipes.text.Unsound;

/**
 * A whole line, all of whose parts agree: vessels and crew, and the lots that share them.
 *
 * @param zone whose clock all times are read by
 * @param vessels one group or more
 * @param crew null where moves happen at any time
 * @param orders one or more, up to 5000, of different lots
 * @param minimise what is to be least, first first; one or more
 */
public record Line(
        Place place,
        String title,
        ZonedDateTime starts,
        ZoneId zone,
        List<VesselGroup> vessels,
        @Nullable Crew crew,
        Moves moves,
        List<Utility> utilities,
        List<Order> orders,
        List<LineGoal> minimise) {
    public Line {
        vessels = List.copyOf(vessels);
        utilities = List.copyOf(utilities);
        orders = List.copyOf(orders);
        minimise = List.copyOf(minimise);
        if (!starts.getZone().equals(zone) || (crew != null && !crew.zone().equals(zone))) {
            throw new IllegalArgumentException("a line has one clock: " + zone);
        }
        Minutes.require("the start", starts, place);
        Map<String, Recipe> recipes = byFile(orders);
        List<Problem> problems = new ArrayList<>(Agreement.counts(place, title, vessels, orders, minimise));
        problems.addAll(Agreement.ofNames(vessels, utilities));
        problems.addAll(Agreement.ofOrders(orders, starts));
        vessels.forEach(group -> {
            problems.addAll(Agreement.ofServes(group, recipes.values()));
            problems.addAll(Agreement.ofLiquor(group, recipes));
        });
        for (VesselGroup group : vessels) {
            problems.addAll(Agreement.ofDraws(group, utilities, recipes));
        }
        problems.addAll(Agreement.unserved(place, vessels, recipes));
        problems.addAll(Agreement.ofGoals(minimise, recipes, place));
        if (crew != null) {
            problems.addAll(Agreement.ofCrew(crew, moves, starts.toInstant()));
        }
        if (!problems.isEmpty()) {
            throw new Unsound(problems);
        }
    }

    private static Map<String, Recipe> byFile(List<Order> orders) {
        Map<String, Recipe> recipes = new LinkedHashMap<>();
        orders.forEach(order -> recipes.putIfAbsent(order.recipeFile(), order.recipe()));
        return Collections.unmodifiableMap(recipes);
    }

    /** Each recipe once, by the name that the line has for it, in the order of the lots. */
    public Map<String, Recipe> recipes() {
        return byFile(orders);
    }

    public Optional<Order> order(String lot) {
        return orders.stream().filter(one -> one.lot().equals(lot)).findFirst();
    }

    /** The vessels in which a step may run. */
    public List<VesselGroup> serving(Step step) {
        return vessels.stream().filter(group -> group.serves(step)).toList();
    }

    public Optional<Utility> utility(String name) {
        return utilities.stream().filter(one -> one.name().equals(name)).findFirst();
    }

    /** Whether a move that begins then is one at night; without a crew the night is from 22:00 to 06:00. */
    public boolean isNight(Instant time) {
        return crew == null
                ? Night.usual(place)
                        .contains(LocalDateTime.ofInstant(time, zone).toLocalTime())
                : crew.isNight(time);
    }
}
