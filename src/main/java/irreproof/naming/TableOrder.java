package irreproof.naming;

import irreproof.engine.lie.DominantWeight;
import irreproof.engine.lie.SimpleAlgebra;
import java.util.Comparator;
import java.util.stream.IntStream;

/**
 * The order in which published tables compare Dynkin labels: node by node in Slansky's numbering ({@link
 * DynkinNumbering}), the larger label first. D_n with even n > 4 begins with the last node, so that the spinor named
 * without a prime comes first; B2 and D3 follow C2 and A3, whose names they share.
 */
final class TableOrder implements Comparator<DominantWeight> {
    private final int[] nodes;

    private TableOrder(int[] nodes) {
        this.nodes = nodes;
    }

    static TableOrder of(SimpleAlgebra algebra) {
        int rank = algebra.rank();
        TableOrder natural = new TableOrder(DynkinNumbering.slansky(algebra));
        return switch (algebra.series()) {
            case A, C, E, F, G -> natural;
            case B -> rank == 2 ? natural.startingWith(1) : natural;
            case D -> {
                if (rank == 3) {
                    yield natural.startingWith(1);
                }
                yield rank > 4 && rank % 2 == 0 ? natural.startingWith(rank - 1) : natural;
            }
        };
    }

    /** The same order with one node compared before all others. */
    TableOrder startingWith(int node) {
        return new TableOrder(
                IntStream.concat(IntStream.of(node), IntStream.of(nodes)).toArray());
    }

    @Override
    public int compare(DominantWeight left, DominantWeight right) {
        for (int node : nodes) {
            int difference = Integer.compare(right.label(node), left.label(node));
            if (difference != 0) {
                return difference;
            }
        }
        return 0;
    }
}
