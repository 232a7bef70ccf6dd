package irreproof.check;

import irreproof.budget.Budget;
import irreproof.budget.BudgetExceeded;
import irreproof.check.judge.Chain;
import irreproof.check.judge.DeclaredNames;
import irreproof.check.judge.Judge;
import irreproof.check.judge.Judgement;
import irreproof.check.judge.Lexicon;
import irreproof.check.judge.LieLexicon;
import irreproof.check.judge.Names;
import irreproof.check.judge.Undecidable;
import irreproof.engine.Decomposition;
import irreproof.engine.Rational;
import irreproof.engine.lie.DominantWeight;
import irreproof.engine.lie.ReductiveIrrep;
import irreproof.latex.Passage;
import irreproof.latex.Reader;
import irreproof.naming.Groups;
import irreproof.naming.LieGroup;
import irreproof.naming.ProductGroup;
import irreproof.naming.ProductGroup.Entries;
import irreproof.naming.Resolution;
import irreproof.naming.SymplecticUsage;
import irreproof.naming.WrittenTuple;
import irreproof.notation.AuthorStyle;
import irreproof.notation.Expression;
import irreproof.notation.Expression.Name;
import irreproof.notation.GroupName;
import irreproof.notation.GroupReader;
import irreproof.notation.Statement;
import irreproof.notation.StatementFinder;
import irreproof.text.SourceText;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;

/** Completes a bare product, power or sum, or a branching: what {@code derive} prints. */
public final class Derivation {
    private Derivation() {}

    /**
     * The outcome of {@link #derive}.
     *
     * @param ok whether the statement could be completed
     * @param text the completed statement as LaTeX, or why there is none, in plain words. A branching gives one line for
     *     each inequivalent embedding that the irreps can tell apart, with a comment on which it is
     */
    public record Result(boolean ok, String text) {
        static Result failed(String reason) {
            return new Result(false, reason);
        }
    }

    /**
     * @param latex what the user typed, without math shifts ({@code \mathbf{3}\otimes\mathbf{8}}); if it has several
     *     sides, the one that multiplies is completed
     * @param setting the group to work in, or groups joined by arrows for a branching ({@code E6 -> SO(10) x U(1)}), as
     *     typed by the user; empty if the LaTeX names the group
     * @param notation how to name the irreps of the result
     */
    public static Result derive(String latex, String setting, DerivedNotation notation, Budget budget) {
        try {
            return completed(latex, setting, notation, budget);
        } catch (Undecidable reason) {
            return Result.failed(reason.getMessage());
        } catch (BudgetExceeded exceeded) {
            if (exceeded.reason() == BudgetExceeded.Cause.CANCELLED) {
                throw exceeded;
            }
            return Result.failed(exceeded.getMessage());
        }
    }

    private static Result completed(String latex, String setting, DerivedNotation notation, Budget budget) {
        String typed = latex.strip().replaceAll("=\\s*$", "").strip();
        Optional<Passage> passage = Reader.passage(typed);
        List<Statement> statements =
                passage.map(read -> StatementFinder.find(typed, read, budget)).orElse(List.of());
        Optional<Statement> statement = statements.isEmpty()
                ? passage.flatMap(read -> StatementFinder.side(typed, read, budget))
                : Optional.of(statements.get(0));
        if (statement.isEmpty()) {
            return Result.failed("no product or sum of irreps can be read in " + latex.strip());
        }
        if (!statement.get().problems().isEmpty()) {
            return Result.failed(
                    "cannot be read: " + statement.get().problems().get(0).message());
        }
        Expression side = statement.get().sides().get(Chain.reference(statement.get()));
        Statement bare =
                new Statement(List.of(side), List.of(), side.span(), side.span().of(typed), false, List.of());
        if (DerivedBranching.isChain(setting)) {
            return new DerivedBranching(typed, bare, notation, budget).derive(setting);
        }
        boolean single = side instanceof Name;
        Optional<GroupName> name = setting.isEmpty()
                ? GroupReader.find(Reader.flatten(typed)).stream().findFirst()
                : GroupReader.read(Reader.flatten(setting));
        if (name.isEmpty()) {
            return Result.failed(
                    setting.isEmpty()
                            ? "no group is named; use --group, as in --group 'SU(3)'"
                            : "\"" + setting + "\" is not a group such as SU(5)");
        }
        Resolution group = Groups.resolveFully(name.get(), SymplecticUsage.SIZE);
        if (group instanceof Resolution.Unsupported unsupported) {
            return Result.failed(unsupported.display() + ": " + unsupported.reason());
        }
        if (single && notation == DerivedNotation.AUTHOR) {
            return Result.failed("one irrep of " + group.display()
                    + " needs no completion; for a branching name two groups, as in --group 'SU(3) -> SU(2) x U(1)'");
        }
        return group instanceof Resolution.Simple simple
                ? inSimpleGroup(typed, bare, simple.group(), notation, budget)
                : inProduct(typed, bare, ((Resolution.Product) group).group(), notation, budget);
    }

    private static Result inSimpleGroup(
            String typed, Statement bare, LieGroup group, DerivedNotation notation, Budget budget) {
        LieLexicon lexicon = new LieLexicon(group, DeclaredNames.NONE);
        Judgement<DominantWeight> judgement = judged(typed, bare, lexicon, group.display(), budget);
        Decomposition<DominantWeight> value = judgement.values().get(0);
        if (notation == DerivedNotation.AUTHOR) {
            Ruling ruling = new Ruling(Verdict.HOLDS, "", null, SettingSource.NONE, judgement, lexicon, null, null);
            Wording wording = new Wording(new SourceText("", typed), bare, List.of(bare), ruling, budget);
            return equation(bare, wording.usualSum(value));
        }
        ProductGroup alone = alone(group);
        AuthorStyle style = DerivedNames.style(typed, bare, notation);
        return equation(
                bare, new DerivedNames(alone, notation, Entries.DIMENSIONS, style, budget).sum(embedded(value)));
    }

    /** A simple group as a product of one factor. */
    static ProductGroup alone(LieGroup group) {
        return new ProductGroup(group.display(), List.of(new ProductGroup.Simple(group)), Entries.DIMENSIONS);
    }

    private static Decomposition<ReductiveIrrep> embedded(Decomposition<DominantWeight> sum) {
        Map<ReductiveIrrep, Long> irreps = new TreeMap<>();
        sum.multiplicities()
                .forEach((irrep, count) -> irreps.put(new ReductiveIrrep(List.of(irrep), List.<Rational>of()), count));
        return Decomposition.of(irreps);
    }

    private static Result inProduct(
            String typed, Statement bare, ProductGroup group, DerivedNotation notation, Budget budget) {
        ProductLexicon lexicon = new ProductLexicon(group);
        Judgement<ReductiveIrrep> judgement = judged(typed, bare, lexicon, group.display(), budget);
        DerivedNotation chosen = notation;
        if (chosen == DerivedNotation.AUTHOR) {
            chosen = WrittenTuple.of(Names.of(bare.sides().get(0)).get(0), group)
                    .flatMap(tuple -> tuple.entries().stream().findFirst())
                    .map(DerivedNames::of)
                    .orElse(DerivedNotation.DIMENSION);
        }
        Entries entries = ProductLexicon.entries(judgement.reading().interpretation());
        AuthorStyle style = AuthorStyle.learn(typed, List.of(bare));
        return equation(
                bare,
                new DerivedNames(group, chosen, entries, style, budget)
                        .sum(judgement.values().get(0)));
    }

    /** @throws Undecidable if the side has no value in the group, with the reason */
    static <I extends Comparable<? super I>> Judgement<I> judged(
            String typed, Statement bare, Lexicon<I> lexicon, String group, Budget budget) {
        Judgement<I> judgement = Judge.judge(bare, lexicon, budget);
        return switch (judgement.outcome()) {
            case HOLDS -> judgement;
            case UNDECIDED -> throw new Undecidable(judgement.reason());
            case FAILS, NOT_ITS_GROUP -> {
                List<Name> unknown = judgement.unknownNames();
                throw new Undecidable(
                        unknown.isEmpty()
                                ? judgement.reason()
                                : group + " has no irrep "
                                        + unknown.get(0).span().of(typed));
            }
        };
    }

    private static Result equation(Statement bare, String right) {
        return new Result(true, bare.latex().strip() + " = " + right);
    }
}
