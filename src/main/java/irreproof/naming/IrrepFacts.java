package irreproof.naming;

import irreproof.engine.Rational;
import irreproof.engine.lie.DominantWeight;
import irreproof.engine.lie.Reality;
import java.math.BigInteger;
import java.util.List;
import java.util.Optional;

/**
 * What there is to say about one irrep of a simple Lie group.
 *
 * @param label the name in the published tables; empty if the search for it outgrew the budget
 * @param youngRows row lengths of the Young diagram; empty for groups other than SU(n)
 * @param index Slansky's index l, twice T
 * @param casimir the quadratic Casimir C_2, normalised like T: dimension times C_2 is T times the group's dimension
 * @param reality for the compact form
 * @param anomaly the cubic anomaly coefficient, 1 for the fundamental irrep; empty unless the group is SU(n), n from 3
 * @param spin empty unless the algebra is that of SU(2)
 * @param lines the same in words, for display
 */
public record IrrepFacts(
        LieGroup group,
        DominantWeight irrep,
        Optional<IrrepLabel> label,
        BigInteger dimension,
        Optional<List<Integer>> youngRows,
        BigInteger index,
        Rational casimir,
        Reality reality,
        Optional<BigInteger> anomaly,
        Optional<Rational> spin,
        List<Line> lines) {
    public IrrepFacts {
        lines = List.copyOf(lines);
    }

    /** One fact in words: {@code index} and {@code l = 6, T = 3 (the 3 has l = 1)}. A value may have several lines. */
    public record Line(String label, String value) {}
}
