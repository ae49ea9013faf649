package org.soakwright.planner.cli;

import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.AtomicMoveNotSupportedException;
import java.nio.file.Files;
import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.nio.file.StandardOpenOption;
import java.util.regex.Pattern;

/**
 * The file that {@code --json} names. It is written aside and moved into place, so that it is whole or not there; of what exists already
 * only an empty file and an earlier result are replaced.
 */
final class JsonTarget {
    /** Standard output. */
    static final String STANDARD_OUTPUT = "-";

    private static final Pattern RESULT = Pattern.compile("\\s*\\{\\s*\"soakwright\"\\s*:.*", Pattern.DOTALL);
    private static final int ENOUGH_TO_TELL = 64;

    private final String given;
    private final Path path;

    private JsonTarget(String given, Path path) {
        this.given = given;
        this.path = path;
    }

    /**
     * Looks before any work is done.
     *
     * @throws Refusal where it cannot or must not be written
     */
    static JsonTarget of(String given) throws Refusal {
        Path path;
        try {
            path = Path.of(given);
        } catch (InvalidPathException e) {
            throw refuse(given, "is no file name", e);
        }
        if (given.isBlank() || Files.isDirectory(path)) {
            throw refuse(given, "is a folder; name a file in it, such as result.json", null);
        }
        if (!Files.isDirectory(folder(path))) {
            throw refuse(given, "lies in a folder that does not exist; create it first", null);
        }
        if (Files.isRegularFile(path)) {
            if (!Files.isWritable(path)) {
                throw refuse(given, "is write-protected; name another file", null);
            }
            if (!isReplaceable(path)) {
                throw refuse(given, "exists and is no result of soakwright, so it is kept; name another file", null);
            }
        }
        return new JsonTarget(given, path);
    }

    private static boolean isReplaceable(Path path) {
        try (InputStream in = Files.newInputStream(path)) {
            byte[] begin = in.readNBytes(ENOUGH_TO_TELL);
            return begin.length == 0
                    || RESULT.matcher(new String(begin, StandardCharsets.UTF_8)).matches();
        } catch (IOException e) {
            return false;
        }
    }

    private static Path folder(Path path) {
        Path parent = path.toAbsolutePath().getParent();
        return parent == null ? path.toAbsolutePath() : parent;
    }

    private static Refusal refuse(String given, String why, @org.jspecify.annotations.Nullable Throwable cause) {
        String message = "--json " + given + " " + why;
        return cause == null ? new Refusal(Exit.BAD_INPUT, message) : new Refusal(Exit.BAD_INPUT, message, cause);
    }

    String name() {
        return given;
    }

    void write(String text) throws Refusal {
        try {
            if (Files.exists(path) && !Files.isRegularFile(path)) {
                // A device or a pipe: nothing to move into its place.
                Files.writeString(path, text, StandardOpenOption.WRITE);
            } else {
                // A link stays a link: what it points at is replaced.
                replace(Files.exists(path) ? path.toRealPath() : path.toAbsolutePath(), text);
            }
        } catch (IOException e) {
            throw new Refusal(
                    Exit.FAILED,
                    "--json " + given + " could not be written (" + Refusal.reason(e)
                            + "); nothing was written, make room or" + " name another file",
                    e);
        }
    }

    private static void replace(Path target, String text) throws IOException {
        Path aside = target.resolveSibling(
                "." + target.getFileName() + "." + ProcessHandle.current().pid() + ".part");
        try {
            Files.writeString(
                    aside,
                    text,
                    StandardOpenOption.CREATE,
                    StandardOpenOption.TRUNCATE_EXISTING,
                    StandardOpenOption.WRITE);
            try {
                Files.move(aside, target, StandardCopyOption.ATOMIC_MOVE);
            } catch (AtomicMoveNotSupportedException e) {
                Files.move(aside, target, StandardCopyOption.REPLACE_EXISTING);
            }
        } finally {
            Files.deleteIfExists(aside);
        }
    }
}
