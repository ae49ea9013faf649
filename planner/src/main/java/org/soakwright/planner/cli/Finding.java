package org.soakwright.planner.cli;

import java.util.List;
import java.util.function.Supplier;
import org.soakwright.planner.report.Folder;

/**
 * What a command found out, put into words only where it is asked for.
 *
 * @param status the exit status
 * @param sheet for people
 * @param json for programs
 * @param report for people who want to look closer: the files of a folder
 */
record Finding(int status, Supplier<String> sheet, Supplier<String> json, Supplier<List<Folder.Entry>> report) {
    /** Of a command that writes no report. */
    Finding(int status, Supplier<String> sheet, Supplier<String> json) {
        this(status, sheet, json, List::of);
    }
}
