package org.soakwright.planner.report.paper;

import java.util.ArrayList;
import java.util.List;

/** A piece of a page over its whole width that is never cut; its marks lie between 0 and its height. */
record Strip(double height, List<Mark> marks) {
    Strip {
        marks = List.copyOf(marks);
    }

    static Strip gap(double height) {
        return new Strip(height, List.of());
    }

    static double height(List<Strip> strips) {
        return strips.stream().mapToDouble(Strip::height).sum();
    }

    /** One that holds several below each other. */
    static Strip of(List<Strip> strips) {
        List<Mark> marks = new ArrayList<>();
        double y = 0;
        for (Strip strip : strips) {
            double top = y;
            strip.marks().forEach(mark -> marks.add(mark.lowered(top)));
            y += strip.height();
        }
        return new Strip(y, marks);
    }
}
