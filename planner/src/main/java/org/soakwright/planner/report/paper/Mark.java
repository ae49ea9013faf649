package org.soakwright.planner.report.paper;

/** Something printed; x from the left edge of the page, y down from where it is placed, in points. */
sealed interface Mark {
    /** The same, so much lower. */
    Mark lowered(double by);

    /** One line of text that the face can show. */
    record Words(double x, double baseline, Face face, double size, String text) implements Mark {
        @Override
        public Mark lowered(double by) {
            return new Words(x, baseline + by, face, size, text);
        }
    }

    /** A line across. */
    record Rule(double x, double y, double length, double weight) implements Mark {
        @Override
        public Mark lowered(double by) {
            return new Rule(x, y + by, length, weight);
        }
    }

    /** A rectangle, its y the upper edge; grey as a ground without an outline where the weight is 0, else white with one. */
    record Frame(double x, double y, double width, double height, double weight) implements Mark {
        @Override
        public Mark lowered(double by) {
            return new Frame(x, y + by, width, height, weight);
        }
    }
}
