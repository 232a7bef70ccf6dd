package irreproof.engine.lie;

/**
 * Twice the coordinates of a weight of a classical algebra in the orthonormal basis e_1, e_2, ... of Bourbaki's plates
 * I-IV (for A_n in the n+1 coordinates of gl(n+1), the last one 0). Linear in the rank, for any rank.
 */
final class OrthogonalCoordinates {
    private OrthogonalCoordinates() {}

    /** Of the weight plus so many times half the sum of the positive roots. */
    static long[] of(SimpleAlgebra algebra, DominantWeight weight, int rhoTimes) {
        int rank = algebra.rank();
        boolean typeA = algebra.series() == Series.A;
        long[] coordinates = new long[typeA ? rank + 1 : rank];
        long running = 0;
        for (int i = rank - 1; i >= 0; i--) {
            long label = (long) weight.label(i) + rhoTimes;
            boolean last = i == rank - 1;
            switch (algebra.series()) {
                case A, C -> running += 2 * label;
                case B -> running += last ? label : 2 * label;
                case D -> {
                    long before = (long) weight.label(rank - 2) + rhoTimes;
                    if (last) {
                        running = label - before;
                    } else if (i == rank - 2) {
                        running += 2 * before;
                    } else {
                        running += 2 * label;
                    }
                }
                case E, F, G -> throw new IllegalArgumentException(algebra + " is not classical");
            }
            coordinates[i] = running;
        }
        return coordinates;
    }
}
