package irreproof.naming;

import irreproof.engine.lie.DominantWeight;
import irreproof.engine.lie.SimpleAlgebra;
import java.util.Comparator;
import java.util.stream.IntStream;

/**
 * The order in which published tables compare Dynkin labels: Dynkin's numbering of the nodes as Slansky (Phys. Rept. 79,
 * 1981; from memory) has it, the larger label first. D_n with even n > 4 begins with the last node, so that the spinor
 * named without a prime comes first; B2 and D3 follow C2 and A3, whose names they share.
 */
final class TableOrder implements Comparator<DominantWeight> {
    private final int[] nodes;

    private TableOrder(int[] nodes) {
        this.nodes = nodes;
    }

    static TableOrder of(SimpleAlgebra algebra) {
        int rank = algebra.rank();
        return new TableOrder(
                switch (algebra.series()) {
                    case A, C, F -> natural(rank);
                    case B -> rank == 2 ? new int[] {1, 0} : natural(rank);
                    case D -> {
                        if (rank == 3) {
                            yield new int[] {1, 0, 2};
                        }
                        yield rank > 4 && rank % 2 == 0
                                ? IntStream.concat(IntStream.of(rank - 1), IntStream.range(0, rank - 1))
                                        .toArray()
                                : natural(rank);
                    }
                    case E ->
                        IntStream.range(0, rank)
                                .map(position -> position == 0 ? 0 : position == rank - 1 ? 1 : position + 1)
                                .toArray();
                    case G -> new int[] {1, 0};
                });
    }

    private static int[] natural(int rank) {
        return IntStream.range(0, rank).toArray();
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
