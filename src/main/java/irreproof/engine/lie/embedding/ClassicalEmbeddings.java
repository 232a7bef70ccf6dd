package irreproof.engine.lie.embedding;

import irreproof.budget.Budget;
import irreproof.engine.lie.Embedding;
import irreproof.engine.lie.Series;
import irreproof.engine.lie.SimpleAlgebra;
import java.math.BigInteger;

/**
 * The families of subalgebras of SU(N), SO(N) and Sp(N), for any rank, each by the representation in which its matrices
 * act ({@link MatrixEmbedding}). Factors stand in the order of the arguments; low ranks go by the names that tables use
 * ({@link DefiningRepresentation#orthogonal}).
 */
public final class ClassicalEmbeddings {
    private ClassicalEmbeddings() {}

    /** SU(n+m) to SU(n) x SU(m) x U(1), charges coprime and positive on the first: SU(5) has 2 on the SU(3) triplet. */
    public static Embedding unitarySum(int n, int m, Budget budget) {
        int divisor = BigInteger.valueOf(n).gcd(BigInteger.valueOf(m)).intValue();
        DefiningRepresentation left = DefiningRepresentation.unitary(n)
                .times(DefiningRepresentation.unitary(m).one());
        DefiningRepresentation right = DefiningRepresentation.unitary(n).one().times(DefiningRepresentation.unitary(m));
        DefiningRepresentation both = left.times(DefiningRepresentation.line(m / divisor))
                .and(right.times(DefiningRepresentation.line(-n / divisor)));
        return MatrixEmbedding.of(unitary(n + m), both, "SU(n) x SU(m) x U(1) in SU(n+m)", budget);
    }

    /** SU(nm) to SU(n) x SU(m). */
    public static Embedding unitaryProduct(int n, int m, Budget budget) {
        DefiningRepresentation product = DefiningRepresentation.unitary(n).times(DefiningRepresentation.unitary(m));
        return MatrixEmbedding.of(unitary(n * m), product, "tensor product SU(n) x SU(m) in SU(nm)", budget);
    }

    /** SU(n) to SO(n). */
    public static Embedding orthogonalInUnitary(int n, Budget budget) {
        return MatrixEmbedding.of(unitary(n), DefiningRepresentation.orthogonal(n), "SO(n) in SU(n)", budget);
    }

    /** SU(n) to Sp(n), n even. */
    public static Embedding symplecticInUnitary(int n, Budget budget) {
        return MatrixEmbedding.of(unitary(n), DefiningRepresentation.symplectic(n), "Sp(n) in SU(n)", budget);
    }

    /** SO(n+m) to SO(n) x SO(m); the vector of an SO(2) has charges 1 and -1. */
    public static Embedding orthogonalSum(int n, int m, Budget budget) {
        DefiningRepresentation sum = DefiningRepresentation.orthogonal(n).plus(DefiningRepresentation.orthogonal(m));
        return MatrixEmbedding.of(orthogonal(n + m), sum, "SO(n) x SO(m) in SO(n+m)", budget);
    }

    /** SO(nm) to SO(n) x SO(m). */
    public static Embedding orthogonalProduct(int n, int m, Budget budget) {
        DefiningRepresentation product =
                DefiningRepresentation.orthogonal(n).times(DefiningRepresentation.orthogonal(m));
        return MatrixEmbedding.of(orthogonal(n * m), product, "tensor product SO(n) x SO(m) in SO(nm)", budget);
    }

    /** SO(nm) to Sp(n) x Sp(m), both even. */
    public static Embedding symplecticProduct(int n, int m, Budget budget) {
        DefiningRepresentation product =
                DefiningRepresentation.symplectic(n).times(DefiningRepresentation.symplectic(m));
        return MatrixEmbedding.of(orthogonal(n * m), product, "tensor product Sp(n) x Sp(m) in SO(nm)", budget);
    }

    /** SO(2n) to SU(n) x U(1), charge 1 on the SU(n) fundamental in the vector. */
    public static Embedding unitaryInOrthogonal(int n, Budget budget) {
        return MatrixEmbedding.of(orthogonal(2 * n), doubled(n), "SU(n) x U(1) in SO(2n)", budget);
    }

    /** Sp(2n) to SU(n) x U(1), charge 1 on the SU(n) fundamental. */
    public static Embedding unitaryInSymplectic(int n, Budget budget) {
        return MatrixEmbedding.of(symplectic(2 * n), doubled(n), "SU(n) x U(1) in Sp(2n)", budget);
    }

    private static DefiningRepresentation doubled(int n) {
        DefiningRepresentation half = DefiningRepresentation.unitary(n).times(DefiningRepresentation.line(1));
        return half.and(half.conjugate());
    }

    /** Sp(n+m) to Sp(n) x Sp(m), both even. */
    public static Embedding symplecticSum(int n, int m, Budget budget) {
        DefiningRepresentation sum = DefiningRepresentation.symplectic(n).plus(DefiningRepresentation.symplectic(m));
        return MatrixEmbedding.of(symplectic(n + m), sum, "Sp(n) x Sp(m) in Sp(n+m)", budget);
    }

    /** Sp(nm) to Sp(n) x SO(m), n even. */
    public static Embedding mixedProduct(int n, int m, Budget budget) {
        DefiningRepresentation product =
                DefiningRepresentation.symplectic(n).times(DefiningRepresentation.orthogonal(m));
        return MatrixEmbedding.of(symplectic(n * m), product, "tensor product Sp(n) x SO(m) in Sp(nm)", budget);
    }

    /** SO(8) to Spin(7), whose spinor is the vector of SO(8). */
    public static Embedding spinSeven(Budget budget) {
        DefiningRepresentation spinor = DefiningRepresentation.of(new SimpleAlgebra(Series.B, 3), 0, 0, 1);
        return MatrixEmbedding.of(orthogonal(8), spinor, "Spin(7) in SO(8)", budget);
    }

    private static SimpleAlgebra unitary(int n) {
        return new SimpleAlgebra(Series.A, n - 1);
    }

    /** SO(3) as A1 would have the wrong defining irrep, SO(4) is not simple: from SO(5). */
    private static SimpleAlgebra orthogonal(int n) {
        return new SimpleAlgebra(n % 2 == 1 ? Series.B : Series.D, n / 2);
    }

    private static SimpleAlgebra symplectic(int n) {
        return new SimpleAlgebra(Series.C, n / 2);
    }
}
