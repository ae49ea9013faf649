package org.soakwright.planner.cli;

import java.time.DateTimeException;
import java.time.LocalDateTime;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.soakwright.recipes.text.Shown;
import picocli.CommandLine.Model.OptionSpec;

/**
 * When the first step starts, by the clock on the wall of the place where it does. No zone: clocks that are put forward or back in between
 * are not followed.
 */
final class Start {
    private static final Pattern LOCAL =
            Pattern.compile("([0-9]{4})-([0-9]{2})-([0-9]{2})[T ]([0-9]{2}):([0-9]{2})(?::00)?");
    private static final Pattern ZONE = Pattern.compile(".*[0-9](Z|[+-][0-9]{2}:?[0-9]{2}|\\[.*])");

    private final OptionSpec option = OptionSpec.builder("--start")
            .type(String.class)
            .paramLabel("TIME")
            .description(
                    "when the first step starts, local time, such as 2026-03-02T06:00; times of day are then shown")
            .build();

    OptionSpec option() {
        return option;
    }

    /**
     * The moment given, if any.
     *
     * @throws Refusal where it is none
     */
    Optional<LocalDateTime> moment() throws Refusal {
        String given = option.getValue();
        return given == null ? Optional.empty() : Optional.of(read(given.strip()));
    }

    static LocalDateTime read(String given) throws Refusal {
        if (ZONE.matcher(given).matches()) {
            throw refuse(given, "names a zone; write the local time alone", null);
        }
        Matcher matcher = LOCAL.matcher(given);
        if (!matcher.matches()) {
            throw refuse(given, "is no date with a time of day", null);
        }
        try {
            return LocalDateTime.of(
                    number(matcher, 1), number(matcher, 2), number(matcher, 3), number(matcher, 4), number(matcher, 5));
        } catch (DateTimeException e) {
            throw refuse(given, "is on no calendar or clock", e);
        }
    }

    private static int number(Matcher matcher, int group) {
        return Integer.parseInt(matcher.group(group));
    }

    private static Refusal refuse(String given, String why, @org.jspecify.annotations.Nullable Throwable cause) {
        String message = "--start " + Shown.quoted(given) + " " + why + ", such as 2026-03-02T06:00";
        return cause == null ? new Refusal(Exit.BAD_INPUT, message) : new Refusal(Exit.BAD_INPUT, message, cause);
    }
}
