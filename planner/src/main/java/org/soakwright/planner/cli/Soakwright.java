package org.soakwright.planner.cli;

import java.io.OutputStreamWriter;
import java.io.PrintStream;
import java.io.PrintWriter;
import java.nio.charset.StandardCharsets;
import java.util.stream.Stream;
import picocli.CommandLine;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.ParameterException;

/** The command line's front door. */
public final class Soakwright {
    private static final String TRACE = "SOAKWRIGHT_TRACE";

    private Soakwright() {}

    /** Runs one command and ends the process with its exit status. */
    public static void main(String[] args) {
        Session session = Session.ofProcess();
        Runtime.getRuntime().addShutdownHook(new Thread(session::interrupt));
        System.exit(run(args, session));
    }

    /**
     * Runs one command without colour or progress.
     *
     * @return the exit status: 0 done, 1 no plan that meets the targets, 2 bad input or usage, 3 internal
     */
    public static int run(String[] args, PrintStream out, PrintStream err) {
        return run(args, new Session(out, err, false, false));
    }

    static int run(String[] args, Session session) {
        int status;
        try {
            status = execute(args, session);
        } catch (Throwable failure) {
            // The last door: whatever comes through it is told in one line.
            status = internal(failure, session);
        }
        if (session.out().checkError()) {
            session.say("the output could not be written in full: the pipe was closed or the disk is full;"
                    + " write to a place with room");
            status = Exit.FAILED;
        }
        session.finish();
        return status;
    }

    private static int execute(String[] args, Session session) {
        PrintWriter out = writer(session.out());
        PrintWriter err = writer(session.err());
        CommandSpec top = Help.describe(
                CommandSpec.create(),
                "soakwright",
                "plan loin-desalting.yaml",
                "Plans soaks, rinses, rests and drying of solid pieces from the diffusion inside them.",
                "java -jar soakwright.jar COMMAND --help tells more.",
                "",
                "Exit status: 0 done, follow also when targets are missed; 1 plan found no choice that meets",
                "the targets, line none with every lot in time; 2 bad input or usage; 3 internal error or output that could not be written");
        top.usageMessage()
                .customSynopsis("soakwright COMMAND RECIPE [--json FILE] [--report DIR] [--quiet]")
                .optionListHeading("%n")
                .commandListHeading("%nCommands:%n");
        Help.withHelpAndVersion(top);
        Stream.of(new CheckCommand(session), new FollowCommand(session), new PlanCommand(session))
                .map(RecipeCommand::spec)
                .forEach(spec -> top.addSubcommand(spec.name(), spec));
        CommandSpec compare = new CompareCommand(session).spec();
        top.addSubcommand(compare.name(), compare);
        CommandSpec line = new LineCommand(session).spec();
        top.addSubcommand(line.name(), line);
        CommandLine commands = new CommandLine(top)
                .setOut(out)
                .setErr(err)
                .setColorScheme(CommandLine.Help.defaultColorScheme(session.ansi()))
                .setUsageHelpWidth(Help.WIDTH)
                .setHelpSectionKeys(Help.EXAMPLE_FIRST)
                .setExpandAtFiles(false)
                .setParameterExceptionHandler((problem, all) -> misused(problem, session))
                .setExecutionExceptionHandler((failure, command, parsed) -> internal(failure, session));
        if (args.length == 0) {
            commands.usage(err);
            return Exit.BAD_INPUT;
        }
        return commands.execute(args);
    }

    private static PrintWriter writer(PrintStream stream) {
        return new PrintWriter(new OutputStreamWriter(stream, StandardCharsets.UTF_8), true);
    }

    private static int misused(ParameterException problem, Session session) {
        session.say(Misuse.explained(problem));
        String command = problem.getCommandLine().getCommandSpec().qualifiedName();
        session.err()
                .println("java -jar " + command.replaceFirst("soakwright", "soakwright.jar") + " --help shows how");
        return Exit.BAD_INPUT;
    }

    private static int internal(Throwable failure, Session session) {
        session.say("internal error: " + failure + "; " + remedy(failure));
        if ("1".equals(System.getenv(TRACE))) {
            failure.printStackTrace(session.err());
        }
        return Exit.FAILED;
    }

    private static String remedy(Throwable failure) {
        return failure instanceof OutOfMemoryError
                ? "give Java more memory, such as java -Xmx1g -jar soakwright.jar"
                : "this is a fault of the program: please report it with the recipe, " + TRACE + "=1 shows where";
    }
}
