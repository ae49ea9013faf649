package org.soakwright.planner.line.verify;

import org.soakwright.recipes.model.Gap;
import org.soakwright.recipes.model.Quantity;
import org.soakwright.recipes.model.Time;
import org.soakwright.recipes.model.line.Line;

/** Whether each step of a load lasts as long as it may, and follows the one before as it should. */
final class Course {
    /** What binary numbers make of decimals, s. */
    private static final double ROUNDING = 1e-6;

    /** Whoever is on shift all year is on shift. */
    private static final long A_YEAR = 366 * 86_400;

    private final Line line;
    private final Wall wall;
    private final Faults faults;

    Course(Line line, Wall wall, Faults faults) {
        this.line = line;
        this.wall = wall;
        this.faults = faults;
    }

    /** Whether it can be followed with these times, be they allowed or not. */
    boolean check(Cargo cargo) {
        boolean possible = true;
        for (int k = 0; k < cargo.parts().size(); k++) {
            Cargo.Part part = cargo.parts().get(k);
            lasts(cargo, part);
            attended(cargo, part);
            possible &= part.stint().lasts() > 0;
            if (k > 0) {
                follows(cargo, cargo.parts().get(k - 1), part);
                possible &=
                        part.stint().from() >= cargo.parts().get(k - 1).stint().until();
            }
        }
        return possible;
    }

    private void lasts(Cargo cargo, Cargo.Part part) {
        Result.Stint stint = part.stint();
        String what = cargo.name() + ": " + part.name() + " in " + stint.vessel();
        long seconds = stint.lasts();
        if (stint.seconds() != seconds) {
            faults.add(what + " says it lasts " + Wall.lasting(stint.seconds()) + ", " + Wall.lasting(seconds)
                    + " from its start to its end would be right.");
        }
        if (seconds <= 0) {
            faults.add(what + " ends at " + wall.at(stint.until()) + " and starts at " + wall.at(stint.from())
                    + ", an end after its start would be right.");
            return;
        }
        if (stint.latestPull().isPresent()) {
            long pull = stint.latestPull().getAsLong();
            double slack = (double) (pull - stint.until());
            if (slack < 0 || stint.slack().orElse(slack) != slack) {
                faults.add(what + " has a latest pull of " + wall.at(pull) + ", its end at " + wall.at(stint.until())
                        + " and its slack later would be right.");
            }
        }
        Time time = part.step().time();
        int fills = part.step().fills();
        String each = fills == 1 ? "" : " a fill";
        double shortest = time.seconds(0) / fills;
        if (seconds < shortest - ROUNDING) {
            faults.add(what + " lasts " + Wall.lasting(seconds) + ", at least " + Wall.lasting(shortest) + each
                    + " would be right.");
            return;
        }
        Quantity hold = part.step().head().handling().holdAtMost();
        if (hold != null) {
            // Whole seconds: a choice that is none is rounded up.
            double chosen = Math.ceil(choice(time, fills, seconds) / fills - ROUNDING);
            if (seconds > chosen + hold.si() / fills + ROUNDING) {
                faults.add(what + " lasts " + Wall.lasting(seconds) + ", " + Wall.lasting(chosen) + each
                        + " held at most " + Wall.lasting(hold.si() / fills) + " longer would be right.");
            }
        }
    }

    /** The longest time that the step offers and that is no longer than it lasts. */
    private static double choice(Time time, int fills, long seconds) {
        int low = 0;
        int high = time.choices() - 1;
        while (low < high) {
            int middle = low + (high - low + 1) / 2;
            if (Math.ceil(time.seconds(middle) / fills - ROUNDING) <= seconds) {
                low = middle;
            } else {
                high = middle - 1;
            }
        }
        return time.seconds(low);
    }

    private void attended(Cargo cargo, Cargo.Part part) {
        if (!part.step().head().handling().attended()) {
            return;
        }
        long until = Math.min(part.stint().until(), part.stint().from() + A_YEAR);
        for (long at = part.stint().from(); at < until; at = Wall.nextMinute(at)) {
            if (!wall.onShift(at)) {
                faults.add(cargo.name() + ": " + part.name() + " in "
                        + part.stint().vessel() + " is attended and nobody is on shift at " + wall.at(at)
                        + ", wholly within crew hours would be right.");
                return;
            }
        }
    }

    /** How long the pieces are out of any liquor, and whether they are where they were. */
    private void follows(Cargo cargo, Cargo.Part before, Cargo.Part part) {
        long gap = part.stint().from() - before.stint().until();
        String what = cargo.name() + ": " + part.name() + " in " + part.stint().vessel();
        if (!part.isLifted() && !part.stint().vessel().equals(before.stint().vessel())) {
            faults.add(what + " comes after " + before.name() + " in "
                    + before.stint().vessel() + ", staying there would be right.");
        }
        long least = 0;
        long most = 0;
        if (part.isLifted()) {
            least = Math.max(
                    line.moves().seconds(), (long) Math.ceil(gap(cargo, part).seconds() - ROUNDING));
            most = least == 0 ? 0 : least + line.moves().hangsSeconds();
        } else {
            least = (long) Math.ceil(gap(cargo, part).seconds() - ROUNDING);
            most = least;
        }
        if (gap < least || gap > most) {
            faults.add(what + " starts " + Wall.lasting(Math.abs(gap)) + (gap < 0 ? " before " : " after ")
                    + before.name() + " ended, "
                    + (least == most
                            ? Wall.lasting(least)
                            : "from " + Wall.lasting(least) + " to " + Wall.lasting(most))
                    + " after it would be right.");
        }
    }

    private static Gap gap(Cargo cargo, Cargo.Part part) {
        return part.fill() > 0 ? part.step().gapBetweenFills() : cargo.recipe().gapBefore(part.index());
    }
}
