package irreproof.cli;

import irreproof.budget.Budget;
import irreproof.check.CheckOptions;
import irreproof.check.Derivation;
import irreproof.check.DerivedNotation;
import java.util.List;
import java.util.concurrent.Callable;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Model.OptionSpec;
import picocli.CommandLine.Model.PositionalParamSpec;
import picocli.CommandLine.ParseResult;

/** Completes a product or a branching and prints the statement. */
final class DeriveCommand implements Subcommand {
    @Override
    public String name() {
        return "derive";
    }

    @Override
    public String[] description() {
        return new String[] {
            "Completes a product, a power or a branching and prints the whole statement as LaTeX.",
            "",
            "A branching is asked for by two or more groups: --group 'E6 -> SO(10) x U(1)'. Where inequivalent embeddings"
                    + " differ, each gives a line.",
            ""
        };
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
        spec.addOption(OptionSpec.builder("--group")
                .paramLabel("SETTING")
                .type(String.class)
                .defaultValue("")
                .description(
                        "The group, such as 'SU(5)' or 'SU(3) x SU(2) x U(1)', or groups joined by -> for a branching.")
                .build());
        spec.addOption(OptionSpec.builder("--notation")
                .paramLabel("dimension|dynkin|young")
                .type(String.class)
                .defaultValue("")
                .description("How to name the irreps of the result (default: as in LATEX).")
                .build());
    }

    @Override
    public int run(ParseResult given, Console console) throws Exception {
        String latex = given.matchedPositionalValue(0, "");
        String group = given.matchedOptionValue("--group", "");
        DerivedNotation notation = notation(given.matchedOptionValue("--notation", ""));
        Callable<Derivation.Result> task =
                () -> Derivation.derive(latex, group, notation, Budget.of(CheckOptions.DEFAULT_STEPS));
        Derivation.Result result = DeepStack.runAll(List.of(task)).get(0);
        if (!result.ok()) {
            throw new UserError(result.text());
        }
        console.print(result.text() + "\n");
        return ExitCode.CLEAN;
    }

    private static DerivedNotation notation(String written) throws UserError {
        return switch (written) {
            case "" -> DerivedNotation.AUTHOR;
            case "dimension" -> DerivedNotation.DIMENSION;
            case "dynkin" -> DerivedNotation.DYNKIN;
            case "young" -> DerivedNotation.YOUNG;
            default -> throw new UserError("--notation is dimension, dynkin or young, not " + written);
        };
    }
}
