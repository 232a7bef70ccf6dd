package irreproof.naming;

import irreproof.engine.lie.Series;
import irreproof.engine.lie.SimpleAlgebra;
import java.util.Objects;

/**
 * A simple Lie group as authors name it: the family decides how its irreps are called, the algebra what they are. Two
 * groups are equal if both agree, however they are printed: SU(4), SL(4,R) and SU(2,2) are one setting.
 *
 * @param display as printed in messages: {@code SU(3)}, {@code Sp(4)}, {@code E6}
 * @param degree n of SU(n), SO(n), and 2n of Sp(2n); the rank for exceptional groups
 */
public record LieGroup(String display, Family family, int degree, SimpleAlgebra algebra) {
    /** Families with naming customs of their own. */
    public enum Family {
        SU,
        SO,
        SP,
        EXCEPTIONAL
    }

    /** SU(n). @throws IllegalArgumentException if n is below 2 */
    public static LieGroup su(int degree) {
        return new LieGroup("SU(" + degree + ")", Family.SU, degree, new SimpleAlgebra(Series.A, degree - 1));
    }

    /**
     * SO(n) or a cover of it: SO(3) has the algebra A1, SO(5) B2, SO(6) D3.
     *
     * @throws IllegalArgumentException for n below 3 and for SO(4), which are not simple
     */
    public static LieGroup so(int degree) {
        if (degree < 3 || degree == 4) {
            throw new IllegalArgumentException("SO(" + degree + ") is not simple");
        }
        SimpleAlgebra algebra;
        if (degree == 3) {
            algebra = new SimpleAlgebra(Series.A, 1);
        } else {
            algebra = new SimpleAlgebra(degree % 2 == 0 ? Series.D : Series.B, degree / 2);
        }
        return new LieGroup("SO(" + degree + ")", Family.SO, degree, algebra);
    }

    /**
     * Sp(2n), also written USp(2n); Sp(2) has the algebra A1.
     *
     * @param degree 2n
     * @throws IllegalArgumentException if the degree is odd or below 2
     */
    public static LieGroup sp(int degree) {
        if (degree < 2 || degree % 2 != 0) {
            throw new IllegalArgumentException("no Sp(" + degree + ") in the convention Sp(2n)");
        }
        SimpleAlgebra algebra = degree == 2 ? new SimpleAlgebra(Series.A, 1) : new SimpleAlgebra(Series.C, degree / 2);
        return new LieGroup("Sp(" + degree + ")", Family.SP, degree, algebra);
    }

    /** E6, E7, E8, F4 or G2. @throws IllegalArgumentException for anything else */
    public static LieGroup exceptional(Series series, int rank) {
        boolean classical = switch (series) {
            case A, B, C, D -> true;
            case E, F, G -> false;
        };
        if (classical) {
            throw new IllegalArgumentException("" + series + rank + " is not exceptional");
        }
        return new LieGroup("" + series + rank, Family.EXCEPTIONAL, rank, new SimpleAlgebra(series, rank));
    }

    /** The same group under another printed name. */
    public LieGroup displayed(String name) {
        return new LieGroup(name, family, degree, algebra);
    }

    @Override
    public boolean equals(Object other) {
        return other instanceof LieGroup that
                && family == that.family
                && degree == that.degree
                && algebra.equals(that.algebra);
    }

    @Override
    public int hashCode() {
        return Objects.hash(family, degree, algebra);
    }
}
