package irreproof.engine.lie;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/** Reads the tables of published values under {@code published/}; every row there carries its own source. */
public final class Published {
    private static final Pattern GROUP = Pattern.compile("(SU|SO|Sp)\\((\\d+)\\)|([EFG])(\\d)");
    private static final Pattern TERM = Pattern.compile("(?:(\\d+)\\*)?\\(([\\d,]+)\\)");

    private Published() {}

    /** The rows as maps from column name to cell. */
    public static List<Map<String, String>> rows(String file) {
        try (InputStream stream = Published.class.getResourceAsStream("/published/" + file)) {
            String[] lines = new String(stream.readAllBytes(), StandardCharsets.UTF_8).split("\n");
            String[] columns = lines[0].split("\t", -1);
            List<Map<String, String>> rows = new ArrayList<>();
            for (int i = 1; i < lines.length; i++) {
                String[] cells = lines[i].split("\t", -1);
                Map<String, String> row = new HashMap<>();
                for (int j = 0; j < columns.length; j++) {
                    row.put(columns[j], j < cells.length ? cells[j] : "");
                }
                rows.add(row);
            }
            return rows;
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    /** The algebra of {@code SU(5)}, {@code E6}, ...; empty for anything else ({@code SU(N)}). */
    public static Optional<SimpleAlgebra> algebra(String group) {
        Matcher match = GROUP.matcher(group);
        if (!match.matches()) {
            return Optional.empty();
        }
        if (match.group(3) != null) {
            return Optional.of(new SimpleAlgebra(Series.valueOf(match.group(3)), Integer.parseInt(match.group(4))));
        }
        int degree = Integer.parseInt(match.group(2));
        return Optional.of(
                switch (match.group(1)) {
                    case "SU" -> new SimpleAlgebra(Series.A, degree - 1);
                    case "Sp" -> new SimpleAlgebra(Series.C, degree / 2);
                    default -> new SimpleAlgebra(degree % 2 == 1 ? Series.B : Series.D, degree / 2);
                });
    }

    /** One weight: {@code (1001)}, {@code (10,0)}; {@code (12)} is one label for rank 1. */
    public static DominantWeight weight(SimpleAlgebra algebra, String text) {
        return terms(algebra, text).get(0);
    }

    /** The weights of {@code (01) + 2*(20)} with repetition. */
    public static List<DominantWeight> terms(SimpleAlgebra algebra, String text) {
        List<DominantWeight> terms = new ArrayList<>();
        Matcher match = TERM.matcher(text);
        while (match.find()) {
            int times = match.group(1) == null ? 1 : Integer.parseInt(match.group(1));
            String separator = match.group(2).contains(",") || algebra.rank() == 1 ? "," : "";
            String[] labels = match.group(2).split(separator);
            DominantWeight weight = weight(labels);
            for (int i = 0; i < times; i++) {
                terms.add(weight);
            }
        }
        return terms;
    }

    private static DominantWeight weight(String[] labels) {
        int[] values = new int[labels.length];
        for (int i = 0; i < values.length; i++) {
            values[i] = Integer.parseInt(labels[i]);
        }
        return DominantWeight.of(values);
    }
}
