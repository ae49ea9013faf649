package org.soakwright.recipes.model.line;

import java.time.DayOfWeek;
import java.time.LocalTime;
import java.util.Collections;
import java.util.EnumSet;
import java.util.List;
import java.util.Set;
import org.soakwright.recipes.text.Place;
import org.soakwright.recipes.text.Unsound;

/** A shift that begins on certain days of every week. */
public record Hours(Place place, Set<DayOfWeek> days, Shift shift) {
    public Hours {
        if (days.isEmpty()) {
            throw new Unsound(place, "hours are of one day or more: found none; write such as days: mon-fri");
        }
        days = Collections.unmodifiableSet(EnumSet.copyOf(days));
    }

    public Hours(Place place, Set<DayOfWeek> days, LocalTime from, LocalTime to, int heads, List<Break> breaks) {
        this(place, days, new Shift(place, from, to, heads, breaks));
    }

    public LocalTime from() {
        return shift.from();
    }

    public LocalTime to() {
        return shift.to();
    }

    public int heads() {
        return shift.heads();
    }

    public List<Break> breaks() {
        return shift.breaks();
    }
}
