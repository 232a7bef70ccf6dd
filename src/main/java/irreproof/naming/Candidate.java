package irreproof.naming;

import irreproof.engine.lie.DominantWeight;

/** An irrep that a written name can denote, and how usual that is. */
public record Candidate(DominantWeight irrep, Custom custom) {}
