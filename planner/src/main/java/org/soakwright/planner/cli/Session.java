package org.soakwright.planner.cli;

import java.io.FileDescriptor;
import java.io.FileOutputStream;
import java.io.IOException;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import org.jspecify.annotations.Nullable;
import org.soakwright.planner.report.Style;
import picocli.CommandLine.Help.Ansi;

/** Where a command prints, what its reader can see, and what has been written when someone ends it early. */
final class Session {
    private final PrintStream out;
    private final PrintStream err;
    private final boolean colour;
    private final ProgressLine line;
    private @Nullable String written;
    private boolean finished;
    private boolean interrupted;

    /**
     * A session.
     *
     * @param colour whether standard output is a terminal whose reader wants colour
     * @param watched whether standard error is a terminal
     */
    Session(PrintStream out, PrintStream err, boolean colour, boolean watched) {
        this.out = out;
        this.err = err;
        this.colour = colour;
        line = new ProgressLine(err, watched);
    }

    /** On this process' standard streams, always in UTF-8. */
    static Session ofProcess() {
        boolean colour = Ansi.AUTO.enabled() && !"dumb".equals(System.getenv("TERM"));
        return new Session(stream(FileDescriptor.out), stream(FileDescriptor.err), colour, isErrTerminal(colour));
    }

    private static PrintStream stream(FileDescriptor descriptor) {
        return new PrintStream(new FileOutputStream(descriptor), true, StandardCharsets.UTF_8);
    }

    /** Java knows of standard output only; where the system tells more it is asked, so that no log gets progress lines. */
    private static boolean isErrTerminal(boolean otherwise) {
        Path err = Path.of("/proc/self/fd/2");
        try {
            String device = Files.readSymbolicLink(err).toString();
            return device.startsWith("/dev/pts/") || device.startsWith("/dev/tty") || device.equals("/dev/console");
        } catch (IOException | UnsupportedOperationException e) {
            return otherwise;
        }
    }

    PrintStream out() {
        return out;
    }

    PrintStream err() {
        return err;
    }

    Style style() {
        return colour ? Style.ANSI : Style.PLAIN;
    }

    Ansi ansi() {
        return colour ? Ansi.ON : Ansi.OFF;
    }

    ProgressLine line() {
        return line;
    }

    /** One line about the command itself. */
    void say(String message) {
        line.erase();
        err.println("soakwright: " + message);
    }

    /** Something that writes a file whole or not at all. */
    interface Writing {
        void write() throws Refusal;
    }

    /** Writes without being interrupted half-way, and never after an interruption was announced. */
    synchronized void write(String file, Writing writing) throws Refusal {
        if (!interrupted) {
            writing.write();
            written = written == null ? file : written + " and " + file;
        }
    }

    synchronized void finish() {
        line.erase();
        finished = true;
    }

    /** Told when the process has to end; says so unless the command was done anyway. */
    synchronized void interrupt() {
        if (!finished) {
            interrupted = true;
            say("interrupted; "
                    + (written == null
                            ? "nothing was written"
                            : written + (written.contains(" and ") ? " were" : " was") + " written"));
        }
    }
}
