package org.soakwright.planner.line.shop;

import java.util.List;

/**
 * Where jobs go through.
 *
 * @param utilities most that may be drawn of each at once
 */
public record Shop(List<Station> stations, Staffing staffing, Carriage carriage, List<Long> utilities) {
    public Shop {
        stations = List.copyOf(stations);
        utilities = List.copyOf(utilities);
    }
}
