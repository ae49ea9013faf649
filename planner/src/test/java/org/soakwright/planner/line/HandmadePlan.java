package org.soakwright.planner.line;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.OptionalDouble;
import java.util.OptionalLong;
import org.soakwright.planner.batch.Progress;
import org.soakwright.planner.line.shop.Placed;
import org.soakwright.planner.line.shop.Schedule;
import org.soakwright.recipes.LineOutcome;
import org.soakwright.recipes.Lines;
import org.soakwright.recipes.model.line.Line;
import org.soakwright.recipes.model.line.Order;

/**
 * A plan of a small hall put together by hand, so that what is told of plans does not change with how they are made: a lot in two parts, two
 * lots in one load, a lot that is late, stays with changeovers and fills, a room that several loads are in at once, and the end of summer time.
 */
public final class HandmadePlan {
    public static final Path FILE = Path.of("src/test/resources/org/soakwright/planner/line/small-hall.yaml");

    private static final int TANK = 0;
    private static final int TROUGH = 2;
    private static final int TUB = 4;
    private static final int SINK = 5;
    private static final int ROOM = 6;

    private HandmadePlan() {}

    /** One lot late, every target met. */
    public static LinePlan of() {
        return planned(line(), 26);
    }

    /** The first part of the first lot comes out of its running water too early. */
    public static LinePlan missing() {
        return planned(line(), 16);
    }

    public static Line line() {
        LineOutcome outcome = Lines.read(FILE);
        if (outcome instanceof LineOutcome.Refused refused) {
            throw new AssertionError(refused.problems());
        }
        return ((LineOutcome.Accepted) outcome).line();
    }

    /** From one hour to another, after the start. */
    private record Hours(int station, double from, double to) {}

    private static LinePlan planned(Line line, double firstUntil) {
        Hall hall = new Hall(line);
        List<Load> loads = List.of(
                load(share(line, "L1", 1, 2, 450)),
                load(share(line, "L1", 2, 2, 450)),
                load(share(line, "L2", 1, 1, 400)),
                load(share(line, "C1", 1, 1, 150), share(line, "C2", 1, 1, 100)),
                load(share(line, "C3, ж; urgent", 1, 1, 200)));
        List<List<Hours>> times = List.of(
                loins(0, 0.25, 7, 11, 15, firstUntil),
                loins(1, 0.5, 7.5, 11.5, 15.5, 26.25),
                loins(0, 24.25, 32, 36, 39.5, 50),
                cords(6.25, 8.5, 27.5),
                cords(10, 12.5, 34));
        List<Jobs.Made> made = new Jobs(line, hall, false, Progress.NONE).of(loads);
        List<LoadPlan> plans = new ArrayList<>();
        List<Placed> placed = new ArrayList<>();
        for (int i = 0; i < loads.size(); i++) {
            List<Placed.Visit> visits = times.get(i).stream()
                    .map(one -> new Placed.Visit(one.station(), seconds(one.from()), seconds(one.to())))
                    .toList();
            Placed own = new Placed(made.get(i).job(), visits);
            placed.add(own);
            plans.add(plan(hall, made.get(i), own, i == 4));
        }
        plans.sort(Comparator.comparingLong(
                load -> load.placed().begins(hall.shop().carriage())));
        return new LinePlan(
                line,
                hall.clock(),
                new Schedule(hall.shop(), placed),
                plans,
                new LinePlan.Proof(OptionalDouble.of(1800), OptionalLong.of(seconds(48))),
                List.of("Put together by hand."));
    }

    private static List<Hours> loins(int number, double from, double first, double second, double third, double last) {
        double change = 50 / 60.0;
        return List.of(
                new Hours(TANK + number, from, first),
                new Hours(TANK + number, first + change, second),
                new Hours(TANK + number, second + change, third),
                new Hours(TROUGH + number, third + 0.25, last));
    }

    private static List<Hours> cords(double from, double until, double last) {
        return List.of(
                new Hours(TUB, from, until),
                new Hours(SINK, until + 0.25, until + 0.5),
                new Hours(ROOM, until + 0.75, last));
    }

    private static long seconds(double hours) {
        return Math.round(hours * 60) * 60;
    }

    private static Load.Share share(Line line, String lot, int part, int parts, double kg) {
        return new Load.Share(line.order(lot).orElseThrow(), part, parts, kg);
    }

    private static Load load(Load.Share... shares) {
        Order order = shares[0].order();
        double kg = 0;
        for (Load.Share share : shares) {
            kg += share.kg();
        }
        return new Load(Route.weighing(order.recipe(), kg), order.recipeFile(), kg, List.of(shares));
    }

    private static LoadPlan plan(Hall hall, Jobs.Made made, Placed placed, boolean late) {
        var run = made.physics().follow(placed.times());
        Route route = made.route();
        List<LoadPlan.LegPlan> legs = new ArrayList<>();
        for (int k = 0; k < route.size(); k++) {
            Placed.Visit visit = placed.visit(k);
            boolean last = k + 1 == route.size();
            legs.add(new LoadPlan.LegPlan(
                    route.legs().get(k),
                    route.written().steps().get(route.legs().get(k).step()).name(),
                    route.steps()[k],
                    hall.shop().stations().get(visit.station()).name(),
                    visit.start(),
                    visit.end(),
                    last ? visit.end() + seconds(1.5) : visit.end(),
                    last ? "the next load needs the vessel" : "somebody is wanted for the next step"));
        }
        return new LoadPlan(
                made.load(),
                placed,
                run,
                run.targets(),
                legs,
                late ? List.of("it waited for the tub", "where C1 + C2 were until 16:30") : List.of());
    }
}
