package org.soakwright.planner.line.shop;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.soakwright.planner.line.shop.ClassicalShop.Operation;

/** Instances from the literature. */
final class Published {
    private static final long TAILLARDS_MODULUS = 2_147_483_647;

    /** Seeds of the ten flow shops of 20 jobs on 5 machines: Taillard (1993), Table 3. */
    private static final long[] SEEDS = {
        873_654_221, 379_008_056, 1_866_992_158, 216_771_124, 495_070_989,
        402_959_317, 1_369_363_414, 2_021_925_980, 573_109_518, 88_325_120
    };

    private Published() {}

    /** Carlier's eight flow shops by name, a row a job. */
    static Map<String, long[][]> carlier() {
        Map<String, List<long[]>> rows = new LinkedHashMap<>();
        List<long[]> now = new ArrayList<>();
        for (String line : text("carlier-1978.txt").split("\n")) {
            if (line.startsWith("car")) {
                now = new ArrayList<>();
                rows.put(line.strip(), now);
            } else if (!line.startsWith("#") && !line.isBlank()) {
                now.add(Arrays.stream(line.strip().split(" +"))
                        .mapToLong(Long::parseLong)
                        .toArray());
            }
        }
        Map<String, long[][]> shops = new LinkedHashMap<>();
        rows.forEach((name, jobs) -> shops.put(name, jobs.toArray(long[][]::new)));
        return shops;
    }

    /**
     * Flow shops of 20 jobs on 5 machines, made by the generator of E. Taillard (1993), Benchmarks for basic scheduling problems, European Journal
     * of Operational Research 64, 278-285: a linear congruence that fills machine after machine with durations from 1 to 99.
     *
     * @param number from 1 to 10
     */
    static long[][] taillard(int number) {
        long seed = SEEDS[number - 1];
        long[][] minutes = new long[20][5];
        for (int machine = 0; machine < 5; machine++) {
            for (int job = 0; job < 20; job++) {
                seed = 16_807 * seed % TAILLARDS_MODULUS;
                minutes[job][machine] = 1 + (long) Math.floor(seed / (double) TAILLARDS_MODULUS * 99);
            }
        }
        return minutes;
    }

    /**
     * The job shop of six jobs on six machines of H. Fisher and G. L. Thompson (1963), Probabilistic learning combinations of local job-shop
     * scheduling rules, in J. F. Muth and G. L. Thompson (eds), Industrial Scheduling, 225-251; ft06 in the OR-Library, file jobshop1.
     */
    static List<List<Operation>> fisherAndThompson() {
        return jobs(
                "2 1 0 3 1 6 3 7 5 3 4 6",
                "1 8 2 5 4 10 5 10 0 10 3 4",
                "2 5 3 4 5 8 0 9 1 1 4 7",
                "1 5 0 5 2 5 3 3 4 8 5 9",
                "2 9 1 3 4 5 5 4 0 3 3 1",
                "1 3 3 3 5 9 0 10 4 4 2 1");
    }

    /** A text a job: machine and duration by turns. */
    private static List<List<Operation>> jobs(String... rows) {
        List<List<Operation>> jobs = new ArrayList<>();
        for (String row : rows) {
            String[] numbers = row.split(" ");
            List<Operation> job = new ArrayList<>();
            for (int i = 0; i < numbers.length; i += 2) {
                job.add(new Operation(Integer.parseInt(numbers[i]), Long.parseLong(numbers[i + 1])));
            }
            jobs.add(job);
        }
        return jobs;
    }

    private static String text(String name) {
        try (InputStream in = Published.class.getResourceAsStream(name)) {
            if (in == null) {
                throw new IllegalStateException(name + " is missing");
            }
            return new String(in.readAllBytes(), StandardCharsets.UTF_8);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }
}
