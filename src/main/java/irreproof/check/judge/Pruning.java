package irreproof.check.judge;

import irreproof.budget.Budget;
import irreproof.engine.Decomposition;
import irreproof.engine.RepresentationRing;
import irreproof.notation.Expression;
import irreproof.notation.Expression.Multiple;
import irreproof.notation.Expression.Name;
import irreproof.notation.Statement;
import java.util.ArrayList;
import java.util.List;
import java.util.Set;

/**
 * Drops meanings that cannot make a statement hold, so that the readings left over are few and, if there are none, no
 * reading works: a name listed as a term of a sum that must equal (or be part of) a product has to occur in that product
 * under one of the readings of the product's own names.
 */
final class Pruning<I extends Comparable<? super I>> {
    private final Statement statement;
    private final Lexicon<I> lexicon;
    private final Budget budget;

    Pruning(Statement statement, Lexicon<I> lexicon, Budget budget) {
        this.statement = statement;
        this.lexicon = lexicon;
        this.budget = budget;
    }

    /** The readings without the impossible meanings; the same ones if nothing can be said. */
    Readings<I> prune(Readings<I> readings, List<Chain.Link> links) {
        if (links.isEmpty()) {
            return readings;
        }
        int deciding = links.get(0).against();
        Expression product = statement.sides().get(deciding);
        if (!Names.multiplies(product) || links.stream().anyMatch(link -> link.against() != deciding)) {
            return readings;
        }
        List<Name> factors = Names.of(product);
        Readings<I> ofProduct = readings.of(factors);
        List<Reading<I>> choices = ofProduct.all(Readings.MOST);
        if (ofProduct.truncated()) {
            return readings;
        }
        List<Decomposition<I>> products = choices.stream()
                .map(choice -> new Evaluator<>(lexicon, choice, budget).value(product))
                .toList();
        Readings<I> pruned = readings;
        for (Chain.Link link : links) {
            if (link.kind() == Comparison.Kind.EQUAL || link.kind() == Comparison.Kind.PART_OF) {
                for (Name term : listedTerms(statement.sides().get(link.side()))) {
                    pruned = pruned.keeping(term, candidate -> occurs(term, candidate, products));
                }
            }
        }
        return pruned;
    }

    private static List<Name> listedTerms(Expression side) {
        List<Name> terms = new ArrayList<>();
        for (Expression term : Names.terms(side)) {
            boolean counted =
                    term instanceof Multiple multiple && multiple.count().signum() > 0;
            Expression body = counted ? ((Multiple) term).body() : term;
            if (body instanceof Name name) {
                terms.add(name);
            }
        }
        return terms;
    }

    private boolean occurs(Name term, Candidate<I> candidate, List<Decomposition<I>> products) {
        Set<I> irreps = candidate.value().multiplicities().keySet();
        RepresentationRing<I> ring = lexicon.ring();
        boolean barred = lexicon.isBarred(term);
        return products.stream()
                .anyMatch(product -> irreps.stream()
                        .map(irrep -> barred ? ring.conjugate(irrep) : irrep)
                        .allMatch(irrep -> product.multiplicity(irrep) > 0));
    }
}
