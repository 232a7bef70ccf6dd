package irreproof.engine;

import java.util.Collection;
import java.util.Collections;
import java.util.Map;
import java.util.SortedMap;
import java.util.TreeMap;

/**
 * A finite sum of irreps with integer multiplicities (negative ones make it virtual); immutable, irreps in their natural
 * order, no zero multiplicities. Arithmetic overflow throws {@link ArithmeticException}.
 *
 * @param <I> the irreps of one group
 */
public final class Decomposition<I extends Comparable<? super I>> {
    private final SortedMap<I, Long> multiplicities;

    private Decomposition(SortedMap<I, Long> multiplicities) {
        this.multiplicities = multiplicities;
    }

    public static <I extends Comparable<? super I>> Decomposition<I> zero() {
        return new Decomposition<I>(new TreeMap<I, Long>());
    }

    public static <I extends Comparable<? super I>> Decomposition<I> of(I irrep) {
        return of(Map.of(irrep, 1L));
    }

    public static <I extends Comparable<? super I>> Decomposition<I> of(Map<I, Long> multiplicities) {
        SortedMap<I, Long> copy = new TreeMap<>(multiplicities);
        copy.values().removeIf(count -> count == 0);
        return new Decomposition<>(copy);
    }

    public static <I extends Comparable<? super I>> Decomposition<I> sum(Collection<I> irreps) {
        SortedMap<I, Long> counts = new TreeMap<>();
        irreps.forEach(irrep -> counts.merge(irrep, 1L, Math::addExact));
        return new Decomposition<>(counts);
    }

    /** Unmodifiable, in the irreps' order. */
    public SortedMap<I, Long> multiplicities() {
        return Collections.unmodifiableSortedMap(multiplicities);
    }

    public long multiplicity(I irrep) {
        return multiplicities.getOrDefault(irrep, 0L);
    }

    public boolean isZero() {
        return multiplicities.isEmpty();
    }

    /** True if no multiplicity is negative. */
    public boolean isActual() {
        return multiplicities.values().stream().allMatch(count -> count > 0);
    }

    public Decomposition<I> plus(Decomposition<I> other) {
        return plus(other, 1);
    }

    public Decomposition<I> minus(Decomposition<I> other) {
        return plus(other, -1);
    }

    public Decomposition<I> times(long factor) {
        return Decomposition.<I>zero().plus(this, factor);
    }

    /** This plus factor times the other. */
    public Decomposition<I> plus(Decomposition<I> other, long factor) {
        SortedMap<I, Long> result = new TreeMap<>(multiplicities);
        other.multiplicities.forEach(
                (irrep, count) -> result.merge(irrep, Math.multiplyExact(count, factor), Math::addExact));
        result.values().removeIf(count -> count == 0);
        return new Decomposition<>(result);
    }

    /** The part with positive multiplicities. */
    public Decomposition<I> positivePart() {
        SortedMap<I, Long> result = new TreeMap<>(multiplicities);
        result.values().removeIf(count -> count < 0);
        return new Decomposition<>(result);
    }

    @Override
    public boolean equals(Object other) {
        return other instanceof Decomposition<?> that && multiplicities.equals(that.multiplicities);
    }

    @Override
    public int hashCode() {
        return multiplicities.hashCode();
    }

    @Override
    public String toString() {
        return multiplicities.toString();
    }
}
