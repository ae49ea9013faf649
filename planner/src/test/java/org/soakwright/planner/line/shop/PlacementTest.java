package org.soakwright.planner.line.shop;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.SplittableRandom;
import java.util.TimeZone;
import org.junit.jupiter.api.Test;

/** One job put on a floor on which others are. */
class PlacementTest {
    private static final int DRAWS = 300;

    /** No job on such a floor needs to be out later. */
    private static final int HORIZON = 50;

    /** The other jobs of a drawn shop stay where they were put, as if their stations were closed and their people away. */
    @Test
    void aJobOfGivenDurationsIsOutAsEarlyAsAnyWayOfIt() {
        SplittableRandom random = new SplittableRandom(11);
        int compared = 0;
        for (int draw = 0; draw < DRAWS; draw++) {
            TinyShop tiny = TinyShop.drawn(random, false);
            Floor floor = new Floor(tiny.shop());
            Placement placement = new Placement();
            List<Placed> others = new ArrayList<>();
            for (int j = 1; j < tiny.jobs().size(); j++) {
                Placement.Outcome outcome = placement.place(floor, tiny.jobs().get(j), -1);
                if (outcome != null) {
                    floor.put(outcome.placed());
                    others.add(outcome.placed());
                }
            }
            Job job = tiny.jobs().get(0);
            Placement.Outcome found = placement.place(floor, job, -1);
            if (found == null) {
                // It would have to be back in its only station before that is turned around.
                assertEquals((long) HORIZON, Everything.earliest(tiny, job, others, HORIZON), "draw " + draw);
                continue;
            }
            long out = found.placed().finishes(tiny.shop().carriage()) / TinyShop.STEP;
            boolean within =
                    others.stream().allMatch(other -> other.finishes(tiny.shop().carriage()) < HORIZON * TinyShop.STEP);
            if (out < HORIZON && within) {
                assertEquals(out, Everything.earliest(tiny, job, others, HORIZON), "draw " + draw);
                compared++;
            }
        }
        assertTrue(compared > 0.8 * DRAWS);
    }

    @Test
    void whatIsHandedOutIsMetWhenFollowed() {
        SplittableRandom random = new SplittableRandom(12);
        for (int draw = 0; draw < DRAWS; draw++) {
            TinyShop tiny = TinyShop.drawn(random, true);
            Floor floor = new Floor(tiny.shop());
            Placement placement = new Placement();
            for (Job job : tiny.jobs()) {
                Placement.Outcome outcome = placement.place(floor, job, -1);
                if (outcome == null) {
                    continue;
                }
                assertTrue(outcome.met(), "draw " + draw);
                assertTrue(job.physics().read(outcome.placed().times()).met(), "draw " + draw);
                floor.put(outcome.placed());
            }
        }
    }

    @Test
    void theSameShopGivesTheSameScheduleWhereverItIsMade() {
        String here = schedules();
        Locale locale = Locale.getDefault();
        TimeZone zone = TimeZone.getDefault();
        try {
            Locale.setDefault(Locale.forLanguageTag("tr-TR"));
            TimeZone.setDefault(TimeZone.getTimeZone("Pacific/Chatham"));
            assertEquals(here, schedules());
        } finally {
            Locale.setDefault(locale);
            TimeZone.setDefault(zone);
        }
    }

    private static String schedules() {
        SplittableRandom random = new SplittableRandom(13);
        StringBuilder all = new StringBuilder();
        for (int draw = 0; draw < 20; draw++) {
            TinyShop tiny = TinyShop.drawn(random, draw % 2 == 0);
            try {
                Search.Found found =
                        new Search(tiny.shop(), tiny.jobs(), List.of(Aim.LATENESS, Aim.MAKESPAN)).best(400);
                found.schedule().jobs().forEach(placed -> all.append(placed.visits()));
                all.append(found.score()).append('\n');
            } catch (Search.Unplaceable unplaceable) {
                all.append(unplaceable.job().name()).append('\n');
            }
        }
        return all.toString();
    }
}
