package irreproof.engine.lie;

import irreproof.engine.Rational;

/** What the Dynkin index of SU(N)'s fundamental irrep is taken to be; the quadratic Casimir goes with it. */
public enum IndexNormalisation {
    /** Slansky's l: 1 for the fundamental irrep of SU(N), long roots of squared length 2 with (w, w + 2 rho). */
    FUNDAMENTAL_ONE(Rational.ONE),
    /** The T of gauge theory: 1/2 for the fundamental irrep of SU(N), tr(T_a T_b) = delta_ab / 2. */
    FUNDAMENTAL_HALF(Rational.of(1, 2));

    private final Rational fundamental;

    IndexNormalisation(Rational fundamental) {
        this.fundamental = fundamental;
    }

    /** The index of SU(N)'s fundamental irrep. */
    public Rational fundamental() {
        return fundamental;
    }
}
