package org.soakwright.planner.cli;

import java.io.ByteArrayOutputStream;
import java.io.File;
import java.io.IOException;
import java.io.InputStream;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Objects;

/** Gives commands as someone at a desk would, in a folder of their own, and keeps what they print. */
final class Desk {
    private final Path folder;

    Desk(Path folder) {
        this.folder = folder;
    }

    /** What one command did; names of files as if given in their own folder. */
    record Printed(int status, String out, String err) {}

    Printed give(String... args) {
        ByteArrayOutputStream out = new ByteArrayOutputStream();
        ByteArrayOutputStream err = new ByteArrayOutputStream();
        int status = Soakwright.run(args, stream(out), stream(err));
        return new Printed(status, text(out), text(err));
    }

    static PrintStream stream(ByteArrayOutputStream bytes) {
        return new PrintStream(bytes, true, StandardCharsets.UTF_8);
    }

    private String text(ByteArrayOutputStream bytes) {
        return bytes.toString(StandardCharsets.UTF_8).replace(folder + File.separator, "");
    }

    Path path(String name) {
        return folder.resolve(name);
    }

    /** A recipe of the test resources, copied into the folder. */
    String recipe(String name) throws IOException {
        Path copy = path(name);
        try (InputStream in = Desk.class.getResourceAsStream(name)) {
            Files.write(copy, Objects.requireNonNull(in, name).readAllBytes());
        }
        return copy.toString();
    }
}
