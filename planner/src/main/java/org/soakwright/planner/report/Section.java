package org.soakwright.planner.report;

import java.util.List;
import java.util.Optional;

/**
 * One part of what there is to say.
 *
 * @param id a short word of lower-case letters and hyphens, the same for the same part of every batch
 * @param table at most one
 * @param points of a list
 * @param notes sentences about the table
 */
public record Section(String id, String heading, Optional<Table> table, List<String> points, List<String> notes) {
    public Section {
        points = List.copyOf(points);
        notes = List.copyOf(notes);
    }

    public static Section of(String id, String heading, Table table, List<String> notes) {
        return new Section(id, heading, Optional.of(table), List.of(), notes);
    }

    public static Section of(String id, String heading, List<String> points) {
        return new Section(id, heading, Optional.empty(), points, List.of());
    }

    /** Its lines on a terminal, from its heading on. */
    List<String> lines(Style style) {
        List<String> lines = new java.util.ArrayList<>();
        lines.add(style.heading(heading));
        table.ifPresent(content -> lines.addAll(TableText.lines(content, style)));
        points.forEach(point -> lines.addAll(Prose.point(point)));
        notes.forEach(note -> lines.addAll(Prose.lines("  ", "  ", note)));
        return lines;
    }
}
