package irreproof.engine.lie;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assumptions.assumeTrue;

import irreproof.budget.Budget;
import irreproof.engine.Decomposition;
import java.io.File;
import java.io.IOException;
import java.math.BigInteger;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.concurrent.TimeUnit;
import java.util.regex.Pattern;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/**
 * Random products against GAP (the GAP Group, https://www.gap-system.org; DecomposeTensorProduct of its library), where
 * {@code gap} is on the path. GAP numbers the nodes of SimpleLieAlgebra as Bourbaki does, but for F4;
 * D3 is asked as A3.
 */
class GapOracleTest {
    private static final int PRODUCTS = 500;
    private static final long LARGEST_DIMENSION = 100_000;
    /** GAP visits the weights of the first factor one by one, and slowly. */
    private static final long LARGEST_SMALLER_DIMENSION = 10_000;

    private record Case(SimpleAlgebra algebra, DominantWeight left, DominantWeight right) {
        @Override
        public String toString() {
            return algebra + ": " + left + " x " + right;
        }
    }

    @Test
    void agreesWithGap(@TempDir Path folder) throws IOException, InterruptedException {
        assumeTrue(onPath("gap"), "gap is not on the path: skipped");
        List<Case> cases = cases();
        List<String> answers = runGap(folder, cases);
        List<String> differences = new ArrayList<>();
        for (int i = 0; i < cases.size(); i++) {
            Case one = cases.get(i);
            Decomposition<DominantWeight> ours =
                    new LieRing(one.algebra).product(one.left, one.right, Budget.unlimited());
            if (!ours.equals(read(one.algebra, answers.get(i)))) {
                differences.add(one + " = " + ours + ", GAP: " + answers.get(i));
            }
        }
        System.out.println("GAP: " + cases.size() + " products, " + differences.size() + " differences");
        assertEquals(List.of(), differences);
    }

    /** All types in turn, so that each rank of each series gets its share. */
    private static List<Case> cases() {
        RandomIrreps random = new RandomIrreps(20260109, "agreesWithGap");
        List<SimpleAlgebra> algebras = Algebras.upToRank(8);
        List<Case> cases = new ArrayList<>();
        BigInteger largest = BigInteger.ZERO;
        while (cases.size() < PRODUCTS) {
            SimpleAlgebra algebra = algebras.get(cases.size() % algebras.size());
            DominantWeight left = random.next(algebra, LARGEST_SMALLER_DIMENSION);
            DominantWeight right = random.next(algebra, LARGEST_DIMENSION);
            if (!left.isZero() && !right.isZero()) {
                cases.add(new Case(algebra, left, right));
                largest = largest.max(WeylDimension.dimension(algebra, right));
            }
        }
        System.out.println("GAP: dimensions up to " + largest + ", " + algebras.size() + " algebras");
        return cases;
    }

    private static List<String> runGap(Path folder, List<Case> cases) throws IOException, InterruptedException {
        StringBuilder script = new StringBuilder();
        for (SimpleAlgebra algebra : Algebras.upToRank(8)) {
            script.append("%s := SimpleLieAlgebra(\"%s\", %d, Rationals);;%n"
                    .formatted(algebra, isD3(algebra) ? Series.A : algebra.series(), algebra.rank()));
        }
        for (Case one : cases) {
            script.append("d := DecomposeTensorProduct(%s, %s, %s);;%n"
                    .formatted(one.algebra, toGap(one.algebra, one.left), toGap(one.algebra, one.right)));
            // a line per irrep, multiplicity and labels, since GAP breaks long lines; then one that ends the product
            script.append("for i in [1..Length(d[1])] do Print(\"+\", d[2][i]); for a in d[1][i] do "
                    + "Print(\",\", a); od; Print(\"\\n\"); od; Print(\"=\\n\");\n");
        }
        script.append("QUIT;\n");
        Path file = Files.writeString(folder.resolve("products.g"), script);
        Path output = folder.resolve("answers.txt");
        Process gap = new ProcessBuilder("gap", "-q", "-A", file.toString())
                .redirectErrorStream(true)
                .redirectOutput(output.toFile())
                .start();
        gap.getOutputStream().close();
        boolean ended = gap.waitFor(300, TimeUnit.SECONDS);
        gap.destroyForcibly();
        assertEquals(true, ended, "GAP took longer than five minutes");
        List<String> lines = Files.readAllLines(output);
        List<String> answers = new ArrayList<>();
        StringBuilder answer = new StringBuilder();
        for (String line : lines) {
            if (line.startsWith("+")) {
                answer.append(line);
            } else if (line.equals("=")) {
                answers.add(answer.substring(1));
                answer.setLength(0);
            }
        }
        assertEquals(
                cases.size(),
                answers.size(),
                () -> "GAP's answers; it ended with " + gap.exitValue() + " and said " + lines);
        return answers;
    }

    private static Decomposition<DominantWeight> read(SimpleAlgebra algebra, String answer) {
        Map<DominantWeight, Long> terms = new HashMap<>();
        for (String term : answer.split("\\+")) {
            String[] numbers = term.split(",");
            int[] labels = new int[algebra.rank()];
            int[] nodes = gapNodes(algebra);
            for (int i = 0; i < labels.length; i++) {
                labels[nodes[i]] = Integer.parseInt(numbers[i + 1]);
            }
            terms.put(DominantWeight.of(labels), Long.parseLong(numbers[0]));
        }
        return Decomposition.of(terms);
    }

    private static String toGap(SimpleAlgebra algebra, DominantWeight weight) {
        List<Integer> labels = new ArrayList<>();
        for (int node : gapNodes(algebra)) {
            labels.add(weight.label(node));
        }
        return labels.toString();
    }

    /** The Bourbaki node (from 0) at each of GAP's places. */
    private static int[] gapNodes(SimpleAlgebra algebra) {
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

    private static boolean onPath(String program) {
        for (String folder : System.getenv().getOrDefault("PATH", "").split(Pattern.quote(File.pathSeparator))) {
            if (Files.isExecutable(Path.of(folder, program))) {
                return true;
            }
        }
        return false;
    }
}
