package org.soakwright.planner.report.picture;

import java.awt.Color;
import java.awt.geom.Path2D;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;

/** Names beside the ends of lines, moved apart where they would touch and tied to their lines. */
final class Labels {
    static final double SPACING = 16;
    private static final double LEAD = 16;
    /** What a label takes beside its words. */
    static final double ROOM = LEAD + 2;

    private final double x;
    private final double width;
    private final List<Label> labels = new ArrayList<>();

    private static final class Label {
        private final String name;
        private final String rest;
        private final double wanted;
        private final Color color;
        private double y;

        Label(String name, String rest, double wanted, Color color) {
            this.name = name;
            this.rest = rest;
            this.wanted = wanted;
            this.color = color;
            y = wanted;
        }
    }

    /**
     * A column of labels.
     *
     * @param x where the lines end
     * @param width of the column
     */
    Labels(double x, double width) {
        this.x = x;
        this.width = width;
    }

    void add(String name, double y, Color color) {
        add(name, "", y, color);
    }

    /** Where there is no room for all, the name is cut and not the rest. */
    void add(String name, String rest, double y, Color color) {
        labels.add(new Label(name, rest, y, color));
    }

    /** Places them as near to their lines as they go between top and bottom. */
    void on(Sheet sheet, double top, double bottom) {
        labels.sort(Comparator.comparingDouble((Label label) -> label.wanted));
        double least = top;
        for (Label label : labels) {
            label.y = Math.max(label.wanted, least);
            least = label.y + SPACING;
        }
        double most = bottom;
        for (int i = labels.size() - 1; i >= 0; i--) {
            Label label = labels.get(i);
            label.y = Math.min(label.y, most);
            most = label.y - SPACING;
        }
        for (Label label : labels) {
            Path2D lead = new Path2D.Double();
            lead.moveTo(x + 3, label.wanted);
            lead.lineTo(x + 7, label.wanted);
            lead.lineTo(x + LEAD - 5, label.y);
            lead.lineTo(x + LEAD - 1, label.y);
            sheet.draw(lead, label.color, Look.dashed(1.2f));
            String rest = label.rest.isEmpty() ? "" : " " + label.rest;
            double room = width - ROOM - Typeface.width(rest, Look.TEXT);
            String fitted = Typeface.fitted(label.name, Look.TEXT, room) + rest;
            sheet.text(
                    fitted,
                    x + ROOM,
                    label.y + 4,
                    Sheet.Anchor.LEFT,
                    Look.TEXT,
                    sheet.look().ink());
        }
    }
}
