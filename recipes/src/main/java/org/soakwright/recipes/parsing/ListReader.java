package org.soakwright.recipes.parsing;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.jspecify.annotations.Nullable;
import org.soakwright.recipes.model.Dimension;
import org.soakwright.recipes.model.Shape;
import org.soakwright.recipes.text.Kind;
import org.soakwright.recipes.text.Measurement;
import org.soakwright.recipes.text.Nearest;
import org.soakwright.recipes.text.Place;
import org.soakwright.recipes.text.Problems;
import org.soakwright.recipes.text.Shown;
import org.soakwright.recipes.text.Source;
import org.soakwright.recipes.text.Unit;

/**
 * Reads a list of measured pieces: comma-separated values with a header row that names each column and its unit, then one
 * piece per row. Lines that begin with # and empty ones are passed over.
 */
final class ListReader {
    private static final Pattern COLUMN = Pattern.compile("([^\\[(]*+)(?:\\[([^\\])]*+)]|\\(([^\\])]*+)\\))");
    private static final String WEIGHT = "weight";
    private static final int FEWEST = 5;
    private static final int MOST = 100_000;

    /** A list in the wrong form is wrong in every row; more would help nobody. */
    private static final int MOST_PROBLEMS = 20;

    private final Source source;
    private final Problems problems;
    private final List<String> known = new ArrayList<>();
    private final String example;
    private int found;

    ListReader(Source source, Shape shape, Problems problems) {
        this.source = source;
        this.problems = problems;
        shape.dimensions().forEach(dimension -> known.add(dimension.word()));
        known.add(WEIGHT);
        example = known.get(0) + " [mm]";
    }

    /** A cell and where it stands. */
    private record Cell(Place place, String text) {}

    /** A column by its name. */
    private record Column(String name, Unit unit) {}

    @Nullable
    SizeList list() {
        List<Column> columns = List.of();
        List<SizeList.Row> rows = new ArrayList<>();
        int line = 0;
        for (String text : source.text().split("\n", -1)) {
            line++;
            if (text.isBlank() || text.stripLeading().startsWith("#")) {
                continue;
            }
            List<Cell> cells = cells(text, line);
            if (columns.isEmpty()) {
                columns = header(cells);
                if (columns.isEmpty()) {
                    return null;
                }
                continue;
            }
            if (rows.size() == MOST) {
                problem(cells.get(0).place(), "a list holds " + MOST + " pieces at most: found more; keep a sample");
                return null;
            }
            SizeList.Row row = row(cells, columns);
            if (row != null) {
                rows.add(row);
            } else if (found >= MOST_PROBLEMS) {
                problem(Place.of(source.file()), "there may be more to correct after the first " + found + " problems");
                return null;
            }
        }
        return checked(columns, rows);
    }

    private @Nullable SizeList checked(List<Column> columns, List<SizeList.Row> rows) {
        Place whole = Place.of(source.file());
        if (columns.isEmpty()) {
            problem(whole, "the list is empty; write a header row such as " + example + ", then one piece per row");
        } else if (found == 0 && rows.size() < FEWEST) {
            problem(
                    whole,
                    "a list holds " + FEWEST + " pieces or more: found " + rows.size()
                            + "; measure more, or state the size");
        }
        if (found > 0) {
            return null;
        }
        Column size = columns.stream()
                .filter(column -> !column.name().equals(WEIGHT))
                .findFirst()
                .orElseThrow();
        Unit weight = columns.stream()
                .filter(column -> column.name().equals(WEIGHT))
                .map(Column::unit)
                .findFirst()
                .orElse(null);
        return new SizeList(
                Dimension.valueOf(size.name().toUpperCase(Locale.ROOT)), size.unit(), weight, List.copyOf(rows));
    }

    private List<Cell> cells(String line, int number) {
        List<Cell> cells = new ArrayList<>();
        int from = 0;
        for (String part : line.split(",", -1)) {
            int lead = part.length() - part.stripLeading().length();
            Place place = new Place(source.file(), number, line.codePointCount(0, from + lead) + 1);
            cells.add(new Cell(place, unquoted(part.strip())));
            from += part.length() + 1;
        }
        return cells;
    }

    private static String unquoted(String cell) {
        return cell.length() > 1 && cell.startsWith("\"") && cell.endsWith("\"")
                ? cell.substring(1, cell.length() - 1).strip()
                : cell;
    }

    private List<Column> header(List<Cell> cells) {
        List<Column> columns = new ArrayList<>();
        for (Cell cell : cells.subList(0, Math.min(cells.size(), MOST_PROBLEMS))) {
            Column column = column(cell);
            if (column != null && columns.stream().anyMatch(one -> one.name().equals(column.name()))) {
                problem(cell.place(), "two columns have one name: found " + column.name() + " again; keep one");
            }
            if (column != null) {
                columns.add(column);
            }
        }
        List<String> sizes = columns.stream()
                .map(Column::name)
                .filter(name -> !name.equals(WEIGHT))
                .distinct()
                .toList();
        if (found == 0 && sizes.isEmpty()) {
            problem(cells.get(0).place(), "the list has no column of a size: found none; write such as " + example);
        } else if (sizes.size() > 1) {
            problem(
                    cells.get(0).place(),
                    "one size is measured, the others follow from proportions: found " + String.join(", ", sizes)
                            + "; keep one column");
        }
        return found == 0 ? columns : List.of();
    }

    private @Nullable Column column(Cell cell) {
        Matcher matcher = COLUMN.matcher(cell.text());
        if (!matcher.matches()) {
            problem(
                    cell.place(),
                    "the first row names each column and its unit: found "
                            + (cell.text().isEmpty() ? "nothing" : Shown.quoted(cell.text())) + "; write such as "
                            + example);
            return null;
        }
        String name = matcher.group(1).strip().toLowerCase(Locale.ROOT);
        if (!known.contains(name)) {
            problem(cell.place(), "unknown column: found " + Shown.quoted(name) + "; " + Nearest.hint(name, known));
            return null;
        }
        String symbol = matcher.group(2) == null ? matcher.group(3) : matcher.group(2);
        Kind kind = name.equals(WEIGHT) ? Kind.MASS : Kind.LENGTH;
        Unit unit = kind.unit(symbol.strip()).orElse(null);
        if (unit == null) {
            problem(
                    cell.place(),
                    "the unit of " + name + ": found " + Shown.quoted(symbol) + ", where that of " + kind.label()
                            + " is needed; write such as " + kind.usual());
            return null;
        }
        return new Column(name, unit);
    }

    private SizeList.@Nullable Row row(List<Cell> cells, List<Column> columns) {
        if (cells.size() != columns.size()) {
            problem(
                    cells.get(0).place(),
                    "a row has as many cells as the header: found " + cells.size() + " where that has " + columns.size()
                            + "; separate them by commas, and write decimals with a point");
            return null;
        }
        double size = 0;
        double weight = 0;
        for (int i = 0; i < cells.size(); i++) {
            double value = value(cells.get(i), columns.get(i));
            if (columns.get(i).name().equals(WEIGHT)) {
                weight = value;
            } else {
                size = value;
            }
        }
        return Double.isNaN(size + weight) ? null : new SizeList.Row(size, weight);
    }

    /** In SI; not a number where it is none above zero. */
    private double value(Cell cell, Column column) {
        Measurement measured = Measurement.of(cell.text()).orElse(null);
        if (measured == null || !measured.unit().isEmpty()) {
            problem(
                    cell.place(),
                    column.name() + ": "
                            + (measured == null
                                    ? Measurement.whyNot(cell.text())
                                    : "found " + Shown.quoted(cell.text()) + ", its unit belongs in the header")
                            + "; write a plain number such as 12.5");
            return Double.NaN;
        }
        double value = column.unit().toSi(measured.number());
        boolean possible = column.name().equals(WEIGHT) ? value > 0 && value < 1e9 : SizeReader.isPossible(value);
        if (!possible) {
            problem(
                    cell.place(),
                    "no piece has this " + column.name() + ": found " + Shown.quoted(cell.text())
                            + "; write a number above zero such as 12.5");
            return Double.NaN;
        }
        return value;
    }

    private void problem(Place place, String what) {
        problems.add(place, what);
        found++;
    }
}
