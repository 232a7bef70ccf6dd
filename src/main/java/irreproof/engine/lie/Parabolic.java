package irreproof.engine.lie;

import java.math.BigInteger;
import java.util.BitSet;
import java.util.List;

/** The subgroup of a Weyl group that some simple reflections generate: the stabiliser of the dominant weights with labels
 * 0 at just these nodes. Its numbers are found when first asked for. Safe for threads.
 */
final class Parabolic {
    private final RootSystem system;
    private final BitSet nodes;
    private List<RootOrbits.Orbit> rootOrbits;
    private BigInteger orbitSize;

    /** @param nodes of the reflections; not to be changed any more */
    Parabolic(RootSystem system, BitSet nodes) {
        this.system = system;
        this.nodes = nodes;
    }

    /** The orbits of this group on the positive roots. */
    synchronized List<RootOrbits.Orbit> rootOrbits() {
        if (rootOrbits == null) {
            rootOrbits = RootOrbits.under(system, nodes::get);
        }
        return rootOrbits;
    }

    /** The number of weights in the orbit, under the whole Weyl group, of a weight whose stabiliser this is. */
    synchronized BigInteger orbitSize() {
        if (orbitSize == null) {
            orbitSize = system.weylGroupOrder().divide(WeylGroup.order(system, nodes::get));
        }
        return orbitSize;
    }
}
