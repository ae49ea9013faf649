package org.soakwright.planner.report.line;

import java.io.IOException;
import java.util.Optional;
import java.util.OptionalDouble;
import org.soakwright.planner.line.LinePlan;
import org.soakwright.planner.line.LoadPlan;
import org.soakwright.planner.report.JsonText;
import org.soakwright.planner.report.ResultJson;
import org.soakwright.planner.report.Stamp;
import org.soakwright.recipes.model.Step;

/**
 * A planned line as JSON: one object, pretty-printed, with a line feed at its end. Moments are local with their offset, durations seconds,
 * masses kg, liquors litres. Of every lot there is an entry, of a lot in parts one for each part.
 */
public final class LineJson {
    private final Stamp stamp;
    private final Account account;
    private final LinePlan plan;
    private final Times times;

    private LineJson(Stamp stamp, Account account) {
        this.stamp = stamp;
        this.account = account;
        plan = account.plan();
        times = new Times(plan.clock());
    }

    public static String of(Stamp stamp, LinePlan plan) {
        return of(stamp, new Account(plan));
    }

    static String of(Stamp stamp, Account account) {
        return JsonText.object(new LineJson(stamp, account)::write);
    }

    private void write(JsonText json) throws IOException {
        json.string("soakwright", stamp.version());
        json.string("title", plan.line().title());
        json.string("zone", plan.line().zone().getId());
        json.string("inputs-sha256", stamp.sha256());
        json.truth("met", account.isGood());
        json.array("lots", () -> {
            for (Account.Lot lot : account.lots()) {
                json.element(() -> lot(json, lot));
            }
        });
        json.array("moves", () -> {
            for (Move move : account.moves()) {
                json.element(() -> move(json, move));
            }
        });
        json.whole("makespan-seconds", plan.schedule().makespan());
        if (plan.proof().makespan().isPresent()) {
            json.whole("bound-seconds", plan.proof().makespan().getAsLong());
        } else {
            json.nothing("bound-seconds");
        }
        json.number("lateness-seconds", plan.schedule().lateness());
        json.numberOrNull("bound-lateness-seconds", plan.proof().lateness());
        json.whole("night-moves", plan.schedule().atNight());
        json.numberOrNull("cost", account.cost());
        json.stringOrNull("currency", account.currency());
        json.array("liquor", () -> {
            for (Supply supply : account.supplies()) {
                json.element(() -> supply(json, supply));
            }
        });
        json.array("liquor-by-day", () -> {
            for (Supplies.Day day : Supplies.byDay(account.supplies())) {
                json.element(() -> day(json, day));
            }
        });
        json.strings("notes", plan.notes());
        json.array("cautions", () -> {
            for (Warnings.Warning warning : account.warnings().shown()) {
                json.element(() -> {
                    json.string("caution", warning.words());
                    json.strings("recipes", Warnings.files(warning.loads()));
                    json.whole("loads", warning.loads().size());
                });
            }
        });
        json.strings("stops", account.stops());
    }

    private void lot(JsonText json, Account.Lot lot) throws IOException {
        LoadPlan load = lot.load();
        json.string("lot", lot.order().lot());
        if (lot.share().parts() > 1) {
            json.whole("part", lot.share().part());
            json.whole("parts", lot.share().parts());
        }
        json.string("load", load.load().name());
        json.string("recipe", load.load().recipeFile());
        json.number("mass-kg", lot.share().kg());
        json.truth("met", load.met());
        json.whole("late-seconds", lot.late());
        json.string("ready", Times.iso(lot.order().ready()));
        json.stringOrNull("due", Optional.ofNullable(lot.order().due()).map(Times::iso));
        json.string("loaded", times.iso(lot.loaded()));
        json.string("done", times.iso(lot.done()));
        json.array("steps", () -> {
            for (LoadPlan.LegPlan leg : load.legs()) {
                json.element(() -> leg(json, load, leg));
            }
        });
        ResultJson.targets(json, load.run(), load.targets());
        json.strings("why-late", lot.why());
    }

    private void leg(JsonText json, LoadPlan load, LoadPlan.LegPlan leg) throws IOException {
        Step step = load.load().recipe().steps().get(leg.leg().step());
        json.string("name", leg.name());
        json.string("kind", step.kind());
        if (leg.leg().fills() > 1) {
            json.whole("fill", leg.leg().fill() + 1L);
        }
        json.string("vessel", leg.vessel());
        json.string("start", times.iso(leg.start()));
        json.string("end", times.iso(leg.end()));
        json.whole("seconds", leg.seconds());
        json.string("latest-pull", times.iso(leg.latestPull()));
        json.whole("slack-seconds", leg.slack());
        json.string("limited-by", leg.reason());
    }

    private void move(JsonText json, Move move) throws IOException {
        json.string("kind", move.word());
        json.string("lot", move.loadName());
        json.stringOrNull("from", move.from());
        json.stringOrNull("to", move.to());
        json.string("start", times.iso(move.start()));
        json.string("end", times.iso(move.end()));
        json.whole("heads", move.heads());
        json.truth("hoist", move.hoist());
    }

    private void supply(JsonText json, Supply supply) throws IOException {
        json.string("day", supply.day().toString());
        json.string("vessel", supply.leg().vessel());
        json.string("lot", supply.load().load().name());
        json.string("step", supply.leg().name());
        if (supply.leg().leg().fills() > 1) {
            json.whole("fill", supply.leg().leg().fill() + 1L);
        }
        json.string("kind", supply.running() ? "flow" : "fill");
        json.string("from", times.iso(supply.from()));
        json.numberOrNull("litres", supply.litres());
        json.object("species", () -> {
            for (var entry : supply.strengths().entrySet()) {
                json.object(entry.getKey(), () -> {
                    json.number("strength", entry.getValue());
                    json.string("unit", "g/L");
                    json.numberOrNull(
                            "kg",
                            supply.litres().isPresent()
                                    ? OptionalDouble.of(supply.kg(entry.getKey()))
                                    : OptionalDouble.empty());
                });
            }
        });
    }

    private static void day(JsonText json, Supplies.Day day) throws IOException {
        json.string("day", day.day().toString());
        json.number("litres", day.litres());
        json.truth("complete", day.complete());
        json.object("kg", () -> {
            for (var entry : day.kg().entrySet()) {
                json.number(entry.getKey(), entry.getValue());
            }
        });
    }
}
