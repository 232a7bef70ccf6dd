package irreproof.cli;

import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Model.OptionSpec;
import picocli.CommandLine.ParseResult;

/**
 * One of the program's commands. Options are declared in code, not by annotations, which picocli would have to read by
 * reflection at every start.
 */
interface Subcommand {
    String name();

    /** A sentence for the list of commands; it may be followed by further lines for the command's own help. */
    String[] description();

    /** Adds the options and parameters. */
    void declare(CommandSpec spec);

    /**
     * @return the exit code
     * @throws Exception {@link UserError} and its kin for what the user should mend; anything else is a crash
     */
    int run(ParseResult given, Console console) throws Exception;

    default CommandSpec spec(String shownName) {
        CommandSpec spec = CommandSpec.create().name(shownName).addOption(help());
        spec.usageMessage().description(description()).width(100);
        declare(spec);
        return spec;
    }

    static OptionSpec help() {
        return OptionSpec.builder("--help")
                .usageHelp(true)
                .description("Print this help.")
                .build();
    }

    static OptionSpec group() {
        return OptionSpec.builder("--group")
                .paramLabel("SETTING")
                .type(String.class)
                .defaultValue("")
                .description("The group for statements whose document names none, such as 'SU(5)'.")
                .build();
    }
}
