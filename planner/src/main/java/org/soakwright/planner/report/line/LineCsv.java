package org.soakwright.planner.report.line;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import org.soakwright.planner.line.LinePlan;
import org.soakwright.planner.line.LoadPlan;
import org.soakwright.planner.report.Csv;

/** Lots, steps, moves and liquors of a line for spreadsheets: moments local with their offset, durations s, numbers in full. */
final class LineCsv {
    static final String STEPS = "steps";

    private final Account account;
    private final LinePlan plan;
    private final Times times;

    private LineCsv(Account account) {
        this.account = account;
        plan = account.plan();
        times = new Times(plan.clock());
    }

    /** The text of each file by the id of the section that it belongs to. */
    static Map<String, String> of(Account account) {
        LineCsv csv = new LineCsv(account);
        Map<String, String> files = new LinkedHashMap<>();
        files.put(LineFindings.LOTS, csv.lots());
        files.put(STEPS, csv.steps());
        files.put(LineFindings.MOVES, csv.moves());
        files.put(LineFindings.LIQUOR, csv.liquor());
        return files;
    }

    private String lots() {
        Csv csv = new Csv(List.of(
                "lot",
                "part",
                "parts",
                "load",
                "recipe",
                "mass [kg]",
                "ready",
                "due",
                "loaded",
                "done",
                "late [s]",
                "targets met",
                "why late"));
        for (Account.Lot lot : account.lots()) {
            csv.text(lot.order().lot())
                    .whole(lot.share().part())
                    .whole(lot.share().parts())
                    .text(lot.load().load().name())
                    .text(lot.load().load().recipeFile())
                    .number(lot.share().kg())
                    .text(Times.iso(lot.order().ready()))
                    .text(Optional.ofNullable(lot.order().due()).map(Times::iso).orElse(""))
                    .text(times.iso(lot.loaded()))
                    .text(times.iso(lot.done()))
                    .whole(lot.late())
                    .text(lot.load().met() ? "yes" : "no")
                    .text(String.join(" ", lot.why()))
                    .end();
        }
        return csv.toString();
    }

    private String steps() {
        Csv csv = new Csv(List.of(
                "load",
                "step",
                "kind",
                "fill",
                "vessel",
                "start",
                "end",
                "duration [s]",
                "latest pull",
                "slack [s]",
                "limited by"));
        for (LoadPlan load : plan.loads()) {
            for (LoadPlan.LegPlan leg : load.legs()) {
                csv.text(load.load().name())
                        .text(leg.name())
                        .text(load.load().recipe().steps().get(leg.leg().step()).kind())
                        .number(
                                leg.leg().fills() > 1
                                        ? OptionalDouble.of(leg.leg().fill() + 1)
                                        : OptionalDouble.empty())
                        .text(leg.vessel())
                        .text(times.iso(leg.start()))
                        .text(times.iso(leg.end()))
                        .whole(leg.seconds())
                        .text(times.iso(leg.latestPull()))
                        .whole(leg.slack())
                        .text(leg.reason())
                        .end();
            }
        }
        return csv.toString();
    }

    private String moves() {
        Csv csv = new Csv(List.of(
                "kind",
                "load",
                "from",
                "to",
                "for",
                "start",
                "end",
                "duration [s]",
                "heads",
                "heads free besides",
                "hoist"));
        for (Move move : account.moves()) {
            csv.text(move.word())
                    .text(move.loadName())
                    .text(move.from().orElse(""))
                    .text(move.to().orElse(""))
                    .text(move.step())
                    .text(times.iso(move.start()))
                    .text(times.iso(move.end()))
                    .whole(move.end() - move.start())
                    .whole(move.heads())
                    .number(
                            plan.line().crew() == null
                                    ? OptionalDouble.empty()
                                    : OptionalDouble.of((double) move.free()))
                    .text(move.hoist() ? "yes" : "no")
                    .end();
        }
        return csv.toString();
    }

    /** A row for each species that a liquor holds, and one where it holds none: litres are said once for each liquor. */
    private String liquor() {
        Csv csv = new Csv(List.of(
                "day",
                "from",
                "vessel",
                "load",
                "step",
                "fill",
                "kind",
                "volume [L]",
                "species",
                "strength [g/L]",
                "mass [kg]"));
        for (Supply supply : account.supplies()) {
            if (supply.strengths().isEmpty()) {
                head(csv, supply, true)
                        .text("")
                        .number(OptionalDouble.empty())
                        .number(OptionalDouble.empty())
                        .end();
            }
            boolean first = true;
            for (Map.Entry<String, Double> solute : supply.strengths().entrySet()) {
                head(csv, supply, first)
                        .text(solute.getKey())
                        .number(solute.getValue())
                        .number(
                                supply.litres().isPresent()
                                        ? OptionalDouble.of(supply.kg(solute.getKey()))
                                        : OptionalDouble.empty())
                        .end();
                first = false;
            }
        }
        return csv.toString();
    }

    private Csv head(Csv csv, Supply supply, boolean first) {
        return csv.text(supply.day().toString())
                .text(times.iso(supply.from()))
                .text(supply.leg().vessel())
                .text(supply.load().load().name())
                .text(supply.leg().name())
                .number(
                        supply.leg().leg().fills() > 1
                                ? OptionalDouble.of(supply.leg().leg().fill() + 1)
                                : OptionalDouble.empty())
                .text(supply.running() ? "flow" : supply.litres().isPresent() ? "fill" : "unlimited")
                .number(first ? supply.litres() : OptionalDouble.empty());
    }
}
