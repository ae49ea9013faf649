package org.soakwright.planner.report.picture;

import java.awt.Graphics2D;
import java.awt.geom.Rectangle2D;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.soakwright.planner.batch.StepEnd;
import org.soakwright.planner.report.PieceWords;
import org.soakwright.planner.report.Way;
import org.soakwright.recipes.model.Faces;
import org.soakwright.recipes.model.Grade;

/** Content against depth when each step ends, a field for each grade and species. */
final class Profiles {
    private static final int LEFT = 48;
    private static final int GAP = 26;
    private static final int LABELS = 124;
    private static final int FIELD_HEIGHT = 178;
    private static final int ROW = FIELD_HEIGHT + 84;

    private final History history;
    private final List<Field> fields = new ArrayList<>();
    private final int columns;
    private final int fieldHeight;
    private final int height;

    private record Field(int species, Grade grade, Way way, List<double[]> profiles, Scale contents) {
        /** Where the way begins and ends, and the core on the way from face to face, by name. */
        Map<String, Double> places(double[] profile) {
            Map<String, Double> places = new LinkedHashMap<>();
            places.put(way.fromSkin() ? DepthMap.SKIN : "core", profile[0]);
            if (way.fromSkin()) {
                places.put("middle", way.core(profile));
            }
            places.put(way.fromSkin() ? DepthMap.BARE : "surface", Way.bare(profile));
            return places;
        }
    }

    Profiles(History history) {
        this.history = history;
        int steps = history.ends().size();
        for (int s = 0; s < history.recipe().species().size(); s++) {
            for (int j = 0; j < history.grades().size(); j++) {
                List<double[]> profiles = new ArrayList<>();
                double most = 0;
                double least = Double.POSITIVE_INFINITY;
                profiles.add(history.profiles(s, j)[0]);
                for (int k = 0; k < steps; k++) {
                    profiles.add(history.profileAtEnd(s, j, k));
                }
                for (double[] profile : profiles) {
                    most = Math.max(most, History.highest(profile));
                    least = Math.min(least, History.lowest(profile));
                }
                fields.add(new Field(
                        s, history.grades().get(j), history.way(s, j), profiles, Scale.holding(least, most, 6)));
            }
        }
        columns = Math.min(2, fields.size());
        fieldHeight = Math.max(FIELD_HEIGHT, (int) (Labels.SPACING * (steps + 1)));
        int rows = (fields.size() + columns - 1) / columns;
        height = (int) Sheet.TOP + rows * (ROW - FIELD_HEIGHT + fieldHeight) - 12;
    }

    Picture picture() {
        return new Picture("profiles", title(), caption(), altText(), Look.WIDTH, height, this::draw);
    }

    private static String title() {
        return "Profiles at the end of each step";
    }

    private void draw(Graphics2D g, Theme theme) {
        Sheet sheet = new Sheet(g, theme, Look.WIDTH, height);
        sheet.head(
                title(),
                "Content from the core" + (skinned() ? ", or a face with skin" : "") + ", left, "
                        + (several() ? "the shortest way " : "") + "to the surface, right."
                        + (PieceWords.differ(history.recipe()) ? " Pieces as stated." : "")
                        + " The dotted line is the start.");
        double slot = (Look.WIDTH - GAP * (columns - 1.0)) / columns;
        for (int i = 0; i < fields.size(); i++) {
            double x = i % columns * (slot + GAP);
            double y = Sheet.TOP + i / columns * (ROW - FIELD_HEIGHT + fieldHeight) + 28;
            draw(sheet, fields.get(i), new Rectangle2D.Double(x + LEFT, y, slot - LEFT - LABELS, fieldHeight));
        }
    }

    private void draw(Sheet sheet, Field field, Rectangle2D area) {
        Look look = sheet.look();
        double depth = field.way().millimetres();
        Panel panel = new Panel(area, Scale.full(depth, 4), field.contents());
        double[] positions = history.depths();
        for (int i = 0; i < positions.length; i++) {
            positions[i] *= depth;
        }
        Labels labels = new Labels(area.getMaxX(), LABELS);
        List<StepEnd> ends = history.ends();
        panel.line(positions, field.profiles().get(0), look.muted(), Look.dashed(1.6f, 1, 4));
        for (int k = 0; k < ends.size(); k++) {
            double[] profile = field.profiles().get(k + 1);
            panel.line(positions, profile, look.order(k, ends.size()), Look.dashed(Look.LINE));
            double surface = profile[profile.length - 1];
            labels.add((k + 1) + " " + ends.get(k).step().name(), panel.y(surface), look.order(k, ends.size()));
        }
        panel.on(sheet);
        String species = history.recipe().species().get(field.species()).name();
        panel.nameRows(sheet, species + " in " + field.grade().name() + ", " + history.unit(field.species()));
        panel.nameColumns(sheet, "mm from the " + beginning(field));
        labels.on(sheet, area.getY(), area.getMaxY());
    }

    private static String beginning(Field field) {
        Grade grade = field.grade();
        if (field.way().fromSkin()) {
            return DepthMap.SKIN + (PieceWords.hasSeveralSides(grade) ? ", " + PieceWords.way(grade) : "");
        }
        return switch (grade.shape()) {
            case SLAB -> grade.shortest().faces() == Faces.ONE ? "sealed face" : "middle";
            case CYLINDER -> "axis";
            case SPHERE -> "centre";
            case SHORT_CYLINDER, BRICK -> "core " + PieceWords.way(grade);
        };
    }

    private boolean skinned() {
        return fields.stream().anyMatch(field -> field.way().fromSkin());
    }

    private boolean several() {
        return history.grades().stream().anyMatch(PieceWords::hasSeveralSides);
    }

    private String caption() {
        Field steepest = fields.get(0);
        double most = -1;
        for (Field field : fields) {
            double[] last = field.profiles().get(field.profiles().size() - 1);
            double range = (History.highest(last) - History.lowest(last))
                    / field.contents()
                            .ticks()
                            .get(field.contents().ticks().size() - 1)
                            .value();
            if (range > most) {
                most = range;
                steepest = field;
            }
        }
        double[] last = steepest.profiles().get(steepest.profiles().size() - 1);
        String unit = " " + history.unit(steepest.species());
        double core = last[0];
        double surface = last[last.length - 1];
        String species = history.recipe().species().get(steepest.species()).name();
        String way = PieceWords.hasSeveralSides(steepest.grade()) ? " " + PieceWords.way(steepest.grade()) : "";
        if (steepest.way().fromSkin()) {
            List<String> places = new ArrayList<>();
            steepest.places(last)
                    .forEach((place, value) -> places.add(Words.number(value) + unit + " at the " + place));
            return "At the end " + steepest.grade().name() + " still holds " + species + way + " unevenly: "
                    + Words.list(places)
                    + (fields.size() > 1 ? ", the steepest profile that is left." : ".");
        }
        return "At the end " + steepest.grade().name() + " still "
                + (core >= surface ? "falls" : "rises") + way + " from " + Words.number(core) + unit + " " + species
                + " at the core to " + Words.number(surface) + unit + " at the surface"
                + (fields.size() > 1 ? ", the steepest profile that is left." : ".");
    }

    private String altText() {
        StringBuilder text = new StringBuilder("Content against depth at the end of each step.");
        for (Field field : fields) {
            String unit = " " + history.unit(field.species());
            text.append(' ')
                    .append(Words.capital(
                            history.recipe().species().get(field.species()).name()))
                    .append(" in ")
                    .append(field.grade().name())
                    .append(PieceWords.hasSeveralSides(field.grade()) ? ", " + PieceWords.way(field.grade()) : "")
                    .append(", ")
                    .append(Words.list(
                            List.copyOf(field.places(field.profiles().get(0)).keySet())))
                    .append(": ");
            for (int k = 0; k < field.profiles().size(); k++) {
                double[] profile = field.profiles().get(k);
                text.append(
                                k == 0
                                        ? "start "
                                        : "; "
                                                + history.ends()
                                                        .get(k - 1)
                                                        .step()
                                                        .name() + " ")
                        .append(Words.list(field.places(profile).values().stream()
                                .map(Words::number)
                                .toList()))
                        .append(unit);
            }
            text.append('.');
        }
        return text.toString();
    }
}
