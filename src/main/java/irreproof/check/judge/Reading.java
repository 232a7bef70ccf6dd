package irreproof.check.judge;

import java.util.Map;

/**
 * One assignment of irreps to all names of a statement.
 *
 * @param unusual the sum of how unusual the choices are; 0 for the usual reading
 */
public record Reading<I extends Comparable<? super I>>(
        Interpretation interpretation, Map<NameKey, Candidate<I>> meanings, int unusual) {
    public Reading {
        meanings = Map.copyOf(meanings);
    }
}
