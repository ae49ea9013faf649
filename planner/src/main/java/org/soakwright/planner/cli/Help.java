package org.soakwright.planner.cli;

import java.util.List;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Model.OptionSpec;
import picocli.CommandLine.Model.UsageMessageSpec;

/**
 * What every command's help has in common. Commands are built rather than annotated: reading annotations would make every start some
 * tens of milliseconds longer.
 */
final class Help {
    static final int WIDTH = 100;

    static final List<String> EXAMPLE_FIRST = List.of(
            UsageMessageSpec.SECTION_KEY_DESCRIPTION_HEADING,
            UsageMessageSpec.SECTION_KEY_DESCRIPTION,
            UsageMessageSpec.SECTION_KEY_HEADER_HEADING,
            UsageMessageSpec.SECTION_KEY_HEADER,
            UsageMessageSpec.SECTION_KEY_SYNOPSIS_HEADING,
            UsageMessageSpec.SECTION_KEY_SYNOPSIS,
            UsageMessageSpec.SECTION_KEY_PARAMETER_LIST_HEADING,
            UsageMessageSpec.SECTION_KEY_PARAMETER_LIST,
            UsageMessageSpec.SECTION_KEY_OPTION_LIST_HEADING,
            UsageMessageSpec.SECTION_KEY_OPTION_LIST,
            UsageMessageSpec.SECTION_KEY_COMMAND_LIST_HEADING,
            UsageMessageSpec.SECTION_KEY_COMMAND_LIST,
            UsageMessageSpec.SECTION_KEY_FOOTER_HEADING,
            UsageMessageSpec.SECTION_KEY_FOOTER);

    private Help() {}

    /** A name, an example of its use, what it is for, and what is said last. */
    static CommandSpec describe(CommandSpec spec, String name, String example, String purpose, String... last) {
        spec.name(name).version("soakwright " + Version.current());
        spec.usageMessage()
                .descriptionHeading("Example:%n")
                .description("  java -jar soakwright.jar " + example)
                .headerHeading("%n")
                .header(purpose)
                .synopsisHeading("%nUsage: ")
                .footerHeading("%n")
                .footer(last)
                .sortOptions(false);
        return spec;
    }

    static CommandSpec withHelpAndVersion(CommandSpec spec) {
        return spec.addOption(flag("--help", "show this help").usageHelp(true).build())
                .addOption(
                        flag("--version", "show the version").versionHelp(true).build());
    }

    static OptionSpec.Builder flag(String name, String description) {
        return OptionSpec.builder(name).type(boolean.class).description(description);
    }
}
