package org.soakwright.planner.report.picture;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import org.soakwright.planner.batch.Batch;
import org.soakwright.planner.batch.Planner;
import org.soakwright.planner.batch.Run;
import org.soakwright.planner.batch.Trace;
import org.soakwright.recipes.Outcome;
import org.soakwright.recipes.Recipes;
import org.soakwright.recipes.model.Recipe;

/** The batches whose pictures are looked at: every example as planned, and one with much in it as written. */
final class Batches {
    static final List<String> EXAMPLES = List.of("loin-desalting", "bead-washing", "cord-brining");

    /** Times of the crowded recipe, s. */
    private static final double[] CROWDED = {6 * 3600, 240, 2 * 3600, 1800, 300, 14 * 3600, 20 * 3600};

    private static final Map<String, List<Picture>> DRAWN = new LinkedHashMap<>();

    private Batches() {}

    /** All of them by name. */
    static synchronized Map<String, List<Picture>> all() {
        if (DRAWN.isEmpty()) {
            EXAMPLES.forEach(name -> DRAWN.put(name, Pictures.of(Planner.plan(example(name), (what, share) -> {}))));
            DRAWN.put("crowded", Pictures.of(crowded()));
        }
        return DRAWN;
    }

    static Recipe example(String name) {
        Path top = Path.of("").toAbsolutePath();
        while (!Files.isDirectory(top.resolve("recipes/examples"))) {
            top = Objects.requireNonNull(top.getParent());
        }
        try {
            return read(name, Files.readString(top.resolve("recipes/examples").resolve(name + ".yaml")));
        } catch (IOException failure) {
            throw new UncheckedIOException(failure);
        }
    }

    static Run crowded() {
        try (InputStream stream = Objects.requireNonNull(Batches.class.getResourceAsStream("crowded.yaml"))) {
            return new Batch(read("crowded", new String(stream.readAllBytes(), StandardCharsets.UTF_8)))
                    .follow(CROWDED);
        } catch (IOException failure) {
            throw new UncheckedIOException(failure);
        }
    }

    static History history(Run run) {
        return new History(Trace.of(run, Pictures.LAYERS));
    }

    static Recipe read(String name, String text) {
        Outcome outcome = Recipes.read(name, text);
        if (outcome instanceof Outcome.Refused refused) {
            throw new AssertionError(refused.problems());
        }
        return ((Outcome.Accepted) outcome).recipe();
    }
}
