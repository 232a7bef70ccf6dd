package irreproof.check.judge;

import irreproof.engine.lie.CongruenceClass;
import irreproof.engine.lie.Conjugation;
import irreproof.engine.lie.DominantWeight;
import irreproof.naming.LieGroup;
import java.util.Arrays;

/**
 * Which names leave no choice. Authors place bars by one of two customs: by congruence class (Slansky) or by tensors
 * (no bar on the irrep with fewer boxes). Where both agree, nobody means the conjugate; and everybody's defining irreps
 * and basic spinors fix what the others' bars mean. Without this, a statement with a forgotten bar could always be saved
 * by reading the name the other way round.
 */
final class FixedNames {
    private FixedNames() {}

    /** True if the irrep is never called by its dimension name without the bar. */
    static boolean excludes(LieGroup group, DominantWeight irrep) {
        DominantWeight conjugate = Conjugation.conjugate(group.algebra(), irrep);
        if (conjugate.equals(irrep)) {
            return false;
        }
        return switch (group.algebra().series()) {
            case A ->
                barredByClass(group, irrep, conjugate) && barredByBoxes(irrep, conjugate)
                        || isSquareOfDefining(conjugate);
            case D -> isFundamental(irrep) && barredByClass(group, irrep, conjugate);
            case E -> isEndOfChain(irrep) && barredByClass(group, irrep, conjugate);
            case B, C, F, G -> false;
        };
    }

    private static boolean barredByClass(LieGroup group, DominantWeight irrep, DominantWeight conjugate) {
        int own = CongruenceClass.of(group.algebra(), irrep).value();
        int other = CongruenceClass.of(group.algebra(), conjugate).value();
        return own > other || own == other && irrep.compareTo(conjugate) > 0;
    }

    private static boolean barredByBoxes(DominantWeight irrep, DominantWeight conjugate) {
        long own = boxes(irrep);
        long other = boxes(conjugate);
        return own > other || own == other && irrep.compareTo(conjugate) > 0;
    }

    private static long boxes(DominantWeight irrep) {
        long boxes = 0;
        for (int node = 0; node < irrep.rank(); node++) {
            boxes += (node + 1L) * irrep.label(node);
        }
        return boxes;
    }

    /** (2,0,...,0), whose name has no bar whatever its class. */
    private static boolean isSquareOfDefining(DominantWeight irrep) {
        int[] labels = irrep.labels();
        return labels[0] == 2 && Arrays.stream(labels).sum() == 2;
    }

    /** The 27 of E6 and its conjugate. */
    private static boolean isEndOfChain(DominantWeight irrep) {
        return isFundamental(irrep) && irrep.label(0) + irrep.label(irrep.rank() - 1) == 1;
    }

    private static boolean isFundamental(DominantWeight irrep) {
        return Arrays.stream(irrep.labels()).sum() == 1;
    }
}
