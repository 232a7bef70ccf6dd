package irreproof.engine.lie;

import irreproof.engine.Rational;
import java.math.BigInteger;

/**
 * Numbers that belong to an irrep, in closed form from the highest weight. Linear in the rank for classical algebras
 * beside {@link WeylDimension}; any rank.
 */
public final class Invariants {
    private Invariants() {}

    /**
     * The quadratic Casimir (w, w + 2 rho) / 2 with long roots of squared length 2: SU(N)'s fundamental irrep has
     * (N^2-1)/2N, the adjoint irrep has the dual Coxeter number.
     */
    public static Rational quadraticCasimir(SimpleAlgebra algebra, DominantWeight weight) {
        algebra.requireWeight(weight);
        return switch (algebra.series()) {
            case A, B, C, D -> {
                DominantWeight zero = DominantWeight.of(new int[algebra.rank()]);
                Rational shifted = classicalSquare(algebra, OrthogonalCoordinates.of(algebra, weight, 1));
                Rational rho = classicalSquare(algebra, OrthogonalCoordinates.of(algebra, zero, 1));
                yield shifted.minus(rho).dividedBy(Rational.of(2));
            }
            case E, F, G -> {
                RootSystem system = RootSystem.of(algebra);
                long[] labels = new long[algebra.rank()];
                long[] labelsPlusTwo = new long[algebra.rank()];
                for (int i = 0; i < labels.length; i++) {
                    labels[i] = weight.label(i);
                    labelsPlusTwo[i] = labels[i] + 2;
                }
                yield Rational.of(system.form(labels, labelsPlusTwo), 2 * system.formDenominator());
            }
        };
    }

    /** From twice the coordinates; in A_n the component along (1,...,1) is taken off, in C_n a long root is 2 e_i. */
    private static Rational classicalSquare(SimpleAlgebra algebra, long[] doubled) {
        BigInteger squares = powerSum(doubled, 2);
        BigInteger sum = powerSum(doubled, 1);
        return switch (algebra.series()) {
            case A ->
                Rational.of(squares)
                        .minus(new Rational(sum.pow(2), BigInteger.valueOf(doubled.length)))
                        .dividedBy(Rational.of(4));
            case C -> new Rational(squares, BigInteger.valueOf(8));
            case B, D, E, F, G -> new Rational(squares, BigInteger.valueOf(4));
        };
    }

    private static BigInteger powerSum(long[] values, int exponent) {
        BigInteger total = BigInteger.ZERO;
        for (long value : values) {
            total = total.add(BigInteger.valueOf(value).pow(exponent));
        }
        return total;
    }

    /**
     * The index l of Slansky: 1 for the fundamental irrep of SU(N) and Sp(2n), 2 for the vector of SO(N) with N from 5;
     * twice the T that is 1/2 for SU(N)'s fundamental irrep. Equals 2 dim C_2 / dim(adjoint).
     */
    public static BigInteger dynkinIndex(SimpleAlgebra algebra, DominantWeight weight) {
        return Rational.of(WeylDimension.dimension(algebra, weight))
                .times(quadraticCasimir(algebra, weight))
                .times(Rational.of(2, algebra.dimension()))
                .toIntegerExact();
    }

    /** The index in a normalisation of one's choice. */
    public static Rational dynkinIndex(SimpleAlgebra algebra, DominantWeight weight, IndexNormalisation normalisation) {
        return Rational.of(dynkinIndex(algebra, weight)).times(normalisation.fundamental());
    }

    /**
     * The quadratic Casimir that goes with the index of this normalisation: its value times the dimension of the irrep is
     * the index times the dimension of the algebra.
     */
    public static Rational quadraticCasimir(
            SimpleAlgebra algebra, DominantWeight weight, IndexNormalisation normalisation) {
        return quadraticCasimir(algebra, weight).times(Rational.of(2)).times(normalisation.fundamental());
    }

    /**
     * By the sign of the invariant bilinear form of a self-dual irrep, (-1)^(w, 2 rho^vee): Bourbaki, Lie VIII, 7.5,
     * proposition 12.
     */
    public static Reality reality(SimpleAlgebra algebra, DominantWeight weight) {
        if (!Conjugation.conjugate(algebra, weight).equals(weight)) {
            return Reality.COMPLEX;
        }
        int n = algebra.rank();
        // the parity of the pairing of each fundamental weight with 2 rho^vee, read off the plates
        long parity = switch (algebra.series()) {
            case A -> n % 2 == 1 && ((n + 1) / 2) % 2 == 1 ? weight.label((n - 1) / 2) : 0;
            case B -> n % 4 == 1 || n % 4 == 2 ? weight.label(n - 1) : 0;
            case C -> CongruenceClass.of(algebra, weight).value();
            case D -> n % 4 == 2 ? (long) weight.label(n - 2) + weight.label(n - 1) : 0;
            case E -> n == 7 ? CongruenceClass.of(algebra, weight).value() : 0;
            case F, G -> 0;
        };
        return parity % 2 == 0 ? Reality.REAL : Reality.PSEUDOREAL;
    }

    /**
     * The cubic anomaly coefficient of SU(N), 1 for the fundamental irrep, odd under conjugation, 0 for SU(2): the
     * dimension times the cubic power sum of the traceless shifted coordinates, the only odd cubic invariant (Okubo 1977).
     *
     * @throws IllegalArgumentException if the algebra is not A_n
     */
    public static BigInteger cubicAnomaly(SimpleAlgebra algebra, DominantWeight weight) {
        if (algebra.series() != Series.A) {
            throw new IllegalArgumentException("the cubic anomaly belongs to SU(N), not to " + algebra);
        }
        algebra.requireWeight(weight);
        if (algebra.rank() == 1) {
            return BigInteger.ZERO;
        }
        int[] fundamental = new int[algebra.rank()];
        fundamental[0] = 1;
        BigInteger unit = tracelessCube(algebra, DominantWeight.of(fundamental))
                .multiply(BigInteger.valueOf(algebra.rank() + 1L));
        BigInteger value = tracelessCube(algebra, weight).multiply(WeylDimension.dimension(algebra, weight));
        return new Rational(value, unit).toIntegerExact();
    }

    /** Eight N^3 times the sum of the cubes of the traceless coordinates of weight + rho. */
    private static BigInteger tracelessCube(SimpleAlgebra algebra, DominantWeight weight) {
        long[] doubled = OrthogonalCoordinates.of(algebra, weight, 1);
        BigInteger degree = BigInteger.valueOf(doubled.length);
        BigInteger sum = powerSum(doubled, 1);
        BigInteger total = BigInteger.ZERO;
        for (long value : doubled) {
            total = total.add(
                    BigInteger.valueOf(value).multiply(degree).subtract(sum).pow(3));
        }
        return total;
    }
}
