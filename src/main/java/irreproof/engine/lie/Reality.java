package irreproof.engine.lie;

/** Whether an irrep of the compact form preserves a symmetric form, an antisymmetric one, or none. */
public enum Reality {
    REAL,
    PSEUDOREAL,
    COMPLEX
}
