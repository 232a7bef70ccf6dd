package irreproof.engine.lie;

import com.sun.management.OperatingSystemMXBean;
import irreproof.budget.Budget;
import irreproof.engine.Decomposition;
import java.lang.management.ManagementFactory;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.List;

/**
 * 300 typical products over all types, as papers print them: for each of 30 algebras the up to six smallest irreps up
 * to the dimension 31000 and with few labels; of their products ten, evenly by dimension, the largest
 * included. {@code ProductTable gap} prints a GAP program that times the same table;
 * {@code ProductTable time} times ours, nothing remembered from one product to the next.
 */
public final class ProductTable {
    private static final int EACH = 10;
    private static final BigInteger LARGEST = BigInteger.valueOf(31_000);
    private static final int ROUNDS = 60;
    private static final int WARM_UP = 60;

    private record Product(SimpleAlgebra algebra, DominantWeight left, DominantWeight right) {
        Decomposition<DominantWeight> compute() {
            return algebra.series() == Series.A
                    ? LittlewoodRichardson.product(left, right, Budget.unlimited())
                    : KlimykProduct.product(algebra, left, right, Budget.unlimited());
        }

        /** GAP walks the weights of the first factor: it gets the smaller one first. */
        String inGap() {
            return "[" + algebra + ", " + labels(left) + ", " + labels(right) + "]";
        }

        /** GAP numbers the nodes as Bourbaki does, but for F4. */
        private String labels(DominantWeight weight) {
            int[] labels = weight.labels();
            if (algebra.series() == Series.F) {
                labels = new int[] {labels[3], labels[0], labels[2], labels[1]};
            }
            return Arrays.toString(labels);
        }
    }

    private ProductTable() {}

    public static void main(String[] arguments) {
        List<Product> table = table();
        switch (arguments[0]) {
            case "gap" -> System.out.print(gapProgram(table));
            case "time" -> time(table);
            case "list" -> table.forEach(System.out::println);
            default -> throw new IllegalArgumentException(arguments[0]);
        }
    }

    private static List<SimpleAlgebra> algebras() {
        List<SimpleAlgebra> algebras = new ArrayList<>();
        for (int rank = 1; rank <= 8; rank++) {
            algebras.add(new SimpleAlgebra(Series.A, rank));
            if (rank >= 2) {
                algebras.add(new SimpleAlgebra(Series.B, rank));
            }
            if (rank >= 3) {
                algebras.add(new SimpleAlgebra(Series.C, rank));
            }
            if (rank >= 4) {
                algebras.add(new SimpleAlgebra(Series.D, rank));
            }
            if (rank >= 6) {
                algebras.add(new SimpleAlgebra(Series.E, rank));
            }
        }
        algebras.add(new SimpleAlgebra(Series.F, 4));
        algebras.add(new SimpleAlgebra(Series.G, 2));
        return algebras;
    }

    private static List<Product> table() {
        List<Product> table = new ArrayList<>();
        for (SimpleAlgebra algebra : algebras()) {
            List<DominantWeight> irreps = new ArrayList<>();
            addIrreps(new int[algebra.rank()], 0, Math.max(3, 7 - algebra.rank()), irreps);
            irreps.removeIf(irrep ->
                    irrep.isZero() || WeylDimension.dimension(algebra, irrep).compareTo(LARGEST) > 0);
            irreps.sort(Comparator.comparing((DominantWeight irrep) -> WeylDimension.dimension(algebra, irrep))
                    .thenComparing(Comparator.naturalOrder()));
            List<Product> products = new ArrayList<>();
            List<DominantWeight> low = irreps.subList(0, Math.min(6, irreps.size()));
            for (DominantWeight left : low) {
                for (DominantWeight right : low) {
                    if (low.indexOf(left) <= low.indexOf(right)) {
                        products.add(new Product(algebra, left, right));
                    }
                }
            }
            products.sort(Comparator.comparing(ProductTable::dimension));
            // ten of them evenly, the largest included
            for (int i = 1; i <= EACH; i++) {
                table.add(products.get(i * products.size() / EACH - 1));
            }
        }
        return table;
    }

    private static void addIrreps(int[] labels, int node, int left, List<DominantWeight> found) {
        if (node == labels.length) {
            found.add(DominantWeight.of(labels));
            return;
        }
        for (int label = 0; label <= left; label++) {
            labels[node] = label;
            addIrreps(labels, node + 1, left - label, found);
        }
        labels[node] = 0;
    }

    private static BigInteger dimension(Product product) {
        return WeylDimension.dimension(product.algebra, product.left)
                .multiply(WeylDimension.dimension(product.algebra, product.right));
    }

    private static String gapProgram(List<Product> table) {
        StringBuilder program = new StringBuilder();
        for (SimpleAlgebra algebra : algebras()) {
            program.append("%s := SimpleLieAlgebra(\"%s\", %d, Rationals);; RootSystem(%s);;%n"
                    .formatted(algebra, algebra.series(), algebra.rank(), algebra));
        }
        program.append("table := [\n");
        table.forEach(product -> program.append(product.inGap()).append(",\n"));
        program.append("];;\n");
        program.append("run := function() local t, terms; terms := 0; for t in table do\n"
                + "  terms := terms + Length(DecomposeTensorProduct(t[1], t[2], t[3])[1]); od; return terms; end;;\n"
                + "run();; start := Runtime();; terms := run();;\n"
                + "Print(terms, \" \", 1000 * (Runtime() - start), \"\\n\");\nQUIT;\n");
        return program.toString();
    }

    /** Prints the number of terms, and the processor time of a round in microseconds: that of all threads, so that
     * collecting garbage counts.
     */
    private static void time(List<Product> table) {
        algebras().forEach(RootSystem::of);
        OperatingSystemMXBean clock = ManagementFactory.getPlatformMXBean(OperatingSystemMXBean.class);
        long start = 0;
        long terms = 0;
        for (int round = -WARM_UP; round < ROUNDS; round++) {
            if (round == 0) {
                start = clock.getProcessCpuTime();
            }
            terms = 0;
            for (Product product : table) {
                terms += product.compute().multiplicities().size();
            }
        }
        System.out.println(terms + " " + (clock.getProcessCpuTime() - start) / 1000 / ROUNDS);
    }
}
