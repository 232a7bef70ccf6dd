package irreproof.engine.lie.embedding;

import irreproof.engine.Decomposition;
import irreproof.engine.Rational;
import irreproof.engine.lie.DominantWeight;
import irreproof.engine.lie.ReductiveAlgebra;
import irreproof.engine.lie.ReductiveIrrep;
import irreproof.engine.lie.ReductiveRing;
import irreproof.engine.lie.Series;
import irreproof.engine.lie.SimpleAlgebra;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.HashMap;
import java.util.List;
import java.util.Map;

/**
 * A representation of a reductive algebra, as the vector space in which it acts: those of SU(n), SO(n) and Sp(2n), by the
 * algebras that tables name for low ranks, and their sums and products over products of groups.
 */
public record DefiningRepresentation(ReductiveAlgebra algebra, Decomposition<ReductiveIrrep> sum) {
    /** Of SU(n); SU(1) is trivial. */
    public static DefiningRepresentation unitary(int n) {
        return n == 1 ? nothing() : first(new SimpleAlgebra(Series.A, n - 1));
    }

    /** Of Sp(n), n even. */
    public static DefiningRepresentation symplectic(int n) {
        return first(n == 2 ? new SimpleAlgebra(Series.A, 1) : new SimpleAlgebra(Series.C, n / 2));
    }

    /** Of SO(n): SO(2) has charge 1 and -1, SO(3) is A1, SO(4) A1+A1, SO(5) C2, SO(6) A3. */
    public static DefiningRepresentation orthogonal(int n) {
        SimpleAlgebra su2 = new SimpleAlgebra(Series.A, 1);
        return switch (n) {
            case 1 -> nothing();
            case 2 -> {
                List<ReductiveIrrep> both = List.of(charge(1), charge(-1));
                yield new DefiningRepresentation(new ReductiveAlgebra(List.of(), 1), Decomposition.sum(both));
            }
            case 3 -> of(su2, 2);
            case 4 -> of(su2, 1).times(of(su2, 1));
            case 5 -> of(new SimpleAlgebra(Series.C, 2), 0, 1);
            case 6 -> of(new SimpleAlgebra(Series.A, 3), 0, 1, 0);
            default -> first(new SimpleAlgebra(n % 2 == 1 ? Series.B : Series.D, n / 2));
        };
    }

    /** The irrep of a simple algebra with these Dynkin labels. */
    public static DefiningRepresentation of(SimpleAlgebra algebra, int... labels) {
        ReductiveIrrep irrep = new ReductiveIrrep(List.of(DominantWeight.of(labels)), List.of());
        return new DefiningRepresentation(ReductiveAlgebra.of(algebra), Decomposition.of(irrep));
    }

    private static DefiningRepresentation first(SimpleAlgebra algebra) {
        int[] labels = new int[algebra.rank()];
        labels[0] = 1;
        return of(algebra, labels);
    }

    private static DefiningRepresentation nothing() {
        ReductiveAlgebra none = new ReductiveAlgebra(List.of(), 0);
        return new DefiningRepresentation(none, Decomposition.of(new ReductiveIrrep(List.of(), List.of())));
    }

    private static ReductiveIrrep charge(long charge) {
        return new ReductiveIrrep(List.of(), List.of(Rational.of(charge)));
    }

    /** One line on which a u(1) acts with this charge. */
    static DefiningRepresentation line(long charge) {
        return new DefiningRepresentation(new ReductiveAlgebra(List.of(), 1), Decomposition.of(charge(charge)));
    }

    /** The tensor product, for the product of both algebras. */
    public DefiningRepresentation times(DefiningRepresentation other) {
        Map<ReductiveIrrep, Long> terms = new HashMap<>();
        sum.multiplicities()
                .forEach((left, count) -> other.sum
                        .multiplicities()
                        .forEach((right, times) -> terms.put(joined(left, right), Math.multiplyExact(count, times))));
        return new DefiningRepresentation(both(other), Decomposition.of(terms));
    }

    /** The direct sum, for the product of both algebras. */
    public DefiningRepresentation plus(DefiningRepresentation other) {
        DefiningRepresentation left = times(other.one());
        return new DefiningRepresentation(left.algebra, left.sum.plus(one().times(other).sum));
    }

    /** The direct sum with another representation of the same algebra. */
    DefiningRepresentation and(DefiningRepresentation other) {
        return new DefiningRepresentation(algebra, sum.plus(other.sum));
    }

    DefiningRepresentation conjugate() {
        ReductiveRing ring = new ReductiveRing(algebra);
        Map<ReductiveIrrep, Long> terms = new HashMap<>();
        sum.multiplicities().forEach((irrep, count) -> terms.put(ring.conjugate(irrep), count));
        return new DefiningRepresentation(algebra, Decomposition.of(terms));
    }

    /** The trivial irrep of the same algebra. */
    DefiningRepresentation one() {
        return new DefiningRepresentation(algebra, Decomposition.of(new ReductiveRing(algebra).trivial()));
    }

    private ReductiveAlgebra both(DefiningRepresentation other) {
        List<SimpleAlgebra> factors = new ArrayList<>(algebra.factors());
        factors.addAll(other.algebra.factors());
        return new ReductiveAlgebra(factors, algebra.charges() + other.algebra.charges());
    }

    private static ReductiveIrrep joined(ReductiveIrrep left, ReductiveIrrep right) {
        List<DominantWeight> weights = new ArrayList<>(left.weights());
        weights.addAll(right.weights());
        List<Rational> charges = new ArrayList<>(left.charges());
        charges.addAll(right.charges());
        return new ReductiveIrrep(weights, charges);
    }

    /** One irrep for each list of labels: an array for each factor, charges none. */
    static DefiningRepresentation sumOf(List<SimpleAlgebra> factors, int[][]... irreps) {
        List<ReductiveIrrep> terms = Arrays.stream(irreps)
                .map(labels -> new ReductiveIrrep(
                        Arrays.stream(labels).map(DominantWeight::of).toList(), List.of()))
                .toList();
        return new DefiningRepresentation(new ReductiveAlgebra(factors, 0), Decomposition.sum(terms));
    }
}
