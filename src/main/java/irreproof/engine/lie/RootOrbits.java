package irreproof.engine.lie;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.function.IntPredicate;

/**
 * The positive roots sorted into orbits of a parabolic subgroup of the Weyl group, each orbit by the member that is
 * dominant at the subgroup's nodes (Moody and Patera, Bull. AMS 7, 1982). Linear in the number of roots times the rank:
 * from the highest root down, each root inherits from one reflection of it that lies higher.
 */
final class RootOrbits {
    /** @param count how many positive roots the orbit holds */
    record Orbit(Root representative, int count) {}

    private RootOrbits() {}

    static List<Orbit> under(RootSystem system, IntPredicate nodes) {
        List<Root> roots = system.positiveRoots();
        Map<Root, Root> representatives = new HashMap<>();
        Map<Root, Integer> counts = new HashMap<>();
        List<Root> order = new ArrayList<>();
        for (int i = roots.size() - 1; i >= 0; i--) {
            Root root = roots.get(i);
            int node = firstNegative(root, nodes, system.rank());
            Root representative = root;
            if (node < system.rank()) {
                representative = representatives.get(root.plus(node, -root.label(node), system.simpleRoot(node)));
            } else {
                order.add(root);
            }
            representatives.put(root, representative);
            counts.merge(representative, 1, Integer::sum);
        }
        return order.stream().map(root -> new Orbit(root, counts.get(root))).toList();
    }

    private static int firstNegative(Root root, IntPredicate nodes, int rank) {
        int node = 0;
        while (node < rank && !(root.label(node) < 0 && nodes.test(node))) {
            node++;
        }
        return node;
    }
}
