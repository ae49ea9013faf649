package org.soakwright.solver.chain;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.soakwright.solver.stage.Bath;
import org.soakwright.solver.stage.Bathing;
import org.soakwright.solver.stage.Conditions;
import org.soakwright.solver.stage.Product;

/** Passages through liquors, prepared and kept for the gradients and equal fills that ask again; those used last stay longest. */
final class Passages {
    /** Unknowns of those kept, some eight megabytes. */
    private static final int MOST_KEPT = 60_000;

    /** Kept whatever their size. */
    private static final int FEWEST_KEPT = 3;

    private final Map<Wanted, Bathing> kept = new LinkedHashMap<>(16, 0.75f, true);

    private record Wanted(Fineness fineness, Conditions conditions, double seconds) {}

    Bathing of(Fineness fineness, List<Product> lot, Conditions conditions, double seconds) {
        Wanted wanted = new Wanted(fineness, conditions, seconds);
        Bathing known = kept.get(wanted);
        if (known == null) {
            int unknowns = lot.stream().mapToInt(Product::size).sum();
            while (kept.size() >= Math.max(FEWEST_KEPT, MOST_KEPT / unknowns)) {
                kept.remove(kept.keySet().iterator().next());
            }
            known = new Bathing(lot, (Bath.Vessel) conditions.bath(), seconds);
            kept.put(wanted, known);
        }
        return known;
    }
}
