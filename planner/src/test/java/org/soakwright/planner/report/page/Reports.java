package org.soakwright.planner.report.page;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.LocalDateTime;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.Optional;
import org.soakwright.planner.batch.Batch;
import org.soakwright.planner.batch.Planner;
import org.soakwright.planner.batch.Progress;
import org.soakwright.planner.batch.Run;
import org.soakwright.planner.batch.StepTimes;
import org.soakwright.planner.cli.Soakwright;
import org.soakwright.planner.report.Folder;
import org.soakwright.planner.report.Stamp;
import org.soakwright.recipes.Outcome;
import org.soakwright.recipes.model.Recipe;

/** Reports of recipes that tests have, in memory: the bytes of each file by its name. */
final class Reports {
    static final Stamp STAMP = new Stamp("0.1.0", "00ff".repeat(16));
    static final Optional<LocalDateTime> MONDAY = Optional.of(LocalDateTime.of(2026, 3, 2, 6, 0));

    private Reports() {}

    /** A recipe beside the tests of the command line. */
    static Recipe recipe(String name) throws IOException {
        try (InputStream in = Soakwright.class.getResourceAsStream(name)) {
            String text = new String(Objects.requireNonNull(in, name).readAllBytes(), StandardCharsets.UTF_8);
            return accepted(name, text);
        }
    }

    /** One of the examples. */
    static Recipe example(String name) throws IOException {
        return accepted(name, Files.readString(Path.of("../recipes/examples").resolve(name)));
    }

    private static Recipe accepted(String name, String text) {
        Outcome outcome = org.soakwright.recipes.Recipes.read(name, text);
        if (outcome instanceof Outcome.Refused refused) {
            throw new AssertionError(refused.problems());
        }
        return ((Outcome.Accepted) outcome).recipe();
    }

    static Run follow(Recipe recipe) {
        return new Batch(recipe).follow(StepTimes.definite(recipe));
    }

    static Map<String, byte[]> followed(Recipe recipe) throws IOException {
        return written(Report.of(follow(recipe), STAMP, Optional.empty()));
    }

    static Map<String, byte[]> planned(Recipe recipe) throws IOException {
        return written(Report.of(Planner.plan(recipe, Progress.NONE), STAMP, MONDAY));
    }

    static Map<String, byte[]> written(List<Folder.Entry> entries) throws IOException {
        Map<String, byte[]> files = new LinkedHashMap<>();
        for (Folder.Entry entry : entries) {
            ByteArrayOutputStream bytes = new ByteArrayOutputStream();
            entry.body().writeTo(bytes);
            files.put(entry.path(), bytes.toByteArray());
        }
        return files;
    }

    static String text(Map<String, byte[]> files, String name) {
        return new String(Objects.requireNonNull(files.get(name), name), StandardCharsets.UTF_8);
    }
}
