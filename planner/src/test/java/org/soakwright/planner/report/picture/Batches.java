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
import org.soakwright.planner.batch.Progress;
import org.soakwright.planner.batch.Run;
import org.soakwright.planner.batch.StepTimes;
import org.soakwright.planner.batch.Trace;
import org.soakwright.recipes.Outcome;
import org.soakwright.recipes.Recipes;
import org.soakwright.recipes.model.Recipe;

/** The batches whose pictures are looked at: every example, and two with much in them as written. */
final class Batches {
    private static final double HOUR = 3600;

    static final List<String> EXAMPLES = List.of("loin-desalting", "bead-washing", "cord-brining");

    /** Times near those planned of examples that take long to plan, s. */
    private static final Map<String, double[]> FOLLOWED = Map.of(
            "wheel-brining", new double[] {21 * HOUR, 1764 * HOUR},
            "brick-desalination", new double[] {96 * HOUR, 216 * HOUR, 504 * HOUR});

    /** Times of the crowded recipe, s. */
    private static final double[] CROWDED = {6 * HOUR, 240, 2 * HOUR, 1800, 300, 14 * HOUR, 20 * HOUR};

    private static final Map<String, List<Picture>> DRAWN = new LinkedHashMap<>();

    private Batches() {}

    /** All of them by name. */
    static synchronized Map<String, List<Picture>> all() {
        if (DRAWN.isEmpty()) {
            EXAMPLES.forEach(name -> DRAWN.put(name, Pictures.of(Planner.plan(example(name), (what, share) -> {}))));
            FOLLOWED.keySet().stream().sorted().forEach(name -> DRAWN.put(name, Pictures.of(followed(name))));
            DRAWN.put("crowded", Pictures.of(crowded()));
            DRAWN.put("corners", Pictures.of(corners()));
            DRAWN.put("skinned", Pictures.of(skinned().judged(Progress.NONE)));
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

    /** An example at the times it is followed with here. */
    static Run followed(String name) {
        return new Batch(example(name)).follow(Objects.requireNonNull(FOLLOWED.get(name), name));
    }

    static Run crowded() {
        return new Batch(resource("crowded")).follow(CROWDED);
    }

    /** Pieces of several sides that differ. */
    static Run corners() {
        Recipe recipe = resource("corners");
        return new Batch(recipe).follow(StepTimes.definite(recipe));
    }

    /** Skins on one face, contents counted against what is there, and a value that is not known exactly. */
    static Run skinned() {
        Recipe recipe = resource("skinned");
        return new Batch(recipe).follow(StepTimes.definite(recipe));
    }

    private static Recipe resource(String name) {
        try (InputStream stream = Objects.requireNonNull(Batches.class.getResourceAsStream(name + ".yaml"))) {
            return read(name, new String(stream.readAllBytes(), StandardCharsets.UTF_8));
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
