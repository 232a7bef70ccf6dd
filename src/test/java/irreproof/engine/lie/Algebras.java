package irreproof.engine.lie;

import java.util.ArrayList;
import java.util.List;

/** Every simple Lie algebra up to a rank, for tests over all types. */
final class Algebras {
    private Algebras() {}

    static List<SimpleAlgebra> upToRank(int limit) {
        List<SimpleAlgebra> algebras = new ArrayList<>();
        for (Series series : Series.values()) {
            for (int rank = 1; rank <= limit; rank++) {
                boolean exists = switch (series) {
                    case A -> true;
                    case B, C -> rank >= 2;
                    case D -> rank >= 3;
                    case E -> rank >= 6 && rank <= 8;
                    case F -> rank == 4;
                    case G -> rank == 2;
                };
                if (exists) {
                    algebras.add(new SimpleAlgebra(series, rank));
                }
            }
        }
        return algebras;
    }
}
