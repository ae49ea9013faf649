package org.soakwright.planner.report.line;

import java.time.LocalDate;
import java.time.ZonedDateTime;
import java.util.ArrayList;
import java.util.Collections;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import java.util.TreeMap;
import org.soakwright.planner.conditions.Known;
import org.soakwright.planner.line.Clock;
import org.soakwright.planner.line.LinePlan;
import org.soakwright.planner.line.LoadPlan;
import org.soakwright.recipes.model.Medium;
import org.soakwright.recipes.model.Recipe;
import org.soakwright.recipes.model.Renewal;
import org.soakwright.recipes.model.Species;
import org.soakwright.recipes.model.Step;

/** The order of water and chemicals: every fill on the day on which its leg begins, what runs in on the days on which it does. */
final class Supplies {
    private static final double LITRES = 1000;

    private final Clock clock;
    private final List<Supply> supplies = new ArrayList<>();

    private Supplies(Clock clock) {
        this.clock = clock;
    }

    static List<Supply> of(LinePlan plan) {
        Supplies all = new Supplies(plan.clock());
        for (LoadPlan load : plan.loads()) {
            Recipe recipe = Known.of(load.load().recipe()).recipe();
            for (LoadPlan.LegPlan leg : load.legs()) {
                if (recipe.steps().get(leg.leg().step()) instanceof Step.Wet wet) {
                    all.add(recipe, wet, load, leg);
                }
            }
        }
        all.supplies.sort(Comparator.comparingLong(Supply::from)
                .thenComparing(supply -> supply.leg().vessel())
                .thenComparing(supply -> supply.load().load().name())
                .thenComparing(Supply::running));
        return List.copyOf(all.supplies);
    }

    private void add(Recipe recipe, Step.Wet wet, LoadPlan load, LoadPlan.LegPlan leg) {
        Map<String, Double> strengths = strengths(recipe, wet);
        OptionalDouble volume = wet.liquor().volumeM3(recipe.lot());
        OptionalDouble litres =
                volume.isPresent() ? OptionalDouble.of(volume.getAsDouble() * LITRES) : OptionalDouble.empty();
        LocalDate first = clock.at(leg.start()).toLocalDate();
        supplies.add(new Supply(first, load, leg, false, leg.start(), litres, strengths));
        if (wet instanceof Step.Rinse rinse && rinse.renewal() instanceof Renewal.Flow flow) {
            running(load, leg, flow.rate().si() * LITRES, strengths);
        }
    }

    /** Cut at every local midnight. */
    private void running(LoadPlan load, LoadPlan.LegPlan leg, double litresPerSecond, Map<String, Double> strengths) {
        long from = leg.start();
        while (from < leg.end()) {
            LocalDate day = clock.at(from).toLocalDate();
            ZonedDateTime midnight = day.plusDays(1).atStartOfDay(clock.zone());
            long until = Math.min(leg.end(), clock.seconds(midnight));
            supplies.add(new Supply(
                    day, load, leg, true, from, OptionalDouble.of(litresPerSecond * (until - from)), strengths));
            from = until;
        }
    }

    private static Map<String, Double> strengths(Recipe recipe, Step.Wet wet) {
        Map<String, Double> strengths = new LinkedHashMap<>();
        for (Species species : recipe.species()) {
            double strength = wet.liquor().kgPerM3(species.name());
            if (species.exchangesWith(Medium.LIQUOR) && strength > 0) {
                strengths.put(species.name(), strength);
            }
        }
        return Collections.unmodifiableMap(strengths);
    }

    /** What one day needs: litres of all liquors that are counted, kg of each species. */
    record Day(LocalDate day, double litres, Map<String, Double> kg, boolean complete) {}

    /** Every day on which something is needed. */
    static List<Day> byDay(List<Supply> supplies) {
        Map<LocalDate, List<Supply>> days = new TreeMap<>();
        supplies.forEach(supply ->
                days.computeIfAbsent(supply.day(), key -> new ArrayList<>()).add(supply));
        List<Day> sums = new ArrayList<>();
        days.forEach((day, own) -> {
            double litres = 0;
            boolean complete = true;
            Map<String, Double> kg = new LinkedHashMap<>();
            for (Supply supply : own) {
                litres += supply.litres().orElse(0);
                complete &= supply.litres().isPresent();
                supply.strengths().keySet().forEach(species -> kg.merge(species, supply.kg(species), Double::sum));
            }
            sums.add(new Day(day, litres, Collections.unmodifiableMap(kg), complete));
        });
        return List.copyOf(sums);
    }

    /** The species that any liquor holds, in the order in which they are needed. */
    static List<String> species(List<Supply> supplies) {
        return supplies.stream()
                .flatMap(supply -> supply.strengths().keySet().stream())
                .distinct()
                .toList();
    }
}
