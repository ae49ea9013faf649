package org.soakwright.planner.report.line;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.Collectors;
import org.soakwright.planner.batch.Durations;
import org.soakwright.planner.line.LinePlan;
import org.soakwright.planner.line.Load;
import org.soakwright.planner.line.LoadPlan;
import org.soakwright.planner.report.Figures;
import org.soakwright.planner.report.Table;
import org.soakwright.recipes.model.line.Line;
import org.soakwright.recipes.model.line.VesselGroup;

/** Lots, moves and liquors of a line as tables and sentences. */
final class LineTables {
    private final Account account;
    private final LinePlan plan;
    private final Times times;

    LineTables(Account account) {
        this.account = account;
        plan = account.plan();
        times = new Times(plan.clock());
    }

    Times times() {
        return times;
    }

    /** What the line is: where its clock hangs, how much goes through what. */
    List<String> about() {
        Line line = plan.line();
        int lots = line.orders().size();
        int loads = plan.loads().size();
        double kg = plan.loads().stream().mapToDouble(load -> load.load().kg()).sum();
        String vessels = line.vessels().stream().map(LineTables::vessels).collect(Collectors.joining(", "));
        return List.of(
                lots + (lots == 1 ? " lot" : " lots") + " in " + loads + (loads == 1 ? " load" : " loads") + ", "
                        + Figures.made(kg) + " kg, by "
                        + (account.recipeFiles().size() == 1
                                ? "one recipe"
                                : account.recipeFiles().size() + " recipes")
                        + "; " + vessels,
                "From " + times.wallWithYear(0) + ", all times by the clock of "
                        + line.zone().getId());
    }

    private static String vessels(VesselGroup group) {
        return group.count() == 1 ? group.name() : group.count() + " x " + group.name();
    }

    boolean isBad(LoadPlan load) {
        return !load.met() || account.latest(load).isPresent();
    }

    /**
     * A line for each load.
     *
     * @param brief whether room is short
     */
    Table lots(List<LoadPlan> loads, boolean brief) {
        Table table = new Table()
                .text("Lot")
                .text("Recipe")
                .number("Begins")
                .number("Done")
                .number("Due")
                .number("Against due")
                .verdict("Verdict");
        for (LoadPlan load : loads) {
            long done = load.placed().finishes(plan.schedule().shop().carriage());
            Long due = account.due(load);
            table.row(List.of(
                    brief ? briefly(load.load()) : load.load().name(),
                    withoutEnding(load.load().recipeFile()),
                    times.wall(load.placed().begins(plan.schedule().shop().carriage())),
                    times.wall(done),
                    due == null ? "" : times.wall(due),
                    due == null ? "" : against(done - due),
                    verdict(load)));
        }
        return table;
    }

    private static String against(long late) {
        return Durations.clock((double) Math.abs(late)) + (late > 0 ? " late" : " early");
    }

    /** {@code L1 1/2}, {@code C1 + 3}. */
    static String briefly(Load load) {
        Load.Share first = load.shares().get(0);
        int more = load.shares().size() - 1;
        if (more == 1) {
            return load.name();
        }
        return first.order().lot()
                + (first.parts() == 1 ? "" : " " + first.part() + "/" + first.parts())
                + (more == 0 ? "" : " + " + more);
    }

    /** {@code loin-desalting}. */
    static String withoutEnding(String file) {
        String name = file.substring(file.lastIndexOf('/') + 1);
        int dot = name.lastIndexOf('.');
        return dot > 0 ? name.substring(0, dot) : name;
    }

    private String verdict(LoadPlan load) {
        return !load.met() ? "MISSED" : isBad(load) ? "LATE" : "met";
    }

    /** Each late lot with the chain that made it late; lots of one load together. */
    List<String> late() {
        List<String> points = new ArrayList<>();
        for (LoadPlan load : plan.loads()) {
            String who = account.lots(load).stream()
                    .filter(lot -> lot.late() > 0)
                    .map(lot -> lot.name() + " by " + Times.lasting(lot.late()))
                    .collect(Collectors.joining(", "));
            if (!who.isEmpty()) {
                points.add(who + (load.late().isEmpty() ? "." : ": " + sentences(load.late())));
            }
        }
        return points;
    }

    /** Whole sentences stay apart; what are none become one. */
    private static String sentences(List<String> chain) {
        boolean whole = chain.stream().allMatch(part -> part.endsWith("."));
        return whole ? String.join(" ", chain) : String.join("; ", chain) + ".";
    }

    List<String> missed() {
        return account.missing().stream()
                .flatMap(load -> LineAnswer.misses(load).stream())
                .toList();
    }

    /**
     * Moves under the names of their shifts.
     *
     * @param whole with who is free meanwhile, and room to tick
     */
    Table moves(List<Move> moves, boolean whole) {
        Table table = new Table()
                .text("Time")
                .text("Move")
                .text("Lot")
                .text("From")
                .text("To")
                .text("For");
        if (whole) {
            table.number("Heads").number("Free besides").text("Hoist");
        }
        for (Shifts.Worked shift : Shifts.of(plan, moves)) {
            table.heading(shift.name());
            for (Move move : shift.moves()) {
                List<String> row = new ArrayList<>(List.of(
                        times.hour(move.start()) + " – " + times.hour(move.end()),
                        move.word(),
                        move.loadName(),
                        move.from().orElse(""),
                        move.to().orElse(""),
                        move.step()));
                if (whole) {
                    row.add(Long.toString(move.heads()));
                    row.add(plan.line().crew() == null ? "" : Long.toString(move.free()));
                    row.add(hoist(move));
                }
                table.row(row);
            }
        }
        return table;
    }

    /** Of one shift, with room for what was done. */
    Table dispatch(List<Move> moves) {
        Table table = new Table()
                .text("Time")
                .text("Move")
                .text("Lot")
                .text("From")
                .text("To")
                .text("For")
                .number("Heads")
                .number("Free besides")
                .text("Hoist")
                .text("Done");
        for (Move move : moves) {
            table.row(List.of(
                    solid(times.hour(move.start()) + " – " + times.hour(move.end())),
                    move.word(),
                    move.loadName(),
                    solid(move.from().orElse("")),
                    solid(move.to().orElse("")),
                    move.step(),
                    Long.toString(move.heads()),
                    plan.line().crew() == null ? "" : Long.toString(move.free()),
                    hoist(move),
                    "________"));
        }
        return table;
    }

    /** Never parted at a space. */
    static String solid(String text) {
        return text.replace(' ', '\u00a0');
    }

    private String hoist(Move move) {
        return move.hoist() ? move.lifts() + " of " + plan.line().moves().atOnce() : "not needed";
    }

    /** What each day needs. */
    Table days() {
        List<String> species = Supplies.species(account.supplies());
        Table table = new Table().text("Day").number("Liquor");
        species.forEach(name -> table.number(name + " to dissolve"));
        for (Supplies.Day day : Supplies.byDay(account.supplies())) {
            List<String> row = new ArrayList<>(List.of(
                    times.day(day.day()),
                    Figures.made(day.litres()) + " L" + (day.complete() ? "" : " and unlimited")));
            species.forEach(name ->
                    row.add(day.kg().containsKey(name) ? Figures.made(day.kg().getOrDefault(name, 0.0)) + " kg" : ""));
            table.row(row);
        }
        return table;
    }

    /** Every fill and what runs in. */
    Table liquors() {
        Table table = new Table()
                .group("Day")
                .text("From")
                .text("Vessel")
                .text("Lot")
                .text("For")
                .text("")
                .number("Liquor")
                .text("To dissolve");
        for (Supply supply : account.supplies()) {
            table.row(List.of(
                    times.day(supply.day()),
                    times.hour(supply.from()),
                    supply.leg().vessel(),
                    supply.load().load().name(),
                    Legs.name(supply.leg()),
                    supply.running() ? "runs in" : "make up",
                    supply.litres().isPresent() ? Figures.made(supply.litres().getAsDouble()) + " L" : "unlimited",
                    dissolve(supply)));
        }
        return table;
    }

    static String dissolve(Supply supply) {
        return supply.strengths().keySet().stream()
                .map(species -> supply.litres().isPresent()
                        ? Figures.made(supply.kg(species)) + " kg " + species + " (" + strength(supply, species) + ")"
                        : species + " " + strength(supply, species))
                .collect(Collectors.joining(", "));
    }

    private static String strength(Supply supply, String species) {
        return Figures.made(supply.strengths().getOrDefault(species, 0.0)) + " g/L";
    }

    /** What is not in the sums. */
    List<String> uncounted() {
        List<String> steps = account.supplies().stream()
                .filter(supply -> supply.litres().isEmpty())
                .map(supply -> supply.leg().name())
                .distinct()
                .toList();
        List<String> notes = new ArrayList<>();
        notes.add("A fill counts on the day on which it is made up, running liquor on the days on which it runs.");
        if (!steps.isEmpty()) {
            notes.add("Not counted, since it is unlimited: the liquor of " + String.join(", ", steps) + ".");
        }
        return notes;
    }
}
