package irreproof.engine.lie;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assumptions.assumeTrue;

import irreproof.budget.Budget;
import irreproof.engine.Decomposition;
import java.io.IOException;
import java.math.BigInteger;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/**
 * Random products and powers against GAP, skipped where {@link Gap} is not here. Full counts:
 * {@code mvn test -Dtest=GapOracleTest -Dirreproof.long=true}.
 */
class GapOracleTest {
    private static final boolean LONG = Boolean.getBoolean("irreproof.long");
    private static final int PRODUCTS = LONG ? 2_000 : 500;
    private static final int POWERS = LONG ? 200 : 24;
    private static final int MINUTES = LONG ? 30 : 5;
    private static final long LARGEST_DIMENSION = 100_000;
    /** GAP visits the weights of the first factor one by one, and slowly. */
    private static final long LARGEST_SMALLER_DIMENSION = 10_000;
    /** GAP makes the power with a basis, and lets the Cartan subalgebra act on it. */
    private static final long LARGEST_POWER = LONG ? 250 : 80;

    /** The dominant weights of a power of an irrep: those of GAP's basis, which consists of weight vectors. */
    private static final String POWER = """
            power := function(L, weight, k, symmetric)
              local W, h, B, v, labels, dominant;
              W := HighestWeightModule(L, weight);
              if symmetric then W := SymmetricPowerOfAlgebraModule(W, k);
              else W := ExteriorPowerOfAlgebraModule(W, k); fi;
              h := ChevalleyBasis(L)[3];
              B := Basis(W);
              dominant := [];
              for v in [1..Length(B)] do
                labels := List(h, a -> Coefficients(B, a^B[v])[v]);
                if ForAll(labels, a -> a >= 0) then Add(dominant, labels); fi;
              od;
              dominant := Collected(dominant);
              print(List(dominant, pair -> pair[1]), List(dominant, pair -> pair[2]));
            end;;
            """;

    private record Product(SimpleAlgebra algebra, DominantWeight left, DominantWeight right) {}

    private record Power(SimpleAlgebra algebra, DominantWeight irrep, int exponent, boolean symmetric) {}

    /** All types in turn, so that each rank of each series gets its share. */
    @Test
    void productsAgreeWithGap(@TempDir Path folder) throws IOException, InterruptedException {
        assumeTrue(Gap.isHere(), "gap is not on the path: skipped");
        RandomIrreps random = new RandomIrreps(20260109, "productsAgreeWithGap");
        List<SimpleAlgebra> algebras = Algebras.upToRank(8);
        List<Product> cases = new ArrayList<>();
        StringBuilder script = new StringBuilder();
        while (cases.size() < PRODUCTS) {
            SimpleAlgebra algebra = algebras.get(cases.size() % algebras.size());
            DominantWeight left = random.next(algebra, LARGEST_SMALLER_DIMENSION);
            DominantWeight right = random.next(algebra, LARGEST_DIMENSION);
            if (!left.isZero() && !right.isZero()) {
                cases.add(new Product(algebra, left, right));
                script.append("d := DecomposeTensorProduct(%s, %s, %s);; print(d[1], d[2]);%n"
                        .formatted(algebra, Gap.labels(algebra, left), Gap.labels(algebra, right)));
            }
        }
        List<Map<DominantWeight, Long>> answers = Gap.run(
                folder, script.toString(), cases.stream().map(Product::algebra).toList(), MINUTES);
        List<String> differences = new ArrayList<>();
        for (int i = 0; i < cases.size(); i++) {
            Product one = cases.get(i);
            Decomposition<DominantWeight> ours =
                    new LieRing(one.algebra).product(one.left, one.right, Budget.unlimited());
            if (!ours.equals(Decomposition.of(answers.get(i)))) {
                differences.add(one + " = " + ours + ", GAP: " + answers.get(i));
            }
        }
        System.out.println("GAP: " + cases.size() + " products, " + differences.size() + " differences");
        assertEquals(List.of(), differences);
    }

    /** Symmetric and exterior squares, the parts of a square, and third powers. */
    @Test
    void powersAgreeWithGap(@TempDir Path folder) throws IOException, InterruptedException {
        assumeTrue(Gap.isHere(), "gap is not on the path: skipped");
        RandomIrreps random = new RandomIrreps(20260217, "powersAgreeWithGap");
        // E8's smallest square has dimension 30876, E7's 1596
        List<SimpleAlgebra> algebras = Algebras.upToRank(6);
        List<Power> cases = new ArrayList<>();
        StringBuilder script = new StringBuilder(POWER);
        for (int turn = 0; cases.size() < POWERS; turn++) {
            SimpleAlgebra algebra = algebras.get(turn % algebras.size());
            Power power = new Power(algebra, random.next(algebra, 60), 2 + random.below(2), random.below(2) == 0);
            BigInteger dimension = new LieRing(algebra).dimension(value(power));
            boolean fits = dimension.signum() > 0 && dimension.compareTo(BigInteger.valueOf(LARGEST_POWER)) <= 0;
            if (fits && !power.irrep.isZero()) {
                cases.add(power);
                script.append("power(%s, %s, %d, %s);%n"
                        .formatted(algebra, Gap.labels(algebra, power.irrep), power.exponent, power.symmetric));
            }
        }
        List<Map<DominantWeight, Long>> answers = Gap.run(
                folder, script.toString(), cases.stream().map(Power::algebra).toList(), MINUTES);
        for (int i = 0; i < cases.size(); i++) {
            Power one = cases.get(i);
            assertEquals(answers.get(i), dominantWeights(one.algebra, value(one)), one::toString);
        }
        System.out.println("GAP: " + cases.size() + " powers agree");
    }

    private static Decomposition<DominantWeight> value(Power power) {
        LieRing ring = new LieRing(power.algebra);
        return power.symmetric
                ? ring.symmetricPower(power.irrep, power.exponent, Budget.unlimited())
                : ring.exteriorPower(power.irrep, power.exponent, Budget.unlimited());
    }

    private static Map<DominantWeight, Long> dominantWeights(SimpleAlgebra algebra, Decomposition<DominantWeight> sum) {
        Map<DominantWeight, Long> total = new HashMap<>();
        sum.multiplicities()
                .forEach((irrep, count) -> DominantCharacter.of(algebra, irrep, Budget.unlimited())
                        .forEach((weight, times) -> total.merge(weight, count * times, Math::addExact)));
        return total;
    }
}
