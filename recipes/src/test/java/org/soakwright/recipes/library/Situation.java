package org.soakwright.recipes.library;

import java.util.ArrayList;
import java.util.EnumSet;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import org.soakwright.recipes.model.Product;
import org.soakwright.recipes.model.Reading;

/** Facts put together for a test. Each method adds one and returns the same situation. */
final class Situation implements Facts {
    private final Set<Product> products = EnumSet.noneOf(Product.class);
    private final List<Stay> steps = new ArrayList<>();
    private final Set<String> species = new HashSet<>();
    private final Set<String> names = new HashSet<>();
    private final Map<String, Double> liquors = new HashMap<>();
    private final Map<String, List<Double>> pieces = new HashMap<>();
    private final Map<String, List<Double>> waterPhases = new HashMap<>();
    private OptionalDouble vessel = OptionalDouble.empty();
    private Optional<String> allowedBy = Optional.empty();

    static Situation of(Product... kinds) {
        Situation situation = new Situation();
        situation.products.addAll(List.of(kinds));
        return situation;
    }

    Situation step(StepKind kind, double celsius, double hours) {
        steps.add(new Stay(kind, OptionalDouble.of(celsius + 273.15), hours * 3600));
        return this;
    }

    Situation stepOfUnknownTemperature(StepKind kind, double hours) {
        steps.add(new Stay(kind, OptionalDouble.empty(), hours * 3600));
        return this;
    }

    Situation species(String name) {
        species.add(name);
        return this;
    }

    Situation called(String name) {
        names.add(name);
        return this;
    }

    Situation liquor(String name, double kgPerM3) {
        species.add(name);
        liquors.put(name, kgPerM3);
        return this;
    }

    Situation vessel(double litres) {
        vessel = OptionalDouble.of(litres * 1e-3);
        return this;
    }

    Situation piece(String name, Reading reading, Double... kgPerKg) {
        species.add(name);
        pieces.put(name + reading, List.of(kgPerKg));
        return this;
    }

    Situation waterPhase(String name, Reading reading, Double... kgPerKg) {
        species.add(name);
        waterPhases.put(name + reading, List.of(kgPerKg));
        return this;
    }

    Situation allowedBy(String plan) {
        allowedBy = Optional.of(plan);
        return this;
    }

    @Override
    public Set<Product> products() {
        return products;
    }

    @Override
    public List<Stay> steps() {
        return steps;
    }

    @Override
    public Set<String> species() {
        return species;
    }

    @Override
    public Set<String> names() {
        return names;
    }

    @Override
    public OptionalDouble liquor(String name) {
        Double content = liquors.get(name);
        return content == null ? OptionalDouble.empty() : OptionalDouble.of(content);
    }

    @Override
    public OptionalDouble vessel() {
        return vessel;
    }

    @Override
    public List<Double> piece(String name, Reading reading) {
        return pieces.getOrDefault(name + reading, List.of());
    }

    @Override
    public List<Double> waterPhase(String name, Reading reading) {
        return waterPhases.getOrDefault(name + reading, List.of());
    }

    @Override
    public Optional<String> allowedBy() {
        return allowedBy;
    }
}
