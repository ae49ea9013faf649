package org.soakwright.recipes.parsing;

import java.math.BigDecimal;
import java.time.ZoneId;
import java.time.ZonedDateTime;
import java.util.List;
import java.util.Map;
import org.jspecify.annotations.Nullable;
import org.soakwright.recipes.model.Recipe;
import org.soakwright.recipes.model.line.Agreement;
import org.soakwright.recipes.model.line.Crew;
import org.soakwright.recipes.model.line.Line;
import org.soakwright.recipes.model.line.LineGoal;
import org.soakwright.recipes.model.line.Moves;
import org.soakwright.recipes.model.line.Order;
import org.soakwright.recipes.model.line.Utility;
import org.soakwright.recipes.model.line.VesselGroup;
import org.soakwright.recipes.text.Problems;
import org.soakwright.recipes.text.Tree;

/**
 * Reads a line from its tree. Lots and their recipes come before what vessels serve is held against them; parts that could not
 * be read are passed over where others are compared.
 */
public final class LineReader {
    private final LineFiles files;
    private final Values values;
    private final Problems problems;

    private LineReader(LineFiles files, Problems problems) {
        this.files = files;
        this.values = new Values(problems);
        this.problems = problems;
    }

    /** The line; null, with every problem added, where it or a file it names is not whole. */
    public static @Nullable Line read(Tree tree, LineFiles files, Problems problems) {
        Fields fields = Fields.of(tree, LineSection.LINE, problems);
        return fields == null ? null : new LineReader(files, problems).line(fields);
    }

    private @Nullable Line line(Fields fields) {
        language(fields.get("language"));
        String title = values.name("title", fields.need("title", "Quayside hall"), "Quayside hall");
        ZoneId zone = Moments.zone(values, fields.need("zone", "Europe/Oslo"));
        Moments moments = new Moments(values, zone);
        ZonedDateTime starts = moments.dateTime("starts", fields.need("starts", "2026-03-02T06:00"));
        OrderReader orderReader = new OrderReader(values, moments, files, starts);
        Tree lots = fields.need("lots", "orders.csv");
        List<Order> orders = lots == null ? List.of() : orderReader.orders(lots);
        VesselReader vesselReader = new VesselReader(values, moments);
        List<Utility> utilities = vesselReader.utilities(fields.get("utilities"));
        Tree vesselTree = fields.need("vessels", "{tank: {count: 3, serves: [soak], volume: {…}}}");
        List<VesselGroup> vessels = vesselTree == null ? null : vesselReader.vessels(vesselTree);
        if (vesselTree != null && vessels != null) {
            agree(vesselTree, vessels, utilities, orderReader);
        }
        CrewReader crewReader = new CrewReader(values, moments);
        Tree crewTree = fields.get("crew");
        Crew crew = crewTree == null ? null : crewReader.crew(crewTree);
        Moves moves = crewReader.moves(fields.need("moves", "{takes: 15 min, at-once: 1}"));
        if (crew != null && moves != null && starts != null) {
            problems.addAll(Agreement.ofCrew(crew, moves, starts.toInstant()));
        }
        List<LineGoal> goals = goals(fields.get("minimise"), orderReader);
        if (!problems.isEmpty()
                || title == null
                || zone == null
                || starts == null
                || vessels == null
                || moves == null
                || utilities == null) {
            return null;
        }
        return problems.attempt(
                () -> new Line(fields.place(), title, starts, zone, vessels, crew, moves, utilities, orders, goals));
    }

    private void agree(
            Tree tree, List<VesselGroup> vessels, @Nullable List<Utility> utilities, OrderReader orderReader) {
        Map<String, Recipe> recipes = orderReader.recipes();
        problems.addAll(Agreement.ofNames(vessels, List.of()));
        for (VesselGroup group : vessels) {
            problems.addAll(Agreement.ofLiquor(group, recipes));
            if (orderReader.knowsAllRecipes()) {
                problems.addAll(Agreement.ofServes(group, recipes.values()));
            }
            if (utilities != null) {
                problems.addAll(Agreement.ofDraws(group, utilities, recipes));
            }
        }
        problems.addAll(Agreement.unserved(tree.place(), vessels, recipes));
    }

    private void language(@Nullable Tree tree) {
        BigDecimal language = values.number("language", tree, "1");
        if (tree != null && language != null && language.compareTo(RecipeReader.LANGUAGE) != 0) {
            problems.add(tree.place(), "this version reads language 1: found " + tree.label() + "; write language: 1");
        }
    }

    private List<LineGoal> goals(@Nullable Tree tree, OrderReader orderReader) {
        if (tree == null) {
            return LineGoal.defaults(orderReader.recipes().values());
        }
        List<LineGoal> goals = values.someWords("minimise", tree, LineGoal.class);
        if (orderReader.knowsAllRecipes()) {
            problems.addAll(Agreement.ofGoals(goals, orderReader.recipes(), tree.place()));
        }
        return goals;
    }
}
