package irreproof.engine.lie;

import java.math.BigInteger;
import java.util.Map;
import java.util.concurrent.ConcurrentHashMap;

/**
 * Weyl's dimension formula, the product over the positive coroots of (weight + rho, coroot) / (rho, coroot). Classical
 * algebras: in orthogonal coordinates, quadratic in the rank and without a table, for any rank. Exceptional algebras:
 * over the list of positive coroots. Factors that cancel (the coroot does not see the weight) are not multiplied.
 */
public final class WeylDimension {
    private static final Map<SimpleAlgebra, int[][]> EXCEPTIONAL_COROOTS = new ConcurrentHashMap<>();

    private WeylDimension() {}

    /** The dimension of the irrep with this highest weight. */
    public static BigInteger dimension(SimpleAlgebra algebra, DominantWeight weight) {
        algebra.requireWeight(weight);
        return switch (algebra.series()) {
            case A, B, C, D -> classical(algebra, weight);
            case E, F, G -> exceptional(algebra, weight);
        };
    }

    private static BigInteger classical(SimpleAlgebra algebra, DominantWeight weight) {
        long[] shifted = OrthogonalCoordinates.of(algebra, weight, 1);
        long[] rho = OrthogonalCoordinates.of(algebra, zero(algebra.rank()), 1);
        Quotient quotient = new Quotient();
        boolean sums = algebra.series() != Series.A;
        for (int i = 0; i < shifted.length; i++) {
            for (int j = i + 1; j < shifted.length; j++) {
                quotient.factor(shifted[i] - shifted[j], rho[i] - rho[j]);
                if (sums) {
                    quotient.factor(shifted[i] + shifted[j], rho[i] + rho[j]);
                }
            }
            if (algebra.series() == Series.B || algebra.series() == Series.C) {
                quotient.factor(shifted[i], rho[i]);
            }
        }
        return quotient.value();
    }

    private static DominantWeight zero(int rank) {
        return DominantWeight.of(new int[rank]);
    }

    private static BigInteger exceptional(SimpleAlgebra algebra, DominantWeight weight) {
        // at most five keys: E6, E7, E8, F4, G2
        int[][] coroots = EXCEPTIONAL_COROOTS.computeIfAbsent(algebra, WeylDimension::positiveCoroots);
        int rank = algebra.rank();
        Quotient quotient = new Quotient();
        for (int[] coroot : coroots) {
            long paired = 0;
            for (int i = 0; i < rank; i++) {
                paired += (long) coroot[i] * weight.label(i);
            }
            quotient.factor(paired + coroot[rank], coroot[rank]);
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

    /** A product of fractions, held in machine words while it fits. */
    private static final class Quotient {
        private final Product numerator = new Product();
        private final Product denominator = new Product();

        void factor(long above, long below) {
            if (above != below) {
                numerator.multiply(above);
                denominator.multiply(below);
            }
        }

        BigInteger value() {
            return numerator.value().divide(denominator.value());
        }
    }

    private static final class Product {
        private long small = 1;
        private BigInteger large = BigInteger.ONE;

        void multiply(long factor) {
            long low = small * factor;
            if (Math.multiplyHigh(small, factor) != low >> 63) {
                large = large.multiply(BigInteger.valueOf(small));
                small = factor;
            } else {
                small = low;
            }
        }

        BigInteger value() {
            return large.multiply(BigInteger.valueOf(small));
        }
    }
}
