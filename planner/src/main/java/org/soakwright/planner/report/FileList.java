package org.soakwright.planner.report;

import java.io.FilterOutputStream;
import java.io.IOException;
import java.io.InputStream;
import java.io.OutputStream;
import java.nio.file.Files;
import java.nio.file.LinkOption;
import java.nio.file.Path;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.ArrayList;
import java.util.HexFormat;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeMap;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * The list of a report's files and what they held when they were written, by which a later report knows what is its own. In the form that
 * {@code sha256sum --check} reads.
 *
 * @param hashes SHA-256 of each file by its name; while a report is being replaced, one of the old and one of the new
 */
record FileList(Map<String, Set<String>> hashes) {
    static final String NAME = "files.sha256";

    private static final String FIRST =
            "# Written by soakwright. A later report replaces these files as long as they are unchanged.";
    private static final Pattern LINE = Pattern.compile("([0-9a-f]{64})  (.+)");

    /** The list in a folder; empty where there is none, or one that is not ours. */
    static FileList in(Path folder) throws IOException {
        Map<String, Set<String>> hashes = new TreeMap<>();
        Path file = folder.resolve(NAME);
        if (Files.isRegularFile(file, LinkOption.NOFOLLOW_LINKS)) {
            List<String> lines;
            try {
                lines = Files.readAllLines(file);
            } catch (java.nio.charset.CharacterCodingException e) {
                return new FileList(hashes);
            }
            if (!lines.isEmpty() && lines.get(0).equals(FIRST)) {
                for (String line : lines) {
                    Matcher matcher = LINE.matcher(line);
                    if (matcher.matches()) {
                        hashes.computeIfAbsent(matcher.group(2), key -> new LinkedHashSet<>())
                                .add(matcher.group(1));
                    }
                }
            }
        }
        return new FileList(hashes);
    }

    void write(Path folder) throws IOException {
        List<String> lines = new ArrayList<>(List.of(FIRST));
        hashes.forEach((name, all) -> all.forEach(hash -> lines.add(hash + "  " + name)));
        Files.writeString(folder.resolve(NAME), String.join("\n", lines) + "\n");
    }

    FileList and(FileList other) {
        Map<String, Set<String>> all = new TreeMap<>();
        for (FileList list : List.of(this, other)) {
            list.hashes.forEach((name, some) ->
                    all.computeIfAbsent(name, key -> new LinkedHashSet<>()).addAll(some));
        }
        return new FileList(all);
    }

    /** All files, this list with them. */
    List<String> names() {
        List<String> names = new ArrayList<>(hashes.keySet());
        names.add(NAME);
        return names;
    }

    boolean has(String name) {
        return hashes.containsKey(name) || (name.equals(NAME) && !hashes.isEmpty());
    }

    boolean hasFolder(String name) {
        return hashes.keySet().stream().anyMatch(file -> file.startsWith(name + "/"));
    }

    /** Whether a file is one of these and holds what was written. */
    boolean isOurs(String name, Path file) throws IOException {
        if (!has(name) || !Files.isRegularFile(file, LinkOption.NOFOLLOW_LINKS)) {
            return false;
        }
        if (name.equals(NAME)) {
            return true;
        }
        MessageDigest digest = sha256();
        try (InputStream in = Files.newInputStream(file)) {
            in.transferTo(new java.security.DigestOutputStream(OutputStream.nullOutputStream(), digest));
        }
        Set<String> known = hashes.get(name);
        return known != null && known.contains(HexFormat.of().formatHex(digest.digest()));
    }

    private static MessageDigest sha256() {
        try {
            return MessageDigest.getInstance("SHA-256");
        } catch (NoSuchAlgorithmException e) {
            throw new IllegalStateException("every Java has SHA-256", e);
        }
    }

    /** Takes the hash of what passes through it. */
    static final class Hashing extends FilterOutputStream {
        private final MessageDigest digest = sha256();

        Hashing(OutputStream out) {
            super(out);
        }

        @Override
        public void write(int b) throws IOException {
            out.write(b);
            digest.update((byte) b);
        }

        @Override
        public void write(byte[] bytes, int offset, int length) throws IOException {
            out.write(bytes, offset, length);
            digest.update(bytes, offset, length);
        }

        String hash() {
            return HexFormat.of().formatHex(digest.digest());
        }
    }
}
