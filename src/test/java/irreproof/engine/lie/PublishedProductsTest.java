package irreproof.engine.lie;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import irreproof.budget.Budget;
import irreproof.engine.Decomposition;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.Collections;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;

/** Published products and powers; the source stands in each row. */
class PublishedProductsTest {
    private static final Budget UNLIMITED = Budget.unlimited();

    private static List<Map<String, String>> rows(String kind) {
        return Published.rows("products.tsv").stream()
                .filter(row -> row.get("kind").startsWith(kind))
                .toList();
    }

    private static LieRing ring(Map<String, String> row) {
        return new LieRing(Published.algebra(row.get("group")).orElseThrow());
    }

    private static Decomposition<DominantWeight> product(LieRing ring, List<DominantWeight> factors) {
        Decomposition<DominantWeight> product = Decomposition.of(ring.trivial());
        for (DominantWeight factor : factors) {
            product = ring.product(product, Decomposition.of(factor), UNLIMITED);
        }
        return product;
    }

    @Test
    void agreesWithThePublishedProductsAndTheirSymmetricParts() {
        int products = 0;
        int symmetries = 0;
        List<Map<String, String>> rows = new ArrayList<>(rows("product"));
        rows.addAll(rows("spins"));
        for (Map<String, String> row : rows) {
            LieRing ring = ring(row);
            List<DominantWeight> factors = Published.terms(ring.algebra(), row.get("factors_dynkin_bourbaki"));
            List<DominantWeight> terms = Published.terms(ring.algebra(), row.get("decomposition_dynkin_bourbaki"));
            assertEquals(Decomposition.sum(terms), product(ring, factors), row::toString);
            products++;
            if (!row.get("symmetric").isEmpty()) {
                Names names = new Names(row.get("group"), ring.algebra());
                DominantWeight factor = factors.get(0);
                assertEquals(names.sum(row.get("symmetric")), ring.symmetricPower(factor, 2, UNLIMITED), row::toString);
                assertEquals(
                        names.sum(row.get("antisymmetric")), ring.exteriorPower(factor, 2, UNLIMITED), row::toString);
                symmetries++;
            }
        }
        assertEquals(266, products);
        assertEquals(69, symmetries);
    }

    @Test
    void agreesWithThePublishedCubes() {
        for (Map<String, String> row : rows("cube")) {
            LieRing ring = ring(row);
            DominantWeight factor = Published.weight(ring.algebra(), row.get("factors_dynkin_bourbaki"));
            assertEquals(
                    dimensions(row.get("symmetric")),
                    dimensions(ring, ring.symmetricPower(factor, 3, UNLIMITED)),
                    row::toString);
            assertEquals(
                    dimensions(row.get("antisymmetric")),
                    dimensions(ring, ring.exteriorPower(factor, 3, UNLIMITED)),
                    row::toString);
        }
        assertEquals(19, rows("cube").size());
    }

    /** Names without their bars and primes; which irrep of that dimension is meant is left to the Dynkin label rows. */
    private static List<BigInteger> dimensions(String names) {
        List<BigInteger> dimensions = new ArrayList<>();
        for (String name : names.split(" \\+ ")) {
            dimensions.add(new BigInteger(name.replaceAll("\\D", "")));
        }
        Collections.sort(dimensions);
        return dimensions;
    }

    private static List<BigInteger> dimensions(LieRing ring, Decomposition<DominantWeight> sum) {
        List<BigInteger> dimensions = new ArrayList<>();
        sum.multiplicities().forEach((weight, count) -> {
            for (long i = 0; i < count; i++) {
                dimensions.add(ring.dimension(weight));
            }
        });
        Collections.sort(dimensions);
        return dimensions;
    }

    /** How often the trivial irrep occurs in each power, up to the last published term. */
    @Test
    void agreesWithThePublishedNumbersOfInvariants() {
        Map<String, int[][]> bases = Map.of(
                "SU(2) 3", new int[][] {{2}},
                "G2 7", new int[][] {{1, 0}},
                "Sp(4) 4", new int[][] {{1, 0}},
                "Sp(4) 5", new int[][] {{0, 1}},
                "Sp(4) 1+5", new int[][] {{0, 0}, {0, 1}},
                "SU(3) 3 (powers 0,3,6,...)", new int[][] {{1, 0}},
                "SU(3) 8", new int[][] {{1, 1}},
                "E6 78", new int[][] {{0, 1, 0, 0, 0, 0}},
                "E7 133", new int[][] {{1, 0, 0, 0, 0, 0, 0}},
                "F4 52", new int[][] {{1, 0, 0, 0}});
        for (Map<String, String> row : rows("singlet count")) {
            LieRing ring = ring(row);
            int[][] labels = bases.get(row.get("group") + " " + row.get("factors"));
            Decomposition<DominantWeight> base = Decomposition.zero();
            for (int[] irrep : labels) {
                base = base.plus(Decomposition.of(DominantWeight.of(irrep)));
            }
            int step = row.get("factors").contains("powers 0,3") ? 3 : 1;
            Decomposition<DominantWeight> power = Decomposition.of(ring.trivial());
            List<Long> found = new ArrayList<>();
            int wanted = row.get("decomposition").split(" ").length;
            while (true) {
                found.add(power.multiplicity(ring.trivial()));
                if (found.size() == wanted) {
                    break;
                }
                for (int i = 0; i < step; i++) {
                    power = ring.product(power, base, UNLIMITED);
                }
            }
            assertEquals(row.get("decomposition"), join(found), row::toString);
        }
        assertEquals(10, rows("singlet count").size());
    }

    private static String join(List<Long> values) {
        return String.join(" ", values.stream().map(String::valueOf).toList());
    }

    @Test
    void agreesWithThePublishedDimensionPolynomials() {
        for (Map<String, String> row : rows("general N")) {
            for (int n : List.of(5, 6, 7, 8, 9, 10, 11, 12, 20)) {
                String group = row.get("group").replace("N", Integer.toString(n));
                boolean fits = !group.startsWith("Sp") || n % 2 == 0 && n > 4;
                if (group.startsWith("SO") && n < 9 || !fits) {
                    continue;
                }
                LieRing ring = new LieRing(Published.algebra(group).orElseThrow());
                List<DominantWeight> factors = new ArrayList<>();
                for (String factor : row.get("factors").split(" x ")) {
                    factors.add(general(ring, factor));
                }
                String message = group + " " + row;
                assertDimensions(row.get("decomposition"), n, ring, product(ring, factors), message);
                if (!row.get("symmetric").isEmpty()) {
                    DominantWeight factor = factors.get(0);
                    var symmetric = ring.symmetricPower(factor, 2, UNLIMITED);
                    assertDimensions(row.get("symmetric"), n, ring, symmetric, message);
                    var antisymmetric = ring.exteriorPower(factor, 2, UNLIMITED);
                    assertDimensions(row.get("antisymmetric"), n, ring, antisymmetric, message);
                }
            }
        }
        assertEquals(16, rows("general N").size());
    }

    private static void assertDimensions(
            String polynomials, int n, LieRing ring, Decomposition<DominantWeight> sum, String message) {
        List<BigInteger> expected = DimensionPolynomial.terms(polynomials, n);
        Collections.sort(expected);
        assertEquals(expected, dimensions(ring, sum), message);
    }

    private static DominantWeight general(LieRing ring, String factor) {
        int[] labels = new int[ring.algebra().rank()];
        switch (factor.replace("bar", "")) {
            case "N" -> labels[0] = 1;
            case "S2" -> labels[0] = 2;
            case "L2" -> labels[1] = 1;
            case "adj" -> {
                return RootSystem.of(ring.algebra()).highestRoot();
            }
            default -> throw new IllegalArgumentException(factor);
        }
        DominantWeight weight = DominantWeight.of(labels);
        return factor.endsWith("bar") ? ring.conjugate(weight) : weight;
    }

    /** The tensor products of one simple group among the published errors, as printed: each must differ. */
    @Test
    void contradictsThePublishedErrors() {
        assertWrong("SU(5)", "(1000) x (0100)", "(0011) + (0010)", "5 x 10 = 40 + 10~");
        assertWrong("SU(5)", "(0100) x (0100)", "(0020) + (0101) + (1000)", "10 x 10 = 50 + 45 + 5");
        assertWrong("SU(5)", "(1000) x (1000)", "(0100) + (1000)", "5 x 5 = 10 + 5 (title)");
        assertWrong("SU(3)", "(11) x (11)", "(03) + (11) + (11) + (00)", "8 x 8 = 10~ + 8 + 8 + 1");
        assertWrong("E6", "(100000) x (100000)", "(000001) + (000010) + (001000)", "27 x 27 = 27~ + 351 + 351~");
        assertWrong("E6", "(100000) x (100000)", "(000001) + (000002)", "27 x 27 = 27* + 351' with antisymmetric");
        assertWrong("SO(10)", "(00001) x (00001)", "(10000) + (00100) + (00020)", "16 x 16 = 10 + 120 + 126~");
        assertWrong(
                "SO(14)",
                "(0000010) x (0000010)",
                "(0000000) + (0100000) + (0001000) + (1000000) + (0010000) + (0000020)",
                "64 x 64 = (1 + 91 + 2002 + ...)_S");
    }

    /** The row that gives E6's irreps (100000) and (000001) the dimension 77. */
    @Test
    void contradictsThePublishedWrongDimension() {
        LieRing ring = new LieRing(new SimpleAlgebra(Series.E, 6));
        Map<String, String> row = Published.rows("published_errors.tsv").stream()
                .filter(candidate -> candidate.get("kind").equals("dimension"))
                .findFirst()
                .orElseThrow();
        for (DominantWeight weight : Published.terms(ring.algebra(), row.get("as_printed"))) {
            assertEquals(row.get("correct"), ring.dimension(weight).toString());
            assertTrue(row.get("as_printed").endsWith("dimension 77"));
        }
    }

    private static void assertWrong(String group, String factors, String printed, String asPrinted) {
        assertTrue(
                Published.rows("published_errors.tsv").stream()
                        .anyMatch(row -> row.get("group").equals(group)
                                && row.get("as_printed").contains(asPrinted)),
                asPrinted);
        LieRing ring = new LieRing(Published.algebra(group).orElseThrow());
        Decomposition<DominantWeight> sum = Decomposition.sum(Published.terms(ring.algebra(), printed));
        assertNotEquals(sum, product(ring, Published.terms(ring.algebra(), factors)), asPrinted);
    }

    /** The names of one group, learnt from the rows that print names and Dynkin labels side by side. */
    private static final class Names {
        private final SimpleAlgebra algebra;
        private final Map<String, DominantWeight> known = new HashMap<>();

        Names(String group, SimpleAlgebra algebra) {
            this.algebra = algebra;
            for (Map<String, String> row : Published.rows("products.tsv")) {
                if (row.get("group").equals(group) && row.get("kind").equals("product")) {
                    learn(row.get("decomposition"), row.get("decomposition_dynkin_bourbaki"));
                    learn(row.get("factors").replace(" x ", " + "), row.get("factors_dynkin_bourbaki"));
                }
                if (row.get("kind").equals("spins") && row.get("group").equals(group)) {
                    for (int twice = 0; twice <= 20; twice += 2) {
                        known.put(Integer.toString(twice / 2), DominantWeight.of(twice));
                    }
                }
            }
        }

        private void learn(String names, String labels) {
            String[] words = names.split(" \\+ ");
            String[] weights = labels.split(" [+x] ");
            for (int i = 0; i < words.length && words.length == weights.length; i++) {
                known.put(words[i].replaceFirst("^\\d+\\*", ""), Published.weight(algebra, weights[i]));
            }
        }

        Decomposition<DominantWeight> sum(String names) {
            List<DominantWeight> weights = new ArrayList<>();
            for (String name : names.split(" \\+ ")) {
                DominantWeight weight = known.get(name);
                if (weight == null) {
                    throw new IllegalArgumentException("no row of " + algebra + " names " + name);
                }
                weights.add(weight);
            }
            return Decomposition.sum(weights);
        }
    }
}
