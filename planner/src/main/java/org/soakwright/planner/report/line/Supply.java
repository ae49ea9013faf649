package org.soakwright.planner.report.line;

import java.time.LocalDate;
import java.util.Map;
import java.util.OptionalDouble;
import org.soakwright.planner.line.LoadPlan;

/**
 * Liquor that has to be there on a day.
 *
 * @param running whether it runs in while the leg lasts; else it is made up when the leg begins
 * @param from since when it is needed on that day, s from the line's start
 * @param litres empty where the liquor is unlimited and not counted
 * @param strengths g/L of each species that it holds
 */
record Supply(
        LocalDate day,
        LoadPlan load,
        LoadPlan.LegPlan leg,
        boolean running,
        long from,
        OptionalDouble litres,
        Map<String, Double> strengths) {
    /** What is dissolved in it of a species, kg. */
    double kg(String species) {
        return strengths.getOrDefault(species, 0.0) * litres.orElse(0) / 1000;
    }
}
