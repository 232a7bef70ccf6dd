package irreproof.engine.lie;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTimeoutPreemptively;

import irreproof.budget.BudgetExceeded;
import java.math.BigInteger;
import java.time.Duration;
import java.util.Map;
import java.util.TreeSet;
import org.junit.jupiter.api.Test;

/** Published dimensions; the source stands in each row. */
class WeylDimensionTest {
    @Test
    void agreesWithThePublishedDimensions() {
        int checked = 0;
        for (Map<String, String> row : Published.rows("dims.tsv")) {
            if (row.get("kind").equals("irrep")) {
                SimpleAlgebra algebra = Published.algebra(row.get("group")).orElseThrow();
                DominantWeight weight = Published.weight(algebra, row.get("dynkin_bourbaki"));
                assertEquals(
                        row.get("value"),
                        WeylDimension.dimension(algebra, weight).toString(),
                        row::toString);
                checked++;
            }
        }
        assertEquals(1560, checked);
    }

    /** Every irrep up to the last dimension of the list, found by walking up from the trivial one. */
    @Test
    void findsExactlyThePublishedDistinctDimensions() {
        int checked = 0;
        for (Map<String, String> row : Published.rows("dims.tsv")) {
            if (row.get("kind").equals("list (distinct dimensions, increasing)")) {
                SimpleAlgebra algebra = Published.algebra(row.get("group")).orElseThrow();
                String[] values = row.get("value").split(" ");
                BigInteger limit = new BigInteger(values[values.length - 1]);
                TreeSet<BigInteger> found = new TreeSet<>();
                collect(algebra, new int[algebra.rank()], 0, limit, found);
                assertEquals(String.join(" ", values), join(found), row::toString);
                checked++;
            }
        }
        assertEquals(9, checked);
    }

    private static void collect(
            SimpleAlgebra algebra, int[] labels, int from, BigInteger limit, TreeSet<BigInteger> found) {
        BigInteger dimension = WeylDimension.dimension(algebra, DominantWeight.of(labels));
        if (dimension.compareTo(limit) > 0) {
            return;
        }
        found.add(dimension);
        for (int node = from; node < labels.length; node++) {
            labels[node]++;
            collect(algebra, labels, node, limit, found);
            labels[node]--;
        }
    }

    private static String join(TreeSet<BigInteger> values) {
        return String.join(" ", values.stream().map(BigInteger::toString).toList());
    }

    @Test
    void agreesWithThePublishedSequences() {
        int checked = 0;
        for (Map<String, String> row : Published.rows("dims.tsv")) {
            if (row.get("kind").startsWith("list (k * highest root")) {
                SimpleAlgebra algebra = Published.algebra(row.get("group")).orElseThrow();
                DominantWeight root = RootSystem.of(algebra).highestRoot();
                assertSequence(row, algebra, root, 1);
                checked++;
            } else if (row.get("kind").equals("list (k*omega7, k=0..9)")) {
                assertSequence(row, new SimpleAlgebra(Series.E, 7), DominantWeight.of(0, 0, 0, 0, 0, 0, 1), 0);
                checked++;
            } else if (row.get("kind").equals("list (k*omega8, k=1..8)")) {
                assertSequence(row, new SimpleAlgebra(Series.E, 8), DominantWeight.of(0, 0, 0, 0, 0, 0, 0, 1), 1);
                checked++;
            } else if (row.get("kind").equals("list (two irreps of equal dimension)")) {
                SimpleAlgebra algebra = Published.algebra(row.get("group")).orElseThrow();
                for (DominantWeight weight : Published.terms(algebra, row.get("dynkin_bourbaki"))) {
                    assertEquals(
                            row.get("value"),
                            WeylDimension.dimension(algebra, weight).toString());
                }
                checked++;
            }
        }
        assertEquals(10, checked);
    }

    private static void assertSequence(
            Map<String, String> row, SimpleAlgebra algebra, DominantWeight weight, int firstMultiple) {
        int multiple = firstMultiple;
        for (String value : row.get("value").split(" ")) {
            int[] labels = weight.labels();
            for (int i = 0; i < labels.length; i++) {
                labels[i] *= multiple;
            }
            assertEquals(
                    value,
                    WeylDimension.dimension(algebra, DominantWeight.of(labels)).toString(),
                    row::toString);
            multiple++;
        }
    }

    /** SO(2n)'s spinors have 2^(n-1) dimensions, SO(2n+1)'s 2^n (Fulton and Harris, 20); binomials for SU(n). */
    @Test
    void largeRanksAreNoBombs() {
        Duration limit = Duration.ofSeconds(20);
        assertTimeoutPreemptively(limit, () -> {
            SimpleAlgebra so2000 = new SimpleAlgebra(Series.D, 1000);
            assertEquals(BigInteger.TWO.pow(999), WeylDimension.dimension(so2000, node(1000, 999)));
            SimpleAlgebra so2001 = new SimpleAlgebra(Series.B, 1000);
            assertEquals(BigInteger.TWO.pow(1000), WeylDimension.dimension(so2001, node(1000, 1000)));
            SimpleAlgebra su100000 = new SimpleAlgebra(Series.A, 99_999);
            assertEquals(new BigInteger("4999950000"), WeylDimension.dimension(su100000, node(99_999, 2)));
            assertEquals(new BigInteger("100000"), WeylDimension.dimension(su100000, node(99_999, 99_999)));
            DominantWeight middle = node(99_999, 50_000);
            assertThrows(BudgetExceeded.class, () -> WeylDimension.dimension(su100000, middle));
        });
    }

    private static DominantWeight node(int rank, int node) {
        int[] labels = new int[rank];
        labels[node - 1] = 1;
        return DominantWeight.of(labels);
    }

    @Test
    void aWeightOfAnotherRankIsRefused() {
        SimpleAlgebra algebra = new SimpleAlgebra(Series.A, 2);
        DominantWeight weight = DominantWeight.of(1);
        assertThrows(IllegalArgumentException.class, () -> WeylDimension.dimension(algebra, weight));
    }
}
