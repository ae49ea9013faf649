package org.soakwright.planner.report.picture;

import java.awt.Color;
import java.awt.Graphics2D;
import java.awt.geom.Line2D;
import java.awt.geom.Rectangle2D;
import java.util.ArrayList;
import java.util.List;
import org.soakwright.planner.batch.Balance;

/** Where the solute came from and where it went: bars laid end to end, so that both sides end at the same line. */
final class Ledger {
    private static final int LEFT = 178;
    private static final int RIGHT = 176;
    private static final int ROW = 21;
    private static final int BAR = 13;
    private static final int HEAD = 25;
    private static final int FIELD_GAP = 70;

    private final List<Account> accounts = new ArrayList<>();
    private final int height;

    /** One species in a unit of mass that suits it. */
    private record Account(
            String species,
            List<Balance.Entry> sources,
            List<Balance.Entry> sinks,
            boolean closed,
            String unit,
            double per) {
        double total() {
            return sources.stream().mapToDouble(Balance.Entry::kilograms).sum();
        }

        /** How far the two sides can be trusted to be found apart from each other. */
        String closing() {
            double out = sinks.stream().mapToDouble(Balance.Entry::kilograms).sum();
            double defect = Math.abs(total() - out);
            return closed
                    ? "Both sides are computed apart; they differ by "
                            + (defect <= 1e-12 * total() ? "nothing but rounding." : amount(defect) + ".")
                    : "What running or unlimited liquor or air took is what is missing elsewhere.";
        }

        int rows() {
            return sources.size() + sinks.size();
        }

        String amount(double kilograms) {
            return Words.number(kilograms * per) + " " + unit;
        }

        String share(double kilograms) {
            double percent = total() > 0 ? 100 * kilograms / total() : 0;
            return percent > 0 && percent < 0.05 ? "< 0.1 %" : Words.plain(percent, 0.1) + " %";
        }
    }

    Ledger(History history) {
        int sum = (int) Sheet.TOP;
        for (int s = 0; s < history.recipe().species().size(); s++) {
            Account account = account(history.run().balance(s));
            accounts.add(account);
            sum += account.rows() * ROW + 2 * HEAD + FIELD_GAP;
        }
        height = sum - 8;
    }

    /** A sink below zero is a source. */
    private static Account account(Balance balance) {
        List<Balance.Entry> sources = new ArrayList<>(balance.sources());
        List<Balance.Entry> sinks = new ArrayList<>();
        for (Balance.Entry entry : balance.sinks()) {
            if (entry.kilograms() < 0) {
                sources.add(new Balance.Entry(entry.name(), -entry.kilograms()));
            } else {
                sinks.add(entry);
            }
        }
        double total = sources.stream().mapToDouble(Balance.Entry::kilograms).sum();
        boolean small = total < 1;
        boolean tiny = total < 1e-3;
        return new Account(
                balance.species(),
                sources,
                sinks,
                balance.closed(),
                tiny ? "mg" : small ? "g" : "kg",
                tiny ? 1e6 : small ? 1e3 : 1);
    }

    Picture picture() {
        return new Picture("balance", title(), caption(), altText(), Look.WIDTH, height, this::draw);
    }

    private String title() {
        return accounts.size() == 1 ? "Where the " + accounts.get(0).species() + " went" : "Where the solutes went";
    }

    private void draw(Graphics2D g, Theme theme) {
        Sheet sheet = new Sheet(g, theme, Look.WIDTH, height);
        sheet.head(
                title(),
                "Each bar begins where the one above it ends; what came in and what went out end at one line.");
        double top = Sheet.TOP;
        for (Account account : accounts) {
            draw(sheet, account, top);
            top += account.rows() * ROW + 2 * HEAD + FIELD_GAP;
        }
    }

    private void draw(Sheet sheet, Account account, double top) {
        Look look = sheet.look();
        double bottom = top + account.rows() * ROW + 2 * HEAD + 4;
        Rectangle2D area = new Rectangle2D.Double(LEFT, top, Look.WIDTH - LEFT - RIGHT, bottom - top);
        double total = account.total() * account.per();
        Scale scale = total > 0 ? Scale.linear(0, total, 6) : Scale.linear(0, 1, 2);
        Panel panel = new Panel(area, scale, new Scale.Placed(List.of(), value -> value));
        for (Scale.Tick tick : scale.ticks()) {
            sheet.draw(
                    new Line2D.Double(panel.x(tick.value()), top + HEAD, panel.x(tick.value()), bottom),
                    look.grid(),
                    Look.dashed(1));
        }
        String axis = account.species() + ", " + account.unit();
        panel.nameColumns(sheet, axis);
        sheet.foot(account.closing(), 0, bottom + 35, area.getMaxX() - 30 - Typeface.width(axis, Look.STRONG));
        double y = side(sheet, panel, account, "what came in", account.sources(), top);
        side(sheet, panel, account, "where it went", account.sinks(), y);
        double end = panel.x(total);
        sheet.draw(new Line2D.Double(end, top + HEAD - 2, end, bottom), look.ink(), Look.dashed(1.2f));
    }

    private double side(
            Sheet sheet, Panel panel, Account account, String heading, List<Balance.Entry> entries, double top) {
        Look look = sheet.look();
        sheet.text(heading, 0, top + 17, Sheet.Anchor.LEFT, Look.STRONG, look.ink());
        double sum = entries.stream().mapToDouble(Balance.Entry::kilograms).sum();
        numbers(sheet, account, sum, top + 17, true);
        double y = top + HEAD;
        double before = 0;
        for (Balance.Entry entry : entries) {
            double from = panel.x(before * account.per());
            before += entry.kilograms();
            double to = panel.x(before * account.per());
            sheet.fill(
                    new Rectangle2D.Double(from, y + 3, entry.kilograms() == 0 ? 0 : Math.max(1.5, to - from), BAR),
                    color(look, entry.name()));
            String name = Typeface.fitted(entry.name(), Look.TEXT, LEFT - 22.0);
            sheet.text(name, LEFT - 12.0, y + 14, Sheet.Anchor.RIGHT, Look.TEXT, look.ink());
            numbers(sheet, account, entry.kilograms(), y + 14, false);
            y += ROW;
        }
        return y;
    }

    private static void numbers(Sheet sheet, Account account, double kilograms, double baseline, boolean strong) {
        Look look = sheet.look();
        java.awt.Font font = strong ? Look.STRONG : Look.TEXT;
        sheet.text(account.amount(kilograms), Look.WIDTH - 70.0, baseline, Sheet.Anchor.RIGHT, font, look.ink());
        sheet.text(account.share(kilograms), Look.WIDTH, baseline, Sheet.Anchor.RIGHT, font, look.muted());
    }

    private static Color color(Look look, String name) {
        return name.startsWith("pieces ")
                ? look.series(0)
                : name.startsWith("clinging ") ? look.series(2) : look.series(1);
    }

    private String caption() {
        List<String> parts = new ArrayList<>();
        for (Account account : accounts) {
            Balance.Entry left = account.sinks().get(0);
            String most = account.sinks().stream()
                    .skip(1)
                    .max(java.util.Comparator.comparingDouble(Balance.Entry::kilograms))
                    .map(entry -> " and " + account.amount(entry.kilograms()) + " left with " + entry.name())
                    .orElse("");
            parts.add("of " + account.amount(account.total()) + " " + account.species() + " "
                    + account.amount(left.kilograms()) + " is in the pieces at the end" + most);
        }
        return Words.capital(String.join("; ", parts)) + ".";
    }

    private String altText() {
        StringBuilder text = new StringBuilder("Balance of what came in and where it went.");
        for (Account account : accounts) {
            text.append(' ').append(Words.capital(account.species())).append(", in: ");
            text.append(listed(account, account.sources())).append("; out: ");
            text.append(listed(account, account.sinks())).append('.');
        }
        return text.toString();
    }

    private static String listed(Account account, List<Balance.Entry> entries) {
        return Words.list(entries.stream()
                .map(entry -> entry.name() + " " + account.amount(entry.kilograms()) + " ("
                        + account.share(entry.kilograms()) + ")")
                .toList());
    }
}
