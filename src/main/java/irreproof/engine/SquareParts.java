package irreproof.engine;

import irreproof.budget.Budget;
import java.util.HashSet;
import java.util.Set;

/**
 * The square of an irrep, split into its symmetric and its antisymmetric part, so that an irrep with several copies in
 * the square tells how many lie in each: in SU(3) the one octet of 8 x 8 is symmetric, the other antisymmetric.
 */
public record SquareParts<I extends Comparable<? super I>>(Decomposition<I> symmetric, Decomposition<I> antisymmetric) {
    public static <I extends Comparable<? super I>> SquareParts<I> of(
            RepresentationRing<I> ring, I irrep, Budget budget) {
        return new SquareParts<>(ring.symmetricPower(irrep, 2, budget), ring.exteriorPower(irrep, 2, budget));
    }

    /** The whole square. */
    public Decomposition<I> square() {
        return symmetric.plus(antisymmetric);
    }

    /** The irreps with copies in both parts: an author must tell these apart, by subscripts or otherwise. */
    public Set<I> inBoth() {
        Set<I> both = new HashSet<>(symmetric.multiplicities().keySet());
        both.retainAll(antisymmetric.multiplicities().keySet());
        return both;
    }
}
