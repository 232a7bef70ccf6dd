package irreproof.naming;

import irreproof.engine.lie.DominantWeight;
import irreproof.engine.lie.SimpleAlgebra;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.IntStream;

/**
 * In which order authors write Dynkin labels: as Bourbaki numbers the nodes (Lie IV-VI, plates I-IX), or as Dynkin and
 * Slansky do (Slansky, Phys. Rept. 79, 1981; from memory). The two differ for E6, E7, E8, where Slansky writes the node
 * off the chain last, and for G2, where he writes the long root first.
 */
public final class DynkinNumbering {
    private DynkinNumbering() {}

    /** Bourbaki's node (from 0) at each place of Slansky's order. */
    static int[] slansky(SimpleAlgebra algebra) {
        int rank = algebra.rank();
        return switch (algebra.series()) {
            case A, B, C, D, F -> IntStream.range(0, rank).toArray();
            case E ->
                IntStream.range(0, rank)
                        .map(place -> place == 0 ? 0 : place == rank - 1 ? 1 : place + 1)
                        .toArray();
            case G -> new int[] {1, 0};
        };
    }

    /**
     * The irreps that written Dynkin labels can denote: read in Bourbaki's order first, then in Slansky's where it gives
     * another irrep.
     *
     * @return empty if their number is not the rank, or one is negative
     */
    public static List<Candidate> candidates(LieGroup group, int... written) {
        if (written.length != group.algebra().rank() || IntStream.of(written).anyMatch(label -> label < 0)) {
            return List.of();
        }
        List<Candidate> candidates = new ArrayList<>();
        DominantWeight bourbaki = DominantWeight.of(written);
        candidates.add(new Candidate(bourbaki, Custom.TABLES));
        int[] nodes = slansky(group.algebra());
        int[] labels = new int[written.length];
        for (int place = 0; place < nodes.length; place++) {
            labels[nodes[place]] = written[place];
        }
        DominantWeight slansky = DominantWeight.of(labels);
        if (!slansky.equals(bourbaki)) {
            candidates.add(new Candidate(slansky, Custom.MIRRORED));
        }
        return List.copyOf(candidates);
    }

    /** The labels of an irrep as Slansky orders them. */
    public static List<Integer> inSlanskysOrder(LieGroup group, DominantWeight irrep) {
        return IntStream.of(slansky(group.algebra())).map(irrep::label).boxed().toList();
    }
}
