package irreproof.check;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import irreproof.budget.Budget;
import irreproof.engine.Decomposition;
import irreproof.engine.lie.DominantWeight;
import irreproof.engine.lie.LieRing;
import irreproof.engine.lie.Series;
import irreproof.naming.DimensionNames;
import irreproof.naming.IrrepLabel;
import irreproof.naming.LieGroup;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Test;

/**
 * Soundness on random products, printed with the names of the published tables: as they are they hold without a finding;
 * with a summand dropped, doubled or taken from elsewhere they fail, or are
 * undecided where what is left could be meant (a single term, one symmetry of a square). (That the products themselves are right is tested
 * in the engine, against GAP.)
 */
class RandomStatementsTest {
    private static final long SEED = 20261201;
    private static final int ROUNDS = 400;
    private static final List<LieGroup> GROUPS = List.of(
            LieGroup.su(2),
            LieGroup.su(3),
            LieGroup.su(4),
            LieGroup.su(5),
            LieGroup.su(6),
            LieGroup.so(7),
            LieGroup.so(8),
            LieGroup.so(9),
            LieGroup.so(10),
            LieGroup.so(12),
            LieGroup.sp(4),
            LieGroup.sp(6),
            LieGroup.exceptional(Series.G, 2),
            LieGroup.exceptional(Series.F, 4),
            LieGroup.exceptional(Series.E, 6));

    private int undecided;

    private final Random random = new Random(SEED);

    @Test
    void trueOnesHoldAndCorruptedOnesFail() {
        int corrupted = 0;
        for (int round = 0; round < ROUNDS; round++) {
            LieGroup group = GROUPS.get(random.nextInt(GROUPS.size()));
            LieRing ring = new LieRing(group.algebra());
            DominantWeight left = irrep(group);
            DominantWeight right = irrep(group);
            Decomposition<DominantWeight> product = ring.product(left, right, Budget.unlimited());
            List<String> terms = new ArrayList<>();
            product.multiplicities()
                    .forEach((irrep, count) -> terms.addAll(Collections.nCopies(count.intValue(), name(group, irrep))));
            if (terms.size() > 40) {
                continue;
            }
            Collections.shuffle(terms, random);
            String start = name(group, left) + "\\otimes" + name(group, right) + "=";
            String statement = start + String.join("\\oplus ", terms);
            StatementReport report = Fixture.only(group.display().replaceAll("([EFG])(\\d)", "$1_$2"), statement);
            assertEquals(Verdict.HOLDS, report.verdict(), () -> group.display() + ": " + statement + report.reason());
            assertEquals(List.of(), report.findings(), () -> group.display() + ": " + statement);
            if (terms.size() > 1) {
                corrupted++;
                check(group, start, terms);
            }
        }
        System.out.println("random statements: seed " + SEED + ", " + ROUNDS + " true, " + corrupted + " corrupted, "
                + undecided + " of them undecided");
        assertTrue(undecided * 8 <= corrupted, "undecided: " + undecided);
    }

    private void check(LieGroup group, String start, List<String> terms) {
        List<String> wrong = new ArrayList<>(terms);
        int place = random.nextInt(wrong.size());
        switch (random.nextInt(3)) {
            case 0 -> wrong.remove(place);
            case 1 -> wrong.add(wrong.get(place));
            default -> wrong.set(place, name(group, irrep(group)));
        }
        List<String> before = terms.stream().sorted().toList();
        if (before.equals(wrong.stream().sorted().toList())) {
            return;
        }
        String statement = start + String.join("\\oplus ", wrong);
        StatementReport report = Fixture.only(group.display().replaceAll("([EFG])(\\d)", "$1_$2"), statement);
        boolean renamed = report.verdict() == Verdict.HOLDS
                && report.findings().stream().anyMatch(finding -> finding.rule().equals("unusual-name"));
        if (report.verdict() == Verdict.UNDECIDED) {
            undecided++;
        } else if (!renamed) {
            assertEquals(Verdict.FAILS, report.verdict(), () -> group.display() + ": " + statement + report.reason());
            assertNotEquals(List.of(), report.findings(), () -> group.display() + ": " + statement);
        }
    }

    private DominantWeight irrep(LieGroup group) {
        int[] labels = new int[group.algebra().rank()];
        int sum = 1 + random.nextInt(group.algebra().rank() > 3 ? 1 : 2);
        for (int i = 0; i < sum; i++) {
            labels[random.nextInt(labels.length)]++;
        }
        return DominantWeight.of(labels);
    }

    private static String name(LieGroup group, DominantWeight irrep) {
        IrrepLabel label = new DimensionNames(group).labelOf(irrep, Budget.unlimited());
        String digits = "\\mathbf{" + label.dimension() + "}" + "'".repeat(label.primes());
        String suffix = label.suffix().isEmpty() ? "" : "_{" + label.suffix() + "}";
        return (label.barred() ? "\\overline{" + digits + "}" : digits) + suffix;
    }
}
