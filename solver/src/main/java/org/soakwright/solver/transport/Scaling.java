package org.soakwright.solver.transport;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import org.soakwright.solver.Require;

/** How a diffusivity goes with temperature. */
public sealed interface Scaling {
    /** Diffusivity at a temperature in K, m2/s. */
    Quantity at(double temperature);

    /**
     * With temperature over the viscosity of water (Stokes 1851, Einstein 1905), for solutes that move in water; within
     * 10 % from 0 C to 60 C when stated at 25 C (from memory of salts in water). Refused where {@link Water} is.
     *
     * @param diffusivity m2/s; above 0
     * @param statedAt the temperature it is stated for, K
     */
    record StokesEinstein(double diffusivity, double statedAt) implements Scaling {
        private static final double ERROR = 0.10;

        public StokesEinstein {
            Require.positive("diffusivity", diffusivity, "m2/s");
            Water.viscosity(statedAt);
        }

        @Override
        public Quantity at(double temperature) {
            Quantity viscosity = Water.viscosity(temperature);
            double thinner = Water.viscosity(statedAt).value() / viscosity.value();
            double error = temperature == statedAt ? 0 : ERROR;
            return new Quantity(diffusivity * temperature / statedAt * thinner, error, viscosity.cautions());
        }
    }

    /**
     * With exp(-E/RT) (Arrhenius 1889). An activation energy is measured over some tens of kelvins: farther than 30 K
     * from where the diffusivity is stated is cautioned (common practice, from memory).
     *
     * @param diffusivity m2/s; above 0
     * @param statedAt the temperature it is stated for, K; above 0
     * @param activationEnergy J/mol; at least 0
     */
    record Arrhenius(double diffusivity, double statedAt, double activationEnergy) implements Scaling {
        private static final double GAS_CONSTANT = 8.314462618;
        private static final double FAR = 30;

        public Arrhenius {
            Require.positive("diffusivity", diffusivity, "m2/s");
            Require.positive("temperature", statedAt, "K");
            Require.notNegative("activation energy", activationEnergy, "J/mol");
        }

        @Override
        public Quantity at(double temperature) {
            Require.positive("temperature", temperature, "K");
            List<Caution> cautions = new ArrayList<>();
            new Range(
                            "temperature",
                            statedAt - FAR,
                            statedAt + FAR,
                            "K",
                            "an activation energy stated in the middle of it")
                    .note(temperature, cautions);
            double exponent = activationEnergy / GAS_CONSTANT * (1 / statedAt - 1 / temperature);
            return new Quantity(diffusivity * Math.exp(exponent), 0, cautions);
        }
    }

    /**
     * Through measured points, the logarithm straight in 1/T from each to the next; beyond the ends along the outermost
     * pair, with a caution; refused where that leads beyond what anything moves like.
     *
     * @param points at least two, at different temperatures, in any order
     */
    record Measured(List<Point> points) implements Scaling {
        /** Gases move with 1e-5 to 1e-3 m2/s, nothing at all in 1e-30. */
        private static final Range POSSIBLE =
                new Range("diffusivity", 1e-30, 1e-2, "m2/s", "what measured points lead to");

        public Measured {
            points = points.stream()
                    .sorted(Comparator.comparingDouble(Point::temperature))
                    .toList();
            if (points.size() < 2) {
                throw new IllegalArgumentException(
                        "diffusivity needs at least two measured temperatures, found " + points.size());
            }
            for (int i = 1; i < points.size(); i++) {
                double temperature = points.get(i).temperature;
                if (temperature == points.get(i - 1).temperature) {
                    throw new IllegalArgumentException(
                            "measured temperatures must differ, found " + temperature + " K twice");
                }
            }
        }

        @Override
        public Quantity at(double temperature) {
            Require.positive("temperature", temperature, "K");
            double low = points.get(0).temperature;
            double high = points.get(points.size() - 1).temperature;
            List<Caution> cautions = new ArrayList<>();
            new Range("temperature", low, high, "K", "the measured diffusivities").note(temperature, cautions);
            int next = 1;
            while (next < points.size() - 1 && points.get(next).temperature < temperature) {
                next++;
            }
            Point cold = points.get(next - 1);
            Point warm = points.get(next);
            double share = (1 / cold.temperature - 1 / temperature) / (1 / cold.temperature - 1 / warm.temperature);
            double logarithm = (1 - share) * Math.log(cold.diffusivity) + share * Math.log(warm.diffusivity);
            double value = Math.exp(logarithm);
            POSSIBLE.refuse(value);
            return new Quantity(value, 0, cautions);
        }
    }

    /**
     * One measured diffusivity.
     *
     * @param temperature K; above 0
     * @param diffusivity m2/s; above 0
     */
    record Point(double temperature, double diffusivity) {
        public Point {
            Require.positive("temperature", temperature, "K");
            Require.positive("diffusivity", diffusivity, "m2/s");
        }
    }
}
