package irreproof.naming;

import irreproof.engine.Decomposition;
import irreproof.engine.lie.ReductiveIrrep;

/**
 * What a written tuple can denote.
 *
 * @param value one irrep, or two for a charge with both signs ({@code (1,2)_{\pm 6}})
 * @param unusual 0 if the published tables use all its names so; more if only some authors do
 */
public record ProductCandidate(Decomposition<ReductiveIrrep> value, int unusual) {}
