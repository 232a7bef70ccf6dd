package irreproof.naming;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import irreproof.budget.Budget;
import irreproof.budget.BudgetExceeded;
import irreproof.engine.lie.DominantWeight;
import irreproof.engine.lie.Published;
import java.util.Map;
import java.util.Optional;
import java.util.stream.Collectors;
import org.junit.jupiter.api.Test;

class FactsTest {
    /** Values from invariants.tsv, each row with its source. */
    @Test
    void statesThePublishedInvariants() {
        int checked = 0;
        for (Map<String, String> row : Published.rows("invariants.tsv")) {
            Optional<LieGroup> group = WrittenNames.group(row.get("group"));
            if (group.isEmpty() || row.get("dynkin_bourbaki").isEmpty()) {
                continue;
            }
            DominantWeight irrep = Published.weight(group.get().algebra(), row.get("dynkin_bourbaki"));
            IrrepFacts facts = Facts.of(group.get(), irrep, Budget.unlimited());
            assertEquals(row.get("dim"), facts.dimension().toString(), row::toString);
            assertEquals(row.get("reality"), line(facts, "reality"), row::toString);
            assertEquals("T = l/2 = " + row.get("T=l/2"), line(facts, "index").split(", | \\(")[1], row::toString);
            assertEquals(WrittenNames.label(row.get("irrep")), facts.label().orElseThrow(), row::toString);
            facts.anomaly()
                    .ifPresent(anomaly ->
                            assertEquals(row.get("cubic_anomaly (fund=1)"), anomaly.toString(), row::toString));
            checked++;
        }
        assertEquals(134, checked);
    }

    @Test
    void putsThemIntoWords() {
        assertEquals("""
                dimension: 15
                Dynkin label: (2,1)
                Young diagram: \u25a1\u25a1\u25a1
                \u25a1
                N-ality: 1 mod 3
                index: l = 20, T = l/2 = 10 (the 3 has l = 1)
                quadratic Casimir: 16/3 (the 3 has 4/3)
                reality: complex
                cubic anomaly: 14 (the 3 has 1)""", words(LieGroup.su(3), 2, 1));
        assertEquals("""
                dimension: 2
                spin: 1/2
                Dynkin label: (1)
                Young diagram: \u25a1
                N-ality: 1 mod 2
                index: l = 1, T = l/2 = 1/2 (the 2 has l = 1)
                quadratic Casimir: 3/4 (the 2 has 3/4)
                reality: pseudoreal""", words(LieGroup.su(2), 1));
        assertEquals("""
                dimension: 16
                Dynkin label: (0,0,0,0,1)
                congruence class: (1,1)
                index: l = 4, T = l/2 = 2 (the 10 has l = 2)
                quadratic Casimir: 45/8 (the 10 has 9/2)
                reality: complex""", words(LieGroup.so(10), 0, 0, 0, 0, 1));
        assertEquals("""
                dimension: 14
                Dynkin label: (0,1) in Bourbaki's order, (1,0) in Slansky's
                index: l = 8, T = l/2 = 4 (the 7 has l = 2)
                quadratic Casimir: 4 (the 7 has 2)
                reality: real""", words(WrittenNames.family("G2"), 0, 1));
    }

    @Test
    void givesRowLengthsForALargeDiagram() {
        IrrepFacts facts = Facts.of(LieGroup.su(3), DominantWeight.of(30, 2), Budget.unlimited());
        assertEquals("rows (32,2)", line(facts, "Young diagram"));
    }

    @Test
    void leavesOutANameThatOutgrowsTheBudget() {
        IrrepFacts facts = Facts.of(LieGroup.su(3), DominantWeight.of(4000, 4000), Budget.of(1000));
        assertEquals(Optional.empty(), facts.label());
        assertEquals("64048012001", line(facts, "dimension"));
        Budget cancelled = Budget.unlimited();
        cancelled.cancel();
        assertThrows(BudgetExceeded.class, () -> Facts.of(LieGroup.su(3), DominantWeight.of(40, 40), cancelled));
    }

    private static String words(LieGroup group, int... labels) {
        return Facts.of(group, DominantWeight.of(labels), Budget.unlimited()).lines().stream()
                .map(line -> line.label() + ": " + line.value())
                .collect(Collectors.joining("\n"));
    }

    private static String line(IrrepFacts facts, String label) {
        return facts.lines().stream()
                .filter(line -> line.label().equals(label))
                .map(IrrepFacts.Line::value)
                .findFirst()
                .orElseThrow();
    }
}
