package org.soakwright.recipes.parsing;

import java.time.DayOfWeek;
import java.time.LocalDate;
import java.time.LocalTime;
import java.util.ArrayList;
import java.util.EnumSet;
import java.util.List;
import java.util.Locale;
import java.util.Set;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.jspecify.annotations.Nullable;
import org.soakwright.recipes.model.Quantity;
import org.soakwright.recipes.model.line.Break;
import org.soakwright.recipes.model.line.Crew;
import org.soakwright.recipes.model.line.ExceptionalDay;
import org.soakwright.recipes.model.line.Hours;
import org.soakwright.recipes.model.line.Moves;
import org.soakwright.recipes.model.line.Night;
import org.soakwright.recipes.model.line.Shift;
import org.soakwright.recipes.text.Kind;
import org.soakwright.recipes.text.Nearest;
import org.soakwright.recipes.text.Problems;
import org.soakwright.recipes.text.Tree;

/** Reads who moves lots, when, and what a move takes. */
final class CrewReader {
    private static final String HOURS = "[{days: mon-fri, from: \"06:00\", to: \"14:00\", heads: 2}]";
    private static final List<String> DAYS =
            Stream.of(DayOfWeek.values()).map(CrewReader::word).toList();

    private final Values values;
    private final Problems problems;
    private final Moments moments;

    CrewReader(Values values, Moments moments) {
        this.values = values;
        this.problems = values.problems();
        this.moments = moments;
    }

    private static String word(DayOfWeek day) {
        return day.name().substring(0, 3).toLowerCase(Locale.ROOT);
    }

    @Nullable
    Moves moves(@Nullable Tree tree) {
        Fields fields = tree == null ? null : Fields.of(tree, LineSection.MOVES, problems);
        if (fields == null) {
            return null;
        }
        Quantity takes = values.quantity("takes", fields.need("takes", "15 min"), Kind.DURATION);
        Integer atOnce = values.whole("at-once", fields.need("at-once", "1"), "1");
        Tree headsTree = fields.get("heads");
        Integer heads = headsTree == null ? Integer.valueOf(Moves.USUAL_HEADS) : values.whole("heads", headsTree, "1");
        Quantity hangs = values.quantity("hangs-at-most", fields.get("hangs-at-most"), Kind.DURATION);
        boolean broken = hangs == null && fields.has("hangs-at-most");
        return takes == null || atOnce == null || heads == null || broken
                ? null
                : problems.attempt(() -> new Moves(fields.place(), takes, atOnce, heads, hangs));
    }

    @Nullable
    Crew crew(Tree tree) {
        Fields fields = Fields.of(tree, LineSection.CREW, problems);
        if (fields == null) {
            return null;
        }
        List<Hours> hours = values.each("hours", fields.need("hours", HOURS), HOURS, this::hours);
        List<ExceptionalDay> except =
                values.each("except", fields.get("except"), "[{date: 2026-05-01, closed: true}]", this::exceptional);
        Tree nightTree = fields.get("night");
        Night night = nightTree == null ? Night.usual(fields.place()) : night(nightTree);
        return hours == null || except == null || night == null || !fields.has("hours")
                ? null
                : problems.attempt(() -> new Crew(fields.place(), moments.clock(), hours, except, night));
    }

    private @Nullable Hours hours(Tree tree) {
        Fields fields = Fields.of(tree, LineSection.HOURS, problems);
        if (fields == null) {
            return null;
        }
        Set<DayOfWeek> days = days(fields.need("days", "mon-fri"));
        Shift shift = shift(fields);
        return days.isEmpty() || shift == null ? null : problems.attempt(() -> new Hours(fields.place(), days, shift));
    }

    private @Nullable Shift shift(Fields fields) {
        LocalTime from = moments.begin(fields.need("from", "\"06:00\""));
        LocalTime to = moments.end(fields.need("to", "\"14:00\""));
        Integer heads = values.whole("heads", fields.need("heads", "2"), "2");
        List<Break> breaks =
                values.each("breaks", fields.get("breaks"), "[{from: \"10:00\", to: \"10:30\"}]", this::pause);
        return from == null || to == null || heads == null || breaks == null
                ? null
                : problems.attempt(() -> new Shift(fields.place(), from, to, heads, breaks));
    }

    private @Nullable Break pause(Tree tree) {
        Fields fields = Fields.of(tree, LineSection.BREAK, problems);
        if (fields == null) {
            return null;
        }
        LocalTime from = moments.begin(fields.need("from", "\"10:00\""));
        LocalTime to = moments.end(fields.need("to", "\"10:30\""));
        return from == null || to == null ? null : problems.attempt(() -> new Break(fields.place(), from, to));
    }

    private @Nullable Night night(Tree tree) {
        Fields fields = Fields.of(tree, LineSection.NIGHT, problems);
        if (fields == null) {
            return null;
        }
        LocalTime from = moments.begin(fields.need("from", "\"22:00\""));
        LocalTime to = moments.end(fields.need("to", "\"06:00\""));
        return from == null || to == null ? null : problems.attempt(() -> new Night(fields.place(), from, to));
    }

    private @Nullable ExceptionalDay exceptional(Tree tree) {
        Fields fields = Fields.of(tree, LineSection.EXCEPT, problems);
        if (fields == null) {
            return null;
        }
        LocalDate date = moments.date("date", fields.need("date", "2026-05-01"));
        Tree throughTree = fields.get("through");
        LocalDate through = throughTree == null ? date : moments.date("through", throughTree);
        Truth closed = values.word("closed", fields.get("closed"), Truth.class);
        List<String> hours =
                Stream.of("from", "to", "heads", "breaks").filter(fields::has).toList();
        if (closed == Truth.TRUE) {
            hours.forEach(key -> problems.add(
                    fields.place(key), "a day that is closed has no hours: found " + key + " beside closed; keep one"));
        } else if (hours.isEmpty() && closed == null) {
            if (!fields.has("closed")) {
                problems.add(
                        fields.place(),
                        "an exceptional day is closed or has hours of its own: found neither; write closed: true, or such"
                                + " as from: \"08:00\", to: \"14:00\", heads: 1");
            }
            return null;
        }
        Shift shift = closed == Truth.TRUE ? null : shift(fields);
        boolean broken = closed == Truth.TRUE ? !hours.isEmpty() : shift == null;
        return date == null || through == null || broken
                ? null
                : problems.attempt(() -> new ExceptionalDay(fields.place(), date, through, shift));
    }

    /** {@code mon-fri}, {@code sat}, or a list of such; empty where a problem has been added. */
    private Set<DayOfWeek> days(@Nullable Tree tree) {
        Set<DayOfWeek> days = EnumSet.noneOf(DayOfWeek.class);
        boolean whole = true;
        if (tree instanceof Tree.Items items) {
            for (Tree item : items.items()) {
                whole &= add(days, item);
            }
            if (items.items().isEmpty()) {
                problems.add(tree.place(), "days: found an empty list; write such as mon-fri");
            }
        } else if (tree != null) {
            whole = add(days, tree);
        }
        return whole ? days : EnumSet.noneOf(DayOfWeek.class);
    }

    private boolean add(Set<DayOfWeek> days, Tree tree) {
        Tree.Leaf leaf = values.leaf("days", tree, "mon-fri");
        if (leaf == null) {
            return false;
        }
        List<String> ends = List.of(leaf.text().split("-", -1));
        if (ends.size() > 2 || !DAYS.containsAll(ends)) {
            String hint = ends.stream()
                    .filter(end -> !DAYS.contains(end))
                    .findFirst()
                    .flatMap(end -> Nearest.of(end, DAYS))
                    .map(near -> "the nearest is \"" + near + "\", ")
                    .orElse("");
            problems.add(
                    leaf.place(),
                    "days are " + DAYS.stream().collect(Collectors.joining(", ")) + " or a range of two: found "
                            + leaf.label() + "; " + hint + "write such as mon-fri");
            return false;
        }
        List<DayOfWeek> read = new ArrayList<>();
        DayOfWeek last = DayOfWeek.of(DAYS.indexOf(ends.get(ends.size() - 1)) + 1);
        for (DayOfWeek day = DayOfWeek.of(DAYS.indexOf(ends.get(0)) + 1); day != last; day = day.plus(1)) {
            read.add(day);
        }
        read.add(last);
        for (DayOfWeek day : read) {
            if (!days.add(day)) {
                problems.add(leaf.place(), "days names " + word(day) + " twice; keep one");
                return false;
            }
        }
        return true;
    }
}
