package irreproof.engine.lie;

/** The Cartan series of simple Lie algebras. */
public enum Series {
    A,
    B,
    C,
    D,
    E,
    F,
    G
}
