package org.soakwright.planner.line.verify;

import java.time.Instant;
import java.util.HashMap;
import java.util.Map;
import org.soakwright.planner.batch.Durations;
import org.soakwright.recipes.model.line.Crew;
import org.soakwright.recipes.model.line.Line;

/** The clock of a line, and who is there by it: asked minute by minute, since crews come and go at whole minutes only. */
final class Wall {
    static final long MINUTE = 60;

    private final Line line;
    private final Map<Long, Integer> heads = new HashMap<>();
    private final Map<Long, Boolean> shifts = new HashMap<>();

    Wall(Line line) {
        this.line = line;
    }

    String at(long second) {
        return Instant.ofEpochSecond(second)
                .atZone(line.zone())
                .toOffsetDateTime()
                .toString();
    }

    static String lasting(double seconds) {
        return seconds == 0 ? "no time" : Durations.practical(seconds);
    }

    static String lasting(long seconds) {
        return lasting((double) seconds);
    }

    /** How many can move lots; where there is no crew, as many as are needed. */
    int heads(long second) {
        Crew crew = line.crew();
        return crew == null
                ? Integer.MAX_VALUE
                : heads.computeIfAbsent(
                        Math.floorDiv(second, MINUTE), minute -> crew.heads(Instant.ofEpochSecond(minute * MINUTE)));
    }

    /** Whether anybody is on shift, be it in a break. */
    boolean onShift(long second) {
        Crew crew = line.crew();
        return crew == null
                || shifts.computeIfAbsent(
                        Math.floorDiv(second, MINUTE), minute -> crew.onShift(Instant.ofEpochSecond(minute * MINUTE)));
    }

    boolean isNight(long second) {
        return line.isNight(Instant.ofEpochSecond(second));
    }

    /** The next whole minute after a moment. */
    static long nextMinute(long second) {
        return (Math.floorDiv(second, MINUTE) + 1) * MINUTE;
    }
}
