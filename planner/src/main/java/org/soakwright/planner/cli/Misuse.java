package org.soakwright.planner.cli;

import java.util.Collection;
import org.soakwright.recipes.text.Nearest;
import org.soakwright.recipes.text.Shown;
import picocli.CommandLine.MissingParameterException;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.UnmatchedArgumentException;

/** What is wrong with a command line, and what was most likely meant. */
final class Misuse {
    private Misuse() {}

    static String explained(ParameterException problem) {
        CommandSpec spec = problem.getCommandLine().getCommandSpec();
        if (problem instanceof UnmatchedArgumentException unmatched
                && !unmatched.getUnmatched().isEmpty()) {
            return unmatched(unmatched.getUnmatched().get(0), spec);
        }
        if (problem instanceof MissingParameterException missing
                && missing.getMissing().stream().anyMatch(arg -> arg.isPositional())) {
            if (spec.positionalParameters().size() > 1) {
                return "two batches are compared; name both such as " + spec.name()
                        + " three-waters.yaml four-waters.yaml";
            }
            return isLine(spec)
                    ? "no line is named; name one such as " + spec.name() + " quayside-hall.yaml"
                    : "no recipe is named; name one such as " + spec.name() + " loin-desalting.yaml";
        }
        String message = String.valueOf(problem.getMessage());
        return message.isEmpty()
                ? message
                : message.substring(0, 1).toLowerCase(java.util.Locale.ROOT) + message.substring(1);
    }

    private static boolean isLine(CommandSpec spec) {
        return spec.name().equals(LineCommand.NAME);
    }

    private static String unmatched(String word, CommandSpec spec) {
        boolean option = word.startsWith("-");
        if (!option && spec.subcommands().isEmpty()) {
            String most =
                    spec.positionalParameters().size() > 1 ? "two batches" : isLine(spec) ? "one line" : "one recipe";
            return most + " at a time: found " + Shown.quoted(word) + " as well";
        }
        Collection<String> known =
                option ? spec.optionsMap().keySet() : spec.subcommands().keySet();
        return "unknown " + (option ? "option " : "command ") + Shown.quoted(word) + "; " + Nearest.hint(word, known);
    }
}
