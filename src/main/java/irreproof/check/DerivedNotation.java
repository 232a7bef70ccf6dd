package irreproof.check;

/** How {@code derive} names the irreps of the side it completes. */
public enum DerivedNotation {
    /** As the side given by the user names its own. */
    AUTHOR,
    DIMENSION,
    /** In Bourbaki's order of the nodes. */
    DYNKIN,
    YOUNG
}
