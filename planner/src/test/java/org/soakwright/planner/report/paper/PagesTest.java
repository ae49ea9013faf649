package org.soakwright.planner.report.paper;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.Collections;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.soakwright.planner.report.paper.Pages.Block;

/** Pages of 100 points, on which every strip is a line whose length tells which it is. */
class PagesTest {
    private static final double TITLE = 1;
    private static final double COLUMNS = 2;
    private static final double LATER = 9;

    private final Pages pages = new Pages(0, 100, strip(LATER, 10));

    private static Strip strip(double length, double height) {
        return new Strip(height, List.of(new Mark.Rule(0, 0, length, 1)));
    }

    private static List<Strip> rows(int count, double height) {
        return Collections.nCopies(count, strip(5, height));
    }

    private List<Double> lengths(int page) {
        return pages.marks().get(page).stream()
                .map(mark -> ((Mark.Rule) mark).length())
                .toList();
    }

    @Test
    void whatFitsAPageIsKeptOnOne() {
        pages.add(Block.of(List.of(), rows(6, 10)));
        pages.add(Block.of(List.of(strip(TITLE, 10)), rows(4, 10)));
        assertEquals(2, pages.marks().size());
        assertEquals(List.of(5.0, 5.0, 5.0, 5.0, 5.0, 5.0), lengths(0));
        assertEquals(List.of(LATER, TITLE, 5.0, 5.0, 5.0, 5.0), lengths(1));
    }

    @Test
    void rowsThatGoOverRepeatTitleAndColumns() {
        pages.add(new Block(List.of(strip(TITLE, 10)), rows(1, 10), List.of(strip(COLUMNS, 10)), rows(10, 10)));
        assertEquals(List.of(TITLE, 5.0, COLUMNS, 5.0, 5.0, 5.0, 5.0, 5.0, 5.0, 5.0), lengths(0));
        assertEquals(List.of(LATER, TITLE, COLUMNS, 5.0, 5.0, 5.0), lengths(1));
    }

    @Test
    void noTitleStandsAloneAtTheEndOfAPage() {
        pages.add(Block.of(List.of(), rows(8, 10)));
        pages.add(Block.of(List.of(strip(TITLE, 15)), rows(30, 10)));
        assertEquals(8, lengths(0).size());
        assertEquals(TITLE, lengths(1).get(1));
    }
}
