package org.soakwright.planner.line.constraint;

import com.google.ortools.sat.CpModel;
import com.google.ortools.sat.CpSolver;
import com.google.ortools.sat.CpSolverStatus;
import com.google.ortools.sat.IntVar;
import com.google.ortools.sat.LinearArgument;
import com.google.ortools.sat.LinearExpr;
import com.google.ortools.sat.Literal;
import java.util.ArrayList;
import java.util.IdentityHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import org.soakwright.planner.line.shop.Aim;
import org.soakwright.planner.line.shop.Job;
import org.soakwright.planner.line.shop.Physics;
import org.soakwright.planner.line.shop.Schedule;
import org.soakwright.planner.line.shop.Shop;

/**
 * A shop's model solved for one aim after the other, each kept at what was reached while the next is made least. Ends after so much
 * deterministic work, never by the clock: the same shop gives the same answer.
 */
final class Program {
    /** What a weight of one becomes, so that priorities keep three decimals. */
    private static final long WEIGHT = 1000;

    private static final double CENT = 100;

    private final Shop shop;
    private final List<Job> jobs;
    private final List<Aim> aims;
    private final long tick;

    Program(Shop shop, List<Job> jobs, List<Aim> aims) {
        this.shop = shop;
        this.jobs = jobs;
        this.aims = aims.stream().filter(aim -> aim != Aim.NIGHT_MOVES).toList();
        tick = Ticks.of(shop, jobs);
    }

    /**
     * What came of it.
     *
     * @param schedule the last solution, with single stations found for it; empty where there is none
     * @param lateness no schedule has less, s times weight; empty where nothing is known
     * @param makespan no schedule that is no later than the given one has less, s; empty where nothing is known
     */
    record Answer(Optional<Schedule> schedule, OptionalDouble lateness, OptionalDouble makespan) {}

    /**
     * Solves.
     *
     * @param known a schedule that meets everything; what comes is no later
     * @param hint where to begin; it may miss something
     * @param cuts what each physics asks for besides what is certain
     * @param work deterministic work to spend, about a second each
     */
    Answer solve(Schedule known, Schedule hint, IdentityHashMap<Physics, List<Physics.Cut>> cuts, double work) {
        return new Solving(model(known, hint, cuts), known, false).answer(work);
    }

    /**
     * The same with everybody's turn at stations and hoist kept as in a schedule: quick, since only times are left to find. No bound comes of it.
     *
     * @param order it may be later than the known one, and miss something
     */
    Optional<Schedule> retimed(
            Schedule known, Schedule order, IdentityHashMap<Physics, List<Physics.Cut>> cuts, double work) {
        Model model = model(known, order, cuts);
        Turns.keep(model, shop, tick, order);
        return new Solving(model, known, true).answer(work).schedule();
    }

    private Model model(Schedule known, Schedule hint, IdentityHashMap<Physics, List<Physics.Cut>> cuts) {
        Model model = new Model(shop, jobs, tick, known.makespan() + (known.lateness() > 0 ? known.makespan() : 0));
        for (Job job : jobs) {
            job.physics().certain().forEach(cut -> model.cut(job, cut));
            List<Physics.Cut> own = cuts.get(job.physics());
            if (own != null) {
                own.forEach(cut -> model.cut(job, cut));
            }
        }
        model.hint(hint);
        return model;
    }

    private final class Solving {
        private final Model model;
        private final Schedule known;
        private final boolean quick;
        private Optional<Schedule> schedule = Optional.empty();
        private OptionalDouble lateness = OptionalDouble.empty();
        private OptionalDouble makespan = OptionalDouble.empty();

        Solving(Model model, Schedule known, boolean quick) {
            this.model = model;
            this.quick = quick;
            this.known = known;
        }

        Answer answer(double work) {
            boolean timely = true;
            double left = work;
            for (Aim aim : aims) {
                if (aim == Aim.LATENESS && known.lateness() == 0) {
                    jobs.forEach(job -> job.dues()
                            .forEach(due -> model.model().addLessOrEqual(model.out(job), due.moment() / tick)));
                    lateness = OptionalDouble.of(0);
                    continue;
                }
                if (left <= 0) {
                    break;
                }
                LinearExpr sum = sum(aim);
                model.model().minimize(sum);
                double share = aim == aims.get(aims.size() - 1) ? left : left * 0.6;
                CpSolver solver = solver(share, quick ? 1 : 2);
                CpSolverStatus status = solver.solve(model.model());
                left -= share;
                boolean proven = status == CpSolverStatus.OPTIMAL || status == CpSolverStatus.FEASIBLE;
                if (proven || status == CpSolverStatus.UNKNOWN) {
                    bound(aim, Math.ceil(solver.bestObjectiveBound() - 1e-6), timely);
                }
                if (!proven) {
                    break;
                }
                schedule = Stations.of(shop, jobs, model, solver, tick).or(() -> schedule);
                long reached = Math.round(solver.objectiveValue());
                model.model().addLessOrEqual(sum, reached);
                timely = aim == Aim.LATENESS;
                again(solver);
            }
            return new Answer(schedule, lateness, makespan);
        }

        /** A bound on the makespan holds for schedules no later than this one, so only where lateness alone came before it. */
        private void bound(Aim aim, double value, boolean timely) {
            if (aim == Aim.LATENESS && aims.get(0) == Aim.LATENESS) {
                lateness = OptionalDouble.of(Math.max(0, value * tick / WEIGHT));
            } else if (aim == Aim.MAKESPAN && timely) {
                makespan = OptionalDouble.of(Math.max(0, value * tick));
            }
        }

        private void again(CpSolver solver) {
            CpModel program = model.model();
            program.clearHints();
            for (Job job : jobs) {
                for (int k = 0; k < job.size(); k++) {
                    program.addHint(model.start(job, k), solver.value(model.start(job, k)));
                    program.addHint(model.end(job, k), solver.value(model.end(job, k)));
                    Map<Integer, Literal> in = model.in(job, k);
                    if (in.size() > 1) {
                        in.values().forEach(literal -> program.addHint(literal, solver.booleanValue(literal)));
                    }
                }
            }
        }

        private LinearExpr sum(Aim aim) {
            return switch (aim) {
                case LATENESS -> lateness();
                case MAKESPAN -> makespan();
                case COST -> cost();
                case NIGHT_MOVES -> throw new IllegalArgumentException("nights are not linear");
            };
        }

        private LinearExpr lateness() {
            List<LinearArgument> late = new ArrayList<>();
            List<Long> weights = new ArrayList<>();
            for (Job job : jobs) {
                for (Job.Due due : job.dues()) {
                    IntVar own = model.model().newIntVar(0, Long.MAX_VALUE / 1_000_000_000_000L, job.name() + " late");
                    model.model()
                            .addGreaterOrEqual(
                                    own,
                                    LinearExpr.newBuilder()
                                            .add(model.out(job))
                                            .add(-(due.moment() / tick))
                                            .build());
                    late.add(own);
                    weights.add((long) Math.floor(due.weight() * WEIGHT));
                }
            }
            return LinearExpr.weightedSum(
                    late.toArray(LinearArgument[]::new),
                    weights.stream().mapToLong(Long::longValue).toArray());
        }

        private LinearExpr makespan() {
            IntVar last = model.model().newIntVar(0, Long.MAX_VALUE / 1_000_000_000_000L, "last");
            jobs.forEach(job -> model.model().addGreaterOrEqual(last, model.out(job)));
            return LinearExpr.newBuilder().add(last).build();
        }

        private LinearExpr cost() {
            var sum = LinearExpr.newBuilder();
            for (Job job : jobs) {
                List<Double> rates = job.tariff().perSecond();
                for (int i = 0; i < rates.size(); i++) {
                    long rate = Math.round(rates.get(i) * tick * CENT * WEIGHT);
                    int k = i / 2;
                    if (i % 2 == 0) {
                        sum.addTerm(model.end(job, k), rate).addTerm(model.start(job, k), -rate);
                    } else {
                        sum.addTerm(model.start(job, k + 1), rate).addTerm(model.end(job, k), -rate);
                    }
                }
            }
            return sum.build();
        }
    }

    private static CpSolver solver(double work, int workers) {
        CpSolver solver = new CpSolver();
        // Workers take turns in a fixed order, so that the answer does not depend on which was quicker.
        solver.getParameters()
                .setInterleaveSearch(workers > 1)
                .setNumWorkers(workers)
                .setRandomSeed(1)
                .setMaxDeterministicTime(work);
        return solver;
    }
}
