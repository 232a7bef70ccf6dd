package irreproof.cli;

import irreproof.budget.Budget;
import irreproof.check.CheckOptions;
import irreproof.check.Derivation;
import java.util.List;
import java.util.concurrent.Callable;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Model.PositionalParamSpec;
import picocli.CommandLine.ParseResult;

/** Completes a product and prints the statement. */
final class DeriveCommand implements Subcommand {
    @Override
    public String name() {
        return "derive";
    }

    @Override
    public String[] description() {
        return new String[] {"Completes a product and prints the whole statement as LaTeX.", ""};
    }

    @Override
    public void declare(CommandSpec spec) {
        spec.addPositional(PositionalParamSpec.builder()
                .paramLabel("LATEX")
                .required(true)
                .arity("1")
                .type(String.class)
                .description("What to complete, such as '\\mathbf{3} \\otimes \\mathbf{8}'.")
                .build());
        spec.addOption(Subcommand.group());
    }

    @Override
    public int run(ParseResult given, Console console) throws Exception {
        String latex = given.matchedPositionalValue(0, "");
        String group = given.matchedOptionValue("--group", "");
        Callable<Derivation.Result> task = () -> Derivation.derive(latex, group, Budget.of(CheckOptions.DEFAULT_STEPS));
        Derivation.Result result = DeepStack.runAll(List.of(task)).get(0);
        if (!result.ok()) {
            throw new UserError(result.text());
        }
        console.print(result.text() + "\n");
        return ExitCode.CLEAN;
    }
}
