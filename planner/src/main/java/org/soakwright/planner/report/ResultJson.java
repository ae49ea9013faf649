package org.soakwright.planner.report;

import java.io.IOException;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.jspecify.annotations.Nullable;
import org.soakwright.planner.batch.Cautions;
import org.soakwright.planner.batch.Outlook;
import org.soakwright.planner.batch.Plan;
import org.soakwright.planner.batch.Run;
import org.soakwright.planner.batch.StepEnd;
import org.soakwright.planner.batch.TargetState;
import org.soakwright.planner.batch.Totals;
import org.soakwright.planner.batch.doubt.Chance;
import org.soakwright.planner.batch.doubt.Shares;
import org.soakwright.recipes.model.Basis;
import org.soakwright.recipes.model.Counted;
import org.soakwright.recipes.model.Per;
import org.soakwright.recipes.model.Quantity;
import org.soakwright.recipes.model.Reading;
import org.soakwright.recipes.model.Recipe;
import org.soakwright.recipes.model.Target;

/**
 * The result of following or planning a recipe as JSON: one object, pretty-printed, with a line feed at its end. Times are seconds,
 * liquor contents g/L, contents of pieces in the unit of the species' start, targets in their own unit. Every number is finite; one that
 * would not be is an {@link ArithmeticException}.
 */
public final class ResultJson {
    private static final String OF_START = " of start";

    private final Stamp stamp;
    private final Run run;
    private final Recipe recipe;
    private final @Nullable Plan plan;

    private ResultJson(Stamp stamp, Run run, @Nullable Plan plan) {
        this.stamp = stamp;
        this.run = run;
        this.plan = plan;
        recipe = run.batch().recipe();
    }

    /** Of a recipe followed as written; nothing is claimed of it. */
    public static String of(Stamp stamp, Run run) {
        return JsonText.object(new ResultJson(stamp, run, null)::write);
    }

    /** Of a plan. */
    public static String of(Stamp stamp, Plan plan) {
        return JsonText.object(new ResultJson(stamp, plan.run(), plan)::write);
    }

    /** A member {@code targets} with each as it stands in a run. */
    public static void targets(JsonText json, Run run, List<TargetState> states) throws IOException {
        ResultJson result = new ResultJson(new Stamp("", ""), run, null);
        json.array("targets", () -> {
            for (TargetState state : states) {
                json.element(() -> result.target(json, state));
            }
        });
    }

    private void write(JsonText json) throws IOException {
        json.string("soakwright", stamp.version());
        json.string("title", recipe.title());
        json.string("inputs-sha256", stamp.sha256());
        json.truth("met", plan == null ? run.meetsTargets() : plan.met());
        if (recipe.allowedBy() != null) {
            json.string("allowed-by", recipe.allowedBy());
        }
        uncertainty(json);
        json.array("steps", () -> {
            for (int i = 0; i < recipe.steps().size(); i++) {
                StepEnd end = run.end(i);
                json.element(() -> step(json, end));
            }
        });
        targets(json, run, run.targets());
        totals(json, "totals", run.totals());
        reasons(json);
        Cautions cautions = Cautions.of(run);
        json.strings("cautions", cautions.shown());
        json.strings("stops", cautions.stops());
    }

    /** Only where something is not known exactly. */
    private void uncertainty(JsonText json) throws IOException {
        Outlook outlook = run.outlook().orElse(null);
        if (outlook == null) {
            return;
        }
        json.object("chance", () -> {
            chance(json, outlook.all());
            json.whole("refused", outlook.refused());
        });
        json.array("uncertain", () -> {
            for (int i = 0; i < outlook.values().size(); i++) {
                int value = i;
                json.element(() -> {
                    json.string("name", outlook.values().get(value));
                    json.array("shares", () -> shares(json, outlook, value));
                });
            }
        });
    }

    private static void chance(JsonText json, Chance chance) throws IOException {
        json.number("value", chance.value());
        json.number("low", chance.low());
        json.number("high", chance.high());
        json.whole("samples", chance.samples());
    }

    private static void shares(JsonText json, Outlook outlook, int value) throws IOException {
        for (Outlook.Prospect one : outlook.prospects()) {
            if (!one.shares().isEmpty()) {
                json.element(() -> {
                    json.string("target", one.name());
                    json.number("share", one.shares().get(value));
                    json.number("remaining", Shares.remaining(one.shares().get(value)));
                });
            }
        }
    }

    /** What is to be expected of a target; only where something is not known exactly. */
    private void prospect(JsonText json, TargetState state) throws IOException {
        Outlook outlook = run.outlook().orElse(null);
        if (outlook == null) {
            return;
        }
        Chance chance = outlook.chance(state, recipe.targets()).orElseThrow();
        json.object("chance", () -> chance(json, chance));
        Outlook.Prospect one = outlook.of(state).orElseThrow();
        json.numberIfAny("value-error", one.error());
        if (!one.percentiles().isEmpty()) {
            json.object("percentiles", () -> {
                for (int i = 0; i < Outlook.LEVELS.size(); i++) {
                    json.number(
                            Figures.made(100 * Outlook.LEVELS.get(i)),
                            one.percentiles().get(i));
                }
            });
        }
    }

    private void step(JsonText json, StepEnd end) throws IOException {
        json.string("name", end.step().name());
        json.string("kind", end.step().kind());
        json.number("seconds", end.seconds());
        json.object("liquor", () -> {
            for (StepEnd.Liquor liquor : end.liquor()) {
                json.object(liquor.species(), () -> {
                    json.number("start", liquor.start());
                    json.number("end", liquor.end());
                    json.string("unit", "g/L");
                });
            }
        });
        json.object("species", () -> {
            for (StepEnd.LotMean mean : end.means()) {
                json.object(mean.species(), () -> {
                    json.number("mean", mean.value());
                    json.string("unit", mean.unit().symbol());
                });
            }
        });
        if (end.massKg().isPresent()) {
            double kg = end.massKg().getAsDouble();
            json.object("mass", () -> {
                json.number("value", kg);
                json.number("of-start", kg / recipe.lot().massKg().orElseThrow());
                json.string("unit", "kg");
            });
        }
        json.array("pieces", () -> {
            for (StepEnd.Piece piece : end.pieces()) {
                json.element(() -> piece(json, piece));
            }
        });
    }

    private static void piece(JsonText json, StepEnd.Piece piece) throws IOException {
        json.string("name", piece.name());
        json.object("species", () -> {
            for (StepEnd.Content content : piece.species()) {
                json.object(content.species(), () -> {
                    for (Reading reading : Reading.values()) {
                        json.number(reading.word(), content.value(reading));
                    }
                    distribution(json, content);
                    json.number("error", content.error());
                    json.string("unit", content.unit().symbol());
                });
            }
        });
    }

    /** What so many per cent of the pieces, by mass, read at most; only where they differ. */
    private static void distribution(JsonText json, StepEnd.Content content) throws IOException {
        if (content.distribution().isEmpty()) {
            return;
        }
        json.object("distribution", () -> {
            for (Reading reading : Reading.values()) {
                List<Double> values = content.distribution().getOrDefault(reading, List.of());
                json.object(reading.word(), () -> {
                    for (int i = 0; i < values.size(); i++) {
                        json.number(Figures.made(100 * StepEnd.SHARES.get(i)), values.get(i));
                    }
                });
            }
        });
    }

    private void target(JsonText json, TargetState state) throws IOException {
        Target target = state.target();
        boolean ofStart = false;
        if (target instanceof Target.OfPieces pieces) {
            json.string("species", pieces.species().name());
            json.string("reading", pieces.reading().word());
            json.stringOrNull("grade", state.grade());
            if (pieces.after() != null) {
                json.string("after", pieces.after().name());
            }
            if (pieces.share() != null) {
                json.number("share", pieces.share().si());
            }
            counted(json, pieces.counted());
            ofStart = pieces.limits().basis() == Basis.OF_START;
        } else if (target instanceof Target.OfLiquor liquor) {
            json.string("liquor", liquor.step().name());
            json.string("species", liquor.species().name());
            json.string("reading", "end");
        } else if (target instanceof Target.OfTotal total) {
            json.string("total", total.total().word());
        } else if (target instanceof Target.OfMass mass) {
            json.string("total", "mass");
            if (mass.after() != null) {
                json.string("after", mass.after().name());
            }
            ofStart = mass.ofStart();
        }
        Optional<Quantity> confidence = recipe.confidence(target);
        if (confidence.isPresent()) {
            json.number("confidence", confidence.get().si());
        }
        json.numberIfAny("at-most", state.atMost());
        json.numberIfAny("at-least", state.atLeast());
        if (ofStart) {
            json.string("of", "start");
        }
        json.number("value", state.value());
        json.string("unit", plainUnit(state.unit()));
        json.truth("met", state.met());
        prospect(json, state);
    }

    /** Only what is not counted as loaded. */
    private static void counted(JsonText json, Counted counted) throws IOException {
        if (counted instanceof Counted.InPhase in) {
            json.string("phase", in.phase().word());
        } else if (counted instanceof Counted.OfPiece piece && piece.per() != Per.LOADED) {
            json.string("per", piece.per().word());
        }
    }

    private static String plainUnit(String unit) {
        return unit.endsWith(OF_START) ? unit.substring(0, unit.length() - OF_START.length()) : unit;
    }

    private void totals(JsonText json, String name, Totals totals) throws IOException {
        json.object(name, () -> {
            json.number("seconds", totals.seconds());
            liquorAndCost(json, totals);
            json.stringOrNull("currency", totals.cost().isPresent() ? Wording.currency(recipe) : Optional.empty());
        });
    }

    private static void liquorAndCost(JsonText json, Totals totals) throws IOException {
        OptionalDouble volume = totals.liquorM3();
        json.numberOrNull(
                "liquor-litres",
                volume.isPresent() ? OptionalDouble.of(volume.getAsDouble() * 1000) : OptionalDouble.empty());
        json.numberOrNull("cost", totals.cost());
    }

    /** What only a plan has to say; a recipe followed says the same with nothing in it. */
    private void reasons(JsonText json) throws IOException {
        if (plan == null) {
            json.nothing("proof");
            json.strings("binds", List.of());
            json.array("per-hour", () -> {});
            json.nothing("nearest-miss");
            json.array("remedies", () -> {});
            return;
        }
        Plan chosen = plan;
        json.object("proof", () -> {
            Plan.Proof proof = chosen.proof();
            json.string("claim", proof.claim().name().toLowerCase(java.util.Locale.ROOT));
            json.whole("starts", proof.starts());
            json.whole("agreed", proof.agreed());
            json.numberOrNull("bound-seconds", proof.bound());
            json.whole("evaluations", proof.evaluations());
        });
        json.strings("binds", chosen.binds());
        json.array("per-hour", () -> {
            for (Plan.PerHour one : chosen.perHour()) {
                json.element(() -> {
                    json.string("step", one.step());
                    json.string("reading", one.reading());
                    json.number("change", one.change());
                    json.string("unit", one.unit());
                });
            }
        });
        if (chosen.nearestMiss().isPresent()) {
            Plan.NearestMiss miss = chosen.nearestMiss().get();
            json.object("nearest-miss", () -> nearestMiss(json, miss));
        } else {
            json.nothing("nearest-miss");
        }
        json.array("remedies", () -> {
            for (Plan.Remedy remedy : chosen.remedies()) {
                json.element(() -> {
                    json.string("kind", remedy.kind());
                    json.string("change", remedy.change());
                    json.number("seconds", remedy.totals().seconds());
                    liquorAndCost(json, remedy.totals());
                    json.string("caution", remedy.caution());
                });
            }
        });
    }

    private static void nearestMiss(JsonText json, Plan.NearestMiss miss) throws IOException {
        TargetState state = miss.target();
        json.string("target", state.name());
        json.stringOrNull("grade", state.grade());
        json.number("value", state.value());
        json.number("limit", Wording.side(state));
        json.number("by", miss.by());
        if (state.unit().endsWith(OF_START)) {
            json.string("of", "start");
        }
        json.string("unit", plainUnit(state.unit()));
    }
}
