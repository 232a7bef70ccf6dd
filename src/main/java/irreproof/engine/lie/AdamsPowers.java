package irreproof.engine.lie;

import irreproof.budget.Budget;
import irreproof.engine.Decomposition;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;

/**
 * Symmetric and exterior powers of an irrep by Newton's recursion in the representation ring: n S^n is the sum over k of
 * psi^k S^(n-k), with alternating signs for exterior powers, where the Adams operation psi^k multiplies the weights of the
 * character by k (Macdonald, Symmetric Functions and Hall Polynomials, I.2; Knutson, Lambda-Rings, 1973). Each product
 * with an Adams operation is a Brauer-Klimyk sum.
 *
 * <p>Cost: for each k the weights of the irrep times the irreps of S^(n-k). Rank limit as in {@link RootSystem}.
 */
final class AdamsPowers {
    private AdamsPowers() {}

    /**
     * @param character of the irrep: dominant weights with multiplicities
     * @param exponent 0 or more
     */
    static Decomposition<DominantWeight> power(
            SimpleAlgebra algebra, Map<DominantWeight, Long> character, boolean exterior, int exponent, Budget budget) {
        RootSystem system = RootSystem.of(algebra);
        // psi^k S^(n-k) alone visits every weight once, for each k of each n
        budget.require(BigInteger.valueOf(exponent).pow(2).shiftRight(1), "the power " + exponent);
        List<Decomposition<DominantWeight>> powers = new ArrayList<>();
        powers.add(Decomposition.of(DominantWeight.of(new int[algebra.rank()])));
        for (int n = 1; n <= exponent; n++) {
            Decomposition<DominantWeight> sum = Decomposition.zero();
            for (int k = 1; k <= n; k++) {
                Decomposition<DominantWeight> term =
                        KlimykProduct.scaled(system, character, k, powers.get(n - k), budget);
                sum = sum.plus(term, exterior && k % 2 == 0 ? -1 : 1);
            }
            powers.add(dividedBy(sum, n));
        }
        return powers.get(exponent);
    }

    private static Decomposition<DominantWeight> dividedBy(Decomposition<DominantWeight> sum, int divisor) {
        Map<DominantWeight, Long> quotient = new HashMap<>();
        sum.multiplicities().forEach((weight, count) -> {
            if (count % divisor != 0) {
                throw new IllegalStateException("Newton's recursion leaves a rest at " + weight);
            }
            quotient.put(weight, count / divisor);
        });
        return Decomposition.of(quotient);
    }
}
