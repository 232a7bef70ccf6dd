package irreproof.engine.lie.embedding;

import irreproof.budget.Budget;
import irreproof.engine.Decomposition;
import irreproof.engine.Rational;
import irreproof.engine.lie.LieRing;
import irreproof.engine.lie.ReductiveAlgebra;
import irreproof.engine.lie.ReductiveIrrep;
import irreproof.engine.lie.RootSystem;
import irreproof.engine.lie.SimpleAlgebra;
import irreproof.engine.lie.WeylOrbit;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.List;

/**
 * All weights of a representation of a reductive algebra, each as often as it occurs, in descending order. The order is
 * total and respects sums: first the form with rho, so that positive roots are positive, then the labels, then charges.
 */
final class WeightSystem {
    private final ReductiveAlgebra algebra;
    private final long scale;
    private final List<long[]> weights = new ArrayList<>();

    private WeightSystem(ReductiveAlgebra algebra, long scale) {
        this.algebra = algebra;
        this.scale = scale;
    }

    static WeightSystem of(ReductiveAlgebra algebra, Decomposition<ReductiveIrrep> sum, Budget budget) {
        BigInteger scale = BigInteger.ONE;
        for (ReductiveIrrep irrep : sum.multiplicities().keySet()) {
            for (Rational charge : irrep.charges()) {
                scale = scale.multiply(charge.denominator()).divide(scale.gcd(charge.denominator()));
            }
        }
        WeightSystem system = new WeightSystem(algebra, scale.longValueExact());
        sum.multiplicities().forEach((irrep, count) -> {
            for (long[] weight : system.weightsOf(irrep, budget)) {
                for (long i = 0; i < count; i++) {
                    system.weights.add(weight);
                }
            }
        });
        system.weights.sort(system.order().reversed());
        return system;
    }

    private List<long[]> weightsOf(ReductiveIrrep irrep, Budget budget) {
        List<long[]> result = List.of(new long[0]);
        for (int i = 0; i < irrep.weights().size(); i++) {
            SimpleAlgebra factor = algebra.factors().get(i);
            List<long[]> longer = new ArrayList<>();
            List<long[]> shorter = result;
            new LieRing(factor)
                    .character(irrep.weights().get(i), budget)
                    .forEach((dominant, count) -> WeylOrbit.forEach(RootSystem.of(factor), dominant, budget, weight -> {
                        budget.spend(count * shorter.size());
                        for (long[] start : shorter) {
                            for (long k = 0; k < count; k++) {
                                longer.add(joined(start, weight));
                            }
                        }
                    }));
            result = longer;
        }
        long[] charges = irrep.charges().stream()
                .mapToLong(charge ->
                        charge.times(Rational.of(scale)).toIntegerExact().longValueExact())
                .toArray();
        return result.stream()
                .map(start -> {
                    long[] all = Arrays.copyOf(start, start.length + charges.length);
                    System.arraycopy(charges, 0, all, start.length, charges.length);
                    return all;
                })
                .toList();
    }

    private long[] joined(long[] start, int[] weight) {
        long[] all = Arrays.copyOf(start, start.length + weight.length);
        for (int i = 0; i < weight.length; i++) {
            all[start.length + i] = scale * weight[i];
        }
        return all;
    }

    /** What all entries have been multiplied by, so that charges too are whole. */
    long scale() {
        return scale;
    }

    List<long[]> weights() {
        return weights;
    }

    Comparator<long[]> order() {
        long[] rho = new long[algebra.rank()];
        // one common unit for the forms of all factors
        long unit = 1;
        for (SimpleAlgebra factor : algebra.factors()) {
            unit = Math.multiplyExact(unit, RootSystem.of(factor).formDenominator());
        }
        int start = 0;
        for (SimpleAlgebra factor : algebra.factors()) {
            RootSystem system = RootSystem.of(factor);
            for (int i = 0; i < factor.rank(); i++) {
                long sum = 0;
                for (int j = 0; j < factor.rank(); j++) {
                    sum += system.form(i, j);
                }
                rho[start + i] = Math.multiplyExact(sum, unit / system.formDenominator());
            }
            start += factor.rank();
        }
        return Comparator.<long[]>comparingLong(weight -> dot(rho, weight)).thenComparing(Arrays::compare);
    }

    private static long dot(long[] left, long[] right) {
        long sum = 0;
        for (int i = 0; i < left.length; i++) {
            sum = Math.addExact(sum, Math.multiplyExact(left[i], right[i]));
        }
        return sum;
    }
}
