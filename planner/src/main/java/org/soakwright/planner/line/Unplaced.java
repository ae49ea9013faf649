package org.soakwright.planner.line;

import java.util.ArrayList;
import java.util.List;
import org.soakwright.planner.batch.Durations;
import org.soakwright.planner.line.shop.Aim;
import org.soakwright.planner.line.shop.Job;
import org.soakwright.planner.line.shop.Joint;
import org.soakwright.planner.line.shop.Moments;
import org.soakwright.planner.line.shop.Phase;
import org.soakwright.planner.line.shop.Search;
import org.soakwright.planner.line.shop.Staffing;
import org.soakwright.recipes.text.Problem;
import org.soakwright.recipes.text.Shown;
import org.soakwright.recipes.text.Unsound;

/** Why lots can be made on a line at no time, however late: found out only once it is known that it is so. */
final class Unplaced {
    private final Hall hall;

    private Unplaced(Hall hall) {
        this.hall = hall;
    }

    /** A problem for every lot that has no place even in an empty hall; for the one that found none where all do. */
    static Unsound told(Hall hall, List<Jobs.Made> made, Search.Unplaceable first) {
        Unplaced unplaced = new Unplaced(hall);
        List<Problem> problems = new ArrayList<>();
        for (Jobs.Made one : made) {
            if (unplaced.isNowhere(one.job())) {
                problems.add(unplaced.problem(one, unplaced.reason(one)));
            }
        }
        for (Jobs.Made one : made) {
            if (problems.isEmpty() && one.job().name().equals(first.job().name())) {
                problems.add(unplaced.problem(
                        one,
                        "found room for it on an empty line, and none beside the others within " + Hall.AFTERWARDS_DAYS
                                + " d after the last lot is ready; plan them in parts"));
            }
        }
        Unsound unsound = new Unsound(problems);
        unsound.initCause(first);
        return unsound;
    }

    private boolean isNowhere(Job job) {
        try {
            new Search(hall.shop(), List.of(job), List.of(Aim.MAKESPAN)).best(0);
            return false;
        } catch (Search.Unplaceable nowhere) {
            return true;
        }
    }

    private Problem problem(Jobs.Made made, String reason) {
        return new Problem(
                made.load().shares().get(0).order().place(),
                "lot " + Shown.quoted(made.load().name()) + " can be made at no time, however late: " + reason);
    }

    private String reason(Jobs.Made made) {
        Staffing staffing = hall.shop().staffing();
        long shift = longest(staffing.shifts());
        long lifting = longest(there(staffing, hall.shop().carriage().heads()));
        long changing = longest(there(staffing, 1));
        Job job = made.job();
        for (int k = 0; k < job.size(); k++) {
            Phase phase = job.phase(k);
            String step = made.route()
                    .written()
                    .steps()
                    .get(made.route().legs().get(k).step())
                    .name();
            if (phase.attended() && phase.shortest() > shift) {
                return "found the attended step " + Shown.quoted(step) + " of at least "
                        + Durations.practical((double) phase.shortest()) + ", where somebody is on shift for at most "
                        + Durations.practical((double) shift)
                        + " on end; shorten the step, or let shifts follow each other";
            }
            if (k > 0 && phase.before() instanceof Joint.Change change && change.seconds() > changing) {
                return "found a changeover before " + Shown.quoted(step) + " of "
                        + Durations.practical((double) change.seconds()) + ", where somebody is there for at most "
                        + Durations.practical((double) changing)
                        + " on end; shorten the changeover, or let shifts follow each other";
            }
            if (k > 0
                    && phase.before() instanceof Joint.Lift lift
                    && !hall.shop().carriage().isFree()
                    && lift.least() > lifting) {
                return "found " + Durations.practical((double) lift.least()) + " from lifting to landing before "
                        + Shown.quoted(step) + people(lifting);
            }
        }
        if (hall.shop().carriage().takes() > lifting) {
            return "found a move that takes "
                    + Durations.practical((double) hall.shop().carriage().takes()) + people(lifting);
        }
        return "found no time within " + Hall.AFTERWARDS_DAYS
                + " d after the last lot is ready at which its steps, as long as they may be held, end when somebody is"
                + " there and the next vessel is not out; give steps more hold-at-most, the crew longer hours or fewer"
                + " outages, and let a lot that comes back to its only vessel stay there";
    }

    private static String people(long lifting) {
        return ", where enough of the crew are there for at most " + Durations.practical((double) lifting)
                + " on end; let moves take less, or shifts follow each other";
    }

    private static Moments there(Staffing staffing, long heads) {
        Moments there = Moments.NONE;
        for (Staffing.Level level : staffing.levels()) {
            if (level.heads() >= heads) {
                there = there.or(Moments.of(level.from(), level.until()));
            }
        }
        return there;
    }

    private static long longest(Moments moments) {
        long longest = 0;
        for (int i = 0; i < moments.size(); i++) {
            longest = Math.max(longest, moments.to(i) - moments.from(i));
        }
        return longest;
    }
}
