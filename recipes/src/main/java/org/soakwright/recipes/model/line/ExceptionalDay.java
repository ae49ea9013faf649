package org.soakwright.recipes.model.line;

import java.time.LocalDate;
import org.jspecify.annotations.Nullable;
import org.soakwright.recipes.text.Place;
import org.soakwright.recipes.text.Unsound;

/**
 * Days whose shifts are others than those of the week, or none. A shift that began the day before runs on.
 *
 * @param date the first of them
 * @param through the last, itself included
 * @param shift what begins on each; null is closed
 */
public record ExceptionalDay(
        Place place,
        LocalDate date,
        LocalDate through,
        @Nullable Shift shift) {
    public ExceptionalDay {
        if (through.isBefore(date)) {
            throw new Unsound(
                    place, "through is not before date: found " + through + " before " + date + "; write a later day");
        }
    }

    public boolean covers(LocalDate day) {
        return !day.isBefore(date) && !day.isAfter(through);
    }

    public boolean isClosed() {
        return shift == null;
    }

    boolean overlaps(ExceptionalDay other) {
        return !date.isAfter(other.through) && !through.isBefore(other.date);
    }
}
