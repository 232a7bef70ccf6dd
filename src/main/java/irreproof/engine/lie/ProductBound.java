package irreproof.engine.lie;

import java.math.BigInteger;

/**
 * A lower bound on the number of irreps in a product, without forming it: for pairwise unjoined nodes i and numbers k_i
 * up to the smaller of the two labels there, the sum of the highest weights less k_i simple roots occurs (it does so in
 * the product of SU(2)s that belongs to these nodes). The Dynkin diagram is a tree, so its nodes fall into two such sets.
 */
final class ProductBound {
    private ProductBound() {}

    static BigInteger leastIrreps(SimpleAlgebra algebra, DominantWeight left, DominantWeight right) {
        BigInteger[] counts = {BigInteger.ONE, BigInteger.ONE};
        for (int node = 0; node < left.rank(); node++) {
            int colour = colour(algebra, node);
            int smaller = Math.min(left.label(node), right.label(node));
            counts[colour] = counts[colour].multiply(BigInteger.valueOf(1L + smaller));
        }
        return counts[0].max(counts[1]);
    }

    /** Joined nodes have different colours: along the chain by parity, off the chain by hand. */
    private static int colour(SimpleAlgebra algebra, int node) {
        return switch (algebra.series()) {
            case A, B, C, F, G -> node % 2;
            case D -> node == algebra.rank() - 1 ? (node - 1) % 2 : node % 2;
            // the chain 1-3-4-5-..., with node 2 joined to node 4
            case E -> node == 0 ? 1 : node == 1 ? 0 : node % 2;
        };
    }
}
