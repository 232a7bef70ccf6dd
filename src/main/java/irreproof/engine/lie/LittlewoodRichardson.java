package irreproof.engine.lie;

import irreproof.budget.Budget;
import irreproof.budget.BudgetExceeded;
import irreproof.engine.Decomposition;
import irreproof.engine.Partition;
import java.util.Arrays;
import java.util.HashMap;
import java.util.Map;

/**
 * Products of SU(N) irreps by the Littlewood-Richardson rule (Macdonald, Symmetric Functions and Hall Polynomials, I.9):
 * the rows of one diagram are added to the other as horizontal strips, row i as boxes filled with i, so that reading from
 * the right and down no i+1 ever leads. The rule ties each strip only to the one before it, so strips that lead to the
 * same shape with the same last strip are counted together.
 *
 * <p>Cost: one step per row looked at while placing strips, and for each row of a shape kept; independent of the dimensions, hence fit for large N. Of the
 * two factors and their conjugates the one with the fewest boxes is added. At most 1000 rows in all. A multiplicity beyond 64 bits throws
 * {@link ArithmeticException}.
 */
public final class LittlewoodRichardson {
    /** The placing of strips recurses row by row. */
    private static final int MOST_ROWS = 1000;

    private final int[] added;
    private final int rows;
    private final Budget budget;
    private Map<State, Long> next = new HashMap<>();

    private LittlewoodRichardson(int[] added, int rows, Budget budget) {
        this.added = added;
        this.rows = rows;
        this.budget = budget;
    }

    /** The product of two irreps of SU(N), N being the number of labels plus one. */
    public static Decomposition<DominantWeight> product(DominantWeight left, DominantWeight right, Budget budget) {
        SimpleAlgebra algebra = new SimpleAlgebra(Series.A, left.rank());
        algebra.requireWeight(right);
        budget.require(ProductBound.leastIrreps(algebra, left, right), "a product of irreps of " + algebra);
        DominantWeight leftDual = Conjugation.conjugate(algebra, left);
        DominantWeight rightDual = Conjugation.conjugate(algebra, right);
        long boxes = Math.min(boxes(left), boxes(right));
        boolean dual = Math.min(boxes(leftDual), boxes(rightDual)) < boxes;
        Partition first = Diagrams.partition(dual ? leftDual : left);
        Partition second = Diagrams.partition(dual ? rightDual : right);
        int degree = left.rank() + 1;
        Map<Partition, Long> diagrams;
        try {
            diagrams = multiply(first, second, degree, budget);
        } catch (BudgetExceeded stopped) {
            throw stopped.reason() == BudgetExceeded.Cause.STEPS ? tooLarge(first, second, degree, stopped) : stopped;
        }
        Map<DominantWeight, Long> terms = new HashMap<>();
        diagrams.forEach((diagram, count) -> {
            DominantWeight weight = Diagrams.weight(degree, diagram).orElseThrow();
            terms.put(dual ? Conjugation.conjugate(algebra, weight) : weight, count);
        });
        return Decomposition.of(terms);
    }

    /** The steps cannot be foretold, but a lower bound on the irreps can be told afterwards. */
    private static BudgetExceeded tooLarge(Partition first, Partition second, int degree, BudgetExceeded stopped) {
        String size = first.length() + second.length() > degree
                ? ""
                : "; it has at least " + HookLengths.leastTerms(first, second) + " irreps, counted with multiplicity";
        return new BudgetExceeded(
                BudgetExceeded.Cause.TOO_LARGE,
                "the product " + first + " x " + second + " is too large (" + stopped.getMessage() + size + ")");
    }

    private static long boxes(DominantWeight weight) {
        return Diagrams.partition(weight).size();
    }

    /**
     * The product of two Schur functions, diagrams with more rows than given left out.
     *
     * @param rows the largest number of rows kept: N for GL(N)
     */
    public static Map<Partition, Long> multiply(Partition left, Partition right, int rows, Budget budget) {
        Partition larger = left.size() < right.size() ? right : left;
        Partition smaller = larger == left ? right : left;
        if (larger.length() > rows || smaller.length() > rows) {
            return Map.of();
        }
        int used = Math.min(rows, larger.length() + smaller.length());
        if (used > MOST_ROWS) {
            throw new BudgetExceeded(
                    BudgetExceeded.Cause.TOO_LARGE, "a product of diagrams with " + used + " rows is too large");
        }
        int[] added = smaller.rows().stream().mapToInt(Integer::intValue).toArray();
        return new LittlewoodRichardson(added, used, budget).run(larger);
    }

    private Map<Partition, Long> run(Partition start) {
        int[] shape = new int[rows];
        for (int row = 0; row < rows; row++) {
            shape[row] = start.row(row);
        }
        budget.spend(1);
        Map<State, Long> states = Map.of(new State(shape, new int[rows]), 1L);
        for (int strip = 0; strip < added.length; strip++) {
            next = new HashMap<>();
            for (var entry : states.entrySet()) {
                State state = entry.getKey();
                new Placing(state, strip, entry.getValue()).place(0, added[strip], 0);
            }
            states = next;
        }
        Map<Partition, Long> result = new HashMap<>();
        states.forEach((state, count) -> result.merge(Partition.of(state.shape), count, Math::addExact));
        return result;
    }

    /** A shape, and how many boxes of the last strip lie in each row. */
    private static final class State {
        private final int[] shape;
        private final int[] strip;
        private final int hash;

        State(int[] shape, int[] strip) {
            this.shape = shape;
            this.strip = strip;
            // a multiplier of its own: by 31 a box more in a shape could balance one less in the strip
            this.hash = 0x9E3779B9 * Arrays.hashCode(shape) + Arrays.hashCode(strip);
        }

        @Override
        public boolean equals(Object other) {
            return other instanceof State that && Arrays.equals(shape, that.shape) && Arrays.equals(strip, that.strip);
        }

        @Override
        public int hashCode() {
            return hash;
        }
    }

    /** All ways to add one strip to one state. */
    private final class Placing {
        private final int[] shape;
        private final int number;
        private final long count;
        private final int[] placed = new int[rows];
        /** Boxes of the strip before in the rows above; how many boxes of this strip the rows up to here may hold. */
        private final long[] allowed = new long[rows];

        Placing(State state, int number, long count) {
            this.shape = state.shape;
            this.number = number;
            this.count = count;
            long above = 0;
            for (int row = 0; row < rows; row++) {
                allowed[row] = number == 0 ? added[0] : above;
                above += state.strip[row];
            }
        }

        /** Chooses for a row and those below, with so many boxes left and so many placed above. */
        void place(int row, int left, int above) {
            budget.spend(1);
            if (row == rows) {
                if (left == 0) {
                    finish();
                }
                return;
            }
            long room = row == 0 ? left : shape[row - 1] - shape[row];
            long most = Math.min(Math.min(room, left), allowed[row] - above);
            long least = Math.max(0, Math.max(left - roomBelow(row), neededBy(row) - above));
            for (long boxes = least; boxes <= most; boxes++) {
                placed[row] = (int) boxes;
                place(row + 1, (int) (left - boxes), (int) (above + boxes));
            }
            placed[row] = 0;
        }

        /** Rows below a row can take no more than the steps of the shape. */
        private long roomBelow(int row) {
            return shape[row] - shape[rows - 1];
        }

        /** Each later strip must go strictly lower than its predecessor, so enough of this one must lie high enough. */
        private int neededBy(int row) {
            int later = number + rows - 1 - row;
            return later > number && later < added.length ? added[later] : 0;
        }

        private void finish() {
            // a state to keep
            budget.spend(2L * rows);
            int[] newShape = new int[rows];
            for (int row = 0; row < rows; row++) {
                newShape[row] = Math.addExact(shape[row], placed[row]);
            }
            next.merge(new State(newShape, placed.clone()), count, Math::addExact);
        }
    }
}
