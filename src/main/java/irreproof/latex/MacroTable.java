package irreproof.latex;

/** The macros a document defines. */
public final class MacroTable {}
