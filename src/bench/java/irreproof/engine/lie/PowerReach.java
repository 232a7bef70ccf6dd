package irreproof.engine.lie;

import irreproof.budget.Budget;
import irreproof.budget.BudgetExceeded;
import irreproof.engine.Decomposition;
import irreproof.engine.Partition;
import java.math.BigInteger;
import java.util.Locale;
import java.util.function.IntFunction;

/**
 * Prints how far symmetric and exterior powers, and Schur functors of hooks, get within the budget that a statement has:
 * the largest exponent, the number of different irreps in that power, its time, and why the next is refused.
 */
public final class PowerReach {
    /** As for one statement of a document. */
    private static final long STEPS = 50_000_000;

    private static final int MOST_BOXES = 8;

    private PowerReach() {}

    public static void main(String[] arguments) {
        System.out.println("| algebra | irrep | power | up to | dimension | irreps | ms | then |");
        System.out.println("|---|---|---|---:|---:|---:|---:|---|");
        reach(new SimpleAlgebra(Series.A, 2), 1, 1);
        reach(new SimpleAlgebra(Series.A, 4), 0, 1, 0, 0);
        reach(new SimpleAlgebra(Series.D, 5), 0, 0, 0, 0, 1);
        reach(new SimpleAlgebra(Series.D, 5), 0, 1, 0, 0, 0);
        reach(new SimpleAlgebra(Series.E, 6), 1, 0, 0, 0, 0, 0);
        reach(new SimpleAlgebra(Series.E, 7), 0, 0, 0, 0, 0, 0, 1);
        reach(new SimpleAlgebra(Series.E, 8), 0, 0, 0, 0, 0, 0, 0, 1);
        reach(new SimpleAlgebra(Series.A, 49), unit(49, 1));
        reach(new SimpleAlgebra(Series.D, 16), unit(16, 15));
    }

    private static int[] unit(int rank, int node) {
        int[] labels = new int[rank];
        labels[node] = 1;
        return labels;
    }

    private static void reach(SimpleAlgebra algebra, int... labels) {
        DominantWeight irrep = DominantWeight.of(labels);
        String name = "| " + algebra + " | " + WeylDimension.dimension(algebra, irrep) + " | ";
        reach(algebra, irrep, name + "symmetric", Partition::of);
        reach(algebra, irrep, name + "exterior", Partition::column);
        reach(algebra, irrep, name + "(n-1,1)", boxes -> Partition.of(boxes - 1, 1));
    }

    private static void reach(
            SimpleAlgebra algebra, DominantWeight irrep, String name, IntFunction<Partition> diagram) {
        LieRing ring = new LieRing(algebra);
        int limit = WeylDimension.dimension(algebra, irrep)
                .min(BigInteger.valueOf(MOST_BOXES))
                .intValue();
        Decomposition<DominantWeight> last = Decomposition.of(irrep);
        double millis = 0;
        int boxes = 1;
        String end = "";
        while (boxes < limit && end.isEmpty()) {
            long start = System.nanoTime();
            try {
                last = ring.schurFunctor(irrep, diagram.apply(boxes + 1), Budget.of(STEPS));
                millis = (System.nanoTime() - start) / 1e6;
                boxes++;
            } catch (BudgetExceeded exceeded) {
                end = exceeded.getMessage();
            } catch (ArithmeticException overflow) {
                end = "a multiplicity beyond 64 bits";
            }
        }
        System.out.printf(
                Locale.ROOT,
                "%s | %d | %.3g | %d | %.0f | %s |%n",
                name,
                boxes,
                ring.dimension(last).doubleValue(),
                last.multiplicities().size(),
                millis,
                end.isEmpty() ? "not tried" : end);
    }
}
