package irreproof.naming;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import irreproof.budget.Budget;
import irreproof.engine.lie.DominantWeight;
import java.math.BigInteger;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Names both ways for a spread of the irreps up to dimension ten million, within the steps that one name may cost. */
class ManyNamesTest {
    private static final BigInteger LARGEST = BigInteger.valueOf(10_000_000);

    /** As many as a front end spends on one name. */
    private static final long STEPS = 20_000_000;

    /** What the dearest of these names costs, rounded up: a fortieth of what is allowed. */
    private static final long MOST_SEEN = 500_000;

    private static final int SPREAD = 12;

    /** Columns: the group, and how many irreps it has up to that dimension. */
    @ParameterizedTest
    @CsvSource({
        "SU(3),182193",
        "SU(5),12706",
        "SU(12),816",
        "SU(50),44",
        "SO(7),1345",
        "SO(8),2918",
        "SO(10),886",
        "SO(11),282",
        "SO(32),30",
        "Sp(8),519",
        "Sp(20),60",
        "E6,167",
        "E7,42",
        "E8,12",
        "F4,74",
        "G2,523"
    })
    void everyNameLeadsBackToItsIrrep(String written, int expected) {
        LieGroup group = WrittenNames.family(written.replace("(", "").replace(")", ""));
        DimensionNames names = new DimensionNames(group);
        List<DominantWeight> irreps = IrrepSearch.upToDimension(group.algebra(), LARGEST, Budget.of(2_000_000_000));
        for (int i = 0; i < SPREAD; i++) {
            DominantWeight irrep = irreps.get((int) ((irreps.size() - 1L) * i / (SPREAD - 1)));
            Budget budget = Budget.of(STEPS);
            IrrepLabel label = names.labelOf(irrep, budget);
            assertTrue(STEPS - budget.remaining() < MOST_SEEN, () -> label + ": " + budget.remaining());
            List<Candidate> meanings =
                    names.candidates(label.dimension(), label.barred() ? 1 : 0, label.primes(), label.suffix(), budget);
            assertEquals(new Candidate(irrep, Custom.TABLES), meanings.get(0), label::toString);
            assertTrue(names.irrepsOfDimension(label.dimension(), budget).contains(irrep), label::toString);
            Set<DominantWeight> ofPlainName = new HashSet<>();
            names.candidates(label.dimension(), 0, 0, "", budget).forEach(found -> ofPlainName.add(found.irrep()));
            assertEquals(Set.copyOf(names.irrepsOfDimension(label.dimension(), budget)), ofPlainName, label::toString);
        }
        assertEquals(expected, irreps.size());
    }
}
