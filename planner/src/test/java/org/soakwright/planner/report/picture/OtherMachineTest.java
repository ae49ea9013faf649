package org.soakwright.planner.report.picture;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.TimeUnit;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class OtherMachineTest {
    @TempDir
    Path folder = Path.of("");

    /** Another JVM is told of no font, no screen, another home, language, hour and number format. */
    @Test
    void aMachineWithoutFontsDrawsTheSameBytes() throws Exception {
        Path nothing = folder.resolve("fonts.conf");
        Files.writeString(nothing, "<?xml version=\"1.0\"?><fontconfig></fontconfig>");
        Path temporary = Files.createDirectory(folder.resolve("temporary"));
        List<String> command = new ArrayList<>(List.of(
                Path.of(System.getProperty("java.home"), "bin", "java").toString(),
                "-Duser.home=" + folder,
                "-Djava.io.tmpdir=" + temporary,
                "-Duser.language=tr",
                "-Duser.country=TR",
                "-Duser.timezone=Pacific/Chatham",
                "-Dfile.encoding=ISO-8859-1",
                "-cp",
                System.getProperty("java.class.path"),
                Fingerprint.class.getName()));
        ProcessBuilder builder = new ProcessBuilder(command).redirectErrorStream(true);
        builder.environment().put("FONTCONFIG_FILE", nothing.toString());
        builder.environment().put("FONTCONFIG_PATH", folder.toString());
        builder.environment().remove("DISPLAY");
        Process process = builder.start();
        String said = new String(process.getInputStream().readAllBytes(), StandardCharsets.UTF_8).strip();
        assertTrue(process.waitFor(1, TimeUnit.MINUTES));
        assertEquals(Fingerprint.of(), said);
        try (Stream<Path> left = Files.list(temporary)) {
            assertEquals(List.of(), left.toList(), "nothing is left in the temporary folder");
        }
    }
}
