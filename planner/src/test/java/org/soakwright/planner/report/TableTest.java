package org.soakwright.planner.report;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.api.Test;

class TableTest {
    @Test
    void numbersStandOnTheirDecimalPoints() {
        Table table = new Table().text("Name").number("Value");
        table.row(List.of("a", "9.281 g/kg"));
        table.row(List.of("b", "120 g/kg"));
        table.row(List.of("c", "unlimited"));
        assertEquals(
                List.of(
                        "  Name  Value", //
                        "  a       9.281 g/kg",
                        "  b     120 g/kg",
                        "  c     unlimited"),
                TableText.lines(table, Style.PLAIN));
    }

    @Test
    void longNamesGiveWayBeforeASheetGetsTooWide() {
        Table table = new Table().text("Name").number("Value");
        table.row(List.of("n".repeat(300), "9.281 g/kg"));
        List<String> lines = TableText.lines(table, Style.PLAIN);
        assertTrue(lines.get(1).endsWith("…  9.281 g/kg"), lines.get(1));
        assertEquals(Prose.WIDTH, Prose.length(lines.get(1)));
    }

    @Test
    void colourDoesNotMoveAColumn() {
        Table table = new Table().verdict("Verdict").text("Note");
        table.row(List.of("met", "x"));
        table.row(List.of("MISSED", "y"));
        List<String> plain = TableText.lines(table, Style.PLAIN);
        List<String> coloured = TableText.lines(table, Style.ANSI).stream()
                .map(line -> line.replaceAll("\u001b\\[[0-9;]*m", ""))
                .toList();
        assertEquals(plain, coloured);
        assertTrue(TableText.lines(table, Style.ANSI).get(1).contains("\u001b[32m"));
    }
}
