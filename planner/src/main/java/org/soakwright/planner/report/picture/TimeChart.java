package org.soakwright.planner.report.picture;

import java.util.ArrayList;
import java.util.List;

/**
 * Who is in which vessel when: a row for each vessel, a bar for each time that something is in it. Horizons too long for one panel are cut
 * into several below each other, and into several pictures where they become many. Times are s from any moment.
 */
public final class TimeChart {
    /** More than these have no colour of their own: nobody would tell them apart. */
    public static final int KINDS = 4;

    /** Panels of one picture. */
    static final int MOST_PANELS = 5;

    private TimeChart() {}

    /** From a moment until another. */
    public record Span(long from, long until) {
        boolean meets(Span other) {
            return from < other.until && until > other.from;
        }

        Span within(Span other) {
            return new Span(Math.max(from, other.from), Math.min(until, other.until));
        }

        long length() {
            return until - from;
        }
    }

    /** A moment with its name. */
    public record Mark(long moment, String label) {}

    /** A time that has a name, perhaps an empty one. */
    public record Named(Span span, String label) {}

    /**
     * One stay in a vessel.
     *
     * @param lane from 0, where several are in it at once
     * @param kind what it is coloured by, from 0; those from {@link #KINDS} on look alike
     * @param labels what may stand in it, the longest first
     * @param legs in order
     * @param changes between legs
     * @param after until the vessel can be used again; of no length where at once
     */
    public record Stay(int lane, int kind, List<String> labels, List<Span> legs, List<Span> changes, Span after) {
        public Stay {
            labels = List.copyOf(labels);
            legs = List.copyOf(legs);
            changes = List.copyOf(changes);
        }

        /** With the vessel in use again from a moment on. */
        public Stay until(long moment) {
            Span shorter = new Span(after.from(), Math.max(after.from(), Math.min(after.until(), moment)));
            return new Stay(lane, kind, labels, legs, changes, shorter);
        }
    }

    /**
     * A time of a stay that lies after it was to be over.
     *
     * @param first whether a flag stands where it begins
     */
    public record Late(int lane, Span span, boolean first) {}

    /** One vessel. */
    public record Row(String name, int lanes, List<Stay> stays, List<Named> closed, List<Late> late) {
        public Row {
            stays = List.copyOf(stays);
            closed = List.copyOf(closed);
            late = List.copyOf(late);
        }
    }

    /**
     * What people do.
     *
     * @param lane from 0, where several things are done at once
     */
    public record Tick(int lane, Span span, boolean strong) {}

    /**
     * What is drawn.
     *
     * @param kinds the name of each kind, {@link #KINDS} or fewer, and one for all others if there are any
     * @param panels what each shows, in order
     * @param days where each begins
     * @param hours finer marks, shown where there is room
     */
    public record Subject(
            String title,
            String subtitle,
            String caption,
            String altText,
            List<String> kinds,
            List<Row> rows,
            String workName,
            int workLanes,
            List<Tick> work,
            List<Span> away,
            List<Span> pauses,
            List<Span> nights,
            List<Mark> days,
            List<Mark> hours,
            List<Span> panels) {
        public Subject {
            kinds = List.copyOf(kinds);
            rows = List.copyOf(rows);
            work = List.copyOf(work);
            away = List.copyOf(away);
            pauses = List.copyOf(pauses);
            nights = List.copyOf(nights);
            days = List.copyOf(days);
            hours = List.copyOf(hours);
            panels = List.copyOf(panels);
        }
    }

    /** {@code time-chart}, {@code time-chart-2} and so on. */
    public static List<Picture> of(Subject subject) {
        List<Picture> pictures = new ArrayList<>();
        List<Span> panels = subject.panels();
        int count = (panels.size() + MOST_PANELS - 1) / MOST_PANELS;
        for (int i = 0; i < count; i++) {
            List<Span> own = panels.subList(i * MOST_PANELS, Math.min(panels.size(), (i + 1) * MOST_PANELS));
            String id = i == 0 ? "time-chart" : "time-chart-" + (i + 1);
            String part = count == 1 ? "" : ", part " + (i + 1) + " of " + count;
            TimePanels drawing = new TimePanels(subject, own, subject.title() + part);
            pictures.add(new Picture(
                    id,
                    subject.title() + part,
                    subject.caption(),
                    subject.altText(),
                    Look.WIDTH,
                    drawing.height(),
                    drawing::on));
        }
        return List.copyOf(pictures);
    }
}
