package irreproof.naming;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import irreproof.budget.Budget;
import irreproof.engine.lie.DominantWeight;
import irreproof.engine.lie.Published;
import irreproof.engine.lie.Series;
import irreproof.engine.lie.SimpleAlgebra;
import irreproof.engine.lie.WeylDimension;
import java.math.BigInteger;
import java.util.Arrays;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import java.util.TreeSet;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class IrrepSearchTest {
    private final Budget budget = Budget.unlimited();

    /** The two searches against each other, and the bound against plain enumeration of a box of labels. */
    @ParameterizedTest
    @CsvSource({"A,1,60", "A,2,300", "A,3,300", "B,2,300", "B,3,600", "C,3,600", "D,4,1000", "G,2,2000"})
    void findsEveryIrrepBelowTheBound(Series series, int rank, int bound) {
        SimpleAlgebra algebra = new SimpleAlgebra(series, rank);
        TreeMap<BigInteger, TreeSet<DominantWeight>> expected = new TreeMap<>();
        int[] labels = new int[rank];
        // wide enough for the multiples of every fundamental weight below these bounds
        int side = rank == 1 ? bound : rank == 2 ? 60 : 12;
        do {
            DominantWeight weight = DominantWeight.of(labels);
            BigInteger dimension = WeylDimension.dimension(algebra, weight);
            if (dimension.compareTo(BigInteger.valueOf(bound)) <= 0) {
                expected.computeIfAbsent(dimension, key -> new TreeSet<>()).add(weight);
            }
        } while (advance(labels, side));
        TreeSet<DominantWeight> all = new TreeSet<>();
        expected.values().forEach(all::addAll);
        assertEquals(List.copyOf(all), IrrepSearch.upToDimension(algebra, BigInteger.valueOf(bound), budget));
        for (int dimension = 0; dimension <= bound; dimension++) {
            BigInteger key = BigInteger.valueOf(dimension);
            assertEquals(
                    List.copyOf(expected.getOrDefault(key, new TreeSet<>())),
                    IrrepSearch.ofDimension(algebra, key, budget).irreps());
        }
    }

    private static boolean advance(int[] labels, int side) {
        for (int i = 0; i < labels.length; i++) {
            if (++labels[i] < side) {
                return true;
            }
            labels[i] = 0;
        }
        return false;
    }

    /** Each list of distinct dimensions, from the OEIS sequence in its row. */
    @Test
    void findsIrrepsOfEveryPublishedDimensionAndNoOthersBetween() {
        int checked = 0;
        for (Map<String, String> row : Published.rows("dims.tsv")) {
            if (row.get("kind").startsWith("list (distinct dimensions")) {
                SimpleAlgebra algebra = Published.algebra(row.get("group")).orElseThrow();
                List<BigInteger> dimensions = Arrays.stream(row.get("value").split(" "))
                        .map(BigInteger::new)
                        .toList();
                for (BigInteger dimension : dimensions) {
                    List<DominantWeight> irreps =
                            IrrepSearch.ofDimension(algebra, dimension, budget).irreps();
                    assertFalse(irreps.isEmpty(), row.get("group") + " " + dimension);
                }
                BigInteger last = dimensions.get(dimensions.size() - 1);
                List<BigInteger> found = IrrepSearch.upToDimension(algebra, last, budget).stream()
                        .map(irrep -> WeylDimension.dimension(algebra, irrep))
                        .sorted()
                        .distinct()
                        .toList();
                assertEquals(dimensions, found, row.get("group"));
                checked++;
            }
        }
        assertEquals(9, checked);
    }

    /** OEIS A339250 (its misprinted 77 aside) and A181746, by the rows of dims.tsv. */
    @Test
    void findsThePublishedCoincidencesOfDimension() {
        SimpleAlgebra e6 = new SimpleAlgebra(Series.E, 6);
        for (Map<String, String> row : Published.rows("dims.tsv")) {
            if (row.get("kind").equals("list (dimensions carried by several irreps)")) {
                for (String dimension : row.get("value").split(" ")) {
                    int count = IrrepSearch.ofDimension(e6, new BigInteger(dimension), budget)
                            .irreps()
                            .size();
                    assertTrue(count > 1, dimension);
                }
            }
        }
        SimpleAlgebra e8 = new SimpleAlgebra(Series.E, 8);
        assertEquals(
                List.of(DominantWeight.of(1, 0, 0, 0, 0, 0, 1, 1), DominantWeight.of(1, 0, 1, 0, 0, 0, 0, 0)),
                IrrepSearch.ofDimension(e8, new BigInteger("8634368000"), budget).irreps().stream()
                        .sorted((left, right) -> Arrays.compare(left.labels(), right.labels()))
                        .toList());
    }

    /** Binomial coefficients: exterior powers of the fundamental irrep, common practice. */
    @Test
    void reachesHighRanks() {
        SimpleAlgebra a49 = new SimpleAlgebra(Series.A, 49);
        int[] fifth = new int[49];
        fifth[4] = 1;
        int[] fifthFromTheEnd = new int[49];
        fifthFromTheEnd[44] = 1;
        assertEquals(
                List.of(DominantWeight.of(fifth), DominantWeight.of(fifthFromTheEnd)),
                IrrepSearch.ofDimension(a49, BigInteger.valueOf(2_118_760), budget)
                        .irreps());
        SimpleAlgebra d16 = new SimpleAlgebra(Series.D, 16);
        assertEquals(
                2,
                IrrepSearch.ofDimension(d16, BigInteger.valueOf(32_768), budget)
                        .irreps()
                        .size());
    }
}
