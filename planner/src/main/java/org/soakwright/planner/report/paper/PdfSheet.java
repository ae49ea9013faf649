package org.soakwright.planner.report.paper;

import java.io.IOException;
import java.io.OutputStream;
import java.util.ArrayList;
import java.util.List;
import org.apache.pdfbox.pdmodel.PDDocument;

/** A sheet as PDF: the same content in the same order as the page. */
final class PdfSheet {
    private static final double BLANK_WIDTH = 120;
    private static final double BLANK_COLUMN = BLANK_WIDTH + 60;
    private static final double VESSEL_WIDTH = 90;
    private static final int MOST_TITLE_LINES = 3;
    private static final int MOST_NAME_LINES = 2;

    private final Sheet sheet;
    private final Setting set;

    private PdfSheet(Sheet sheet, Setting set) {
        this.sheet = sheet;
        this.set = set;
    }

    static void write(Sheet sheet, OutputStream out) throws IOException {
        try (PDDocument document = new PDDocument();
                Face regular = Face.of(Face.REGULAR, document);
                Face semibold = Face.of(Face.SEMIBOLD, document)) {
            new PdfFile(document, sheet).write(fewest(sheet, regular, semibold), out);
        }
    }

    /** Dense only where that saves a page. */
    private static List<List<Mark>> fewest(Sheet sheet, Face regular, Face semibold) {
        List<List<Mark>> roomy = new PdfSheet(sheet, new Setting(regular, semibold, false)).pages();
        List<List<Mark>> dense = new PdfSheet(sheet, new Setting(regular, semibold, true)).pages();
        return dense.size() < roomy.size() ? dense : roomy;
    }

    private List<List<Mark>> pages() {
        Pages pages = new Pages(Setting.TOP, Setting.BOTTOM, runningHead());
        pages.add(Pages.Block.of(List.of(), head()));
        for (Sheet.Part part : sheet.parts()) {
            pages.add(part(part));
        }
        if (!sheet.targets().isEmpty()) {
            pages.add(new Pages.Block(
                    List.of(heading(Sheet.TARGETS)),
                    List.of(),
                    List.of(tableHead(targetColumns(), Sheet.TargetLine.HEADINGS)),
                    targets()));
        }
        list(pages, Sheet.SAMPLING, sheet.sampling());
        list(pages, Sheet.CAUTIONS, sheet.cautions());
        pages.add(Pages.Block.of(List.of(heading(Sheet.SIGNATURES)), List.of(signatures())));
        List<List<Mark>> marks = pages.marks();
        for (int i = 0; i < marks.size(); i++) {
            marks.get(i).addAll(footer(i + 1, marks.size()));
        }
        return marks;
    }

    private List<Strip> head() {
        List<Strip> strips = new ArrayList<>();
        if (!sheet.isPlan()) {
            strips.add(banner());
            strips.add(Strip.gap(2 * Setting.GAP));
        }
        Setting.Column left = new Setting.Column(Setting.LEFT, Setting.WIDTH - BLANK_COLUMN);
        Strip title = Strip.of(List.of(
                set.words(left, set.regular, Setting.BODY, Sheet.KIND),
                set.words(left, set.semibold, Setting.TITLE, sheet.title(), MOST_TITLE_LINES)));
        List<Mark> marks = new ArrayList<>(title.marks());
        double y = 0;
        for (Sheet.Blank blank : sheet.lotBlanks()) {
            marks.addAll(set.blank(blank, y, BLANK_WIDTH));
            y += set.blankHeight + 4;
        }
        strips.add(new Strip(Math.max(title.height(), y) + 2, marks));
        strips.addAll(set.lines(Setting.STEP, sheet.lot()));
        strips.add(Strip.gap(2));
        strips.addAll(set.lines(Setting.BODY, sheet.timing()));
        strips.add(Strip.gap(set.gap));
        return strips;
    }

    private Strip banner() {
        double inset = 8;
        Setting.Column inside = new Setting.Column(Setting.LEFT + inset, Setting.WIDTH - 2 * inset);
        List<Strip> strips = new ArrayList<>();
        strips.add(Strip.gap(inset - 2));
        strips.add(set.words(inside, set.semibold, Setting.TITLE, sheet.banner()));
        sheet.against().forEach(miss -> strips.add(set.words(inside, set.regular, Setting.STEP, miss)));
        strips.add(Strip.gap(inset - 2));
        Strip inner = Strip.of(strips);
        List<Mark> marks = new ArrayList<>();
        marks.add(new Mark.Frame(Setting.LEFT, 0, Setting.WIDTH, inner.height(), Setting.BOLD));
        marks.addAll(inner.marks());
        return new Strip(inner.height(), marks);
    }

    /** What every page but the first begins with, so that no page can be taken for one of another lot. */
    private Strip runningHead() {
        Sheet.Blank code = sheet.lotBlanks().get(0);
        Setting.Column left = new Setting.Column(Setting.LEFT, Setting.WIDTH - BLANK_COLUMN);
        String text = sheet.isPlan() ? sheet.title() : sheet.banner() + ". " + sheet.title();
        Strip title = set.words(left, set.semibold, Setting.STEP, text, 1);
        List<Mark> marks = new ArrayList<>();
        title.marks().forEach(mark -> marks.add(mark.lowered(4)));
        marks.addAll(set.blank(code, 0, BLANK_WIDTH));
        return new Strip(set.blankHeight + 2 * Setting.GAP, marks);
    }

    private Pages.Block part(Sheet.Part part) {
        return new Pages.Block(
                partHead(part),
                set.lines(Setting.STEP, part.makeUp()),
                List.of(tableHead(partColumns(), sheet.hasWall() ? Sheet.Part.HEADINGS : withoutWall())),
                partRows(part));
    }

    private List<Strip> partHead(Sheet.Part part) {
        double pad = 3;
        Setting.Column number = new Setting.Column(Setting.LEFT + pad, 18);
        Setting.Column name = new Setting.Column(Setting.LEFT + 22, 190);
        Setting.Column doing = new Setting.Column(Setting.LEFT + 22 + 190 + Setting.GAP, 150);
        Strip named = set.words(name, set.semibold, Setting.HEADING, part.name(), MOST_NAME_LINES);
        Strip done = set.words(doing, set.regular, Setting.STEP, part.doing());
        double height = Math.max(Math.max(named.height(), done.height()), set.blankHeight) + 2 * pad;
        List<Mark> marks = new ArrayList<>();
        marks.add(new Mark.Frame(Setting.LEFT, 0, Setting.WIDTH, height, 0));
        marks.add(new Mark.Rule(Setting.LEFT, 0, Setting.WIDTH, 1.5 * Setting.LINE));
        set.words(number, set.semibold, Setting.HEADING, Integer.toString(part.number())).marks().stream()
                .map(mark -> mark.lowered(0.5 * (height - named.height())))
                .forEach(marks::add);
        named.marks().forEach(mark -> marks.add(mark.lowered(0.5 * (height - named.height()))));
        done.marks().forEach(mark -> marks.add(mark.lowered(0.5 * (height - done.height()) + 0.5)));
        double y = 0.5 * (height - set.blankHeight);
        set.blank(new Sheet.Blank(Sheet.VESSEL, ""), y, VESSEL_WIDTH).forEach(marks::add);
        return List.of(Strip.gap(set.gap), new Strip(height, marks), Strip.gap(3));
    }

    private static List<String> withoutWall() {
        return Sheet.Part.HEADINGS.stream()
                .filter(heading -> !heading.equals(Sheet.Part.WALL))
                .toList();
    }

    private List<Setting.Column> partColumns() {
        return Setting.Column.of(Setting.moments(sheet.hasWall()));
    }

    private Strip tableHead(List<Setting.Column> columns, List<String> headings) {
        List<Strip> words = new ArrayList<>();
        for (int i = 0; i < headings.size(); i++) {
            words.add(set.words(columns.get(i), set.semibold, Setting.BODY, headings.get(i)));
        }
        double height = words.stream().mapToDouble(Strip::height).max().orElse(0);
        List<Mark> marks = new ArrayList<>();
        words.forEach(strip -> strip.marks().forEach(mark -> marks.add(mark.lowered(2))));
        return new Strip(height + 3, marks);
    }

    private List<Strip> partRows(Sheet.Part part) {
        List<Strip> strips = new ArrayList<>();
        List<Setting.Column> columns = partColumns();
        for (Sheet.Moment moment : part.moments()) {
            List<Setting.Cell> cells = new ArrayList<>();
            List<String> words = new ArrayList<>(List.of(moment.what(), moment.clock()));
            if (sheet.hasWall()) {
                words.add(moment.wall());
            }
            words.add(moment.planned());
            for (int i = 0; i < words.size(); i++) {
                cells.add(
                        i == 0
                                ? Setting.Cell.strong(columns.get(i), words.get(i))
                                : Setting.Cell.words(columns.get(i), words.get(i)));
            }
            cells.add(Setting.Cell.box(columns.get(words.size()), moment.unit()));
            cells.add(Setting.Cell.box(columns.get(words.size() + 1), ""));
            strips.add(set.row(Setting.STEP, cells));
            double x = columns.get(1).x();
            Setting.Column notes = new Setting.Column(x, Setting.LEFT + Setting.WIDTH - x);
            moment.notes().forEach(note -> strips.addAll(set.lines(notes, Setting.BODY, note)));
            if (!moment.notes().isEmpty()) {
                strips.add(Strip.gap(2));
            }
        }
        strips.addAll(set.lines(Setting.BODY, part.notes()));
        return strips;
    }

    private Strip heading(String text) {
        return Strip.of(List.of(
                Strip.gap(1.5 * set.gap),
                set.words(Setting.Column.whole(), set.semibold, Setting.HEADING, text),
                Strip.gap(1)));
    }

    private static List<Setting.Column> targetColumns() {
        return Setting.Column.of(Setting.targets());
    }

    private List<Strip> targets() {
        List<Setting.Column> columns = targetColumns();
        List<Strip> strips = new ArrayList<>();
        for (Sheet.TargetLine line : sheet.targets()) {
            List<Setting.Cell> cells = new ArrayList<>();
            List<String> words = line.words();
            for (int i = 0; i < words.size(); i++) {
                boolean strong = i == words.size() - 1;
                cells.add(
                        strong
                                ? Setting.Cell.strong(columns.get(i), words.get(i))
                                : Setting.Cell.words(columns.get(i), words.get(i)));
            }
            if (!line.unit().isEmpty()) {
                cells.add(Setting.Cell.box(columns.get(words.size()), line.unit()));
            }
            strips.add(set.row(Setting.BODY, cells));
        }
        return strips;
    }

    private void list(Pages pages, String heading, List<String> points) {
        if (!points.isEmpty()) {
            pages.add(Pages.Block.of(
                    List.of(heading(heading)),
                    points.stream().flatMap(point -> set.point(point).stream()).toList()));
        }
    }

    private Strip signatures() {
        double[] shares = new double[sheet.signatures().size()];
        java.util.Arrays.fill(shares, 1);
        List<Setting.Column> columns = Setting.Column.of(shares);
        List<Mark> marks = new ArrayList<>();
        double label = set.leading(Setting.BODY);
        double height = 1.4 * set.blankHeight;
        for (int i = 0; i < columns.size(); i++) {
            marks.addAll(set.words(
                            columns.get(i),
                            set.regular,
                            Setting.BODY,
                            sheet.signatures().get(i))
                    .marks());
            marks.addAll(set.box(columns.get(i), label + 1, height, ""));
        }
        return new Strip(label + height + 2, marks);
    }

    private List<Mark> footer(int page, int pages) {
        double y = Setting.BOTTOM + 7;
        String count = "page " + page + " of " + pages;
        double width = set.regular.width(count, Setting.SMALL);
        Setting.Column left = new Setting.Column(Setting.LEFT, Setting.WIDTH - width - 2 * Setting.GAP);
        List<Mark> marks = new ArrayList<>();
        marks.add(new Mark.Rule(Setting.LEFT, y - 4, Setting.WIDTH, Setting.HAIR));
        set.words(left, set.regular, Setting.SMALL, sheet.footer(), 1)
                .marks()
                .forEach(mark -> marks.add(mark.lowered(y)));
        marks.add(new Mark.Words(
                Setting.LEFT + Setting.WIDTH - width, y + Setting.SMALL * 1.02, set.regular, Setting.SMALL, count));
        return marks;
    }
}
