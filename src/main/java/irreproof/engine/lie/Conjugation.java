package irreproof.engine.lie;

/**
 * The dual (complex conjugate) irrep: minus the longest Weyl group element acts on the nodes as the diagram symmetry of
 * A_n, of D_n with odd n, and of E6, and trivially otherwise (Bourbaki, Lie IV-VI, plates, item XI).
 */
public final class Conjugation {
    private Conjugation() {}

    /** The highest weight of the dual irrep. */
    public static DominantWeight conjugate(SimpleAlgebra algebra, DominantWeight weight) {
        algebra.requireWeight(weight);
        int[] labels = weight.labels();
        switch (algebra.series()) {
            case A -> {
                for (int i = 0, j = labels.length - 1; i < j; i++, j--) {
                    swap(labels, i, j);
                }
            }
            case D -> {
                if (algebra.rank() % 2 == 1) {
                    swap(labels, labels.length - 2, labels.length - 1);
                }
            }
            case E -> {
                if (algebra.rank() == 6) {
                    swap(labels, 0, 5);
                    swap(labels, 2, 4);
                }
            }
            case B, C, F, G -> {
                return weight;
            }
        }
        return DominantWeight.of(labels);
    }

    private static void swap(int[] labels, int i, int j) {
        int kept = labels[i];
        labels[i] = labels[j];
        labels[j] = kept;
    }
}
