package org.soakwright.planner.report;

import java.util.List;
import java.util.OptionalDouble;
import java.util.regex.Pattern;

/**
 * A table for spreadsheets, as RFC 4180 has it: commas, lines ended by CR LF, quotes where a cell needs them. Numbers are written in full
 * with a decimal point; a text that a spreadsheet would take for a formula gets an apostrophe before it.
 */
public final class Csv {
    private static final Pattern NEEDS_QUOTES = Pattern.compile("[\",\r\n]|^\\s|\\s$");
    private static final String FORMULA = "=+-@\t\r";

    private final StringBuilder text = new StringBuilder();
    private final int columns;
    private int cells;

    /** With units in the headers that have one: {@code duration [s]}. */
    public Csv(List<String> headers) {
        columns = headers.size();
        headers.forEach(this::text);
        end();
    }

    public Csv text(String value) {
        boolean formula = !value.isEmpty() && FORMULA.indexOf(value.charAt(0)) >= 0;
        return cell(formula ? "'" + value : value);
    }

    public Csv number(double value) {
        if (!Double.isFinite(value)) {
            throw new ArithmeticException("a cell came out as " + value);
        }
        return cell(
                value == Math.rint(value) && Math.abs(value) < 1e15
                        ? Long.toString((long) value)
                        : Double.toString(value));
    }

    public Csv whole(long value) {
        return cell(Long.toString(value));
    }

    /** An empty cell where there is none. */
    public Csv number(OptionalDouble value) {
        return value.isPresent() ? number(value.getAsDouble()) : cell("");
    }

    private Csv cell(String content) {
        if (cells > 0) {
            text.append(',');
        }
        boolean quotes = NEEDS_QUOTES.matcher(content).find();
        text.append(quotes ? "\"" + content.replace("\"", "\"\"") + "\"" : content);
        cells++;
        return this;
    }

    /** Ends a row. */
    public void end() {
        if (cells != columns) {
            throw new IllegalStateException(columns + " cells wanted, found " + cells);
        }
        text.append("\r\n");
        cells = 0;
    }

    @Override
    public String toString() {
        return text.toString();
    }
}
