package irreproof.cli;

import irreproof.check.RuleInfo;
import irreproof.check.Rules;
import java.util.List;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Model.PositionalParamSpec;
import picocli.CommandLine.ParseResult;

/** Lists the rules, or prints the page of one. */
final class RulesCommand implements Subcommand {
    @Override
    public String name() {
        return "rules";
    }

    @Override
    public String[] description() {
        return new String[] {"Lists the rules, or prints one rule's page.", ""};
    }

    @Override
    public void declare(CommandSpec spec) {
        spec.addPositional(PositionalParamSpec.builder()
                .paramLabel("NAME")
                .arity("0..1")
                .type(String.class)
                .description("A rule's name, as it stands behind a finding.")
                .build());
    }

    @Override
    public int run(ParseResult given, Console console) throws UserError {
        String name = given.matchedPositionalValue(0, "");
        console.print(name.isEmpty() ? list(Rules.all()) : page(name, Rules.all()));
        return ExitCode.CLEAN;
    }

    private static String list(List<RuleInfo> rules) {
        int widest = rules.stream().mapToInt(rule -> rule.name().length()).max().orElse(1);
        StringBuilder text = new StringBuilder();
        for (RuleInfo rule : rules) {
            String severity = rule.severity().word();
            text.append(("%-" + widest + "s  %-7s  %s\n").formatted(rule.name(), severity, rule.summary()));
        }
        return text.toString();
    }

    private static String page(String name, List<RuleInfo> rules) throws UserError {
        for (RuleInfo rule : rules) {
            if (rule.name().equals(name)) {
                return rule.page().strip() + "\n";
            }
        }
        throw new UserError("there is no rule " + name + "; `irreproof rules` lists them");
    }
}
