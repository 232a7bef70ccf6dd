package irreproof.engine.lie.embedding;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import irreproof.budget.Budget;
import irreproof.engine.Decomposition;
import irreproof.engine.Rational;
import irreproof.engine.lie.Branching;
import irreproof.engine.lie.Embedding;
import irreproof.engine.lie.PublishedBranchings;
import irreproof.engine.lie.ReductiveIrrep;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import org.junit.jupiter.api.Test;

/**
 * All rows of published/branchings.tsv (each with its source) that go by one name, by one embedding found from the types
 * of the groups alone. Charges agree up to one factor for each name.
 */
class PublishedBranchingsTest {
    private static final int LONGEST_CHAIN = 3;
    private static final Budget FREE = Budget.unlimited();

    @Test
    void constructedEmbeddingsGiveThePublishedBranchings() {
        Map<String, List<PublishedBranchings.Row>> names = new LinkedHashMap<>();
        for (PublishedBranchings.Row row : PublishedBranchings.rows()) {
            names.computeIfAbsent(row.cells().get("embedding"), key -> new ArrayList<>())
                    .add(row);
        }
        List<String> missing = new ArrayList<>();
        Map<Integer, Integer> rowsByLength = new HashMap<>();
        names.forEach((name, rows) -> {
            int steps = shortestChain(rows);
            if (steps > LONGEST_CHAIN) {
                missing.add(name + ": " + rows.get(0).cells());
            } else {
                rowsByLength.merge(steps, rows.size(), Integer::sum);
            }
        });
        System.out.println("branchings by constructed embeddings, by length of chain: " + rowsByLength + ", names "
                + names.size() + ", missing " + missing);
        assertEquals(List.of(), missing);
        assertTrue(rowsByLength.get(1) > 250);
    }

    private static int shortestChain(List<PublishedBranchings.Row> rows) {
        PublishedBranchings.Row first = rows.get(0);
        for (int steps = 1; steps <= LONGEST_CHAIN; steps++) {
            for (Embedding embedding : SubalgebraSearch.find(first.algebra(), first.subalgebra(), steps, FREE)) {
                if (agrees(embedding, rows)) {
                    return steps;
                }
            }
        }
        return LONGEST_CHAIN + 1;
    }

    private static boolean agrees(Embedding embedding, List<PublishedBranchings.Row> rows) {
        Set<Rational> scales = null;
        for (PublishedBranchings.Row row : rows) {
            Set<Rational> possible = scales(row, Branching.branch(embedding, row.irrep(), FREE));
            if (scales == null) {
                scales = possible;
            } else {
                scales.retainAll(possible);
            }
            if (scales.isEmpty()) {
                return false;
            }
        }
        return true;
    }

    /** The factors by which all charges may be multiplied to agree with the row: none, one or two. */
    private static Set<Rational> scales(PublishedBranchings.Row row, Decomposition<ReductiveIrrep> actual) {
        Rational scale = largest(actual).signum() == 0
                ? Rational.ONE
                : largest(row.decomposition()).dividedBy(largest(actual));
        Set<Rational> scales = new HashSet<>();
        for (Rational candidate : List.of(scale, scale.negate())) {
            if (scaled(actual, candidate).equals(row.decomposition())) {
                scales.add(candidate);
            }
        }
        return scales;
    }

    private static Rational largest(Decomposition<ReductiveIrrep> sum) {
        Rational largest = Rational.ZERO;
        for (ReductiveIrrep irrep : sum.multiplicities().keySet()) {
            for (Rational charge : irrep.charges()) {
                Rational size = charge.signum() < 0 ? charge.negate() : charge;
                largest = size.compareTo(largest) > 0 ? size : largest;
            }
        }
        return largest;
    }

    private static Decomposition<ReductiveIrrep> scaled(Decomposition<ReductiveIrrep> sum, Rational scale) {
        Map<ReductiveIrrep, Long> terms = new HashMap<>();
        sum.multiplicities().forEach((irrep, count) -> {
            List<Rational> charges = irrep.charges().stream().map(scale::times).toList();
            terms.merge(new ReductiveIrrep(irrep.weights(), charges), count, Long::sum);
        });
        return Decomposition.of(terms);
    }
}
