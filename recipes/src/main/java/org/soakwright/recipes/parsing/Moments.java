package org.soakwright.recipes.parsing;

import java.time.DateTimeException;
import java.time.LocalDate;
import java.time.LocalDateTime;
import java.time.LocalTime;
import java.time.ZoneId;
import java.time.ZoneOffset;
import java.time.ZonedDateTime;
import java.time.zone.ZoneOffsetTransition;
import java.util.List;
import java.util.TreeSet;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Collectors;
import org.jspecify.annotations.Nullable;
import org.soakwright.recipes.text.Nearest;
import org.soakwright.recipes.text.Place;
import org.soakwright.recipes.text.Problems;
import org.soakwright.recipes.text.Shown;
import org.soakwright.recipes.text.Tree;

/** Reads dates and times by the clock of one zone; null where there is nothing, or a problem has been added. */
final class Moments {
    private static final Pattern DATE = Pattern.compile("([0-9]{4})-([0-9]{2})-([0-9]{2})");
    private static final Pattern TIME = Pattern.compile("([0-9]{2}):([0-9]{2})(:[0-9.]+)?");
    private static final Pattern DATE_TIME =
            Pattern.compile("(" + DATE.pattern() + ")T([0-9:.]+)(Z|[+-][0-9]{2}:[0-9]{2})?");
    private static final Pattern NO_SECONDS = Pattern.compile(":0{2}(\\.0+)?");

    /** Before it, clocks of some zones differed by odd seconds; after it, nobody plans. */
    private static final int FIRST_YEAR = 2000;

    private static final int LAST_YEAR = 2199;

    private final Values values;
    private final Problems problems;
    private final @Nullable ZoneId zone;

    /** @param zone null where it could not be read: then no time is held against it */
    Moments(Values values, @Nullable ZoneId zone) {
        this.values = values;
        this.problems = values.problems();
        this.zone = zone;
    }

    static @Nullable ZoneId zone(Values values, @Nullable Tree tree) {
        Tree.Leaf leaf = values.leaf("zone", tree, "Europe/Oslo");
        if (leaf == null) {
            return null;
        }
        // In order, so that of two equally near ones it is always the same that is offered.
        TreeSet<String> known = new TreeSet<>(ZoneId.getAvailableZoneIds());
        if (known.contains(leaf.text())) {
            return ZoneId.of(leaf.text());
        }
        boolean named = leaf.text().chars().anyMatch(Character::isLetter);
        String nearest = Nearest.of(leaf.text(), known)
                .filter(near -> named)
                .map(near -> "the nearest is \"" + near + "\", ")
                .orElse("an offset alone does not say when clocks change, ");
        values.problems()
                .add(
                        leaf.place(),
                        "no time zone has this name: found " + leaf.label() + "; " + nearest
                                + "write such as Europe/Oslo");
        return null;
    }

    /** The zone, or one to go on with where there is none. */
    ZoneId clock() {
        return zone == null ? ZoneOffset.UTC : zone;
    }

    @Nullable
    ZonedDateTime dateTime(String what, @Nullable Tree tree) {
        Tree.Leaf leaf = values.leaf(what, tree, "2026-03-02T06:00");
        if (leaf == null) {
            return null;
        }
        Matcher matcher = DATE_TIME.matcher(leaf.text());
        if (!matcher.matches()) {
            problems.add(
                    leaf.place(),
                    what + " is a date and a time of day: found " + found(leaf) + "; write such as 2026-03-02T06:00");
            return null;
        }
        LocalDate date = date(what, leaf.place(), matcher.group(1));
        LocalTime time = timeOfDay(what, leaf.place(), matcher.group(5), leaf);
        return date == null || time == null ? null : zoned(what, leaf, date.atTime(time), matcher.group(6));
    }

    private @Nullable ZonedDateTime zoned(String what, Tree.Leaf leaf, LocalDateTime local, @Nullable String written) {
        ZoneId clock = clock();
        List<ZoneOffset> offsets = clock.getRules().getValidOffsets(local);
        if (offsets.isEmpty()) {
            ZoneOffsetTransition turn = clock.getRules().getTransition(local);
            problems.add(
                    leaf.place(),
                    what + ": there is no such time, the clocks go from "
                            + turn.getDateTimeBefore().toLocalTime() + " to "
                            + turn.getDateTimeAfter().toLocalTime() + " that day in " + clock + ": found "
                            + leaf.label()
                            + "; write such as " + turn.getDateTimeAfter());
            return null;
        }
        if (written == null || zone == null) {
            return ZonedDateTime.ofLocal(local, clock, null);
        }
        for (ZoneOffset offset : offsets) {
            if (written.equals(shown(offset)) || (written.equals("Z") && offset.getTotalSeconds() == 0)) {
                return ZonedDateTime.ofStrict(local, offset, clock);
            }
        }
        problems.add(
                leaf.place(),
                what + ": found " + leaf.label() + ", where the offset of " + clock + " is then "
                        + offsets.stream().map(Moments::shown).collect(Collectors.joining(" or "))
                        + "; leave the offset out, or correct it");
        return null;
    }

    private static String shown(ZoneOffset offset) {
        return offset.getTotalSeconds() == 0 ? "+00:00" : offset.getId();
    }

    @Nullable
    LocalDate date(String what, @Nullable Tree tree) {
        Tree.Leaf leaf = values.leaf(what, tree, "2026-05-01");
        return leaf == null ? null : date(what, leaf.place(), leaf.text());
    }

    private @Nullable LocalDate date(String what, Place place, String text) {
        Matcher matcher = DATE.matcher(text);
        String remedy = "; write such as 2026-03-02";
        if (!matcher.matches()) {
            problems.add(place, what + " is a date: found " + Shown.quoted(text) + remedy);
            return null;
        }
        int year = Integer.parseInt(matcher.group(1));
        if (year < FIRST_YEAR || year > LAST_YEAR) {
            problems.add(
                    place,
                    what + " lies in the years " + FIRST_YEAR + " to " + LAST_YEAR + ": found " + Shown.quoted(text)
                            + remedy);
            return null;
        }
        try {
            return LocalDate.of(year, Integer.parseInt(matcher.group(2)), Integer.parseInt(matcher.group(3)));
        } catch (DateTimeException e) {
            problems.add(place, what + ": the calendar has no such day: found " + Shown.quoted(text) + remedy);
            return null;
        }
    }

    /** A time of day at which something begins. */
    @Nullable
    LocalTime begin(@Nullable Tree tree) {
        Tree.Leaf leaf = values.leaf("from", tree, "06:00");
        return leaf == null ? null : timeOfDay("from", leaf.place(), leaf.text(), leaf);
    }

    /** A time of day at which something ends; 24:00 is the midnight that ends the day. */
    @Nullable
    LocalTime end(@Nullable Tree tree) {
        Tree.Leaf leaf = values.leaf("to", tree, "14:00");
        if (leaf == null) {
            return null;
        }
        return leaf.text().equals("24:00") ? LocalTime.MIDNIGHT : timeOfDay("to", leaf.place(), leaf.text(), leaf);
    }

    private @Nullable LocalTime timeOfDay(String what, Place place, String text, Tree.Leaf leaf) {
        Matcher matcher = TIME.matcher(text);
        if (!matcher.matches()) {
            problems.add(place, what + " is a time of day: found " + leaf.label() + "; write such as \"06:00\"");
            return null;
        }
        String seconds = matcher.group(3);
        if (seconds != null && !NO_SECONDS.matcher(seconds).matches()) {
            problems.add(
                    place,
                    what + " is a whole minute, as all times of a line: found " + leaf.label()
                            + "; leave the seconds out, such as 06:00");
            return null;
        }
        try {
            return LocalTime.of(Integer.parseInt(matcher.group(1)), Integer.parseInt(matcher.group(2)));
        } catch (DateTimeException e) {
            problems.add(
                    place,
                    what + ": the clock has no such time: found " + leaf.label() + "; write 00:00 to 23:59"
                            + (what.equals("to") ? ", or 24:00" : ""));
            return null;
        }
    }

    private static String found(Tree.Leaf leaf) {
        return leaf.label() + (DATE.matcher(leaf.text()).matches() ? ", a date alone" : "");
    }
}
