package org.soakwright.planner.line.constraint;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.soakwright.planner.line.shop.Shop;
import org.soakwright.planner.line.shop.Station;

/** Stations of which one is as good as another at any time: alike, never closed, holding one job each. Any other is alone. */
final class Pools {
    private final List<List<Integer>> pools = new ArrayList<>();
    private final int[] poolOf;

    Pools(Shop shop) {
        poolOf = new int[shop.stations().size()];
        Map<Integer, Integer> byGroup = new LinkedHashMap<>();
        for (int s = 0; s < poolOf.length; s++) {
            Station station = shop.stations().get(s);
            Integer pool = null;
            if (station.closed().isEmpty() && !station.holdsMany()) {
                pool = byGroup.get(station.group());
                if (pool == null) {
                    byGroup.put(station.group(), pools.size());
                }
            }
            if (pool == null) {
                pool = pools.size();
                pools.add(new ArrayList<>());
            }
            poolOf[s] = pool;
            pools.get(pool).add(s);
        }
    }

    int of(int station) {
        return poolOf[station];
    }

    List<Integer> stations(int pool) {
        return pools.get(pool);
    }
}
