package org.soakwright.recipes.text;

import java.io.IOException;
import java.io.InputStream;
import java.nio.ByteBuffer;
import java.nio.CharBuffer;
import java.nio.charset.CharsetDecoder;
import java.nio.charset.CoderResult;
import java.nio.charset.CodingErrorAction;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.HexFormat;

/** The text of a file and the fingerprint of its bytes. */
public record Source(String file, String text, String sha256) {
    /** The largest recipe read. */
    public static final int MOST_BYTES = Document.RECIPE.mostBytes;

    /**
     * Reads a recipe file of UTF-8 text.
     *
     * @throws Unsound where it is missing, unreadable, a folder, larger than 1 MiB, or not text
     */
    public static Source of(Path path) {
        return of(path, Document.RECIPE);
    }

    /**
     * Reads a list of UTF-8 text.
     *
     * @throws Unsound where it is missing, unreadable, a folder, larger than 8 MiB, or not text
     */
    public static Source list(Path path) {
        return of(path, Document.LIST);
    }

    /**
     * Reads a file of UTF-8 text.
     *
     * @throws Unsound where it is missing, unreadable, a folder, larger than such a one may be, or not text
     */
    public static Source of(Path path, Document use) {
        String file = path.toString();
        Place place = Place.of(file);
        if (!Files.exists(path)) {
            throw new Unsound(place, "there is no such file; check the name and the folder");
        }
        if (Files.isDirectory(path)) {
            throw new Unsound(place, "this is a folder; name a " + use.label + " file in it");
        }
        try (InputStream in = Files.newInputStream(path)) {
            return of(file, in.readNBytes(use.mostBytes + 1), use);
        } catch (IOException e) {
            throw new Unsound(place, "the file cannot be read; check its permissions");
        }
    }

    /**
     * Takes the bytes of UTF-8 text.
     *
     * @throws Unsound where they are more than 1 MiB, or not text
     */
    public static Source of(String file, byte[] bytes) {
        return of(file, bytes, Document.RECIPE);
    }

    private static Source of(String file, byte[] bytes, Document use) {
        if (bytes.length > use.mostBytes) {
            throw new Unsound(
                    Place.of(file),
                    "the file is too large: found more than " + (use.mostBytes >> 20) + " MiB; " + use.enoughBytes);
        }
        return new Source(file, decoded(file, bytes, use), sha256(bytes));
    }

    private static String decoded(String file, byte[] bytes, Document use) {
        CharsetDecoder decoder = StandardCharsets.UTF_8
                .newDecoder()
                .onMalformedInput(CodingErrorAction.REPORT)
                .onUnmappableCharacter(CodingErrorAction.REPORT);
        CharBuffer chars = CharBuffer.allocate(bytes.length + 1);
        CoderResult result = decoder.decode(ByteBuffer.wrap(bytes), chars, true);
        String text = chars.flip().toString();
        int bad = result.isError() ? text.length() : firstNotText(text);
        if (bad >= 0) {
            throw new Unsound(
                    placeOf(file, text, bad),
                    "this is not text: found " + (result.isError() ? "bytes that are not UTF-8" : controlAt(text, bad))
                            + "; save the " + use.label + " as UTF-8 text");
        }
        return text.startsWith("\uFEFF") ? text.substring(1) : text;
    }

    private static String controlAt(String text, int index) {
        return String.format("the control character \\u%04x", (int) text.charAt(index));
    }

    private static int firstNotText(String text) {
        for (int i = 0; i < text.length(); i++) {
            char c = text.charAt(i);
            boolean control = (c < 0x20 && c != '\t' && c != '\n' && c != '\r') || (c >= 0x7f && c < 0xa0 && c != 0x85);
            if (control || c == 0xfffe || c == 0xffff) {
                return i;
            }
        }
        return -1;
    }

    private static Place placeOf(String file, String text, int index) {
        int line = 1;
        int lineStart = 0;
        for (int i = 0; i < index; i++) {
            if (text.charAt(i) == '\n') {
                line++;
                lineStart = i + 1;
            }
        }
        return new Place(file, line, text.codePointCount(lineStart, index) + 1);
    }

    /** SHA-256 of bytes in lower-case hexadecimal. */
    public static String sha256(byte[] bytes) {
        try {
            return HexFormat.of().formatHex(MessageDigest.getInstance("SHA-256").digest(bytes));
        } catch (NoSuchAlgorithmException e) {
            throw new IllegalStateException("every Java has SHA-256", e);
        }
    }
}
