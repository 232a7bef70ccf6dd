package irreproof.latex;

import irreproof.text.Span;

/** A sectioning command. Level 0 is the document's title, 1 a chapter, 2 a section, 3 a subsection, and so on. */
public record Heading(int level, Span span) {}
