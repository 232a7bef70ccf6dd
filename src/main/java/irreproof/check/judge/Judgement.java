package irreproof.check.judge;

import irreproof.engine.Decomposition;
import irreproof.notation.Expression;
import irreproof.notation.Expression.Symmetry;
import java.util.List;

/**
 * What came of judging one statement in one setting.
 *
 * @param outcome what is claimed
 * @param reason why it is undecided, or what in the form of the names does not fit the group; or empty
 * @param reading the reading that makes it hold; for a failure the most usual reading; null if names have no meaning
 * @param comparisons under that reading, in the order of the sides; if names are unknown, those of the sides that hold
 *     them, with nothing found
 * @param values what each side lists under that reading; empty if there is none
 * @param satisfying every reading that makes it hold, most usual first (bounded)
 * @param unknownNames names that no irrep of the group can have; the reading then covers the others
 * @param wrongParts terms marked as symmetric or antisymmetric that are not
 */
public record Judgement<I extends Comparable<? super I>>(
        Outcome outcome,
        String reason,
        Reading<I> reading,
        List<Comparison<I>> comparisons,
        List<Decomposition<I>> values,
        List<Reading<I>> satisfying,
        List<Expression.Name> unknownNames,
        List<WrongPart> wrongParts) {
    /** What is claimed. */
    public enum Outcome {
        HOLDS,
        FAILS,
        UNDECIDED,
        /** The deciding side names irreps that the group does not have: the statement is about another group. */
        NOT_ITS_GROUP
    }

    /** A term whose subscript claims a part of the square that it does not lie in. */
    public record WrongPart(Expression.Name term, Symmetry claimed) {}

    public Judgement {
        comparisons = List.copyOf(comparisons);
        values = List.copyOf(values);
        satisfying = List.copyOf(satisfying);
        unknownNames = List.copyOf(unknownNames);
        wrongParts = List.copyOf(wrongParts);
    }

    /** A name without a meaning is further from holding than many wrong terms. */
    private static final long UNKNOWN = 1000;

    /**
     * How far from holding: of several failures, the nearest is what the author meant. Undecided comes before all
     * failures, another group behind them.
     */
    public long distance() {
        return switch (outcome) {
            case UNDECIDED -> -1;
            case HOLDS -> reading.unusual();
            case FAILS ->
                comparisons.stream().mapToLong(Judgement::distance).sum()
                        + wrongParts.size()
                        + UNKNOWN * unknownNames.size()
                        + reading.unusual();
            case NOT_ITS_GROUP -> Long.MAX_VALUE;
        };
    }

    private static long distance(Comparison<?> comparison) {
        return comparison.holds() ? 0 : 1 + size(comparison.missing()) + size(comparison.surplus());
    }

    private static long size(Decomposition<?> sum) {
        return sum.multiplicities().values().stream()
                .mapToLong(count -> Math.min(count, UNKNOWN))
                .sum();
    }

    /** The same, with all the readings that make it hold. */
    Judgement<I> satisfiedBy(List<Reading<I>> readings) {
        return new Judgement<>(outcome, reason, reading, comparisons, values, readings, unknownNames, wrongParts);
    }

    static <I extends Comparable<? super I>> Judgement<I> undecided(String reason) {
        return new Judgement<>(Outcome.UNDECIDED, reason, null, List.of(), List.of(), List.of(), List.of(), List.of());
    }

    /** @param reason what in the form of the names does not fit the group, or empty */
    static <I extends Comparable<? super I>> Judgement<I> notItsGroup(String reason, List<Expression.Name> unknown) {
        return new Judgement<>(
                Outcome.NOT_ITS_GROUP, reason, null, List.of(), List.of(), List.of(), unknown, List.of());
    }
}
