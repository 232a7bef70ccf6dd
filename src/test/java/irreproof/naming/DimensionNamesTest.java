package irreproof.naming;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import irreproof.budget.Budget;
import irreproof.budget.BudgetExceeded;
import irreproof.engine.lie.Conjugation;
import irreproof.engine.lie.DominantWeight;
import java.math.BigInteger;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import java.util.stream.Collectors;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** Names both ways; the published values stand in {@link PublishedNamesTest}. */
class DimensionNamesTest {
    private final Budget budget = Budget.unlimited();

    /** Theorems of naming, no source needed: names are unique, denote their irrep first, and conjugate by a bar. */
    @ParameterizedTest
    @ValueSource(
            strings = {
                "SU(2)", "SU(3)", "SU(4)", "SU(5)", "SU(6)", "SU(7)", "SU(9)", "SU(50)", "SO(3)", "SO(5)", "SO(6)",
                "SO(7)", "SO(8)", "SO(9)", "SO(10)", "SO(12)", "SO(14)", "SO(16)", "SO(32)", "Sp(2)", "Sp(4)", "Sp(6)",
                "Sp(8)", "Sp(16)", "G2", "F4", "E6", "E7", "E8"
            })
    void everyNameUpToTenThousandDenotesItsIrrepFirst(String written) {
        LieGroup group = WrittenNames.family(written);
        DimensionNames names = new DimensionNames(group);
        List<DominantWeight> irreps = IrrepSearch.upToDimension(group.algebra(), BigInteger.valueOf(10_000), budget);
        Set<IrrepLabel> seen = new HashSet<>();
        for (DominantWeight irrep : irreps) {
            IrrepLabel label = names.labelOf(irrep, budget);
            String shown = label + " of " + written;
            assertTrue(seen.add(label), () -> shown + " names two irreps");
            List<Candidate> candidates = candidates(names, label, 0);
            assertEquals(new Candidate(irrep, Custom.TABLES), candidates.get(0), shown);
            assertEquals(
                    candidates.size(),
                    candidates.stream().map(Candidate::irrep).distinct().count(),
                    () -> shown + " lists an irrep twice");

            DominantWeight conjugate = Conjugation.conjugate(group.algebra(), irrep);
            IrrepLabel conjugateLabel = names.labelOf(conjugate, budget);
            assertEquals(!conjugate.equals(irrep), label.barred() != conjugateLabel.barred(), shown);
            assertEquals(label.primes(), conjugateLabel.primes(), shown);
            assertEquals(
                    candidates.stream()
                            .map(candidate -> Conjugation.conjugate(group.algebra(), candidate.irrep()))
                            .toList(),
                    candidates(names, label, 1).stream().map(Candidate::irrep).toList(),
                    shown);
        }
        assertEquals(irreps.size(), seen.size());
    }

    /**
     * Sources: the first of each list as in labels.tsv; the others from the authors' differences that the class comments
     * of {@link ConjugatePairs} and {@link TrialityImages} describe. T tables, M mirrored, O other primes.
     */
    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            nullValues = "-",
            value = {
                "SU(3)  | 15      | -  | (2,1)T (1,2)M (4,0)O (0,4)O",
                "SU(3)  | 15~     | -  | (1,2)T (2,1)M (0,4)O (4,0)O",
                "SU(3)  | 15'     | -  | (4,0)T (0,4)M (2,1)O (1,2)O",
                "SU(3)  | 8       | -  | (1,1)T",
                "SU(3)  | 8~      | -  | (1,1)T",
                "SU(3)  | 3'      | -  | (1,0)O (0,1)O",
                "SU(3)  | 6       | S  | (2,0)T (0,2)M",
                "SU(3)  | 7       | -  | ",
                "SU(3)  | 0       | -  | ",
                "SU(4)  | 20      | -  | (0,1,1)T (1,1,0)M (0,2,0)O (0,0,3)O (3,0,0)O",
                "SU(4)  | 20      | M  | (0,1,1)T (1,1,0)M (0,2,0)O (0,0,3)O (3,0,0)O",
                "SU(2)  | 2~      | -  | (1)T",
                "SO(3)  | 2       | -  | (1)T",
                "SO(5)  | 4       | -  | (0,1)T",
                "SO(5)  | 5       | -  | (1,0)T",
                "SO(5)  | 35'     | -  | (0,4)T (1,2)O",
                "SO(6)  | 4       | -  | (0,1,0)T (0,0,1)M",
                "SO(6)  | 10      | -  | (0,2,0)T (0,0,2)M",
                "SO(6)  | 6       | -  | (1,0,0)T",
                "SO(10) | 16      | -  | (0,0,0,0,1)T (0,0,0,1,0)M",
                "SO(10) | 16      | s  | (0,0,0,0,1)T (0,0,0,1,0)M",
                "SO(10) | 16      | c  | (0,0,0,1,0)T (0,0,0,0,1)M",
                "SO(10) | 126     | s  | (0,0,0,0,2)T (0,0,0,2,0)M",
                "SO(10) | 45      | a  | (0,1,0,0,0)T",
                "SO(12) | 32      | -  | (0,0,0,0,0,1)T (0,0,0,0,1,0)M",
                "SO(12) | 32      | +  | (0,0,0,0,0,1)T (0,0,0,0,1,0)M",
                "SO(12) | 32'     | -  | (0,0,0,0,1,0)T (0,0,0,0,0,1)M",
                "SO(12) | 352     | -  | (1,0,0,0,0,1)T (1,0,0,0,1,0)M (3,0,0,0,0,0)O",
                "SO(8)  | 8       | v  | (1,0,0,0)T",
                "SO(8)  | 8       | s  | (0,0,0,1)T (0,0,1,0)M",
                "SO(8)  | 8       | c  | (0,0,1,0)T (0,0,0,1)M",
                "SO(8)  | 8       | +  | (0,0,0,1)T (0,0,1,0)M",
                "SO(8)  | 8       | -  | (1,0,0,0)T (0,0,0,1)M (0,0,1,0)M",
                "SO(8)  | 35      | -  | (2,0,0,0)T (0,0,0,2)M (0,0,2,0)M",
                "SO(8)  | 28      | s  | (0,1,0,0)T",
                "SO(8)  | 1       | s  | (0,0,0,0)T",
                "SO(8)  | 56      | s  | (1,0,1,0)T (1,0,0,1)M",
                "SO(8)  | 56      | v  | (0,0,1,1)T",
                "SO(8)  | 224     | vs | (2,0,0,1)T (2,0,1,0)M (1,0,0,2)M",
                "SO(8)  | 28      | a  | (0,1,0,0)T",
                "SO(8)  | 35      | a  | (2,0,0,0)T (0,0,0,2)M (0,0,2,0)M",
            })
    void listsWhatAWrittenNameCanDenote(String group, String written, String suffix, String expected) {
        IrrepLabel label = WrittenNames.label(written);
        String shown = new DimensionNames(WrittenNames.family(group))
                        .candidates(
                                label.dimension(),
                                label.barred() ? 1 : 0,
                                label.primes(),
                                suffix == null ? "" : suffix,
                                budget)
                        .stream()
                        .map(candidate ->
                                candidate.irrep() + candidate.custom().name().substring(0, 1))
                        .collect(Collectors.joining(" "));
        assertEquals(expected == null ? "" : expected, shown);
    }

    /** The lower sign of a chiral pair, which a table cell that reads "-" for "none" cannot say. */
    @Test
    void readsAMinusAsTheOtherChirality() {
        DominantWeight other = DominantWeight.of(0, 0, 0, 0, 1, 0);
        List<Candidate> minus =
                new DimensionNames(LieGroup.so(12)).candidates(BigInteger.valueOf(32), 0, 0, "-", budget);
        assertEquals(new Candidate(other, Custom.TABLES), minus.get(0));
    }

    @Test
    void twoBarsCancel() {
        DimensionNames names = new DimensionNames(LieGroup.su(5));
        assertEquals(
                names.candidates(BigInteger.TEN, 0, 0, "", budget), names.candidates(BigInteger.TEN, 2, 0, "", budget));
    }

    @Test
    void refusesWhatOutgrowsTheBudgetEvenIfItWasFoundBefore() {
        DimensionNames names = new DimensionNames(LieGroup.su(3));
        BigInteger dimension = BigInteger.valueOf(8);
        assertFalse(names.irrepsOfDimension(dimension, budget).isEmpty());
        assertThrows(BudgetExceeded.class, () -> names.irrepsOfDimension(dimension, Budget.of(1)));
        BigInteger huge = BigInteger.TEN.pow(30);
        assertThrows(BudgetExceeded.class, () -> names.irrepsOfDimension(huge, Budget.of(100_000)));
    }

    @Test
    void refusesLabelsBeyondTheRangeOfNumbers() {
        DimensionNames names = new DimensionNames(LieGroup.su(2));
        assertThrows(BudgetExceeded.class, () -> names.irrepsOfDimension(BigInteger.TEN.pow(12), budget));
    }

    @Test
    void givesOneAnswerToManyThreads() {
        LieGroup group = LieGroup.so(14);
        List<DominantWeight> irreps = IrrepSearch.upToDimension(group.algebra(), BigInteger.valueOf(100_000), budget);
        List<IrrepLabel> parallel = irreps.parallelStream()
                .map(irrep -> new DimensionNames(group).labelOf(irrep, Budget.unlimited()))
                .toList();
        List<IrrepLabel> serial = irreps.stream()
                .map(irrep -> new DimensionNames(group).labelOf(irrep, budget))
                .toList();
        assertEquals(serial, parallel);
    }

    private List<Candidate> candidates(DimensionNames names, IrrepLabel label, int moreBars) {
        int bars = (label.barred() ? 1 : 0) + moreBars;
        return names.candidates(label.dimension(), bars, label.primes(), label.suffix(), budget);
    }
}
