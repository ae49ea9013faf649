package org.soakwright.recipes.parsing;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import org.jspecify.annotations.Nullable;
import org.soakwright.recipes.model.line.Agreement;
import org.soakwright.recipes.text.Nearest;
import org.soakwright.recipes.text.Place;
import org.soakwright.recipes.text.Problems;
import org.soakwright.recipes.text.Shown;
import org.soakwright.recipes.text.Source;
import org.soakwright.recipes.text.Tree;

/**
 * Reads a list of lots: separated values with a header row that names the columns, then one lot per row. What comes out is
 * what the same lots written into the line would be, so that one reader serves both. Lines that begin with # are passed over
 * before the header, not after it, where a lot may be called so.
 */
final class LotList {
    /** Columns without which there is no lot. */
    private static final List<String> NEEDED = List.of("lot", "recipe", "mass");

    private static final List<String> KNOWN = LineSection.ORDER.keys();
    private static final String EXAMPLE = "lot,recipe,mass,ready,due";

    /** A list in the wrong form is wrong in every row; more would help nobody. */
    static final int MOST_PROBLEMS = 20;

    private final Source source;
    private final Problems problems;
    private int broken;

    LotList(Source source, Problems problems) {
        this.source = source;
        this.problems = problems;
    }

    /** Whether every row could be read, once they are. */
    boolean isWhole() {
        return broken == 0;
    }

    /** Every row that could be read; null where there is none, with a problem added. */
    @Nullable
    List<Tree> rows() {
        List<String> lines = List.of(source.text().split("\n", -1));
        int header = 0;
        while (header < lines.size()
                && (lines.get(header).isBlank()
                        || lines.get(header).stripLeading().startsWith("#"))) {
            header++;
        }
        if (header == lines.size()) {
            problems.add(
                    Place.of(source.file()),
                    "the list is empty; write a header row such as " + EXAMPLE + ", then one lot per row");
            return null;
        }
        char separator = Csv.separator(lines.get(header));
        List<Csv.Cell> names = cells(header, lines, separator);
        return names == null || !isHeader(names) ? null : rows(lines, header, names, separator);
    }

    private @Nullable List<Csv.Cell> cells(int index, List<String> lines, char separator) {
        String line = lines.get(index);
        String text = line.endsWith("\r") ? line.substring(0, line.length() - 1) : line;
        return problems.attempt(() -> Csv.cells(source.file(), index + 1, text, separator));
    }

    private boolean isHeader(List<Csv.Cell> cells) {
        List<String> seen = new ArrayList<>();
        boolean whole = true;
        for (Csv.Cell cell : cells.subList(0, Math.min(cells.size(), MOST_PROBLEMS))) {
            String name = name(cell);
            if (!KNOWN.contains(name)) {
                problems.unknownKey(
                        cell.place(),
                        "unknown column: found " + (name.isEmpty() ? "nothing" : Shown.quoted(cell.text())) + "; "
                                + Nearest.hint(name, KNOWN));
                whole = false;
            } else if (seen.contains(name)) {
                problems.add(cell.place(), "two columns have one name: found " + name + " again; keep one");
                whole = false;
            }
            seen.add(name);
        }
        for (String needed : NEEDED) {
            if (!seen.contains(needed) && whole) {
                problems.add(
                        cells.get(0).place(),
                        "the list needs the column " + needed + ": found " + String.join(", ", seen)
                                + "; write such as " + EXAMPLE);
            }
        }
        return whole && seen.containsAll(NEEDED);
    }

    private static String name(Csv.Cell cell) {
        return cell.text().toLowerCase(Locale.ROOT);
    }

    private @Nullable List<Tree> rows(List<String> lines, int header, List<Csv.Cell> names, char separator) {
        List<Tree> rows = new ArrayList<>();
        for (int i = header + 1; i < lines.size() && rows.size() <= Agreement.MOST_ORDERS; i++) {
            if (lines.get(i).isBlank()) {
                continue;
            }
            List<Csv.Cell> cells = cells(i, lines, separator);
            if (cells != null && cells.stream().allMatch(cell -> cell.text().isEmpty())) {
                continue;
            }
            if (cells == null || !fits(cells, names, separator)) {
                if (++broken == MOST_PROBLEMS) {
                    problems.add(
                            Place.of(source.file()),
                            "there may be more to correct after the first " + broken + " problems");
                    return rows;
                }
                continue;
            }
            rows.add(row(cells, names));
        }
        if (rows.isEmpty() && broken == 0) {
            problems.add(
                    Place.of(source.file()),
                    "the list has no lots: found a header alone; write one lot per row below it");
        }
        return rows.isEmpty() ? null : rows;
    }

    private boolean fits(List<Csv.Cell> cells, List<Csv.Cell> names, char separator) {
        if (cells.size() == names.size()) {
            return true;
        }
        problems.add(
                cells.get(0).place(),
                "a row has as many cells as the header: found " + cells.size() + " where that has " + names.size()
                        + "; separate them by \"" + separator + "\" as there, and quote a cell that has one within it");
        return false;
    }

    /** An empty cell states nothing. */
    private static Tree row(List<Csv.Cell> cells, List<Csv.Cell> names) {
        List<Tree.Entry> entries = new ArrayList<>();
        for (int i = 0; i < cells.size(); i++) {
            Csv.Cell cell = cells.get(i);
            if (!cell.text().isEmpty()) {
                entries.add(new Tree.Entry(cell.place(), name(names.get(i)), new Tree.Leaf(cell.place(), cell.text())));
            }
        }
        return new Tree.Entries(cells.get(0).place(), entries);
    }
}
