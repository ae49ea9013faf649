package org.soakwright.planner.report.picture;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.awt.Color;
import java.awt.geom.Rectangle2D;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import org.junit.jupiter.params.provider.ValueSource;

class TimeChartTest {
    private static final long HOUR = 3600;
    private static final long DAY = 24 * HOUR;

    /** A stay of ten hours a day in each of some vessels. */
    private static TimeChart.Subject subject(int vessels, int weeks) {
        List<TimeChart.Row> rows = new ArrayList<>();
        List<TimeChart.Tick> work = new ArrayList<>();
        for (int v = 0; v < vessels; v++) {
            List<TimeChart.Stay> stays = new ArrayList<>();
            for (int d = 0; d < 7 * weeks; d++) {
                if (v == 1 && d == 1) {
                    continue;
                }
                long from = d * DAY + (6 + v % 8) * HOUR;
                stays.add(new TimeChart.Stay(
                        0,
                        (v + d) % 6,
                        List.of("a lot with a long name " + d + " in vessel " + v, "lot " + d, "" + d),
                        List.of(
                                new TimeChart.Span(from, from + 6 * HOUR),
                                new TimeChart.Span(from + 7 * HOUR, from + 10 * HOUR)),
                        List.of(new TimeChart.Span(from + 6 * HOUR, from + 7 * HOUR)),
                        new TimeChart.Span(from + 10 * HOUR, from + 11 * HOUR)));
                work.add(new TimeChart.Tick(v % 2, new TimeChart.Span(from - 900, from), v % 3 > 0));
            }
            rows.add(new TimeChart.Row(
                    "vessel " + v,
                    1,
                    stays,
                    v == 1 ? List.of(new TimeChart.Named(new TimeChart.Span(DAY, 2 * DAY), "inspection")) : List.of(),
                    v == 2
                            ? List.of(new TimeChart.Late(0, new TimeChart.Span(8 * HOUR, 12 * HOUR), true))
                            : List.of()));
        }
        List<TimeChart.Span> panels = new ArrayList<>();
        List<TimeChart.Mark> days = new ArrayList<>();
        List<TimeChart.Mark> hours = new ArrayList<>();
        List<TimeChart.Span> nights = new ArrayList<>();
        for (int w = 0; w < weeks; w++) {
            panels.add(new TimeChart.Span(7 * DAY * w, 7 * DAY * (w + 1)));
            for (int d = 7 * w; d < 7 * (w + 1); d++) {
                days.add(new TimeChart.Mark(d * DAY, "Wed " + (d + 1) + " Mar"));
                hours.add(new TimeChart.Mark(d * DAY + 12 * HOUR, "12:00"));
                nights.add(new TimeChart.Span(d * DAY + 22 * HOUR, d * DAY + 30 * HOUR));
            }
        }
        return new TimeChart.Subject(
                "Who is in which vessel when",
                "a hall",
                "caption",
                "a hall with vessels in which lots are, one after the other",
                List.of("soaking", "brining", "washing", "leaching", "other recipes"),
                rows,
                "moves",
                2,
                work,
                nights,
                List.of(new TimeChart.Span(10 * HOUR, 11 * HOUR)),
                nights,
                days,
                hours,
                panels);
    }

    @ParameterizedTest
    @ValueSource(ints = {3, 30})
    void everythingLiesOnTheSheetAndNoLettersMeet(int vessels) throws Exception {
        for (Picture picture : TimeChart.of(subject(vessels, 3))) {
            Drawn drawn = new Drawn(picture.svg(Theme.LIGHT));
            Rectangle2D canvas = drawn.canvas();
            drawn.shapes()
                    .forEach(shape -> assertTrue(
                            shape.getMinX() >= canvas.getMinX()
                                    && shape.getMaxX() <= canvas.getMaxX() + 0.1
                                    && shape.getMinY() >= canvas.getMinY()
                                    && shape.getMaxY() <= canvas.getMaxY() + 0.1,
                            shape.toString()));
            List<Drawn.Line> lines = drawn.lines();
            for (int i = 0; i < lines.size(); i++) {
                assertTrue(canvas.contains(lines.get(i).box()), lines.get(i).text());
                for (int j = 0; j < i; j++) {
                    assertFalse(
                            lines.get(i).box().intersects(lines.get(j).box()),
                            lines.get(i).text() + " on " + lines.get(j).text());
                }
            }
        }
    }

    @Test
    void weeksStandBelowEachOtherAndManyGoOnInAnotherPicture() throws Exception {
        List<Picture> pictures = TimeChart.of(subject(4, 7));
        assertEquals(
                List.of("time-chart", "time-chart-2"),
                pictures.stream().map(Picture::id).toList());
        List<String> first = new Drawn(pictures.get(0).svg(Theme.LIGHT)).texts();
        List<String> second = new Drawn(pictures.get(1).svg(Theme.LIGHT)).texts();
        assertTrue(first.contains("Wed 1 Mar") && first.contains("Wed 35 Mar"));
        assertFalse(first.contains("Wed 36 Mar"));
        assertTrue(second.contains("Wed 36 Mar") && second.contains("Wed 49 Mar"));
        assertEquals(5, first.stream().filter("vessel 3"::equals).count());
    }

    @Test
    void aBarBearsTheLongestNameThatFits() throws Exception {
        List<String> texts = new Drawn(TimeChart.of(subject(1, 1)).get(0).svg(Theme.LIGHT)).texts();
        // Six hours of a week are 29 px.
        assertTrue(texts.contains("lot 3"), texts.toString());
        TimeChart.Subject week = subject(1, 1);
        TimeChart.Subject day = new TimeChart.Subject(
                week.title(),
                week.subtitle(),
                week.caption(),
                week.altText(),
                week.kinds(),
                week.rows(),
                week.workName(),
                week.workLanes(),
                week.work(),
                week.away(),
                week.pauses(),
                week.nights(),
                week.days(),
                week.hours(),
                List.of(new TimeChart.Span(0, DAY)));
        assertTrue(new Drawn(TimeChart.of(day).get(0).svg(Theme.LIGHT))
                .texts()
                .contains("a lot with a long name 0 in vessel 0"));
    }

    /** Web Content Accessibility Guidelines 2.2, success criterion 1.4.3. */
    @ParameterizedTest
    @EnumSource(Theme.class)
    void lettersInBarsAreReadable(Theme theme) {
        Look look = Look.of(theme);
        for (int kind = 0; kind <= TimeChart.KINDS; kind++) {
            assertTrue(contrast(TimePanels.colour(look, kind), look.ground()) >= 4.5, theme + " " + kind);
        }
        assertTrue(contrast(look.ink(), look.closed()) >= 4.5);
        assertTrue(contrast(look.ink(), look.pause()) >= 4.5);
    }

    private static double contrast(Color one, Color other) {
        double a = luminance(one);
        double b = luminance(other);
        return (Math.max(a, b) + 0.05) / (Math.min(a, b) + 0.05);
    }

    private static double luminance(Color color) {
        return 0.2126 * Oklab.linear(color.getRed())
                + 0.7152 * Oklab.linear(color.getGreen())
                + 0.0722 * Oklab.linear(color.getBlue());
    }

    @Test
    void darkAndGreyHoldTheSame() throws Exception {
        Picture picture = TimeChart.of(subject(3, 1)).get(0);
        List<String> light = new Drawn(picture.svg(Theme.LIGHT)).texts();
        for (Theme theme : List.of(Theme.DARK, Theme.GREY)) {
            assertEquals(light, new Drawn(picture.svg(theme)).texts());
        }
        assertFalse(picture.inline().matches("(?s).*#[0-9a-f]{6}.*"), "a colour of its own does not turn dark");
    }
}
