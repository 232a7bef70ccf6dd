package irreproof.engine.lie;

import irreproof.engine.Rational;
import java.util.List;

/**
 * A reductive subalgebra of a simple Lie algebra, by the linear map of weights it induces: a weight with Dynkin labels w
 * (Bourbaki order) restricts to the labels P w, first those of the factors in their order, then the charges.
 *
 * @param projection the rows of P, {@code subalgebra.rank()} of them with {@code algebra.rank()} entries each; whole
 *     numbers in the rows of simple factors
 * @param name how it arises, in the trade's words: {@code regular, node 2 deleted}, {@code special, principal}
 */
public record Embedding(
        SimpleAlgebra algebra, ReductiveAlgebra subalgebra, List<List<Rational>> projection, String name) {
    public Embedding {
        projection = projection.stream().map(List::copyOf).toList();
        boolean fits = projection.size() == subalgebra.rank()
                && projection.stream().allMatch(row -> row.size() == algebra.rank());
        if (!fits) {
            throw new IllegalArgumentException(
                    "the projection of " + algebra + " to " + subalgebra + " has a wrong shape");
        }
    }
}
