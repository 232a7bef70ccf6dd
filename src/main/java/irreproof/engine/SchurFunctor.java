package irreproof.engine;

import irreproof.budget.Budget;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.Collections;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.NavigableMap;
import java.util.Set;
import java.util.TreeMap;

/**
 * The Schur functor of a Young diagram, applied in a representation ring: the tensors with the symmetry of the diagram;
 * one row gives symmetric powers, one column exterior ones. By the recursion n s_lambda = sum over k of psi^k s_lambda/k,
 * where n counts the boxes, psi^k is the Adams operation, and s_lambda/k the sum over the diagrams that are lambda less a
 * border strip of k boxes, with the sign of the strip (Murnaghan and Nakayama; Macdonald, Symmetric Functions and Hall
 * Polynomials, I.2, I.3 example 11 and I.5 example 3). For one row this is Newton's recursion.
 *
 * <p>Cost: for each diagram that is left by taking strips away, and each size of strip, one product with an Adams
 * operation. Multiplicities beyond 64 bits throw {@link ArithmeticException}.
 *
 * @param <I> the irreps
 */
public final class SchurFunctor<I extends Comparable<? super I>> {
    /** psi^k of the representation that the functor is applied to, times a sum. */
    @FunctionalInterface
    public interface AdamsProduct<I extends Comparable<? super I>> {
        Decomposition<I> times(int power, Decomposition<I> factor, Budget budget);
    }

    private final AdamsProduct<I> adams;
    private final Budget budget;
    private final Map<Partition, Decomposition<I>> values = new HashMap<>();
    /** By strip size, the diagrams left with their signs. */
    private final Map<Partition, Map<Integer, Map<Partition, Long>>> strips = new HashMap<>();

    private SchurFunctor(AdamsProduct<I> adams, Budget budget) {
        this.adams = adams;
        this.budget = budget;
    }

    /** @param trivial the trivial irrep, which is what the empty diagram gives */
    public static <I extends Comparable<? super I>> Decomposition<I> of(
            AdamsProduct<I> adams, I trivial, Partition diagram, Budget budget) {
        requireBoxes(diagram.size(), budget);
        budget.require(strips(diagram), "the Schur functor of " + diagram);
        SchurFunctor<I> functor = new SchurFunctor<>(adams, budget);
        functor.values.put(Partition.of(), Decomposition.of(trivial));
        for (Partition smaller : functor.reached(diagram)) {
            functor.values.put(smaller, functor.value(smaller));
        }
        return functor.values.get(diagram);
    }

    /** Refuses diagrams beyond the budget: one of each smaller size is reached, and has as many strips as boxes. */
    public static void requireBoxes(long boxes, Budget budget) {
        budget.require(BigInteger.valueOf(boxes).pow(2).shiftRight(1), "the power " + boxes);
    }

    /**
     * How many strips all diagrams inside one have together, which is how many boxes: taking single boxes away leads to
     * each of them. Counted row by row from the bottom, by the length of the row; one step per box.
     */
    private static BigInteger strips(Partition diagram) {
        int longest = diagram.row(0);
        BigInteger[] counts = new BigInteger[longest + 1];
        BigInteger[] boxes = new BigInteger[longest + 1];
        Arrays.fill(counts, BigInteger.ONE);
        Arrays.fill(boxes, BigInteger.ZERO);
        for (int row = diagram.length() - 1; row >= 0; row--) {
            // from "a row of exactly this length here" to "at most this length", for the row above
            for (int length = 0; length <= longest; length++) {
                boolean fits = length <= diagram.row(row);
                BigInteger inRow = counts[length].multiply(BigInteger.valueOf(length));
                boxes[length] = fits ? boxes[length].add(inRow) : BigInteger.ZERO;
                counts[length] = fits ? counts[length] : BigInteger.ZERO;
                if (length > 0) {
                    boxes[length] = boxes[length].add(boxes[length - 1]);
                    counts[length] = counts[length].add(counts[length - 1]);
                }
            }
        }
        return boxes[longest];
    }

    /** The diagrams from the smallest on, without the empty one. */
    private List<Partition> reached(Partition diagram) {
        NavigableMap<Long, Set<Partition>> open = new TreeMap<>(Map.of(diagram.size(), Set.of(diagram)));
        List<Partition> found = new ArrayList<>();
        while (open.lastKey() > 0) {
            for (Partition next : open.pollLastEntry().getValue()) {
                found.add(next);
                Map<Integer, Map<Partition, Long>> taken = withoutStrips(next);
                strips.put(next, taken);
                taken.forEach((size, rest) -> open.computeIfAbsent(next.size() - size, boxes -> new HashSet<>())
                        .addAll(rest.keySet()));
            }
        }
        Collections.reverse(found);
        return found;
    }

    private Decomposition<I> value(Partition diagram) {
        Decomposition<I> total = Decomposition.zero();
        for (var bySize : strips.get(diagram).entrySet()) {
            Decomposition<I> rest = Decomposition.zero();
            for (var signed : bySize.getValue().entrySet()) {
                rest = rest.plus(values.get(signed.getKey()), signed.getValue());
            }
            total = total.plus(adams.times(bySize.getKey(), rest, budget));
        }
        return dividedBy(total, diagram.size());
    }

    /**
     * The border strips of a diagram, one for each hook. With the row lengths turned into a strictly decreasing list,
     * row i plus the number of rows below, a strip of k boxes takes one entry down by k to a number that is not in the
     * list, and its sign is the parity of the entries jumped over (Macdonald, I.1 example 8).
     */
    private Map<Integer, Map<Partition, Long>> withoutStrips(Partition diagram) {
        int rows = diagram.length();
        int[] entries = new int[rows];
        for (int i = 0; i < rows; i++) {
            entries[i] = Math.addExact(diagram.row(i), rows - 1 - i);
        }
        Map<Integer, Map<Partition, Long>> result = new TreeMap<>();
        for (int i = 0; i < rows; i++) {
            int jumped = 0;
            for (int target = entries[i] - 1; target >= 0; target--) {
                if (i + jumped + 1 < rows && entries[i + jumped + 1] == target) {
                    jumped++;
                } else {
                    budget.spend(rows);
                    result.computeIfAbsent(entries[i] - target, size -> new HashMap<>())
                            .put(moved(entries, i, jumped, target), jumped % 2 == 0 ? 1L : -1L);
                }
            }
        }
        return result;
    }

    private static Partition moved(int[] entries, int from, int jumped, int target) {
        int[] list = entries.clone();
        System.arraycopy(entries, from + 1, list, from, jumped);
        list[from + jumped] = target;
        for (int i = 0; i < list.length; i++) {
            list[i] -= list.length - 1 - i;
        }
        return Partition.of(list);
    }

    private Decomposition<I> dividedBy(Decomposition<I> sum, long divisor) {
        Map<I, Long> quotient = new HashMap<>();
        sum.multiplicities().forEach((irrep, count) -> {
            if (count % divisor != 0) {
                throw new IllegalStateException("the recursion leaves a rest at " + irrep);
            }
            quotient.put(irrep, count / divisor);
        });
        return Decomposition.of(quotient);
    }
}
