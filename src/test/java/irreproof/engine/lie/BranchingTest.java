package irreproof.engine.lie;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import irreproof.budget.Budget;
import irreproof.budget.BudgetExceeded;
import irreproof.engine.Decomposition;
import irreproof.engine.Rational;
import java.util.List;
import org.junit.jupiter.api.Test;

class BranchingTest {
    private static final SimpleAlgebra SU2 = new SimpleAlgebra(Series.A, 1);
    private static final SimpleAlgebra SU3 = new SimpleAlgebra(Series.A, 2);

    private static Decomposition<ReductiveIrrep> branch(Embedding embedding, DominantWeight irrep) {
        return Branching.branch(embedding, irrep, Budget.unlimited());
    }

    /** Each row of published/branchings.tsv names its source, and prints the projection used here. */
    @Test
    void agreesWithPublishedBranchingsByTheirProjections() {
        int checked = 0;
        for (PublishedBranchings.Row row : PublishedBranchings.rows()) {
            if (row.printed().isPresent()) {
                assertEquals(row.decomposition(), branch(row.printed().get(), row.irrep()), row.cells()::toString);
                checked++;
            }
        }
        System.out.println("branchings by printed projections: " + checked);
        assertTrue(checked > 280);
    }

    /** U(1) generators are traceless; charges need not be whole. */
    private static Embedding isospinAndHypercharge() {
        List<List<Rational>> rows =
                List.of(List.of(Rational.ONE, Rational.ZERO), List.of(Rational.of(1, 3), Rational.of(2, 3)));
        return new Embedding(SU3, new ReductiveAlgebra(List.of(SU2), 1), rows, "isospin and hypercharge");
    }

    /** Common practice: the octet holds isospin 1/2 with hypercharge 1 and -1, and 1 and 0 with 0. */
    @Test
    void branchesTheOctet() {
        assertEquals(
                Decomposition.sum(List.of(irrep(1, 1), irrep(1, -1), irrep(2, 0), irrep(0, 0))),
                branch(isospinAndHypercharge(), DominantWeight.of(1, 1)));
        assertEquals(
                Decomposition.sum(List.of(
                        new ReductiveIrrep(List.of(DominantWeight.of(1)), List.of(Rational.of(1, 3))),
                        new ReductiveIrrep(List.of(DominantWeight.of(0)), List.of(Rational.of(-2, 3))))),
                branch(isospinAndHypercharge(), DominantWeight.of(1, 0)));
    }

    private static ReductiveIrrep irrep(int label, int charge) {
        return new ReductiveIrrep(List.of(DominantWeight.of(label)), List.of(Rational.of(charge)));
    }

    @Test
    void chainsRestrictLikeTheirSteps() {
        Embedding first = isospinAndHypercharge();
        Embedding torus =
                new Embedding(SU2, new ReductiveAlgebra(List.of(), 1), List.of(List.of(Rational.of(1, 2))), "T3");
        Embedding chain = first.then(0, torus);
        assertEquals(2, chain.subalgebra().charges());
        DominantWeight irrep = DominantWeight.of(2, 1);
        Decomposition<ReductiveIrrep> stepwise = Decomposition.zero();
        for (var term : branch(first, irrep).multiplicities().entrySet()) {
            stepwise =
                    stepwise.plus(Branching.branch(List.of(torus), term.getKey(), Budget.unlimited()), term.getValue());
        }
        assertEquals(stepwise, branch(chain, irrep));
        assertThrows(IllegalArgumentException.class, () -> first.then(0, first));
    }

    @Test
    void theIdentityChangesNothing() {
        DominantWeight irrep = DominantWeight.of(3, 1);
        assertEquals(
                Decomposition.of(new ReductiveIrrep(List.of(irrep), List.of())),
                branch(Embedding.identity(SU3), irrep));
    }

    @Test
    void refusesWhatIsTooLarge() {
        SimpleAlgebra e8 = new SimpleAlgebra(Series.E, 8);
        DominantWeight huge = DominantWeight.of(9, 9, 9, 9, 9, 9, 9, 9);
        assertThrows(BudgetExceeded.class, () -> Branching.branch(Embedding.identity(e8), huge, Budget.of(1_000_000)));
    }
}
