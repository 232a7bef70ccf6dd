package irreproof.naming;

import irreproof.budget.Budget;
import irreproof.engine.lie.Conjugation;
import irreproof.engine.lie.DominantWeight;
import irreproof.engine.lie.Invariants;
import irreproof.engine.lie.WeylDimension;
import irreproof.naming.NameSharing.Member;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Objects;

/**
 * The dimension names of one group's irreps, both ways. Irreps of equal dimension (those that differ by a bar or a
 * subscript of SO(8) counted once) are numbered by Dynkin index, then by {@link TableOrder}; the number is the count of
 * primes. Immutable and safe for threads; what was found for a dimension is kept, bounded, and charged to the budget
 * again when it is reused, so that results do not depend on what was asked before.
 *
 * <p>Every method throws {@link irreproof.budget.BudgetExceeded} when the search for all irreps of a dimension outgrows
 * the budget; see {@link IrrepSearch} for its cost.
 */
public final class DimensionNames {
    private static final BoundedCache<Key, Namesakes> CACHE = new BoundedCache<>(4096);

    private final LieGroup group;
    private final NameSharing sharing;

    public DimensionNames(LieGroup group) {
        this.group = group;
        this.sharing = NameSharing.of(group);
    }

    private record Key(LieGroup group, BigInteger dimension) {
        // equals and hashCode written out: a record's generated ones cost a short run more than the rest of its work

        @Override
        public boolean equals(Object other) {
            return other instanceof Key that && dimension.equals(that.dimension) && group.equals(that.group);
        }

        @Override
        public int hashCode() {
            return 31 * group.hashCode() + dimension.hashCode();
        }
    }

    /**
     * All irreps of one dimension.
     *
     * @param byPrimes the irreps named with 0, 1, 2, ... primes
     * @param steps what it cost to find them
     */
    private record Namesakes(List<List<Member>> byPrimes, long steps) {}

    /** The name in the published tables. */
    public IrrepLabel labelOf(DominantWeight irrep, Budget budget) {
        BigInteger dimension = WeylDimension.dimension(group.algebra(), irrep);
        List<List<Member>> byPrimes = namesakes(dimension, budget).byPrimes();
        for (int primes = 0; primes < byPrimes.size(); primes++) {
            for (Member member : byPrimes.get(primes)) {
                if (member.irrep().equals(irrep)) {
                    return new IrrepLabel(dimension, primes, member.barred(), member.suffix());
                }
            }
        }
        throw new IllegalStateException("no irrep " + irrep + " among those of dimension " + dimension);
    }

    /** All irreps of this dimension, by primes, those without a bar first; none for a dimension below 1. */
    public List<DominantWeight> irrepsOfDimension(BigInteger dimension, Budget budget) {
        return namesakes(dimension, budget).byPrimes().stream()
                .flatMap(List::stream)
                .map(Member::irrep)
                .toList();
    }

    /** How many names of this dimension there are, bars and subscripts left aside; more than that have no primes. */
    public int countOf(BigInteger dimension, Budget budget) {
        return namesakes(dimension, budget).byPrimes().size();
    }

    /**
     * All irreps that a written name can denote, the most usual first: the dimension binds, the decoration only orders.
     * Bars beyond the first cancel in pairs, and mean nothing on a self-conjugate irrep. The candidates of a barred name
     * are the conjugates of those of the name without the bar, in the same order. A subscript without a meaning in this
     * group is passed over, as is one on an irrep that needs none (28_s of SO(8) is 28); a letter of SO(8) that has one
     * excludes the other irreps, except that {@code s} and {@code c} may be exchanged.
     *
     * @param suffix the subscript that may belong to the name, as written, or empty
     * @return empty if no irrep has this dimension
     */
    public List<Candidate> candidates(BigInteger dimension, int bars, int primes, String suffix, Budget budget) {
        List<List<Member>> byPrimes = namesakes(dimension, budget).byPrimes();
        List<Candidate> candidates = new ArrayList<>();
        if (primes < byPrimes.size()) {
            candidates.addAll(sharing.read(byPrimes.get(primes), suffix));
        }
        for (List<Member> members : byPrimes) {
            for (Candidate candidate : sharing.read(members, suffix)) {
                if (candidates.stream().noneMatch(other -> other.irrep().equals(candidate.irrep()))) {
                    candidates.add(new Candidate(candidate.irrep(), Custom.OTHER_PRIMES));
                }
            }
        }
        if (bars % 2 == 0) {
            return List.copyOf(candidates);
        }
        return candidates.stream()
                .map(candidate ->
                        new Candidate(Conjugation.conjugate(group.algebra(), candidate.irrep()), candidate.custom()))
                .toList();
    }

    private Namesakes namesakes(BigInteger dimension, Budget budget) {
        Key key = new Key(group, dimension);
        Namesakes kept = CACHE.get(key);
        if (kept != null) {
            budget.spend(kept.steps());
            return kept;
        }
        Namesakes found = find(dimension, budget);
        CACHE.put(key, found);
        return found;
    }

    private Namesakes find(BigInteger dimension, Budget budget) {
        IrrepSearch.Result result = IrrepSearch.ofDimension(group.algebra(), dimension, budget);
        record Numbered(List<Member> members, BigInteger index) {}
        List<List<Member>> byPrimes = result.irreps().stream()
                .map(sharing::sharing)
                .distinct()
                .map(members -> new Numbered(
                        members,
                        Invariants.dynkinIndex(group.algebra(), members.get(0).irrep())))
                .sorted(Comparator.comparing(Numbered::index)
                        .thenComparing(numbered -> numbered.members().get(0).irrep(), sharing.tieOrder()))
                .map(Numbered::members)
                .toList();
        return new Namesakes(byPrimes, result.steps());
    }

    @Override
    public boolean equals(Object other) {
        return other instanceof DimensionNames that && group.equals(that.group);
    }

    @Override
    public int hashCode() {
        return Objects.hash(group);
    }

    @Override
    public String toString() {
        return "dimension names of " + group.display();
    }
}
