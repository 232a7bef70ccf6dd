package irreproof.engine.lie.embedding;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import irreproof.budget.Budget;
import irreproof.budget.BudgetExceeded;
import irreproof.engine.Decomposition;
import irreproof.engine.Rational;
import irreproof.engine.lie.Branching;
import irreproof.engine.lie.DominantWeight;
import irreproof.engine.lie.Embedding;
import irreproof.engine.lie.ReductiveAlgebra;
import irreproof.engine.lie.ReductiveIrrep;
import irreproof.engine.lie.Series;
import irreproof.engine.lie.SimpleAlgebra;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import org.junit.jupiter.api.Test;

class SubalgebraSearchTest {
    private static final Budget FREE = Budget.unlimited();

    private static SimpleAlgebra type(Series series, int rank) {
        return new SimpleAlgebra(series, rank);
    }

    private static ReductiveIrrep irrep(int... labels) {
        return new ReductiveIrrep(List.of(DominantWeight.of(labels)), List.of());
    }

    /** Common practice: the triplet is a triplet of SO(3), or a doublet and a singlet of isospin. */
    @Test
    void findsBothSubalgebrasOfOneType() {
        Set<Decomposition<ReductiveIrrep>> triplets = new HashSet<>();
        for (Embedding embedding :
                SubalgebraSearch.find(type(Series.A, 2), ReductiveAlgebra.of(type(Series.A, 1)), 2, FREE)) {
            triplets.add(Branching.branch(embedding, DominantWeight.of(1, 0), FREE));
        }
        assertEquals(Set.of(Decomposition.of(irrep(2)), Decomposition.sum(List.of(irrep(1), irrep(0)))), triplets);
    }

    /** SO(8) has three classes of SO(7), one for each eight-dimensional irrep that splits (triality; Baez, from memory). */
    @Test
    void trialityGivesThreeClasses() {
        SimpleAlgebra so8 = type(Series.D, 4);
        Embedding vector = ClassicalEmbeddings.orthogonalSum(1, 7, FREE);
        List<Embedding> variants = EmbeddingVariants.of(vector, FREE);
        assertEquals(3, variants.size());
        Set<DominantWeight> splitting = new HashSet<>();
        for (Embedding variant : variants) {
            for (int node : List.of(0, 2, 3)) {
                int[] labels = new int[4];
                labels[node] = 1;
                DominantWeight eight = DominantWeight.of(labels);
                if (Branching.branch(variant, eight, FREE).multiplicities().size() == 2) {
                    splitting.add(eight);
                }
            }
        }
        assertEquals(3, splitting.size());
        Embedding spinor = ClassicalEmbeddings.spinSeven(FREE);
        assertEquals(so8, spinor.algebra());
        assertTrue(variants.stream()
                .anyMatch(variant -> Fingerprint.of(variant, FREE).equals(Fingerprint.of(spinor, FREE))));
    }

    /** SU(3)^3 in E6: 27 = (3,3bar,1) + (1,3,3bar) + (3bar,1,3): in each factor the bar may change sides, 2^3 choices. */
    @Test
    void trinificationHasItsConjugates() {
        ReductiveAlgebra su3cubed =
                new ReductiveAlgebra(List.of(type(Series.A, 2), type(Series.A, 2), type(Series.A, 2)), 0);
        List<Embedding> found = SubalgebraSearch.find(type(Series.E, 6), su3cubed, 1, FREE);
        Set<Decomposition<ReductiveIrrep>> different = new HashSet<>();
        found.forEach(
                embedding -> different.add(Branching.branch(embedding, DominantWeight.of(1, 0, 0, 0, 0, 0), FREE)));
        assertEquals(different.size(), found.size());
        assertEquals(8, found.size());
    }

    /** SU(5): 5 = (3,1)(-1/3) + (1,2)(1/2), up to the charge's scale; also as a Levi subalgebra. */
    @Test
    void leviSubalgebrasAreTheFamilies() {
        SimpleAlgebra su5 = type(Series.A, 4);
        Embedding levi = RegularEmbeddings.levi(su5, List.of(2));
        Embedding family = ClassicalEmbeddings.unitarySum(3, 2, FREE);
        assertEquals(family.subalgebra(), levi.subalgebra());
        DominantWeight five = DominantWeight.of(1, 0, 0, 0);
        assertEquals(Branching.branch(family, five, FREE), Branching.branch(levi, five, FREE));
        Decomposition<ReductiveIrrep> expected = Decomposition.sum(List.of(
                new ReductiveIrrep(List.of(DominantWeight.of(1, 0), DominantWeight.of(0)), List.of(Rational.of(2))),
                new ReductiveIrrep(List.of(DominantWeight.of(0, 0), DominantWeight.of(1)), List.of(Rational.of(-3)))));
        assertEquals(expected, Branching.branch(levi, five, FREE));
        assertEquals(2, RegularEmbeddings.levi(su5, List.of(2, 3)).subalgebra().charges());
    }

    /** SO(5) and SO(6) by their own labels: the vectors of SO(11) under SO(5) x SO(6). */
    @Test
    void answersInTheNamesAsked() {
        ReductiveAlgebra orthogonal = new ReductiveAlgebra(List.of(type(Series.B, 2), type(Series.D, 3)), 0);
        ReductiveIrrep five =
                new ReductiveIrrep(List.of(DominantWeight.of(1, 0), DominantWeight.of(0, 0, 0)), List.of());
        ReductiveIrrep six =
                new ReductiveIrrep(List.of(DominantWeight.of(0, 0), DominantWeight.of(1, 0, 0)), List.of());
        List<Embedding> found = SubalgebraSearch.find(type(Series.B, 5), orthogonal, 1, FREE);
        assertEquals(1, found.size());
        assertEquals(
                Decomposition.sum(List.of(five, six)),
                Branching.branch(found.get(0), DominantWeight.of(1, 0, 0, 0, 0), FREE));
    }

    @Test
    void refusesMatricesThatKeepNoForm() {
        DefiningRepresentation spinThreeHalves = DefiningRepresentation.of(type(Series.A, 1), 3);
        assertEquals(
                1,
                MatrixEmbedding.of(type(Series.C, 2), spinThreeHalves, "spin 3/2", FREE)
                        .projection()
                        .size());
        DefiningRepresentation spinFiveHalves = DefiningRepresentation.of(type(Series.A, 1), 5);
        assertThrows(
                IllegalArgumentException.class,
                () -> MatrixEmbedding.of(type(Series.D, 3), spinFiveHalves, "spin 5/2", FREE));
        assertThrows(
                IllegalArgumentException.class,
                () -> MatrixEmbedding.of(type(Series.A, 4), spinThreeHalves, "spin 3/2", FREE));
    }

    @Test
    void searchesWithinTheBudget() {
        ReductiveAlgebra su2 = ReductiveAlgebra.of(type(Series.A, 1));
        assertThrows(
                BudgetExceeded.class, () -> SubalgebraSearch.find(type(Series.E, 8), su2, 6, Budget.of(1_000_000)));
    }

    /** Spinors are told apart without being restricted: SO(64) has two classes of SU(32) x U(1), charges up to sign. */
    @Test
    void findsSubalgebrasOfLargeGroups() {
        ReductiveAlgebra su32 = new ReductiveAlgebra(List.of(type(Series.A, 31)), 1);
        List<Embedding> found = SubalgebraSearch.find(type(Series.D, 32), su32, 1, FREE);
        Set<Fingerprint> classes = new HashSet<>();
        found.forEach(embedding -> classes.add(Fingerprint.of(embedding, FREE)));
        assertEquals(4, classes.size());
        assertEquals(4, found.size());
        assertEquals(
                2,
                found.stream()
                        .map(e -> Fingerprint.of(e, FREE).orientation())
                        .distinct()
                        .count());
    }

    /** The orientation agrees with the spinors themselves: they restrict alike exactly where it is 0. */
    @Test
    void orientationTellsSpinorsApart() {
        for (int rank = 4; rank <= 7; rank++) {
            SimpleAlgebra algebra = type(Series.D, rank);
            int[] left = new int[rank];
            int[] right = new int[rank];
            left[rank - 2] = 1;
            right[rank - 1] = 1;
            for (Embedding embedding : Embeddings.maximal(algebra, FREE)) {
                assertEquals(
                        Fingerprint.of(embedding, FREE).orientation() == 0,
                        Branching.branch(embedding, DominantWeight.of(left), FREE)
                                .equals(Branching.branch(embedding, DominantWeight.of(right), FREE)),
                        embedding::toString);
            }
        }
    }

    /** Common practice: the diagonal of SU(2) x SU(2) in SO(4), and hypercharge as T3R + (B-L)/2 in SO(10). */
    @Test
    void diagonalsAndMixedCharges() {
        Embedding product = ClassicalEmbeddings.unitaryProduct(2, 2, FREE);
        assertEquals(
                Decomposition.sum(List.of(irrep(2), irrep(0))),
                Branching.branch(product.diagonal(0, 1), DominantWeight.of(1, 0, 0), FREE));
        Embedding patiSalam = ClassicalEmbeddings.orthogonalSum(4, 6, FREE);
        Embedding colour = patiSalam.then(2, ClassicalEmbeddings.unitarySum(3, 1, FREE));
        Embedding broken = colour.then(1, RegularEmbeddings.levi(type(Series.A, 1), List.of(0)));
        assertEquals(new ReductiveAlgebra(List.of(type(Series.A, 1), type(Series.A, 2)), 2), broken.subalgebra());
        // charges of SU(4) > SU(3) x U(1) are 3 (B-L), of SU(2) > U(1) 2 T3
        Embedding hypercharge = broken.recharged(List.of(List.of(Rational.of(1, 6), Rational.of(1, 2))));
        Set<Rational> charges = new HashSet<>();
        Branching.branch(hypercharge, DominantWeight.of(0, 0, 0, 0, 1), FREE)
                .multiplicities()
                .keySet()
                .forEach(term -> charges.add(term.charges().get(0)));
        Set<Rational> family = Set.of(
                Rational.of(1, 6),
                Rational.of(-2, 3),
                Rational.of(1, 3),
                Rational.of(-1, 2),
                Rational.ONE,
                Rational.ZERO);
        Set<Rational> conjugate = new HashSet<>();
        family.forEach(charge -> conjugate.add(charge.negate()));
        assertTrue(charges.equals(family) || charges.equals(conjugate), charges::toString);
    }
}
