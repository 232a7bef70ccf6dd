package irreproof.check.judge;

import irreproof.engine.Decomposition;
import irreproof.engine.lie.DominantWeight;
import irreproof.engine.lie.Series;
import irreproof.naming.LieGroup;
import irreproof.notation.Expression.Bracket;
import irreproof.notation.Expression.ListName;
import java.util.List;
import java.util.Optional;

/**
 * Irreps of SO(n), n from 7, by the rank of a tensor: {@code [p]} an antisymmetric tensor (a p-form), {@code (p)} a
 * traceless symmetric one; {@code [n/2]_+} and {@code [n/2]_-} the self-dual and anti-self-dual halves of SO(2m), of
 * which the first is given to the last node of the diagram; without a sign both together.
 */
final class TensorRanks {
    private TensorRanks() {}

    static Optional<Decomposition<DominantWeight>> value(ListName list, List<Integer> numbers, LieGroup group) {
        if (group.family() != LieGroup.Family.SO || group.degree() < 7 || numbers.size() != 1) {
            return Optional.empty();
        }
        int rank = numbers.get(0);
        if (list.bracket() == Bracket.ROUND) {
            return rank < 0 ? Optional.empty() : Optional.of(Decomposition.of(weight(group, 0, rank)));
        }
        String sign = list.decoration().label();
        return form(rank, sign, group);
    }

    private static Optional<Decomposition<DominantWeight>> form(int rank, String sign, LieGroup group) {
        int nodes = group.algebra().rank();
        int lower = Math.min(rank, group.degree() - rank);
        if (lower < 0) {
            return Optional.empty();
        }
        if (lower == 0) {
            return Optional.of(Decomposition.of(weight(group, 0, 0)));
        }
        boolean even = group.algebra().series() == Series.D;
        if (even && lower == nodes) {
            Decomposition<DominantWeight> selfDual = Decomposition.of(weight(group, nodes - 1, 2));
            Decomposition<DominantWeight> antiSelfDual = Decomposition.of(weight(group, nodes - 2, 2));
            return Optional.of(
                    switch (sign) {
                        case "+" -> selfDual;
                        case "-" -> antiSelfDual;
                        default -> selfDual.plus(antiSelfDual);
                    });
        }
        if (even && lower == nodes - 1) {
            return Optional.of(Decomposition.of(weight(group, nodes - 2, 1, nodes - 1, 1)));
        }
        return Optional.of(Decomposition.of(weight(group, lower - 1, !even && lower == nodes ? 2 : 1)));
    }

    /** Pairs of a node, counted from 0, and its label. */
    private static DominantWeight weight(LieGroup group, int... nodesAndLabels) {
        int[] labels = new int[group.algebra().rank()];
        for (int i = 0; i < nodesAndLabels.length; i += 2) {
            labels[nodesAndLabels[i]] = nodesAndLabels[i + 1];
        }
        return DominantWeight.of(labels);
    }
}
