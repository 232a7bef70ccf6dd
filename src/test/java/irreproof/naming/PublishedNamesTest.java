package irreproof.naming;

import static org.junit.jupiter.api.Assertions.assertEquals;

import irreproof.budget.Budget;
import irreproof.engine.lie.Conjugation;
import irreproof.engine.lie.DominantWeight;
import irreproof.engine.lie.Published;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.junit.jupiter.api.Test;

/** Names against the published tables; the source stands in each row of the files. */
class PublishedNamesTest {
    private final Budget budget = Budget.unlimited();

    @Test
    void reproducesEveryPublishedLabelBothWays() {
        int checked = 0;
        for (Map<String, String> row : Published.rows("labels.tsv")) {
            LieGroup group = WrittenNames.group(row.get("group")).orElseThrow();
            assertNames(group, row.get("name"), Published.weight(group.algebra(), row.get("dynkin_bourbaki")));
            checked++;
        }
        assertEquals(265, checked);
    }

    @Test
    void reproducesTheNamesBesidePublishedInvariants() {
        int checked = 0;
        for (Map<String, String> row : Published.rows("invariants.tsv")) {
            Optional<LieGroup> group = WrittenNames.group(row.get("group"));
            if (group.isPresent() && !row.get("dynkin_bourbaki").isEmpty()) {
                assertNames(
                        group.get(),
                        row.get("irrep"),
                        Published.weight(group.get().algebra(), row.get("dynkin_bourbaki")));
                checked++;
            }
        }
        assertEquals(134, checked);
    }

    @Test
    void reproducesTheNamesBesidePublishedDimensions() {
        int checked = 0;
        for (Map<String, String> row : Published.rows("dims.tsv")) {
            if (row.get("kind").equals("irrep")) {
                LieGroup group = WrittenNames.group(row.get("group")).orElseThrow();
                assertNames(group, row.get("name"), Published.weight(group.algebra(), row.get("dynkin_bourbaki")));
                checked++;
            }
        }
        assertEquals(1560, checked);
    }

    /** Names and Dynkin labels stand in the same order in the two columns. */
    @Test
    void reproducesTheNamesInPublishedProducts() {
        int checked = 0;
        for (Map<String, String> row : Published.rows("products.tsv")) {
            Optional<LieGroup> group = WrittenNames.group(row.get("group"));
            boolean named = !row.get("kind").equals("spins")
                    && !row.get("decomposition_dynkin_bourbaki").isEmpty();
            if (group.isEmpty() || !named) {
                continue;
            }
            List<IrrepLabel> names = WrittenNames.sum(row.get("decomposition"));
            List<DominantWeight> weights =
                    Published.terms(group.get().algebra(), row.get("decomposition_dynkin_bourbaki"));
            assertEquals(names.size(), weights.size(), row::toString);
            DimensionNames dimensionNames = new DimensionNames(group.get());
            for (int i = 0; i < names.size(); i++) {
                assertEquals(names.get(i), dimensionNames.labelOf(weights.get(i), budget), row::toString);
            }
            checked++;
        }
        assertEquals(254, checked);
    }

    private void assertNames(LieGroup group, String written, DominantWeight irrep) {
        DimensionNames names = new DimensionNames(group);
        IrrepLabel label = WrittenNames.label(written);
        String shown = group.display() + " " + written + " = " + irrep;
        assertEquals(label, names.labelOf(irrep, budget), shown);
        for (int moreBars = 0; moreBars < 2; moreBars++) {
            int bars = (label.barred() ? 1 : 0) + moreBars;
            Candidate first = names.candidates(label.dimension(), bars, label.primes(), label.suffix(), budget)
                    .get(0);
            DominantWeight expected = moreBars == 1 ? Conjugation.conjugate(group.algebra(), irrep) : irrep;
            assertEquals(new Candidate(expected, Custom.TABLES), first, shown + " with " + bars + " bars");
        }
    }
}
