package org.soakwright.planner.report.picture;

import java.awt.Graphics2D;
import java.awt.geom.Point2D;
import java.awt.geom.Rectangle2D;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.stream.Collectors;
import org.soakwright.planner.batch.Durations;
import org.soakwright.planner.report.PieceWords;
import org.soakwright.planner.report.Way;
import org.soakwright.recipes.model.Grade;
import org.soakwright.recipes.model.Reading;

/** One species in one grade: the clock across, the depth into the piece down, the content as a shade; core, mean and surface below. */
final class DepthMap {
    private static final int COLUMNS = 276;
    private static final int ROWS = 56;
    private static final int LEFT = 52;
    /** Room for labels, unless a limit takes more words. */
    private static final int RIGHT = 148;

    private static final int MOST_RIGHT = 220;
    private static final int MAP_TOP = 104;
    private static final int MAP_HEIGHT = 212;
    private static final int COURSE_TOP = MAP_TOP + MAP_HEIGHT + 40;
    private static final int COURSE_HEIGHT = 124;
    private static final int HEIGHT = COURSE_TOP + COURSE_HEIGHT + 40;

    static final String BARE = "bare face";
    static final String SKIN = "face with skin";

    private final History history;
    private final Clock clock;
    private final int right;
    private final Ribbon ribbon;
    private final int species;
    private final Grade grade;
    private final Way way;
    private final boolean several;
    private final boolean differs;
    private final double[][] profiles;
    private final List<Bound> bounds;
    private final Scale contents;
    private final Scale depths;
    private final List<Course> courses = new ArrayList<>();
    private final double[][] shares;

    /** One number of each profile. */
    private record Course(String name, double[] values) {
        double last() {
            return values[values.length - 1];
        }
    }

    /**
     * A map.
     *
     * @param contents what the shades stand for
     */
    DepthMap(History history, Clock clock, int species, int gradeIndex, Scale contents) {
        this.history = history;
        this.clock = clock;
        this.species = species;
        grade = history.grades().get(gradeIndex);
        way = history.way(species, gradeIndex);
        profiles = history.profiles(species, gradeIndex);
        bounds = Bound.of(history, species, gradeIndex);
        right = right(bounds);
        ribbon = new Ribbon(clock, history.ends(), Look.WIDTH - LEFT - right);
        this.contents = contents;
        several = PieceWords.hasSeveralSides(grade);
        differs = PieceWords.differ(grade, history.recipe().species().get(species));
        depths = Scale.full(way.millimetres(), 6).reversed();
        courses.add(new Course(middle(), history.readings(species, gradeIndex, Reading.CORE)));
        courses.add(new Course(Reading.MEAN.word(), history.readings(species, gradeIndex, Reading.MEAN)));
        if (way.fromSkin()) {
            courses.add(new Course(
                    BARE, Arrays.stream(profiles).mapToDouble(Way::bare).toArray()));
            courses.add(new Course(
                    SKIN,
                    Arrays.stream(profiles).mapToDouble(profile -> profile[0]).toArray()));
        } else {
            courses.add(new Course(outside(), history.readings(species, gradeIndex, Reading.SURFACE)));
        }
        shares = resampled();
    }

    private static int right(List<Bound> bounds) {
        double longest = bounds.stream()
                .mapToDouble(bound -> Typeface.width(bound.text(), Look.TEXT))
                .max()
                .orElse(0);
        return (int) Math.min(MOST_RIGHT, Math.max(RIGHT, Math.ceil(longest + Labels.ROOM)));
    }

    Picture picture() {
        String name = history.recipe().species().get(species).name();
        return new Picture(
                "map-" + Words.identifier(grade.name()) + "-" + Words.identifier(name),
                title(),
                caption(),
                altText(),
                Look.WIDTH,
                height(),
                this::draw);
    }

    private int height() {
        return HEIGHT + ribbon.keyHeight();
    }

    private String title() {
        return Words.capital(history.recipe().species().get(species).name()) + " in " + grade.name()
                + ", by depth and time";
    }

    private void draw(Graphics2D g, Theme theme) {
        Sheet sheet = new Sheet(g, theme, Look.WIDTH, height());
        Look look = sheet.look();
        sheet.head(
                title(),
                "Shade: the content" + where() + ". Above: the steps. Below: "
                        + Words.list(courses.stream().map(Course::name).toList()) + "."
                        + (bounds.isEmpty() ? "" : " Lines: contents that targets name."));
        int width = Look.WIDTH - LEFT - right;
        Panel map = new Panel(new Rectangle2D.Double(LEFT, MAP_TOP, width, MAP_HEIGHT), clock, depths);
        map.image(Shades.image(shares, look.contents()));
        map.on(sheet);
        map.nameRows(sheet, "depth from the " + from() + ", mm");
        ribbon.over(sheet, map, Sheet.TOP + 4);
        contours(sheet, map);
        ShadeBar.on(sheet, map.area().getMaxX() + 22, MAP_TOP, MAP_HEIGHT, contents, history.unit(species));
        Panel course = new Panel(new Rectangle2D.Double(LEFT, COURSE_TOP, width, COURSE_HEIGHT), clock, contents);
        ribbon.through(sheet, course);
        Labels labels = new Labels(course.area().getMaxX(), right);
        for (Bound bound : bounds) {
            course.line(
                    new double[] {0, history.end()},
                    new double[] {bound.level(), bound.level()},
                    look.limit(),
                    Look.dashed(1.2f, 4, 4));
            labels.add(bound.text(), course.y(bound.level()), look.limit());
        }
        for (int i = 0; i < courses.size(); i++) {
            Course one = courses.get(i);
            course.line(history.clocks(), one.values(), look.series(i), Look.line(i));
            labels.add(one.name() + " " + Words.number(one.last()), course.y(one.last()), look.series(i));
        }
        course.on(sheet);
        course.nameRows(sheet, "content, " + history.unit(species));
        course.nameColumns(sheet, clock.name());
        labels.on(sheet, COURSE_TOP, COURSE_TOP + COURSE_HEIGHT);
        double room = width - Typeface.width(clock.name(), Look.STRONG) - 24;
        sheet.foot(foot(), LEFT, COURSE_TOP + COURSE_HEIGHT + 35, room);
        ribbon.key(sheet, course);
    }

    /** The end of the shortest way out, as the course of it is called. */
    private String outside() {
        return several ? "face" : "surface";
    }

    private String middle() {
        return way.fromSkin() ? "middle" : Reading.CORE.word();
    }

    private String from() {
        if (way.fromSkin()) {
            return several ? BARE + ", " + PieceWords.way(grade) : BARE;
        }
        return switch (grade.shape()) {
            case SLAB -> "wetted face";
            case BRICK -> "face, " + PieceWords.way(grade);
            default -> PieceWords.face(grade);
        };
    }

    /** What is followed where pieces are not of one size in one direction. */
    private String where() {
        return (several ? " " + PieceWords.way(grade) : "") + (differs ? ", a piece as stated" : "");
    }

    private String foot() {
        return differs ? "Mean: over all pieces of the grade." : several ? "Mean: of the whole piece." : "";
    }

    /** Shares of the shade scale by column of the image and by row, the surface first. */
    private double[][] resampled() {
        double[][] image = new double[COLUMNS][ROWS];
        double[] clocks = history.clocks();
        int after = 1;
        for (int i = 0; i < COLUMNS; i++) {
            double at = clock.clock((i + 0.5) / COLUMNS);
            while (after < clocks.length - 1 && clocks[after] < at) {
                after++;
            }
            double share = Math.max(0, Math.min(1, (at - clocks[after - 1]) / (clocks[after] - clocks[after - 1])));
            for (int j = 0; j < ROWS; j++) {
                double position = 1 - (j + 0.5) / ROWS;
                double before = Way.at(profiles[after - 1], position);
                image[i][j] = contents.at(before + share * (Way.at(profiles[after], position) - before));
            }
        }
        return image;
    }

    private void contours(Sheet sheet, Panel map) {
        Isolines isolines = new Isolines(sheet, map.area());
        for (Bound bound : bounds) {
            isolines.add(
                    Contour.of(profiles, bound.level()).stream()
                            .map(line -> line.stream()
                                    .map(point -> placed(map, point))
                                    .toList())
                            .toList(),
                    bound.text());
        }
        isolines.name();
    }

    private Point2D placed(Panel map, Point2D point) {
        return new Point2D.Double(map.x(clockAt(point.getX())), map.y(depthAt(point.getY())));
    }

    private double clockAt(double column) {
        double[] clocks = history.clocks();
        int i = Math.min(clocks.length - 2, (int) column);
        return clocks[i] + (column - i) * (clocks[i + 1] - clocks[i]);
    }

    private double depthAt(double row) {
        return way.millimetres() * (1 - row / (history.depths().length - 1));
    }

    private String caption() {
        String unit = " " + history.unit(species);
        double[] core = courses.get(0).values();
        int last = core.length - 1;
        String text = (differs ? "In a piece of " + grade.name() + " as stated" : "In " + grade.name())
                + (several
                        ? ", from " + (way.fromSkin() ? "face to face " : "the core ") + PieceWords.way(grade) + ","
                        : "")
                + " the " + middle() + " goes from "
                + Words.number(core[0]) + " to " + Words.number(core[last]) + unit
                + courses.stream()
                        .skip(2)
                        .map(outer -> " and the " + outer.name() + " to " + Words.number(outer.last()) + unit)
                        .collect(Collectors.joining());
        for (Bound bound : bounds) {
            int after = crossing(core, bound.level());
            if (after > 0) {
                double share = (bound.level() - core[after - 1]) / (core[after] - core[after - 1]);
                double at =
                        history.clocks()[after - 1] + share * (history.clocks()[after] - history.clocks()[after - 1]);
                return text + "; the " + middle() + " comes to " + Words.written(round(bound.level())) + unit + " at "
                        + Durations.clock(at) + ".";
            }
        }
        for (Bound bound : bounds) {
            double depth = depthReached(bound.level());
            if (depth > 0) {
                return text + "; at the end " + Words.written(round(bound.level())) + unit + " is found "
                        + Words.number(depth) + " mm deep, the " + (way.fromSkin() ? SKIN : "core") + " at "
                        + Words.number(way.millimetres()) + " mm.";
            }
        }
        return text + ".";
    }

    /** Contents of targets are round, but for the rounding of units. */
    private static double round(double level) {
        return new java.math.BigDecimal(level)
                .round(new java.math.MathContext(6))
                .doubleValue();
    }

    private static int crossing(double[] values, double level) {
        for (int i = values.length - 1; i > 0; i--) {
            if (values[i] >= level != values[i - 1] >= level) {
                return i;
            }
        }
        return 0;
    }

    /** mm; 0 where the last profile does not cross. */
    private double depthReached(double level) {
        double[] profile = profiles[profiles.length - 1];
        int i = crossing(profile, level);
        return i == 0 ? 0 : depthAt(i - 1 + (level - profile[i - 1]) / (profile[i] - profile[i - 1]));
    }

    private String altText() {
        String unit = " " + history.unit(species);
        StringBuilder text = new StringBuilder("Map of "
                + title().substring(0, 1).toLowerCase(java.util.Locale.ROOT)
                + title().substring(1) + ": across the running clock from 0:00 to " + Durations.clock(history.end())
                + ", down the depth from the "
                + (several ? PieceWords.face(grade) + " " + PieceWords.way(grade) : way.fromSkin() ? BARE : "surface")
                + " to the " + (way.fromSkin() ? SKIN : "core") + " at " + Words.number(way.millimetres())
                + " mm. At the end of each step:");
        for (int i = 0; i < history.ends().size(); i++) {
            int at = history.momentAt(history.ends().get(i).to());
            text.append(i == 0 ? " " : "; ").append(history.ends().get(i).step().name());
            for (int k = 0; k < courses.size(); k++) {
                text.append(k == 0 ? " " : ", ")
                        .append(courses.get(k).name())
                        .append(' ')
                        .append(Words.number(courses.get(k).values()[at]))
                        .append(unit);
            }
        }
        return text.append('.').toString();
    }
}
