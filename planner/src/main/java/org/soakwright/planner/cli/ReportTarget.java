package org.soakwright.planner.cli;

import java.io.File;
import java.io.IOException;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.soakwright.planner.report.Folder;

/** The folder that {@code --report} names. */
final class ReportTarget {
    private final String given;
    private final Folder folder;
    private List<String> written = List.of();

    private ReportTarget(String given, Folder folder) {
        this.given = given;
        this.folder = folder;
    }

    /**
     * Looks before any work is done.
     *
     * @throws Refusal where it cannot or must not be written into
     */
    static ReportTarget of(String given) throws Refusal {
        try {
            return new ReportTarget(given, Folder.at(given));
        } catch (Folder.Unusable e) {
            throw unusable(given, e);
        }
    }

    private static Refusal unusable(String given, Folder.Unusable e) {
        return new Refusal(Exit.BAD_INPUT, "--report " + given + " " + e.getMessage(), e);
    }

    String name() {
        return given;
    }

    void write(List<Folder.Entry> entries) throws Refusal {
        try {
            written = folder.write(entries);
        } catch (Folder.Unusable e) {
            throw unusable(given, e);
        } catch (IOException e) {
            throw new Refusal(
                    Exit.FAILED,
                    "--report " + given + " could not be written (" + Refusal.reason(e)
                            + "); nothing in it was changed, make room or name another folder",
                    e);
        }
    }

    /** What was written, a line for each folder. */
    String told() {
        Map<String, List<String>> folders = new LinkedHashMap<>();
        folders.put("", new ArrayList<>());
        for (String name : written) {
            int slash = name.lastIndexOf('/') + 1;
            folders.computeIfAbsent(name.substring(0, slash), key -> new ArrayList<>())
                    .add(name.substring(slash));
        }
        String top = given.endsWith("/") || given.endsWith(File.separator) ? given : given + File.separator;
        StringBuilder text = new StringBuilder("\nWritten\n");
        folders.forEach((name, files) -> text.append(wrapped(top + name, files)));
        return text.toString();
    }

    private static String wrapped(String folder, List<String> files) {
        StringBuilder lines = new StringBuilder("  " + folder + "\n");
        StringBuilder line = new StringBuilder("   ");
        for (String file : files) {
            if (line.length() > 3 && line.length() + 1 + file.length() > Help.WIDTH) {
                lines.append(line).append('\n');
                line = new StringBuilder("   ");
            }
            line.append(' ').append(file);
        }
        return lines.append(line).append('\n').toString();
    }
}
