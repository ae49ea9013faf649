package org.soakwright.planner.report.paper;

import java.util.ArrayList;
import java.util.List;

/** Strips placed on pages from the top down. */
final class Pages {
    private final double top;
    private final double bottom;
    private final Strip later;
    private final List<List<Mark>> pages = new ArrayList<>();
    private double y;

    /**
     * No page yet has anything on it.
     *
     * @param top of what is placed, in points from the upper edge
     * @param bottom the same for its end
     * @param later what every page but the first begins with
     */
    Pages(double top, double bottom, Strip later) {
        this.top = top;
        this.bottom = bottom;
        this.later = later;
        turn();
    }

    private void turn() {
        pages.add(new ArrayList<>());
        y = top;
        if (pages.size() > 1) {
            put(later);
        }
    }

    private void put(Strip strip) {
        strip.marks().forEach(mark -> page().add(mark.lowered(y)));
        y += strip.height();
    }

    private List<Mark> page() {
        return pages.get(pages.size() - 1);
    }

    private boolean hasRoomFor(double height) {
        return y + height <= bottom;
    }

    /**
     * What belongs together.
     *
     * @param title repeated on every page that the block goes over
     * @param opening what follows the title
     * @param columns the heading of the rows, repeated with the title where rows go over
     */
    record Block(List<Strip> title, List<Strip> opening, List<Strip> columns, List<Strip> rows) {
        static Block of(List<Strip> title, List<Strip> opening) {
            return new Block(title, opening, List.of(), List.of());
        }

        double height() {
            return Strip.height(title) + Strip.height(opening) + Strip.height(columns) + Strip.height(rows);
        }

        /** Of the least that is worth beginning on a page. */
        double beginning() {
            List<Strip> first = opening.isEmpty() ? rows : opening;
            return Strip.height(title) + (first.isEmpty() ? 0 : first.get(0).height());
        }
    }

    /** On one page if that can be; else over as many as it takes. */
    void add(Block block) {
        boolean whole = top + later.height() + block.height() <= bottom;
        if (!hasRoomFor(whole ? block.height() : block.beginning())) {
            turn();
        }
        block.title().forEach(this::put);
        flow(block.opening(), block.title());
        if (block.rows().isEmpty()) {
            return;
        }
        if (!hasRoomFor(Strip.height(block.columns()) + block.rows().get(0).height())) {
            turn();
            block.title().forEach(this::put);
        }
        block.columns().forEach(this::put);
        List<Strip> head = new ArrayList<>(block.title());
        head.addAll(block.columns());
        flow(block.rows(), head);
    }

    private void flow(List<Strip> strips, List<Strip> head) {
        for (Strip strip : strips) {
            if (!hasRoomFor(strip.height())) {
                turn();
                head.forEach(this::put);
            }
            put(strip);
        }
    }

    /** The marks of each page, y from its upper edge. */
    List<List<Mark>> marks() {
        return pages;
    }
}
