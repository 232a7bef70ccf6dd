package irreproof.check.judge;

import irreproof.engine.Decomposition;

/**
 * One thing a written name can mean.
 *
 * @param value the irrep; zero for a Young diagram that vanishes
 * @param unusual 0 if the published tables use the name so; more if only some authors do
 */
public record Candidate<I extends Comparable<? super I>>(Decomposition<I> value, int unusual) {}
