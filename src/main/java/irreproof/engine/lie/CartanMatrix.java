package irreproof.engine.lie;

import java.util.Arrays;

/**
 * The Cartan matrix in Bourbaki's numbering: entry (i,j) is the simple root i paired with the simple coroot j, so row i
 * holds the Dynkin labels of the simple root i. Source: Bourbaki, Lie IV-VI, plates I-IX.
 */
final class CartanMatrix {
    private CartanMatrix() {}

    static int[][] of(SimpleAlgebra algebra) {
        int rank = algebra.rank();
        int[][] matrix = new int[rank][rank];
        for (int i = 0; i < rank; i++) {
            matrix[i][i] = 2;
        }
        switch (algebra.series()) {
            case A, B, C, F, G -> chain(matrix, 0, rank);
            case D -> {
                chain(matrix, 0, rank - 1);
                join(matrix, rank - 3, rank - 1);
            }
            case E -> {
                chain(matrix, 2, rank);
                join(matrix, 0, 2);
                join(matrix, 1, 3);
            }
        }
        switch (algebra.series()) {
            case B -> matrix[rank - 2][rank - 1] = -2;
            case C -> matrix[rank - 1][rank - 2] = -2;
            case F -> matrix[1][2] = -2;
            case G -> matrix[1][0] = -3;
            case A, D, E -> {}
        }
        return matrix;
    }

    private static void chain(int[][] matrix, int from, int to) {
        for (int i = from; i + 1 < to; i++) {
            join(matrix, i, i + 1);
        }
    }

    private static void join(int[][] matrix, int i, int j) {
        matrix[i][j] = -1;
        matrix[j][i] = -1;
    }

    /**
     * The determinant times the inverse, which is an integer matrix, with the determinant. Bareiss' fraction-free elimination (1968): every intermediate entry is a minor, hence a small integer. Cubic.
     */
    static Inverse inverse(int[][] matrix) {
        int rank = matrix.length;
        long[][] work = new long[rank][2 * rank];
        for (int i = 0; i < rank; i++) {
            for (int j = 0; j < rank; j++) {
                work[i][j] = matrix[i][j];
            }
            work[i][rank + i] = 1;
        }
        long previous = 1;
        for (int pivot = 0; pivot < rank; pivot++) {
            // principal minors of a Cartan matrix of finite type are positive: no pivoting needed
            long head = work[pivot][pivot];
            for (int i = 0; i < rank; i++) {
                long factor = work[i][pivot];
                if (i == pivot) {
                    continue;
                }
                for (int j = 0; j < 2 * rank; j++) {
                    work[i][j] = Math.subtractExact(
                                    Math.multiplyExact(head, work[i][j]), Math.multiplyExact(factor, work[pivot][j]))
                            / previous;
                }
            }
            previous = head;
        }
        long[][] adjugate = new long[rank][];
        for (int i = 0; i < rank; i++) {
            adjugate[i] = Arrays.copyOfRange(work[i], rank, 2 * rank);
        }
        return new Inverse(adjugate, previous);
    }

    /** The inverse as an integer matrix over a common denominator. */
    record Inverse(long[][] adjugate, long determinant) {}
}
