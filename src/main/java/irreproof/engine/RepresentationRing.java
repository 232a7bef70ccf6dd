package irreproof.engine;

import irreproof.budget.Budget;
import java.math.BigInteger;
import java.util.Optional;

/**
 * The irreps of one group and how they multiply: the interface that every kind of group shares.
 *
 * @param <I> the irreps
 */
public interface RepresentationRing<I extends Comparable<? super I>> {
    I trivial();

    BigInteger dimension(I irrep);

    I conjugate(I irrep);

    /** The product of two irreps, decomposed. */
    Decomposition<I> product(I left, I right, Budget budget);

    /** The symmetric or exterior power of one irrep (exponent 0 or more), decomposed. */
    Decomposition<I> symmetricPower(I irrep, int exponent, Budget budget);

    /** See {@link #symmetricPower}. */
    Decomposition<I> exteriorPower(I irrep, int exponent, Budget budget);

    /**
     * The character of the centre on the irrep, as the trade names it, for the short proof that two sides differ: its
     * name and its value. Equal values are necessary for terms of one product.
     */
    Optional<CentralCharacter> centralCharacter(I irrep);

    /** {@code N-ality} with value {@code 2} of modulus {@code 3}; {@code congruence class} {@code (0,1)}. */
    record CentralCharacter(String name, String value) {
        // equals and hashCode written out: a record's generated ones cost a short run more than the rest of its work

        @Override
        public boolean equals(Object other) {
            return other instanceof CentralCharacter that && value.equals(that.value) && name.equals(that.name);
        }

        @Override
        public int hashCode() {
            return value.hashCode();
        }
    }

    /** The product of two sums, decomposed. */
    default Decomposition<I> product(Decomposition<I> left, Decomposition<I> right, Budget budget) {
        Decomposition<I> result = Decomposition.zero();
        for (var a : left.multiplicities().entrySet()) {
            for (var b : right.multiplicities().entrySet()) {
                long count = Math.multiplyExact(a.getValue(), b.getValue());
                result = result.plus(product(a.getKey(), b.getKey(), budget), count);
            }
        }
        return result;
    }

    /**
     * The Adams operation psi^k of an irrep, whose character at g is that of the irrep at g^k, times a sum; by Newton's
     * formula psi^k = sum of (-1)^(r-1) r (exterior r) (symmetric k-r) where a ring has no quicker way.
     *
     * @param power the k, 1 or more
     */
    default Decomposition<I> adamsProduct(I irrep, int power, Decomposition<I> factor, Budget budget) {
        Decomposition<I> operation = Decomposition.zero();
        for (int r = 1; r <= power; r++) {
            Decomposition<I> exterior = exteriorPower(irrep, r, budget);
            Decomposition<I> symmetric = symmetricPower(irrep, power - r, budget);
            operation = operation.plus(product(exterior, symmetric, budget), r % 2 == 0 ? -r : r);
        }
        return product(operation, factor, budget);
    }

    /** What has the symmetry of a Young diagram among the tensors over a sum, decomposed; see {@link SchurFunctor}. */
    default Decomposition<I> schurFunctor(Decomposition<I> sum, Partition diagram, Budget budget) {
        if (sum.isActual() && dimension(sum).compareTo(BigInteger.valueOf(diagram.length())) < 0) {
            return Decomposition.zero();
        }
        SchurFunctor.AdamsProduct<I> adams = (power, factor, allowed) -> {
            Decomposition<I> total = Decomposition.zero();
            for (var term : sum.multiplicities().entrySet()) {
                total = total.plus(adamsProduct(term.getKey(), power, factor, allowed), term.getValue());
            }
            return total;
        };
        return SchurFunctor.of(adams, trivial(), diagram, budget);
    }

    /** See {@link #schurFunctor(Decomposition, Partition, Budget)}. */
    default Decomposition<I> schurFunctor(I irrep, Partition diagram, Budget budget) {
        return schurFunctor(Decomposition.of(irrep), diagram, budget);
    }

    /** The dimension of a sum. */
    default BigInteger dimension(Decomposition<I> sum) {
        BigInteger total = BigInteger.ZERO;
        for (var term : sum.multiplicities().entrySet()) {
            total = total.add(dimension(term.getKey()).multiply(BigInteger.valueOf(term.getValue())));
        }
        return total;
    }
}
