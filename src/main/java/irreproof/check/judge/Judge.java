package irreproof.check.judge;

import irreproof.budget.Budget;
import irreproof.budget.BudgetExceeded;
import irreproof.check.judge.Judgement.Outcome;
import irreproof.check.judge.Judgement.WrongPart;
import irreproof.engine.Decomposition;
import irreproof.notation.Expression;
import irreproof.notation.Expression.Name;
import irreproof.notation.Statement;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;

/**
 * Decides one statement in one setting: holds if some consistent reading makes every comparison true, fails if none
 * does. Whatever cannot be read or computed is undecided, with the reason. Cost: one evaluation for each reading; the
 * engine's products are cached there.
 */
public final class Judge<I extends Comparable<? super I>> {
    private final Statement statement;
    private final Lexicon<I> lexicon;
    private final Budget budget;
    private final List<Name> names = new ArrayList<>();
    private final List<Chain.Link> links;

    private Judge(Statement statement, Lexicon<I> lexicon, Budget budget) {
        this.statement = statement;
        this.lexicon = lexicon;
        this.budget = budget;
        statement.sides().forEach(side -> names.addAll(Names.of(side)));
        this.links = Chain.links(statement);
    }

    public static <I extends Comparable<? super I>> Judgement<I> judge(
            Statement statement, Lexicon<I> lexicon, Budget budget) {
        try {
            return new Judge<>(statement, lexicon, budget).judge();
        } catch (Undecidable reason) {
            return Judgement.undecided(reason.getMessage());
        } catch (BudgetExceeded reason) {
            if (reason.reason() == BudgetExceeded.Cause.CANCELLED) {
                throw reason;
            }
            return Judgement.undecided(reason.getMessage());
        } catch (ArithmeticException reason) {
            return Judgement.undecided("a multiplicity is too large");
        }
    }

    /** What an expression of a judged statement decomposes into; dots at its top level count as nothing. */
    public static <I extends Comparable<? super I>> Decomposition<I> valueOf(
            Expression expression, Lexicon<I> lexicon, Reading<I> reading, Budget budget) {
        return new Evaluator<>(lexicon, reading, budget).value(expression);
    }

    private Judgement<I> judge() {
        List<Judgement<I>> failures = new ArrayList<>();
        List<Reading<I>> satisfying = new ArrayList<>();
        Judgement<I> best = null;
        boolean truncated = false;
        for (Interpretation interpretation : lexicon.interpretations(names)) {
            Readings<I> readings = new Readings<>(lexicon, interpretation, names, budget);
            if (!readings.unknown().isEmpty()) {
                failures.add(unknown(readings.unknown()));
                continue;
            }
            List<Reading<I>> all = readings.all();
            truncated |= readings.truncated();
            for (Reading<I> reading : all) {
                Judgement<I> judgement = evaluate(reading);
                if (judgement.outcome() == Outcome.HOLDS) {
                    satisfying.add(reading);
                    best = best == null || reading.unusual() < best.reading().unusual() ? judgement : best;
                } else {
                    failures.add(judgement);
                }
            }
        }
        if (best != null) {
            return new Judgement<>(
                    Outcome.HOLDS,
                    "",
                    best.reading(),
                    best.comparisons(),
                    best.values(),
                    satisfying,
                    List.of(),
                    List.of());
        }
        Judgement<I> nearest = failures.stream()
                .min(Comparator.comparingInt(Judge::badness))
                .orElseGet(() -> Judgement.undecided("its names have no common meaning in this group"));
        if (truncated && !differInDimension(nearest)) {
            return Judgement.undecided("its names can be read in too many ways");
        }
        return nearest;
    }

    /** Dimensions are the same in every reading, so that one reading decides. */
    private boolean differInDimension(Judgement<I> judgement) {
        return judgement.comparisons().stream()
                .anyMatch(comparison -> comparison.kind() == Comparison.Kind.EQUAL
                        && !lexicon.ring()
                                .dimension(comparison.expected())
                                .equals(lexicon.ring().dimension(comparison.found())));
    }

    /** Of several failures, the one that is nearest to holding is what the author meant. */
    private static int badness(Judgement<?> failure) {
        int names = failure.outcome() == Outcome.NOT_ITS_GROUP
                ? 1000
                : 100 * failure.unknownNames().size();
        int wrong = failure.comparisons().stream().mapToInt(Judge::distance).sum();
        int unusual = failure.reading() == null ? 0 : failure.reading().unusual();
        int undecided = failure.outcome() == Outcome.UNDECIDED ? -1_000_000 : 0;
        return undecided
                + names
                + 10 * unusual
                + Math.min(wrong, 9)
                + failure.wrongParts().size();
    }

    private static int distance(Comparison<?> comparison) {
        return comparison.holds() ? 0 : 1;
    }

    private Judgement<I> unknown(List<Name> unknown) {
        Expression deciding = statement.sides().get(Chain.reference(statement));
        List<Name> ofDeciding = Names.of(deciding);
        boolean otherGroup = !Names.multiplies(deciding) || unknown.stream().anyMatch(ofDeciding::contains);
        return new Judgement<>(
                otherGroup ? Outcome.NOT_ITS_GROUP : Outcome.FAILS,
                "",
                null,
                List.of(),
                List.of(),
                List.of(),
                unknown,
                List.of());
    }

    private Judgement<I> evaluate(Reading<I> reading) {
        Evaluator<I> evaluator = new Evaluator<>(lexicon, reading, budget);
        List<Decomposition<I>> values = new ArrayList<>();
        for (Expression side : statement.sides()) {
            if (Names.hasInnerDots(side)) {
                throw new Undecidable("dots inside a product leave its meaning open");
            }
            values.add(evaluator.value(side));
        }
        List<Comparison<I>> comparisons = new ArrayList<>();
        boolean projection = false;
        for (Chain.Link link : links) {
            Comparison<I> comparison = compare(link, values);
            comparisons.add(comparison);
            projection |= link.projecting() && !comparison.holds();
        }
        boolean holds = comparisons.stream().allMatch(Comparison::holds);
        if (!holds && projection) {
            throw new Undecidable("an arrow behind a product may mean a projection");
        }
        List<WrongPart> wrongParts = holds ? Parts.wrong(statement, lexicon, reading, evaluator, values) : List.of();
        Outcome outcome = holds && wrongParts.isEmpty() ? Outcome.HOLDS : Outcome.FAILS;
        return new Judgement<>(outcome, "", reading, comparisons, values, List.of(), List.of(), wrongParts);
    }

    private Comparison<I> compare(Chain.Link link, List<Decomposition<I>> values) {
        Decomposition<I> expected = values.get(link.against());
        Decomposition<I> found = values.get(link.side());
        boolean partOf = found.minus(expected).positivePart().isZero();
        boolean holds = switch (link.kind()) {
            case EQUAL -> found.equals(expected);
            case PART_OF -> partOf;
            case DIFFERENT -> !found.equals(expected);
            case NOT_PART_OF -> !partOf;
        };
        return new Comparison<>(link.side(), link.against(), link.kind(), holds, expected, found);
    }
}
