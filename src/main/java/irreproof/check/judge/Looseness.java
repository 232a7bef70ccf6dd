package irreproof.check.judge;

import irreproof.engine.Decomposition;
import irreproof.notation.Expression;
import irreproof.notation.Expression.Name;
import irreproof.notation.Expression.Power;
import irreproof.notation.Expression.PowerKind;
import irreproof.notation.Expression.Product;
import irreproof.notation.Expression.Sum;
import irreproof.notation.Expression.Symmetry;
import irreproof.notation.Statement;
import java.util.List;
import java.util.Optional;

/**
 * Why two sides may differ although the statement is right as its author means it: an arrow between them, a single term
 * that a product projects onto (or a count of dimensions), one symmetry of a square (identical particles), factors
 * decomposed under a subgroup.
 */
final class Looseness {
    private Looseness() {}

    static <I extends Comparable<? super I>> Optional<String> reason(
            Statement statement, Chain.Link link, Comparison<I> failed, Evaluator<I> evaluator) {
        if (!link.loose().isEmpty()) {
            return Optional.of(link.loose());
        }
        if (link.kind() != Comparison.Kind.EQUAL) {
            return Optional.empty();
        }
        Expression deciding = statement.sides().get(link.against());
        Expression side = statement.sides().get(link.side());
        boolean product =
                deciding instanceof Product || deciding instanceof Power power && power.kind() == PowerKind.TENSOR;
        boolean reducible = failed.expected().multiplicities().size() > 1;
        if (side instanceof Name && product && reducible) {
            return Optional.of("a single term behind a product may mean a projection, or count dimensions");
        }
        if (side instanceof Sum
                && deciding instanceof Product square
                && isPartOfSquare(square, failed.found(), evaluator)) {
            return Optional.of("it is one symmetry of the square");
        }
        if (decomposesFactors(statement, deciding)) {
            return Optional.of("its factors seem to be decomposed under a subgroup");
        }
        return Optional.empty();
    }

    private static <I extends Comparable<? super I>> boolean isPartOfSquare(
            Product product, Decomposition<I> found, Evaluator<I> evaluator) {
        if (product.factors().size() != 2) {
            return false;
        }
        Decomposition<I> factor = evaluator.value(product.factors().get(0));
        if (!factor.equals(evaluator.value(product.factors().get(1)))) {
            return false;
        }
        return List.of(Symmetry.values()).stream()
                .anyMatch(symmetry -> evaluator.square(factor, symmetry).equals(found));
    }

    /** Another side has as many factors, but sums where this one has names. */
    static boolean decomposesFactors(Statement statement, Expression deciding) {
        if (!(deciding instanceof Product product)) {
            return false;
        }
        return statement.sides().stream()
                .filter(side -> side != deciding)
                .filter(Product.class::isInstance)
                .map(side -> ((Product) side).factors())
                .filter(factors -> factors.size() == product.factors().size())
                .anyMatch(factors -> {
                    for (int i = 0; i < factors.size(); i++) {
                        if (factors.get(i) instanceof Sum && product.factors().get(i) instanceof Name) {
                            return true;
                        }
                    }
                    return false;
                });
    }
}
