package org.soakwright.planner.line.shop;

/** What a schedule is to have least of. */
public enum Aim {
    /** Lateness times weight, s. */
    LATENESS {
        @Override
        public double of(Schedule schedule) {
            return schedule.lateness();
        }
    },
    /** When the last job is out, s. */
    MAKESPAN {
        @Override
        public double of(Schedule schedule) {
            return schedule.makespan();
        }
    },
    /** Money. */
    COST {
        @Override
        public double of(Schedule schedule) {
            return schedule.jobs().stream()
                    .mapToDouble(placed -> placed.job().tariff().of(placed.times()))
                    .sum();
        }
    },
    /** Tasks that begin at night. */
    NIGHT_MOVES {
        @Override
        public double of(Schedule schedule) {
            return schedule.atNight();
        }
    };

    public abstract double of(Schedule schedule);
}
