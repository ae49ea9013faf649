package org.soakwright.planner.report.paper;

import java.util.ArrayList;
import java.util.List;
import org.soakwright.planner.report.Stamp;

/**
 * What a batch sheet says, in the order in which it is read; no word of it is added later.
 *
 * @param misses the targets that are missed; none where this is a plan to run
 * @param stops cautions that forbid to use it; none where this is a plan to run
 * @param lot how much of what
 * @param timing how long, from when to when, and how times are counted
 * @param targets each limit with what to expect and room for what is found
 * @param sampling how to take what the targets speak of
 * @param signatures what is signed for
 */
record Sheet(
        String title,
        List<String> misses,
        List<String> stops,
        List<Blank> lotBlanks,
        List<String> lot,
        List<String> timing,
        List<Part> parts,
        List<TargetLine> targets,
        List<String> sampling,
        List<String> cautions,
        List<String> signatures,
        Stamp stamp) {
    private static final int MOST_MISSES = 6;

    static final String KIND = "Batch sheet";
    static final String NO_PLAN = "NOT A PLAN";
    static final String VESSEL = "Vessel";
    static final String TARGETS = "Targets";
    static final String SAMPLING = "Sampling";
    static final String CAUTIONS = "Cautions";
    static final String SIGNATURES = "Signatures";

    Sheet {
        misses = List.copyOf(misses);
        stops = List.copyOf(stops);
        lotBlanks = List.copyOf(lotBlanks);
        lot = List.copyOf(lot);
        timing = List.copyOf(timing);
        parts = List.copyOf(parts);
        targets = List.copyOf(targets);
        sampling = List.copyOf(sampling);
        cautions = List.copyOf(cautions);
        signatures = List.copyOf(signatures);
    }

    /** A box to be filled in, with what belongs there and, where it is a number, its unit. */
    record Blank(String label, String unit) {}

    /**
     * One step.
     *
     * @param number from 1
     * @param doing kind, length and temperature
     * @param makeUp what to make up before it
     * @param moments what happens, in the order of time
     * @param notes what holds for the step as a whole
     */
    record Part(int number, String name, String doing, List<String> makeUp, List<Moment> moments, List<String> notes) {
        static final String WALL = "Time of day";
        static final List<String> HEADINGS = List.of("", "Clock", WALL, "Planned", "Actual", "Initials");

        Part {
            makeUp = List.copyOf(makeUp);
            moments = List.copyOf(moments);
            notes = List.copyOf(notes);
        }
    }

    /**
     * Something to do at a time.
     *
     * @param seconds from the start of the batch
     * @param clock the same as people read it
     * @param wall by the clock on the wall; empty where the start is not known
     * @param planned what to do or expect
     * @param unit of what is written down; a time where it is empty
     * @param notes what to watch
     */
    record Moment(
            String what, double seconds, String clock, String wall, String planned, String unit, List<String> notes) {
        Moment {
            notes = List.copyOf(notes);
        }
    }

    /**
     * One limit for one grade.
     *
     * @param unit of what is found; empty where there is nothing to find
     */
    record TargetLine(
            String target, String grade, String when, String limit, String expected, String verdict, String unit) {
        static final List<String> HEADINGS =
                List.of("Target", "Grade", "At the end of", "Limit", "Expected", "", "Found");

        /** All that is printed before what is found. */
        List<String> words() {
            return List.of(target, grade, when, limit, expected, verdict);
        }
    }

    boolean isPlan() {
        return misses.isEmpty() && stops.isEmpty();
    }

    /** Whether times of day are known. */
    boolean hasWall() {
        return parts.stream()
                .flatMap(part -> part.moments().stream())
                .anyMatch(moment -> !moment.wall().isEmpty());
    }

    /** What stops it, then the first misses, for the top, and how many more there are. */
    List<String> against() {
        List<String> against = new ArrayList<>(stops);
        if (misses.size() <= MOST_MISSES) {
            against.addAll(misses);
            return against;
        }
        against.addAll(misses.subList(0, MOST_MISSES));
        against.add("And " + (misses.size() - MOST_MISSES) + " more: see the targets.");
        return against;
    }

    String banner() {
        if (misses.isEmpty()) {
            return NO_PLAN + ": stopped by a caution";
        }
        return NO_PLAN + ": misses " + (misses.size() == 1 ? "a target" : misses.size() + " targets");
    }

    String footer() {
        return "Soakwright " + stamp.version() + ", recipe sha256 " + stamp.sha256();
    }
}
