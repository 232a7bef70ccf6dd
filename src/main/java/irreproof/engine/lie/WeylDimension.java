package irreproof.engine.lie;

import irreproof.budget.BudgetExceeded;
import java.math.BigInteger;
import java.util.Map;
import java.util.concurrent.ConcurrentHashMap;

/**
 * Weyl's dimension formula, the product over the positive coroots of (weight + rho, coroot) / (rho, coroot). Classical
 * algebras: in orthogonal coordinates and without a table; coordinates that do not differ are passed over in blocks, so
 * small diagrams cost their rows times the rank. Exceptional algebras: over the list of positive coroots.
 */
public final class WeylDimension {
    private static final Map<SimpleAlgebra, int[][]> EXCEPTIONAL_COROOTS = new ConcurrentHashMap<>();

    /** Beyond so many coordinates equal factors are struck out before multiplying. */
    private static final int MANY = 64;

    private static final long MOST_PAIRS = 4_000_000;

    private WeylDimension() {}

    /**
     * The dimension of the irrep with this highest weight.
     *
     * @throws BudgetExceeded (too large) if more than four million coroots see the weight: never up to rank 2000
     */
    public static BigInteger dimension(SimpleAlgebra algebra, DominantWeight weight) {
        algebra.requireWeight(weight);
        return switch (algebra.series()) {
            case A, B, C, D -> classical(algebra, weight);
            case E, F, G -> exceptional(algebra, weight);
        };
    }

    private static BigInteger classical(SimpleAlgebra algebra, DominantWeight weight) {
        long[] plain = OrthogonalCoordinates.of(algebra, weight, 0);
        long[] rho = OrthogonalCoordinates.of(algebra, DominantWeight.of(new int[algebra.rank()]), 1);
        FactorQuotient quotient = new FactorQuotient(plain.length > MANY);
        boolean sums = algebra.series() != Series.A;
        boolean single = algebra.series() == Series.B || algebra.series() == Series.C;
        long pairs = 0;
        int blockEnd = 0;
        for (int i = 0; i < plain.length && plain[i] != 0; i++) {
            while (blockEnd < plain.length && plain[blockEnd] == plain[i]) {
                blockEnd++;
            }
            pairs += plain.length - (sums ? i : blockEnd);
            if (pairs > MOST_PAIRS) {
                throw new BudgetExceeded(
                        BudgetExceeded.Cause.TOO_LARGE, "the dimension of an irrep of " + algebra + " is too large");
            }
            for (int j = blockEnd; j < plain.length; j++) {
                quotient.factor(plain[i] - plain[j] + rho[i] - rho[j], rho[i] - rho[j]);
            }
            for (int j = sums ? i + 1 : plain.length; j < plain.length; j++) {
                quotient.factor(plain[i] + plain[j] + rho[i] + rho[j], rho[i] + rho[j]);
            }
            if (single) {
                quotient.factor(plain[i] + rho[i], rho[i]);
            }
        }
        return quotient.value();
    }

    private static BigInteger exceptional(SimpleAlgebra algebra, DominantWeight weight) {
        // at most five keys: E6, E7, E8, F4, G2
        int[][] coroots = EXCEPTIONAL_COROOTS.computeIfAbsent(algebra, WeylDimension::positiveCoroots);
        int rank = algebra.rank();
        FactorQuotient quotient = new FactorQuotient(false);
        for (int[] coroot : coroots) {
            long paired = 0;
            for (int i = 0; i < rank; i++) {
                paired += (long) coroot[i] * weight.label(i);
            }
            if (paired != 0) {
                quotient.factor(paired + coroot[rank], coroot[rank]);
            }
        }
        return quotient.value();
    }

    /** Coefficients over the simple coroots, followed by their sum. */
    private static int[][] positiveCoroots(SimpleAlgebra algebra) {
        RootSystem system = RootSystem.of(algebra);
        int rank = algebra.rank();
        return system.positiveRoots().stream()
                .map(root -> {
                    int[] coroot = new int[rank + 1];
                    int length = system.length(root);
                    for (int i = 0; i < rank; i++) {
                        coroot[i] = root.coefficient(i) * system.simpleRootLength(i) / length;
                        coroot[rank] += coroot[i];
                    }
                    return coroot;
                })
                .toArray(int[][]::new);
    }
}
