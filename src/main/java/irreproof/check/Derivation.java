package irreproof.check;

import irreproof.budget.Budget;
import irreproof.check.judge.Chain;
import irreproof.check.judge.DeclaredNames;
import irreproof.check.judge.Judge;
import irreproof.check.judge.Judgement;
import irreproof.check.judge.LieLexicon;
import irreproof.engine.lie.DominantWeight;
import irreproof.latex.Reader;
import irreproof.naming.Groups;
import irreproof.naming.Resolution;
import irreproof.notation.GroupReader;
import irreproof.notation.Statement;
import irreproof.notation.StatementFinder;
import irreproof.text.SourceText;
import java.util.List;
import java.util.Optional;

/** Completes a bare product or sum: what {@code derive} prints. */
public final class Derivation {
    private Derivation() {}

    /**
     * The outcome of {@link #derive}.
     *
     * @param ok whether the statement could be completed
     * @param text the completed statement as LaTeX, or why there is none, in one line of plain words
     */
    public record Result(boolean ok, String text) {}

    /**
     * @param latex what the user typed, without math shifts ({@code \mathbf{3}\otimes\mathbf{8}}); if it has several
     *     sides, the one that multiplies is completed
     * @param group the group to work in, as typed by the user; empty if the LaTeX names it
     */
    public static Result derive(String latex, String group, Budget budget) {
        String typed = latex.strip().replaceAll("=\\s*$", "").strip();
        List<Statement> statements = Reader.passage(typed)
                .map(passage -> StatementFinder.find(typed, passage, budget))
                .orElse(List.of());
        if (statements.isEmpty()) {
            return new Result(false, "no product or sum of irreps can be read in " + latex.strip());
        }
        Statement statement = statements.get(0);
        if (!statement.problems().isEmpty()) {
            return new Result(
                    false, "cannot be read: " + statement.problems().get(0).message());
        }
        Optional<Resolution> setting = group.isEmpty() ? named(typed) : Directives.group(group);
        if (setting.isEmpty()) {
            return new Result(
                    false,
                    group.isEmpty()
                            ? "no group is named; use --group, as in --group 'SU(3)'"
                            : "\"" + group + "\" is not a group such as SU(5)");
        }
        if (setting.get() instanceof Resolution.Unsupported unsupported) {
            return new Result(false, unsupported.display() + ": " + unsupported.reason());
        }
        return complete(typed, statement, (Resolution.Simple) setting.get(), budget);
    }

    private static Optional<Resolution> named(String latex) {
        return GroupReader.find(Reader.flatten(latex)).stream().findFirst().map(Groups::resolve);
    }

    private static Result complete(String latex, Statement statement, Resolution.Simple group, Budget budget) {
        int reference = Chain.reference(statement);
        var side = statement.sides().get(reference);
        Statement bare =
                new Statement(List.of(side), List.of(), side.span(), side.span().of(latex), false, List.of());
        LieLexicon lexicon = new LieLexicon(group.group(), DeclaredNames.NONE);
        Judgement<DominantWeight> judgement = Judge.judge(bare, lexicon, budget);
        return switch (judgement.outcome()) {
            case UNDECIDED -> new Result(false, judgement.reason());
            case FAILS, NOT_ITS_GROUP -> {
                String name = judgement.unknownNames().get(0).span().of(latex);
                yield new Result(false, group.display() + " has no irrep " + name);
            }
            case HOLDS -> {
                Ruling ruling = new Ruling(Verdict.HOLDS, "", null, SettingSource.NONE, judgement, lexicon, null, null);
                Wording wording = new Wording(new SourceText("", latex), bare, List.of(statement), ruling, budget);
                String right = wording.usualSum(judgement.values().get(0));
                yield new Result(true, bare.latex().strip() + " = " + right);
            }
        };
    }
}
