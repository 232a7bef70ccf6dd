package irreproof.engine.lie.embedding;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import irreproof.budget.Budget;
import irreproof.engine.lie.Embedding;
import irreproof.engine.lie.Published;
import irreproof.engine.lie.ReductiveIrrep;
import irreproof.engine.lie.Series;
import irreproof.engine.lie.SimpleAlgebra;
import irreproof.engine.lie.WeylDimension;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.regex.Pattern;
import org.junit.jupiter.api.Test;

/** Against published/maximal_subalgebras.tsv, whose rows name their sources. */
class EmbeddingsTest {
    private static final Budget FREE = Budget.unlimited();
    private static final Pattern NUMBER = Pattern.compile("\\d+");

    private static SimpleAlgebra algebra(String name) {
        return new SimpleAlgebra(Series.valueOf(name.substring(0, 1)), Integer.parseInt(name.substring(1)));
    }

    /** Rows whose kind is empty record what a source prints wrongly. */
    private static Map<SimpleAlgebra, List<Map<String, String>>> published() {
        Map<SimpleAlgebra, List<Map<String, String>>> tables = new LinkedHashMap<>();
        for (Map<String, String> row : Published.rows("maximal_subalgebras.tsv")) {
            if (!row.get("kind").isBlank()) {
                tables.computeIfAbsent(algebra(row.get("algebra")), key -> new ArrayList<>())
                        .add(row);
            }
        }
        return tables;
    }

    /** {@code A2+u1 | 3,3 | 3x1, 1x3}: the factors in their order; indices and dimensions where a row gives them. */
    private static String described(Map<String, String> row) {
        return row.get("subalgebra") + " | " + row.get("embedding_index") + " | "
                + dimensions(row.get("defining_decomposition"));
    }

    private static String dimensions(String decomposition) {
        if (decomposition.isBlank()) {
            return "";
        }
        List<List<String>> terms = new ArrayList<>();
        for (String term : decomposition.split("=")[1].split("\\+")) {
            terms.add(
                    NUMBER.matcher(term).results().map(result -> result.group()).toList());
        }
        return terms.stream()
                .map(term -> String.join("x", term))
                .sorted()
                .toList()
                .toString();
    }

    private static String described(Embedding embedding, boolean special) {
        if (!special) {
            return embedding.subalgebra() + " |  | ";
        }
        List<String> indices = new ArrayList<>();
        for (int i = 0; i < embedding.subalgebra().factors().size(); i++) {
            indices.add(EmbeddingIndex.of(embedding, i).toString());
        }
        List<String> terms = new ArrayList<>();
        Fingerprint.of(embedding, FREE).restriction().multiplicities().forEach((irrep, count) -> {
            for (long i = 0; i < count; i++) {
                terms.add(dimensions(embedding, irrep));
            }
        });
        terms.sort(null);
        return embedding.subalgebra() + " | " + String.join(",", indices) + " | " + terms;
    }

    private static String dimensions(Embedding embedding, ReductiveIrrep irrep) {
        List<String> dimensions = new ArrayList<>();
        for (int i = 0; i < irrep.weights().size(); i++) {
            SimpleAlgebra factor = embedding.subalgebra().factors().get(i);
            dimensions.add(
                    WeylDimension.dimension(factor, irrep.weights().get(i)).toString());
        }
        return String.join("x", dimensions);
    }

    /** Neither a row of the table is missing, nor is there a subalgebra that it does not have. */
    @Test
    void maximalSubalgebrasAreThePublishedOnes() {
        int count = 0;
        List<String> problems = new ArrayList<>();
        for (var table : published().entrySet()) {
            List<String> expected = table.getValue().stream()
                    .map(EmbeddingsTest::described)
                    .sorted()
                    .toList();
            List<String> actual = new ArrayList<>();
            for (Embedding embedding : Embeddings.maximal(table.getKey(), FREE)) {
                boolean special = !embedding.name().startsWith("Levi")
                        && !embedding.name().startsWith("regular");
                actual.add(described(embedding, special));
            }
            actual.sort(null);
            if (!expected.equals(actual)) {
                problems.add(table.getKey() + ":\n  published " + expected + "\n  found     " + actual);
            }
            count += expected.size();
        }
        assertEquals(List.of(), problems, () -> String.join("\n", problems));
        System.out.println("maximal subalgebras: " + count);
        assertTrue(count > 190);
    }
}
