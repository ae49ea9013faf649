package org.soakwright.planner.report;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import java.util.stream.Stream;
import org.junit.jupiter.api.Assumptions;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** Nothing of anyone else's is ever lost, and nothing half-written is ever left. */
class FolderTest {
    private static final List<Folder.Entry> FIRST =
            List.of(Folder.Entry.of("index.html", "one"), Folder.Entry.of("tables/steps.csv", "a"));
    private static final List<Folder.Entry> SECOND =
            List.of(Folder.Entry.of("index.html", "two"), Folder.Entry.of("pictures/map.svg", "b"));

    @TempDir
    Path top = Path.of("");

    private Path target() {
        return top.resolve("report");
    }

    private List<String> write(List<Folder.Entry> entries) throws IOException, Folder.Unusable {
        return Folder.at(target().toString()).write(entries);
    }

    /** Everything below the top, by name, with its text; a folder with nothing in it as well. */
    private Map<String, String> all() throws IOException {
        Map<String, String> all = new TreeMap<>();
        try (Stream<Path> files = Files.walk(top)) {
            for (Path file : files.toList()) {
                if (Files.isRegularFile(file)) {
                    all.put(top.relativize(file).toString().replace('\\', '/'), Files.readString(file));
                } else if (!file.equals(top) && isEmpty(file)) {
                    all.put(top.relativize(file).toString().replace('\\', '/') + "/", "");
                }
            }
        }
        return all;
    }

    private static boolean isEmpty(Path folder) throws IOException {
        try (Stream<Path> files = Files.list(folder)) {
            return files.findAny().isEmpty();
        }
    }

    private static String refused(String given) {
        return String.valueOf(
                assertThrows(Folder.Unusable.class, () -> Folder.at(given)).getMessage());
    }

    @Test
    void aFolderThatDoesNotExistIsMadeWithThoseAboveIt() throws IOException, Folder.Unusable {
        Path deep = top.resolve("a/b/report");
        assertEquals(
                List.of("index.html", "tables/steps.csv", "files.sha256"),
                Folder.at(deep.toString()).write(FIRST));
        assertEquals("one", Files.readString(deep.resolve("index.html")));
        assertEquals(
                List.of("a/b/report/files.sha256", "a/b/report/index.html", "a/b/report/tables/steps.csv"), names());
    }

    private List<String> names() throws IOException {
        return List.copyOf(all().keySet());
    }

    @Test
    void anEmptyFolderIsFilled() throws IOException, Folder.Unusable {
        Files.createDirectory(target());
        write(FIRST);
        assertEquals(List.of("report/files.sha256", "report/index.html", "report/tables/steps.csv"), names());
    }

    @Test
    void anEarlierReportIsReplacedWhole() throws IOException, Folder.Unusable {
        write(FIRST);
        write(SECOND);
        assertEquals(List.of("report/files.sha256", "report/index.html", "report/pictures/map.svg"), names());
        assertEquals("two", Files.readString(target().resolve("index.html")));
        write(FIRST);
        assertEquals(List.of("report/files.sha256", "report/index.html", "report/tables/steps.csv"), names());
    }

    @Test
    void aForeignFileStandsInTheWayAndIsKept() throws IOException, Folder.Unusable {
        write(FIRST);
        Files.writeString(target().resolve("notes.txt"), "mine");
        Map<String, String> before = all();
        assertEquals(
                "holds the file notes.txt, which is no part of a report, so it is kept; name a new or empty folder",
                refused(target().toString()));
        assertEquals(before, all());
    }

    @Test
    void aForeignFolderStandsInTheWayEvenWhenEmpty() throws IOException {
        Files.createDirectories(target().resolve("tables"));
        assertEquals(
                "holds the folder tables, which is no part of a report, so it is kept; name a new or empty folder",
                refused(target().toString()));
    }

    @Test
    void aFileOfTheSameNameWithoutAListIsForeign() throws IOException {
        Files.createDirectory(target());
        Files.writeString(target().resolve("index.html"), "someone's page");
        assertTrue(refused(target().toString()).startsWith("holds the file index.html"));
    }

    @Test
    void aListOfSomeoneElseMakesNothingOurs() throws IOException {
        Files.createDirectory(target());
        Files.writeString(target().resolve("files.sha256"), "0".repeat(64) + "  files.sha256\n");
        assertTrue(refused(target().toString()).startsWith("holds the file files.sha256"));
    }

    @Test
    void aReportThatSomeoneEditedIsKept() throws IOException, Folder.Unusable {
        write(FIRST);
        Files.writeString(target().resolve("index.html"), "one, with a remark");
        Map<String, String> before = all();
        assertEquals(
                "holds index.html, which was changed since it was written, so it is kept; move it away or name another"
                        + " folder",
                refused(target().toString()));
        assertEquals(before, all());
    }

    @Test
    void aFileThatComesToLieThereMeanwhileIsKept() throws IOException, Folder.Unusable {
        write(FIRST);
        Folder folder = Folder.at(target().toString());
        Files.writeString(target().resolve("notes.txt"), "mine");
        Map<String, String> before = all();
        assertThrows(Folder.Unusable.class, () -> folder.write(SECOND));
        assertEquals(before, all());
    }

    @Test
    void aDiskThatFillsUpLeavesNothingBehind() throws IOException, Folder.Unusable {
        Path deep = top.resolve("a/b/report");
        Folder folder = Folder.at(deep.toString());
        IOException full = assertThrows(IOException.class, () -> folder.write(withFailure()));
        assertEquals("No space left on device", full.getMessage());
        assertEquals(Map.of(), all());
    }

    @Test
    void aDiskThatFillsUpLeavesAnEarlierReportAsItWas() throws IOException, Folder.Unusable {
        write(FIRST);
        Map<String, String> before = all();
        Folder folder = Folder.at(target().toString());
        assertThrows(IOException.class, () -> folder.write(withFailure()));
        assertEquals(before, all());
    }

    @Test
    void aFaultOfTheProgramLeavesNothingBehindEither() throws IOException, Folder.Unusable {
        Folder folder = Folder.at(target().toString());
        List<Folder.Entry> faulty = List.of(new Folder.Entry("index.html", out -> {
            throw new IllegalStateException("out of order");
        }));
        assertThrows(IllegalStateException.class, () -> folder.write(faulty));
        assertEquals(Map.of(), all());
    }

    private static List<Folder.Entry> withFailure() {
        return List.of(Folder.Entry.of("index.html", "new"), new Folder.Entry("batch-sheet.pdf", out -> {
            out.write("%PDF-1.7 and then".getBytes(StandardCharsets.US_ASCII));
            throw new IOException("No space left on device");
        }));
    }

    /** What a run that was killed half-way leaves: its part, and a list of old and new files. */
    @Test
    void whatAKilledRunLeftIsCleanedUp() throws IOException, Folder.Unusable {
        write(FIRST);
        Files.createDirectories(target().resolve(".soakwright.part/tables"));
        Files.writeString(target().resolve(".soakwright.part/tables/steps.csv"), "ha");
        write(SECOND);
        assertEquals(List.of("report/files.sha256", "report/index.html", "report/pictures/map.svg"), names());
    }

    @Test
    void aFileIsNoFolder() throws IOException {
        Files.writeString(target(), "mine");
        assertEquals("is a file; name a folder", refused(target().toString()));
        assertEquals(
                "would lie in report, which is a file; name another",
                refused(target().resolve("below").toString()));
    }

    @Test
    void aNamelessFolderIsRefused() {
        assertEquals("is no folder name", refused(" "));
        assertEquals("is no folder name", refused("a\0b"));
    }

    @Test
    void aWriteProtectedFolderIsRefused() throws IOException {
        Path locked = Files.createDirectory(target());
        Assumptions.assumeTrue(locked.toFile().setWritable(false) && !Files.isWritable(locked), "rights count here");
        assertEquals("is write-protected; name another folder", refused(locked.toString()));
        assertTrue(refused(locked.resolve("below").toString())
                .startsWith("would lie in a folder that is write-protected"));
        assertTrue(locked.toFile().setWritable(true));
    }

    @Test
    void aLinkStaysALink() throws IOException, Folder.Unusable {
        Path real = Files.createDirectory(top.resolve("real"));
        Path link = top.resolve("link");
        try {
            Files.createSymbolicLink(link, real);
        } catch (IOException | UnsupportedOperationException e) {
            Assumptions.abort("links can be made here");
        }
        Folder.at(link.toString()).write(FIRST);
        assertTrue(Files.isSymbolicLink(link));
        assertEquals("one", Files.readString(real.resolve("index.html")));
    }

    @Test
    void aLinkThatLiesInTheFolderIsForeign() throws IOException, Folder.Unusable {
        write(FIRST);
        Path other = Files.writeString(top.resolve("other.html"), "one");
        Files.delete(target().resolve("index.html"));
        try {
            Files.createSymbolicLink(target().resolve("index.html"), other);
        } catch (IOException | UnsupportedOperationException e) {
            Assumptions.abort("links can be made here");
        }
        assertFalse(refused(target().toString()).isEmpty());
        assertEquals("one", Files.readString(other));
    }

    @Test
    void anEntryStaysInsideItsFolder() {
        for (String path : List.of("../x", "/x", "a/../../x", "", "a\\b")) {
            assertThrows(IllegalArgumentException.class, () -> Folder.Entry.of(path, ""));
        }
    }
}
