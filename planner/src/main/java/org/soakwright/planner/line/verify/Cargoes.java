package org.soakwright.planner.line.verify;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.Set;
import java.util.stream.Collectors;
import org.soakwright.recipes.model.Step;
import org.soakwright.recipes.model.line.Line;
import org.soakwright.recipes.model.line.Order;
import org.soakwright.recipes.text.Shown;

/** Whether every order is made, whole and by its own recipe; and what goes through the line together. */
final class Cargoes {
    /** What sums of parts may be off by: rounding. */
    private static final double ROUNDING = 1e-9;

    private static final double TOO_MUCH = 10;

    private final Line line;
    private final Result result;
    private final Faults faults;
    private final Map<String, Order> known = new LinkedHashMap<>();

    Cargoes(Line line, Result result, Faults faults) {
        this.line = line;
        this.result = result;
        this.faults = faults;
        line.orders().forEach(order -> known.put(order.lot(), order));
    }

    /** Those that follow their recipe step by step; of others it is told what is wrong. */
    List<Cargo> all() {
        Map<String, List<Result.Entry>> byLoad = new LinkedHashMap<>();
        Map<String, List<Result.Entry>> byLot = new LinkedHashMap<>();
        for (Result.Entry entry : result.lots()) {
            byLot.computeIfAbsent(entry.lot(), name -> new ArrayList<>()).add(entry);
            if (!known.containsKey(entry.lot())) {
                faults.add("Lot " + Shown.quoted(entry.lot()) + " is no lot of the line, one of its "
                        + line.orders().size() + " would be right.");
            } else {
                byLoad.computeIfAbsent(entry.load(), name -> new ArrayList<>()).add(entry);
            }
        }
        line.orders().forEach(order -> made(order, byLot.getOrDefault(order.lot(), List.of())));
        List<Cargo> all = new ArrayList<>();
        byLoad.forEach((name, entries) -> add(all, name, entries));
        return all;
    }

    private void made(Order order, List<Result.Entry> own) {
        if (own.isEmpty()) {
            faults.add(
                    "Lot " + order.lot() + " is not in the result, all its " + order.mass() + " made would be right.");
            return;
        }
        int parts = own.get(0).parts();
        Set<Integer> numbers = new LinkedHashSet<>();
        for (Result.Entry entry : own) {
            if (entry.parts() != parts || entry.part() < 1 || entry.part() > parts || !numbers.add(entry.part())) {
                faults.add("Lot " + order.lot() + " has a part " + entry.part() + " of " + entry.parts()
                        + ", each from 1 to " + parts + " once would be right.");
                return;
            }
        }
        double kg = own.stream().mapToDouble(Result.Entry::kg).sum();
        double wanted = order.mass().si();
        if (own.size() != parts || !(Math.abs(kg - wanted) <= ROUNDING * wanted)) {
            faults.add("Lot " + order.lot() + " is made in " + own.size() + " of " + parts
                    + (parts == 1 ? " part" : " parts") + " with " + kg(kg) + " together, " + kg(wanted)
                    + " would be right.");
        }
        for (Result.Entry entry : own) {
            if (!(entry.kg() > 0)) {
                faults.add(entry.name() + " weighs " + kg(entry.kg()) + ", more than nothing would be right.");
            }
            if (!entry.recipe().equals(order.recipeFile())) {
                faults.add(entry.name() + " follows " + Shown.quoted(entry.recipe()) + ", " + order.recipeFile()
                        + " would be right.");
            }
        }
    }

    private static String kg(double kg) {
        return Faults.number(kg) + " kg";
    }

    private void add(List<Cargo> all, String name, List<Result.Entry> entries) {
        List<Order> orders = entries.stream()
                .map(entry -> Objects.requireNonNull(known.get(entry.lot())))
                .toList();
        Result.Entry first = entries.get(0);
        boolean alike = true;
        for (int i = 1; i < entries.size(); i++) {
            Result.Entry entry = entries.get(i);
            if (!orders.get(i).recipeFile().equals(orders.get(0).recipeFile())) {
                faults.add(entry.name() + " of " + orders.get(i).recipeFile() + " shares a load with " + first.name()
                        + " of " + orders.get(0).recipeFile() + ", one recipe a load would be right.");
                alike = false;
            }
            if (!entry.steps().equals(first.steps())
                    || !entry.targets().equals(first.targets())
                    || entry.done() != first.done()
                    || entry.loaded() != first.loaded()) {
                faults.add(entry.name() + " has other times or targets than " + first.name()
                        + " in the same load, the same would be right.");
                alike = false;
            }
        }
        for (int i = 0; i < entries.size(); i++) {
            if (orders.get(i).alone() && entries.size() > 1) {
                faults.add(entries.get(i).name() + " goes together with others as " + name + ", alone would be right.");
            }
        }
        double kg = entries.stream().mapToDouble(Result.Entry::kg).sum();
        List<Cargo.Part> parts = parts(name, orders.get(0), first.steps());
        // Of what weighs much more than was ordered it is told already.
        double most = TOO_MUCH
                * orders.stream().mapToDouble(order -> order.mass().si()).sum();
        if (alike && kg > 0 && kg <= most && !parts.isEmpty()) {
            all.add(new Cargo(
                    name,
                    List.copyOf(entries),
                    orders,
                    Unrolled.weighing(orders.get(0).recipe(), kg),
                    kg,
                    parts));
        }
    }

    /** Empty where they are others than the recipe's. */
    private List<Cargo.Part> parts(String load, Order order, List<Result.Stint> stints) {
        List<Cargo.Part> parts = new ArrayList<>();
        List<Step> steps = order.recipe().steps();
        boolean same = true;
        for (int i = 0; i < steps.size(); i++) {
            for (int fill = 0; fill < steps.get(i).fills(); fill++) {
                int k = parts.size();
                if (k >= stints.size()) {
                    same = false;
                    break;
                }
                Result.Stint stint = stints.get(k);
                same &= stint.name().equals(steps.get(i).name())
                        && stint.kind().equals(steps.get(i).kind())
                        && stint.fill() == fill + 1;
                parts.add(new Cargo.Part(steps.get(i), i, fill, stint));
            }
        }
        if (same && parts.size() == stints.size()) {
            return parts;
        }
        faults.add(load + " goes through "
                + (stints.isEmpty()
                        ? "nothing"
                        : stints.stream().map(Cargoes::told).collect(Collectors.joining(", ")))
                + "; "
                + steps.stream()
                        .map(step -> step.kind() + " " + step.name()
                                + (step.fills() == 1 ? "" : " in fills 1 to " + step.fills()))
                        .collect(Collectors.joining(", "))
                + " would be right.");
        return List.of();
    }

    private static String told(Result.Stint stint) {
        return stint.kind() + " " + stint.name() + (stint.fill() == 1 ? "" : ", fill " + stint.fill());
    }
}
