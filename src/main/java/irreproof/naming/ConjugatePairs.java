package irreproof.naming;

import irreproof.engine.lie.CongruenceClass;
import irreproof.engine.lie.Conjugation;
import irreproof.engine.lie.DominantWeight;
import irreproof.engine.lie.Series;
import irreproof.engine.lie.SimpleAlgebra;
import java.util.List;

/**
 * A complex irrep shares its number with its conjugate, which bears the bar. The one without a bar is, after Slansky
 * (Phys. Rept. 79, 1981; from memory), the one whose congruence class c in Z_N is less than that of the conjugate; if
 * they are equal, the larger one in {@link TableOrder}, where SO(4k+2) first compares the spinor node of class 1. SU(3)'s
 * 6 is (2,0) by common practice, against that rule.
 */
record ConjugatePairs(LieGroup group, TableOrder tieOrder) implements NameSharing {
    private static final DominantWeight SEXTET = DominantWeight.of(2, 0);

    ConjugatePairs(LieGroup group) {
        this(group, TableOrder.of(group.algebra()));
    }

    @Override
    public List<Member> sharing(DominantWeight irrep) {
        DominantWeight conjugate = Conjugation.conjugate(group.algebra(), irrep);
        if (conjugate.equals(irrep)) {
            return List.of(new Member(irrep, false, ""));
        }
        boolean plain = isPlain(irrep, conjugate);
        return List.of(
                new Member(plain ? irrep : conjugate, false, ""), new Member(plain ? conjugate : irrep, true, ""));
    }

    private boolean isPlain(DominantWeight irrep, DominantWeight conjugate) {
        SimpleAlgebra algebra = group.algebra();
        if (algebra.series() == Series.A && algebra.rank() == 2) {
            if (irrep.equals(SEXTET) || conjugate.equals(SEXTET)) {
                return irrep.equals(SEXTET);
            }
        }
        int own = CongruenceClass.of(algebra, irrep).value();
        int other = CongruenceClass.of(algebra, conjugate).value();
        if (own != other) {
            return own < other;
        }
        TableOrder order = algebra.series() == Series.D ? tieOrder.startingWith(classOneSpinor(algebra)) : tieOrder;
        return order.compare(irrep, conjugate) < 0;
    }

    private static int classOneSpinor(SimpleAlgebra algebra) {
        return algebra.rank() % 4 == 1 ? algebra.rank() - 1 : algebra.rank() - 2;
    }

    /**
     * Subscripts count in SO(2n) only: {@code c} and {@code -} mark the spinors of the other chirality. All others
     * ({@code s} may say "spinor" or "symmetric") leave the usual irrep first.
     */
    @Override
    public List<Candidate> read(List<Member> members, String suffix) {
        DominantWeight first = members.get(0).irrep();
        DominantWeight mirrored = mirror(first);
        if (mirrored.equals(first)) {
            return List.of(new Candidate(first, Custom.TABLES));
        }
        boolean otherChirality = group.algebra().series() == Series.D && (suffix.equals("c") || suffix.equals("-"));
        return List.of(
                new Candidate(otherChirality ? mirrored : first, Custom.TABLES),
                new Candidate(otherChirality ? first : mirrored, Custom.MIRRORED));
    }

    /** The image under the symmetry of the Dynkin diagram by which authors' conventions differ. */
    private DominantWeight mirror(DominantWeight irrep) {
        return group.algebra().series() == Series.D
                ? swapped(irrep, irrep.rank() - 2, irrep.rank() - 1)
                : Conjugation.conjugate(group.algebra(), irrep);
    }

    static DominantWeight swapped(DominantWeight irrep, int one, int other) {
        int[] labels = irrep.labels();
        labels[one] = irrep.label(other);
        labels[other] = irrep.label(one);
        return DominantWeight.of(labels);
    }
}
