package org.soakwright.solver.finitevolume;

import java.util.List;

/** One kind of body within one phase: its waves are products, their rates sums, and all it gives the bath goes through them. */
final class Share {
    final Tensor rate;
    /** What a uniform content of 1 holds of each wave. */
    final Tensor uniform;
    /** What the bodies hold of each wave, departures from rest. */
    final Tensor held;
    /** Partition times volume, m3. */
    final double capacity;
    /** Of the capacity, what is at the surface and so part of the bath; 0 behind a film. */
    final double bathCapacity;
    /** What is there, departure times volume. */
    final double bathContent;

    private final List<Waves> axes;
    private final boolean open;

    Share(List<Waves> axes, List<Double> paces, double capacity, Tensor contents) {
        this.axes = axes;
        this.capacity = capacity;
        List<double[]> rates = new java.util.ArrayList<>();
        for (int i = 0; i < axes.size(); i++) {
            double pace = paces.get(i);
            rates.add(
                    java.util.Arrays.stream(axes.get(i).rate).map(r -> pace * r).toArray());
        }
        rate = Tensor.outer(rates, Double::sum);
        uniform = Tensor.outer(axes.stream().map(a -> a.uniform).toList(), (a, b) -> a * b);
        held = contents.times(axes.stream().map(a -> a.part).toList());
        open = axes.stream().anyMatch(a -> a.open);
        bathCapacity = open ? capacity * (1 - uniform.dot(uniform)) : 0;
        bathContent = open ? capacity * (mean(axes, contents) - uniform.dot(held)) : 0;
    }

    static double mean(List<Waves> axes, Tensor contents) {
        return Tensor.outer(axes.stream().map(a -> a.share).toList(), (a, b) -> a * b)
                .dot(contents);
    }

    /** Contents at the nodes, from what is held of each wave and the bath's departure. */
    Tensor contents(double[] after, double bath) {
        double[] inside = after.clone();
        double shift = open ? bath : 0;
        for (int n = 0; n < inside.length; n++) {
            inside[n] -= shift * uniform.value[n];
        }
        Tensor nodes = new Tensor(rate.size, inside)
                .times(axes.stream().map(a -> a.wave).toList());
        for (int i = 0; i < nodes.value.length; i++) {
            nodes.value[i] += shift;
        }
        return nodes;
    }
}
