package org.soakwright.planner.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.fail;

import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;

/**
 * Whole screens as they are meant to be. After a change that is wanted, {@code mvn test -Dsoakwright.screens=write} writes them anew;
 * it fails every screen it writes, so that a build never passes on screens nobody has looked at.
 */
final class Screens {
    private static final Path SOURCES = Path.of("src/test/resources/org/soakwright/planner/cli/screens");

    private Screens() {}

    static void assertShown(String screen, String shown) throws IOException {
        if ("write".equals(System.getProperty("soakwright.screens"))) {
            Files.createDirectories(SOURCES);
            Files.writeString(SOURCES.resolve(screen), shown);
            fail(screen + " was written: look at it, then run without soakwright.screens");
        }
        assertEquals(meant(screen), shown);
    }

    private static String meant(String screen) throws IOException {
        try (InputStream in = Screens.class.getResourceAsStream("screens/" + screen)) {
            return in == null ? "" : new String(in.readAllBytes(), StandardCharsets.UTF_8);
        }
    }
}
