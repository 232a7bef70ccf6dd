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
import java.util.Optional;

/**
 * Decides one statement in one setting: holds if some consistent reading makes every comparison true, fails if none
 * does. Whatever cannot be read or computed is undecided, with the reason. Cost: one evaluation for each reading; the
 * engine's products are cached there.
 */
public final class Judge<I extends Comparable<? super I>> {
    /** Among how many failing readings the one nearest to holding is looked for. */
    private static final int REPORTED = 12;

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
            return reason.isOtherGroup()
                    ? Judgement.notItsGroup(reason.getMessage(), List.of())
                    : Judgement.undecided(reason.getMessage());
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
        List<Judgement<I>> held = new ArrayList<>();
        boolean truncated = false;
        for (Interpretation interpretation : lexicon.interpretations(names)) {
            try {
                truncated |= judge(interpretation, held, failures);
            } catch (BudgetExceeded exceeded) {
                if (held.isEmpty() || exceeded.reason() == BudgetExceeded.Cause.CANCELLED) {
                    throw exceeded;
                }
            }
            boolean usual =
                    held.stream().anyMatch(judgement -> judgement.reading().unusual() == 0);
            if (usual) {
                break;
            }
        }
        if (!held.isEmpty()) {
            Judgement<I> best = held.stream()
                    .min(Comparator.comparingInt(
                            judgement -> judgement.reading().unusual()))
                    .orElseThrow();
            return best.satisfiedBy(held.stream().map(Judgement::reading).toList());
        }
        Judgement<I> nearest = failures.stream()
                .min(Comparator.comparingLong(Judgement::distance))
                .orElseGet(() -> Judgement.undecided("its names have no common meaning in this group"));
        if (nearest.outcome() == Outcome.FAILS && !differInDimension(nearest)) {
            Optional<String> doubt =
                    truncated ? Optional.of("its names can be read in too many ways") : lexicon.doubt(names);
            if (doubt.isPresent()) {
                return Judgement.undecided(doubt.get());
            }
        }
        return nearest;
    }

    /** Tries the readings under one interpretation; true if some were left out. */
    private boolean judge(Interpretation interpretation, List<Judgement<I>> held, List<Judgement<I>> failures) {
        Readings<I> readings = Readings.of(lexicon, interpretation, names, budget);
        if (!readings.unknown().isEmpty()) {
            failures.add(unknown(readings));
            return false;
        }
        Readings<I> possible = new Pruning<>(statement, lexicon, budget).prune(readings, links);
        int before = held.size();
        for (Reading<I> reading : possible.all(Readings.MOST)) {
            Judgement<I> judgement = evaluate(reading);
            if (judgement.outcome() == Outcome.HOLDS) {
                held.add(judgement);
            }
        }
        if (held.size() == before) {
            readings.all(REPORTED).forEach(reading -> failures.add(evaluate(reading)));
        }
        return possible.truncated();
    }

    /** Dimensions are the same in every reading, so that one reading decides. */
    private boolean differInDimension(Judgement<I> judgement) {
        return judgement.comparisons().stream()
                .anyMatch(comparison -> comparison.kind() == Comparison.Kind.EQUAL
                        && !lexicon.ring()
                                .dimension(comparison.expected())
                                .equals(lexicon.ring().dimension(comparison.found())));
    }

    /** The other names decide, and what the sides with the unknown names must be is known all the same. */
    private Judgement<I> unknown(Readings<I> readings) {
        List<Name> unknown = readings.unknown();
        int reference = Chain.reference(statement);
        Expression deciding = statement.sides().get(reference);
        List<Name> ofDeciding = Names.of(deciding);
        if (!Names.multiplies(deciding) || unknown.stream().anyMatch(ofDeciding::contains)) {
            return Judgement.notItsGroup("", unknown);
        }
        boolean claimed = links.stream()
                .filter(link ->
                        Names.of(statement.sides().get(link.side())).stream().anyMatch(unknown::contains))
                .allMatch(link -> link.isEquation() && !(statement.sides().get(link.side()) instanceof Name));
        if (!claimed || Looseness.decomposesFactors(statement, deciding)) {
            return Judgement.undecided("the group has no irrep of that name, but this may not be meant as an equation");
        }
        List<Name> known =
                names.stream().filter(name -> !unknown.contains(name)).toList();
        Reading<I> reading = readings.of(known).all(1).stream().findFirst().orElse(null);
        if (reading == null) {
            return Judgement.undecided("its names cannot be told apart");
        }
        Decomposition<I> expected = new Evaluator<>(lexicon, reading, budget).value(deciding);
        List<Comparison<I>> comparisons = links.stream()
                .filter(link -> link.isEquation() && link.against() == reference)
                .filter(link ->
                        Names.of(statement.sides().get(link.side())).stream().anyMatch(unknown::contains))
                .map(link -> new Comparison<I>(
                        link.side(), link.against(), link.kind(), false, expected, Decomposition.zero()))
                .toList();
        return new Judgement<>(Outcome.FAILS, "", reading, comparisons, List.of(), List.of(), unknown, List.of());
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
        String loose = "";
        for (Chain.Link link : links) {
            Comparison<I> comparison = compare(link, values);
            comparisons.add(comparison);
            loose = comparison.holds()
                    ? loose
                    : Looseness.reason(statement, link, comparison, evaluator).orElse(loose);
        }
        boolean holds = comparisons.stream().allMatch(Comparison::holds);
        if (!loose.isEmpty()) {
            return new Judgement<>(
                    Outcome.UNDECIDED, loose, reading, comparisons, values, List.of(), List.of(), List.of());
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
