package irreproof.check.judge;

/** What the forms of names stand for in one statement: the same choice for all its names of one form. */
public record Interpretation(Numbers numbers, Lists lists, Diagrams diagrams) {
    /** What a bare number stands for. */
    public enum Numbers {
        DIMENSION,
        SPIN
    }

    /** What bracketed numbers stand for. */
    public enum Lists {
        DYNKIN_BOURBAKI,
        /** Dynkin labels in the node order of Slansky's tables, where it differs. */
        DYNKIN_SLANSKY,
        PARTITION_ROWS,
        PARTITION_COLUMNS,
        /** The rank of an antisymmetric or traceless symmetric tensor of SO(n). */
        TENSOR_RANK,
        /** Brackets around one name, for nothing. */
        GROUPED
    }

    /** What a box of a Young diagram stands for. */
    public enum Diagrams {
        DEFINING,
        /** The conjugate of the defining irrep: the author draws boxes for antiquarks. */
        CONJUGATE
    }

    /** How far from common usage. */
    public int unusual() {
        return diagrams == Diagrams.CONJUGATE ? 1 : 0;
    }
}
