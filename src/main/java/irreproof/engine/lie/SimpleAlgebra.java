package irreproof.engine.lie;

/**
 * A simple complex Lie algebra by Cartan type, nodes numbered as in Bourbaki, Lie IV-VI, plates I-IX. Ranks: A from 1,
 * B and C from 2, D from 3 (D3 is A3 with the labels of so(6)), E 6 to 8, F 4, G 2.
 */
public record SimpleAlgebra(Series series, int rank) {
    public SimpleAlgebra {
        boolean exists = switch (series) {
            case A -> rank >= 1;
            case B, C -> rank >= 2;
            case D -> rank >= 3;
            case E -> rank >= 6 && rank <= 8;
            case F -> rank == 4;
            case G -> rank == 2;
        };
        if (!exists) {
            throw new IllegalArgumentException("no simple Lie algebra " + series + rank);
        }
    }

    /** Of the algebra itself, that is of its adjoint representation. */
    public long dimension() {
        long n = rank;
        return switch (series) {
            case A -> n * (n + 2);
            case B, C -> n * (2 * n + 1);
            case D -> n * (2 * n - 1);
            case E -> n == 6 ? 78 : n == 7 ? 133 : 248;
            case F -> 52;
            case G -> 14;
        };
    }

    /** The squared length of a long root in units of a short one: 1, 2 or 3. */
    public int lacing() {
        return switch (series) {
            case A, D, E -> 1;
            case B, C, F -> 2;
            case G -> 3;
        };
    }

    /** @throws IllegalArgumentException if the weight has another number of labels than this algebra has nodes */
    public void requireWeight(DominantWeight weight) {
        if (weight.rank() != rank) {
            throw new IllegalArgumentException(weight + " is not a weight of " + this);
        }
    }

    // equals and hashCode written out: a record's generated ones go through method handles, whose first use costs more
    // than the rest of a short run's algebra

    @Override
    public boolean equals(Object other) {
        return other instanceof SimpleAlgebra that && series == that.series && rank == that.rank;
    }

    @Override
    public int hashCode() {
        return 31 * rank + series.ordinal();
    }

    @Override
    public String toString() {
        return series.name().concat(Integer.toString(rank));
    }
}
