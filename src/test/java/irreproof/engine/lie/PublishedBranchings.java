package irreproof.engine.lie;

import irreproof.engine.Decomposition;
import irreproof.engine.Rational;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/** Reads {@code published/branchings.tsv}, whose projection matrices act on labels in the order of Slansky's tables. */
public final class PublishedBranchings {
    private static final Pattern TERM = Pattern.compile("(?:(\\d+)\\*)?\\[([^\\];]*)(?:;([^\\]]*))?\\]");
    private static final Pattern WEIGHT = Pattern.compile("\\([\\d,]+\\)");

    /** One published branching: what it starts from, and what it says. */
    public record Row(
            SimpleAlgebra algebra,
            ReductiveAlgebra subalgebra,
            DominantWeight irrep,
            Decomposition<ReductiveIrrep> decomposition,
            Optional<Embedding> printed,
            Map<String, String> cells) {}

    private PublishedBranchings() {}

    public static List<Row> rows() {
        List<Row> rows = new ArrayList<>();
        for (Map<String, String> cells : Published.rows("branchings.tsv")) {
            SimpleAlgebra algebra = Published.algebra(cells.get("group")).orElseThrow();
            ReductiveAlgebra subalgebra = subalgebra(cells.get("subgroup"));
            DominantWeight irrep = Published.weight(algebra, cells.get("irrep_dynkin_bourbaki"));
            String matrix = cells.get("projection_matrix_physics");
            Optional<Embedding> printed = matrix.isBlank()
                    ? Optional.empty()
                    : Optional.of(new Embedding(algebra, subalgebra, projection(algebra, subalgebra, matrix), matrix));
            String terms = cells.get("decomposition_dynkin_bourbaki");
            Decomposition<ReductiveIrrep> decomposition =
                    terms.isBlank() ? spins(cells.get("decomposition")) : decomposition(subalgebra, terms);
            rows.add(new Row(algebra, subalgebra, irrep, decomposition, printed, cells));
        }
        return rows;
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

    /** Decompositions under SU(2) are partly printed by dimensions alone: {@code 11 + 3}. */
    private static Decomposition<ReductiveIrrep> spins(String dimensions) {
        List<ReductiveIrrep> irreps = new ArrayList<>();
        for (String dimension : dimensions.split(" \\+ ")) {
            DominantWeight weight = DominantWeight.of(Integer.parseInt(dimension) - 1);
            irreps.add(new ReductiveIrrep(List.of(weight), List.of()));
        }
        return Decomposition.sum(irreps);
    }

    private static Decomposition<ReductiveIrrep> decomposition(ReductiveAlgebra subalgebra, String text) {
        Map<ReductiveIrrep, Long> terms = new HashMap<>();
        Matcher term = TERM.matcher(text);
        while (term.find()) {
            List<DominantWeight> weights = new ArrayList<>();
            Matcher weight = WEIGHT.matcher(term.group(2));
            while (weight.find()) {
                weights.add(Published.weight(subalgebra.factors().get(weights.size()), weight.group()));
            }
            List<Rational> charges = new ArrayList<>();
            if (term.group(3) != null) {
                for (String charge : term.group(3).split("[ ,]+")) {
                    if (!charge.isBlank()) {
                        charges.add(rational(charge));
                    }
                }
            }
            long count = term.group(1) == null ? 1 : Long.parseLong(term.group(1));
            terms.merge(new ReductiveIrrep(weights, charges), count, Long::sum);
        }
        return Decomposition.of(terms);
    }

    static Rational rational(String text) {
        String[] parts = text.trim().split("/");
        return Rational.of(Long.parseLong(parts[0]), parts.length == 1 ? 1 : Long.parseLong(parts[1]));
    }

    private static List<List<Rational>> projection(SimpleAlgebra algebra, ReductiveAlgebra subalgebra, String text) {
        List<List<Rational>> printed = new ArrayList<>();
        for (String line : text.split(" / ")) {
            String[] entries = line.trim().split(" +");
            Rational[] row = new Rational[entries.length];
            for (int i = 0; i < entries.length; i++) {
                row[slanskyOrder(algebra, i)] = rational(entries[i]);
            }
            printed.add(List.of(row));
        }
        List<List<Rational>> rows = new ArrayList<>(printed);
        int start = 0;
        for (SimpleAlgebra factor : subalgebra.factors()) {
            for (int i = 0; i < factor.rank(); i++) {
                rows.set(start + slanskyOrder(factor, i), printed.get(start + i));
            }
            start += factor.rank();
        }
        return rows;
    }

    /** The node in Bourbaki's order, from 0, that is the i-th in Slansky's. */
    private static int slanskyOrder(SimpleAlgebra algebra, int i) {
        return switch (algebra.series()) {
            case A, B, C, D, F -> i;
            case G -> 1 - i;
            case E -> i == 0 ? 0 : i == algebra.rank() - 1 ? 1 : i + 1;
        };
    }
}
