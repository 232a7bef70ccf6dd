package irreproof.naming;

import irreproof.engine.lie.DominantWeight;
import java.util.List;

/**
 * Which irreps of a group share one number with its primes, and how the rest of their names tells them apart: conjugate
 * pairs by a bar, the triality images of SO(8) by subscripts.
 */
sealed interface NameSharing permits ConjugatePairs, TrialityImages {
    static NameSharing of(LieGroup group) {
        return group.family() == LieGroup.Family.SO && group.degree() == 8
                ? new TrialityImages()
                : new ConjugatePairs(group);
    }

    /** The irrep and all that share its number and primes; the one with the plainest name first. */
    List<Member> sharing(DominantWeight irrep);

    /** The order among sharings of equal dimension and index, by their first members. */
    TableOrder tieOrder();

    /**
     * The members that a subscript can mean, given without primes and bars: first what the tables mean by it
     * ({@link Custom#TABLES}), then what else.
     */
    List<Candidate> read(List<Member> members, String suffix);

    /** An irrep and what tells it from those that share its number. */
    record Member(DominantWeight irrep, boolean barred, String suffix) {
        // equals and hashCode written out: a record's generated ones cost a short run more than the rest of its work

        @Override
        public boolean equals(Object other) {
            return other instanceof Member that
                    && barred == that.barred
                    && irrep.equals(that.irrep)
                    && suffix.equals(that.suffix);
        }

        @Override
        public int hashCode() {
            return irrep.hashCode();
        }
    }
}
