package org.soakwright.planner.report.line;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Objects;
import java.util.TimeZone;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.soakwright.planner.line.HandmadePlan;
import org.soakwright.planner.line.LinePlan;
import org.soakwright.planner.report.CsvText;
import org.soakwright.planner.report.Folder;
import org.soakwright.planner.report.Stamp;
import org.soakwright.planner.report.page.PageCheck;

class LineReportTest {
    private static final Stamp STAMP = new Stamp("0.1.0", "00ff".repeat(16));

    private static Map<String, byte[]> written(LinePlan plan) throws IOException {
        Map<String, byte[]> files = new LinkedHashMap<>();
        for (Folder.Entry entry : LineReport.of(plan, STAMP)) {
            ByteArrayOutputStream bytes = new ByteArrayOutputStream();
            entry.body().writeTo(bytes);
            files.put(entry.path(), bytes.toByteArray());
        }
        return files;
    }

    private static String text(Map<String, byte[]> files, String name) {
        return new String(Objects.requireNonNull(files.get(name), name), StandardCharsets.UTF_8);
    }

    @Test
    void everyPageIsSound() throws IOException {
        for (LinePlan plan : List.of(HandmadePlan.of(), HandmadePlan.missing())) {
            Map<String, byte[]> files = written(plan);
            Map<String, String> pages = new LinkedHashMap<>();
            for (String page : List.of("index.html", "dispatch.html", "lot-sheets.html")) {
                pages.put(page, text(files, page));
            }
            PageCheck.assertSound(pages, files.keySet());
        }
    }

    @ParameterizedTest
    @CsvSource({"tr-TR, Pacific/Chatham", "ar-EG, America/Caracas"})
    void itDoesNotDependOnWhereItIsWritten(String tag, String zone) throws IOException {
        Map<String, byte[]> here = written(HandmadePlan.of());
        Locale locale = Locale.getDefault();
        TimeZone time = TimeZone.getDefault();
        try {
            Locale.setDefault(Locale.forLanguageTag(tag));
            TimeZone.setDefault(TimeZone.getTimeZone(zone));
            Map<String, byte[]> there = written(HandmadePlan.of());
            assertEquals(here.keySet(), there.keySet());
            here.forEach((name, bytes) -> assertArrayEquals(bytes, there.get(name), name));
        } finally {
            Locale.setDefault(locale);
            TimeZone.setDefault(time);
        }
    }

    @Test
    void tablesHaveARowForEachOfWhatTheyHold() throws IOException {
        Map<String, byte[]> files = written(HandmadePlan.of());
        Account account = new Account(HandmadePlan.of());
        assertEquals(1 + 6, CsvText.read(text(files, "tables/lots.csv")).size());
        assertEquals(
                1 + 3 * 4 + 2 * 3, CsvText.read(text(files, "tables/steps.csv")).size());
        assertEquals(
                1 + account.moves().size(),
                CsvText.read(text(files, "tables/moves.csv")).size());
        assertEquals(
                1 + account.supplies().size(),
                CsvText.read(text(files, "tables/liquor.csv")).size());
    }

    @Test
    void litresOfATableAddUp() throws IOException {
        List<List<String>> rows = CsvText.read(text(written(HandmadePlan.of()), "tables/liquor.csv"));
        int volume = rows.get(0).indexOf("volume [L]");
        double litres = rows.stream()
                .skip(1)
                .map(row -> row.get(volume))
                .filter(cell -> !cell.isEmpty())
                .mapToDouble(Double::parseDouble)
                .sum();
        double days = Supplies.byDay(Supplies.of(HandmadePlan.of())).stream()
                .mapToDouble(Supplies.Day::litres)
                .sum();
        assertEquals(days, litres, 1e-6);
    }

    @ParameterizedTest
    @ValueSource(strings = {"L1 (1 of 2)", "L1 (2 of 2)", "C1 + C2", "C3, ж; urgent", "L2"})
    void everyLoadHasASheetWithItsClockTimes(String load) throws IOException {
        LinePlan plan = HandmadePlan.of();
        String sheets = text(written(plan), "lot-sheets.html");
        int begin = sheets.indexOf("-heading\">" + load + "</h2>");
        if (begin < 0) {
            begin = sheets.indexOf("-heading\">" + load);
        }
        assertTrue(begin > 0, load);
        String sheet =
                sheets.substring(begin, sheets.indexOf("</section>", begin)).replace('\u00a0', ' ');
        Times times = new Times(plan.clock());
        plan.loads().stream()
                .filter(one -> one.load().name().equals(load))
                .flatMap(one -> one.legs().stream())
                .forEach(leg -> {
                    assertTrue(sheet.contains(times.wall(leg.start())), leg.name());
                    assertTrue(sheet.contains(times.wall(leg.latestPull())), leg.name());
                    assertTrue(sheet.contains(leg.vessel()), leg.name());
                    assertTrue(sheet.contains(leg.reason()), leg.name());
                });
        assertTrue(sheet.contains("confirm by assay"), "cautions");
    }

    @Test
    void aSheetOfALoadThatMissesSaysSo() throws IOException {
        String sheets = text(written(HandmadePlan.missing()), "lot-sheets.html");
        assertTrue(sheets.contains("NOT A PLAN: misses a target"));
        assertEquals(1, sheets.split("NOT A PLAN", -1).length - 1);
    }

    @Test
    void dispatchGoesByShift() {
        Account account = new Account(HandmadePlan.of());
        List<String> shifts = Shifts.of(account.plan(), account.moves()).stream()
                .map(shift -> shift.name() + ": " + shift.moves().size())
                .toList();
        assertEquals(
                List.of(
                        "Fri 23 Oct 06:00 – 14:00, 2 heads: 5",
                        "Fri 23 Oct 14:00 – 22:00, 2 heads: 9",
                        "Sat 24 Oct 06:00 – 14:00, 2 heads: 4",
                        "Sat 24 Oct 14:00 – 22:00, 2 heads: 4",
                        "Sun 25 Oct 06:00 – 14:00, 2 heads: 1"),
                shifts);
    }

    @Test
    void whoIsBusyIsNotFree() {
        Account account = new Account(HandmadePlan.of());
        // The changeovers of both parts overlap from 13:30 to 13:50 and need both heads.
        List<Move> changes = account.moves().stream()
                .filter(move -> move.step().equals("washing, fill 1 of 2")
                        && move.loadName().startsWith("L1"))
                .toList();
        assertEquals(List.of(0L, 0L), changes.stream().map(Move::free).toList());
        assertEquals(1, account.moves().get(0).free());
        assertEquals(1, account.moves().get(0).lifts());
    }
}
