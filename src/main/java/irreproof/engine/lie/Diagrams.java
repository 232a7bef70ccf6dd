package irreproof.engine.lie;

import irreproof.engine.Partition;
import java.util.Optional;

/**
 * Young diagrams of SU(N) against Dynkin labels: the label at node i is the number of columns with i boxes. Columns of N
 * boxes are singlets and drop out; a longer column vanishes.
 */
public final class Diagrams {
    private Diagrams() {}

    /**
     * The diagram without columns of N boxes, N being the number of labels plus one.
     *
     * @throws ArithmeticException if a row's length overflows
     */
    public static Partition partition(DominantWeight weight) {
        int[] rows = new int[weight.rank()];
        int length = 0;
        for (int i = rows.length - 1; i >= 0; i--) {
            length = Math.addExact(length, weight.label(i));
            rows[i] = length;
        }
        return Partition.of(rows);
    }

    /**
     * The irrep of SU(N) that a diagram stands for; empty if a column is longer than N, that is if the diagram's
     * symmetry leaves nothing.
     *
     * @param degree the N of SU(N), 2 or more
     */
    public static Optional<DominantWeight> weight(int degree, Partition partition) {
        if (partition.length() > degree) {
            return Optional.empty();
        }
        int[] labels = new int[degree - 1];
        for (int i = 0; i < labels.length; i++) {
            labels[i] = partition.row(i) - partition.row(i + 1);
        }
        return Optional.of(DominantWeight.of(labels));
    }
}
