package irreproof.cli;

import irreproof.workspace.UnreadableFile;
import irreproof.workspace.Version;
import java.io.PrintStream;
import java.util.Arrays;
import java.util.List;
import picocli.CommandLine;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Model.OptionSpec;
import picocli.CommandLine.ParameterException;

/** The program without the process around it: arguments and streams in, exit code out. */
final class CommandLineProgram {
    private static final List<Subcommand> SUBCOMMANDS =
            List.of(new CheckCommand(), new DeriveCommand(), new RulesCommand(), new ServeCommand());

    private CommandLineProgram() {}

    static int run(String[] arguments, Console console) {
        try {
            for (Subcommand subcommand : SUBCOMMANDS) {
                if (arguments.length > 0 && arguments[0].equals(subcommand.name())) {
                    return run(subcommand, Arrays.copyOfRange(arguments, 1, arguments.length), console);
                }
            }
            return withoutSubcommand(arguments, console);
        } catch (ParameterException e) {
            console.err().println("irreproof: " + e.getMessage().replaceAll("\\s*\\R\\s*", " "));
            String command = e.getCommandLine().getCommandName();
            console.err().println("`" + command + " --help` tells how to use it");
        } catch (UserError | UnreadableFile e) {
            console.err().println("irreproof: " + e.getMessage());
        } catch (Exception | Error e) {
            crash(e, console.err());
        }
        return ExitCode.FAILED;
    }

    private static int run(Subcommand subcommand, String[] arguments, Console console) throws Exception {
        CommandLine line = new CommandLine(subcommand.spec("irreproof " + subcommand.name()));
        CommandLine.ParseResult given = line.parseArgs(arguments);
        if (line.isUsageHelpRequested()) {
            console.print(line.getUsageMessage());
            return ExitCode.CLEAN;
        }
        return subcommand.run(given, console);
    }

    private static int withoutSubcommand(String[] arguments, Console console) throws UserError {
        CommandSpec spec = CommandSpec.create().name("irreproof").addOption(Subcommand.help());
        spec.addOption(OptionSpec.builder("--version")
                .versionHelp(true)
                .description("Print the version.")
                .build());
        spec.usageMessage()
                .description("Proofreads the representation theory in LaTeX manuscripts.", "")
                .synopsisSubcommandLabel("COMMAND")
                .width(100);
        SUBCOMMANDS.forEach(subcommand -> spec.addSubcommand(subcommand.name(), subcommand.spec(subcommand.name())));
        CommandLine line = new CommandLine(spec);
        line.parseArgs(arguments);
        if (line.isUsageHelpRequested()) {
            console.print(line.getUsageMessage());
        } else if (line.isVersionHelpRequested()) {
            console.print("irreproof " + Version.text() + "\n");
        } else {
            throw new ParameterException(line, "no command given");
        }
        return ExitCode.CLEAN;
    }

    private static void crash(Throwable problem, PrintStream err) {
        err.println("irreproof: this is a fault of the program, please report it: " + problem
                + " (IRREPROOF_DEBUG=1 prints where)");
        if (System.getenv("IRREPROOF_DEBUG") != null) {
            problem.printStackTrace(err);
        }
    }
}
