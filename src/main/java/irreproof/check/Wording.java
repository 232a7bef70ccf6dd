package irreproof.check;

import irreproof.budget.Budget;
import irreproof.engine.Decomposition;
import irreproof.engine.lie.DominantWeight;
import irreproof.notation.Expression.Name;
import irreproof.notation.Statement;
import irreproof.text.SourceText;
import irreproof.text.Span;
import java.util.List;

/** Placeholder until the writer lands. */
final class Wording {
    static final long STEPS = 20_000_000;
    private final SourceText source;
    private final Statement statement;
    private final Ruling ruling;

    Wording(SourceText source, Statement statement, List<Statement> samples, Ruling ruling, Budget budget) {
        this.source = source;
        this.statement = statement;
        this.ruling = ruling;
    }

    static String times(long count) {
        return count == 1 ? "once" : count == 2 ? "twice" : count + " times";
    }

    String name(DominantWeight irrep, int side) {
        return irrep.toString();
    }

    String sum(Decomposition<DominantWeight> sum, int side) {
        return sum.isZero() ? "" : sum.toString();
    }

    String corrected(Decomposition<DominantWeight> sum, int side) {
        return sum.toString();
    }

    String usualSum(Decomposition<DominantWeight> sum) {
        return sum.toString();
    }

    String usualName(DominantWeight irrep) {
        return irrep.toString();
    }

    Span place(DominantWeight irrep, int side) {
        return statement.sides().get(side).span();
    }

    String written(Name name) {
        return name.span().of(source.content());
    }

    int line(Span span) {
        return source.lines().position(span.start()).line() + 1;
    }
}
