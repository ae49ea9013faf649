package org.soakwright.planner.line;

import java.time.Instant;
import java.time.ZoneId;
import java.time.ZonedDateTime;
import org.soakwright.recipes.model.line.Line;

/** Seconds from the start of a line, and the clock on its wall. */
public record Clock(Instant starts, ZoneId zone) {
    public static Clock of(Line line) {
        return new Clock(line.starts().toInstant(), line.zone());
    }

    public long seconds(Instant instant) {
        return instant.getEpochSecond() - starts.getEpochSecond();
    }

    public long seconds(ZonedDateTime time) {
        return seconds(time.toInstant());
    }

    public ZonedDateTime at(long seconds) {
        return starts.plusSeconds(seconds).atZone(zone);
    }
}
