package org.soakwright.planner.report.compare;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.BiPredicate;
import java.util.function.Function;

/** Which of one list goes with which of another: those of the same name that stand in the same order, then what lies between them. */
final class Pairing {
    private Pairing() {}

    /** At least one of them. */
    record Pair<T>(Optional<T> a, Optional<T> b) {
        /** What to call both: the name they share, or both names. */
        String label(Function<T, String> name) {
            String first = a.map(name).orElse("");
            String second = b.map(name).orElse("");
            if (first.isEmpty() || second.isEmpty()) {
                return first + second;
            }
            return first.equals(second) ? first : first + " / " + second;
        }
    }

    /**
     * Pairs two lists.
     *
     * @param name by which they are known
     * @param alike whether two of different names are paired all the same
     */
    static <T> List<Pair<T>> of(List<T> a, List<T> b, Function<T, String> name, BiPredicate<T, T> alike) {
        int[][] common = new int[a.size() + 1][b.size() + 1];
        for (int i = a.size() - 1; i >= 0; i--) {
            for (int j = b.size() - 1; j >= 0; j--) {
                common[i][j] = name.apply(a.get(i)).equals(name.apply(b.get(j)))
                        ? common[i + 1][j + 1] + 1
                        : Math.max(common[i + 1][j], common[i][j + 1]);
            }
        }
        List<Pair<T>> pairs = new ArrayList<>();
        List<T> left = new ArrayList<>();
        List<T> right = new ArrayList<>();
        int i = 0;
        int j = 0;
        while (i < a.size() && j < b.size()) {
            if (name.apply(a.get(i)).equals(name.apply(b.get(j)))) {
                between(left, right, alike, pairs);
                pairs.add(new Pair<>(Optional.of(a.get(i)), Optional.of(b.get(j))));
                i++;
                j++;
            } else if (common[i + 1][j] >= common[i][j + 1]) {
                left.add(a.get(i));
                i++;
            } else {
                right.add(b.get(j));
                j++;
            }
        }
        left.addAll(a.subList(i, a.size()));
        right.addAll(b.subList(j, b.size()));
        between(left, right, alike, pairs);
        return List.copyOf(pairs);
    }

    private static <T> void between(List<T> left, List<T> right, BiPredicate<T, T> alike, List<Pair<T>> pairs) {
        while (!left.isEmpty() || !right.isEmpty()) {
            if (left.isEmpty()) {
                pairs.add(new Pair<>(Optional.empty(), Optional.of(right.remove(0))));
            } else if (!right.isEmpty() && alike.test(left.get(0), right.get(0))) {
                pairs.add(new Pair<>(Optional.of(left.remove(0)), Optional.of(right.remove(0))));
            } else {
                pairs.add(new Pair<>(Optional.of(left.remove(0)), Optional.empty()));
            }
        }
    }
}
