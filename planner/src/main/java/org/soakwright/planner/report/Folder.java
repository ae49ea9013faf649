package org.soakwright.planner.report;

import java.io.BufferedOutputStream;
import java.io.IOException;
import java.io.OutputStream;
import java.io.Serial;
import java.nio.charset.StandardCharsets;
import java.nio.file.AtomicMoveNotSupportedException;
import java.nio.file.Files;
import java.nio.file.InvalidPathException;
import java.nio.file.LinkOption;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.util.ArrayList;
import java.util.Collections;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.Set;
import java.util.stream.Stream;
import org.jspecify.annotations.Nullable;

/**
 * The folder that a report goes into. It does not exist, or is empty, or holds an earlier report, known by its list of files: that one is
 * replaced. Whatever else it holds is kept, and stands in the way. Everything is written aside first; only when all of it has been
 * written is it moved into place, so that a run that fails changes nothing.
 */
public final class Folder {
    private static final String PART = ".soakwright.part";

    private final Path path;

    private Folder(Path path) {
        this.path = path;
    }

    /** What fills one file. */
    public interface Body {
        /** Writes all of it and leaves the stream open. */
        void writeTo(OutputStream out) throws IOException;
    }

    /**
     * One file of a report.
     *
     * @param path inside the folder, parts parted by {@code /}
     */
    public record Entry(String path, Body body) {
        public Entry {
            if (path.isEmpty() || path.startsWith("/") || path.contains("..") || path.contains("\\")) {
                throw new IllegalArgumentException("no path inside a folder: " + path);
            }
        }

        public static Entry of(String path, String text) {
            return new Entry(path, out -> out.write(text.getBytes(StandardCharsets.UTF_8)));
        }
    }

    /** A folder that must not or cannot be written into; the message says why and what to do, as the end of a sentence. */
    public static final class Unusable extends Exception {
        @Serial
        private static final long serialVersionUID = 1L;

        Unusable(String why, @Nullable Throwable cause) {
            super(why, cause);
        }
    }

    /**
     * Looks before any work is done.
     *
     * @throws Unusable where it is no folder, is write-protected or holds something else
     */
    public static Folder at(String given) throws Unusable {
        Path path;
        try {
            path = Path.of(given);
        } catch (InvalidPathException e) {
            throw new Unusable("is no folder name", e);
        }
        if (given.isBlank()) {
            throw new Unusable("is no folder name", null);
        }
        try {
            Folder folder = new Folder(Files.exists(path) ? path.toRealPath() : path.toAbsolutePath());
            folder.check(given);
            return folder;
        } catch (IOException e) {
            throw new Unusable("cannot be looked into; check its permissions or name another folder", e);
        }
    }

    private void check(String given) throws IOException, Unusable {
        if (!Files.exists(path, LinkOption.NOFOLLOW_LINKS)) {
            checkAbove(given);
            return;
        }
        if (!Files.isDirectory(path)) {
            throw new Unusable("is a file; name a folder", null);
        }
        if (!Files.isWritable(path)) {
            throw new Unusable("is write-protected; name another folder", null);
        }
        checkContent();
    }

    private void checkAbove(String given) throws Unusable {
        Path above = path.getParent();
        while (above != null && !Files.exists(above)) {
            above = above.getParent();
        }
        if (above == null || !Files.isDirectory(above)) {
            throw new Unusable(
                    "would lie in " + (above == null ? given : above.getFileName()) + ", which is a file; name another",
                    null);
        }
        if (!Files.isWritable(above)) {
            throw new Unusable(
                    "would lie in a folder that is write-protected (" + above.getFileName()
                            + "); name a folder elsewhere",
                    null);
        }
    }

    private void checkContent() throws IOException, Unusable {
        FileList ours = FileList.in(path);
        // At its own level first: whatever else lies here, it is not walked through.
        try (Stream<Path> top = Files.list(path)) {
            for (Path file : top.sorted().toList()) {
                String name = name(file);
                boolean folder = Files.isDirectory(file, LinkOption.NOFOLLOW_LINKS);
                if (!isPart(name) && !(folder ? ours.hasFolder(name) : ours.has(name))) {
                    throw foreign(name, folder ? "folder" : "file");
                }
            }
        }
        for (Path file : content()) {
            String name = name(file);
            if (Files.isDirectory(file, LinkOption.NOFOLLOW_LINKS)) {
                if (!ours.hasFolder(name)) {
                    throw foreign(name, "folder");
                }
            } else if (!ours.isOurs(name, file)) {
                throw ours.has(name)
                        ? new Unusable(
                                "holds " + name
                                        + ", which was changed since it was written, so it is kept; move it away or"
                                        + " name another folder",
                                null)
                        : foreign(name, "file");
            }
        }
    }

    private static Unusable foreign(String name, String what) {
        return new Unusable(
                "holds the " + what + " " + name + ", which is no part of a report, so it is kept; name a new or empty"
                        + " folder",
                null);
    }

    /** Everything below the folder but what a run that was killed left half-written. */
    private List<Path> content() throws IOException {
        try (Stream<Path> files = Files.walk(path)) {
            return files.filter(file -> !file.equals(path) && !isPart(name(file)))
                    .sorted()
                    .toList();
        }
    }

    private static boolean isPart(String name) {
        return name.equals(PART) || name.startsWith(PART + "/");
    }

    private String name(Path file) {
        return path.relativize(file).toString().replace('\\', '/');
    }

    /**
     * Writes a report.
     *
     * @return the names of all files in it
     * @throws Unusable where something else has come to lie in it since
     * @throws IOException where something cannot be written; then nothing has changed
     */
    public List<String> write(List<Entry> entries) throws IOException, Unusable {
        boolean exists = Files.exists(path, LinkOption.NOFOLLOW_LINKS);
        if (exists) {
            checkContent();
        }
        Path parent = Objects.requireNonNull(path.getParent());
        Path missing = firstMissing();
        Path aside = exists
                ? path.resolve(PART)
                : parent.resolve(
                        "." + path.getFileName() + "." + ProcessHandle.current().pid() + PART);
        try {
            Files.createDirectories(parent);
            deleteAll(aside);
            FileList list = stage(aside, entries);
            if (exists) {
                moveInto(aside, list);
            } else {
                move(aside, path);
            }
            deleteAll(aside);
            return list.names();
        } catch (IOException | RuntimeException | Error failure) {
            tidy(aside, exists ? path : missing, failure);
            throw failure;
        }
    }

    private void tidy(Path aside, Path missing, Throwable failure) {
        try {
            deleteAll(aside);
            for (Path folder = path.getParent();
                    folder != null && folder.startsWith(missing);
                    folder = folder.getParent()) {
                Files.deleteIfExists(folder);
            }
        } catch (IOException | RuntimeException second) {
            failure.addSuppressed(second);
        }
    }

    private Path firstMissing() {
        Path missing = path;
        Path above = path.getParent();
        while (above != null && !Files.exists(above)) {
            missing = above;
            above = above.getParent();
        }
        return missing;
    }

    private static FileList stage(Path aside, List<Entry> entries) throws IOException {
        Map<String, Set<String>> hashes = new LinkedHashMap<>();
        for (Entry entry : entries) {
            Path file = aside.resolve(entry.path());
            Files.createDirectories(Objects.requireNonNull(file.getParent()));
            FileList.Hashing hashing = new FileList.Hashing(Files.newOutputStream(file));
            try (OutputStream out = new BufferedOutputStream(hashing)) {
                entry.body().writeTo(out);
            }
            if (hashes.put(entry.path(), Set.of(hashing.hash())) != null) {
                throw new IllegalArgumentException("twice: " + entry.path());
            }
        }
        FileList list = new FileList(hashes);
        list.write(aside);
        return list;
    }

    /** While files are moved, the list knows old and new ones, so that a run killed half-way leaves nothing foreign. */
    private void moveInto(Path aside, FileList list) throws IOException {
        FileList before = FileList.in(path);
        Path both = aside.resolve("both");
        Files.createDirectory(both);
        list.and(before).write(both);
        move(both.resolve(FileList.NAME), path.resolve(FileList.NAME));
        for (String name : list.names()) {
            if (!name.equals(FileList.NAME)) {
                Path target = path.resolve(name);
                Files.createDirectories(Objects.requireNonNull(target.getParent()));
                move(aside.resolve(name), target);
            }
        }
        List<Path> obsolete = new ArrayList<>(content());
        Collections.reverse(obsolete);
        for (Path file : obsolete) {
            boolean wanted = Files.isDirectory(file) ? list.hasFolder(name(file)) : list.has(name(file));
            if (!wanted) {
                Files.deleteIfExists(file);
            }
        }
        move(aside.resolve(FileList.NAME), path.resolve(FileList.NAME));
    }

    private static void move(Path from, Path to) throws IOException {
        try {
            Files.move(from, to, StandardCopyOption.ATOMIC_MOVE);
        } catch (AtomicMoveNotSupportedException e) {
            Files.move(from, to, StandardCopyOption.REPLACE_EXISTING);
        }
    }

    private static void deleteAll(Path root) throws IOException {
        if (!Files.exists(root, LinkOption.NOFOLLOW_LINKS)) {
            return;
        }
        List<Path> deepestFirst;
        try (Stream<Path> files = Files.walk(root)) {
            deepestFirst = files.sorted(Comparator.reverseOrder()).toList();
        }
        for (Path file : deepestFirst) {
            Files.deleteIfExists(file);
        }
    }
}
