package irreproof.engine.lie;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.io.File;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.concurrent.TimeUnit;
import java.util.regex.Pattern;

/**
 * Asks GAP (the GAP Group, https://www.gap-system.org), where {@code gap} is on the path. GAP numbers the nodes of
 * SimpleLieAlgebra as Bourbaki does, but for F4; D3 is asked as A3.
 */
final class Gap {
    /** Prints a list of pairs as a line each, second and first members, since GAP breaks long lines; then an end. */
    static final String PRINT = """
            print := function(labels, counts)
              local i, a;
              for i in [1..Length(labels)] do
                Print("+", counts[i]); for a in labels[i] do Print(",", a); od; Print("\\n");
              od;
              Print("=\\n");
            end;;
            """;

    private Gap() {}

    static boolean isHere() {
        for (String folder : System.getenv().getOrDefault("PATH", "").split(Pattern.quote(File.pathSeparator))) {
            if (Files.isExecutable(Path.of(folder, "gap"))) {
                return true;
            }
        }
        return false;
    }

    /** Defines every algebra up to the rank 8 under its name. */
    static String algebras() {
        StringBuilder script = new StringBuilder();
        for (SimpleAlgebra algebra : Algebras.upToRank(8)) {
            script.append("%s := SimpleLieAlgebra(\"%s\", %d, Rationals);;%n"
                    .formatted(algebra, isD3(algebra) ? Series.A : algebra.series(), algebra.rank()));
        }
        return script.toString();
    }

    /** What a script prints by {@link #PRINT}, by weights of the algebras in turn. */
    static List<Map<DominantWeight, Long>> run(Path folder, String script, List<SimpleAlgebra> algebras, int minutes)
            throws IOException, InterruptedException {
        Path file = Files.writeString(folder.resolve("script.g"), algebras() + PRINT + script + "QUIT;\n");
        Path output = folder.resolve("answers.txt");
        Process gap = new ProcessBuilder("gap", "-q", "-A", file.toString())
                .redirectErrorStream(true)
                .redirectOutput(output.toFile())
                .start();
        gap.getOutputStream().close();
        boolean ended = gap.waitFor(minutes, TimeUnit.MINUTES);
        gap.destroyForcibly();
        assertEquals(true, ended, "GAP took longer than " + minutes + " minutes");
        List<String> lines = Files.readAllLines(output);
        List<Map<DominantWeight, Long>> answers = new ArrayList<>();
        Map<DominantWeight, Long> answer = new HashMap<>();
        for (String line : lines) {
            if (line.startsWith("+")) {
                addTerm(algebras.get(answers.size()), line.substring(1).split(","), answer);
            } else if (line.equals("=")) {
                answers.add(answer);
                answer = new HashMap<>();
            }
        }
        assertEquals(
                algebras.size(),
                answers.size(),
                () -> "GAP's answers; it ended with " + gap.exitValue() + " and said " + lines);
        return answers;
    }

    private static void addTerm(SimpleAlgebra algebra, String[] numbers, Map<DominantWeight, Long> terms) {
        int[] labels = new int[algebra.rank()];
        int[] nodes = nodes(algebra);
        for (int i = 0; i < labels.length; i++) {
            labels[nodes[i]] = Integer.parseInt(numbers[i + 1]);
        }
        terms.put(DominantWeight.of(labels), Long.parseLong(numbers[0]));
    }

    static String labels(SimpleAlgebra algebra, DominantWeight weight) {
        List<Integer> labels = new ArrayList<>();
        for (int node : nodes(algebra)) {
            labels.add(weight.label(node));
        }
        return labels.toString();
    }

    /** The Bourbaki node (from 0) at each of GAP's places. */
    private static int[] nodes(SimpleAlgebra algebra) {
        if (isD3(algebra)) {
            return new int[] {1, 0, 2};
        }
        return switch (algebra.series()) {
            case F -> new int[] {3, 0, 2, 1};
            case A, B, C, D, E, G -> {
                int[] nodes = new int[algebra.rank()];
                for (int i = 0; i < nodes.length; i++) {
                    nodes[i] = i;
                }
                yield nodes;
            }
        };
    }

    /** GAP's series D begins at 4; it gets A3 instead. */
    private static boolean isD3(SimpleAlgebra algebra) {
        return algebra.series() == Series.D && algebra.rank() == 3;
    }
}
