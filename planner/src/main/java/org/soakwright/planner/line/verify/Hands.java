package org.soakwright.planner.line.verify;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import org.jspecify.annotations.Nullable;
import org.soakwright.recipes.model.line.Line;
import org.soakwright.recipes.model.line.Order;
import org.soakwright.recipes.text.Shown;

/** Whether everything is moved that has to be and nothing else, by people and hoists that are there. */
final class Hands {
    private static final String CHANGEOVER = "changeover";

    /** Changes the liquor around a lot that stays. */
    private static final int HEADS_OF_A_CHANGEOVER = 1;

    /** No move is longer; of one that is, it is told otherwise. */
    private static final long A_YEAR = 366 * 86_400;

    private final Line line;
    private final Wall wall;
    private final Faults faults;

    Hands(Line line, Wall wall, Faults faults) {
        this.line = line;
        this.wall = wall;
        this.faults = faults;
    }

    /**
     * Checks all moves.
     *
     * @param names of all loads, also of those whose steps are none of their recipe's
     */
    void check(List<Cargo> cargoes, Set<String> names, List<Result.Move> moves) {
        Map<String, List<Result.Move>> byLoad = new LinkedHashMap<>();
        for (Result.Move move : moves) {
            if (!names.contains(move.load())) {
                faults.add("The " + move.way() + " at " + wall.at(move.start()) + " is of " + Shown.quoted(move.load())
                        + ", one of the loads would be right.");
            }
            byLoad.computeIfAbsent(move.load(), name -> new ArrayList<>()).add(move);
            asked(move);
        }
        for (Cargo cargo : cargoes) {
            whole(cargo, new ArrayList<>(byLoad.getOrDefault(cargo.name(), List.of())));
            ready(cargo);
        }
        people(moves);
        hoists(moves);
    }

    private boolean isChangeover(Result.Move move) {
        return move.kind().equals(CHANGEOVER);
    }

    private int heads(Result.Move move) {
        return isChangeover(move) ? HEADS_OF_A_CHANGEOVER : line.moves().heads();
    }

    /** What it says that it needs. */
    private void asked(Result.Move move) {
        String what = move.load() + ": the " + move.way() + " at " + wall.at(move.start());
        if (line.crew() != null && move.heads() != heads(move)) {
            faults.add(what + " takes " + Faults.count(move.heads(), "head") + ", " + heads(move) + " would be right.");
        }
        if (move.hoist() == isChangeover(move)) {
            faults.add(what + (move.hoist() ? " takes a hoist, none" : " takes no hoist, one") + " would be right.");
        }
        if (move.end() < move.start()) {
            faults.add(what + " ends at " + wall.at(move.end()) + ", after its start would be right.");
        }
    }

    private List<Result.Move> needed(Cargo cargo) {
        List<Result.Move> needed = new ArrayList<>();
        long takes = line.moves().seconds();
        long landed = cargo.first().stint().from();
        long pulled = cargo.last().stint().until();
        // A move that takes no time is none.
        if (takes > 0) {
            needed.add(move(cargo, "load", null, cargo.first().stint().vessel(), landed - takes, landed));
        }
        for (int k = 1; k < cargo.parts().size(); k++) {
            Cargo.Part part = cargo.parts().get(k);
            Result.Stint from = cargo.parts().get(k - 1).stint();
            Result.Stint to = part.stint();
            if (part.isLifted()) {
                if (takes > 0) {
                    needed.add(move(cargo, "transfer", from.vessel(), to.vessel(), from.until(), to.from()));
                }
            } else if (changes(cargo, part)) {
                needed.add(move(cargo, CHANGEOVER, from.vessel(), to.vessel(), from.until(), to.from()));
            }
        }
        if (takes > 0) {
            needed.add(move(cargo, "unload", cargo.last().stint().vessel(), null, pulled, pulled + takes));
        }
        return needed;
    }

    private static boolean changes(Cargo cargo, Cargo.Part part) {
        return (part.fill() > 0 ? part.step().gapBetweenFills() : cargo.recipe().gapBefore(part.index())).lasts();
    }

    private static Result.Move move(
            Cargo cargo, String kind, @Nullable String from, @Nullable String to, long start, long end) {
        return new Result.Move(
                kind, cargo.name(), Optional.ofNullable(from), Optional.ofNullable(to), start, end, 0, false);
    }

    private void whole(Cargo cargo, List<Result.Move> found) {
        List<Result.Move> missing = new ArrayList<>();
        for (Result.Move move : needed(cargo)) {
            if (!take(found, move)) {
                missing.add(move);
            }
        }
        for (Result.Move move : missing) {
            Optional<Result.Move> alike =
                    found.stream().filter(one -> one.way().equals(move.way())).findFirst();
            String right = wall.at(move.start()) + " to " + wall.at(move.end()) + " would be right.";
            if (alike.isPresent()) {
                found.remove(alike.get());
                faults.add(cargo.name() + ": the " + move.way() + " goes from "
                        + wall.at(alike.get().start()) + " to "
                        + wall.at(alike.get().end()) + ", " + right);
            } else {
                faults.add(cargo.name() + ": the " + move.way() + " is missing, one from " + right);
            }
        }
        for (Result.Move move : found) {
            faults.add(cargo.name() + ": the " + move.way() + " at " + wall.at(move.start())
                    + " leads nowhere, none would be right.");
        }
    }

    private static boolean take(List<Result.Move> found, Result.Move wanted) {
        for (int i = 0; i < found.size(); i++) {
            Result.Move one = found.get(i);
            if (one.way().equals(wanted.way()) && one.start() == wanted.start() && one.end() == wanted.end()) {
                found.remove(i);
                return true;
            }
        }
        return false;
    }

    private void ready(Cargo cargo) {
        long begins = cargo.first().stint().from() - line.moves().seconds();
        long starts = line.starts().toInstant().getEpochSecond();
        if (begins < starts) {
            faults.add(cargo.name() + " is loaded at " + wall.at(begins) + ", after the line starts at "
                    + wall.at(starts) + " would be right.");
        }
        for (Order order : cargo.orders()) {
            long ready = order.ready().toInstant().getEpochSecond();
            if (begins < ready) {
                faults.add(cargo.name() + " is loaded at " + wall.at(begins) + ", after " + order.lot()
                        + " is ready at " + wall.at(ready) + " would be right.");
            }
        }
    }

    private void people(List<Result.Move> moves) {
        if (line.crew() == null) {
            return;
        }
        Peaks peaks = new Peaks();
        moves.forEach(
                move -> peaks.add(told(move), move.start(), Math.min(move.end(), move.start() + A_YEAR), heads(move)));
        for (Peaks.Excess excess : peaks.over(wall::heads, true)) {
            faults.add("At " + wall.at(excess.from()) + " " + Faults.count(Math.round(excess.used()), "head")
                    + " of the crew "
                    + (excess.used() == 1 ? "is" : "are") + " needed for " + excess.who() + ", at most "
                    + Math.round(excess.limit()) + " would be right.");
        }
    }

    private void hoists(List<Result.Move> moves) {
        Peaks peaks = new Peaks();
        moves.stream()
                .filter(move -> !isChangeover(move))
                .forEach(move -> peaks.add(told(move), move.start(), move.end(), 1));
        for (Peaks.Excess excess : peaks.over(at -> line.moves().atOnce(), false)) {
            faults.add("At " + wall.at(excess.from()) + " " + Faults.count(Math.round(excess.used()), "load")
                    + " are on the move with " + excess.who() + ", at most "
                    + line.moves().atOnce() + " at once would be right.");
        }
    }

    private static String told(Result.Move move) {
        return "the " + move.way() + " of " + move.load();
    }
}
