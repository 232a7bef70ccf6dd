package irreproof.engine.lie.embedding;

import irreproof.budget.Budget;
import irreproof.engine.lie.Embedding;
import irreproof.engine.lie.Series;
import irreproof.engine.lie.SimpleAlgebra;
import java.util.Arrays;
import java.util.List;

/**
 * The special maximal subalgebras of the exceptional algebras (Dynkin, Semisimple subalgebras, 1952, table 39; from
 * memory), by what the smallest irrep becomes; the linear map is found by {@link WeightMatching}.
 */
final class ExceptionalEmbeddings {
    private static final SimpleAlgebra A1 = new SimpleAlgebra(Series.A, 1);
    private static final SimpleAlgebra A2 = new SimpleAlgebra(Series.A, 2);
    private static final SimpleAlgebra C2 = new SimpleAlgebra(Series.C, 2);
    private static final SimpleAlgebra C3 = new SimpleAlgebra(Series.C, 3);
    private static final SimpleAlgebra C4 = new SimpleAlgebra(Series.C, 4);
    private static final SimpleAlgebra E6 = new SimpleAlgebra(Series.E, 6);
    private static final SimpleAlgebra E7 = new SimpleAlgebra(Series.E, 7);
    private static final SimpleAlgebra E8 = new SimpleAlgebra(Series.E, 8);
    private static final SimpleAlgebra F4 = new SimpleAlgebra(Series.F, 4);
    private static final SimpleAlgebra G2 = new SimpleAlgebra(Series.G, 2);

    private record Special(SimpleAlgebra algebra, DefiningRepresentation smallest) {}

    private static final List<Special> DYNKIN = List.of(
            spins(G2, 6),
            spins(F4, 8, 16),
            special(F4, List.of(A1, G2), irrep("4", "00"), irrep("2", "10")),
            special(E6, List.of(A2), irrep("22")),
            special(E6, List.of(G2), irrep("20")),
            special(E6, List.of(C4), irrep("0100")),
            special(E6, List.of(F4), irrep("0000"), irrep("0001")),
            special(E6, List.of(A2, G2), irrep("02", "00"), irrep("10", "10")),
            spins(E7, 9, 17, 27),
            spins(E7, 5, 11, 15, 21),
            special(E7, List.of(A2), irrep("60"), irrep("06")),
            special(E7, List.of(A1, A1), irrep("4", "1"), irrep("2", "5"), irrep("6", "3")),
            special(E7, List.of(A1, G2), irrep("3", "10"), irrep("1", "01")),
            special(E7, List.of(A1, F4), irrep("3", "0000"), irrep("1", "0001")),
            special(E7, List.of(G2, C3), irrep("00", "001"), irrep("10", "100")),
            spins(E8, 2, 14, 22, 26, 34, 38, 46, 58),
            spins(E8, 2, 10, 14, 18, 22, 26, 28, 34, 38, 46),
            spins(E8, 2, 6, 10, 14, 16, 18, 22, 22, 26, 28, 34, 38),
            special(E8, List.of(C2), irrep("20"), irrep("60"), irrep("23")),
            special(
                    E8,
                    List.of(A1, A2),
                    irrep("2", "00"),
                    irrep("0", "11"),
                    irrep("6", "11"),
                    irrep("4", "30"),
                    irrep("4", "03"),
                    irrep("2", "22")),
            special(E8, List.of(G2, F4), irrep("01", "0000"), irrep("00", "1000"), irrep("10", "0001")));

    private ExceptionalEmbeddings() {}

    private static Special special(SimpleAlgebra algebra, List<SimpleAlgebra> factors, int[][]... irreps) {
        return new Special(algebra, DefiningRepresentation.sumOf(factors, irreps));
    }

    /** Under SU(2), by the Dynkin labels: twice the spins. */
    private static Special spins(SimpleAlgebra algebra, int... labels) {
        int[][][] irreps =
                Arrays.stream(labels).mapToObj(label -> new int[][] {{label}}).toArray(int[][][]::new);
        return special(algebra, List.of(A1), irreps);
    }

    /** Labels of one digit each, a word for each factor. */
    private static int[][] irrep(String... labels) {
        return Arrays.stream(labels)
                .map(word -> word.chars().map(Character::getNumericValue).toArray())
                .toArray(int[][]::new);
    }

    static List<Embedding> of(SimpleAlgebra algebra, Budget budget) {
        return DYNKIN.stream()
                .filter(entry -> entry.algebra.equals(algebra))
                .map(entry -> WeightMatching.of(
                        algebra,
                        Fingerprint.smallestIrrep(algebra),
                        entry.smallest,
                        "special " + entry.smallest.algebra() + " in " + algebra,
                        budget))
                .toList();
    }
}
