package irreproof.naming;

/** How usual it is that a written name denotes an irrep; the most usual first. */
public enum Custom {
    /** As in the published tables. */
    TABLES,
    /**
     * As with authors who place the bars, the chirality of spinors or the subscripts of SO(8) the other way round: the
     * image of the tabulated irrep under a symmetry of the Dynkin diagram.
     */
    MIRRORED,
    /** As with authors who number the irreps of one dimension differently, or leave primes out. */
    OTHER_PRIMES
}
