package irreproof.engine.lie.embedding;

import irreproof.engine.Rational;
import irreproof.engine.lie.DominantWeight;
import irreproof.engine.lie.Embedding;
import irreproof.engine.lie.ReductiveAlgebra;
import irreproof.engine.lie.RootSystem;
import irreproof.engine.lie.SimpleAlgebra;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import java.util.function.Function;
import java.util.function.IntPredicate;
import java.util.stream.IntStream;

/**
 * Subalgebras of full rank, whose roots are roots of the algebra (Borel and de Siebenthal 1949; Dynkin 1952): Levi
 * subalgebras from the Dynkin diagram with nodes deleted, each of which leaves a u(1), and semisimple ones from the
 * extended diagram with one node deleted. Factors come in the order of their smallest node, the node of the lowest root
 * last; a charge is the coefficient at the deleted node, scaled to coprime whole numbers on the weights. Cost cubic in
 * the rank.
 */
public final class RegularEmbeddings {
    private final SimpleAlgebra algebra;
    private final RootSystem system;

    private RegularEmbeddings(SimpleAlgebra algebra) {
        this.algebra = algebra;
        this.system = RootSystem.of(algebra);
    }

    /**
     * The Levi subalgebra of the nodes that are left.
     *
     * @param deleted nodes counted from 0, none of them twice; one charge for each, in this order
     */
    public static Embedding levi(SimpleAlgebra algebra, List<Integer> deleted) {
        RegularEmbeddings regular = new RegularEmbeddings(algebra);
        List<RootPair> roots = new ArrayList<>();
        for (int node = 0; node < algebra.rank(); node++) {
            if (!deleted.contains(node)) {
                roots.add(regular.simpleRoot(node));
            }
        }
        List<List<Rational>> charges = deleted.stream().map(regular::charge).toList();
        return regular.embedding(roots, charges, "Levi, " + described(deleted) + " deleted");
    }

    private static String described(List<Integer> nodes) {
        List<String> numbers =
                nodes.stream().map(node -> Integer.toString(node + 1)).toList();
        return (nodes.size() == 1 ? "node " : "nodes ") + String.join(", ", numbers);
    }

    /**
     * The semisimple subalgebra of the extended diagram without one node.
     *
     * @param deleted the node, counted from 0
     */
    public static Embedding semisimple(SimpleAlgebra algebra, int deleted) {
        RegularEmbeddings regular = new RegularEmbeddings(algebra);
        List<RootPair> roots = new ArrayList<>();
        for (int node = 0; node < algebra.rank(); node++) {
            if (node != deleted) {
                roots.add(regular.simpleRoot(node));
            }
        }
        roots.add(regular.lowestRoot());
        return regular.embedding(roots, List.of(), "regular, extended diagram, node " + (deleted + 1) + " deleted");
    }

    /** The maximal ones, one of each type: Levi of a node of mark 1, then semisimple of a node of prime mark. */
    public static List<Embedding> maximal(SimpleAlgebra algebra) {
        List<Integer> marks = new RegularEmbeddings(algebra).marks();
        List<Embedding> found =
                new ArrayList<>(ofMarks(marks, mark -> mark == 1, node -> levi(algebra, List.of(node))));
        found.addAll(
                ofMarks(marks, mark -> BigInteger.valueOf(mark).isProbablePrime(9), node -> semisimple(algebra, node)));
        return found;
    }

    private static List<Embedding> ofMarks(
            List<Integer> marks, IntPredicate wanted, Function<Integer, Embedding> construction) {
        Set<List<String>> types = new HashSet<>();
        return IntStream.range(0, marks.size())
                .filter(node -> wanted.test(marks.get(node)))
                .mapToObj(construction::apply)
                .filter(embedding -> types.add(embedding.subalgebra().factors().stream()
                        .map(SimpleAlgebra::toString)
                        .sorted()
                        .toList()))
                .toList();
    }

    /** The coefficients of the highest root over the simple roots. */
    private List<Integer> marks() {
        int[] comarks = comarks(system);
        List<Integer> marks = new ArrayList<>();
        for (int node = 0; node < comarks.length; node++) {
            marks.add(Rational.of(2L * comarks[node])
                    .dividedBy(length(system, node))
                    .toIntegerExact()
                    .intValueExact());
        }
        return marks;
    }

    /** The coefficients of the highest root's coroot over the simple coroots: its form with the fundamental weights. */
    static int[] comarks(RootSystem system) {
        DominantWeight highest = system.highestRoot();
        int[] comarks = new int[system.rank()];
        for (int node = 0; node < comarks.length; node++) {
            long form = 0;
            for (int other = 0; other < comarks.length; other++) {
                form += highest.label(other) * system.form(other, node);
            }
            comarks[node] = Math.toIntExact(form / system.formDenominator());
        }
        return comarks;
    }

    /** The squared length of a simple root, long ones having 2. */
    static Rational length(RootSystem system, int node) {
        long form = 0;
        for (int i = 0; i < system.rank(); i++) {
            form += system.cartan(node, i) * system.form(i, node);
        }
        // the simple root paired with the fundamental weight is half its squared length
        return Rational.of(2 * form, system.formDenominator());
    }

    /** A root by its Dynkin labels, and its coroot's coefficients over the simple coroots. */
    private record RootPair(int[] labels, int[] coroot) {}

    private RootPair simpleRoot(int node) {
        int[] labels = new int[algebra.rank()];
        for (int i = 0; i < labels.length; i++) {
            labels[i] = system.cartan(node, i);
        }
        int[] coroot = new int[algebra.rank()];
        coroot[node] = 1;
        return new RootPair(labels, coroot);
    }

    private RootPair lowestRoot() {
        return new RootPair(negated(system.highestRoot().labels()), negated(comarks(system)));
    }

    private static int[] negated(int[] values) {
        return IntStream.of(values).map(value -> -value).toArray();
    }

    /** A weight's coefficient at a simple root, up to a factor: its form with that fundamental weight. */
    private List<Rational> charge(int node) {
        BigInteger divisor = BigInteger.ZERO;
        for (int i = 0; i < algebra.rank(); i++) {
            divisor = divisor.gcd(BigInteger.valueOf(system.form(i, node)));
        }
        List<Rational> row = new ArrayList<>();
        for (int i = 0; i < algebra.rank(); i++) {
            row.add(Rational.of(system.form(i, node), divisor.longValueExact()));
        }
        return row;
    }

    private Embedding embedding(List<RootPair> roots, List<List<Rational>> charges, String name) {
        int size = roots.size();
        int[][] cartan = new int[size][size];
        for (int i = 0; i < size; i++) {
            for (int j = 0; j < size; j++) {
                cartan[i][j] = paired(roots.get(i).labels, roots.get(j).coroot);
            }
        }
        List<SimpleAlgebra> factors = new ArrayList<>();
        List<List<Rational>> rows = new ArrayList<>();
        for (DynkinDiagram.Component component : DynkinDiagram.components(cartan)) {
            factors.add(component.algebra());
            for (int index : component.nodes()) {
                rows.add(IntStream.of(roots.get(index).coroot)
                        .mapToObj(Rational::of)
                        .toList());
            }
        }
        rows.addAll(charges);
        return new Embedding(algebra, new ReductiveAlgebra(factors, charges.size()), rows, name);
    }

    private static int paired(int[] labels, int[] coroot) {
        int sum = 0;
        for (int i = 0; i < labels.length; i++) {
            sum += labels[i] * coroot[i];
        }
        return sum;
    }
}
