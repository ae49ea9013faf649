package org.soakwright.planner.report.line;

import java.nio.charset.StandardCharsets;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.time.LocalDateTime;
import java.time.ZoneOffset;
import java.time.ZonedDateTime;
import java.util.HexFormat;
import org.soakwright.planner.report.Stamp;

/**
 * The moves of a line as a calendar (RFC 5545): an event for each, in universal time. A move keeps its UID when the line is planned again, so
 * that calendars replace it; the time of the stamp is the line's start, so that the same line gives the same bytes.
 */
final class Calendar {
    /** Octets of a line without its end (RFC 5545, 3.1). */
    private static final int MOST_OCTETS = 75;

    private static final String END = "\r\n";

    private final StringBuilder out = new StringBuilder();
    private final Account account;

    private Calendar(Account account) {
        this.account = account;
    }

    static String of(Account account, Stamp stamp) {
        return new Calendar(account).write(stamp);
    }

    private String write(Stamp stamp) {
        line("BEGIN", "VCALENDAR");
        line("VERSION", "2.0");
        line("PRODID", text("-//Soakwright//Line " + stamp.version() + "//EN"));
        line("CALSCALE", "GREGORIAN");
        line("METHOD", "PUBLISH");
        account.moves().forEach(this::event);
        line("END", "VCALENDAR");
        return out.toString();
    }

    private void event(Move move) {
        line("BEGIN", "VEVENT");
        line("UID", identifier(move) + "@soakwright");
        line("DTSTAMP", moment(0));
        line("DTSTART", moment(move.start()));
        if (move.end() > move.start()) {
            line("DTEND", moment(move.end()));
        }
        line("SUMMARY", text(move.sentence()));
        line("LOCATION", text(move.to().or(move::from).orElse("")));
        line("CATEGORIES", text(move.word()));
        line("DESCRIPTION", text(description(move)));
        line("END", "VEVENT");
    }

    private String description(Move move) {
        String recipe = account.recipeTitle(move.load().load().recipeFile());
        String step = move.step().isEmpty() ? "" : "\nFor " + move.step();
        String hands = move.heads() + (move.heads() == 1 ? " head" : " heads") + (move.hoist() ? ", hoist" : "");
        return recipe + step + "\n" + hands;
    }

    /** Of what it is about and not of when. */
    private String identifier(Move move) {
        String about = String.join(
                "\n", account.plan().line().title(), move.loadName(), move.word(), Integer.toString(move.stage()));
        try {
            byte[] sum = MessageDigest.getInstance("SHA-256").digest(about.getBytes(StandardCharsets.UTF_8));
            return HexFormat.of().formatHex(sum, 0, 16);
        } catch (NoSuchAlgorithmException e) {
            throw new IllegalStateException("every Java has SHA-256", e);
        }
    }

    private String moment(long seconds) {
        ZonedDateTime local = account.plan().clock().at(seconds);
        LocalDateTime time = LocalDateTime.ofInstant(local.toInstant(), ZoneOffset.UTC);
        return padded(time.getYear(), 4)
                + padded(time.getMonthValue(), 2)
                + padded(time.getDayOfMonth(), 2)
                + "T"
                + padded(time.getHour(), 2)
                + padded(time.getMinute(), 2)
                + padded(time.getSecond(), 2)
                + "Z";
    }

    private static String padded(int number, int digits) {
        String text = Integer.toString(number);
        return "0".repeat(Math.max(0, digits - text.length())) + text;
    }

    /** RFC 5545, 3.3.11; controls that no text may hold are left out. */
    static String text(String value) {
        StringBuilder escaped = new StringBuilder();
        value.codePoints().forEach(c -> {
            switch (c) {
                case '\\', ';', ',' -> escaped.append('\\').appendCodePoint(c);
                case '\n' -> escaped.append("\\n");
                default -> {
                    if (c >= 0x20 && c != 0x7f) {
                        escaped.appendCodePoint(c);
                    }
                }
            }
        });
        return escaped.toString();
    }

    /** One property, folded between characters. */
    private void line(String name, String value) {
        int octets = 0;
        String whole = name + ":" + value;
        for (int i = 0; i < whole.length(); ) {
            int c = whole.codePointAt(i);
            int size = new String(Character.toChars(c)).getBytes(StandardCharsets.UTF_8).length;
            if (octets + size > MOST_OCTETS) {
                out.append(END).append(' ');
                octets = 1;
            }
            out.appendCodePoint(c);
            octets += size;
            i += Character.charCount(c);
        }
        out.append(END);
    }
}
