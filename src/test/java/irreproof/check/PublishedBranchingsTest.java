package irreproof.check;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import irreproof.budget.Budget;
import irreproof.engine.Decomposition;
import irreproof.engine.Rational;
import irreproof.engine.lie.DominantWeight;
import irreproof.engine.lie.Published;
import irreproof.engine.lie.ReductiveAlgebra;
import irreproof.engine.lie.ReductiveIrrep;
import irreproof.engine.lie.SimpleAlgebra;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.junit.jupiter.api.Test;

/**
 * What {@code derive} prints against the published tables of branching rules, each with its source in the file: one of the
 * lines is the published one, up to what is the author's choice (conjugations, names of spinors, signs and scales of
 * charges).
 */
class PublishedBranchingsTest {
    private static final Pattern TERM = Pattern.compile("(?:(\\d+)[*x]?)?\\[([^;\\]]*)(?:;([^\\]]*))?\\]");
    private static final Pattern PRINTED =
            Pattern.compile("(?:(\\d+)\\\\,)?\\(((?:\\([\\d,]+\\),?)+|[\\d,]+)\\)(?:_\\{([-\\d,/]+)\\})?");

    @Test
    void aLineOfDeriveIsThePublishedOne() {
        int checked = 0;
        List<String> wrong = new ArrayList<>();
        for (Map<String, String> row : Published.rows("branchings.tsv")) {
            if (row.get("decomposition_dynkin_bourbaki").isEmpty()) {
                continue;
            }
            SimpleAlgebra algebra = Published.algebra(row.get("group")).orElseThrow();
            DominantWeight irrep = Published.weight(algebra, row.get("irrep_dynkin_bourbaki"));
            ReductiveAlgebra subalgebra = subalgebra(row.get("subgroup"));
            String groups = row.get("group") + " -> " + row.get("subgroup");
            Derivation.Result result =
                    Derivation.derive(irrep.toString(), groups, DerivedNotation.DYNKIN, Budget.of(1_000_000_000));
            assertTrue(result.ok(), () -> row + ": " + result.text());
            Decomposition<ReductiveIrrep> expected = scaled(published(row, subalgebra), subalgebra);
            boolean found = result.text()
                    .lines()
                    .map(line -> scaled(printed(line, subalgebra), subalgebra))
                    .anyMatch(sum -> RestrictionImages.of(sum, subalgebra).contains(expected));
            if (!found) {
                wrong.add(
                        groups + " " + irrep + ": " + row.get("decomposition_dynkin_bourbaki") + "\n" + result.text());
            }
            checked++;
        }
        assertEquals(List.of(), wrong);
        assertEquals(293, checked);
    }

    private static ReductiveAlgebra subalgebra(String group) {
        List<SimpleAlgebra> factors = new ArrayList<>();
        int charges = 0;
        for (String factor : group.split(" x ")) {
            if (factor.equals("U(1)")) {
                charges++;
            } else {
                factors.add(Published.algebra(factor).orElseThrow());
            }
        }
        return new ReductiveAlgebra(factors, charges);
    }

    private static Decomposition<ReductiveIrrep> published(Map<String, String> row, ReductiveAlgebra algebra) {
        Map<ReductiveIrrep, Long> terms = new TreeMap<>();
        Matcher term = TERM.matcher(row.get("decomposition_dynkin_bourbaki"));
        while (term.find()) {
            List<DominantWeight> weights = new ArrayList<>();
            String[] labels = term.group(2).strip().split(" ");
            for (int i = 0; i < labels.length; i++) {
                weights.add(Published.weight(algebra.factors().get(i), labels[i]));
            }
            long count = term.group(1) == null ? 1 : Long.parseLong(term.group(1));
            terms.merge(new ReductiveIrrep(weights, charges(term.group(3))), count, Long::sum);
        }
        return Decomposition.of(terms);
    }

    private static Decomposition<ReductiveIrrep> printed(String line, ReductiveAlgebra algebra) {
        Map<ReductiveIrrep, Long> terms = new TreeMap<>();
        String right = line.substring(line.indexOf("\\to") + 3).replaceAll(" %.*", "");
        for (String written : right.split("\\\\oplus")) {
            Matcher term = PRINTED.matcher(written.strip());
            assertTrue(term.matches(), written);
            List<DominantWeight> weights = Arrays.stream(term.group(2).split("\\),\\("))
                    .map(labels -> labels.replaceAll("[()]", "").split(","))
                    .map(labels -> DominantWeight.of(
                            Arrays.stream(labels).mapToInt(Integer::parseInt).toArray()))
                    .toList();
            long count = term.group(1) == null ? 1 : Long.parseLong(term.group(1));
            terms.merge(new ReductiveIrrep(weights, charges(term.group(3))), count, Long::sum);
        }
        return Decomposition.of(terms);
    }

    private static List<Rational> charges(String written) {
        if (written == null) {
            return List.of();
        }
        return Arrays.stream(written.split(","))
                .map(PublishedBranchingsTest::charge)
                .toList();
    }

    private static Rational charge(String written) {
        String[] parts = written.strip().split("/");
        BigInteger denominator = parts.length == 2 ? new BigInteger(parts[1]) : BigInteger.ONE;
        return new Rational(new BigInteger(parts[0]), denominator);
    }

    /** With 1 as the largest charge of each U(1). */
    private static Decomposition<ReductiveIrrep> scaled(Decomposition<ReductiveIrrep> sum, ReductiveAlgebra algebra) {
        List<Rational> largest = new ArrayList<>();
        for (int i = 0; i < algebra.charges(); i++) {
            int charge = i;
            Rational most = sum.multiplicities().keySet().stream()
                    .map(irrep -> irrep.charges().get(charge))
                    .map(value -> value.signum() < 0 ? value.negate() : value)
                    .max(Rational::compareTo)
                    .orElseThrow();
            largest.add(most.signum() == 0 ? Rational.ONE : most);
        }
        Map<ReductiveIrrep, Long> terms = new TreeMap<>();
        sum.multiplicities().forEach((irrep, count) -> {
            List<Rational> charges = new ArrayList<>();
            for (int i = 0; i < largest.size(); i++) {
                charges.add(irrep.charges().get(i).dividedBy(largest.get(i)));
            }
            terms.put(new ReductiveIrrep(irrep.weights(), charges), count);
        });
        return Decomposition.of(terms);
    }
}
