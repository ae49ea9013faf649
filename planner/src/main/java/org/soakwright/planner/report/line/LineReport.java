package org.soakwright.planner.report.line;

import java.util.ArrayList;
import java.util.List;
import org.soakwright.planner.line.LinePlan;
import org.soakwright.planner.report.Folder;
import org.soakwright.planner.report.Stamp;
import org.soakwright.planner.report.picture.Picture;
import org.soakwright.planner.report.picture.Theme;

/**
 * The report of a planned line as the files of a folder: {@code index.html}, {@code dispatch.html} and {@code lot-sheets.html} to be printed,
 * {@code moves.ics}, {@code result.json}, {@code tables/*.csv} and {@code pictures/*.svg}. The same bytes for the same line.
 */
public final class LineReport {
    static final String DISPATCH = "dispatch.html";
    static final String SHEETS = "lot-sheets.html";
    static final String CALENDAR = "moves.ics";
    static final String RESULT = "result.json";

    private LineReport() {}

    public static List<Folder.Entry> of(LinePlan plan, Stamp stamp) {
        Account account = new Account(plan);
        List<Folder.Entry> entries = new ArrayList<>();
        entries.add(Folder.Entry.of(DISPATCH, DispatchPage.of(account, stamp)));
        entries.add(Folder.Entry.of(SHEETS, LotSheets.of(account, stamp)));
        entries.add(Folder.Entry.of(CALENDAR, Calendar.of(account, stamp)));
        entries.add(Folder.Entry.of(RESULT, LineJson.of(stamp, account)));
        LineCsv.of(account).forEach((id, text) -> entries.add(Folder.Entry.of("tables/" + id + ".csv", text)));
        List<Picture> pictures = HallChart.of(account);
        pictures.forEach(
                picture -> entries.add(Folder.Entry.of("pictures/" + picture.id() + ".svg", picture.svg(Theme.LIGHT))));
        List<String> files = entries.stream().map(Folder.Entry::path).toList();
        entries.add(0, Folder.Entry.of("index.html", LinePage.of(account, pictures, stamp, files)));
        return entries;
    }
}
