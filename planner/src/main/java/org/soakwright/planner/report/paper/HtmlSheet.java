package org.soakwright.planner.report.paper;

import java.util.Arrays;
import java.util.List;

/** A sheet as one page of HTML that is XML as well, made to be printed. */
final class HtmlSheet {
    private static final String STYLE = """
            @page { size: A4; margin: 13mm 14mm 15mm;
              @bottom-right { content: "page " counter(page) " of " counter(pages); font-size: 8pt; } }
            * { box-sizing: border-box; }
            body { font: 10pt/1.35 "Open Sans", "Segoe UI", Roboto, "Helvetica Neue", Arial, sans-serif; color: #000; background: #fff;
              max-width: 182mm; margin: 8mm auto; }
            @media print { body { margin: 0; max-width: none; } }
            h1 { font-size: 16pt; line-height: 1.2; margin: 0; overflow-wrap: anywhere; }
            h2 { font-size: 11pt; margin: 4mm 0 1mm; break-after: avoid; }
            p, ul { font-size: 9pt; margin: 0 0 1mm; overflow-wrap: anywhere; }
            ul { padding-left: 4mm; }
            header { display: flex; gap: 6mm; justify-content: space-between; margin-bottom: 2mm; }
            header > div:first-child { flex: 1; min-width: 0; }
            .kind { font-size: 9pt; }
            .lot { font-size: 10pt; }
            .banner { border: 1mm solid #000; padding: 2mm 3mm; margin: 0 0 3mm; }
            .banner strong { font-size: 15pt; }
            .blank { display: flex; align-items: center; justify-content: flex-end; gap: 2mm; font-size: 9pt; white-space: nowrap; }
            .blank + .blank { margin-top: 1mm; }
            .box { display: inline-block; border: 0.3mm solid #000; background: #fff; height: 7mm; width: 38mm; text-align: right;
              padding: 1.6mm 1mm 0; font-size: 8pt; color: #444; line-height: 1.35; }
            section { break-inside: avoid; margin-top: 3mm; }
            .part > h2 { display: flex; align-items: center; gap: 4mm; margin: 0 0 1mm; padding: 1mm 2mm; background: #e8e8e8;
              border-top: 0.5mm solid #000; -webkit-print-color-adjust: exact; print-color-adjust: exact; }
            .part > h2 > span { overflow-wrap: anywhere; min-width: 0; }
            .part > h2 > .doing { font-weight: normal; font-size: 10pt; flex: 1; }
            table { border-collapse: collapse; width: 100%; table-layout: fixed; font-size: 10pt; }
            thead { display: table-header-group; }
            th { text-align: left; font-size: 9pt; font-weight: 600; border-bottom: 0.3mm solid #000; padding: 0.3mm 2mm 0.3mm 0; }
            td { padding: 0.7mm 2mm 0.7mm 0; vertical-align: middle; overflow-wrap: anywhere; }
            td:last-child, th:last-child { padding-right: 0; }
            tr { break-inside: avoid; }
            tr.event td { border-top: 0.1mm solid #999; }
            tr.note td { font-size: 9pt; padding-top: 0; }
            table.targets { font-size: 9pt; }
            td.what { font-weight: 600; }
            td.time { white-space: nowrap; font-variant-numeric: tabular-nums; }
            td .box { width: 100%; display: block; }
            .sign .box { width: 100%; height: 9mm; }
            footer { margin-top: 4mm; border-top: 0.1mm solid #999; padding-top: 1mm; font-size: 8pt; overflow-wrap: anywhere; }
            """;

    private final Sheet sheet;
    private final StringBuilder out = new StringBuilder(16_384);

    private HtmlSheet(Sheet sheet) {
        this.sheet = sheet;
    }

    static String of(Sheet sheet) {
        return new HtmlSheet(sheet).page();
    }

    private String page() {
        out.append("<!DOCTYPE html>\n<html lang=\"en\">\n<head>\n<meta charset=\"utf-8\"/>\n")
                .append("<meta name=\"viewport\" content=\"width=device-width, initial-scale=1\"/>\n");
        element("title", Sheet.KIND + ": " + sheet.title());
        out.append("<style>\n").append(STYLE).append("</style>\n</head>\n<body>\n");
        head();
        sheet.parts().forEach(this::part);
        targets();
        list(Sheet.SAMPLING, sheet.sampling());
        list(Sheet.CAUTIONS, sheet.cautions());
        signatures();
        element("footer", sheet.footer());
        return out.append("</body>\n</html>\n").toString();
    }

    private void head() {
        if (!sheet.isPlan()) {
            out.append("<div class=\"banner\" role=\"alert\">");
            element("strong", sheet.banner());
            sheet.against().forEach(miss -> element("p", miss));
            out.append("</div>\n");
        }
        out.append("<header>\n<div>");
        element("div", "kind", Sheet.KIND);
        element("h1", sheet.title());
        out.append("</div>\n<div>");
        sheet.lotBlanks().forEach(this::blank);
        out.append("</div>\n</header>\n");
        sheet.lot().forEach(line -> element("p", "lot", line));
        sheet.timing().forEach(line -> element("p", line));
    }

    private void blank(Sheet.Blank blank) {
        out.append("<div class=\"blank\">").append(escaped(blank.label())).append(box(blank.unit()));
        out.append("</div>");
    }

    private void part(Sheet.Part part) {
        out.append("<section class=\"part\">\n<h2>");
        element("span", part.number() + "  " + part.name());
        element("span", "doing", part.doing());
        blank(new Sheet.Blank(Sheet.VESSEL, ""));
        out.append("</h2>\n");
        part.makeUp().forEach(line -> element("p", "lot", line));
        table("moments", Setting.moments(sheet.hasWall()));
        for (String heading : Sheet.Part.HEADINGS) {
            if (sheet.hasWall() || !heading.equals(Sheet.Part.WALL)) {
                element("th", heading);
            }
        }
        out.append("</tr></thead>\n<tbody>\n");
        part.moments().forEach(this::moment);
        out.append("</tbody>\n</table>\n");
        part.notes().forEach(line -> element("p", line));
        out.append("</section>\n");
    }

    private void moment(Sheet.Moment moment) {
        out.append("<tr class=\"event\">");
        element("td", "what", moment.what());
        element("td", "time", moment.clock());
        if (sheet.hasWall()) {
            element("td", "time", moment.wall());
        }
        element("td", moment.planned());
        out.append("<td>")
                .append(box(moment.unit()))
                .append("</td><td>")
                .append(box(""))
                .append("</td></tr>\n");
        for (String note : moment.notes()) {
            out.append("<tr class=\"note\"><td></td><td colspan=\"")
                    .append(sheet.hasWall() ? 5 : 4)
                    .append("\">");
            out.append(escaped(note)).append("</td></tr>\n");
        }
    }

    private void targets() {
        if (sheet.targets().isEmpty()) {
            return;
        }
        out.append("<section>\n");
        element("h2", Sheet.TARGETS);
        table("targets", Setting.targets());
        Sheet.TargetLine.HEADINGS.forEach(heading -> element("th", heading));
        out.append("</tr></thead>\n<tbody>\n");
        for (Sheet.TargetLine line : sheet.targets()) {
            out.append("<tr class=\"event\">");
            line.words().forEach(word -> element("td", word));
            out.append("<td>")
                    .append(line.unit().isEmpty() ? "" : box(line.unit()))
                    .append("</td></tr>\n");
        }
        out.append("</tbody>\n</table>\n</section>\n");
    }

    private void list(String heading, List<String> points) {
        if (points.isEmpty()) {
            return;
        }
        out.append("<section>\n");
        element("h2", heading);
        out.append("<ul>\n");
        points.forEach(point -> element("li", point));
        out.append("</ul>\n</section>\n");
    }

    private void signatures() {
        out.append("<section>\n");
        element("h2", Sheet.SIGNATURES);
        out.append("<table class=\"sign\">\n<tbody><tr>");
        sheet.signatures()
                .forEach(who ->
                        out.append("<td>").append(escaped(who)).append(box("")).append("</td>"));
        out.append("</tr></tbody>\n</table>\n</section>\n");
    }

    private void table(String kind, double[] shares) {
        double sum = Arrays.stream(shares).sum();
        out.append("<table class=\"").append(kind).append("\">\n<colgroup>");
        for (double share : shares) {
            out.append("<col style=\"width:")
                    .append(Math.round(1000 * share / sum) / 10.0)
                    .append("%\"/>");
        }
        out.append("</colgroup>\n<thead><tr>");
    }

    private static String box(String unit) {
        return "<span class=\"box\">" + escaped(unit) + "</span>";
    }

    private void element(String name, String text) {
        out.append('<')
                .append(name)
                .append('>')
                .append(escaped(text))
                .append("</")
                .append(name)
                .append(">\n");
    }

    private void element(String name, String kind, String text) {
        out.append('<')
                .append(name)
                .append(" class=\"")
                .append(kind)
                .append("\">")
                .append(escaped(text));
        out.append("</").append(name).append(">\n");
    }

    /** For content and attributes; what XML has no way to say becomes the replacement character. */
    static String escaped(String text) {
        StringBuilder safe = new StringBuilder(text.length());
        Glue.of(text).codePoints().forEach(point -> {
            switch (point) {
                case '&' -> safe.append("&amp;");
                case '<' -> safe.append("&lt;");
                case '>' -> safe.append("&gt;");
                case '"' -> safe.append("&quot;");
                default -> safe.appendCodePoint(isXml(point) ? point : 0xFFFD);
            }
        });
        return safe.toString();
    }

    private static boolean isXml(int point) {
        return point == '\t'
                || point == '\n'
                || (point >= 0x20 && point < 0x7F)
                || (point >= 0xA0 && point < 0xD800)
                || (point >= 0xE000 && point < 0xFFFE)
                || point >= 0x10000;
    }
}
