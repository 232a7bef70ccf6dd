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

    @Override
    public String toString() {
        return series.name() + rank;
    }
}
