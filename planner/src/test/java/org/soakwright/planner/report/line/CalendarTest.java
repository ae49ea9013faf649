package org.soakwright.planner.report.line;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import org.junit.jupiter.api.Test;
import org.soakwright.planner.line.HandmadePlan;
import org.soakwright.planner.report.Stamp;

/** B. Desruisseaux (ed.), Internet Calendaring and Scheduling Core Object Specification, RFC 5545 (2009). */
class CalendarTest {
    private static final Stamp STAMP = new Stamp("0.1.0", "00ff".repeat(16));

    private final Account account = new Account(HandmadePlan.of());
    private final String text = Calendar.of(account, STAMP);

    /** 3.1: lines end in CR LF and have 75 octets at most; a space at the beginning continues the line before. */
    private List<String> unfolded() {
        assertTrue(text.endsWith("\r\n"));
        assertFalse(text.replace("\r\n", "").contains("\n")
                || text.replace("\r\n", "").contains("\r"));
        List<String> lines = new ArrayList<>();
        for (String line : text.substring(0, text.length() - 2).split("\r\n", -1)) {
            assertTrue(line.getBytes(StandardCharsets.UTF_8).length <= 75, line);
            if (line.startsWith(" ")) {
                lines.set(lines.size() - 1, lines.get(lines.size() - 1) + line.substring(1));
            } else {
                lines.add(line);
            }
        }
        return lines;
    }

    private List<Map<String, String>> events() {
        List<Map<String, String>> events = new ArrayList<>();
        Map<String, String> open = new LinkedHashMap<>();
        for (String line : unfolded()) {
            int colon = line.indexOf(':');
            String name = line.substring(0, colon);
            String value = line.substring(colon + 1);
            if (line.equals("BEGIN:VEVENT")) {
                open = new LinkedHashMap<>();
            } else if (line.equals("END:VEVENT")) {
                events.add(open);
            } else {
                assertTrue(name.matches("[A-Z]+"), line);
                assertEquals(null, open.put(name, value), "3.8: at most once: " + name);
            }
        }
        return events;
    }

    /** 3.6: version and product first, components nested. */
    @Test
    void itBeginsAndEndsAsACalendar() {
        List<String> lines = unfolded();
        assertEquals(
                List.of(
                        "BEGIN:VCALENDAR",
                        "VERSION:2.0",
                        "PRODID:-//Soakwright//Line 0.1.0//EN",
                        "CALSCALE:GREGORIAN",
                        "METHOD:PUBLISH"),
                lines.subList(0, 5));
        assertEquals("END:VCALENDAR", lines.get(lines.size() - 1));
    }

    /** 3.6.1: UID, DTSTAMP and, with a method, DTSTART are required; an end is later than its start. */
    @Test
    void everyMoveIsAnEventInUniversalTime() {
        List<Map<String, String>> events = events();
        assertEquals(account.moves().size(), events.size());
        Set<String> identifiers = new HashSet<>();
        for (Map<String, String> event : events) {
            assertTrue(identifiers.add(event.get("UID")), "3.8.4.7: unique");
            for (String name : List.of("DTSTAMP", "DTSTART", "DTEND")) {
                assertTrue(event.getOrDefault(name, "").matches("\\d{8}T\\d{6}Z"), "3.3.5, form 2: " + event);
            }
            assertTrue(event.getOrDefault("DTEND", "").compareTo(event.getOrDefault("DTSTART", "")) > 0);
        }
        assertEquals("20261023T040000Z", events.get(0).get("DTSTART"), "06:00 in Oslo in summer");
        assertEquals("20261025T060000Z", events.get(events.size() - 1).get("DTSTART"), "07:00 in winter");
        assertEquals("Load L1 (1 of 2) into tank 1", events.get(0).get("SUMMARY"));
    }

    /** 3.3.11. */
    @Test
    void commasSemicolonsAndBackslashesAreEscaped() {
        assertEquals("a\\, b\\; c\\\\d\\ne", Calendar.text("a, b; c\\d\ne\u0007\r"));
        assertTrue(events().stream()
                .anyMatch(event -> event.getOrDefault("SUMMARY", "").equals("Load C3\\, ж\\; urgent into tub")));
    }

    @Test
    void aFoldNeverCutsACharacter() {
        assertFalse(new String(text.getBytes(StandardCharsets.UTF_8), StandardCharsets.UTF_8).contains("\ufffd"));
        for (String line : text.split("\r\n", -1)) {
            assertFalse(!line.isEmpty() && Character.isLowSurrogate(line.charAt(0)), line);
        }
    }

    @Test
    void aMoveKeepsItsNameWhenItIsPlannedForAnotherTime() {
        Account other = new Account(HandmadePlan.missing());
        List<String> then = identifiers(Calendar.of(other, STAMP));
        assertEquals(Set.copyOf(identifiers(text)), Set.copyOf(then));
        assertFalse(Calendar.of(other, STAMP).equals(text));
    }

    private static List<String> identifiers(String text) {
        return text.lines().filter(line -> line.startsWith("UID:")).toList();
    }
}
