package irreproof.naming;

import irreproof.engine.Rational;
import irreproof.engine.lie.DominantWeight;
import java.math.BigInteger;
import java.util.Optional;

/** The irreps of SU(2) by spin: spin j has the Dynkin label 2j and the dimension 2j+1. */
public final class Spins {
    private static final BigInteger LARGEST_LABEL = BigInteger.valueOf(Integer.MAX_VALUE);

    private Spins() {}

    /**
     * The irrep of spin numerator/denominator.
     *
     * @return empty unless the spin is a non-negative multiple of 1/2 within the range of labels
     */
    public static Optional<DominantWeight> irrep(BigInteger numerator, int denominator) {
        Rational label = new Rational(numerator, BigInteger.valueOf(denominator)).times(Rational.of(2));
        boolean exists =
                label.isInteger() && label.signum() >= 0 && label.numerator().compareTo(LARGEST_LABEL) <= 0;
        return exists ? Optional.of(DominantWeight.of(label.numerator().intValueExact())) : Optional.empty();
    }

    /**
     * The spin of an irrep of A1.
     *
     * @throws IllegalArgumentException for a weight of another rank
     */
    public static Rational spin(DominantWeight irrep) {
        if (irrep.rank() != 1) {
            throw new IllegalArgumentException(irrep + " is no irrep of SU(2)");
        }
        return Rational.of(irrep.label(0), 2);
    }
}
