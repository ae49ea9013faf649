package org.soakwright.planner.report.line;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.Collectors;
import org.soakwright.planner.line.LinePlan;
import org.soakwright.planner.line.Load;
import org.soakwright.planner.line.LoadPlan;
import org.soakwright.planner.line.shop.Joint;
import org.soakwright.planner.line.shop.Placed;
import org.soakwright.planner.line.shop.Station;
import org.soakwright.planner.report.Figures;
import org.soakwright.planner.report.picture.Picture;
import org.soakwright.planner.report.picture.TimeChart;
import org.soakwright.recipes.model.line.VesselGroup;

/** A planned line as a time chart by vessel. */
final class HallChart {
    private final Account account;
    private final LinePlan plan;
    private final Times times;
    private final ChartClock clock;
    private final List<List<TimeChart.Stay>> stays = new ArrayList<>();
    private final List<List<TimeChart.Late>> late = new ArrayList<>();
    private final Lanes[] lanes;
    private final long[] busy;

    private HallChart(Account account) {
        this.account = account;
        plan = account.plan();
        times = new Times(plan.clock());
        clock = ChartClock.of(plan);
        List<Station> stations = plan.schedule().shop().stations();
        lanes = new Lanes[stations.size()];
        busy = new long[stations.size()];
        for (int i = 0; i < lanes.length; i++) {
            lanes[i] = new Lanes();
            stays.add(new ArrayList<>());
            late.add(new ArrayList<>());
        }
    }

    static List<Picture> of(Account account) {
        return TimeChart.of(new HallChart(account).subject());
    }

    private TimeChart.Subject subject() {
        List<Stay> all = new ArrayList<>();
        plan.loads().forEach(load -> all.addAll(stays(load)));
        all.sort(Comparator.comparingLong(Stay::from));
        all.forEach(this::add);
        List<TimeChart.Row> rows = new ArrayList<>();
        List<Station> stations = plan.schedule().shop().stations();
        for (int i = 0; i < stations.size(); i++) {
            rows.add(new TimeChart.Row(
                    stations.get(i).name(), lanes[i].count(), stays.get(i), closed(stations.get(i)), late.get(i)));
        }
        Lanes hands = new Lanes();
        List<TimeChart.Tick> work = account.moves().stream()
                .map(move -> new TimeChart.Tick(
                        hands.of(move.start(), move.end()), new TimeChart.Span(move.start(), move.end()), move.hoist()))
                .toList();
        return new TimeChart.Subject(
                "Who is in which vessel when",
                subtitle(),
                caption(),
                altText(),
                kinds(),
                rows,
                "moves",
                hands.count(),
                work,
                clock.away(),
                clock.pauses(),
                clock.nights(),
                clock.days(),
                clock.hours(),
                clock.panels());
    }

    /**
     * The legs of a load from one lift to the next.
     *
     * @param before when the stay before it was over; before everything for the first
     */
    private record Stay(LoadPlan load, int station, List<Placed.Visit> visits, long before, boolean last) {
        long from() {
            return visits.get(0).start();
        }

        long until() {
            return visits.get(visits.size() - 1).end();
        }
    }

    private static List<Stay> stays(LoadPlan load) {
        Placed placed = load.placed();
        List<Stay> stays = new ArrayList<>();
        List<Placed.Visit> visits = new ArrayList<>();
        long before = Long.MIN_VALUE;
        int size = placed.job().size();
        for (int k = 0; k < size; k++) {
            visits.add(placed.visit(k));
            boolean leaves = k + 1 == size || placed.job().phase(k + 1).before() instanceof Joint.Lift;
            if (leaves) {
                stays.add(new Stay(load, placed.visit(k).station(), List.copyOf(visits), before, k + 1 == size));
                before = placed.visit(k).end();
                visits.clear();
            }
        }
        return stays;
    }

    private void add(Stay stay) {
        Station station = plan.schedule().shop().stations().get(stay.station());
        long until = stay.until() + station.turnaround();
        int lane = station.holdsMany() ? lanes[stay.station()].of(stay.from(), until) : 0;
        List<TimeChart.Stay> before = stays.get(stay.station());
        if (!station.holdsMany() && !before.isEmpty()) {
            // A load that comes back into its own vessel need not wait for the turnaround.
            TimeChart.Stay last = before.get(before.size() - 1);
            busy[stay.station()] -= Math.max(0, last.after().until() - stay.from());
            before.set(before.size() - 1, last.until(stay.from()));
        }
        busy[stay.station()] += until - stay.from();
        List<TimeChart.Span> legs = new ArrayList<>();
        List<TimeChart.Span> changes = new ArrayList<>();
        for (int k = 0; k < stay.visits().size(); k++) {
            Placed.Visit visit = stay.visits().get(k);
            legs.add(new TimeChart.Span(visit.start(), visit.end()));
            if (k > 0 && visit.start() > stay.visits().get(k - 1).end()) {
                changes.add(new TimeChart.Span(stay.visits().get(k - 1).end(), visit.start()));
            }
        }
        int kind = account.recipeFiles().indexOf(stay.load().load().recipeFile());
        before.add(new TimeChart.Stay(
                lane, kind, labels(stay.load().load()), legs, changes, new TimeChart.Span(stay.until(), until)));
        account.latest(stay.load()).ifPresent(lot -> late(stay, lane, lot.done() - lot.late()));
    }

    /** What of a stay comes after its load was due; the first such stay bears the flag. */
    private void late(Stay stay, int lane, long due) {
        boolean first = stay.before() <= due && (stay.until() > due || stay.last());
        if (first || stay.from() > due) {
            long from = Math.min(Math.max(due, stay.from()), stay.until());
            late.get(stay.station()).add(new TimeChart.Late(lane, new TimeChart.Span(from, stay.until()), first));
        }
    }

    private static List<String> labels(Load load) {
        List<String> labels = new ArrayList<>(List.of(load.name()));
        Load.Share first = load.shares().get(0);
        String part = first.parts() == 1 ? "" : " " + first.part() + "/" + first.parts();
        int more = load.shares().size() - 1;
        labels.add(first.order().lot() + part + (more == 0 ? "" : " + " + more));
        labels.add(first.order().lot() + (more == 0 ? "" : "+"));
        return labels;
    }

    private List<TimeChart.Named> closed(Station station) {
        List<TimeChart.Named> closed = new ArrayList<>();
        VesselGroup group = plan.line().vessels().get(station.group());
        int number = group.vesselNames().indexOf(station.name()) + 1;
        group.outages().stream()
                .filter(outage -> outage.concerns(number))
                .forEach(outage -> closed.add(new TimeChart.Named(
                        new TimeChart.Span(
                                plan.clock().seconds(outage.from()),
                                plan.clock().seconds(outage.to())),
                        outage.reason() == null ? "" : outage.reason())));
        return closed;
    }

    /** The recipes, those that have no colour of their own together. */
    private List<String> kinds() {
        List<String> files = account.recipeFiles();
        List<String> kinds = new ArrayList<>();
        files.stream().limit(TimeChart.KINDS).forEach(file -> kinds.add(account.recipeTitle(file)));
        if (files.size() == TimeChart.KINDS + 1) {
            kinds.add(account.recipeTitle(files.get(TimeChart.KINDS)));
        } else if (files.size() > TimeChart.KINDS) {
            kinds.add("other recipes");
        }
        return kinds;
    }

    private String subtitle() {
        return times.wallWithYear(0) + " to " + times.wall(plan.schedule().makespan()) + ", clock of "
                + plan.line().zone().getId() + (plan.line().crew() == null ? "" : "; night is marked above the rows");
    }

    private String caption() {
        List<Station> stations = plan.schedule().shop().stations();
        int most = -1;
        for (int i = 0; i < busy.length; i++) {
            if (!stations.get(i).holdsMany() && busy[i] > 0 && (most < 0 || busy[i] > busy[most])) {
                most = i;
            }
        }
        long span = plan.schedule().makespan();
        String busiest = most < 0 || span <= 0
                ? ""
                : " The busiest vessel is " + stations.get(most).name() + ", taken "
                        + Figures.rounded(100.0 * busy[most] / span, 2) + " % of the time.";
        List<String> late = account.lateLots().stream()
                .map(lot -> lot.name() + " by " + Times.lasting(lot.late()))
                .limit(3)
                .toList();
        int more = account.lateLots().size() - late.size();
        return "Each bar is a load in a vessel; a move stands in the last row, solid where it needs the hoist."
                + busiest
                + (late.isEmpty()
                        ? ""
                        : " Late: " + String.join(", ", late) + (more > 0 ? " and " + more + " more." : "."));
    }

    private String altText() {
        String rows =
                plan.schedule().shop().stations().stream().map(Station::name).collect(Collectors.joining(", "));
        Map<String, Long> loads = new LinkedHashMap<>();
        plan.loads().forEach(load -> loads.merge(account.recipeTitle(load.load().recipeFile()), 1L, Long::sum));
        String recipes = loads.entrySet().stream()
                .map(entry -> entry.getValue() + " of " + entry.getKey())
                .collect(Collectors.joining(", "));
        return "Time chart of the vessels " + rows + " from " + times.wallWithYear(0) + " to "
                + times.wall(plan.schedule().makespan()) + ". Loads: " + recipes + ". Lots late: "
                + account.lateLots().size() + ". The same stands in the lists of lots and moves.";
    }

    /** Beside each other what is on at once. */
    private static final class Lanes {
        private final List<Long> ends = new ArrayList<>();

        int of(long from, long until) {
            for (int i = 0; i < ends.size(); i++) {
                if (ends.get(i) <= from) {
                    ends.set(i, until);
                    return i;
                }
            }
            ends.add(until);
            return ends.size() - 1;
        }

        int count() {
            return Math.max(1, ends.size());
        }
    }
}
