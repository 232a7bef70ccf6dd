package irreproof.engine.lie;

import static org.junit.jupiter.api.Assertions.assertEquals;

import irreproof.budget.Budget;
import irreproof.engine.Decomposition;
import irreproof.engine.Partition;
import java.util.List;
import java.util.Map;
import java.util.stream.Collectors;
import org.junit.jupiter.api.Test;

/** Products by two algorithms each. */
class ProductAlgorithmsTest {
    private static final Budget UNLIMITED = Budget.unlimited();
    /** {@code mvn test -Dtest=ProductAlgorithmsTest -Dirreproof.long=true} for the full counts. */
    private static final boolean LONG = Boolean.getBoolean("irreproof.long");

    @Test
    void klimykAgreesWithLittlewoodRichardson() {
        RandomIrreps random = new RandomIrreps(20260103, "klimykAgreesWithLittlewoodRichardson");
        int products = LONG ? 10_000 : 1_000;
        for (int i = 0; i < products; i++) {
            SimpleAlgebra algebra = new SimpleAlgebra(Series.A, 1 + random.below(8));
            DominantWeight left = random.next(algebra, 3_000);
            DominantWeight right = random.next(algebra, 100_000);
            assertEquals(
                    KlimykProduct.product(algebra, left, right, UNLIMITED),
                    LittlewoodRichardson.product(left, right, UNLIMITED),
                    () -> algebra + ": " + left + " x " + right);
        }
        System.out.println("Klimyk and Littlewood-Richardson agree on " + products + " products");
    }

    @Test
    void klimykAgreesWithPeelingCharacters() {
        RandomIrreps random = new RandomIrreps(20260104, "klimykAgreesWithPeelingCharacters");
        List<SimpleAlgebra> algebras = Algebras.upToRank(6).stream()
                .filter(algebra -> algebra.series() != Series.A)
                .toList();
        int products = LONG ? 10_000 : 300;
        for (int i = 0; i < products; i++) {
            SimpleAlgebra algebra = algebras.get(i % algebras.size());
            DominantWeight left = random.next(algebra, 400);
            DominantWeight right = random.next(algebra, 400);
            assertEquals(
                    CharacterPeeling.product(algebra, left, right),
                    KlimykProduct.product(algebra, left, right, UNLIMITED),
                    () -> algebra + ": " + left + " x " + right);
        }
        System.out.println("Klimyk and characters agree on " + products + " products");
    }

    /** Macdonald, Symmetric Functions and Hall Polynomials, I.9 (from memory): s_21 squared. */
    @Test
    void theSchurFunction21SquaredHasOneDoubleTerm() {
        Map<Partition, Long> square =
                LittlewoodRichardson.multiply(Partition.of(2, 1), Partition.of(2, 1), 6, UNLIMITED);
        String text = square.entrySet().stream()
                .sorted(Map.Entry.comparingByKey())
                .map(term -> term.getValue() + "*" + term.getKey())
                .collect(Collectors.joining(" + "));
        assertEquals(
                "1*[4, 2] + 1*[4, 1, 1] + 1*[3, 3] + 2*[3, 2, 1] + 1*[3, 1, 1, 1] + 1*[2, 2, 2] + 1*[2, 2, 1, 1]",
                text);
    }

    /** The dimension of the product is the only oracle at this size. */
    @Test
    void su50WithModerateDiagrams() {
        LieRing ring = new LieRing(new SimpleAlgebra(Series.A, 49));
        List<DominantWeight> weights = List.of(
                Diagrams.weight(50, Partition.of(4, 3, 2, 1)).orElseThrow(),
                Diagrams.weight(50, Partition.of(5, 3, 3, 1, 1)).orElseThrow(),
                mixed(1, 1),
                mixed(2, 2),
                mixed(3, 1));
        for (DominantWeight left : weights) {
            for (DominantWeight right : weights) {
                Decomposition<DominantWeight> product = ring.product(left, right, Budget.of(20_000_000));
                assertEquals(ring.dimension(left).multiply(ring.dimension(right)), ring.dimension(product));
            }
        }
    }

    private static DominantWeight mixed(int first, int last) {
        int[] labels = new int[49];
        labels[0] = first;
        labels[48] = last;
        return DominantWeight.of(labels);
    }
}
