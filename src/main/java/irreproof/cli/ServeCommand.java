package irreproof.cli;

import irreproof.server.ServerMain;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Model.OptionSpec;
import picocli.CommandLine.ParseResult;

/** The language server. */
final class ServeCommand implements Subcommand {
    @Override
    public String name() {
        return "serve";
    }

    @Override
    public String[] description() {
        return new String[] {"Runs the language server on standard input and output, until the editor ends it.", ""};
    }

    @Override
    public void declare(CommandSpec spec) {
        // Some editors' libraries add this to every command line; it asks for what is done anyway.
        spec.addOption(OptionSpec.builder("--stdio").hidden(true).build());
    }

    @Override
    public int run(ParseResult given, Console console) {
        return ServerMain.run(console.in(), console.out());
    }
}
