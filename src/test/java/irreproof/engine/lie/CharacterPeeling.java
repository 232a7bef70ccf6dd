package irreproof.engine.lie;

import irreproof.budget.Budget;
import irreproof.engine.Decomposition;
import java.util.Collections;
import java.util.HashMap;
import java.util.Map;

/** The second way to a product, for tests: multiply the full characters weight by weight, then peel highest weights. */
final class CharacterPeeling {
    private CharacterPeeling() {}

    static Decomposition<DominantWeight> product(SimpleAlgebra algebra, DominantWeight left, DominantWeight right) {
        RootSystem system = RootSystem.of(algebra);
        Map<DominantWeight, Long> dominant = new HashMap<>();
        Map<int[], Long> other = weights(system, right);
        weights(system, left)
                .forEach((a, countA) -> other.forEach((b, countB) -> {
                    int[] sum = a.clone();
                    boolean inside = true;
                    for (int i = 0; i < sum.length; i++) {
                        sum[i] += b[i];
                        inside &= sum[i] >= 0;
                    }
                    if (inside) {
                        dominant.merge(DominantWeight.of(sum), countA * countB, Long::sum);
                    }
                }));
        return peel(algebra, dominant);
    }

    /** Every weight once, with its multiplicity. */
    static Map<int[], Long> weights(RootSystem system, DominantWeight highest) {
        Map<int[], Long> all = new HashMap<>();
        Budget budget = Budget.unlimited();
        DominantCharacter.of(system.algebra(), highest, budget)
                .forEach((dominant, count) ->
                        WeylOrbit.forEach(system, dominant, budget, weight -> all.put(weight.clone(), count)));
        return all;
    }

    private static Decomposition<DominantWeight> peel(SimpleAlgebra algebra, Map<DominantWeight, Long> dominant) {
        RootSystem system = RootSystem.of(algebra);
        Map<DominantWeight, Long> result = new HashMap<>();
        while (!dominant.isEmpty()) {
            DominantWeight highest =
                    Collections.max(dominant.keySet(), (a, b) -> Long.compare(height(system, a), height(system, b)));
            long count = dominant.get(highest);
            result.put(highest, count);
            DominantCharacter.of(algebra, highest, Budget.unlimited())
                    .forEach((weight, times) -> dominant.merge(weight, -times * count, Long::sum));
            dominant.values().removeIf(rest -> rest == 0);
        }
        return Decomposition.of(result);
    }

    /** The form with the sum of the fundamental weights grows along every positive root. */
    private static long height(RootSystem system, DominantWeight weight) {
        long[] labels = new long[weight.rank()];
        long[] ones = new long[weight.rank()];
        for (int i = 0; i < labels.length; i++) {
            labels[i] = weight.label(i);
            ones[i] = 1;
        }
        return system.form(labels, ones);
    }
}
