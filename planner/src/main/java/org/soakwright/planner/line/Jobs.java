package org.soakwright.planner.line;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.IntStream;
import org.soakwright.planner.batch.Batch;
import org.soakwright.planner.batch.Cost;
import org.soakwright.planner.batch.Plan;
import org.soakwright.planner.batch.Planner;
import org.soakwright.planner.batch.Progress;
import org.soakwright.planner.batch.Run;
import org.soakwright.planner.line.shop.Job;
import org.soakwright.planner.line.shop.Phase;
import org.soakwright.planner.line.shop.Tariff;
import org.soakwright.recipes.model.Goal;
import org.soakwright.recipes.model.LiquorVolume;
import org.soakwright.recipes.model.Recipe;
import org.soakwright.recipes.model.Renewal;
import org.soakwright.recipes.model.Step;
import org.soakwright.recipes.model.Target;
import org.soakwright.recipes.model.line.Line;
import org.soakwright.recipes.model.line.VesselGroup;
import org.soakwright.recipes.text.Problems;
import org.soakwright.recipes.text.Shown;
import org.soakwright.recipes.text.Unsound;

/** Loads as jobs. Loads of one recipe share its physics, and each recipe is planned alone once, where its mass is no matter. */
final class Jobs {
    private final Line line;
    private final Hall hall;
    private final boolean decoupled;
    private final Progress progress;
    private final Map<String, Prepared> prepared = new LinkedHashMap<>();

    /**
     * Jobs of a line.
     *
     * @param decoupled whether every leg lasts at least as long as when its recipe is planned alone
     */
    Jobs(Line line, Hall hall, boolean decoupled, Progress progress) {
        this.line = line;
        this.hall = hall;
        this.decoupled = decoupled;
        this.progress = progress;
    }

    /**
     * A recipe planned alone.
     *
     * @param seconds of each leg
     */
    private record Prepared(Plan plan, double[] seconds, RoutePhysics physics) {}

    /** What a load looks like for the shop, and what goes on in it. */
    record Made(Load load, Route route, RoutePhysics physics, Plan alone, Job job) {
        /** Followed with such times, with the mass of this load. */
        Run followed(long[] times) {
            return alone.run().holding(new Batch(route.run())).follow(route.seconds(times));
        }
    }

    /**
     * The jobs of loads.
     *
     * @throws Unsound with a problem for every lot whose recipe cannot meet its targets
     */
    List<Made> of(List<Load> loads) {
        Problems problems = new Problems();
        List<Made> made = new ArrayList<>();
        for (int i = 0; i < loads.size(); i++) {
            progress.at("preparing recipes", (double) i / loads.size());
            Load load = loads.get(i);
            Made one = problems.attempt(() -> of(load));
            if (one != null) {
                made.add(one);
            }
        }
        if (!problems.isEmpty()) {
            throw new Unsound(problems.sorted());
        }
        return made;
    }

    private Made of(Load load) {
        Route route = Route.of(load.recipe(), load.kg(), line.moves());
        Prepared ready = prepared.get(key(load));
        if (ready == null) {
            ready = prepare(load, route);
            prepared.put(key(load), ready);
        }
        Job job = new Job(
                load.name(),
                Math.max(0, Loads.ready(hall.clock(), load)),
                dues(hall.clock(), load),
                Hall.amount(load.kg()),
                phases(route, ready.seconds()),
                ready.physics(),
                tariff(route));
        return new Made(load, route, ready.physics(), ready.plan(), job);
    }

    /** Loads for which the same goes on in the pieces. */
    private static String key(Load load) {
        return load.recipeFile() + (isWhateverItsMass(load.recipe()) ? "" : " " + load.kg());
    }

    private static boolean isWhateverItsMass(Recipe recipe) {
        for (Step step : recipe.steps()) {
            boolean flows = step instanceof Step.Rinse rinse && rinse.renewal() instanceof Renewal.Flow;
            boolean stated = step instanceof Step.Wet wet && wet.liquor().volume() instanceof LiquorVolume.Volume;
            if (flows || stated) {
                return false;
            }
        }
        return recipe.targets().stream()
                .noneMatch(target -> target instanceof Target.OfMass
                        || (target instanceof Target.OfTotal total && total.total() != Goal.TIME));
    }

    private Prepared prepare(Load load, Route route) {
        Plan plan = Planner.plan(route.written(), Progress.NONE);
        if (!plan.met()) {
            throw new Unsound(load.shares().get(0).order().place(), failed(load, plan));
        }
        double[] seconds = new double[route.size()];
        for (int k = 0; k < seconds.length; k++) {
            Leg leg = route.legs().get(k);
            seconds[k] = plan.run().seconds()[leg.step()] / leg.fills();
        }
        Batch batch = plan.run().holding(new Batch(route.run()));
        List<long[]> styles = decoupled
                ? List.of(Arrays.stream(seconds).mapToLong(Jobs::whole).toArray())
                : Styles.of(phases(route, seconds), seconds);
        return new Prepared(plan, seconds, new RoutePhysics(route, batch, styles));
    }

    private static long whole(double seconds) {
        return (long) Math.ceil(seconds - 1e-6);
    }

    private static String failed(Load load, Plan plan) {
        return load.recipeFile() + " cannot meet its targets, whatever its times, with "
                + BigDecimal.valueOf(load.kg())
                        .round(new MathContext(4))
                        .stripTrailingZeros()
                        .toPlainString() + " kg"
                + plan.nearestMiss()
                        .map(miss -> ": nearest is " + miss.target().name() + " missed by "
                                + Shown.number(BigDecimal.valueOf(miss.by()).round(new MathContext(3))) + " "
                                + miss.target().unit())
                        .orElse("")
                + "; plan that recipe alone to see what would help";
    }

    private static List<Job.Due> dues(Clock clock, Load load) {
        List<Job.Due> dues = new ArrayList<>();
        for (Load.Share share : load.shares()) {
            if (share.order().due() != null) {
                dues.add(new Job.Due(
                        clock.seconds(share.order().due()),
                        share.order().priority().doubleValue()));
            }
        }
        return dues;
    }

    private List<Phase> phases(Route route, double[] planned) {
        List<List<VesselGroup>> groups = Fitting.groups(route.written(), line.vessels());
        List<Phase> phases = new ArrayList<>();
        for (int k = 0; k < route.size(); k++) {
            Leg leg = route.legs().get(k);
            Step step = route.written().steps().get(leg.step());
            List<Integer> stations = IntStream.range(0, hall.shop().stations().size())
                    .filter(station -> groups.get(leg.step()).contains(hall.group(station)))
                    .boxed()
                    .toList();
            phases.add(new Phase(
                    stations,
                    Lasting.of(step, decoupled ? planned[k] : 0),
                    step.head().handling().attended(),
                    route.joints().get(k),
                    stations.stream().map(station -> hall.draws(station, step)).toList()));
        }
        return phases;
    }

    private static Tariff tariff(Route route) {
        if (route.written().currency().isEmpty()) {
            return Tariff.NONE;
        }
        Cost cost = new Cost(route.run());
        double[] rates = new double[route.run().steps().size()];
        for (int i = 0; i < rates.length; i++) {
            rates[i] = cost.rate(Goal.COST, i);
        }
        return new Tariff(
                cost.of(Goal.COST, new double[rates.length]),
                Arrays.stream(route.byTimes(rates)).boxed().toList());
    }
}
