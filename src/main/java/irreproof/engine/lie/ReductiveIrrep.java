package irreproof.engine.lie;

import irreproof.engine.Rational;
import java.util.List;

/**
 * An irrep of a reductive algebra: a highest weight for each simple factor, a charge for each u(1). Ordered by the
 * weights, factor by factor, then by the charges.
 */
public record ReductiveIrrep(List<DominantWeight> weights, List<Rational> charges)
        implements Comparable<ReductiveIrrep> {
    public ReductiveIrrep {
        weights = List.copyOf(weights);
        charges = List.copyOf(charges);
    }

    @Override
    public int compareTo(ReductiveIrrep other) {
        for (int i = 0; i < weights.size(); i++) {
            int byWeight = weights.get(i).compareTo(other.weights.get(i));
            if (byWeight != 0) {
                return byWeight;
            }
        }
        for (int i = 0; i < charges.size(); i++) {
            int byCharge = charges.get(i).compareTo(other.charges.get(i));
            if (byCharge != 0) {
                return byCharge;
            }
        }
        return 0;
    }
}
