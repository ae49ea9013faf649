package org.soakwright.planner.line.verify;

import java.util.List;
import java.util.Set;
import java.util.stream.Collectors;
import org.soakwright.recipes.model.line.Line;
import org.soakwright.recipes.model.line.Order;

/**
 * Checks a result of {@code line --json} against every rule of its line. It knows the rules as the guide says them and nothing of how the schedule
 * was made; what goes on in the pieces is followed anew with the times that the result states. Supplies, notes, and how much longer each step could
 * last are not checked.
 */
public final class Verification {
    private Verification() {}

    /**
     * What was found.
     *
     * @param faults a sentence each; none where the result keeps every rule
     * @param lots of the line, found in the result
     * @param steps checked, each fill for itself
     * @param targets read anew
     */
    public record Verdict(List<String> faults, int lots, int steps, int moves, int targets) {
        public Verdict {
            faults = List.copyOf(faults);
        }

        public boolean isFine() {
            return faults.isEmpty();
        }
    }

    /** Whatever the text is, it is answered and never thrown at. */
    public static Verdict of(Line line, String json) {
        Faults faults = new Faults();
        Result result = Tree.read(json, faults)
                .map(tree -> Result.of(tree, line.zone()))
                .orElse(null);
        return result == null || !faults.isEmpty()
                ? new Verdict(faults.all(), 0, 0, 0, 0)
                : checked(line, result, faults);
    }

    private static Verdict checked(Line line, Result result, Faults faults) {
        Wall wall = new Wall(line);
        List<Cargo> cargoes = new Cargoes(line, result, faults).all();
        Course course = new Course(line, wall, faults);
        Judge judge = new Judge(faults);
        boolean whole = true;
        for (Cargo cargo : cargoes) {
            if (course.check(cargo)) {
                judge.check(cargo);
            } else {
                whole = false;
            }
        }
        new Vessels(line, wall, faults).check(cargoes);
        Set<String> loads = result.lots().stream().map(Result.Entry::load).collect(Collectors.toSet());
        new Hands(line, wall, faults).check(cargoes, loads, result.moves());
        Sums sums = new Sums(line, wall, faults);
        sums.lots(cargoes);
        // Sums over loads that could not be made out would only repeat what is wrong with those.
        if (whole && cargoes.size() == loads.size()) {
            sums.whole(result, cargoes, judge.cost());
        }
        Set<String> orders = line.orders().stream().map(Order::lot).collect(Collectors.toSet());
        return new Verdict(
                faults.all(),
                (int) result.lots().stream()
                        .map(Result.Entry::lot)
                        .filter(orders::contains)
                        .distinct()
                        .count(),
                cargoes.stream().mapToInt(cargo -> cargo.parts().size()).sum(),
                result.moves().size(),
                judge.targets());
    }
}
