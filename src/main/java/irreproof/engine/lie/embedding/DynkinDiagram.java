package irreproof.engine.lie.embedding;

import irreproof.engine.lie.RootSystem;
import irreproof.engine.lie.Series;
import irreproof.engine.lie.SimpleAlgebra;
import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.Deque;
import java.util.List;

/**
 * Recognises the components of a Cartan matrix and puts the nodes of each into Bourbaki's order, by matching the matrix
 * with those of the candidates of that rank node by node (backtracking; at most a few dead ends, since diagrams are
 * chains with at most one branch). Of equal algebras the one that tables name is taken: A1, A1+A1, C2, A3.
 */
final class DynkinDiagram {
    /** @param nodes the indices in the matrix, in Bourbaki's order */
    record Component(SimpleAlgebra algebra, List<Integer> nodes) {}

    private final int[][] cartan;

    private DynkinDiagram(int[][] cartan) {
        this.cartan = cartan;
    }

    /** The components, in the order of their smallest index. */
    static List<Component> components(int[][] cartan) {
        DynkinDiagram diagram = new DynkinDiagram(cartan);
        boolean[] seen = new boolean[cartan.length];
        List<Component> components = new ArrayList<>();
        for (int start = 0; start < cartan.length; start++) {
            if (!seen[start]) {
                components.add(diagram.recognise(diagram.connected(start, seen)));
            }
        }
        return components;
    }

    private List<Integer> connected(int start, boolean[] seen) {
        List<Integer> nodes = new ArrayList<>();
        Deque<Integer> open = new ArrayDeque<>(List.of(start));
        seen[start] = true;
        while (!open.isEmpty()) {
            int node = open.pop();
            nodes.add(node);
            for (int other = 0; other < cartan.length; other++) {
                if (!seen[other] && cartan[node][other] != 0) {
                    seen[other] = true;
                    open.push(other);
                }
            }
        }
        nodes.sort(null);
        return nodes;
    }

    private Component recognise(List<Integer> nodes) {
        for (SimpleAlgebra candidate : candidates(nodes.size())) {
            int[] order = new int[nodes.size()];
            if (matches(candidate, nodes, order, 0)) {
                return new Component(candidate, Arrays.stream(order).boxed().toList());
            }
        }
        throw new IllegalStateException("no Dynkin diagram of finite type");
    }

    private static List<SimpleAlgebra> candidates(int rank) {
        List<SimpleAlgebra> candidates = new ArrayList<>();
        candidates.add(new SimpleAlgebra(Series.A, rank));
        if (rank >= 2) {
            candidates.add(new SimpleAlgebra(Series.C, rank));
        }
        if (rank >= 3) {
            candidates.add(new SimpleAlgebra(Series.B, rank));
        }
        if (rank >= 4) {
            candidates.add(new SimpleAlgebra(Series.D, rank));
        }
        if (rank >= 6 && rank <= 8) {
            candidates.add(new SimpleAlgebra(Series.E, rank));
        }
        if (rank == 4) {
            candidates.add(new SimpleAlgebra(Series.F, rank));
        }
        if (rank == 2) {
            candidates.add(new SimpleAlgebra(Series.G, rank));
        }
        return candidates;
    }

    private boolean matches(SimpleAlgebra candidate, List<Integer> nodes, int[] order, int placed) {
        if (placed == order.length) {
            return true;
        }
        RootSystem system = RootSystem.of(candidate);
        for (int node : nodes) {
            if (fits(system, order, placed, node)) {
                order[placed] = node;
                if (matches(candidate, nodes, order, placed + 1)) {
                    return true;
                }
            }
        }
        return false;
    }

    private boolean fits(RootSystem system, int[] order, int placed, int node) {
        for (int i = 0; i < placed; i++) {
            boolean bonds = order[i] != node
                    && cartan[order[i]][node] == system.cartan(i, placed)
                    && cartan[node][order[i]] == system.cartan(placed, i);
            if (!bonds) {
                return false;
            }
        }
        return true;
    }
}
