package irreproof.check;

import irreproof.budget.Budget;
import irreproof.budget.BudgetExceeded;
import irreproof.check.judge.Judge;
import irreproof.check.judge.Judgement;
import irreproof.check.judge.Names;
import irreproof.check.judge.Reading;
import irreproof.engine.Decomposition;
import irreproof.engine.lie.DominantWeight;
import irreproof.notation.AuthorStyle;
import irreproof.notation.Expression;
import irreproof.notation.Expression.Multiple;
import irreproof.notation.Expression.Name;
import irreproof.notation.Statement;
import irreproof.notation.Writer;
import irreproof.notation.WrittenTerm;
import irreproof.text.SourceText;
import irreproof.text.Span;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;
import java.util.function.Supplier;

/**
 * The words to speak of one judged statement: irreps and sums in its author's own notation. The style is learnt only
 * when something is to be said.
 */
final class Wording {
    /** Steps for looking up one name; beyond them its Dynkin label is said instead. */
    static final long STEPS = 20_000_000;

    private final SourceText source;
    private final Statement statement;
    private final Ruling ruling;
    private final Budget budget;
    private final Supplier<AuthorStyle> style;

    /** @param samples the document's statements, whose notation fills in what this one does not show */
    Wording(SourceText source, Statement statement, List<Statement> samples, Ruling ruling, Budget budget) {
        this.source = source;
        this.statement = statement;
        this.ruling = ruling;
        this.budget = budget;
        this.style = new Supplier<>() {
            private AuthorStyle learnt;

            @Override
            public AuthorStyle get() {
                if (learnt == null) {
                    List<Statement> ordered = new ArrayList<>(List.of(statement));
                    ordered.addAll(samples);
                    learnt = AuthorStyle.learn(source.content(), ordered);
                }
                return learnt;
            }
        };
    }

    static String times(long count) {
        return count == 1 ? "once" : count == 2 ? "twice" : count + " times";
    }

    /** One irrep, named as the side names its irreps. */
    String name(DominantWeight irrep, int side) {
        return Writer.name(vocabulary(statement.sides().get(side)).name(irrep), style.get());
    }

    /** A sum, its irreps named as the side names its own, largest first; empty for zero. */
    String sum(Decomposition<DominantWeight> sum, int side) {
        return written(sum, vocabulary(statement.sides().get(side)), largestFirst(sum));
    }

    /** What the side must be, in the order the author uses there. */
    String corrected(Decomposition<DominantWeight> sum, int side) {
        Expression expression = statement.sides().get(side);
        return written(sum, vocabulary(expression), inAuthorsOrder(sum, expression));
    }

    /** A sum named as the statement names its first irrep. */
    String usualSum(Decomposition<DominantWeight> sum) {
        return sum.isZero() ? "0" : written(sum, vocabulary(statement.sides().get(0)), largestFirst(sum));
    }

    /** The dimension name of the published tables, in the author's style. */
    String usualName(DominantWeight irrep) {
        return Writer.name(Vocabulary.ofTables(ruling.lexicon(), budget).name(irrep), style.get());
    }

    /** Where the side lists the irrep, the last place if there are several; the whole side if nowhere. */
    Span place(DominantWeight irrep, int side) {
        Expression expression = statement.sides().get(side);
        Span place = expression.span();
        for (Expression term : Names.terms(expression)) {
            Expression body = term instanceof Multiple multiple ? multiple.body() : term;
            if (body instanceof Name && value(body).multiplicity(irrep) > 0) {
                place = term.span();
            }
        }
        return place;
    }

    String written(Name name) {
        return name.span().of(source.content());
    }

    /** The line of a place, counted from 1. */
    int line(Span span) {
        return source.lines().position(span.start()).line() + 1;
    }

    private String written(Decomposition<DominantWeight> sum, Vocabulary vocabulary, List<DominantWeight> order) {
        if (sum.isZero()) {
            return "";
        }
        List<WrittenTerm> terms = order.stream()
                .map(irrep -> new WrittenTerm(BigInteger.valueOf(sum.multiplicity(irrep)), vocabulary.name(irrep)))
                .toList();
        return Writer.sum(terms, style.get());
    }

    private Vocabulary vocabulary(Expression side) {
        Judgement<DominantWeight> judgement = ruling.judgement();
        Reading<DominantWeight> reading = judgement == null ? null : judgement.reading();
        return reading == null
                ? Vocabulary.ofTables(ruling.lexicon(), budget)
                : Vocabulary.ofSide(side, statement, ruling.lexicon(), reading, budget);
    }

    private List<DominantWeight> largestFirst(Decomposition<DominantWeight> sum) {
        return sum.multiplicities().keySet().stream()
                .sorted(Comparator.comparing(ruling.lexicon()::dimension)
                        .reversed()
                        .thenComparing(Comparator.naturalOrder()))
                .toList();
    }

    /** By dimension if the author's terms are so ordered; otherwise the author's order, then what is new. */
    private List<DominantWeight> inAuthorsOrder(Decomposition<DominantWeight> sum, Expression side) {
        Set<DominantWeight> listed = new LinkedHashSet<>();
        for (Expression term : Names.terms(side)) {
            listed.addAll(value(term).multiplicities().keySet());
        }
        List<BigInteger> dimensions =
                listed.stream().map(ruling.lexicon()::dimension).toList();
        List<DominantWeight> falling = largestFirst(sum);
        if (isOrdered(dimensions, Comparator.reverseOrder())) {
            return falling;
        }
        if (isOrdered(dimensions, Comparator.naturalOrder())) {
            List<DominantWeight> rising = new ArrayList<>(falling);
            rising.sort(Comparator.comparing(ruling.lexicon()::dimension));
            return rising;
        }
        Set<DominantWeight> order = new LinkedHashSet<>(listed);
        order.addAll(falling);
        order.retainAll(falling);
        return List.copyOf(order);
    }

    private static boolean isOrdered(List<BigInteger> dimensions, Comparator<BigInteger> order) {
        for (int i = 1; i < dimensions.size(); i++) {
            if (order.compare(dimensions.get(i - 1), dimensions.get(i)) > 0) {
                return false;
            }
        }
        return true;
    }

    /** What an expression lists; nothing if it holds a name without a meaning. */
    private Decomposition<DominantWeight> value(Expression expression) {
        if (Names.of(expression).stream().anyMatch(ruling.judgement().unknownNames()::contains)) {
            return Decomposition.zero();
        }
        try {
            return Judge.valueOf(
                    expression, ruling.lexicon(), ruling.judgement().reading(), budget.withSteps(STEPS));
        } catch (BudgetExceeded exceeded) {
            if (exceeded.reason() == BudgetExceeded.Cause.CANCELLED) {
                throw exceeded;
            }
            return Decomposition.zero();
        }
    }
}
