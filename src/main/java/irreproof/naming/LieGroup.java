package irreproof.naming;

import irreproof.engine.lie.SimpleAlgebra;

/**
 * A simple Lie group as authors name it: the family decides how its irreps are called, the algebra what they are.
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
}
